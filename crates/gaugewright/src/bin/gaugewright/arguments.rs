//! What can be typed.

use std::path::PathBuf;

use clap::{Args, Parser, Subcommand, ValueEnum};
use gaugewright::Failure;
use gaugewright::answer::WeightsAsked;
use gaugewright::request::{IrrepText, Request};
use roots::Numbering;

use crate::model_input;

/// From a gauge group and multiplets to an exact verdict.
#[derive(Debug, Parser)]
#[command(version, max_term_width = 96, propagate_version = true)]
pub(crate) struct Arguments {
    /// How the answer is written.
    #[arg(long, global = true, value_enum, default_value_t = Format::Text)]
    pub(crate) format: Format,

    /// How nodes of Dynkin diagrams are counted, on input and output: slansky or bourbaki.
    #[arg(long, global = true, default_value_t, value_name = "NAME")]
    pub(crate) numbering: Numbering,

    #[command(subcommand)]
    pub(crate) command: Command,
}

/// The formats of an answer.
#[derive(Clone, Copy, Debug, PartialEq, Eq, ValueEnum)]
pub(crate) enum Format {
    /// For a terminal.
    Text,
    /// One JSON object.
    Json,
    /// LaTeX that compiles by itself and can be \input.
    Latex,
}

#[derive(Debug, Subcommand)]
pub(crate) enum Command {
    /// Facts of one simple algebra: roots, Cartan matrix, exponents, centre.
    Algebra {
        /// Its name, e.g. "SU(5)", so10, E6, D5.
        algebra: String,
    },
    /// Facts of one irrep: dimension, indices, reality, class.
    Irrep {
        /// The algebra's name, e.g. "SO(10)".
        algebra: String,
        /// A name such as 16bar, or Dynkin labels such as "(0,0,0,1,0)".
        #[arg(allow_negative_numbers = true)]
        irrep: String,
        /// List its weights with their multiplicities.
        #[arg(long, value_enum, value_name = "WHICH")]
        weights: Option<Weights>,
        /// How many weights may be listed; a million unless given.
        #[arg(long, value_name = "N", requires = "weights")]
        max_weights: Option<usize>,
    },
    /// The tensor product of any number of irreps.
    Product {
        /// The algebra's name, e.g. "SU(5)".
        algebra: String,
        /// Names or Dynkin labels, e.g. 10 10 5bar.
        #[arg(required = true, allow_negative_numbers = true)]
        irreps: Vec<String>,
        #[command(flatten)]
        limits: LimitArguments,
    },
    /// The part of a tensor power with one symmetry.
    Power {
        /// The algebra's name, e.g. "SO(10)".
        algebra: String,
        /// A name such as 16, or Dynkin labels.
        #[arg(allow_negative_numbers = true)]
        irrep: String,
        /// The degree; a partition tells it by itself.
        #[arg(long, value_name = "N")]
        degree: Option<u32>,
        /// symmetric, antisymmetric, or a partition such as 2,1.
        #[arg(long, value_name = "SYMMETRY", default_value = "symmetric")]
        symmetry: String,
        #[command(flatten)]
        limits: LimitArguments,
    },
    /// Irreps of an algebra up to a bound.
    Catalog {
        /// The algebra's name, e.g. E8.
        algebra: String,
        /// List irreps up to this dimension; 1000 or 20 times the algebra's own unless given.
        #[arg(
            long,
            value_name = "N",
            conflicts_with = "max_index",
            allow_negative_numbers = true
        )]
        max_dimension: Option<String>,
        /// List irreps up to this Dynkin index.
        #[arg(long, value_name = "N", allow_negative_numbers = true)]
        max_index: Option<String>,
        /// How many irreps may be listed; 100,000 unless given.
        #[arg(long, value_name = "N")]
        limit: Option<usize>,
    },
    /// Every anomaly condition of a model, and what each multiplet adds.
    Anomalies {
        /// The model file; - is standard input.
        model: PathBuf,
    },
    /// Everything about a model: the verdict, why, and what the model is.
    Audit {
        /// The model file; - is standard input. The built-in demonstration unless given.
        model: Option<PathBuf>,
    },
    /// Requests as lines of JSON, one line of JSON out for each, in order.
    ///
    /// A request is e.g. {"command": "irrep", "algebra": "SO(10)", "irrep": "16"}, with the
    /// command's arguments by name; a model is an object of the model file's shape. A bad line
    /// gets {"error": ...} in its place. Answers are JSON whatever --format says.
    Batch {
        /// The file of requests; - is standard input.
        file: PathBuf,
    },
}

/// Limits of one's own.
#[derive(Clone, Copy, Debug, Args)]
pub(crate) struct LimitArguments {
    /// How many different irreps the answer may have; two million unless given.
    #[arg(long, value_name = "N")]
    max_terms: Option<usize>,
    /// How many weights may be walked through; 20 thousand million unless given.
    #[arg(long, value_name = "N")]
    max_weights: Option<u64>,
    /// How many dominant weights one irrep may have; 200 thousand unless given.
    #[arg(long, value_name = "N")]
    max_dominant_weights: Option<usize>,
}

/// Which weights are listed.
#[derive(Clone, Copy, Debug, PartialEq, Eq, ValueEnum)]
pub(crate) enum Weights {
    /// One for each Weyl orbit.
    Dominant,
    /// All of them.
    All,
}

impl Command {
    /// What is meant by what was typed; `Batch` holds many requests and is run by itself.
    pub(crate) fn request(self) -> Result<Request, Failure> {
        Ok(match self {
            Self::Algebra { algebra } => Request::Algebra { algebra },
            Self::Irrep {
                algebra,
                irrep,
                weights,
                max_weights,
            } => Request::Irrep {
                algebra,
                irrep: IrrepText::Written(irrep),
                weights: weights.map(|which| match which {
                    Weights::Dominant => WeightsAsked::Dominant,
                    Weights::All => WeightsAsked::All,
                }),
                max_weights,
            },
            Self::Product {
                algebra,
                irreps,
                limits,
            } => Request::Product {
                algebra,
                factors: irreps.into_iter().map(IrrepText::Written).collect(),
                max_terms: limits.max_terms,
                max_weights: limits.max_weights,
                max_dominant_weights: limits.max_dominant_weights,
            },
            Self::Power {
                algebra,
                irrep,
                degree,
                symmetry,
                limits,
            } => Request::Power {
                algebra,
                irrep: IrrepText::Written(irrep),
                degree,
                symmetry,
                max_terms: limits.max_terms,
                max_weights: limits.max_weights,
                max_dominant_weights: limits.max_dominant_weights,
            },
            Self::Catalog {
                algebra,
                max_dimension,
                max_index,
                limit,
            } => Request::Catalog {
                algebra,
                max_dimension: max_dimension.map(Into::into),
                max_index: max_index.map(Into::into),
                limit,
            },
            Self::Anomalies { model } => Request::Anomalies {
                model: model_input::read(&model)?,
            },
            Self::Audit { model } => Request::Audit {
                model: model.map(|path| model_input::read(&path)).transpose()?,
            },
            Self::Batch { .. } => {
                return Err(Failure::Request("a batch is no single request".to_owned()));
            }
        })
    }
}
