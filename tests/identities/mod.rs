//! What must be true of every algebra.
