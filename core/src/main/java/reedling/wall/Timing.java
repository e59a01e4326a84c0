// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * When a motion runs, and the smooth rise and fall of its strength between 0 and 1.
 *
 * <p>Formula: strength e(t) = s((t - start)/ramp) - s((t - stop + ramp)/ramp), s(u) = 6u^5 - 15u^4 + 10u^3 for 0 <= u
 * <= 1, 0 below and 1 above. Value, slope and curvature of s vanish or match at both ends, so velocities and
 * accelerations made from e have no jump.
 * <p>Where: start, stop (s); ramp (s) the duration of the rise after the start and of the fall before the stop. A
 * ramp of 0 switches at once and is only for motions that need no strength (see {@link #switchesAtOnce}).
 * <p>Errors: ramp negative; stop earlier than start + 2 ramps; start not finite.
 * <p>Source: the quintic step is common practice, no source.
 * <p>Threads: immutable.
 *
 * @param start first instant of motion, s; minus infinity only in {@link #always()}
 * @param stop first instant of rest after the motion, s; may be plus infinity
 * @param ramp duration of the rise and of the fall, s
 */
public record Timing(double start, double stop, double ramp) {

    /** Steps that show the speed of a motion which switches at once, s: a wall moves a fraction of a micrometre in them. */
    private static final double INSTANT = 1e-7;

    private static final double STEPS_IN_A_RAMP = 50;

    private static final Timing ALWAYS = new Timing(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, 0);

    public Timing {
        boolean endless = start == Double.NEGATIVE_INFINITY && stop == Double.POSITIVE_INFINITY && ramp == 0;
        if (!endless) {
            new RangeCheck("motion.timing")
                    .finite("start", start, "s")
                    .notNegative("ramp", ramp, "s")
                    .require(stop >= start + 2 * ramp, "stop", stop, "s", "at least start + 2 ramps")
                    .finish();
        }
    }

    /** Full strength at every time; distances are counted from time 0. */
    public static Timing always() {
        return ALWAYS;
    }

    /** Starts at {@code start} (s) with a rise of {@code ramp} (s) and never stops. */
    public static Timing from(double start, double ramp) {
        return new Timing(start, Double.POSITIVE_INFINITY, ramp);
    }

    /** Instant from which phases are counted, s. */
    public double origin() {
        return start == Double.NEGATIVE_INFINITY ? 0 : start;
    }

    /** Whether the strength jumps from 0 to 1, so that an oscillation made with it would jump in position. */
    public boolean switchesAtOnce() {
        return ramp == 0 && start != Double.NEGATIVE_INFINITY;
    }

    /** Strength e(t), 0 to 1. */
    public double strength(double time) {
        if (start == Double.NEGATIVE_INFINITY) {
            return 1;
        }
        if (time <= start || time >= stop) {
            return 0;
        }
        double rise = step(time - start);
        return stop == Double.POSITIVE_INFINITY ? rise : rise - step(time - (stop - ramp));
    }

    /** Integral of the strength from the origin to t, s: the time at full strength that covers the same distance. */
    public double elapsed(double time) {
        if (start == Double.NEGATIVE_INFINITY) {
            return time;
        }
        if (time <= start) {
            return 0;
        }
        // clamped first, so that rounding cannot make a stopped wall creep
        double seen = Math.min(time, stop);
        double rise = stepIntegral(seen - start);
        return stop == Double.POSITIVE_INFINITY ? rise : rise - stepIntegral(seen - (stop - ramp));
    }

    /**
     * Longest step from a time, s, that does not run past a change of strength before anybody could see it: a step ends
     * where a change begins, those inside are short.
     */
    public double longestStep(double time) {
        return Math.min(untilChange(start - time), untilChange(stop - ramp - time));
    }

    private double untilChange(double left) {
        double inside = Math.max(INSTANT, ramp / STEPS_IN_A_RAMP);
        if (left > inside) {
            return left;
        }
        return left > -ramp - 2 * inside ? inside : Double.POSITIVE_INFINITY;
    }

    private double step(double since) {
        if (since <= 0) {
            return 0;
        }
        if (since >= ramp) {
            return 1;
        }
        double u = since / ramp;
        return u * u * u * (10 + u * (-15 + 6 * u));
    }

    private double stepIntegral(double since) {
        if (since <= 0) {
            return 0;
        }
        if (since >= ramp) {
            return since - 0.5 * ramp;
        }
        double u = since / ramp;
        return ramp * u * u * u * u * (2.5 + u * (-3 + u));
    }
}
