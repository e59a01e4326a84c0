// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.FREE;

import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.structure.CrossSection;
import reedling.structure.NodalLoads;
import reedling.structure.Structure;

/** The stable step is a bound, and a close one. */
class BeamStepLimitTest {

    private static final double MARGIN = 0.9;

    private static Structure free(CrossSection section, double element, int count, double damping) {
        Structure structure = BeamBench.straight(
                BeamBench.law(section, BeamBench.STEEL, damping), element * count, count, FREE, FREE);
        structure.evaluateForces();
        return structure;
    }

    /**
     * Element bound (B. Irons and G. Treharne, A bound theorem in eigenvalues, 1971): never above 2/omega_max of the
     * mesh and within 12 % of it for slender elements; 0.82 L/c for round wires.
     */
    @Test
    @Tag("reference")
    void boundIsBelowTheTrueLimitAndCloseToIt() {
        double speed = Math.sqrt(2.1e11 / 7850);
        for (double ratio : new double[] {2, 5, 20}) {
            Structure structure = free(new CrossSection.SolidCircle(0.001), 0.001 * ratio, 12, 0);
            double bound = structure.stableStep() / MARGIN;
            double[] all = new StaticSolver(structure, 1e-7).squaredFrequencies();
            double limit = 2 / Math.sqrt(all[all.length - 1]);
            assertThat(limit / bound).as("length over thickness %s", ratio).isBetween(1 - 1e-6, 1.25);
            if (ratio == 20) {
                assertThat(bound).isCloseTo(0.816 * 0.02 / speed, within(0.01 * 0.02 / speed));
            }
        }
    }

    /** The rod limit h/c (Courant, Friedrichs and Lewy): 1.93342e-6 s; a step of 1.05 of it is refused. */
    @Test
    @Tag("reference")
    void stepBeyondTheRodLimitIsRefused() {
        Structure structure = free(new CrossSection.Rectangle(0.01, 0.01), 0.01, 20, 0);
        assertThat(structure.stableStep() / MARGIN).isLessThan(1.05 * 1.93342e-6);
    }

    /** 1e5 steps at 0.95 of the bound from random velocities: the energy stays what it was. */
    @Test
    @Tag("conservation")
    void justBelowTheBoundTheEnergyStays() {
        Structure structure = free(new CrossSection.Rectangle(0.01, 0.01), 0.01, 20, 0);
        double step = 0.95 * structure.stableStep() / MARGIN;
        Random random = new Random(5);
        for (int i = 0; i < 63; i++) {
            structure.nodes().velocity[i] = 1e-3 * random.nextGaussian();
            structure.nodes().spin[i] = 0.1 * random.nextGaussian();
        }
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double start = structure.energy(loop.strainEnergy).balance();
        double largest = 0;
        for (int n = 0; n < 100_000; n++) {
            loop.step(step);
            largest = Math.max(largest, structure.energy(loop.strainEnergy).balance());
        }
        // modes near the limit swing their discrete energy by 1/(1 - (w h/2)^2), here up to a factor of about 10
        assertThat(largest).isLessThan(10 * start);
    }

    /** A fifth above the true limit the same mesh blows up, so the bound is not idle. */
    @Test
    void wellAboveTheLimitTheMeshBlowsUp() {
        Structure structure = free(new CrossSection.SolidCircle(0.001), 0.005, 12, 0);
        double[] all = new StaticSolver(structure, 1e-7).squaredFrequencies();
        double step = 1.05 * 2 / Math.sqrt(all[all.length - 1]);
        Random random = new Random(6);
        for (int i = 0; i < 39; i++) {
            structure.nodes().velocity[i] = 1e-6 * random.nextGaussian();
        }
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        loop.step(step);
        double start = structure.energy(loop.strainEnergy).kinetic();
        for (int n = 0; n < 60; n++) {
            loop.step(step);
        }
        assertThat(structure.energy(loop.strainEnergy).kinetic()).isGreaterThan(1e3 * start);
    }

    /** Strain-rate damping shortens the step by sqrt(1 + x^2) - x, x = beta w/2. */
    @Test
    void dampingShortensTheStep() {
        double plain = free(new CrossSection.SolidCircle(0.001), 0.005, 12, 0).stableStep();
        double frequency = 2 * MARGIN / plain;
        double ratio = 0.3;
        double damped = free(new CrossSection.SolidCircle(0.001), 0.005, 12, 2 * ratio / frequency)
                .stableStep();
        assertThat(damped / plain).isCloseTo(Math.sqrt(1 + ratio * ratio) - ratio, within(1e-12));
    }
}
