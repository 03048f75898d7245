//! One-loop beta coefficients.

use model::{Field, Group, Model, Multiplet};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::{Signed, Zero};

/// The one-loop beta coefficient of one gauge symmetry.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct BetaCoefficient {
    symmetry: usize,
    gauge_bosons: BigRational,
    /// One per multiplet; none while a charge is unknown.
    contributions: Option<Vec<BigRational>>,
}

impl BetaCoefficient {
    /// Place of the symmetry in the spectrum.
    #[must_use]
    pub const fn symmetry(&self) -> usize {
        self.symmetry
    }

    /// What the gauge bosons add, with their superpartners in a supersymmetric model.
    #[must_use]
    pub const fn gauge_bosons(&self) -> &BigRational {
        &self.gauge_bosons
    }

    /// What each multiplet adds, in the spectrum's order; `None` while a charge is unknown.
    #[must_use]
    pub fn contributions(&self) -> Option<&[BigRational]> {
        self.contributions.as_deref()
    }

    /// The coefficient; for a U(1) in the normalisation in which the charges are written. `None`
    /// while a charge is unknown.
    #[must_use]
    pub fn value(&self) -> Option<BigRational> {
        let matter: BigRational = self.contributions.as_ref()?.iter().sum();
        Some(&self.gauge_bosons + matter)
    }

    /// Whether the coupling falls towards high scales; `None` while a charge is unknown.
    #[must_use]
    pub fn is_asymptotically_free(&self) -> Option<bool> {
        self.value().map(|value| value.is_negative())
    }
}

/// The one-loop coefficients of all gauge symmetries, in the spectrum's order, with every multiplet
/// of the model taking part.
///
/// `b = -11/3 C2(G) + 2/3 T(Weyl fermions) + 1/3 T(complex scalars) + 1/6 T(real scalars)`, and
/// `b = -3 C2(G) + T(superfields)` with supersymmetry; T is the squared charge for a U(1).
///
/// # Source
/// [Gross-Wilczek 1973], [Politzer 1973], [Machacek-Vaughn 1983]; supersymmetric: [Jones 1975].
#[must_use]
pub fn one_loop(model: &Model) -> Vec<BetaCoefficient> {
    let symmetries = model.spectrum().symmetries().iter().enumerate();
    symmetries
        .filter(|(_, symmetry)| symmetry.is_gauged())
        .filter_map(|(place, symmetry)| {
            let casimir = match symmetry.group() {
                Group::Simple(algebra) => algebra.adjoint().casimir(),
                Group::U1 => BigRational::zero(),
                Group::Discrete(_) => return None,
            };
            let bosons = if model.is_supersymmetric() {
                whole(-3)
            } else {
                fraction(-11, 3)
            };
            let multiplets = model.spectrum().multiplets().iter();
            Some(BetaCoefficient {
                symmetry: place,
                gauge_bosons: bosons * casimir,
                contributions: multiplets.map(|one| contribution(one, place)).collect(),
            })
        })
        .collect()
}

fn contribution(multiplet: &Multiplet, place: usize) -> Option<BigRational> {
    let weight = match multiplet.field() {
        Field::LeftHandedFermion | Field::RightHandedFermion => fraction(2, 3),
        Field::ComplexScalar => fraction(1, 3),
        Field::RealScalar => fraction(1, 6),
        Field::ChiralSuperfield => whole(1),
    };
    Some(weight * trace(multiplet, place)?)
}

/// T over all components and copies: half the Dynkin index, or the charge squared.
fn trace(multiplet: &Multiplet, place: usize) -> Option<BigRational> {
    match multiplet.irrep(place) {
        Some(_) => {
            let index = BigInt::from(multiplet.total_dynkin_index_under(place));
            Some(BigRational::new(index, 2.into()))
        }
        None => Some(multiplet.charge(place)?.pow(2) * BigInt::from(multiplet.states())),
    }
}

fn whole(value: i64) -> BigRational {
    BigRational::from(BigInt::from(value))
}

fn fraction(above: i64, below: i64) -> BigRational {
    BigRational::new(above.into(), below.into())
}
