// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.ArrayList;
import java.util.List;
import reedling.casefile.CasePlugins;
import reedling.contact.ContactLawProvider;
import reedling.field.FieldProvider;
import reedling.output.SnapshotWriter;
import reedling.plugin.PluginService;
import reedling.structure.ElementType;

/** Every service interface that plugins may provide. */
final class PluginServices {

    static final PluginService<SnapshotWriter.Provider> SNAPSHOT =
            new PluginService<>("snapshot", SnapshotWriter.Provider.class);

    static final PluginService<ContactLawProvider> CONTACT = new PluginService<>("contact", ContactLawProvider.class);

    static final PluginService<FieldProvider> FIELD = new PluginService<>("field", FieldProvider.class);

    static final PluginService<ElementType> ELEMENT = new PluginService<>("element", ElementType.class);

    static final List<PluginService<?>> ALL = all();

    private PluginServices() {}

    private static List<PluginService<?>> all() {
        List<PluginService<?>> all = new ArrayList<>(CasePlugins.SERVICES);
        all.add(SNAPSHOT);
        return List.copyOf(all);
    }
}
