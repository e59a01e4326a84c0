// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Section values against tables. */
class CrossSectionTest {

    /** Round tubes, nu = 0.3; shear factors of G. R. Cowper, 1966; 1e-5 because the table has six digits. */
    @Test
    @Tag("reference")
    void tubesHaveTheirTableValues() {
        double[][] table = {
            {0.06, 0.004, 0.000703717, 2.77264e-7, 5.54529e-7, 9.24215e-6, 0.53495},
            {0.0337, 0.0026, 0.000254029, 3.09271e-8, 6.18542e-8, 1.83544e-6, 0.536549}
        };
        for (double[] row : table) {
            CrossSection tube = new CrossSection.Tube(row[0], row[0] - 2 * row[1]);
            assertClose(tube.area(), row[2]);
            assertClose(tube.secondMoment2(), row[3]);
            assertClose(tube.torsionConstant(), row[4]);
            assertClose(1 / tube.bendingStress(1, 0), row[5]);
            assertClose(tube.shearFactor(0.3), row[6]);
        }
    }

    private static void assertClose(double got, double expected) {
        assertThat(got).isCloseTo(expected, within(1e-5 * expected));
    }

    @Test
    void thinHoleLeavesASolidCircle() {
        CrossSection tube = new CrossSection.Tube(0.002, 1e-9);
        CrossSection wire = new CrossSection.SolidCircle(0.002);
        assertClose(tube.area(), wire.area());
        assertClose(tube.secondMoment3(), wire.secondMoment3());
        assertClose(tube.shearFactor(0.45), wire.shearFactor(0.45));
        assertClose(tube.bendingStress(3, 4), wire.bendingStress(3, 4));
    }

    /** Square section: torsion constant 0.1406 a^4 (textbook), within the 0.4 % of the fit. */
    @Test
    @Tag("reference")
    void squareTwistsAsTheTextbookSays() {
        double torsion = new CrossSection.Rectangle(1, 1).torsionConstant();
        assertThat(torsion).isCloseTo(0.1406, within(0.004 * 0.1406));
    }

    @Test
    void rectangleStressAddsBothBendings() {
        CrossSection bar = new CrossSection.Rectangle(0.02, 0.01);
        double expected = 3 / (0.02 * 1e-4 / 6) + 5 / (0.01 * 4e-4 / 6);
        assertClose(bar.bendingStress(-3, 5), expected);
    }
}
