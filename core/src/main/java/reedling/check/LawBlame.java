// SPDX-License-Identifier: Apache-2.0
package reedling.check;

import java.util.List;
import java.util.Locale;
import reedling.contact.LawFault;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.coupling.Interactions;
import reedling.coupling.RowFault;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainStore;

/**
 * Names the contact law, the two bodies, the step and the time when a law broke a run: by throwing, or by a force that is
 * no number. Looks only after the damage is done.
 *
 * @param interactions of the run
 * @param grains of the run
 * @param laws of the run
 */
public record LawBlame(Interactions interactions, GrainStore grains, LawSet laws) {

    private static final String REMEDY =
            "Try the law with: reedling certify NAME. The last checkpoint is whole: reedling resume goes on from it.";

    /** Columns of the ledger history, in order: dashpot, friction, rolling moment. */
    private static final int FRICTION = 1;

    private static final int MOMENT = 4;
    private static final int COLUMNS = 7;

    /** The stop for what a law threw, in a row of contacts or outside one: a {@link RowFault} or {@link LawFault}. */
    public ReedlingException thrown(RuntimeException fault, long step, double time) {
        if (fault instanceof RowFault inRow) {
            return thrown(inRow, step, time);
        }
        return fault instanceof LawFault outside
                ? thrown(outside, step, time)
                : stop(step, time, "bodies in contact", "contact law", LawFault.words(fault), fault);
    }

    private ReedlingException thrown(RowFault fault, long step, double time) {
        Throwable cause = fault.getCause() == null ? fault : fault.getCause();
        return stop(step, time, bodies(fault.segment(), fault.row()), fault.law(), LawFault.words(cause), cause);
    }

    private ReedlingException thrown(LawFault fault, long step, double time) {
        Throwable cause = fault.getCause() == null ? fault : fault.getCause();
        return stop(step, time, "bodies about to touch", fault.law(), LawFault.words(cause), cause);
    }

    /** The stop of a guard, with the law and its two bodies if a contact force was not a finite number. */
    public ReedlingException refined(ReedlingException stop, long step, double time) {
        for (List<PairSegment> rows :
                List.of(interactions.pairRows(), interactions.wallRows(), interactions.wireRows())) {
            for (PairSegment segment : rows) {
                for (int row = 0; row < segment.activeCount(); row++) {
                    int column = notFinite(segment, row);
                    if (column >= 0) {
                        String law = laws.name(stage(column));
                        return stop(
                                step, time, bodies(segment, row), law, "giving a force that is no finite number", stop);
                    }
                }
            }
        }
        return stop;
    }

    private static int notFinite(PairSegment segment, int row) {
        int lane = row % 8;
        int from = PairSegment.ledgerAt(row - lane) + lane;
        for (int column = 0; column < COLUMNS; column++) {
            if (!Float.isFinite(segment.ledgerHistory()[from + 8 * column])) {
                return column;
            }
        }
        return -1;
    }

    private static Stage stage(int column) {
        return column < FRICTION ? Stage.NORMAL : column < MOMENT ? Stage.TANGENTIAL : Stage.ROLLING;
    }

    private String bodies(PairSegment segment, int row) {
        long first = grains.id()[segment.first()[row]];
        int second = segment.second()[row];
        if (interactions.wallRows().contains(segment)) {
            return "grain " + first + " on wall facet " + second;
        }
        return interactions.wireRows().contains(segment)
                ? "grain " + first + " on wire element " + second
                : "grains " + first + " and " + grains.id()[second];
    }

    private static ReedlingException stop(
            long step, double time, String bodies, String law, String got, Throwable cause) {
        String where = String.format(Locale.ROOT, "step %d, time %.6g s, %s", step, time, bodies);
        return new ReedlingException(
                ExitCode.GUARD,
                new Finding(where, "contact law " + law, got, "finite forces", REMEDY.replace("NAME", law)),
                cause);
    }
}
