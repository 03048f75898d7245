//! Weights of the classical algebras in an orthogonal basis, where the Weyl group permutes the
//! coordinates (and, but for SU(N), changes signs).
//!
//! Sums over all roots become sums over pairs of coordinates, so that nothing of the size of the
//! root system is stored. The bases are those of [Bourbaki 1968], plates I to IV.

use smallvec::SmallVec;

use crate::{CartanType, Family};

/// One number per coordinate; no allocation up to rank 9.
pub(crate) type Coordinates = SmallVec<[i64; 10]>;

/// Coordinates of the weight with these Dynkin labels: for SU(N) the rows of its Young diagram
/// (N of them, the last one 0), for the others *twice* the coordinates of the plates, so that
/// spinors are whole. `None` for the exceptional algebras.
///
/// Labels below 2^33 keep every coordinate within `i64` at any rank that exists.
pub(crate) fn coordinates(
    cartan_type: CartanType,
    labels: impl DoubleEndedIterator<Item = i64> + Clone,
) -> Option<Coordinates> {
    let n = cartan_type.rank();
    let sums_from_the_end = |labels: &mut dyn Iterator<Item = i64>, start: i64, step: i64| {
        let mut sum = start;
        let mut sums: Coordinates = labels
            .map(|label| {
                sum += step * label;
                sum
            })
            .collect();
        sums.reverse();
        sums
    };
    match cartan_type.family() {
        Family::A => {
            let mut rows = sums_from_the_end(&mut labels.rev(), 0, 1);
            rows.push(0);
            Some(rows)
        }
        Family::B => {
            let mut backwards = labels.rev();
            let last = backwards.next()?;
            let mut sums = sums_from_the_end(&mut backwards, last, 2);
            sums.push(last);
            Some(sums)
        }
        Family::C => Some(sums_from_the_end(&mut labels.rev(), 0, 2)),
        Family::D => {
            let mut backwards = labels.rev();
            let (last, other) = (backwards.next()?, backwards.next()?);
            let mut sums = sums_from_the_end(&mut backwards, last + other, 2);
            debug_assert_eq!(sums.len(), n - 2);
            sums.extend([last + other, last - other]);
            Some(sums)
        }
        Family::E | Family::F | Family::G => None,
    }
}

/// Coordinates of the Weyl vector rho, all of whose labels are 1, as [`coordinates`] gives them.
pub(crate) fn weyl_vector(cartan_type: CartanType) -> Option<Coordinates> {
    coordinates(cartan_type, std::iter::repeat_n(1, cartan_type.rank()))
}

/// The type whose roots are the coroots of this classical one.
pub(crate) fn dual(cartan_type: CartanType) -> CartanType {
    let family = match cartan_type.family() {
        Family::B => Family::C,
        Family::C => Family::B,
        same => same,
    };
    CartanType::new(family, cartan_type.rank()).expect("B and C have the same ranks")
}
