// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.List;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.LawSet;

/** Stages in the order in which they run over a block; immutable. */
final class StageLine {

    private final RowStage[] stages;

    private StageLine(List<RowStage> stages) {
        this.stages = stages.toArray(new RowStage[0]);
    }

    static StageLine of(RowStage... stages) {
        return new StageLine(List.of(stages));
    }

    /** Laws of one contact kind and material pair with the engine's stages between them. */
    static StageLine ofLaws(LawSet.Bound laws) {
        List<RowStage> stages = new ArrayList<>();
        boolean pulls = laws.normal().pulls();
        if (pulls) {
            stages.add(rows -> rows.block().clear(Column.ADHESIVE_LOAD, 2));
        }
        stages.add(new LawStage(laws.normal()));
        stages.add(StageLine::keepStoredEnergy);
        stages.add(new NormalSolve(laws.normal().dashpotMayPull()));
        if (pulls) {
            stages.add(PullingForce::load);
        }
        ContactKernel tangential = laws.tangential();
        stages.add(tangential == null ? rows -> rows.block().clear(Column.FRICTION, 4) : new LawStage(tangential));
        ContactKernel rolling = laws.rolling();
        ContactKernel twisting = laws.twisting();
        if (twisting != null) {
            stages.add(new TwistRate());
        }
        stages.add(rolling == null ? rows -> rows.block().clear(Column.ROLLING_MOMENT, 3) : new LawStage(rolling));
        if (twisting != null) {
            stages.add(new LawStage(twisting));
            stages.add(new TwistReturn());
        }
        if (pulls) {
            stages.add(PullingForce::giveBack);
        }
        stages.add(new ContactWork());
        stages.add(new ContactForce());
        stages.add(new FirstForces());
        stages.add(new SecondForces());
        stages.add(new ForceRows());
        return new StageLine(stages);
    }

    /** Books what normal forces store apart from what springs store. */
    private static void keepStoredEnergy(RowRange rows) {
        if (rows.block().energyDue()) {
            rows.tally().store(rows.block(), ContactTally.STORED);
            rows.block().clear(Column.STORED_ENERGY, 1);
        }
    }

    void run(RowRange rows) {
        for (RowStage stage : stages) {
            stage.run(rows);
        }
    }

    private record LawStage(ContactKernel kernel) implements RowStage {

        @Override
        public void run(RowRange rows) {
            ContactBlock block = rows.block();
            try {
                kernel.apply(block);
            } catch (RuntimeException | LinkageError thrown) {
                throw RowFault.of(kernel, rows, thrown);
            }
        }
    }
}
