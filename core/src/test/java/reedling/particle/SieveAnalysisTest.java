// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Distributions as laboratories give them; lengths are pure numbers here, as in the formulas. */
class SieveAnalysisTest {

    /** Closed forms evaluated elsewhere to six digits or more. */
    private static final Offset<Double> DIGITS = within(1e-6);

    private static final double[] OPENINGS = {1, 1.4, 2, 2.8, 4};
    private static final double[] PASSING = {0, 0.15, 0.55, 0.9, 1};

    static List<SizeDistribution> all() {
        return List.of(
                new RosinRammlerSize(Basis.MASS, 2, 1.2, 0.4, 6),
                new RosinRammlerSize(Basis.NUMBER, 2, 1.2, 0.4, 6),
                new RosinRammlerSize(Basis.MASS, 2, 9, 1.2, 2.5),
                new RosinRammlerSize(Basis.NUMBER, 2, 3, 0.5, 4),
                new SchuhmannSize(Basis.MASS, 5, 0.8, 0.8, 5),
                new SchuhmannSize(Basis.MASS, 5, 3, 0.8, 4),
                new SchuhmannSize(Basis.NUMBER, 5, 0.8, 0.8, 5),
                new SieveSize(Basis.MASS, OPENINGS, PASSING),
                new SieveSize(Basis.NUMBER, OPENINGS, PASSING),
                new UniformSize(1, 3),
                new NormalSize(2, 0.5, 1, 2.6));
    }

    /** Values of R = exp(-(x/2)^1.2); P. Rosin and E. Rammler 1933, DIN 66145. */
    @Tag("reference")
    @ParameterizedTest
    @CsvSource({"0.5, 0.827402", "1, 0.647087", "2, 0.367879", "4, 0.100520", "8, 0.00510246"})
    void rosinRammlerRetainsWhatItsFormulaSays(double size, double retained) {
        RosinRammlerSize sizes = new RosinRammlerSize(Basis.MASS, 2, 1.2, 1e-5, 200);
        assertThat(sizes.uncutRetained(size)).isEqualTo(retained, DIGITS);
        // the cuts leave out less than 5e-7 of the whole
        assertThat(1 - sizes.massPassing(size)).isEqualTo(retained, within(2e-6));
    }

    /** Median and size of 80 % passing of the same distribution. */
    @Tag("reference")
    @Test
    void rosinRammlerSizesOfGivenPartsAreThoseOfTheFormula() {
        RosinRammlerSize sizes = new RosinRammlerSize(Basis.MASS, 2, 1.2, 1e-5, 200);
        assertThat(sizes.uncutDiameter(0.5)).isEqualTo(1.47362, within(5e-6));
        assertThat(sizes.uncutDiameter(0.2)).isEqualTo(2.97344, within(5e-6));
        assertThat(sizes.diameterPassing(0.5)).isEqualTo(1.47362, within(5e-6));
        assertThat(sizes.diameterPassing(0.8)).isEqualTo(2.97344, within(5e-6));
    }

    /** Values of Y = (x/5)^0.8 and its median; R. Schuhmann 1940. */
    @Tag("reference")
    @ParameterizedTest
    @CsvSource({"0.5, 0.158489", "1, 0.275946", "2, 0.48045", "4, 0.836512"})
    void schuhmannPassesWhatItsFormulaSays(double size, double passing) {
        SchuhmannSize sizes = new SchuhmannSize(Basis.MASS, 5, 0.8, 1e-9, 5);
        assertThat(sizes.uncutPassing(size)).isEqualTo(passing, DIGITS);
        assertThat(sizes.massPassing(size)).isEqualTo(passing, DIGITS);
        assertThat(sizes.uncutDiameter(0.5)).isEqualTo(2.10224, within(5e-6));
        assertThat(sizes.diameterPassing(0.5)).isEqualTo(2.10224, within(5e-6));
    }

    /**
     * Grains are drawn one by one, weighed, and the line of the Rosin-Rammler net, ln ln 1/R over ln x, is fitted to their
     * mass: its slope is n. 2 % is the accuracy asked of such a fit in practice.
     */
    @Tag("reference")
    @ParameterizedTest
    @CsvSource({"1.2, 0.4, 6", "2.5, 0.6, 4", "6, 1, 3"})
    void drawnGrainsGiveTheUniformityBack(double uniformity, double smallest, double largest) {
        RosinRammlerSize sizes = new RosinRammlerSize(Basis.MASS, 2, uniformity, smallest, largest);
        double[] mass = new double[40];
        double whole = weigh(sizes, mass, 400_000, 17);
        double first = sizes.uncutRetained(smallest);
        double last = sizes.uncutRetained(largest);
        double below = 0;
        Line line = new Line();
        for (int k = 0; k < mass.length - 1; k++) {
            below += mass[k];
            double x = smallest + (largest - smallest) * (k + 1) / mass.length;
            double retained = first - below / whole * (first - last);
            line.add(Math.log(x), Math.log(-Math.log(retained)));
        }
        assertThat(line.slope()).isEqualTo(uniformity, within(0.02 * uniformity));
    }

    /** The mass of many draws in 20 classes against the distribution: a sum of squares as chi-square has, by mass. */
    @ParameterizedTest
    @MethodSource("all")
    void massOfTheDrawsIsDistributedAsStated(SizeDistribution sizes) {
        int classes = 20;
        double[] mass = new double[classes];
        double whole = weigh(sizes, mass, 300_000, 3);
        for (int k = 0; k < classes; k++) {
            double low = sizes.smallest() + (sizes.largest() - sizes.smallest()) * k / classes;
            double high = sizes.smallest() + (sizes.largest() - sizes.smallest()) * (k + 1) / classes;
            double expected = sizes.massPassing(high) - sizes.massPassing(low);
            // five standard errors of the mass of Poisson numbers of grains, the largest of the class
            double grain = high * high * high;
            double error = 5 * Math.sqrt(grain * expected / whole) + 1e-6;
            assertThat(mass[k] / whole).as("class %d of %s", k, sizes).isEqualTo(expected, within(error));
        }
    }

    private static double weigh(SizeDistribution sizes, double[] mass, int count, long seed) {
        RandomStream random = new RandomStream(seed);
        double whole = 0;
        for (int k = 0; k < count; k++) {
            double d = sizes.diameter(random);
            assertThat(d).isBetween(sizes.smallest(), sizes.largest());
            int place = (int) (mass.length * (d - sizes.smallest()) / (sizes.largest() - sizes.smallest()));
            mass[Math.min(place, mass.length - 1)] += d * d * d;
            whole += d * d * d;
        }
        return whole;
    }

    @Test
    void sieveTableIsMetAtItsOpeningsAndStraightOverTheLogarithmBetween() {
        SieveSize sizes = new SieveSize(Basis.MASS, OPENINGS, PASSING);
        for (int k = 0; k < OPENINGS.length; k++) {
            assertThat(sizes.massPassing(OPENINGS[k])).isEqualTo(PASSING[k], within(1e-12));
        }
        assertThat(sizes.massPassing(Math.sqrt(2 * 2.8))).isEqualTo(0.5 * (0.55 + 0.9), within(1e-12));
    }

    /** One class from 1 to 2 by mass: number mean of d^3 = ln 2 / ((1 - 1/8)/3). */
    @Test
    void meanCubeOfOneClassIsTheClosedForm() {
        SieveSize byMass = new SieveSize(Basis.MASS, new double[] {1, 2}, new double[] {0, 1});
        assertThat(byMass.meanCube()).isEqualTo(3 * Math.log(2) / (7.0 / 8), within(1e-12));
        SieveSize byNumber = new SieveSize(Basis.NUMBER, new double[] {1, 2}, new double[] {0, 1});
        assertThat(byNumber.meanCube()).isEqualTo(7.0 / 3 / Math.log(2), within(1e-12));
    }

    @Test
    void emptyClassesAtTheEndsAreLeftOut() {
        SieveSize sizes = new SieveSize(Basis.MASS, new double[] {1, 2, 3, 4}, new double[] {0, 0, 1, 1});
        assertThat(sizes.smallest()).isEqualTo(2);
        assertThat(sizes.largest()).isEqualTo(3);
    }

    @ParameterizedTest
    @MethodSource("all")
    void sizesOfGivenPartsInvertThePassingPart(SizeDistribution sizes) {
        for (double part : Arrays.asList(0.1, 0.5, 0.9)) {
            assertThat(sizes.massPassing(sizes.diameterPassing(part))).isEqualTo(part, within(1e-9));
        }
        assertThat(sizes.massPassing(sizes.smallest())).isZero();
        assertThat(sizes.massPassing(sizes.largest())).isEqualTo(1);
    }

    /** Least-squares line. */
    private static final class Line {
        private int n;
        private double x;
        private double y;
        private double xx;
        private double xy;

        void add(double u, double v) {
            n++;
            x += u;
            y += v;
            xx += u * u;
            xy += u * v;
        }

        double slope() {
            return (n * xy - x * y) / (n * xx - x * x);
        }
    }
}
