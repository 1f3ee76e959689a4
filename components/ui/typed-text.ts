export type KeypadKey = "0" | "1" | "2" | "3" | "4" | "5" | "6" | "7" | "8" | "9" | "." | "backspace";

/** The text after one key: one decimal point at most, no more characters than the field holds. */
export function typedText(text: string, key: KeypadKey, most: number): string {
  if (key === "backspace") return text.slice(0, -1);
  if (key === "." && text.includes(".")) return text;
  return text.length >= most ? text : text + key;
}

/** The keypad's key for a key of a real keyboard; null for any other. */
export function keypadKey(key: string): KeypadKey | null {
  if (key === "Backspace") return "backspace";
  const point = key === "," ? "." : key;
  return isKeypadKey(point) ? point : null;
}

function isKeypadKey(key: string): key is KeypadKey {
  return /^[0-9.]$/.test(key);
}
