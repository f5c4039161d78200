//! Equilibria that were measured directly, which tie a species to others.

use std::sync::OnceLock;

use super::polynomial::Piece;
use super::polynomial::holding;
use super::read::number;
use super::read::read_pieces;
use super::record::Record;
use super::table;
use super::temperature::Temperature;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Phase;

const LN_10: f64 = std::f64::consts::LN_10;

/// An equilibrium constant measured over a range of temperature: a solubility, an acid constant, a
/// Henry's constant, a complex.
///
/// One of its species is *tied*: in a reaction that goes through the equilibrium, G° of the tied
/// species is not its own record's but follows from the measured K and the other species. So the
/// rounding of single species' Δ_fG° does not enter, ions on both sides cancel exactly, and sums of
/// reactions stay consistent.
///
/// ```
/// use shiftgauge::library::{self, Temperature};
/// let water = library::measured("OH^-.aq").unwrap(); // H2O = H+ + OH−
/// let log10_k = water.ln_k(Temperature::standard()) / std::f64::consts::LN_10;
/// assert!((log10_k + 13.995).abs() < 0.01); // IAPWS R11-07
/// ```
#[derive(Debug, Clone, PartialEq)]
pub struct Measured {
    /// The id of the tied species.
    pub tied: &'static str,
    /// The equilibrium: records with their stoichiometric numbers, the tied one among them.
    pub terms: Vec<(&'static Record, f64)>,
    /// log10 K at 298.15 K, p° = 1 bar, m° = 1 mol/kg.
    pub log10_k: f64,
    /// The standard uncertainty of log10 K at 298.15 K.
    pub u_log10_k: f64,
    /// The id of the source.
    pub source: &'static str,
    /// The lowest and the highest temperature of the measurements in K.
    pub range_k: (f64, f64),
    /// −ln K as the G°/RT of pieces over all temperatures: the ends have constant ΔC°p.
    pub(super) pieces: Vec<Piece>,
}

impl Measured {
    /// ln K of the equilibrium at T; outside [`Measured::range_k`] carried on with constant ΔC°p.
    #[must_use]
    pub fn ln_k(&self, at: Temperature) -> f64 {
        holding(&self.pieces, at.kelvin()).map_or(0.0, |sum| -sum.gibbs(at))
    }

    /// The standard uncertainty of Δ_rG° in J/mol: u(log10 K) · R · 298.15 K · ln 10.
    #[must_use]
    pub fn u_gibbs_j_per_mol(&self) -> f64 {
        self.u_log10_k * GAS_CONSTANT_J_PER_MOL_K * Temperature::standard().kelvin() * LN_10
    }

    /// The equilibrium as an equation, such as `CaCO3(s, calcite) = Ca^2+(aq) + CO3^2-(aq)`.
    #[must_use]
    pub fn equation(&self) -> String {
        let side = |sign: f64| {
            let terms = self.terms.iter().filter(|(_, nu)| nu * sign > 0.0);
            let written = terms.map(|(record, nu)| match nu.abs() {
                1.0 => record.label(),
                number => format!("{number} {}", record.label()),
            });
            written.collect::<Vec<_>>().join(" + ")
        };
        format!("{} = {}", side(-1.0), side(1.0))
    }

    /// The stoichiometric number of a species in the equilibrium; zero if it takes no part.
    pub(super) fn nu(&self, id: &str) -> f64 {
        self.terms.iter().find(|(record, _)| record.id == id).map_or(0.0, |(_, nu)| *nu)
    }

    /// Whether it holds for a reaction: always for a dissolved species; for a solid or a liquid
    /// where the reaction knows another dissolved species of it, or another part of the same liquid.
    pub(super) fn ties<'a>(&self, mut others: impl Iterator<Item = &'a Record>) -> bool {
        let tied = self.terms.iter().find(|(record, _)| record.id == self.tied);
        let of_solution = |phase: Phase| matches!(phase, Phase::Aqueous | Phase::Liquid);
        tied.is_some_and(|(record, _)| record.phase == Phase::Aqueous)
            || others.any(|one| {
                let is_other = one.id != self.tied && self.nu(&one.id) != 0.0;
                is_other && of_solution(one.phase) && one.formula != "H2O"
            })
    }

    /// Reads the lines of one tied species; none if one is broken.
    fn read(lines: impl Iterator<Item = &'static str> + Clone) -> Option<Measured> {
        let first: Vec<&'static str> = lines.clone().next()?.split('\t').collect();
        let [tied, terms, .., log10_k, u_log10_k, source] = first[..] else { return None };
        let (range_k, pieces) = read_pieces(lines.map(|line| line.split('\t').skip(2)))?;
        let words: Vec<&str> = terms.split(' ').collect();
        let term = |pair: &[&str]| {
            let [nu, id] = *pair else { return None };
            Some((table::record(id)?, number(nu)?))
        };
        Some(Measured {
            tied,
            terms: words.chunks(2).map(term).collect::<Option<_>>()?,
            log10_k: number(log10_k)?,
            u_log10_k: number(u_log10_k)?,
            source,
            range_k,
            pieces,
        })
    }
}

/// The measured equilibrium that a species is tied by, if it is.
#[must_use]
pub fn measured(id: &str) -> Option<&'static Measured> {
    let place = all().binary_search_by(|(tied, _)| (*tied).cmp(id)).ok()?;
    read_once(&all()[place])
}

/// Every measured equilibrium, in the order of the table.
pub fn all_measured() -> impl Iterator<Item = &'static Measured> {
    all().iter().filter_map(read_once)
}

/// A tied species, and its equilibrium once it is read: one reads the records of all its species.
type Tie = (&'static str, OnceLock<Option<Measured>>);

fn read_once((tied, measured): &'static Tie) -> Option<&'static Measured> {
    measured.get_or_init(|| Measured::read(table::measured(tied))).as_ref()
}

/// The ties, sorted by the species.
fn all() -> &'static [Tie] {
    static ALL: OnceLock<Vec<Tie>> = OnceLock::new();
    ALL.get_or_init(|| table::tied().map(|tied| (tied, OnceLock::new())).collect())
}
