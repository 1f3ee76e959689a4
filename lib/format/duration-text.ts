import { requireFinite } from "./require-finite";

const minutesPerDay = 24 * 60;

/**
 * How long, in the worksheet's short form: whole minutes begun are dropped, from 24 h on days and hours.
 * @param minutes below 0 reads as 0 (a device clock may run a little ahead)
 * @example durationText({ minutes: 130 }) //=> "2 h 10"
 * @example durationText({ minutes: 20 }) //=> "0 h 20"
 * @example durationText({ minutes: 51 * 60 }) //=> "2 d 3 h"
 */
export function durationText({ minutes }: { minutes: number }): string {
  const whole = Math.max(0, Math.floor(requireFinite("minutes", minutes)));
  const hours = Math.floor((whole % minutesPerDay) / 60);
  if (whole >= minutesPerDay) return `${Math.floor(whole / minutesPerDay)} d ${hours} h`;
  return `${hours} h ${String(whole % 60).padStart(2, "0")}`;
}
