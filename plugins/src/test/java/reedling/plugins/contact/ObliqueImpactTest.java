// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Momentum;
import reedling.plugins.Rig;

/**
 * Oblique impacts and impacts of spinning spheres that slide all the time: the impulse along the surface is mu times the
 * normal one, whatever the stiffness (rigid-body impulse; O. R. Walton, 1993; S. F. Foerster and others, 1994). Set-ups of
 * tests 4 and 6 to 8 of Y. C. Chung and J. Y. Ooi, 2011 (as remembered). Tolerance 0.5 %: the lever is shortened by half
 * the overlap, up to 0.15 % here, and restitution holds to 0.1 %.
 */
@Tag("reference")
class ObliqueImpactTest {

    private static final Material ALUMINA = new Material("alumina", 4000, 3.8e11, 0.23);
    private static final double FRICTION = 0.092;
    private static final double RADIUS = 0.0025;

    private static double[] bounce(double degrees, double restitution) {
        Rig rig = new Rig()
                .material(ALUMINA, restitution, FRICTION, 0)
                .material(Impact.RIGID, restitution, FRICTION, 0)
                .stepsPerContact(200);
        double angle = Math.toRadians(degrees);
        double normal = 3.9 * Math.cos(angle);
        double along = 3.9 * Math.sin(angle);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {normal, along, 0}, Impact.REST, 1e-6 * normal);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        double[] v = rig.velocity(impact.first());
        double[] w = rig.spin(impact.first());
        double ratio = (along - v[1]) / (FRICTION * (normal - v[0]));
        return new double[] {-v[0], v[1], w[2], ratio};
    }

    @ParameterizedTest
    @CsvSource({
        "35, 3.1308, 1.655, 581.95",
        "45, 2.7026, 2.2554, 502.35",
        "55, 2.1922, 2.7872, 407.48",
        "65, 1.6152, 3.2344, 300.24",
        "75, 0.98921, 3.5832, 183.87",
        "85, 0.33311, 3.8232, 61.918"
    })
    void slidingSphereReboundsWithTheCoulombImpulse(double degrees, double normal, double along, double spin) {
        double[] after = bounce(degrees, 0.98);
        assertThat(after[0]).isCloseTo(normal, within(0.005 * normal));
        assertThat(after[1]).isCloseTo(along, within(0.005 * along));
        assertThat(Math.abs(after[2])).isCloseTo(spin, within(0.005 * spin));
        // the plane fills x > 0 and the sphere moves along +y: it begins to roll, w_z R = -v_y
        assertThat(after[2]).isNegative();
        assertThat(after[3]).isCloseTo(1, within(1e-6));
    }

    /** The limit is mu times the whole normal force, dashpot included: the impulse ratio is mu for a lossy impact too. */
    @ParameterizedTest
    @ValueSource(doubles = {0.6, 0.3})
    void frictionLimitUsesTheWholeNormalForce(double restitution) {
        assertThat(bounce(65, restitution)[3]).isCloseTo(1, within(1e-6));
    }

    /** Test 6: a spinning sphere on a rigid plane; v_t' = -0.12, w' = w - 3, v_n' = -0.1. */
    @ParameterizedTest
    @ValueSource(doubles = {6, 12, 24})
    void spinningSphereKicksItselfAlongThePlane(double spin) {
        Rig rig = benchmark();
        double[] turning = {0, 0, spin};
        Impact impact = Impact.onPlane(rig, 0.1, new double[] {0.2, 0, 0}, turning, 1e-5);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        assertBody(rig, impact.first(), -0.1, -0.12, spin - 3);
    }

    /** Tests 7 and 8: on a spinning sphere of its own size, and on a resting one five times as large. */
    @ParameterizedTest
    @CsvSource({
        "6, 0.1, 6, 0.05, -0.06, 4.5, 0.15, 0.06, 4.5",
        "24, 0.1, 24, 0.05, -0.06, 22.5, 0.15, 0.06, 22.5",
        "6, 0.5, 0, -0.097619, -0.119048, 3.02381, 0.00238095, 0.000952381, -0.0047619",
        "24, 0.5, 0, -0.097619, -0.119048, 21.0238, 0.00238095, 0.000952381, -0.0047619"
    })
    void spinningSpheresExchangeImpulse(
            double spin,
            double otherRadius,
            double otherSpin,
            double vn1,
            double vt1,
            double w1,
            double vn2,
            double vt2,
            double w2) {
        Rig rig = benchmark();
        Impact impact = Impact.ofTwo(
                rig,
                new Impact.Ball(0.1, new double[] {0.2, 0, 0}, new double[] {0, 0, spin}),
                new Impact.Ball(otherRadius, Impact.REST, new double[] {0, 0, otherSpin}),
                1e-5);
        Momentum before = Momentum.of(rig.grains());
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        assertBody(rig, impact.first(), vn1, vt1, w1);
        assertBody(rig, impact.second(), vn2, vt2, w2);
        assertThat(Momentum.of(rig.grains()).largestChange(before)).isLessThan(1e-12);
    }

    private static Rig benchmark() {
        return new Rig()
                .material(new Material("alloy", 2700, 7e10, 0.3), 0.5, 0.4, 0)
                .material(Impact.RIGID, 0.5, 0.4, 0)
                .stepsPerContact(200);
    }

    private static void assertBody(Rig rig, long id, double normal, double along, double spin) {
        assertThat(rig.velocity(id)[0]).isCloseTo(normal, within(0.005 * Math.abs(normal)));
        assertThat(rig.velocity(id)[1]).isCloseTo(along, within(0.005 * Math.abs(along)));
        assertThat(rig.spin(id)[2]).isCloseTo(spin, within(0.005 * Math.abs(spin)));
    }
}
