import { describe, expect, test } from "vitest";
import { cmFromFeetInches, roundHalfUp } from "@/lib/format";
import { heightFromUlnaCm, predictedBodyWeightKg } from "@/lib/physiology";

/**
 * BAPEN MUST ulna table, heights in metres from ulna 32.0 cm down in steps of 0.5: men under 65, men from 65, women
 * under 65, women from 65. From memory; the last column unverified.
 */
const ulnaRows = [
  [1.94, 1.87, 1.84, 1.84],
  [1.93, 1.86, 1.83, 1.83],
  [1.91, 1.84, 1.81, 1.81],
  [1.89, 1.82, 1.8, 1.79],
  [1.87, 1.81, 1.79, 1.78],
  [1.85, 1.79, 1.77, 1.76],
  [1.84, 1.78, 1.76, 1.75],
  [1.82, 1.76, 1.75, 1.73],
  [1.8, 1.75, 1.73, 1.71],
  [1.78, 1.73, 1.72, 1.7],
  [1.76, 1.71, 1.7, 1.68],
  [1.75, 1.7, 1.69, 1.66],
  [1.73, 1.68, 1.68, 1.65],
  [1.71, 1.67, 1.66, 1.63],
  [1.69, 1.65, 1.65, 1.61],
  [1.67, 1.63, 1.63, 1.6],
  [1.66, 1.62, 1.62, 1.58],
  [1.64, 1.6, 1.61, 1.56],
  [1.62, 1.59, 1.59, 1.55],
  [1.6, 1.57, 1.58, 1.53],
  [1.58, 1.56, 1.56, 1.52],
  [1.57, 1.54, 1.55, 1.5],
  [1.55, 1.52, 1.54, 1.48],
  [1.53, 1.51, 1.52, 1.47],
  [1.51, 1.49, 1.51, 1.45],
  [1.49, 1.48, 1.5, 1.44],
  [1.48, 1.46, 1.48, 1.42],
  [1.46, 1.45, 1.47, 1.4],
] as const;

const ulnaColumns = [
  { sex: "male", ageYears: 64 },
  { sex: "male", ageYears: 65 },
  { sex: "female", ageYears: 64 },
  { sex: "female", ageYears: 65 },
] as const;

/** ARDS Network tidal-volume grid: PBW and mL at 4, 5, 6, 7, 8 mL/kg. From memory. */
const gridRows: { sex: "female" | "male"; inches: number; pbwKg: number; millilitres: number[] }[] = [
  { sex: "female", inches: 58, pbwKg: 40.9, millilitres: [164, 205, 245, 286, 327] },
  { sex: "female", inches: 62, pbwKg: 50.1, millilitres: [200, 251, 301, 351, 401] },
  { sex: "female", inches: 68, pbwKg: 63.9, millilitres: [256, 320, 383, 447, 511] },
  { sex: "female", inches: 70, pbwKg: 68.5, millilitres: [274, 343, 411, 480, 548] },
  { sex: "female", inches: 72, pbwKg: 73.1, millilitres: [292, 366, 439, 512, 585] },
  { sex: "male", inches: 62, pbwKg: 54.6, millilitres: [218, 273, 328, 382, 437] },
  { sex: "male", inches: 64, pbwKg: 59.2, millilitres: [237, 296, 355, 414, 474] },
  { sex: "male", inches: 66, pbwKg: 63.8, millilitres: [255, 319, 383, 447, 510] },
  { sex: "male", inches: 68, pbwKg: 68.4, millilitres: [274, 342, 410, 479, 547] },
  { sex: "male", inches: 74, pbwKg: 82.2, millilitres: [329, 411, 493, 575, 658] },
  { sex: "male", inches: 76, pbwKg: 86.8, millilitres: [347, 434, 521, 608, 694] },
];

describe("printed tables", () => {
  test.each(ulnaRows.map((heights, row) => ({ ulnaCm: 32 - row / 2, heights })))(
    "ulna $ulnaCm cm gives the MUST table's heights within 1 cm (from memory)",
    ({ ulnaCm, heights }) => {
      ulnaColumns.forEach((column, index) => {
        const heightCm = roundHalfUp(heightFromUlnaCm({ ...column, ulnaCm }), 0);
        expect(Math.abs(heightCm - (heights[index] ?? 0) * 100)).toBeLessThan(1.001);
      });
    },
  );

  test.each(gridRows)(
    "$sex $inches in: the line in cm stays within the card's inch form, 0.0114 kg an inch from 60 in (from memory)",
    ({ sex, inches, pbwKg, millilitres }) => {
      const ours = predictedBodyWeightKg({ sex, heightCm: cmFromFeetInches({ feet: 0, inches }) });
      const formsApartKg = 0.0114 * Math.abs(inches - 60) + 0.001;
      expect(Math.abs(ours - pbwKg)).toBeLessThanOrEqual(formsApartKg);
      millilitres.forEach((ml, index) => {
        expect(Math.abs(ours * (index + 4) - ml)).toBeLessThanOrEqual(formsApartKg * (index + 4) + 0.5);
      });
    },
  );
});
