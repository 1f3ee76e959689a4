import { runSite } from "./site.mjs";

await runSite({ name: "npm run dev", command: "dev", built: false });
