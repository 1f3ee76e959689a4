import { ventilatoryRatio } from "../../physiology/ventilatory-ratio";
import type { BloodGasFact, MechanicsFact } from "../facts";
import { gasAgeing, gasDueAt } from "../due/due-gas";
import { computable } from "../judge/computable";
import { judgeSeries } from "../judge/judge-series";
import { missing, notAsked, type Judged } from "../judge/judged";
import { pairedWith } from "../judge/paired-with";
import type { Alternative, Reading } from "../judge/reading";
import { isNonInvasive } from "../modes-asked";
import type { Scene } from "../scene";
import { countUntil, type Item } from "../timeline/item";
import { readMeasured, readProduct, readSet } from "./minute-volume";

const named = {
  name: "ventilatoryRatio",
  unit: "",
  source: "Sinha, Br J Anaesth 2009;102:692; Am J Respir Crit Care Med 2019;199:333",
} as const;

const readVolume = (item: Item<MechanicsFact>): Reading =>
  typeof item.fact.minuteVolumeLPerMin === "number" ? readMeasured(item) : readProduct(item);

function minuteVolumeAt(scene: Scene, t: number): Reading | null {
  const paired = pairedWith(scene, scene.line.minuteVolumesOrProducts, "breathsAndCarbonDioxide", t);
  return paired ? readVolume(paired) : readSet(scene, t);
}

function read(scene: Scene, item: Item<BloodGasFact>): Reading {
  const paco2MmHg = item.fact.paco2MmHg!;
  const volume = minuteVolumeAt(scene, item.t);
  const inputs = [{ name: "paco2MmHg", value: paco2MmHg, unit: "mmHg", item }, ...(volume?.inputs ?? [])];
  const base = { t: item.t, item, inputs, value: null };
  const litres = volume?.value ?? null;
  const { pbwKg, alternatives, height, heightCm } = scene.pbw;
  if (scene.onEcmo || litres === null) return base;
  const by = (weight: number) =>
    computable(() => ventilatoryRatio({ minuteVolumeLPerMin: litres, paco2MmHg, pbwKg: weight }));
  const all = height ? [...inputs, { name: "heightCm", value: heightCm, unit: "cm", item: height }] : inputs;
  const notes = volume?.notes ?? [];
  if (pbwKg !== null) return { ...base, inputs: all, value: by(pbwKg), notes };
  if (!alternatives) return { ...base, notes: ["needs-height"] };
  const both: Alternative[] = [
    { value: by(alternatives.male), item, note: "male" },
    { value: by(alternatives.female), item, note: "female" },
  ];
  return { ...base, inputs: all, notes: [...notes, "needs-sex"], alternatives: both };
}

/** V5, V11, V12: minute volume × PaCO2 over what predicted body weight would need; not asked on ECMO. */
export function judgeVentilatoryRatio(scene: Scene): Judged {
  if (!scene.settings) return { ...missing(named, null), notes: ["not-computable"] };
  const { paco2 } = scene.line;
  const ageing = gasAgeing(scene, "carbonDioxide");
  const judged = judgeSeries(scene, {
    named,
    limit: null,
    count: countUntil(paco2, scene.at),
    read: (index) => read(scene, paco2[index]!),
    ageing,
    dueAt: ({ t }) => gasDueAt(scene, ageing, t, false),
  });
  const { mode } = scene.settings;
  return scene.onEcmo || isNonInvasive(mode) || mode === "HFOV" ? notAsked(judged) : judged;
}
