//! Rest over a range of one knob, for several values of another.

use super::knob::{Knob, Knobs};
use super::wanted::Wanted;

/// The most points along x.
pub const SWEEP_POINTS_MAX: usize = 2000;
/// The most lines.
pub const SWEEP_LINES_MAX: usize = 12;

/// What to draw.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct SweepRequest<'a> {
    /// The knob along x.
    pub x: Knob,
    /// Its first value.
    pub from: f64,
    /// Its last value.
    pub to: f64,
    /// How many points, evenly spaced, both ends among them: 2 to [`SWEEP_POINTS_MAX`].
    pub count: usize,
    /// The knob that differs from line to line, with one value for each of up to
    /// [`SWEEP_LINES_MAX`] lines; one line of the plant as it stands without it.
    pub lines: Option<(Knob, &'a [f64])>,
    /// The number that is drawn.
    pub show: Wanted,
}

/// What is drawn.
#[derive(Debug, Clone, PartialEq)]
pub struct Sweep {
    /// The values of x.
    pub x: Vec<f64>,
    /// For each line the number at each x; `None` where there is none (see [`Wanted::of`]).
    pub lines: Vec<Vec<Option<f64>>>,
}

/// Works out a chart. A count or a number of lines beyond its limit is taken at the limit, and a
/// count below two at two.
///
/// Where x is the temperature, K is worked out once for each x, whatever the number of lines; where
/// the lines are temperatures, once for each line.
///
/// ```
/// # use shiftgauge::advice::{Knob, Knobs, Plant, SweepRequest, Wanted, sweep};
/// # use shiftgauge::constant::{Constant, StatedConstant};
/// # use shiftgauge::equilibrium::{Hold, Kind, State, System};
/// # let system = System::new(&[Kind::Gas; 2], &[-1.0, 2.0]).unwrap();
/// # let hold = Hold::Pressure { pressure_pa: 100_000.0 };
/// # let state = State { temperature_k: 330.0, hold, amounts_mol: &[1.0, 0.0] };
/// # let constant = Constant::Stated(StatedConstant {
/// #     ln_k: 0.0, u_ln_k: None, at_k: Some(330.0), enthalpy_j_per_mol: Some(57_000.0),
/// #     u_enthalpy_j_per_mol: None, heat_capacity_j_per_mol_k: None,
/// # });
/// # let plant = Plant { system: &system, state, constant: &constant, approach_k: 0.0 };
/// // The share of NO2 from 290 to 390 K at 1 bar and at 5 bar
/// let mut knobs = Knobs::new(plant).unwrap();
/// let request = SweepRequest {
///     x: Knob::Temperature, from: 290.0, to: 390.0, count: 11,
///     lines: Some((Knob::Pressure, &[1e5, 5e5])), show: Wanted::Fraction(1),
/// };
/// let chart = sweep(&mut knobs, &request);
/// assert_eq!(chart.lines.len(), 2);
/// assert!(chart.lines[0][5] > chart.lines[1][5]);
/// ```
pub fn sweep(knobs: &mut Knobs, request: &SweepRequest) -> Sweep {
    let x = evenly(request.from, request.to, request.count.clamp(2, SWEEP_POINTS_MAX));
    let show = request.show;
    let Some((knob, values)) = request.lines else {
        let line = x.iter().map(|&at| show.of(knobs, &[(request.x, at)])).collect();
        return Sweep { x, lines: vec![line] };
    };
    let values = &values[..values.len().min(SWEEP_LINES_MAX)];
    let mut lines = vec![Vec::with_capacity(x.len()); values.len()];
    if knob == Knob::Temperature {
        for (line, &value) in lines.iter_mut().zip(values) {
            line.extend(x.iter().map(|&at| show.of(knobs, &[(knob, value), (request.x, at)])));
        }
    } else {
        for &at in &x {
            for (line, &value) in lines.iter_mut().zip(values) {
                line.push(show.of(knobs, &[(knob, value), (request.x, at)]));
            }
        }
    }
    Sweep { x, lines }
}

/// So many numbers from one to another, both ends exact.
pub(super) fn evenly(from: f64, to: f64, count: usize) -> Vec<f64> {
    let last = count.max(2) - 1;
    let point = |place: usize| {
        let share = place as f64 / last as f64;
        if place == last { to } else { from + share * (to - from) }
    };
    (0..=last).map(point).collect()
}
