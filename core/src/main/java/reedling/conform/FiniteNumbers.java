// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;

/**
 * Extreme but legal contacts give finite forces and positive times: dust on a boulder, a bare touch and a deep one, at rest
 * and at the speed of sound, soft as jelly and hard as diamond, without damping and with all of it.
 */
final class FiniteNumbers implements Check {

    private static final double[] RADII = {1e-6, 1e-3, 1};
    private static final double[] OVERLAPS = {-1e-3, -1e-15, 0, 1e-15, 1e-6, 1e-2, 0.45}; // over R*
    private static final double[] SPEEDS = {0, 1e-12, 1, 300}; // m/s
    private static final double[] SPINS = {0, 1, 1e5}; // rad/s
    private static final double[] STEPS = {0, 1e-12, 1e-6, 1e-3}; // s

    private static final List<Material> MATERIALS = List.of(
            new Material("jelly", 1000, 1e4, 0.49),
            new Material("diamond", 3500, 1.2e12, 0),
            Reference.lossy().first());

    private static final List<double[]> NUMBERS =
            List.of(new double[] {1, 0, 0}, new double[] {0.05, 1.5, 1}, new double[] {0.5, 0.3, 0.01});

    private record Extreme(Couple couple, double overlap, double speed, double spin) {}

    @Override
    public String name() {
        return "finite numbers";
    }

    @Override
    public Outcome run(Subject subject) {
        List<String> findings = new ArrayList<>();
        List<Extreme> extremes = extremes();
        int tried = 0;
        WrittenNumbers written = new WrittenNumbers();
        Map<Stage, ContactLaw> laws = LawTap.at(subject.stage(), subject.laws(), written);
        for (Material material : MATERIALS) {
            for (double[] numbers : NUMBERS) {
                MaterialPair pair = Reference.pair(material, numbers[0], numbers[1], numbers[2]);
                for (int from = 0; from < extremes.size(); from += PairBench.MOST_COUPLES) {
                    int to = Math.min(extremes.size(), from + PairBench.MOST_COUPLES);
                    tried += tryOut(laws, pair, extremes.subList(from, to), findings);
                }
                durations(subject.law(), pair, findings);
            }
        }
        written.faults()
                .forEach((where, times) -> findings.addFirst("The law wrote something that is not a finite number to "
                        + where + " of the block, " + times + " times."));
        int found = findings.size();
        if (found > 3) {
            findings.subList(3, found).clear();
            findings.add("... and " + (found - 3) + " more.");
        }
        return new Outcome(
                findings, tried + " extreme contacts: " + (found == 0 ? "all finite." : found + " are not."));
    }

    private static List<Extreme> extremes() {
        List<Extreme> all = new ArrayList<>();
        for (double first : RADII) {
            for (double second : RADII) {
                for (double overlap : OVERLAPS) {
                    for (int k = 0; k < SPEEDS.length; k++) {
                        double speed = all.size() % 2 == 0 ? SPEEDS[k] : -SPEEDS[k];
                        all.add(new Extreme(
                                new Couple(first, second), overlap, speed, SPINS[all.size() % SPINS.length]));
                    }
                }
            }
        }
        return all;
    }

    private static int tryOut(
            Map<Stage, ContactLaw> laws, MaterialPair pair, List<Extreme> extremes, List<String> findings) {
        List<Couple> couples = extremes.stream().map(Extreme::couple).toList();
        try (PairBench bench = new PairBench(laws, pair, couples, PairBench.ONE_CELL)) {
            for (double step : STEPS) {
                for (int p = 0; p < extremes.size(); p++) {
                    place(bench, p, extremes.get(p));
                }
                bench.evaluate(step, step == 0);
                for (int p = 0; p < extremes.size(); p++) {
                    if (!finite(bench, 2 * p) || !finite(bench, 2 * p + 1)) {
                        findings.add("A force is not a finite number at " + text(extremes.get(p), pair, step));
                    }
                }
                if (!(bench.tally().shortestDuration() > 0)) {
                    findings.add("The contact duration reported in a block is "
                            + bench.tally().shortestDuration() + " s ("
                            + pair.first().name() + ").");
                }
            }
        }
        return extremes.size() * STEPS.length;
    }

    private static void place(PairBench bench, int p, Extreme extreme) {
        Couple couple = extreme.couple();
        double distance = couple.firstRadius() + couple.secondRadius() - extreme.overlap() * couple.effectiveRadius();
        double[] centres = {0, 0, 0, 0.6 * distance, 0, 0.8 * distance};
        double[] velocities = {extreme.speed(), 0.3 * extreme.speed(), 0, 0, 0, 0};
        double[] spins = {0, extreme.spin(), 0, extreme.spin(), 0, 0.5 * extreme.spin()};
        bench.place(2 * p, centres, velocities, spins, 0);
        bench.place(2 * p + 1, centres, velocities, spins, 3);
    }

    private static boolean finite(PairBench bench, int body) {
        boolean finite = Double.isFinite(bench.normalStiffness(body)) && Double.isFinite(bench.slidingStiffness(body));
        for (int axis = 0; axis < 3; axis++) {
            finite &= Double.isFinite(bench.force(body, axis)) && Double.isFinite(bench.torque(body, axis));
        }
        return finite;
    }

    private static void durations(ContactLaw law, MaterialPair pair, List<String> findings) {
        int column = 1; // any: the kernel is asked for a time only
        for (ContactKind kind : ContactKind.values()) {
            ContactKernel kernel = law.bind(pair, kind, column);
            for (double speed : new double[] {1e-9, 1, 300}) {
                for (double radius : RADII) {
                    double mass = pair.first().density() * radius * radius * radius;
                    double duration = kernel.duration(speed, radius, mass);
                    if (!(duration > 0)) {
                        findings.add(String.format(
                                Locale.ROOT,
                                "duration(%g m/s, %g m, %g kg) is %g s, expected a positive time.",
                                speed,
                                radius,
                                mass,
                                duration));
                    }
                }
            }
        }
    }

    private static String text(Extreme extreme, MaterialPair pair, double step) {
        return String.format(
                Locale.ROOT,
                "radii %g and %g m, overlap %g of the effective radius, %g m/s, %g rad/s, step %g s (%s, restitution %g).",
                extreme.couple().firstRadius(),
                extreme.couple().secondRadius(),
                extreme.overlap(),
                extreme.speed(),
                extreme.spin(),
                step,
                pair.first().name(),
                pair.restitution());
    }
}
