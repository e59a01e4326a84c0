// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.Objects;

/**
 * A provider, the service it was found under and where it came from.
 *
 * @param service the service
 * @param provider the instance; an instance of the service's type
 * @param name the provider's name, read once
 * @param jar path of its jar or folder of classes
 */
record LoadedPlugin(PluginService<?> service, Provider provider, String name, String jar) {

    PluginDescription description() {
        String version =
                Objects.requireNonNullElse(provider.getClass().getPackage().getImplementationVersion(), "unversioned");
        return new PluginDescription(
                name, service.kind(), jar, version, provider.summary(), provider.source(), provider.parameters());
    }
}
