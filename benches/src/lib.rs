//! What the benches share: the fixed cases, a stopwatch, and GAP as the peer.
//!
//! GAP is timed inside its own process, without its start-up and with the Lie algebra and its root
//! system already made; each case is run three times there and the fastest is taken.

// Times are measured, and printed as decimals.
#![allow(clippy::float_arithmetic, clippy::cast_precision_loss)]

pub mod case;
pub mod clock;
pub mod families;
pub mod peer;
