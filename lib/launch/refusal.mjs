/** Something the person at the terminal can mend: printed as one sentence, without a stack. */
export class Refusal extends Error {}
