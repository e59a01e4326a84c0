// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.conform;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import reedling.conform.LawTrial;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.ContactRow;
import reedling.contact.HistoryColumn;
import reedling.contact.PerContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;
import reedling.plugin.ParameterValues;

/** Laws written for one contact at a time keep the contract through the adapter, with and without history. */
class PerContactLawTest {

    /** What both providers of this test say of themselves. */
    private interface Plain extends ContactLawProvider {
        @Override
        default int apiLevel() {
            return API_LEVEL;
        }

        @Override
        default String summary() {
            return "A law for one contact at a time.";
        }

        @Override
        default String source() {
            return "common practice, no source";
        }
    }

    /** A linear spring, as soft as a round contact at 1 % overlap. */
    public static final class Spring implements Plain, ContactLaw {

        private record Contact(double modulus) implements PerContactLaw {
            @Override
            public void contact(ContactRow row) {
                double stiffness = 0.2 * modulus * row.effectiveRadius();
                row.stiffness(stiffness);
                row.elasticForce(stiffness * row.overlap());
                row.damping(0.2 * Math.sqrt(stiffness * row.effectiveMass()));
                row.contactRadius(Math.sqrt(row.effectiveRadius() * row.overlap()));
                row.duration(duration(0, row.effectiveRadius(), row.effectiveMass()));
                if (row.energyDue()) {
                    row.addStoredEnergy(0.5 * row.elasticForce() * row.overlap());
                }
            }

            @Override
            public double duration(double speed, double radius, double mass) {
                return Math.PI * Math.sqrt(mass / (0.2 * modulus * radius));
            }

            @Override
            public double dampingRatio() {
                return 0.1;
            }
        }

        @Override
        public String name() {
            return "test-spring";
        }

        @Override
        public Stage stage() {
            return Stage.NORMAL;
        }

        @Override
        public ContactLaw create(ParameterValues values) {
            return this;
        }

        @Override
        public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
            return new Contact(pair.contactModulus()).asKernel(Stage.NORMAL, historyColumn, 0);
        }
    }

    /** Viscous friction below Coulomb's limit, and a count of the steps of the contact that nobody reads. */
    public static final class Drag implements Plain, ContactLaw {

        private record Contact(double friction) implements PerContactLaw {
            @Override
            public void contact(ContactRow row) {
                double speed = 0;
                for (int axis = 0; axis < 3; axis++) {
                    speed += row.sliding(axis) * row.sliding(axis);
                }
                double limit = friction * row.normalForce();
                double drag = Math.min(1e-2, limit / Math.max(Math.sqrt(speed), 1e-300));
                for (int axis = 0; axis < 3; axis++) {
                    row.friction(axis, drag * row.sliding(axis));
                }
                row.history(0, row.history(0) + 1);
            }
        }

        @Override
        public String name() {
            return "test-drag";
        }

        @Override
        public Stage stage() {
            return Stage.TANGENTIAL;
        }

        @Override
        public ContactLaw create(ParameterValues values) {
            return this;
        }

        @Override
        public List<HistoryColumn> history() {
            return List.of(HistoryColumn.scalar("steps"));
        }

        @Override
        public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
            return new Contact(pair.friction()).asKernel(Stage.TANGENTIAL, historyColumn, 1);
        }
    }

    @Test
    void normalLawForOneContactKeepsTheContract() {
        assertThat(LawTrial.findings(Subject.of(new Spring(), Map.of(), LoadedLaws.onClassPath())))
                .isEmpty();
    }

    @Test
    void frictionForOneContactKeepsTheContract() {
        assertThat(LawTrial.findings(Subject.of(new Drag(), Map.of(), LoadedLaws.onClassPath())))
                .isEmpty();
    }
}
