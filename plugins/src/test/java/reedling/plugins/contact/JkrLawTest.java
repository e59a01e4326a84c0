// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import reedling.contact.Column;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.plugin.ParameterValues;

/**
 * The path of an adhesive contact against Johnson, Kendall and Roberts, Surface energy and the contact of elastic solids,
 * 1971. The numbers were computed from a = a(d) and F = F(a) of that paper by bisection and quadrature, apart from this
 * project; 0.1 % because they have six digits or less, works 0.5 % because the path is walked in finite steps.
 */
@Tag("reference")
class JkrLawTest {

    private static final double MASS = 1e-6;

    /** A contact, and what it does. */
    private enum Set {
        SOFT(
                0.05,
                1e-3,
                1e7,
                0.000235619,
                4.1347e-05,
                5.69858e-07,
                -2.26148e-07,
                -4.70408e-07,
                1.03689e-10,
                1.70976e-10),
        FINE(
                0.1,
                5e-6,
                3.5e10,
                2.35619e-06,
                1.00326e-07,
                6.71014e-10,
                -2.66292e-10,
                -5.5391e-10,
                1.22094e-15,
                2.01326e-15);

        final double work;
        final double radius;
        final double modulus;
        final double pullOff;
        final double unloadedRadius;
        final double unloadedOverlap;
        final double pullOffOverlap;
        final double tearOverlap;
        final double cycle;
        final double fromRest;

        Set(
                double work,
                double radius,
                double modulus,
                double pullOff,
                double unloadedRadius,
                double unloadedOverlap,
                double pullOffOverlap,
                double tearOverlap,
                double cycle,
                double fromRest) {
            this.work = work;
            this.radius = radius;
            this.modulus = modulus;
            this.pullOff = pullOff;
            this.unloadedRadius = unloadedRadius;
            this.unloadedOverlap = unloadedOverlap;
            this.pullOffOverlap = pullOffOverlap;
            this.tearOverlap = tearOverlap;
            this.cycle = cycle;
            this.fromRest = fromRest;
        }

        OneRow row() {
            return new OneRow(kernel(work, modulus), radius, MASS);
        }
    }

    static ContactKernel kernel(double work, double modulus) {
        Material half = new Material("half", 1000, 2 * modulus, 0);
        JkrProvider provider = new JkrProvider();
        return provider.create(ParameterValues.of(provider, Map.of("work_of_adhesion", work)))
                .bind(new MaterialPair(half, half, 1, 0, 0), ContactKind.GRAIN_GRAIN, 1);
    }

    @ParameterizedTest
    @EnumSource
    void bodiesInReachDoNotPullBeforeTheyTouch(Set set) {
        OneRow row = set.row();
        assertThat(row.to(0.9 * set.tearOverlap)).isZero();
        assertThat(row.to(0)).isZero();
        assertThat(row.to(1e-9 * set.unloadedOverlap)).isCloseTo(-8.0 / 9 * set.pullOff, within(1e-3 * set.pullOff));
    }

    @ParameterizedTest
    @EnumSource
    void contactWithoutLoadHasItsRadiusAndOverlap(Set set) {
        OneRow row = set.row();
        double force = row.to(set.unloadedOverlap);
        assertThat(force).isCloseTo(0, within(1e-3 * set.pullOff));
        assertThat(row.get(Column.CONTACT_RADIUS)).isCloseTo(set.unloadedRadius, within(1e-3 * set.unloadedRadius));
    }

    @ParameterizedTest
    @EnumSource
    void pullIsLargestAtPullOffAndContactTearsLater(Set set) {
        OneRow row = set.row();
        row.to(set.unloadedOverlap);
        double largest = 0;
        double at = 0;
        for (double d = set.unloadedOverlap; d > set.tearOverlap * 0.9999; d += 1e-4 * set.tearOverlap) {
            double force = row.to(d);
            at = force < largest ? d : at;
            largest = Math.min(largest, force);
        }
        assertThat(-largest).isCloseTo(set.pullOff, within(1e-3 * set.pullOff));
        assertThat(at).isCloseTo(set.pullOffOverlap, within(1e-2 * -set.pullOffOverlap)); // the force is flat there
        assertThat(row.to(0.99999 * set.tearOverlap)).isCloseTo(-5.0 / 9 * set.pullOff, within(2e-2 * set.pullOff));
        assertThat(row.to(1.001 * set.tearOverlap)).isZero();
        assertThat(row.to(0.5 * set.tearOverlap)).isZero();
    }

    /** At the tear the force has a vertical slope: 1e-9 short of it, the rest of the way is 3e-5 of the force. */
    @ParameterizedTest
    @EnumSource
    void tearingContactHoldsFiveNinthsOfThePull(Set set) {
        double tear =
                -0.75 * Math.cbrt(Math.PI * Math.PI * set.work * set.work * set.radius / (set.modulus * set.modulus));
        OneRow row = set.row();
        row.to(set.unloadedOverlap);
        assertThat(row.to(tear * (1 - 1e-9))).isCloseTo(-5.0 / 9 * set.pullOff, within(1e-3 * set.pullOff));
        assertThat(row.to(tear * (1 + 1e-9))).isZero();
    }

    @ParameterizedTest
    @EnumSource
    void workOfPartingIsThatOfTheCycle(Set set) {
        assertThat(work(set, 0)).isCloseTo(set.cycle, within(5e-3 * set.cycle));
        assertThat(work(set, set.unloadedOverlap)).isCloseTo(set.fromRest, within(5e-3 * set.fromRest));
    }

    private static double work(Set set, double from) {
        OneRow row = set.row();
        row.to(set.unloadedOverlap);
        int parts = 20_000;
        double step = (set.tearOverlap * (1 - 1e-5) - from) / parts;
        double work = 0;
        double before = row.to(from);
        for (int k = 1; k <= parts; k++) {
            double force = row.to(from + k * step);
            work += 0.5 * (before + force) * step;
            before = force;
        }
        return work;
    }

    /** The stored energy is the integral of the force; what is left when the contact tears is lost. */
    @ParameterizedTest
    @EnumSource
    void storedEnergyIsTheWorkAndIsLostInTheTear(Set set) {
        OneRow row = set.row();
        double end = 5 * set.unloadedOverlap;
        int parts = 20_000;
        double before = row.to(1e-9 * end);
        double work = 0;
        for (int k = 1; k <= parts; k++) {
            double force = row.to(end * k / parts);
            work += 0.5 * (before + force) * end / parts;
            before = force;
        }
        assertThat(row.get(Column.STORED_ENERGY)).isCloseTo(work, within(1e-6 * work));
        row.to(2 * set.tearOverlap);
        assertThat(row.get(Column.STORED_ENERGY)).isZero();
        assertThat(row.get(Column.LOST_ENERGY)).isCloseTo(set.cycle, within(5e-3 * set.cycle));
    }

    /** Tabor 1977; the numbers are the formula's, worked apart from this project with z0 = 0.4 nm. */
    @Test
    void taborNumberTellsSoftFromHard() {
        assertThat(JkrLaw.tabor(0.05, 1e7, 1e-3)).isCloseTo(731, within(1.0));
        assertThat(JkrLaw.tabor(0.1, 3.5e10, 5e-6)).isCloseTo(0.86077, within(1e-4));
        Material hard = new Material("hard", 1000, 7e10, 0);
        MaterialPair pair = new MaterialPair(hard, hard, 1, 0, 0);
        assertThat(new JkrLaw(0.1, 1, 1).cautions(pair, 5e-6))
                .singleElement()
                .asString()
                .contains("is 0.86, below 5");
        assertThat(new JkrLaw(10, 1, 1).cautions(pair, 1)).isEmpty();
    }

    @Test
    void weakAdhesionIsHertz() {
        OneRow row = new OneRow(kernel(1e-9, 1e7), 1e-3, MASS);
        double overlap = 1e-5;
        double hertz = 4.0 / 3 * 1e7 * Math.sqrt(1e-3) * Math.pow(overlap, 1.5);
        assertThat(row.to(overlap)).isCloseTo(hertz, within(1e-3 * hertz));
        assertThat(row.get(Column.STORED_ENERGY)).isCloseTo(0.4 * hertz * overlap, within(1e-3 * hertz * overlap));
    }
}
