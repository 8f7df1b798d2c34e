/*
 * path_replay.h - the sum of a path with slips in its formulas.
 */
#ifndef AUDIT_PATH_REPLAY_H
#define AUDIT_PATH_REPLAY_H

#include "audit/replay.h"

/* path_replay - the wanted figure in SI; false when it cannot be. */
bool path_replay(struct replay *replay, double *si);

#endif
