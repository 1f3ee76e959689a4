/** The sex a height equation is read for. Never assumed: without it there is no answer. */
export type Sex = "male" | "female";

/** @throws RangeError for anything but male or female */
export function requireSex(sex: Sex): Sex {
  if (sex === "male" || sex === "female") return sex;
  throw new RangeError(`sex ${JSON.stringify(sex) ?? "nothing"} cannot be used: allowed male or female`);
}
