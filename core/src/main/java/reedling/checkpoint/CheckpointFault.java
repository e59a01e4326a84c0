// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.nio.file.Path;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/** Every way in which a checkpoint can be refused; one place for the messages. */
enum CheckpointFault {
    NOT_A_CHECKPOINT("a checkpoint written by Reedling", "Name a file checkpoint_*.rck of a run folder."),
    OTHER_VERSION(
            "format version " + CheckpointFormat.VERSION,
            "Resume with the program version that wrote it, or start anew."),
    TRUNCATED("a whole file", "Resume from the checkpoint before it."),
    DAMAGED_HEADER("a header that agrees with its checksum", "Resume from the checkpoint before it."),
    DAMAGED_SECTION("content that agrees with its checksum", "Resume from the checkpoint before it."),
    TRAILING_BYTES("nothing after the last section", "Resume from the checkpoint before it."),
    MISSING_SECTION("a section of this name", "Resume with the case and plugins that wrote it."),
    SECTION_TOO_SHORT("as much as its owner reads", "Resume with the program and plugin versions that wrote it."),
    SECTION_TOO_LONG("no more than its owner reads", "Resume with the program and plugin versions that wrote it."),
    NONE_FOUND("at least one checkpoint_*.rck", "Start the run anew under another name.");

    private final String expected;
    private final String remedy;

    CheckpointFault(String expected, String remedy) {
        this.expected = expected;
        this.remedy = remedy;
    }

    ReedlingException in(Path file, String what, String got) {
        return new ReedlingException(ExitCode.CHECKPOINT, new Finding(file.toString(), what, got, expected, remedy));
    }
}
