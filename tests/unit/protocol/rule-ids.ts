const numbered = (letter: string, count: number) =>
  Array.from({ length: count }, (_, index) => `${letter}${index + 1}`);

/** The ids of the product's rules on values, freshness, states and findings: each is held by a test that names it. */
export const ruleIds = [...numbered("V", 14), ...numbered("F", 9), ...numbered("S", 8), ...numbered("A", 3)];
