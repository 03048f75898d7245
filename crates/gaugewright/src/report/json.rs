//! Numbers as JSON has them here: whole ones of any length, fractions as strings.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use serde::{Serialize, Serializer};
use serde_json::Number;

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

/// One object on one line.
///
/// # Errors
/// Where a value has no JSON form; none of this crate's answers is of that kind.
pub fn to_json_line(answer: &impl Serialize) -> Result<String, serde_json::Error> {
    serde_json::to_string(answer)
}
