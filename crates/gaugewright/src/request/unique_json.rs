//! A JSON value that remembers whether a key was written twice.
//!
//! `serde_json::Value` keeps the last of two equal keys without a word; a model with
//! `"copies": 3, "copies": 1` would then be judged as another one.

use std::fmt;

use serde::de::{self, Deserialize, DeserializeSeed, Deserializer, MapAccess, SeqAccess, Visitor};
use serde_json::{Map, Number, Value};

/// The key that stands for a number which `serde_json` keeps as text, alone in its object.
const NUMBER: &str = "$serde_json::private::Number";

/// A value, or the first place where a key of an object is repeated.
#[derive(Clone, Debug)]
pub struct UniqueJson {
    value: Value,
    repeated: Option<String>,
}

impl UniqueJson {
    /// The value.
    ///
    /// # Errors
    /// The path of the first repeated key, such as `multiplet[0].copies`.
    pub fn into_value(self) -> Result<Value, String> {
        self.repeated.map_or(Ok(self.value), Err)
    }
}

impl<'de> Deserialize<'de> for UniqueJson {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        let mut repeated = None;
        let place = Place {
            path: String::new(),
            repeated: &mut repeated,
        };
        let value = place.deserialize(deserializer)?;
        Ok(Self { value, repeated })
    }
}

/// The value at one path.
struct Place<'a> {
    path: String,
    repeated: &'a mut Option<String>,
}

impl Place<'_> {
    fn key(&mut self, key: &str) -> Place<'_> {
        let point = if self.path.is_empty() { "" } else { "." };
        Place {
            path: format!("{}{point}{key}", self.path),
            repeated: self.repeated,
        }
    }

    fn item(&mut self, index: usize) -> Place<'_> {
        Place {
            path: format!("{}[{index}]", self.path),
            repeated: self.repeated,
        }
    }
}

impl<'de> DeserializeSeed<'de> for Place<'_> {
    type Value = Value;

    fn deserialize<D: Deserializer<'de>>(self, deserializer: D) -> Result<Value, D::Error> {
        deserializer.deserialize_any(self)
    }
}

impl<'de> Visitor<'de> for Place<'_> {
    type Value = Value;

    fn expecting(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str("a JSON value")
    }

    fn visit_unit<E>(self) -> Result<Value, E> {
        Ok(Value::Null)
    }

    fn visit_none<E>(self) -> Result<Value, E> {
        Ok(Value::Null)
    }

    fn visit_some<D: Deserializer<'de>>(self, deserializer: D) -> Result<Value, D::Error> {
        deserializer.deserialize_any(self)
    }

    fn visit_bool<E>(self, value: bool) -> Result<Value, E> {
        Ok(Value::Bool(value))
    }

    fn visit_i64<E>(self, value: i64) -> Result<Value, E> {
        Ok(value.into())
    }

    fn visit_u64<E>(self, value: u64) -> Result<Value, E> {
        Ok(value.into())
    }

    fn visit_f64<E>(self, value: f64) -> Result<Value, E> {
        Ok(value.into())
    }

    fn visit_str<E>(self, text: &str) -> Result<Value, E> {
        Ok(Value::String(text.to_owned()))
    }

    fn visit_string<E>(self, text: String) -> Result<Value, E> {
        Ok(Value::String(text))
    }

    fn visit_seq<A: SeqAccess<'de>>(mut self, mut items: A) -> Result<Value, A::Error> {
        let mut list = Vec::new();
        while let Some(item) = items.next_element_seed(self.item(list.len()))? {
            list.push(item);
        }
        Ok(Value::Array(list))
    }

    fn visit_map<A: MapAccess<'de>>(mut self, mut members: A) -> Result<Value, A::Error> {
        let mut object = Map::new();
        while let Some(key) = members.next_key::<String>()? {
            if key == NUMBER && object.is_empty() {
                let digits: String = members.next_value()?;
                let number: Number = digits.parse().map_err(de::Error::custom)?;
                return Ok(Value::Number(number));
            }
            let mut place = self.key(&key);
            if object.contains_key(&key) {
                let path = std::mem::take(&mut place.path);
                place.repeated.get_or_insert(path);
            }
            let value = members.next_value_seed(self.key(&key))?;
            object.insert(key, value);
        }
        Ok(Value::Object(object))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn read(text: &str) -> Result<Value, String> {
        serde_json::from_str::<UniqueJson>(text)
            .unwrap()
            .into_value()
    }

    #[test]
    fn a_repeated_key_has_a_path() {
        for (text, path) in [
            (r#"{"a": 1, "a": 1}"#, "a"),
            (r#"{"a": [0, {"b": 1, "c": {}, "b": 2}]}"#, "a[1].b"),
            (r#"[[{"x": {"y": 1, "\u0079": 2}}]]"#, "[0][0].x.y"),
            (r#"{"a": {"b": 1, "b": 2}, "a": 3}"#, "a.b"),
        ] {
            assert_eq!(read(text).unwrap_err(), path, "{text}");
        }
    }

    /// Without repeated keys it is the value that `serde_json` reads, every digit kept.
    #[test]
    fn the_same_value() {
        let text = r#"{"b": [1, -2, 0.1000000000000000000000000001, 123456789012345678901234567890,
            1e400, true, null, "x"], "a": {"b": {}, "a": []}}"#;
        let expected: Value = serde_json::from_str(text).unwrap();
        assert_eq!(read(text).unwrap(), expected);
        assert_eq!(read(text).unwrap().to_string(), expected.to_string());
    }
}
