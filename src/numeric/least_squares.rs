//! Linear least squares, checked; this file is the only one that names nalgebra.

use nalgebra::{DMatrix, DVector, SVD};

/// Columns whose singular value is below this share of the largest say nothing of their own.
const RANK_TOLERANCE: f64 = 1e-12;

/// The cap on the sweeps of the singular value decomposition; small matrices take about ten.
const SWEEPS_AT_MOST: usize = 200;

/// A solution of linear least squares.
#[derive(Debug, Clone, PartialEq)]
pub struct LeastSquares {
    /// One coefficient for each column.
    pub coefficients: Vec<f64>,
    /// (AᵀA)⁻¹: the covariance of the coefficients for values of unit variance.
    pub covariance: Vec<Vec<f64>>,
    /// Value less what the coefficients give, for each row.
    pub residuals: Vec<f64>,
}

/// Finds the coefficients x that make |A x − b|² least; nothing if the rows are not of one length,
/// are fewer than the columns, hold a number that is not finite, or do not tell the columns apart.
///
/// By singular values, with a named rank tolerance and a cap, since the plain solvers answer a
/// singular matrix with numbers that look like an answer.
///
/// ```
/// use shiftgauge::numeric::least_squares;
/// // The line through (0, 1), (1, 3) and (2, 5).
/// let rows = [vec![1.0, 0.0], vec![1.0, 1.0], vec![1.0, 2.0]];
/// let line = least_squares(&rows, &[1.0, 3.0, 5.0]).unwrap();
/// assert!((line.coefficients[1] - 2.0).abs() < 1e-14);
/// let one_place = [vec![1.0, 2.0], vec![1.0, 2.0]];
/// assert_eq!(least_squares(&one_place, &[1.0, 3.0]), None);
/// ```
#[must_use]
pub fn least_squares(rows: &[Vec<f64>], values: &[f64]) -> Option<LeastSquares> {
    let columns = rows.first()?.len();
    let finite = |numbers: &[f64]| numbers.iter().all(|number| number.is_finite());
    let fits = rows.iter().all(|row| row.len() == columns && finite(row));
    if !fits
        || columns == 0
        || rows.len() < columns
        || rows.len() != values.len()
        || !finite(values)
    {
        return None;
    }
    let matrix = DMatrix::from_row_iterator(rows.len(), columns, rows.iter().flatten().copied());
    let right = DVector::from_column_slice(values);
    let parts = SVD::try_new(matrix.clone(), true, true, f64::EPSILON, SWEEPS_AT_MOST)?;
    let (largest, smallest) = (parts.singular_values.max(), parts.singular_values.min());
    // A comparison that also fails for a value that is no number.
    let has_full_rank = smallest > RANK_TOLERANCE * largest;
    if !has_full_rank {
        return None;
    }
    let solution = parts.solve(&right, 0.0).ok()?;
    let right_vectors = parts.v_t.as_ref()?;
    let residuals = &right - &matrix * &solution;
    let covariance = (0..columns).map(|i| {
        let entry = |j: usize| -> f64 {
            let along = parts.singular_values.iter().enumerate();
            along.map(|(k, s)| right_vectors[(k, i)] * right_vectors[(k, j)] / (s * s)).sum()
        };
        (0..columns).map(entry).collect()
    });
    Some(LeastSquares {
        coefficients: solution.iter().copied().collect(),
        covariance: covariance.collect(),
        residuals: residuals.iter().copied().collect(),
    })
}
