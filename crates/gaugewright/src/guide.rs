//! The pages of prose, so that `cargo test --doc` compiles and runs the Rust in each of them. What
//! else they hold is checked by the tests of the command line, `documentation.rs`, among it that
//! no page is missing here.

#[doc = include_str!("../../../DEVELOPERS.md")]
mod developers {}
#[doc = include_str!("../../../README.md")]
mod readme {}
#[doc = include_str!("../../../docs/audit.md")]
mod audit {}
#[doc = include_str!("../../../docs/conventions.md")]
mod conventions {}
#[doc = include_str!("../../../docs/model-file.md")]
mod model_file {}
#[doc = include_str!("../../../docs/products.md")]
mod products {}
