/* What a Cortex-M part does from reset to main; output and exit go to the debugger by newlib's semihosting. */
#include <stdint.h>
#include <stdlib.h>

extern uint32_t stack_top[], data_start[], data_end[], data_stored[], bss_start[], bss_end[];
extern void initialise_monitor_handles(void);
extern int main(void);

void reset(void);
void reset(void)
{
    uint32_t *from = data_stored;
    uint32_t *to;

#ifdef __ARM_FP
    /* Full access to the FPU, in the part's CPACR. */
    *(volatile uint32_t *)0xE000ED88 |= 0xFu << 20;
    __asm__ volatile("dsb\n\tisb");
#endif
    for (to = data_start; to < data_end; to++) {
        *to = *from++;
    }
    for (to = bss_start; to < bss_end; to++) {
        *to = 0;
    }
    initialise_monitor_handles();
    exit(main());
}

static void fault(void)
{
    abort();
}

/* newlib asks for them where there is no start file of its own. */
void _init(void);
void _fini(void);
void _init(void) {}
void _fini(void) {}

__attribute__((section(".vectors"), used)) static void *const vectors[16] = {
    stack_top, (void *)(uintptr_t)reset, (void *)(uintptr_t)fault, (void *)(uintptr_t)fault,
};
