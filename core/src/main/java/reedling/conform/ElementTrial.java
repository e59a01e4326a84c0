// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import reedling.material.Material;
import reedling.particle.RandomStream;
import reedling.plugin.ParameterValues;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.ElementProperties;
import reedling.structure.ElementType;
import reedling.structure.EndCondition;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/**
 * The conformance kit for elements of two nodes, tried on a free steel rod: rigid motion gives no force, forces balance and
 * are the slope of the strain energy, the mass is right, the declared step is stable.
 */
public final class ElementTrial {

    private static final int ELEMENTS = 4;
    private static final double LENGTH = 0.2; // m
    private static final CrossSection ROD = new CrossSection.SolidCircle(0.004);
    private static final Material STEEL = new Material("steel", 7850, 2.1e11, 0.3);
    private static final double NUDGE = 1e-5; // rad, and of an element's length
    private static final double SMALL = 1e-5;
    private static final double ROUNDING = 1e-8;
    private static final int STEPS = 20_000;

    private final ElementLaw law;

    private ElementTrial(ElementType type, Map<String, Double> given) {
        law = type.law(new ElementProperties(ROD, STEEL, 0, ParameterValues.of(type, given)));
    }

    /** Runs every check. */
    public static List<LawTrial.Result> run(ElementType type, Map<String, Double> given) {
        try {
            ElementTrial trial = new ElementTrial(type, given);
            if (trial.law.nodesPerElement() != 2) {
                return List.of(new LawTrial.Result(
                        "two nodes", new Outcome(List.of(), "Not tried: the kit knows elements of two nodes only.")));
            }
            return trial.all();
        } catch (RuntimeException | LinkageError thrown) {
            return List.of(new LawTrial.Result(
                    "runs at all",
                    Outcome.of(false, type.name() + " throws " + thrown + ".", "Not measured: the element throws.")));
        }
    }

    private List<LawTrial.Result> all() {
        return List.of(
                new LawTrial.Result("rigid motion gives no force", rigid()),
                new LawTrial.Result("forces balance", balance()),
                new LawTrial.Result("the force is the slope of the energy", slope()),
                new LawTrial.Result("mass", mass()),
                new LawTrial.Result("the declared step is stable", stable()));
    }

    private Structure rod() {
        StructureBuilder builder = new StructureBuilder();
        int[] nodes = new int[2 * ELEMENTS];
        for (int k = 0; k <= ELEMENTS; k++) {
            int node = builder.node(new Position(LENGTH * k / ELEMENTS, 0, 0));
            if (k < ELEMENTS) {
                nodes[2 * k] = node;
            }
            if (k > 0) {
                nodes[2 * k - 1] = node;
            }
        }
        builder.body("rod", law, nodes, new Position(0, 0, 1), 0);
        builder.support(0, EndCondition.FREE, -1);
        builder.support(ELEMENTS, EndCondition.FREE, -1);
        return builder.build();
    }

    /** N: the scale of forces, those of a stretch by a thousandth. */
    private static double scale() {
        return 1e-3 * STEEL.youngsModulus() * ROD.area();
    }

    private Outcome rigid() {
        double worst = 0;
        for (int seed = 0; seed < 20; seed++) {
            Structure rod = rod();
            Frame frame = Frame.random(seed, LENGTH, 0);
            double[] axis = frame.axis();
            NodeStore nodes = rod.nodes();
            double[] pose = new double[PairMotion.LENGTH];
            for (int n = 0; n < nodes.count; n++) {
                System.arraycopy(nodes.position, 3 * n, pose, 0, 3);
                frame.turn(pose, 0);
                for (int k = 0; k < 3; k++) {
                    nodes.position[3 * n + k] = pose[k] + frame.offset()[k];
                }
                SpatialRotation.turn(nodes.orientation, 4 * n, axis[0], axis[1], axis[2]);
            }
            rod.evaluateForces();
            worst = Math.max(worst, Math.max(largest(nodes.force), largest(nodes.moment) / LENGTH) / scale());
        }
        return Outcome.of(
                worst <= ROUNDING * 10,
                String.format(
                        Locale.ROOT, "A rigid motion gives %.2g of the force of a stretch by a thousandth.", worst),
                String.format(
                        Locale.ROOT,
                        "20 rotations of any size: %.1e of the force of a stretch by a thousandth.",
                        worst));
    }

    private Structure bent(long seed) {
        Structure rod = rod();
        RandomStream random = new RandomStream(seed);
        NodeStore nodes = rod.nodes();
        for (int n = 0; n < nodes.count; n++) {
            SpatialRotation.turn(
                    nodes.orientation, 4 * n, 0.05 * random.normal(), 0.05 * random.normal(), 0.05 * random.normal());
            for (int k = 0; k < 3; k++) {
                nodes.position[3 * n + k] += 0.001 * LENGTH * random.normal();
            }
        }
        return rod;
    }

    private Outcome balance() {
        double worst = 0;
        for (int seed = 0; seed < 20; seed++) {
            Structure rod = bent(seed);
            rod.evaluateForces();
            NodeStore nodes = rod.nodes();
            double size = Math.max(largest(nodes.force), 1e-30);
            for (int k = 0; k < 3; k++) {
                int l = (k + 1) % 3, m = (k + 2) % 3;
                double force = 0;
                double moment = 0;
                for (int n = 0; n < nodes.count; n++) {
                    force += nodes.force[3 * n + k];
                    moment += nodes.moment[3 * n + k]
                            + nodes.position[3 * n + l] * nodes.force[3 * n + m]
                            - nodes.position[3 * n + m] * nodes.force[3 * n + l];
                }
                worst = Math.max(worst, Math.max(Math.abs(force), Math.abs(moment) / LENGTH) / size);
            }
        }
        return Outcome.of(
                worst <= ROUNDING,
                String.format(Locale.ROOT, "Forces and moments of a bent rod leave %.2g of the largest.", worst),
                String.format(Locale.ROOT, "20 bent rods: %.1e of the largest force is left.", worst));
    }

    private Outcome slope() {
        double worst = 0;
        for (int seed = 0; seed < 5; seed++) {
            NodeStore found = bent(seed).nodes();
            Structure rod = bent(seed);
            rod.evaluateForces();
            double force = Math.max(largest(rod.nodes().force), 1e-30);
            double moment = Math.max(largest(rod.nodes().moment), 1e-30);
            for (int d = 0; d < 6 * found.count; d++) {
                int node = d / 6, k = d % 6;
                double nudge = k < 3 ? NUDGE * LENGTH / ELEMENTS : NUDGE;
                double expected = -(energy(seed, node, k, nudge) - energy(seed, node, k, -nudge)) / (2 * nudge);
                double got = k < 3 ? rod.nodes().force[3 * node + k] : rod.nodes().moment[3 * node + k - 3];
                double apart = Math.abs(got - expected) / (k < 3 ? force : moment);
                worst = apart <= worst ? worst : apart;
            }
        }
        return Outcome.of(
                worst <= SMALL,
                String.format(
                        Locale.ROOT, "The force differs by %.2g from minus the slope of the strain energy.", worst),
                String.format(Locale.ROOT, "5 bent rods, every node and direction: %.1e of the largest.", worst));
    }

    private double energy(long seed, int node, int direction, double nudge) {
        Structure rod = bent(seed);
        NodeStore nodes = rod.nodes();
        if (direction < 3) {
            nodes.position[3 * node + direction] += nudge;
        } else {
            double[] turn = new double[3];
            turn[direction - 3] = nudge;
            SpatialRotation.turn(nodes.orientation, 4 * node, turn[0], turn[1], turn[2]);
        }
        rod.evaluateForces();
        return rod.strainEnergy();
    }

    private Outcome mass() {
        double sum = 0;
        for (double mass : rod().nodes().mass) {
            sum += mass;
        }
        double expected = STEEL.density() * ROD.area() * LENGTH;
        double apart = Math.abs(sum / expected - 1);
        return Outcome.of(
                apart <= ROUNDING,
                String.format(Locale.ROOT, "The nodes of a rod of %.6g kg weigh %.6g kg.", expected, sum),
                String.format(Locale.ROOT, "%.1e from density times volume.", apart));
    }

    /** A rod that is kicked at random keeps its energy at the step that the structure calls stable. */
    private Outcome stable() {
        Structure rod = rod();
        rod.evaluateForces();
        RandomStream random = new RandomStream(3);
        NodeStore nodes = rod.nodes();
        double kinetic = 0;
        for (int k = 0; k < nodes.velocity.length; k++) {
            nodes.velocity[k] = 0.1 * random.normal();
            kinetic += 0.5 * nodes.mass[k / 3] * nodes.velocity[k] * nodes.velocity[k];
        }
        double step = rod.stableStep();
        double old = 0;
        double most = 0;
        for (int s = 0; s < STEPS; s++) {
            for (int task = 0; task < rod.elementTasks(); task++) {
                rod.elementForces(task, old);
            }
            double strain = rod.strainEnergy();
            for (int task = 0; task < rod.nodeTasks(); task++) {
                rod.moveNodes(task, old, step, NodalLoads.NONE);
            }
            most = strain <= most ? most : strain;
            old = step;
        }
        double ratio = most / kinetic;
        return Outcome.of(
                ratio <= 2,
                String.format(
                        Locale.ROOT,
                        "At the declared stable step the strain energy grows to %.2g times what was put in: squaredFrequency"
                                + " must be an upper bound.",
                        ratio),
                String.format(
                        Locale.ROOT,
                        "%d steps of %.3g s: strain energy at most %.2f of what was put in.",
                        STEPS,
                        step,
                        ratio));
    }

    private static double largest(double[] values) {
        double largest = 0;
        for (double value : values) {
            largest = Math.abs(value) <= largest ? largest : Math.abs(value);
        }
        return largest;
    }
}
