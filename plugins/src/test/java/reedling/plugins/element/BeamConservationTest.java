// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.CLAMPED;
import static reedling.structure.EndCondition.FREE;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.structure.CrossSection;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;
import reedling.structure.StructureEnergy;

/** Free flight keeps momentum to round-off and energy within the band of a symplectic method. */
@Tag("conservation")
class BeamConservationTest {

    private static final int ELEMENTS = 16;

    private static Structure rod(double dampingTime) {
        return BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(0.002), BeamBench.STEEL, dampingTime),
                0.1,
                ELEMENTS,
                FREE,
                FREE);
    }

    /**
     * Tumbling and slightly bending rod, 1e5 steps at the full step: |dP|, |dH| < 1e-12, drift < 1e-7 of the energy.
     */
    @Test
    void tumblingRodKeepsMomentumAndEnergy() {
        Structure structure = rod(0);
        NodeStore nodes = structure.nodes();
        for (int n = 0; n <= ELEMENTS; n++) {
            double s = 2.0 * n / ELEMENTS - 1;
            nodes.velocity[3 * n] = 0.3;
            nodes.velocity[3 * n + 1] = 3 * s + 0.02 * s * s;
            nodes.velocity[3 * n + 2] = 1 - 2 * s + 0.02 * s * s * s;
            nodes.spin[3 * n] = 30;
            nodes.spin[3 * n + 1] = 40;
            nodes.spin[3 * n + 2] = 60;
        }
        structure.evaluateForces();
        double step = structure.stableStep();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double[] before = BeamBench.momentum(structure);
        double early = meanEnergy(loop, step, 10_000);
        for (int n = 0; n < 80_000; n++) {
            loop.step(step);
        }
        double late = meanEnergy(loop, step, 10_000);
        double[] after = BeamBench.momentum(structure);
        double linear = Math.sqrt(before[0] * before[0] + before[1] * before[1] + before[2] * before[2]);
        double angular = Math.sqrt(before[3] * before[3] + before[4] * before[4] + before[5] * before[5]);
        for (int i = 0; i < 6; i++) {
            assertThat(after[i]).isCloseTo(before[i], within(1e-12 * (i < 3 ? linear : angular)));
        }
        assertThat(late / early - 1).isCloseTo(0, within(1e-7));
    }

    private static double meanEnergy(BeamBench.Loop loop, double step, int steps) {
        double sum = 0;
        for (int n = 0; n < steps; n++) {
            loop.step(step);
            sum += loop.structure.energy(loop.strainEnergy).balance();
        }
        return sum / steps;
    }

    /** Strain-rate damping must not brake a rod that only spins: kinetic energy and spin stay over many turns. */
    @Test
    void damperLeavesASpinningRodAlone() {
        double stable = stableStep();
        Structure structure = rod(0.1 * stable);
        NodeStore nodes = structure.nodes();
        double spin = 400;
        for (int n = 0; n <= ELEMENTS; n++) {
            nodes.position[3 * n] -= 0.05;
        }
        for (int n = 0; n <= ELEMENTS; n++) {
            nodes.velocity[3 * n + 1] = spin * nodes.position[3 * n];
            nodes.spin[3 * n + 2] = spin;
        }
        structure.evaluateForces();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double step = structure.stableStep();
        loop.step(step);
        for (int n = 0; n < 20_000; n++) {
            loop.step(step);
        }
        double settled = structure.energy(loop.strainEnergy).kinetic();
        double[] before = BeamBench.momentum(structure);
        int turns = (int) Math.round(10 * 2 * Math.PI / spin / step);
        for (int n = 0; n < turns; n++) {
            loop.step(step);
        }
        double[] after = BeamBench.momentum(structure);
        assertThat(after[5]).isCloseTo(before[5], within(1e-12 * before[5]));
        assertThat(structure.energy(loop.strainEnergy).kinetic()).isCloseTo(settled, within(1e-11 * settled));
    }

    private static double stableStep() {
        Structure structure = rod(0);
        structure.evaluateForces();
        return structure.stableStep();
    }

    /** Strain-rate damping of a free vibration: ratio beta w / 2, and what the rod loses is what the damper books. */
    @Test
    void strainDampingHasItsRatioAndBooksItsLoss() {
        double dampingTime = 2e-6;
        Structure structure = BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(0.002), BeamBench.STEEL, dampingTime),
                0.1,
                ELEMENTS,
                CLAMPED,
                FREE);
        double omega = 2
                * Math.PI
                * new StaticSolver(new StaticSolver(structure, 1e-6), d -> d == 2 || d == 4).frequencies()[0];
        StaticSolver pull = new StaticSolver(structure, 1e-6);
        pull.loads[6 * ELEMENTS + 2] = 0.1;
        pull.solve(1);
        structure.evaluateForces();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double step = structure.stableStep();
        loop.step(step);
        double start = structure.energy(loop.strainEnergy).balance();
        double before = structure.energy(loop.strainEnergy).strain();
        while (loop.time < 40 * 2 * Math.PI / omega) {
            loop.step(step);
        }
        StructureEnergy end = structure.energy(loop.strainEnergy);
        double left = (end.kinetic() + end.strain()) / before;
        // the static shape holds 97 % of its energy in the first mode; higher modes are gone by now
        double ratio = -Math.log(left / 0.97) / (2 * 40 * 2 * Math.PI);
        assertThat(ratio).isCloseTo(0.5 * dampingTime * omega, within(0.02 * 0.5 * dampingTime * omega));
        assertThat(end.balance()).isCloseTo(start, within(1e-4 * start));
    }

    /** A turned rod vibrates with the bits of its momentum intact even where quaternions change sign. */
    @Test
    void quaternionSignDoesNotMatter() {
        Structure plain = rod(0);
        Structure flipped = rod(0);
        for (Structure structure : new Structure[] {plain, flipped}) {
            SpatialRotation.turn(structure.nodes().orientation, 4 * 5, 0.01, 0.02, -0.03);
        }
        for (int i = 20; i < 24; i++) {
            flipped.nodes().orientation[i] = -flipped.nodes().orientation[i];
        }
        plain.evaluateForces();
        flipped.evaluateForces();
        assertThat(flipped.nodes().force).isEqualTo(plain.nodes().force);
        assertThat(flipped.nodes().moment).isEqualTo(plain.nodes().moment);
    }
}
