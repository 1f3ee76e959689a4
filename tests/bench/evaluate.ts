import { evaluate, targetsFromSet, type Facts } from "../../lib/protocol";
import { benchEndsAt, twoDaysOfFacts } from "./two-days-of-facts";

/**
 * Time of one unit: 60 patients with 48 h of facts each, evaluated once. Cold: facts never seen before, folded anew;
 * warm: the same facts objects, a minute later. Aim: under 30 ms for the unit.
 * Run: npx tsx tests/bench/evaluate.ts
 */
const patients = 60;
const rounds = 100;
const aimMs = 30;

const targets = targetsFromSet("ards", "order");
const unit = { barometricPressureMmHg: 760 };
const episode = { intubatedAt: benchEndsAt - 49 * 3_600_000 };

const unitOfFacts = () => Array.from({ length: patients }, (_, patient) => twoDaysOfFacts(patient));

interface Spent {
  wallMs: number;
  /** Of the process: what a busy machine does not inflate. */
  cpuMs: number;
}

function timeUnit(facts: readonly Facts[], at: number): Spent {
  const [before, cpu] = [performance.now(), process.cpuUsage()];
  for (const patient of facts) evaluate({ targets, unit, episode, facts: patient, at });
  const { user, system } = process.cpuUsage(cpu);
  return { wallMs: performance.now() - before, cpuMs: (user + system) / 1000 };
}

function median(times: readonly number[]): number {
  return times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? 0;
}

function line(name: string, spent: readonly Spent[]): string {
  const walls = spent.map(({ wallMs }) => wallMs);
  const cpu = median(spent.map(({ cpuMs }) => cpuMs));
  const columns = [median(walls), Math.min(...walls), cpu].map((ms) => `${ms.toFixed(1).padStart(8)} ms`);
  return `${name.padEnd(32)}${columns.join("")}`;
}

const count = Object.values(twoDaysOfFacts(0)).reduce((sum, facts) => sum + (facts?.length ?? 0), 0);
const first = timeUnit(unitOfFacts(), benchEndsAt);
const cold = Array.from({ length: rounds }, () => timeUnit(unitOfFacts(), benchEndsAt));
const kept = unitOfFacts();
const warm = Array.from({ length: rounds }, (_, minute) => timeUnit(kept, benchEndsAt + minute * 60_000));

console.log(`${patients} patients, ${count} facts each, median of ${rounds} rounds, aim under ${aimMs} ms`);
console.log(`${"".padEnd(32)}     median    fastest  processor`);
console.log(line("first evaluation of the process", [first]));
console.log(line("cold (facts folded anew)", cold));
console.log(line("warm (facts already folded)", warm));
