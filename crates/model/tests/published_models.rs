//! The example models of docs/models: each is read, survives its own file, and has the verdict of
//! its publication.
//!
//! The sums here are an independent check of anomaly cancellation: plain fractions, and a short
//! hand-written table of irreps instead of what `roots` works out.

use std::collections::BTreeMap;
use std::path::PathBuf;

use model::{Field, Group, Model, Multiplet};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;

fn directory() -> PathBuf {
    PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("../../docs/models")
}

/// Name, text and model of every file in a directory.
fn models(directory: &std::path::Path) -> Vec<(String, String, Model)> {
    let entries = std::fs::read_dir(directory).unwrap();
    let paths = entries.map(|entry| entry.unwrap().path());
    let mut files: Vec<PathBuf> = paths.filter(|path| path.is_file()).collect();
    files.sort();
    let read = files.into_iter().map(|path| {
        let name = path.file_stem().unwrap().to_str().unwrap().to_owned();
        let text = std::fs::read_to_string(&path).unwrap();
        let model = Model::from_toml(&text).unwrap_or_else(|error| panic!("{name}: {error}"));
        (name, text, model)
    });
    read.collect()
}

/// Dimension, Dynkin index and cubic index [Slansky 1981; Banks-Georgi 1976].
fn table(group: Group, irrep: &str) -> (i64, i64, i64) {
    match (&*group.to_string(), irrep) {
        (_, "1") => (1, 0, 0),
        ("SU(2)", "2") => (2, 1, 0),
        ("SU(3)", "3") => (3, 1, 1),
        ("SU(3)", "3bar") => (3, 1, -1),
        ("SU(4)", "4") => (4, 1, 1),
        ("SU(5)", "5bar") => (5, 1, -1),
        ("SU(5)", "10") => (10, 3, 1),
        ("SO(10)", "16") => (16, 4, 0),
        ("E6", "27") => (27, 6, 0),
        ("Sp(4)", "4") => (4, 1, 0),
        other => panic!("{other:?} is not in the table"),
    }
}

/// One multiplet in the left-handed view: what is needed for the sums, as plain fractions.
struct Fermion {
    /// Copies times all dimensions.
    number: i64,
    /// Per symmetry: dimension, Dynkin index, cubic index, charge.
    under: Vec<(i64, i64, i64, BigRational)>,
}

impl Fermion {
    fn new(groups: &[Group], multiplet: &Multiplet) -> Option<Self> {
        let sign = match multiplet.field() {
            Field::LeftHandedFermion | Field::ChiralSuperfield => 1,
            Field::RightHandedFermion => -1,
            Field::ComplexScalar | Field::RealScalar => return None,
        };
        let under = groups.iter().enumerate().map(|(i, group)| {
            if let Some(irrep) = multiplet.irrep(i) {
                let (dimension, index, cubic) = table(*group, &irrep.name());
                return (dimension, index, sign * cubic, BigRational::zero());
            }
            let charge = multiplet.charge(i).unwrap() * BigInt::from(sign);
            (1, 0, 0, charge)
        });
        let under: Vec<_> = under.collect();
        let dimensions = under.iter().map(|under| under.0);
        let number = dimensions.product::<i64>() * i64::from(multiplet.copies());
        Some(Self { number, under })
    }

    fn others(&self, i: usize) -> i64 {
        self.number / self.under[i].0
    }
}

/// Every condition that fails, with its value: `colour colour hypercharge = 1/3`.
fn failures(model: &Model) -> Vec<String> {
    let symmetries = model.spectrum().symmetries();
    let groups: Vec<Group> = symmetries.iter().map(model::Symmetry::group).collect();
    let multiplets = model.spectrum().multiplets().iter();
    let fermions: Vec<Fermion> = multiplets
        .filter_map(|m| Fermion::new(&groups, m))
        .collect();
    let sum = |term: &dyn Fn(&Fermion) -> BigRational| -> BigRational {
        fermions
            .iter()
            .fold(BigRational::zero(), |sum, f| sum + term(f))
    };
    let whole = |value: i64| BigRational::from(BigInt::from(value));
    let mut values: Vec<(String, BigRational)> = Vec::new();
    let label = |i: usize| symmetries[i].label();
    let abelian: Vec<usize> = (0..groups.len()).filter(|&i| groups[i].is_u1()).collect();
    for i in (0..groups.len()).filter(|&i| groups[i].simple().is_some()) {
        let cubic = sum(&|f| whole(f.under[i].2 * f.others(i)));
        values.push((format!("{0} {0} {0}", label(i)), cubic));
        for &u in &abelian {
            let mixed = sum(&|f| &f.under[u].3 * BigInt::from(f.under[i].1 * f.others(i)));
            values.push((format!("{0} {0} {1}", label(i), label(u)), mixed));
        }
        let index = sum(&|f| whole(f.under[i].1 * f.others(i)));
        let has_parity = matches!(&*groups[i].to_string(), "SU(2)" | "Sp(4)");
        if has_parity && index.numer() % 2 != BigInt::zero() {
            values.push((format!("{} parity", label(i)), index));
        }
    }
    for (x, &a) in abelian.iter().enumerate() {
        let gravity = sum(&|f| &f.under[a].3 * BigInt::from(f.number));
        values.push((format!("gravity gravity {}", label(a)), gravity));
        for (y, &b) in abelian.iter().enumerate().skip(x) {
            for &c in &abelian[y..] {
                let cubic = sum(&|f| {
                    &f.under[a].3 * &f.under[b].3 * &f.under[c].3 * BigInt::from(f.number)
                });
                values.push((format!("{} {} {}", label(a), label(b), label(c)), cubic));
            }
        }
    }
    let failing = values.into_iter().filter(|(_, value)| !value.is_zero());
    let mut failing: Vec<String> = failing.map(|(name, v)| format!("{name} = {v}")).collect();
    failing.sort();
    failing
}

#[test]
fn published_models_cancel() {
    let models = models(&directory());
    assert_eq!(models.len(), 14);
    for (name, _, model) in models {
        assert_eq!(failures(&model), Vec::<String>::new(), "{name}");
    }
}

/// Each broken file says in its comment which conditions fail with which values: those, no others.
#[test]
fn broken_models_fail_as_they_say() {
    let models = models(&directory().join("broken"));
    assert_eq!(models.len(), 8);
    for (name, text, model) in models {
        let comment = text.split_once("# Fails:\n").unwrap().1.lines();
        let lines = comment.map_while(|line| line.strip_prefix("#   "));
        let mut said: Vec<String> = lines.map(str::to_owned).collect();
        said.sort();
        assert!(!said.is_empty());
        assert_eq!(failures(&model), said, "{name}");
    }
}

#[test]
fn every_example_names_its_source_and_survives_its_own_file() {
    for directory in [directory(), directory().join("broken")] {
        for (name, text, model) in models(&directory) {
            assert!(model.source().is_some(), "{name}");
            assert!(text.starts_with("# "), "{name}");
            assert_eq!(Model::from_toml(&model.to_toml()), Ok(model), "{name}");
        }
    }
}

#[test]
fn the_demonstration_is_the_example() {
    let text = std::fs::read_to_string(directory().join("lanternfish.toml")).unwrap();
    assert_eq!(text, model::DEMO_FILE);
    assert_eq!(model::demo().spectrum().multiplets().len(), 17);
}

/// Every key of every example misspelt in turn: the error is on that line and says which key was
/// meant. Every line left out in turn: read or refused, never a panic.
#[test]
fn every_line_of_every_example_broken() {
    for (name, text, _) in models(&directory()) {
        let lines: Vec<&str> = text.lines().collect();
        for (i, line) in lines
            .iter()
            .enumerate()
            .filter(|(_, line)| !line.starts_with('#'))
        {
            let with = |line: &str| [&lines[..i], &[line], &lines[i + 1..]].concat().join("\n");
            let _ = Model::from_toml(&with(""));
            let Some((key, rest)) = line.split_once(" = ") else {
                continue;
            };
            let error = Model::from_toml(&with(&format!("x{key} = {rest}"))).unwrap_err();
            assert_eq!(
                (error.line(), error.column()),
                (Some(i + 1), Some(1)),
                "{name}: {error}"
            );
            let meant = format!("did you mean \"{key}\"?");
            assert!(error.help().contains(&meant), "{name}: {error}");
        }
    }
}

/// The weights of an irrep whose weights are one Weyl orbit, as those of all fermions here are.
fn weights(irrep: &roots::Irrep) -> Vec<Vec<i64>> {
    let cartan = irrep.algebra().cartan_matrix();
    let highest: Vec<i64> = irrep.labels().iter().map(|&label| label.into()).collect();
    let mut found = vec![highest];
    let mut next = 0;
    while let Some(weight) = found.get(next).cloned() {
        for (node, root) in cartan.rows().enumerate() {
            let step = weight[node];
            let reflected: Vec<i64> = weight
                .iter()
                .zip(root)
                .map(|(w, r)| w - step * i64::from(*r))
                .collect();
            if !found.contains(&reflected) {
                found.push(reflected);
            }
        }
        next += 1;
    }
    assert_eq!(num_bigint::BigUint::from(found.len()), irrep.dimension());
    found
}

/// How many left-handed fermions there are of each electric charge, conjugates included.
fn charges(model: &Model) -> BTreeMap<String, u32> {
    let electric = model.electric_charge().unwrap();
    let mut found = BTreeMap::new();
    for multiplet in model
        .spectrum()
        .multiplets()
        .iter()
        .filter(|m| m.has_fermions())
    {
        let mut charges = vec![BigRational::zero()];
        for i in 0..model.spectrum().symmetries().len() {
            let parts: Vec<BigRational> = match (multiplet.irrep(i), multiplet.charge(i)) {
                (Some(irrep), _) => {
                    let weights = weights(irrep);
                    weights
                        .iter()
                        .map(|weight| electric.of_weight(i, weight))
                        .collect()
                }
                (_, Some(charge)) => {
                    vec![electric.coefficients(i).iter().map(|c| c * charge).sum()]
                }
                _ => continue,
            };
            charges = charges
                .iter()
                .flat_map(|q| parts.iter().map(move |p| q + p))
                .collect();
        }
        for charge in charges {
            let charge = charge * BigInt::from(multiplet.left_handed_sign());
            *found.entry(charge.to_string()).or_default() += multiplet.copies();
        }
    }
    found
}

/// Three times quarks (-1/3, 2/3), their conjugates, and the numbers of leptons given.
fn families(neutral: u32, charged: u32, more_down_quarks: u32) -> BTreeMap<String, u32> {
    let down = 9 + more_down_quarks;
    [
        ("-1/3", down),
        ("1/3", down),
        ("2/3", 9),
        ("-2/3", 9),
        ("0", neutral),
        ("1", charged),
        ("-1", charged),
    ]
    .map(|(charge, number)| (charge.to_owned(), number))
    .into()
}

/// The electric charges of quarks and leptons [Review of Particle Physics], from each model's own
/// definition of the electric charge: common practice for the unified models, no source.
#[test]
fn fermions_have_the_observed_electric_charges() {
    for (name, _, model) in models(&directory()) {
        let mut minimal_331 = families(3, 3, 0);
        for charge in ["5/3", "-5/3"] {
            minimal_331.insert(charge.into(), 3);
        }
        for charge in ["4/3", "-4/3"] {
            minimal_331.insert(charge.into(), 6);
        }
        let expected = match &*name {
            "standard-model" | "su5" | "l-mu-minus-l-tau" => families(3, 3, 0),
            "standard-model-right-handed-neutrinos"
            | "flipped-su5"
            | "so10"
            | "pati-salam"
            | "left-right"
            | "b-minus-l" => families(6, 3, 0),
            // Two Higgsino doublets.
            "mssm" => families(5, 4, 0),
            // The 27 holds a heavy down-type quark and a lepton doublet with its conjugate more.
            "trinification" | "e6" => families(15, 6, 9),
            // The lure leptons.
            "lanternfish" => families(6, 4, 0),
            "minimal-331" => minimal_331,
            other => panic!("no charges are written down for {other}"),
        };
        assert_eq!(charges(&model), expected, "{name}");
    }
}
