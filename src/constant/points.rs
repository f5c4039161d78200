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
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct PointsLine {
    /// How many points it was drawn through.
    pub points: usize,
    /// The temperatures of the first and the last point.
    pub range_k: (f64, f64),
    /// ΔH°, constant along the line: −R times its slope.
    pub enthalpy_j_per_mol: f64,
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
/// how well it is known (n − 2 degrees of freedom). Source: JCGM 100:2008, H.3.
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
        (Some(_), _) => Some(1.0),
        (None, 0) => None,
        (None, freedom) => Some(scatter / freedom as f64),
    };
    let slope_k = 1e3 * fit.coefficients[1];
    let plain = |(i, residual): (usize, &f64)| residual.abs() / weight(i);
    let kelvins = points.iter().map(|point| point.temperature_k);
    Ok(PointsLine {
        points: points.len(),
        range_k: (kelvins.clone().fold(f64::INFINITY, f64::min), kelvins.fold(0.0, f64::max)),
        enthalpy_j_per_mol: -GAS_CONSTANT_J_PER_MOL_K * slope_k,
        largest_residual: fit.residuals.iter().enumerate().map(plain).fold(0.0, f64::max),
        middle_per_k,
        ln_k_at_middle: fit.coefficients[0],
        slope_k,
        variances: variance.map(|v| (v * fit.covariance[0][0], 1e6 * v * fit.covariance[1][1])),
    })
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
