// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.OptionalDouble;

/**
 * What a run writes and when; an absent interval means never.
 *
 * @param endTime simulated end, s
 * @param snapshotEvery s simulated
 * @param tableEvery s simulated
 * @param checkpointEvery s simulated
 * @param checkpointEveryWall s of wall-clock time
 * @param ledger how much of the energy ledger is kept
 */
public record OutputSpecification(
        double endTime,
        OptionalDouble snapshotEvery,
        OptionalDouble tableEvery,
        OptionalDouble checkpointEvery,
        OptionalDouble checkpointEveryWall,
        Ledger ledger) {

    /** Detail of the energy ledger. */
    public enum Ledger {
        /** One number: energy put in less energy found and dissipated. */
        TOTAL,
        /** Each kind of storage and dissipation by itself. */
        CHANNELS
    }
}
