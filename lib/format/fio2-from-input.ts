const accepted = "enter a fraction, 0.21 to 1.00, or a percentage, 21 to 100";

/** Typed text as a number; a decimal comma counts as a point, a percent sign marks a percentage. */
function parseTyped(text: string): { value: number; percentSign: boolean } | null {
  const match = /^(\d+[.,]?\d*|[.,]\d+)\s*(%?)$/.exec(text.trim());
  if (!match) return null;
  return { value: Number(match[1]?.replace(",", ".")), percentSign: match[2] === "%" };
}

function refusalFor(text: string, value: number, percentSign: boolean): string | null {
  const typed = text.trim();
  if (value > 100) return `FiO2 ${typed} is above 100 %: ${accepted}.`;
  if (percentSign && value < 21) return `FiO2 ${typed} is below room air, 21 %: ${accepted}.`;
  if (value < 0.21) return `FiO2 ${typed} is below room air, 0.21: ${accepted}.`;
  if (value > 1 && value < 21)
    return `FiO2 ${typed} is neither a fraction nor a percentage from room air up: ${accepted}.`;
  return null;
}

/**
 * FiO2 as typed on the form: 0.21–1.00 is a fraction, 21–100 a percentage, 1 means 100 %. Whole percent only.
 * @returns the fraction, or a sentence that says why not and what is accepted
 * @example fio2FromInput("0,4") //=> { fraction: 0.4 }
 * @example fio2FromInput("60") //=> { fraction: 0.6 }
 */
export function fio2FromInput(text: string): { fraction: number } | { refusal: string } {
  if (text.trim() === "") return { refusal: `FiO2 is empty: ${accepted}.` };
  const typed = parseTyped(text);
  if (!typed) return { refusal: `FiO2 '${text.trim()}' is not a number: ${accepted}.` };
  const refusal = refusalFor(text, typed.value, typed.percentSign);
  if (refusal) return { refusal };
  const percent = typed.value >= 21 ? typed.value : typed.value * 100;
  const whole = Math.round(percent);
  if (Math.abs(percent - whole) > 1e-6) {
    return { refusal: `FiO2 ${text.trim()} is not a whole percent: ${accepted}, in steps of 1 %.` };
  }
  return { fraction: whole / 100 };
}
