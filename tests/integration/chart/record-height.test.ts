import { beforeEach, describe, expect, it } from "vitest";
import { Height, Patient } from "@/db/models";
import { paths } from "../http/call";
import { Bedside, idOf, minutesAgo, tallMan } from "./bedside";

let bedside: Bedside;

beforeEach(async () => {
  bedside = await Bedside.open();
});

const bornYearsAgo = async (years: number) => {
  const born = new Date();
  born.setUTCFullYear(born.getUTCFullYear() - years);
  born.setUTCDate(born.getUTCDate() - 2);
  await Patient.update({ birthDate: born.toISOString().slice(0, 10) }, { where: { id: bedside.patientId } });
};

describe("a height", () => {
  it("gives the predicted body weight (ARDS Network 2000: a man of 175 cm has 70.566 kg)", async () => {
    const { worksheet, ...answer } = await bedside.charted("heights", tallMan, { as: "nurse" });
    expect(worksheet.pbwKg).toBeCloseTo(70.566, 6);
    expect(worksheet.height).toMatchObject({ ...tallMan, entryId: answer.entries[0]?.id });
    expect(worksheet.pbwAlternatives).toBeNull();
  });

  it("V12 of 110 cm is kept but gives no PBW; under 100 and over 250 cm are refused", async () => {
    const { worksheet } = await bedside.charted("heights", { ...tallMan, heightCm: 110 });
    expect(worksheet).toMatchObject({ pbwKg: null, height: { heightCm: 110 } });
    for (const heightCm of [99.9, 250.1, 1.75]) {
      expect(paths(await bedside.chart("heights", { ...tallMan, heightCm }))).toEqual(["heightCm"]);
    }
  });

  it("needs the sex used for PBW", async () => {
    expect(paths(await bedside.chart("heights", { method: "reported", heightCm: 175 }))).toEqual(["sexForPbw"]);
  });

  it("takes exactly the length that its method measures", async () => {
    const answer = await bedside.chart("heights", { method: "ulna", sexForPbw: "male", heightCm: 175 });
    expect(paths(answer).sort()).toEqual(["heightCm", "ulnaCm"]);
  });
});

describe("an estimated height", () => {
  it("from the ulna of a man under 65: 79.2 + 3.60 × 26 = 172.8 cm (Elia 2003, from memory)", async () => {
    await bornYearsAgo(64);
    const answer = await bedside.charted("heights", { method: "ulna", sexForPbw: "male", ulnaCm: 26 });
    const row = await Height.findByPk(idOf(answer), { rejectOnEmpty: true });
    expect(row).toMatchObject({ method: "ulna", ulnaCm: 26, heightCm: 172.8 });
    expect(answer.worksheet.height).toMatchObject({ heightCm: 172.8, method: "ulna" });
  });

  it("takes the age when it was charted: from 65 on 86.3 + 3.15 × 26 = 168.2 cm", async () => {
    await bornYearsAgo(65);
    const answer = await bedside.charted("heights", { method: "ulna", sexForPbw: "male", ulnaCm: 26 });
    expect(answer.worksheet.height?.heightCm).toBe(168.2);
  });

  it("from knee height is refused outside 60 to 90 years (Chumlea 1985)", async () => {
    const knee = { method: "knee-height", sexForPbw: "male", kneeHeightCm: 50 };
    for (const years of [59, 91]) {
      await bornYearsAgo(years);
      expect(paths(await bedside.chart("heights", knee)), String(years)).toEqual(["kneeHeightCm"]);
    }
    await bornYearsAgo(70);
    const { worksheet } = await bedside.charted("heights", knee);
    expect(worksheet.height?.heightCm).toBe(162.39);
  });

  it("from the demispan of a man of 55 and more: 1.2 × 84 + 71 = 171.8 cm (BAPEN MUST, from memory)", async () => {
    await bornYearsAgo(60);
    const answer = await bedside.charted("heights", { method: "demispan", sexForPbw: "male", demispanCm: 84 });
    expect(answer.worksheet.height?.heightCm).toBe(171.8);
  });
});

describe("one height after another", () => {
  const reported = { method: "reported", sexForPbw: "male", heightCm: 180 };

  it("by a lower method needs a reason", async () => {
    await bedside.charted("heights", { ...tallMan, chartedAt: minutesAgo(30) });
    expect(paths(await bedside.chart("heights", reported))).toEqual(["reason"]);
    const answer = await bedside.charted("heights", { ...reported, reason: "Measured on another patient" });
    expect(answer.worksheet.height?.heightCm).toBe(180);
    expect((await bedside.history({ kind: "heights" })).entries[0]?.reason).toBe("Measured on another patient");
  });

  it("by the same or a better method needs none", async () => {
    await bedside.charted("heights", { ...reported, chartedAt: minutesAgo(30) });
    await bedside.charted("heights", { ...reported, heightCm: 178, chartedAt: minutesAgo(20) });
    expect((await bedside.chart("heights", tallMan)).status).toBe(201);
  });

  it("charted late, before the better one, replaces nothing and needs none", async () => {
    await bedside.charted("heights", { ...tallMan, chartedAt: minutesAgo(30) });
    const answer = await bedside.charted("heights", { ...reported, chartedAt: minutesAgo(60) });
    expect(answer.worksheet.height?.heightCm).toBe(175);
  });
});
