//! Names both ways, for every irrep of every algebra of rank up to 8 below a dimension, and the
//! rules of naming written down a second time.

use std::collections::{BTreeMap, BTreeSet};

use num_bigint::BigUint;
use outside_checks::slow::SlowAlgebra;
use roots::{CatalogBound, Family, Irrep, NameBook, SimpleAlgebra};

use crate::support::{algebra, irrep, signed, slow};

/// Every irrep up to it has its name checked; up to `READ_BACK` it is read back as well.
const NAMED: u32 = 20_000;
const READ_BACK: u32 = 20_000;

/// SU(2) has as many irreps as dimensions, and nothing to tell apart.
fn bound(algebra: SimpleAlgebra, most: u32) -> u32 {
    if algebra.rank() == 1 {
        most.min(1_000)
    } else {
        most
    }
}

/// Every irrep up to a dimension, by raising labels one by one and nothing cleverer.
fn all_up_to(algebra: SimpleAlgebra, most: u32) -> BTreeSet<Vec<u32>> {
    let mut found = BTreeSet::new();
    let mut open = vec![vec![0; algebra.rank()]];
    while let Some(labels) = open.pop() {
        let dimension = algebra.irrep(&labels).unwrap().dimension();
        if dimension > most.into() || !found.insert(labels.clone()) {
            continue;
        }
        for node in 0..labels.len() {
            let mut raised = labels.clone();
            raised[node] += 1;
            open.push(raised);
        }
    }
    found
}

fn listed(algebra: SimpleAlgebra, most: u32) -> Vec<Irrep> {
    let bound = CatalogBound::Dimension(bound(algebra, most).into());
    algebra.irreps_within(&bound, 100_000).unwrap()
}

#[test]
fn lists_are_complete_and_in_order() {
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let most = bound(algebra, 3_000);
        let list = listed(algebra, 3_000);
        let labels: BTreeSet<Vec<u32>> = list.iter().map(|irrep| irrep.labels().to_vec()).collect();
        assert_eq!(labels.len(), list.len(), "{algebra} lists an irrep twice");
        assert_eq!(labels, all_up_to(algebra, most), "{algebra}");
        let keys: Vec<(BigUint, BigUint)> = list
            .iter()
            .map(|irrep| (irrep.dimension(), irrep.dynkin_index()))
            .collect();
        assert!(keys.is_sorted(), "{algebra}: by dimension, then index");
    }
}

#[test]
fn lists_by_index() {
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let adjoint = algebra.adjoint().dynkin_index();
        let most = &adjoint * 6u32;
        let list = algebra
            .irreps_within(&CatalogBound::DynkinIndex(most.clone()), 100_000)
            .unwrap();
        assert!(
            list.iter().all(|irrep| irrep.dynkin_index() <= most),
            "{algebra}"
        );
        // What is missing has one label more than what is there, and is beyond the bound.
        let there: BTreeSet<&Irrep> = list.iter().collect();
        assert!(there.contains(&algebra.singlet()), "{algebra}");
        for irrep in &list {
            for node in 0..algebra.rank() {
                let mut labels = irrep.labels().to_vec();
                labels[node] += 1;
                let raised = algebra.irrep(&labels).unwrap();
                let beyond = raised.dynkin_index() > most;
                assert!(beyond != there.contains(&raised), "{raised:?}");
            }
        }
    }
}

#[test]
fn names_are_unique_and_follow_the_rules() {
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let list = listed(algebra, NAMED);
        let mut book = NameBook::new(algebra);
        let names: Vec<String> = list
            .iter()
            .map(|irrep| book.name(irrep).to_string())
            .collect();
        let unique: BTreeSet<&String> = names.iter().collect();
        assert_eq!(unique.len(), names.len(), "{algebra}");
        check_rules(algebra, &list, &names);
    }
}

#[test]
fn names_read_back() {
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let mut book = NameBook::new(algebra);
        for irrep in listed(algebra, READ_BACK) {
            let name = book.name(&irrep).to_string();
            assert_eq!(
                algebra.read_irrep(&name).as_ref(),
                Ok(&irrep),
                "{algebra} {name}"
            );
            assert_eq!(algebra.read_irrep(&irrep.bracketed()).as_ref(), Ok(&irrep));
        }
    }
}

/// A name's parts: dimension, primes, letters, bar.
fn parts(name: &str) -> (u32, usize, &str, bool) {
    let (name, bar) = name
        .strip_suffix("bar")
        .map_or((name, false), |plain| (plain, true));
    let digits = name.trim_end_matches(|c: char| !c.is_ascii_digit());
    let rest = &name[digits.len()..];
    let letters = rest.trim_start_matches('\'');
    (
        digits.parse().unwrap(),
        rest.len() - letters.len(),
        letters,
        bar,
    )
}

/// Primes count, index by index, the conjugate pairs (in SO(8), the triality orbits) of a
/// dimension; bars follow the class.
fn check_rules(algebra: SimpleAlgebra, list: &[Irrep], names: &[String]) {
    let slow = slow(algebra);
    let mut kin: BTreeMap<(u32, BTreeSet<Vec<u32>>), Vec<usize>> = BTreeMap::new();
    for (irrep, name) in list.iter().zip(names) {
        let (dimension, primes, letters, bar) = parts(name);
        assert_eq!(irrep.dimension(), dimension.into(), "{irrep:?} {name}");
        assert_eq!(bar, has_bar(algebra, &slow, irrep), "{irrep:?} {name}");
        assert_eq!(letters, expected_letters(irrep), "{irrep:?} {name}");
        let orbit = orbit(&slow, irrep);
        kin.entry((dimension, orbit)).or_default().push(primes);
    }
    let mut by_dimension: BTreeMap<u32, Vec<(usize, BigUint)>> = BTreeMap::new();
    for ((dimension, orbit), primes) in kin {
        assert!(
            primes.iter().all(|p| *p == primes[0]),
            "{algebra}: {orbit:?} share primes"
        );
        assert_eq!(primes.len(), orbit.len(), "{algebra}: {orbit:?} is whole");
        let index = algebra
            .irrep(orbit.first().unwrap())
            .unwrap()
            .dynkin_index();
        by_dimension
            .entry(dimension)
            .or_default()
            .push((primes[0], index));
    }
    for (dimension, mut counted) in by_dimension {
        counted.sort();
        let primes: Vec<usize> = counted.iter().map(|(primes, _)| *primes).collect();
        assert_eq!(
            primes,
            (0..counted.len()).collect::<Vec<_>>(),
            "{algebra}, {dimension}"
        );
        assert!(
            counted.iter().map(|(_, index)| index).is_sorted(),
            "{algebra}, {dimension}"
        );
    }
}

/// An irrep's conjugates, and in SO(8) its images under triality.
fn orbit(slow: &SlowAlgebra, irrep: &Irrep) -> BTreeSet<Vec<u32>> {
    let labels = irrep.labels();
    if (slow.letter, slow.rank()) == ('D', 4) {
        let outer = [labels[0], labels[2], labels[3]];
        let orders = [
            [0, 1, 2],
            [0, 2, 1],
            [1, 0, 2],
            [1, 2, 0],
            [2, 0, 1],
            [2, 1, 0],
        ];
        return orders
            .map(|[i, j, k]| vec![outer[i], labels[1], outer[j], outer[k]])
            .into();
    }
    let conjugate = slow.conjugate(&signed(labels));
    let conjugate = conjugate.iter().map(|&l| l.try_into().unwrap()).collect();
    [labels.to_vec(), conjugate].into()
}

/// The bar of interface.md: the class decides; where it ties, the labels from the left for SU(N)
/// and E6, and the plain spinor's node for SO(4k + 2); the 6 of SU(3) is (20).
fn has_bar(algebra: SimpleAlgebra, slow: &SlowAlgebra, one: &Irrep) -> bool {
    let other = irrep(algebra, &slow.conjugate(&signed(one.labels())));
    if other == *one {
        return false;
    }
    let (own, conjugate) = (signed(one.labels()), signed(other.labels()));
    if slow.letter == 'A' && (own == [2, 0] || own == [0, 2]) {
        return own == [0, 2];
    }
    let class = |w: &[i64]| -> i64 {
        let rank = w.len();
        match (slow.letter, rank) {
            ('A', _) => {
                (1..).zip(w).map(|(k, l)| k * l).sum::<i64>() % (1 + i64::try_from(rank).unwrap())
            }
            ('E', 6) => (w[0] + 2 * w[1] + w[3] + 2 * w[4]) % 3,
            // SO(10) and SO(14) are the ones here: 2 a_1 + 2 a_3 ... and the ends by themselves.
            ('D', 5) => (2 * w[0] + 2 * w[2] + 3 * w[3] + 5 * w[4]) % 4,
            ('D', 7) => (2 * w[0] + 2 * w[2] + 2 * w[4] + 5 * w[5] + 7 * w[6]) % 4,
            ('D', 3) => (2 * w[0] + w[1] + 3 * w[2]) % 4,
            _ => panic!("{algebra} has no complex irreps"),
        }
    };
    let spinor = match slow.rank() {
        3 => 1,
        5 => 4,
        7 => 5,
        _ => 0,
    };
    match class(&own).cmp(&class(&conjugate)) {
        std::cmp::Ordering::Less => false,
        std::cmp::Ordering::Greater => true,
        std::cmp::Ordering::Equal if slow.letter == 'D' => own[spinor] < conjugate[spinor],
        std::cmp::Ordering::Equal => own < conjugate,
    }
}

/// SO(8): no letter where the outer labels are alike, one where two are, two where none are.
fn expected_letters(irrep: &Irrep) -> String {
    if irrep.algebra().cartan_type().to_string() != "D4" {
        return String::new();
    }
    let labels = irrep.labels();
    let mut outer = vec![(labels[0], 'v'), (labels[3], 's'), (labels[2], 'c')];
    let odd_one_out = |outer: &[(u32, char)]| {
        let alone = |label: u32| outer.iter().filter(|(other, _)| *other == label).count() == 1;
        outer
            .iter()
            .find(|(label, _)| alone(*label))
            .map(|(_, letter)| *letter)
    };
    let distinct: BTreeSet<u32> = outer.iter().map(|(label, _)| *label).collect();
    match distinct.len() {
        1 => String::new(),
        2 => odd_one_out(&outer).unwrap().to_string(),
        _ => {
            outer.sort_by(|left, right| right.cmp(left));
            outer[..2].iter().map(|(_, letter)| *letter).collect()
        }
    }
}

/// The names that interface.md promises.
#[test]
fn promised_names() {
    let promised = [
        ("SU(5)", "10", "(0100)"),
        ("SU(5)", "35", "(0003)"),
        ("SU(5)", "40", "(0011)"),
        ("SU(5)", "45", "(0101)"),
        ("SU(4)", "10", "(200)"),
        ("SO(10)", "126", "(00002)"),
        ("SO(14)", "64", "(0000010)"),
        ("SU(3)", "6", "(20)"),
        ("SU(3)", "15", "(21)"),
        ("SU(3)", "15'", "(40)"),
        ("SO(8)", "8v", "(1000)"),
        ("SO(8)", "8s", "(0001)"),
        ("SO(8)", "8c", "(0010)"),
        ("SO(8)", "35v", "(2000)"),
        ("E6", "27", "(100000)"),
        ("E6", "78", "(000001)"),
        ("E7", "133", "(1000000)"),
        ("E7", "56", "(0000010)"),
        ("E8", "248", "(00000010)"),
        ("F4", "52", "(1000)"),
        ("F4", "26", "(0001)"),
        ("G2", "14", "(10)"),
        ("G2", "7", "(01)"),
        ("SO(10)", "16", "(00001)"),
        ("SO(10)", "16bar", "(00010)"),
        ("SU(3)", "6bar", "(02)"),
        ("SO(8)", "56v", "(0011)"),
        ("SO(8)", "224vc", "(2010)"),
        ("SO(12)", "32", "(000001)"),
        ("SO(12)", "32'", "(000010)"),
        ("SO(6)", "4", "(010)"),
        ("SU(2)", "13", "(12)"),
    ];
    for (name, written, labels) in promised {
        let irrep = algebra(name).read_irrep(written).unwrap();
        assert_eq!(
            (irrep.bracketed().as_str(), irrep.name().as_str()),
            (labels, written)
        );
    }
}

/// Names reach dimension 10^6 everywhere and 10^9 in the exceptional algebras.
#[test]
fn names_reach_far() {
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let exceptional = !matches!(
            algebra.cartan_type().family(),
            Family::A | Family::B | Family::C | Family::D
        );
        let reach = if exceptional {
            1_000_000_000u32
        } else {
            1_000_000
        };
        // The largest multiple of the first fundamental weight within reach.
        let multiple = |label: u32| {
            let labels: Vec<u32> = (0..algebra.rank())
                .map(|i| if i == 0 { label } else { 0 })
                .collect();
            algebra.irrep(&labels).unwrap()
        };
        let within = |label: &u32| multiple(*label).dimension() <= reach.into();
        let irrep = multiple((1..).take_while(within).last().unwrap_or(1));
        let name = irrep.name();
        assert!(
            name.starts_with(|c: char| c.is_ascii_digit()),
            "{irrep:?} is {name}"
        );
        assert_eq!(algebra.read_irrep(&name).unwrap(), irrep, "{name}");
    }
}
