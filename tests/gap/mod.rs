//! GAP, a general-purpose algebra system, asked live.

mod answers;
mod root_systems;
