/**
 * The part of a batten that is shown: all of it while one place is read, and the neighbourhood of the marks once two are
 * taken, so that a swing can be seen. Unit of the scale.
 */
export function stripSpan(
  scale: readonly [number, number],
  taken: readonly number[],
  values: readonly number[],
): readonly [number, number] {
  if (taken.length < 2) return scale;
  const least = Math.min(...values);
  const most = Math.max(...values);
  const step = (scale[1] - scale[0]) / 50;
  const around = Math.max(most - least, step) / 2;
  const from = Math.floor((least - around) / step) * step;
  const to = Math.ceil((most + around) / step) * step;
  return [Math.max(scale[0], from), Math.min(scale[1], to)];
}
