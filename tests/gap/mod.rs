//! GAP, a general-purpose algebra system, asked live.

mod answers;
mod products;
mod root_systems;
