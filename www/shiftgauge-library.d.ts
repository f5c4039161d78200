/** The library and a user's own book, as the border carries them; re-exported by `shiftgauge.d.ts`. */

import type { Problem } from './shiftgauge.js';

export interface SpeciesMatch {
  species: string;
  formula: string;
  phase: 'g' | 'l' | 's' | 'aq';
  form: string | null;
  names: string[];
  cas: string;
  found_by: 'formula' | 'atoms' | 'name' | 'start' | 'near';
  own: boolean;
  /** Whether the phase is likely at the temperature asked about, or at 25 °C. */
  likely: boolean;
  range_k: [number, number];
  /** How far the temperature asked about lies outside the range. */
  outside_by_k: number | null;
  sources: string[];
  enthalpy_of_formation_j_per_mol: number;
  entropy_j_per_mol_k: number;
  u_gibbs_j_per_mol: number;
  u_from: UncertaintyKind;
  measured: MeasuredEquilibrium | null;
}

/** How the uncertainty of a record was got. */
export type UncertaintyKind = 'element' | 'atct' | 'codata' | 'sources' | 'class' | 'measured' | 'own';

export interface MeasuredEquilibrium {
  equation: string;
  log10_k: number;
  u_log10_k: number;
  range_k: [number, number];
  source: string;
}

export interface SpeciesAnswer {
  ok: true;
  /** The likeliest first. */
  species: SpeciesMatch[];
  /** What may have been meant, where nothing matches. */
  near: string | null;
}

/** What is asked about beside a text. */
export interface Asked {
  temperature?: string | null;
  book?: Book | null;
}

/** One temperature of a sheet; H° counts from the elements at 298.15 K. */
export interface SheetPoint {
  temperature_k: number;
  heat_capacity_j_per_mol_k: number;
  enthalpy_j_per_mol: number;
  entropy_j_per_mol_k: number;
  gibbs_j_per_mol: number;
  outside_by_k: number | null;
}

export interface Sheet extends SpeciesMatch {
  molar_mass_kg_per_mol: number | null;
  gibbs_of_formation_j_per_mol: number | null;
  heat_capacity_j_per_mol_k: number;
  joints_k: number[];
  transitions: { temperature_k: number; enthalpy_j_per_mol: number }[];
  /** The library's record less the user's own, where that stands in its place. */
  instead_of: {
    enthalpy_j_per_mol: number;
    entropy_j_per_mol_k: number;
    gibbs_j_per_mol: number;
    u_gibbs_j_per_mol: number;
    sources: string[];
  } | null;
  curve: {
    temperature_k: number[];
    heat_capacity_j_per_mol_k: number[];
    enthalpy_j_per_mol: number[];
    entropy_j_per_mol_k: number[];
    gibbs_j_per_mol: number[];
  };
  at: SheetPoint;
  equilibrium: MeasuredEquilibrium | null;
}
export type SheetAnswer = { ok: true; sheet: Sheet } | { ok: false; problems: Problem[] };

/** A species of a book; every quantity is text. */
export interface OwnSpecies {
  species: string;
  names?: string;
  cas?: string;
  enthalpy?: string | null;
  gibbs?: string | null;
  entropy?: string | null;
  heat_capacity: OwnHeat[];
  source: string;
  [other: string]: unknown;
}

/** A range of Cp = Σ c Tᵏ in J/(mol K), with a transition at its lower end where one is passed. */
export interface OwnHeat {
  from: string;
  to: string;
  terms: Record<string, string>;
  transition?: string | null;
}

export interface OwnConstant {
  equation: string;
  constant: Record<string, unknown>;
  source: string;
  [other: string]: unknown;
}

/** What a user keeps of their own: by itself as a file, and inside a case. */
export interface Book {
  format?: string;
  title?: string;
  species?: OwnSpecies[];
  constants?: OwnConstant[];
}
export type BookAnswer =
  | {
      ok: true;
      format: string;
      species: SpeciesMatch[];
      constants: { equation: string; from: 'value' | 'points' | 'formula'; source: string }[];
    }
  | { ok: false; problems: Problem[] };
