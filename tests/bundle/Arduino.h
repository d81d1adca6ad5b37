/* As much of Arduino's core as the example sketch uses; the serial port is where part.h sends characters. */
#include <stdint.h>

extern "C" {
#include "part.h"
}

struct SerialPort {
    void begin(unsigned long) {}
    void write(const uint8_t *text, unsigned count)
    {
        while (count-- > 0) {
            part_put((char)*text++);
        }
    }
    void println() { part_put('\n'); }
    void println(unsigned number)
    {
        part_put('!');
        part_put((char)('0' + number));
        println();
    }
};
static SerialPort Serial;

void setup();
void loop();

int main()
{
    setup();
    loop();
    return part_end();
}
