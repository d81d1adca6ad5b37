/*
 * A small camera controller: what a camera shows behind a telescope, how many frames a target takes, and how exactly the
 * focus motor must stand, on a display of two lines of sixteen characters.
 *
 * The display hangs on a serial line and understands ECMA-48's "cursor position", as any terminal does; its buttons send a
 * letter each: c next camera, b binning, g glass before the camera (none, reducer, Barlow), t next target, p next page,
 * o off. Nothing is drawn again that has not changed.
 *
 * Equipment and targets are invented. Put your own in; the compiler refuses a length in the wrong unit.
 */
#include "board.h"
#include "fieldstop.hpp"

namespace {

using namespace fieldstop::literals;
using fieldstop::result;

constexpr uint8_t columns = 16, rows = 2, most_binning = 3;

/* In flash. */
constexpr fieldstop::telescope telescope = fieldstop::telescope()
                                               .with_aperture(186000_um)
                                               .with_focal_length(790000_um)
                                               .with_obstruction(71000_um)
                                               .with_throughput(0.79_q16);
constexpr fieldstop::camera cameras[] = {
    fieldstop::camera().with_pixel(4300_nm).with_columns(4144).with_rows(2822),
    fieldstop::camera().with_pixel(2650_nm).with_columns(1880).with_rows(1250),
};
/* Nothing, a reducer, a Barlow lens. */
constexpr fieldstop::q16 glasses[] = {1.0_q16, 0.78_q16, 1.9_q16};
/* No eye looks here: what concerns it is 0, not known. */
constexpr fieldstop::observer observer = fieldstop::observer().with_seeing(2400000_uas).with_wavelength(550_nm);

/* The focus: travel of one step of the motor, and the steel tube that cools through the night. */
constexpr fieldstop::nanometres motor_step = 450_nm;
constexpr fieldstop::micrometres tube_length = 690000_um;
constexpr fieldstop::parts_per_billion_per_kelvin steel = 11700_ppb_per_k;

struct target {
    const char *name;
    fieldstop::milliarcseconds width, height;
};
constexpr target targets[] = {
    {"Reed veil", 11400000_mas, 3900000_mas},
    {"Comb stars", 1500000_mas, 1380000_mas},
    {"Lantern", 82000_mas, 64000_mas},
};

/* Pages in their order: the camera's first, two of its lines each. */
constexpr uint8_t camera_pages = (FIELDSTOP_CAMERA_ROWS + rows - 1) / rows;
constexpr uint8_t target_page = camera_pages, focus_page = camera_pages + 1, limits_page = camera_pages + 2;
constexpr uint8_t pages = camera_pages + 3;

template <typename type, unsigned count> constexpr uint8_t count_of(const type (&)[count])
{
    return count;
}

/* What the display shows. */
char shown[rows][columns];

void send_number(unsigned n)
{
    if (n >= 10) {
        send_number(n / 10);
    }
    board_send(static_cast<char>('0' + n % 10));
}

void move_to(unsigned row, unsigned column)
{
    board_send('\033');
    board_send('[');
    send_number(row + 1);
    board_send(';');
    send_number(column + 1);
    board_send('H');
}

/* A line of the display, written from left to right. */
class line {
public:
    explicit line(const char *words)
    {
        for (char &character : text_) {
            character = ' ';
        }
        add(words);
    }
    uint8_t room() const { return static_cast<uint8_t>(columns - length_); }
    fieldstop::buffer rest() { return fieldstop::buffer(text_ + length_, room()); }
    void add(const char *words)
    {
        while (length_ < columns && *words != '\0') {
            text_[length_++] = *words++;
        }
    }
    /* What a function has written into the rest; where there is no value, a dash at the end. */
    void add(result<uint16_t> written)
    {
        if (written) {
            length_ = static_cast<uint8_t>(length_ + written.value());
        } else {
            text_[columns - 1] = '-';
            length_ = columns;
        }
    }
    /* Sends the part that is not on the display yet. */
    void show(uint8_t row) const
    {
        const auto changed = fieldstop::text_changed(shown[row], columns, text_, columns, style());
        if (!changed || changed.value().count == 0) {
            return;
        }
        const unsigned first = changed.value().first, behind = first + changed.value().count;
        move_to(row, first);
        for (unsigned i = first; i < behind; i++) {
            board_send(text_[i]);
            shown[row][i] = text_[i];
        }
    }
    static const fieldstop::text_style &style() { return fieldstop::text_style_ascii(); }

private:
    char text_[columns];
    uint8_t length_ = 0;
};

void show_words(uint8_t row, const char *words)
{
    line(words).show(row);
}

/* Values at the right end of a line. One that is not known hands its status on, in place of its text's. */

void show_angle(uint8_t row, const char *words, fieldstop::milliarcseconds angle)
{
    line on(words);
    on.add(fieldstop::text_angle(angle, fieldstop::angle_by_size, 0, line::style(), on.room(), on.rest()));
    on.show(row);
}

void show_micrometres(uint8_t row, const char *words, result<fieldstop::nanometres> length, uint8_t decimals)
{
    line on(words);
    on.add(length ? fieldstop::text_length_um(length.value(), decimals, line::style(), on.room(), on.rest())
                  : result<uint16_t>(length.status()));
    on.show(row);
}

void show_ratio(uint8_t row, const char *words, result<fieldstop::q16> ratio)
{
    line on(words);
    on.add(ratio ? fieldstop::text_ratio(ratio.value(), 1, line::style(), on.room(), on.rest())
                 : result<uint16_t>(ratio.status()));
    on.show(row);
}

result<uint16_t> write_count(result<uint32_t> count, uint8_t unit, uint8_t width, fieldstop::buffer text)
{
    return count ? fieldstop::text_count(count.value(), unit, line::style(), width, text) : result<uint16_t>(count.status());
}

/* Frames in a row that a length of sky takes; each takes an eighth of the one before it again. */
result<uint32_t> frames(fieldstop::milliarcseconds length, result<fieldstop::milliarcseconds> frame)
{
    return frame ? fieldstop::tiles_fx(length, frame.value(), fieldstop::milliarcseconds(frame.value().count() >> 3))
                 : result<uint32_t>(frame.status());
}

void draw_target(const fieldstop::camera_readout &readout, const target &of)
{
    line on("Frames");
    on.add(write_count(frames(of.width, readout.frame_width()), fieldstop::unit_none, 5, on.rest()));
    on.add(" x ");
    on.add(write_count(frames(of.height, readout.frame_height()), fieldstop::unit_none, 0, on.rest()));
    show_angle(0, of.name, of.width);
    on.show(1);
}

/* How far the focus may be off, to each side. */
result<fieldstop::nanometres> depth_of_focus(const fieldstop::camera_readout &readout)
{
    const auto ratio = readout.focal_ratio();
    return ratio ? fieldstop::depth_of_focus_fx(ratio.value(), observer.wavelength())
                 : result<fieldstop::nanometres>(ratio.status());
}

void draw_focus(const fieldstop::camera_readout &readout)
{
    const auto depth = depth_of_focus(readout);
    const auto steps = depth ? fieldstop::motor_steps_fx(depth.value(), motor_step) : result<uint32_t>(depth.status());
    line on("or +/-");
    on.add(write_count(steps, fieldstop::unit_step, on.room(), on.rest()));
    show_micrometres(0, "Focus +/-", depth, 0);
    on.show(1);
}

/* The tube's change of temperature that takes the focus out of its depth, and how wide one step makes a point. */
void draw_limits(const fieldstop::camera_readout &readout)
{
    const auto ratio = readout.focal_ratio();
    const auto depth = depth_of_focus(readout);
    const auto change = depth ? fieldstop::refocus_temperature_fx(tube_length, steel, depth.value())
                              : result<fieldstop::millikelvin>(depth.status());
    show_ratio(0, "Refocus at K",
               change ? fieldstop::q16_from_milli_fx(fieldstop::thousandths(change.value().count()))
                      : result<fieldstop::q16>(change.status()));
    show_micrometres(1, "A step",
                     ratio ? fieldstop::defocus_blur_fx(motor_step, ratio.value())
                           : result<fieldstop::nanometres>(ratio.status()),
                     2);
}

void draw_camera(const fieldstop::camera_readout &readout, uint8_t page)
{
    for (uint8_t row = 0; row < rows; row++) {
        line on("");
        on.add(fieldstop::text_camera_line(readout, fieldstop::text_camera_labels_short(), line::style(), columns,
                                           static_cast<uint8_t>(page * rows + row), on.rest()));
        on.show(row);
    }
}

void draw(uint8_t page, fieldstop::q16 glass, const fieldstop::camera &camera, const target &of)
{
    const auto readout = fieldstop::camera_readout_compute(telescope.with_amplification(glass), camera, observer,
                                                           fieldstop::camera_all);
    if (!readout) {
        /* Which of the three structs: telescope 1, camera 2, observer 3. */
        static const char *const which[] = {"", "Check telescope", "Check camera", "Check observer"};
        show_words(0, which[readout.status().argument() & 3]);
        show_words(1, readout.status().text());
    } else if (page == target_page) {
        draw_target(readout.value(), of);
    } else if (page == focus_page) {
        draw_focus(readout.value());
    } else if (page == limits_page) {
        draw_limits(readout.value());
    } else {
        draw_camera(readout.value(), page);
    }
}

char wait_for_button()
{
    char button;
    while ((button = board_button()) == 0) {
    }
    return button;
}

uint8_t next(uint8_t now, bool pressed, uint8_t count)
{
    const unsigned then = now + (pressed ? 1u : 0u);
    return then < count ? static_cast<uint8_t>(then) : uint8_t(0);
}

} // namespace

int main()
{
    uint8_t camera = 0, binning = 0, glass = 0, target = 0, page = 0;
    char button;

    board_start();
    /* An empty display, as far as we know. */
    for (uint8_t row = 0; row < rows; row++) {
        move_to(row, 0);
        for (char &character : shown[row]) {
            character = ' ';
            board_send(' ');
        }
    }
    /* The usual caution, until somebody has seen it. */
    show_words(0, "Never at the Sun");
    show_words(1, "without a filter");
    button = wait_for_button();
    while (button != 'o') {
        draw(page, glasses[glass], cameras[camera].with_binning(static_cast<uint8_t>(binning + 1)), targets[target]);
        button = wait_for_button();
        camera = next(camera, button == 'c', count_of(cameras));
        binning = next(binning, button == 'b', most_binning);
        glass = next(glass, button == 'g', count_of(glasses));
        target = next(target, button == 't', count_of(targets));
        page = next(page, button == 'p', pages);
    }
    move_to(rows, 0);
    board_off();
    return 0;
}
