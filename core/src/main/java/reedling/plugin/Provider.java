// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.List;

/** What every plugin says of itself in words; found by {@link java.util.ServiceLoader}, needs a public no-argument constructor. */
public interface Provider {

    /** Level of the service interfaces; a jar built for another level is refused by name. */
    int API_LEVEL = 1;

    /** Stable kebab-case word written into case files and checkpoints. */
    String name();

    /** Must return the compile-time constant {@link #API_LEVEL}, so that the jar remembers what it was built for. */
    int apiLevel();

    /** One sentence: what it computes, between what. */
    String summary();

    /** Where its formula comes from: author, title, year. */
    String source();

    /** Parameters it takes from the case file; empty if none. */
    default List<Parameter> parameters() {
        return List.of();
    }
}
