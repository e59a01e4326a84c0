// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Collects nodes, bodies, supports and motions and makes a {@link Structure} of them. Not for several threads.
 *
 * <p>The nodes of a body must be added one after another, before the body; nodes added since the last body belong to
 * the next one.
 */
public final class StructureBuilder {

    private static final double[] REST = {0, 0, 0, 1, 0, 0, 0};

    private final List<Position> positions = new ArrayList<>();
    private final List<EndCondition> conditions = new ArrayList<>();
    private final List<Integer> motionOfNode = new ArrayList<>();
    private final List<Integer> bodyOfNode = new ArrayList<>();
    private final List<BodyMesh> bodies = new ArrayList<>();
    private final List<Integer> firstNodes = new ArrayList<>();
    private final List<Double> modalRates = new ArrayList<>();
    private final List<SupportMotion> motions = new ArrayList<>();
    private Position gravity = new Position(0, 0, 0);

    /** Acceleration of free fall, m/s2; none if not called. */
    public StructureBuilder gravity(Position acceleration) {
        gravity = acceleration;
        return this;
    }

    /** Adds a support motion and returns its index for {@link #support} and {@link WireEnds}. */
    public int motion(SupportMotion motion) {
        motions.add(motion);
        return motions.size() - 1;
    }

    /** Adds a node at its reference position, m, and returns its id. */
    public int node(Position position) {
        positions.add(position);
        conditions.add(EndCondition.FREE);
        motionOfNode.add(-1);
        bodyOfNode.add(bodies.size());
        return positions.size() - 1;
    }

    /**
     * Adds a body of the nodes added since the last one and returns its index.
     *
     * @param nodes node ids of its elements, in element order
     * @param up direction that turns the sections: axis 2 = up x axis 1
     * @param prestretch stretch of the elements as meshed: stress-free length = length / (1 + prestretch)
     */
    public int body(String name, ElementLaw law, int[] nodes, Position up, double prestretch) {
        return add(new BodyMesh(name, law, nodes.clone(), up, prestretch, false));
    }

    /** Adds a body whose nodes all follow a motion (-1: at rest) and that carries no element forces. */
    public int rigidBody(String name, ElementLaw law, int[] nodes, int motion) {
        int body = add(new BodyMesh(name, law, nodes.clone(), new Position(0, 0, 1), 0, true));
        for (int n = firstNodes.get(body); n < positions.size(); n++) {
            support(n, EndCondition.CLAMPED, motion);
        }
        return body;
    }

    private int add(BodyMesh body) {
        firstNodes.add(bodies.isEmpty() ? 0 : bodyOfNode.indexOf(bodies.size()));
        modalRates.add(0.0);
        bodies.add(body);
        return bodies.size() - 1;
    }

    /** Holds a node; motion -1 is a support at rest. */
    public void support(int node, EndCondition condition, int motion) {
        conditions.set(node, condition);
        motionOfNode.set(node, condition == EndCondition.FREE ? -1 : motion);
    }

    /** Damps a supported body relative to its supports with alpha = 2 zeta omega_1, 1/s. */
    public void modalDamping(int body, double rate) {
        modalRates.set(body, rate);
    }

    /** Makes the structure as it stands at time 0: bodies in the pose of their first driven node, all velocities 0. */
    public Structure build() {
        NodeStore nodes = new NodeStore(positions.size());
        List<Body> built = new ArrayList<>();
        List<ElementSet> sets = new ArrayList<>();
        double[] slots = new double[slotCount()];
        double[] inertia = new double[nodes.count];
        int slot = 0;
        int element = 0;
        for (int b = 0; b < bodies.size(); b++) {
            BodyMesh mesh = bodies.get(b);
            ElementSet set = new ElementSet(
                    mesh.law(), mesh.nodes(), constants(mesh), mesh.rigid() ? new double[0] : slots, slot);
            addMasses(set, nodes, inertia);
            built.add(describe(b, element, set.count()));
            element += set.count();
            if (!mesh.rigid()) {
                sets.add(set);
                slot += ElementSet.SLOT * mesh.nodes().length;
            }
        }
        placeNodes(nodes, inertia);
        ModalDamping damping = damping(nodes);
        Structure structure = new Structure(Mesh.connect(nodes, built, sets, slots), motions, damping, gravity);
        // so that strains, and with them tension and stable step, are those of the start
        structure.evaluateForces();
        return structure;
    }

    private int slotCount() {
        return ElementSet.SLOT
                * bodies.stream()
                        .filter(body -> !body.rigid())
                        .mapToInt(body -> body.nodes().length)
                        .sum();
    }

    private Body describe(int index, int firstElement, int elementCount) {
        BodyMesh mesh = bodies.get(index);
        int end = index + 1 < bodies.size() ? firstNodes.get(index + 1) : positions.size();
        int first = firstNodes.get(index);
        int perElement = mesh.law().nodesPerElement();
        return new Body(
                mesh.name(),
                first,
                end - first,
                firstElement,
                elementCount,
                perElement,
                mesh.nodes(),
                mesh.law().section(),
                mesh.rigid());
    }

    private double[] constants(BodyMesh mesh) {
        int perElement = mesh.law().nodesPerElement();
        int count = mesh.nodes().length / perElement;
        double[] constants = new double[count * mesh.law().constantCount()];
        for (int e = 0; e < count; e++) {
            List<Position> ends = new ArrayList<>();
            for (int a = 0; a < perElement; a++) {
                ends.add(positions.get(mesh.nodes()[e * perElement + a]));
            }
            ElementReference reference = new ElementReference(ends, mesh.up(), mesh.prestretch());
            mesh.law().reference(reference, constants, e * mesh.law().constantCount());
        }
        return constants;
    }

    private static void addMasses(ElementSet set, NodeStore nodes, double[] inertia) {
        int perElement = set.law.nodesPerElement();
        for (int end = 0; end < set.nodes.length; end++) {
            int offset = end / perElement * set.law.constantCount();
            nodes.mass[set.nodes[end]] += set.law.nodeMass(set.constants, offset);
            inertia[set.nodes[end]] += set.law.nodeInertia(set.constants, offset);
        }
    }

    private void placeNodes(NodeStore nodes, double[] inertia) {
        double[] pose = REST.clone();
        double[] placed = new double[3];
        for (int n = 0; n < nodes.count; n++) {
            Position x = positions.get(n);
            nodes.reference[3 * n] = x.x();
            nodes.reference[3 * n + 1] = x.y();
            nodes.reference[3 * n + 2] = x.z();
            nodes.support[n] = motionOfNode.get(n);
            nodes.body[n] = bodyOfNode.get(n);
            nodes.inverseMass[n] = conditions.get(n).holdsPosition() ? 0 : 1 / nodes.mass[n];
            nodes.inverseInertia[n] = conditions.get(n).holdsOrientation() ? 0 : 1 / inertia[n];
            int motion = bodyMotion(bodyOfNode.get(n));
            if (motion < 0) {
                System.arraycopy(REST, 0, pose, 0, REST.length);
            } else {
                motions.get(motion).pose(0, pose);
            }
            SpatialRotation.place(pose, 0, nodes.reference, 3 * n, placed);
            System.arraycopy(placed, 0, nodes.position, 3 * n, 3);
            System.arraycopy(pose, 3, nodes.orientation, 4 * n, 4);
        }
    }

    private int bodyMotion(int body) {
        int end = body + 1 < bodies.size() ? firstNodes.get(body + 1) : positions.size();
        for (int n = firstNodes.get(body); n < end; n++) {
            if (motionOfNode.get(n) >= 0) {
                return motionOfNode.get(n);
            }
        }
        return -1;
    }

    private ModalDamping damping(NodeStore nodes) {
        double[] alpha = new double[nodes.count];
        double[] fraction = new double[nodes.count];
        int[] ends = new int[2 * bodies.size()];
        Arrays.fill(ends, -1);
        for (int b = 0; b < bodies.size(); b++) {
            int first = firstNodes.get(b);
            int end = b + 1 < bodies.size() ? firstNodes.get(b + 1) : nodes.count;
            for (int n = first; n < end && modalRates.get(b) > 0; n++) {
                if (conditions.get(n).holdsPosition()) {
                    ends[2 * b] = ends[2 * b] < 0 ? n : ends[2 * b];
                    ends[2 * b + 1] = n;
                }
            }
            for (int n = first; n < end && ends[2 * b] >= 0; n++) {
                alpha[n] = modalRates.get(b);
                fraction[n] = fraction(positions.get(ends[2 * b]), positions.get(ends[2 * b + 1]), positions.get(n));
            }
        }
        return new ModalDamping(alpha, fraction, ends);
    }

    private static double fraction(Position a, Position b, Position x) {
        double length = a.distance(b);
        return length == 0 ? 0 : Math.min(1, a.distance(x) / length);
    }
}
