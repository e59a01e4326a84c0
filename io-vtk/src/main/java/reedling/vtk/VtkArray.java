// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.IOException;
import reedling.file.LittleEndianOutput;
import reedling.output.SnapshotFrame.NamedArray;

/**
 * One array of a VTK file: its description in the XML part and its bytes in the appended part.
 *
 * @param type VTK's name of the number type
 * @param bytes length of the values
 */
record VtkArray(String type, String name, int components, long bytes, Values values) {

    /** Writes exactly {@code bytes} bytes. */
    @FunctionalInterface
    interface Values {
        void writeTo(LittleEndianOutput out) throws IOException;
    }

    static VtkArray of(NamedArray array) {
        return switch (array) {
            case NamedArray.Floats(String name, int components, float[] values) ->
                new VtkArray(
                        "Float32",
                        name,
                        components,
                        4L * values.length,
                        out -> out.writeFloats(values, 0, values.length));
            case NamedArray.Doubles(String name, int components, double[] values) -> doubles(name, components, values);
            case NamedArray.Ints(String name, int components, int[] values) -> ints(name, components, values);
        };
    }

    static VtkArray doubles(String name, int components, double... values) {
        return new VtkArray(
                "Float64", name, components, 8L * values.length, out -> out.writeDoubles(values, 0, values.length));
    }

    static VtkArray ints(String name, int components, int... values) {
        return new VtkArray(
                "Int32", name, components, 4L * values.length, out -> out.writeInts(values, 0, values.length));
    }

    static VtkArray longs(String name, long... values) {
        return new VtkArray("Int64", name, 1, 8L * values.length, out -> out.writeLongs(values, 0, values.length));
    }

    /** Int32 node numbers widened to the Int64 that cells are written with. */
    static VtkArray widened(String name, int[] values) {
        return new VtkArray("Int64", name, 1, 8L * values.length, out -> {
            for (int value : values) {
                out.writeLong(value);
            }
        });
    }

    /** The {@code count} values {@code first}, {@code first + step}, ... as Int64. */
    static VtkArray sequence(String name, int count, long first, long step) {
        return new VtkArray("Int64", name, 1, 8L * count, out -> {
            for (long i = 0; i < count; i++) {
                out.writeLong(first + i * step);
            }
        });
    }

    /** The same small number {@code count} times as UInt8. */
    static VtkArray constant(String name, int count, int value) {
        return new VtkArray("UInt8", name, 1, count, out -> {
            for (int i = 0; i < count; i++) {
                out.writeByte(value);
            }
        });
    }
}
