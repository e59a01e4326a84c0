// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Solid fractions of regular packings of equal spheres, closed forms of geometry, from generated lattices. */
@Tag("reference")
class BoxFillTest {

    /** Fraction of one rectangular cell, placed askew on the lattice, for spheres of diameter 1. */
    private static double fraction(double[] cell, List<double[]> places) {
        double[] low = {0.123, 0.377, 0.241};
        BoxFill fill = new BoxFill(low, new double[] {low[0] + cell[0], low[1] + cell[1], low[2] + cell[2]});
        for (int i = -3; i <= 3; i++) {
            for (int j = -3; j <= 3; j++) {
                for (int k = -3; k <= 3; k++) {
                    for (double[] place : places) {
                        fill.add(
                                i * cell[0] + place[0] * cell[0],
                                j * cell[1] + place[1] * cell[1],
                                k * cell[2] + place[2] * cell[2],
                                0.5);
                    }
                }
            }
        }
        return fill.fraction();
    }

    /** 1e-6: slices of a sphere that an edge of the box cuts are summed by a rule that expects a smooth area. */
    @Test
    void regularPackingsFillWhatGeometrySays() {
        double[] corner = {0, 0, 0};
        double[] centre = {0.5, 0.5, 0.5};
        assertThat(fraction(new double[] {1, 1, 1}, List.of(corner))).isCloseTo(0.5235988, within(1e-6));
        double bcc = 2 / Math.sqrt(3);
        assertThat(fraction(new double[] {bcc, bcc, bcc}, List.of(corner, centre)))
                .isCloseTo(0.6801748, within(1e-6));
        double fcc = Math.sqrt(2);
        List<double[]> faces =
                List.of(corner, new double[] {0.5, 0.5, 0}, new double[] {0.5, 0, 0.5}, new double[] {0, 0.5, 0.5});
        assertThat(fraction(new double[] {fcc, fcc, fcc}, faces)).isCloseTo(0.7404805, within(1e-6));
        // rows staggered along x, layers over the gaps between rows: each sphere touches ten others
        double[] tetragonal = {1, Math.sqrt(3), Math.sqrt(3)};
        List<double[]> staggered =
                List.of(corner, new double[] {0.5, 0.5, 0}, new double[] {0.5, 0, 0.5}, new double[] {0, 0.5, 0.5});
        assertThat(fraction(tetragonal, staggered)).isCloseTo(0.6981317, within(1e-6));
    }

    @Test
    void sphereInsideAndSphereAcrossACornerCountForWhatIsInside() {
        double ball = Math.PI / 6;
        BoxFill whole = new BoxFill(new double[] {-1, -1, -1}, new double[] {1, 1, 1});
        whole.add(0.1, -0.2, 0.3, 0.5);
        assertThat(whole.fraction()).isCloseTo(ball / 8, within(1e-7));
        BoxFill eighth = new BoxFill(new double[] {0, 0, 0}, new double[] {1, 1, 1});
        eighth.add(0, 0, 0, 0.5);
        assertThat(eighth.fraction()).isCloseTo(ball / 8, within(1e-7));
        BoxFill none = new BoxFill(new double[] {0, 0, 0}, new double[] {1, 1, 1});
        none.add(-0.4, -0.4, 0.5, 0.5);
        assertThat(none.fraction()).isCloseTo(0, within(1e-15));
    }
}
