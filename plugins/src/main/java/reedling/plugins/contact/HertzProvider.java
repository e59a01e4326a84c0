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

/** Offers {@link HertzLaw} under the name {@code hertz}. */
public final class HertzProvider implements ContactLawProvider {

    @Override
    public String name() {
        return "hertz";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Normal force between elastic spheres, with a dashpot that gives the asked restitution at any speed.";
    }

    @Override
    public String source() {
        return "Hertz 1882; damping: Tsuji, Tanaka and Ishida 1992; restitution: Antypov and Elliott 2011 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(EndOfContact.PARAMETER);
    }

    @Override
    public Stage stage() {
        return Stage.NORMAL;
    }

    @Override
    public Set<Trait> brings() {
        return Set.of(Trait.STIFFNESS, Trait.CONTACT_RADIUS, Trait.HERTZ_CONTACT);
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new HertzLaw(EndOfContact.dashpotMayPull(values));
    }
}
