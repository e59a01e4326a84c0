// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.plugin.ParameterValues;

/**
 * A plugin named in a case.
 *
 * @param name of a provider that exists
 * @param parameters one value for each parameter the provider declares, SI, in range
 */
public record PluginChoice(String name, ParameterValues parameters) {}
