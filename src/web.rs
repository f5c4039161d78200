//! The border to the browser: plain data in, plain data out, stateless.
//!
//! A user's mistake is an answer (`{ ok: false, problems }`), never an exception. Absent values
//! cross as `null`, maps as plain objects.

use serde::Serialize;
use serde_wasm_bindgen::Serializer;
use wasm_bindgen::prelude::{JsValue, wasm_bindgen};
use web_sys::console;

use crate::case::{self, Value};

/// Runs once when the module is loaded: a panic becomes a readable message in the console.
#[wasm_bindgen(start)]
pub fn start() {
    console_error_panic_hook::set_once();
}

/// Judges a case and gives its report.
#[wasm_bindgen(unchecked_return_type = "CheckAnswer")]
pub fn check(
    #[wasm_bindgen(unchecked_param_type = "Case")] question: JsValue,
    #[wasm_bindgen(unchecked_param_type = "Options")] _options: JsValue,
) -> JsValue {
    give(&case::check(&tree(question)))
}

/// Balances an equation.
#[wasm_bindgen(unchecked_return_type = "BalanceAnswer")]
pub fn balance(equation: &str) -> JsValue {
    give(&case::balance(equation))
}

/// Gives K and all its forms at one temperature.
#[wasm_bindgen(unchecked_return_type = "ConstantAnswer")]
pub fn constant(reaction: &str, temperature: &str) -> JsValue {
    give(&case::constant(reaction, temperature))
}

/// Works out a chart of a case.
#[wasm_bindgen(unchecked_return_type = "SweepAnswer")]
pub fn sweep(
    #[wasm_bindgen(unchecked_param_type = "Case")] question: JsValue,
    #[wasm_bindgen(unchecked_param_type = "SweepRequest")] request: JsValue,
    #[wasm_bindgen(unchecked_param_type = "Options")] _options: JsValue,
) -> JsValue {
    give(&case::sweep(&tree(question), &tree(request)))
}

/// Looks for the settings of one knob that reach a goal.
#[wasm_bindgen(unchecked_return_type = "TargetAnswer")]
pub fn target(
    #[wasm_bindgen(unchecked_param_type = "Case")] question: JsValue,
    #[wasm_bindgen(unchecked_param_type = "Goal")] goal: JsValue,
    #[wasm_bindgen(unchecked_param_type = "Options")] _options: JsValue,
) -> JsValue {
    give(&case::target(&tree(question), &tree(goal)))
}

/// Turns a number called K into every other form.
#[wasm_bindgen(unchecked_return_type = "ConvertAnswer")]
pub fn convert(#[wasm_bindgen(unchecked_param_type = "StatedNumber")] number: JsValue) -> JsValue {
    give(&case::convert(&tree(number)))
}

/// Finds species of the library and of a book.
#[wasm_bindgen(unchecked_return_type = "SpeciesAnswer")]
pub fn species(
    text: &str,
    #[wasm_bindgen(unchecked_param_type = "Asked")] asked: JsValue,
) -> JsValue {
    give(&case::species(text, &tree(asked)))
}

/// Gives the sheet of one species.
#[wasm_bindgen(unchecked_return_type = "SheetAnswer")]
pub fn sheet(
    text: &str,
    #[wasm_bindgen(unchecked_param_type = "Asked")] asked: JsValue,
) -> JsValue {
    give(&case::sheet(text, &tree(asked)))
}

/// Looks a user's own book through.
#[wasm_bindgen(unchecked_return_type = "BookAnswer")]
pub fn book(#[wasm_bindgen(unchecked_param_type = "Book")] book: JsValue) -> JsValue {
    give(&case::book(&tree(book)))
}

/// Gives ln K − ln Q of each reaction of a problem in bare numbers.
#[wasm_bindgen(unchecked_return_type = "AffinitiesAnswer")]
pub fn affinities(
    #[wasm_bindgen(unchecked_param_type = "BareProblem")] problem: JsValue,
) -> JsValue {
    give(&case::affinities(&tree(problem)))
}

/// Gives the state of rest of a problem in bare numbers.
#[wasm_bindgen(unchecked_return_type = "RestAnswer")]
pub fn rest(#[wasm_bindgen(unchecked_param_type = "BareProblem")] problem: JsValue) -> JsValue {
    give(&case::rest(&tree(problem)))
}

/// Gives the versions of the program and its tables.
#[wasm_bindgen(unchecked_return_type = "Version")]
pub fn version() -> JsValue {
    give(&case::version())
}

/// Does one kind of work so many times and gives its sum; the work is told by its name.
#[cfg(feature = "bench")]
#[wasm_bindgen]
pub struct Bench(crate::bench::Bench);

#[cfg(feature = "bench")]
#[wasm_bindgen]
impl Bench {
    /// Sets the work up; nothing where that fails.
    pub fn set_up() -> Option<Bench> {
        crate::bench::Bench::new().ok().map(Bench)
    }

    /// The names of the kinds of work.
    pub fn names() -> Vec<String> {
        crate::bench::Work::ALL.iter().map(|(_, name)| (*name).to_owned()).collect()
    }

    /// Runs a batch of the kind at this place of the names.
    pub fn run(&mut self, place: usize, count: u32) -> Option<f64> {
        let (work, _) = crate::bench::Work::ALL.get(place)?;
        self.0.run(*work, count).ok()
    }
}

/// Plain data as a tree. What is not plain data (a function, a symbol) reads as nothing, and the
/// console says so to whoever wrote the page around it.
fn tree(data: JsValue) -> Value {
    serde_wasm_bindgen::from_value(data).unwrap_or_else(|error| {
        console::warn_2(&JsValue::from_str("This is no plain data:"), &error.into());
        Value::Null
    })
}

fn give(answer: &impl Serialize) -> JsValue {
    let serializer =
        Serializer::new().serialize_missing_as_null(true).serialize_maps_as_objects(true);
    // Serialising plain structs of finite numbers cannot fail; null would say so if it did.
    answer.serialize(&serializer).unwrap_or(JsValue::NULL)
}
