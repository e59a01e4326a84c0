// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;

/** Writing and reading of columns of doubles, each preceded by its length. */
final class Columns {

    private Columns() {}

    static void write(double[] column, DataOutput out) throws IOException {
        out.writeInt(column.length);
        for (double value : column) {
            out.writeDouble(value);
        }
    }

    static void read(double[] column, DataInput in) throws IOException {
        int length = in.readInt();
        if (length != column.length) {
            throw new IOException("saved structure column holds " + length + " numbers, this mesh needs "
                    + column.length + "; it was saved from another mesh");
        }
        for (int i = 0; i < length; i++) {
            column[i] = in.readDouble();
        }
    }
}
