#include "sheet/job.h"

#include <math.h>
#include <string.h>

#include <gasleaf/species.h>

/* -- totals and flows ---------------------------------------------------------------------------------------------- */

/* clang-format off */
static const struct {
    enum gas_dimension total, flow, molar; /* molar: per mole of the same thing */
} extents[] = {
    {GAS_DIM_VOLUME,  GAS_DIM_VOLUME_FLOW,  GAS_DIM_MOLAR_VOLUME},
    {GAS_DIM_AMOUNT,  GAS_DIM_AMOUNT_FLOW,  GAS_DIM_NUMBER},
    {GAS_DIM_MASS,    GAS_DIM_MASS_FLOW,    GAS_DIM_MOLAR_MASS},
    {GAS_DIM_ENERGY,  GAS_DIM_POWER,        GAS_DIM_MOLAR_ENERGY},
    {GAS_DIM_ENTROPY, GAS_DIM_ENTROPY_FLOW, GAS_DIM_MOLAR_ENTROPY},
};
static const struct {
    enum gas_dimension molar, specific;
} specifics[] = {
    {GAS_DIM_MOLAR_VOLUME,  GAS_DIM_SPECIFIC_VOLUME},
    {GAS_DIM_MOLAR_ENERGY,  GAS_DIM_SPECIFIC_ENERGY},
    {GAS_DIM_MOLAR_ENTROPY, GAS_DIM_SPECIFIC_ENTROPY},
};
/* clang-format on */
enum { EXTENTS = sizeof extents / sizeof *extents, SPECIFICS = sizeof specifics / sizeof *specifics };

enum gas_extent gas_dimension_extent(enum gas_dimension dimension)
{
    for (size_t i = 0; i < EXTENTS; i++) {
        if (extents[i].total == dimension)
            return GAS_EXTENT_TOTAL;
        if (extents[i].flow == dimension)
            return GAS_EXTENT_FLOW;
    }
    return GAS_EXTENT_NONE;
}

double gas_job_from_molar(const struct gas_job *job, enum gas_dimension molar, double figure, double n,
                          enum gas_dimension dimension)
{
    if (dimension == molar)
        return figure;
    for (size_t i = 0; i < SPECIFICS; i++)
        if (specifics[i].molar == molar && specifics[i].specific == dimension)
            return figure / job->gas.molar_mass;
    for (size_t i = 0; i < EXTENTS; i++)
        if (extents[i].total == dimension || extents[i].flow == dimension) {
            if (extents[i].molar == molar)
                return figure * n;
            return molar == GAS_DIM_NUMBER && extents[i].molar == GAS_DIM_MOLAR_MASS ? figure * n * job->gas.molar_mass
                                                                                     : NAN;
        }
    return NAN;
}

/* A conductance is in W/K too, but no flow of anything; "V constant" is either. */
static enum gas_extent heading_extent(const struct gas_heading *heading)
{
    return heading->symbol == GAS_SYM_UA || heading->state == GAS_CONSTANT
               ? GAS_EXTENT_NONE
               : gas_dimension_extent(heading->unit.dimension);
}

static bool refuse_mixed(struct gas_refusal *refusal, const struct gas_heading *first, const struct gas_heading *second,
                         enum gas_extent second_extent)
{
    char a[80], b[80];
    gas_quoted(a, sizeof a, first->text, strlen(first->text));
    gas_quoted(b, sizeof b, second->text, strlen(second->text));
    bool flow = second_extent == GAS_EXTENT_FLOW;
    return gas_refuse(refusal, "given", "%s is %s but %s is not; give both per time or both as totals.", flow ? b : a,
                      gas_dimension_words((flow ? second : first)->unit.dimension), flow ? a : b);
}

bool gas_job_tell_extent(struct gas_job *job, struct gas_refusal *refusal)
{
    const struct gas_heading *first = NULL;
    job->extent = GAS_EXTENT_NONE;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        enum gas_extent extent = heading_extent(heading);
        if (extent == GAS_EXTENT_NONE)
            continue;
        if (first && extent != job->extent && !job->task->mixed_extents)
            return refuse_mixed(refusal, first, heading, extent);
        if (!first)
            job->extent = extent;
        first = first ? first : heading;
    }
    return true;
}

/* A wanted heading without a unit follows the givens: m is kg/s, W is in W, where flows are given. */
static void follow_flows(struct gas_job *job)
{
    for (size_t i = 0; i < job->wanted.columns; i++) {
        struct gas_unit *unit = &job->wanted.heading[i].unit;
        for (size_t k = 0; k < EXTENTS && !job->wanted.heading[i].has_unit; k++)
            if (unit->dimension == extents[k].total)
                *unit = gas_unit_si(extents[k].flow);
    }
}

static bool extent_of_wanted(struct gas_job *job, struct gas_refusal *refusal)
{
    char shown[80];
    if (job->extent == GAS_EXTENT_FLOW)
        follow_flows(job);
    for (size_t i = 0; i < job->wanted.columns && job->extent != GAS_EXTENT_NONE && !job->task->mixed_extents; i++) {
        const struct gas_heading *heading = &job->wanted.heading[i];
        enum gas_extent extent = heading_extent(heading);
        gas_quoted(shown, sizeof shown, heading->text, strlen(heading->text));
        if (extent == GAS_EXTENT_TOTAL && job->extent == GAS_EXTENT_FLOW)
            return gas_refuse(refusal, "wanted", "%s is %s, but flows are given; ask for it per time, such as kg/h.",
                              shown, gas_dimension_words(heading->unit.dimension));
        if (extent == GAS_EXTENT_FLOW && job->extent == GAS_EXTENT_TOTAL)
            return gas_refuse(refusal, "wanted",
                              "%s is %s, but no flow is given; ask for the total, such as kg, or give a flow.", shown,
                              gas_dimension_words(heading->unit.dimension));
    }
    return true;
}

/* -- a call -------------------------------------------------------------------------------------------------------- */

/* An option that would be passed over is a mistake of whoever wrote it. */
static bool options_belong(const struct gas_job *job, struct gas_refusal *refusal)
{
    if (job->options.wall_said && !job->task->wall)
        return gas_refuse(refusal, "options",
                          "isothermal, adiabatic and heat lost are options of FILL and VENT; in %s write a process.",
                          job->task->name);
    if (job->options.open && !job->task->open)
        return gas_refuse(refusal, "options", "open is an option of SOLVE; %s does not take it.", job->task->name);
    return !job->options.outlet_said ||
           gas_refuse(refusal, "options", "outlet is an option of MIX; %s does not take it.", job->task->name);
}

bool gas_job_read(struct gas_job *job, const struct gas_job_arguments *arguments, struct gas_refusal *refusal)
{
    job->choice = NULL;
    job->own = NULL;
    job->extent = GAS_EXTENT_NONE;
    job->barometer_column = job->altitude_column = -1;
    if (!gas_options_read(arguments->options, &job->options, refusal) || !options_belong(job, refusal))
        return false;
    job->choice = gas_choose(arguments->gas, refusal);
    if (!job->choice)
        return false;
    job->gas = job->choice->gas;
    return gas_table_read(arguments->given, arguments->headings, &job->options, &job->table, refusal) &&
           gas_wanted_read(arguments->wanted, &job->options, &job->wanted, refusal);
}

bool gas_job_prepare(struct gas_job *job, struct gas_arena *arena, struct gas_refusal *refusal)
{
    job->barometer_column = gas_job_column(job, GAS_SYM_BAROMETER, 0);
    job->altitude_column = gas_job_column(job, GAS_SYM_ALTITUDE, 0);
    if (job->barometer_column >= 0 && job->altitude_column >= 0)
        return gas_refuse(refusal, "given", "the barometer is given twice, itself and by the altitude; leave one out.");
    return gas_job_tell_extent(job, refusal) && extent_of_wanted(job, refusal) &&
           job->task->prepare(job, arena, refusal);
}

bool gas_job_open(struct gas_job *job, const struct gas_job_arguments *arguments, struct gas_arena *arena,
                  struct gas_refusal *refusal)
{
    return gas_job_read(job, arguments, refusal) && gas_job_prepare(job, arena, refusal);
}

void gas_job_close(struct gas_job *job)
{
    if (job->choice)
        gas_choice_release(job->choice);
    job->choice = NULL;
}

int gas_job_column(const struct gas_job *job, enum gas_symbol symbol, int state)
{
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        if (heading->symbol == symbol && heading->state == state && !heading->tolerance)
            return (int)i;
    }
    return -1;
}

int gas_job_tolerance_column(const struct gas_job *job, enum gas_symbol symbol, int state)
{
    int shared = -1;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        if (heading->symbol != symbol || !heading->tolerance)
            continue;
        if (heading->state == state)
            return (int)i;
        if (heading->state == 0)
            shared = (int)i;
    }
    return shared;
}

int gas_job_last_state(const struct gas_job *job)
{
    int last = 0;
    for (size_t i = 0; i < job->table.columns; i++)
        if (job->table.heading[i].state > last)
            last = job->table.heading[i].state;
    return last;
}

bool gas_heading_is_share(const struct gas_heading *heading)
{
    return heading->tolerance && heading->unit.dimension == GAS_DIM_NUMBER &&
           gas_symbol_dimension(heading->symbol) != GAS_DIM_NUMBER;
}

/* -- one case ------------------------------------------------------------------------------------------------------ */

/* Work is into the gas inside; a heading or an option may count it out of the gas. */
static double sign_of(const struct gas_job *job, const struct gas_heading *heading)
{
    if (heading->symbol != GAS_SYM_W && heading->symbol != GAS_SYM_W_NET)
        return 1;
    return heading->by_gas || (job->options.work_by_gas && !heading->on_gas) ? -1 : 1;
}

static double to_si(const struct gas_job *job, const struct gas_case *figures, const struct gas_heading *heading,
                    double figure)
{
    if (heading->tolerance)
        return gas_unit_difference_to_si(&heading->unit, figure);
    return sign_of(job, heading) * gas_unit_to_si(&heading->unit, figure, figures->barometer);
}

static bool read_altitude(const struct gas_job *job, const struct gas_row *row, struct gas_case *figures,
                          struct gas_refusal *refusal)
{
    char shown[80];
    int column = job->altitude_column;
    if (column < 0 || !(row->given >> column & 1))
        return true;
    const struct gas_unit *unit = &job->table.heading[column].unit;
    struct gas_result P = gas_standard_atmosphere_pressure(gas_unit_to_si(unit, row->figure[column], 0));
    if (P.status != GAS_OK)
        return gas_refuse(refusal, "altitude",
                          "%s is outside the standard atmosphere (-500 to 20000 m); give the "
                          "barometer itself.",
                          gas_figure(shown, sizeof shown, row->figure[column], unit));
    figures->barometer = P.value;
    return true;
}

/* The barometer read with this case, where the table has a column for it. */
static bool read_barometer(const struct gas_job *job, const struct gas_row *row, struct gas_case *figures,
                           struct gas_refusal *refusal)
{
    char shown[80];
    int column = job->barometer_column;
    figures->barometer = job->options.barometer;
    if (column < 0 || !(row->given >> column & 1))
        return read_altitude(job, row, figures, refusal);
    const struct gas_unit *unit = &job->table.heading[column].unit;
    double P = gas_unit_to_si(unit, row->figure[column], job->options.barometer);
    if (!(P >= GAS_BAROMETER_LEAST && P <= GAS_BAROMETER_MOST) || unit->basis != GAS_ABSOLUTE)
        return gas_refuse(refusal, "barometer", "%s is no air pressure; it lies between 0.01 and 10 bar, absolute.",
                          gas_figure(shown, sizeof shown, row->figure[column], unit));
    figures->barometer = P;
    return true;
}

static bool refuse_level(const struct gas_heading *heading, double figure, double si, double barometer,
                         struct gas_refusal *refusal)
{
    char name[GAS_NAME_TEXT];
    gas_quantity_name(name, heading->symbol, heading->state);
    if (!heading->tolerance)
        return gas_accept_level(refusal, name, figure, &heading->unit, barometer);
    return si == 0 || gas_refuse(refusal, name, "a plus-minus figure must be a number and not below zero.");
}

bool gas_job_case(const struct gas_job *job, const struct gas_row *row, struct gas_case *figures,
                  struct gas_refusal *refusal)
{
    figures->row = row;
    if (!read_barometer(job, row, figures, refusal))
        return false;
    for (size_t i = 0; i < job->table.columns; i++) {
        const struct gas_heading *heading = &job->table.heading[i];
        figures->si[i] = NAN;
        if (!(row->given >> i & 1) || heading->state == GAS_CONSTANT)
            continue;
        double si = figures->si[i] = to_si(job, figures, heading, row->figure[i]);
        bool usual = si > 0 && si <= 1e300; /* nothing to complain about: no text is made */
        if (!usual && !refuse_level(heading, row->figure[i], si, figures->barometer, refusal))
            return false;
    }
    return true;
}

double gas_job_shown(const struct gas_job *job, const struct gas_case *figures, const struct gas_heading *heading,
                     double si)
{
    if (heading->tolerance)
        return gas_unit_difference_from_si(&heading->unit, si);
    return gas_unit_from_si(&heading->unit, sign_of(job, heading) * si, figures->barometer);
}

bool gas_job_run(const struct gas_job *job, const struct gas_row *row, double *answers, struct gas_refusal *refusal)
{
    struct gas_case figures;
    if (!gas_job_case(job, row, &figures, refusal) || !job->task->run(job, &figures, answers, refusal))
        return false;
    for (size_t i = 0; i < job->wanted.columns; i++)
        answers[i] = gas_job_shown(job, &figures, &job->wanted.heading[i], answers[i]);
    return true;
}

/* -- every case ---------------------------------------------------------------------------------------------------- */

static struct gas_cell *answer_cell(struct gas_call *call, bool across, size_t row, size_t column)
{
    return &call->answer.cell[across ? column * call->answer.columns + row : row * call->answer.columns + column];
}

/* One sentence, shared by the cells of the case. */
static struct gas_cell failed_cell(const struct gas_job *job, struct gas_call *call, const struct gas_refusal *refusal)
{
    static const char no_memory[] = "Check the range: it is too large for the memory at hand; give fewer rows.";
    if (job->options.hard_errors)
        return (struct gas_cell){.kind = GAS_CELL_NOT_AVAILABLE};
    size_t length = strlen(refusal->text);
    const char *text = gas_arena_copy(call->arena, refusal->text, length);
    return text ? (struct gas_cell){GAS_CELL_TEXT, 0, text, length}
                : (struct gas_cell){GAS_CELL_TEXT, 0, no_memory, sizeof no_memory - 1};
}

static void answer_case(const struct gas_job *job, struct gas_call *call, bool across, size_t index)
{
    struct gas_row row;
    struct gas_refusal refusal;
    double answers[GAS_COLUMNS];
    refusal.made = false;
    bool read = gas_table_row(&job->table, index, &row, &refusal);
    bool blank = read && row.given == 0;
    bool good = read && !blank && gas_job_run(job, &row, answers, &refusal);
    struct gas_cell other = {0};
    if (blank)
        other = (struct gas_cell){GAS_CELL_TEXT, 0, "", 0};
    else if (!good)
        other = failed_cell(job, call, &refusal);
    for (size_t i = 0; i < job->wanted.columns; i++)
        *answer_cell(call, across, index, i) = good ? gas_cell_number(answers[i]) : other;
}

void gas_job_answer(const struct gas_job *job, struct gas_call *call)
{
    size_t cases = job->table.rows, columns = job->wanted.columns;
    bool across = job->table.across || (cases == 1 && job->wanted.down);
    if (!gas_answer_block(call, across ? columns : cases, across ? cases : columns))
        return;
    for (size_t i = 0; i < cases; i++)
        answer_case(job, call, across, i);
}

void gas_job_refused(struct gas_call *call, const struct gas_options *options, const struct gas_refusal *refusal)
{
    if (options && options->hard_errors && gas_answer_block(call, 1, 1))
        gas_put_not_available(call, 0, 0);
    else
        gas_answer_text(call, refusal->text);
}
