// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static reedling.contact.ContactBlock.at;

import java.util.List;
import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.HistoryColumn;
import reedling.contact.NamedLaw;
import reedling.contact.Stage;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.plugins.contact.HertzProvider;
import reedling.plugins.contact.MindlinProvider;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** A law that breaks in a run stops it with the law's name, the two bodies, the step and the time. */
class BrokenLawStopsRunTest {

    private static final ParameterValues NONE = ParameterValues.of(new HertzProvider(), Map.of());
    private static final double[] REST = {0, 0, 0};

    /** What is done to one row. */
    private interface Damage {
        void apply(double[] columns, int row);
    }

    /** A sound law whose rows above an overlap are damaged. */
    private record Breaking(ContactLaw sound, double overlap, Damage damage) implements ContactLaw {
        @Override
        public List<HistoryColumn> history() {
            return sound.history();
        }

        @Override
        public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
            ContactKernel kernel = sound.bind(pair, kind, historyColumn);
            return new ContactKernel() {
                @Override
                public void apply(ContactBlock block) {
                    kernel.apply(block);
                    double[] c = block.columns();
                    for (int r = 0; r < block.rows(); r++) {
                        if (c[at(Column.OVERLAP) + r] > overlap) {
                            damage.apply(c, r);
                        }
                    }
                }

                @Override
                public double duration(double speed, double radius, double mass) {
                    return kernel.duration(speed, radius, mass);
                }
            };
        }
    }

    private static Rig rig() {
        return new Rig()
                .material(new Material("pellet", 1250, 1e8, 0.3), 0.7, 0.3, 0.1)
                .without(Stage.ROLLING);
    }

    /** Grains 0 and 1 rest apart from each other; grains 2 and 3 collide. */
    private static String stopOfTwoGrains(Stage stage, ContactLaw broken) {
        Rig rig = rig().law(stage, new NamedLaw("soft-shell", broken));
        rig.grain(0, 0.005, new double[] {0, 0, 0}, REST, REST);
        rig.grain(0, 0.005, new double[] {0.0102, 0, 0}, REST, REST);
        rig.grain(0, 0.005, new double[] {0.1, 0, 0}, new double[] {1, 0.5, 0}, REST);
        rig.grain(0, 0.005, new double[] {0.1102, 0, 0}, REST, REST);
        return stopOf(rig);
    }

    private static String stopOf(Rig rig) {
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            ReedlingException stop = catchThrowableOfType(ReedlingException.class, () -> {
                for (int k = 0; k < 20_000; k++) {
                    run.step();
                }
            });
            assertThat(stop).isNotNull();
            assertThat(stop.exitCode()).isEqualTo(ExitCode.GUARD);
            assertThat(run.stepCount()).isPositive();
            return stop.getMessage();
        }
    }

    @Test
    void throwingLawIsNamedWithBothGrains() {
        String message =
                stopOfTwoGrains(Stage.NORMAL, new Breaking(new HertzProvider().create(NONE), 1e-5, (c, row) -> {
                    throw new IllegalStateException("table is empty");
                }));
        assertThat(message)
                .matches("step [0-9]+, time [0-9.e-]+ s, grains [23] and [23] contact law soft-shell: is throwing"
                        + " java.lang.IllegalStateException: table is empty at reedling.plugins.run.BrokenLawStopsRunTest.*"
                        + "certify soft-shell.*resume.*");
    }

    @Test
    void normalForceThatIsNoNumberIsNamed() {
        String message = stopOfTwoGrains(
                Stage.NORMAL,
                new Breaking(
                        new HertzProvider().create(NONE),
                        1e-5,
                        (c, row) -> c[at(Column.ELASTIC_FORCE) + row] = Double.NaN));
        assertThat(message)
                .matches("step [0-9]+, time [0-9.e-]+ s, grains [23] and [23] contact law soft-shell:"
                        + " is giving a force that is no finite number.*");
    }

    @Test
    void frictionThatIsNoNumberIsNamed() {
        String message = stopOfTwoGrains(
                Stage.TANGENTIAL,
                new Breaking(
                        new MindlinProvider().create(NONE),
                        1e-5,
                        (c, row) -> c[at(Column.FRICTION) + row] = Double.POSITIVE_INFINITY));
        assertThat(message).contains("contact law soft-shell: is giving a force that is no finite number");
    }

    @Test
    void wallIsNamedAsTheSecondBody() {
        Rig rig = rig().law(
                        Stage.NORMAL,
                        new NamedLaw("soft-shell", new Breaking(new HertzProvider().create(NONE), 1e-5, (c, row) -> {
                            throw new ArithmeticException("out of the table");
                        })));
        rig.wall(new Wall("plane", 0, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
        rig.grain(0, 0.005, new double[] {0, 0, 0.0051}, new double[] {0, 0, -1}, REST);
        assertThat(stopOf(rig)).contains("grain 0 on wall facet 0", "contact law soft-shell", "out of the table");
    }
}
