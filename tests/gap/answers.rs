//! What GAP says of every simple type up to rank 8, from one process.

use std::fmt::Write;
use std::sync::OnceLock;

use num_bigint::BigInt;
use outside_checks::gap;
use roots::SimpleAlgebra;

use crate::support::seed;

/// Irreps asked per type.
const IRREPS: usize = 24;

/// What GAP says of one algebra, in the order that it counts nodes in.
pub(crate) struct Answer {
    pub(crate) algebra: SimpleAlgebra,
    pub(crate) cartan: Vec<Vec<i64>>,
    pub(crate) positive_roots: Vec<Vec<i64>>,
    pub(crate) weyl_group_order: BigInt,
    pub(crate) exponents: Vec<i64>,
    /// Labels in GAP's order, and the dimension.
    pub(crate) irreps: Vec<(Vec<i64>, BigInt)>,
}

/// Exponents are read off the eigenvalues `exp(2 pi i m / h)` of a Coxeter element.
const PER_TYPE: &str = "
checkType := function(letter, rank, irreps)
  local L, R, simple, coxeter, h, exponents, m, p, highest;
  L := SimpleLieAlgebra(letter, rank, Rationals);
  R := RootSystem(L);
  simple := SimpleSystem(R);
  Print(\"cartan \", Concatenation(CartanMatrix(R)), \"\\n\");
  Print(\"roots \", List(PositiveRoots(R), r -> SolutionMat(simple, r)), \"\\n\");
  Print(\"order \", Size(WeylGroup(R)), \"\\n\");
  coxeter := Product(GeneratorsOfGroup(WeylGroup(R)));
  h := Order(coxeter);
  exponents := [];
  for m in [1..h-1] do
    p := CharacteristicPolynomial(coxeter);
    while Value(p, E(h)^m) = 0 do
      Add(exponents, m);
      p := Derivative(p);
    od;
  od;
  Print(\"exponents \", exponents, \"\\n\");
  for highest in irreps do
    Print(\"dimension \", DimensionOfHighestWeightModule(L, highest), \"\\n\");
  od;
end;
";

/// All answers; `None` where there is no GAP.
pub(crate) fn answers() -> Option<&'static [Answer]> {
    static ASKED: OnceLock<Option<Vec<Answer>>> = OnceLock::new();
    ASKED.get_or_init(ask).as_deref()
}

/// Every simple type up to rank 8 but D3, which GAP has as A3 alone.
pub(crate) fn known_to_gap() -> impl Iterator<Item = SimpleAlgebra> {
    SimpleAlgebra::up_to_rank(8).filter(|algebra| algebra.cartan_type().to_string() != "D3")
}

fn ask() -> Option<Vec<Answer>> {
    let mut random = fastrand::Rng::with_seed(seed());
    let questions: Vec<(SimpleAlgebra, Vec<Vec<i64>>)> = known_to_gap()
        .map(|algebra| (algebra, random_irreps(algebra.rank(), &mut random)))
        .collect();
    let mut script = PER_TYPE.to_owned();
    for (algebra, irreps) in &questions {
        let letter = algebra.cartan_type().family();
        let rank = algebra.rank();
        writeln!(script, "checkType(\"{letter}\", {rank}, {irreps:?});").unwrap();
    }
    let lines = gap::run(&script)?;
    let mut lines = lines.into_iter();
    let answers = questions
        .into_iter()
        .map(|(algebra, irreps)| read(algebra, irreps, &mut lines));
    let answers: Vec<Answer> = answers.collect();
    assert_eq!(lines.next(), None, "gap printed more than it was asked");
    Some(answers)
}

/// Labels small and large, most of them zero in some and none in others.
fn random_irreps(rank: usize, random: &mut fastrand::Rng) -> Vec<Vec<i64>> {
    let mut irrep = |i: usize| -> Vec<i64> {
        let most = [1, 3, 9, 1000][i % 4];
        let filled = random.u8(1..=8);
        let mut label = || {
            if random.u8(0..8) < filled {
                random.i64(0..=most)
            } else {
                0
            }
        };
        (0..rank).map(|_| label()).collect()
    };
    (0..IRREPS).map(&mut irrep).collect()
}

fn read(
    algebra: SimpleAlgebra,
    irreps: Vec<Vec<i64>>,
    lines: &mut impl Iterator<Item = String>,
) -> Answer {
    let mut next = |word: &str| -> Vec<BigInt> {
        let line = lines
            .next()
            .unwrap_or_else(|| panic!("no {word} of {algebra}"));
        let rest = line.strip_prefix(word);
        gap::numbers(rest.unwrap_or_else(|| panic!("{algebra}: {word} expected: {line}")))
    };
    let small = |numbers: Vec<BigInt>| -> Vec<i64> {
        numbers
            .iter()
            .map(|number| number.try_into().unwrap())
            .collect()
    };
    let rows = |numbers: Vec<i64>| -> Vec<Vec<i64>> {
        numbers
            .chunks(algebra.rank())
            .map(<[i64]>::to_vec)
            .collect()
    };
    Answer {
        algebra,
        cartan: rows(small(next("cartan"))),
        positive_roots: rows(small(next("roots"))),
        weyl_group_order: next("order").remove(0),
        exponents: small(next("exponents")),
        irreps: irreps
            .into_iter()
            .map(|labels| (labels, next("dimension").remove(0)))
            .collect(),
    }
}
