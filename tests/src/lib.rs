//! What the checks of this workspace stand on.

pub mod gap;
