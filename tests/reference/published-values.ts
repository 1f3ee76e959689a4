import values from "./published-values.json";

/** Inputs as the sources name them. Some are wrong on purpose: a mapping passes them on as they stand. */
export type Inputs = Readonly<Record<string, unknown>>;

export interface PublishedValue {
  id: string;
  item: string;
  inputs: Inputs;
  expected: Readonly<Record<string, unknown>>;
  tolerance: number | null;
  source: string;
  seen: boolean;
  note?: string;
}

export const publishedValues = values as PublishedValue[];

export function publishedValuesOf(item: string): PublishedValue[] {
  return publishedValues.filter((each) => each.item === item);
}

/** Test title: the id and where the value was published, marked where it was not read in a retrieved text. */
export function titleOf({ id, source, seen }: PublishedValue): string {
  const needsNoMark = seen || /no source|practice|from memory/.test(source);
  return `${id}: ${source}${needsNoMark ? "" : ", from memory"}`;
}
