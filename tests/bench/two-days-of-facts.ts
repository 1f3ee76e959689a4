import type { Facts } from "../../lib/protocol";

/** Invented: one patient's 48 h, 240 facts, as a busy unit charts them. */
const entries = { settings: 36, mechanics: 48, observations: 96, bloodGases: 16, checks: 30, positions: 8, others: 6 };
const hours = 48;
const author = { id: "1", name: "Invented" };

export const benchEndsAt = Date.parse("2026-12-01T12:00:00Z");
const begins = benchEndsAt - hours * 3_600_000;

/** Evenly spread moments, a little apart for each patient and kind. */
function spread<Fact>(count: number, shift: number, make: (index: number) => Fact) {
  return Array.from({ length: count }, (_, index) => {
    const chartedAt = new Date(begins + ((index + shift) / (count + 1)) * hours * 3_600_000);
    const recordedAt = new Date(chartedAt.getTime() + 40_000);
    const times = { chartedAt: chartedAt.toISOString(), recordedAt: recordedAt.toISOString() };
    return { id: `${index}${shift}`, author, ...times, ...make(index) };
  });
}

const start = {
  mode: "A/C-VC",
  tidalVolumeMl: 420,
  respiratoryRate: 22,
  peepCmH2O: 10,
  fio2: 0.6,
  inspiratoryTimeS: 0.9,
  flowLPerMin: 55,
} as const;

const adjustments = [
  { peepCmH2O: 12 },
  { fio2: 0.5 },
  { respiratoryRate: 24 },
  { tidalVolumeMl: 400 },
  { peepCmH2O: 10 },
];

export function twoDaysOfFacts(patient: number): Facts {
  const shift = 0.1 + (patient % 10) / 20;
  return {
    settings: spread(entries.settings, shift, (index) =>
      index === 0 ? start : { ...adjustments[index % adjustments.length], fio2: 0.4 + (index % 4) / 10 },
    ),
    mechanics: spread(entries.mechanics, shift + 0.2, (index) => ({
      plateauCmH2O: 22 + ((index + patient) % 11),
      hold: index % 9 === 0 ? ("unsure" as const) : ("relaxed" as const),
      peakCmH2O: 36,
      totalPeepCmH2O: index % 2 === 0 ? 12 : null,
      exhaledTidalVolumeMl: 405 + (index % 5) * 10,
      respiratoryRateTotal: 22 + (index % 6),
      meanAirwayPressureCmH2O: 16,
    })),
    observations: spread(entries.observations, shift + 0.3, (index) => ({
      spo2Percent: 88 + ((index + patient) % 10),
      heartRate: 90,
      mapMmHg: 72,
    })),
    bloodGases: spread(entries.bloodGases, shift + 0.4, (index) => ({
      specimen: "arterial" as const,
      ph: 7.2 + (index % 20) / 100,
      paco2MmHg: 45 + (index % 10),
      pao2MmHg: 60 + (index % 30),
    })),
    settingsChecks: spread(entries.checks, shift + 0.5, () => ({})),
    positions: spread(entries.positions, shift, (index) => ({
      position: index % 2 === 0 ? ("prone" as const) : ("supine" as const),
    })),
    therapies: spread(entries.others - 1, shift, (index) => ({
      therapy: "neuromuscular-block" as const,
      on: index % 2 === 0,
    })),
    heights: spread(1, shift, () => ({ heightCm: 175, sexForPbw: "male" as const, method: "measured-lying" as const })),
  };
}
