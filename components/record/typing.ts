/** Which number the keypad types into. */
export interface TypingTarget {
  part: "settings" | "mechanics" | "observations";
  field: string;
}

export const sameTarget = (one: TypingTarget | null, other: TypingTarget): boolean =>
  one?.part === other.part && one.field === other.field;

export const targetName = ({ part, field }: TypingTarget) => `${part}.${field}` as const;
