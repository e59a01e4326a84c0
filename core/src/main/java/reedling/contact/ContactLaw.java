// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.List;
import reedling.material.MaterialPair;

/** A contact stage with its parameters checked and in SI; immutable. */
public interface ContactLaw {

    /** Changes when the meaning of the history columns changes; written into checkpoints. */
    default int historyVersion() {
        return 1;
    }

    /** What it remembers of each contact; may be empty. */
    default List<HistoryColumn> history() {
        return List.of();
    }

    /**
     * Sentences for the check of a case about contacts for which this law is not made; empty where there is nothing to say.
     *
     * @param radius effective radius, m
     */
    default List<String> cautions(MaterialPair pair, double radius) {
        return List.of();
    }

    /**
     * Binds the law to a material pair.
     *
     * @param historyColumn number of its first history column in a row's history
     */
    ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn);
}
