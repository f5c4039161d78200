//! Plain data as it crosses the border: a tree that keeps the order of its fields.

use std::fmt;

use serde::de::{Deserialize, Deserializer, MapAccess, SeqAccess, Visitor};

/// A tree of plain data, as JSON has it.
///
/// A case is walked by hand from this tree, so that every mistake in it is found, where a
/// deserialiser into structs would stop at the first one.
#[derive(Debug, Clone, PartialEq)]
pub enum Value {
    /// `null`, or a field that is left out.
    Null,
    /// `true` or `false`.
    Bool(bool),
    /// A number; it may be infinite or no number, as JavaScript's may.
    Number(f64),
    /// A text.
    Text(String),
    /// A list.
    List(Vec<Value>),
    /// Fields by name, in the order given.
    Object(Vec<(String, Value)>),
}

impl Value {
    /// The field of this name; `Null` where there is none or this is no object.
    #[must_use]
    pub fn field(&self, name: &str) -> &Value {
        const NULL: &Value = &Value::Null;
        match self {
            Value::Object(fields) => {
                fields.iter().find(|(key, _)| key == name).map_or(NULL, |(_, value)| value)
            }
            _ => NULL,
        }
    }

    /// What kind of thing this is, in words.
    #[must_use]
    pub fn kind(&self) -> &'static str {
        match self {
            Value::Null => "nothing",
            Value::Bool(_) => "true or false",
            Value::Number(_) => "a number",
            Value::Text(_) => "a text",
            Value::List(_) => "a list",
            Value::Object(_) => "an object",
        }
    }
}

impl<'de> Deserialize<'de> for Value {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        deserializer.deserialize_any(Builder)
    }
}

struct Builder;

impl<'de> Visitor<'de> for Builder {
    type Value = Value;

    fn expecting(&self, out: &mut fmt::Formatter) -> fmt::Result {
        out.write_str("plain data")
    }

    fn visit_bool<E>(self, value: bool) -> Result<Value, E> {
        Ok(Value::Bool(value))
    }

    #[allow(clippy::cast_precision_loss, reason = "JavaScript has no other numbers than doubles")]
    fn visit_i64<E>(self, value: i64) -> Result<Value, E> {
        Ok(Value::Number(value as f64))
    }

    #[allow(clippy::cast_precision_loss, reason = "JavaScript has no other numbers than doubles")]
    fn visit_u64<E>(self, value: u64) -> Result<Value, E> {
        Ok(Value::Number(value as f64))
    }

    fn visit_f64<E>(self, value: f64) -> Result<Value, E> {
        Ok(Value::Number(value))
    }

    fn visit_str<E>(self, value: &str) -> Result<Value, E> {
        Ok(Value::Text(value.to_owned()))
    }

    fn visit_string<E>(self, value: String) -> Result<Value, E> {
        Ok(Value::Text(value))
    }

    fn visit_unit<E>(self) -> Result<Value, E> {
        Ok(Value::Null)
    }

    fn visit_none<E>(self) -> Result<Value, E> {
        Ok(Value::Null)
    }

    fn visit_some<D: Deserializer<'de>>(self, deserializer: D) -> Result<Value, D::Error> {
        Deserialize::deserialize(deserializer)
    }

    fn visit_seq<A: SeqAccess<'de>>(self, mut items: A) -> Result<Value, A::Error> {
        let mut list = Vec::new();
        while let Some(item) = items.next_element()? {
            list.push(item);
        }
        Ok(Value::List(list))
    }

    fn visit_map<A: MapAccess<'de>>(self, mut entries: A) -> Result<Value, A::Error> {
        let mut fields = Vec::new();
        while let Some(entry) = entries.next_entry::<String, Value>()? {
            fields.push(entry);
        }
        Ok(Value::Object(fields))
    }
}
