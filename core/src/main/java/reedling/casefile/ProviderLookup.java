// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import reedling.plugin.Provider;

/** The plugins a case may name, by the place that names them. */
@FunctionalInterface
public interface ProviderLookup {

    /** All providers of a kind; order does not matter. */
    List<? extends Provider> providers(ProviderKind kind);
}
