// Times the work inside the engine; the same function runs in Node and in the browser.

/**
 * @typedef {object} Bench the export of the engine built with the feature `bench`
 * @property {(place: number, count: number) => number | undefined} run
 *
 * @typedef {object} Line what each benchmark prints, one line of JSON each
 * @property {string} place
 * @property {string} work
 * @property {number | null} sum of what 256 turns gave: the same wherever the work is the same
 * @property {number[]} ns nanoseconds a turn, one for each batch
 */

/**
 * One call crosses the border a batch, so the border costs nothing here.
 *
 * @param {Bench} bench
 * @param {string[]} names
 * @param {string} place
 * @returns {Line[]}
 */
export function timeBatches(bench, names, place) {
  const batches = 7;
  const count = 20_000;
  return names.map((work, index) => {
    const sum = bench.run(index, 256) ?? null;
    bench.run(index, count);
    const ns = Array.from({ length: batches }, () => {
      const start = performance.now();
      bench.run(index, count);
      return ((performance.now() - start) * 1e6) / count;
    });
    return { place, work, sum, ns };
  });
}
