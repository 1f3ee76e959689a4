import { User } from "@/db/models";
import { sequelize } from "@/db/connection";
import { env } from "@/lib/env";
import { seedDemo } from "./seed-demo";

/** `seeds/run.ts`: the demo's invented people and their three days, in a migrated database without people. */
async function run(): Promise<string> {
  if (env().NEAPTIDE_MODE !== "demo") throw new Error("only the demo has invented people (NEAPTIDE_MODE=demo)");
  if ((await User.count()) > 0) return "The database already has people: nothing was added.";
  const { patients, entries } = await seedDemo(new Date());
  return `The demo has ${patients} patients and ${entries} chart entries, ending now.`;
}

try {
  console.log(await run());
} catch (error) {
  console.error("The demo was not made:", error);
  process.exitCode = 1;
} finally {
  await sequelize.close();
}
