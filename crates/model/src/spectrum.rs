//! Symmetries and the multiplets under them, checked as a whole.

use std::collections::HashMap;

use num_bigint::BigInt;
use num_integer::Integer;
use num_traits::ToPrimitive;

use crate::irrep_memo::IrrepMemo;
use crate::suggestion::Choice;
use crate::{
    Error, Field, Group, MOST_COPIES, Multiplet, MultipletDraft, Owner, Part, Problem, Symmetry,
    Transformation, label,
};

/// Symmetries that a spectrum may have.
pub const MOST_SYMMETRIES: usize = 64;
/// Multiplets that a spectrum may have.
pub const MOST_MULTIPLETS: usize = 10_000;

/// Symmetries in order, and the multiplets that live under them.
///
/// Labels are unique among symmetries and among multiplets. Each multiplet has one
/// [`Transformation`] per symmetry, of the right group.
///
/// ```
/// use model::{Field, Group, Multiplet, Spectrum, Symmetry};
/// let mut spectrum = Spectrum::new([Symmetry::gauge("hypercharge", Group::U1)])?;
/// spectrum.add(Multiplet::draft("up", Field::RightHandedFermion).under("hypercharge", "2/3"))?;
/// spectrum.add(Multiplet::draft("electron", Field::RightHandedFermion).under("hypercharge", -1))?;
/// assert_eq!(spectrum.charge_denominator(0), Some(3));
/// assert_eq!(spectrum.multiplets()[1].scaled_charge(0), Some(-3));
/// # Ok::<(), model::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Spectrum {
    symmetries: Vec<Symmetry>,
    multiplets: Vec<Multiplet>,
    /// Place in `multiplets` by label.
    places: HashMap<String, usize>,
    /// One per symmetry.
    denominators: Vec<Denominator>,
    memo: IrrepMemo,
}

/// The common denominator of the charges under one symmetry.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
enum Denominator {
    /// Not a U(1).
    None,
    /// The least common one, with which every known charge is a whole number within 63 bits.
    Common(i64),
    /// There is none within 63 bits, and further charges cannot bring one back.
    TooLarge,
}

impl Spectrum {
    /// A spectrum of no multiplets yet.
    ///
    /// # Errors
    /// [`Problem::NoSymmetry`], [`Problem::TooManySymmetries`], and for a label
    /// [`Problem::BadLabel`], [`Problem::ReservedLabel`], [`Problem::DuplicateLabel`].
    pub fn new(symmetries: impl IntoIterator<Item = Symmetry>) -> Result<Self, Error> {
        let symmetries: Vec<Symmetry> = symmetries.into_iter().take(MOST_SYMMETRIES + 1).collect();
        if symmetries.is_empty() {
            return Err(Problem::NoSymmetry.into());
        }
        if symmetries.len() > MOST_SYMMETRIES {
            return Err(Problem::TooManySymmetries.into());
        }
        for (i, symmetry) in symmetries.iter().enumerate() {
            check_symmetry_label(symmetry.label(), &symmetries[..i])?;
        }
        let denominators = symmetries.iter().map(|symmetry| match symmetry.group() {
            Group::U1 => Denominator::Common(1),
            Group::Simple(_) | Group::Discrete(_) => Denominator::None,
        });
        Ok(Self {
            denominators: denominators.collect(),
            multiplets: Vec::new(),
            places: HashMap::new(),
            memo: IrrepMemo::default(),
            symmetries,
        })
    }

    /// Adds a multiplet at the end. On an error the spectrum stays as it was.
    ///
    /// # Errors
    /// Says which part of the draft is wrong: its label, a symmetry it names, an irrep or charge,
    /// the number of copies, the mass, a real scalar that cannot be, numbers beyond 63 bits.
    pub fn add(&mut self, draft: MultipletDraft) -> Result<&mut Self, Error> {
        let owner = Owner::Multiplet(draft.label.clone());
        let multiplet = self
            .check(draft)
            .map_err(|(part, problem)| Error::new(owner, part, *problem))?;
        let place = self.multiplets.len();
        self.places.insert(multiplet.label().to_owned(), place);
        self.multiplets.push(multiplet);
        for symmetry in 0..self.symmetries.len() {
            self.scale_charges(symmetry);
        }
        Ok(self)
    }

    fn check(&mut self, mut draft: MultipletDraft) -> Result<Multiplet, (Part, Box<Problem>)> {
        if self.multiplets.len() == MOST_MULTIPLETS {
            return Err((Part::Whole, Problem::TooManyMultiplets.into()));
        }
        label::check(&draft.label).map_err(|problem| (Part::Label, problem.into()))?;
        if self.places.contains_key(&draft.label) {
            let label = draft.label;
            return Err((Part::Label, Problem::DuplicateLabel { label }.into()));
        }
        if !(1..=MOST_COPIES).contains(&draft.copies) {
            let written = draft.copies.to_string();
            return Err((Part::Copies, Problem::BadCopies { written }.into()));
        }
        let mass = draft.mass.take().map(crate::Mass::read).transpose();
        let mass = mass.map_err(|problem| (Part::Mass, problem.into()))?;
        let transformations = self.transformations(&mut draft)?;
        if draft.family_dependent && !transformations.contains(&Transformation::UnknownCharge) {
            return Err((Part::FamilyDependent, Problem::NoUnknownCharge.into()));
        }
        let under = |i: usize| Part::Under(self.symmetries[i].label().to_owned());
        let multiplet = Multiplet::new(draft, mass, transformations, &mut self.memo)
            .map_err(|(place, problem)| (place.map_or(Part::Whole, under), problem.into()))?;
        if multiplet.field() == Field::RealScalar {
            let reality = multiplet.check_reality(&self.symmetries);
            reality.map_err(|(i, problem)| (under(i), problem.into()))?;
        }
        Ok(multiplet)
    }

    /// One transformation per symmetry, in order.
    fn transformations(
        &mut self,
        draft: &mut MultipletDraft,
    ) -> Result<Vec<Transformation>, (Part, Box<Problem>)> {
        let mut found = vec![None; self.symmetries.len()];
        for (label, written) in draft.under.drain(..) {
            let Some(i) = self.symmetry_index(&label) else {
                let choice = self.symmetry_choice(&label, |_| true);
                let problem = Problem::UnknownSymmetry { choice };
                return Err((Part::SymmetryLabel(label), problem.into()));
            };
            if found[i].is_some() {
                let symmetry = label.clone();
                return Err((
                    Part::SymmetryLabel(label),
                    Problem::Repeated { symmetry }.into(),
                ));
            }
            match written.read(self.symmetries[i].group(), &mut self.memo) {
                Ok(transformation) => found[i] = Some(transformation),
                Err(problem) => return Err((Part::Under(label), problem.into())),
            }
        }
        let symmetries = self.symmetries.iter().zip(found);
        let all = symmetries.map(|(symmetry, found)| {
            found.unwrap_or_else(|| Transformation::trivial(symmetry.group()))
        });
        Ok(all.collect())
    }

    /// Brings the last multiplet's charge to the common denominator, and the others' with it
    /// where that has grown. It doubles at least each time it grows, so that happens 62 times at
    /// most.
    fn scale_charges(&mut self, symmetry: usize) {
        let Denominator::Common(old) = self.denominators[symmetry] else {
            return;
        };
        let (last, others) = self
            .multiplets
            .split_last_mut()
            .expect("one was just added");
        let Some(charge) = last.charge(symmetry) else {
            return;
        };
        let common = charge.denom().lcm(&BigInt::from(old)).to_i64();
        let scaled = common.and_then(|common| last.charge_times(symmetry, common));
        let (Some(common), Some(scaled)) = (common, scaled) else {
            return self.give_up_scaling(symmetry);
        };
        last.set_scaled_charge(symmetry, Some(scaled));
        if common == old {
            return;
        }
        for other in others {
            let Some(scaled) = other.scaled_charge(symmetry) else {
                continue;
            };
            match scaled.checked_mul(common / old).filter(|&s| s != i64::MIN) {
                Some(scaled) => other.set_scaled_charge(symmetry, Some(scaled)),
                None => return self.give_up_scaling(symmetry),
            }
        }
        self.denominators[symmetry] = Denominator::Common(common);
    }

    fn give_up_scaling(&mut self, symmetry: usize) {
        self.denominators[symmetry] = Denominator::TooLarge;
        for multiplet in &mut self.multiplets {
            multiplet.set_scaled_charge(symmetry, None);
        }
    }

    /// The symmetries, in order.
    #[must_use]
    pub fn symmetries(&self) -> &[Symmetry] {
        &self.symmetries
    }

    /// The multiplets, in order.
    #[must_use]
    pub fn multiplets(&self) -> &[Multiplet] {
        &self.multiplets
    }

    /// The number, from 0, of the symmetry of that label.
    #[must_use]
    pub fn symmetry_index(&self, label: &str) -> Option<usize> {
        let mut symmetries = self.symmetries.iter();
        symmetries.position(|symmetry| symmetry.label() == label)
    }

    /// The multiplet of that label.
    #[must_use]
    pub fn multiplet(&self, label: &str) -> Option<&Multiplet> {
        self.places.get(label).map(|&place| &self.multiplets[place])
    }

    /// The least common denominator of all known charges under a U(1), where with it every one
    /// of them is a whole number within 63 bits.
    ///
    /// # Panics
    /// Where there is no symmetry of that number.
    #[must_use]
    pub fn charge_denominator(&self, symmetry: usize) -> Option<i64> {
        match self.denominators[symmetry] {
            Denominator::Common(denominator) => Some(denominator),
            Denominator::None | Denominator::TooLarge => None,
        }
    }

    /// Whether some charge is unknown.
    #[must_use]
    pub fn has_unknown_charges(&self) -> bool {
        let mut all = self.multiplets.iter().flat_map(Multiplet::transformations);
        all.any(|one| *one == Transformation::UnknownCharge)
    }

    /// The labels, of those symmetries that are `fit`, one of which `written` should have been.
    pub(crate) fn symmetry_choice(&self, written: &str, fit: fn(&Symmetry) -> bool) -> Choice {
        let symmetries = self.symmetries.iter().filter(|symmetry| fit(symmetry));
        Choice::new(written, symmetries.map(Symmetry::label))
    }
}

fn check_symmetry_label(label: &str, earlier: &[Symmetry]) -> Result<(), Error> {
    let problem = if let Err(problem) = label::check(label) {
        problem
    } else if label == "gravity" {
        let label = label.to_owned();
        Problem::ReservedLabel { label }
    } else if earlier.iter().any(|other| other.label() == label) {
        let label = label.to_owned();
        Problem::DuplicateLabel { label }
    } else {
        return Ok(());
    };
    let owner = Owner::Symmetry(label.to_owned());
    Err(Error::new(owner, Part::Label, problem))
}
