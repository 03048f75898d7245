//! Multiplets of a spectrum, with the numbers that anomalies and running are made of.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use num_traits::ToPrimitive;
use roots::{Irrep, Reality};

use crate::irrep_memo::{IrrepMemo, IrrepNumbers, whole};
use crate::{Field, MultipletDraft, Problem, Symmetry, Transformation};

/// Copies that a multiplet may have.
pub const MOST_COPIES: u32 = 1_000_000;

/// Fields that transform together: what they are under each symmetry of their spectrum.
///
/// It exists only inside a [`Spectrum`](crate::Spectrum), which built it from a
/// [`MultipletDraft`]. Dimensions, indices and whole-number charges are worked out once, then:
/// every method below with a symmetry's number is a look-up, and panics where the spectrum has
/// no symmetry of that number.
///
/// With everything that multiplies it in an anomaly (copies, and the dimensions under the other
/// symmetries), each dimension and index is below 2^63.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Multiplet {
    label: String,
    field: Field,
    copies: u32,
    family_dependent: bool,
    mass_gev: Option<BigRational>,
    dimension: u64,
    /// The dimension times the copies.
    states: u64,
    /// One per symmetry of the spectrum.
    under: Vec<Under>,
}

/// What the multiplet is under one symmetry, and the numbers that follow.
#[derive(Clone, Debug, PartialEq, Eq)]
struct Under {
    transformation: Transformation,
    numbers: IrrepNumbers,
    /// Times copies and the dimensions under the other symmetries.
    total_dynkin_index: u64,
    total_cubic_index: i64,
    scaled_charge: Option<i64>,
}

impl Under {
    fn new(transformation: Transformation, memo: &mut IrrepMemo) -> Result<Self, Problem> {
        let numbers = match &transformation {
            Transformation::Irrep(irrep) => memo.numbers(irrep)?,
            _ => IrrepNumbers::TRIVIAL,
        };
        Ok(Self {
            transformation,
            numbers,
            total_dynkin_index: 0,
            total_cubic_index: 0,
            scaled_charge: None,
        })
    }
}

impl Multiplet {
    /// A multiplet to be added to a spectrum: one copy, a singlet under everything, until told.
    pub fn draft(label: impl Into<String>, field: Field) -> MultipletDraft {
        MultipletDraft::new(label.into(), field)
    }

    /// The multiplet, or the place in `transformations` of what is too large.
    pub(crate) fn new(
        draft: MultipletDraft,
        mass_gev: Option<BigRational>,
        transformations: Vec<Transformation>,
        memo: &mut IrrepMemo,
    ) -> Result<Self, (Option<usize>, Problem)> {
        let under = transformations.into_iter().enumerate();
        let under =
            under.map(|(i, one)| Under::new(one, memo).map_err(|problem| (Some(i), problem)));
        let mut multiplet = Self {
            label: draft.label,
            field: draft.field,
            copies: draft.copies,
            family_dependent: draft.family_dependent,
            mass_gev,
            dimension: 1,
            states: 1,
            under: under.collect::<Result<_, _>>()?,
        };
        multiplet
            .count_states()
            .map_err(|problem| (None, problem))?;
        multiplet
            .total_indices()
            .map_err(|(i, problem)| (Some(i), problem))?;
        Ok(multiplet)
    }

    fn count_states(&mut self) -> Result<(), Problem> {
        let dimensions = self.under.iter().map(|under| under.numbers.dimension);
        let product: BigUint = dimensions.map(BigUint::from).product();
        self.states = whole(&(&product * self.copies), "the dimension times the copies")?;
        self.dimension = whole(&product, "the dimension")?;
        Ok(())
    }

    /// Index times copies and the dimensions under the other symmetries, each within 63 bits.
    fn total_indices(&mut self) -> Result<(), (usize, Problem)> {
        for (i, under) in self.under.iter_mut().enumerate() {
            let IrrepNumbers {
                dimension,
                dynkin_index,
                cubic_index,
            } = under.numbers;
            let others = BigInt::from(self.states / dimension);
            let total = |index: BigInt, quantity| {
                let total = (&others * index).to_i64().filter(|&all| all != i64::MIN);
                total.ok_or((i, Problem::TooLarge { quantity }))
            };
            let dynkin = total(dynkin_index.into(), "the Dynkin index of all copies")?;
            under.total_dynkin_index = dynkin.unsigned_abs();
            under.total_cubic_index = total(cubic_index.into(), "the cubic index of all copies")?;
        }
        Ok(())
    }

    /// The label.
    #[must_use]
    pub fn label(&self) -> &str {
        &self.label
    }

    /// The kind of field.
    #[must_use]
    pub const fn field(&self) -> Field {
        self.field
    }

    /// How many families there are, from 1 to [`MOST_COPIES`].
    #[must_use]
    pub const fn copies(&self) -> u32 {
        self.copies
    }

    /// Whether each copy has unknown charges of its own.
    #[must_use]
    pub const fn is_family_dependent(&self) -> bool {
        self.family_dependent
    }

    /// The mass in GeV, above 0, where there is one.
    #[must_use]
    pub const fn mass_gev(&self) -> Option<&BigRational> {
        self.mass_gev.as_ref()
    }

    /// Whether it counts in anomalies.
    #[inline]
    #[must_use]
    pub const fn has_fermions(&self) -> bool {
        self.field.has_fermions()
    }

    /// -1 for a right-handed fermion, 1 otherwise. In the left-handed view charges and cubic
    /// indices take this sign; dimensions and Dynkin indices do not change.
    #[inline]
    #[must_use]
    pub const fn left_handed_sign(&self) -> i64 {
        self.field.left_handed_sign()
    }

    /// Product of the dimensions under all symmetries, without copies.
    #[must_use]
    pub const fn dimension(&self) -> u64 {
        self.dimension
    }

    /// Dimension times copies.
    #[inline]
    #[must_use]
    pub const fn states(&self) -> u64 {
        self.states
    }

    /// What it is under each symmetry, in the spectrum's order.
    pub fn transformations(&self) -> impl ExactSizeIterator<Item = &Transformation> + Clone {
        self.under.iter().map(|under| &under.transformation)
    }

    /// What it is under symmetry number `symmetry`.
    #[must_use]
    pub fn transformation(&self, symmetry: usize) -> &Transformation {
        &self.under[symmetry].transformation
    }

    /// Its irrep under a simple group.
    #[must_use]
    pub fn irrep(&self, symmetry: usize) -> Option<&Irrep> {
        match self.transformation(symmetry) {
            Transformation::Irrep(irrep) => Some(irrep),
            _ => None,
        }
    }

    /// Its charge under a U(1), where it is known.
    #[must_use]
    pub fn charge(&self, symmetry: usize) -> Option<&BigRational> {
        match self.transformation(symmetry) {
            Transformation::Charge(charge) => Some(charge),
            _ => None,
        }
    }

    /// Its charge under a Z(N), from 0 to N - 1.
    #[inline]
    #[must_use]
    pub fn discrete_charge(&self, symmetry: usize) -> Option<u32> {
        match self.transformation(symmetry) {
            Transformation::Discrete(charge) => Some(*charge),
            _ => None,
        }
    }

    /// Whether its charge under that U(1) is to be found.
    #[must_use]
    pub fn is_charge_unknown(&self, symmetry: usize) -> bool {
        matches!(self.transformation(symmetry), Transformation::UnknownCharge)
    }

    /// Its dimension under one symmetry; 1 for U(1) and Z(N).
    #[must_use]
    pub fn dimension_under(&self, symmetry: usize) -> u64 {
        self.under[symmetry].numbers.dimension
    }

    /// The Dynkin index of its irrep under one symmetry; 0 for singlets, U(1) and Z(N).
    #[must_use]
    pub fn dynkin_index_under(&self, symmetry: usize) -> u64 {
        self.under[symmetry].numbers.dynkin_index
    }

    /// The cubic index of its irrep under one symmetry, as written, not in the left-handed view.
    #[must_use]
    pub fn cubic_index_under(&self, symmetry: usize) -> i64 {
        self.under[symmetry].numbers.cubic_index
    }

    /// The Dynkin index under one symmetry of all that is in the multiplet: times the dimensions
    /// under the others, and the copies.
    #[inline]
    #[must_use]
    pub fn total_dynkin_index_under(&self, symmetry: usize) -> u64 {
        self.under[symmetry].total_dynkin_index
    }

    /// The cubic index under one symmetry of all that is in the multiplet, as written.
    #[inline]
    #[must_use]
    pub fn total_cubic_index_under(&self, symmetry: usize) -> i64 {
        self.under[symmetry].total_cubic_index
    }

    /// Its charge times [`Spectrum::charge_denominator`](crate::Spectrum::charge_denominator), as
    /// written, not in the left-handed view. `None` where the charge is unknown, the symmetry no
    /// U(1), or some charge of the spectrum under it does not fit; [`charge`](Self::charge) is
    /// exact always.
    #[inline]
    #[must_use]
    pub fn scaled_charge(&self, symmetry: usize) -> Option<i64> {
        self.under[symmetry].scaled_charge
    }

    pub(crate) fn set_scaled_charge(&mut self, symmetry: usize, scaled: Option<i64>) {
        self.under[symmetry].scaled_charge = scaled;
    }

    /// The charge times a multiple of its denominator, within 63 bits; `None` if it does not fit.
    pub(crate) fn charge_times(&self, symmetry: usize, denominator: i64) -> Option<i64> {
        let scaled = self.charge(symmetry)? * BigInt::from(denominator);
        debug_assert!(
            scaled.is_integer(),
            "every denominator divides the common one"
        );
        scaled.numer().to_i64().filter(|&scaled| scaled != i64::MIN)
    }

    /// Checks that a real scalar is in a real representation with no charge.
    pub(crate) fn check_reality(&self, symmetries: &[Symmetry]) -> Result<(), (usize, Problem)> {
        let mut pseudoreal = None;
        let mut form_is_symmetric = true;
        for (i, (symmetry, one)) in symmetries.iter().zip(self.transformations()).enumerate() {
            let reality = reality_of(symmetry, one);
            if reality == Reality::Pseudoreal {
                form_is_symmetric = !form_is_symmetric;
                pseudoreal = pseudoreal.or(Some(i));
            }
            if reality == Reality::Complex {
                return Err((i, not_real(symmetry, one, reality)));
            }
        }
        // Two antisymmetric forms make a symmetric one: (2, 2) of SU(2) x SU(2) is real.
        match pseudoreal {
            Some(i) if !form_is_symmetric => {
                let problem = not_real(&symmetries[i], self.transformation(i), Reality::Pseudoreal);
                Err((i, problem))
            }
            _ => Ok(()),
        }
    }
}

fn reality_of(symmetry: &Symmetry, one: &Transformation) -> Reality {
    match (one, symmetry.group()) {
        (Transformation::Irrep(irrep), _) => irrep.reality(),
        // Charge N/2 is its own opposite.
        (Transformation::Discrete(charge), crate::Group::Discrete(order))
            if u64::from(*charge) * 2 == u64::from(order.get()) =>
        {
            Reality::Real
        }
        (other, _) if other.is_trivial() => Reality::Real,
        _ => Reality::Complex,
    }
}

fn not_real(symmetry: &Symmetry, one: &Transformation, reality: Reality) -> Problem {
    let label = symmetry.label().to_owned();
    match one {
        Transformation::Irrep(irrep) => Problem::NotReal {
            found: format!("irrep {}", irrep.bracketed()),
            symmetry: label,
            reality,
        },
        other => Problem::ChargedRealScalar {
            found: other.to_string(),
            symmetry: label,
        },
    }
}
