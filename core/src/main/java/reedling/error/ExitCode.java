// SPDX-License-Identifier: Apache-2.0
package reedling.error;

/** Exit codes of the command line, documented in the README; the numbers follow the common sysexits convention. */
public enum ExitCode {
    /** Everything asked for was done. */
    OK(0),
    /** The command line itself is wrong. */
    USAGE(64),
    /** The case file is wrong; every finding was printed. */
    CASE(65),
    /** A named input file is missing or unreadable. */
    NO_INPUT(66),
    /** A plugin is missing, broken, doubled or of another API level. */
    PLUGIN(69),
    /** A fault of this program, not of its user. */
    INTERNAL(70),
    /** The output folder cannot be created or is in use. */
    OUTPUT(73),
    /** Reading or writing failed part-way. */
    INPUT_OUTPUT(74),
    /** Stopped by a signal; a checkpoint was written and the run can be resumed. */
    STOPPED(75),
    /** A guard stopped the run: not a number, overlap too deep, grain lost, structure torn. */
    GUARD(76),
    /** A checkpoint is damaged or belongs to another version or case. */
    CHECKPOINT(78),
    /** A check that was asked for found something; what is in the report. */
    FOUND(79);

    private final int number;

    ExitCode(int number) {
        this.number = number;
    }

    public int number() {
        return number;
    }
}
