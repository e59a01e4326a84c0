// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.ArrayList;
import java.util.List;
import reedling.casefile.CasePlugins;
import reedling.output.SnapshotWriter;
import reedling.plugin.PluginService;

/** Every service interface that plugins may provide. */
final class PluginServices {

    static final PluginService<SnapshotWriter.Provider> SNAPSHOT =
            new PluginService<>("snapshot", SnapshotWriter.Provider.class);

    static final List<PluginService<?>> ALL = all();

    private PluginServices() {}

    private static List<PluginService<?>> all() {
        List<PluginService<?>> all = new ArrayList<>(CasePlugins.SERVICES);
        all.add(SNAPSHOT);
        return List.copyOf(all);
    }
}
