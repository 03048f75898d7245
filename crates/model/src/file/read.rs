//! From the tree to the model.

use num_bigint::BigInt;

use super::diagnostic::Fault;
use super::fields::{Fields, mistyped, text};
use super::node::{Node, Place, Value};
use crate::transformation::read_fraction;
use crate::{
    ElectricCharge, ElectricChargeDraft, Error, Field, Group, Mass, Model, Multiplet,
    MultipletDraft, Part, Problem, Spectrum, Symmetry, Written, model::check_field,
};

const ROOT_KEYS: [&str; 4] = ["model", "symmetry", "multiplet", "electric_charge"];
const MODEL_KEYS: [&str; 5] = ["title", "supersymmetric", "hypercharge", "source", "notes"];
const SYMMETRY_KEYS: [&str; 3] = ["label", "algebra", "global"];
const MULTIPLET_KEYS: [&str; 6] = [
    "label",
    "field",
    "copies",
    "transforms",
    "family_dependent",
    "mass_gev",
];
const UNTITLED: &str = "untitled model";

/// The model that the tree describes.
pub(super) fn model(root: &Node) -> Result<Model, Fault<'_>> {
    let fields = Fields::open(root, "a model file", &ROOT_KEYS)?;
    let head = fields.get("model");
    let head = head.map(|node| Fields::open(node, "[model]", &MODEL_KEYS));
    let head = head.transpose()?;
    let supersymmetric = match &head {
        Some(head) => head.boolean("supersymmetric")?,
        None => false,
    };
    let mut spectrum = symmetries(root, fields.list("symmetry")?)?;
    for node in fields.list("multiplet")? {
        add_multiplet(&mut spectrum, node, supersymmetric)?;
    }
    let model = titled(root, head.as_ref(), supersymmetric, spectrum)?;
    match fields.get("electric_charge") {
        Some(node) => with_electric_charge(model, node),
        None => Ok(model),
    }
}

fn titled<'a>(
    root: &'a Node,
    head: Option<&Fields<'a>>,
    supersymmetric: bool,
    spectrum: Spectrum,
) -> Result<Model, Fault<'a>> {
    let part = |key: &str, example: &str| match head {
        Some(head) => head.text(key, example),
        None => Ok(None),
    };
    let at = |key: &str| Place::Node(head.and_then(|head| head.get(key)).unwrap_or(root));
    let title = part("title", "Standard Model")?.unwrap_or(UNTITLED);
    let model = if supersymmetric {
        Model::supersymmetric(title, spectrum)
    } else {
        Model::new(title, spectrum)
    };
    let mut model = model.map_err(|error| Fault::problem(at("title"), error.problem()))?;
    if let Some(label) = part("hypercharge", "hypercharge")? {
        let chosen = model.with_hypercharge(label);
        model = chosen.map_err(|error| Fault::problem(at("hypercharge"), error.problem()))?;
    }
    if let Some(source) = part("source", "author and year")? {
        model = model.with_source(source);
    }
    Ok(match part("notes", "free text")? {
        Some(notes) => model.with_notes(notes),
        None => model,
    })
}

fn symmetries<'a>(root: &'a Node, nodes: &'a [Node]) -> Result<Spectrum, Fault<'a>> {
    let symmetries: Vec<Symmetry> = nodes
        .iter()
        .take(crate::MOST_SYMMETRIES + 1)
        .map(symmetry)
        .collect::<Result<_, _>>()?;
    Spectrum::new(symmetries).map_err(|error| match error.problem() {
        Problem::NoSymmetry => {
            let help = "write [[symmetry]] with label = \"colour\" and algebra = \"SU(3)\"";
            let message = error.problem().message();
            Fault::new(Place::Node(root), message, help.into())
        }
        Problem::TooManySymmetries => {
            let place = Place::Node(nodes.last().unwrap_or(root));
            Fault::problem(place, error.problem())
        }
        problem => Fault::problem(mislabelled(root, nodes, &error), problem),
    })
}

/// The label that the error is about: the second of that name where it is a duplicate.
fn mislabelled<'a>(root: &'a Node, nodes: &'a [Node], error: &Error) -> Place<'a> {
    let labels = nodes.iter().filter_map(|node| {
        let entry = node.entries().iter().find(|entry| entry.key == "label")?;
        Some(&entry.node)
    });
    let mut same = labels.filter(|node| match (&node.value, error.owner()) {
        (Value::Text(text), crate::Owner::Symmetry(label)) => text == label,
        _ => false,
    });
    let place = usize::from(matches!(error.problem(), Problem::DuplicateLabel { .. }));
    Place::Node(same.nth(place).unwrap_or(root))
}

fn symmetry(node: &Node) -> Result<Symmetry, Fault<'_>> {
    let fields = Fields::open(node, "a symmetry", &SYMMETRY_KEYS)?;
    let label = fields.require("label", "the symmetry", || {
        "write label = \"colour\", or another name for it".into()
    })?;
    let label = text(label, "label", "colour")?;
    let algebra = fields.require("algebra", "the symmetry", || {
        "write algebra = \"SU(3)\", \"U(1)\" or \"Z(3)\"".into()
    })?;
    let written = text(algebra, "algebra", "SU(3)")?;
    let group: Result<Group, Problem> = written.parse();
    let group = group.map_err(|problem| Fault::problem(Place::Node(algebra), &problem))?;
    Ok(if fields.boolean("global")? {
        Symmetry::global(label, group)
    } else {
        Symmetry::gauge(label, group)
    })
}

fn add_multiplet<'a>(
    spectrum: &mut Spectrum,
    node: &'a Node,
    supersymmetric: bool,
) -> Result<(), Fault<'a>> {
    let fields = Fields::open(node, "a multiplet", &MULTIPLET_KEYS)?;
    let label = fields.require("label", "the multiplet", || {
        "write label = \"quark doublet\", or another name for it".into()
    })?;
    let label = text(label, "label", "quark doublet")?;
    let mut draft = Multiplet::draft(label, field(&fields, supersymmetric)?);
    if let Some(node) = fields.get("copies") {
        draft = draft.copies(copies(node)?);
    }
    if fields.boolean("family_dependent")? {
        draft = draft.family_dependent();
    }
    if let Some(node) = fields.get("mass_gev") {
        draft = draft.mass_gev(mass(node)?);
    }
    if let Some(node) = fields.get("transforms") {
        draft = with_transforms(draft, node)?;
    }
    match spectrum.add(draft) {
        Ok(_) => Ok(()),
        Err(error) => Err(Fault::problem(place_of(&error, node), error.problem())),
    }
}

/// Where in the multiplet's table stands the part that the error is about.
fn place_of<'a>(error: &Error, node: &'a Node) -> Place<'a> {
    let entry = |node: &'a Node, key: &str| {
        let mut entries = node.entries().iter();
        entries.find(|entry| entry.key == key)
    };
    let value = |key: &str| entry(node, key).map(|entry| Place::Node(&entry.node));
    let transforms = entry(node, "transforms").map(|entry| &entry.node);
    let place = match error.part() {
        Part::Label => value("label"),
        Part::Field => value("field"),
        Part::Copies => value("copies"),
        Part::FamilyDependent => value("family_dependent"),
        Part::Mass => value("mass_gev"),
        Part::SymmetryLabel(label) => {
            let entry = transforms.and_then(|node| entry(node, label));
            entry.map(Place::Key)
        }
        Part::Under(label) => {
            let entry = transforms.and_then(|node| entry(node, label));
            entry.map(|entry| Place::Node(&entry.node))
        }
        _ => None,
    };
    place.unwrap_or(Place::Node(node))
}

fn field<'a>(fields: &Fields<'a>, supersymmetric: bool) -> Result<Field, Fault<'a>> {
    if supersymmetric && fields.get("field").is_none() {
        return Ok(Field::ChiralSuperfield);
    }
    let node = fields.require("field", "the multiplet", || {
        let names = Field::ALL.map(|field| format!("\"{field}\""));
        format!("write field = {} or {}", names[..3].join(", "), names[3])
    })?;
    let field: Result<Field, Problem> = text(node, "field", Field::ALL[0].name())?.parse();
    let field = field.and_then(|field| check_field(supersymmetric, field).map(|()| field));
    field.map_err(|problem| Fault::problem(Place::Node(node), &problem))
}

fn copies(node: &Node) -> Result<u32, Fault<'_>> {
    let help = format!("write a whole number from 1 to {}", crate::MOST_COPIES);
    let Value::Whole(digits) = &node.value else {
        return Err(mistyped(node, "copies", "a whole number", help));
    };
    digits.parse().map_err(|_| {
        let written = crate::suggestion::shortened(digits);
        Fault::problem(Place::Node(node), &Problem::BadCopies { written })
    })
}

fn mass(node: &Node) -> Result<Mass, Fault<'_>> {
    match &node.value {
        Value::Whole(digits) | Value::Decimal(digits) => Ok(Mass::Text(digits.clone())),
        _ => {
            let help = "write a number of GeV such as 750.5 or 1e12, without quotation marks";
            Err(mistyped(node, "mass_gev", "a number", help.into()))
        }
    }
}

fn with_transforms<'a>(
    mut draft: MultipletDraft,
    node: &'a Node,
) -> Result<MultipletDraft, Fault<'a>> {
    let Value::Table(entries) = &node.value else {
        let help = "write { colour = \"3\", weak = \"2\", hypercharge = \"1/6\" }";
        return Err(mistyped(node, "transforms", "a table", help.into()));
    };
    for entry in entries {
        draft = draft.under(&*entry.key, transformation(&entry.node, &entry.key)?);
    }
    Ok(draft)
}

fn transformation<'a>(node: &'a Node, symmetry: &str) -> Result<Written, Fault<'a>> {
    match &node.value {
        Value::Text(written) | Value::Decimal(written) => Ok(Written::Text(written.clone())),
        Value::Whole(digits) => whole(node, digits).map(Written::Whole),
        _ => Err(mistyped(
            node,
            &format!("\"{symmetry}\""),
            "an irrep or charge",
            "write an irrep such as \"3\" or \"(1,0)\", or a charge such as \"1/6\"".into(),
        )),
    }
}

fn whole<'a>(node: &'a Node, digits: &str) -> Result<BigInt, Fault<'a>> {
    let value = roots::read_rational(digits);
    let value = value.map_err(|error| Fault::problem(Place::Node(node), &error.into()))?;
    Ok(value.to_integer())
}

fn with_electric_charge(model: Model, node: &Node) -> Result<Model, Fault<'_>> {
    let Value::Table(entries) = &node.value else {
        let help = "write [electric_charge] with weak = [\"1/2\"] and hypercharge = \"1\"";
        return Err(mistyped(node, "electric_charge", "a table", help.into()));
    };
    let mut draft: ElectricChargeDraft = ElectricCharge::draft();
    for entry in entries {
        draft = draft.along(&*entry.key, coefficients(&entry.node, &entry.key)?);
    }
    model.with_electric_charge(draft).map_err(|error| {
        let found = match error.part() {
            Part::ElectricCharge(label) => entries.iter().find(|entry| entry.key == *label),
            _ => None,
        };
        let place = match (found, error.problem()) {
            (Some(entry), Problem::CoefficientCount { .. }) => Place::Node(&entry.node),
            (Some(entry), _) => Place::Key(entry),
            (None, _) => Place::Node(node),
        };
        Fault::problem(place, error.problem())
    })
}

fn coefficients<'a>(node: &'a Node, symmetry: &str) -> Result<Vec<Written>, Fault<'a>> {
    match &node.value {
        Value::List(items) => {
            let items = items.iter().map(|item| coefficient(item, symmetry));
            items.collect()
        }
        _ => Ok(vec![coefficient(node, symmetry)?]),
    }
}

fn coefficient<'a>(node: &'a Node, symmetry: &str) -> Result<Written, Fault<'a>> {
    match &node.value {
        Value::Text(written) | Value::Whole(written) | Value::Decimal(written) => {
            let value = read_fraction(written);
            let value = value.map_err(|problem| Fault::problem(Place::Node(node), &problem));
            value.map(Written::Charge)
        }
        _ => Err(mistyped(
            node,
            &format!("\"{symmetry}\""),
            "fractions",
            "write a fraction such as \"1/2\", or a list of them in square brackets".into(),
        )),
    }
}
