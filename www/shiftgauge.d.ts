/**
 * The engine as the page sees it: the calls of the built `shiftgauge.js` and the plain data that
 * goes in and comes out. Every number is SI and finite; the unit is in the name.
 */

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
  [other: string]: unknown;
}

export interface Entry {
  species: string;
  value: string;
}

export type Water =
  | { fraction: string }
  | { per_dry: string }
  | { dew_point: string; pressure: string }
  | 'from_feed';

export interface Block {
  entries: Entry[];
  [other: string]: unknown;
}

export interface GasBlock extends Block {
  basis: 'wet' | 'dry';
  water: Water | null;
}

export interface Reading {
  gas: GasBlock | null;
  liquid: Block | null;
  solution: unknown;
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
  reading: Reading;
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

export interface Term {
  species: string;
  phase?: string;
  nu: number;
}

export interface Form {
  name: 'K' | 'Kp' | 'Kc' | 'Kx';
  unit: string;
  log10: number;
  value: number | null;
}

export type Verdict = 'forward' | 'reverse' | 'at rest' | 'cannot tell';

export interface ReactionReport {
  equation: string;
  terms: Term[];
  delta_nu_gas: number;
  ln_k: number;
  forms: Form[];
  gibbs_standard_j_per_mol: number;
  enthalpy_standard_j_per_mol: number | null;
  q: 'finite' | 'zero' | 'infinite' | 'undetermined';
  ln_q: number | null;
  gibbs_j_per_mol: number | null;
  verdict: Verdict | null;
  leaning: string | null;
  why: string | null;
  t_star_k: number | null;
  approach_k: number | null;
  shortfall_k: number | null;
  approach_note: string | null;
  extent_mol: number | null;
  source: string | { text: string } | null;
}

export interface SpeciesReport {
  species: string;
  phase: string;
  now_mol: number;
  rest_mol: number | null;
  change_mol: number | null;
  now_fraction: number | null;
  rest_fraction: number | null;
  exhausted: boolean;
}

export type Outcome =
  | 'rest'
  | 'phase exhausted'
  | 'ran to its limit'
  | 'any extent is at rest'
  | 'nothing can move';

/** Points of G/RT above its lowest value, against the extent in mol on the report's basis. */
export interface Curve {
  extent_mol: number[];
  gibbs_over_rt: number[];
}

/** G along the reaction from wall to wall, and optionally a closer look around now and rest. */
export interface Valley extends Curve {
  extent_now_mol: number;
  extent_min_mol: number;
  extent_max_mol: number;
  limits: { side: 'min' | 'max'; species: string[] }[];
  near?: Curve | null;
}

export interface Step {
  text: string;
  /** Which number of the answer the line leads to: `q`, `k`, `gibbs` or `t_star`. */
  about?: string | null;
}

export interface Note {
  level: string;
  code: string;
  text: string;
}

export interface Report {
  temperature_k: number;
  pressure_pa: number;
  volume_m3: number | null;
  basis_mol: number;
  reactions: ReactionReport[];
  species: SpeciesReport[];
  rest: { temperature_k: number; pressure_pa: number; outcome: Outcome } | null;
  valley: Valley | null;
  steps: Step[];
  notes: Note[];
}

export type Refusal = { ok: false; problems: Problem[] };
export type CheckAnswer = { ok: true; report: Report } | Refusal;
export type BalanceAnswer =
  | { ok: true; equation: string; terms: Term[]; already_balanced: boolean }
  | Refusal;

export interface Options {
  language: 'en';
  units: 'as typed' | 'SI' | 'metric' | 'US';
}

export function check(question: Case, options: Options): CheckAnswer;
export function balance(equation: string): BalanceAnswer;
export function constant(reaction: string, temperature: string): unknown;
export function species(text: string): unknown;
export function affinities(problem: unknown): unknown;
export function rest(problem: unknown): unknown;
export function version(): unknown;
/** Lets go of a running or dead engine; the next start makes a new one. */
export function reset(): void;
export function initSync(source: { module: WebAssembly.Module | BufferSource }): unknown;
export default function initialise(source: {
  module_or_path: WebAssembly.Module | BufferSource | Response | string;
}): Promise<unknown>;
