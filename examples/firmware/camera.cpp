/*
 * A small focuser box: what a camera shows on a telescope, how many frames a target takes, and how deep the focus is in
 * steps of the motor, on a display of two lines of sixteen characters.
 *
 * C++11 without heap, exceptions, RTTI or a standard library. Each length and angle has its unit in its type, and a result
 * is looked at before its value is used. The display hangs on a serial line and understands ECMA-48's "cursor position";
 * its buttons send a letter each: c next camera, g glass (none, reducer, Barlow), p next page, o off.
 *
 * Equipment, target and place are invented. Put your own in.
 */
extern "C" {
#include "board.h"
}
#include "fieldstop.hpp"

namespace {

using namespace fieldstop::literals;

enum : uint8_t { COLUMNS = 16, ROWS = 2, CAMERA_PAGES = (FIELDSTOP_CAMERA_ROWS + ROWS - 1) / ROWS, PAGES = CAMERA_PAGES + 2 };

/* In flash. */
constexpr fieldstop::telescope TELESCOPE = fieldstop::telescope()
                                               .with_aperture(117000_um)
                                               .with_focal_length(735000_um)
                                               .with_throughput(0.94_q16);
constexpr fieldstop::camera CAMERAS[] = {
    fieldstop::camera().with_pixel(4100_nm).with_columns(4128).with_rows(2772).with_binning(1),
    fieldstop::camera().with_pixel(2700_nm).with_columns(1936).with_rows(1096).with_binning(1),
};
constexpr fieldstop::q16 GLASS[] = {1.0_q16, 0.79_q16, 1.9_q16};
constexpr fieldstop::observer OBSERVER = fieldstop::observer().with_seeing(2600000_uas).with_wavelength(550_nm);
constexpr fieldstop::nanometres MOTOR_STEP = 1850_nm;
/* Three by two degrees, the frames overlapping by six minutes. */
constexpr fieldstop::milliarcseconds TARGET_WIDTH = 10800000_mas, TARGET_HEIGHT = 7200000_mas, OVERLAP = 360000_mas;

class display {
public:
    void start()
    {
        for (uint8_t row = 0; row < ROWS; row++) {
            move_to(row, 0);
            for (uint8_t column = 0; column < COLUMNS; column++) {
                shown_[row][column] = ' ';
                board_send(' ');
            }
        }
    }

    /* Sends the part of a line that is not on the display yet. */
    void show(uint8_t row, const char (&line)[COLUMNS])
    {
        const auto change =
            fieldstop::text_changed(shown_[row], COLUMNS, line, COLUMNS, *fieldstop_text_style_ascii());
        if (!change || change.value().count == 0) {
            return;
        }
        const uint16_t first = change.value().first, end = static_cast<uint16_t>(first + change.value().count);
        move_to(row, static_cast<uint8_t>(first));
        for (uint16_t column = first; column < end; column++) {
            board_send(shown_[row][column] = line[column]);
        }
    }

    void move_to(uint8_t row, uint8_t column)
    {
        board_send('\033');
        board_send('[');
        send_number(row + 1u);
        board_send(';');
        send_number(column + 1u);
        board_send('H');
    }

private:
    static void send_number(unsigned n)
    {
        if (n >= 10) {
            send_number(n / 10);
        }
        board_send(static_cast<char>('0' + n % 10));
    }

    char shown_[ROWS][COLUMNS];
};

/* A label at the left of a line, and room for a value of `WIDTH` characters at its right end. */
struct labelled {
    enum : uint8_t { WIDTH = 9 };
    char line[COLUMNS];

    explicit labelled(const char *label)
    {
        for (char &place : line) {
            place = *label != '\0' ? *label++ : ' ';
        }
    }
    fieldstop::buffer value() { return fieldstop::buffer(line + COLUMNS - WIDTH, WIDTH); }
    /* A dash where there is no value: the reason is of no use to somebody at the telescope. */
    template <typename value_type> labelled &or_dash(const fieldstop::result<value_type> &written)
    {
        if (!written) {
            line[COLUMNS - 1] = '-';
        }
        return *this;
    }
};

const fieldstop::text_style &style()
{
    return *fieldstop_text_style_ascii();
}

struct box {
    uint8_t camera, glass, page;
    display screen;

    void draw()
    {
        const auto readout = fieldstop::camera_readout_compute(
            TELESCOPE.with_amplification(GLASS[glass]), CAMERAS[camera], OBSERVER, FIELDSTOP_CAMERA_ALL);
        if (!readout) {
            screen.show(0, labelled("bad equipment").line);
            screen.show(1, labelled("").line);
        } else if (page < CAMERA_PAGES) {
            draw_camera(readout.value());
        } else if (page == CAMERA_PAGES) {
            draw_frames(readout.value());
        } else {
            draw_focus(readout.value());
        }
    }

    void draw_camera(const fieldstop::camera_readout &readout)
    {
        for (uint8_t row = 0; row < ROWS; row++) {
            char line[COLUMNS];
            const uint8_t number = static_cast<uint8_t>(page * ROWS + row);
            if (fieldstop::text_camera_line(readout, fieldstop_text_camera_labels_short(), style(), COLUMNS, number, line)) {
                screen.show(row, line);
            }
        }
    }

    /* How many frames the target takes, across and down. */
    void draw_frames(const fieldstop::camera_readout &readout)
    {
        const fieldstop::result<fieldstop::milliarcseconds> frame[] = {readout.frame_width(), readout.frame_height()};
        const fieldstop::milliarcseconds target[] = {TARGET_WIDTH, TARGET_HEIGHT};
        const char *const labels[] = {"Across", "Down"};
        for (uint8_t row = 0; row < ROWS; row++) {
            labelled line(labels[row]);
            const auto count = frame[row] ? fieldstop::tiles_fx(target[row], frame[row].value(), OVERLAP)
                                          : fieldstop::result<uint32_t>(frame[row].status());
            screen.show(row, line.or_dash(count ? fieldstop::text_count(count.value(), FIELDSTOP_UNIT_NONE, style(),
                                                                        labelled::WIDTH, line.value())
                                                : fieldstop::result<uint16_t>(count.status()))
                                 .line);
        }
    }

    /* How far the focus may be off, each side, as a length and in steps of the motor. */
    void draw_focus(const fieldstop::camera_readout &readout)
    {
        labelled depth_line("Depth"), steps_line("Steps");
        const auto ratio = readout.focal_ratio();
        const auto depth = ratio ? fieldstop::depth_of_focus_fx(ratio.value(), OBSERVER.wavelength())
                                 : fieldstop::result<fieldstop::nanometres>(ratio.status());
        const auto steps = depth ? fieldstop::motor_steps_fx(depth.value(), MOTOR_STEP)
                                 : fieldstop::result<uint32_t>(depth.status());
        screen.show(0, depth_line
                           .or_dash(depth ? fieldstop::text_length_um(depth.value(), 1, style(), labelled::WIDTH,
                                                                      depth_line.value())
                                          : fieldstop::result<uint16_t>(depth.status()))
                           .line);
        screen.show(1, steps_line
                           .or_dash(steps ? fieldstop::text_count(steps.value(), FIELDSTOP_UNIT_NONE, style(),
                                                                  labelled::WIDTH, steps_line.value())
                                          : fieldstop::result<uint16_t>(steps.status()))
                           .line);
    }
};

box here;

} // namespace

int main()
{
    char button = 0;

    board_start();
    here.screen.start();
    while (button != 'o') {
        here.draw();
        while ((button = board_button()) == 0) {
        }
        here.camera = static_cast<uint8_t>((here.camera + (button == 'c')) % (sizeof CAMERAS / sizeof CAMERAS[0]));
        here.glass = static_cast<uint8_t>((here.glass + (button == 'g')) % (sizeof GLASS / sizeof GLASS[0]));
        here.page = static_cast<uint8_t>((here.page + (button == 'p')) % PAGES);
    }
    here.screen.move_to(ROWS, 0);
    board_off();
    return 0;
}
