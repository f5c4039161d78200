/** The page's own examples: cases of an imaginary works, each marked as invented. */

import ammonia from './examples/ammonia-converter.json' with { type: 'json' };
import chlorine from './examples/chlorine-recovery.json' with { type: 'json' };
import kiln from './examples/lime-kiln.json' with { type: 'json' };
import shift from './examples/low-temperature-shift.json' with { type: 'json' };
import sump from './examples/scrubber-sump.json' with { type: 'json' };

/** @import { Case } from './shiftgauge.js' */

export const EXAMPLES = /** @type {Record<string, Case>} */ (/** @type {unknown} */ ({
  'low-temperature-shift': shift,
  'ammonia-converter': ammonia,
  'chlorine-recovery': chlorine,
  'lime-kiln': kiln,
  'scrubber-sump': sump,
}));

/** The case that a new visitor sees. */
export const firstCase = () => structuredClone(/** @type {Case} */ (EXAMPLES['low-temperature-shift']));
