//! A place in the case: its data and the path that names it.

use super::value::Value;
use crate::problem::{CaseCode, Outcome, Problem};
use crate::quantity::{self, Measure, Quantity};
use crate::reaction::nearest;

/// A place in the tree, with the path that problems name it by.
#[derive(Debug, Clone)]
pub(super) struct Node<'v> {
    pub value: &'v Value,
    pub path: String,
}

impl<'v> Node<'v> {
    pub fn root(value: &'v Value) -> Self {
        Self { value, path: String::new() }
    }

    pub fn field(&self, name: &str) -> Node<'v> {
        let path =
            if self.path.is_empty() { name.to_owned() } else { format!("{}.{name}", self.path) };
        Node { value: self.value.field(name), path }
    }

    pub fn is_null(&self) -> bool {
        *self.value == Value::Null
    }

    pub fn problem(&self, code: CaseCode) -> Problem {
        Problem::new(code).with("found", self.value.kind()).at(&self.path)
    }
}

/// Collects the problems while a case is walked, so that all are found at once.
#[derive(Debug, Default)]
pub(super) struct Reader {
    pub problems: Vec<Problem>,
}

impl Reader {
    /// Keeps what went well; files what did not under the node's path.
    pub fn keep<T>(&mut self, node: &Node, outcome: Outcome<T>) -> Option<T> {
        match outcome {
            Ok(thing) => Some(thing),
            Err(problems) => {
                self.problems.extend(problems.into_iter().map(|problem| problem.at(&node.path)));
                None
            }
        }
    }

    /// The text of a node; nothing if it is null, a problem if it is something else.
    pub fn text<'v>(&mut self, node: &Node<'v>) -> Option<&'v str> {
        match node.value {
            Value::Text(text) => Some(text),
            Value::Null => None,
            _ => {
                self.problems.push(node.problem(CaseCode::NotAText));
                None
            }
        }
    }

    /// The text of a node that must be there.
    pub fn needed_text<'v>(&mut self, node: &Node<'v>) -> Option<&'v str> {
        if node.is_null() {
            self.problems.push(node.problem(CaseCode::Missing));
            return None;
        }
        self.text(node)
    }

    /// A number that must be there.
    pub fn needed_number(&mut self, node: &Node) -> Option<f64> {
        match node.value {
            Value::Number(number) => Some(*number),
            Value::Null => {
                self.problems.push(node.problem(CaseCode::Missing));
                None
            }
            _ => {
                self.problems.push(node.problem(CaseCode::NotANumber));
                None
            }
        }
    }

    /// The items of a list; nothing if it is null, a problem if it is something else.
    pub fn items<'v>(&mut self, node: &Node<'v>) -> Vec<Node<'v>> {
        match node.value {
            Value::List(items) => items
                .iter()
                .enumerate()
                .map(|(i, value)| Node { value, path: format!("{}[{i}]", node.path) })
                .collect(),
            Value::Null => Vec::new(),
            _ => {
                self.problems.push(node.problem(CaseCode::NotAList));
                Vec::new()
            }
        }
    }

    /// Sees that a node is an object with no other fields than these; null is no object.
    pub fn object(&mut self, node: &Node, names: &[&str]) -> bool {
        let fields = match node.value {
            Value::Object(fields) => fields,
            Value::Null => return false,
            _ => {
                self.problems.push(node.problem(CaseCode::NotAnObject));
                return false;
            }
        };
        for (name, _) in fields {
            if !names.contains(&name.as_str()) {
                let near = nearest(name, names.iter().copied());
                let allowed = near.unwrap_or_else(|| names.join(", "));
                let problem = Problem::new(CaseCode::UnknownField).with("found", name.as_str());
                self.problems.push(problem.with("allowed", allowed).at(&node.field(name).path));
            }
        }
        true
    }

    /// One of some words; the first where nothing is written.
    pub fn choice<T: Copy>(&mut self, node: &Node, words: &[(&str, T)]) -> Option<T> {
        if node.is_null() {
            return words.first().map(|(_, choice)| *choice);
        }
        let text = self.text(node)?;
        if let Some((_, choice)) = words.iter().find(|(word, _)| *word == text) {
            return Some(*choice);
        }
        let allowed: Vec<&str> = words.iter().map(|(word, _)| *word).collect();
        let problem = Problem::new(CaseCode::UnknownWord).with("found", text);
        self.problems.push(problem.with("allowed", allowed.join(", ")).at(&node.path));
        None
    }

    /// A quantity of one of these measures; nothing if it is null.
    pub fn quantity(&mut self, node: &Node, allowed: &[Measure]) -> Option<Quantity> {
        let text = self.text(node)?;
        self.keep(node, quantity::parse(text, allowed))
    }

    /// A quantity that must be there.
    pub fn needed_quantity(&mut self, node: &Node, allowed: &[Measure]) -> Option<Quantity> {
        let text = self.needed_text(node)?;
        self.keep(node, quantity::parse(text, allowed))
    }

    /// Says that this version does not do what a node asks for.
    pub fn not_yet(&mut self, node: &Node, what: &'static str) {
        self.problems.push(Problem::new(CaseCode::NotYet).with("what", what).at(&node.path));
    }
}
