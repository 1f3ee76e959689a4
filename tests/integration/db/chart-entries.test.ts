import { describe, expect, it } from "vitest";
import { withClient } from "../database";
import { buildEntry, buildEpisode, buildSubmission, buildUser } from "../factories";
import { ChartEntry, MechanicsReading, Observation, SettingChange, Submission } from "@/db/models";
import { sequelize } from "@/db/connection";

const correcting = (entry: ChartEntry, correction: "replace" | "void" = "replace") => ({
  episodeId: entry.episodeId,
  kind: entry.kind,
  supersedesId: entry.id,
  correction,
  reason: "Read from the wrong bed",
});

describe("chart entries", () => {
  it("are superseded once: the second to try is refused", async () => {
    const entry = await buildEntry();
    await buildEntry(correcting(entry));
    await expect(buildEntry(correcting(entry, "void"))).rejects.toMatchObject({
      parent: { code: "23505", constraint: "chart_entries_supersedes_uq" },
    });
    expect(await ChartEntry.count({ where: { supersedesId: entry.id } })).toBe(1);
  });

  it("are superseded once when two try at the same moment", async () => {
    const entry = await buildEntry();
    const submissions = [await buildSubmission(), await buildSubmission()];
    const attempts = await Promise.allSettled(
      submissions.map(({ id }) =>
        sequelize.transaction((transaction) =>
          ChartEntry.create(
            {
              ...correcting(entry),
              submissionId: id,
              authorId: entry.authorId,
              chartedAt: new Date(),
              chartedOffsetMin: 0,
            },
            { transaction },
          ),
        ),
      ),
    );
    expect(attempts.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
  });

  it("form a chain: a replacement can itself be replaced, and then voided", async () => {
    const first = await buildEntry();
    const second = await buildEntry(correcting(first));
    const third = await buildEntry(correcting(second, "void"));
    expect(third.supersedesId).toBe(second.id);
  });

  it("that are void are final and have no content", async () => {
    const entry = await buildEntry();
    const voided = await buildEntry(correcting(entry, "void"));
    await expect(buildEntry(correcting(voided))).rejects.toMatchObject({
      parent: { code: "23514", constraint: "chart_entries_void_is_final" },
    });
    await expect(SettingChange.create({ entryId: voided.id, peepCmH2O: 10 })).rejects.toMatchObject({
      parent: { constraint: "void_has_no_detail" },
    });
  });

  it("are corrected by their own kind in their own episode only", async () => {
    const entry = await buildEntry();
    const foreign = { parent: { code: "23503", constraint: "chart_entries_supersedes_fk" } };
    await expect(buildEntry({ ...correcting(entry), kind: "mechanics" })).rejects.toMatchObject(foreign);
    const other = await buildEpisode();
    await expect(buildEntry({ ...correcting(entry), episodeId: other.id })).rejects.toMatchObject(foreign);
  });

  it("say both what they supersede and how, with a reason, or neither", async () => {
    const entry = await buildEntry();
    const { supersedesId, correction, reason, ...place } = correcting(entry);
    await expect(buildEntry({ ...place, supersedesId, reason })).rejects.toThrow("correction_supersedes_ck");
    await expect(buildEntry({ ...place, correction, reason })).rejects.toThrow("correction_supersedes_ck");
    await expect(buildEntry({ ...place, supersedesId, correction })).rejects.toThrow("correction_reason_ck");
  });

  it("are one a kind in a submission", async () => {
    const entry = await buildEntry();
    const { submissionId, episodeId } = entry;
    await expect(buildEntry({ submissionId, episodeId })).rejects.toMatchObject({
      parent: { constraint: "chart_entries_submission_kind_uq" },
    });
    await expect(buildEntry({ submissionId, episodeId, kind: "mechanics" })).resolves.toMatchObject({ submissionId });
  });

  it("take the detail of their own kind and one row of it", async () => {
    const entry = await buildEntry({ kind: "mechanics" });
    await expect(Observation.create({ entryId: entry.id, spo2Percent: 93 })).rejects.toMatchObject({
      parent: { constraint: "observations_entry_fk" },
    });
    await MechanicsReading.create({ entryId: entry.id, plateauCmH2O: 24 });
    await expect(MechanicsReading.create({ entryId: entry.id, plateauCmH2O: 25 })).rejects.toMatchObject({
      parent: { constraint: "mechanics_readings_pk" },
    });
  });
});

describe("recorded_at", () => {
  const longAgo = new Date("2020-02-29T12:00:00.000Z");

  it("is the server's clock whatever the application says, to the millisecond and not ahead", async () => {
    const before = Date.now();
    const entry = await buildEntry({ recordedAt: longAgo });
    expect(entry.recordedAt.getTime()).toBeGreaterThanOrEqual(before - 1);
    expect(entry.recordedAt.getTime()).toBeLessThanOrEqual(Date.now());
    const read = await ChartEntry.findByPk(entry.id, { rejectOnEmpty: true });
    expect(read.recordedAt).toEqual(entry.recordedAt);
  });

  it("moves on inside one transaction: it is the clock's, not the transaction's start", async () => {
    const [first, second] = [await buildSubmission(), await buildSubmission()];
    const episode = await buildEpisode();
    await sequelize.transaction(async (transaction) => {
      const entry = { episodeId: episode.id, kind: "settings", chartedAt: new Date(), chartedOffsetMin: 0 };
      const one = await ChartEntry.create(
        { ...entry, submissionId: first.id, authorId: first.authorId },
        { transaction },
      );
      await sequelize.query("SELECT pg_sleep(0.01)", { transaction });
      const two = await ChartEntry.create(
        { ...entry, submissionId: second.id, authorId: second.authorId },
        { transaction },
      );
      expect(two.recordedAt.getTime()).toBeGreaterThan(one.recordedAt.getTime());
    });
  });

  it("is what the owner says: seeds tell a past", async () => {
    const author = await buildUser();
    const recorded = await withClient(process.env.TEST_DATABASE_OWNER_URL ?? "", async (client) => {
      const { rows } = await client.query<{ recorded_at: Date }>(
        `INSERT INTO submissions (author_id, client_key, body_hash, recorded_at)
         VALUES ($1, gen_random_uuid(), $2, $3) RETURNING recorded_at`,
        [author.id, "0".repeat(64), longAgo],
      );
      return rows[0]?.recorded_at;
    });
    expect(recorded).toEqual(longAgo);
  });
});

describe("submissions", () => {
  it("hold a client key once for each author", async () => {
    const mine = await buildSubmission();
    const again = { clientKey: mine.clientKey };
    await expect(buildSubmission({ ...again, authorId: mine.authorId })).rejects.toMatchObject({
      parent: { constraint: "submissions_author_client_key_uq" },
    });
    const theirs = await buildSubmission(again);
    expect(theirs.authorId).not.toBe(mine.authorId);
    expect(await Submission.count({ where: again })).toBe(2);
  });

  it("take only a hash", async () => {
    await expect(buildSubmission({ bodyHash: "A".repeat(64) })).rejects.toThrow("submissions_body_hash_ck");
  });
});
