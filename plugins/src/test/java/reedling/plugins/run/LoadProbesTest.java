// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.parallel.WorkerTeam;
import reedling.probe.MeasuredWindow;
import reedling.probe.OverlapSample;
import reedling.probe.WallLoads;
import reedling.probe.WireLoads;
import reedling.run.Model;
import reedling.run.Simulation;

class LoadProbesTest {

    private static final double GRAVITY = 9.81;

    private final WorkerTeam team = new WorkerTeam(1);

    @AfterEach
    void endTeam() {
        team.close();
    }

    private Simulation after(double time, Model model) {
        Simulation simulation = new Simulation(model, team);
        simulation.begin();
        while (simulation.time() < time) {
            simulation.step();
        }
        return simulation;
    }

    /**
     * Wires at rest under their own weight. A clamped beam under tension T and load w: solving T y'' - EI y'''' = -w with
     * y = y' = 0 at both ends gives y(L/2) = w L^2/(8 T) - w L/(2 T k) tanh(k L/4), k = sqrt(T/EI). With 16 elements
     * across clamp layers of 1/k = 2.4 mm the mesh is coarse: 5 %. Tension stays what it was at the start.
     */
    @Test
    @Tag("reference")
    void sagAndTensionOfRestingWiresAreThoseOfTheBeamUnderTension() {
        Simulation simulation = after(0.3, RainDeck.still().feeding(0).model());
        WireLoads loads = new WireLoads(simulation.model().structure(), new MeasuredWindow(0, 1, 10));
        loads.sample(0.3, simulation.interactions().wires());
        double tension = RainDeck.TENSION;
        double stiffness = 6e7 * Math.PI * Math.pow(2e-3, 4) / 64;
        double k = Math.sqrt(tension / stiffness);
        double length = RainDeck.SPAN;
        double weight = 1200 * Math.PI * 1e-6 * GRAVITY / (1 + tension / (6e7 * Math.PI * 1e-6)); // stretched: lighter
        double sag = weight * length * length / (8 * tension)
                - weight * length / (2 * tension * k) * Math.tanh(k * length / 4);
        for (int wire = 0; wire < RainDeck.WIRES; wire++) {
            assertThat(loads.window().sag(wire)).isCloseTo(sag, within(0.05 * sag));
            assertThat(loads.window().axialForce(wire)).isCloseTo(tension, within(1e-3 * tension));
            assertThat(loads.window().contactForce(wire)).isZero();
            assertThat(loads.window().stressedElement(wire)).isIn(0, 15); // at a clamp
            double axialStress = tension / (Math.PI * 1e-6);
            assertThat(loads.window().fibreStress(wire)).isBetween(axialStress, 1.05 * axialStress);
        }
    }

    /**
     * A grain that came to rest on two wires presses them with its weight. The step is short against the 3.6 ms in which
     * it swings on the wires, since weight comes once a step and the wires' push in every fine step.
     */
    @Test
    void aRestingGrainPressesItsTwoWires() {
        double radius = 4e-3;
        double height = Math.sqrt(Math.pow(radius + 1e-3, 2) - Math.pow(0.5 * RainDeck.PITCH, 2));
        Simulation simulation = after(
                0.25,
                RainDeck.still()
                        .feeding(0)
                        .longestStep(2e-5)
                        .grain(0.03, 0.5 * RainDeck.PITCH, height + 1e-5, radius)
                        .model());
        double weight = simulation.model().grains().mass(0) * GRAVITY;
        double[] forces = new double[3 * RainDeck.WIRES];
        assertThat(simulation.interactions().wires().addForces(forces)).isTrue();
        assertThat(forces[2] + forces[5]).isCloseTo(-weight, within(0.01 * weight));
        WireLoads loads = new WireLoads(simulation.model().structure(), new MeasuredWindow(0, 1, 10));
        loads.sample(0.25, simulation.interactions().wires());
        assertThat(loads.interval().contactForce(0)).isCloseTo(Math.hypot(forces[1], forces[2]), within(1e-3 * weight));
        assertThat(loads.interval().contactForce(2)).isZero();
        assertThat(forces[1]).isCloseTo(-forces[4], within(0.01 * weight)).isNegative();
    }

    @Test
    void overlapsOfGrainsPlacedByHandAreFound() {
        Simulation simulation = new Simulation(
                RainDeck.still()
                        .feeding(0)
                        .grain(0.02, 0, 0.02, 3e-3)
                        .grain(0.02, 4.94e-3, 0.02, 2e-3) // overlap 0.06 mm: 3 % of the smaller radius
                        .grain(0.04, RainDeck.PITCH, 3.97e-3, 3e-3) // on a wire: 0.03 mm, 1 % of its radius
                        .model(),
                team);
        simulation.begin();
        OverlapSample sample = new OverlapSample();
        sample.sample(simulation.interactions(), simulation.model().grains());
        assertThat(sample.pairs().total()).isEqualTo(1);
        assertThat(sample.pairs().percentile(0.99)).isBetween(0.0299, 0.0315);
        assertThat(sample.wires().total()).isEqualTo(1);
        assertThat(sample.wires().percentile(0.5)).isBetween(0.0099, 0.0105);
        assertThat(sample.wireDepth().percentile(0.5)).isBetween(0.0299e-3, 0.0315e-3);
    }

    @Test
    void wallLoadsAreMeansAndLargestForcesOfAnInterval() {
        WallLoads loads = new WallLoads(2);
        loads.sample(new double[] {3, 0, 4, 1, 0, 0, 0, 0, 0, 0, 0, 0});
        loads.sample(new double[] {1, 0, 0, 3, 0, 0, 0, 2, 0, 0, 0, 0});
        assertThat(loads.mean(0, 0)).isEqualTo(2);
        assertThat(loads.mean(0, 3)).isEqualTo(2);
        assertThat(loads.largest(0)).isEqualTo(5);
        assertThat(loads.largest(1)).isEqualTo(2);
        loads.beginInterval();
        loads.sample(new double[12]);
        assertThat(loads.largest(0)).isZero();
        assertThat(loads.largestEver(0)).isEqualTo(5);
    }
}
