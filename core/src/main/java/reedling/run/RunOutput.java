// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import reedling.checkpoint.CheckpointFolder;
import reedling.output.RunFolder;
import reedling.output.SnapshotWriter;
import reedling.output.WriteQueue;

/**
 * Where a run writes. The caller opens and closes all of it; snapshot writers and checkpoints are used by the queue's
 * thread only.
 *
 * @param folder of the run
 * @param queue of the writing jobs
 * @param snapshots writers of snapshots, possibly none
 * @param checkpoints of the run
 * @param progress what the user sees meanwhile
 */
public record RunOutput(
        RunFolder folder,
        WriteQueue queue,
        List<SnapshotWriter> snapshots,
        CheckpointFolder checkpoints,
        Progress progress) {}
