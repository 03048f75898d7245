//! Tables and formulas in print.

mod anomalies;
mod beta_coefficients;
mod bourbaki_plates;
mod cubic_indices;
mod model_facts;
mod pdg_charges;
mod reality_facts;
mod slansky_irreps;
