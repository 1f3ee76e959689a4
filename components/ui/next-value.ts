/** Float noise: 0.35 / 0.05 is 6.999…, and must count as 7 steps. */
const noise = 1e-9;

export interface StepRange {
  step: number;
  min: number;
  max: number;
}

/**
 * One press up or down: to the next whole step, held inside the range. A value off the grid goes to it first.
 * @example nextValue(0.25, -1, { step: 0.05, min: 0.21, max: 1 }) //=> 0.21
 * @example nextValue(0.21, 1, { step: 0.05, min: 0.21, max: 1 }) //=> 0.25
 */
export function nextValue(value: number, direction: 1 | -1, { step, min, max }: StepRange): number {
  const steps = direction === 1 ? Math.floor(value / step + noise) + 1 : Math.ceil(value / step - noise) - 1;
  const next = Math.min(Math.max(steps * step, min), max);
  return Number(next.toFixed(4));
}

/** Whether going from one value to the next passes a limit, or lands on the far side of one it stood on. */
export function passesLimit(from: number, to: number, limits: readonly number[]): boolean {
  const [low, high] = from < to ? [from, to] : [to, from];
  return limits.some((limit) =>
    from < to ? limit >= low - noise && limit < high - noise : limit > low + noise && limit <= high + noise,
  );
}
