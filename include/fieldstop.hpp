/*
 * fieldstop for C++11 and later, over fieldstop.h: no heap, no exceptions, no RTTI, no standard library, and no more
 * code than the call in C. What each function computes, its ranges, error and statuses stand in fieldstop.h.
 *
 * Made from include/fieldstop.h and src/capi/frame.hpp: do not edit.
 *
 *     using namespace fieldstop::literals;
 *     constexpr fieldstop::micrometres focal_length = 1130000_um, eyepiece = 12500_um;
 *
 *     const auto magnification = fieldstop::magnification_fx(focal_length, eyepiece);
 *     if (magnification) { show(magnification.value()); } else { tell(magnification.status().text()); }
 *
 * Quantities. Each unit is a type of its own: an integer or a float behind count(). Millimetres in place of
 * micrometres do not compile. A literal with a unit, whole (120_mm) or with a point (120.0_mm), becomes whatever number
 * of that unit is asked for; one that does not fit does not compile in a constant expression. 1.5_q16 is a Q16.16.
 * convert<micrometres>(120_mm) goes from one unit to another of the same kind, rounded to nearest, or gives a status.
 * Counts and plain numbers are plain integers and floats.
 *
 * Results. A function gives a result: a value, or a status that tells why there is none. Compilers warn where it is
 * ignored. value_or(other) is always safe; value() without a value stops the program by FIELDSTOP_STOP(), which
 * you may define before this header is read, as an expression that does not return; it is a trap otherwise.
 *
 * Equipment is built member by member: telescope().with_aperture(187500_um) and so on; what C takes is c(). A member of a
 * readout that is not available is a result without a value, of cause FIELDSTOP_UNDEFINED.
 *
 * CAUTION. Never look at or near the Sun through a telescope without a full-aperture filter made for it; nothing that
 * this library computes says that it is safe. The makers' instructions and local rules come first.
 */
#ifndef FIELDSTOP_HPP
#define FIELDSTOP_HPP

#include "fieldstop.h"

#ifndef FIELDSTOP_STOP
#ifdef __GNUC__
#define FIELDSTOP_STOP() __builtin_trap()
#else
#include <stdlib.h>
#define FIELDSTOP_STOP() ::abort()
#endif
#endif

#if __cplusplus >= 201703L
#define FIELDSTOP_CHECKED_TYPE [[nodiscard]]
#else
#define FIELDSTOP_CHECKED_TYPE
#endif

/* Compilers that optimise for size would now and then make a call of what is less than one. */
#ifdef __GNUC__
#define FIELDSTOP_INLINE __attribute__((always_inline)) inline
#else
#define FIELDSTOP_INLINE inline
#endif

namespace fieldstop {

/* What can go wrong. */

enum class cause_number : uint8_t {
    none = 0,
    /** a pointer is null */
    null_pointer = FIELDSTOP_NULL_POINTER,
    /** zero where the quantity must exist */
    zero = FIELDSTOP_ZERO,
    /** outside the documented range */
    out_of_range = FIELDSTOP_OUT_OF_RANGE,
    /** a float argument is infinite or not a number */
    not_finite = FIELDSTOP_NOT_FINITE,
    /** the result does not fit its type */
    overflow = FIELDSTOP_OVERFLOW,
    /** it does not fit its width or buffer */
    no_room = FIELDSTOP_NO_ROOM,
    /** not defined or not known here */
    undefined = FIELDSTOP_UNDEFINED,
    /** never reached: a star or a place of the sky that never comes to what was asked about */
    never_reached = FIELDSTOP_NEVER_REACHED,
    /** never left: a star or a place of the sky that stays in what was asked about, all around the pole */
    never_left = FIELDSTOP_NEVER_LEFT,
    /** there is no good record */
    no_record = FIELDSTOP_NO_RECORD,
    /** the record is of a newer version */
    newer_record = FIELDSTOP_NEWER_RECORD,
    /** the storage could not be read or written */
    storage = FIELDSTOP_STORAGE,
};

class FIELDSTOP_CHECKED_TYPE status {
public:
    FIELDSTOP_INLINE constexpr explicit status(fieldstop_status number) : number_(number) {}
    FIELDSTOP_INLINE constexpr bool ok() const { return number_ == 0; }
    FIELDSTOP_INLINE constexpr cause_number cause() const { return static_cast<cause_number>(FIELDSTOP_CAUSE(number_)); }
    /** The position of the offending argument, counted from 1; 0 where no single one is to blame. */
    FIELDSTOP_INLINE constexpr uint8_t argument() const { return FIELDSTOP_ARGUMENT(number_); }
    FIELDSTOP_INLINE constexpr fieldstop_status number() const { return number_; }
    /** An English sentence for the cause; on AVR in program memory. */
    FIELDSTOP_INLINE const char *text() const { return ::fieldstop_cause_text(number_); }

private:
    fieldstop_status number_;
};

/** How a result gives its value: a copy, but of what is large a reference. */
template <typename value_type> struct given_as {
    typedef value_type type;
};

/** A value, or the status that tells why there is none. */
struct access;
struct plain_access {};
template <typename value_type> class FIELDSTOP_CHECKED_TYPE result {
public:
    FIELDSTOP_INLINE constexpr explicit result(value_type value) : value_(value), number_(0) {}
    FIELDSTOP_INLINE constexpr explicit result(fieldstop::status why) : value_(), number_(why.number()) {}
    FIELDSTOP_INLINE constexpr bool ok() const { return number_ == 0; }
    FIELDSTOP_INLINE constexpr explicit operator bool() const { return number_ == 0; }
    FIELDSTOP_INLINE constexpr fieldstop::status status() const { return fieldstop::status(number_); }
    /** Only where there is one: stops otherwise. */
    FIELDSTOP_INLINE constexpr typename given_as<value_type>::type value() const { return number_ == 0 ? value_ : (FIELDSTOP_STOP(), value_); }
    FIELDSTOP_INLINE constexpr value_type value_or(value_type other) const { return number_ == 0 ? value_ : other; }

private:
    friend struct access;
    /** What C gave: read only where it wrote. */
    template <typename given_type>
    FIELDSTOP_INLINE result(fieldstop_status number, const given_type &given)
        : value_(number == 0 ? value_type(given) : value_type()), number_(number)
    {
    }
    /** What C is to fill. */
    FIELDSTOP_INLINE explicit result(const access &blank) : value_(blank) {}
    /** The same for a struct of C's. */
    FIELDSTOP_INLINE explicit result(const plain_access &) {}
    value_type value_;
    fieldstop_status number_;
};

/** For the functions below. */
struct access {
    /** A small value comes by way of a variable, which leaves it in a register. */
    template <typename value_type, typename given_type>
    FIELDSTOP_INLINE static result<value_type> given(fieldstop_status number, const given_type &value)
    {
        return result<value_type>(number, value);
    }
    /** A struct is filled where it stays. */
    template <typename value_type> FIELDSTOP_INLINE static result<value_type> blank() { return result<value_type>(access()); }
    template <typename value_type> FIELDSTOP_INLINE static decltype(value_type::raw_) *place(result<value_type> &of)
    {
        return &of.value_.raw_;
    }
    template <typename value_type> FIELDSTOP_INLINE static result<value_type> plain_blank() { return result<value_type>(plain_access()); }
    template <typename value_type> FIELDSTOP_INLINE static value_type *plain_place(result<value_type> &of) { return &of.value_; }
    template <typename value_type> FIELDSTOP_INLINE static void finish(result<value_type> &of, fieldstop_status number)
    {
        of.number_ = number;
    }
};

/* Quantities. */

template <typename unit_type, typename number_type> class quantity {
public:
    typedef unit_type unit_of;
    typedef number_type number;
    quantity() = default;
    FIELDSTOP_INLINE constexpr explicit quantity(number_type count) : count_(count) {}
    FIELDSTOP_INLINE constexpr number_type count() const { return count_; }
    friend FIELDSTOP_INLINE constexpr bool operator==(quantity left, quantity right) { return left.count_ == right.count_; }
    friend FIELDSTOP_INLINE constexpr bool operator!=(quantity left, quantity right) { return left.count_ != right.count_; }
    friend FIELDSTOP_INLINE constexpr bool operator<(quantity left, quantity right) { return left.count_ < right.count_; }
    friend FIELDSTOP_INLINE constexpr bool operator>(quantity left, quantity right) { return left.count_ > right.count_; }
    friend FIELDSTOP_INLINE constexpr bool operator<=(quantity left, quantity right) { return left.count_ <= right.count_; }
    friend FIELDSTOP_INLINE constexpr bool operator>=(quantity left, quantity right) { return left.count_ >= right.count_; }

private:
    number_type count_;
};

/** A unit, by what it measures and how large it is among the units of that kind. */
template <int kind_number, long long size_number> struct measure {
    static constexpr int kind() { return kind_number; }
    static constexpr long long size() { return size_number; }
};

namespace unit {
struct milliarcseconds_per_millimetre : measure<0, 1> {};
struct arcseconds_per_millimetre : measure<0, 1000> {};
struct microarcseconds_per_second : measure<1, 1> {};
struct milliarcseconds_per_second : measure<1, 1000> {};
struct arcseconds_per_second : measure<1, 1000000> {};
struct parts_per_billion_per_kelvin : measure<2, 1> {};
struct parts_per_million_per_kelvin : measure<2, 1000> {};
struct day_milliseconds : measure<3, 1> {};
struct nanometres : measure<4, 1> {};
struct micrometres : measure<4, 1000> {};
struct millimetres : measure<4, 1000000> {};
struct metres : measure<4, 1000000000> {};
struct microarcseconds : measure<5, 1> {};
struct milliarcseconds : measure<5, 1000> {};
struct arcseconds : measure<5, 1000000> {};
struct degrees_of_arc : measure<5, 3600000000> {};
struct binary_angle : measure<6, 1> {};
struct q16 : measure<7, 1> {};
struct thousandths : measure<8, 1> {};
struct millimagnitudes : measure<9, 1> {};
struct magnitudes : measure<9, 1000> {};
struct microseconds : measure<10, 1> {};
struct milliseconds : measure<10, 1000> {};
struct seconds : measure<10, 1000000> {};
struct millikelvin : measure<11, 1> {};
struct kelvin : measure<11, 1000> {};
struct index_n7 : measure<12, 1> {};
struct parts_per_million : measure<13, 1> {};
struct milliwatts : measure<14, 1> {};
} // namespace unit

template <typename number> struct number_kind {
    static constexpr bool floating() { return false; }
    static constexpr bool fits(long long count)
    {
        return static_cast<long long>(static_cast<number>(count)) == count;
    }
    static constexpr double least() { return number(-1) > number(0) ? 0.0 : -bound(); }
    /** 2 to the bits of the value: the first that does not fit. */
    static constexpr double bound() { return (number(-1) > number(0) ? 2.0 : 1.0) * static_cast<double>(1ull << (8 * sizeof(number) - 1)); }
};
template <> struct number_kind<float> {
    static constexpr bool floating() { return true; }
    static constexpr bool fits(long long) { return true; }
};
template <> struct number_kind<double> {
    static constexpr bool floating() { return true; }
    static constexpr bool fits(long long) { return true; }
};

/** A literal without a point. */
template <typename unit_type> class whole {
public:
    FIELDSTOP_INLINE constexpr explicit whole(long long count) : count_(count) {}
    FIELDSTOP_INLINE constexpr whole operator-() const { return whole(-count_); }
    FIELDSTOP_INLINE constexpr long long count() const { return count_; }
    template <typename number> FIELDSTOP_INLINE constexpr operator quantity<unit_type, number>() const
    {
        return quantity<unit_type, number>(number_kind<number>::fits(count_) ? static_cast<number>(count_)
                                                                             : (FIELDSTOP_STOP(), number()));
    }

private:
    long long count_;
};

/** A literal with a point: for float and double only. */
template <typename unit_type> class pointed {
public:
    FIELDSTOP_INLINE constexpr explicit pointed(long double count) : count_(count) {}
    FIELDSTOP_INLINE constexpr pointed operator-() const { return pointed(-count_); }
    template <typename number> FIELDSTOP_INLINE constexpr operator quantity<unit_type, number>() const
    {
        static_assert(number_kind<number>::floating(), "a literal with a point is no integer");
        return quantity<unit_type, number>(static_cast<number>(count_));
    }

private:
    long double count_;
};

template <typename unit_type> constexpr whole<unit_type> whole_of(unsigned long long count)
{
    return whole<unit_type>(count >> 63 == 0 ? static_cast<long long>(count) : (FIELDSTOP_STOP(), 0));
}

typedef quantity<unit::arcseconds, double> arcseconds_f64;
typedef quantity<unit::arcseconds, float> arcseconds_f32;
typedef quantity<unit::arcseconds_per_millimetre, double> arcseconds_per_millimetre_f64;
typedef quantity<unit::arcseconds_per_millimetre, float> arcseconds_per_millimetre_f32;
typedef quantity<unit::arcseconds_per_second, double> arcseconds_per_second_f64;
typedef quantity<unit::arcseconds_per_second, float> arcseconds_per_second_f32;
typedef quantity<unit::binary_angle, int32_t> signed_binary_angle;
typedef quantity<unit::binary_angle, uint32_t> binary_angle;
typedef quantity<unit::day_milliseconds, uint32_t> day_milliseconds;
typedef quantity<unit::degrees_of_arc, double> degrees_of_arc_f64;
typedef quantity<unit::degrees_of_arc, float> degrees_of_arc_f32;
typedef quantity<unit::index_n7, uint32_t> index_n7;
typedef quantity<unit::kelvin, double> kelvin_f64;
typedef quantity<unit::kelvin, float> kelvin_f32;
typedef quantity<unit::magnitudes, double> magnitudes_f64;
typedef quantity<unit::magnitudes, float> magnitudes_f32;
typedef quantity<unit::metres, double> metres_f64;
typedef quantity<unit::metres, float> metres_f32;
typedef quantity<unit::microarcseconds, uint32_t> microarcseconds;
typedef quantity<unit::microarcseconds_per_second, int32_t> signed_microarcseconds_per_second;
typedef quantity<unit::microarcseconds_per_second, uint32_t> microarcseconds_per_second;
typedef quantity<unit::micrometres, double> micrometres_f64;
typedef quantity<unit::micrometres, float> micrometres_f32;
typedef quantity<unit::micrometres, int32_t> signed_micrometres;
typedef quantity<unit::micrometres, uint32_t> micrometres;
typedef quantity<unit::microseconds, uint32_t> microseconds;
typedef quantity<unit::milliarcseconds, int32_t> signed_milliarcseconds;
typedef quantity<unit::milliarcseconds, uint32_t> milliarcseconds;
typedef quantity<unit::milliarcseconds_per_millimetre, uint32_t> milliarcseconds_per_millimetre;
typedef quantity<unit::milliarcseconds_per_second, uint32_t> milliarcseconds_per_second;
typedef quantity<unit::millikelvin, int32_t> signed_millikelvin;
typedef quantity<unit::millikelvin, uint32_t> millikelvin;
typedef quantity<unit::millimagnitudes, int32_t> millimagnitudes;
typedef quantity<unit::millimagnitudes, uint32_t> unsigned_millimagnitudes;
typedef quantity<unit::millimetres, double> millimetres_f64;
typedef quantity<unit::millimetres, float> millimetres_f32;
typedef quantity<unit::millimetres, uint32_t> millimetres;
typedef quantity<unit::milliseconds, uint32_t> milliseconds;
typedef quantity<unit::milliwatts, double> milliwatts_f64;
typedef quantity<unit::milliwatts, float> milliwatts_f32;
typedef quantity<unit::milliwatts, uint32_t> milliwatts;
typedef quantity<unit::nanometres, double> nanometres_f64;
typedef quantity<unit::nanometres, float> nanometres_f32;
typedef quantity<unit::nanometres, int32_t> signed_nanometres;
typedef quantity<unit::nanometres, uint32_t> nanometres;
typedef quantity<unit::parts_per_billion_per_kelvin, int32_t> signed_parts_per_billion_per_kelvin;
typedef quantity<unit::parts_per_billion_per_kelvin, uint32_t> parts_per_billion_per_kelvin;
typedef quantity<unit::parts_per_million, uint32_t> parts_per_million;
typedef quantity<unit::parts_per_million_per_kelvin, double> parts_per_million_per_kelvin_f64;
typedef quantity<unit::parts_per_million_per_kelvin, float> parts_per_million_per_kelvin_f32;
typedef quantity<unit::q16, int32_t> signed_q16;
typedef quantity<unit::q16, uint32_t> q16;
typedef quantity<unit::seconds, double> seconds_f64;
typedef quantity<unit::seconds, float> seconds_f32;
typedef quantity<unit::seconds, uint32_t> seconds;
typedef quantity<unit::thousandths, uint32_t> thousandths;

namespace literals {
constexpr whole<unit::milliarcseconds_per_millimetre> operator""_mas_per_mm(unsigned long long count) { return whole_of<unit::milliarcseconds_per_millimetre>(count); }
constexpr pointed<unit::milliarcseconds_per_millimetre> operator""_mas_per_mm(long double count) { return pointed<unit::milliarcseconds_per_millimetre>(count); }
constexpr whole<unit::arcseconds_per_millimetre> operator""_arcsec_per_mm(unsigned long long count) { return whole_of<unit::arcseconds_per_millimetre>(count); }
constexpr pointed<unit::arcseconds_per_millimetre> operator""_arcsec_per_mm(long double count) { return pointed<unit::arcseconds_per_millimetre>(count); }
constexpr whole<unit::microarcseconds_per_second> operator""_uas_per_s(unsigned long long count) { return whole_of<unit::microarcseconds_per_second>(count); }
constexpr pointed<unit::microarcseconds_per_second> operator""_uas_per_s(long double count) { return pointed<unit::microarcseconds_per_second>(count); }
constexpr whole<unit::milliarcseconds_per_second> operator""_mas_per_s(unsigned long long count) { return whole_of<unit::milliarcseconds_per_second>(count); }
constexpr pointed<unit::milliarcseconds_per_second> operator""_mas_per_s(long double count) { return pointed<unit::milliarcseconds_per_second>(count); }
constexpr whole<unit::arcseconds_per_second> operator""_arcsec_per_s(unsigned long long count) { return whole_of<unit::arcseconds_per_second>(count); }
constexpr pointed<unit::arcseconds_per_second> operator""_arcsec_per_s(long double count) { return pointed<unit::arcseconds_per_second>(count); }
constexpr whole<unit::parts_per_billion_per_kelvin> operator""_ppb_per_k(unsigned long long count) { return whole_of<unit::parts_per_billion_per_kelvin>(count); }
constexpr pointed<unit::parts_per_billion_per_kelvin> operator""_ppb_per_k(long double count) { return pointed<unit::parts_per_billion_per_kelvin>(count); }
constexpr whole<unit::parts_per_million_per_kelvin> operator""_ppm_per_k(unsigned long long count) { return whole_of<unit::parts_per_million_per_kelvin>(count); }
constexpr pointed<unit::parts_per_million_per_kelvin> operator""_ppm_per_k(long double count) { return pointed<unit::parts_per_million_per_kelvin>(count); }
constexpr whole<unit::day_milliseconds> operator""_day_ms(unsigned long long count) { return whole_of<unit::day_milliseconds>(count); }
constexpr pointed<unit::day_milliseconds> operator""_day_ms(long double count) { return pointed<unit::day_milliseconds>(count); }
constexpr whole<unit::nanometres> operator""_nm(unsigned long long count) { return whole_of<unit::nanometres>(count); }
constexpr pointed<unit::nanometres> operator""_nm(long double count) { return pointed<unit::nanometres>(count); }
constexpr whole<unit::micrometres> operator""_um(unsigned long long count) { return whole_of<unit::micrometres>(count); }
constexpr pointed<unit::micrometres> operator""_um(long double count) { return pointed<unit::micrometres>(count); }
constexpr whole<unit::millimetres> operator""_mm(unsigned long long count) { return whole_of<unit::millimetres>(count); }
constexpr pointed<unit::millimetres> operator""_mm(long double count) { return pointed<unit::millimetres>(count); }
constexpr whole<unit::metres> operator""_m(unsigned long long count) { return whole_of<unit::metres>(count); }
constexpr pointed<unit::metres> operator""_m(long double count) { return pointed<unit::metres>(count); }
constexpr whole<unit::microarcseconds> operator""_uas(unsigned long long count) { return whole_of<unit::microarcseconds>(count); }
constexpr pointed<unit::microarcseconds> operator""_uas(long double count) { return pointed<unit::microarcseconds>(count); }
constexpr whole<unit::milliarcseconds> operator""_mas(unsigned long long count) { return whole_of<unit::milliarcseconds>(count); }
constexpr pointed<unit::milliarcseconds> operator""_mas(long double count) { return pointed<unit::milliarcseconds>(count); }
constexpr whole<unit::arcseconds> operator""_arcsec(unsigned long long count) { return whole_of<unit::arcseconds>(count); }
constexpr pointed<unit::arcseconds> operator""_arcsec(long double count) { return pointed<unit::arcseconds>(count); }
constexpr whole<unit::degrees_of_arc> operator""_deg(unsigned long long count) { return whole_of<unit::degrees_of_arc>(count); }
constexpr pointed<unit::degrees_of_arc> operator""_deg(long double count) { return pointed<unit::degrees_of_arc>(count); }
constexpr whole<unit::binary_angle> operator""_bam(unsigned long long count) { return whole_of<unit::binary_angle>(count); }
constexpr pointed<unit::binary_angle> operator""_bam(long double count) { return pointed<unit::binary_angle>(count); }
constexpr whole<unit::thousandths> operator""_milli(unsigned long long count) { return whole_of<unit::thousandths>(count); }
constexpr pointed<unit::thousandths> operator""_milli(long double count) { return pointed<unit::thousandths>(count); }
constexpr whole<unit::millimagnitudes> operator""_mmag(unsigned long long count) { return whole_of<unit::millimagnitudes>(count); }
constexpr pointed<unit::millimagnitudes> operator""_mmag(long double count) { return pointed<unit::millimagnitudes>(count); }
constexpr whole<unit::magnitudes> operator""_mag(unsigned long long count) { return whole_of<unit::magnitudes>(count); }
constexpr pointed<unit::magnitudes> operator""_mag(long double count) { return pointed<unit::magnitudes>(count); }
constexpr whole<unit::microseconds> operator""_us(unsigned long long count) { return whole_of<unit::microseconds>(count); }
constexpr pointed<unit::microseconds> operator""_us(long double count) { return pointed<unit::microseconds>(count); }
constexpr whole<unit::milliseconds> operator""_ms(unsigned long long count) { return whole_of<unit::milliseconds>(count); }
constexpr pointed<unit::milliseconds> operator""_ms(long double count) { return pointed<unit::milliseconds>(count); }
constexpr whole<unit::seconds> operator""_s(unsigned long long count) { return whole_of<unit::seconds>(count); }
constexpr pointed<unit::seconds> operator""_s(long double count) { return pointed<unit::seconds>(count); }
constexpr whole<unit::millikelvin> operator""_mk(unsigned long long count) { return whole_of<unit::millikelvin>(count); }
constexpr pointed<unit::millikelvin> operator""_mk(long double count) { return pointed<unit::millikelvin>(count); }
constexpr whole<unit::kelvin> operator""_k(unsigned long long count) { return whole_of<unit::kelvin>(count); }
constexpr pointed<unit::kelvin> operator""_k(long double count) { return pointed<unit::kelvin>(count); }
constexpr whole<unit::index_n7> operator""_n7(unsigned long long count) { return whole_of<unit::index_n7>(count); }
constexpr pointed<unit::index_n7> operator""_n7(long double count) { return pointed<unit::index_n7>(count); }
constexpr whole<unit::parts_per_million> operator""_ppm(unsigned long long count) { return whole_of<unit::parts_per_million>(count); }
constexpr pointed<unit::parts_per_million> operator""_ppm(long double count) { return pointed<unit::parts_per_million>(count); }
constexpr whole<unit::milliwatts> operator""_mw(unsigned long long count) { return whole_of<unit::milliwatts>(count); }
constexpr pointed<unit::milliwatts> operator""_mw(long double count) { return pointed<unit::milliwatts>(count); }

constexpr q16 operator""_q16(long double number)
{
    return number < 65535.9999923706L ? q16(static_cast<uint32_t>(number * 65536.0L + 0.5L)) : (FIELDSTOP_STOP(), q16(0));
}
} // namespace literals

/* One unit for another of the same kind. */

template <bool to_floating, bool from_floating> struct conversion;
template <> struct conversion<false, false> {
    static constexpr long long scaled(long long count, long long up, long long down)
    {
        return down == 1 ? count * up : count < 0 ? -((-count + down / 2) / down) : (count + down / 2) / down;
    }
    template <typename target> static constexpr result<target> checked(long long count)
    {
        return number_kind<typename target::number>::fits(count)
                   ? result<target>(target(static_cast<typename target::number>(count)))
                   : result<target>(status(FIELDSTOP_OVERFLOW));
    }
    template <typename target> static constexpr result<target> of(long long count, long long up, long long down)
    {
        return checked<target>(scaled(count, up, down));
    }
};
template <bool from_floating> struct conversion<true, from_floating> {
    template <typename target, typename number>
    static constexpr result<target> of(number count, long long up, long long down)
    {
        return result<target>(target(static_cast<typename target::number>(count) * static_cast<typename target::number>(up) /
                                     static_cast<typename target::number>(down)));
    }
};
template <> struct conversion<false, true> {
    template <typename target, typename number> static constexpr result<target> checked(number count)
    {
        typedef number_kind<typename target::number> kind;
        return count >= static_cast<number>(kind::least()) && count < static_cast<number>(kind::bound())
                   ? conversion<false, false>::checked<target>(
                         static_cast<long long>(count < 0 ? count - number(0.5) : count + number(0.5)))
                   : result<target>(status(count - count == 0 ? FIELDSTOP_OVERFLOW : FIELDSTOP_NOT_FINITE));
    }
    template <typename target, typename number>
    static constexpr result<target> of(number count, long long up, long long down)
    {
        return checked<target>(count * static_cast<number>(up) / static_cast<number>(down));
    }
};

constexpr long long times_larger(long long from, long long to)
{
    return from > to ? from / to : 1;
}

template <typename target, typename unit_type, typename number>
FIELDSTOP_CHECKED constexpr result<target> convert(quantity<unit_type, number> from)
{
    static_assert(target::unit_of::kind() == unit_type::kind(), "units of different kinds");
    return conversion<number_kind<typename target::number>::floating(), number_kind<number>::floating()>::template of<target>(
        from.count(), times_larger(unit_type::size(), target::unit_of::size()),
        times_larger(target::unit_of::size(), unit_type::size()));
}
template <typename target, typename unit_type> FIELDSTOP_CHECKED constexpr result<target> convert(whole<unit_type> from)
{
    return convert<target>(static_cast<quantity<unit_type, long long>>(from));
}

/** The characters that a text goes to. */
class buffer {
public:
    FIELDSTOP_INLINE constexpr buffer(char *text, uint16_t capacity) : text_(text), capacity_(capacity) {}
    template <size_t capacity> FIELDSTOP_INLINE constexpr buffer(char (&text)[capacity]) : text_(text), capacity_(capacity)
    {
        static_assert(capacity <= 0xFFFF, "longer than any text");
    }
    FIELDSTOP_INLINE constexpr char *text() const { return text_; }
    FIELDSTOP_INLINE constexpr uint16_t capacity() const { return capacity_; }

private:
    char *text_;
    uint16_t capacity_;
};

/* Named numbers. */

/** Eyepiece mapping: true field = A fe / f, the apparent angle proportional to the true one */
constexpr uint8_t equidistant = FIELDSTOP_EQUIDISTANT;
/** Eyepiece mapping: true field = 2 atan(tan(A/2) fe / f), no distortion */
constexpr uint8_t rectilinear = FIELDSTOP_RECTILINEAR;
/** Visual readout, wanted and available: focal_length_um */
constexpr uint32_t visual_focal_length = FIELDSTOP_VISUAL_FOCAL_LENGTH;
/** Visual readout, wanted and available: focal_ratio_q16 */
constexpr uint32_t visual_focal_ratio = FIELDSTOP_VISUAL_FOCAL_RATIO;
/** Visual readout, wanted and available: magnification_q16 */
constexpr uint32_t visual_magnification = FIELDSTOP_VISUAL_MAGNIFICATION;
/** Visual readout, wanted and available: exit_pupil_um */
constexpr uint32_t visual_exit_pupil = FIELDSTOP_VISUAL_EXIT_PUPIL;
/** Visual readout, wanted and available: true_field_mas */
constexpr uint32_t visual_true_field = FIELDSTOP_VISUAL_TRUE_FIELD;
/** Visual readout, wanted and available: resolution_uas */
constexpr uint32_t visual_resolution = FIELDSTOP_VISUAL_RESOLUTION;
/** Visual readout, wanted and available: dawes_limit_uas */
constexpr uint32_t visual_dawes_limit = FIELDSTOP_VISUAL_DAWES_LIMIT;
/** Visual readout, wanted and available: lowest_magnification_q16 */
constexpr uint32_t visual_lowest_magnification = FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION;
/** Visual readout, wanted and available: resolving_magnification_q16 */
constexpr uint32_t visual_resolving_magnification = FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION;
/** Visual readout, wanted and available: effective_aperture_um */
constexpr uint32_t visual_effective_aperture = FIELDSTOP_VISUAL_EFFECTIVE_APERTURE;
/** Visual readout, wanted and available: limiting_magnitude_mmag */
constexpr uint32_t visual_limiting_magnitude = FIELDSTOP_VISUAL_LIMITING_MAGNITUDE;
/** Visual readout, wanted and available: surface_brightness_q16 */
constexpr uint32_t visual_surface_brightness = FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS;
/** Visual readout, wanted: every member */
constexpr uint32_t visual_all = FIELDSTOP_VISUAL_ALL;
/** Visual readout, fact: the exit pupil is wider than the eye's, and light falls on the iris (geometry) */
constexpr uint32_t visual_fact_wide_exit_pupil = FIELDSTOP_VISUAL_FACT_WIDE_EXIT_PUPIL;
/** Visual readout, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the observer's eye) */
constexpr uint32_t visual_fact_empty_magnification = FIELDSTOP_VISUAL_FACT_EMPTY_MAGNIFICATION;
/** Visual readout, fact: the true field comes from the apparent field, as good as the mapping */
constexpr uint32_t visual_fact_field_from_apparent = FIELDSTOP_VISUAL_FACT_FIELD_FROM_APPARENT;
/** Visual readout, fact: the seeing is wider than the resolution (common practice) */
constexpr uint32_t visual_fact_seeing_limited = FIELDSTOP_VISUAL_FACT_SEEING_LIMITED;
/** Camera readout, wanted and available: focal_length_um */
constexpr uint32_t camera_focal_length = FIELDSTOP_CAMERA_FOCAL_LENGTH;
/** Camera readout, wanted and available: focal_ratio_q16 */
constexpr uint32_t camera_focal_ratio = FIELDSTOP_CAMERA_FOCAL_RATIO;
/** Camera readout, wanted and available: t_number_q16 */
constexpr uint32_t camera_t_number = FIELDSTOP_CAMERA_T_NUMBER;
/** Camera readout, wanted and available: frame_width_mas */
constexpr uint32_t camera_frame_width = FIELDSTOP_CAMERA_FRAME_WIDTH;
/** Camera readout, wanted and available: frame_height_mas */
constexpr uint32_t camera_frame_height = FIELDSTOP_CAMERA_FRAME_HEIGHT;
/** Camera readout, wanted and available: pixel_scale_uas */
constexpr uint32_t camera_pixel_scale = FIELDSTOP_CAMERA_PIXEL_SCALE;
/** Camera readout, wanted and available: plate_scale_mas_per_mm */
constexpr uint32_t camera_plate_scale = FIELDSTOP_CAMERA_PLATE_SCALE;
/** Camera readout, wanted and available: star_fwhm_uas */
constexpr uint32_t camera_star_fwhm = FIELDSTOP_CAMERA_STAR_FWHM;
/** Camera readout, wanted and available: pixels_per_fwhm_q16 */
constexpr uint32_t camera_pixels_per_fwhm = FIELDSTOP_CAMERA_PIXELS_PER_FWHM;
/** Camera readout, wanted and available: cutoff_frequency_q16 */
constexpr uint32_t camera_cutoff_frequency = FIELDSTOP_CAMERA_CUTOFF_FREQUENCY;
/** Camera readout, wanted and available: nyquist_pixel_nm */
constexpr uint32_t camera_nyquist_pixel = FIELDSTOP_CAMERA_NYQUIST_PIXEL;
/** Camera readout, wanted and available: diagonal_mas */
constexpr uint32_t camera_diagonal = FIELDSTOP_CAMERA_DIAGONAL;
/** Camera readout, wanted: every member */
constexpr uint32_t camera_all = FIELDSTOP_CAMERA_ALL;
/** Camera readout, fact: under two pixels to the star image (common practice, after Shannon 1949) */
constexpr uint32_t camera_fact_coarse_sampling = FIELDSTOP_CAMERA_FACT_COARSE_SAMPLING;
/** Camera readout, fact: over three pixels to the star image (common practice) */
constexpr uint32_t camera_fact_fine_sampling = FIELDSTOP_CAMERA_FACT_FINE_SAMPLING;
/** Visual target, purpose: the whole target with room around it, as large as that allows */
constexpr uint8_t purpose_frame = FIELDSTOP_PURPOSE_FRAME;
/** Visual target, purpose: two stars as far apart to the eye as it needs */
constexpr uint8_t purpose_split = FIELDSTOP_PURPOSE_SPLIT;
/** Visual target, purpose: the nearest exit pupil */
constexpr uint8_t purpose_exit_pupil = FIELDSTOP_PURPOSE_EXIT_PUPIL;
/** Choices: the place in the list of Barlows and reducers where there is none */
constexpr uint8_t no_amplifier = FIELDSTOP_NO_AMPLIFIER;
/** Visual choice, available: magnification_q16 */
constexpr uint32_t visual_choice_magnification = FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION;
/** Visual choice, available: exit_pupil_um */
constexpr uint32_t visual_choice_exit_pupil = FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL;
/** Visual choice, available: true_field_mas */
constexpr uint32_t visual_choice_true_field = FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD;
/** Visual choice, available: fit_q16 */
constexpr uint32_t visual_choice_fit = FIELDSTOP_VISUAL_CHOICE_FIT;
/** Visual choice, fact: the exit pupil is wider than the eye's (geometry) */
constexpr uint32_t visual_choice_fact_wide_exit_pupil = FIELDSTOP_VISUAL_CHOICE_FACT_WIDE_EXIT_PUPIL;
/** Visual choice, fact: the magnification is over the resolving magnification (Rayleigh 1879, and the observer's eye) */
constexpr uint32_t visual_choice_fact_empty_magnification = FIELDSTOP_VISUAL_CHOICE_FACT_EMPTY_MAGNIFICATION;
/** Visual choice, fact: the true field comes from the apparent field */
constexpr uint32_t visual_choice_fact_field_from_apparent = FIELDSTOP_VISUAL_CHOICE_FACT_FIELD_FROM_APPARENT;
/** Visual choice, fact: the magnification is over that at which the seeing reaches the smallest angle that the eye parts (common practice) */
constexpr uint32_t visual_choice_fact_seeing_shows = FIELDSTOP_VISUAL_CHOICE_FACT_SEEING_SHOWS;
/** Visual choice, fact: what is wanted is reached */
constexpr uint32_t visual_choice_fact_serves = FIELDSTOP_VISUAL_CHOICE_FACT_SERVES;
/** Visual choice, fact: the separation is under the telescope's Rayleigh limit */
constexpr uint32_t visual_choice_fact_under_resolution = FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_RESOLUTION;
/** Visual choice, fact: the separation is under the seeing (common practice) */
constexpr uint32_t visual_choice_fact_under_seeing = FIELDSTOP_VISUAL_CHOICE_FACT_UNDER_SEEING;
/** Camera choice, available: frame_width_mas */
constexpr uint32_t camera_choice_frame_width = FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH;
/** Camera choice, available: frame_height_mas */
constexpr uint32_t camera_choice_frame_height = FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT;
/** Camera choice, available: pixel_scale_uas */
constexpr uint32_t camera_choice_pixel_scale = FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE;
/** Camera choice, available: pixels_per_fwhm_q16 */
constexpr uint32_t camera_choice_pixels_per_fwhm = FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM;
/** Camera choice, available: tiles_wide and tiles_high */
constexpr uint32_t camera_choice_tiles = FIELDSTOP_CAMERA_CHOICE_TILES;
/** Camera choice, fact: under two pixels to the star image (common practice, after Shannon 1949) */
constexpr uint32_t camera_choice_fact_coarse_sampling = FIELDSTOP_CAMERA_CHOICE_FACT_COARSE_SAMPLING;
/** Camera choice, fact: over three pixels to the star image (common practice) */
constexpr uint32_t camera_choice_fact_fine_sampling = FIELDSTOP_CAMERA_CHOICE_FACT_FINE_SAMPLING;
/** Camera choice, fact: one frame takes the whole target */
constexpr uint32_t camera_choice_fact_fits = FIELDSTOP_CAMERA_CHOICE_FACT_FITS;
/** Focus readout, wanted and available: focal_ratio_q16 */
constexpr uint32_t focus_focal_ratio = FIELDSTOP_FOCUS_FOCAL_RATIO;
/** Focus readout, wanted and available: depth_nm */
constexpr uint32_t focus_depth = FIELDSTOP_FOCUS_DEPTH;
/** Focus readout, wanted and available: depth_steps */
constexpr uint32_t focus_depth_steps = FIELDSTOP_FOCUS_DEPTH_STEPS;
/** Focus readout, wanted and available: temperature_mk */
constexpr uint32_t focus_temperature = FIELDSTOP_FOCUS_TEMPERATURE;
/** Focus readout, wanted and available: blur_nm */
constexpr uint32_t focus_blur = FIELDSTOP_FOCUS_BLUR;
/** Focus readout, wanted and available: blur_angle_uas */
constexpr uint32_t focus_blur_angle = FIELDSTOP_FOCUS_BLUR_ANGLE;
/** Focus readout, wanted and available: wavefront_nm */
constexpr uint32_t focus_wavefront = FIELDSTOP_FOCUS_WAVEFRONT;
/** Focus readout, wanted: every member */
constexpr uint32_t focus_all = FIELDSTOP_FOCUS_ALL;
/** Focus readout, fact: one step of the motor is over the depth of focus (Rayleigh 1879) */
constexpr uint32_t focus_fact_coarse_step = FIELDSTOP_FOCUS_FACT_COARSE_STEP;
/** Focus readout, fact: the defocus is over the depth of focus (Rayleigh 1879) */
constexpr uint32_t focus_fact_out_of_focus = FIELDSTOP_FOCUS_FACT_OUT_OF_FOCUS;
/** Newtonian readout, wanted and available: diagonal_um */
constexpr uint32_t newtonian_diagonal = FIELDSTOP_NEWTONIAN_DIAGONAL;
/** Newtonian readout, wanted and available: diagonal_offset_um */
constexpr uint32_t newtonian_diagonal_offset = FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET;
/** Newtonian readout, wanted and available: obstruction_q16 */
constexpr uint32_t newtonian_obstruction = FIELDSTOP_NEWTONIAN_OBSTRUCTION;
/** Newtonian readout, wanted and available: beam_um */
constexpr uint32_t newtonian_beam = FIELDSTOP_NEWTONIAN_BEAM;
/** Newtonian readout, wanted and available: beam_shift_um */
constexpr uint32_t newtonian_beam_shift = FIELDSTOP_NEWTONIAN_BEAM_SHIFT;
/** Newtonian readout, wanted and available: edge_light_q16 */
constexpr uint32_t newtonian_edge_light = FIELDSTOP_NEWTONIAN_EDGE_LIGHT;
/** Newtonian readout, wanted and available: eyepiece_height_um */
constexpr uint32_t newtonian_eyepiece_height = FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT;
/** Newtonian readout, wanted and available: greatest_height_um */
constexpr uint32_t newtonian_greatest_height = FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT;
/** Newtonian readout, wanted: every member */
constexpr uint32_t newtonian_all = FIELDSTOP_NEWTONIAN_ALL;
/** Newtonian readout, fact: the diagonal in place is smaller than the field needs (geometry) */
constexpr uint32_t newtonian_fact_small_diagonal = FIELDSTOP_NEWTONIAN_FACT_SMALL_DIAGONAL;
/** Newtonian readout, fact: the diagonal is wider than the obstruction that the telescope tells (geometry) */
constexpr uint32_t newtonian_fact_wider_than_told = FIELDSTOP_NEWTONIAN_FACT_WIDER_THAN_TOLD;
/** Newtonian readout, fact: the eyepiece is above the height that the layout sets; show the caution */
constexpr uint32_t newtonian_fact_high_eyepiece = FIELDSTOP_NEWTONIAN_FACT_HIGH_EYEPIECE;
/** Newtonian readout, fact: within its altitudes it gets above that height; show the caution */
constexpr uint32_t newtonian_fact_high_reached = FIELDSTOP_NEWTONIAN_FACT_HIGH_REACHED;
/** Two mirror readout, wanted and available: secondary_magnification_q16 */
constexpr uint32_t two_mirror_secondary_magnification = FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION;
/** Two mirror readout, wanted and available: separation_um */
constexpr uint32_t two_mirror_separation = FIELDSTOP_TWO_MIRROR_SEPARATION;
/** Two mirror readout, wanted and available: secondary_um */
constexpr uint32_t two_mirror_secondary = FIELDSTOP_TWO_MIRROR_SECONDARY;
/** Two mirror readout, wanted and available: secondary_radius_um */
constexpr uint32_t two_mirror_secondary_radius = FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS;
/** Two mirror readout, wanted and available: obstruction_q16 */
constexpr uint32_t two_mirror_obstruction = FIELDSTOP_TWO_MIRROR_OBSTRUCTION;
/** Two mirror readout, wanted and available: length_um */
constexpr uint32_t two_mirror_length = FIELDSTOP_TWO_MIRROR_LENGTH;
/** Two mirror readout, wanted and available: length_share_q16 */
constexpr uint32_t two_mirror_length_share = FIELDSTOP_TWO_MIRROR_LENGTH_SHARE;
/** Two mirror readout, wanted: every member */
constexpr uint32_t two_mirror_all = FIELDSTOP_TWO_MIRROR_ALL;
/** Two mirror readout, fact: the secondary is wider than the obstruction that the telescope tells (geometry) */
constexpr uint32_t two_mirror_fact_wider_than_told = FIELDSTOP_TWO_MIRROR_FACT_WIDER_THAN_TOLD;
/** Kind of entry: telescopes, up to 4 in a record */
constexpr uint8_t kind_telescope = FIELDSTOP_KIND_TELESCOPE;
/** Kind of entry: eyepieces, up to 16 in a record */
constexpr uint8_t kind_eyepiece = FIELDSTOP_KIND_EYEPIECE;
/** Kind of entry: Barlows and reducers, up to 8 in a record */
constexpr uint8_t kind_amplifier = FIELDSTOP_KIND_AMPLIFIER;
/** Kind of entry: cameras, up to 4 in a record */
constexpr uint8_t kind_camera = FIELDSTOP_KIND_CAMERA;
/** Kind of entry: observers, up to 4 in a record */
constexpr uint8_t kind_observer = FIELDSTOP_KIND_OBSERVER;
/** Kind of entry: sites, up to 4 in a record */
constexpr uint8_t kind_site = FIELDSTOP_KIND_SITE;
/** In use: none of that kind */
constexpr uint8_t none_in_use = FIELDSTOP_NONE_IN_USE;
/** Bytes of a record without entries */
constexpr uint16_t record_least = FIELDSTOP_RECORD_LEAST;
/** Bytes of the longest record */
constexpr uint16_t record_most = FIELDSTOP_RECORD_MOST;
/** Saving: refuse where there is a good record of a newer version */
constexpr uint8_t keep_newer = FIELDSTOP_KEEP_NEWER;
/** Saving: save over a good record of a newer version */
constexpr uint8_t replace_newer = FIELDSTOP_REPLACE_NEWER;
/** Angle: decimal seconds under one minute, whole seconds under one degree, whole minutes from there on */
constexpr uint8_t angle_by_size = FIELDSTOP_ANGLE_BY_SIZE;
/** Angle: degrees with decimals */
constexpr uint8_t angle_decimal_degrees = FIELDSTOP_ANGLE_DECIMAL_DEGREES;
/** Angle: degrees and minutes */
constexpr uint8_t angle_degrees_minutes = FIELDSTOP_ANGLE_DEGREES_MINUTES;
/** Angle: minutes and seconds, with degrees in front from sixty minutes on */
constexpr uint8_t angle_minutes_seconds = FIELDSTOP_ANGLE_MINUTES_SECONDS;
/** Angle: seconds, however many */
constexpr uint8_t angle_decimal_seconds = FIELDSTOP_ANGLE_DECIMAL_SECONDS;
/** Unit: a plain number */
constexpr uint8_t unit_none = FIELDSTOP_UNIT_NONE;
/** Unit: between degrees and minutes of arc */
constexpr uint8_t unit_degree = FIELDSTOP_UNIT_DEGREE;
/** Unit: minutes of arc */
constexpr uint8_t unit_minute = FIELDSTOP_UNIT_MINUTE;
/** Unit: seconds of arc */
constexpr uint8_t unit_second = FIELDSTOP_UNIT_SECOND;
/** Unit: degrees with decimals */
constexpr uint8_t unit_decimal_degree = FIELDSTOP_UNIT_DECIMAL_DEGREE;
/** Unit: metres */
constexpr uint8_t unit_metre = FIELDSTOP_UNIT_METRE;
/** Unit: millimetres */
constexpr uint8_t unit_millimetre = FIELDSTOP_UNIT_MILLIMETRE;
/** Unit: micrometres */
constexpr uint8_t unit_micrometre = FIELDSTOP_UNIT_MICROMETRE;
/** Unit: nanometres */
constexpr uint8_t unit_nanometre = FIELDSTOP_UNIT_NANOMETRE;
/** Unit: magnification */
constexpr uint8_t unit_times = FIELDSTOP_UNIT_TIMES;
/** Unit: per hundred */
constexpr uint8_t unit_percent = FIELDSTOP_UNIT_PERCENT;
/** Unit: magnitudes */
constexpr uint8_t unit_magnitude = FIELDSTOP_UNIT_MAGNITUDE;
/** Unit: in front of a focal ratio */
constexpr uint8_t unit_focal_ratio = FIELDSTOP_UNIT_FOCAL_RATIO;
/** Unit: pixels */
constexpr uint8_t unit_pixel = FIELDSTOP_UNIT_PIXEL;
/** Unit: seconds of arc to a pixel */
constexpr uint8_t unit_second_per_pixel = FIELDSTOP_UNIT_SECOND_PER_PIXEL;
/** Unit: seconds of arc to a millimetre */
constexpr uint8_t unit_second_per_millimetre = FIELDSTOP_UNIT_SECOND_PER_MILLIMETRE;
/** Unit: seconds of arc in a second of time */
constexpr uint8_t unit_second_per_time = FIELDSTOP_UNIT_SECOND_PER_TIME;
/** Unit: cycles to a millimetre */
constexpr uint8_t unit_per_millimetre = FIELDSTOP_UNIT_PER_MILLIMETRE;
/** Unit: seconds of time */
constexpr uint8_t unit_time = FIELDSTOP_UNIT_TIME;
/** Unit: steps of a motor */
constexpr uint8_t unit_step = FIELDSTOP_UNIT_STEP;
/** Unit: kelvin */
constexpr uint8_t unit_kelvin = FIELDSTOP_UNIT_KELVIN;
/** Unit: watts */
constexpr uint8_t unit_watt = FIELDSTOP_UNIT_WATT;
/** Rows of the visual pages, and labels that they need */
constexpr uint8_t visual_rows = FIELDSTOP_VISUAL_ROWS;
/** Visual row: magnification */
constexpr uint8_t visual_row_magnification = FIELDSTOP_VISUAL_ROW_MAGNIFICATION;
/** Visual row: true field */
constexpr uint8_t visual_row_true_field = FIELDSTOP_VISUAL_ROW_TRUE_FIELD;
/** Visual row: exit pupil */
constexpr uint8_t visual_row_exit_pupil = FIELDSTOP_VISUAL_ROW_EXIT_PUPIL;
/** Visual row: resolution */
constexpr uint8_t visual_row_resolution = FIELDSTOP_VISUAL_ROW_RESOLUTION;
/** Visual row: faintest star */
constexpr uint8_t visual_row_faintest_star = FIELDSTOP_VISUAL_ROW_FAINTEST_STAR;
/** Visual row: surface brightness */
constexpr uint8_t visual_row_surface_brightness = FIELDSTOP_VISUAL_ROW_SURFACE_BRIGHTNESS;
/** Visual row: focal ratio */
constexpr uint8_t visual_row_focal_ratio = FIELDSTOP_VISUAL_ROW_FOCAL_RATIO;
/** Visual row: focal length */
constexpr uint8_t visual_row_focal_length = FIELDSTOP_VISUAL_ROW_FOCAL_LENGTH;
/** Visual row: lowest magnification */
constexpr uint8_t visual_row_lowest_magnification = FIELDSTOP_VISUAL_ROW_LOWEST_MAGNIFICATION;
/** Visual row: resolving magnification */
constexpr uint8_t visual_row_resolving_magnification = FIELDSTOP_VISUAL_ROW_RESOLVING_MAGNIFICATION;
/** Visual row: dawes limit */
constexpr uint8_t visual_row_dawes_limit = FIELDSTOP_VISUAL_ROW_DAWES_LIMIT;
/** Visual row: effective aperture */
constexpr uint8_t visual_row_effective_aperture = FIELDSTOP_VISUAL_ROW_EFFECTIVE_APERTURE;
/** Visual row: wide exit pupil */
constexpr uint8_t visual_row_wide_exit_pupil = FIELDSTOP_VISUAL_ROW_WIDE_EXIT_PUPIL;
/** Visual row: empty magnification */
constexpr uint8_t visual_row_empty_magnification = FIELDSTOP_VISUAL_ROW_EMPTY_MAGNIFICATION;
/** Visual row: field from apparent */
constexpr uint8_t visual_row_field_from_apparent = FIELDSTOP_VISUAL_ROW_FIELD_FROM_APPARENT;
/** Visual row: seeing limited */
constexpr uint8_t visual_row_seeing_limited = FIELDSTOP_VISUAL_ROW_SEEING_LIMITED;
/** Rows of the camera pages, and labels that they need */
constexpr uint8_t camera_rows = FIELDSTOP_CAMERA_ROWS;
/** Camera row: frame width */
constexpr uint8_t camera_row_frame_width = FIELDSTOP_CAMERA_ROW_FRAME_WIDTH;
/** Camera row: frame height */
constexpr uint8_t camera_row_frame_height = FIELDSTOP_CAMERA_ROW_FRAME_HEIGHT;
/** Camera row: pixel scale */
constexpr uint8_t camera_row_pixel_scale = FIELDSTOP_CAMERA_ROW_PIXEL_SCALE;
/** Camera row: star width */
constexpr uint8_t camera_row_star_width = FIELDSTOP_CAMERA_ROW_STAR_WIDTH;
/** Camera row: star pixels */
constexpr uint8_t camera_row_star_pixels = FIELDSTOP_CAMERA_ROW_STAR_PIXELS;
/** Camera row: focal ratio */
constexpr uint8_t camera_row_focal_ratio = FIELDSTOP_CAMERA_ROW_FOCAL_RATIO;
/** Camera row: t-number */
constexpr uint8_t camera_row_t_number = FIELDSTOP_CAMERA_ROW_T_NUMBER;
/** Camera row: focal length */
constexpr uint8_t camera_row_focal_length = FIELDSTOP_CAMERA_ROW_FOCAL_LENGTH;
/** Camera row: plate scale */
constexpr uint8_t camera_row_plate_scale = FIELDSTOP_CAMERA_ROW_PLATE_SCALE;
/** Camera row: diagonal */
constexpr uint8_t camera_row_diagonal = FIELDSTOP_CAMERA_ROW_DIAGONAL;
/** Camera row: cutoff */
constexpr uint8_t camera_row_cutoff = FIELDSTOP_CAMERA_ROW_CUTOFF;
/** Camera row: nyquist pixel */
constexpr uint8_t camera_row_nyquist_pixel = FIELDSTOP_CAMERA_ROW_NYQUIST_PIXEL;
/** Camera row: coarse sampling */
constexpr uint8_t camera_row_coarse_sampling = FIELDSTOP_CAMERA_ROW_COARSE_SAMPLING;
/** Camera row: fine sampling */
constexpr uint8_t camera_row_fine_sampling = FIELDSTOP_CAMERA_ROW_FINE_SAMPLING;
/** Caution: where a fact tells that the eyepiece is high */
constexpr uint8_t caution_high_eyepiece = FIELDSTOP_CAUTION_HIGH_EYEPIECE;
/** Caution: where the Sun may be near */
constexpr uint8_t caution_sun = FIELDSTOP_CAUTION_SUN;
/** Rows of the focus pages, and labels that they need */
constexpr uint8_t focus_rows = FIELDSTOP_FOCUS_ROWS;
/** Focus row: depth of focus */
constexpr uint8_t focus_row_depth_of_focus = FIELDSTOP_FOCUS_ROW_DEPTH_OF_FOCUS;
/** Focus row: depth steps */
constexpr uint8_t focus_row_depth_steps = FIELDSTOP_FOCUS_ROW_DEPTH_STEPS;
/** Focus row: temperature */
constexpr uint8_t focus_row_temperature = FIELDSTOP_FOCUS_ROW_TEMPERATURE;
/** Focus row: blur */
constexpr uint8_t focus_row_blur = FIELDSTOP_FOCUS_ROW_BLUR;
/** Focus row: blur angle */
constexpr uint8_t focus_row_blur_angle = FIELDSTOP_FOCUS_ROW_BLUR_ANGLE;
/** Focus row: wavefront */
constexpr uint8_t focus_row_wavefront = FIELDSTOP_FOCUS_ROW_WAVEFRONT;
/** Focus row: focal ratio */
constexpr uint8_t focus_row_focal_ratio = FIELDSTOP_FOCUS_ROW_FOCAL_RATIO;
/** Focus row: coarse step */
constexpr uint8_t focus_row_coarse_step = FIELDSTOP_FOCUS_ROW_COARSE_STEP;
/** Focus row: out of focus */
constexpr uint8_t focus_row_out_of_focus = FIELDSTOP_FOCUS_ROW_OUT_OF_FOCUS;
/** Rows of the pages of a Newtonian's layout, and labels that they need */
constexpr uint8_t newtonian_rows = FIELDSTOP_NEWTONIAN_ROWS;
/** Newtonian row: diagonal */
constexpr uint8_t newtonian_row_diagonal = FIELDSTOP_NEWTONIAN_ROW_DIAGONAL;
/** Newtonian row: diagonal offset */
constexpr uint8_t newtonian_row_diagonal_offset = FIELDSTOP_NEWTONIAN_ROW_DIAGONAL_OFFSET;
/** Newtonian row: obstruction */
constexpr uint8_t newtonian_row_obstruction = FIELDSTOP_NEWTONIAN_ROW_OBSTRUCTION;
/** Newtonian row: edge light */
constexpr uint8_t newtonian_row_edge_light = FIELDSTOP_NEWTONIAN_ROW_EDGE_LIGHT;
/** Newtonian row: eyepiece height */
constexpr uint8_t newtonian_row_eyepiece_height = FIELDSTOP_NEWTONIAN_ROW_EYEPIECE_HEIGHT;
/** Newtonian row: greatest height */
constexpr uint8_t newtonian_row_greatest_height = FIELDSTOP_NEWTONIAN_ROW_GREATEST_HEIGHT;
/** Newtonian row: beam */
constexpr uint8_t newtonian_row_beam = FIELDSTOP_NEWTONIAN_ROW_BEAM;
/** Newtonian row: beam shift */
constexpr uint8_t newtonian_row_beam_shift = FIELDSTOP_NEWTONIAN_ROW_BEAM_SHIFT;
/** Newtonian row: small diagonal */
constexpr uint8_t newtonian_row_small_diagonal = FIELDSTOP_NEWTONIAN_ROW_SMALL_DIAGONAL;
/** Newtonian row: wider than told */
constexpr uint8_t newtonian_row_wider_than_told = FIELDSTOP_NEWTONIAN_ROW_WIDER_THAN_TOLD;
/** Newtonian row: high eyepiece */
constexpr uint8_t newtonian_row_high_eyepiece = FIELDSTOP_NEWTONIAN_ROW_HIGH_EYEPIECE;
/** Newtonian row: high reached */
constexpr uint8_t newtonian_row_high_reached = FIELDSTOP_NEWTONIAN_ROW_HIGH_REACHED;
/** Rows of the pages of two mirrors' layout, and labels that they need */
constexpr uint8_t two_mirror_rows = FIELDSTOP_TWO_MIRROR_ROWS;
/** Two-mirror row: separation */
constexpr uint8_t two_mirror_row_separation = FIELDSTOP_TWO_MIRROR_ROW_SEPARATION;
/** Two-mirror row: secondary */
constexpr uint8_t two_mirror_row_secondary = FIELDSTOP_TWO_MIRROR_ROW_SECONDARY;
/** Two-mirror row: radius */
constexpr uint8_t two_mirror_row_radius = FIELDSTOP_TWO_MIRROR_ROW_RADIUS;
/** Two-mirror row: obstruction */
constexpr uint8_t two_mirror_row_obstruction = FIELDSTOP_TWO_MIRROR_ROW_OBSTRUCTION;
/** Two-mirror row: secondary magnification */
constexpr uint8_t two_mirror_row_secondary_magnification = FIELDSTOP_TWO_MIRROR_ROW_SECONDARY_MAGNIFICATION;
/** Two-mirror row: length */
constexpr uint8_t two_mirror_row_length = FIELDSTOP_TWO_MIRROR_ROW_LENGTH;
/** Two-mirror row: length share */
constexpr uint8_t two_mirror_row_length_share = FIELDSTOP_TWO_MIRROR_ROW_LENGTH_SHARE;
/** Two-mirror row: wider than told */
constexpr uint8_t two_mirror_row_wider_than_told = FIELDSTOP_TWO_MIRROR_ROW_WIDER_THAN_TOLD;
/** Entry: micrometres; a bare number is in mm; units m cm mm um nm in */
constexpr uint8_t entry_length = FIELDSTOP_ENTRY_LENGTH;
/** Entry: the same, and f/ in front of a focal ratio, which is multiplied by the aperture */
constexpr uint8_t entry_focal_length = FIELDSTOP_ENTRY_FOCAL_LENGTH;
/** Entry: nanometres; a bare number is in um; units as for a length */
constexpr uint8_t entry_pixel_pitch = FIELDSTOP_ENTRY_PIXEL_PITCH;
/** Entry: nanometres; a bare number is in nm; units as for a length */
constexpr uint8_t entry_wavelength = FIELDSTOP_ENTRY_WAVELENGTH;
/** Entry: milliarcseconds; a bare number is in degrees; units d deg, ' arcmin, " arcsec */
constexpr uint8_t entry_angle = FIELDSTOP_ENTRY_ANGLE;
/** Entry: microarcseconds; a bare number is in seconds of arc; units as for an angle */
constexpr uint8_t entry_small_angle = FIELDSTOP_ENTRY_SMALL_ANGLE;
/** Entry: Q16.16; no unit */
constexpr uint8_t entry_ratio = FIELDSTOP_ENTRY_RATIO;
/** Entry: Q16.16; f/ may stand in front */
constexpr uint8_t entry_focal_ratio = FIELDSTOP_ENTRY_FOCAL_RATIO;
/** Entry: Q16.16; x may stand behind */
constexpr uint8_t entry_magnification = FIELDSTOP_ENTRY_MAGNIFICATION;
/** Entry: Q16.16, 65536 for a hundred per cent; % may stand behind */
constexpr uint8_t entry_percent = FIELDSTOP_ENTRY_PERCENT;
/** Entry: millimagnitudes as int32_t; mag may stand behind */
constexpr uint8_t entry_magnitude = FIELDSTOP_ENTRY_MAGNITUDE;
/** Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees; a sign, or N or S behind */
constexpr uint8_t entry_latitude = FIELDSTOP_ENTRY_LATITUDE;
/** Entry: binary angle, positive east; under 360 degrees, or 180 at most with a sign, or E or W behind */
constexpr uint8_t entry_longitude = FIELDSTOP_ENTRY_LONGITUDE;
/** Entry: binary angle as int32_t, a quarter turn at most; a bare number is in degrees */
constexpr uint8_t entry_declination = FIELDSTOP_ENTRY_DECLINATION;
/** Entry: binary angle under a turn; a bare number is in hours; units h m s, or those of an angle */
constexpr uint8_t entry_right_ascension = FIELDSTOP_ENTRY_RIGHT_ASCENSION;
/** Entry: milliseconds of a day, under 86400000; a bare number is in hours; units h m s */
constexpr uint8_t entry_time_of_day = FIELDSTOP_ENTRY_TIME_OF_DAY;
/** Entry: milliseconds; a bare number is in seconds; units h m s */
constexpr uint8_t entry_duration = FIELDSTOP_ENTRY_DURATION;
/** Entry: an integer; px or steps may stand behind */
constexpr uint8_t entry_count = FIELDSTOP_ENTRY_COUNT;
/** State of an entry: it gives a quantity */
constexpr uint8_t entry_complete = FIELDSTOP_ENTRY_COMPLETE;
/** State of an entry: it gives none yet; more characters can make it right */
constexpr uint8_t entry_partial = FIELDSTOP_ENTRY_PARTIAL;
/** State of an entry: it gives none, whatever follows */
constexpr uint8_t entry_wrong = FIELDSTOP_ENTRY_WRONG;
/** Reason: none, for it is complete */
constexpr uint8_t entry_fine = FIELDSTOP_ENTRY_FINE;
/** Reason: it ends where more must come */
constexpr uint8_t entry_ended = FIELDSTOP_ENTRY_ENDED;
/** Reason: no entry has this byte here */
constexpr uint8_t entry_unexpected = FIELDSTOP_ENTRY_UNEXPECTED;
/** Reason: the quantity is outside its range */
constexpr uint8_t entry_too_large = FIELDSTOP_ENTRY_TOO_LARGE;
/** Reason: minutes or seconds of 60 or more behind a greater unit */
constexpr uint8_t entry_sixty = FIELDSTOP_ENTRY_SIXTY;
/** Reason: a focal ratio where the aperture is not known */
constexpr uint8_t entry_no_aperture = FIELDSTOP_ENTRY_NO_APERTURE;

/** A telescope: objective or primary mirror, with the Barlow or reducer that is in use */
class telescope;
template <> struct given_as<telescope> {
    typedef const telescope &type;
};
class telescope {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr telescope() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit telescope(const ::fieldstop_telescope &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_telescope &c() const { return raw_; }
    /** Diameter of the entrance pupil, micrometres; not 0 */
    FIELDSTOP_INLINE constexpr micrometres aperture() const { return micrometres(raw_.aperture_um); }
    FIELDSTOP_INLINE constexpr telescope with_aperture(micrometres aperture_um) const
    {
        return telescope(::fieldstop_telescope{aperture_um.count(), raw_.focal_length_um, raw_.obstruction_um, raw_.amplification_q16, raw_.throughput_q16});
    }
    /** Focal length without Barlow or reducer, micrometres; not 0 */
    FIELDSTOP_INLINE constexpr micrometres focal_length() const { return micrometres(raw_.focal_length_um); }
    FIELDSTOP_INLINE constexpr telescope with_focal_length(micrometres focal_length_um) const
    {
        return telescope(::fieldstop_telescope{raw_.aperture_um, focal_length_um.count(), raw_.obstruction_um, raw_.amplification_q16, raw_.throughput_q16});
    }
    /** Diameter of the central obstruction, micrometres, under the aperture; 0: none */
    FIELDSTOP_INLINE constexpr micrometres obstruction() const { return micrometres(raw_.obstruction_um); }
    FIELDSTOP_INLINE constexpr telescope with_obstruction(micrometres obstruction_um) const
    {
        return telescope(::fieldstop_telescope{raw_.aperture_um, raw_.focal_length_um, obstruction_um.count(), raw_.amplification_q16, raw_.throughput_q16});
    }
    /** What a Barlow (over 1) or reducer (under 1) multiplies the focal length by, unsigned Q16.16; 65536 where there is none; not 0 */
    FIELDSTOP_INLINE constexpr q16 amplification() const { return q16(raw_.amplification_q16); }
    FIELDSTOP_INLINE constexpr telescope with_amplification(q16 amplification_q16) const
    {
        return telescope(::fieldstop_telescope{raw_.aperture_um, raw_.focal_length_um, raw_.obstruction_um, amplification_q16.count(), raw_.throughput_q16});
    }
    /** Share of the light that mirrors and glass pass on, without the obstruction's loss, unsigned Q16.16, at most 65536; 0: unknown */
    FIELDSTOP_INLINE constexpr q16 throughput() const { return q16(raw_.throughput_q16); }
    FIELDSTOP_INLINE constexpr telescope with_throughput(q16 throughput_q16) const
    {
        return telescope(::fieldstop_telescope{raw_.aperture_um, raw_.focal_length_um, raw_.obstruction_um, raw_.amplification_q16, throughput_q16.count()});
    }

private:
    friend struct access;
    friend class result<telescope>;
    FIELDSTOP_INLINE explicit telescope(const access &) {}
    ::fieldstop_telescope raw_;
};
static_assert(sizeof(telescope) == sizeof(::fieldstop_telescope), "no more than in C");

/** An eyepiece */
class eyepiece;
template <> struct given_as<eyepiece> {
    typedef const eyepiece &type;
};
class eyepiece {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr eyepiece() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit eyepiece(const ::fieldstop_eyepiece &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_eyepiece &c() const { return raw_; }
    /** Focal length, micrometres; not 0 */
    FIELDSTOP_INLINE constexpr micrometres focal_length() const { return micrometres(raw_.focal_length_um); }
    FIELDSTOP_INLINE constexpr eyepiece with_focal_length(micrometres focal_length_um) const
    {
        return eyepiece(::fieldstop_eyepiece{focal_length_um.count(), raw_.field_stop_um, raw_.apparent_field_mas, raw_.mapping, {0, 0, 0}});
    }
    /** Diameter of the field stop as the telescope sees it (the effective one where lenses stand before it), micrometres; 0: unknown */
    FIELDSTOP_INLINE constexpr micrometres field_stop() const { return micrometres(raw_.field_stop_um); }
    FIELDSTOP_INLINE constexpr eyepiece with_field_stop(micrometres field_stop_um) const
    {
        return eyepiece(::fieldstop_eyepiece{raw_.focal_length_um, field_stop_um.count(), raw_.apparent_field_mas, raw_.mapping, {0, 0, 0}});
    }
    /** Apparent field, milliarcseconds, under 180 degrees (648,000,000); 0: unknown */
    FIELDSTOP_INLINE constexpr milliarcseconds apparent_field() const { return milliarcseconds(raw_.apparent_field_mas); }
    FIELDSTOP_INLINE constexpr eyepiece with_apparent_field(milliarcseconds apparent_field_mas) const
    {
        return eyepiece(::fieldstop_eyepiece{raw_.focal_length_um, raw_.field_stop_um, apparent_field_mas.count(), raw_.mapping, {0, 0, 0}});
    }
    /** How angles at the eye grow with the angle on the sky: 0 equidistant, 1 rectilinear (named constants) */
    FIELDSTOP_INLINE constexpr uint8_t mapping() const { return uint8_t(raw_.mapping); }
    FIELDSTOP_INLINE constexpr eyepiece with_mapping(uint8_t mapping) const
    {
        return eyepiece(::fieldstop_eyepiece{raw_.focal_length_um, raw_.field_stop_um, raw_.apparent_field_mas, mapping, {0, 0, 0}});
    }

private:
    friend struct access;
    friend class result<eyepiece>;
    FIELDSTOP_INLINE explicit eyepiece(const access &) {}
    ::fieldstop_eyepiece raw_;
};
static_assert(sizeof(eyepiece) == sizeof(::fieldstop_eyepiece), "no more than in C");

/** A camera at the focus */
class camera;
template <> struct given_as<camera> {
    typedef const camera &type;
};
class camera {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr camera() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit camera(const ::fieldstop_camera &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_camera &c() const { return raw_; }
    /** Pitch of the single pixels, without binning, nanometres; not 0 */
    FIELDSTOP_INLINE constexpr nanometres pixel() const { return nanometres(raw_.pixel_nm); }
    FIELDSTOP_INLINE constexpr camera with_pixel(nanometres pixel_nm) const
    {
        return camera(::fieldstop_camera{pixel_nm.count(), raw_.columns, raw_.rows, raw_.binning, {0, 0, 0}});
    }
    /** Single pixels across the frame's width; not 0 */
    FIELDSTOP_INLINE constexpr uint16_t columns() const { return uint16_t(raw_.columns); }
    FIELDSTOP_INLINE constexpr camera with_columns(uint16_t columns) const
    {
        return camera(::fieldstop_camera{raw_.pixel_nm, columns, raw_.rows, raw_.binning, {0, 0, 0}});
    }
    /** Single pixels across the frame's height; not 0 */
    FIELDSTOP_INLINE constexpr uint16_t rows() const { return uint16_t(raw_.rows); }
    FIELDSTOP_INLINE constexpr camera with_rows(uint16_t rows) const
    {
        return camera(::fieldstop_camera{raw_.pixel_nm, raw_.columns, rows, raw_.binning, {0, 0, 0}});
    }
    /** Pixels read out as one, along each side; 1 where they are read singly; not 0, not over the columns or the rows */
    FIELDSTOP_INLINE constexpr uint8_t binning() const { return uint8_t(raw_.binning); }
    FIELDSTOP_INLINE constexpr camera with_binning(uint8_t binning) const
    {
        return camera(::fieldstop_camera{raw_.pixel_nm, raw_.columns, raw_.rows, binning, {0, 0, 0}});
    }

private:
    friend struct access;
    friend class result<camera>;
    FIELDSTOP_INLINE explicit camera(const access &) {}
    ::fieldstop_camera raw_;
};
static_assert(sizeof(camera) == sizeof(::fieldstop_camera), "no more than in C");

/** An eye and the night that it observes in */
class observer;
template <> struct given_as<observer> {
    typedef const observer &type;
};
class observer {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr observer() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit observer(const ::fieldstop_observer &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_observer &c() const { return raw_; }
    /** Faintest star that the bare eye sees here tonight, millimagnitudes; any value, 0 is magnitude 0 */
    FIELDSTOP_INLINE constexpr millimagnitudes naked_eye() const { return millimagnitudes(raw_.naked_eye_mmag); }
    FIELDSTOP_INLINE constexpr observer with_naked_eye(millimagnitudes naked_eye_mmag) const
    {
        return observer(::fieldstop_observer{naked_eye_mmag.count(), raw_.eye_pupil_um, raw_.eye_resolution_mas, raw_.seeing_uas, raw_.wavelength_nm});
    }
    /** Diameter of the eye's pupil in the dark, micrometres; 0: unknown */
    FIELDSTOP_INLINE constexpr micrometres eye_pupil() const { return micrometres(raw_.eye_pupil_um); }
    FIELDSTOP_INLINE constexpr observer with_eye_pupil(micrometres eye_pupil_um) const
    {
        return observer(::fieldstop_observer{raw_.naked_eye_mmag, eye_pupil_um.count(), raw_.eye_resolution_mas, raw_.seeing_uas, raw_.wavelength_nm});
    }
    /** Smallest angle that the eye parts, milliarcseconds; 0: unknown */
    FIELDSTOP_INLINE constexpr milliarcseconds eye_resolution() const { return milliarcseconds(raw_.eye_resolution_mas); }
    FIELDSTOP_INLINE constexpr observer with_eye_resolution(milliarcseconds eye_resolution_mas) const
    {
        return observer(::fieldstop_observer{raw_.naked_eye_mmag, raw_.eye_pupil_um, eye_resolution_mas.count(), raw_.seeing_uas, raw_.wavelength_nm});
    }
    /** Full width at half maximum of a star in a long exposure, by the air alone, microarcseconds; 0: unknown */
    FIELDSTOP_INLINE constexpr microarcseconds seeing() const { return microarcseconds(raw_.seeing_uas); }
    FIELDSTOP_INLINE constexpr observer with_seeing(microarcseconds seeing_uas) const
    {
        return observer(::fieldstop_observer{raw_.naked_eye_mmag, raw_.eye_pupil_um, raw_.eye_resolution_mas, seeing_uas.count(), raw_.wavelength_nm});
    }
    /** Wavelength that resolution is stated for, nanometres; not 0 */
    FIELDSTOP_INLINE constexpr nanometres wavelength() const { return nanometres(raw_.wavelength_nm); }
    FIELDSTOP_INLINE constexpr observer with_wavelength(nanometres wavelength_nm) const
    {
        return observer(::fieldstop_observer{raw_.naked_eye_mmag, raw_.eye_pupil_um, raw_.eye_resolution_mas, raw_.seeing_uas, wavelength_nm.count()});
    }

private:
    friend struct access;
    friend class result<observer>;
    FIELDSTOP_INLINE explicit observer(const access &) {}
    ::fieldstop_observer raw_;
};
static_assert(sizeof(observer) == sizeof(::fieldstop_observer), "no more than in C");

/** A place to observe from */
class site;
template <> struct given_as<site> {
    typedef const site &type;
};
class site {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr site() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit site(const ::fieldstop_site &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_site &c() const { return raw_; }
    /** Latitude, north positive, binary angle; within a quarter turn (2^30) either way */
    FIELDSTOP_INLINE constexpr signed_binary_angle latitude() const { return signed_binary_angle(raw_.latitude_bam); }
    FIELDSTOP_INLINE constexpr site with_latitude(signed_binary_angle latitude_bam) const
    {
        return site(::fieldstop_site{latitude_bam.count(), raw_.longitude_bam});
    }
    /** Longitude, counted toward the east, binary angle; any value */
    FIELDSTOP_INLINE constexpr binary_angle longitude() const { return binary_angle(raw_.longitude_bam); }
    FIELDSTOP_INLINE constexpr site with_longitude(binary_angle longitude_bam) const
    {
        return site(::fieldstop_site{raw_.latitude_bam, longitude_bam.count()});
    }

private:
    friend struct access;
    friend class result<site>;
    FIELDSTOP_INLINE explicit site(const access &) {}
    ::fieldstop_site raw_;
};
static_assert(sizeof(site) == sizeof(::fieldstop_site), "no more than in C");

/** What the eye gets at the eyepiece */
class visual_readout;
template <> struct given_as<visual_readout> {
    typedef const visual_readout &type;
};
class visual_readout {
public:
    FIELDSTOP_INLINE constexpr explicit visual_readout(const ::fieldstop_visual_readout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_visual_readout &c() const { return raw_; }
    /** Bits of the members that were wanted and could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** What is worth telling beside the values; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Focal length with the Barlow or reducer, micrometres: f k */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> focal_length() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_FOCAL_LENGTH) != 0 ? result<micrometres>(micrometres(raw_.focal_length_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Focal ratio with the Barlow or reducer: N = f k / D */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> focal_ratio() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_FOCAL_RATIO) != 0 ? result<q16>(q16(raw_.focal_ratio_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Magnification: M = f k / fe */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> magnification() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_MAGNIFICATION) != 0 ? result<q16>(q16(raw_.magnification_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Exit pupil, micrometres: D fe / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> exit_pupil() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_EXIT_PUPIL) != 0 ? result<micrometres>(micrometres(raw_.exit_pupil_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Diameter of the sky in view, milliarcseconds: from the field stop where that is known, otherwise from the apparent field by the eyepiece's mapping */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> true_field() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_TRUE_FIELD) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.true_field_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Rayleigh limit with the central obstruction, microarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> resolution() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_RESOLUTION) != 0 ? result<microarcseconds>(microarcseconds(raw_.resolution_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Dawes limit, microarcseconds: 116 arcsec mm / D */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> dawes_limit() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_DAWES_LIMIT) != 0 ? result<microarcseconds>(microarcseconds(raw_.dawes_limit_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Magnification at which the exit pupil fills the eye's pupil: D / p */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> lowest_magnification() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_LOWEST_MAGNIFICATION) != 0 ? result<q16>(q16(raw_.lowest_magnification_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Magnification at which the resolution limit reaches the smallest angle that this eye parts: eye resolution / resolution */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> resolving_magnification() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_RESOLVING_MAGNIFICATION) != 0 ? result<q16>(q16(raw_.resolving_magnification_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Unobstructed, loss-free aperture that gathers as much light, micrometres: Deff = D sqrt((1 - (d/D)^2) T) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> effective_aperture() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_EFFECTIVE_APERTURE) != 0 ? result<micrometres>(micrometres(raw_.effective_aperture_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Faintest star through the eyepiece, millimagnitudes: m0 + 5 log10(Deff / p) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<millimagnitudes> limiting_magnitude() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_LIMITING_MAGNITUDE) != 0 ? result<millimagnitudes>(millimagnitudes(raw_.limiting_magnitude_mmag)) : result<millimagnitudes>(status(FIELDSTOP_UNDEFINED));
    }
    /** Brightness of an extended object against the bare eye's view of it: T (min(1, (x/p)^2) - min(1, (s/p)^2)), x the exit pupil and s the obstruction's shadow within it, d fe / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> surface_brightness() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_SURFACE_BRIGHTNESS) != 0 ? result<q16>(q16(raw_.surface_brightness_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }

private:
    visual_readout() = default;
    friend struct access;
    friend class result<visual_readout>;
    FIELDSTOP_INLINE explicit visual_readout(const access &) {}
    ::fieldstop_visual_readout raw_;
};
static_assert(sizeof(visual_readout) == sizeof(::fieldstop_visual_readout), "no more than in C");

/** What a camera gets at the focus */
class camera_readout;
template <> struct given_as<camera_readout> {
    typedef const camera_readout &type;
};
class camera_readout {
public:
    FIELDSTOP_INLINE constexpr explicit camera_readout(const ::fieldstop_camera_readout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_camera_readout &c() const { return raw_; }
    /** Bits of the members that were wanted and could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** What is worth telling beside the values; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Focal length with the Barlow or reducer, micrometres: f k */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> focal_length() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_FOCAL_LENGTH) != 0 ? result<micrometres>(micrometres(raw_.focal_length_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Focal ratio with the Barlow or reducer: N = f k / D */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> focal_ratio() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_FOCAL_RATIO) != 0 ? result<q16>(q16(raw_.focal_ratio_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Focal ratio of a loss-free, unobstructed telescope that exposes as long: f k / Deff = N / sqrt((1 - (d/D)^2) T) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> t_number() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_T_NUMBER) != 0 ? result<q16>(q16(raw_.t_number_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky across the frame's columns, milliarcseconds: 2 atan(p n / (2 f k)); binning does not change it */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> frame_width() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_FRAME_WIDTH) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.frame_width_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky across the frame's rows, milliarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> frame_height() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_FRAME_HEIGHT) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.frame_height_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky to one pixel as read out, with binning, microarcseconds: (1 rad) p b / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> pixel_scale() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_PIXEL_SCALE) != 0 ? result<microarcseconds>(microarcseconds(raw_.pixel_scale_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky to one millimetre at the focus, milliarcseconds per millimetre: (1 rad) / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds_per_millimetre> plate_scale() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_PLATE_SCALE) != 0 ? result<milliarcseconds_per_millimetre>(milliarcseconds_per_millimetre(raw_.plate_scale_mas_per_mm)) : result<milliarcseconds_per_millimetre>(status(FIELDSTOP_UNDEFINED));
    }
    /** Full width at half maximum of a star's image, microarcseconds: seeing and diffraction as the root of the sum of squares */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> star_fwhm() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_STAR_FWHM) != 0 ? result<microarcseconds>(microarcseconds(raw_.star_fwhm_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Pixels as read out across that width */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> pixels_per_fwhm() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_PIXELS_PER_FWHM) != 0 ? result<q16>(q16(raw_.pixels_per_fwhm_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Finest detail that the optics pass at all, cycles per millimetre at the focus: 1 / (lambda N) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> cutoff_frequency() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_CUTOFF_FREQUENCY) != 0 ? result<q16>(q16(raw_.cutoff_frequency_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** The coarsest pixel that loses nothing of it in still air, nanometres: lambda f k / (2 D) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<nanometres> nyquist_pixel() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_NYQUIST_PIXEL) != 0 ? result<nanometres>(nanometres(raw_.nyquist_pixel_nm)) : result<nanometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky from corner to corner of the frame, milliarcseconds: 2 atan(p sqrt(c^2 + r^2) / (2 f k)) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> diagonal() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_DIAGONAL) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.diagonal_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }

private:
    camera_readout() = default;
    friend struct access;
    friend class result<camera_readout>;
    FIELDSTOP_INLINE explicit camera_readout(const access &) {}
    ::fieldstop_camera_readout raw_;
};
static_assert(sizeof(camera_readout) == sizeof(::fieldstop_camera_readout), "no more than in C");

/** What an eyepiece is wanted for */
class visual_target;
template <> struct given_as<visual_target> {
    typedef const visual_target &type;
};
class visual_target {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr visual_target() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit visual_target(const ::fieldstop_visual_target &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_visual_target &c() const { return raw_; }
    /** To frame: the target's longer side, milliarcseconds; not 0 */
    FIELDSTOP_INLINE constexpr milliarcseconds size() const { return milliarcseconds(raw_.size_mas); }
    FIELDSTOP_INLINE constexpr visual_target with_size(milliarcseconds size_mas) const
    {
        return visual_target(::fieldstop_visual_target{size_mas.count(), raw_.room_q16, raw_.separation_uas, raw_.exit_pupil_um, raw_.purpose, {0, 0, 0}});
    }
    /** To frame: the true field over the target's size that is wanted at least, unsigned Q16.16; not under 65536 */
    FIELDSTOP_INLINE constexpr q16 room() const { return q16(raw_.room_q16); }
    FIELDSTOP_INLINE constexpr visual_target with_room(q16 room_q16) const
    {
        return visual_target(::fieldstop_visual_target{raw_.size_mas, room_q16.count(), raw_.separation_uas, raw_.exit_pupil_um, raw_.purpose, {0, 0, 0}});
    }
    /** To split: the separation of the two stars, microarcseconds; not 0 */
    FIELDSTOP_INLINE constexpr microarcseconds separation() const { return microarcseconds(raw_.separation_uas); }
    FIELDSTOP_INLINE constexpr visual_target with_separation(microarcseconds separation_uas) const
    {
        return visual_target(::fieldstop_visual_target{raw_.size_mas, raw_.room_q16, separation_uas.count(), raw_.exit_pupil_um, raw_.purpose, {0, 0, 0}});
    }
    /** For an exit pupil: the one wanted, micrometres; not 0 */
    FIELDSTOP_INLINE constexpr micrometres exit_pupil() const { return micrometres(raw_.exit_pupil_um); }
    FIELDSTOP_INLINE constexpr visual_target with_exit_pupil(micrometres exit_pupil_um) const
    {
        return visual_target(::fieldstop_visual_target{raw_.size_mas, raw_.room_q16, raw_.separation_uas, exit_pupil_um.count(), raw_.purpose, {0, 0, 0}});
    }
    /** What it is: 0 to frame, 1 to split, 2 for an exit pupil (named constants) */
    FIELDSTOP_INLINE constexpr uint8_t purpose() const { return uint8_t(raw_.purpose); }
    FIELDSTOP_INLINE constexpr visual_target with_purpose(uint8_t purpose) const
    {
        return visual_target(::fieldstop_visual_target{raw_.size_mas, raw_.room_q16, raw_.separation_uas, raw_.exit_pupil_um, purpose, {0, 0, 0}});
    }

private:
    friend struct access;
    friend class result<visual_target>;
    FIELDSTOP_INLINE explicit visual_target(const access &) {}
    ::fieldstop_visual_target raw_;
};
static_assert(sizeof(visual_target) == sizeof(::fieldstop_visual_target), "no more than in C");

/** An eyepiece, alone or with a Barlow or reducer, and what speaks for and against it */
class visual_choice;
template <> struct given_as<visual_choice> {
    typedef const visual_choice &type;
};
class visual_choice {
public:
    FIELDSTOP_INLINE constexpr explicit visual_choice(const ::fieldstop_visual_choice &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_visual_choice &c() const { return raw_; }
    /** Bits of the members that could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** Why it stands where it stands; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Magnification: M = f k / fe */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> magnification() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_CHOICE_MAGNIFICATION) != 0 ? result<q16>(q16(raw_.magnification_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Exit pupil, micrometres: D fe / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> exit_pupil() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_CHOICE_EXIT_PUPIL) != 0 ? result<micrometres>(micrometres(raw_.exit_pupil_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Diameter of the sky in view, milliarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> true_field() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_CHOICE_TRUE_FIELD) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.true_field_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** What it gives over what is wanted */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> fit() const
    {
        return (raw_.available & FIELDSTOP_VISUAL_CHOICE_FIT) != 0 ? result<q16>(q16(raw_.fit_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Place of the eyepiece in the list, counted from 0 */
    FIELDSTOP_INLINE constexpr uint8_t eyepiece() const { return raw_.eyepiece; }
    /** Place of the Barlow or reducer in the list, counted from 0; 255: none */
    FIELDSTOP_INLINE constexpr uint8_t amplifier() const { return raw_.amplifier; }
    /** 0: it serves, and nothing speaks against it; 1: it serves, but its exit pupil is wide, its magnification empty or the seeing shows; 2: it does not serve; 3: not known */
    FIELDSTOP_INLINE constexpr uint8_t standing() const { return raw_.standing; }

private:
    visual_choice() = default;
    friend struct access;
    friend class result<visual_choice>;
    FIELDSTOP_INLINE explicit visual_choice(const access &) {}
    ::fieldstop_visual_choice raw_;
};
static_assert(sizeof(visual_choice) == sizeof(::fieldstop_visual_choice), "no more than in C");

/** What a camera is to take */
class camera_target;
template <> struct given_as<camera_target> {
    typedef const camera_target &type;
};
class camera_target {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr camera_target() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit camera_target(const ::fieldstop_camera_target &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_camera_target &c() const { return raw_; }
    /** The target's extent along the frame's columns, its width, milliarcseconds; not 0 */
    FIELDSTOP_INLINE constexpr milliarcseconds width() const { return milliarcseconds(raw_.width_mas); }
    FIELDSTOP_INLINE constexpr camera_target with_width(milliarcseconds width_mas) const
    {
        return camera_target(::fieldstop_camera_target{width_mas.count(), raw_.height_mas, raw_.overlap_q16});
    }
    /** Its extent along the frame's height, milliarcseconds; not 0 */
    FIELDSTOP_INLINE constexpr milliarcseconds height() const { return milliarcseconds(raw_.height_mas); }
    FIELDSTOP_INLINE constexpr camera_target with_height(milliarcseconds height_mas) const
    {
        return camera_target(::fieldstop_camera_target{raw_.width_mas, height_mas.count(), raw_.overlap_q16});
    }
    /** Share of a frame that the next one takes again where it needs more than one, unsigned Q16.16, under 65536; 0: none */
    FIELDSTOP_INLINE constexpr q16 overlap() const { return q16(raw_.overlap_q16); }
    FIELDSTOP_INLINE constexpr camera_target with_overlap(q16 overlap_q16) const
    {
        return camera_target(::fieldstop_camera_target{raw_.width_mas, raw_.height_mas, overlap_q16.count()});
    }

private:
    friend struct access;
    friend class result<camera_target>;
    FIELDSTOP_INLINE explicit camera_target(const access &) {}
    ::fieldstop_camera_target raw_;
};
static_assert(sizeof(camera_target) == sizeof(::fieldstop_camera_target), "no more than in C");

/** A camera, alone or with a Barlow or reducer, and what it takes to get the whole target */
class camera_choice;
template <> struct given_as<camera_choice> {
    typedef const camera_choice &type;
};
class camera_choice {
public:
    FIELDSTOP_INLINE constexpr explicit camera_choice(const ::fieldstop_camera_choice &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_camera_choice &c() const { return raw_; }
    /** Bits of the members that could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** Why it stands where it stands; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Sky across the frame's columns, milliarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> frame_width() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_CHOICE_FRAME_WIDTH) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.frame_width_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky across the frame's rows, milliarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<milliarcseconds> frame_height() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_CHOICE_FRAME_HEIGHT) != 0 ? result<milliarcseconds>(milliarcseconds(raw_.frame_height_mas)) : result<milliarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Sky to one pixel as read out, microarcseconds */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> pixel_scale() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_CHOICE_PIXEL_SCALE) != 0 ? result<microarcseconds>(microarcseconds(raw_.pixel_scale_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Pixels as read out across a star's image */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> pixels_per_fwhm() const
    {
        return (raw_.available & FIELDSTOP_CAMERA_CHOICE_PIXELS_PER_FWHM) != 0 ? result<q16>(q16(raw_.pixels_per_fwhm_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Frames beside each other that the target's width takes */
    FIELDSTOP_INLINE constexpr uint32_t tiles_wide() const { return raw_.tiles_wide; }
    /** Frames above each other that its height takes */
    FIELDSTOP_INLINE constexpr uint32_t tiles_high() const { return raw_.tiles_high; }
    /** Place of the camera in the list, counted from 0 */
    FIELDSTOP_INLINE constexpr uint8_t camera() const { return raw_.camera; }
    /** Place of the Barlow or reducer in the list, counted from 0; 255: none */
    FIELDSTOP_INLINE constexpr uint8_t amplifier() const { return raw_.amplifier; }

private:
    camera_choice() = default;
    friend struct access;
    friend class result<camera_choice>;
    FIELDSTOP_INLINE explicit camera_choice(const access &) {}
    ::fieldstop_camera_choice raw_;
};
static_assert(sizeof(camera_choice) == sizeof(::fieldstop_camera_choice), "no more than in C");

/** Where things are in a Newtonian telescope, and how it stands */
class newtonian_layout;
template <> struct given_as<newtonian_layout> {
    typedef const newtonian_layout &type;
};
class newtonian_layout {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr newtonian_layout() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit newtonian_layout(const ::fieldstop_newtonian_layout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_newtonian_layout &c() const { return raw_; }
    /** From the centre of the diagonal to the focus, micrometres; not over the telescope's focal length, or what rests on it is not available */
    FIELDSTOP_INLINE constexpr micrometres focus_distance() const { return micrometres(raw_.focus_distance_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_focus_distance(micrometres focus_distance_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{focus_distance_um.count(), raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only */
    FIELDSTOP_INLINE constexpr micrometres lit_field() const { return micrometres(raw_.lit_field_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_lit_field(micrometres lit_field_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, lit_field_um.count(), raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** How far from the axis the edge of the field is whose light is asked for, micrometres */
    FIELDSTOP_INLINE constexpr micrometres edge_offset() const { return micrometres(raw_.edge_offset_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_edge_offset(micrometres edge_offset_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, edge_offset_um.count(), raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** Minor axis of the diagonal that is in place, micrometres; 0: as large as it must be */
    FIELDSTOP_INLINE constexpr micrometres diagonal() const { return micrometres(raw_.diagonal_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_diagonal(micrometres diagonal_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, diagonal_um.count(), raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** The altitude axis above the place where the observer stands, micrometres */
    FIELDSTOP_INLINE constexpr micrometres axis_height() const { return micrometres(raw_.axis_height_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_axis_height(micrometres axis_height_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, axis_height_um.count(), raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** From the altitude axis to the eyepiece along the tube, micrometres; negative where the eyepiece is at the lower end */
    FIELDSTOP_INLINE constexpr signed_micrometres reach() const { return signed_micrometres(raw_.reach_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_reach(signed_micrometres reach_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, reach_um.count(), raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** Where the telescope points now, binary angle from 0 to 90 degrees (0x40000000) */
    FIELDSTOP_INLINE constexpr signed_binary_angle altitude() const { return signed_binary_angle(raw_.altitude_bam); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_altitude(signed_binary_angle altitude_bam) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, altitude_bam.count(), raw_.lowest_altitude_bam, raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** The lowest altitude that it points to, from 0 to 90 degrees */
    FIELDSTOP_INLINE constexpr signed_binary_angle lowest_altitude() const { return signed_binary_angle(raw_.lowest_altitude_bam); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_lowest_altitude(signed_binary_angle lowest_altitude_bam) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, lowest_altitude_bam.count(), raw_.highest_altitude_bam, raw_.height_limit_um});
    }
    /** The highest, from 0 to 90 degrees, not under the lowest */
    FIELDSTOP_INLINE constexpr signed_binary_angle highest_altitude() const { return signed_binary_angle(raw_.highest_altitude_bam); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_highest_altitude(signed_binary_angle highest_altitude_bam) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, highest_altitude_bam.count(), raw_.height_limit_um});
    }
    /** An eyepiece above this height is told as a fact, micrometres; 0: none is */
    FIELDSTOP_INLINE constexpr micrometres height_limit() const { return micrometres(raw_.height_limit_um); }
    FIELDSTOP_INLINE constexpr newtonian_layout with_height_limit(micrometres height_limit_um) const
    {
        return newtonian_layout(::fieldstop_newtonian_layout{raw_.focus_distance_um, raw_.lit_field_um, raw_.edge_offset_um, raw_.diagonal_um, raw_.axis_height_um, raw_.reach_um, raw_.altitude_bam, raw_.lowest_altitude_bam, raw_.highest_altitude_bam, height_limit_um.count()});
    }

private:
    friend struct access;
    friend class result<newtonian_layout>;
    FIELDSTOP_INLINE explicit newtonian_layout(const access &) {}
    ::fieldstop_newtonian_layout raw_;
};
static_assert(sizeof(newtonian_layout) == sizeof(::fieldstop_newtonian_layout), "no more than in C");

/** What a telescope of two mirrors with a convex secondary is made of */
class two_mirror_layout;
template <> struct given_as<two_mirror_layout> {
    typedef const two_mirror_layout &type;
};
class two_mirror_layout {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr two_mirror_layout() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit two_mirror_layout(const ::fieldstop_two_mirror_layout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_two_mirror_layout &c() const { return raw_; }
    /** Focal length of the primary mirror, micrometres; not 0 */
    FIELDSTOP_INLINE constexpr micrometres primary_focal() const { return micrometres(raw_.primary_focal_um); }
    FIELDSTOP_INLINE constexpr two_mirror_layout with_primary_focal(micrometres primary_focal_um) const
    {
        return two_mirror_layout(::fieldstop_two_mirror_layout{primary_focal_um.count(), raw_.back_focus_um, raw_.lit_field_um});
    }
    /** The focus behind the primary's vertex, micrometres */
    FIELDSTOP_INLINE constexpr micrometres back_focus() const { return micrometres(raw_.back_focus_um); }
    FIELDSTOP_INLINE constexpr two_mirror_layout with_back_focus(micrometres back_focus_um) const
    {
        return two_mirror_layout(::fieldstop_two_mirror_layout{raw_.primary_focal_um, back_focus_um.count(), raw_.lit_field_um});
    }
    /** Diameter at the focus that the whole aperture is to light, micrometres; 0: the centre only */
    FIELDSTOP_INLINE constexpr micrometres lit_field() const { return micrometres(raw_.lit_field_um); }
    FIELDSTOP_INLINE constexpr two_mirror_layout with_lit_field(micrometres lit_field_um) const
    {
        return two_mirror_layout(::fieldstop_two_mirror_layout{raw_.primary_focal_um, raw_.back_focus_um, lit_field_um.count()});
    }

private:
    friend struct access;
    friend class result<two_mirror_layout>;
    FIELDSTOP_INLINE explicit two_mirror_layout(const access &) {}
    ::fieldstop_two_mirror_layout raw_;
};
static_assert(sizeof(two_mirror_layout) == sizeof(::fieldstop_two_mirror_layout), "no more than in C");

/** A focuser, and the tube whose length moves the focus */
class focuser;
template <> struct given_as<focuser> {
    typedef const focuser &type;
};
class focuser {
public:
    /** Every member 0. */
    FIELDSTOP_INLINE constexpr focuser() : raw_() {}
    FIELDSTOP_INLINE constexpr explicit focuser(const ::fieldstop_focuser &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_focuser &c() const { return raw_; }
    /** Travel of one step of the motor, nanometres; 0: unknown */
    FIELDSTOP_INLINE constexpr nanometres motor_step() const { return nanometres(raw_.motor_step_nm); }
    FIELDSTOP_INLINE constexpr focuser with_motor_step(nanometres motor_step_nm) const
    {
        return focuser(::fieldstop_focuser{motor_step_nm.count(), raw_.defocus_nm, raw_.tube_length_um, raw_.expansion_ppb_per_k});
    }
    /** The distance from the best focus that is asked about, nanometres; 0 is in focus */
    FIELDSTOP_INLINE constexpr nanometres defocus() const { return nanometres(raw_.defocus_nm); }
    FIELDSTOP_INLINE constexpr focuser with_defocus(nanometres defocus_nm) const
    {
        return focuser(::fieldstop_focuser{raw_.motor_step_nm, defocus_nm.count(), raw_.tube_length_um, raw_.expansion_ppb_per_k});
    }
    /** Length that grows with the temperature between the objective and the focus, micrometres; 0: unknown */
    FIELDSTOP_INLINE constexpr micrometres tube_length() const { return micrometres(raw_.tube_length_um); }
    FIELDSTOP_INLINE constexpr focuser with_tube_length(micrometres tube_length_um) const
    {
        return focuser(::fieldstop_focuser{raw_.motor_step_nm, raw_.defocus_nm, tube_length_um.count(), raw_.expansion_ppb_per_k});
    }
    /** Its thermal expansion, parts per billion per kelvin; 0: unknown */
    FIELDSTOP_INLINE constexpr parts_per_billion_per_kelvin expansion() const { return parts_per_billion_per_kelvin(raw_.expansion_ppb_per_k); }
    FIELDSTOP_INLINE constexpr focuser with_expansion(parts_per_billion_per_kelvin expansion_ppb_per_k) const
    {
        return focuser(::fieldstop_focuser{raw_.motor_step_nm, raw_.defocus_nm, raw_.tube_length_um, expansion_ppb_per_k.count()});
    }

private:
    friend struct access;
    friend class result<focuser>;
    FIELDSTOP_INLINE explicit focuser(const access &) {}
    ::fieldstop_focuser raw_;
};
static_assert(sizeof(focuser) == sizeof(::fieldstop_focuser), "no more than in C");

/** How exact the focus must be, and what it costs to be off */
class focus_readout;
template <> struct given_as<focus_readout> {
    typedef const focus_readout &type;
};
class focus_readout {
public:
    FIELDSTOP_INLINE constexpr explicit focus_readout(const ::fieldstop_focus_readout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_focus_readout &c() const { return raw_; }
    /** Bits of the members that were wanted and could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** What is worth telling beside the values; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Focal ratio with the Barlow or reducer: N = f k / D */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> focal_ratio() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_FOCAL_RATIO) != 0 ? result<q16>(q16(raw_.focal_ratio_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** How far from the best focus, each side, the wavefront is a quarter wave off, nanometres: 2 lambda N^2 */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<nanometres> depth() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_DEPTH) != 0 ? result<nanometres>(nanometres(raw_.depth_nm)) : result<nanometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** The same in steps of the motor, to the nearest */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<uint32_t> depth_steps() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_DEPTH_STEPS) != 0 ? result<uint32_t>(uint32_t(raw_.depth_steps)) : result<uint32_t>(status(FIELDSTOP_UNDEFINED));
    }
    /** Change of temperature that moves the focus so far, millikelvin: depth / (length expansion) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<millikelvin> temperature() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_TEMPERATURE) != 0 ? result<millikelvin>(millikelvin(raw_.temperature_mk)) : result<millikelvin>(status(FIELDSTOP_UNDEFINED));
    }
    /** Width of a star's image at the defocus asked about, by geometry, nanometres: defocus / N */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<nanometres> blur() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_BLUR) != 0 ? result<nanometres>(nanometres(raw_.blur_nm)) : result<nanometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** The same on the sky, microarcseconds: (1 rad) blur / (f k) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<microarcseconds> blur_angle() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_BLUR_ANGLE) != 0 ? result<microarcseconds>(microarcseconds(raw_.blur_angle_uas)) : result<microarcseconds>(status(FIELDSTOP_UNDEFINED));
    }
    /** Error of the wavefront there, peak to valley, nanometres: defocus / (8 N^2) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<nanometres> wavefront() const
    {
        return (raw_.available & FIELDSTOP_FOCUS_WAVEFRONT) != 0 ? result<nanometres>(nanometres(raw_.wavefront_nm)) : result<nanometres>(status(FIELDSTOP_UNDEFINED));
    }

private:
    focus_readout() = default;
    friend struct access;
    friend class result<focus_readout>;
    FIELDSTOP_INLINE explicit focus_readout(const access &) {}
    ::fieldstop_focus_readout raw_;
};
static_assert(sizeof(focus_readout) == sizeof(::fieldstop_focus_readout), "no more than in C");

/** A Newtonian's diagonal, the light that it passes, and the height of the eyepiece */
class newtonian_readout;
template <> struct given_as<newtonian_readout> {
    typedef const newtonian_readout &type;
};
class newtonian_readout {
public:
    FIELDSTOP_INLINE constexpr explicit newtonian_readout(const ::fieldstop_newtonian_readout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_newtonian_readout &c() const { return raw_; }
    /** Bits of the members that were wanted and could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** What is worth telling beside the values; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** Minor axis of the smallest diagonal that lights the field wanted, micrometres */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> diagonal() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_DIAGONAL) != 0 ? result<micrometres>(micrometres(raw_.diagonal_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** How far its centre lies away from the focuser, and as much toward the primary, micrometres */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> diagonal_offset() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_DIAGONAL_OFFSET) != 0 ? result<micrometres>(micrometres(raw_.diagonal_offset_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** The diagonal in place over the aperture */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> obstruction() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_OBSTRUCTION) != 0 ? result<q16>(q16(raw_.obstruction_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** Width of the beam at the diagonal, micrometres: D L / f */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> beam() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_BEAM) != 0 ? result<micrometres>(micrometres(raw_.beam_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** How far off the axis the beam to the edge of the field is there, micrometres: y (f - L) / f */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> beam_shift() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_BEAM_SHIFT) != 0 ? result<micrometres>(micrometres(raw_.beam_shift_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Share of the light on the axis that the diagonal in place passes to the edge of the field */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> edge_light() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_EDGE_LIGHT) != 0 ? result<q16>(q16(raw_.edge_light_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** The eyepiece above the place where the observer stands, now, micrometres */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> eyepiece_height() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_EYEPIECE_HEIGHT) != 0 ? result<micrometres>(micrometres(raw_.eyepiece_height_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** The same at the altitude where it is highest, micrometres */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> greatest_height() const
    {
        return (raw_.available & FIELDSTOP_NEWTONIAN_GREATEST_HEIGHT) != 0 ? result<micrometres>(micrometres(raw_.greatest_height_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }

private:
    newtonian_readout() = default;
    friend struct access;
    friend class result<newtonian_readout>;
    FIELDSTOP_INLINE explicit newtonian_readout(const access &) {}
    ::fieldstop_newtonian_readout raw_;
};
static_assert(sizeof(newtonian_readout) == sizeof(::fieldstop_newtonian_readout), "no more than in C");

/** Where the second mirror goes and what it is */
class two_mirror_readout;
template <> struct given_as<two_mirror_readout> {
    typedef const two_mirror_readout &type;
};
class two_mirror_readout {
public:
    FIELDSTOP_INLINE constexpr explicit two_mirror_readout(const ::fieldstop_two_mirror_readout &raw) : raw_(raw) {}
    FIELDSTOP_INLINE constexpr const ::fieldstop_two_mirror_readout &c() const { return raw_; }
    /** Bits of the members that were wanted and could be known */
    FIELDSTOP_INLINE constexpr uint32_t available() const { return raw_.available; }
    /** What is worth telling beside the values; named constants */
    FIELDSTOP_INLINE constexpr uint32_t facts() const { return raw_.facts; }
    /** How much longer the secondary makes the focal length: m = F / f1 */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> secondary_magnification() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_SECONDARY_MAGNIFICATION) != 0 ? result<q16>(q16(raw_.secondary_magnification_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** From the primary's vertex to the secondary's, micrometres: f1 - p, p = (f1 + b) / (m + 1) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> separation() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_SEPARATION) != 0 ? result<micrometres>(micrometres(raw_.separation_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Diameter of the secondary with the margin for the lit field, micrometres: D p / f1 + i (f1 - p) / F */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> secondary() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_SECONDARY) != 0 ? result<micrometres>(micrometres(raw_.secondary_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** Radius of curvature of the secondary, convex, micrometres: 2 p m / (m - 1) */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> secondary_radius() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_SECONDARY_RADIUS) != 0 ? result<micrometres>(micrometres(raw_.secondary_radius_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** That diameter over the aperture */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> obstruction() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_OBSTRUCTION) != 0 ? result<q16>(q16(raw_.obstruction_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }
    /** From the secondary to the focus, micrometres: the separation and the back focus */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<micrometres> length() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_LENGTH) != 0 ? result<micrometres>(micrometres(raw_.length_um)) : result<micrometres>(status(FIELDSTOP_UNDEFINED));
    }
    /** That length over the focal length: how short the tube is for it */
    FIELDSTOP_CHECKED FIELDSTOP_INLINE constexpr result<q16> length_share() const
    {
        return (raw_.available & FIELDSTOP_TWO_MIRROR_LENGTH_SHARE) != 0 ? result<q16>(q16(raw_.length_share_q16)) : result<q16>(status(FIELDSTOP_UNDEFINED));
    }

private:
    two_mirror_readout() = default;
    friend struct access;
    friend class result<two_mirror_readout>;
    FIELDSTOP_INLINE explicit two_mirror_readout(const access &) {}
    ::fieldstop_two_mirror_readout raw_;
};
static_assert(sizeof(two_mirror_readout) == sizeof(::fieldstop_two_mirror_readout), "no more than in C");

/** What the owner calls a piece of equipment: up to 12 bytes in the characters of the owner's display */
typedef ::fieldstop_equipment_name equipment_name;
template <> struct given_as<equipment_name> {
    typedef const equipment_name &type;
};

/** Which entry of each kind is in use: its index, or 255 for none */
typedef ::fieldstop_in_use in_use;
template <> struct given_as<in_use> {
    typedef const in_use &type;
};

/** Two places for a record in a storage */
typedef ::fieldstop_slot_pair slot_pair;
template <> struct given_as<slot_pair> {
    typedef const slot_pair &type;
};

/** The look of all text */
typedef ::fieldstop_text_style text_style;
template <> struct given_as<text_style> {
    typedef const text_style &type;
};

/** A part of a line, in characters */
typedef ::fieldstop_span span;
template <> struct given_as<span> {
    typedef const span &type;
};

/** What an entry is worth */
typedef ::fieldstop_entry_state entry_state;
template <> struct given_as<entry_state> {
    typedef const entry_state &type;
};
/* What can go wrong. The numbers are frozen: they are the `fieldstop_status` of the C interface. */

/** Gives a static English sentence for the cause in a status; never null. */
FIELDSTOP_INLINE const char *cause_text(status status)
{
    return ::fieldstop_cause_text(status.number());
}

/** Gives the version of the library: major times 65536 plus minor times 256 plus patch. */
FIELDSTOP_INLINE uint32_t version()
{
    return ::fieldstop_version();
}

/* The quantities of the fixed forms, each an integer with its unit in its name. */

/** Gives the binary angle of milliarcseconds, whole turns dropped. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<binary_angle> bam_from_mas_fx(signed_milliarcseconds angle_mas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_bam_from_mas_fx(angle_mas.count(), &given);
    return access::given<binary_angle>(number, given);
}

/** Gives the milliarcseconds of a binary angle, under 1296000000. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> mas_from_bam_fx(binary_angle angle_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_mas_from_bam_fx(angle_bam.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

/** Gives the milliarcseconds of a binary angle either side of zero. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_milliarcseconds> signed_mas_from_bam_fx(signed_binary_angle angle_bam)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_signed_mas_from_bam_fx(angle_bam.count(), &given);
    return access::given<signed_milliarcseconds>(number, given);
}

/** Gives the binary angle of milliseconds on a circle of 24 hours. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<binary_angle> bam_from_day_ms_fx(day_milliseconds time_day_ms)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_bam_from_day_ms_fx(time_day_ms.count(), &given);
    return access::given<binary_angle>(number, given);
}

/** Gives the milliseconds on a circle of 24 hours of a binary angle, under 86400000. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<day_milliseconds> day_ms_from_bam_fx(binary_angle angle_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_day_ms_from_bam_fx(angle_bam.count(), &given);
    return access::given<day_milliseconds>(number, given);
}

/** Gives the thousandths of a Q16.16 number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<thousandths> milli_from_q16_fx(q16 number_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_milli_from_q16_fx(number_q16.count(), &given);
    return access::given<thousandths>(number, given);
}

/** Gives the Q16.16 number of thousandths. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> q16_from_milli_fx(thousandths number_milli)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_q16_from_milli_fx(number_milli.count(), &given);
    return access::given<q16>(number, given);
}

/* Field of view: what the focal lengths, the eyepiece and the sensor show of the sky. */

/** Gives the focal ratio (the N of f/N), in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> focal_ratio_fx(micrometres focal_length_um, micrometres aperture_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_ratio_fx(focal_length_um.count(), aperture_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal ratio (the N of f/N), a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> focal_ratio_f32(millimetres_f32 focal_length_mm, millimetres_f32 aperture_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_ratio_f32(focal_length_mm.count(), aperture_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal ratio (the N of f/N), a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> focal_ratio_f64(millimetres_f64 focal_length_mm, millimetres_f64 aperture_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_ratio_f64(focal_length_mm.count(), aperture_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the focal length of a telescope with an amplifier or a reducer in its beam, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> amplified_focal_length_fx(micrometres focal_length_um, q16 amplification_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_fx(focal_length_um.count(), amplification_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> amplified_focal_length_f32(millimetres_f32 focal_length_mm, float amplification)
{
    float given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_f32(focal_length_mm.count(), amplification, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal length of a telescope with an amplifier or a reducer in its beam, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> amplified_focal_length_f64(millimetres_f64 focal_length_mm, double amplification)
{
    double given;
    const fieldstop_status number = ::fieldstop_amplified_focal_length_f64(focal_length_mm.count(), amplification, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how much a lens before the focus lengthens the focal length, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> amplification_fx(signed_micrometres element_focal_length_um, micrometres image_distance_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_amplification_fx(element_focal_length_um.count(), image_distance_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how much a lens before the focus lengthens the focal length, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> amplification_f32(millimetres_f32 element_focal_length_mm, millimetres_f32 image_distance_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_amplification_f32(element_focal_length_mm.count(), image_distance_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how much a lens before the focus lengthens the focal length, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> amplification_f64(millimetres_f64 element_focal_length_mm, millimetres_f64 image_distance_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_amplification_f64(element_focal_length_mm.count(), image_distance_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the magnification of a telescope with an eyepiece, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> magnification_fx(micrometres focal_length_um, micrometres eyepiece_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_magnification_fx(focal_length_um.count(), eyepiece_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the magnification of a telescope with an eyepiece, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> magnification_f32(millimetres_f32 focal_length_mm, millimetres_f32 eyepiece_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnification_f32(focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the magnification of a telescope with an eyepiece, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> magnification_f64(millimetres_f64 focal_length_mm, millimetres_f64 eyepiece_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnification_f64(focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the diameter of the beam that leaves the eyepiece, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> exit_pupil_fx(micrometres aperture_um, micrometres focal_length_um, micrometres eyepiece_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_exit_pupil_fx(aperture_um.count(), focal_length_um.count(), eyepiece_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the diameter of the beam that leaves the eyepiece, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> exit_pupil_f32(millimetres_f32 aperture_mm, millimetres_f32 focal_length_mm, millimetres_f32 eyepiece_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_exit_pupil_f32(aperture_mm.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the diameter of the beam that leaves the eyepiece, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> exit_pupil_f64(millimetres_f64 aperture_mm, millimetres_f64 focal_length_mm, millimetres_f64 eyepiece_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_exit_pupil_f64(aperture_mm.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the eyepiece focal length that gives an exit pupil, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> eyepiece_for_exit_pupil_fx(micrometres exit_pupil_um, micrometres focal_length_um, micrometres aperture_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_fx(exit_pupil_um.count(), focal_length_um.count(), aperture_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the eyepiece focal length that gives an exit pupil, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> eyepiece_for_exit_pupil_f32(millimetres_f32 exit_pupil_mm, millimetres_f32 focal_length_mm, millimetres_f32 aperture_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_f32(exit_pupil_mm.count(), focal_length_mm.count(), aperture_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the eyepiece focal length that gives an exit pupil, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> eyepiece_for_exit_pupil_f64(millimetres_f64 exit_pupil_mm, millimetres_f64 focal_length_mm, millimetres_f64 aperture_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_exit_pupil_f64(exit_pupil_mm.count(), focal_length_mm.count(), aperture_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the eyepiece focal length that gives a magnification, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> eyepiece_for_magnification_fx(micrometres focal_length_um, q16 magnification_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_fx(focal_length_um.count(), magnification_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the eyepiece focal length that gives a magnification, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> eyepiece_for_magnification_f32(millimetres_f32 focal_length_mm, float magnification)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_f32(focal_length_mm.count(), magnification, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the eyepiece focal length that gives a magnification, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> eyepiece_for_magnification_f64(millimetres_f64 focal_length_mm, double magnification)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_for_magnification_f64(focal_length_mm.count(), magnification, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the angle of sky inside the eyepiece's field stop, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> true_field_from_stop_fx(micrometres field_stop_um, micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_fx(field_stop_um.count(), focal_length_um.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky inside the eyepiece's field stop, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> true_field_from_stop_f32(millimetres_f32 field_stop_mm, millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_f32(field_stop_mm.count(), focal_length_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky inside the eyepiece's field stop, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> true_field_from_stop_f64(millimetres_f64 field_stop_mm, millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_from_stop_f64(field_stop_mm.count(), focal_length_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the angle of sky in an eyepiece that keeps straight lines straight, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> true_field_rectilinear_fx(milliarcseconds apparent_field_mas, micrometres focal_length_um, micrometres eyepiece_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_fx(apparent_field_mas.count(), focal_length_um.count(), eyepiece_um.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> true_field_rectilinear_f32(arcseconds_f32 apparent_field_arcsec, millimetres_f32 focal_length_mm, millimetres_f32 eyepiece_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_f32(apparent_field_arcsec.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky in an eyepiece that keeps straight lines straight, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> true_field_rectilinear_f64(arcseconds_f64 apparent_field_arcsec, millimetres_f64 focal_length_mm, millimetres_f64 eyepiece_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_rectilinear_f64(apparent_field_arcsec.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the angle of sky in an eyepiece that keeps equal angles equal, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> true_field_equidistant_fx(milliarcseconds apparent_field_mas, micrometres focal_length_um, micrometres eyepiece_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_fx(apparent_field_mas.count(), focal_length_um.count(), eyepiece_um.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> true_field_equidistant_f32(arcseconds_f32 apparent_field_arcsec, millimetres_f32 focal_length_mm, millimetres_f32 eyepiece_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_f32(apparent_field_arcsec.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky in an eyepiece that keeps equal angles equal, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> true_field_equidistant_f64(arcseconds_f64 apparent_field_arcsec, millimetres_f64 focal_length_mm, millimetres_f64 eyepiece_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_equidistant_f64(apparent_field_arcsec.count(), focal_length_mm.count(), eyepiece_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the angle of sky along one side of a sensor, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> frame_field_fx(nanometres pixel_nm, uint32_t pixel_count, micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_frame_field_fx(pixel_nm.count(), pixel_count, focal_length_um.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky along one side of a sensor, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> frame_field_f32(micrometres_f32 pixel_um, uint32_t pixel_count, millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_frame_field_f32(pixel_um.count(), pixel_count, focal_length_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky along one side of a sensor, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> frame_field_f64(micrometres_f64 pixel_um, uint32_t pixel_count, millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_frame_field_f64(pixel_um.count(), pixel_count, focal_length_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the angle of sky to a millimetre at the focus, in milliarcseconds per millimetre. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds_per_millimetre> plate_scale_fx(micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_plate_scale_fx(focal_length_um.count(), &given);
    return access::given<milliarcseconds_per_millimetre>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_millimetre_f32> plate_scale_f32(millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_plate_scale_f32(focal_length_mm.count(), &given);
    return access::given<arcseconds_per_millimetre_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky to a millimetre at the focus, in arcseconds per millimetre. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_millimetre_f64> plate_scale_f64(millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_plate_scale_f64(focal_length_mm.count(), &given);
    return access::given<arcseconds_per_millimetre_f64>(number, given);
}
#endif

/** Gives the angle of sky to a pixel, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> pixel_scale_fx(nanometres pixel_nm, micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_pixel_scale_fx(pixel_nm.count(), focal_length_um.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky to a pixel, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> pixel_scale_f32(micrometres_f32 pixel_um, millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_pixel_scale_f32(pixel_um.count(), focal_length_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky to a pixel, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> pixel_scale_f64(micrometres_f64 pixel_um, millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_pixel_scale_f64(pixel_um.count(), focal_length_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the focal length that spreads a field over a width at the focus, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> focal_length_for_field_fx(micrometres extent_um, milliarcseconds field_mas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_fx(extent_um.count(), field_mas.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal length that spreads a field over a width at the focus, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> focal_length_for_field_f32(millimetres_f32 extent_mm, arcseconds_f32 field_arcsec)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_f32(extent_mm.count(), field_arcsec.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal length that spreads a field over a width at the focus, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> focal_length_for_field_f64(millimetres_f64 extent_mm, arcseconds_f64 field_arcsec)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_length_for_field_f64(extent_mm.count(), field_arcsec.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how many frames in a row cover a target. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint32_t> tiles_fx(milliarcseconds target_mas, milliarcseconds frame_mas, milliarcseconds overlap_mas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_fx(target_mas.count(), frame_mas.count(), overlap_mas.count(), &given);
    return access::given<uint32_t>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many frames in a row cover a target. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint32_t> tiles_f32(arcseconds_f32 target_arcsec, arcseconds_f32 frame_arcsec, arcseconds_f32 overlap_arcsec)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_f32(target_arcsec.count(), frame_arcsec.count(), overlap_arcsec.count(), &given);
    return access::given<uint32_t>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many frames in a row cover a target. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint32_t> tiles_f64(arcseconds_f64 target_arcsec, arcseconds_f64 frame_arcsec, arcseconds_f64 overlap_arcsec)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_tiles_f64(target_arcsec.count(), frame_arcsec.count(), overlap_arcsec.count(), &given);
    return access::given<uint32_t>(number, given);
}
#endif

/* Resolution: how fine a telescope shows, and how far the air, the obstruction and the wavefront let it. */

/** Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> rayleigh_limit_fx(micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_fx(aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> rayleigh_limit_f32(millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_f32(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives Rayleigh's limit: the separation of two stars, one at the other's first dark ring, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> rayleigh_limit_f64(millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_f64(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives Rayleigh's limit with a central obstruction, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> rayleigh_limit_obstructed_fx(micrometres aperture_um, micrometres obstruction_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_fx(aperture_um.count(), obstruction_um.count(), wavelength_nm.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives Rayleigh's limit with a central obstruction, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> rayleigh_limit_obstructed_f32(millimetres_f32 aperture_mm, millimetres_f32 obstruction_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_f32(aperture_mm.count(), obstruction_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives Rayleigh's limit with a central obstruction, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> rayleigh_limit_obstructed_f64(millimetres_f64 aperture_mm, millimetres_f64 obstruction_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_rayleigh_limit_obstructed_f64(aperture_mm.count(), obstruction_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives Dawes's limit: the separation at which two equal stars are just seen apart, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> dawes_limit_fx(micrometres aperture_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_dawes_limit_fx(aperture_um.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> dawes_limit_f32(millimetres_f32 aperture_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_dawes_limit_f32(aperture_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives Dawes's limit: the separation at which two equal stars are just seen apart, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> dawes_limit_f64(millimetres_f64 aperture_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_dawes_limit_f64(aperture_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> sparrow_limit_fx(micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_fx(aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> sparrow_limit_f32(millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_f32(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives Sparrow's limit: the separation of two stars at which the dip between them is gone, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> sparrow_limit_f64(millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_sparrow_limit_f64(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the full width at half maximum of a star's image in perfect optics and still air, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> airy_fwhm_fx(micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_fx(aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> airy_fwhm_f32(millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_f32(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the full width at half maximum of a star's image in perfect optics and still air, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> airy_fwhm_f64(millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_airy_fwhm_f64(aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the radius of the Airy disc at the focus, centre to first dark ring, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> airy_radius_fx(micrometres focal_length_um, micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_airy_radius_fx(focal_length_um.count(), aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> airy_radius_f32(millimetres_f32 focal_length_mm, millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_airy_radius_f32(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the radius of the Airy disc at the focus, centre to first dark ring, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> airy_radius_f64(millimetres_f64 focal_length_mm, millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_airy_radius_f64(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre, Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> cutoff_frequency_fx(micrometres focal_length_um, micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_fx(focal_length_um.count(), aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> cutoff_frequency_f32(millimetres_f32 focal_length_mm, millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_f32(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the cutoff frequency at the focus, beyond which detail has no contrast, in cycles per millimetre, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> cutoff_frequency_f64(millimetres_f64 focal_length_mm, millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_cutoff_frequency_f64(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the contrast that the optics keep at a frequency, with a central obstruction, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> contrast_fx(q16 frequency_q16, q16 obstruction_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_contrast_fx(frequency_q16.count(), obstruction_q16.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> contrast_f32(float frequency, float obstruction)
{
    float given;
    const fieldstop_status number = ::fieldstop_contrast_f32(frequency, obstruction, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the contrast that the optics keep at a frequency, with a central obstruction, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> contrast_f64(double frequency, double obstruction)
{
    double given;
    const fieldstop_status number = ::fieldstop_contrast_f64(frequency, obstruction, &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> strehl_ratio_fx(nanometres rms_nm, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_fx(rms_nm.count(), wavelength_nm.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> strehl_ratio_f32(nanometres_f32 rms_nm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_f32(rms_nm.count(), wavelength_nm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the Strehl ratio of a wavefront: the brightness of the star image's centre against the perfect one, in a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> strehl_ratio_f64(nanometres_f64 rms_nm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_strehl_ratio_f64(rms_nm.count(), wavelength_nm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives Fried's parameter, the aperture that the air leaves, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> fried_parameter_fx(microarcseconds seeing_uas, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_fried_parameter_fx(seeing_uas.count(), wavelength_nm.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives Fried's parameter, the aperture that the air leaves, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> fried_parameter_f32(arcseconds_f32 seeing_arcsec, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_fried_parameter_f32(seeing_arcsec.count(), wavelength_nm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives Fried's parameter, the aperture that the air leaves, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> fried_parameter_f64(arcseconds_f64 seeing_arcsec, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_fried_parameter_f64(seeing_arcsec.count(), wavelength_nm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the seeing at an airmass, from that at the zenith, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> seeing_at_airmass_fx(microarcseconds seeing_uas, q16 airmass_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_fx(seeing_uas.count(), airmass_q16.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the seeing at an airmass, from that at the zenith, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> seeing_at_airmass_f32(arcseconds_f32 seeing_arcsec, float airmass)
{
    float given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_f32(seeing_arcsec.count(), airmass, &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the seeing at an airmass, from that at the zenith, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> seeing_at_airmass_f64(arcseconds_f64 seeing_arcsec, double airmass)
{
    double given;
    const fieldstop_status number = ::fieldstop_seeing_at_airmass_f64(seeing_arcsec.count(), airmass, &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the width of a star image that three causes blur, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> combined_fwhm_fx(microarcseconds a_uas, microarcseconds b_uas, microarcseconds c_uas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_fx(a_uas.count(), b_uas.count(), c_uas.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the width of a star image that three causes blur, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> combined_fwhm_f32(arcseconds_f32 a_arcsec, arcseconds_f32 b_arcsec, arcseconds_f32 c_arcsec)
{
    float given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_f32(a_arcsec.count(), b_arcsec.count(), c_arcsec.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the width of a star image that three causes blur, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> combined_fwhm_f64(arcseconds_f64 a_arcsec, arcseconds_f64 b_arcsec, arcseconds_f64 c_arcsec)
{
    double given;
    const fieldstop_status number = ::fieldstop_combined_fwhm_f64(a_arcsec.count(), b_arcsec.count(), c_arcsec.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/* Light: what the mirrors, the glass and the hole in the middle leave of it, and the magnitudes that follow. */

/** Gives the share of the light that mirrors and glass surfaces let through, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> throughput_fx(uint8_t mirrors, q16 reflectance_q16, uint8_t surfaces, q16 transmittance_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_throughput_fx(mirrors, reflectance_q16.count(), surfaces, transmittance_q16.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the share of the light that mirrors and glass surfaces let through, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> throughput_f32(uint8_t mirrors, float reflectance, uint8_t surfaces, float transmittance)
{
    float given;
    const fieldstop_status number = ::fieldstop_throughput_f32(mirrors, reflectance, surfaces, transmittance, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the share of the light that mirrors and glass surfaces let through, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> throughput_f64(uint8_t mirrors, double reflectance, uint8_t surfaces, double transmittance)
{
    double given;
    const fieldstop_status number = ::fieldstop_throughput_f64(mirrors, reflectance, surfaces, transmittance, &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the share of the aperture's area that the central obstruction leaves, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> clear_fraction_fx(micrometres aperture_um, micrometres obstruction_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_clear_fraction_fx(aperture_um.count(), obstruction_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the share of the aperture's area that the central obstruction leaves, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> clear_fraction_f32(millimetres_f32 aperture_mm, millimetres_f32 obstruction_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_clear_fraction_f32(aperture_mm.count(), obstruction_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the share of the aperture's area that the central obstruction leaves, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> clear_fraction_f64(millimetres_f64 aperture_mm, millimetres_f64 obstruction_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_clear_fraction_f64(aperture_mm.count(), obstruction_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the clear, lossless aperture that would gather as much light, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> effective_aperture_fx(micrometres aperture_um, micrometres obstruction_um, q16 throughput_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_effective_aperture_fx(aperture_um.count(), obstruction_um.count(), throughput_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the clear, lossless aperture that would gather as much light, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> effective_aperture_f32(millimetres_f32 aperture_mm, millimetres_f32 obstruction_mm, float throughput)
{
    float given;
    const fieldstop_status number = ::fieldstop_effective_aperture_f32(aperture_mm.count(), obstruction_mm.count(), throughput, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the clear, lossless aperture that would gather as much light, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> effective_aperture_f64(millimetres_f64 aperture_mm, millimetres_f64 obstruction_mm, double throughput)
{
    double given;
    const fieldstop_status number = ::fieldstop_effective_aperture_f64(aperture_mm.count(), obstruction_mm.count(), throughput, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how many magnitudes fainter a telescope shows a star than the bare eye, in millimagnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimagnitudes> magnitude_gain_fx(micrometres effective_aperture_um, micrometres eye_pupil_um)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_fx(effective_aperture_um.count(), eye_pupil_um.count(), &given);
    return access::given<millimagnitudes>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f32> magnitude_gain_f32(millimetres_f32 effective_aperture_mm, millimetres_f32 eye_pupil_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_f32(effective_aperture_mm.count(), eye_pupil_mm.count(), &given);
    return access::given<magnitudes_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many magnitudes fainter a telescope shows a star than the bare eye, in magnitudes, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f64> magnitude_gain_f64(millimetres_f64 effective_aperture_mm, millimetres_f64 eye_pupil_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnitude_gain_f64(effective_aperture_mm.count(), eye_pupil_mm.count(), &given);
    return access::given<magnitudes_f64>(number, given);
}
#endif

/** Gives the faintest star that a telescope shows to an eye whose own limit is known, in millimagnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimagnitudes> limiting_magnitude_fx(millimagnitudes naked_eye_mmag, micrometres effective_aperture_um, micrometres eye_pupil_um)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_fx(naked_eye_mmag.count(), effective_aperture_um.count(), eye_pupil_um.count(), &given);
    return access::given<millimagnitudes>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f32> limiting_magnitude_f32(magnitudes_f32 naked_eye_mag, millimetres_f32 effective_aperture_mm, millimetres_f32 eye_pupil_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_f32(naked_eye_mag.count(), effective_aperture_mm.count(), eye_pupil_mm.count(), &given);
    return access::given<magnitudes_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the faintest star that a telescope shows to an eye whose own limit is known, in magnitudes, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f64> limiting_magnitude_f64(magnitudes_f64 naked_eye_mag, millimetres_f64 effective_aperture_mm, millimetres_f64 eye_pupil_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_limiting_magnitude_f64(naked_eye_mag.count(), effective_aperture_mm.count(), eye_pupil_mm.count(), &given);
    return access::given<magnitudes_f64>(number, given);
}
#endif

/** Gives how bright an extended object looks in the eyepiece, against the bare eye, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> surface_brightness_fx(micrometres exit_pupil_um, micrometres eye_pupil_um, q16 throughput_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_surface_brightness_fx(exit_pupil_um.count(), eye_pupil_um.count(), throughput_q16.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> surface_brightness_f32(millimetres_f32 exit_pupil_mm, millimetres_f32 eye_pupil_mm, float throughput)
{
    float given;
    const fieldstop_status number = ::fieldstop_surface_brightness_f32(exit_pupil_mm.count(), eye_pupil_mm.count(), throughput, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how bright an extended object looks in the eyepiece, against the bare eye, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> surface_brightness_f64(millimetres_f64 exit_pupil_mm, millimetres_f64 eye_pupil_mm, double throughput)
{
    double given;
    const fieldstop_status number = ::fieldstop_surface_brightness_f64(exit_pupil_mm.count(), eye_pupil_mm.count(), throughput, &given);
    return access::given<double>(number, given);
}
#endif

/** Gives how many magnitudes fainter the first of two lights is than the second, in millimagnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimagnitudes> magnitude_difference_fx(uint32_t flux_a, uint32_t flux_b)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_fx(flux_a, flux_b, &given);
    return access::given<millimagnitudes>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f32> magnitude_difference_f32(float flux_a, float flux_b)
{
    float given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_f32(flux_a, flux_b, &given);
    return access::given<magnitudes_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many magnitudes fainter the first of two lights is than the second, in magnitudes, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f64> magnitude_difference_f64(double flux_a, double flux_b)
{
    double given;
    const fieldstop_status number = ::fieldstop_magnitude_difference_f64(flux_a, flux_b, &given);
    return access::given<magnitudes_f64>(number, given);
}
#endif

/** Gives how many magnitudes a light loses from a near to a distant place, in millimagnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimagnitudes> distance_dimming_fx(uint32_t near_distance, uint32_t distant_distance)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_distance_dimming_fx(near_distance, distant_distance, &given);
    return access::given<millimagnitudes>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many magnitudes a light loses from a near to a distant place, in magnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f32> distance_dimming_f32(float near_distance, float distant_distance)
{
    float given;
    const fieldstop_status number = ::fieldstop_distance_dimming_f32(near_distance, distant_distance, &given);
    return access::given<magnitudes_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many magnitudes a light loses from a near to a distant place, in magnitudes, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f64> distance_dimming_f64(double near_distance, double distant_distance)
{
    double given;
    const fieldstop_status number = ::fieldstop_distance_dimming_f64(near_distance, distant_distance, &given);
    return access::given<magnitudes_f64>(number, given);
}
#endif

/** Gives how many magnitudes the air takes from a star, in millimagnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimagnitudes> extinction_fx(unsigned_millimagnitudes coefficient_mmag, q16 airmass_q16)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_extinction_fx(coefficient_mmag.count(), airmass_q16.count(), &given);
    return access::given<millimagnitudes>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many magnitudes the air takes from a star, in magnitudes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f32> extinction_f32(magnitudes_f32 coefficient_mag, float airmass)
{
    float given;
    const fieldstop_status number = ::fieldstop_extinction_f32(coefficient_mag.count(), airmass, &given);
    return access::given<magnitudes_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many magnitudes the air takes from a star, in magnitudes, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<magnitudes_f64> extinction_f64(magnitudes_f64 coefficient_mag, double airmass)
{
    double given;
    const fieldstop_status number = ::fieldstop_extinction_f64(coefficient_mag.count(), airmass, &given);
    return access::given<magnitudes_f64>(number, given);
}
#endif

/** Gives the focal ratio of the lossless telescope that would expose a sensor as fast, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> t_number_fx(q16 focal_ratio_q16, q16 throughput_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_t_number_fx(focal_ratio_q16.count(), throughput_q16.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> t_number_f32(float focal_ratio, float throughput)
{
    float given;
    const fieldstop_status number = ::fieldstop_t_number_f32(focal_ratio, throughput, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal ratio of the lossless telescope that would expose a sensor as fast, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> t_number_f64(double focal_ratio, double throughput)
{
    double given;
    const fieldstop_status number = ::fieldstop_t_number_f64(focal_ratio, throughput, &given);
    return access::given<double>(number, given);
}
#endif

/* Imaging: how a sensor samples the sky, how large a target falls on it, and what a focal ratio does to the exposure. */

/** Gives how many pixels lie across the width of a star's image, Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> pixels_per_fwhm_fx(microarcseconds fwhm_uas, microarcseconds pixel_scale_uas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_fx(fwhm_uas.count(), pixel_scale_uas.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many pixels lie across the width of a star's image. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> pixels_per_fwhm_f32(arcseconds_f32 fwhm_arcsec, arcseconds_f32 pixel_scale_arcsec)
{
    float given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_f32(fwhm_arcsec.count(), pixel_scale_arcsec.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many pixels lie across the width of a star's image, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> pixels_per_fwhm_f64(arcseconds_f64 fwhm_arcsec, arcseconds_f64 pixel_scale_arcsec)
{
    double given;
    const fieldstop_status number = ::fieldstop_pixels_per_fwhm_f64(fwhm_arcsec.count(), pixel_scale_arcsec.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> nyquist_pixel_fx(micrometres focal_length_um, micrometres aperture_um, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_fx(focal_length_um.count(), aperture_um.count(), wavelength_nm.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> nyquist_pixel_f32(millimetres_f32 focal_length_mm, millimetres_f32 aperture_mm, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_f32(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the coarsest pixel that loses nothing of what the telescope shows in still air, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> nyquist_pixel_f64(millimetres_f64 focal_length_mm, millimetres_f64 aperture_mm, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_nyquist_pixel_f64(focal_length_mm.count(), aperture_mm.count(), wavelength_nm.count(), &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives the focal length that gives a pixel so much of the sky, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> focal_length_for_pixel_scale_fx(nanometres pixel_nm, microarcseconds pixel_scale_uas)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_fx(pixel_nm.count(), pixel_scale_uas.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal length that gives a pixel so much of the sky, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> focal_length_for_pixel_scale_f32(micrometres_f32 pixel_um, arcseconds_f32 pixel_scale_arcsec)
{
    float given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_f32(pixel_um.count(), pixel_scale_arcsec.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal length that gives a pixel so much of the sky, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> focal_length_for_pixel_scale_f64(micrometres_f64 pixel_um, arcseconds_f64 pixel_scale_arcsec)
{
    double given;
    const fieldstop_status number = ::fieldstop_focal_length_for_pixel_scale_f64(pixel_um.count(), pixel_scale_arcsec.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the angle of sky from corner to corner of a sensor, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> diagonal_field_fx(nanometres pixel_nm, uint16_t columns, uint16_t rows, micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_field_fx(pixel_nm.count(), columns, rows, focal_length_um.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the angle of sky from corner to corner of a sensor, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> diagonal_field_f32(micrometres_f32 pixel_um, uint16_t columns, uint16_t rows, millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_field_f32(pixel_um.count(), columns, rows, focal_length_mm.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle of sky from corner to corner of a sensor, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> diagonal_field_f64(micrometres_f64 pixel_um, uint16_t columns, uint16_t rows, millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_field_f64(pixel_um.count(), columns, rows, focal_length_mm.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives how large a target is at the focus, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> image_size_fx(milliarcseconds field_mas, micrometres focal_length_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_image_size_fx(field_mas.count(), focal_length_um.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how large a target is at the focus, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> image_size_f32(arcseconds_f32 field_arcsec, millimetres_f32 focal_length_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_image_size_f32(field_arcsec.count(), focal_length_mm.count(), &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how large a target is at the focus, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> image_size_f64(arcseconds_f64 field_arcsec, millimetres_f64 focal_length_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_image_size_f64(field_arcsec.count(), focal_length_mm.count(), &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, signed Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_q16> exposure_stops_fx(q16 from_focal_ratio_q16, q16 to_focal_ratio_q16)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_exposure_stops_fx(from_focal_ratio_q16.count(), to_focal_ratio_q16.count(), &given);
    return access::given<signed_q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many stops more exposure a focal ratio needs than another, negative where it needs less. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> exposure_stops_f32(float from_focal_ratio, float to_focal_ratio)
{
    float given;
    const fieldstop_status number = ::fieldstop_exposure_stops_f32(from_focal_ratio, to_focal_ratio, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many stops more exposure a focal ratio needs than another, negative where it needs less, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> exposure_stops_f64(double from_focal_ratio, double to_focal_ratio)
{
    double given;
    const fieldstop_status number = ::fieldstop_exposure_stops_f64(from_focal_ratio, to_focal_ratio, &given);
    return access::given<double>(number, given);
}
#endif

/* Focus: how deep it is, what a miss costs, and how far heat, a near object and the edge of the field move it. */

/** Gives how far from the focus, each side, the wavefront is a quarter wave off, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> depth_of_focus_fx(q16 focal_ratio_q16, nanometres wavelength_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_fx(focal_ratio_q16.count(), wavelength_nm.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> depth_of_focus_f32(float focal_ratio, nanometres_f32 wavelength_nm)
{
    float given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_f32(focal_ratio, wavelength_nm.count(), &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far from the focus, each side, the wavefront is a quarter wave off, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> depth_of_focus_f64(double focal_ratio, nanometres_f64 wavelength_nm)
{
    double given;
    const fieldstop_status number = ::fieldstop_depth_of_focus_f64(focal_ratio, wavelength_nm.count(), &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives the diameter of a star's image out of focus, by geometry, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> defocus_blur_fx(nanometres defocus_nm, q16 focal_ratio_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_defocus_blur_fx(defocus_nm.count(), focal_ratio_q16.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the diameter of a star's image out of focus, by geometry, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> defocus_blur_f32(micrometres_f32 defocus_um, float focal_ratio)
{
    float given;
    const fieldstop_status number = ::fieldstop_defocus_blur_f32(defocus_um.count(), focal_ratio, &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the diameter of a star's image out of focus, by geometry, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> defocus_blur_f64(micrometres_f64 defocus_um, double focal_ratio)
{
    double given;
    const fieldstop_status number = ::fieldstop_defocus_blur_f64(defocus_um.count(), focal_ratio, &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres> defocus_wavefront_fx(nanometres defocus_nm, q16 focal_ratio_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_fx(defocus_nm.count(), focal_ratio_q16.count(), &given);
    return access::given<nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres_f32> defocus_wavefront_f32(micrometres_f32 defocus_um, float focal_ratio)
{
    float given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_f32(defocus_um.count(), focal_ratio, &given);
    return access::given<nanometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the error of the wavefront out of focus, from its lowest to its highest point, in nanometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<nanometres_f64> defocus_wavefront_f64(micrometres_f64 defocus_um, double focal_ratio)
{
    double given;
    const fieldstop_status number = ::fieldstop_defocus_wavefront_f64(defocus_um.count(), focal_ratio, &given);
    return access::given<nanometres_f64>(number, given);
}
#endif

/** Gives how many steps of the focus motor a distance takes, to the nearest. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint32_t> motor_steps_fx(nanometres distance_nm, nanometres step_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_motor_steps_fx(distance_nm.count(), step_nm.count(), &given);
    return access::given<uint32_t>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how many steps of the focus motor a distance takes, steps and their fraction. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> motor_steps_f32(micrometres_f32 distance_um, micrometres_f32 step_um)
{
    float given;
    const fieldstop_status number = ::fieldstop_motor_steps_f32(distance_um.count(), step_um.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how many steps of the focus motor a distance takes, steps and their fraction, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> motor_steps_f64(micrometres_f64 distance_um, micrometres_f64 step_um)
{
    double given;
    const fieldstop_status number = ::fieldstop_motor_steps_f64(distance_um.count(), step_um.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in nanometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_nanometres> thermal_shift_fx(micrometres length_um, signed_parts_per_billion_per_kelvin expansion_ppb_per_k, signed_millikelvin temperature_change_mk)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_thermal_shift_fx(length_um.count(), expansion_ppb_per_k.count(), temperature_change_mk.count(), &given);
    return access::given<signed_nanometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f32> thermal_shift_f32(millimetres_f32 length_mm, parts_per_million_per_kelvin_f32 expansion_ppm_per_k, kelvin_f32 temperature_change_k)
{
    float given;
    const fieldstop_status number = ::fieldstop_thermal_shift_f32(length_mm.count(), expansion_ppm_per_k.count(), temperature_change_k.count(), &given);
    return access::given<micrometres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how much longer a tube or a rod gets by a change of temperature, negative where it gets shorter, in micrometres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres_f64> thermal_shift_f64(millimetres_f64 length_mm, parts_per_million_per_kelvin_f64 expansion_ppm_per_k, kelvin_f64 temperature_change_k)
{
    double given;
    const fieldstop_status number = ::fieldstop_thermal_shift_f64(length_mm.count(), expansion_ppm_per_k.count(), temperature_change_k.count(), &given);
    return access::given<micrometres_f64>(number, given);
}
#endif

/** Gives the change of temperature that uses up a tolerance of focus, in millikelvin. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millikelvin> refocus_temperature_fx(micrometres length_um, parts_per_billion_per_kelvin expansion_ppb_per_k, nanometres tolerance_nm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_fx(length_um.count(), expansion_ppb_per_k.count(), tolerance_nm.count(), &given);
    return access::given<millikelvin>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the change of temperature that uses up a tolerance of focus, in kelvin. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<kelvin_f32> refocus_temperature_f32(millimetres_f32 length_mm, parts_per_million_per_kelvin_f32 expansion_ppm_per_k, micrometres_f32 tolerance_um)
{
    float given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_f32(length_mm.count(), expansion_ppm_per_k.count(), tolerance_um.count(), &given);
    return access::given<kelvin_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the change of temperature that uses up a tolerance of focus, in kelvin, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<kelvin_f64> refocus_temperature_f64(millimetres_f64 length_mm, parts_per_million_per_kelvin_f64 expansion_ppm_per_k, micrometres_f64 tolerance_um)
{
    double given;
    const fieldstop_status number = ::fieldstop_refocus_temperature_f64(length_mm.count(), expansion_ppm_per_k.count(), tolerance_um.count(), &given);
    return access::given<kelvin_f64>(number, given);
}
#endif

/** Gives how far the focus lies behind its place for a star when the object is near, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> near_focus_travel_fx(micrometres focal_length_um, millimetres object_distance_mm)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_fx(focal_length_um.count(), object_distance_mm.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far the focus lies behind its place for a star when the object is near, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> near_focus_travel_f32(millimetres_f32 focal_length_mm, metres_f32 object_distance_m)
{
    float given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_f32(focal_length_mm.count(), object_distance_m.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far the focus lies behind its place for a star when the object is near, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> near_focus_travel_f64(millimetres_f64 focal_length_mm, metres_f64 object_distance_m)
{
    double given;
    const fieldstop_status number = ::fieldstop_near_focus_travel_f64(focal_length_mm.count(), object_distance_m.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how long the coma of a paraboloid draws a star out, off the axis, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> coma_length_fx(milliarcseconds off_axis_mas, q16 focal_ratio_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_coma_length_fx(off_axis_mas.count(), focal_ratio_q16.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> coma_length_f32(arcseconds_f32 off_axis_arcsec, float focal_ratio)
{
    float given;
    const fieldstop_status number = ::fieldstop_coma_length_f32(off_axis_arcsec.count(), focal_ratio, &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how long the coma of a paraboloid draws a star out, off the axis, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> coma_length_f64(arcseconds_f64 off_axis_arcsec, double focal_ratio)
{
    double given;
    const fieldstop_status number = ::fieldstop_coma_length_f64(off_axis_arcsec.count(), focal_ratio, &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/* Layout of mirrors and tube: how large the mirrors are and where they stand, what they leave of the light, and what the tube needs around it. */

/** Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> diagonal_minor_axis_fx(micrometres aperture_um, micrometres focal_length_um, micrometres focus_distance_um, micrometres lit_field_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_fx(aperture_um.count(), focal_length_um.count(), focus_distance_um.count(), lit_field_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> diagonal_minor_axis_f32(millimetres_f32 aperture_mm, millimetres_f32 focal_length_mm, millimetres_f32 focus_distance_mm, millimetres_f32 lit_field_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_f32(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the minor axis of the smallest 45 degree diagonal that takes in the whole beam of a lit field, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> diagonal_minor_axis_f64(millimetres_f64 aperture_mm, millimetres_f64 focal_length_mm, millimetres_f64 focus_distance_mm, millimetres_f64 lit_field_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_minor_axis_f64(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the primary, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> diagonal_offset_fx(micrometres aperture_um, micrometres focal_length_um, micrometres focus_distance_um, micrometres lit_field_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_fx(aperture_um.count(), focal_length_um.count(), focus_distance_um.count(), lit_field_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the primary, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> diagonal_offset_f32(millimetres_f32 aperture_mm, millimetres_f32 focal_length_mm, millimetres_f32 focus_distance_mm, millimetres_f32 lit_field_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_f32(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far the diagonal's centre is moved off the axis, away from the focuser, and as much toward the primary, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> diagonal_offset_f64(millimetres_f64 aperture_mm, millimetres_f64 focal_length_mm, millimetres_f64 focus_distance_mm, millimetres_f64 lit_field_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_diagonal_offset_f64(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the diameter of the beam to the middle of the field, at a distance before the focus, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> beam_width_fx(micrometres aperture_um, micrometres focal_length_um, micrometres focus_distance_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_beam_width_fx(aperture_um.count(), focal_length_um.count(), focus_distance_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> beam_width_f32(millimetres_f32 aperture_mm, millimetres_f32 focal_length_mm, millimetres_f32 focus_distance_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_beam_width_f32(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the diameter of the beam to the middle of the field, at a distance before the focus, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> beam_width_f64(millimetres_f64 aperture_mm, millimetres_f64 focal_length_mm, millimetres_f64 focus_distance_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_beam_width_f64(aperture_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the focus, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> beam_shift_fx(micrometres image_offset_um, micrometres focal_length_um, micrometres focus_distance_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_beam_shift_fx(image_offset_um.count(), focal_length_um.count(), focus_distance_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the focus, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> beam_shift_f32(millimetres_f32 image_offset_mm, millimetres_f32 focal_length_mm, millimetres_f32 focus_distance_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_beam_shift_f32(image_offset_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far off the axis the beam to an image point off the axis has its centre, at a distance before the focus, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> beam_shift_f64(millimetres_f64 image_offset_mm, millimetres_f64 focal_length_mm, millimetres_f64 focus_distance_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_beam_shift_f64(image_offset_mm.count(), focal_length_mm.count(), focus_distance_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how much the second mirror lengthens the primary's focal length, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> secondary_magnification_fx(micrometres primary_focal_um, micrometres system_focal_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_fx(primary_focal_um.count(), system_focal_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how much the second mirror lengthens the primary's focal length, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> secondary_magnification_f32(millimetres_f32 primary_focal_mm, millimetres_f32 system_focal_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_f32(primary_focal_mm.count(), system_focal_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how much the second mirror lengthens the primary's focal length, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> secondary_magnification_f64(millimetres_f64 primary_focal_mm, millimetres_f64 system_focal_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_magnification_f64(primary_focal_mm.count(), system_focal_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives how far the second mirror stands before the primary, from vertex to vertex, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> secondary_separation_fx(micrometres primary_focal_um, micrometres system_focal_um, micrometres back_focus_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_separation_fx(primary_focal_um.count(), system_focal_um.count(), back_focus_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> secondary_separation_f32(millimetres_f32 primary_focal_mm, millimetres_f32 system_focal_mm, millimetres_f32 back_focus_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_separation_f32(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far the second mirror stands before the primary, from vertex to vertex, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> secondary_separation_f64(millimetres_f64 primary_focal_mm, millimetres_f64 system_focal_mm, millimetres_f64 back_focus_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_separation_f64(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the diameter of the second mirror for the image point on the axis, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> secondary_diameter_fx(micrometres aperture_um, micrometres primary_focal_um, micrometres system_focal_um, micrometres back_focus_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_fx(aperture_um.count(), primary_focal_um.count(), system_focal_um.count(), back_focus_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the diameter of the second mirror for the image point on the axis, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> secondary_diameter_f32(millimetres_f32 aperture_mm, millimetres_f32 primary_focal_mm, millimetres_f32 system_focal_mm, millimetres_f32 back_focus_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_f32(aperture_mm.count(), primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the diameter of the second mirror for the image point on the axis, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> secondary_diameter_f64(millimetres_f64 aperture_mm, millimetres_f64 primary_focal_mm, millimetres_f64 system_focal_mm, millimetres_f64 back_focus_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_diameter_f64(aperture_mm.count(), primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives what a lit field adds to the second mirror's diameter, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> secondary_field_margin_fx(micrometres primary_focal_um, micrometres system_focal_um, micrometres back_focus_um, micrometres lit_field_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_fx(primary_focal_um.count(), system_focal_um.count(), back_focus_um.count(), lit_field_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives what a lit field adds to the second mirror's diameter, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> secondary_field_margin_f32(millimetres_f32 primary_focal_mm, millimetres_f32 system_focal_mm, millimetres_f32 back_focus_mm, millimetres_f32 lit_field_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_f32(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives what a lit field adds to the second mirror's diameter, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> secondary_field_margin_f64(millimetres_f64 primary_focal_mm, millimetres_f64 system_focal_mm, millimetres_f64 back_focus_mm, millimetres_f64 lit_field_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_field_margin_f64(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), lit_field_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the radius of curvature of the second mirror, which is convex, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> secondary_radius_fx(micrometres primary_focal_um, micrometres system_focal_um, micrometres back_focus_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_radius_fx(primary_focal_um.count(), system_focal_um.count(), back_focus_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the radius of curvature of the second mirror, which is convex, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> secondary_radius_f32(millimetres_f32 primary_focal_mm, millimetres_f32 system_focal_mm, millimetres_f32 back_focus_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_radius_f32(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the radius of curvature of the second mirror, which is convex, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> secondary_radius_f64(millimetres_f64 primary_focal_mm, millimetres_f64 system_focal_mm, millimetres_f64 back_focus_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_radius_f64(primary_focal_mm.count(), system_focal_mm.count(), back_focus_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the share of a beam's disc that lies inside a stop's or a mirror's, in Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> illumination_fx(micrometres beam_um, micrometres stop_um, micrometres offset_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_illumination_fx(beam_um.count(), stop_um.count(), offset_um.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> illumination_f32(millimetres_f32 beam_mm, millimetres_f32 stop_mm, millimetres_f32 offset_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_illumination_f32(beam_mm.count(), stop_mm.count(), offset_mm.count(), &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the share of a beam's disc that lies inside a stop's or a mirror's, a plain number, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> illumination_f64(millimetres_f64 beam_mm, millimetres_f64 stop_mm, millimetres_f64 offset_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_illumination_f64(beam_mm.count(), stop_mm.count(), offset_mm.count(), &given);
    return access::given<double>(number, given);
}
#endif

/** Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> swing_radius_fx(micrometres reach_um, micrometres tube_diameter_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_swing_radius_fx(reach_um.count(), tube_diameter_um.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> swing_radius_f32(millimetres_f32 reach_mm, millimetres_f32 tube_diameter_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_swing_radius_f32(reach_mm.count(), tube_diameter_mm.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the radius that the tube's far end sweeps about the pivot, which the room must clear, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> swing_radius_f64(millimetres_f64 reach_mm, millimetres_f64 tube_diameter_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_swing_radius_f64(reach_mm.count(), tube_diameter_mm.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how high the eyepiece stands above the floor, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> eyepiece_height_fx(micrometres axis_height_um, signed_micrometres reach_um, signed_binary_angle altitude_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_fx(axis_height_um.count(), reach_um.count(), altitude_bam.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how high the eyepiece stands above the floor, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> eyepiece_height_f32(millimetres_f32 axis_height_mm, millimetres_f32 reach_mm, degrees_of_arc_f32 altitude_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_f32(axis_height_mm.count(), reach_mm.count(), altitude_deg.count(), &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how high the eyepiece stands above the floor, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> eyepiece_height_f64(millimetres_f64 axis_height_mm, millimetres_f64 reach_mm, degrees_of_arc_f64 altitude_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_eyepiece_height_f64(axis_height_mm.count(), reach_mm.count(), altitude_deg.count(), &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/* Colour: what a single lens does to it, and what a pair of two glasses leaves. */

/** Gives the Abbe number of a glass, Q16.16. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> abbe_number_fx(index_n7 index_d_n7, index_n7 index_f_n7, index_n7 index_c_n7)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_abbe_number_fx(index_d_n7.count(), index_f_n7.count(), index_c_n7.count(), &given);
    return access::given<q16>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the Abbe number of a glass. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<float> abbe_number_f32(float index_d, float index_f, float index_c)
{
    float given;
    const fieldstop_status number = ::fieldstop_abbe_number_f32(index_d, index_f, index_c, &given);
    return access::given<float>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the Abbe number of a glass, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<double> abbe_number_f64(double index_d, double index_f, double index_c)
{
    double given;
    const fieldstop_status number = ::fieldstop_abbe_number_f64(index_d, index_f, index_c, &given);
    return access::given<double>(number, given);
}
#endif

/** Gives how far apart along the axis a single lens focuses blue and red, F and C, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> singlet_colour_shift_fx(micrometres focal_length_um, q16 abbe_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_fx(focal_length_um.count(), abbe_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> singlet_colour_shift_f32(millimetres_f32 focal_length_mm, float abbe)
{
    float given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_f32(focal_length_mm.count(), abbe, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far apart along the axis a single lens focuses blue and red, F and C, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> singlet_colour_shift_f64(millimetres_f64 focal_length_mm, double abbe)
{
    double given;
    const fieldstop_status number = ::fieldstop_singlet_colour_shift_f64(focal_length_mm.count(), abbe, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in microarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds> singlet_colour_blur_fx(q16 focal_ratio_q16, q16 abbe_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_fx(focal_ratio_q16.count(), abbe_q16.count(), &given);
    return access::given<microarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> singlet_colour_blur_f32(float focal_ratio, float abbe)
{
    float given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_f32(focal_ratio, abbe, &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the diameter on the sky to which a single lens draws a star in blue and red, F and C, at the best focus, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> singlet_colour_blur_f64(double focal_ratio, double abbe)
{
    double given;
    const fieldstop_status number = ::fieldstop_singlet_colour_blur_f64(focal_ratio, abbe, &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the focal length of the crown lens of an achromat, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> achromat_crown_fx(micrometres focal_length_um, q16 crown_abbe_q16, q16 flint_abbe_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_achromat_crown_fx(focal_length_um.count(), crown_abbe_q16.count(), flint_abbe_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal length of the crown lens of an achromat, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> achromat_crown_f32(millimetres_f32 focal_length_mm, float crown_abbe, float flint_abbe)
{
    float given;
    const fieldstop_status number = ::fieldstop_achromat_crown_f32(focal_length_mm.count(), crown_abbe, flint_abbe, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal length of the crown lens of an achromat, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> achromat_crown_f64(millimetres_f64 focal_length_mm, double crown_abbe, double flint_abbe)
{
    double given;
    const fieldstop_status number = ::fieldstop_achromat_crown_f64(focal_length_mm.count(), crown_abbe, flint_abbe, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> achromat_flint_fx(micrometres focal_length_um, q16 crown_abbe_q16, q16 flint_abbe_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_achromat_flint_fx(focal_length_um.count(), crown_abbe_q16.count(), flint_abbe_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> achromat_flint_f32(millimetres_f32 focal_length_mm, float crown_abbe, float flint_abbe)
{
    float given;
    const fieldstop_status number = ::fieldstop_achromat_flint_f32(focal_length_mm.count(), crown_abbe, flint_abbe, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the focal length of the flint lens of an achromat, in size: the lens is negative, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> achromat_flint_f64(millimetres_f64 focal_length_mm, double crown_abbe, double flint_abbe)
{
    double given;
    const fieldstop_status number = ::fieldstop_achromat_flint_f64(focal_length_mm.count(), crown_abbe, flint_abbe, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/** Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in micrometres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<micrometres> secondary_spectrum_fx(micrometres focal_length_um, parts_per_million partial_difference_ppm, q16 abbe_difference_q16)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_fx(focal_length_um.count(), partial_difference_ppm.count(), abbe_difference_q16.count(), &given);
    return access::given<micrometres>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f32> secondary_spectrum_f32(millimetres_f32 focal_length_mm, float partial_difference, float abbe_difference)
{
    float given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_f32(focal_length_mm.count(), partial_difference, abbe_difference, &given);
    return access::given<millimetres_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how far from the common focus of blue and red, F and C, an achromat brings the colour between, in millimetres, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<millimetres_f64> secondary_spectrum_f64(millimetres_f64 focal_length_mm, double partial_difference, double abbe_difference)
{
    double given;
    const fieldstop_status number = ::fieldstop_secondary_spectrum_f64(focal_length_mm.count(), partial_difference, abbe_difference, &given);
    return access::given<millimetres_f64>(number, given);
}
#endif

/* Motion: how the sky turns past a telescope, how long a star stays in the field or on a pixel, and what an altazimuth mount has to do. */

/** Gives how fast a star drifts through the field when the drive stands still, in microarcseconds per second. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microarcseconds_per_second> drift_rate_fx(signed_binary_angle declination_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_drift_rate_fx(declination_bam.count(), &given);
    return access::given<microarcseconds_per_second>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f32> drift_rate_f32(degrees_of_arc_f32 declination_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_drift_rate_f32(declination_deg.count(), &given);
    return access::given<arcseconds_per_second_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how fast a star drifts through the field when the drive stands still, in arcseconds per second, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f64> drift_rate_f64(degrees_of_arc_f64 declination_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_drift_rate_f64(declination_deg.count(), &given);
    return access::given<arcseconds_per_second_f64>(number, given);
}
#endif

/** Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still, in milliseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliseconds> drift_time_fx(milliarcseconds field_mas, signed_binary_angle declination_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_drift_time_fx(field_mas.count(), declination_bam.count(), &given);
    return access::given<milliseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still, in seconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f32> drift_time_f32(arcseconds_f32 field_arcsec, degrees_of_arc_f32 declination_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_drift_time_f32(field_arcsec.count(), declination_deg.count(), &given);
    return access::given<seconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how long a star takes through the field, from edge to edge through its centre, when the drive stands still, in seconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f64> drift_time_f64(arcseconds_f64 field_arcsec, degrees_of_arc_f64 declination_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_drift_time_f64(field_arcsec.count(), declination_deg.count(), &given);
    return access::given<seconds_f64>(number, given);
}
#endif

/** Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> true_field_from_drift_fx(milliseconds drift_ms, signed_binary_angle declination_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_fx(drift_ms.count(), declination_bam.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> true_field_from_drift_f32(seconds_f32 drift_s, degrees_of_arc_f32 declination_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_f32(drift_s.count(), declination_deg.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the true field of an eyepiece by the time that a star takes through its centre when the drive stands still, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> true_field_from_drift_f64(seconds_f64 drift_s, degrees_of_arc_f64 declination_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_true_field_from_drift_f64(drift_s.count(), declination_deg.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in microseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<microseconds> trail_free_exposure_fx(nanometres pixel_nm, q16 tolerance_q16, micrometres focal_length_um, signed_binary_angle declination_bam)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_fx(pixel_nm.count(), tolerance_q16.count(), focal_length_um.count(), declination_bam.count(), &given);
    return access::given<microseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f32> trail_free_exposure_f32(micrometres_f32 pixel_um, float tolerance, millimetres_f32 focal_length_mm, degrees_of_arc_f32 declination_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_f32(pixel_um.count(), tolerance, focal_length_mm.count(), declination_deg.count(), &given);
    return access::given<seconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the longest exposure without a drive that draws out a star by no more than the tolerance, in seconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f64> trail_free_exposure_f64(micrometres_f64 pixel_um, double tolerance, millimetres_f64 focal_length_mm, degrees_of_arc_f64 declination_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_trail_free_exposure_f64(pixel_um.count(), tolerance, focal_length_mm.count(), declination_deg.count(), &given);
    return access::given<seconds_f64>(number, given);
}
#endif

/** Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the tolerance, in milliseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliseconds> rotation_free_exposure_fx(q16 tolerance_q16, uint32_t radius_px, microarcseconds_per_second rate_uas_per_s)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_fx(tolerance_q16.count(), radius_px, rate_uas_per_s.count(), &given);
    return access::given<milliseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the tolerance, in seconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f32> rotation_free_exposure_f32(float tolerance, uint32_t radius_px, arcseconds_per_second_f32 rate_arcsec_per_s)
{
    float given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_f32(tolerance, radius_px, rate_arcsec_per_s.count(), &given);
    return access::given<seconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the longest exposure on an altazimuth mount on which the turning field draws out a star by no more than the tolerance, in seconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<seconds_f64> rotation_free_exposure_f64(double tolerance, uint32_t radius_px, arcseconds_per_second_f64 rate_arcsec_per_s)
{
    double given;
    const fieldstop_status number = ::fieldstop_rotation_free_exposure_f64(tolerance, radius_px, rate_arcsec_per_s.count(), &given);
    return access::given<seconds_f64>(number, given);
}
#endif

/** Gives how fast the field turns in an altazimuth telescope, in microarcseconds per second, positive where the parallactic angle grows. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_microarcseconds_per_second> field_rotation_rate_fx(signed_binary_angle latitude_bam, binary_angle azimuth_bam, signed_binary_angle altitude_bam)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_fx(latitude_bam.count(), azimuth_bam.count(), altitude_bam.count(), &given);
    return access::given<signed_microarcseconds_per_second>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, positive where the parallactic angle grows. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f32> field_rotation_rate_f32(degrees_of_arc_f32 latitude_deg, degrees_of_arc_f32 azimuth_deg, degrees_of_arc_f32 altitude_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_f32(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how fast the field turns in an altazimuth telescope, in arcseconds per second, in double, positive where the parallactic angle grows. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f64> field_rotation_rate_f64(degrees_of_arc_f64 latitude_deg, degrees_of_arc_f64 azimuth_deg, degrees_of_arc_f64 altitude_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_field_rotation_rate_f64(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f64>(number, given);
}
#endif

/** Gives how fast an altazimuth mount turns in azimuth to follow the sky, in microarcseconds per second, positive from north to east. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_microarcseconds_per_second> azimuth_rate_fx(signed_binary_angle latitude_bam, binary_angle azimuth_bam, signed_binary_angle altitude_bam)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_fx(latitude_bam.count(), azimuth_bam.count(), altitude_bam.count(), &given);
    return access::given<signed_microarcseconds_per_second>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, positive from north to east. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f32> azimuth_rate_f32(degrees_of_arc_f32 latitude_deg, degrees_of_arc_f32 azimuth_deg, degrees_of_arc_f32 altitude_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_f32(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how fast an altazimuth mount turns in azimuth to follow the sky, in arcseconds per second, in double, positive from north to east. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f64> azimuth_rate_f64(degrees_of_arc_f64 latitude_deg, degrees_of_arc_f64 azimuth_deg, degrees_of_arc_f64 altitude_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_azimuth_rate_f64(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f64>(number, given);
}
#endif

/** Gives how fast an altazimuth mount turns in altitude to follow the sky, in microarcseconds per second, positive upward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_microarcseconds_per_second> altitude_rate_fx(signed_binary_angle latitude_bam, binary_angle azimuth_bam, signed_binary_angle altitude_bam)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_altitude_rate_fx(latitude_bam.count(), azimuth_bam.count(), altitude_bam.count(), &given);
    return access::given<signed_microarcseconds_per_second>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, positive upward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f32> altitude_rate_f32(degrees_of_arc_f32 latitude_deg, degrees_of_arc_f32 azimuth_deg, degrees_of_arc_f32 altitude_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_altitude_rate_f32(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how fast an altazimuth mount turns in altitude to follow the sky, in arcseconds per second, in double, positive upward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f64> altitude_rate_f64(degrees_of_arc_f64 latitude_deg, degrees_of_arc_f64 azimuth_deg, degrees_of_arc_f64 altitude_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_altitude_rate_f64(latitude_deg.count(), azimuth_deg.count(), altitude_deg.count(), &given);
    return access::given<arcseconds_per_second_f64>(number, given);
}
#endif

/** Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> zenith_blind_radius_fx(signed_binary_angle latitude_bam, milliarcseconds_per_second top_rate_mas_per_s)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_fx(latitude_bam.count(), top_rate_mas_per_s.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f32> zenith_blind_radius_f32(degrees_of_arc_f32 latitude_deg, arcseconds_per_second_f32 top_rate_arcsec_per_s)
{
    float given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_f32(latitude_deg.count(), top_rate_arcsec_per_s.count(), &given);
    return access::given<arcseconds_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the radius of the circle about the zenith in which an altazimuth mount cannot follow the sky, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> zenith_blind_radius_f64(degrees_of_arc_f64 latitude_deg, arcseconds_per_second_f64 top_rate_arcsec_per_s)
{
    double given;
    const fieldstop_status number = ::fieldstop_zenith_blind_radius_f64(latitude_deg.count(), top_rate_arcsec_per_s.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in microarcseconds per second, positive northward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_microarcseconds_per_second> misalignment_drift_fx(milliarcseconds polar_error_mas, binary_angle hour_angle_bam)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_fx(polar_error_mas.count(), hour_angle_bam.count(), &given);
    return access::given<signed_microarcseconds_per_second>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per second, positive northward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f32> misalignment_drift_f32(arcseconds_f32 polar_error_arcsec, degrees_of_arc_f32 hour_angle_deg)
{
    float given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_f32(polar_error_arcsec.count(), hour_angle_deg.count(), &given);
    return access::given<arcseconds_per_second_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives how fast a star leaves its declination on a mount whose polar axis is not on the pole, in arcseconds per second, in double, positive northward. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_per_second_f64> misalignment_drift_f64(arcseconds_f64 polar_error_arcsec, degrees_of_arc_f64 hour_angle_deg)
{
    double given;
    const fieldstop_status number = ::fieldstop_misalignment_drift_f64(polar_error_arcsec.count(), hour_angle_deg.count(), &given);
    return access::given<arcseconds_per_second_f64>(number, given);
}
#endif

/* The Sun: where it stands, how far from it a telescope points, and how much of its light an aperture collects. */

/** Gives the right ascension of the Sun, of the date, as binary angle. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<binary_angle> sun_right_ascension_fx(seconds unix_s)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sun_right_ascension_fx(unix_s.count(), &given);
    return access::given<binary_angle>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the right ascension of the Sun, of the date, as degrees, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<degrees_of_arc_f64> sun_right_ascension_f64(seconds unix_s)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_right_ascension_f64(unix_s.count(), &given);
    return access::given<degrees_of_arc_f64>(number, given);
}
#endif

/** Gives the declination of the Sun, of the date, as binary angle. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<signed_binary_angle> sun_declination_fx(seconds unix_s)
{
    int32_t given;
    const fieldstop_status number = ::fieldstop_sun_declination_fx(unix_s.count(), &given);
    return access::given<signed_binary_angle>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the declination of the Sun, of the date, as degrees, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<degrees_of_arc_f64> sun_declination_f64(seconds unix_s)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_declination_f64(unix_s.count(), &given);
    return access::given<degrees_of_arc_f64>(number, given);
}
#endif

/** Gives the angle from a direction to the centre of the Sun, in milliarcseconds. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliarcseconds> sun_clearance_fx(binary_angle right_ascension_bam, signed_binary_angle declination_bam, seconds unix_s)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_sun_clearance_fx(right_ascension_bam.count(), declination_bam.count(), unix_s.count(), &given);
    return access::given<milliarcseconds>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the angle from a direction to the centre of the Sun, in arcseconds, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<arcseconds_f64> sun_clearance_f64(degrees_of_arc_f64 right_ascension_deg, degrees_of_arc_f64 declination_deg, seconds unix_s)
{
    double given;
    const fieldstop_status number = ::fieldstop_sun_clearance_f64(right_ascension_deg.count(), declination_deg.count(), unix_s.count(), &given);
    return access::given<arcseconds_f64>(number, given);
}
#endif

/** Gives the power of the Sun's light that an aperture takes in, in milliwatts. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliwatts> collected_sunlight_fx(micrometres effective_aperture_um)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_fx(effective_aperture_um.count(), &given);
    return access::given<milliwatts>(number, given);
}

#if !defined(FIELDSTOP_NO_FLOAT)
/** Gives the power of the Sun's light that an aperture takes in, in milliwatts. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliwatts_f32> collected_sunlight_f32(millimetres_f32 effective_aperture_mm)
{
    float given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_f32(effective_aperture_mm.count(), &given);
    return access::given<milliwatts_f32>(number, given);
}
#endif

#if !defined(FIELDSTOP_NO_FLOAT) && !defined(__AVR__)
/** Gives the power of the Sun's light that an aperture takes in, in milliwatts, in double. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<milliwatts_f64> collected_sunlight_f64(millimetres_f64 effective_aperture_mm)
{
    double given;
    const fieldstop_status number = ::fieldstop_collected_sunlight_f64(effective_aperture_mm.count(), &given);
    return access::given<milliwatts_f64>(number, given);
}
#endif

/* Equipment as plain structs in fixed units, and all readouts of one screen in one call. */

/** Gives 0 for a telescope that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status telescope_check(const telescope &telescope)
{
    return status(::fieldstop_telescope_check(&telescope.c()));
}

/** Gives 0 for an eyepiece that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status eyepiece_check(const eyepiece &eyepiece)
{
    return status(::fieldstop_eyepiece_check(&eyepiece.c()));
}

/** Gives 0 for a camera that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status camera_check(const camera &camera)
{
    return status(::fieldstop_camera_check(&camera.c()));
}

/** Gives 0 for an observer that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status observer_check(const observer &observer)
{
    return status(::fieldstop_observer_check(&observer.c()));
}

/** Gives 0 for a site that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status site_check(const site &site)
{
    return status(::fieldstop_site_check(&site.c()));
}

/** Gives what the eye gets at the eyepiece: the wanted values, each in the unit of its name, and the facts about them. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<visual_readout> visual_readout_compute(const telescope &telescope, const eyepiece &eyepiece, const observer &observer, uint32_t wanted)
{
    result<visual_readout> given = access::blank<visual_readout>();
    access::finish(given, ::fieldstop_visual_readout_compute(&telescope.c(), &eyepiece.c(), &observer.c(), wanted, access::place(given)));
    return given;
}

/** Gives what a camera gets at the focus: the wanted values, each in the unit of its name, and the facts about them. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<camera_readout> camera_readout_compute(const telescope &telescope, const camera &camera, const observer &observer, uint32_t wanted)
{
    result<camera_readout> given = access::blank<camera_readout>();
    access::finish(given, ::fieldstop_camera_readout_compute(&telescope.c(), &camera.c(), &observer.c(), wanted, access::place(given)));
    return given;
}

/** Fills `choices` with the best eyepieces for a target, each alone and with each Barlow or reducer, the best first. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status visual_choose(const telescope &telescope, const eyepiece *eyepieces, uint8_t eyepiece_count, const uint32_t *amplifiers_q16, uint8_t amplifier_count, const observer &observer, const visual_target &target, ::fieldstop_visual_choice *choices, uint8_t *choice_count)
{
    return status(::fieldstop_visual_choose(&telescope.c(), eyepieces == nullptr ? nullptr : &eyepieces->c(), eyepiece_count, amplifiers_q16, amplifier_count, &observer.c(), &target.c(), choices, choice_count));
}

/** Fills `choices` with the best cameras for a target, each alone and with each Barlow or reducer, the best first. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status camera_choose(const telescope &telescope, const camera *cameras, uint8_t camera_count, const uint32_t *amplifiers_q16, uint8_t amplifier_count, const observer &observer, const camera_target &target, ::fieldstop_camera_choice *choices, uint8_t *choice_count)
{
    return status(::fieldstop_camera_choose(&telescope.c(), cameras == nullptr ? nullptr : &cameras->c(), camera_count, amplifiers_q16, amplifier_count, &observer.c(), &target.c(), choices, choice_count));
}

/** Gives 0 for a Newtonian's layout that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status newtonian_layout_check(const newtonian_layout &layout)
{
    return status(::fieldstop_newtonian_layout_check(&layout.c()));
}

/** Gives 0 for a layout of two mirrors that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status two_mirror_layout_check(const two_mirror_layout &layout)
{
    return status(::fieldstop_two_mirror_layout_check(&layout.c()));
}

/** Gives how exact the focus must be and what it costs to be off: the wanted values, each in the unit of its name, and the facts about them. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<focus_readout> focus_readout_compute(const telescope &telescope, const focuser &focuser, const observer &observer, uint32_t wanted)
{
    result<focus_readout> given = access::blank<focus_readout>();
    access::finish(given, ::fieldstop_focus_readout_compute(&telescope.c(), &focuser.c(), &observer.c(), wanted, access::place(given)));
    return given;
}

/** Gives a Newtonian's diagonal, the light that it passes, and the height of the eyepiece: the wanted values, each in the unit of its name, and the facts about them. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<newtonian_readout> newtonian_readout_compute(const telescope &telescope, const newtonian_layout &layout, uint32_t wanted)
{
    result<newtonian_readout> given = access::blank<newtonian_readout>();
    access::finish(given, ::fieldstop_newtonian_readout_compute(&telescope.c(), &layout.c(), wanted, access::place(given)));
    return given;
}

/** Gives where the second mirror of two goes and what it is: the wanted values, each in the unit of its name, and the facts about them. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<two_mirror_readout> two_mirror_readout_compute(const telescope &telescope, const two_mirror_layout &layout, uint32_t wanted)
{
    result<two_mirror_readout> given = access::blank<two_mirror_readout>();
    access::finish(given, ::fieldstop_two_mirror_readout_compute(&telescope.c(), &layout.c(), wanted, access::place(given)));
    return given;
}

/* The stored record: equipment, observers and sites with their names, as bytes in EEPROM or flash. */

/** Makes a record without entries of the buffer's first 28 bytes, and gives 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_begin(uint8_t *record, uint16_t capacity)
{
    return status(::fieldstop_record_begin(record, capacity));
}

/** Gives 0 for a good record at the front of these bytes: its checksum is right and its equipment passes the checks. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_check(const uint8_t *record, uint16_t length)
{
    return status(::fieldstop_record_check(record, length));
}

/** Gives the record's own length in bytes, out of its header. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> record_get_length(const uint8_t *record, uint16_t length)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_record_get_length(record, length, &given);
    return access::given<uint16_t>(number, given);
}

/** Gives how many entries of a kind there are. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint8_t> record_get_count(const uint8_t *record, uint16_t length, uint8_t kind)
{
    uint8_t given;
    const fieldstop_status number = ::fieldstop_record_get_count(record, length, kind, &given);
    return access::given<uint8_t>(number, given);
}

/** Gives the name of an entry. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<equipment_name> record_get_name(const uint8_t *record, uint16_t length, uint8_t kind, uint8_t index)
{
    result<equipment_name> given = access::plain_blank<equipment_name>();
    access::finish(given, ::fieldstop_record_get_name(record, length, kind, index, access::plain_place(given)));
    return given;
}

/** Gives which entries are in use. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<in_use> record_get_in_use(const uint8_t *record, uint16_t length)
{
    result<in_use> given = access::plain_blank<in_use>();
    access::finish(given, ::fieldstop_record_get_in_use(record, length, access::plain_place(given)));
    return given;
}

/** Gives a telescope, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<telescope> record_get_telescope(const uint8_t *record, uint16_t length, uint8_t index)
{
    result<telescope> given = access::blank<telescope>();
    access::finish(given, ::fieldstop_record_get_telescope(record, length, index, access::place(given)));
    return given;
}

/** Gives an eyepiece, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<eyepiece> record_get_eyepiece(const uint8_t *record, uint16_t length, uint8_t index)
{
    result<eyepiece> given = access::blank<eyepiece>();
    access::finish(given, ::fieldstop_record_get_eyepiece(record, length, index, access::place(given)));
    return given;
}

/** Gives what a Barlow or reducer multiplies the focal length by, Q16.16, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<q16> record_get_amplifier(const uint8_t *record, uint16_t length, uint8_t index)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_record_get_amplifier(record, length, index, &given);
    return access::given<q16>(number, given);
}

/** Gives a camera, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<camera> record_get_camera(const uint8_t *record, uint16_t length, uint8_t index)
{
    result<camera> given = access::blank<camera>();
    access::finish(given, ::fieldstop_record_get_camera(record, length, index, access::place(given)));
    return given;
}

/** Gives an observer, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<observer> record_get_observer(const uint8_t *record, uint16_t length, uint8_t index)
{
    result<observer> given = access::blank<observer>();
    access::finish(given, ::fieldstop_record_get_observer(record, length, index, access::place(given)));
    return given;
}

/** Gives a site, of a record. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<site> record_get_site(const uint8_t *record, uint16_t length, uint8_t index)
{
    result<site> given = access::blank<site>();
    access::finish(given, ::fieldstop_record_get_site(record, length, index, access::place(given)));
    return given;
}

/** Puts a telescope and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_telescope(uint8_t *record, uint16_t capacity, uint8_t index, const telescope &telescope, const equipment_name &name)
{
    return status(::fieldstop_record_put_telescope(record, capacity, index, &telescope.c(), &name));
}

/** Puts an eyepiece and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_eyepiece(uint8_t *record, uint16_t capacity, uint8_t index, const eyepiece &eyepiece, const equipment_name &name)
{
    return status(::fieldstop_record_put_eyepiece(record, capacity, index, &eyepiece.c(), &name));
}

/** Puts a Barlow or reducer and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_amplifier(uint8_t *record, uint16_t capacity, uint8_t index, q16 amplification_q16, const equipment_name &name)
{
    return status(::fieldstop_record_put_amplifier(record, capacity, index, amplification_q16.count(), &name));
}

/** Puts a camera and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_camera(uint8_t *record, uint16_t capacity, uint8_t index, const camera &camera, const equipment_name &name)
{
    return status(::fieldstop_record_put_camera(record, capacity, index, &camera.c(), &name));
}

/** Puts an observer and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_observer(uint8_t *record, uint16_t capacity, uint8_t index, const observer &observer, const equipment_name &name)
{
    return status(::fieldstop_record_put_observer(record, capacity, index, &observer.c(), &name));
}

/** Puts a site and its name into a record, and gives 0: in place of the one of that index, or one more where the index is their number. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_site(uint8_t *record, uint16_t capacity, uint8_t index, const site &site, const equipment_name &name)
{
    return status(::fieldstop_record_put_site(record, capacity, index, &site.c(), &name));
}

/** Says which entries are in use, and gives 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_put_in_use(uint8_t *record, uint16_t capacity, const in_use &used)
{
    return status(::fieldstop_record_put_in_use(record, capacity, &used));
}

/** Takes an entry out of a record, and gives 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status record_remove(uint8_t *record, uint16_t capacity, uint8_t kind, uint8_t index)
{
    return status(::fieldstop_record_remove(record, capacity, kind, index));
}

/** Gives 0 for a slot pair that can be used; otherwise the cause, with the number of the first bad member, counted from 1, in the place of the argument. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status slot_pair_check(const slot_pair &places)
{
    return status(::fieldstop_slot_pair_check(&places));
}

/** Reads the last good record into the buffer, and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> store_load(const slot_pair &places, fieldstop_read read, void *context, uint8_t *record, uint16_t capacity)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_store_load(&places, read, context, record, capacity, &given);
    return access::given<uint16_t>(number, given);
}

/** Saves a record into the slot that does not have the last good one, and gives 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE status store_save(const slot_pair &places, fieldstop_read read, fieldstop_write write, fieldstop_erase erase, void *context, const uint8_t *record, uint16_t capacity, uint8_t newer)
{
    return status(::fieldstop_store_save(&places, read, write, erase, context, record, capacity, newer));
}

/* Quantities as characters of a display: integers only, into a buffer of the caller's. */

/** Gives the style of plain ASCII; never null. */
FIELDSTOP_INLINE const text_style &text_style_ascii()
{
    return *::fieldstop_text_style_ascii();
}

/** Gives the style of UTF-8, with the signs of degree, prime, double prime, micro and times; never null. */
FIELDSTOP_INLINE const text_style &text_style_utf8()
{
    return *::fieldstop_text_style_utf8();
}

/** Gives the style of character displays with ROM A00 (Japanese) of the HD44780U; never null. */
FIELDSTOP_INLINE const text_style &text_style_hd44780_a00()
{
    return *::fieldstop_text_style_hd44780_a00();
}

/** Gives the style of character displays with ROM A02 (European) of the HD44780U; never null. */
FIELDSTOP_INLINE const text_style &text_style_hd44780_a02()
{
    return *::fieldstop_text_style_hd44780_a02();
}

/** Writes an integer with its unit as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_count(uint32_t count, uint8_t unit, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_count(count, unit, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a length in millimetres as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_length_mm(micrometres length_um, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_length_mm(length_um.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a length in micrometres as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_length_um(nanometres length_nm, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_length_um(length_nm.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a plain ratio as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_ratio(q16 ratio_q16, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_ratio(ratio_q16.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a magnification, as in 62.5x as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_magnification(q16 magnification_q16, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_magnification(magnification_q16.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a focal ratio, as in f/6.0 as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_focal_ratio(q16 focal_ratio_q16, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focal_ratio(focal_ratio_q16.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a ratio in per cent as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_percent(q16 ratio_q16, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_percent(ratio_q16.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes an angle in seconds of arc as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_arcseconds(microarcseconds angle_uas, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_arcseconds(angle_uas.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a magnitude as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_magnitude(millimagnitudes magnitude_mmag, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_magnitude(magnitude_mmag.count(), decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes an angle in degrees, minutes and seconds as text and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_angle(milliarcseconds angle_mas, uint8_t form, uint8_t decimals, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_angle(angle_mas.count(), form, decimals, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the text of a unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_unit(uint8_t unit, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_unit(unit, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the English labels of the visual pages for 20 columns and more, an array of FIELDSTOP_VISUAL_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_visual_labels()
{
    return ::fieldstop_text_visual_labels();
}

/** Gives the English labels of the visual pages for 8 and 16 columns, an array of FIELDSTOP_VISUAL_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_visual_labels_short()
{
    return ::fieldstop_text_visual_labels_short();
}

/** Writes one line of the visual pages and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_visual_line(const visual_readout &readout, const char *const *labels, const text_style &style, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_line(&readout.c(), labels, &style, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the visual pages with its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_visual_value(const visual_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_value(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the visual pages without its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_visual_number(const visual_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_number(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the unit of a value of the visual pages and gives its length in bytes, which may be 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_visual_unit(const visual_readout &readout, uint8_t row, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_visual_unit(&readout.c(), row, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the English labels of the camera pages for 20 columns and more, an array of FIELDSTOP_CAMERA_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_camera_labels()
{
    return ::fieldstop_text_camera_labels();
}

/** Gives the English labels of the camera pages for 8 and 16 columns, an array of FIELDSTOP_CAMERA_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_camera_labels_short()
{
    return ::fieldstop_text_camera_labels_short();
}

/** Writes one line of the camera pages and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_camera_line(const camera_readout &readout, const char *const *labels, const text_style &style, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_line(&readout.c(), labels, &style, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the camera pages with its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_camera_value(const camera_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_value(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the camera pages without its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_camera_number(const camera_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_number(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the unit of a value of the camera pages and gives its length in bytes, which may be 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_camera_unit(const camera_readout &readout, uint8_t row, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_camera_unit(&readout.c(), row, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the part of a line that is different from what is shown, in characters. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<span> text_changed(const char *shown, uint16_t shown_length, const char *line, uint16_t line_length, const text_style &style)
{
    result<span> given = access::plain_blank<span>();
    access::finish(given, ::fieldstop_text_changed(shown, shown_length, line, line_length, &style, access::plain_place(given)));
    return given;
}

/** Gives a caution in English, one of FIELDSTOP_CAUTION_...; an empty text for any other number, never null. */
FIELDSTOP_INLINE const char *text_caution(uint8_t caution)
{
    return ::fieldstop_text_caution(caution);
}

/** Gives how many lines of `columns` characters a sentence takes, broken between words; 0 for a null pointer. */
FIELDSTOP_INLINE uint8_t text_caution_lines(const char *sentence, uint8_t columns)
{
    return ::fieldstop_text_caution_lines(sentence, columns);
}

/** Writes one line of a sentence broken between words and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_caution_line(const char *sentence, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_caution_line(sentence, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the English labels of the focus pages for 20 columns and more, an array of FIELDSTOP_FOCUS_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_focus_labels()
{
    return ::fieldstop_text_focus_labels();
}

/** Gives the English labels of the focus pages for 8 and 16 columns, an array of FIELDSTOP_FOCUS_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_focus_labels_short()
{
    return ::fieldstop_text_focus_labels_short();
}

/** Writes one line of the focus pages and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_focus_line(const focus_readout &readout, const char *const *labels, const text_style &style, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_line(&readout.c(), labels, &style, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the focus pages with its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_focus_value(const focus_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_value(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the focus pages without its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_focus_number(const focus_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_number(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the unit of a value of the focus pages and gives its length in bytes, which may be 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_focus_unit(const focus_readout &readout, uint8_t row, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_focus_unit(&readout.c(), row, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the English labels of the pages of a Newtonian's layout for 20 columns and more, an array of FIELDSTOP_NEWTONIAN_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_newtonian_labels()
{
    return ::fieldstop_text_newtonian_labels();
}

/** Gives the English labels of the pages of a Newtonian's layout for 8 and 16 columns, an array of FIELDSTOP_NEWTONIAN_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_newtonian_labels_short()
{
    return ::fieldstop_text_newtonian_labels_short();
}

/** Writes one line of the pages of a Newtonian's layout and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_newtonian_line(const newtonian_readout &readout, const char *const *labels, const text_style &style, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_line(&readout.c(), labels, &style, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the pages of a Newtonian's layout with its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_newtonian_value(const newtonian_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_value(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the pages of a Newtonian's layout without its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_newtonian_number(const newtonian_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_number(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the unit of a value of the pages of a Newtonian's layout and gives its length in bytes, which may be 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_newtonian_unit(const newtonian_readout &readout, uint8_t row, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_newtonian_unit(&readout.c(), row, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Gives the English labels of the pages of two mirrors' layout for 20 columns and more, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_two_mirror_labels()
{
    return ::fieldstop_text_two_mirror_labels();
}

/** Gives the English labels of the pages of two mirrors' layout for 8 and 16 columns, an array of FIELDSTOP_TWO_MIRROR_ROWS; never null. */
FIELDSTOP_INLINE const char *const *text_two_mirror_labels_short()
{
    return ::fieldstop_text_two_mirror_labels_short();
}

/** Writes one line of the pages of two mirrors' layout and gives its length in bytes; it is always `columns` characters long. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_two_mirror_line(const two_mirror_readout &readout, const char *const *labels, const text_style &style, uint8_t columns, uint8_t line, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_line(&readout.c(), labels, &style, columns, line, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the pages of two mirrors' layout with its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_two_mirror_value(const two_mirror_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_value(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes a value of the pages of two mirrors' layout without its unit and gives its length in bytes. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_two_mirror_number(const two_mirror_readout &readout, uint8_t row, const text_style &style, uint8_t width, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_number(&readout.c(), row, &style, width, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/** Writes the unit of a value of the pages of two mirrors' layout and gives its length in bytes, which may be 0. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint16_t> text_two_mirror_unit(const two_mirror_readout &readout, uint8_t row, const text_style &style, buffer text)
{
    uint16_t given;
    const fieldstop_status number = ::fieldstop_text_two_mirror_unit(&readout.c(), row, &style, text.text(), text.capacity(), &given);
    return access::given<uint16_t>(number, given);
}

/* What a person types on a keypad or sends over a line, back to a quantity: integers only, correctly rounded. */

/** Reads what a person typed as a quantity, in the integer unit of its kind. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<uint32_t> entry_read(const char *text, uint16_t text_length, uint8_t kind, micrometres aperture_um, const text_style &style)
{
    uint32_t given;
    const fieldstop_status number = ::fieldstop_entry_read(text, text_length, kind, aperture_um.count(), &style, &given);
    return access::given<uint32_t>(number, given);
}

/** Tells whether what a person has typed so far is complete, partial or wrong, with the reason and the place. */
FIELDSTOP_CHECKED FIELDSTOP_INLINE result<entry_state> entry_check(const char *text, uint16_t text_length, uint8_t kind, micrometres aperture_um, const text_style &style)
{
    result<entry_state> given = access::plain_blank<entry_state>();
    access::finish(given, ::fieldstop_entry_check(text, text_length, kind, aperture_um.count(), &style, access::plain_place(given)));
    return given;
}
} // namespace fieldstop

#endif // FIELDSTOP_HPP
