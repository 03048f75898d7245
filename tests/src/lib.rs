//! What the checks of this workspace stand on: tables as they were published, a slow and plain
//! calculation that shares nothing with the library crates, and a way to ask GAP.
//!
//! - [`table`] reads `data/*.toml`, one published table a file, its citation at the head.
//! - [`slow`] has its own Cartan matrices, roots and weights, in textbook form.
//! - [`gap`] runs one GAP process and hands back the lines it printed.
//!
//! Variables: `GAUGEWRIGHT_SEED` repeats the random choices of an earlier run, which it printed;
//! `GAP` is the program to run in place of `gap`; where there is none the checks against it are
//! skipped, unless `CI` or `REQUIRE_GAP` is set. `PROPTEST_CASES` is proptest's own.
//!
//! The checks themselves are one test binary, `main.rs`: `published/` holds the library to tables
//! and formulas in print, `identities/` to what must be true of every algebra, `gap/` to GAP.

pub mod gap;
pub mod slow;
pub mod table;
