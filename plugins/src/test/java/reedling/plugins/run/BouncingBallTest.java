// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Oscillating;
import reedling.wall.Placement;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Wall;

/**
 * A ball on a plate z = A sin(w t), the model of a shaken layer; G = A w^2/g. Restitution is 0.05, the least a case may
 * ask for; what a flight from rest does not depend on it.
 *
 * <p>Source: A. Mehta and J. M. Luck, Novel temporal behavior of a nonlinear dynamical system: the completely inelastic
 * bouncing ball, 1990. 1 % is allowed: contacts of 0.05 ms in a period of 40 ms, and steps of 0.02 ms.
 */
@Tag("reference")
class BouncingBallTest {

    private static final double GRAVITY = 9.81;
    private static final double FREQUENCY = 25;
    private static final double RADIUS = 2e-3;
    private static final double RESTITUTION = 0.05;

    /** Periods after which the ball, set down without overlap, carries its weight. */
    private static final double AT_REST = 0.02;

    /** Part of the weight below which the plate no longer carries the ball. */
    private static final double RELEASED = 2e-3;

    /** Lengths of flights, in periods. */
    private final List<Double> flights = new ArrayList<>();

    private double released = Double.NaN;
    private double highest = Double.NEGATIVE_INFINITY;

    private void shake(double relativeAcceleration, double periods) {
        double turn = 2 * Math.PI * FREQUENCY;
        double amplitude = relativeAcceleration * GRAVITY / (turn * turn);
        Oscillating motion =
                Oscillating.harmonic(new Stroke(new Vector3d(0, 0, 1), amplitude, 0), FREQUENCY, Timing.always());
        Rig rig = new Rig()
                .material(new Material("hard", 1280, 2e9, 0.3), RESTITUTION, 0, 0)
                .gravity(0, 0, -GRAVITY)
                .maximumStep(2e-5)
                .reportEvery(1000)
                .wall(new Wall("plate", 0, new HalfSpace(), Placement.world(), motion));
        long ball =
                rig.grain(0, RADIUS, new double[] {0, 0, RADIUS}, new double[] {0, 0, amplitude * turn}, new double[3]);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double since = Double.NaN;
            double weight = rig.grains().mass(0) * GRAVITY;
            while (run.time() * FREQUENCY < periods) {
                run.step();
                double plate = amplitude * Math.sin(turn * run.time());
                double gap = rig.centre(ball)[2] - RADIUS - plate;
                highest = Math.max(highest, gap);
                double load = Math.abs(run.interactions().walls().lastLoads()[2]);
                if (Double.isNaN(released) && run.time() * FREQUENCY > AT_REST && load < RELEASED * weight) {
                    released = run.time() * FREQUENCY;
                }
                if (gap > 0 && Double.isNaN(since)) {
                    since = run.time();
                } else if (gap <= 0 && !Double.isNaN(since)) {
                    keep(since * FREQUENCY, run.time() * FREQUENCY);
                    since = Double.NaN;
                }
            }
        }
    }

    /** Rebounds of a twentieth, and of that again, are no flights of their own. */
    private void keep(double from, double to) {
        if (to - from > 0.2) {
            flights.add(to - from);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.5, 0.97})
    void ballStaysOnThePlateBelowGravity(double acceleration) {
        shake(acceleration, 3);
        assertThat(highest).isLessThan(1e-7);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.5, 2, 3})
    void ballLeavesThePlateWhereItsAccelerationIsThatOfGravity(double acceleration) {
        shake(acceleration, 2);
        double turns = Math.asin(1 / acceleration) / (2 * Math.PI);
        // seen by the load: the gap opens with the third power of time, and the overlap under the weight delays it more
        assertThat(released).isEqualTo(turns, within(0.01 * turns));
    }

    @Test
    void flightFromRestLastsOnePeriodAtTheSquareRootOfOneAndPiSquared() {
        shake(Math.sqrt(1 + Math.PI * Math.PI), 2);
        assertThat(flights.getFirst()).isEqualTo(1, within(0.01));
    }

    /**
     * Flights of one period become alternately long and short at G^2 = (pi (1-e)/(1+e))^2 + (2 (1+e^2)/(1+e)^2)^2, 4 + pi^2
     * for e = 0. Source of the form with e: N. B. Tufillaro, T. Abbott and J. Reilly, An Experimental Approach to Nonlinear
     * Dynamics and Chaos, 1992 (from memory; met by the exact map from impact to impact).
     */
    @Test
    void flightsDoubleTheirPeriodWhereTheMapSaysSo() {
        double e = RESTITUTION;
        double threshold = Math.hypot(Math.PI * (1 - e) / (1 + e), 2 * (1 + e * e) / ((1 + e) * (1 + e)));
        shake(0.99 * threshold, 80);
        assertThat(lastChange()).isLessThan(0.01);
        flights.clear();
        shake(1.01 * threshold, 80);
        assertThat(lastChange()).isGreaterThan(0.05);
    }

    private double lastChange() {
        assertThat(flights).hasSizeGreaterThan(60);
        return Math.abs(flights.getLast() - flights.get(flights.size() - 2));
    }
}
