// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.io.IOException;

/**
 * Owns a part of the state that decides the next bits of a run. {@link #restore} must read exactly what {@link #save}
 * wrote, in the same order; a restored run continues bit for bit as if it had never stopped.
 */
public interface Persistent {

    /** Stable name of its section, unique in a run, e.g. {@code grains}. */
    String section();

    /** Called between steps by the thread that runs the loop; must not keep {@code out}. */
    void save(SectionWriter out) throws IOException;

    /** Called once, before the first step of a resumed run. */
    void restore(SectionReader in) throws IOException;
}
