//! Wrong inputs, one a file: the whole message is the expected text.
//!
//! A file has the call in its first line, its input below, a line of dashes, and the problems as a
//! user sees them. The input of `check` is laid over `base.json`, field by field; a list replaces
//! the one below it. `MISTAKES=write cargo test mistakes` writes what the program says now, to be
//! read line by line before it is committed.

use std::fs;
use std::path::PathBuf;

use serde::Serialize;
use shiftgauge::case::{self, Value};

const FEWEST: usize = 40;

fn folder() -> PathBuf {
    PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("tests/mistakes")
}

fn tree(json: &serde_json::Value) -> Value {
    serde_json::from_value(json.clone()).unwrap()
}

fn lay_over(base: &mut serde_json::Value, over: &serde_json::Value) {
    match (base, over) {
        (serde_json::Value::Object(base), serde_json::Value::Object(over)) => {
            for (name, value) in over {
                lay_over(base.entry(name.clone()).or_insert(serde_json::Value::Null), value);
            }
        }
        (base, over) => *base = over.clone(),
    }
}

fn problems(answer: &impl Serialize) -> String {
    let answer = serde_json::to_value(answer).unwrap();
    if answer["ok"] == true {
        return "no problem found\n".to_owned();
    }
    let mut text = String::new();
    for problem in answer["problems"].as_array().unwrap() {
        let word = |name: &str| problem[name].as_str().unwrap().to_owned();
        let span = match &problem["span"] {
            serde_json::Value::Null => String::new(),
            span => format!(" {}..{}", span["start"], span["end"]),
        };
        text += &format!("{} at {}{span}\n", word("code"), word("field"));
        text += &format!("  {}\n  {}\n", word("message"), word("hint"));
    }
    text
}

fn ask(call: &str, input: &str) -> String {
    let json = || serde_json::from_str::<serde_json::Value>(input).unwrap();
    let mut lines = input.lines();
    let mut line = || lines.next().unwrap_or_default();
    match call {
        "check" => {
            let base = fs::read_to_string(folder().join("base.json")).unwrap();
            let mut case = serde_json::from_str(&base).unwrap();
            lay_over(&mut case, &json());
            problems(&case::check(&tree(&case)))
        }
        "bare check" => problems(&case::check(&tree(&json()))),
        "balance" => problems(&case::balance(line())),
        "constant" => problems(&case::constant(line(), line())),
        "book" => problems(&case::book(&tree(&json()))),
        "sheet" => problems(&case::sheet(line(), &Value::Null)),
        "rest" => problems(&case::rest(&tree(&json()))),
        "affinities" => problems(&case::affinities(&tree(&json()))),
        other => panic!("no call {other}"),
    }
}

#[test]
fn every_mistake_gets_its_whole_message() {
    let write = std::env::var("MISTAKES").is_ok_and(|word| word == "write");
    let mut names: Vec<PathBuf> =
        fs::read_dir(folder()).unwrap().map(|entry| entry.unwrap().path()).collect();
    names.retain(|path| path.extension().is_some_and(|ending| ending == "txt"));
    names.sort();
    let mut wrong = Vec::new();
    for path in &names {
        let text = fs::read_to_string(path).unwrap();
        let (call, rest) = text.split_once('\n').unwrap();
        let (input, expected) = rest.split_once("----\n").unwrap_or((rest, ""));
        let found = ask(call, input);
        assert!(!found.contains('{'), "{}: a sentence is not filled in: {found}", path.display());
        if write {
            let input = input.trim_end();
            fs::write(path, format!("{call}\n{input}\n----\n{found}")).unwrap();
        } else if found != expected {
            wrong.push(format!("{}\nexpected\n{expected}found\n{found}", path.display()));
        }
    }
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
    assert!(names.len() >= FEWEST, "only {} mistakes", names.len());
}

#[test]
fn the_base_of_the_mistakes_is_itself_right() {
    let base = fs::read_to_string(folder().join("base.json")).unwrap();
    let case: Value = serde_json::from_str(&base).unwrap();
    let answer = case::check(&case);
    assert_eq!(problems(&answer), "no problem found\n");
}
