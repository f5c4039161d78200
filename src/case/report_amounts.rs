//! The part of the report that tells amounts: now, at rest, behind a feed, and along the extent.

use serde::Serialize;

/// A species now and at rest.
#[derive(Debug, Clone, Serialize)]
pub struct SpeciesReport {
    /// The species with its phase.
    pub species: String,
    /// `g`, `l`, `s` or `aq`.
    pub phase: &'static str,
    /// Its stoichiometric number, zero for an inert.
    pub nu: f64,
    /// The amount now; null for an ample phase.
    pub now_mol: Option<f64>,
    /// The amount at rest; null for an ample phase, or where nothing was solved.
    pub rest_mol: Option<f64>,
    /// ln of the amount at rest, also where the amount itself underflows.
    pub rest_ln_mol: Option<f64>,
    /// Rest minus now.
    pub change_mol: Option<f64>,
    /// The fraction of its phase now.
    pub now_fraction: Option<f64>,
    /// The fraction of its phase at rest.
    pub rest_fraction: Option<f64>,
    /// The molality now, for a solute.
    pub now_mol_per_kg: Option<f64>,
    /// The molality at rest, for a solute.
    pub rest_mol_per_kg: Option<f64>,
    /// ln of the activity now.
    pub now_ln_activity: Option<f64>,
    /// ln of the activity at rest.
    pub rest_ln_activity: Option<f64>,
    /// φ or γ: 1 for an ideal mixture.
    pub activity_coefficient: f64,
    /// The partial pressure now, for a gas.
    pub partial_pressure_pa: Option<f64>,
    /// Whether it is used up at rest.
    pub exhausted: bool,
}

/// How the state of rest was found.
#[derive(Debug, Clone, Serialize)]
pub struct RestReport {
    /// Its temperature.
    pub temperature_k: f64,
    /// Its pressure.
    pub pressure_pa: Option<f64>,
    /// Its volume.
    pub volume_m3: Option<f64>,
    /// How the search ended.
    pub outcome: &'static str,
    /// The steps it took.
    pub iterations: u32,
    /// The affinity over RT that is left; zero at an exhausted phase.
    pub residual: f64,
}

/// How much of a reactant is converted.
#[derive(Debug, Clone, Serialize)]
pub struct Conversion {
    /// The reactant.
    pub species: String,
    /// From the feed to now; null without a feed.
    pub feed_to_now: Option<f64>,
    /// From now to rest.
    pub now_to_rest: Option<f64>,
    /// From the feed to rest; null without a feed.
    pub feed_to_rest: Option<f64>,
}

/// The entry that was found from K.
#[derive(Debug, Clone, Serialize)]
pub struct MissingReport {
    /// The species.
    pub species: String,
    /// A fraction of the gas as analysed, or an amount in mol like those of the other lines.
    pub value: f64,
    /// Whether the value is a fraction.
    pub is_fraction: bool,
    /// Its standard uncertainty.
    pub u_value: f64,
}

/// The gas behind a feed, by the balance of the elements.
#[derive(Debug, Clone, Serialize)]
pub struct BalanceReport {
    /// By what share the gas shrinks from the feed to the reading; negative where it grows.
    pub contraction: f64,
    /// The largest difference of an element, as a share of what is fed.
    pub closes_within: f64,
    /// One for each element that balances in the gas.
    pub elements: Vec<ElementReport>,
    /// What the analysis does not show and the balance found.
    pub restored: Vec<RestoredReport>,
}

/// One element in the feed and behind it.
#[derive(Debug, Clone, Serialize)]
pub struct ElementReport {
    /// Its symbol.
    pub element: &'static str,
    /// Atoms of it in the feed, mol on the feed's basis.
    pub feed_mol: f64,
    /// Atoms of it behind, mol on the feed's basis.
    pub reading_mol: f64,
}

/// A species that the balance found.
#[derive(Debug, Clone, Serialize)]
pub struct RestoredReport {
    /// The species with its phase.
    pub species: String,
    /// Its fraction of the wet gas.
    pub fraction: f64,
}

/// The energy along the extent, from one limit to the other.
#[derive(Debug, Clone, Serialize)]
pub struct ValleyReport {
    /// `G` at constant pressure, `A` (Helmholtz energy) at constant volume.
    pub energy: &'static str,
    /// Where the mixture is now; always zero.
    pub extent_now_mol: f64,
    /// The left end of the drawing.
    pub extent_min_mol: f64,
    /// The right end of the drawing.
    pub extent_max_mol: f64,
    /// What runs out at each end.
    pub limits: Vec<Limit>,
    /// Extents on the basis, rising.
    pub extent_mol: Vec<f64>,
    /// The energy above its lowest value, over RT, on the same basis.
    pub gibbs_over_rt: Vec<f64>,
    /// A closer look around now and rest, where they are near each other.
    pub near: Option<CurveReport>,
}

/// Points of a curve.
#[derive(Debug, Clone, Serialize)]
pub struct CurveReport {
    /// Extents on the basis, rising.
    pub extent_mol: Vec<f64>,
    /// The energy above its value at rest, over RT.
    pub gibbs_over_rt: Vec<f64>,
}

impl From<crate::advice::Curve> for CurveReport {
    fn from(curve: crate::advice::Curve) -> Self {
        Self { extent_mol: curve.extent_mol, gibbs_over_rt: curve.energy_over_rt }
    }
}

/// One end of the extent.
#[derive(Debug, Clone, Serialize)]
pub struct Limit {
    /// `min` or `max`.
    pub side: &'static str,
    /// What runs out there.
    pub species: Vec<String>,
}

/// How far a solution is from being saturated with a solid.
#[derive(Debug, Clone, Serialize)]
pub struct SaturationReport {
    /// The solid.
    pub species: String,
    /// log10(Q/K) of dissolving one of it: above zero it may precipitate, below it dissolves.
    pub saturation_index: f64,
}

/// The charges of a solution as read.
#[derive(Debug, Clone, Copy, Serialize)]
pub struct ChargeReport {
    /// Σ z m of the cations.
    pub positive_eq_per_kg: f64,
    /// Σ |z| m of the anions.
    pub negative_eq_per_kg: f64,
    /// The first less the second.
    pub difference: f64,
}
