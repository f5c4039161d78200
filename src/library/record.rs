//! What is known of one species, and its properties at a temperature.

use std::borrow::Cow;

use super::element::elements_entropy_j_per_mol_k;
use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::holding;
use super::table::citation;
use super::temperature::Temperature;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Phase;
use crate::reaction::parse_formula;

/// Whether a property at T rests on the record's data or on constant heat capacity beyond them.
#[derive(Debug, Clone, Copy, PartialEq)]
pub enum Reach {
    /// T is inside the record's range.
    InRange,
    /// T is outside; C°p is held at its value at the nearest end.
    Extrapolated {
        /// The distance to the nearest end in K, positive.
        by_k: f64,
    },
}

/// How the uncertainty of a record's Δ_fG°(298.15 K) was got.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub enum UncertaintyKind {
    /// The reference state of an element: zero by definition.
    Element,
    /// The Active Thermochemical Tables' 95 % half-width, halved.
    Atct,
    /// The CODATA key values' 95 % half-width, halved.
    Codata,
    /// Half the difference of two sources.
    Sources,
    /// A class: judged, for want of better.
    Class,
    /// That of a measured equilibrium and of the species that it ties this one to.
    Measured,
    /// Stated by the user with a record of their own.
    Own,
}

impl UncertaintyKind {
    pub(super) const WORDS: [(&'static str, UncertaintyKind); 7] = [
        ("element", UncertaintyKind::Element),
        ("atct", UncertaintyKind::Atct),
        ("codata", UncertaintyKind::Codata),
        ("sources", UncertaintyKind::Sources),
        ("class", UncertaintyKind::Class),
        ("measured", UncertaintyKind::Measured),
        ("own", UncertaintyKind::Own),
    ];

    /// The word of the tables and of the border: `element`, `atct`, `codata`, `sources`, `class`,
    /// `measured` or `own`.
    #[must_use]
    pub fn as_str(self) -> &'static str {
        Self::WORDS.iter().find(|(_, kind)| *kind == self).map_or("", |(word, _)| word)
    }
}

/// A change of phase or of form inside one record's range.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Transition {
    /// Where it is passed, in K.
    pub temperature_k: f64,
    /// Its enthalpy in J/mol, positive on heating.
    pub enthalpy_j_per_mol: f64,
}

/// A step of H° at a joint is a transition from this size on, J/mol: what rounding leaves is a
/// thousand times less, the smallest transition of the tables ten times more.
const TRANSITION_FROM_J_PER_MOL: f64 = 1.0;

/// Standard molar properties at one temperature, p° = 1 bar.
///
/// The zero of enthalpy: the elements in their reference states at 298.15 K, so that H°(298.15 K)
/// is Δ_fH°(298.15 K); G° = H° − T S°.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Properties {
    /// C°p in J/(mol K).
    pub heat_capacity_j_per_mol_k: f64,
    /// H° in J/mol.
    pub enthalpy_j_per_mol: f64,
    /// S° in J/(mol K).
    pub entropy_j_per_mol_k: f64,
    /// G° in J/mol.
    pub gibbs_j_per_mol: f64,
    /// Whether T is inside the record's range.
    pub reach: Reach,
}

/// One species in one phase and form: its names, its figures, and where they come from.
#[derive(Debug, Clone, PartialEq)]
pub struct Record {
    /// The row's name in the tables, such as `S.s.rhombic`.
    pub id: Cow<'static, str>,
    /// The formula as the trade writes it, such as `Ca(OH)2`.
    pub formula: Cow<'static, str>,
    /// The phase.
    pub phase: Phase,
    /// The polymorph or isomer, where the formula and the phase do not tell.
    pub form: Option<Cow<'static, str>>,
    /// English names, the most usual first.
    pub names: Vec<Cow<'static, str>>,
    /// The CAS registry number.
    pub cas: Cow<'static, str>,
    /// Δ_fH°(298.15 K) in J/mol, as in the table.
    pub formation_enthalpy_j_per_mol: f64,
    /// S°(298.15 K) in J/(mol K), as in the table.
    pub standard_entropy_j_per_mol_k: f64,
    /// The standard uncertainty of Δ_fG°(298.15 K) in J/mol.
    pub u_gibbs_j_per_mol: f64,
    /// How that uncertainty was got.
    pub u_kind: UncertaintyKind,
    /// The ids of the sources, or for a user's own record the source in words;
    /// [`Record::citations`] gives them in full.
    pub sources: Vec<Cow<'static, str>>,
    /// The lowest and the highest temperature of the data in K.
    pub range_k: (f64, f64),
    /// Pieces over all temperatures: the ends are constant heat capacity.
    pub(super) pieces: Vec<Piece>,
}

impl Record {
    /// Standard molar properties at T.
    ///
    /// H° = RT·(H/RT), and so on, from the piece that holds at T; at a transition that of the
    /// upper phase. Outside [`Record::range_k`] C°p is constant, and `reach` says so.
    ///
    /// ```
    /// use shiftgauge::library::{self, Temperature};
    /// use shiftgauge::reaction::Phase;
    /// let so2 = library::one("SO2", Some(Phase::Gas), None).unwrap();
    /// let at = so2.properties(Temperature::standard());
    /// assert!((at.enthalpy_j_per_mol + 296_835.0).abs() < 1.0); // NASA TM-4513
    /// ```
    #[must_use]
    pub fn properties(&self, at: Temperature) -> Properties {
        let polynomial = self.polynomial(at);
        let rt = GAS_CONSTANT_J_PER_MOL_K * at.kelvin();
        Properties {
            heat_capacity_j_per_mol_k: GAS_CONSTANT_J_PER_MOL_K * polynomial.heat_capacity(at),
            enthalpy_j_per_mol: rt * polynomial.enthalpy(at),
            entropy_j_per_mol_k: GAS_CONSTANT_J_PER_MOL_K * polynomial.entropy(at),
            gibbs_j_per_mol: rt * polynomial.gibbs(at),
            reach: self.reach(at),
        }
    }

    /// G°/RT at T, without the rest.
    #[must_use]
    pub fn gibbs_over_rt(&self, at: Temperature) -> f64 {
        self.polynomial(at).gibbs(at)
    }

    /// Δ_fG°(298.15 K) in J/mol = Δ_fH° − T (S° − Σ S° of the elements); none where the library lacks an
    /// element's reference state.
    #[must_use]
    pub fn formation_gibbs_j_per_mol(&self) -> Option<f64> {
        let formula = parse_formula(&self.formula).ok()?;
        let elements = elements_entropy_j_per_mol_k(&formula).ok()?;
        let formed = self.standard_entropy_j_per_mol_k - elements;
        Some(self.formation_enthalpy_j_per_mol - Temperature::standard().kelvin() * formed)
    }

    /// Whether T is inside the record's range, and how far outside.
    #[must_use]
    pub fn reach(&self, at: Temperature) -> Reach {
        let outside = (self.range_k.0 - at.kelvin()).max(at.kelvin() - self.range_k.1);
        if outside > 0.0 { Reach::Extrapolated { by_k: outside } } else { Reach::InRange }
    }

    /// The sources in full.
    pub fn citations(&self) -> impl Iterator<Item = Cow<'static, str>> + '_ {
        let own = self.u_kind == UncertaintyKind::Own;
        self.sources.iter().filter_map(move |id| {
            if own { Some(id.clone()) } else { citation(id).map(Cow::Borrowed) }
        })
    }

    /// Whether a user made it.
    #[must_use]
    pub fn is_own(&self) -> bool {
        self.u_kind == UncertaintyKind::Own
    }

    /// Whether another record is of the same formula in the same phase and form.
    #[must_use]
    pub fn stands_for(&self, other: &Record) -> bool {
        (&self.formula, self.phase, &self.form) == (&other.formula, other.phase, &other.form)
    }

    /// The species as an equation may name it, such as `S(s, rhombic)`.
    #[must_use]
    pub fn label(&self) -> String {
        let (formula, phase) = (&self.formula, self.phase.symbol());
        self.form.as_ref().map_or_else(
            || format!("{formula}({phase})"),
            |form| format!("{formula}({phase}, {form})"),
        )
    }

    /// The temperatures where one range of the data meets the next, in K.
    ///
    /// H° and S° are continuous there unless a phase transition is passed, where G° alone is.
    #[must_use]
    pub fn joints_k(&self) -> Vec<f64> {
        let inside = |k: &f64| *k > self.range_k.0 && *k < self.range_k.1;
        self.pieces.iter().map(|piece| piece.from_k).filter(inside).collect()
    }

    /// The transitions inside the range, from the lowest on.
    ///
    /// ```
    /// use shiftgauge::library;
    /// let iron = &library::find("Fe", Some(shiftgauge::reaction::Phase::Solid), None)[0];
    /// let first = iron.transitions()[0]; // alpha to gamma, 900 J/mol at 1184 K in the JANAF tables
    /// assert!((first.temperature_k - 1184.0).abs() < 1.0 && first.enthalpy_j_per_mol > 800.0);
    /// ```
    #[must_use]
    pub fn transitions(&self) -> Vec<Transition> {
        let pairs = self.pieces.iter().zip(self.pieces.iter().skip(1));
        let found = pairs.filter_map(|(lower, upper)| {
            let at = Temperature::new(upper.from_k).ok()?;
            let step = upper.polynomial.enthalpy(at) - lower.polynomial.enthalpy(at);
            let enthalpy_j_per_mol = GAS_CONSTANT_J_PER_MOL_K * at.kelvin() * step;
            (enthalpy_j_per_mol.abs() >= TRANSITION_FROM_J_PER_MOL)
                .then_some(Transition { temperature_k: at.kelvin(), enthalpy_j_per_mol })
        });
        found.collect()
    }

    fn polynomial(&self, at: Temperature) -> Polynomial {
        holding(&self.pieces, at.kelvin()).copied().unwrap_or_default()
    }
}
