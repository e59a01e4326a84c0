// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

/**
 * One service interface that plugins may provide.
 *
 * @param kind word for lists and messages: contact, field, element or snapshot; names are unique within a kind
 * @param type the interface, as written in the file name under META-INF/services
 * @param <P> the interface
 */
public record PluginService<P extends Provider>(String kind, Class<P> type) {}
