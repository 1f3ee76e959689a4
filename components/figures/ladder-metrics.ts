import type { VolumeLadderProps } from "./ladder-reading";

export interface LadderMetrics {
  height: number;
  /** Top rail and bottom rail, px from the top. */
  rails: [top: number, bottom: number];
  /** How far the rails run on beyond 4 and 12, px. */
  run: number;
  mlBaseline: number;
  perKgBaseline: number;
  mlSize: number;
  /** The phone writes bare 4 to 12 under the millilitres. */
  perKgUnit: string;
  flag: boolean;
  /** Part of the ladder that one label takes at the narrowest this size is drawn, mL/kg. */
  labelRoom: number;
  /** From a rail's end to 4 and 12: the padding around the drawing. */
  insetClass: string;
  /** The narrowest the drawing gets, px, and how far the flag may stand out beyond 4 and 12. */
  leastWidth: number;
  inset: number;
}

export function ladderMetrics(size: NonNullable<VolumeLadderProps["size"]>): LadderMetrics {
  return sizes[size];
}

const sizes: Record<NonNullable<VolumeLadderProps["size"]>, LadderMetrics> = {
  full: {
    height: 108,
    rails: [37, 63],
    run: 14,
    mlBaseline: 85,
    perKgBaseline: 105,
    mlSize: 20,
    perKgUnit: " mL/kg",
    flag: true,
    labelRoom: 0.7,
    insetClass: "px-10",
    leastWidth: 720,
    inset: 40,
  },
  compact: {
    height: 90,
    rails: [34, 54],
    run: 14,
    mlBaseline: 73,
    perKgBaseline: 89,
    mlSize: 18,
    perKgUnit: " mL/kg",
    flag: true,
    labelRoom: 0.9,
    insetClass: "px-[30px]",
    leastWidth: 520,
    inset: 30,
  },
  phone: {
    height: 80,
    rails: [8, 32],
    run: 12,
    mlBaseline: 57,
    perKgBaseline: 75,
    mlSize: 18,
    perKgUnit: "",
    flag: false,
    labelRoom: 0.95,
    insetClass: "px-4",
    leastWidth: 256,
    inset: 16,
  },
};
