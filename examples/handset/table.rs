//! A TOML table that knows its lines.

use crate::decimal::Decimal;
use fieldstop::units::Q16;
use std::fmt;
use std::ops::Range;
use toml::Spanned;
use toml::de::{DeTable, DeValue};

/// Why a file was refused.
pub struct FileError {
    line: usize,
    field: String,
    reason: String,
}

impl fmt::Display for FileError {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "line {}: ", self.line)?;
        if !self.field.is_empty() {
            write!(f, "{}: ", self.field)?;
        }
        f.write_str(&self.reason)
    }
}

fn line_of(file: &str, offset: usize) -> usize {
    file.bytes().take(offset).filter(|&byte| byte == b'\n').count() + 1
}

pub fn parse(file: &str) -> Result<Spanned<DeTable<'_>>, FileError> {
    DeTable::parse(file).map_err(|error| {
        let line = line_of(file, error.span().map_or(0, |span| span.start));
        FileError { line, field: String::new(), reason: format!("not TOML: {}", error.message()) }
    })
}

/// One table, with the whole file for its lines.
pub struct Table<'a> {
    file: &'a str,
    fields: &'a DeTable<'a>,
    /// Where the table stands, for fields that it lacks.
    span: Range<usize>,
    /// `telescope 2, `, or nothing for the root.
    path: String,
}

impl<'a> Table<'a> {
    pub fn root(file: &'a str, fields: &'a DeTable<'a>) -> Table<'a> {
        Table { file, fields, span: 0..0, path: String::new() }
    }

    pub fn has(&self, field: &str) -> bool {
        self.fields.contains_key(field)
    }

    /// An error at the field's line, or at the table's where it has no such field.
    pub fn error(&self, field: &str, reason: String) -> FileError {
        let span = self.fields.get_key_value(field).map_or(self.span.clone(), |(key, _)| key.span());
        FileError { line: line_of(self.file, span.start), field: format!("{}{field}", self.path), reason }
    }

    /// Refuses a field that is not one of these.
    pub fn only(&self, fields: &[&str]) -> Result<(), FileError> {
        let unknown = |key: &&Spanned<_>| !fields.contains(&AsRef::<str>::as_ref(Spanned::get_ref(key)));
        match self.fields.keys().filter(unknown).min_by_key(|key| key.span().start) {
            Some(key) => {
                let known = fields.join(", ");
                Err(self.error(key.get_ref(), format!("unknown here; known are {known}")))
            }
            None => Ok(()),
        }
    }

    pub fn text(&self, field: &str) -> Result<Option<&'a str>, FileError> {
        self.value(field, "a text in quotes", DeValue::as_str)
    }

    /// A text that must be there, on one line.
    pub fn name(&self, field: &str, most: usize) -> Result<String, FileError> {
        let text = self.text(field)?.ok_or_else(|| self.error(field, "missing".into()))?;
        match text.chars().count() {
            count if (1..=most).contains(&count) && !text.contains(char::is_control) => Ok(text.into()),
            _ => Err(self.error(field, format!("must have 1 to {most} characters, on one line"))),
        }
    }

    /// A number in whole steps of one `per_unit`th of the file's unit.
    pub fn steps<T: TryFrom<i64>>(&self, field: &str, per_unit: u32) -> Result<Option<T>, FileError> {
        self.integer(field, |decimal| decimal.steps(per_unit))
    }

    /// A plain number, to the nearest 65536th.
    pub fn ratio(&self, field: &str) -> Result<Option<Q16>, FileError> {
        Ok(self.integer(field, |decimal| decimal.nearest_steps(Q16::ONE.0))?.map(Q16))
    }

    fn integer<T: TryFrom<i64>>(
        &self,
        field: &str,
        convert: impl Fn(&Decimal) -> Result<i64, String>,
    ) -> Result<Option<T>, FileError> {
        let Some(text) = self.value(field, "a number", number_text)? else { return Ok(None) };
        let steps = Decimal::read(text).and_then(|decimal| convert(&decimal));
        let steps = steps.map_err(|reason| self.error(field, reason))?;
        let fitting = T::try_from(steps).map_err(|_| {
            self.error(field, if steps < 0 { "must not be negative" } else { "too large" }.into())
        })?;
        Ok(Some(fitting))
    }

    pub fn table(&self, field: &str) -> Result<Table<'a>, FileError> {
        let table = self.value(field, "a table", DeValue::as_table)?;
        let fields = table.ok_or_else(|| self.error(field, "missing".into()))?;
        Ok(Table { file: self.file, fields, span: self.span_of(field), path: format!("{field}, ") })
    }

    /// At least one of `[[field]]`.
    pub fn tables(&self, field: &str) -> Result<Vec<Table<'a>>, FileError> {
        let array = self.value(field, "a list of tables, each under [[...]]", DeValue::as_array)?;
        let array = array.ok_or_else(|| self.error(field, "missing".into()))?;
        let tables = array.iter().enumerate().map(|(index, value)| {
            let fields = value.get_ref().as_table();
            let fields = fields.ok_or_else(|| self.error(field, "must be a list of tables".into()))?;
            let path = format!("{field} {}, ", index + 1);
            Ok(Table { file: self.file, fields, span: value.span(), path })
        });
        let tables = tables.collect::<Result<Vec<_>, _>>()?;
        if tables.is_empty() { Err(self.error(field, "must not be empty".into())) } else { Ok(tables) }
    }

    fn span_of(&self, field: &str) -> Range<usize> {
        self.fields.get(field).map_or(self.span.clone(), Spanned::span)
    }

    fn value<T>(
        &self,
        field: &str,
        kind: &str,
        convert: impl Fn(&'a DeValue<'a>) -> Option<T>,
    ) -> Result<Option<T>, FileError> {
        let Some(value) = self.fields.get(field) else { return Ok(None) };
        match convert(value.get_ref()) {
            Some(converted) => Ok(Some(converted)),
            None => Err(self.error(field, format!("must be {kind}"))),
        }
    }
}

/// The number as it is written in the file.
fn number_text<'a>(value: &'a DeValue<'a>) -> Option<&'a str> {
    match value {
        DeValue::Integer(integer) if integer.radix() == 10 => Some(integer.as_str()),
        DeValue::Float(float) => Some(float.as_str()),
        _ => None,
    }
}
