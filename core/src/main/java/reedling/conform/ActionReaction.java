// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import reedling.material.MaterialPair;

/** Forces on both bodies sum to zero, torques balance, and it does not matter which body is called the first. */
final class ActionReaction implements Check {

    private static final int COUPLES = 24;
    private static final int STEPS = 400;
    private static final double ROUNDING = 1e-11;

    /** Forces follow overlaps that are differences of coordinates a few hundred times as large, and slips a thousand times. */
    private static final double EXCHANGED = 1e-7;

    @Override
    public String name() {
        return "action and reaction";
    }

    @Override
    public Outcome run(Subject subject) {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        double[] unbalanced = new double[2];
        try (PairBench bench = new PairBench(subject.laws(), pair, cycles.couples(), PairBench.ONE_CELL)) {
            new Drive(bench, cycles.motions(), cycles.duration() / STEPS)
                    .run(0, STEPS, (step, drive) -> balance(drive, unbalanced));
        }
        Recording.Plan plan = new Recording.Plan(pair, STEPS, cycles.duration(), 0, 0);
        Recording named = Recording.of(subject.laws(), cycles.couples(), cycles.motions(), PairBench.ONE_CELL, plan);
        Recording exchanged = Recording.of(
                subject.laws(), cycles.exchangedCouples(), cycles.exchangedMotions(), PairBench.ONE_CELL, plan);
        double difference = named.difference(exchanged, ActionReaction::exchange);
        List<String> findings = new ArrayList<>();
        if (!(unbalanced[0] <= ROUNDING)) {
            findings.add(
                    text("The forces on the two bodies do not sum to zero: %.2g of the force is left.", unbalanced[0]));
        }
        if (!(unbalanced[1] <= ROUNDING)) {
            findings.add(text("The torques do not balance: %.2g of force times radius is left.", unbalanced[1]));
        }
        if (!(difference <= EXCHANGED)) {
            findings.add(text(
                    "With the two bodies exchanged the forces differ by %.2g of the largest:"
                            + " the law treats the first body unlike the second.",
                    difference));
        }
        return new Outcome(
                findings,
                String.format(
                        Locale.ROOT,
                        "Force left %.1e, torque left %.1e, bodies exchanged %.1e (all relative).",
                        unbalanced[0],
                        unbalanced[1],
                        difference));
    }

    private static String text(String format, double value) {
        return String.format(Locale.ROOT, format, value);
    }

    /** Sums forces, and torques about the first centre, of every couple. */
    private static void balance(Drive drive, double[] unbalanced) {
        for (int p = 0; p < COUPLES; p++) {
            double[] pose = drive.pose(p);
            double size = 1e-30;
            for (int c = 0; c < PairMotion.ANGLES; c++) {
                size = Math.max(size, Math.abs(drive.load(p, c)));
            }
            for (int k = 0; k < 3; k++) {
                int l = (k + 1) % 3, m = (k + 2) % 3;
                double force = drive.load(p, k) + drive.load(p, 3 + k);
                double torque = drive.load(p, 6 + k)
                        + drive.load(p, 9 + k)
                        + (pose[3 + l] - pose[l]) * drive.load(p, 3 + m)
                        - (pose[3 + m] - pose[m]) * drive.load(p, 3 + l);
                unbalanced[0] = larger(unbalanced[0], Math.abs(force) / size);
                unbalanced[1] = larger(unbalanced[1], Math.abs(torque) / (size * Reference.RADIUS));
            }
        }
    }

    private static double larger(double a, double b) {
        return Double.isNaN(b) ? Double.POSITIVE_INFINITY : Math.max(a, b);
    }

    private static void exchange(double[] loads, int from) {
        for (int k = from; k < from + PairMotion.LENGTH; k += 6) {
            for (int c = k; c < k + 3; c++) {
                double first = loads[c];
                loads[c] = loads[c + 3];
                loads[c + 3] = first;
            }
        }
    }
}
