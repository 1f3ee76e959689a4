/** Values between the two, neither included, look like that unit. */
interface Slip {
  above: number;
  below: number;
  looksLike: string;
}

const slips: Readonly<Record<string, Slip>> = {
  fio2: { above: 1, below: 101, looksLike: "a percentage" },
  heightCm: { above: 0, below: 3, looksLike: "metres" },
  tidalVolumeMl: { above: 0, below: 10, looksLike: "litres" },
  flowLPerMin: { above: 0, below: 3, looksLike: "litres per second" },
  minuteVolumeLPerMin: { above: 60, below: 60_000, looksLike: "millilitres per minute" },
  paco2MmHg: { above: 0, below: 8, looksLike: "kPa" },
  spo2Percent: { above: 0, below: 1.01, looksLike: "a fraction" },
  temperatureC: { above: 45, below: 115, looksLike: "degrees Fahrenheit" },
};

/**
 * The unit a refused value was probably typed in, or null. It only names the unit: nothing is ever converted unseen.
 * Source: common practice.
 * @example slippedUnit("heightCm", 1.75) //=> "metres"
 */
export function slippedUnit(field: string, value: number): string | null {
  const slip = slips[field];
  return slip && value > slip.above && value < slip.below ? slip.looksLike : null;
}
