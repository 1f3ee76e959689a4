export interface PlacedLabel {
  /** Top edge, px. */
  top: number;
  height: number;
}

/**
 * Moves labels apart so that none overlaps, keeping their order from top to bottom. A pinned label (the limit) stays;
 * those above it give way upward, those below it downward. What would leave the bottom is pushed back up.
 */
export function placeLabels<Label extends PlacedLabel & { pinned?: boolean }>(
  labels: Label[],
  bottom: number,
): Label[] {
  const pinned = Math.max(
    labels.findIndex((label) => label.pinned),
    0,
  );
  const placed = labels.map((label) => ({ ...label }));
  const pushUp = (from: number) => {
    for (let index = from; index > 0; index -= 1) {
      const [upper, lower] = [placed[index - 1], placed[index]];
      if (upper && lower) upper.top = Math.min(upper.top, lower.top - upper.height);
    }
  };
  for (let index = pinned + 1; index < placed.length; index += 1) {
    const [upper, lower] = [placed[index - 1], placed[index]];
    if (upper && lower) lower.top = Math.max(lower.top, upper.top + upper.height);
  }
  const last = placed.at(-1);
  if (last && !last.pinned) last.top = Math.min(last.top, bottom - last.height);
  pushUp(placed.length - 1);
  return placed;
}
