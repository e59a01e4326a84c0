// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.Set;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.contact.Trait;
import reedling.plugin.ParameterValues;

/** Offers {@link MindlinLaw} with {@link StretchRule#INCREMENTAL} under the name {@code mindlin-incremental}. */
public final class MindlinIncrementalProvider implements ContactLawProvider {

    @Override
    public String name() {
        return "mindlin-incremental";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Friction as mindlin, but its spring keeps the force when the load changes; may create energy.";
    }

    @Override
    public String source() {
        return "Mindlin, Compliance of elastic bodies in contact, 1949; its energy: Elata and Berryman 1996 (from memory)";
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
        return new MindlinLaw(StretchRule.INCREMENTAL);
    }
}
