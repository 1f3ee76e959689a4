import { displayNumber } from "@/lib/format";
import type { RangeTrackProps } from "./range-track-props";
import { stateWord } from "./state-word";
import type { TrackMetric } from "./track-domain";

const decimals: Record<TrackMetric, number> = {
  vtMlPerKg: 1,
  plateauCmH2O: 0,
  drivingPressureCmH2O: 0,
  pao2MmHg: 0,
  spo2Percent: 0,
  paco2MmHg: 0,
  ph: 2,
  rass: 0,
  intrinsicPeepCmH2O: 0,
};

/** 'Plateau 27, inside; ordered up to 30.' */
export function describeTrack(track: RangeTrackProps): string {
  return `${track.name} ${valueWords(track)}; ${limitWords(track)}.`;
}

function valueWords({ metric, value, lastValue = null, state, lastState = null, limit }: RangeTrackProps): string {
  const limits = [limit.min, limit.max].filter((each) => each !== undefined);
  const text = (number: number) => displayNumber({ value: number, decimals: decimals[metric], limit: limits });
  if (state === "not-asked") return "not asked";
  if (state !== "unmeasured") return value === null ? stateWord(state) : `${text(value)}, ${stateWord(state)}`;
  const was = lastValue === null ? "" : `, was ${text(lastValue)}`;
  return `not measured${was}${lastState === "outside" ? ", outside" : ""}`;
}

function limitWords({ metric, limit: { min, max, origin } }: RangeTrackProps): string {
  const text = (number: number) => displayNumber({ value: number, decimals: limitDecimals(metric, number) });
  const word = origin === "order" ? "ordered" : "default";
  if (min !== undefined && max !== undefined) return `${word} ${text(min)} to ${text(max)}`;
  if (max !== undefined) return `${word} up to ${text(max)}`;
  return min === undefined ? "no limit" : `${word} from ${text(min)}`;
}

function limitDecimals(metric: TrackMetric, limit: number): number {
  if (metric === "ph") return 2;
  return Number.isInteger(limit) ? 0 : 1;
}
