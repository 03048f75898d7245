//! Tables and formulas in print.

mod bourbaki_plates;
mod cubic_indices;
mod pdg_charges;
mod reality_facts;
mod slansky_irreps;
