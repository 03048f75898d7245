//! Values of single keys, whose errors name the key and what belongs there.

use serde::de::{Deserialize, Deserializer, Error};
use serde_json::Value;

use super::{is_whole, shown};
use crate::answer::WeightsAsked;

pub(super) fn weights<'de, D: Deserializer<'de>>(
    deserializer: D,
) -> Result<Option<WeightsAsked>, D::Error> {
    let value = Value::deserialize(deserializer)?;
    match value.as_str() {
        _ if value.is_null() => Ok(None),
        Some("dominant") => Ok(Some(WeightsAsked::Dominant)),
        Some("all") => Ok(Some(WeightsAsked::All)),
        _ => Err(D::Error::custom(format!(
            "\"weights\" cannot be {}: it is \"dominant\" or \"all\"",
            shown(&value)
        ))),
    }
}

/// A partition may be a list of whole numbers.
pub(super) fn symmetry<'de, D: Deserializer<'de>>(deserializer: D) -> Result<String, D::Error> {
    let value = Value::deserialize(deserializer)?;
    let parts = value.as_array().and_then(|parts| {
        let part = |part: &Value| match part {
            Value::Number(part) if is_whole(part) => Some(part.to_string()),
            _ => None,
        };
        let parts: Option<Vec<String>> = parts.iter().map(part).collect();
        Some(parts?.join(","))
    });
    match (value, parts) {
        (Value::String(written), _) | (_, Some(written)) => Ok(written),
        (other, None) => Err(D::Error::custom(format!(
            "\"symmetry\" cannot be {}: it is \"symmetric\", \"antisymmetric\" or a partition such \
             as \"2,1\" or [2,1]",
            shown(&other)
        ))),
    }
}

pub(super) fn degree<'de, D: Deserializer<'de>>(d: D) -> Result<Option<u32>, D::Error> {
    whole(d, "degree", u32::MAX.into())
}

pub(super) fn limit<'de, D: Deserializer<'de>>(d: D) -> Result<Option<usize>, D::Error> {
    whole(d, "limit", usize::MAX as u64)
}

pub(super) fn max_terms<'de, D: Deserializer<'de>>(d: D) -> Result<Option<usize>, D::Error> {
    whole(d, "max_terms", usize::MAX as u64)
}

/// For lists of weights a `usize`, for walks through weights a `u64`.
pub(super) fn max_weights<'de, D: Deserializer<'de>, N: TryFrom<u64>>(
    d: D,
) -> Result<Option<N>, D::Error> {
    whole(d, "max_weights", u64::MAX)
}

fn whole<'de, D: Deserializer<'de>, N: TryFrom<u64>>(
    deserializer: D,
    key: &str,
    most: u64,
) -> Result<Option<N>, D::Error> {
    let value = Value::deserialize(deserializer)?;
    if value.is_null() {
        return Ok(None);
    }
    let number = value.as_u64().and_then(|number| number.try_into().ok());
    number.map(Some).ok_or_else(|| {
        D::Error::custom(format!(
            "\"{key}\" cannot be {}: it is a whole number from 0 to {most}",
            shown(&value)
        ))
    })
}

pub(super) fn max_dominant_weights<'de, D: Deserializer<'de>>(
    d: D,
) -> Result<Option<usize>, D::Error> {
    whole(d, "max_dominant_weights", usize::MAX as u64)
}
