/** The core's note codes as people read them beside a number; codes without words here stand in the where-from panel. */
const words: Record<string, string> = {
  "patient-effort": "patient effort, repeat relaxed",
  "needs-total-peep": "needs total PEEP",
  "needs-height": "needs height",
  "needs-sex": "needs the sex used for PBW",
  "not-computable": "cannot be worked out",
  "exhaled-outside-not-measured-since": "exhaled was outside, not measured since",
  leak: "leak?",
  "exhaled-differs": "exhaled differs",
  "set-volume-alone": "set volume alone",
  "assumes-no-trapped-gas": "assumes no trapped gas",
  "zero-flow": "at zero flow",
  "set-times-set": "set × set",
  "room-to-lower-fio2": "room to lower FiO2",
};

/** The most telling note that has words, or null. */
export function noteWords(notes: readonly string[]): string | null {
  const known = Object.keys(words).find((code) => notes.includes(code));
  return known === undefined ? null : (words[known] ?? null);
}

const reasons = ["patient-effort", "needs-total-peep", "needs-height", "needs-sex"];

/** Why a fresh reading still gives no number, where a note says so; what its last value rested on is no reason. */
export function whyUnmeasured(notes: readonly string[]): string | null {
  return noteWords(notes.filter((code) => reasons.includes(code)));
}
