//! The part of the gauge group's centre that no multiplet feels.

use num_bigint::BigInt;
use num_traits::Zero;
use roots::{Center, Congruency, FiniteAbelian, rows_without};

use crate::{Group, Multiplet, Spectrum};

impl Spectrum {
    /// The subgroup of the gauge group that acts trivially on every multiplet, scalars included.
    /// Each simple factor is taken simply connected, and the U(1)s together as the torus that acts
    /// effectively: its characters are the sums of the charges that occur, so that the answer does
    /// not depend on which combinations of the U(1)s the charges are written in, and a combination
    /// that nothing is charged under is left out. It is Z6 for the Standard Model.
    ///
    /// `None` while a charge is unknown, and for charges without a common denominator within 63
    /// bits. The group that acts is the quotient by it. Z(N) symmetries and global ones take no
    /// part.
    ///
    /// # Source
    /// [Tong 2017]; computed as the classes under the centre modulo those that neutral
    /// combinations of the multiplets have.
    #[must_use]
    pub fn trivially_acting_center(&self) -> Option<FiniteAbelian> {
        let gauged = self
            .symmetries()
            .iter()
            .enumerate()
            .filter(|(_, one)| one.is_gauged());
        let (charges, simple): (Vec<_>, Vec<_>) = gauged
            .map(|(place, one)| (place, one.group()))
            .partition(|(_, group)| group.is_u1());
        let centers: Vec<(usize, Center)> = simple
            .into_iter()
            .filter_map(|(place, group)| match group {
                Group::Simple(algebra) => Some((place, algebra.center())),
                Group::U1 | Group::Discrete(_) => None,
            })
            .collect();
        let orders: Vec<u32> = centers
            .iter()
            .flat_map(|(_, center)| cyclic_orders(*center))
            .collect();
        let rows = self.multiplets().iter().map(|multiplet| {
            let charges = charges
                .iter()
                .map(|&(place, _)| multiplet.scaled_charge(place));
            let charges: Option<Vec<BigInt>> = charges.map(|q| q.map(BigInt::from)).collect();
            let mut row = charges?;
            row.extend(
                centers
                    .iter()
                    .flat_map(|&(place, _)| classes(multiplet, place)),
            );
            Some(row)
        });
        let rows: Vec<Vec<BigInt>> = rows.collect::<Option<_>>()?;
        let neutral = rows_without(rows, charges.len()).into_iter();
        let mut relations: Vec<Vec<BigInt>> = neutral
            .map(|mut row| row.split_off(charges.len()))
            .collect();
        for (place, &order) in orders.iter().enumerate() {
            let mut relation = vec![BigInt::zero(); orders.len()];
            relation[place] = order.into();
            relations.push(relation);
        }
        FiniteAbelian::quotient(orders.len(), &relations)
    }
}

fn cyclic_orders(center: Center) -> Vec<u32> {
    match center {
        Center::Cyclic(order) => vec![order],
        Center::FourGroup => vec![2, 2],
    }
}

fn classes(multiplet: &Multiplet, place: usize) -> Vec<BigInt> {
    let class = multiplet.irrep(place).map(roots::Irrep::congruency);
    match class {
        Some(Congruency::Cyclic(class)) => vec![class.into()],
        // Slansky's second number is even and counts modulo 4.
        Some(Congruency::Pair(first, second)) => vec![first.into(), (second / 2).into()],
        None => Vec::new(),
    }
}
