/*
 * Keeps the equipment of an invented observer in a file, as a hand controller would keep it in EEPROM: two slots, written
 * in turn, so that the last good record survives a loss of power.
 *
 *     cargo rustc --release --lib --crate-type staticlib --features capi
 *     cc -std=c99 -Iinclude examples/c/record.c target/release/libfieldstop.a -lpthread -ldl -lm -o record
 *     ./record [FILE]
 */
#include <inttypes.h>
#include <stdio.h>
#include <string.h>

#include "fieldstop.h"

/* Two slots of 512 bytes, written byte by byte: an EEPROM of 1024 bytes. */
static const fieldstop_slot_pair slot_pair = {0, 512, 512, 1, {0, 0, 0}};
enum { STORAGE_BYTES = 1024 };

/* The storage: the context is the file. Another number than 0 says that it failed. */
static fieldstop_status read_file(void *context, uint32_t offset, uint8_t *bytes, uint16_t length)
{
    FILE *file = (FILE *)context;

    return fseek(file, (long)offset, SEEK_SET) != 0 || fread(bytes, 1, length, file) != length;
}

static fieldstop_status write_file(void *context, uint32_t offset, const uint8_t *bytes, uint16_t length)
{
    FILE *file = (FILE *)context;

    return fseek(file, (long)offset, SEEK_SET) != 0 || fwrite(bytes, 1, length, file) != length || fflush(file) != 0;
}

/* Says what was refused, and gives 0 then. */
static int is_done(const char *what, fieldstop_status status)
{
    if (status != 0) {
        printf("%s: argument %u: %s\n", what, (unsigned)FIELDSTOP_ARGUMENT(status), fieldstop_cause_text(status));
    }
    return status == 0;
}

static fieldstop_equipment_name named(const char *text)
{
    fieldstop_equipment_name name = {{0}};
    size_t length = strlen(text);

    memcpy(name.text, text, length < sizeof name.text ? length : sizeof name.text);
    return name;
}

static int add_eyepiece(uint8_t *record, const char *text, uint32_t focal_length_um, uint32_t field_stop_um)
{
    const fieldstop_eyepiece eyepiece = {focal_length_um, field_stop_um, 0, FIELDSTOP_EQUIDISTANT, {0, 0, 0}};
    const fieldstop_equipment_name name = named(text);
    uint8_t count;

    return is_done("count", fieldstop_record_get_count(record, FIELDSTOP_RECORD_MOST, FIELDSTOP_KIND_EYEPIECE, &count))
           && is_done("eyepiece", fieldstop_record_put_eyepiece(record, FIELDSTOP_RECORD_MOST, count, &eyepiece, &name));
}

static int first_equipment(uint8_t *record)
{
    const fieldstop_telescope telescope = {180000, 1130000, 46000, 65536, 0};
    const fieldstop_site site = {0x20000000, 0x08000000}; /* 45 degrees north, 11.25 degrees east */
    const fieldstop_equipment_name tube = named("Valley tube"), hill = named("Hill");

    return is_done("begin", fieldstop_record_begin(record, FIELDSTOP_RECORD_MOST))
           && is_done("telescope", fieldstop_record_put_telescope(record, FIELDSTOP_RECORD_MOST, 0, &telescope, &tube))
           && is_done("site", fieldstop_record_put_site(record, FIELDSTOP_RECORD_MOST, 0, &site, &hill))
           && add_eyepiece(record, "Wide 28", 28000, 33500);
}

static int save(FILE *file, const uint8_t *record)
{
    /* No erase: a file can be written over. */
    return is_done("save", fieldstop_store_save(&slot_pair, read_file, write_file, NULL, file, record,
                                                FIELDSTOP_RECORD_MOST, FIELDSTOP_KEEP_NEWER));
}

/* Loads the last good record and shows what its eyepieces do at its telescope. */
static int show(FILE *file)
{
    uint8_t record[FIELDSTOP_RECORD_MOST];
    uint16_t length;
    uint8_t index, count;
    fieldstop_telescope telescope;
    fieldstop_equipment_name name;

    if (!is_done("load", fieldstop_store_load(&slot_pair, read_file, file, record, sizeof record, &length))
        || !is_done("telescope", fieldstop_record_get_telescope(record, length, 0, &telescope))
        || !is_done("name", fieldstop_record_get_name(record, length, FIELDSTOP_KIND_TELESCOPE, 0, &name))
        || !is_done("count", fieldstop_record_get_count(record, length, FIELDSTOP_KIND_EYEPIECE, &count))) {
        return 0;
    }
    printf("%.12s, %u bytes\n", (const char *)name.text, (unsigned)length);
    for (index = 0; index < count; index++) {
        fieldstop_eyepiece eyepiece;
        uint32_t magnification_q16;

        if (!is_done("eyepiece", fieldstop_record_get_eyepiece(record, length, index, &eyepiece))
            || !is_done("name", fieldstop_record_get_name(record, length, FIELDSTOP_KIND_EYEPIECE, index, &name))
            || !is_done("magnification", fieldstop_magnification_fx(telescope.focal_length_um,
                                                                    eyepiece.focal_length_um, &magnification_q16))) {
            return 0;
        }
        printf("  %-12.12s %" PRIu32 "x\n", (const char *)name.text, (magnification_q16 + 0x8000u) >> 16);
    }
    return 1;
}

int main(int count, char **arguments)
{
    const char *path = count > 1 ? arguments[1] : "record.bin";
    FILE *file = fopen(path, "w+b");
    uint8_t record[FIELDSTOP_RECORD_MOST];
    int at, is_right;

    if (file == NULL) {
        printf("%s cannot be written\n", path);
        return 1;
    }
    for (at = 0; at < STORAGE_BYTES; at++) {
        (void)putc(0xFF, file);
    }
    printf("A new storage:\n");
    (void)show(file);

    is_right = first_equipment(record) && save(file, record);
    printf("Saved:\n");
    is_right = is_right && show(file);

    is_right = is_right && add_eyepiece(record, "Close 4.5", 4500, 6300) && save(file, record);
    printf("An eyepiece more:\n");
    is_right = is_right && show(file);

    /* As a loss of power in the midst of a save would leave it: the second slot is damaged. */
    is_right = is_right && write_file(file, slot_pair.second + 40, (const uint8_t *)"?", 1) == 0;
    printf("Damaged, so the record before:\n");
    is_right = is_right && show(file);

    (void)fclose(file);
    if (count < 2) {
        (void)remove(path);
    }
    return is_right ? 0 : 1;
}
