import { isAbove } from "./same-number";

interface Named {
  name: string;
  value: number;
}

/** Refuses a value below another that it may equal; a difference of float noise counts as equal. */
export function requireNotBelow(higher: Named, lower: Named): void {
  if (!isAbove(lower.value, higher.value)) return;
  throw new RangeError(
    `${higher.name} ${higher.value} is below ${lower.name} ${lower.value}: allowed from ${lower.value}`,
  );
}
