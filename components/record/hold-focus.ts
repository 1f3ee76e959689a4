const afterPaint = (focus: () => void) => requestAnimationFrame(() => requestAnimationFrame(focus));

/** To the first of the hold's words beside the digits, for a person without a mouse. */
export function focusHoldWords() {
  afterPaint(() =>
    document
      .querySelector<HTMLElement>("[data-keypad-zone] [role=group] > div:last-child > button")
      ?.focus({ preventScroll: true }),
  );
}

/** Back to where the word now stands: the keypad that had the focus is gone. */
export function focusHoldWord() {
  afterPaint(() =>
    document.querySelector<HTMLElement>('[data-field="mechanics.plateauCmH2O"] button')?.focus({ preventScroll: true }),
  );
}
