//! The feature `serde`: algebras as their names, irreps as algebra and labels.
//!
//! ```
//! let spinor = "SO(10)".parse::<roots::SimpleAlgebra>()?.read_irrep("16")?;
//! let json = serde_json::to_string(&spinor)?;
//! assert_eq!(json, r#"{"algebra":"SO(10)","labels":[0,0,0,0,1]}"#);
//! assert_eq!(serde_json::from_str::<roots::Irrep>(&json)?, spinor);
//! # Ok::<(), Box<dyn std::error::Error>>(())
//! ```

use std::fmt::Display;
use std::str::FromStr;

use serde::de::{Deserializer, Error};
use serde::ser::Serializer;
use serde::{Deserialize, Serialize};

use crate::{Irrep, Numbering, ReductiveAlgebra, SimpleAlgebra};

fn read<'de, D: Deserializer<'de>, T: FromStr<Err: Display>>(from: D) -> Result<T, D::Error> {
    String::deserialize(from)?.parse().map_err(D::Error::custom)
}

impl Serialize for SimpleAlgebra {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        serializer.collect_str(self)
    }
}

impl<'de> Deserialize<'de> for SimpleAlgebra {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        read(deserializer)
    }
}

impl Serialize for ReductiveAlgebra {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        serializer.collect_str(self)
    }
}

impl<'de> Deserialize<'de> for ReductiveAlgebra {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        read(deserializer)
    }
}

impl Serialize for Numbering {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        serializer.collect_str(self)
    }
}

impl<'de> Deserialize<'de> for Numbering {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        read(deserializer)
    }
}

/// An irrep in its parts, before the labels are counted.
#[derive(Serialize, Deserialize)]
struct Parts {
    algebra: SimpleAlgebra,
    labels: Vec<u32>,
}

impl Serialize for Irrep {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        let (algebra, labels) = (self.algebra(), self.labels().to_vec());
        Parts { algebra, labels }.serialize(serializer)
    }
}

impl<'de> Deserialize<'de> for Irrep {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        let Parts { algebra, labels } = Parts::deserialize(deserializer)?;
        algebra.irrep(&labels).map_err(D::Error::custom)
    }
}

#[cfg(test)]
mod tests {
    use super::{Irrep, SimpleAlgebra};

    #[test]
    fn what_is_read_is_checked() {
        assert!(serde_json::from_str::<SimpleAlgebra>("\"SO(4)\"").is_err());
        let short = r#"{"algebra":"SU(3)","labels":[1]}"#;
        let error = serde_json::from_str::<Irrep>(short)
            .unwrap_err()
            .to_string();
        assert!(error.contains("SU(3) takes 2 Dynkin labels"), "{error}");
    }
}
