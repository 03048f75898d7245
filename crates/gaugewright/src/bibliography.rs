//! The works that the documentation of these crates cites, by key.
//!
//! A key in square brackets, such as `[Slansky 1981]`, stands for one of these. Written down from
//! memory, volume and page included, unless a comment says otherwise.

/// A cited work.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Work {
    /// The key, without its brackets.
    pub key: &'static str,
    /// Where it was published.
    pub reference: &'static str,
}

const fn work(key: &'static str, reference: &'static str) -> Work {
    Work { key, reference }
}

/// Every work cited, by key.
pub const WORKS: &[Work] = &[
    work(
        "Adams 1962",
        "J. F. Adams, Vector fields on spheres, Ann. Math. 75 (1962) 603",
    ),
    work(
        "Alvarez-Gaume-Witten 1984",
        "L. Alvarez-Gaume, E. Witten, Gravitational anomalies, Nucl. Phys. B 234 (1984) 269",
    ),
    work(
        "Baez-Huerta 2010",
        "J. Baez, J. Huerta, The algebra of grand unified theories, Bull. Amer. Math. Soc. 47 (2010) 483, arXiv:0904.1556",
    ),
    work(
        "Banks-Dine 1992",
        "T. Banks, M. Dine, Note on discrete gauge anomalies, Phys. Rev. D 45 (1992) 1424",
    ),
    work(
        "Banks-Georgi 1976",
        "J. Banks, H. Georgi, Comment on gauge theories without anomalies, Phys. Rev. D 14 (1976) 1159",
    ),
    work(
        "Bareiss 1968",
        "E. H. Bareiss, Sylvester's identity and multistep integer-preserving Gaussian elimination, Math. Comp. 22 (1968) 565",
    ),
    work(
        "Bouchiat-Iliopoulos-Meyer 1972",
        "C. Bouchiat, J. Iliopoulos, P. Meyer, An anomaly-free version of Weinberg's model, Phys. Lett. B 38 (1972) 519",
    ),
    work(
        "Bourbaki 1968",
        "N. Bourbaki, Groupes et algebres de Lie, chapters IV to VI, Hermann 1968",
    ),
    work(
        "Bourbaki 1975",
        "N. Bourbaki, Groupes et algebres de Lie, chapters VII and VIII, Hermann 1975",
    ),
    work(
        "Brauer 1937",
        "R. Brauer, Sur la multiplication des caracteristiques des groupes continus et semi-simples, C. R. Acad. Sci. Paris 204 (1937) 1784",
    ),
    work(
        "Bremner-Moody-Patera 1985",
        "M. R. Bremner, R. V. Moody, J. Patera, Tables of dominant weight multiplicities for representations of simple Lie algebras, Dekker 1985",
    ),
    work(
        "Delbourgo-Salam 1972",
        "R. Delbourgo, A. Salam, The gravitational correction to PCAC, Phys. Lett. B 40 (1972) 381",
    ),
    work(
        "Dynkin 1957",
        "E. B. Dynkin, Semisimple subalgebras of semisimple Lie algebras, Amer. Math. Soc. Transl. (2) 6 (1957) 111",
    ),
    work(
        "Freudenthal 1954",
        "H. Freudenthal, Zur Berechnung der Charaktere der halbeinfachen Lieschen Gruppen, Indag. Math. 16 (1954) 369",
    ),
    work(
        "Fulton 1997",
        "W. Fulton, Young Tableaux, Cambridge University Press 1997",
    ),
    work(
        "Fulton-Harris 1991",
        "W. Fulton, J. Harris, Representation Theory, Springer 1991",
    ),
    work(
        "Geng-Marshak 1989",
        "C. Q. Geng, R. E. Marshak, Uniqueness of quark and lepton representations in the standard model from the anomalies viewpoint, Phys. Rev. D 39 (1989) 693",
    ),
    work(
        "Georgi-Glashow 1972",
        "H. Georgi, S. L. Glashow, Gauge theories without anomalies, Phys. Rev. D 6 (1972) 429",
    ),
    work(
        "Georgi-Quinn-Weinberg 1974",
        "H. Georgi, H. R. Quinn, S. Weinberg, Hierarchy of interactions in unified gauge theories, Phys. Rev. Lett. 33 (1974) 451",
    ),
    work(
        "Gross-Jackiw 1972",
        "D. J. Gross, R. Jackiw, Effect of anomalies on quasi-renormalizable theories, Phys. Rev. D 6 (1972) 477",
    ),
    work(
        "Gross-Wilczek 1973",
        "D. J. Gross, F. Wilczek, Ultraviolet behavior of non-abelian gauge theories, Phys. Rev. Lett. 30 (1973) 1343",
    ),
    work(
        "Humphreys 1972",
        "J. E. Humphreys, Introduction to Lie Algebras and Representation Theory, Springer 1972",
    ),
    work(
        "Humphreys 1990",
        "J. E. Humphreys, Reflection Groups and Coxeter Groups, Cambridge University Press 1990",
    ),
    work(
        "Ibanez-Ross 1991",
        "L. E. Ibanez, G. G. Ross, Discrete gauge symmetry anomalies, Phys. Lett. B 260 (1991) 291",
    ),
    work(
        "Jones 1975",
        "D. R. T. Jones, Asymptotic behaviour of supersymmetric Yang-Mills theories in the two-loop approximation, Nucl. Phys. B 87 (1975) 127",
    ),
    work(
        "Klimyk 1968",
        "A. U. Klimyk, Decomposition of a tensor product of irreducible representations of a semisimple Lie algebra into a direct sum of irreducible representations, Amer. Math. Soc. Transl. (2) 76 (1968) 63",
    ),
    work(
        "Knuth 1998",
        "D. E. Knuth, The Art of Computer Programming, volume 3, second edition, Addison-Wesley 1998",
    ),
    work(
        "Littlewood-Richardson 1934",
        "D. E. Littlewood, A. R. Richardson, Group characters and algebra, Phil. Trans. R. Soc. A 233 (1934) 99",
    ),
    work(
        "Macdonald 1972",
        "I. G. Macdonald, The Poincare series of a Coxeter group, Math. Ann. 199 (1972) 161",
    ),
    work(
        "Macdonald 1995",
        "I. G. Macdonald, Symmetric Functions and Hall Polynomials, second edition, Oxford University Press 1995",
    ),
    work(
        "Machacek-Vaughn 1983",
        "M. E. Machacek, M. T. Vaughn, Two-loop renormalization group equations in a general quantum field theory I, Nucl. Phys. B 222 (1983) 83",
    ),
    work(
        "McKay-Patera 1981",
        "W. G. McKay, J. Patera, Tables of Dimensions, Indices, and Branching Rules for Representations of Simple Lie Algebras, Dekker 1981",
    ),
    work(
        "Minahan-Ramond-Warner 1990",
        "J. A. Minahan, P. Ramond, R. C. Warner, A comment on anomaly cancellation in the standard model, Phys. Rev. D 41 (1990) 715",
    ),
    work(
        "Moody-Patera 1982",
        "R. V. Moody, J. Patera, Fast recursion formula for weight multiplicities, Bull. Amer. Math. Soc. 7 (1982) 237",
    ),
    work(
        "Newman 1972",
        "M. Newman, Integral Matrices, Academic Press 1972",
    ),
    work(
        "Okubo 1977",
        "S. Okubo, Gauge groups without triangular anomaly, Phys. Rev. D 16 (1977) 3528",
    ),
    work(
        "Politzer 1973",
        "H. D. Politzer, Reliable perturbative results for strong interactions?, Phys. Rev. Lett. 30 (1973) 1346",
    ),
    work(
        "Racah 1964",
        "G. Racah, Lectures on Lie groups, in Group Theoretical Concepts and Methods in Elementary Particle Physics, Gordon and Breach 1964",
    ),
    work(
        "Slansky 1981",
        "R. Slansky, Group theory for unified model building, Phys. Rep. 79 (1981) 1",
    ),
    work(
        "Snow 1990",
        "D. M. Snow, Weyl group orbits, ACM Trans. Math. Softw. 16 (1990) 94",
    ),
    work(
        "Speiser 1964",
        "D. Speiser, Theory of compact Lie groups and some applications to elementary particle physics, in Group Theoretical Concepts and Methods in Elementary Particle Physics, Gordon and Breach 1964",
    ),
    work(
        "Stembridge 1998",
        "J. R. Stembridge, The partial order of dominant weights, Adv. Math. 136 (1998) 340",
    ),
    work(
        "Tong 2017",
        "D. Tong, Line operators in the Standard Model, JHEP 07 (2017) 104, arXiv:1705.01853",
    ),
    work(
        "Warren 2013",
        "H. S. Warren, Hacker's Delight, second edition, Addison-Wesley 2013",
    ),
    work(
        "Witten 1982",
        "E. Witten, An SU(2) anomaly, Phys. Lett. B 117 (1982) 324",
    ),
    work(
        "Yamatsu 2015",
        "N. Yamatsu, Finite-dimensional Lie algebras and their representations for unified model building, arXiv:1511.08771",
    ),
];

#[cfg(test)]
mod tests {
    use std::collections::BTreeSet;
    use std::fs;
    use std::path::{Path, PathBuf};

    use super::WORKS;

    fn sources(folder: &Path, found: &mut Vec<PathBuf>) {
        for entry in fs::read_dir(folder).expect("the folder is in the repository") {
            let path = entry.expect("the folder can be read").path();
            let kind = path.extension().and_then(|kind| kind.to_str());
            if path.is_dir() {
                sources(&path, found);
            } else if matches!(kind, Some("rs" | "md")) {
                found.push(path);
            }
        }
    }

    /// Words, hyphens and a year in square brackets, as keys are written.
    fn keys(text: &str) -> impl Iterator<Item = &str> {
        let parts = text
            .split('[')
            .skip(1)
            .filter_map(|rest| Some(rest.split_once(']')?.0));
        parts.filter(|key| {
            let Some((authors, year)) = key.rsplit_once(' ') else {
                return false;
            };
            let is_year = year.len() == 4 && year.bytes().all(|b| b.is_ascii_digit());
            let named = authors.starts_with(|c: char| c.is_ascii_uppercase());
            is_year
                && named
                && authors
                    .bytes()
                    .all(|b| b.is_ascii_alphabetic() || b == b'-')
        })
    }

    #[test]
    fn every_key_is_listed_and_every_work_is_cited() {
        let root = Path::new(env!("CARGO_MANIFEST_DIR")).join("../..");
        let mut files = Vec::new();
        for folder in ["crates", "docs", "tests", "benches"] {
            sources(&root.join(folder), &mut files);
        }
        let mut cited = BTreeSet::new();
        for file in files
            .iter()
            .filter(|file| !file.ends_with("bibliography.rs"))
        {
            // Keys may be broken over two lines of a comment.
            let text = fs::read_to_string(file).expect("sources are text");
            let words: Vec<&str> = text
                .split_whitespace()
                .filter(|word| !matches!(*word, "//" | "///" | "//!"))
                .collect();
            cited.extend(keys(&words.join(" ")).map(str::to_owned));
        }
        let listed: BTreeSet<String> = WORKS.iter().map(|work| work.key.to_owned()).collect();
        let unlisted: Vec<_> = cited.difference(&listed).collect();
        let uncited: Vec<_> = listed.difference(&cited).collect();
        assert!(unlisted.is_empty(), "not in the bibliography: {unlisted:?}");
        assert!(uncited.is_empty(), "cited nowhere: {uncited:?}");
    }

    #[test]
    fn keys_are_in_order() {
        assert!(WORKS.windows(2).all(|pair| pair[0].key < pair[1].key));
    }
}
