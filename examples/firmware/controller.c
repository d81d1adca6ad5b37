/*
 * A small hand controller: what a telescope and an eyepiece show, on a display of four lines of twenty characters.
 *
 * The display hangs on a serial line and understands ECMA-48's "cursor position", as any terminal does; its buttons send a
 * letter each: t next telescope, e next eyepiece, p next page, o off. Nothing is drawn again that has not changed.
 *
 * Equipment and place are invented. Put your own in; on a part with more eyepieces than this only the tables grow.
 */
#include "board.h"
#include "fieldstop.h"

enum { COLUMNS = 20, ROWS = 4, PAGES = (FIELDSTOP_VISUAL_ROWS + ROWS - 1) / ROWS };
#define MM(mm) ((uint32_t)((mm) * 1000.0 + 0.5))
#define Q16(x) ((uint32_t)((x) * 65536.0 + 0.5))
#define COUNT(array) (sizeof(array) / sizeof(array)[0])

/* In flash. A zero is "not known"; 1.0 is no Barlow lens. */
static const fieldstop_telescope telescopes[] = {
    {MM(178), MM(1130), MM(47), Q16(1.0), Q16(0.83)}, /* a reflector of the night school in the valley */
    {MM(93), MM(610), 0, Q16(1.0), Q16(0.96)},        /* its refractor */
};
static const fieldstop_eyepiece eyepieces[] = {
    {MM(28), MM(33.5), 0, 0, {0, 0, 0}},
    {MM(13), MM(16.2), 0, 0, {0, 0, 0}},
    {MM(4.5), 0, 82u * 3600000u, 0, {0, 0, 0}}, /* its maker tells the apparent field only */
};
static const fieldstop_observer observer = {5400, MM(6.5), 120000, 2200000, 550};

static unsigned telescope, eyepiece, page;
/* What the display shows. */
static char shown[ROWS][COLUMNS];

static void send_number(unsigned n)
{
    if (n >= 10) {
        send_number(n / 10);
    }
    board_send((char)('0' + n % 10));
}

static void move_to(unsigned row, unsigned column)
{
    board_send('\033');
    board_send('[');
    send_number(row + 1);
    board_send(';');
    send_number(column + 1);
    board_send('H');
}

/* Sends the part of a line that is not on the display yet. */
static void show(unsigned row, const char *line)
{
    fieldstop_span span;
    unsigned i;

    if (fieldstop_text_changed(shown[row], COLUMNS, line, COLUMNS, fieldstop_text_style_ascii(), &span) != 0
        || span.count == 0) {
        return;
    }
    move_to(row, span.first);
    for (i = span.first; i < span.first + span.count; i++) {
        board_send(line[i]);
        shown[row][i] = line[i];
    }
}

/* Says which of the three structs a status blames, in the library's words. */
static void complain(fieldstop_status status)
{
    static const char *const which[] = {"", "telescope", "eyepiece", "observer"};
    const char *texts[] = {"check the", which[FIELDSTOP_ARGUMENT(status) & 3], fieldstop_cause_text(status), ""};
    unsigned row, i;

    for (row = 0; row < ROWS; row++) {
        char line[COLUMNS];
        const char *text = texts[row];
        for (i = 0; i < COLUMNS; i++) {
            line[i] = *text != '\0' ? *text++ : ' ';
        }
        show(row, line);
    }
}

static void draw(void)
{
    fieldstop_visual_readout readout;
    fieldstop_status status;
    unsigned row;

    status = fieldstop_visual_readout_compute(&telescopes[telescope], &eyepieces[eyepiece], &observer, 0xffffffffu, &readout);
    for (row = 0; row < ROWS && status == 0; row++) {
        char line[COLUMNS];
        uint16_t length;
        status = fieldstop_text_visual_line(&readout, fieldstop_text_visual_labels(), fieldstop_text_style_ascii(), COLUMNS,
                                            (uint8_t)(page * ROWS + row), line, COLUMNS, &length);
        if (status == 0) {
            show(row, line);
        }
    }
    if (status != 0) {
        complain(status);
    }
}

int main(void)
{
    char button = 0;
    unsigned row, column;

    board_start();
    /* An empty display, as far as we know. */
    for (row = 0; row < ROWS; row++) {
        move_to(row, 0);
        for (column = 0; column < COLUMNS; column++) {
            shown[row][column] = ' ';
            board_send(' ');
        }
    }
    while (button != 'o') {
        draw();
        while ((button = board_button()) == 0) {
        }
        telescope = (telescope + (button == 't')) % COUNT(telescopes);
        eyepiece = (eyepiece + (button == 'e')) % COUNT(eyepieces);
        page = (page + (button == 'p')) % PAGES;
    }
    move_to(ROWS, 0);
    board_off();
    return 0;
}
