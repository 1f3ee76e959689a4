/**
 * V14: the physiology functions refuse what cannot be; the chart may hold it (exhaled 0, plateau over peak). Such a
 * number is null, and says so.
 */
export function computable<Answer>(compute: () => Answer): Answer | null {
  try {
    return compute();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
