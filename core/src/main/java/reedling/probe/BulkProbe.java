// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.particle.GrainStore;

/** Looks at all grains of a run together and gives a few figures; changes nothing. Threads: one. */
public interface BulkProbe extends Persistent {

    /** As in the case file. */
    String name();

    /** Time between two samples, s; infinite if it needs none. */
    double every();

    /** Looks at the grains; called at the first step at or after each multiple of {@link #every}. */
    void sample(double time, GrainStore grains);

    /** The figures as they stand, always the same names in the same order. */
    List<Reading> readings(GrainStore grains);

    /** Rows of a closing table behind the figures, the first its header with units, in CSV. */
    List<String> closingTable(GrainStore grains);

    @Override
    default String section() {
        return "probe " + name();
    }
}
