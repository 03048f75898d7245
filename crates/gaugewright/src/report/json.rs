//! Numbers as JSON has them here: whole ones of any length, fractions as strings.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use serde::{Serialize, Serializer};
use serde_json::Number;

use super::acts_on_terminals;

/// A quantity that can only be whole: a JSON number of any length.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Whole(BigInt);

impl Whole {
    /// The number.
    #[must_use]
    pub const fn value(&self) -> &BigInt {
        &self.0
    }
}

impl From<BigUint> for Whole {
    fn from(value: BigUint) -> Self {
        Self(value.into())
    }
}

impl From<BigInt> for Whole {
    fn from(value: BigInt) -> Self {
        Self(value)
    }
}

impl Serialize for Whole {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let number: Number = self
            .0
            .to_string()
            .parse()
            .map_err(serde::ser::Error::custom)?;
        number.serialize(serializer)
    }
}

/// A quantity that may be a fraction: a JSON string such as `"-1/6"` or `"2"`.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Exact(BigRational);

impl Exact {
    /// The number.
    #[must_use]
    pub const fn value(&self) -> &BigRational {
        &self.0
    }
}

impl From<BigRational> for Exact {
    fn from(value: BigRational) -> Self {
        Self(value)
    }
}

impl From<BigInt> for Exact {
    fn from(value: BigInt) -> Self {
        Self(value.into())
    }
}

impl Serialize for Exact {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        serializer.collect_str(&self.0)
    }
}

/// One object on one line, with nothing in it that acts on a terminal.
///
/// # Errors
/// Where a value has no JSON form; none of this crate's answers is of that kind.
pub fn to_json_line(answer: &impl Serialize) -> Result<String, serde_json::Error> {
    let line = serde_json::to_string(answer)?;
    if !line.contains(acts_on_terminals) {
        return Ok(line);
    }
    // Outside strings the line is ASCII, so what is found stands in one and may be escaped there.
    let mut out = String::with_capacity(line.len() + 8);
    for c in line.chars() {
        if acts_on_terminals(c) {
            out.push_str(&format!("\\u{:04x}", u32::from(c)));
        } else {
            out.push(c);
        }
    }
    Ok(out)
}
