/** A stretch that belongs to a callout: from its letter to what it points at, or along its label. */
export type Stretch = readonly [fromX: number, fromY: number, toX: number, toY: number];

/** How far a point is from a stretch. */
function distanceTo([fromX, fromY, toX, toY]: Stretch, x: number, y: number): number {
  const [alongX, alongY] = [toX - fromX, toY - fromY];
  const length = alongX ** 2 + alongY ** 2;
  const part = length === 0 ? 0 : ((x - fromX) * alongX + (y - fromY) * alongY) / length;
  const held = Math.min(1, Math.max(0, part));
  return Math.hypot(x - fromX - held * alongX, y - fromY - held * alongY);
}

/**
 * Whose stretch is nearest to a touch. Callouts stand closer together than a knuckle is wide, so the areas that take a
 * touch overlap and the one on top is not always the one meant.
 */
export function nearestOf<Key>(
  x: number,
  y: number,
  callouts: readonly { key: Key; stretches: readonly Stretch[] }[],
): Key | undefined {
  let nearest: { key: Key; distance: number } | undefined;
  for (const { key, stretches } of callouts) {
    const distance = Math.min(...stretches.map((stretch) => distanceTo(stretch, x, y)));
    if (!nearest || distance < nearest.distance) nearest = { key, distance };
  }
  return nearest?.key;
}
