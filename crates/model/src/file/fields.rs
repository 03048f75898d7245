//! Reading a table by its keys.

use super::diagnostic::Fault;
use super::node::{Entry, Node, Place, Value};
use crate::suggestion::Choice;

/// A table whose keys are all known.
pub(super) struct Fields<'a> {
    node: &'a Node,
    entries: &'a [Entry],
}

impl<'a> Fields<'a> {
    /// The table `node`, called `what` in messages, which has no keys but `keys`.
    pub(super) fn open(
        node: &'a Node,
        what: &str,
        keys: &[&'static str],
    ) -> Result<Self, Fault<'a>> {
        let Value::Table(entries) = &node.value else {
            let help = format!("write a table with the keys {}", keys.join(", "));
            return Err(mistyped(node, what, "a table", help));
        };
        for entry in entries {
            if !keys.contains(&&*entry.key) {
                let choice = Choice::new(&entry.key, keys.iter().copied());
                let message = format!("{what} has no key \"{}\"", choice.written());
                return Err(Fault::new(Place::Key(entry), message, choice.to_string()));
            }
        }
        Ok(Self { node, entries })
    }

    pub(super) fn get(&self, key: &str) -> Option<&'a Node> {
        let mut entries = self.entries.iter();
        entries
            .find(|entry| entry.key == key)
            .map(|entry| &entry.node)
    }

    /// The value at `key`, or an error at the head of the table that says what to write.
    pub(super) fn require(
        &self,
        key: &str,
        what: &str,
        help: impl FnOnce() -> String,
    ) -> Result<&'a Node, Fault<'a>> {
        self.get(key).ok_or_else(|| {
            let message = format!("{what} has no {key}");
            Fault::new(Place::Node(self.node), message, help())
        })
    }

    pub(super) fn text(&self, key: &str, example: &str) -> Result<Option<&'a str>, Fault<'a>> {
        self.get(key)
            .map(|node| text(node, key, example))
            .transpose()
    }

    pub(super) fn boolean(&self, key: &str) -> Result<bool, Fault<'a>> {
        match self.get(key).map(|node| (node, &node.value)) {
            None => Ok(false),
            Some((_, Value::Boolean(value))) => Ok(*value),
            Some((node, _)) => {
                let help = format!("write {key} = true, or leave it out");
                Err(mistyped(node, key, "true or false", help))
            }
        }
    }

    /// The tables of a list; none where the key is absent.
    pub(super) fn list(&self, key: &str) -> Result<&'a [Node], Fault<'a>> {
        match self.get(key).map(|node| (node, &node.value)) {
            None => Ok(&[]),
            Some((_, Value::List(items))) => Ok(items),
            Some((node, _)) => {
                let help = format!("write [[{key}]] in double brackets, once for each");
                Err(mistyped(node, key, "a list of tables", help))
            }
        }
    }
}

pub(super) fn text<'a>(node: &'a Node, key: &str, example: &str) -> Result<&'a str, Fault<'a>> {
    match &node.value {
        Value::Text(text) => Ok(text),
        _ => {
            let help = format!("write text in quotation marks, such as \"{example}\"");
            Err(mistyped(node, key, "text", help))
        }
    }
}

/// A value of another type than belongs there.
pub(super) fn mistyped<'a>(node: &'a Node, what: &str, expected: &str, help: String) -> Fault<'a> {
    let message = format!("{what} takes {expected}, not {}", node.described());
    Fault::new(Place::Node(node), message, help)
}
