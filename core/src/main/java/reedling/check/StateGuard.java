// SPDX-License-Identifier: Apache-2.0
package reedling.check;

import java.util.List;
import java.util.Locale;
import reedling.coupling.ContactTally;
import reedling.coupling.Interactions;
import reedling.coupling.MoveTally;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.neighbour.Chunk;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.structure.NodeStore;

/**
 * Stops a run whose state no longer means anything: a number that is none, an overlap deeper than half an effective
 * radius, a step limit that is no positive number. Looks at what the phases report anyway; only a failure searches for
 * the body to name.
 */
public final class StateGuard {

    private StateGuard() {}

    /** Checks the contacts of a chunk list after a force phase. */
    public static void contacts(
            List<ContactTally> tallies, List<Chunk> chunks, GrainStore grains, long step, double time) {
        for (int k = 0; k < tallies.size(); k++) {
            ContactTally tally = tallies.get(k);
            if (tally.deepestExcess() > 0) {
                Chunk chunk = chunks.get(k);
                String bodies = OverlapSearch.deepest(chunk, grains);
                throw stop(
                        step,
                        time,
                        bodies,
                        "overlap",
                        "above half the effective radius",
                        "Stiffer grains, smaller drop heights or more steps per contact keep overlaps small.");
            }
            if (Double.isNaN(tally.shortestDuration())) {
                throw stop(
                        step,
                        time,
                        "normal law",
                        "contact duration",
                        "not a number",
                        "The law must report a positive time for every touching row.");
            }
        }
    }

    /** Checks that all grains and nodes still have finite velocities after a move. */
    public static void motion(Interactions interactions, GrainStore grains, NodeStore nodes, long step, double time) {
        List<MoveTally> tallies = interactions.moves();
        List<Chunk> chunks = interactions.lists().chunks();
        for (int k = 0; k < tallies.size(); k++) {
            if (!tallies.get(k).finite()) {
                Chunk chunk = chunks.get(k);
                for (int g = chunk.from(); g < chunk.to(); g++) {
                    if (!finite(grains.rows(), GrainRow.at(g) + GrainRow.V, 3)) {
                        throw stop(
                                step,
                                time,
                                "grain " + grains.id()[g],
                                "velocity",
                                "not a finite number",
                                "Look at the last snapshots and the laws near this grain.");
                    }
                }
            }
        }
        for (int n = 0; n < nodes.count; n++) {
            if (!finite(nodes.velocity, 3 * n, 3)) {
                throw stop(
                        step,
                        time,
                        "node " + n + " of body " + nodes.body[n],
                        "velocity",
                        "not a finite number",
                        "The structure came apart: check its supports, its tension and the loads on it.");
            }
        }
    }

    private static boolean finite(double[] values, int from, int count) {
        for (int k = from; k < from + count; k++) {
            if (!Double.isFinite(values[k])) {
                return false;
            }
        }
        return true;
    }

    /** A stop with the step, the time and the bodies in its message. */
    public static ReedlingException stop(
            long step, double time, String bodies, String what, String got, String remedy) {
        String where = String.format(Locale.ROOT, "step %d, time %.6g s, %s", step, time, bodies);
        return new ReedlingException(ExitCode.GUARD, new Finding(where, what, got, "", remedy));
    }
}
