// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.error.ReedlingException;

/**
 * The exact solution is that of K. L. Johnson, Contact Mechanics, 1985, section 4.2: an ellipse of semi-axes a > b and
 * eccentricity e with  R'/R'' = ((a/b)^2 E - K)/(K - E),  p0 = 3 P/(2 pi a b),
 * 1/(2 R') = (p0/E*) b/(e^2 a^2) (K - E),  d = (p0/E*) b K.
 */
class HertzLineTest {

    @Tag("reference")
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 0.3, 1, 3, 10, 20, 50})
    void outsideFollowsTheEllipticSolution(double grainOverCylinder) {
        double r = 0.001;
        double grain = grainOverCylinder * r;
        double exact = exactRadius(grain, 1 / (1 / grain + 1 / r));
        // the fit is published as good to a few tenths of a per cent; 0.6 % in force, force goes as the root of the
        // radius
        double force = Math.sqrt(HertzLine.outside(grain, r) / exact);
        assertThat(force).isEqualTo(1, within(0.006));
    }

    @Tag("reference")
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.1, 0.3, 0.6, 0.9, 0.98})
    void inBoreFollowsTheEllipticSolution(double grainOverBore) {
        double bore = 0.05;
        double grain = grainOverBore * bore;
        double exact = exactRadius(1 / (1 / grain - 1 / bore), grain);
        double force = Math.sqrt(HertzLine.inBore(grain, bore) / exact);
        assertThat(force).isEqualTo(1, within(0.006));
    }

    @Test
    void veryWideCylinderIsAPlane() {
        assertThat(HertzLine.outside(0.003, 1e6)).isEqualTo(0.003, within(1e-9));
        assertThat(HertzLine.inBore(0.003, 1e6)).isEqualTo(0.003, within(1e-9));
    }

    @Test
    void sphereThatFillsTheBoreIsRefused() {
        assertThatThrownBy(() -> HertzLine.inBore(0.099, 0.1))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("0.098");
    }

    /** Radius of the sphere on a plane with the same force at the same overlap, from the exact solution. */
    private static double exactRadius(double larger, double smaller) {
        double low = 1e-9;
        double high = 1 - 1e-15;
        for (int k = 0; k < 200; k++) {
            double middle = 0.5 * (low + high);
            if (radiusRatio(middle) < larger / smaller) {
                low = middle;
            } else {
                high = middle;
            }
        }
        double square = low * low;
        double[] ke = integrals(square);
        double a = 1;
        double b = Math.sqrt(1 - square);
        double pressure = square * a * a / (b * (ke[0] - ke[1])) / (2 * larger);
        double overlap = pressure * b * ke[0];
        double load = pressure * 2 * Math.PI * a * b / 3;
        double root = 0.75 * load / Math.pow(overlap, 1.5);
        return root * root;
    }

    private static double radiusRatio(double eccentricity) {
        double square = eccentricity * eccentricity;
        double[] ke = integrals(square);
        return (ke[1] / (1 - square) - ke[0]) / (ke[0] - ke[1]);
    }

    /** Complete elliptic integrals K and E of modulus e by the arithmetic-geometric mean. */
    private static double[] integrals(double square) {
        double a = 1;
        double b = Math.sqrt(1 - square);
        double sum = square / 2;
        double power = 0.5;
        for (int k = 0; k < 40; k++) {
            double c = (a - b) / 2;
            double mean = (a + b) / 2;
            b = Math.sqrt(a * b);
            a = mean;
            power *= 2;
            sum += power * c * c;
        }
        double first = Math.PI / (2 * a);
        return new double[] {first, first * (1 - sum)};
    }
}
