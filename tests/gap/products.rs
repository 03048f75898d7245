//! Products, dominant characters and powers against GAP, over irreps drawn at random.
//!
//! The seed is printed; `GAUGEWRIGHT_SEED=<number>` gives it again.

use std::collections::{BTreeMap, HashMap};

use num_bigint::{BigInt, BigUint};
use outside_checks::gap::{numbers, run};

use crate::support::seed;
use roots::{Decomposition, Irrep, Partition, SimpleAlgebra};

/// Every type of rank up to 8.
fn algebras() -> Vec<SimpleAlgebra> {
    SimpleAlgebra::up_to_rank(8).collect()
}

/// For each node of ours its place in GAP's order, found by matching the two Cartan matrices:
/// both have the labels of simple root i in row i.
fn places(algebra: SimpleAlgebra, gap: &[i64]) -> Vec<usize> {
    let n = algebra.rank();
    let ours = algebra.cartan_matrix();
    let mut places: Vec<usize> = Vec::new();
    let mut next = 0;
    // Depth first over partial matchings: the last node tried is given up when none fits.
    while places.len() < n {
        let node = places.len();
        let fits = |&p: &usize| {
            !places.contains(&p)
                && gap[p * n + p] == 2
                && (0..node).all(|j| {
                    i64::from(ours[(node, j)]) == gap[p * n + places[j]]
                        && i64::from(ours[(j, node)]) == gap[places[j] * n + p]
                })
        };
        match (next..n).find(fits) {
            Some(place) => {
                places.push(place);
                next = 0;
            }
            None => next = places.pop().expect("the two diagrams are one") + 1,
        }
    }
    places
}

/// GAP's order of nodes for every type, in one run; `None` without GAP.
fn all_places() -> Option<HashMap<SimpleAlgebra, Vec<usize>>> {
    let mut script = String::new();
    for algebra in algebras() {
        let gap = gap_algebra(algebra);
        script += &format!("Print(CartanMatrix(RootSystem({gap})),\"\\n\");\n");
    }
    let lines = run(&script)?;
    assert_eq!(lines.len(), algebras().len());
    let read = |line: &String| -> Vec<i64> {
        let entries = numbers(line).into_iter();
        entries.map(|entry| entry.try_into().unwrap()).collect()
    };
    let matrices = lines.iter().map(read);
    let known = algebras().into_iter().zip(matrices);
    Some(
        known
            .map(|(algebra, matrix)| (algebra, places(algebra, &matrix)))
            .collect(),
    )
}

/// Labels in GAP's order, as GAP writes a list.
fn to_gap(irrep: &Irrep, places: &[usize]) -> String {
    let mut labels = vec![0; places.len()];
    for (&label, &place) in irrep.labels().iter().zip(places) {
        labels[place] = label;
    }
    format!("{labels:?}")
}

/// A printed pair `[ [ labels, ... ], [ multiplicities ] ]`, labels in our order.
fn from_gap(line: &str, places: &[usize]) -> BTreeMap<Vec<i64>, BigInt> {
    let n = places.len();
    let flat = numbers(line);
    assert_eq!(flat.len() % (n + 1), 0, "{line}");
    let (weights, counts) = flat.split_at(flat.len() / (n + 1) * n);
    let label = |weight: &[BigInt], place: usize| -> i64 { (&weight[place]).try_into().unwrap() };
    weights
        .chunks(n)
        .map(|weight| places.iter().map(|&place| label(weight, place)).collect())
        .zip(counts.iter().cloned())
        .collect()
}

fn listed(sum: &Decomposition) -> BTreeMap<Vec<i64>, BigInt> {
    sum.iter()
        .map(|(irrep, n)| {
            let labels = irrep.labels().iter().map(|&label| label.into()).collect();
            (labels, n.into())
        })
        .collect()
}

/// Labels raised at random nodes for as long as the dimension stays within the bound.
fn random_irrep(random: &mut fastrand::Rng, algebra: SimpleAlgebra, most: u64) -> Irrep {
    let mut labels = vec![0; algebra.rank()];
    for _ in 0..random.usize(1..8) {
        let node = random.usize(..algebra.rank());
        labels[node] += 1;
        if algebra.irrep(&labels).unwrap().dimension() > BigUint::from(most) {
            labels[node] -= 1;
        }
    }
    algebra.irrep(&labels).unwrap()
}

/// As GAP makes it. It has D only from rank 4 on; D3 is A3 with other labels, which the matching
/// of Cartan matrices sees to.
fn gap_algebra(algebra: SimpleAlgebra) -> String {
    let of = algebra.cartan_type();
    let (family, rank) = (of.family().to_string(), of.rank());
    let family = if (family.as_str(), rank) == ("D", 3) {
        "A"
    } else {
        &family
    };
    format!("SimpleLieAlgebra(\"{family}\",{rank},Rationals)")
}

/// 330 products: ten of each of the 33 types.
#[test]
fn random_products() {
    let Some(places) = all_places() else { return };
    let mut random = fastrand::Rng::with_seed(seed());
    let mut script = String::new();
    let mut cases = Vec::new();
    for algebra in algebras() {
        script += &format!("L := {};\n", gap_algebra(algebra));
        for _ in 0..10 {
            let most = if algebra.rank() > 4 { 3_000 } else { 1_000 };
            let left = random_irrep(&mut random, algebra, most);
            let right = random_irrep(&mut random, algebra, most);
            let of = &places[&algebra];
            script += &format!(
                "Print(DecomposeTensorProduct(L,{},{}),\"\\n\");\n",
                to_gap(&left, of),
                to_gap(&right, of)
            );
            cases.push((left, right));
        }
    }
    assert!(cases.len() >= 300);
    let lines = run(&script).expect("gap ran before");
    assert_eq!(lines.len(), cases.len());
    for ((left, right), line) in cases.iter().zip(&lines) {
        let ours = listed(&left.product(right).unwrap());
        let theirs = from_gap(line, &places[&left.algebra()]);
        assert_eq!(ours, theirs, "{left:?} x {right:?}");
    }
}

/// 132 dominant characters: four of each type.
#[test]
fn random_dominant_characters() {
    let Some(places) = all_places() else { return };
    let mut random = fastrand::Rng::with_seed(seed());
    let mut script = String::new();
    let mut cases = Vec::new();
    for algebra in algebras() {
        script += &format!("L := {};\n", gap_algebra(algebra));
        for _ in 0..4 {
            let irrep = random_irrep(&mut random, algebra, 10_000_000);
            let labels = to_gap(&irrep, &places[&algebra]);
            script += &format!("Print(DominantCharacter(L,{labels}),\"\\n\");\n");
            cases.push(irrep);
        }
    }
    assert!(cases.len() >= 100);
    assert_characters_agree(&script, &cases, &places);
}

/// The first irreps of E8, whose weights [McKay-Patera 1981] and [Bremner-Moody-Patera 1985]
/// tabulate.
#[test]
fn characters_of_e8() {
    let Some(places) = all_places() else { return };
    let e8: SimpleAlgebra = "E8".parse().unwrap();
    let cases = ["248", "3875", "27000", "30380", "147250", "779247"];
    let cases = cases.map(|name| e8.read_irrep(name).unwrap());
    let mut script = format!("L := {};\n", gap_algebra(e8));
    for irrep in &cases {
        let labels = to_gap(irrep, &places[&e8]);
        script += &format!("Print(DominantCharacter(L,{labels}),\"\\n\");\n");
    }
    assert_characters_agree(&script, &cases, &places);
}

fn assert_characters_agree(
    script: &str,
    cases: &[Irrep],
    places: &HashMap<SimpleAlgebra, Vec<usize>>,
) {
    let lines = run(script).expect("gap ran before");
    assert_eq!(lines.len(), cases.len());
    for (irrep, line) in cases.iter().zip(&lines) {
        let dominant = irrep.dominant_weights().unwrap().into_iter();
        let ours: BTreeMap<Vec<i64>, BigInt> = dominant
            .map(|(weight, n)| (weight.labels().to_vec(), n.into()))
            .collect();
        assert_eq!(ours, from_gap(line, &places[&irrep.algebra()]), "{irrep:?}");
    }
}

/// Sym^3 + Alt^3 + 2 mixed is the cube, which GAP takes by two products; of a small irrep of each
/// type.
#[test]
fn cubes_from_their_symmetries() {
    const PROGRAM: &str = r#"
Cube := function(L, a)
  local square, sum, i, j, k, part;
  square := DecomposeTensorProduct(L, a, a);
  sum := [[], []];
  for i in [1..Length(square[1])] do
    part := DecomposeTensorProduct(L, square[1][i], a);
    for j in [1..Length(part[1])] do
      k := Position(sum[1], part[1][j]);
      if k = fail then
        Add(sum[1], part[1][j]); Add(sum[2], square[2][i] * part[2][j]);
      else
        sum[2][k] := sum[2][k] + square[2][i] * part[2][j];
      fi;
    od;
  od;
  return sum;
end;
"#;
    let Some(places) = all_places() else { return };
    let mut random = fastrand::Rng::with_seed(seed());
    let mut script = PROGRAM.to_owned();
    let mut cases = Vec::new();
    for algebra in algebras() {
        let most = if algebra.cartan_type().to_string() == "E8" {
            248
        } else {
            60
        };
        let irrep = random_irrep(&mut random, algebra, most);
        let labels = to_gap(&irrep, &places[&algebra]);
        script += &format!("Print(Cube({},{labels}),\"\\n\");\n", gap_algebra(algebra));
        cases.push(irrep);
    }
    let lines = run(&script).expect("gap ran before");
    assert_eq!(lines.len(), cases.len());
    for (irrep, line) in cases.iter().zip(&lines) {
        let mut ours: BTreeMap<Vec<i64>, BigInt> = BTreeMap::new();
        for partition in Partition::all(3).unwrap() {
            let identity = Partition::column(3).unwrap();
            let times = partition.symmetric_group_character(&identity);
            for (labels, n) in listed(&irrep.power(&partition).unwrap()) {
                *ours.entry(labels).or_default() += n * &times;
            }
        }
        assert_eq!(ours, from_gap(line, &places[&irrep.algebra()]), "{irrep:?}");
    }
}
