// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.FREE;
import static reedling.structure.EndCondition.PINNED;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/** Large motions against closed forms, by the step loop itself. */
@Tag("reference")
class BeamMotionTest {

    /** Inextensible chain of length 2.5 m over a span of 2 m, 3 N/m (catenary, textbook): 0.5 %, 40 elements. */
    @Test
    void slackWireHangsAsACatenary() {
        int elements = 40;
        CrossSection section = new CrossSection.SolidCircle(2e-4);
        Material limp = new Material("chain", 3 / 9.81 / section.area(), 1e12, 0.3);
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        // a circular arc of 2.5 m between the supports; every element is straight and stress free there
        double opening = 1.131;
        double radius = 1.25 / opening;
        for (int i = 0; i < 20; i++) {
            double slope = (opening * Math.cos(opening) - Math.sin(opening)) / (opening * opening);
            opening -= (Math.sin(opening) / opening - 0.8) / slope;
            radius = 1.25 / opening;
        }
        int[] pairs = new int[2 * elements];
        for (int i = 0; i <= elements; i++) {
            double phi = opening * (2.0 * i / elements - 1);
            builder.node(new Position(radius * Math.sin(phi), 0, radius * (Math.cos(opening) - Math.cos(phi))));
            if (i < elements) {
                pairs[2 * i] = i;
                pairs[2 * i + 1] = i + 1;
            }
        }
        builder.body("chain", BeamBench.law(section, limp, 0), pairs, new Position(0, 1, 0), 0);
        builder.support(0, PINNED, -1);
        builder.support(elements, PINNED, -1);
        Structure structure = builder.build();
        structure.evaluateForces();
        relax(structure, 0.8 * structure.stableStep(), 60_000, 0.9997);
        NodeStore nodes = structure.nodes();
        assertThat(-nodes.position[3 * (elements / 2) + 2]).isCloseTo(0.663594, within(0.005 * 0.663594));
        assertThat(Math.abs(nodes.force[0])).isCloseTo(2.53651, within(0.005 * 2.53651));
        // the held half node carries 3 N/m * 2.5 m / 80 of the weight itself
        double vertical = Math.abs(nodes.force[2]) + 3 * 2.5 / 80;
        double pull = Math.sqrt(nodes.force[0] * nodes.force[0] + vertical * vertical);
        assertThat(pull).isCloseTo(4.5273, within(0.005 * 4.5273));
    }

    private static void relax(Structure structure, double step, int steps, double keep) {
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        NodeStore nodes = structure.nodes();
        for (int n = 0; n < steps; n++) {
            loop.step(step);
            for (int i = 0; i < 3 * nodes.count; i++) {
                nodes.velocity[i] *= keep;
                nodes.spin[i] *= keep;
            }
        }
    }

    /**
     * Stiff beam hinged at its end, let go level: period 1.93333 s, hinge force 2.5 mg at the bottom (textbook); 0.3 %:
     * lumping 20 elements adds 0.12 % of inertia.
     */
    @Test
    void stiffBeamSwingsAsAPendulum() {
        int elements = 20;
        Material stiff = new Material("stiff", 7850, 2.1e11, 0.3);
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        BeamBench.line(
                builder,
                BeamBench.law(new CrossSection.SolidCircle(0.03), stiff, 0),
                BeamBench.ORIGIN,
                new Position(1, 0, 0),
                elements,
                0);
        builder.support(0, PINNED, -1);
        Structure structure = builder.build();
        structure.evaluateForces();
        NodeStore nodes = structure.nodes();
        double mass = java.util.Arrays.stream(nodes.mass).sum();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double step = structure.stableStep();
        double before = nodes.position[3 * elements];
        double hinge = 0;
        int samples = 0;
        double quarter = Double.NaN;
        while (Double.isNaN(quarter) || loop.time < quarter + 0.0043) {
            loop.step(step);
            double x = nodes.position[3 * elements];
            // first bending mode 233 Hz: its ripple averages out over one period after the bottom
            if (!Double.isNaN(quarter)) {
                hinge += nodes.force[2];
                samples++;
            } else if (x <= 0) {
                quarter = loop.time - step * x / (x - before);
            }
            before = x;
        }
        assertThat(4 * quarter).isCloseTo(1.93333, within(0.003 * 1.93333));
        double force = -hinge / samples + 9.81 * nodes.mass[0];
        assertThat(force).isCloseTo(2.5 * 9.81 * mass, within(0.003 * 2.5 * 9.81 * mass));
    }

    /**
     * Ring of radius 0.5 m, 0.8 kg/m, EA = 2e7 N, spun up to 40 rad/s at its stress-free size: mean tension 320 N, mean
     * growth 8e-6 m (closed form), 0.5 %; momenta stay to round-off.
     */
    @Test
    @Tag("conservation")
    void spinningRingCarriesItsHoopTension() {
        int elements = 60;
        double diameter = Math.sqrt(4e-4 / Math.PI);
        Material ring = new Material("ring", 8000, 2e11, 0.3);
        StructureBuilder builder = new StructureBuilder();
        int[] pairs = new int[2 * elements];
        for (int i = 0; i < elements; i++) {
            double phi = 2 * Math.PI * i / elements;
            builder.node(new Position(0.5 * Math.cos(phi), 0.5 * Math.sin(phi), 0));
            pairs[2 * i] = i;
            pairs[2 * i + 1] = (i + 1) % elements;
        }
        builder.body("ring", BeamBench.law(new CrossSection.SolidCircle(diameter), ring, 0), pairs, BeamBench.UP, 0);
        Structure structure = builder.build();
        NodeStore nodes = structure.nodes();
        for (int n = 0; n < elements; n++) {
            nodes.velocity[3 * n] = -40 * nodes.position[3 * n + 1];
            nodes.velocity[3 * n + 1] = 40 * nodes.position[3 * n];
            nodes.spin[3 * n + 2] = 40;
        }
        structure.evaluateForces();
        double[] start = BeamBench.momentum(structure);
        assertThat(start[5]).isCloseTo(25.1327, within(0.005 * 25.1327));
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double step = 0.25 * structure.stableStep();
        double breathing = 2 * Math.PI * 0.5 / 5000;
        int steps = (int) Math.round(20 * breathing / step);
        double radius = 0;
        double tension = 0;
        double[] row = new double[6];
        var set = structure.elementSets().getFirst();
        for (int n = 0; n < steps; n++) {
            loop.step(step);
            radius += Math.hypot(nodes.position[0], nodes.position[1]);
            set.law.results(set, 0, 1, row);
            tension += row[0];
        }
        assertThat(tension / steps).isCloseTo(320, within(0.005 * 320));
        assertThat(radius / steps - 0.5).isCloseTo(8e-6, within(0.005 * 8e-6));
        double[] end = BeamBench.momentum(structure);
        for (int i = 0; i < 6; i++) {
            assertThat(end[i]).isCloseTo(start[i], within(1e-12 * 25));
        }
    }

    /**
     * First mode of a beam between immovable pins at large amplitude (S. Woinowsky-Krieger, The effect of an axial
     * force on the vibration of hinged bars, 1950): frequency ratios at A/r, 1 %.
     */
    @Test
    void largeAmplitudeRaisesTheFrequency() {
        double[][] table = {{0.5, 1.02313}, {1, 1.08916}, {2, 1.31778}, {3, 1.62568}};
        double diameter = 0.001;
        double gyration = diameter / 4;
        double linear = Math.PI * Math.PI / 0.01 * Math.sqrt(2.1e11 / 7850) * gyration;
        for (double[] row : table) {
            double period = periodFromAmplitude(row[0] * gyration, diameter);
            assertThat(2 * Math.PI / period / linear).isCloseTo(row[1], within(0.01 * row[1]));
        }
    }

    private static double periodFromAmplitude(double amplitude, double diameter) {
        int elements = 32;
        Structure structure = BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(diameter), BeamBench.STEEL, 0),
                0.1,
                elements,
                PINNED,
                PINNED);
        NodeStore nodes = structure.nodes();
        for (int n = 0; n <= elements; n++) {
            double phi = Math.PI * n / elements;
            nodes.position[3 * n + 2] = amplitude * Math.sin(phi);
            // uniform stretch: u = -(A pi/L)^2 / 8 * L/pi * sin(2 pi x/L)
            double slope = amplitude * Math.PI / 0.1;
            nodes.position[3 * n] -= slope * slope * 0.1 / (8 * Math.PI) * Math.sin(2 * phi);
            SpatialRotation.turn(nodes.orientation, 4 * n, 0, -slope * Math.cos(phi), 0);
        }
        structure.evaluateForces();
        BeamBench.Loop loop = new BeamBench.Loop(structure, NodalLoads.NONE);
        double step = structure.stableStep();
        double before = amplitude;
        double first = Double.NaN;
        int falls = 0;
        while (true) {
            loop.step(step);
            double z = nodes.position[3 * (elements / 2) + 2];
            if (before > 0 && z <= 0) {
                double crossing = loop.time - step * z / (z - before);
                first = falls == 0 ? crossing : first;
                if (falls == 4) {
                    return (crossing - first) / 4;
                }
                falls++;
            }
            before = z;
        }
    }

    /**
     * Rod hits a rigid wall end-on (A. Barre de Saint-Venant): contact 2L/c, force rho c A v, rebound at full speed; 2
     * % with 200 elements and a wall spring as stiff as an element, whose compression adds 0.5 % to the time.
     */
    @Test
    void rodBouncesOffAWall() {
        int elements = 200;
        double diameter = Math.sqrt(4e-4 / Math.PI);
        var law = BeamBench.law(new CrossSection.SolidCircle(diameter), BeamBench.STEEL, 0);
        Structure structure = BeamBench.straight(law, 1, elements, FREE, FREE);
        NodeStore nodes = structure.nodes();
        for (int n = 0; n <= elements; n++) {
            nodes.velocity[3 * n] = -1;
        }
        structure.evaluateForces();
        double spring = 4 * 2.1e7 * elements;
        double[] push = new double[1];
        NodalLoads wall = (first, last, force, moment) -> {
            if (first == 0) {
                push[0] = Math.max(0, -spring * nodes.position[0]);
                force[0] += push[0];
            }
        };
        BeamBench.Loop loop = new BeamBench.Loop(structure, wall);
        double step = 0.4 * structure.stableStep();
        double impulse = 0;
        double lastTouch = 0;
        double plateau = 0;
        int samples = 0;
        while (loop.time < 6e-4) {
            loop.step(step);
            impulse += push[0] * step;
            lastTouch = push[0] > 0 ? loop.time : lastTouch;
            if (loop.time > 0.25 * 0.000386683 && loop.time < 0.75 * 0.000386683) {
                plateau += push[0];
                samples++;
            }
        }
        double mass = 7850 * 1e-4;
        double speed = BeamBench.momentum(structure)[0] / mass;
        assertThat(lastTouch).isCloseTo(0.000386683, within(0.02 * 0.000386683));
        assertThat(plateau / samples).isCloseTo(4060.17, within(0.02 * 4060.17));
        assertThat(speed).isCloseTo(1, within(0.02));
        assertThat(impulse).isCloseTo(mass * (1 + speed), within(1e-9 * mass));
    }
}
