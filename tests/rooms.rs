//! The rooms of `src` depend one way, and only one file knows the browser.

use std::fs;
use std::path::{Path, PathBuf};

/// The rooms from the ground up: each may use those before it and none after it.
const ROOMS: [&str; 11] = [
    "problem",
    "quantity",
    "numeric",
    "reaction",
    "library",
    "constant",
    "mixture",
    "equilibrium",
    "advice",
    "case",
    "rounds",
];

fn files_below(folder: &Path, ending: &str) -> Vec<PathBuf> {
    let mut found = Vec::new();
    for entry in fs::read_dir(folder).unwrap() {
        let path = entry.unwrap().path();
        let name = path.file_name().unwrap().to_string_lossy().into_owned();
        if path.is_dir() && name != "node_modules" {
            found.extend(files_below(&path, ending));
        } else if name.ends_with(ending) {
            found.push(path);
        }
    }
    found
}

fn code_lines(path: &Path) -> Vec<String> {
    let text = fs::read_to_string(path).unwrap();
    text.lines().filter(|line| !line.trim_start().starts_with("//")).map(str::to_owned).collect()
}

#[test]
fn a_room_uses_only_the_rooms_above_it() {
    let source = Path::new(env!("CARGO_MANIFEST_DIR")).join("src");
    let mut seen = 0;
    for (floor, room) in ROOMS.iter().enumerate() {
        for path in files_below(&source.join(room), ".rs") {
            seen += 1;
            for line in code_lines(&path) {
                for above in &ROOMS[floor + 1..] {
                    assert!(
                        !line.contains(&format!("crate::{above}")),
                        "{} uses the room {above}, which stands below it: {line}",
                        path.display()
                    );
                }
                assert!(
                    !line.contains("crate::{"),
                    "{} joins rooms in one `use`; name each: {line}",
                    path.display()
                );
            }
        }
    }
    assert!(seen >= ROOMS.len(), "only {seen} files were read");
}

#[test]
fn every_folder_of_src_is_a_room() {
    let source = Path::new(env!("CARGO_MANIFEST_DIR")).join("src");
    for entry in fs::read_dir(source).unwrap() {
        let path = entry.unwrap().path();
        let name = path.file_name().unwrap().to_string_lossy().into_owned();
        let beside = ["lib.rs", "web.rs", "bench.rs"];
        let known = ROOMS.contains(&name.as_str()) || beside.contains(&name.as_str());
        assert!(known, "src/{name} is no room");
    }
}

#[test]
fn the_browser_and_nalgebra_are_named_in_their_own_place_only() {
    let source = Path::new(env!("CARGO_MANIFEST_DIR")).join("src");
    let web = ["wasm_bindgen", "web_sys", "serde_wasm_bindgen", "console_error_panic_hook"];
    for path in files_below(&source, ".rs") {
        let place = path.strip_prefix(&source).unwrap().to_string_lossy().into_owned();
        for line in code_lines(&path) {
            for name in web {
                assert!(place == "web.rs" || !line.contains(name), "{place} names {name}: {line}");
            }
            let numeric = place.starts_with("numeric");
            assert!(numeric || !line.contains("nalgebra"), "{place} names nalgebra: {line}");
            let standard = [".exp()", ".ln()", ".powf(", ".log10()", ".exp_m1()", ".ln_1p()"];
            for call in standard {
                assert!(!line.contains(call), "{place} uses {call}; take it from libm: {line}");
            }
        }
    }
}

#[test]
fn no_file_is_longer_than_its_limit() {
    let root = Path::new(env!("CARGO_MANIFEST_DIR"));
    let limits =
        [("src", ".rs", 500), ("tests", ".rs", 500), ("www", ".js", 250), ("www", ".css", 250)];
    for (folder, ending, limit) in limits {
        for path in files_below(&root.join(folder), ending) {
            let lines = fs::read_to_string(&path).unwrap().lines().count();
            assert!(lines <= limit, "{} has {lines} lines; the limit is {limit}", path.display());
        }
    }
}
