import { altitudeAdjustedPf } from "../../physiology/altitude-adjusted-pf";
import { berlinSeverity } from "../../physiology/berlin-severity";
import { pfRatio } from "../../physiology/pf-ratio";
import type { BloodGasFact } from "../facts";
import { gasAgeing, gasDueAt } from "../due/due-gas";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import type { Judged } from "../judge/judged";
import type { Alternative, Input, Reading } from "../judge/reading";
import type { NoteCode } from "../note-codes";
import { settingsAt, type Scene } from "../scene";
import { countUntil, newestUntil, type Item } from "../timeline/item";
import { altitudeFromMmHg } from "../unit-policy-defaults";
import { atGas } from "./gas-fio2";

const named = {
  name: "pfRatio",
  unit: "mmHg",
  source: "ARDS Definition Task Force, JAMA 2012;307:2526; altitude as in the ARDS Network's trials",
} as const;

/** V13: only at or below 674 mmHg (1,000 m). */
function adjusted(scene: Scene, ratio: number): number | null {
  const { barometricPressureMmHg } = scene.policy;
  if (barometricPressureMmHg > altitudeFromMmHg) return null;
  return computable(() => altitudeAdjustedPf({ pfRatio: ratio, barometricPressureMmHg }));
}

interface Band {
  band?: string;
  notes: NoteCode[];
  inputs: Input[];
}

const noBand: Band = { notes: [], inputs: [] };

/** V11, V13: the Berlin band; none in HFNO nor on ECMO; in APRV and HFOV PEEP is not comparable. */
function bandOf(scene: Scene, gas: Item<BloodGasFact>, ratio: number): Band {
  const mode = settingsAt(scene, gas.t)?.mode;
  if (scene.onEcmo || mode === "HFNO") return noBand;
  if (mode === "APRV" || mode === "HFOV") return { ...noBand, notes: ["peep-not-comparable"] };
  const peep = atGas(scene, gas, "peepCmH2O");
  if (!peep) return noBand;
  const band = computable(() => berlinSeverity({ pfRatio: ratio, peepCmH2O: peep.value! }));
  if (band === null) return { ...noBand, notes: ["not-computable"] };
  const capped = mode === "NIV" && (band === "moderate" || band === "severe");
  return { band: capped ? "mild" : band, notes: capped ? ["non-invasive-mild-only"] : [], inputs: [peep] };
}

function read(scene: Scene, item: Item<BloodGasFact>): Reading {
  const pao2MmHg = item.fact.pao2MmHg!;
  const fio2 = atGas(scene, item, "fio2");
  const own = { name: "pao2MmHg", value: pao2MmHg, unit: "mmHg", item };
  const value = fio2 && computable(() => pfRatio({ pao2MmHg, fio2: fio2.value! }));
  if (value === null) return { t: item.t, item, value, inputs: [own], notes: ["not-computable"] };
  const compared = adjusted(scene, value);
  const { band, notes, inputs } = bandOf(scene, item, compared ?? value);
  const alternatives: Alternative[] =
    compared === null ? [] : [{ value: compared, item, note: "adjusted-for-altitude" }];
  const adjustment: NoteCode[] = compared === null ? [] : ["adjusted-for-altitude"];
  const all = [own, fio2!, ...inputs];
  return { t: item.t, item, value, inputs: all, notes: [...adjustment, ...notes], alternatives, band };
}

/** V5, V11, V13: PaO2 over the FiO2 running when the blood was drawn, with its band. */
export function judgePfRatio(scene: Scene): Judged {
  const { pao2, ardsAssessments } = scene.line;
  const ageing = gasAgeing(scene, "oxygen");
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(pao2, scene.at),
    read: (index) => read(scene, pao2[index]!),
    ageing,
    dueAt: ({ t }) => gasDueAt(scene, ageing, t, false),
  });
  const assessed = newestUntil(ardsAssessments, scene.at)?.fact.ards === true;
  return assessed ? { ...judged, notes: [...judged.notes, "ards-assessed"] } : judged;
}
