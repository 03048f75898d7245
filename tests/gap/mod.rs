//! GAP, a general-purpose algebra system, asked live.
