// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * Sphere dropped on the middle of a simply supported beam: Hertz contact and modal superposition after S. Timoshenko,
 * Zur Frage nach der Wirkung eines Stosses auf einen Balken, 1913; W. Goldsmith, Impact, 1960. Expected values were
 * computed independently with Bernoulli-Euler modes; the sections here are slender enough for shear and rotary inertia
 * to vanish.
 */
@Tag("reference")
class SphereOnBeamTest {

    /** What the striker went through. */
    private static final class Blow {
        double peak;
        double peakTime;
        double impulse;
        double speed;
        double deflection;
        final java.util.List<double[]> contacts = new java.util.ArrayList<>();
    }

    private record Striker(double mass, double stiffness, double speed) {}

    /** Beam along x on springs at both ends that hold y and z only, so that bending does not stretch it. */
    private static Blow strike(Structure structure, Striker striker, double spring, double end) {
        NodeStore nodes = structure.nodes();
        int last = nodes.count - 1;
        int middle = last / 2;
        double[] push = new double[1];
        NodalLoads loads = (from, to, force, moment) -> {
            for (int n : new int[] {0, last}) {
                for (int i = 1; i < 3 && n >= from && n < to; i++) {
                    force[3 * n + i] -= spring * nodes.position[3 * n + i];
                }
            }
            if (middle >= from && middle < to) {
                force[3 * middle + 2] -= push[0];
            }
        };
        structure.evaluateForces();
        double step = 0.5 * structure.stableStep();
        BeamBench.Loop loop = new BeamBench.Loop(structure, loads);
        Blow blow = new Blow();
        double z = 0;
        double v = -striker.speed;
        double oldStep = 0;
        while (loop.time < end) {
            double overlap = nodes.position[3 * middle + 2] - z;
            double force = overlap > 0 ? striker.stiffness * overlap * Math.sqrt(overlap) : 0;
            record(blow, push[0], force, loop.time);
            push[0] = force;
            blow.impulse += force * step;
            blow.deflection = Math.max(blow.deflection, -nodes.position[3 * middle + 2]);
            loop.step(step);
            v += 0.5 * (oldStep + step) * force / striker.mass;
            z += step * v;
            oldStep = step;
        }
        blow.speed = v;
        return blow;
    }

    private static void record(Blow blow, double before, double force, double time) {
        if (before == 0 && force > 0) {
            blow.contacts.add(new double[] {time, Double.NaN});
        }
        if (before > 0 && force == 0) {
            blow.contacts.getLast()[1] = time;
        }
        if (force > blow.peak) {
            blow.peak = force;
            blow.peakTime = time;
        }
    }

    private static Structure beam(double length, double bending, double massPerLength, double side, int elements) {
        CrossSection section = new CrossSection.Rectangle(side, side);
        Material material =
                new Material("slender", massPerLength / section.area(), bending / section.secondMoment2(), 0.3);
        return BeamBench.straight(
                BeamBench.law(section, material, 0), length, elements, EndCondition.FREE, EndCondition.FREE);
    }

    /** Light striker: 3 %, of which the lumped mesh of 40 elements takes about 1 %. */
    @Test
    void lightSphereBouncesOnceWithTheKnownForce() {
        double stiffness = 4.0 / 3 * 1.18132e11 * Math.sqrt(0.01);
        Blow blow =
                strike(beam(0.1535, 179.167, 0.78, 0.002, 40), new Striker(0.0326726, stiffness, 0.01), 1e10, 0.0015);
        assertThat(blow.contacts).hasSize(1);
        assertThat(blow.peak).isCloseTo(4.912, within(0.03 * 4.912));
        assertThat(blow.peakTime).isCloseTo(7.209e-5, within(0.03 * 7.209e-5));
        assertThat(blow.contacts.getFirst()[1]).isCloseTo(1.553e-4, within(0.03 * 1.553e-4));
        assertThat(blow.speed).isCloseTo(0.003025, within(0.03 * 0.003025));
        assertThat(blow.impulse).isCloseTo(0.00042557, within(0.03 * 0.00042557));
        assertThat(blow.deflection).isCloseTo(1.115e-6, within(0.03 * 1.115e-6));
    }

    /** Heavy striker: rides on the beam in a chatter of contacts. Speed and deflection 3 %, impulse 2 %, peak 15 %. */
    @Test
    void heavySphereChattersAndIsThrownBack() {
        double stiffness = 4.0 / 3 * 1e9 * Math.sqrt(0.05);
        Blow blow = strike(beam(0.5, 200, 0.4, 0.006, 20), new Striker(2, stiffness, 0.5), 1e9, 0.06);
        assertThat(blow.contacts.size()).isGreaterThan(5);
        assertThat(blow.contacts.get(0)[1]).isCloseTo(0.0009124, within(0.15 * 0.0009124));
        assertThat(blow.contacts.get(1)[0]).isCloseTo(0.002258, within(0.15 * 0.002258));
        assertThat(blow.peak).isCloseTo(488.7, within(0.15 * 488.7));
        assertThat(blow.speed).isCloseTo(0.4963, within(0.03 * 0.4963));
        assertThat(blow.impulse).isCloseTo(1.9925, within(0.02 * 1.9925));
        assertThat(blow.deflection).isCloseTo(0.002502, within(0.03 * 0.002502));
    }
}
