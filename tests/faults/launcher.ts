import { spawn, type ChildProcess } from "node:child_process";
import { once } from "node:events";
import { MARK } from "@/lib/launch/child-environment.mjs";
import { root } from "@/lib/launch/settings.mjs";
import { commandLine, hasVariable, processesWhere } from "@/lib/launch/system-processes.mjs";

const ANSWERS = /^Neaptide answers at (\S+)/m;
const HOLDS_DATABASE = /^export TEST_DATABASE_APP_URL=(\S+)/m;

/** A launcher under test: what it printed, and its end. */
export interface Launcher {
  child: ChildProcess;
  printed: () => string;
  exitCode: Promise<number | null>;
}

/** Runs a command of the checkout with a bare environment, as a person at a terminal has it. */
export function run(command: string[], values: Record<string, string>): Launcher {
  const [program = "", ...args] = command;
  const env = { PATH: process.env.PATH, HOME: process.env.HOME, NODE_ENV: process.env.NODE_ENV, ...values };
  const child = spawn(program, args, { cwd: root, env, stdio: ["ignore", "pipe", "pipe"] });
  let text = "";
  child.stdout.setEncoding("utf8").on("data", (part: string) => (text += part));
  child.stderr.setEncoding("utf8").on("data", (part: string) => (text += part));
  const exitCode = once(child, "close").then(([code]: (number | null)[]) => code ?? null);
  return { child, printed: () => text, exitCode };
}

function untilPrinted({ child, printed, exitCode }: Launcher, line: RegExp): Promise<string> {
  const ended = exitCode.then((code) => Promise.reject(new Error(`ended with ${code}:\n${printed()}`)));
  const found = new Promise<string>((resolve) => {
    const look = () => {
      const word = line.exec(printed())?.[1];
      if (word) resolve(word);
    };
    child.stdout?.on("data", look);
    look();
  });
  return Promise.race([found, ended]);
}

/** Waits for the server's address; fails with what was printed when the launcher ends before that. */
export const untilAnswering = (launcher: Launcher) => untilPrinted(launcher, ANSWERS);

/** Waits for the database's address of `npm run db`. */
export const untilDatabase = (launcher: Launcher) => untilPrinted(launcher, HOLDS_DATABASE);

/** Processes of a data folder: those the launcher marked, and PostgreSQL's, which it names on the command line. */
export function processesOf(data: string): number[] {
  return processesWhere(
    (pid: number) => hasVariable(pid, MARK, data) || commandLine(pid).some((word) => word === `${data}/pg`),
  );
}
