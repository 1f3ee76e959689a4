import { mapArdsNetwork } from "./ards-network";
import { mapHeightSurrogate } from "./height-surrogates";
import type { Mapping } from "./mapping";
import { mapMechanicalPower } from "./mechanical-power";
import { mapMechanics } from "./mechanics";
import { mapOxygenation } from "./oxygenation";
import { mapPfAndArds } from "./pf-and-ards";
import { mapPlausibility } from "./plausibility";
import { mapPredictedBodyWeight } from "./predicted-body-weight";
import { mapRescue } from "./rescue";
import { mapUnits } from "./units";
import { mapVentilation } from "./ventilation";

/** One mapping an item; an item without one waits as a whole. */
export const mappings: Readonly<Record<string, Mapping>> = {
  "01-pbw": mapPredictedBodyWeight,
  "02-height-surrogate": mapHeightSurrogate,
  "03-pf-ards": mapPfAndArds,
  "04-mechanics": mapMechanics,
  "05-mech-power": mapMechanicalPower,
  "06-ventilation": mapVentilation,
  "07-oxygenation": mapOxygenation,
  "08-ardsnet": mapArdsNetwork,
  "09-rescue": mapRescue,
  "13-units": mapUnits,
  "14-plausibility": mapPlausibility,
};
