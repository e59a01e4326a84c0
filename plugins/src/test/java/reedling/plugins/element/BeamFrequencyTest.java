// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.CLAMPED;
import static reedling.structure.EndCondition.FREE;
import static reedling.structure.EndCondition.PINNED;

import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/** Natural frequencies and buckling loads from the eigenvalues of a finite-difference stiffness. */
@Tag("reference")
class BeamFrequencyTest {

    private static final CrossSection BAR = new CrossSection.Rectangle(0.02, 0.01);

    /** Modes that move along z and turn about y only. */
    private static double[] lateral(Structure structure) {
        return new StaticSolver(new StaticSolver(structure, 1e-6), d -> d == 2 || d == 4).frequencies();
    }

    private static double[] bar(int elements, EndCondition start, EndCondition end) {
        return lateral(BeamBench.straight(BeamBench.law(BAR, BeamBench.STEEL, 0), 1, elements, start, end));
    }

    /** Bernoulli-Euler frequencies (textbook) of a slender bar: 0.5 % for the first, 2 % for the third, 40 elements. */
    @Test
    void slenderBarsVibrateAsBernoulliEulerSays() {
        assertModes(bar(40, CLAMPED, FREE), 0, 8.35517, 52.3609, 146.612);
        assertModes(bar(40, CLAMPED, CLAMPED), 0, 53.166, 146.554, 287.305);
        assertModes(bar(40, PINNED, PINNED), 0, 23.4533, 93.8132, 211.08);
        assertModes(bar(40, CLAMPED, PINNED), 0, 36.6385, 118.732, 247.726);
        double[] free = bar(40, FREE, FREE);
        assertThat(free[1]).isLessThan(0.5);
        assertModes(free, 2, 53.166, 146.554, 287.305);
    }

    private static void assertModes(double[] got, int skip, double f1, double f2, double f3) {
        assertThat(got[skip]).isCloseTo(f1, within(0.005 * f1));
        assertThat(got[skip + 1]).isCloseTo(f2, within(0.0125 * f2));
        assertThat(got[skip + 2]).isCloseTo(f3, within(0.02 * f3));
    }

    /** Lumped masses: the error of the first clamped-free frequency falls by four per doubling. */
    @Test
    @Tag("convergence")
    void frequencyErrorIsOfSecondOrder() {
        double[] error = new double[3];
        for (int level = 0; level < 3; level++) {
            error[level] = bar(4 << level, CLAMPED, FREE)[0] / 8.35517 - 1;
        }
        assertThat(error[0] / error[1]).isBetween(3.5, 4.5);
        assertThat(error[1] / error[2]).isBetween(3.4, 4.6);
        // known error of this element with four elements
        assertThat(error[0]).isCloseTo(-0.0281, within(0.002));
    }

    /**
     * Stout pinned beam (S. Timoshenko, On the correction for shear, 1921): with the bending rotary inertia of the
     * section (inertia factor 0.5 for a square) 0.5 % for three modes at 60 elements.
     */
    @Test
    void stoutBeamVibratesAsTimoshenkoSays() {
        double[] got = lateral(BeamBench.straight(
                BeamBench.law(new CrossSection.Rectangle(0.1, 0.1), BeamBench.STEEL, 0, 0.5), 1, 60, PINNED, PINNED));
        double[] expected = {230.68, 881.522, 1857.2};
        for (int i = 0; i < 3; i++) {
            // the sheet's shear factor is 0.833333, the section's 10(1+nu)/(12+11nu) = 0.8497: 0.1 to 0.4 %
            assertThat(got[i]).isCloseTo(expected[i], within(0.005 * expected[i]));
        }
    }

    /** With the default inertia factor the rotary inertia in bending is doubled: Timoshenko's equation with 2 rho I. */
    @Test
    void defaultInertiaDoublesTheRotaryInertiaOfBending() {
        CrossSection square = new CrossSection.Rectangle(0.1, 0.1);
        double[] got = lateral(BeamBench.straight(BeamBench.law(square, BeamBench.STEEL, 0), 1, 60, PINNED, PINNED));
        double shear = square.shearFactor(0.3) * BeamBench.STEEL.shearModulus() * square.area();
        double bending = BeamBench.STEEL.youngsModulus() * square.secondMoment2();
        double mass = BeamBench.STEEL.density() * square.area();
        double rotary = BeamBench.STEEL.density() * square.polarMoment();
        for (int n = 1; n <= 3; n++) {
            double k2 = Math.PI * Math.PI * n * n;
            double a = mass * rotary / shear;
            double b = mass + rotary * k2 + mass * bending * k2 / shear;
            double c = bending * k2 * k2;
            double hertz = Math.sqrt((b - Math.sqrt(b * b - 4 * a * c)) / (2 * a)) / (2 * Math.PI);
            assertThat(got[n - 1]).isCloseTo(hertz, within(0.003 * hertz));
        }
    }

    /** Torsion of a round bar, f = c_s / 4L (textbook), 0.5 % at 20 elements. */
    @Test
    void roundBarTwistsAtItsFrequency() {
        double diameter = Math.sqrt(Math.sqrt(32 * 1.5708e-8 / Math.PI));
        Material bar = new Material("bar", 7850, 2 * 8e10 * 1.3, 0.3);
        Structure structure =
                BeamBench.straight(BeamBench.law(new CrossSection.SolidCircle(diameter), bar, 0), 1, 20, CLAMPED, FREE);
        double[] got = new StaticSolver(new StaticSolver(structure, 1e-6), d -> d == 3).frequencies();
        assertThat(got[0]).isCloseTo(798.087, within(0.005 * 798.087));
    }

    /** Taut string, f_n = n/2L sqrt(T/mu) (textbook), 0.5 %: 40 elements put mode 3 at -0.2 %. */
    @Test
    void tautWireVibratesAsAString() {
        CrossSection section = new CrossSection.SolidCircle(0.001);
        double stretch = 500 / (2e11 * section.area());
        Material wire = new Material("string", 0.05 * (1 + stretch) / section.area(), 2e11, 0.3);
        double[] got = lateral(BeamBench.straight(BeamBench.law(section, wire, 0), 2, 40, PINNED, PINNED, stretch));
        for (int n = 1; n <= 3; n++) {
            assertThat(got[n - 1]).isCloseTo(25.0 * n, within(0.005 * 25 * n));
        }
    }

    /**
     * A wire pulled by 25 times 12 EI/L^2 of its elements stays stable: the shear stiffness does not eat the tension.
     */
    @Test
    void hardPulledWireStaysStable() {
        CrossSection section = new CrossSection.SolidCircle(0.0012);
        double element = 0.03;
        double bending = BeamBench.STEEL.youngsModulus() * section.secondMoment2();
        double tension = 25 * 12 * bending / (element * element);
        double stretch = tension / (BeamBench.STEEL.youngsModulus() * section.area());
        Structure structure =
                BeamBench.straight(BeamBench.law(section, BeamBench.STEEL, 0), 0.3, 10, PINNED, PINNED, stretch);
        double[] all = new StaticSolver(structure, 1e-6).squaredFrequencies();
        // the wire may spin freely about its own axis: one zero, everything else positive
        double spin = 1e-9 * all[all.length - 1];
        assertThat(all[0]).isBetween(-spin, spin);
        assertThat(all[1]).isGreaterThan(spin);
        double mass = BeamBench.STEEL.density() * section.area() / (1 + stretch);
        double string = Math.sqrt(tension / mass) / 0.6 * Math.sqrt(1 + Math.PI * Math.PI * bending / (tension * 0.09));
        assertThat(lateral(structure)[0]).isCloseTo(string, within(0.006 * string));
    }

    /** Critical loads (L. Euler; textbook): 3454.36, 863.59, 13817.4 and 7066.75 N, 0.5 % at 32 elements. */
    @Test
    void columnsBuckleAtEulersLoad() {
        assertThat(heldCritical(PINNED, PINNED)).isCloseTo(3454.36, within(0.005 * 3454.36));
        assertThat(heldCritical(CLAMPED, CLAMPED)).isCloseTo(13817.4, within(0.005 * 13817.4));
        assertThat(heldCritical(CLAMPED, PINNED)).isCloseTo(7066.75, within(0.005 * 7066.75));
        assertThat(freeCritical()).isCloseTo(863.59, within(0.005 * 863.59));
    }

    private static double heldCritical(EndCondition start, EndCondition end) {
        ElementLaw law = BeamBench.law(BAR, BeamBench.STEEL, 0);
        double axial = BeamBench.STEEL.youngsModulus() * BAR.area();
        UnivariateFunction lowest = load -> new StaticSolver(
                        new StaticSolver(BeamBench.straight(law, 1, 32, start, end, -load / axial), 1e-6),
                        d -> d == 2 || d == 4)
                .squaredFrequencies()[0];
        return new BrentSolver(1e-5).solve(60, lowest, 1000, 16000);
    }

    private static double freeCritical() {
        ElementLaw law = BeamBench.law(BAR, BeamBench.STEEL, 0);
        UnivariateFunction lowest = load -> {
            Structure structure = BeamBench.straight(law, 1, 32, CLAMPED, FREE);
            StaticSolver full = new StaticSolver(structure, 1e-6);
            full.loads[6 * 32] = -load;
            full.solve(1);
            return new StaticSolver(full, d -> d == 2 || d == 4).squaredFrequencies()[0];
        };
        return new BrentSolver(1e-5).solve(60, lowest, 500, 1200);
    }

    /** Chain hanging from a pin (D. Bernoulli): omega_n = j_0n/2 sqrt(g/L), 1 % with 40 nearly limp elements. */
    @Test
    void hangingChainSwingsAsBernoulliSays() {
        StructureBuilder builder = new StructureBuilder();
        Material limp = new Material("chain", 1e6, 1e10, 0.3);
        ElementLaw law = BeamBench.law(new CrossSection.SolidCircle(1e-4), limp, 0);
        BeamBench.line(builder, law, BeamBench.ORIGIN, new Position(0, 0, -1), 40, 0);
        builder.support(0, PINNED, -1);
        Structure structure = builder.build();
        StaticSolver full = new StaticSolver(structure, 1e-7);
        for (int n = 0; n <= 40; n++) {
            full.loads[6 * n + 2] = -9.81 * structure.nodes().mass[n];
        }
        new StaticSolver(full, d -> d == 2).solve(1);
        double[] got = new StaticSolver(full, d -> d == 0 || d == 4).frequencies();
        assertThat(got[0]).isCloseTo(0.599388, within(0.01 * 0.599388));
        assertThat(got[1]).isCloseTo(1.37585, within(0.01 * 1.37585));
    }
}
