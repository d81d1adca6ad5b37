//! What include/fieldstop.h declares, read from its text; that text is cbindgen's, so its shape is known.

#[derive(Default)]
pub struct Declared {
    pub constants: Vec<Constant>,
    /// Macros with arguments, and how many.
    pub macros: Vec<(String, usize)>,
    /// A type's name, and what it stands for.
    pub types: Vec<(String, String)>,
    /// A type of function that the caller gives, and the declaration of a pointer to one.
    pub functions_given: Vec<(String, String)>,
    pub structs: Vec<Struct>,
    pub functions: Vec<Function>,
}

pub struct Constant {
    pub name: String,
    pub value: String,
    pub comment: String,
}

pub struct Struct {
    pub name: String,
    pub comment: String,
    pub members: Vec<Member>,
}

pub struct Member {
    pub name: String,
    pub of: String,
    /// The lengths of an array, the outer first.
    pub lengths: Vec<usize>,
    pub comment: String,
    /// In bytes.
    pub place: usize,
    pub size: usize,
}

pub struct Function {
    pub name: String,
    pub result: String,
    pub arguments: Vec<Argument>,
    /// The preprocessor's condition, where there is one.
    pub condition: Option<String>,
    pub comment: String,
    pub section: String,
}

pub struct Argument {
    /// `const struct fieldstop_telescope *`, with the name left out.
    pub of: String,
    pub name: String,
}

impl Struct {
    pub fn size(&self) -> usize {
        self.members.last().map_or(0, |last| last.place + last.size)
    }
}

/// The size of an integer of the header; its alignment is the same or, on AVR, 1.
pub fn size_of(integer: &str) -> usize {
    match integer {
        "char" | "uint8_t" | "int8_t" => 1,
        "uint16_t" | "int16_t" | "fieldstop_status" => 2,
        "uint32_t" | "int32_t" => 4,
        other => panic!("{other} in a struct: only integers of a fixed width have the same size everywhere"),
    }
}

pub fn read(header: &str) -> Declared {
    let mut declared = Declared::default();
    let (mut comment, mut section) = (String::new(), String::new());
    let mut condition = None;
    let mut lines = header.lines().skip_while(|line| *line != "#define FIELDSTOP_H").skip(1);
    while let Some(line) = lines.next() {
        let mut until = |end: &str| {
            let mut whole = line.to_string();
            while !whole.contains(end) {
                whole.push('\n');
                whole.push_str(lines.next().unwrap());
            }
            whole
        };
        if line.starts_with("/* ---") {
            let text = until("*/");
            section = words(text.trim_start_matches(['/', '*', '-', ' ']).trim_end_matches("*/"));
        } else if line.starts_with("/*") {
            comment = words_of_comment(&until("*/"));
        } else if let Some(text) = line.strip_prefix("#define ") {
            let text = text.trim_end_matches('\\');
            if let Some((name, rest)) = text.split_once('(').filter(|(name, _)| !name.contains(' ')) {
                declared.macros.push((name.to_string(), rest.split(')').next().unwrap().split(',').count()));
            } else if let Some((name, value)) = text.split_once(' ')
                && value.trim().parse::<i64>().is_ok()
                && !name.contains("_VERSION")
            {
                let comment = std::mem::take(&mut comment);
                declared.constants.push(Constant {
                    name: name.to_string(),
                    value: value.trim().to_string(),
                    comment,
                });
            }
        } else if let Some(text) = line.strip_prefix("#if ") {
            condition = Some(text.trim_matches(['(', ')']).to_string()).filter(|c| c.contains("FLOAT"));
            if let Some(c) = condition.as_mut().filter(|c| c.contains("(FIELDSTOP") && !c.ends_with(')')) {
                c.push(')');
            }
        } else if line.starts_with("#endif") {
            condition = None;
        } else if line.starts_with("typedef struct") {
            let comment = std::mem::take(&mut comment);
            let body = until("\n}");
            let (before, body) = body.split_once('{').unwrap();
            declared.structs.push(Struct {
                name: before.split_whitespace().last().unwrap().to_string(),
                comment,
                members: members(body.rsplit_once('}').unwrap().0),
            });
        } else if line.starts_with("typedef ") && line.contains("(*") {
            let text = words(&until(";"));
            let text = text.trim_start_matches("typedef ").trim_end_matches(';');
            let (result, rest) = text.split_once("(*").unwrap();
            let (name, arguments) = rest.split_once(')').unwrap();
            declared.functions_given.push((name.to_string(), format!("{result}(*function){arguments}")));
        } else if let Some(text) = line.strip_prefix("typedef ") {
            let (of, name) = text.trim_end_matches(';').rsplit_once(' ').unwrap();
            declared.types.push((name.to_string(), of.to_string()));
        } else if line.contains("fieldstop_") && line.starts_with(|c: char| c.is_ascii_lowercase()) {
            let text = words(&until(";"));
            let (before, arguments) = text.trim_end_matches(");").split_once('(').unwrap();
            let (result, name) = of_and_name(before);
            declared.functions.push(Function {
                name,
                result,
                arguments: arguments
                    .split(", ")
                    .filter(|argument| *argument != "void")
                    .map(|argument| {
                        let (of, name) = of_and_name(argument);
                        Argument { of, name }
                    })
                    .collect(),
                condition: condition.clone(),
                comment: std::mem::take(&mut comment),
                section: section.clone(),
            });
        }
    }
    declared
}

/// `uint32_t *` and `x` of `uint32_t *x`.
fn of_and_name(text: &str) -> (String, String) {
    let at = text.rfind([' ', '*']).unwrap() + 1;
    (text[..at].trim_end().to_string(), text[at..].to_string())
}

fn members(body: &str) -> Vec<Member> {
    let mut members = Vec::new();
    let mut place = 0;
    let mut rest = body.trim();
    while !rest.is_empty() {
        let mut comment = String::new();
        if rest.starts_with("/*") {
            let end = rest.find("*/").unwrap() + 2;
            comment = words_of_comment(&rest[..end]);
            rest = rest[end..].trim_start();
        }
        let (text, after) = rest.split_once(';').unwrap();
        rest = after.trim_start();
        let (of, name) = text.trim().rsplit_once(' ').unwrap();
        let mut parts = name.split('[');
        let name = parts.next().unwrap().to_string();
        let lengths: Vec<usize> = parts.map(|part| part.trim_end_matches(']').parse().unwrap()).collect();
        let one = size_of(of);
        assert_eq!(place % one, 0, "{name}: padding must be explicit, for AVR has none");
        let size = one * lengths.iter().product::<usize>();
        members.push(Member { name, of: of.to_string(), lengths, comment, place, size });
        place += size;
    }
    let widest = members.iter().map(|member| size_of(&member.of)).max().unwrap_or(1);
    assert_eq!(place % widest, 0, "padding at the end must be explicit, for AVR has none");
    members
}

fn words(text: &str) -> String {
    text.split_whitespace().collect::<Vec<_>>().join(" ")
}

fn words_of_comment(text: &str) -> String {
    let text = text.trim_start_matches('/').trim_end_matches('/');
    words(&text.lines().map(|line| line.trim().trim_matches('*')).collect::<Vec<_>>().join(" "))
}
