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
  phase: string | null;
  nu: number;
}

export interface Form {
  name: 'K' | 'Kp' | 'Kc' | 'Kx';
  unit: string;
  log10: number;
  value: number | null;
}

export type Verdict = 'forward' | 'reverse' | 'at rest' | 'cannot tell';

export interface SourceReport {
  text: string;
  range_k: [number, number] | null;
  extrapolated_by_k: number | null;
  /** One for each species that the library gave. */
  records: RecordReport[];
}

export interface RecordReport {
  species: string;
  name: string;
  sources: string[];
  range_k: [number, number];
  u_gibbs_j_per_mol: number;
}

export interface ReactionReport {
  equation: string;
  terms: { species: string; nu: number }[];
  delta_nu_gas: number;
  ln_k: number;
  log10_k: number;
  u_ln_k: number | null;
  forms: Form[];
  gibbs_standard_j_per_mol: number;
  enthalpy_standard_j_per_mol: number | null;
  entropy_standard_j_per_mol_k: number | null;
  heat_capacity_j_per_mol_k: number | null;
  q: 'finite' | 'zero' | 'infinite' | 'undetermined';
  ln_q: number | null;
  u_ln_q: number | null;
  affinity_over_rt: number | null;
  u_affinity_over_rt: number | null;
  gibbs_j_per_mol: number | null;
  u_gibbs_j_per_mol: number | null;
  /** Null where there is no reading. */
  verdict: Verdict | null;
  leaning: 'forward' | 'reverse' | null;
  why: string;
  t_star_k: number | null;
  approach_k: number | null;
  u_approach_k: number | null;
  shortfall_k: number | null;
  approach_note: string | null;
  extent_mol: number | null;
  extent_min_mol: number | null;
  extent_max_mol: number | null;
  budget: { input: string; share_of_variance: number }[];
  source: SourceReport;
}

export interface SpeciesReport {
  /** With its phase, such as `CO2(g)` or `C(s, graphite)`. */
  species: string;
  phase: 'g' | 'l' | 's' | 'aq';
  /** Zero for an inert. */
  nu: number;
  /** Null for a phase that is there in ample amount. */
  now_mol: number | null;
  rest_mol: number | null;
  rest_ln_mol: number | null;
  change_mol: number | null;
  now_fraction: number | null;
  rest_fraction: number | null;
  now_ln_activity: number | null;
  rest_ln_activity: number | null;
  activity_coefficient: number;
  partial_pressure_pa: number | null;
  exhausted: boolean;
}

export type Outcome =
  | 'rest'
  | 'phase exhausted'
  | 'ran to its limit'
  | 'any extent is at rest'
  | 'nothing can move'
  | 'has no limit';

/** Points of the energy over RT above its lowest value, against the extent on the report's basis. */
export interface Curve {
  extent_mol: number[];
  gibbs_over_rt: number[];
}

/** The energy along the reaction from wall to wall, and a closer look where now and rest are near. */
export interface Valley extends Curve {
  /** Gibbs energy at constant pressure, Helmholtz energy (A) at constant volume. */
  energy: 'G' | 'A';
  extent_now_mol: number;
  extent_min_mol: number;
  extent_max_mol: number;
  limits: { side: 'min' | 'max'; species: string[] }[];
  near: Curve | null;
}

export interface Step {
  text: string;
  /** Which number of the answer the line leads to. */
  about: 'k' | 'q' | 'gibbs' | 't_star' | 'rest';
}

export interface Note {
  level: 'assumption' | 'conversion' | 'warning' | 'caution';
  code: string;
  text: string;
}

export interface Report {
  temperature_k: number;
  pressure_pa: number | null;
  volume_m3: number | null;
  ionic_strength_mol_per_kg: number | null;
  reactions: ReactionReport[];
  basis_mol: number;
  /** What the amounts stand for, in words. */
  basis: string;
  species: SpeciesReport[];
  rest: {
    temperature_k: number;
    pressure_pa: number | null;
    volume_m3: number | null;
    outcome: Outcome;
    iterations: number;
    residual: number;
  } | null;
  conversions: {
    species: string;
    feed_to_now: number | null;
    now_to_rest: number | null;
    feed_to_rest: number | null;
  }[];
  valley: Valley | null;
  steps: Step[];
  notes: Note[];
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

export interface SpeciesMatch {
  species: string;
  formula: string;
  phase: 'g' | 'l' | 's' | 'aq';
  form: string | null;
  names: string[];
  cas: string;
  range_k: [number, number];
  sources: string[];
  enthalpy_of_formation_j_per_mol: number;
  entropy_j_per_mol_k: number;
  u_gibbs_j_per_mol: number;
}
export interface SpeciesAnswer {
  ok: true;
  species: SpeciesMatch[];
  /** A formula of the library that is near, where nothing matches. */
  near: string | null;
}

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
export function species(text: string): SpeciesAnswer;
export function affinities(problem: BareProblem): AffinitiesAnswer;
export function rest(problem: BareProblem): RestAnswer;
export function version(): Version;
/** Lets go of a running or dead engine; the next start makes a new one. */
export function reset(): void;
export function initSync(source: { module: WebAssembly.Module | BufferSource }): unknown;
export default function initialise(source: {
  module_or_path: WebAssembly.Module | BufferSource | Response | string;
}): Promise<unknown>;
