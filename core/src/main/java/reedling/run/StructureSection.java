// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.structure.Structure;

/** State of the structure in a checkpoint. */
record StructureSection(Structure structure) implements Persistent {

    @Override
    public String section() {
        return "structure";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        structure.write(new DataOutputStream(bytes));
        SectionBytes.write(bytes, out);
    }

    @Override
    public void restore(SectionReader in) throws IOException {
        structure.read(new DataInputStream(new ByteArrayInputStream(SectionBytes.read(in))));
    }
}
