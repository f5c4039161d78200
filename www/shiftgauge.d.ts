/**
 * The engine as the page sees it: the calls of the built `shiftgauge.js` and the plain data that
 * goes in and comes out. Every number is SI and finite; the unit is in the name.
 */

import type { Term, Form, ReactionReport, Outcome, Report } from './shiftgauge-report.js';
import type { Asked, Book, BookAnswer, SheetAnswer, SpeciesAnswer } from './shiftgauge-library.js';

export type * from './shiftgauge-report.js';
export type * from './shiftgauge-library.js';

/** What a value of K is given as. */
export type ConstantKind = 'K' | 'Kp' | 'Kc' | 'Kx' | 'log10 K' | 'ln K' | 'pK' | 'gibbs';

/** Where K comes from; fields of other sources pass through unread. */
export interface ConstantSource {
  from: string;
  for?: string;
  value?: string;
  kind?: ConstantKind;
  pressure_unit?: string;
  at?: string;
  enthalpy?: string;
  heat_capacity?: string;
  approach?: string;
  points?: [string, string][];
  terms?: Record<string, string>;
  [other: string]: unknown;
}

export interface Entry {
  species: string;
  value: string;
  /** What the analyser counts in with this species. */
  includes?: string;
}

export type Water =
  | { fraction: string }
  | { per_dry: string }
  | { dew_point: string; pressure?: string }
  | 'from_feed';

export interface Block {
  entries: Entry[];
  [other: string]: unknown;
}

export interface GasBlock extends Block {
  basis: 'wet' | 'dry';
  water: Water | null;
  /** What the sample lost when it was cooled. */
  lost?: string[];
}

/** Neither a volume nor a mass of water stands for 1 kg of water. */
export interface SolutionBlock extends Block {
  volume: string | null;
  water: string | null;
}

export interface Feed {
  gas: GasBlock | null;
  [other: string]: unknown;
}

export interface Reading {
  gas: GasBlock | null;
  liquid: Block | null;
  solution: SolutionBlock | null;
  solids: Block | null;
}

/** One question; the saved file is this, as JSON. */
export interface Case {
  format: string;
  title: string;
  note: string;
  reactions: { equation: string; constant: ConstantSource }[];
  temperature: string;
  pressure: string | null;
  atmosphere: string;
  hold: 'pressure' | 'volume';
  volume: string | null;
  band: string;
  reading: Reading;
  feed: Feed | null;
  /** The user's own species and constants that this case may use. */
  book?: Book | null;
  [other: string]: unknown;
}

export interface Problem {
  code: string;
  field: string;
  span: { start: number; end: number } | null;
  arguments: unknown;
  message: string;
  hint: string;
}

export type Refusal = { ok: false; problems: Problem[] };
export type CheckAnswer = { ok: true; report: Report } | Refusal;
export type BalanceAnswer =
  | { ok: true; equation: string; terms: Term[]; already_balanced: boolean }
  | Refusal;

export interface ConstantReport {
  equation: string;
  terms: { species: string; nu: number }[];
  temperature_k: number;
  ln_k: number;
  log10_k: number;
  u_ln_k: number | null;
  forms: Form[];
  gibbs_standard_j_per_mol: number;
  enthalpy_standard_j_per_mol: number | null;
  entropy_standard_j_per_mol_k: number | null;
  heat_capacity_j_per_mol_k: number | null;
  range_k: [number, number] | null;
  extrapolated_by_k: number | null;
}
export type ConstantAnswer = { ok: true; constant: ConstantReport } | Refusal;

export type Knob = 'temperature' | 'pressure' | 'volume' | `amount of ${string}`;

/** A number of a state of rest; conversion, fraction and amount are of a species. */
export interface Wanted {
  what: 'conversion' | 'fraction' | 'amount' | 'extent' | 'ln_k';
  species?: string | null;
}

/** A chart: rest over one knob, for several settings of another. Settings are texts with units; an
 * amount is a ratio to what else is in its phase. */
export interface SweepRequest {
  x: { knob: Knob; from: string; to: string; count: number };
  lines: { knob: Knob; values: string[] } | null;
  show: Wanted;
}
export type SweepAnswer =
  | {
      ok: true;
      sweep: {
        x: { knob: Knob; unit: 'K' | 'Pa' | 'm3' | 'mol/mol'; values: number[] };
        lines: { name: string; value_si: number | null; y: (number | null)[] }[];
        show: Wanted;
        data_range_k: [number, number] | null;
      /** u(ln K) at each x, where ln K is shown along the temperature. */
      u_ln_k: (number | null)[];
        now: { x: number | null; y: number | null };
      };
    }
  | Refusal;

/** Which setting of a knob gives a wanted number at rest. */
export interface Goal {
  knob: Knob;
  from: string;
  to: string;
  reach: Wanted;
  value: string;
}
export interface Setting {
  value_si: number;
  text: string;
  reached: number;
}
export type TargetAnswer =
  | {
      ok: true;
      target: {
        outcome: 'none' | 'one' | 'several';
        settings: Setting[];
        nearest: Setting | null;
        from_si: number;
        to_si: number;
        unit: 'K' | 'Pa' | 'm3' | 'mol/mol';
        why: string;
      };
    }
  | Refusal;

/** A number called K, to be turned into every other form. */
export interface StatedNumber {
  equation: string;
  value: string;
  kind: ConstantKind;
  pressure_unit?: string | null;
  temperature: string;
  /** Needed for Kx. */
  pressure?: string | null;
}
export type ConvertAnswer =
  | {
      ok: true;
      equation: string;
      terms: { species: string; nu: number }[];
      delta_nu_gas: number;
      temperature_k: number;
      ln_k: number;
      pk: number;
      gibbs_j_per_mol: number;
      forms: Form[];
    }
  | Refusal;

/** A problem in bare numbers, names being free; see `affinities` and `rest`. */
export interface BareProblem {
  species: { name: string; phase: 'g' | 'l' | 's' | 'aq'; amount_mol: number }[];
  reactions: { nu: number[]; ln_k: number }[];
  temperature_k: number;
  hold: 'pressure' | 'volume';
  pressure_pa?: number;
  volume_m3?: number;
}
export type AffinitiesAnswer =
  | { ok: true; affinities: { affinity_over_rt: number | null; q: ReactionReport['q'] }[] }
  | Refusal;
export type RestAnswer =
  | {
      ok: true;
      species: { name: string; amount_mol: number; ln_amount: number | null; exhausted: boolean }[];
      extents_mol: number[];
      outcome: Outcome;
      iterations: number;
      residual: number;
    }
  | Refusal;

export interface Version {
  ok: true;
  program: string;
  /** The case format that it writes. */
  format: string;
  /** How many species the library knows. */
  species: number;
}

export interface Options {
  language: 'en';
  units: 'as typed' | 'SI' | 'metric' | 'US';
}

export function check(question: Case, options: Options): CheckAnswer;
export function balance(equation: string): BalanceAnswer;
export function constant(reaction: string, temperature: string): ConstantAnswer;
export function sweep(question: Case, request: SweepRequest, options: Options): SweepAnswer;
export function target(question: Case, goal: Goal, options: Options): TargetAnswer;
export function convert(number: StatedNumber): ConvertAnswer;
export function species(text: string, asked: Asked | null): SpeciesAnswer | Refusal;
export function sheet(species: string, asked: Asked | null): SheetAnswer;
export function book(book: Book): BookAnswer;
export function affinities(problem: BareProblem): AffinitiesAnswer;
export function rest(problem: BareProblem): RestAnswer;
export function version(): Version;
/** Lets go of a running or dead engine; the next start makes a new one. */
export function reset(): void;
export function initSync(source: { module: WebAssembly.Module | BufferSource }): unknown;
export default function initialise(source: {
  module_or_path: WebAssembly.Module | BufferSource | Response | string;
}): Promise<unknown>;
