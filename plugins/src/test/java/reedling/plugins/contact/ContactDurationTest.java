// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.plugin.ParameterValues;

/**
 * Duration of a Hertz impact as the step control asks for it (K. L. Johnson, Contact mechanics, 1985, section 11.4; the
 * constants 2.868266 and 2.943275 from quadrature). 1e-5: the constants have seven digits.
 */
@Tag("reference")
class ContactDurationTest {

    private static ContactKernel kernel(Material one, Material two) {
        HertzProvider provider = new HertzProvider();
        return provider.create(ParameterValues.of(provider, Map.of()))
                .bind(new MaterialPair(one, two, 0.5, 0, 0), ContactKind.GRAIN_GRAIN, 1);
    }

    @Test
    void softGrainOnARigidPlane() {
        Material soft = new Material("soft", 2500, 1e8, 0.25);
        double mass = 2500 * 4.0 / 3 * Math.PI * 0.005 * 0.005 * 0.005;
        double duration = kernel(soft, Impact.RIGID).duration(1, 0.005, mass);
        assertThat(duration).isCloseTo(0.000357593, within(1e-5 * duration));
        double slower = kernel(soft, Impact.RIGID).duration(0.5, 0.005, mass);
        assertThat(slower / duration).isCloseTo(1.1487, within(1e-4));
    }

    @Test
    void twoEqualGlassBeads() {
        Material glass = new Material("glass", 2500, 6e10, 0.22);
        double mass = 2500 * 4.0 / 3 * Math.PI * 0.002 * 0.002 * 0.002;
        double duration = kernel(glass, glass).duration(0.5, 0.001, 0.5 * mass);
        assertThat(duration).isCloseTo(1.46958e-05, within(1e-5 * duration));
    }
}
