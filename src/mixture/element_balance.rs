//! What the feed says of the gas behind it: every element that goes in as gas comes out as gas.

use super::closing::Closing;
use super::gas::AmountBasis;
use crate::numeric::least_squares;
use crate::problem::{MixtureCode, Outcome, Problem};
use crate::reaction::{Element, Species};

/// The feed of a gas reading.
#[derive(Debug, Clone)]
pub struct Feed {
    /// The species and their amounts, wet.
    pub amounts_mol: Vec<(Species, f64)>,
    /// What the amounts stand for.
    pub basis: AmountBasis,
    /// How its fractions were closed.
    pub closing: Closing,
    /// Elements that may come from or go into a liquid or solid, so that they do not balance in the
    /// gas.
    pub open_elements: Vec<&'static str>,
}

/// A species whose amount the balance is to find.
#[derive(Debug, Clone)]
pub(super) struct Sought {
    pub species: Species,
    /// The entry whose value counts it as well: an oxygen analyser that sees argon.
    pub within: Option<usize>,
}

/// One element in the feed and behind it, for one mole of feed (or on its amounts).
#[derive(Debug, Clone, PartialEq)]
pub struct ElementRow {
    /// The element's symbol.
    pub element: &'static str,
    /// Atoms of it in the feed, mol.
    pub feed_mol: f64,
    /// Atoms of it in the gas behind, mol.
    pub reading_mol: f64,
}

/// The gas behind a feed, on the amounts of the feed.
#[derive(Debug, Clone)]
pub struct ElementBalance {
    /// The sum of the feed's amounts.
    pub feed_mol: f64,
    /// The sum of the amounts behind it.
    pub reading_mol: f64,
    /// The elements that the balance rests on.
    pub elements: Vec<ElementRow>,
    /// The species that the balance found, with their fractions of the gas behind.
    pub restored: Vec<(Species, f64)>,
    /// The largest of the elements' differences, as a share of the feed's.
    pub closes_within: f64,
    /// The feed's amounts per amount of the analysis.
    pub(super) scale: f64,
    /// The analysed amounts on the feed's amounts, then the sought ones.
    pub(super) amounts_mol: Vec<f64>,
}

/// Lays an analysis behind its feed: finds its scale and the amounts of the sought species.
///
/// For each element e: s Σ y_i a_ie + Σ w_k a_ke = F_e, by least squares in the relative
/// differences; an inert such as nitrogen or argon ties the two gases together by its element.
///
/// # Errors
/// `feed-open` if the elements do not fix the scale and every sought amount; `feed-contradicts` if
/// an amount comes out negative.
pub(super) fn balance(
    feed: &Feed,
    analysed: &[(Species, f64)],
    sought: &[Sought],
) -> Outcome<ElementBalance> {
    let mut elements: Vec<&'static Element> = Vec::new();
    let all = feed.amounts_mol.iter().chain(analysed).map(|(species, _)| species);
    for species in all.chain(sought.iter().map(|sought| &sought.species)) {
        for (element, _) in species.formula.atoms() {
            let is_open = feed.open_elements.contains(&element.symbol);
            if !is_open && !elements.iter().any(|known| known.symbol == element.symbol) {
                elements.push(element);
            }
        }
    }
    let in_feed = |element: &Element| atoms(&feed.amounts_mol, element);
    elements.retain(|element| in_feed(element) > 0.0);
    let columns = |element: &Element| {
        let mut row = vec![atoms(analysed, element)];
        row.extend(sought.iter().map(|sought| {
            let counted = sought.within.map_or(0.0, |entry| count(&analysed[entry].0, element));
            count(&sought.species, element) - counted
        }));
        row
    };
    let rows: Vec<Vec<f64>> = elements
        .iter()
        .map(|element| columns(element).iter().map(|x| x / in_feed(element)).collect())
        .collect();
    let open = || Problem::new(MixtureCode::FeedOpen).at("feed");
    let fit = least_squares(&rows, &vec![1.0; rows.len()]).ok_or_else(|| vec![open()])?;
    let scale = fit.coefficients[0];
    let mut amounts_mol: Vec<f64> = analysed.iter().map(|(_, amount)| amount * scale).collect();
    for (sought, found) in sought.iter().zip(&fit.coefficients[1..]) {
        if let Some(counting) = sought.within.and_then(|entry| amounts_mol.get_mut(entry)) {
            *counting -= found;
        }
        amounts_mol.push(*found);
    }
    let names = analysed.iter().map(|(species, _)| species);
    let names: Vec<&Species> = names.chain(sought.iter().map(|sought| &sought.species)).collect();
    let reading_mol: f64 = amounts_mol.iter().sum();
    for (species, amount) in names.iter().zip(&mut amounts_mol) {
        // A trace below zero is the rounding of the fit.
        if *amount < -1e-9 * reading_mol {
            let problem = Problem::new(MixtureCode::FeedContradicts)
                .with("species", species.formula.text())
                .with("per_cent", format!("{:.3}", 100.0 * *amount / reading_mol));
            return Err(problem.at("feed").into());
        }
        *amount = amount.max(0.0);
    }
    let behind = |element: &Element| {
        let each = names.iter().zip(&amounts_mol);
        each.map(|(species, amount)| count(species, element) * amount).sum()
    };
    let elements: Vec<ElementRow> = elements
        .iter()
        .map(|element| ElementRow {
            element: element.symbol,
            feed_mol: in_feed(element),
            reading_mol: behind(element),
        })
        .collect();
    let off = elements.iter().map(|row| (row.reading_mol / row.feed_mol - 1.0).abs());
    Ok(ElementBalance {
        feed_mol: feed.amounts_mol.iter().map(|(_, amount)| amount).sum(),
        reading_mol,
        closes_within: off.fold(0.0, f64::max),
        elements,
        restored: sought
            .iter()
            .zip(&amounts_mol[analysed.len()..])
            .map(|(sought, amount)| (sought.species.clone(), amount / reading_mol))
            .collect(),
        scale,
        amounts_mol,
    })
}

fn count(species: &Species, element: &Element) -> f64 {
    species.formula.count(element.symbol).to_f64()
}

fn atoms(amounts: &[(Species, f64)], element: &Element) -> f64 {
    amounts.iter().map(|(species, amount)| amount * count(species, element)).sum()
}
