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
@CAUSES@};

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
@UNITS@} // namespace unit

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

@ALIASES@
namespace literals {
@LITERALS@
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

@CONSTANTS@
@STRUCTS@
@FUNCTIONS@
} // namespace fieldstop

#endif // FIELDSTOP_HPP
