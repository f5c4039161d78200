/** The engine as the page sees it: the calls of the built `shiftgauge.js`. */

export type Module = BufferSource | WebAssembly.Module;

/** Fetches and starts the engine. */
export default function init(options?: {
  module_or_path: string | URL | Request | Response | Module;
}): Promise<unknown>;

/** Starts the engine from bytes or a compiled module. */
export function initSync(options: { module: Module }): unknown;

/** Lets go of a running or dead engine; the next start makes a new one. */
export function reset(): void;

/** The version of the program. */
export function version(): string;
