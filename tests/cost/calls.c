/* Counts the functions of text and setup, those of calls.h. */
#include "measure.h"
#include "fieldstop.h"
#include CASES
#include "calls.h"

static const struct row {
    const char *name;
    uintptr_t function;
    void (*arguments)(uint32_t *words);
    int gives_pointer;
} rows[] = {
#define ROW(name, ...) {#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 0},
#define OTHER(name, ...) {#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 1},
#define GIVER(name) {#name, (uintptr_t)fieldstop_##name, arguments_of_##name, 1},
    ROWS
};


static uint32_t count(const struct row *row, uint8_t whole)
{
    static uint32_t counts[MOST];
    uint32_t n = whole ? 4 * N : N, stack = 0, k;

    is_whole = whole;
    for (k = 0; k < n; k++) {
        struct call call = {row->function, {0}, 0};
        uint32_t used, status;

        prepare((uint16_t)k);
        row->arguments(call.words);
        status = measure(&call);
        if (!row->gives_pointer && (uint16_t)status != 0) {
            printf("%s: status %u\n", row->name, (unsigned)status);
            exit(1);
        }
        counts[k] = counted(&call);
        prepare((uint16_t)k);
        row->arguments(call.words);
        used = stack_of(call);
        stack = used > stack ? used : stack;
    }
    print_counts(counts, n);
    return stack;
}

int main(void)
{
    uint32_t i;

    verify();
    for (i = 0; i < sizeof rows / sizeof rows[0]; i++) {
        uint32_t stack, more;
        printf("%s", rows[i].name);
        stack = count(&rows[i], 0);
        more = count(&rows[i], 1);
        printf(" %u\n", (unsigned)(more > stack ? more : stack));
    }
    return 0;
}
