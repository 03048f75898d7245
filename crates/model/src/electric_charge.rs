//! The electric charge as a combination of gauged charges: Q = T3 + Y, or another.

use num_rational::BigRational;
use num_traits::{One, Zero};

use crate::transformation::{bounded, read_fraction};
use crate::{Error, Group, Owner, Part, Problem, Spectrum, Symmetry, Written};

/// The electric charge: a sum over gauge symmetries of coefficients times charges.
///
/// A U(1) has one coefficient. A simple group has one for each Dynkin label of a weight: SU(2)'s
/// T3 is half the label, so its coefficient is 1/2.
///
/// ```
/// use model::ElectricCharge;
/// let left_right = ElectricCharge::draft()
///     .along("left", ["1/2"])
///     .along("right", ["1/2"])
///     .along("B-L", ["1/2"]);
/// # let _ = left_right;
/// ```
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub struct ElectricCharge {
    /// One list per symmetry of the spectrum; empty where the symmetry does not enter.
    coefficients: Vec<Vec<BigRational>>,
}

impl ElectricCharge {
    /// An electric charge to be given to a [`Model`](crate::Model).
    pub const fn draft() -> ElectricChargeDraft {
        ElectricChargeDraft { terms: Vec::new() }
    }

    pub(crate) fn new(draft: ElectricChargeDraft, spectrum: &Spectrum) -> Result<Self, Error> {
        let mut coefficients = vec![Vec::new(); spectrum.symmetries().len()];
        for (label, written) in draft.terms {
            let wrong = |part, problem| Error::new(Owner::Model, part, problem);
            let Some(i) = spectrum.symmetry_index(&label) else {
                let choice = spectrum.symmetry_choice(&label, is_fit);
                let problem = Problem::UnknownSymmetry { choice };
                return Err(wrong(Part::ElectricCharge(label), problem));
            };
            if !coefficients[i].is_empty() {
                let symmetry = label.clone();
                return Err(wrong(
                    Part::ElectricCharge(label),
                    Problem::Repeated { symmetry },
                ));
            }
            coefficients[i] = read(written, spectrum, i)
                .map_err(|problem| wrong(Part::ElectricCharge(label), problem))?;
        }
        Ok(Self { coefficients })
    }

    /// Q = T3 + Y, where there is a gauged SU(2) labelled `weak` and a hypercharge.
    pub(crate) fn isospin_and_hypercharge(
        spectrum: &Spectrum,
        hypercharge: Option<usize>,
    ) -> Option<Self> {
        let (weak, hypercharge) = (spectrum.symmetry_index("weak")?, hypercharge?);
        let symmetry = &spectrum.symmetries()[weak];
        let algebra = symmetry.group().simple()?;
        let is_su2 = algebra.rank() == 1 && symmetry.is_gauged();
        let mut coefficients = vec![Vec::new(); spectrum.symmetries().len()];
        coefficients[weak] = vec![BigRational::new(1.into(), 2.into())];
        coefficients[hypercharge] = vec![BigRational::one()];
        is_su2.then_some(Self { coefficients })
    }

    /// The coefficients for symmetry number `symmetry`: none where it does not enter, one for a
    /// U(1), one per Dynkin label of a weight for a simple group.
    ///
    /// # Panics
    /// Where there is no symmetry of that number.
    #[must_use]
    pub fn coefficients(&self, symmetry: usize) -> &[BigRational] {
        &self.coefficients[symmetry]
    }

    /// What a weight of symmetry number `symmetry` adds to the charge: Dynkin labels of the
    /// weight, in Slansky's numbering. 0 where the symmetry does not enter.
    ///
    /// # Panics
    /// Where there is no symmetry of that number.
    #[must_use]
    pub fn of_weight(&self, symmetry: usize, labels: &[i64]) -> BigRational {
        let terms = self.coefficients[symmetry].iter().zip(labels);
        terms.fold(BigRational::zero(), |sum, (coefficient, &label)| {
            sum + coefficient * num_bigint::BigInt::from(label)
        })
    }
}

fn is_fit(symmetry: &Symmetry) -> bool {
    symmetry.is_gauged() && !matches!(symmetry.group(), Group::Discrete(_))
}

fn read(
    written: Vec<Written>,
    spectrum: &Spectrum,
    symmetry: usize,
) -> Result<Vec<BigRational>, Problem> {
    let symmetry = &spectrum.symmetries()[symmetry];
    let unfit = |what| Problem::NotForElectricCharge {
        symmetry: symmetry.label().to_owned(),
        what,
    };
    let expected = match symmetry.group() {
        Group::Discrete(_) => return Err(unfit("a discrete symmetry")),
        _ if !symmetry.is_gauged() => return Err(unfit("a global symmetry")),
        Group::U1 => 1,
        Group::Simple(algebra) => algebra.rank(),
    };
    if written.len() != expected {
        return Err(Problem::CoefficientCount {
            group: symmetry.group().to_string(),
            expected,
            found: written.len(),
        });
    }
    written.into_iter().map(read_coefficient).collect()
}

fn read_coefficient(written: Written) -> Result<BigRational, Problem> {
    match written {
        Written::Text(written) => read_fraction(&written),
        Written::Whole(whole) => bounded(whole.into()),
        Written::Charge(value) => bounded(value),
        Written::Irrep(irrep) => Err(Problem::WrongKind {
            found: format!("the irrep {} of {}", irrep.bracketed(), irrep.algebra()),
            group: "the electric charge".into(),
            expected: "a fraction such as \"1/2\"".into(),
        }),
    }
}

/// An electric charge as it is written down, before a model has checked it.
#[derive(Clone, Debug, Default, PartialEq, Eq)]
#[must_use = "a draft does nothing until a model takes it"]
pub struct ElectricChargeDraft {
    terms: Vec<(String, Vec<Written>)>,
}

impl ElectricChargeDraft {
    /// Adds the coefficients for the gauge symmetry of that label: one for a U(1), one per Dynkin
    /// label of a weight for a simple group.
    pub fn along<T: Into<Written>>(
        mut self,
        symmetry: impl Into<String>,
        coefficients: impl IntoIterator<Item = T>,
    ) -> Self {
        let coefficients = coefficients.into_iter().map(Into::into).collect();
        self.terms.push((symmetry.into(), coefficients));
        self
    }
}
