//! The part of the report that tells the verdict and what the tolerances make of it.

use serde::Serialize;

/// The verdict on one reaction, with its uncertainty; u_… is a standard uncertainty.
#[derive(Debug, Clone, Serialize)]
pub struct JudgementReport {
    /// `forward`, `reverse`, `at rest` or `cannot tell`; null where there is no reading.
    pub verdict: Option<&'static str>,
    /// The direction that the values point to, tolerances aside.
    pub leaning: Option<&'static str>,
    /// The verdict in one sentence.
    pub why: String,
    /// Of ln Q; null where Q is not finite.
    pub u_ln_q: Option<f64>,
    /// Of A/RT.
    pub u_affinity_over_rt: Option<f64>,
    /// Of ΔG.
    pub u_gibbs_j_per_mol: Option<f64>,
    /// Of T*, where there is one, and so of T − T* without T's own.
    pub u_approach_k: Option<f64>,
    /// The 95 % interval of A/RT over all bounds; an end that is null is open.
    pub affinity_interval_over_rt: Option<[Option<f64>; 2]>,
    /// The 95 % interval of T − T*.
    pub approach_interval_k: Option<[Option<f64>; 2]>,
    /// How near to rest counts as at rest.
    pub band: Option<BandReport>,
    /// The extent to rest as a share of the whole range of the extent.
    pub missing_conversion: Option<f64>,
    /// Of the missing conversion.
    pub u_missing_conversion: Option<f64>,
    /// The 95 % interval of the missing conversion.
    pub missing_conversion_interval: Option<[Option<f64>; 2]>,
    /// What each input does to A/RT, the largest share first.
    pub budget: Vec<BudgetRow>,
    /// Whether the figures change in proportion to the inputs within their tolerances.
    pub linear: bool,
    /// What to measure better, where the verdict cannot be told.
    pub better: Vec<BetterRow>,
}

/// The band of the verdict.
#[derive(Debug, Clone, Copy, Serialize)]
#[serde(tag = "kind", rename_all = "lowercase")]
pub enum BandReport {
    /// On T − T*.
    Temperature {
        /// The half-width.
        half_width_k: f64,
    },
    /// On the missing conversion.
    Conversion {
        /// The half-width, a share.
        half_width: f64,
    },
}

/// What one input does.
#[derive(Debug, Clone, Serialize)]
pub struct BudgetRow {
    /// The input's field; empty for data of the library or of a line.
    pub input: String,
    /// What it is called in the middle of a sentence.
    pub name: String,
    /// Its share of the variance of A/RT, 0 to 1.
    pub share_of_variance: f64,
    /// The change of A/RT for one standard uncertainty of the input.
    pub affinity_over_rt: f64,
    /// The change of T − T* for it.
    pub approach_k: Option<f64>,
}

/// What would settle the verdict.
#[derive(Debug, Clone, Serialize)]
pub struct BetterRow {
    /// The input's field; empty for data of the library or of a line.
    pub input: String,
    /// What it is called in the middle of a sentence.
    pub name: String,
    /// What is needed, as a sentence.
    pub text: String,
}
