//! Anomaly conditions of a spectrum: which there are, what each multiplet adds, what cancels.
//!
//! Sums run over left-handed Weyl fermions; a right-handed one counts as its left-handed
//! conjugate, a superfield by its fermion, a scalar not at all.
//! ```
//! use model::{Field, Multiplet, Spectrum, Symmetry};
//! let mut spectrum = Spectrum::new([Symmetry::gauge("unified", "SU(5)".parse()?)])?;
//! spectrum.add(Multiplet::draft("F", Field::LeftHandedFermion).under("unified", "5bar"))?;
//! spectrum.add(Multiplet::draft("T", Field::LeftHandedFermion).under("unified", "10"))?;
//! assert!(anomaly::is_consistent(&spectrum)?);
//!
//! let report = anomaly::Report::of(&spectrum)?;
//! assert_eq!(report.conditions()[0].name(), "unified^3");
//! assert_eq!(report.conditions()[0].contributions().len(), 2);
//! # Ok::<(), Box<dyn std::error::Error>>(())
//! ```
//!
//! - [`Anomaly`] names one condition by the symmetries in it; [`Anomaly::all`] lists those of a
//!   spectrum.
//! - [`Report`] holds every [`Condition`] with its value and the share of each multiplet.
//! - [`is_consistent`] is the bare verdict, for scans: whole numbers, no allocation.
//!
//! Values follow one convention: the sum of the cubic index for `G^3`; of Dynkin index times
//! charge for `G^2 U(1)`; of products of charges, with no permutation factor; of charges for
//! gravity; each times copies and the dimensions under the other factors.
//!
//! Four space-time dimensions only.

mod anomaly;
mod condition;
mod error;
mod report;
mod share;
mod verdict;

pub use anomaly::{Anomaly, Kind};
pub use condition::{Condition, Rule};
pub use error::{ReportError, UnknownCharge};
pub use report::Report;
pub use verdict::is_consistent;
