/* An image that does nothing: what a function adds to it is its flash. */
extern unsigned stack_top[];
void reset(void);
void reset(void)
{
    for (;;) {
    }
}
__attribute__((section(".vectors"), used)) static void *const vectors[2] = {stack_top, (void *)reset};
