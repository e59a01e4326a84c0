// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.conform.LawTrial;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.ContactLaw;
import reedling.material.Material;
import reedling.material.MaterialPair;

class LiquidBridgeLawTest {

    /**
     * Bridges of water that outlast the gaps of the kit's motions, bridges that break in them, and a made-up liquid that
     * pulls a third as hard as the kit's firm contacts push.
     */
    @ParameterizedTest
    @CsvSource({"0.072, 0, 1e-11", "0.072, 0.5, 1e-17", "5, 0.5, 1e-16"})
    void lawKeepsTheContract(double tension, double angle, double volume) {
        Map<String, Double> values = Map.of("surface_tension", tension, "contact_angle", angle, "volume", volume);
        Subject subject = Subject.of(new LiquidBridgeProvider(), values, LoadedLaws.onClassPath());
        assertThat(LawTrial.findings(subject)).isEmpty();
    }

    /** A hundredth of R^3 is the limit; equal spheres of 2 mm have R* = 1 mm. */
    @ParameterizedTest
    @CsvSource({"7.9e-11, true", "8.1e-11, false"})
    void tooMuchLiquidIsCautionedAgainst(double volume, boolean silent) {
        ContactLaw law = new LiquidBridgeLaw(0.072, 0, volume, 1, 1);
        Material grain = new Material("grain", 1280, 5e7, 0.3);
        List<String> cautions = law.cautions(new MaterialPair(grain, grain, 1, 0, 0), 1e-3);
        assertThat(cautions.isEmpty()).isEqualTo(silent);
    }
}
