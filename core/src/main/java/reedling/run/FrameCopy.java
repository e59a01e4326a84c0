// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.ArrayList;
import java.util.List;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.NamedArray;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.probe.ElementResults;
import reedling.probe.WireShape;
import reedling.structure.Body;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * Copies a simulation's state into a frame that a writer may keep: grains by ascending id, and all wires as one mesh.
 * Velocities are those of the half step before. Threads: one, between steps.
 */
final class FrameCopy {

    private final Simulation simulation;
    private final RunProbes probes;
    private final ElementResults results;

    FrameCopy(Simulation simulation, RunProbes probes) {
        this.simulation = simulation;
        this.probes = probes;
        results = new ElementResults(simulation.model().structure());
    }

    SnapshotFrame take() {
        Structure structure = simulation.model().structure();
        List<SnapshotFrame.LineMesh> meshes = structure.bodies().isEmpty() ? List.of() : List.of(wires(structure));
        return new SnapshotFrame(simulation.time(), simulation.stepCount(), grains(), meshes);
    }

    private SnapshotFrame.GrainCloud grains() {
        GrainStore grains = simulation.model().grains();
        int[] order = GrainOrder.byId(grains);
        double[] positions = new double[3 * order.length];
        float[] radius = new float[order.length];
        float[] velocity = new float[3 * order.length];
        float[] spin = new float[3 * order.length];
        int[] lot = new int[order.length];
        int[] material = new int[order.length];
        int[] id = new int[order.length];
        int[] pegged = new int[order.length];
        double[] rows = grains.rows();
        for (int k = 0; k < order.length; k++) {
            int g = order[k];
            int at = GrainRow.at(g);
            for (int axis = 0; axis < 3; axis++) {
                positions[3 * k + axis] = rows[at + GrainRow.X + axis];
                velocity[3 * k + axis] = (float) rows[at + GrainRow.V + axis];
                spin[3 * k + axis] = (float) rows[at + GrainRow.W + axis];
            }
            radius[k] = (float) rows[at + GrainRow.RADIUS];
            lot[k] = grains.lot()[g];
            material[k] = grains.material()[g];
            id[k] = (int) grains.id()[g];
            pegged[k] = probes.pegged(grains.id()[g]) ? 1 : 0;
        }
        List<NamedArray> fields = List.of(
                new NamedArray.Floats("radius [m]", 1, radius),
                new NamedArray.Floats("velocity [m/s]", 3, velocity),
                new NamedArray.Floats("spin [rad/s]", 3, spin),
                new NamedArray.Ints("lot", 1, lot),
                new NamedArray.Ints("material", 1, material),
                new NamedArray.Ints("id", 1, id),
                new NamedArray.Ints("pegged", 1, pegged));
        return new SnapshotFrame.GrainCloud(order.length, positions, fields);
    }

    private SnapshotFrame.LineMesh wires(Structure structure) {
        List<Integer> connectivity = new ArrayList<>();
        List<Float> radius = new ArrayList<>();
        List<Integer> bodyNumber = new ArrayList<>();
        for (int b = 0; b < structure.bodies().size(); b++) {
            Body body = structure.bodies().get(b);
            for (int node : body.elementNodes()) {
                connectivity.add(node);
            }
            for (int e = 0; e < body.elementCount(); e++) {
                radius.add((float) body.section().contactRadius());
                bodyNumber.add(b);
            }
        }
        results.take();
        List<NamedArray> cells = List.of(
                new NamedArray.Floats("axial force [N]", 1, floats(results.axialForce())),
                new NamedArray.Floats("bending moment [N m]", 1, floats(results.bendingMoment())),
                new NamedArray.Floats("max fibre stress [Pa]", 1, floats(results.fibreStress())),
                new NamedArray.Floats(
                        "radius [m]",
                        1,
                        floats(radius.stream().mapToDouble(Float::doubleValue).toArray())),
                new NamedArray.Ints(
                        "body",
                        1,
                        bodyNumber.stream().mapToInt(Integer::intValue).toArray()));
        NodeStore nodes = structure.nodes();
        List<NamedArray> points = List.of(
                new NamedArray.Floats("displacement [m]", 3, displacement(structure)),
                new NamedArray.Floats("velocity [m/s]", 3, floats(nodes.velocity)));
        int[] ends = connectivity.stream().mapToInt(Integer::intValue).toArray();
        return new SnapshotFrame.LineMesh("wires", nodes.position.clone(), ends, points, cells);
    }

    private static float[] displacement(Structure structure) {
        float[] all = new float[3 * structure.nodes().count];
        double[] one = new double[3];
        for (Body body : structure.bodies()) {
            for (int n = body.firstNode(); n < body.firstNode() + body.nodeCount(); n++) {
                WireShape.sag(structure.nodes(), body, n, one);
                for (int axis = 0; axis < 3; axis++) {
                    all[3 * n + axis] = (float) one[axis];
                }
            }
        }
        return all;
    }

    private static float[] floats(double[] values) {
        float[] narrow = new float[values.length];
        for (int k = 0; k < values.length; k++) {
            narrow[k] = (float) values[k];
        }
        return narrow;
    }
}
