//! A user's own record, made of what they know of a species, or refused with reasons.

use super::element::elements_entropy_j_per_mol_k;
use super::polynomial::Piece;
use super::polynomial::Polynomial;
use super::polynomial::with_ends;
use super::record::Record;
use super::record::UncertaintyKind;
use super::temperature::Temperature;
use crate::problem::LibraryCode;
use crate::problem::Outcome;
use crate::problem::Problem;
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;
use crate::reaction::Phase;
use crate::reaction::Species;

/// The heat capacity over one range of temperature, C°p = Σ cₖ Tᵏ.
#[derive(Debug, Clone, PartialEq)]
pub struct OwnHeat {
    /// Where it starts, in K.
    pub low_k: f64,
    /// Where it ends, in K.
    pub high_k: f64,
    /// The coefficients of T⁻² to T⁴, in J/(mol K) times the power of K.
    pub terms: [f64; 7],
    /// The enthalpy of a transition at `low_k`, in J/mol; zero where none is passed.
    pub transition_j_per_mol: f64,
}

/// What a user knows of a species, p° = 1 bar.
#[derive(Debug, Clone, PartialEq)]
pub struct OwnFigures {
    /// The species, with its phase.
    pub species: Species,
    /// Its names.
    pub names: Vec<String>,
    /// Its CAS number; empty if none is given.
    pub cas: String,
    /// Δ_fH°(298.15 K) in J/mol.
    pub enthalpy_j_per_mol: Option<f64>,
    /// Δ_fG°(298.15 K) in J/mol.
    pub gibbs_j_per_mol: Option<f64>,
    /// S°(298.15 K) in J/(mol K).
    pub entropy_j_per_mol_k: Option<f64>,
    /// Heat capacities, from the lowest range on.
    pub heat: Vec<OwnHeat>,
    /// The standard uncertainty of Δ_fG°(298.15 K) in J/mol.
    pub u_gibbs_j_per_mol: f64,
    /// Where the figures come from, in words.
    pub source: String,
}

/// Δ_fG° as stated and as it follows from Δ_fH° and S° may differ by this, in J/mol: handbooks round
/// each to 0.1 kJ/mol and take elements from other tables. Common practice, no source.
pub const FIGURES_AGREE_J_PER_MOL: f64 = 500.0;
/// C°p may step by this share where one range meets the next without a transition.
pub const HEAT_STEP: f64 = 0.1;
/// C°p is looked at in so many places of a range.
const LOOKED_AT: u32 = 64;

impl Record {
    /// Makes a record of a user's figures.
    ///
    /// Two of Δ_fH°, S° and Δ_fG° at 298.15 K give the third: Δ_fG° = Δ_fH° − T (S° − Σ S° of the
    /// elements). H° and S° are carried from there over the ranges of C°p, which must hold 298.15 K.
    ///
    /// # Errors
    /// All that is wrong, each with the field's name: fewer than two figures, or three that disagree
    /// by more than [`FIGURES_AGREE_J_PER_MOL`]; S° not above zero, or C°p not above zero somewhere,
    /// unless dissolved; no heat capacity, ranges that do not follow one another or miss 298.15 K;
    /// C°p that steps by more than [`HEAT_STEP`] without a transition; an element whose reference
    /// state the library lacks where Δ_fG° is to give Δ_fH°.
    pub fn own(figures: OwnFigures) -> Outcome<Record> {
        let mut problems = heat_problems(&figures);
        let standard = standard_figures(&figures);
        let is_solute = figures.species.phase == Some(Phase::Aqueous);
        if let Ok((_, entropy)) = standard {
            if entropy <= 0.0 && !is_solute {
                let problem = Problem::new(LibraryCode::OwnEntropy);
                problems.push(problem.with("found", format!("{entropy:.3}")).at("entropy"));
            }
        }
        let pieces = if problems.is_empty() {
            standard.as_ref().ok().and_then(|of| joined(&figures.heat, *of))
        } else {
            None
        };
        let (enthalpy, entropy) = match standard {
            Ok(figures) => figures,
            Err(found) => {
                problems.extend(found);
                return Err(problems);
            }
        };
        let (Some((pieces, range_k)), true) = (pieces, problems.is_empty()) else {
            return Err(problems);
        };
        let OwnFigures { species, names, cas, u_gibbs_j_per_mol, source, .. } = figures;
        let phase = species.phase.unwrap_or(Phase::Gas);
        let formula = species.formula.text().to_owned();
        let id = [Some(formula.as_str()), Some(phase.symbol()), species.form.as_deref()];
        Ok(Record {
            id: id.into_iter().flatten().collect::<Vec<_>>().join(".").into(),
            formula: formula.into(),
            phase,
            form: species.form.map(Into::into),
            names: names.into_iter().map(Into::into).collect(),
            cas: cas.into(),
            formation_enthalpy_j_per_mol: enthalpy,
            standard_entropy_j_per_mol_k: entropy,
            u_gibbs_j_per_mol,
            u_kind: UncertaintyKind::Own,
            sources: vec![source.into()],
            range_k,
            pieces,
        })
    }
}

/// Δ_fH° and S° at 298.15 K, from two of three figures.
fn standard_figures(figures: &OwnFigures) -> Outcome<(f64, f64)> {
    let t = Temperature::standard().kelvin();
    let of_elements = || {
        elements_entropy_j_per_mol_k(&figures.species.formula).map_err(|element| {
            let problem = Problem::new(LibraryCode::OwnElement).with("element", element);
            vec![problem.at("gibbs")]
        })
    };
    let OwnFigures { enthalpy_j_per_mol, gibbs_j_per_mol, entropy_j_per_mol_k, .. } = *figures;
    match (enthalpy_j_per_mol, gibbs_j_per_mol, entropy_j_per_mol_k) {
        (Some(h), None, Some(s)) => Ok((h, s)),
        (None, Some(g), Some(s)) => Ok((g + t * (s - of_elements()?), s)),
        (Some(h), Some(g), None) => Ok((h, (h - g) / t + of_elements()?)),
        (Some(h), Some(g), Some(s)) => {
            // Without the elements nothing can be compared: H and S stand as they are.
            let Ok(elements) = of_elements() else { return Ok((h, s)) };
            let follows = h - t * (s - elements);
            if (follows - g).abs() > FIGURES_AGREE_J_PER_MOL {
                return Err(Problem::new(LibraryCode::OwnDisagree)
                    .with("found", format!("{:.2}", g / 1000.0))
                    .with("follows", format!("{:.2}", follows / 1000.0))
                    .with("limit", format!("{}", FIGURES_AGREE_J_PER_MOL / 1000.0))
                    .at("gibbs")
                    .into());
            }
            Ok((h, s))
        }
        _ => Err(Problem::new(LibraryCode::OwnTooFew).at("enthalpy").into()),
    }
}

/// All that is wrong with the heat capacities.
fn heat_problems(figures: &OwnFigures) -> Vec<Problem> {
    let heat = &figures.heat;
    let mut problems = Vec::new();
    let (Some(first), Some(last)) = (heat.first(), heat.last()) else {
        return Problem::new(LibraryCode::OwnHeatMissing).at("heat_capacity").into();
    };
    let standard = Temperature::standard().kelvin();
    for (place, one) in heat.iter().enumerate() {
        let field = format!("heat_capacity[{place}]");
        let bounds = [one.low_k, one.high_k].map(Temperature::new);
        if bounds.iter().any(Result::is_err) || one.low_k >= one.high_k {
            problems.push(Problem::new(LibraryCode::OwnRange).at(&field));
        } else if figures.species.phase != Some(Phase::Aqueous) {
            let bad = (0..=LOOKED_AT).find_map(|step| {
                let share = f64::from(step) / f64::from(LOOKED_AT);
                let t = one.low_k + share * (one.high_k - one.low_k);
                (heat_at(one, t) <= 0.0).then_some(t)
            });
            problems.extend(bad.map(|t| {
                let problem = Problem::new(LibraryCode::OwnHeat);
                let problem = problem.with("found", format!("{:.3}", heat_at(one, t)));
                problem.with("temperature", format!("{t:.1}")).at(&field)
            }));
        }
    }
    for (place, pair) in heat.windows(2).enumerate() {
        let [lower, upper] = pair else { continue };
        let field = format!("heat_capacity[{}]", place + 1);
        if lower.high_k != upper.low_k {
            problems.push(
                Problem::new(LibraryCode::OwnGap)
                    .with("found", format!("{}", upper.low_k))
                    .with("wanted", format!("{}", lower.high_k))
                    .at(&field),
            );
            continue;
        }
        let (below, above) = (heat_at(lower, upper.low_k), heat_at(upper, upper.low_k));
        if upper.transition_j_per_mol == 0.0 && (above - below).abs() > HEAT_STEP * below.abs() {
            problems.push(
                Problem::new(LibraryCode::OwnJump)
                    .with("below", format!("{below:.2}"))
                    .with("above", format!("{above:.2}"))
                    .with("temperature", format!("{}", upper.low_k))
                    .with("limit", format!("{}", 100.0 * HEAT_STEP))
                    .at(&field),
            );
        }
    }
    if problems.is_empty() && !(first.low_k <= standard && standard <= last.high_k) {
        problems.push(Problem::new(LibraryCode::OwnStandard).at("heat_capacity"));
    }
    problems
}

/// C°p in J/(mol K).
fn heat_at(heat: &OwnHeat, t: f64) -> f64 {
    let x = 1.0 / t;
    let [a, b, c, d, e, f, g] = heat.terms;
    x * (a * x + b) + c + t * (d + t * (e + t * (f + t * g)))
}

/// The pieces joined so that H° and S° at 298.15 K are these and G° is continuous everywhere.
fn joined(heat: &[OwnHeat], (enthalpy, entropy): (f64, f64)) -> Option<(Vec<Piece>, (f64, f64))> {
    let r = GAS_CONSTANT_J_PER_MOL_K;
    let mut polynomials: Vec<Polynomial> = heat
        .iter()
        .map(|one| Polynomial { a: one.terms.map(|term| term / r), ..Polynomial::default() })
        .collect();
    let standard = Temperature::standard();
    let start = heat.iter().position(|one| one.high_k >= standard.kelvin())?;
    polynomials[start].meet(standard, enthalpy / (r * standard.kelvin()), entropy / r);
    for place in start + 1..heat.len() {
        let at = Temperature::new(heat[place].low_k).ok()?;
        let step = heat[place].transition_j_per_mol / (r * at.kelvin());
        let below = polynomials[place - 1];
        polynomials[place].meet(at, below.enthalpy(at) + step, below.entropy(at) + step);
    }
    for place in (0..start).rev() {
        let at = Temperature::new(heat[place].high_k).ok()?;
        let step = heat[place + 1].transition_j_per_mol / (r * at.kelvin());
        let above = polynomials[place + 1];
        polynomials[place].meet(at, above.enthalpy(at) - step, above.entropy(at) - step);
    }
    let starts = heat.iter().map(|one| one.low_k);
    let pieces = starts.zip(polynomials).map(|(from_k, polynomial)| Piece { from_k, polynomial });
    let range_k = (heat.first()?.low_k, heat.last()?.high_k);
    Some((with_ends(pieces.collect(), range_k.1)?, range_k))
}
