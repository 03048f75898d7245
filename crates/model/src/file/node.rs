//! A tree of values with the place of each, the same for TOML and JSON.

use std::ops::Range;

use num_bigint::BigInt;
use num_traits::Num;
use toml::de::{DeTable, DeValue};

use super::ModelFileError;

/// How deep tables and lists may stand in each other; a model needs 5.
const MOST_DEPTH: usize = 16;
/// Digits of a number that is not decimal, beyond which it stays as it is written.
const MOST_DIGITS: usize = 64;

/// A value and where it stands.
#[derive(Debug)]
pub(super) struct Node {
    /// Bytes of the text; empty for JSON.
    pub(super) span: Range<usize>,
    pub(super) value: Value,
}

/// What can stand in a model file. Numbers are kept as text: nothing is rounded.
#[derive(Debug)]
pub(super) enum Value {
    Text(String),
    Whole(String),
    Decimal(String),
    Boolean(bool),
    List(Vec<Node>),
    Table(Vec<Entry>),
    Date,
    Null,
}

/// A key of a table, and its value.
#[derive(Debug)]
pub(super) struct Entry {
    pub(super) key: String,
    pub(super) key_span: Range<usize>,
    pub(super) node: Node,
}

impl Node {
    /// The tree of a parsed document, whose parser has bounded its depth.
    pub(super) fn from_toml(span: Range<usize>, table: &DeTable<'_>) -> Self {
        let entries = table.iter().map(|(key, value)| Entry {
            key: key.get_ref().to_string(),
            key_span: key.span(),
            node: Self::from_toml_value(value.span(), value.get_ref()),
        });
        let mut entries: Vec<Entry> = entries.collect();
        // As written: the first mistake is then the one reported.
        entries.sort_by_key(|entry| entry.key_span.start);
        Self {
            span,
            value: Value::Table(entries),
        }
    }

    fn from_toml_value(span: Range<usize>, value: &DeValue<'_>) -> Self {
        let value = match value {
            DeValue::String(text) => Value::Text(text.to_string()),
            DeValue::Integer(number) => Value::Whole(decimal_digits(number)),
            DeValue::Float(number) => Value::Decimal(number.as_str().to_owned()),
            DeValue::Boolean(value) => Value::Boolean(*value),
            DeValue::Datetime(_) => Value::Date,
            DeValue::Array(items) => {
                let items = items.iter();
                let nodes = items.map(|item| Self::from_toml_value(item.span(), item.get_ref()));
                Value::List(nodes.collect())
            }
            DeValue::Table(table) => return Self::from_toml(span, table),
        };
        Self { span, value }
    }

    /// The tree of a JSON value.
    ///
    /// # Errors
    /// Where it is nested deeper than any model.
    pub(super) fn from_json(value: &serde_json::Value) -> Result<Self, ModelFileError> {
        Self::from_json_at(value, 0)
    }

    fn from_json_at(value: &serde_json::Value, depth: usize) -> Result<Self, ModelFileError> {
        use serde_json::Value as Json;
        if depth > MOST_DEPTH {
            return Err(ModelFileError::without_place(
                format!("it is nested more than {MOST_DEPTH} deep"),
                "write a model of the model file's shape".into(),
            ));
        }
        let value = match value {
            Json::Null => Value::Null,
            Json::Bool(value) => Value::Boolean(*value),
            Json::Number(number) => number_of(&number.to_string()),
            Json::String(text) => Value::Text(text.clone()),
            Json::Array(items) => {
                let nodes = items.iter().map(|item| Self::from_json_at(item, depth + 1));
                Value::List(nodes.collect::<Result<_, _>>()?)
            }
            Json::Object(members) => {
                let entries = members.iter().map(|(key, value)| {
                    Ok(Entry {
                        key: key.clone(),
                        key_span: 0..0,
                        node: Self::from_json_at(value, depth + 1)?,
                    })
                });
                Value::Table(entries.collect::<Result<_, ModelFileError>>()?)
            }
        };
        Ok(Self { span: 0..0, value })
    }

    /// What it is, for a message: `the text "three"`, `a list`.
    pub(super) fn described(&self) -> String {
        use crate::suggestion::shortened;
        match &self.value {
            Value::Text(text) => format!("the text \"{}\"", shortened(text)),
            Value::Whole(digits) => format!("the number {}", shortened(digits)),
            Value::Decimal(digits) => format!("the decimal {}", shortened(digits)),
            Value::Boolean(value) => value.to_string(),
            Value::List(_) => "a list".into(),
            Value::Table(_) => "a table".into(),
            Value::Date => "a date".into(),
            Value::Null => "null".into(),
        }
    }

    /// Its entries, where it is a table.
    pub(super) fn entries(&self) -> &[Entry] {
        match &self.value {
            Value::Table(entries) => entries,
            _ => &[],
        }
    }

    /// The path from here to `target`, such as `multiplet[3].transforms.weak`.
    pub(super) fn path_to(&self, target: &Place<'_>) -> Option<String> {
        match (target, &self.value) {
            (Place::Node(node), _) if std::ptr::eq(*node, self) => Some(String::new()),
            (_, Value::List(items)) => items.iter().enumerate().find_map(|(i, item)| {
                let rest = item.path_to(target)?;
                Some(format!("[{i}]{}", joined(rest)))
            }),
            (_, Value::Table(entries)) => entries.iter().find_map(|entry| {
                if matches!(target, Place::Key(key) if std::ptr::eq(*key, entry)) {
                    return Some(entry.key.clone());
                }
                let rest = entry.node.path_to(target)?;
                Some(format!("{}{}", entry.key, joined(rest)))
            }),
            _ => None,
        }
    }
}

/// The rest of a path, with a point where it begins with a key.
fn joined(rest: String) -> String {
    if rest.is_empty() || rest.starts_with('[') {
        rest
    } else {
        format!(".{rest}")
    }
}

/// A place in the tree that a message points at.
#[derive(Clone, Copy, Debug)]
pub(super) enum Place<'a> {
    /// A value.
    Node(&'a Node),
    /// A key.
    Key(&'a Entry),
}

impl Place<'_> {
    pub(super) fn span(&self) -> Range<usize> {
        match self {
            Self::Node(node) => node.span.clone(),
            Self::Key(entry) => entry.key_span.clone(),
        }
    }
}

/// Whole where it is written with digits alone.
fn number_of(text: &str) -> Value {
    let digits = text.strip_prefix('-').unwrap_or(text);
    if digits.bytes().all(|b| b.is_ascii_digit()) {
        Value::Whole(text.to_owned())
    } else {
        Value::Decimal(text.to_owned())
    }
}

/// The number in base ten; as it is written where it has more digits than any number that fits.
fn decimal_digits(number: &toml::de::DeInteger<'_>) -> String {
    let (digits, radix) = (number.as_str(), number.radix());
    let short = radix != 10 && digits.len() <= MOST_DIGITS;
    let value = short.then(|| BigInt::from_str_radix(digits, radix).ok());
    value
        .flatten()
        .map_or_else(|| number.to_string(), |value| value.to_string())
}
