//! The readouts against the world outside: handbook tables, textbooks, standards. Each check names its source, and says
//! where a value is quoted from memory.

mod colour;
mod field;
mod focus;
mod imaging;
mod layout;
mod light;
mod motion;
mod resolution;
mod sun;

/// Fails unless `got` is within `tolerance` of what is published.
#[track_caller]
fn near(got: f64, published: f64, tolerance: f64) {
    assert!((got - published).abs() <= tolerance, "{got} is not {published} to within {tolerance}");
}
