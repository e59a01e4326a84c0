// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.List;

/**
 * A loaded plugin in words, for lists, run records and documentation.
 *
 * @param name kebab-case word written in case files
 * @param kind contact, field, element or snapshot
 * @param jar path of the jar (or folder of classes) it came from
 * @param version Implementation-Version of the jar's manifest, or "unversioned"
 * @param summary one sentence
 * @param source where its formula comes from
 * @param parameters what it takes from the case file
 */
public record PluginDescription(
        String name,
        String kind,
        String jar,
        String version,
        String summary,
        String source,
        List<Parameter> parameters) {

    public PluginDescription {
        parameters = List.copyOf(parameters);
    }
}
