// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.util.List;

/**
 * A copy of the state at one time, owned by the writer; the compute threads never touch it again.
 *
 * @param time s
 * @param step number of the step
 * @param grains the grains, in stable id order
 * @param structures one mesh for each structure body, may be empty
 */
public record SnapshotFrame(double time, long step, GrainCloud grains, List<LineMesh> structures) {

    /**
     * Grains as points.
     *
     * @param count number of grains
     * @param positions 3 doubles a grain, m
     * @param fields named arrays, one tuple a grain
     */
    public record GrainCloud(int count, double[] positions, List<NamedArray> fields) {

        public GrainCloud {
            requireTuples("grain positions", positions.length, 3, count);
            fields.forEach(field -> requireTuples(field.name(), field.length(), field.components(), count));
        }
    }

    /**
     * A structure made of two-node lines.
     *
     * @param name e.g. wires
     * @param points 3 doubles a node, current position, m
     * @param connectivity 2 node numbers an element
     * @param pointFields named arrays, one tuple a node
     * @param cellFields named arrays, one tuple an element
     */
    public record LineMesh(
            String name,
            double[] points,
            int[] connectivity,
            List<NamedArray> pointFields,
            List<NamedArray> cellFields) {

        public LineMesh {
            requireTuples("points of " + name, points.length, 3, points.length / 3);
            requireTuples("connectivity of " + name, connectivity.length, 2, connectivity.length / 2);
            int nodes = points.length / 3;
            int elements = connectivity.length / 2;
            pointFields.forEach(field -> requireTuples(field.name(), field.length(), field.components(), nodes));
            cellFields.forEach(field -> requireTuples(field.name(), field.length(), field.components(), elements));
        }

        public int nodes() {
            return points.length / 3;
        }

        public int elements() {
            return connectivity.length / 2;
        }
    }

    /**
     * A named array, tuples of {@code components} values one after the other; the name ends in its unit where it has
     * one, e.g. {@code radius [m]}.
     */
    public sealed interface NamedArray {
        String name();

        int components();

        /** Number of values, all components counted. */
        int length();

        /** Single precision is enough for results that are looked at. */
        record Floats(String name, int components, float[] values) implements NamedArray {
            @Override
            public int length() {
                return values.length;
            }
        }

        record Doubles(String name, int components, double[] values) implements NamedArray {
            @Override
            public int length() {
                return values.length;
            }
        }

        record Ints(String name, int components, int[] values) implements NamedArray {
            @Override
            public int length() {
                return values.length;
            }
        }
    }

    private static void requireTuples(String what, int length, int components, int tuples) {
        if (length != components * tuples) {
            throw new IllegalArgumentException(
                    what + ": " + length + " values, expected " + tuples + " tuples of " + components);
        }
    }
}
