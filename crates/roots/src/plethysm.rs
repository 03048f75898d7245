//! Powers of an irrep: the part of R x R x ... x R with one permutation symmetry.

use num_bigint::BigInt;

use crate::count::{Count, in_width};
use crate::frame::Frame;
use crate::klimyk::{self, Counted, Factor};
use crate::lane_table::LaneTable;
use crate::lanes::{Lanes, on_lanes};
use crate::tensor_product::{bound_of, factor, singlet};
use crate::{Decomposition, Error, Irrep, Limits, Partition};

impl Irrep {
    /// The part of the power that has the symmetry of `partition`: symmetric for a single row,
    /// antisymmetric for a single column.
    ///
    /// # Errors
    /// [`Error::BeyondLimit`] where it is too large for the [`Limits`].
    /// # Cost
    /// For each class of permutations about one product with the irrep, the classes taken
    /// together as Horner's rule takes the terms of a polynomial.
    /// # Source
    /// Frobenius' formula: the average over permutations of the symmetric group's character times
    /// the product of Adams operations over cycles, [Macdonald 1995], I.7 and I.8.
    ///
    /// ```
    /// let su3: roots::SimpleAlgebra = "SU(3)".parse()?;
    /// let baryons = su3.read_irrep("3")?.power(&"2,1".parse()?)?;
    /// assert_eq!(baryons.irreps().next().unwrap().name(), "8");
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn power(&self, partition: &Partition) -> Result<Decomposition, Error> {
        self.power_within(partition, &Limits::default())
    }

    /// As [`power`](Self::power), within limits of one's own.
    ///
    /// # Errors
    /// As [`power`](Self::power).
    pub fn power_within(
        &self,
        partition: &Partition,
        limits: &Limits,
    ) -> Result<Decomposition, Error> {
        let copies = std::iter::repeat_n(self, partition.size() as usize);
        let bound = bound_of(self.algebra(), copies)?;
        on_lanes!(self.algebra().cartan_type(), bound, |held| {
            Ok(in_width!(Counts => power_in::<_, Counts>(self, &held, partition, limits)?))
        })
    }

    /// The symmetric power.
    ///
    /// # Errors
    /// As [`power`](Self::power), and [`Error::BadPartition`] beyond [`Partition::MOST`].
    pub fn symmetric_power(&self, degree: u32) -> Result<Decomposition, Error> {
        self.power(&Partition::row(degree)?)
    }

    /// The antisymmetric power.
    ///
    /// # Errors
    /// As [`power`](Self::power), and [`Error::BadPartition`] beyond [`Partition::MOST`].
    pub fn antisymmetric_power(&self, degree: u32) -> Result<Decomposition, Error> {
        self.power(&Partition::column(degree)?)
    }

    /// The whole tensor power, of any degree.
    ///
    /// # Errors
    /// As [`SimpleAlgebra::product`](crate::SimpleAlgebra::product).
    ///
    /// ```
    /// let su5: roots::SimpleAlgebra = "SU(5)".parse()?;
    /// let power = su5.adjoint().tensor_power(20)?;
    /// assert_eq!(power.dimension(), num_bigint::BigUint::from(24u32).pow(20));
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn tensor_power(&self, degree: usize) -> Result<Decomposition, Error> {
        self.algebra().product(&vec![self.clone(); degree])
    }
}

fn power_in<L: Lanes, C: Count>(
    irrep: &Irrep,
    frame: &Frame<L>,
    partition: &Partition,
    limits: &Limits,
) -> Result<Option<Decomposition>, Error> {
    let Some(factor) = factor::<L, C>(frame, irrep, limits)? else {
        return Ok(None);
    };
    let expansion = Expansion {
        frame,
        factor,
        partition,
        permutations: (1..=partition.size()).map(BigInt::from).product(),
        limits,
    };
    let Some(whole) = expansion.with_cycles_from(1, partition.size(), &mut Vec::new())? else {
        return Ok(None);
    };
    let Some(permutations) = C::read(&expansion.permutations) else {
        return Ok(None);
    };
    let terms = whole.into_iter().map(|(weight, count)| {
        let (times, rest) = count.div_rem(&permutations);
        debug_assert!(rest.is_zero(), "multiplicities are whole");
        (weight, times)
    });
    let terms = terms.collect();
    Ok(Decomposition::from_counts(irrep.algebra(), terms))
}

/// The sum over permutations, cycle by cycle.
struct Expansion<'a, L, C> {
    frame: &'a Frame<L>,
    factor: Factor<L, C>,
    partition: &'a Partition,
    permutations: BigInt,
    limits: &'a Limits,
}

impl<L: Lanes, C: Count> Expansion<'_, L, C> {
    /// The sum over all ways to fill `left` places with cycles of `length` or longer, beside the
    /// `shorter` ones: a polynomial in the Adams operation of degree `length`.
    fn with_cycles_from(
        &self,
        length: u32,
        left: u32,
        shorter: &mut Vec<u32>,
    ) -> Result<Option<Counted<L, C>>, Error> {
        if left == 0 {
            return Ok(self.constant(shorter));
        }
        let mut sum: Counted<L, C> = Vec::new();
        for cycles in (0..=left / length).rev() {
            if !sum.is_empty() {
                let scale = length.into();
                let times = klimyk::times(self.frame, &sum, &self.factor, scale, self.limits)?;
                let Some(times) = times else { return Ok(None) };
                sum = klimyk::unshifted(self.frame, &times);
            }
            let rest = left - cycles * length;
            if rest != 0 && rest <= length {
                continue;
            }
            let known = shorter.len();
            shorter.extend(std::iter::repeat_n(length, cycles as usize));
            let others = self.with_cycles_from(length + 1, rest, shorter)?;
            shorter.truncate(known);
            let Some(others) = others else {
                return Ok(None);
            };
            let Some(total) = add(sum, others) else {
                return Ok(None);
            };
            sum = total;
        }
        Ok(Some(sum))
    }

    /// The number of permutations with these cycles times the symmetric group's character.
    fn constant(&self, cycles: &[u32]) -> Option<Counted<L, C>> {
        let mut falling = cycles.to_vec();
        falling.reverse();
        let class = Partition::new(&falling).expect("cycles fill the partition's size");
        let value = self.partition.symmetric_group_character(&class)
            * (&self.permutations / class.centralizer_order());
        let value = C::read(&value)?;
        let singlet = singlet(self.frame);
        Some(if value.is_zero() {
            Vec::new()
        } else {
            vec![(singlet, value)]
        })
    }
}

/// The sum; `None` where a count does not fit in `C`.
fn add<L: Lanes, C: Count>(left: Counted<L, C>, right: Counted<L, C>) -> Option<Counted<L, C>> {
    if left.is_empty() {
        return Some(right);
    }
    if right.is_empty() {
        return Some(left);
    }
    let mut sums = LaneTable::<L, C>::for_entries(left.len() + right.len());
    for (weight, count) in left.into_iter().chain(right) {
        let sum = sums.at(&weight);
        *sum = sum.checked_add(&count)?;
    }
    Some(
        sums.into_entries()
            .filter(|(_, count)| !count.is_zero())
            .collect(),
    )
}
