//! The model that is built in: an invented proposal, to show what a report looks like.

use crate::Model;

/// The model file of the demonstration, "Lanternfish".
pub const DEMO_FILE: &str = include_str!("demo/lanternfish.toml");

/// The model of [`DEMO_FILE`]: the Standard Model with right-handed neutrinos, and a gauged U(1)
/// that only the third family and a vector-like pair of leptons carry.
///
/// ```
/// assert_eq!(model::demo().title(), "Lanternfish");
/// ```
#[must_use]
pub fn demo() -> Model {
    Model::from_toml(DEMO_FILE).expect("the built-in model file is right")
}
