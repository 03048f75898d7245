//! A model file broken one line at a time: each error says where, and what to write.

use model::{Model, ModelFileError};

const GOOD: &str = r#"[model]
title = "Quarks"
supersymmetric = false
[[symmetry]]
label = "colour"
algebra = "SU(3)"
[[symmetry]]
label = "weak"
algebra = "SU(2)"
[[symmetry]]
label = "hypercharge"
algebra = "U(1)"
global = false
[[symmetry]]
label = "parity"
algebra = "Z(2)"
[[multiplet]]
label = "quark doublet"
field = "left-handed fermion"
copies = 3
transforms = { colour = "3", weak = "2", hypercharge = "1/6", parity = 1 }
mass_gev = 1e3
[electric_charge]
weak = ["1/2"]
hypercharge = "1"
"#;

fn error(text: &str) -> ModelFileError {
    Model::from_toml(text).expect_err(text)
}

/// Each line is `from => to @ line:column help`: with `from` replaced by `to`, the error is there
/// and its help says that. `\n` is the end of a line and `\\` a backslash.
#[track_caller]
fn check(cases: &str) {
    Model::from_toml(GOOD).unwrap();
    for case in cases.trim().lines() {
        let (from, rest) = case.split_once(" => ").unwrap();
        let (to, rest) = rest.rsplit_once(" @ ").unwrap();
        let (place, help) = rest.split_once(' ').unwrap();
        let (line, column) = place.split_once(':').unwrap();
        let (from, to) = (unescaped(from), unescaped(to));
        assert!(GOOD.contains(&from), "{from}");
        let text = GOOD.replacen(&from, &to, 1);
        check_place(&text, line.parse().unwrap(), column.parse().unwrap(), help);
    }
}

fn unescaped(text: &str) -> String {
    let parts = text.split("\\\\").map(|part| part.replace("\\n", "\n"));
    parts.collect::<Vec<_>>().join("\\")
}

#[track_caller]
fn check_place(text: &str, line: usize, column: usize, help: &str) {
    let error = error(text);
    let place = (error.line(), error.column());
    assert_eq!(place, (Some(line), Some(column)), "{text}: {error}");
    assert!(error.help().contains(help), "{text}: {error}");
    assert!(!error.message().is_empty());
    let source = text.split('\n').nth(line - 1);
    let source = source.map(|line| line.trim_matches(['\r', '\u{feff}']));
    assert_eq!(error.source_line(), source, "{text}");
    let sentence = format!("line {line}, column {column}: ");
    assert!(error.to_string().starts_with(&sentence), "{error}");
    let span = error.span().unwrap();
    assert!(text.is_char_boundary(span.start) && text.is_char_boundary(span.end));
}

#[test]
fn the_model_table() {
    check(
        r#"
[model] => [modle] @ 1:2 did you mean "model"?
[model] => [model @ 1:7 [model], [[symmetry]]
[model] => [[model]] @ 1:1 write a table with the keys title
title = => titel = @ 2:1 did you mean "title"?
"Quarks" => 3 @ 2:9 text in quotation marks
"Quarks" => Quarks @ 2:9 in quotation marks
"Quarks" => "Quarks @ 2:16 in quotation marks
"Quarks" => "" @ 2:9 "Standard Model"
"Quarks" => """\nQuarks\n""" @ 2:9 write one line
title = "Quarks" => title @ 2:6 title = "Standard Model"
title = "Quarks" => title = "a"\ntitle = "b" @ 3:1 write each key once
supersymmetric => suppersymetric @ 3:1 did you mean "supersymmetric"?
supersymmetric = false => supersymmetric = "no" @ 3:18 = true, or leave it out
supersymmetric = false => supersymmetric = true @ 19:9 "chiral superfield"
supersymmetric = false => hypercharge = "weak" @ 3:15 the label of a gauged U(1)
supersymmetric = false => hypercharge = "hyper charge" @ 3:15 mean "hypercharge"?
supersymmetric = false => hypercharge = 1 @ 3:15 text in quotation marks
supersymmetric = false => source = 1982 @ 3:10 text in quotation marks
supersymmetric = false => notes = ["a"] @ 3:9 text in quotation marks
"#,
    );
}

#[test]
fn symmetries() {
    check(
        r#"
[[symmetry]] => [[symetry]] @ 4:3 did you mean "symmetry"?
[[symmetry]] => [symmetry] @ 7:3 [[multiplet]] in double brackets each time
[[symmetry]] => [[symmetry] @ 4:12 [[symmetry]]
label = "colour"\n =>  @ 4:1 write label = "colour"
label = "colour" => lable = "colour" @ 5:1 did you mean "label"?
label = "colour" => label = "weak" @ 8:9 a label of its own
label = "colour" => label = "" @ 5:9 write a name of one line
label = "colour" => label = "gravity" @ 5:9 choose another label
label = "colour" => label = 3 @ 5:9 text in quotation marks
algebra = "SU(3)"\n =>  @ 4:1 write algebra = "SU(3)"
algebra = "SU(3)" => group = "SU(3)" @ 6:1 "algebra"
"SU(3)" => "SV(3)" @ 6:11 write SU(N), SO(N)
"SU(3)" => SU(3) @ 6:11 in quotation marks
"SU(3)" => 3 @ 6:11 such as "SU(3)"
"SU(3)" => ["SU(3)"] @ 6:11 such as "SU(3)"
"SU(3)" => "SU(3) x SU(2)" @ 6:11 one symmetry for each factor
"SU(3)" => "SO(4)" @ 6:11 write two symmetries, each SU(2)
"SU(3)" => "D2" @ 6:11 write two symmetries, each SU(2)
"SU(3)" => "SO(2)" @ 6:11 write U(1)
"SU(3)" => "U(2)" @ 6:11 write two symmetries, U(1) and SU(N)
"SU(3)" => "SU(1000000)" @ 6:11 SU(257)
"SU(3)" => "Z(1)" @ 6:11 write Z(2) or larger
"SU(3)" => "SU(5)" @ 21:25 5 = (1000), 5bar = (0001)
global = false => global = "yes" @ 13:10 write global = true
global = false => globl = true @ 13:1 did you mean "global"?
"#,
    );
}

#[test]
fn multiplets() {
    check(
        r#"
[[multiplet]] => [[multiplets]] @ 17:3 did you mean "multiplet"?
[[multiplet]] => [multiplet] @ 17:1 [[multiplet]] in double brackets
label = "quark doublet"\n =>  @ 17:1 write label = "quark doublet"
label = "quark doublet" => label = "a\\nb" @ 18:9 a name of one line
label = "quark doublet" => name = "q" @ 18:1 "label"
field = "left-handed fermion"\n =>  @ 17:1 write field = "left-handed fermion"
"left-handed fermion" => "left fermion" @ 19:9 mean "left-handed fermion"?
"left-handed fermion" => 1 @ 19:9 such as "left-handed fermion"
"left-handed fermion" => "chiral superfield" @ 19:9 declare the model supersymm
"left-handed fermion" => "real scalar" @ 21:25 write "complex scalar"
copies = 3 => copies = 0 @ 20:10 from 1 to 1000000
copies = 3 => copies = -1 @ 20:10 from 1 to 1000000
copies = 3 => copies = 1000001 @ 20:10 from 1 to 1000000
copies = 3 => copies = 1000000000000000000000000000000 @ 20:10 from 1 to 1000000
copies = 3 => copies = 1e30 @ 20:10 from 1 to 1000000
copies = 3 => copies = 3.0 @ 20:10 a whole number
copies = 3 => copies = "3" @ 20:10 a whole number
copies = 3 => copies = 1979-05-27 @ 20:10 a whole number
copies = 3 => copies = three @ 20:10 in quotation marks
copies = 3 => copies = @ 20:9 in quotation marks
copies = 3 => copies = 3\ncopies = 3 @ 21:1 write each key once
copies = 3 => copys = 3 @ 20:1 did you mean "copies"?
copies = 3 => family_dependent = true @ 20:20 write "?" as a charge
copies = 3 => family_dependent = 1 @ 20:20 = true, or leave it out
mass_gev = 1e3 => mass_gev = 0 @ 22:12 a mass above 0
mass_gev = 1e3 => mass_gev = -750.5 @ 22:12 a mass above 0
mass_gev = 1e3 => mass_gev = inf @ 22:12 750.5 or 1e12
mass_gev = 1e3 => mass_gev = nan @ 22:12 750.5 or 1e12
mass_gev = 1e3 => mass_gev = 1e999999999 @ 22:12 from -200 to 200
mass_gev = 1e3 => mass_gev = "1e3" @ 22:12 without quotation marks
mass_gev = 1e3 => mass = 1e3 @ 22:1 did you mean "mass_gev"?
"#,
    );
}

#[test]
fn transforms() {
    check(
        r#"
transforms => transform @ 21:1 did you mean "transforms"?
transforms = { => transforms = 3 # @ 21:14 write { colour = "3"
colour = "3" => color = "3" @ 21:16 did you mean "colour"?
colour = "3" => colour = "7" @ 21:25 6 = (20), 6bar = (02), 8 = (11)
colour = "3" => colour = "15''" @ 21:25 15' = (40)
colour = "3" => colour = "" @ 21:25 a dimension such as 3
colour = "3" => colour = 3 @ 21:25 in quotation marks, "3"
colour = "3" => colour = 3.0 @ 21:25 a dimension such as 3
colour = "3" => colour = [1, 0] @ 21:25 "(1,0)"
colour = "3" => colour = "(1)" @ 21:25 write 2 in brackets
colour = "3" => colour = "(1,-1)" @ 21:25 whole numbers from 0
colour = "3" => colour = "(99999999999,0)" @ 21:25 whole numbers from 0
colour = "3" => colour = "(4000000000,4000000000)" @ 21:25 smaller irreps
colour = "3" => colour = "3", colour = "3" @ 21:30 write each key once
"1/6" => "1/0" @ 21:56 a fraction such as -1/3
"1/6" => 1/6 @ 21:56 in quotation marks, as in algebra = "SU(3)" or "1/6"
"1/6" => 0.5 @ 21:56 write "1/2"
"1/6" => "0.5" @ 21:56 write "1/2"
"1/6" => nan @ 21:56 a fraction such as -1/3
"1/6" => NaN @ 21:56 in quotation marks
"1/6" => "NaN" @ 21:56 a fraction such as -1/3
"1/6" => inf @ 21:56 a fraction such as -1/3
"1/6" => 1e999999999 @ 21:56 a fraction such as -1/3
"1/6" => true @ 21:56 a charge such as "1/6"
"1/6" => "one sixth" @ 21:56 a fraction such as -1/3
"1/6" => "a; \\"b" @ 21:56 a fraction such as -1/3
"3" => "a; \\"b" @ 21:25 a dimension such as 3
parity = 1 => parity = "?" @ 21:72 write a whole number
parity = 1 => parity = 0.5 @ 21:72 write a whole number
parity = 1 => parity = "1/2" @ 21:72 write a whole number
"#,
    );
}

#[test]
fn electric_charge() {
    check(
        r#"
[electric_charge] => [electric] @ 23:2 "electric_charge"
[electric_charge] => [[electric_charge]] @ 23:1 write [electric_charge] with
weak = ["1/2"] => wek = ["1/2"] @ 24:1 did you mean "weak"?
weak = ["1/2"] => weak = ["1/2", "1"] @ 24:8 write one fraction
weak = ["1/2"] => weak = [] @ 24:8 write one fraction
weak = ["1/2"] => weak = [0.5] @ 24:9 write "1/2"
weak = ["1/2"] => weak = true @ 24:8 a fraction such as "1/2"
weak = ["1/2"] => colour = "1" @ 24:10 write 2 fractions
weak = ["1/2"] => parity = "1" @ 24:1 a gauged U(1) or simple group
global = false => global = true @ 25:1 a gauged U(1) or simple group
hypercharge = "1" => hypercharge = "1/0" @ 25:15 such as -1/3
hypercharge = "1" => weak = "1" @ 25:1 write each key once
"#,
    );
}

#[test]
fn what_is_no_model_file() {
    for (text, line, column, help) in [
        ("", 1, 1, "write [[symmetry]]"),
        ("# a comment\n\n", 1, 1, "write [[symmetry]]"),
        ("[model]\ntitle = \"x\"\n", 1, 1, "write [[symmetry]]"),
        ("model = 1", 1, 9, "write a table with the keys title"),
        ("symmetry = []", 1, 1, "write [[symmetry]]"),
        (
            "symmetry = [1]",
            1,
            13,
            "write a table with the keys label, algebra, global",
        ),
        ("\u{7f}ELF\u{2}\u{1}", 1, 1, "UTF-8 text"),
        ("[model]\n\0", 2, 1, "UTF-8 text"),
        ("\u{feff}[modle]", 1, 2, "did you mean \"model\"?"),
        (
            "[model]\r\ntitel = \"x\"\r\n",
            2,
            1,
            "did you mean \"title\"?",
        ),
        ("[model]\ntitle = \"Grüße\"; x", 2, 16, "in quotation marks"),
    ] {
        check_place(text, line, column, help);
    }
}

#[test]
fn text_beyond_4_mib_is_refused() {
    let error = error(&"#".repeat(model::MOST_FILE_BYTES + 1));
    assert!(error.message().contains("4 MiB"), "{error}");
    assert_eq!((error.line(), error.span()), (None, None));
    let comment = format!(
        "{GOOD}#{}",
        "-".repeat(model::MOST_FILE_BYTES - GOOD.len() - 1)
    );
    Model::from_toml(&comment).unwrap();
}

#[test]
fn deep_nesting_is_an_error() {
    for text in [
        "[".repeat(100_000),
        format!("a = {}", "[".repeat(100_000)),
        format!("{}b = 1", "a.".repeat(100_000)),
        format!("a = {}", "{a = ".repeat(100_000)),
    ] {
        error(&text);
    }
    let mut value = serde_json::json!(1);
    for _ in 0..100 {
        value = serde_json::json!([value]);
    }
    let error = Model::from_json(&value).unwrap_err();
    assert!(
        error.message().contains("nested more than 16 deep"),
        "{error}"
    );
}

#[test]
fn limits_on_symmetries_and_multiplets() {
    let symmetries: String = (0..65)
        .map(|i| format!("[[symmetry]]\nlabel = \"u{i}\"\nalgebra = \"U(1)\"\n"))
        .collect();
    let error = error(&symmetries);
    assert!(
        error.message().contains("more than 64 symmetries"),
        "{error}"
    );
    assert_eq!(error.line(), Some(3 * 64 + 1));
    let mut many = String::from("[[symmetry]]\nlabel = \"u\"\nalgebra = \"U(1)\"\n");
    for i in 0..10_001 {
        many += &format!("[[multiplet]]\nlabel = \"m{i}\"\nfield = \"complex scalar\"\n");
    }
    let error = self::error(&many);
    assert!(
        error.message().contains("more than 10000 multiplets"),
        "{error}"
    );
    assert_eq!(error.line(), Some(3 + 3 * 10_000 + 1));
}

#[test]
fn json_errors_name_the_path() {
    let good = serde_json::json!({
        "model": {"title": "Quarks"},
        "symmetry": [
            {"label": "colour", "algebra": "SU(3)"},
            {"label": "hypercharge", "algebra": "U(1)"},
        ],
        "multiplet": [
            {"label": "a", "field": "left-handed fermion", "copies": 3,
             "transforms": {"colour": "3", "hypercharge": "1/6"}, "mass_gev": 750.5},
        ],
        "electric_charge": {"hypercharge": 1},
    });
    Model::from_json(&good).unwrap();
    for (pointer, value, path, help) in [
        ("/model", serde_json::json!(3), "model", "write a table"),
        (
            "/model/title",
            serde_json::json!(null),
            "model.title",
            "text in quotation marks",
        ),
        (
            "/symmetry",
            serde_json::json!({}),
            "symmetry",
            "[[symmetry]]",
        ),
        (
            "/symmetry/1/label",
            serde_json::json!("colour"),
            "symmetry[1].label",
            "of its own",
        ),
        (
            "/symmetry/0/algebra",
            serde_json::json!("SV(3)"),
            "symmetry[0].algebra",
            "SU(N)",
        ),
        (
            "/multiplet/0",
            serde_json::json!([]),
            "multiplet[0]",
            "write a table",
        ),
        (
            "/multiplet/0/copies",
            serde_json::json!(-1),
            "multiplet[0].copies",
            "from 1 to",
        ),
        (
            "/multiplet/0/copies",
            serde_json::json!(1e30),
            "multiplet[0].copies",
            "from 1 to",
        ),
        (
            "/multiplet/0/mass_gev",
            serde_json::json!(0),
            "multiplet[0].mass_gev",
            "above 0",
        ),
        (
            "/multiplet/0/transforms/colour",
            serde_json::json!("7"),
            "multiplet[0].transforms.colour",
            "6 = (20)",
        ),
        (
            "/multiplet/0/transforms/hypercharge",
            serde_json::json!(0.5),
            "multiplet[0].transforms.hypercharge",
            "\"1/2\"",
        ),
        (
            "/multiplet/0/transforms",
            serde_json::json!({"color": "3"}),
            "multiplet[0].transforms.color",
            "mean \"colour\"?",
        ),
        (
            "/electric_charge/hypercharge",
            serde_json::json!([1, 2]),
            "electric_charge.hypercharge",
            "one fraction",
        ),
        (
            "/electric_charge/hypercharge",
            serde_json::json!([{}]),
            "electric_charge.hypercharge[0]",
            "a fraction",
        ),
    ] {
        let mut broken = good.clone();
        *broken.pointer_mut(pointer).unwrap() = value;
        let error = Model::from_json(&broken).unwrap_err();
        assert_eq!(error.path(), path, "{error}");
        assert!(error.help().contains(help), "{error}");
        assert!(
            error.to_string().starts_with(&format!("{path}: ")),
            "{error}"
        );
        assert_eq!((error.line(), error.source_line()), (None, None));
    }
    let error = Model::from_json(&serde_json::json!({})).unwrap_err();
    assert_eq!(
        (
            error.path(),
            error.to_string().starts_with("there is no symmetry;")
        ),
        ("", true)
    );
}

/// The second mistake of a file does not hide the first: errors come in the order of the text.
#[test]
fn the_first_unknown_key_is_reported() {
    let text = "zebra = 1\napple = 2\n";
    assert_eq!(error(text).line(), Some(1));
}
