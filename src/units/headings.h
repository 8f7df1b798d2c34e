/*
 * headings.h - what the files of headings share; nothing outside src/units includes it.
 *
 * A heading is a label and a unit. quantities.c lists what a label can name and what it becomes with which unit;
 * label.c reads a label; heading.c finds where the label ends and the unit begins.
 */
#ifndef GASLEAF_HEADINGS_INTERNAL_H
#define GASLEAF_HEADINGS_INTERNAL_H

#include <gasleaf/heading.h>

/* What a quantity is when its unit has this dimension. A list ends with GAS_SYM_NONE. */
struct reading {
    enum gas_dimension dimension;
    enum gas_symbol symbol;
    bool reference_only; /* an amount, if written as a reference volume: V, Nm3 */
};

struct quantity {
    const char *symbols; /* as printed, case counts: "P,p" */
    const char *words;   /* any case: "pressure,press" */
    enum gas_symbol symbol;
    enum gas_dimension bare; /* GAS_DIM_OTHER: the unit must be there */
    const struct reading *readings;
};
extern const struct quantity gas_quantities[];
extern const size_t gas_quantity_count;

struct label {
    const struct quantity *quantity; /* NULL: only a state or a basis was named */
    int state;
    bool has_state, has_basis, tolerance, by_gas, on_gas;
    enum gas_pressure_basis basis;
};

/* False when no quantity, state or basis could be told from the text. */
bool gas_label_parse(const char *text, size_t length, struct label *label);
void gas_label_nearest(const char *text, size_t length, char *hint, size_t size);

/* A label and a unit (NULL: none written) -> a heading. */
bool gas_heading_join(const struct label *label, const char *label_text, size_t label_length,
                      const struct gas_unit *unit, const struct gas_references *references, struct gas_heading *heading,
                      struct gas_heading_fault *fault);
bool gas_heading_refuse(struct gas_heading_fault *fault, enum gas_heading_status status, const char *hint);

#endif
