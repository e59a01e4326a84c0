// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Impacts of wet grains in the whole program: what the bridge takes is the work of the published force up to s_c. */
class WetImpactTest {

    private static final double VOLUME = 8e-12; // m3
    private static final double LENGTH = 2e-4; // m
    private static final LiquidBridgeLaw LAW = new LiquidBridgeLaw(0.072, 0, VOLUME, 1, 1);
    private static final double WORK = Published.work(TwoGrains.RADIUS, 0.072, 0, VOLUME, LENGTH);

    /** Energy balance: m* v^2 / 2 = work. */
    private static final double STICKING = Math.sqrt(2 * WORK / TwoGrains.MASS);

    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.3, 0.8, 0.97})
    void slowGrainsStick(double share) {
        assertThat(TwoGrains.meet(LAW, share * STICKING, 1e-6, 40).speed()).isZero();
    }

    /** 1 % of the speed at 40 steps a contact. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {1.1, 1.5, 3, 10})
    void fasterGrainsLoseTheEnergyOfTheBridge(double share) {
        double speed = share * STICKING;
        double expected = Math.sqrt(speed * speed - STICKING * STICKING);
        TwoGrains.Outcome seen = TwoGrains.meet(LAW, speed, 1e-6, 40);
        assertThat(seen.speed()).isCloseTo(expected, within(0.01 * expected));
        assertThat(seen.lost()).isCloseTo(WORK, within(1e-3 * WORK));
    }

    /** The residual falls with the square of the step, 64-fold here; 15 leaves room for where steps fall at the jumps. */
    @Test
    @Tag("convergence")
    void ledgerClosesWithTheStep() {
        double coarse = largestResidual(20);
        assertThat(coarse).isLessThan(0.03);
        assertThat(largestResidual(160)).isLessThan(coarse / 15);
    }

    /** Over several starts, as a part of what the bridge takes. */
    private static double largestResidual(int stepsPerContact) {
        double largest = 0;
        for (int k = 0; k < 12; k++) {
            TwoGrains.Outcome one = TwoGrains.meet(LAW, 1.5 * STICKING, 1e-6 * (1 + k * 0.0171), stepsPerContact);
            largest = Math.max(largest, Math.abs(one.residual()) / WORK);
        }
        return largest;
    }
}
