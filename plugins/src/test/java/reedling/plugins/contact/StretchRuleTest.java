// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import reedling.contact.Column;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.material.Material;
import reedling.material.MaterialPair;

/**
 * Work round two closed paths of a sticking tangential spring whose stiffness goes from k to 2 k and back with the load.
 * Sheared to s at k, pressed, let back to no force at 2 k: the work put in is 1/2 k s^2, the work given back 1/2 k s^2 / 2
 * where the force was kept and 1/2 k s^2 2 where the stretch was. Sheared at 2 k, released to k, let back: put in k s^2,
 * given back 1/2 k s^2 where the stretch was kept and 2 k s^2 where the force was. So each of the simple rules gains on one
 * path what the passive one loses. Derived here.
 */
@Tag("conservation")
class StretchRuleTest {

    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final double STEP = 1e-6;
    private static final double SHEAR = 1e-6;
    private static final int PIECES = 64;

    /** A contact held by a force no slip can reach. */
    private static final class Sheared {
        final RowTile tile = new RowTile(4).set(Column.NORMAL_FORCE, 1e9);
        final ContactKernel kernel;
        double radius = 1e-4;
        double work;

        Sheared(StretchRule rule) {
            MaterialPair pair = new MaterialPair(GRAIN, GRAIN, 1, 1, 0);
            kernel = new MindlinLaw(rule).bind(pair, ContactKind.GRAIN_GRAIN, 1);
            step(0);
        }

        double step(double distance) {
            double before = force();
            tile.set(Column.CONTACT_RADIUS, radius).set(Column.SLIDING + 1, distance / STEP);
            double stored = tile.apply(kernel, STEP);
            work += 0.5 * (before + force()) * distance;
            tile.set(Column.RADIUS_RATIO, 1);
            return stored;
        }

        double force() {
            return tile.get(Column.FRICTION + 1);
        }

        void shear(double distance) {
            for (int k = 0; k < PIECES; k++) {
                step(distance / PIECES);
            }
        }

        void load(double factor) {
            tile.set(Column.RADIUS_RATIO, 1 / factor);
            radius *= factor;
            step(0);
        }

        /** Lets the spring come back to no force; its stored energy is what it still holds. */
        double release() {
            double stretch = tile.history(2);
            shear(-stretch);
            assertThat(Math.abs(force())).isLessThan(1e-9);
            return work;
        }
    }

    private static double stiffness(double radius) {
        return 8 * new MaterialPair(GRAIN, GRAIN, 1, 1, 0).contactShearModulus() * radius;
    }

    /** Work left in the contact over 1/2 k s^2; the sums of trapezia are exact for a linear spring. */
    private static double pressedWhileSheared(StretchRule rule) {
        Sheared contact = new Sheared(rule);
        contact.shear(SHEAR);
        contact.load(2);
        return contact.release() / (0.5 * stiffness(1e-4) * SHEAR * SHEAR);
    }

    private static double releasedWhileSheared(StretchRule rule) {
        Sheared contact = new Sheared(rule);
        contact.load(2);
        contact.shear(SHEAR);
        contact.load(0.5);
        return contact.release() / (0.5 * stiffness(1e-4) * SHEAR * SHEAR);
    }

    @Test
    void passiveRuleTakesWorkOnBothPaths() {
        assertThat(pressedWhileSheared(StretchRule.PASSIVE)).isCloseTo(1 - 0.5, within(1e-9));
        assertThat(releasedWhileSheared(StretchRule.PASSIVE)).isCloseTo(2 - 1, within(1e-9));
    }

    @Test
    void secantRuleGivesWorkWhenPressed() {
        assertThat(pressedWhileSheared(StretchRule.SECANT)).isCloseTo(1 - 2, within(1e-9));
        assertThat(releasedWhileSheared(StretchRule.SECANT)).isCloseTo(2 - 1, within(1e-9));
    }

    @Test
    void incrementalRuleGivesWorkWhenReleased() {
        assertThat(pressedWhileSheared(StretchRule.INCREMENTAL)).isCloseTo(1 - 0.5, within(1e-9));
        assertThat(releasedWhileSheared(StretchRule.INCREMENTAL)).isCloseTo(2 - 4, within(1e-9));
    }

    /** What the kernel reports to the ledger is 1/2 k s^2 at constant load, by every rule. */
    @ParameterizedTest
    @EnumSource(StretchRule.class)
    void storedEnergyIsThatOfTheSpring(StretchRule rule) {
        Sheared contact = new Sheared(rule);
        contact.shear(SHEAR);
        double expected = 0.5 * stiffness(1e-4) * SHEAR * SHEAR;
        assertThat(contact.step(0)).isCloseTo(expected, within(1e-9 * expected));
        assertThat(contact.work).isCloseTo(expected, within(1e-9 * expected));
    }
}
