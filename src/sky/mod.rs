//! The formulas of the sky, one file a subject, with the conventions of [`crate::optics`].
//!
//! A binary angle for latitude, declination or altitude is within a quarter turn either way; hour angle, azimuth and right
//! ascension wrap. In the float forms those are degrees from -90 to 90, these from 0 to 360. Azimuth runs from north
//! through east, hour angle grows westward, northern latitudes and declinations are positive.

pub mod motion;
pub mod sun;
