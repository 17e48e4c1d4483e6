/** Moves label heights apart to at least `gap`, in order, as little as needed, and keeps the last above `bottom`. */
export const spreadLabels = (heights: readonly number[], gap: number, bottom: number): readonly number[] => {
  const placed: number[] = [];
  for (const height of heights) placed.push(Math.max(height, (placed.at(-1) ?? -Infinity) + gap));
  let limit = bottom;
  for (let index = placed.length - 1; index >= 0; index -= 1) {
    placed[index] = Math.min(placed[index] ?? limit, limit);
    limit = (placed[index] ?? limit) - gap;
  }
  return placed;
};
