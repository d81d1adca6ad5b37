/*
 * A record is put together, saved and loaded on the part itself, over storages of both kinds in RAM, with the power cut at
 * every write: prints a checksum of all that comes of it. The same bits on every part.
 */
#include <stdint.h>

#include "fieldstop.h"
#include "part.h"

enum { SLOT = 256, RECORD = 160 };

static uint8_t storage[2 * SLOT];
static uint8_t buffer[RECORD];
static uint16_t writes_left;
static uint32_t sum = 2166136261u;

/* FNV-1a. */
static void add(uint32_t number)
{
    uint8_t i;

    for (i = 0; i < 4; i++) {
        sum = (sum ^ (number & 0xFFu)) * 16777619u;
        number >>= 8;
    }
}

static fieldstop_status read_part(void *context, uint32_t offset, uint8_t *bytes, uint16_t length)
{
    const uint8_t *from = (const uint8_t *)context + offset;

    while (length-- > 0) {
        *bytes++ = *from++;
    }
    return 0;
}

static fieldstop_status write_part(void *context, uint32_t offset, const uint8_t *bytes, uint16_t length)
{
    uint8_t *to = (uint8_t *)context + offset;

    if (writes_left == 0) {
        return 1;
    }
    writes_left--;
    while (length-- > 0) {
        *to++ = *bytes++;
    }
    return 0;
}

static fieldstop_status erase_part(void *context, uint32_t offset, uint32_t length)
{
    uint8_t *to = (uint8_t *)context + offset;

    while (length-- > 0) {
        *to++ = 0xFF;
    }
    return 0;
}

/* Loads what is there, and adds it to the sum. */
static void load(const fieldstop_slot_pair *places)
{
    uint16_t length = 0, i;
    uint8_t count = 0;
    uint32_t amplification_q16 = 0;
    fieldstop_eyepiece eyepiece = {0, 0, 0, 0, {0, 0, 0}};
    fieldstop_site site = {0, 0};

    add(fieldstop_store_load(places, read_part, storage, buffer, RECORD, &length));
    add(length);
    for (i = 0; i < length; i++) {
        add(buffer[i]);
    }
    add(fieldstop_record_check(buffer, length));
    add(fieldstop_record_get_count(buffer, length, FIELDSTOP_KIND_EYEPIECE, &count));
    add(count);
    add(fieldstop_record_get_eyepiece(buffer, length, 0, &eyepiece));
    add(eyepiece.focal_length_um);
    add(eyepiece.mapping);
    add(fieldstop_record_get_amplifier(buffer, length, 0, &amplification_q16));
    add(amplification_q16);
    add(fieldstop_record_get_site(buffer, length, 0, &site));
    add((uint32_t)site.latitude_bam);
}

static void keep(uint8_t write_bytes, fieldstop_erase erase)
{
    const fieldstop_slot_pair places = {0, SLOT, SLOT, write_bytes, {0, 0, 0}};
    const fieldstop_telescope telescope = {187500, 1130000, 47000, 65536, 53740};
    const fieldstop_site site = {-0x12345678, 0x87654321u};
    const fieldstop_in_use used = {0, 1, 0, 255, 255, 0};
    const fieldstop_equipment_name name = {{'V', 'a', 'l', 'l', 'e', 'y', 0, 0, 0, 0, 0, 0}};
    fieldstop_eyepiece eyepiece = {12500, 13700, 216000000u, FIELDSTOP_RECTILINEAR, {0, 0, 0}};
    fieldstop_status status;
    uint16_t i;

    for (i = 0; i < 2 * SLOT; i++) {
        storage[i] = 0xFF;
    }
    load(&places);
    add(fieldstop_record_begin(buffer, RECORD));
    add(fieldstop_record_put_site(buffer, RECORD, 0, &site, &name));
    add(fieldstop_record_put_amplifier(buffer, RECORD, 0, 131072, &name));
    add(fieldstop_record_put_telescope(buffer, RECORD, 0, &telescope, &name));
    add(fieldstop_record_put_eyepiece(buffer, RECORD, 0, &eyepiece, &name));
    eyepiece.focal_length_um = 0;
    add(fieldstop_record_put_eyepiece(buffer, RECORD, 0, &eyepiece, &name));
    eyepiece.focal_length_um = 28000;
    add(fieldstop_record_put_eyepiece(buffer, RECORD, 1, &eyepiece, &name));
    add(fieldstop_record_put_in_use(buffer, RECORD, &used));
    for (i = 0;; i++) {
        writes_left = i;
        status = fieldstop_store_save(&places, read_part, write_part, erase, storage, buffer, RECORD, FIELDSTOP_KEEP_NEWER);
        add(status);
        if (status == 0) {
            break;
        }
    }
    load(&places);
    add(fieldstop_record_remove(buffer, RECORD, FIELDSTOP_KIND_EYEPIECE, 0));
    writes_left = 100;
    add(fieldstop_store_save(&places, read_part, write_part, erase, storage, buffer, RECORD, FIELDSTOP_KEEP_NEWER));
    load(&places);
    storage[SLOT + 30] ^= 4;
    load(&places);
    for (i = 0; i < 2 * SLOT; i++) {
        add(storage[i]);
    }
}

int main(void)
{
    uint8_t i;

    keep(1, 0);
    keep(1, erase_part);
    keep(8, erase_part);
    keep(32, erase_part);
    for (i = 0; i < 8; i++) {
        part_put("0123456789abcdef"[sum >> 28]);
        sum <<= 4;
    }
    part_put(' ');
    part_put('r');
    part_put('\n');
    return part_end();
}
