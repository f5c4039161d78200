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

/**
 * Heights moved apart until each has this much room, in their order, and kept between two bounds as
 * far as there is room at all.
 * @param {readonly number[]} heights
 * @param {number} room
 * @param {number} top
 * @param {number} bottom
 * @returns {number[]}   in the order given
 */
export function spread(heights, room, top, bottom) {
  const order = heights.map((height, index) => ({ height, index })).sort((a, b) => a.height - b.height);
  let above = top - room;
  for (const one of order) {
    one.height = Math.max(one.height, above + room);
    above = one.height;
  }
  let below = bottom + room;
  for (const one of [...order].reverse()) {
    one.height = Math.min(one.height, below - room);
    below = one.height;
  }
  const moved = [...heights];
  for (const { height, index } of order) moved[index] = height;
  return moved;
}
