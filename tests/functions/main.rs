//! Every formula of the library against high-precision arithmetic, against its own other forms, at the edges of its
//! arguments, and through C. One registry drives them all; FIELDSTOP_CASES sets the number of cases a function and form.

mod big;
mod borders;
mod cases;
mod cost_cases;
mod coverage;
mod degenerate;
mod documented;
mod edges;
mod imaging_properties;
mod layout_properties;
mod oracle;
mod properties;
mod registry;
mod sky_borders;
mod sky_properties;
mod target;
mod twin;
