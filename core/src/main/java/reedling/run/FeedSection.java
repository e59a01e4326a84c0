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
import reedling.feed.RainFeed;

/** State of a feed in a checkpoint. */
record FeedSection(RainFeed feed) implements Persistent {

    @Override
    public String section() {
        return "feed " + feed.plan().name();
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        feed.save(new DataOutputStream(bytes));
        SectionBytes.write(bytes, out);
    }

    @Override
    public void restore(SectionReader in) throws IOException {
        feed.restore(new DataInputStream(new ByteArrayInputStream(SectionBytes.read(in))));
    }
}
