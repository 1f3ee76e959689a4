import { derivedRanges } from "./derived-ranges";
import { requireCharted } from "./require-charted";
import { requireInRange } from "./require-in-range";
import { isAbove } from "./same-number";

export interface LungInjuryInput {
  quadrants?: number;
  pfRatio?: number;
  peepCmH2O?: number;
  complianceMlPerCmH2O?: number;
}

/** Lowest P/F and compliance that score 0, 1, 2, 3; below the last 4. The printed whole-number bands leave gaps. */
const pfFloors = [300, 225, 175, 100];
const complianceFloors = [80, 60, 40, 20];
/** Highest PEEP that scores 0, 1, 2, 3; above the last 4. */
const peepCeilings = [5, 8, 11, 14];

const pointsBelow = (value: number, floors: number[]) => floors.filter((floor) => isAbove(floor, value)).length;
const pointsAbove = (value: number, ceilings: number[]) => ceilings.filter((each) => isAbove(value, each)).length;

function quadrantPoints(quadrants: number): number {
  requireInRange("quadrants", quadrants, derivedRanges.chestQuadrants);
  if (Number.isInteger(quadrants)) return quadrants;
  throw new RangeError(`quadrants ${quadrants} is not whole: allowed 0, 1, 2, 3 or 4`);
}

function pointsOf({ quadrants, pfRatio, peepCmH2O, complianceMlPerCmH2O }: LungInjuryInput): number[] {
  const points: number[] = [];
  if (quadrants !== undefined) points.push(quadrantPoints(quadrants));
  if (pfRatio !== undefined) {
    points.push(pointsBelow(requireInRange("pfRatio", pfRatio, derivedRanges.pfRatio), pfFloors));
  }
  if (peepCmH2O !== undefined) points.push(pointsAbove(requireCharted("peepCmH2O", peepCmH2O), peepCeilings));
  if (complianceMlPerCmH2O !== undefined) {
    const allowed = derivedRanges.complianceMlPerCmH2O;
    requireInRange("complianceMlPerCmH2O", complianceMlPerCmH2O, allowed);
    points.push(pointsBelow(complianceMlPerCmH2O, complianceFloors));
  }
  return points;
}

/**
 * Lung injury score, 0 to 4: the mean of the components that are known; above 2.5 severe.
 * @param input.quadrants 0 to 4 quadrants of the chest film with consolidation
 * @param input.pfRatio 10 to 3334
 * @param input.peepCmH2O 0 to 50
 * @param input.complianceMlPerCmH2O 0.1 to 2000
 * @returns the score and how many components it rests on
 * @throws RangeError outside these, or with no component
 * @source Murray, Am Rev Respir Dis 1988;138:720
 * @example lungInjuryScore({ quadrants: 4, pfRatio: 85, peepCmH2O: 14, complianceMlPerCmH2O: 25 }) //=> { score: 3.5, components: 4 }
 */
export function lungInjuryScore(input: LungInjuryInput): { score: number; components: number } {
  const points = pointsOf(input);
  if (points.length === 0)
    throw new RangeError("no component given: allowed 1 to 4 of quadrants, P/F, PEEP, compliance");
  return { score: points.reduce((sum, each) => sum + each, 0) / points.length, components: points.length };
}
