// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link TwistingLaw} under the name {@code twisting-spring}. */
public final class TwistingProvider implements ContactLawProvider {

    private static final Parameter TWISTING_FRICTION = new Parameter(
            "twisting_friction",
            Dimension.NUMBER,
            0,
            1,
            0.01,
            "Limit moment over normal force and effective radius, the same for all pairs of materials.");
    private static final Parameter DAMPING_RATIO = new Parameter(
            "damping_ratio", Dimension.NUMBER, 0, 2, 0.3, "Twisting dashpot as a fraction of the critical one.");

    @Override
    public String name() {
        return "twisting-spring";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Resistance to spin about the normal by a spring and dashpot that yield at a moment proportional to the normal force.";
    }

    @Override
    public String source() {
        return "Form as rolling resistance of Iwashita and Oda 1998; stiffness by analogy, no source";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(TWISTING_FRICTION, DAMPING_RATIO);
    }

    @Override
    public Stage stage() {
        return Stage.TWISTING;
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new TwistingLaw(values.get(TWISTING_FRICTION.name()), values.get(DAMPING_RATIO.name()));
    }
}
