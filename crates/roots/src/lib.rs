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
//! - [`Weight`] and its Weyl orbit; [`Irrep::dominant_weights`] and [`Irrep::weights`] with
//!   multiplicities; [`Character`], which adds and multiplies them.
//! - [`SimpleAlgebra::product`], [`Irrep::power`] and [`Irrep::tensor_power`] give a
//!   [`Decomposition`]; [`ProductCache`] remembers for a scan, [`Limits`] bound the work.
//! - [`ReductiveAlgebra`] is a product of simple algebras and U(1)s, [`ReductiveIrrep`] an irrep
//!   of it.
//!
//! The keys in square brackets are listed in the bibliography of the `gaugewright` crate.

mod algebra;
mod algebra_name;
mod cartan_matrix;
mod cartan_type;
mod character;
mod congruency;
mod count;
mod decomposition;
mod dimension;
mod dimension_search;
mod dominant_weights;
mod dynkin_diagram;
mod error;
mod frame;
mod index;
mod integer_lattice;
mod irrep;
mod irrep_name;
mod irrep_text;
mod klimyk;
mod lane_table;
mod lanes;
mod limits;
mod littlewood_richardson;
mod multiplicities;
mod numbering;
mod orbit_walk;
mod orthogonal_basis;
mod partition;
mod plethysm;
mod product_cache;
mod rational;
mod reality;
mod reductive;
mod reductive_product;
mod root_system;
#[cfg(feature = "serde")]
mod serialisation;
mod single_multiplicity;
mod tensor_product;
mod text;
#[cfg(test)]
mod two_ways;
mod weight;
mod weight_division;
mod weight_metric;
mod weight_system;

pub use algebra::SimpleAlgebra;
pub use cartan_matrix::{CartanMatrix, InverseCartanMatrix};
pub use cartan_type::{CartanType, Family, MAX_RANK};
pub use character::Character;
pub use congruency::{Center, Congruency};
pub use decomposition::Decomposition;
pub use dimension_search::CatalogBound;
pub use dynkin_diagram::DynkinDiagram;
pub use error::{Error, LimitKind};
pub use integer_lattice::{FiniteAbelian, rows_without};
pub use irrep::Irrep;
pub use irrep_name::{IrrepName, NameBook};
pub use limits::Limits;
pub use numbering::Numbering;
pub use partition::Partition;
pub use product_cache::ProductCache;
pub use rational::read_rational;
pub use reality::Reality;
pub use reductive::{Factor, Part, ReductiveAlgebra, ReductiveIrrep};
pub use reductive_product::ReductiveDecomposition;
pub use root_system::{Root, RootSystem};
pub use weight::Weight;
pub use weight_division::product_by_weight_division;
pub use weight_metric::WeightMetric;
