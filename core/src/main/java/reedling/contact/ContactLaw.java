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
     * Binds the law to a material pair.
     *
     * @param historyColumn number of its first history column in a row's history
     */
    ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn);
}
