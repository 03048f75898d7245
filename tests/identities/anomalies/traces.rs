//! Anomalies a second way: traces over the components of every left-handed fermion, with weights
//! that the library has no part in.
//!
//! Take one generator along the Cartan directions of all simple groups and along all U(1)s. The
//! trace of its cube over all components is the sum of the local conditions, each times a
//! polynomial in the directions that no content enters; the trace of itself is the gravitational
//! ones. At random directions each condition has to be right for the sums to agree.

use std::collections::HashMap;

use anomaly::{Anomaly, Report};
use model::{Field, Symmetry};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::{One, Zero};
use outside_checks::slow::SlowAlgebra;
use proptest::prelude::*;

use super::plan::{Content, Part, Plan, plan};
use crate::support::{signed, slow};

/// The sums of powers 0 to 3 of the generator over some components.
type Moments = [BigRational; 4];

fn whole(value: i64) -> BigRational {
    BigRational::from(BigInt::from(value))
}

/// Moments of an irrep along `direction`, by its weights.
fn moments(algebra: &SlowAlgebra, labels: &[i64], direction: &[i64]) -> Moments {
    let character = algebra.character(labels);
    let mut sums = [0i64; 4];
    for (weight, times) in &character.weights {
        let pairs = weight.iter().zip(direction);
        let value: i64 = pairs.map(|(&w, x)| i64::from(w) * x).sum();
        for (power, sum) in (0u32..).zip(&mut sums) {
            *sum += times * value.pow(power);
        }
    }
    sums.map(whole)
}

/// Moments of a sum of two generators over a product of components.
fn multiplied(left: &Moments, right: &Moments) -> Moments {
    let binomial = [[1, 0, 0, 0], [1, 1, 0, 0], [1, 2, 1, 0], [1, 3, 3, 1]];
    std::array::from_fn(|power| {
        let terms = (0..=power).map(|k| &left[k] * &right[power - k] * whole(binomial[power][k]));
        terms.sum()
    })
}

fn of_part(symmetry: &Symmetry, part: &Part, direction: &[i64]) -> Moments {
    match part {
        Part::Labels(labels) => {
            let algebra = slow(symmetry.group().simple().unwrap());
            moments(&algebra, &signed(labels), direction)
        }
        Part::Charge(charge) => {
            let value = charge * whole(direction[0]);
            [0, 1, 2, 3].map(|power| value.pow(power))
        }
        Part::Discrete(_) => [1, 0, 0, 0].map(whole),
    }
}

/// Over all copies, in the left-handed view: a right-handed field is minus everything.
fn of_content(symmetries: &[Symmetry], content: &Content, directions: &[Vec<i64>]) -> Moments {
    let sign = match content.field {
        Field::ComplexScalar | Field::RealScalar => return [0, 0, 0, 0].map(whole),
        Field::RightHandedFermion => -1,
        Field::LeftHandedFermion | Field::ChiralSuperfield => 1,
    };
    let mut all = [1, 0, 0, 0].map(whole);
    for ((symmetry, part), direction) in symmetries.iter().zip(&content.parts).zip(directions) {
        all = multiplied(&all, &of_part(symmetry, part, direction));
    }
    let copies = whole(content.copies.into());
    [1, sign, 1, sign]
        .map(whole)
        .into_iter()
        .zip(all)
        .map(|(s, m)| s * m * &copies)
        .collect::<Vec<_>>()
        .try_into()
        .unwrap()
}

/// What the square and the cube of the generator trace to for index 1: from the adjoint, whose
/// index is its own trace over the roots; and from the fundamental of SU(N), or SO(6)'s spinor.
fn per_index(algebra: &SlowAlgebra, direction: &[i64]) -> (BigRational, BigRational) {
    let adjoint = algebra.labels_of(algebra.highest_root());
    let index = algebra.index(&algebra.character(&adjoint));
    let square = &moments(algebra, &adjoint, direction)[2] / whole(index);
    let mut fundamental = vec![0; algebra.rank()];
    match (algebra.letter, algebra.rank()) {
        ('A', _) => fundamental[0] = 1,
        ('D', 3) => fundamental[1] = 1,
        _ => return (square, BigRational::zero()),
    }
    (square, moments(algebra, &fundamental, direction)[3].clone())
}

/// How many orders three charges have.
fn orders(charges: [usize; 3]) -> i64 {
    let mut counts: HashMap<usize, i64> = HashMap::new();
    for charge in charges {
        *counts.entry(charge).or_default() += 1;
    }
    6 / counts
        .values()
        .map(|&n| (1..=n).product::<i64>())
        .product::<i64>()
}

/// The traces of the generator and of its cube, as the conditions say.
fn by_conditions(plan: &Plan, directions: &[Vec<i64>]) -> [BigRational; 2] {
    let report = Report::of(&plan.spectrum()).unwrap();
    let charge = |place: usize| whole(directions[place][0]);
    let factors = |place: usize| {
        let algebra = slow(plan.symmetries[place].group().simple().unwrap());
        per_index(&algebra, &directions[place])
    };
    let (mut linear, mut cubic) = (BigRational::zero(), BigRational::zero());
    for one in report.conditions() {
        let polynomial = match one.anomaly() {
            Anomaly::GravityCharge(place) => {
                linear += one.value() * charge(place);
                continue;
            }
            Anomaly::GaugeCubed(place) => factors(place).1,
            Anomaly::GaugeSquaredCharge {
                gauge,
                charge: place,
            } => factors(gauge).0 * charge(place) * whole(3),
            Anomaly::Charges(charges) => {
                let product = charges
                    .iter()
                    .fold(BigRational::one(), |all, &one| all * charge(one));
                product * whole(orders(charges))
            }
            _ => continue,
        };
        cubic += one.value() * polynomial;
    }
    [linear, cubic]
}

fn directions(plan: &Plan) -> impl Strategy<Value = Vec<Vec<i64>>> + use<> {
    let ranks = plan
        .symmetries
        .iter()
        .map(|one| one.group().simple().map_or(1, |a| a.rank()));
    let each: Vec<_> = ranks
        .map(|rank| prop::collection::vec(-9i64..=9, rank))
        .collect();
    each
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(96))]

    #[test]
    fn conditions_are_traces(
        (plan, directions) in plan().prop_flat_map(|plan| {
            let directions = directions(&plan);
            (Just(plan), directions)
        }),
    ) {
        let contents = plan.contents.iter();
        let mut sum = [0, 0, 0, 0].map(whole);
        for one in contents.map(|one| of_content(&plan.symmetries, one, &directions)) {
            for (sum, moment) in sum.iter_mut().zip(one) {
                *sum += moment;
            }
        }
        let [linear, cubic] = by_conditions(&plan, &directions);
        prop_assert_eq!(&linear, &sum[1]);
        prop_assert_eq!(&cubic, &sum[3]);
    }
}

/// Parities and Z(N) conditions: indices by weights.
fn index_by_weights(plan: &Plan, place: usize, content: &Content) -> i64 {
    if !content.field.has_fermions() {
        return 0;
    }
    let mut product = i64::from(content.copies);
    for (i, (symmetry, part)) in plan.symmetries.iter().zip(&content.parts).enumerate() {
        let Part::Labels(labels) = part else { continue };
        let algebra = slow(symmetry.group().simple().unwrap());
        let character = algebra.character(&signed(labels));
        product *= if i == place {
            algebra.index(&character)
        } else {
            character.dimension()
        };
    }
    product
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(96))]

    #[test]
    fn parities_and_discrete_sums(plan in plan()) {
        let report = Report::of(&plan.spectrum()).unwrap();
        let groups = plan.symmetries.len();
        for one in report.conditions() {
            let (place, discrete) = match one.anomaly() {
                Anomaly::Parity(place) => (place, None),
                Anomaly::GaugeSquaredDiscrete { gauge, discrete } => (gauge, Some(discrete)),
                // No place is looked at for its index: dimensions alone.
                Anomaly::GravityDiscrete(discrete) => (groups, Some(discrete)),
                _ => continue,
            };
            let mut sum = 0;
            for content in &plan.contents {
                let sign = if content.field == Field::RightHandedFermion { -1 } else { 1 };
                let charge = match discrete.map(|place| &content.parts[place]) {
                    None => 1,
                    Some(Part::Discrete(charge)) => sign * charge,
                    Some(_) => unreachable!("a Z(N) has whole charges"),
                };
                sum += charge * index_by_weights(&plan, place, content);
            }
            let modulus = match (discrete, one.rule()) {
                (None, anomaly::Rule::MultipleOf(2)) => 2,
                (Some(place), anomaly::Rule::MultipleOf(_)) => match plan.symmetries[place].group() {
                    model::Group::Discrete(order) => i64::from(order.get()),
                    _ => unreachable!("a Z(N)"),
                },
                _ => unreachable!("sums with a modulus"),
            };
            if discrete.is_none() {
                prop_assert_eq!(one.value(), &whole(sum), "{}", one.name());
            }
            let change = (one.value() - whole(sum)) / whole(modulus);
            prop_assert!(change.is_integer(), "{}", one.name());
            let rule = if place == groups && modulus % 2 == 0 { modulus / 2 } else { modulus };
            prop_assert_eq!(one.cancels(), sum % rule == 0, "{}", one.name());
        }
    }
}
