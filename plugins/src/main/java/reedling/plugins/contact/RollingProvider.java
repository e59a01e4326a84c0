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

/** Offers {@link RollingLaw} under the name {@code elastic-plastic}. */
public final class RollingProvider implements ContactLawProvider {

    private static final String DAMPING = "damping_ratio";

    @Override
    public String name() {
        return "elastic-plastic";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Rolling resistance by a spring and dashpot that yield at a moment proportional to the normal force.";
    }

    @Override
    public String source() {
        return "Iwashita and Oda 1998; Ai, Chen, Rotter and Ooi, Assessment of rolling resistance models, 2011";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(new Parameter(
                DAMPING, Dimension.NUMBER, 0, 2, 0.3, "Rolling dashpot as a fraction of the critical one."));
    }

    @Override
    public Stage stage() {
        return Stage.ROLLING;
    }

    @Override
    public Set<Trait> needs() {
        return Set.of(Trait.STIFFNESS);
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new RollingLaw(values.get(DAMPING));
    }
}
