import { describe, expect, it } from "vitest";
import { administratorCan, can, type Member } from "@/lib/access/can";
import { rights, type Right } from "@/lib/access/rights";

const roles = ["therapist", "intensivist", "nurse"] as const;
const usual = { nursesSetVentilators: false };
const nursesSet = { nursesSetVentilators: true };
const member = (role: Member["role"], lead = false): Member => ({ role, lead });

/** Therapist, intensivist, nurse, administrator: y may, n may not, l only as lead, u only where nurses set ventilators. */
const expected: Record<Right, string> = {
  "session:own": "yyyy",
  "patients:read": "yyyn",
  "beds:read": "yyyn",
  "patients:admit": "yynn",
  "patients:edit": "yynn",
  "episode:manage": "yynn",
  "heights:chart": "yyyn",
  "settings:chart": "yyyn",
  "settings-checks:chart": "yyun",
  "mechanics:chart": "yynn",
  "bedside-entries:chart": "yyyn",
  "therapies:chart": "yynn",
  "airway-checks:chart": "yyyn",
  "observations:chart": "yyyn",
  "blood-gases:chart": "yyyn",
  "weights:chart": "yyyn",
  "conditions:chart": "yyyn",
  "positions:chart": "yyyn",
  "sedation:chart": "yyyn",
  "fluids:chart": "yyyn",
  "care-checks:chart": "yyyn",
  "notes:chart": "yyyn",
  "attachments:chart": "yyyn",
  "handover-questions:chart": "yyyn",
  "targets:order": "nynn",
  "ards-assessments:chart": "nynn",
  "rounds-reviews:chart": "nynn",
  "acknowledgements:chart": "yyyn",
  "handover:take-over": "yyyn",
  "entries:correct": "yyyn",
  "intake:file": "yynn",
  "intake:tokens": "nnny",
  "hours-inside:read": "llln",
  "next-steps:switch": "llln",
  "staff:manage": "nnny",
  "units:manage": "nnny",
  "audit:read": "nnny",
};

const mayAsLead = (letter: string | undefined) => letter === "y" || letter === "l";

describe("the rights table", () => {
  it("is tested right by right", () => {
    expect(Object.keys(rights).sort()).toEqual(Object.keys(expected).sort());
  });

  for (const [right, letters] of Object.entries(expected) as [Right, string][]) {
    it(`${right} is held by whom product 3 says`, () => {
      roles.forEach((role, index) => {
        const letter = letters[index];
        expect(can(member(role), right, usual), role).toBe(letter === "y");
        expect(can(member(role, true), right, usual), `${role}, lead`).toBe(mayAsLead(letter));
        expect(can(member(role), right, nursesSet), `${role}, where nurses set`).toBe(letter === "y" || letter === "u");
      });
      expect(administratorCan(right)).toBe(letters[3] === "y");
    });
  }
});
