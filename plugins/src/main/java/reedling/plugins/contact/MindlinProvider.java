// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.Set;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.contact.Trait;
import reedling.plugin.ParameterValues;

/** Offers {@link MindlinLaw} under the name {@code mindlin}. */
public final class MindlinProvider implements ContactLawProvider {

    @Override
    public String name() {
        return "mindlin";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Friction with a tangential spring of Mindlin's stiffness, a dashpot and Coulomb's limit.";
    }

    @Override
    public String source() {
        return "Mindlin 1949; Mindlin and Deresiewicz 1953; stiffness change: Thornton and Randall 1988 (from memory)";
    }

    @Override
    public Stage stage() {
        return Stage.TANGENTIAL;
    }

    @Override
    public Set<Trait> needs() {
        return Set.of(Trait.CONTACT_RADIUS);
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new MindlinLaw(StretchRule.PASSIVE);
    }
}
