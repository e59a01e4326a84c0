// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link LinearSpringLaw} under the name {@code linear-spring}. */
public final class LinearSpringProvider implements ContactLawProvider {

    private static final Parameter STIFFNESS = new Parameter(
            "stiffness",
            Dimension.STIFFNESS,
            0,
            1e12,
            0,
            "Of every contact; 0: from the reference impact, for each pair of bodies.");
    private static final Parameter SPEED = new Parameter(
            "reference_speed",
            Dimension.SPEED,
            1e-6,
            1e4,
            1,
            "Speed of an impact that, undamped, reaches the reference overlap.");
    private static final Parameter OVERLAP = new Parameter(
            "reference_overlap",
            Dimension.NUMBER,
            1e-6,
            0.5,
            0.01,
            "Overlap of the reference impact as a fraction of the effective radius R1 R2 / (R1 + R2).");

    @Override
    public String name() {
        return "linear-spring";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Normal force of a linear spring and dashpot that give the asked restitution and one duration at any speed.";
    }

    @Override
    public String source() {
        return "Linear oscillator, textbook; end of contact: Schwager and Poeschel 2007 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(STIFFNESS, SPEED, OVERLAP, EndOfContact.PARAMETER);
    }

    @Override
    public Stage stage() {
        return Stage.NORMAL;
    }

    /**
     * @throws ReedlingException where a stiffness and a reference impact are both given
     */
    @Override
    public ContactLaw create(ParameterValues values) {
        double fixed = values.get(STIFFNESS.name());
        double speed = values.get(SPEED.name());
        double overlap = values.get(OVERLAP.name());
        boolean reference = speed != SPEED.defaultValue() || overlap != OVERLAP.defaultValue();
        Finding both = new Finding(
                "law",
                STIFFNESS.name(),
                fixed + " N/m beside a reference impact of " + speed + " m/s and overlap " + overlap,
                "one of both",
                "Take the stiffness or the reference impact away.");
        Finding[] faults = fixed > 0 && reference ? new Finding[] {both} : new Finding[0];
        double referenceSpeed = fixed > 0 ? 0 : speed / overlap;
        return new LinearSpringLaw(
                new LinearSpringLaw.Stiffness(fixed, referenceSpeed), EndOfContact.dashpotMayPull(values, faults));
    }
}
