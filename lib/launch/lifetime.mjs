import { startNothingMore, stopWork, within } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { requireSystem } from "./requirements.mjs";

// What was stopped under it makes the command fail at once; the time is for its own tidying up.
const TIDY_MS = 1_000;

const stops = [];
let ending;
let command = Promise.resolve();

/** Registers what to stop at the end; the last registered stops first. */
export function atEnd(stop) {
  stops.push(stop);
}

async function stopEverything() {
  // Work under way goes before the services it uses.
  if (await stopWork()) await within(Promise.allSettled([command]), TIDY_MS);
  for (const stop of stops.reverse()) {
    try {
      await stop();
    } catch (error) {
      console.error(`While stopping: ${error.message}`);
    }
  }
}

/** Stops everything once, then exits; later calls wait for the first. */
function end(code) {
  ending ??= stopEverything().then(() => process.exit(code));
  return ending;
}

const isEnding = () => ending !== undefined;

const exitCodes = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };

function listenForSignals(exitCodeOf) {
  for (const signal of Object.keys(exitCodes)) {
    // `on`, not `once`: npm passes a Ctrl-C on that the terminal has already delivered.
    process.on(signal, () => {
      startNothingMore();
      void end(exitCodeOf(signal));
    });
  }
}

function listenForFaults() {
  // A closed terminal or a pipe whose reader has gone: nobody reads on, and what runs must still be stopped.
  for (const stream of [process.stdout, process.stderr]) stream.on("error", () => void end(1));
  process.on("uncaughtException", (error) => {
    console.error(error);
    void end(1);
  });
}

/** Runs a command of the launcher: signals, refusals and faults all end with nothing left running. */
export async function launch(main) {
  let served = false;
  listenForSignals((signal) => (served ? 0 : exitCodes[signal]));
  listenForFaults();
  try {
    requireSystem();
    command = main({ serving: () => (served = true) });
    await end(await command);
  } catch (error) {
    if (isEnding()) return ending;
    console.error(error instanceof Refusal ? error.message : error);
    await end(1);
  }
}
