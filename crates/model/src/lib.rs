//! What a model of particle physics is made of: symmetries, multiplets, spectra.
//!
//! Everything is exact, and a value that exists is a value that makes sense: labels are unique,
//! irreps belong to their algebra, charges are fractions.
//! ```
//! use model::{Field, Group, Multiplet, Spectrum, Symmetry};
//! let mut spectrum = Spectrum::new([
//!     Symmetry::gauge("colour", "SU(3)".parse()?),
//!     Symmetry::gauge("weak", "SU(2)".parse()?),
//!     Symmetry::gauge("hypercharge", Group::U1),
//! ])?;
//! let quarks = Multiplet::draft("quark doublet", Field::LeftHandedFermion)
//!     .copies(3)
//!     .under("colour", "3")
//!     .under("weak", "2")
//!     .under("hypercharge", "1/6");
//! spectrum.add(quarks)?;
//! assert_eq!(spectrum.multiplets()[0].dimension(), 6);
//! # Ok::<(), model::Error>(())
//! ```
//!
//! - [`Symmetry`] is a labelled [`Group`], gauged or global; [`Multiplet`] is a [`Field`] with one
//!   [`Transformation`] for each of them; [`Spectrum`] holds both, checked.
//! - [`Model`] adds a title, supersymmetry, the hypercharge and the [`ElectricCharge`].
//! - [`Model::from_toml`] reads a model file, [`Model::from_json`] the same shape as JSON, and
//!   [`Model::to_toml`] writes one; a [`ModelFileError`] says where the file is wrong, and what to
//!   write instead.
//!
//! Chirality: anomalies are summed over left-handed Weyl fermions; a right-handed field counts as
//! its left-handed conjugate, which [`Multiplet::left_handed_sign`] tells.

mod center_action;
mod charged_states;
mod chirality;
mod decimal;
mod degrees_of_freedom;
mod demo;
mod draft;
mod electric_charge;
mod error;
mod field;
mod file;
mod group;
mod irrep_memo;
mod label;
mod model;
mod multiplet;
mod problem;
mod spectrum;
mod suggestion;
mod symmetry;
mod transformation;

pub use charged_states::ChargedStates;
pub use chirality::FermionClass;
pub use decimal::{Mass, read_decimal, write_decimal};
pub use degrees_of_freedom::DegreesOfFreedom;
pub use demo::{DEMO_FILE, demo};
pub use draft::MultipletDraft;
pub use electric_charge::{ElectricCharge, ElectricChargeDraft};
pub use error::{Error, Owner, Part};
pub use field::Field;
pub use file::{MOST_FILE_BYTES, ModelFileError};
pub use group::{CyclicOrder, Group};
pub use label::MOST_LABEL_CHARACTERS;
pub use model::{MOST_TITLE_CHARACTERS, Model};
pub use multiplet::{MOST_COPIES, Multiplet};
pub use problem::Problem;
pub use spectrum::{MOST_MULTIPLETS, MOST_SYMMETRIES, Spectrum};
pub use suggestion::Choice;
pub use symmetry::Symmetry;
pub use transformation::{Transformation, Written};
