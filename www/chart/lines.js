/** Lines through points, and values read from them. */

/**
 * The path through points, in pixels to one decimal.
 * @param {readonly (readonly [number, number])[]} points
 */
export function path(points) {
  return points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${x.toFixed(1)} ${y.toFixed(1)}`).join('');
}

/**
 * The height of a line through ascending points at this place; past the ends, the end's own.
 * @param {readonly number[]} xs
 * @param {readonly number[]} ys
 * @param {number} at
 */
export function heightAt(xs, ys, at) {
  const next = xs.findIndex((x) => x >= at);
  if (next === -1) return ys[ys.length - 1] ?? 0;
  const [x0, x1] = [xs[next - 1] ?? at, xs[next] ?? at];
  const [y0, y1] = [ys[next - 1] ?? ys[next] ?? 0, ys[next] ?? 0];
  return x1 === x0 ? y1 : y0 + ((at - x0) / (x1 - x0)) * (y1 - y0);
}
