/** The one line at the foot of every clinical screen. */
export const cautionLine =
  "Supports, does not replace, judgement. Check ventilator and patient. Adults only. Not an alarm, not a certified device.";

/** Stands beside it wherever a person decides whether to rely on this at all: sign-in and prints. */
export const cautionFull = {
  lead: "Supports, does not replace, judgement.",
  rest: "Check ventilator and patient. Adults only. Not an alarm, not a certified device. Follow local protocol and the licensed prescriber.",
};
