// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import java.util.Set;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.contact.Trait;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link DmtAdhesionLaw} under the name {@code dmt-adhesion}. */
public final class DmtAdhesionProvider implements ContactLawProvider {

    private static final Parameter WORK_OF_ADHESION = new Parameter(
            "work_of_adhesion",
            Dimension.SURFACE_ENERGY,
            1e-6,
            10,
            Double.NaN,
            "Work to separate a unit of touching area, the same for all pairs of materials.");

    @Override
    public String name() {
        return "dmt-adhesion";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Constant attraction of touching stiff grains, from a work of adhesion; no hysteresis.";
    }

    @Override
    public String source() {
        return "Derjaguin, Muller and Toporov, Effect of contact deformations on the adhesion of particles, 1975 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(WORK_OF_ADHESION);
    }

    @Override
    public Stage stage() {
        return Stage.ADHESION;
    }

    @Override
    public Set<Trait> needs() {
        return Set.of(Trait.HERTZ_CONTACT);
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new DmtAdhesionLaw(values.get(WORK_OF_ADHESION.name()));
    }
}
