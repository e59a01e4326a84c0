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

/** Offers {@link JkrLaw} under the name {@code jkr}. */
public final class JkrProvider implements ContactLawProvider {

    private static final String WORK = "work_of_adhesion";
    private static final String WALLS = "on_walls";
    private static final String WIRES = "on_wires";

    @Override
    public String name() {
        return "jkr";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Normal force between elastic, adhesive spheres: springs open on touch, holds until it tears.";
    }

    @Override
    public String source() {
        return "Johnson, Kendall and Roberts, Surface energy and the contact of elastic solids, 1971";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(
                new Parameter(
                        WORK,
                        Dimension.SURFACE_ENERGY,
                        1e-9,
                        1e3,
                        Double.NaN,
                        "Work to part a unit area of two grains; twice their surface energy where both are alike."),
                new Parameter(
                        WALLS, Dimension.NUMBER, 0, 1e3, 1, "Work of adhesion to walls over that between grains."),
                new Parameter(
                        WIRES, Dimension.NUMBER, 0, 1e3, 1, "Work of adhesion to wires over that between grains."));
    }

    @Override
    public Stage stage() {
        return Stage.NORMAL;
    }

    @Override
    public Set<Trait> brings() {
        return Set.of(Trait.STIFFNESS, Trait.CONTACT_RADIUS, Trait.ADHESION);
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new JkrLaw(values.get(WORK), values.get(WALLS), values.get(WIRES));
    }
}
