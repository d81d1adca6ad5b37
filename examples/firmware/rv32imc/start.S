# From reset to main: the stack, variables with their first values out of flash, the others 0.
    .section .start, "ax"
    .globl start
start:
    la sp, stack_top
    la t0, data_start
    la t1, data_end
    la t2, data_stored
1:  bgeu t0, t1, 2f
    lw t3, 0(t2)
    sw t3, 0(t0)
    addi t0, t0, 4
    addi t2, t2, 4
    j 1b
2:  la t0, bss_start
    la t1, bss_end
3:  bgeu t0, t1, 4f
    sw zero, 0(t0)
    addi t0, t0, 4
    j 3b
4:  la t0, trap
    csrw mtvec, t0
    call main
    call board_off

# Where a fault goes.
    .balign 4
trap:
    j trap
