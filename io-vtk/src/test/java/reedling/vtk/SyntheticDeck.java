// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.util.ArrayList;
import java.util.List;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.GrainCloud;
import reedling.output.SnapshotFrame.LineMesh;
import reedling.output.SnapshotFrame.NamedArray;

/** A made-up deck of parallel wires under two lots of grains; the numbers only look plausible, nothing is simulated. */
final class SyntheticDeck {

    private static final double PITCH = 0.012;
    private static final double WIRE_LENGTH = 0.3;

    private SyntheticDeck() {}

    static SnapshotFrame frame(double time, long step, int grains, int wires, int elementsPerWire) {
        return new SnapshotFrame(time, step, grains(time, grains, wires), List.of(wires(time, wires, elementsPerWire)));
    }

    private static GrainCloud grains(double time, int count, int wires) {
        double[] positions = new double[3 * count];
        float[] velocity = new float[3 * count];
        double[] radius = new double[count];
        int[] lot = new int[count];
        int[] id = new int[count];
        int across = Math.max(1, (int) (wires * PITCH / 0.015));
        for (int i = 0; i < count; i++) {
            int layer = i / (20 * across);
            lot[i] = (i * 7) % 10 < 7 ? 0 : 1;
            radius[i] = lot[i] == 0 ? 0.0065 : 0.0035;
            positions[3 * i] = 0.0075 + 0.015 * (i % 20) + 0.002 * Math.sin(i);
            positions[3 * i + 1] = 0.0075 + 0.015 * (i / 20 % across) + 0.002 * Math.cos(3 * i);
            positions[3 * i + 2] = 0.009 + 0.015 * layer + 0.004 * Math.sin(5 * i + 40 * time);
            velocity[3 * i + 2] = (float) (0.16 * Math.cos(5 * i + 40 * time));
            id[i] = i;
        }
        return new GrainCloud(
                count,
                positions,
                List.of(
                        new NamedArray.Doubles("radius [m]", 1, radius),
                        new NamedArray.Floats("velocity [m/s]", 3, velocity),
                        new NamedArray.Ints("lot", 1, lot),
                        new NamedArray.Ints("id", 1, id)));
    }

    private static LineMesh wires(double time, int wires, int elementsPerWire) {
        int nodesPerWire = elementsPerWire + 1;
        double[] points = new double[3 * wires * nodesPerWire];
        float[] displacement = new float[points.length];
        int[] connectivity = new int[2 * wires * elementsPerWire];
        float[] axialForce = new float[wires * elementsPerWire];
        float[] moment = new float[axialForce.length];
        float[] stress = new float[axialForce.length];
        float[] radius = new float[axialForce.length];
        for (int wire = 0; wire < wires; wire++) {
            for (int k = 0; k < nodesPerWire; k++) {
                int node = wire * nodesPerWire + k;
                double along = (double) k / elementsPerWire;
                double sag = -0.004 * Math.sin(Math.PI * along) * Math.sin(40 * time + 0.3 * wire);
                points[3 * node] = WIRE_LENGTH * along;
                points[3 * node + 1] = PITCH * wire;
                points[3 * node + 2] = sag;
                displacement[3 * node + 2] = (float) sag;
            }
            for (int k = 0; k < elementsPerWire; k++) {
                int element = wire * elementsPerWire + k;
                connectivity[2 * element] = wire * nodesPerWire + k;
                connectivity[2 * element + 1] = wire * nodesPerWire + k + 1;
                axialForce[element] = (float) (400 + 60 * Math.sin(0.3 * wire + 40 * time));
                moment[element] = (float) (0.02 * Math.sin(Math.PI * (k + 0.5) / elementsPerWire));
                stress[element] = 1e6f * (300 + k);
                radius[element] = 0.001f;
            }
        }
        List<NamedArray> cells = new ArrayList<>(List.of(
                new NamedArray.Floats("axial force [N]", 1, axialForce),
                new NamedArray.Floats("bending moment [N m]", 1, moment),
                new NamedArray.Floats("max fibre stress [Pa]", 1, stress),
                new NamedArray.Floats("radius [m]", 1, radius)));
        return new LineMesh(
                "wires",
                points,
                connectivity,
                List.of(new NamedArray.Floats("displacement [m]", 3, displacement)),
                cells);
    }
}
