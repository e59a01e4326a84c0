// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link LennardJonesLaw} under the name {@code lennard-jones}. */
public final class LennardJonesProvider implements ContactLawProvider {

    private static final double ASKED = Double.NaN;

    @Override
    public String name() {
        return "lennard-jones";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Force across the gap: a well with a steep core, and screened repulsion of like charges.";
    }

    @Override
    public String source() {
        return "Textbook potentials of Lennard-Jones, Coulomb and Yukawa, force shifted to end at the cut-off";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(
                new Parameter("depth", Dimension.ENERGY, 0, 1e3, ASKED, "Depth of the well."),
                new Parameter(
                        "zero_distance", Dimension.LENGTH, 1e-11, 1, ASKED, "Distance at which the potential is zero."),
                new Parameter(
                        "contact_distance",
                        Dimension.LENGTH,
                        0,
                        10,
                        ASKED,
                        "Distance of surfaces that touch; the sum of both radii makes it the distance of centres."),
                new Parameter("cutoff", Dimension.LENGTH, 1e-11, 100, ASKED, "Distance beyond which nothing acts."),
                new Parameter("charge", Dimension.CHARGE, 0, 1, 0, "Charge of each body, all of one sign."),
                new Parameter(
                        "screening_length",
                        Dimension.LENGTH,
                        1e-10,
                        1e6,
                        1e6,
                        "Distance over which charge is screened to 1/e; the default is none to speak of."));
    }

    @Override
    public Stage stage() {
        return Stage.NEAR_FIELD;
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new LennardJonesLaw(
                values.get("depth"),
                values.get("zero_distance"),
                values.get("contact_distance"),
                values.get("cutoff"),
                values.get("charge"),
                values.get("screening_length"));
    }
}
