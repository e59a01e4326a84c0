// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;

/** Choices of the gas that a case makes, and those it cannot. */
class GasProviderTest {

    @ParameterizedTest
    @CsvSource({"none, uniform", "constant, shear", "rubinow-keller, vortex"})
    void everyDragCanBeCombined(String lift, String flow) {
        GasProvider provider = new GasProvider();
        for (String drag : DragCurve.words()) {
            Map<String, String> words = Map.of("drag", drag, "lift", lift, "flow", flow);
            assertThat(provider.create(ParameterValues.of(provider, Map.of(), words))
                            .motionForce())
                    .isPresent();
        }
    }

    @Test
    void buoyancyIsTheWeightOfTheGasInTheGrainsPlace() {
        double[] rest = new double[3];
        try (FreeFlight flight = new FreeFlight(
                        0.01,
                        100,
                        1e-3,
                        rest,
                        rest,
                        FreeFlight.gas(Map.of("density", 25.0, "gravity_z", -8.0), Map.of("drag", "none")))
                .until(1)) {
            assertThat(flight.v(2)).isCloseTo(0.25 * 8 * flight.middle(), within(1e-9));
            assertThat(Math.abs(flight.run().ledger().relativeResidual())).isLessThan(1e-10);
        }
    }

    @Test
    void choicesThatDoNotFitAreRefused() {
        GasProvider provider = new GasProvider();
        ReedlingException same = catchThrowableOfType(
                ReedlingException.class,
                () -> provider.create(ParameterValues.of(
                        provider, Map.of(), Map.of("flow", "shear", "shear_along", "y", "shear_across", "y"))));
        assertThat(same.findings().getFirst().toString()).contains("shear across: is y");
        ReedlingException tableless = catchThrowableOfType(
                ReedlingException.class,
                () -> provider.create(ParameterValues.of(provider, Map.of(), Map.of("flow", "table"))));
        assertThat(tableless.findings().getFirst().toString()).contains("table: is missing");
    }

    @Test
    void keysWithoutEffectAreRefused() {
        GasProvider provider = new GasProvider();
        ReedlingException idle = catchThrowableOfType(
                ReedlingException.class,
                () -> provider.create(ParameterValues.of(
                        provider, Map.of("shear_rate", 2.0, "vortex_spin", 3.0), Map.of("table", "wind.csv"))));
        assertThat(idle.findings()).extracting(Finding::what).containsExactly("shear rate", "vortex spin", "table");
        ReedlingException doubled = catchThrowableOfType(
                ReedlingException.class,
                () -> provider.create(ParameterValues.of(
                        provider, Map.of("velocity_y", 2.0), Map.of("table", "wind.csv", "flow", "table"))));
        assertThat(doubled.findings()).extracting(Finding::what).containsExactly("velocity y");
    }

    @Test
    void everyParameterHasADefaultAndAMeaning() {
        for (Parameter parameter : new GasProvider().parameters()) {
            assertThat(parameter.obligatory()).as(parameter.name()).isFalse();
            assertThat(parameter.meaning()).as(parameter.name()).endsWith(".");
        }
    }
}
