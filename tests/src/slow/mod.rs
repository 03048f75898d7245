//! A slow and plain calculation of roots, weights and what follows from them.
//!
//! Written from textbooks and sharing no code with the library crates, so that agreement means
//! something. Ranks go up to 8, labels and weights fit in `i16`.

mod algebra;
mod cartan;
mod character;
mod invariants;
mod product;

pub use algebra::SlowAlgebra;
pub use cartan::slansky_cartan_matrix;
pub use character::{Character, Weight};
