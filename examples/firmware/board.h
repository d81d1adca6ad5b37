/* What the firmware asks of its board. */
#ifndef BOARD_H
#define BOARD_H

#ifdef __cplusplus
extern "C" {
#endif

void board_start(void);
/* The display's serial line. */
void board_send(char c);
/* A button's letter, or 0 if none was pressed. */
char board_button(void);
/* The end, which a real board does not have: it sleeps. */
void board_off(void);

#ifdef __cplusplus
}
#endif

#endif
