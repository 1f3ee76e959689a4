import { compareToLimit } from "../compare-to-limit";
import { foresee } from "../freshness";
import { minuteMs } from "../instant";
import { isHeldOutside, type Judged } from "../judge/judged";
import type { DerivedName } from "../result";
import type { Scene } from "../scene";
import { newestUntil } from "../timeline/item";
import { pao2BesideSpo2Min, pao2InPlaceOfSpo2Min } from "../unit-policy-defaults";

/** S3: what one check says about the bed's group. */
export interface Check {
  judged: Judged;
  says: "outside" | "unmeasured" | "edge" | "inside";
}

export type JudgedMetrics = Record<DerivedName, Judged>;

const severity = { inside: 0, edge: 1, unmeasured: 2, outside: 3 } as const;

export function worseOf(a: Check, b: Check): Check {
  return severity[b.says] > severity[a.says] ? b : a;
}

function checkOf(judged: Judged): Check | null {
  if (!judged.limit || judged.state === null || judged.state === "not-asked") return null;
  return { judged, says: isHeldOutside(judged) ? "outside" : judged.state };
}

/** S3: pH and PaCO2 without a fresh result move the group only when due, lapsed, or last outside. */
function gasCheck(scene: Scene, judged: Judged): Check | null {
  const check = checkOf(judged);
  if (!check || judged.reading || check.says === "outside") return check;
  const isDue = judged.dueAt !== null && compareToLimit(judged.dueAt, scene.at) <= 0;
  return isDue || judged.freshness === "lapsed" ? check : null;
}

function besideSpo2(spo2: Judged, pao2: Judged): boolean {
  return spo2.reading!.t - pao2.reading!.t <= pao2BesideSpo2Min * minuteMs;
}

/** S3: a fresh PaO2 younger than 2 h and newer than SpO2 stands in its place. */
function inPlaceOfSpo2(scene: Scene, pao2: Judged): boolean {
  if (!pao2.reading || !pao2.limit) return false;
  const { t } = pao2.reading;
  const age = pao2InPlaceOfSpo2Min * minuteMs;
  const newestSpo2 = newestUntil(scene.line.spo2, scene.at);
  foresee(scene, scene.clock.after(t, age));
  return scene.clock.between(t, scene.at) < age && (!newestSpo2 || t > newestSpo2.t);
}

/** S3: oxygen is one check: SpO2 with a PaO2 no more than 1 h older, else a PaO2 in its place, else SpO2's last word. */
export function oxygenChecks(scene: Scene, { spo2Percent: spo2, pao2MmHg: pao2 }: JudgedMetrics): Check[] {
  const bySpo2 = checkOf(spo2);
  const byPao2 = checkOf(pao2);
  if (!bySpo2) return byPao2 ? [byPao2] : [];
  if (spo2.reading) return byPao2 && pao2.reading && besideSpo2(spo2, pao2) ? [bySpo2, byPao2] : [bySpo2];
  return byPao2 && inPlaceOfSpo2(scene, pao2) ? [byPao2] : [bySpo2];
}

/** S3, S8: the checks that decide a bed's group, oxygen as its worse part. */
export function groupChecks(scene: Scene, judged: JudgedMetrics): Check[] {
  const oxygen = oxygenChecks(scene, judged);
  return [
    checkOf(judged.vtMlPerKg),
    checkOf(judged.plateauCmH2O),
    checkOf(judged.drivingPressureCmH2O),
    checkOf(judged.intrinsicPeepCmH2O),
    oxygen.length > 0 ? oxygen.reduce(worseOf) : null,
    gasCheck(scene, judged.paco2MmHg),
    gasCheck(scene, judged.ph),
  ].filter((check) => check !== null);
}
