import { describe, expect, it } from "vitest";
import type { Transaction } from "sequelize";
import { buildBed, buildEpisode, buildHospital, buildPatient, buildUnit, buildUser } from "../factories";
import { sequelize } from "@/db/connection";
import { BedStay, EpisodePause, UnitPolicy, VentilationEpisode } from "@/db/models";

const at = (hour: number) => new Date(Date.UTC(2026, 10, 30, hour));

async function twoInTwoBeds() {
  const unit = await buildUnit();
  const [first, second] = [await buildEpisode({ unitId: unit.id }), await buildEpisode({ unitId: unit.id })];
  const [left, right] = [await buildBed({ unitId: unit.id }), await buildBed({ unitId: unit.id })];
  const a = await BedStay.create({ episodeId: first.id, bedId: left.id, during: [at(0), null] });
  const b = await BedStay.create({ episodeId: second.id, bedId: right.id, during: [at(0), null] });
  return { a, b, left, right };
}

/** Ends both stays at noon and begins the crossed ones: in between two patients share a bed. */
async function swap({ a, b }: { a: BedStay; b: BedStay }, transaction: Transaction) {
  await a.update({ during: [at(0), at(12)] }, { transaction });
  await BedStay.create({ episodeId: a.episodeId, bedId: b.bedId, during: [at(12), null] }, { transaction });
  await b.update({ during: [at(0), at(12)] }, { transaction });
  await BedStay.create({ episodeId: b.episodeId, bedId: a.bedId, during: [at(12), null] }, { transaction });
  await sequelize.query("SET CONSTRAINTS ALL IMMEDIATE", { transaction });
}

describe("bed stays", () => {
  it("hold one patient a bed at a time", async () => {
    const { a } = await twoInTwoBeds();
    const other = await buildEpisode();
    await expect(BedStay.create({ episodeId: other.id, bedId: a.bedId, during: [at(5), at(6)] })).rejects.toMatchObject(
      { parent: { code: "23P01", constraint: "bed_stays_one_patient_a_bed_ex" } },
    );
  });

  it("hold one bed a patient at a time", async () => {
    const { a } = await twoInTwoBeds();
    const free = await buildBed();
    await expect(
      BedStay.create({ episodeId: a.episodeId, bedId: free.id, during: [at(5), null] }),
    ).rejects.toMatchObject({ parent: { code: "23P01", constraint: "bed_stays_one_bed_a_patient_ex" } });
  });

  it("let a bed be taken at the moment it is left", async () => {
    const { a } = await twoInTwoBeds();
    await a.update({ during: [at(0), at(6)] });
    const next = await buildEpisode();
    const stay = await BedStay.create({ episodeId: next.id, bedId: a.bedId, during: [at(6), null] });
    expect(stay.bedId).toBe(a.bedId);
  });

  it("let two patients swap in one transaction", async () => {
    const { a, b, left, right } = await twoInTwoBeds();
    await sequelize.transaction((transaction) => swap({ a, b }, transaction));
    const now = await BedStay.findAll({ where: { episodeId: [a.episodeId, b.episodeId] }, order: [["id", "ASC"]] });
    expect(now.map(({ bedId }) => bedId)).toEqual([left.id, right.id, right.id, left.id]);
  });

  it("answer a clash at SET CONSTRAINTS ALL IMMEDIATE, not only at commit", async () => {
    const { a } = await twoInTwoBeds();
    const other = await buildEpisode();
    const clash = sequelize.transaction(async (transaction) => {
      await BedStay.create({ episodeId: other.id, bedId: a.bedId, during: [at(5), null] }, { transaction });
      await sequelize.query("SET CONSTRAINTS ALL IMMEDIATE", { transaction });
    });
    await expect(clash).rejects.toMatchObject({ parent: { code: "23P01" } });
    expect(await BedStay.count({ where: { episodeId: other.id } })).toBe(0);
  });

  it("last longer than nothing", async () => {
    const [episode, bed] = [await buildEpisode(), await buildBed()];
    await expect(BedStay.create({ episodeId: episode.id, bedId: bed.id, during: [at(5), at(5)] })).rejects.toThrow(
      "bed_stays_during_ck",
    );
  });
});

describe("ventilation episodes", () => {
  it("are open once for a patient", async () => {
    const open = await buildEpisode();
    const again = { patientId: open.patientId, unitId: open.unitId };
    await expect(buildEpisode(again)).rejects.toMatchObject({
      parent: { constraint: "ventilation_episodes_open_patient_uq" },
    });
    await open.update({ endedAt: new Date(), endReason: "liberation" });
    await expect(buildEpisode(again)).resolves.toMatchObject({ endedAt: null });
  });

  it("end with a reason, and after they began", async () => {
    await expect(buildEpisode({ endedAt: new Date() })).rejects.toThrow("ventilation_episodes_end_ck");
    await expect(buildEpisode({ intubatedAt: at(12), endedAt: at(11), endReason: "transfer" })).rejects.toThrow(
      "ventilation_episodes_order_ck",
    );
  });

  it("belong to one admission", async () => {
    const { submissionId } = await buildEpisode();
    await expect(buildEpisode({ submissionId })).rejects.toMatchObject({
      parent: { constraint: "ventilation_episodes_submission_uq" },
    });
    expect(await VentilationEpisode.count({ where: { submissionId } })).toBe(1);
  });

  it("pause once at a time", async () => {
    const episode = await buildEpisode();
    await EpisodePause.create({ episodeId: episode.id, pausedAt: at(1) });
    await expect(EpisodePause.create({ episodeId: episode.id, pausedAt: at(2) })).rejects.toMatchObject({
      parent: { code: "23P01", constraint: "episode_pauses_no_overlap_ex" },
    });
  });
});

describe("people and places", () => {
  it("have an MRN once in a hospital, and the same one in another", async () => {
    const [here, there] = [await buildHospital(), await buildHospital()];
    await buildPatient({ hospitalId: here.id, mrn: "30044417" });
    await expect(buildPatient({ hospitalId: here.id, mrn: "30044417" })).rejects.toMatchObject({
      parent: { constraint: "patients_hospital_mrn_uq" },
    });
    await expect(buildPatient({ hospitalId: there.id, mrn: "30044417" })).resolves.toMatchObject({ mrn: "30044417" });
  });

  it("have an e-mail address once, in lower case", async () => {
    await buildUser({ email: "m.okafor@example.test" });
    await expect(buildUser({ email: "m.okafor@example.test" })).rejects.toMatchObject({
      parent: { constraint: "users_email_uq" },
    });
    await expect(buildUser({ email: "M.Okafor@example.test" })).rejects.toThrow("users_email_ck");
  });

  it("name who switched next steps on together with when", async () => {
    const unit = await buildUnit();
    const policy = await UnitPolicy.findOne({ where: { unitId: unit.id }, raw: true, rejectOnEmpty: true });
    const { id: _id, recordedAt: _recordedAt, ...next } = policy;
    await expect(UnitPolicy.create({ ...next, nextStepsEnabledAt: new Date() })).rejects.toThrow(
      "unit_policies_next_steps_ck",
    );
  });
});
