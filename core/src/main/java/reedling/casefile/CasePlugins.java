// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Optional;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.field.FieldProvider;
import reedling.plugin.PluginCatalogue;
import reedling.plugin.PluginService;
import reedling.plugin.Provider;
import reedling.structure.ElementType;

/**
 * The plugins that a case may name, as the loader found them. Threads: immutable.
 *
 * @param catalogue loaded with at least {@link #SERVICES}
 */
public record CasePlugins(PluginCatalogue catalogue) implements ProviderLookup {

    private static final PluginService<ContactLawProvider> CONTACT =
            new PluginService<>("contact", ContactLawProvider.class);
    private static final PluginService<FieldProvider> FIELD = new PluginService<>("field", FieldProvider.class);
    private static final PluginService<ElementType> ELEMENT = new PluginService<>("element", ElementType.class);

    /** Services whose plugins are named in cases. */
    public static final List<PluginService<?>> SERVICES = List.of(CONTACT, FIELD, ELEMENT);

    @Override
    public List<? extends Provider> providers(ProviderKind kind) {
        return switch (kind) {
            case NORMAL -> laws(Stage.NORMAL);
            case ADHESION -> laws(Stage.ADHESION);
            case NEAR_FIELD -> laws(Stage.NEAR_FIELD);
            case TANGENTIAL -> laws(Stage.TANGENTIAL);
            case ROLLING -> laws(Stage.ROLLING);
            case TWISTING -> laws(Stage.TWISTING);
            case FIELD -> all(FIELD);
            case ELEMENT -> all(ELEMENT);
        };
    }

    private List<ContactLawProvider> laws(Stage stage) {
        return all(CONTACT).stream().filter(law -> law.stage() == stage).toList();
    }

    private <P extends Provider> List<P> all(PluginService<P> service) {
        return catalogue.names(service).stream()
                .map(name -> catalogue.find(service, name))
                .flatMap(Optional::stream)
                .toList();
    }

    ContactLawProvider law(String name, String where) {
        return catalogue.require(CONTACT, name, where);
    }

    FieldProvider field(String name, String where) {
        return catalogue.require(FIELD, name, where);
    }

    ElementType element(String name, String where) {
        return catalogue.require(ELEMENT, name, where);
    }
}
