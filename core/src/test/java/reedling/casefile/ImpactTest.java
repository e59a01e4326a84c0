// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

class ImpactTest {

    private static final Impact IMPACT = new Impact(3e7, 2e-3, 5e-5);

    /** Hertz's force 4/3 E* sqrt(R) d^1.5, integrated to the largest overlap, takes up all of the kinetic energy. */
    @Test
    void workToTheLargestOverlapIsTheKineticEnergy() {
        double deepest = IMPACT.overlap(1.7);
        int parts = 100_000;
        double work = 0;
        for (int k = 0; k < parts; k++) {
            double overlap = deepest * (k + 0.5) / parts;
            work += 4.0 / 3 * 3e7 * Math.sqrt(2e-3) * Math.pow(overlap, 1.5) * deepest / parts;
        }
        assertThat(work).isCloseTo(0.5 * 5e-5 * 1.7 * 1.7, Percentage.withPercentage(1e-6));
    }

    @Test
    void stiffnessIsTheSlopeOfHertzForce() {
        double overlap = 2e-5;
        double step = 1e-9;
        double slope = 4.0
                / 3
                * 3e7
                * Math.sqrt(2e-3)
                * (Math.pow(overlap + step, 1.5) - Math.pow(overlap - step, 1.5))
                / (2 * step);
        assertThat(IMPACT.stiffness(overlap)).isCloseTo(slope, Percentage.withPercentage(1e-5));
    }
}
