//! The quantities of the fixed forms, each an integer with its unit in its name.
//!
//! In C the same integer is a plain `stdint.h` type whose name carries the suffix given here.

macro_rules! quantity {
    ($($(#[$doc:meta])* $name:ident($integer:ty)),* $(,)?) => {$(
        $(#[$doc])*
        #[derive(Clone, Copy, Debug, Default, PartialEq, Eq, PartialOrd, Ord, Hash)]
        #[cfg_attr(feature = "defmt", derive(defmt::Format))]
        #[repr(transparent)]
        pub struct $name(pub $integer);

        impl From<$name> for $integer {
            fn from(quantity: $name) -> $integer {
                quantity.0
            }
        }
    )*};
}

quantity! {
    /// Apertures, focal lengths, field stops, pupils. C suffix `_um`; the float form is in millimetres, `_mm`.
    Micrometres(u32),
    /// A length that may be negative. C suffix `_um`; the float form is in millimetres, `_mm`.
    SignedMicrometres(i32),
    /// Pixel pitch, wavelength, lengths at the focus. C suffix `_nm`; the float form is in micrometres, `_um`, but
    /// for wavelengths and rms wavefront, which stay in nanometres, `_nm`.
    Nanometres(u32),
    /// A length at the focus that may be negative. C suffix `_nm`; the float form is in micrometres, `_um`.
    SignedNanometres(i32),
    /// Distances before the telescope. C suffix `_mm`; the float form is in metres, `_m`.
    Millimetres(u32),
    /// Fields of view and separations. C suffix `_mas`; the float form is in arcseconds, `_arcsec`.
    Milliarcseconds(u32),
    /// An angle that may be negative. C suffix `_mas`.
    SignedMilliarcseconds(i32),
    /// Resolution, pixel scale, seeing. C suffix `_uas`; the float form is in arcseconds, `_arcsec`.
    Microarcseconds(u32),
    /// Plate scale. C suffix `_mas_per_mm`; the float form is in arcseconds per millimetre.
    MilliarcsecondsPerMillimetre(u32),
    /// Ratios, magnifications, focal ratios: unsigned Q16.16. C suffix `_q16`; the float form is a plain number.
    Q16(u32),
    /// Exposure in stops: signed Q16.16. C suffix `_q16`; the float form is a plain number.
    SignedQ16(i32),
    /// Thousandths of a plain number. C suffix `_milli`.
    Milli(u32),
    /// Brightness on the magnitude scale. C suffix `_mmag`; the float form is in magnitudes, `_mag`.
    Millimagnitudes(i32),
    /// Extinction, never negative. C suffix `_mmag`; the float form is in magnitudes, `_mag`.
    MillimagnitudesPerAirmass(u32),
    /// A difference of temperature, in size. C suffix `_mk`; the float form is in kelvin, `_k`.
    Millikelvin(u32),
    /// A change of temperature. C suffix `_mk`; the float form is in kelvin, `_k`.
    SignedMillikelvin(i32),
    /// Thermal expansion, in size. C suffix `_ppb_per_k`; the float form is in parts per million per kelvin, `_ppm_per_k`.
    PartsPerBillionPerKelvin(u32),
    /// Thermal expansion of either sign. C suffix `_ppb_per_k`; the float form is in parts per million per kelvin,
    /// `_ppm_per_k`.
    SignedPartsPerBillionPerKelvin(i32),
    /// Refractive index in steps of 10^-7. C suffix `_n7`; the float form is the index.
    RefractiveIndex(u32),
    /// A small share. C suffix `_ppm`; the float form is a plain number, 10^-6 for each part.
    PartsPerMillion(u32),
    /// A binary angle that wraps: 2^32 is one turn. C suffix `_bam`; the float form is in degrees, `_deg`.
    Bam(u32),
    /// A binary angle either side of zero: 2^32 is one turn. C suffix `_bam`; the float form is in degrees, `_deg`.
    SignedBam(i32),
    /// Milliseconds of a circle of 24 hours. C suffix `_day_ms`.
    DayMilliseconds(u32),
    /// How long something takes. C suffix `_ms`; the float form is in seconds, `_s`.
    Milliseconds(u32),
    /// How long an exposure may take. C suffix `_us`; the float form is in seconds, `_s`.
    Microseconds(u32),
    /// How fast a direction changes, in size. C suffix `_mas_per_s`; the float form is in arcseconds per second,
    /// `_arcsec_per_s`.
    MilliarcsecondsPerSecond(u32),
    /// How fast a direction changes, in size. C suffix `_uas_per_s`; the float form is in arcseconds per second,
    /// `_arcsec_per_s`.
    MicroarcsecondsPerSecond(u32),
    /// How fast a direction changes, of either sign. C suffix `_uas_per_s`; the float form is in arcseconds per second,
    /// `_arcsec_per_s`.
    SignedMicroarcsecondsPerSecond(i32),
    /// Light as power. C suffix `_mw`; the float form is in milliwatts too.
    Milliwatts(u32),
}

impl Q16 {
    /// 1.0
    pub const ONE: Q16 = Q16(1 << 16);
}

impl RefractiveIndex {
    /// 1.0, that of nothing.
    pub const ONE: RefractiveIndex = RefractiveIndex(10_000_000);
}
