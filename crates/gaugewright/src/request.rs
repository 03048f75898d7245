//! What is asked: one request, from the command line or from a line of a batch.

use model::Model;
use num_bigint::BigUint;
use roots::{CatalogBound, Irrep, Limits, Numbering, SimpleAlgebra};
use serde::Deserialize;
use serde::de::{self, Deserializer};
use serde_json::Value;

mod keys;
mod unique_json;

pub use unique_json::UniqueJson;

use crate::Failure;
use crate::answer::{
    AlgebraAnswer, AnomaliesAnswer, Answer, AuditAnswer, CATALOG_LIMIT, CatalogAnswer,
    DecompositionAnswer, IrrepAnswer, PowerSymmetry, WeightsAsked,
};

/// One request; the field names are those of a line of a batch.
#[derive(Clone, Debug, Deserialize)]
#[serde(
    tag = "command",
    rename_all = "lowercase",
    deny_unknown_fields,
    expecting = "an object with the key \"command\""
)]
#[non_exhaustive]
pub enum Request {
    /// Facts of one simple algebra.
    Algebra {
        /// Its name.
        algebra: String,
    },
    /// Facts of one irrep.
    Irrep {
        /// Name of its algebra.
        algebra: String,
        /// Its name or labels.
        irrep: IrrepText,
        /// Which weights are listed.
        #[serde(default, deserialize_with = "keys::weights")]
        weights: Option<WeightsAsked>,
        /// How many weights may be listed.
        #[serde(default, deserialize_with = "keys::max_weights")]
        max_weights: Option<usize>,
    },
    /// A tensor product.
    Product {
        /// Name of the algebra.
        algebra: String,
        /// The irreps that are multiplied.
        factors: Vec<IrrepText>,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_terms")]
        max_terms: Option<usize>,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_weights")]
        max_weights: Option<u64>,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_dominant_weights")]
        max_dominant_weights: Option<usize>,
    },
    /// The part of a tensor power with one symmetry.
    Power {
        /// Name of the algebra.
        algebra: String,
        /// The irrep.
        irrep: IrrepText,
        /// The degree, which a partition tells by itself.
        #[serde(default, deserialize_with = "keys::degree")]
        degree: Option<u32>,
        /// `symmetric`, which it is unless given, `antisymmetric` or a partition such as `2,1`.
        #[serde(default = "symmetric", deserialize_with = "keys::symmetry")]
        symmetry: String,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_terms")]
        max_terms: Option<usize>,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_weights")]
        max_weights: Option<u64>,
        /// Limits of one's own.
        #[serde(default, deserialize_with = "keys::max_dominant_weights")]
        max_dominant_weights: Option<usize>,
    },
    /// Irreps up to a bound.
    Catalog {
        /// Name of their algebra.
        algebra: String,
        /// Largest dimension.
        #[serde(default)]
        max_dimension: Option<WholeText>,
        /// Largest Dynkin index.
        #[serde(default)]
        max_index: Option<WholeText>,
        /// How many may be listed.
        #[serde(default, deserialize_with = "keys::limit")]
        limit: Option<usize>,
    },
    /// Every anomaly condition of a model.
    Anomalies {
        /// The model.
        model: ModelText,
    },
    /// Everything about a model.
    Audit {
        /// The model; the built-in demonstration unless given.
        #[serde(default)]
        model: Option<ModelText>,
    },
}

impl Request {
    /// Reads one line of a batch.
    ///
    /// # Errors
    /// [`Failure::Request`] where the line is no request.
    pub fn from_json_line(line: &str) -> Result<Self, Failure> {
        serde_json::from_str(line).map_err(|error| Failure::Request(in_json_words(&error)))
    }

    /// The answer, with nodes in the order of `numbering`.
    ///
    /// # Errors
    /// What is wrong with the request, and what to write instead.
    pub fn answer(self, numbering: Numbering) -> Result<Box<dyn Answer>, Failure> {
        Ok(match self {
            Self::Algebra { algebra } => {
                Box::new(AlgebraAnswer::new(read_algebra(&algebra)?, numbering))
            }
            Self::Irrep {
                algebra,
                irrep,
                weights,
                max_weights,
            } => {
                let irrep = irrep.read(read_algebra(&algebra)?, numbering)?;
                Box::new(match weights {
                    None => IrrepAnswer::new(irrep, numbering),
                    Some(asked) => IrrepAnswer::with_weights(irrep, asked, max_weights, numbering)?,
                })
            }
            Self::Product {
                algebra,
                factors,
                max_terms,
                max_weights,
                max_dominant_weights,
            } => {
                let algebra = read_algebra(&algebra)?;
                let read = factors.iter().map(|factor| factor.read(algebra, numbering));
                let factors = read.collect::<Result<Vec<_>, _>>()?;
                let limits = limits(max_terms, max_weights, max_dominant_weights);
                Box::new(DecompositionAnswer::product(
                    algebra, &factors, &limits, numbering,
                )?)
            }
            Self::Power {
                algebra,
                irrep,
                degree,
                symmetry,
                max_terms,
                max_weights,
                max_dominant_weights,
            } => {
                let irrep = irrep.read(read_algebra(&algebra)?, numbering)?;
                let symmetry = PowerSymmetry::read(&symmetry, degree)?;
                let limits = limits(max_terms, max_weights, max_dominant_weights);
                Box::new(DecompositionAnswer::power(
                    &irrep, &symmetry, &limits, numbering,
                )?)
            }
            Self::Catalog {
                algebra,
                max_dimension,
                max_index,
                limit,
            } => {
                let algebra = read_algebra(&algebra)?;
                let bound = bound(algebra, max_dimension, max_index)?;
                let limit = limit.unwrap_or(CATALOG_LIMIT);
                Box::new(CatalogAnswer::new(algebra, bound, limit, numbering)?)
            }
            Self::Anomalies { model } => Box::new(AnomaliesAnswer::new(&model.read()?)?),
            Self::Audit { model: None } => Box::new(AuditAnswer::new(model::demo(), numbering)?),
            Self::Audit { model: Some(model) } => {
                Box::new(AuditAnswer::new(model.read()?, numbering)?)
            }
        })
    }
}

/// The error in the words of JSON instead of those of a Rust type.
fn in_json_words(error: &serde_json::Error) -> String {
    let words = [
        ("unknown variant", "unknown command"),
        ("unknown field", "unknown key"),
        ("missing field", "missing key"),
        ("duplicate field", "duplicate key"),
        ("expected variant identifier", "expected a JSON object"),
        ("sequence", "list"),
        ("expected ident", "expected a value"),
        // A request is one line.
        (" at line 1 column", " at column"),
    ];
    let mut said = error.to_string();
    if error.is_syntax() {
        said = format!("the line is no JSON: {said}");
    }
    for (rust, json) in words {
        said = said.replacen(rust, json, 1);
    }
    said
}

fn symmetric() -> String {
    "symmetric".to_owned()
}

fn read_algebra(written: &str) -> Result<SimpleAlgebra, Failure> {
    Ok(written.parse()?)
}

fn limits(
    max_terms: Option<usize>,
    max_weights: Option<u64>,
    max_dominant_weights: Option<usize>,
) -> Limits {
    let mut limits = Limits::default();
    if let Some(terms) = max_terms {
        limits = limits.with_terms(terms);
    }
    if let Some(weights) = max_weights {
        limits = limits.with_weights(weights);
    }
    if let Some(weights) = max_dominant_weights {
        limits = limits.with_dominant_weights(weights);
    }
    limits
}

fn bound(
    algebra: SimpleAlgebra,
    max_dimension: Option<WholeText>,
    max_index: Option<WholeText>,
) -> Result<CatalogBound, Failure> {
    match (max_dimension, max_index) {
        (Some(_), Some(_)) => Err(Failure::Request(
            "max_dimension and max_index cannot both bound a catalogue".to_owned(),
        )),
        (Some(most), None) => Ok(CatalogBound::Dimension(most.read("largest dimension")?)),
        (None, Some(most)) => Ok(CatalogBound::DynkinIndex(most.read("largest index")?)),
        (None, None) => Ok(CatalogAnswer::usual_bound(algebra)),
    }
}

/// An irrep as it is written: a name, labels in brackets, or in JSON a list of labels.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum IrrepText {
    /// A name or labels in brackets.
    Written(String),
    /// One label per node.
    Labels(Vec<u32>),
}

impl IrrepText {
    /// The irrep of `algebra` that is meant.
    ///
    /// # Errors
    /// What is wrong with the text or the labels.
    pub fn read(&self, algebra: SimpleAlgebra, numbering: Numbering) -> Result<Irrep, Failure> {
        Ok(match self {
            Self::Written(written) => algebra.read_irrep_in(numbering, written)?,
            Self::Labels(labels) => {
                // The count is checked before nodes are rearranged.
                let irrep = algebra.irrep(labels)?;
                algebra.irrep(&numbering.to_slansky(algebra.cartan_type(), irrep.labels()))?
            }
        })
    }
}

impl<'de> Deserialize<'de> for IrrepText {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        match Value::deserialize(deserializer)? {
            Value::String(written) => Ok(Self::Written(written)),
            Value::Number(dimension) if is_whole(&dimension) => {
                Ok(Self::Written(dimension.to_string()))
            }
            Value::Array(labels) => {
                let labels = labels.iter().map(label);
                Ok(Self::Labels(labels.collect::<Result<_, _>>()?))
            }
            other => Err(de::Error::custom(format!(
                "{} is no irrep: it is a name such as \"16\" or a list of Dynkin labels such as \
                 [0,0,0,0,1]",
                shown(&other)
            ))),
        }
    }
}

fn is_whole(number: &serde_json::Number) -> bool {
    number.as_str().bytes().all(|byte| byte.is_ascii_digit())
}

fn label<E: de::Error>(value: &Value) -> Result<u32, E> {
    let label = value.as_u64().and_then(|label| label.try_into().ok());
    label.ok_or_else(|| {
        let most = u32::MAX;
        let value = shown(value);
        E::custom(format!(
            "{value} is no Dynkin label: labels are whole numbers from 0 to {most}"
        ))
    })
}

/// The value as it was written, cut where it is too long to repeat.
fn shown(value: &Value) -> String {
    const MOST: usize = 60;
    let written = value.to_string();
    match written.char_indices().nth(MOST) {
        Some((end, _)) => format!("{}...", &written[..end]),
        None => written,
    }
}

/// A whole number of any length: a JSON number, or digits in a string.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct WholeText(String);

impl WholeText {
    fn read(&self, what: &'static str) -> Result<BigUint, Failure> {
        const MOST_DIGITS: usize = 1000;
        let digits = self.0.len() <= MOST_DIGITS && self.0.bytes().all(|b| b.is_ascii_digit());
        let value = digits.then(|| self.0.parse().ok()).flatten();
        value.ok_or_else(|| Failure::Number {
            written: self.0.chars().take(60).collect(),
            what,
        })
    }
}

impl From<String> for WholeText {
    fn from(written: String) -> Self {
        Self(written)
    }
}

impl<'de> Deserialize<'de> for WholeText {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        match Value::deserialize(deserializer)? {
            Value::Number(number) => Ok(Self(number.to_string())),
            Value::String(written) => Ok(Self(written)),
            other => Err(de::Error::custom(format!(
                "{} is no whole number",
                shown(&other)
            ))),
        }
    }
}

/// A model: one that has been read, or in JSON an object of the model file's shape.
#[derive(Clone, Debug)]
pub enum ModelText {
    /// A model that has been read.
    Read(Box<Model>),
    /// An object of the model file's shape.
    Inline(UniqueJson),
}

impl ModelText {
    fn read(self) -> Result<Model, Failure> {
        Ok(match self {
            Self::Read(model) => *model,
            Self::Inline(json) => {
                let value = json.into_value();
                let value = value.map_err(|path| Failure::RepeatedKey { path })?;
                Model::from_json(&value)?
            }
        })
    }
}

impl<'de> Deserialize<'de> for ModelText {
    fn deserialize<D: Deserializer<'de>>(deserializer: D) -> Result<Self, D::Error> {
        UniqueJson::deserialize(deserializer).map(Self::Inline)
    }
}
