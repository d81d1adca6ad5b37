//! The formulas against published values, their source beside each.

mod light;
