//! Beta coefficients of gauge couplings, exact.
//!
//! One convention throughout: `d alpha_i^-1 / d ln mu = -b_i / 2 pi` at one loop, so that a
//! negative coefficient means asymptotic freedom. The Standard Model has (41/6, -19/6, -7) with
//! hypercharge as it is written, 3/5 of the first, 41/10, in unified normalisation.
//! ```
//! use model::{Field, Multiplet, Spectrum, Symmetry};
//! let mut spectrum = Spectrum::new([Symmetry::gauge("colour", "SU(3)".parse()?)])?;
//! spectrum.add(Multiplet::draft("quarks", Field::LeftHandedFermion).copies(6).under("colour", "3"))?;
//! spectrum.add(Multiplet::draft("antiquarks", Field::LeftHandedFermion).copies(6).under("colour", "3bar"))?;
//! let model = model::Model::new("Six flavours", spectrum)?;
//! let [colour] = &running::one_loop(&model)[..] else { unreachable!("one gauge group") };
//! assert_eq!(colour.value().unwrap().to_string(), "-7");
//! # Ok::<(), model::Error>(())
//! ```

mod beta_coefficient;

pub use beta_coefficient::{BetaCoefficient, one_loop};
