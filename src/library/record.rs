//! What is known of one species, and its properties at a temperature.

use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::holding;
use super::table::citation;
use super::temperature::TEMPERATURE_LIMITS_K;
use super::temperature::Temperature;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Phase;

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
}

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
    pub id: &'static str,
    /// The formula as the trade writes it, such as `Ca(OH)2`.
    pub formula: &'static str,
    /// The phase.
    pub phase: Phase,
    /// The polymorph or isomer, where the formula and the phase do not tell.
    pub form: Option<&'static str>,
    /// English names, the most usual first.
    pub names: Vec<&'static str>,
    /// The CAS registry number.
    pub cas: &'static str,
    /// Δ_fH°(298.15 K) in J/mol, as in the table.
    pub formation_enthalpy_j_per_mol: f64,
    /// S°(298.15 K) in J/(mol K), as in the table.
    pub standard_entropy_j_per_mol_k: f64,
    /// The standard uncertainty of Δ_fG°(298.15 K) in J/mol.
    pub u_gibbs_j_per_mol: f64,
    /// How that uncertainty was got.
    pub u_kind: UncertaintyKind,
    /// The ids of the sources; [`Record::citations`] gives them in full.
    pub sources: Vec<&'static str>,
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

    /// Whether T is inside the record's range, and how far outside.
    #[must_use]
    pub fn reach(&self, at: Temperature) -> Reach {
        let outside = (self.range_k.0 - at.kelvin()).max(at.kelvin() - self.range_k.1);
        if outside > 0.0 { Reach::Extrapolated { by_k: outside } } else { Reach::InRange }
    }

    /// The sources in full.
    pub fn citations(&self) -> impl Iterator<Item = &'static str> + '_ {
        self.sources.iter().filter_map(|id| citation(id))
    }

    /// The species as an equation may name it, such as `S(s, rhombic)`.
    #[must_use]
    pub fn label(&self) -> String {
        let (formula, phase) = (self.formula, self.phase.symbol());
        self.form.map_or_else(
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

    fn polynomial(&self, at: Temperature) -> Polynomial {
        holding(&self.pieces, at.kelvin()).copied().unwrap_or_default()
    }

    /// Reads a line of the species table and its lines of the heat table; none if one is broken.
    pub(super) fn read(
        line: &'static str,
        heat: impl Iterator<Item = &'static str>,
    ) -> Option<Record> {
        let cells: Vec<&'static str> = line.split('\t').collect();
        let [id, formula, phase, form, names, cas, enthalpy, entropy, u, kind, sources] = cells[..]
        else {
            return None;
        };
        let (range_k, pieces) = read_pieces(heat)?;
        Some(Record {
            id,
            formula,
            phase: Phase::from_symbol(phase)?,
            form: Some(form).filter(|text| !text.is_empty()),
            names: names.split(';').collect(),
            cas,
            formation_enthalpy_j_per_mol: 1000.0 * number(enthalpy)?,
            standard_entropy_j_per_mol_k: number(entropy)?,
            u_gibbs_j_per_mol: 1000.0 * number(u)?,
            u_kind: match kind {
                "element" => UncertaintyKind::Element,
                "atct" => UncertaintyKind::Atct,
                "codata" => UncertaintyKind::Codata,
                "sources" => UncertaintyKind::Sources,
                "class" => UncertaintyKind::Class,
                _ => return None,
            },
            sources: sources.split(';').collect(),
            range_k,
            pieces,
        })
    }
}

/// The range and the pieces of a species, with one of constant heat capacity at either end.
fn read_pieces(heat: impl Iterator<Item = &'static str>) -> Option<((f64, f64), Vec<Piece>)> {
    let mut pieces: Vec<Piece> = Vec::with_capacity(4);
    let mut end_k = None;
    for line in heat {
        let mut figures = [0.0; 11];
        let mut cells = line.split('\t').skip(1);
        for figure in &mut figures {
            *figure = number(cells.next()?)?;
        }
        let [low, high, a @ .., b_enthalpy, b_entropy] = figures;
        let in_order =
            low > TEMPERATURE_LIMITS_K.0 && high >= low && end_k.is_none_or(|k| k == low);
        if !in_order {
            return None;
        }
        end_k = Some(high);
        let polynomial = Polynomial { a, b_enthalpy, b_entropy };
        pieces.push(Piece { from_k: low, polynomial });
    }
    let (first, last) = (*pieces.first()?, *pieces.last()?);
    let (low_k, high_k) = (first.from_k, end_k?);
    let below = first.polynomial.continued_from(Temperature::new(low_k).ok()?);
    let above = last.polynomial.continued_from(Temperature::new(high_k).ok()?);
    pieces.insert(0, Piece { from_k: 0.0, polynomial: below });
    pieces.push(Piece { from_k: high_k, polynomial: above });
    Some(((low_k, high_k), pieces))
}

fn number(cell: &str) -> Option<f64> {
    cell.parse().ok().filter(|value: &f64| value.is_finite())
}
