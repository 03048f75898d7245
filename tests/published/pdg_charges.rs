//! Charges of quarks and leptons in the Review of Particle Physics, against Q = T3 + Y with the
//! hypercharges of the Standard Model (common practice: quark doublet 1/6, lepton doublet -1/2).

use num_rational::BigRational;
use outside_checks::table::{self, ChargeTable};
use roots::read_rational;

use crate::support::{algebra, slow};

fn number(written: &str) -> BigRational {
    read_rational(written).unwrap()
}

/// Charges of a multiplet's components, the highest weight of SU(2) first.
fn charges(doublet: &str, hypercharge: &str) -> Vec<BigRational> {
    let su2 = algebra("SU(2)");
    let irrep = su2.read_irrep(doublet).unwrap();
    let weights = slow(su2).character(&[irrep.labels()[0].into()]).weights;
    let mut labels: Vec<i16> = weights.keys().map(|w| w[0]).collect();
    labels.sort_by(|left, right| right.cmp(left));
    let t3 = labels
        .into_iter()
        .map(|label| number(&format!("{label}/2")));
    t3.map(|t3| t3 + number(hypercharge)).collect()
}

#[test]
fn charge_is_t3_plus_hypercharge() {
    let table: ChargeTable = table::read("pdg_charges.toml");
    assert_eq!(table.particles.len(), 12);
    let multiplets = [
        (
            charges("2", "1/6"),
            vec!["up-type quark", "down-type quark"],
        ),
        (charges("1", "2/3"), vec!["up-type quark"]),
        (charges("1", "-1/3"), vec!["down-type quark"]),
        (charges("2", "-1/2"), vec!["neutrino", "charged lepton"]),
        (charges("1", "-1"), vec!["charged lepton"]),
        (charges("1", "0"), vec!["neutrino"]),
    ];
    for (charges, kinds) in multiplets {
        assert_eq!(charges.len(), kinds.len());
        for (charge, kind) in charges.iter().zip(kinds) {
            let of_kind = table
                .particles
                .iter()
                .filter(|particle| particle.kind == kind);
            let published: Vec<BigRational> = of_kind.map(|p| number(&p.charge)).collect();
            assert_eq!(
                published,
                vec![charge.clone(); 3],
                "{kind}, {}",
                table.source
            );
        }
    }
}
