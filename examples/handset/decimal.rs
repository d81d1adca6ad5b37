//! A decimal number's text as an integer, without a float in between: 203.5 mm is 203500 micrometres, exactly.

/// `digits` divided by ten to the power of `places`.
pub struct Decimal {
    negative: bool,
    digits: u64,
    places: u32,
}

impl Decimal {
    /// Reads `203.5`, `-1.25`, `1_130`; no exponent, no infinity.
    pub fn read(text: &str) -> Result<Decimal, String> {
        let text = text.replace('_', "");
        let unsigned = text.strip_prefix(['+', '-']).unwrap_or(&text);
        let (whole, fraction) = unsigned.split_once('.').unwrap_or((unsigned, ""));
        let fraction = fraction.trim_end_matches('0');
        if !whole.chars().chain(fraction.chars()).all(|c| c.is_ascii_digit()) {
            return Err("must be written as a plain decimal number".into());
        }
        let digits = format!("{whole}{fraction}").parse().map_err(|_| "too many digits")?;
        Ok(Decimal { negative: text.starts_with('-'), digits, places: fraction.len() as u32 })
    }

    /// In steps of one `per_unit`th; refused where it lies between two of them.
    pub fn steps(&self, per_unit: u32) -> Result<i64, String> {
        match self.scaled(per_unit)? {
            (steps, 0, _) => Ok(self.signed(steps)),
            _ if per_unit == 1 => Err("must be a whole number".into()),
            _ => Err(format!("too fine: it lies between two steps of 1/{per_unit}")),
        }
    }

    /// In the nearest steps of one `per_unit`th.
    pub fn nearest_steps(&self, per_unit: u32) -> Result<i64, String> {
        let (steps, rest, one) = self.scaled(per_unit)?;
        Ok(self.signed(steps + i64::from(rest >= one - rest)))
    }

    fn signed(&self, steps: i64) -> i64 {
        if self.negative { -steps } else { steps }
    }

    /// Whole steps, and the rest in parts of `one`.
    fn scaled(&self, per_unit: u32) -> Result<(i64, u64, u64), String> {
        let too_long = "too many digits";
        let one = 10u64.checked_pow(self.places).ok_or(too_long)?;
        let scaled = self.digits.checked_mul(per_unit.into()).ok_or(too_long)?;
        let steps = i64::try_from(scaled / one).map_err(|_| too_long)?;
        Ok((steps, scaled % one, one))
    }
}
