#include <math.h>

#include <gasleaf/path.h>

static double gap(double end, double start)
{
    return (end - start) / start;
}

/* |W| over the volume swept: the pressure that would do the same work in one stroke; none when nothing was swept. */
static double mean_pressure(double W, double v_least, double v_most)
{
    return v_most > v_least ? fabs(W) / (v_most - v_least) : NAN;
}

static void add_ratios(struct gas_cycle *cycle)
{
    const double W = cycle->W_net;
    cycle->efficiency = W < 0 && cycle->Q_in > 0 ? -W / cycle->Q_in : NAN;
    cycle->cop_heating = W > 0 ? cycle->Q_out / W : NAN;
    cycle->cop_cooling = W > 0 ? cycle->Q_in / W : NAN;
}

struct gas_result gas_cycle_of(const struct gas_point *start, const struct gas_change *changes, size_t count,
                               double closes_within, struct gas_cycle *cycle)
{
    double v_least = start->v, v_most = v_least;
    *cycle = (struct gas_cycle){0};
    if (count == 0)
        return gas_bad(GAS_UNDETERMINED, 3, 0);
    for (size_t i = 0; i < count; i++) {
        cycle->W_net += changes[i].W;
        cycle->Q_in += changes[i].Q_in;
        cycle->Q_out += changes[i].Q_out;
        v_least = fmin(v_least, changes[i].v_least);
        v_most = fmax(v_most, changes[i].v_most);
    }
    const struct gas_point *end = &changes[count - 1].end;
    cycle->gap_P = gap(end->P, start->P);
    cycle->gap_T = gap(end->T, start->T);
    cycle->gap_v = gap(end->v, start->v);
    cycle->mep = mean_pressure(cycle->W_net, v_least, v_most);
    add_ratios(cycle);
    const double widest = fmax(fabs(cycle->gap_P), fmax(fabs(cycle->gap_T), fabs(cycle->gap_v)));
    return widest <= closes_within ? gas_good(cycle->W_net) : gas_bad(GAS_CONTRADICTION, 0, widest);
}
