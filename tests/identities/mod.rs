//! What must be true of every algebra.

mod anomalies;
mod catalogues;
mod choices;
mod index_and_casimir;
mod isomorphisms;
mod large_labels;
mod large_ranks;
mod names;
mod reading;
mod reality;
