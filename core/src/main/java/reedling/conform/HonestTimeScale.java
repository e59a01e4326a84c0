// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * The step control believes what a law says of its time scale: the duration it declares is not longer than an impact
 * really takes, and the stiffness it declares is not below the slope of its force.
 */
final class HonestTimeScale implements Check {

    /** An impact's time is taken as twice that to the deepest point, which a dashpot shortens by up to a fifth. */
    private static final double LONGEST = 1.35;

    /** Below it the law is honest but makes runs slow. */
    private static final double SHORTEST = 0.2;

    /** Share of the measured stiffness that must be declared. */
    private static final double SOFTEST = 0.8;

    private static final int STEPS = 500;
    private static final double[] DEPTHS = {0.001, 0.003, 0.01, 0.03};

    @Override
    public String name() {
        return "honest time scale";
    }

    @Override
    public Outcome run(Subject subject) {
        List<String> findings = new ArrayList<>();
        StringBuilder measured = new StringBuilder();
        if (subject.stage() == Stage.NORMAL) {
            durations(subject, findings, measured);
        }
        Slopes slopes = Slopes.of(subject.laws());
        stiffness("normal", slopes.normal(), findings, measured);
        stiffness("tangential", slopes.sliding(), findings, measured);
        return new Outcome(findings, measured.toString().strip());
    }

    private static void durations(Subject subject, List<String> findings, StringBuilder measured) {
        MaterialPair pair = Reference.pair(0.9, 0, 0);
        Couple couple = Reference.equal();
        ContactKernel kernel = subject.law().bind(pair, ContactKind.GRAIN_GRAIN, 1);
        double largest = 0;
        double smallest = Double.POSITIVE_INFINITY;
        for (double depth : DEPTHS) {
            double overlap = depth * couple.effectiveRadius();
            double speed = Reference.speed(couple, pair, overlap);
            double[] seen = impact(subject, pair, speed, Reference.duration(couple, pair, overlap) / STEPS);
            double asked = kernel.duration(speed, couple.effectiveRadius(), Reference.effectiveMass(couple, pair));
            largest = Math.max(largest, Math.max(asked, seen[1]) / seen[0]);
            smallest = Math.min(smallest, Math.min(asked, seen[1]) / seen[0]);
        }
        if (!(largest <= LONGEST)) {
            findings.add(String.format(
                    Locale.ROOT,
                    "The law declares a contact %.3g times as long as an impact really takes: steps would be too long.",
                    largest));
        }
        if (!(smallest >= SHORTEST)) {
            findings.add(String.format(
                    Locale.ROOT,
                    "The law declares a contact of %.2g of the time an impact really takes: runs would be slow for nothing.",
                    smallest));
        }
        measured.append(
                String.format(Locale.ROOT, "Declared over measured contact time %.2f to %.2f. ", smallest, largest));
    }

    /** Measured duration and the longest that was reported during the contact, s. */
    private static double[] impact(Subject subject, MaterialPair pair, double speed, double firstStep) {
        double step = firstStep;
        double[] seen = {Double.NaN, 0};
        // a law much stiffer or softer than a round elastic contact gets a step of its own scale in the second flight
        for (int flight = 0; flight < 2; flight++) {
            double[] deepest = {0, 0, 0};
            try (Flight fly =
                    new Flight(subject.laws(), pair, List.of(new Flight.Shot(Reference.equal(), speed, 0)), step)) {
                fly.run(40 * STEPS, now -> {
                    double overlap = now.overlap(0);
                    if (overlap > deepest[0]) {
                        deepest[0] = overlap;
                        deepest[1] = now.time();
                    }
                    double reported = now.bench().tally().shortestDuration();
                    if (reported < Double.POSITIVE_INFINITY) {
                        deepest[2] = Math.max(deepest[2], reported);
                    }
                });
            }
            seen[0] = 2 * deepest[1];
            seen[1] = deepest[2];
            step = seen[0] / STEPS;
        }
        return seen;
    }

    private static void stiffness(String which, Slopes.Range range, List<String> findings, StringBuilder measured) {
        if (!range.any()) {
            return;
        }
        if (!(range.smallest() >= SOFTEST)) {
            findings.add(String.format(
                    Locale.ROOT,
                    "The %s stiffness declared is %.2g of the slope of the force: steps would be too long.",
                    which,
                    range.smallest()));
        }
        measured.append(String.format(
                Locale.ROOT,
                "Declared over measured %s stiffness %.2f to %.2f. ",
                which,
                range.smallest(),
                range.largest()));
    }
}
