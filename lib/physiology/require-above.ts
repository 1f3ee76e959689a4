import { isAbove } from "./same-number";

interface Named {
  name: string;
  value: number;
}

/** Refuses a value at or below another that it must exceed; a difference of float noise counts as equal. */
export function requireAbove(higher: Named, lower: Named): void {
  if (isAbove(higher.value, lower.value)) return;
  throw new RangeError(
    `${higher.name} ${higher.value} is not above ${lower.name} ${lower.value}: allowed above ${lower.value}`,
  );
}
