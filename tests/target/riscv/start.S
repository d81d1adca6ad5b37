# From reset to main; nothing is initialised, for nothing needs it.
    .section .start, "ax"
    .globl start
start:
    la sp, stack_top
    call main
1:  j 1b
