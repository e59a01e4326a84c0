// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.nio.file.Path;

/** Writes snapshots of one run into its folder; called by the single writer thread, never by a compute thread. */
public interface SnapshotWriter {

    /** Found by ServiceLoader; makes a writer for one run folder. */
    interface Provider extends reedling.plugin.Provider {
        /**
         * Opens a series in a run folder. When a run is resumed, frames later than {@code resumeTime} (s) are dropped
         * and their files deleted; NaN starts a new series.
         */
        SnapshotWriter open(Path folder, double resumeTime) throws IOException;
    }

    /**
     * Writes one frame, in place of one of the same time if there is one; when it returns, every index in the folder
     * names whole files only.
     */
    void write(SnapshotFrame frame) throws IOException;
}
