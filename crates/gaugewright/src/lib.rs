//! From "gauge group plus multiplets" to an exact verdict.
//!
//! This crate gathers the others under one roof and adds the answers and reports that the
//! `gaugewright` command prints:
//! - [`roots`]: simple Lie algebras and their irreps;
//! - [`model`]: symmetries, multiplets, spectra and the model file;
//! - [`anomaly`]: anomaly conditions and verdicts;
//! - [`running`]: beta coefficients;
//! - [`answer`]: what each command answers, as a value, as JSON and as a [`report::Page`];
//! - [`bibliography`]: the works that doc comments cite by key;
//! - [`request`]: what a command asks, from a terminal or a line of JSON.
//!
//! ```
//! use gaugewright::request::Request;
//! let line = r#"{"command": "irrep", "algebra": "SO(10)", "irrep": "16bar"}"#;
//! let answer = Request::from_json_line(line)?.answer(Default::default())?;
//! assert!(answer.json().contains(r#""labels":[0,0,0,1,0]"#));
//! # Ok::<(), gaugewright::Failure>(())
//! ```

pub use anomaly;
pub use model;
pub use roots;
pub use running;

pub mod answer;
pub mod bibliography;
mod failure;
#[cfg(doctest)]
mod guide;
pub mod report;
pub mod request;

pub use failure::Failure;
