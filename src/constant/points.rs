//! K from points: van 't Hoff's straight line of ln K against 1/T.

use crate::numeric::least_squares;
use crate::problem::{ConstantCode, Outcome, Problem};
use crate::quantity::GAS_CONSTANT_J_PER_MOL_K;

/// One point: ln K of the reaction at a temperature.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Point {
    /// The temperature.
    pub temperature_k: f64,
    /// ln K, p° = 1 bar.
    pub ln_k: f64,
    /// Its standard uncertainty, where one was stated.
    pub u_ln_k: Option<f64>,
}

/// The straight line through points, with what it says of ΔH° and how well it fits.
#[derive(Debug, Clone, PartialEq)]
pub struct PointsLine {
    /// The points it was drawn through.
    pub points: Vec<Point>,
    /// The temperatures of the first and the last point.
    pub range_k: (f64, f64),
    /// ΔH°, constant along the line: −R times its slope.
    pub enthalpy_j_per_mol: f64,
    /// The standard uncertainty of ΔH°; none for two points without tolerances.
    pub u_enthalpy_j_per_mol: Option<f64>,
    /// Whether four or more points bend away from the line by more than their scatter, so that
    /// ΔH° is not constant.
    pub bends: bool,
    /// The largest distance of a point from the line, in ln K.
    pub largest_residual: f64,
    /// 1/T at the middle of the points, where the line is known best.
    middle_per_k: f64,
    ln_k_at_middle: f64,
    slope_k: f64,
    /// Variances of the value at the middle and of the slope; none for two points without
    /// tolerances, where nothing tells how well they are known.
    variances: Option<(f64, f64)>,
}

/// Draws the straight line ln K = a − (ΔH°/R)/T through two or more points.
///
/// Least squares. Where every point has a tolerance the points are weighted by 1/u² and the line's
/// uncertainty follows from theirs; otherwise they count alike, and the scatter about the line says
/// how well it is known (n − 2 degrees of freedom, widened by Student's t so that ±2u holds 95 %).
/// Source: JCGM 100:2008, H.3 and G.3.
///
/// # Errors
/// `points-too-few`: fewer than two, or all at one temperature.
///
/// ```
/// use shiftgauge::constant::{Point, line_through};
/// let point = |temperature_k, ln_k| Point { temperature_k, ln_k, u_ln_k: None };
/// let line = line_through(&[point(500.0, 4.0), point(1000.0, 1.0)]).unwrap();
/// // Slope 3/(1/500 − 1/1000) = 3000 K, so ΔH° = −3000 R.
/// assert!((line.enthalpy_j_per_mol + 3000.0 * 8.314_462_618).abs() < 1e-4);
/// assert!((line.ln_k(500.0) - 4.0).abs() < 1e-12);
/// ```
pub fn line_through(points: &[Point]) -> Outcome<PointsLine> {
    let too_few = || Problem::new(ConstantCode::PointsTooFew);
    let stated: Option<Vec<f64>> =
        points.iter().map(|point| point.u_ln_k.filter(|u| *u > 0.0)).collect();
    let weight = |i: usize| stated.as_ref().map_or(1.0, |u| 1.0 / u[i]);
    let total: f64 = (0..points.len()).map(|i| weight(i) * weight(i)).sum();
    let reciprocals = points.iter().map(|point| 1.0 / point.temperature_k);
    let weighted = reciprocals.enumerate().map(|(i, x)| weight(i) * weight(i) * x);
    let middle_per_k = weighted.sum::<f64>() / total;
    let rows: Vec<Vec<f64>> = points
        .iter()
        .enumerate()
        .map(|(i, point)| {
            // In units of 1e-3/K both columns are of like size.
            let x = 1e3 * (1.0 / point.temperature_k - middle_per_k);
            vec![weight(i), weight(i) * x]
        })
        .collect();
    let values: Vec<f64> = points.iter().enumerate().map(|(i, p)| weight(i) * p.ln_k).collect();
    let Some(fit) = least_squares(&rows, &values) else { return Err(too_few().into()) };
    let scatter: f64 = fit.residuals.iter().map(|r| r * r).sum();
    let freedom = points.len() - 2;
    let variance = match (&stated, freedom) {
        // Points that miss the line by more than their tolerances widen it: Birge's ratio, χ²/(n − 2).
        (Some(_), 0) => Some(1.0),
        (Some(_), freedom) => Some((scatter / freedom as f64).max(1.0)),
        (None, 0) => None,
        (None, freedom) => {
            let widening = 0.5 * student_t(freedom);
            Some(scatter / freedom as f64 * widening * widening)
        }
    };
    let variances = variance.map(|v| (v * fit.covariance[0][0], 1e6 * v * fit.covariance[1][1]));
    let slope_k = 1e3 * fit.coefficients[1];
    let plain = |(i, residual): (usize, &f64)| residual.abs() / weight(i);
    let kelvins = points.iter().map(|point| point.temperature_k);
    Ok(PointsLine {
        points: points.to_vec(),
        range_k: (kelvins.clone().fold(f64::INFINITY, f64::min), kelvins.fold(0.0, f64::max)),
        enthalpy_j_per_mol: -GAS_CONSTANT_J_PER_MOL_K * slope_k,
        largest_residual: fit.residuals.iter().enumerate().map(plain).fold(0.0, f64::max),
        middle_per_k,
        ln_k_at_middle: fit.coefficients[0],
        slope_k,
        bends: bends(&rows, &values, stated.is_some()),
        u_enthalpy_j_per_mol: variances.map(|(_, slope)| GAS_CONSTANT_J_PER_MOL_K * slope.sqrt()),
        variances,
    })
}

/// Student's t for 95 % both ways, by degrees of freedom; above the last row that of the last.
/// Source: JCGM 100:2008, table G.2;
/// the third decimal from memory.
fn student_t(freedom: usize) -> f64 {
    const T: [f64; 10] = [12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306, 2.262, 2.228];
    T[freedom.clamp(1, T.len()) - 1]
}

/// Whether a parabola fits better than the line by more than chance: its bend differs from zero by
/// more than Student's t allows.
fn bends(rows: &[Vec<f64>], values: &[f64], has_tolerances: bool) -> bool {
    let bent = |row: &Vec<f64>| {
        let (weight, x) = (row[0], row[1] / row[0]);
        vec![weight, weight * x, weight * x * x]
    };
    let bent: Vec<Vec<f64>> = rows.iter().map(bent).collect();
    let Some(freedom) = rows.len().checked_sub(3).filter(|freedom| *freedom > 0) else {
        return false;
    };
    let Some(fit) = least_squares(&bent, values) else { return false };
    let scatter: f64 = fit.residuals.iter().map(|r| r * r).sum();
    let variance = if has_tolerances { 1.0 } else { scatter / freedom as f64 };
    let allowed = if has_tolerances { 2.0 } else { student_t(freedom) };
    let u = (variance * fit.covariance[2][2]).sqrt();
    let rounding = 1e-9 * fit.coefficients[0].abs().max(1.0);
    fit.coefficients[2].abs() > allowed * u + rounding
}

impl PointsLine {
    /// ln K on the line.
    #[must_use]
    pub fn ln_k(&self, temperature_k: f64) -> f64 {
        self.ln_k_at_middle + self.slope_k * (1.0 / temperature_k - self.middle_per_k)
    }

    /// Standard uncertainty of ln K on the line, where something tells it; the value at the middle
    /// and the slope are independent.
    #[must_use]
    pub fn u_ln_k(&self, temperature_k: f64) -> Option<f64> {
        let away = 1.0 / temperature_k - self.middle_per_k;
        self.variances.map(|(middle, slope)| libm::sqrt(middle + slope * away * away))
    }
}
