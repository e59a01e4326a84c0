// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link ViscousRollingLaw} under the name {@code viscous-rolling}. */
public final class ViscousRollingProvider implements ContactLawProvider {

    private static final Parameter TIME = new Parameter(
            "rolling_time",
            Dimension.TIME,
            0,
            10,
            1e-3,
            "Rolling friction per rolling speed: at w rad/s it resists as a rolling friction of rolling_time times w.");

    @Override
    public String name() {
        return "viscous-rolling";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Rolling resistance in proportion to normal force and rolling speed; holds nothing at rest.";
    }

    @Override
    public String source() {
        return "Brilliantov and Poeschel, Rolling friction of a viscous sphere on a hard plane, 1998 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(TIME);
    }

    @Override
    public Stage stage() {
        return Stage.ROLLING;
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new ViscousRollingLaw(values.get(TIME.name()));
    }
}
