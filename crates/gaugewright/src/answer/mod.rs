//! What each command answers: a value that serialises to the promised JSON and lays itself out as
//! a [`Page`].

mod algebra;
mod anomalies;
mod audit;
mod audit_page;
mod catalog;
mod decomposition;
mod irrep;
mod multiplets;

pub use algebra::AlgebraAnswer;
pub use anomalies::AnomaliesAnswer;
pub use audit::AuditAnswer;
pub use catalog::{CATALOG_LIMIT, CatalogAnswer, CatalogEntry};
pub use decomposition::{DecompositionAnswer, PowerSymmetry};
pub use irrep::{IrrepAnswer, WeightsAsked};

use crate::report::Page;

/// An answer in every format.
pub trait Answer {
    /// The answer as one JSON object on one line.
    fn json(&self) -> String;

    /// The answer as a page for people.
    fn page(&self) -> Page;

    /// Whether the answer is "not consistent", which the exit status tells.
    fn is_refusal(&self) -> bool {
        false
    }
}
