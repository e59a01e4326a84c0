// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.function.LongToDoubleFunction;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Packings of equal spheres that fell into a box: how much they fill, and on how many neighbours a sphere rests. */
@Tag("slow")
@Tag("reference")
class PackingTest {

    private static final int SEEDS = 3;
    private static final double FAR = 5 * Packing.DIAMETER; // layers along a wall have faded
    private static final double CLEAR = 3 * Packing.DIAMETER; // enough for counts of contacts
    private static final double LOOSE = 0.3; // solid fraction before a short fall
    private static final double RAIN = 0.1; // before a long one

    private static Spread seeds(LongToDoubleFunction one) {
        double[] values = new double[SEEDS];
        Arrays.setAll(values, seed -> one.applyAsDouble(seed + 1));
        return Spread.of(values);
    }

    /**
     * 0.64 +- 0.01. Scott and Kilgour, The density of random close packing of spheres, 1969; Bernal and Mason, Packing of
     * spheres, 1960 (from memory). The load presses these spheres together by a third of a per cent.
     */
    @Test
    void smoothSpheresComeToRandomClosePacking() {
        Packing.Pouring pouring = new Packing.Pouring(0, 0.3, 1e8, LOOSE, 0, 0.8);
        Spread fraction = seeds(seed -> Packing.pour(pouring, seed).solidFraction(FAR));
        fraction.print("solid fraction of smooth spheres");
        assertThat(fraction.mean()).as("%s", fraction).isCloseTo(0.64, within(0.01));
        assertThat(fraction.deviation()).isLessThan(0.01);
    }

    /** 0.58 to 0.62 is the range commonly reported for spheres poured with a friction of 0.5; no single source. */
    @Test
    void spheresWithFrictionStayLooser() {
        Packing.Pouring pouring = new Packing.Pouring(0.5, 0.3, 1e8, RAIN, 0, 0.75);
        Spread fraction = seeds(seed -> Packing.pour(pouring, seed).solidFraction(FAR));
        fraction.print("solid fraction with friction 0.5");
        assertThat(fraction.mean()).as("%s", fraction).isBetween(0.58, 0.62);
        assertThat(fraction.deviation()).isLessThan(0.01);
    }

    /**
     * Six contacts a sphere without load: counting of constraints, 2 d (Moukarzel, Isostatic phase transition and instability
     * in stiff granular materials, 1998; O'Hern, Silbert, Liu and Nagel, Jamming at zero temperature and zero applied
     * stress, 2003; from memory). Load adds contacts with the square root of the overlap, that is E^(-1/3): three moduli
     * give the value without load; drag brings the packing to rest. 0.2: the straight line over so wide a range of loads comes
     * out a tenth low, and it reaches as far beyond its last point as that is from the first.
     */
    @Test
    void smoothSpheresRestOnSixWithoutLoad() {
        Spread contacts = seeds(seed -> {
            StraightLine line = new StraightLine();
            for (double modulus : new double[] {1e6, 3e6, 1e7}) {
                Packing.Pouring pouring = new Packing.Pouring(0, 0.1, modulus, LOOSE, 10, 1.5);
                double z = Packing.pour(pouring, seed).coordination(CLEAR, 4);
                line.add(Math.pow(modulus, -1.0 / 3), z);
            }
            return line.start();
        });
        contacts.print("contacts of smooth spheres without load");
        assertThat(contacts.mean()).as("%s", contacts).isCloseTo(6, within(0.2));
    }

    /**
     * Four or a little more with very large friction: d + 1 by counting of constraints (Edwards and Grinev, Statistical
     * mechanics of stress transmission in disordered granular arrays, 1999; Silbert, Ertas, Grest, Halsey and Levine,
     * Geometry of frictionless and frictional sphere packings, 2002, find 4 to 4.6; from memory).
     */
    @Test
    void roughSpheresRestOnFourOrLittleMore() {
        Packing.Pouring pouring = new Packing.Pouring(10, 0.3, 1e8, LOOSE, 0, 0.5);
        Spread contacts = seeds(seed -> Packing.pour(pouring, seed).coordination(CLEAR, 2));
        contacts.print("contacts with friction 10");
        assertThat(contacts.mean()).as("%s", contacts).isBetween(4.0, 4.6);
        assertThat(contacts.deviation()).isLessThan(0.15);
    }
}
