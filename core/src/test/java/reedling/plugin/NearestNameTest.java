// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class NearestNameTest {

    @Test
    void distanceCountsInsertionsDeletionsAndReplacements() {
        assertThat(NearestName.distance("density", "density")).isZero();
        assertThat(NearestName.distance("density", "densty")).isEqualTo(1);
        assertThat(NearestName.distance("radius", "rodiuss")).isEqualTo(2);
        assertThat(NearestName.distance("", "gap")).isEqualTo(3);
    }

    @Test
    void nearestKnownNameIsFound() {
        assertThat(NearestName.of("densiti", List.of("radius", "density", "friction")))
                .contains("density");
    }

    @Test
    void namesThatShareLittleAreNotSuggested() {
        assertThat(NearestName.of("xyz", List.of("density", "friction"))).isEmpty();
        assertThat(NearestName.of("anything", List.of())).isEmpty();
    }
}
