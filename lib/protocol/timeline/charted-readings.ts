import type { Facts, MechanicsFact, ObservationFact } from "../facts";
import { itemsInOrder, type Item } from "./item";

type Mechanics = Item<MechanicsFact>;

const isCharted = (value: number | null | undefined) => value !== null && value !== undefined;

function mechanicsReadings(mechanics: Mechanics[]) {
  return {
    exhaled: mechanics.filter(({ fact }) => isCharted(fact.exhaledTidalVolumeMl)),
    spontaneous: mechanics.filter(({ fact }) => isCharted(fact.spontaneousTidalVolumeMl)),
    minuteVolumes: mechanics.filter(({ fact }) => isCharted(fact.minuteVolumeLPerMin)),
    peaks: mechanics.filter(({ fact }) => isCharted(fact.peakCmH2O)),
    totalPeeps: mechanics.filter(({ fact }) => isCharted(fact.totalPeepCmH2O)),
    meanPressures: mechanics.filter(({ fact }) => isCharted(fact.meanAirwayPressureCmH2O)),
    breathVolumes: mechanics.filter(
      ({ fact }) => isCharted(fact.spontaneousTidalVolumeMl) || isCharted(fact.exhaledTidalVolumeMl),
    ),
  };
}

/** V7: the newer of mechanics and observations; of one moment the observation. */
function totalRatesOf(
  mechanics: Mechanics[],
  observations: Item<ObservationFact>[],
): Item<MechanicsFact | ObservationFact>[] {
  const measured = mechanics.filter(({ fact }) => isCharted(fact.respiratoryRateTotal));
  const observed = observations.filter(({ fact }) => isCharted(fact.respiratoryRateTotal));
  return observed.length === 0 ? measured : [...measured, ...observed].sort((a, b) => a.t - b.t);
}

/** Each measured field's readings, ascending. */
export function chartedReadings(facts: Facts) {
  const mechanics = itemsInOrder(facts.mechanics);
  const observations = itemsInOrder(facts.observations);
  const gases = itemsInOrder(facts.bloodGases).filter(({ fact }) => fact.specimen === "arterial");
  return {
    mechanics,
    observations,
    ...mechanicsReadings(mechanics),
    totalRates: totalRatesOf(mechanics, observations),
    spo2: observations.filter(({ fact }) => isCharted(fact.spo2Percent)),
    etco2: observations.filter(({ fact }) => isCharted(fact.etco2MmHg)),
    gases,
    pao2: gases.filter(({ fact }) => isCharted(fact.pao2MmHg)),
    paco2: gases.filter(({ fact }) => isCharted(fact.paco2MmHg)),
    ph: gases.filter(({ fact }) => isCharted(fact.ph)),
  };
}
