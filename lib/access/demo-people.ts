/** The demo's invented people, in the order the sign-in page lists them. There are none in production. */
export const demoPeople = [
  { role: "Respiratory therapist", email: "therapist@neaptide.test" },
  { role: "Intensivist", email: "intensivist@neaptide.test" },
  { role: "Nurse", email: "nurse@neaptide.test" },
  { role: "Administrator", email: "admin@neaptide.test" },
  { role: "Nurse of the second unit", email: "nurse.east@neaptide.test" },
] as const;

export const demoPassword = "small-tides-2026";
