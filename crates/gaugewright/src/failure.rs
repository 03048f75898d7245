//! Why a request has no answer.

use std::io;
use std::path::{Path, PathBuf};

use roots::LimitKind;

/// Unusable input: what was wrong, where, and what to write instead.
#[derive(Debug, thiserror::Error)]
#[non_exhaustive]
pub enum Failure {
    /// A name, label or bound.
    #[error(transparent)]
    Algebra(roots::Error),
    /// An answer beyond a limit that an option raises.
    #[error("{error} ({})", written(.limit))]
    BeyondLimit {
        /// What is beyond it.
        error: roots::Error,
        /// Which limit it is.
        limit: LimitKind,
    },
    /// A catalogue beyond its limit.
    #[error("{0} (--limit, in a batch limit)")]
    TooMany(roots::Error),
    /// A power whose symmetry and degree do not fit together.
    #[error(
        "{0}; give a degree such as 2 with the symmetry symmetric or antisymmetric, \
         or as symmetry a partition of the degree such as 2,1"
    )]
    Power(String),
    /// A line of a batch that is no request.
    #[error(
        "{0}; write one JSON object such as {{\"command\": \"irrep\", \"algebra\": \"SO(10)\", \"irrep\": \"16\"}}"
    )]
    Request(String),
    /// A number that is none.
    #[error("\"{written}\" is no whole number; write the {what} in digits, such as 1000")]
    Number {
        /// What was written.
        written: String,
        /// What it should have been.
        what: &'static str,
    },
    /// Anomalies that cannot be summed: a charge is unknown, or there are too many.
    #[error(transparent)]
    Anomalies(#[from] anomaly::ReportError),
    /// A model that is wrong.
    #[error("model: {0}")]
    Model(#[from] model::ModelFileError),
    /// A model in JSON with a key written twice in one object.
    #[error("model: {path}: this key is written twice in one object; write it once")]
    RepeatedKey {
        /// Where the second one stands, such as `multiplet[0].copies`.
        path: String,
    },
    /// A model file with a mistake.
    #[error("{}: {error}", .path.display())]
    ModelFile {
        /// The file.
        path: PathBuf,
        /// The mistake.
        error: model::ModelFileError,
    },
    /// A model file that cannot be read.
    #[error("{} cannot be read: {why}; name a model file, which is TOML text", .path.display())]
    UnreadableModel {
        /// The file.
        path: PathBuf,
        /// Why.
        why: String,
    },
    /// A file of requests that cannot be read.
    #[error("{} cannot be read: {why}; name a file of requests, or - for standard input", .path.display())]
    Unreadable {
        /// The file.
        path: PathBuf,
        /// Why.
        why: String,
    },
    /// Standard output or a file that cannot be written.
    #[error("the answer cannot be written: {0}")]
    Output(io::Error),
}

impl From<roots::Error> for Failure {
    fn from(error: roots::Error) -> Self {
        match error {
            roots::Error::BeyondLimit {
                raised_by: Some(limit),
                ..
            } => Self::BeyondLimit { error, limit },
            roots::Error::TooMany { .. } => Self::TooMany(error),
            _ => Self::Algebra(error),
        }
    }
}

/// The option that raises the limit.
const fn written(limit: &LimitKind) -> &'static str {
    match limit {
        LimitKind::Terms => "--max-terms, in a batch max_terms",
        LimitKind::DominantWeights => "--max-dominant-weights, in a batch max_dominant_weights",
        LimitKind::Weights => "--max-weights, in a batch max_weights",
    }
}

impl Failure {
    /// A file that cannot be read, and why.
    #[must_use]
    pub fn unreadable(path: &Path, why: impl ToString) -> Self {
        Self::Unreadable {
            path: path.to_owned(),
            why: why.to_string(),
        }
    }
}
