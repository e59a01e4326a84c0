// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.List;
import reedling.material.MaterialPair;

/**
 * A law under the name that the case knows it by, so that a message about it can name it.
 *
 * @param name of the plugin
 * @param law the law
 */
public record NamedLaw(String name, ContactLaw law) implements ContactLaw {

    @Override
    public int historyVersion() {
        return law.historyVersion();
    }

    @Override
    public List<HistoryColumn> history() {
        return law.history();
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        try {
            return new NamedKernel(name, law.bind(pair, kind, historyColumn));
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public List<String> cautions(MaterialPair pair, double radius) {
        try {
            return law.cautions(pair, radius);
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }
}
