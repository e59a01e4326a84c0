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
    public record GrainCloud(int count, double[] positions, List<NamedArray> fields) {}

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
            List<NamedArray> cellFields) {}

    /** A named array, tuples of {@code components} values one after the other; the name ends in its unit where it has one. */
    public sealed interface NamedArray {
        String name();

        int components();

        /** Single precision is enough for results that are looked at. */
        record Floats(String name, int components, float[] values) implements NamedArray {}

        record Doubles(String name, int components, double[] values) implements NamedArray {}

        record Ints(String name, int components, int[] values) implements NamedArray {}
    }
}
