import type { Inputs } from "../published-values";

export interface MappedRun {
  /** The product's answer under the source's keys; throws where the product refuses. */
  answer: () => Record<string, unknown>;
  /** Wider tolerances by key, where the product's published form differs from the printed one. */
  tolerances?: Readonly<Record<string, number>>;
}

/** Translates one published value to calls of the product; null where no function exists for it yet. */
export type Mapping = (inputs: Inputs) => MappedRun | null;

/** Hands a table's value on as it stands: the tables also hold what must be refused. */
export function asNumber(value: unknown): number {
  return value as number;
}

export function run(answer: MappedRun["answer"], tolerances?: MappedRun["tolerances"]): MappedRun {
  return { answer, tolerances };
}
