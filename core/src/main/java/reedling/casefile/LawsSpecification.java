// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * Stages of the contact law.
 *
 * @param normal normal force
 * @param tangential friction
 * @param rolling rolling resistance
 */
public record LawsSpecification(PluginChoice normal, PluginChoice tangential, PluginChoice rolling) {}
