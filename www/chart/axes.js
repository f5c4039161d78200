/** Scales and round ticks. */

/**
 * A straight scale from a range of values to a range of pixels; a range without width maps to its
 * middle.
 * @param {[number, number]} domain
 * @param {[number, number]} range
 * @returns {(value: number) => number}
 */
export function linear([from, to], [start, end]) {
  const width = to - from;
  if (width === 0) return () => (start + end) / 2;
  return (value) => start + ((value - from) / width) * (end - start);
}

/**
 * Round values inside a range: about `count` of them, each a multiple of 1, 2 or 5 times a power of
 * ten.
 * @param {number} from
 * @param {number} to
 * @param {number} count
 * @returns {{ values: number[], decimals: number }}
 */
export function ticks(from, to, count) {
  const rough = (to - from) / count;
  if (!(rough > 0) || !Number.isFinite(rough)) return { values: [], decimals: 0 };
  const power = Math.floor(Math.log10(rough));
  const unit = 10 ** power;
  const step = ([1, 2, 5].find((multiple) => multiple * unit >= rough) ?? 10) * unit;
  const first = Math.ceil(from / step);
  const last = Math.floor(to / step);
  const values = Array.from({ length: Math.min(50, last - first + 1) }, (_, index) => (first + index) * step);
  return { values, decimals: Math.max(0, -Math.floor(Math.log10(step) + 1e-9)) };
}
