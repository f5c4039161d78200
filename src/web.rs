//! The border to the browser: plain data in, plain data out, stateless.

use wasm_bindgen::prelude::wasm_bindgen;

/// Runs once when the module is loaded: a panic becomes a readable message in the console.
#[wasm_bindgen(start)]
pub fn start() {
    console_error_panic_hook::set_once();
}

/// Gives the version of the program.
#[wasm_bindgen]
#[must_use]
pub fn version() -> String {
    env!("CARGO_PKG_VERSION").to_owned()
}
