//! Simple Lie algebras: roots, weights, irreps and their products, in exact arithmetic.
//!
//! Nodes are numbered as in [Slansky 1981]; [`Numbering::Bourbaki`] translates.
//! Longest root squared is 2; the index of the SU(N) fundamental is 1.
//! ```
//! let so10: roots::SimpleAlgebra = "SO(10)".parse()?;
//! let spinor = so10.irrep(&[0, 0, 0, 0, 1])?;
//! assert_eq!((spinor.name(), spinor.dimension()), ("16".into(), 16u32.into()));
//! # Ok::<(), roots::Error>(())
//! ```
//!
//! - [`SimpleAlgebra`] is SU(N), SO(N), Sp(2N) or an exceptional one; its [`CartanMatrix`],
//!   [`RootSystem`], [`WeightMetric`] and [`Center`] come from it.
//! - [`Irrep`] is one irrep by its Dynkin labels, with dimension, indices, reality, class and
//!   conjugate; [`NameBook`] gives many of them their names.
//! - [`ReductiveAlgebra`] is a product of simple algebras and U(1)s, [`ReductiveIrrep`] an irrep
//!   of it.
//!
//! The keys in square brackets are listed in the bibliography of the `gaugewright` crate.

mod algebra;
mod algebra_name;
mod cartan_matrix;
mod cartan_type;
mod congruency;
mod dimension;
mod dimension_search;
mod dynkin_diagram;
mod error;
mod index;
mod irrep;
mod irrep_name;
mod irrep_text;
mod numbering;
mod orthogonal_basis;
mod rational;
mod reality;
mod reductive;
mod root_system;
mod text;
mod weight_metric;

pub use algebra::SimpleAlgebra;
pub use cartan_matrix::{CartanMatrix, InverseCartanMatrix};
pub use cartan_type::{CartanType, Family, MAX_RANK};
pub use congruency::{Center, Congruency};
pub use dimension_search::CatalogBound;
pub use dynkin_diagram::DynkinDiagram;
pub use error::Error;
pub use irrep::Irrep;
pub use irrep_name::{IrrepName, NAMED_UP_TO, NameBook};
pub use numbering::Numbering;
pub use rational::read_rational;
pub use reality::Reality;
pub use reductive::{Factor, Part, ReductiveAlgebra, ReductiveIrrep};
pub use root_system::{Root, RootSystem};
pub use weight_metric::WeightMetric;
