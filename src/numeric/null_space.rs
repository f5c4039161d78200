//! Exact rank and null space of a matrix of fractions, with no rounding and so no tolerance.

use super::rational::{Rational, RationalError, greatest_common_divisor};

/// A matrix brought to reduced row echelon form.
struct Echelon {
    rows: Vec<Vec<Rational>>,
    /// The column of each row's leading one.
    pivots: Vec<usize>,
}

/// The rank of a matrix given as rows of equal length (a shorter row ends in zeros).
///
/// # Errors
/// Overflow of an intermediate fraction.
///
/// ```
/// use shiftgauge::numeric::{Rational, rank};
/// let row = |numbers: [i32; 3]| numbers.map(Rational::from).to_vec();
/// assert_eq!(rank(&[row([1, 2, 3]), row([2, 4, 6])]), Ok(1));
/// ```
pub fn rank(rows: &[Vec<Rational>]) -> Result<usize, RationalError> {
    let columns = rows.iter().map(Vec::len).max().unwrap_or(0);
    Ok(reduce(rows, columns)?.pivots.len())
}

/// A basis of all x with A x = 0, for A given as rows of `columns` entries.
///
/// Each basis vector has a one in a column of its own where the others have zero.
///
/// # Errors
/// Overflow of an intermediate fraction.
///
/// ```
/// use shiftgauge::numeric::{Rational, null_space};
/// let row = [1, 2].map(Rational::from).to_vec();
/// let basis = null_space(&[row], 2).unwrap();
/// assert_eq!(basis, [[Rational::from(-2), Rational::ONE]]);
/// ```
pub fn null_space(
    rows: &[Vec<Rational>],
    columns: usize,
) -> Result<Vec<Vec<Rational>>, RationalError> {
    let echelon = reduce(rows, columns)?;
    let free = (0..columns).filter(|column| !echelon.pivots.contains(column));
    Ok(free
        .map(|column| {
            let mut vector = vec![Rational::ZERO; columns];
            vector[column] = Rational::ONE;
            for (row, &pivot) in echelon.rows.iter().zip(&echelon.pivots) {
                vector[pivot] = row[column].negated();
            }
            vector
        })
        .collect())
}

/// The multiple of a vector by a positive number whose entries are the smallest whole numbers.
///
/// # Errors
/// Overflow. A vector of zeros is given back as it is.
///
/// ```
/// use shiftgauge::numeric::{Rational, smallest_whole};
/// let half = Rational::new(1, 2).unwrap();
/// let scaled = smallest_whole(&[half, Rational::ONE]).unwrap();
/// assert_eq!(scaled, [Rational::ONE, Rational::from(2)]);
/// ```
pub fn smallest_whole(vector: &[Rational]) -> Result<Vec<Rational>, RationalError> {
    let (mut multiple, mut divisor) = (1_u128, 0_u128);
    for entry in vector.iter().filter(|entry| !entry.is_zero()) {
        let bottom = entry.denominator().unsigned_abs();
        let factor = bottom / greatest_common_divisor(multiple, bottom);
        multiple = multiple.checked_mul(factor).ok_or(RationalError::Overflow)?;
        let top = entry.numerator().unsigned_abs();
        divisor = if divisor == 0 { top } else { greatest_common_divisor(divisor, top) };
    }
    let whole = |number: u128| i128::try_from(number).map_err(|_| RationalError::Overflow);
    let scale = Rational::new(whole(multiple)?, whole(divisor.max(1))?)?;
    vector.iter().map(|entry| entry.times(scale)).collect()
}

fn reduce(rows: &[Vec<Rational>], columns: usize) -> Result<Echelon, RationalError> {
    let mut rows: Vec<Vec<Rational>> = rows.to_vec();
    for row in &mut rows {
        row.resize(columns, Rational::ZERO);
    }
    let mut pivots = Vec::new();
    for column in 0..columns {
        let top = pivots.len();
        let Some(found) = (top..rows.len()).find(|&row| !rows[row][column].is_zero()) else {
            continue;
        };
        rows.swap(top, found);
        let lead = rows[top][column];
        for entry in &mut rows[top] {
            *entry = entry.over(lead)?;
        }
        let pivot_row = rows[top].clone();
        for (index, row) in rows.iter_mut().enumerate() {
            let factor = row[column];
            if index == top || factor.is_zero() {
                continue;
            }
            for (entry, pivot) in row.iter_mut().zip(&pivot_row) {
                if !pivot.is_zero() {
                    *entry = entry.minus(pivot.times(factor)?)?;
                }
            }
        }
        pivots.push(column);
    }
    rows.truncate(pivots.len());
    Ok(Echelon { rows, pivots })
}
