// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import reedling.field.Field;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.particle.RandomStream;

/**
 * The conformance kit for fields: the force is the slope of the potential where there is one, a range of grains is a range,
 * splitting it changes no bit, numbers are finite, nothing is allocated.
 */
public final class FieldTrial {

    private static final int GRAINS = 96;
    private static final double[] TIMES = {0, 0.013, 1.7}; // s
    private static final double NUDGE = 1e-6; // m
    private static final double SLOPE = 1e-4; // central differences of energies that are sums of large numbers
    private static final int CALLS = 20_000;
    private static final int ROUNDS = 20;

    private FieldTrial() {}

    /** Runs every check. */
    public static List<LawTrial.Result> run(Field field) {
        List<LawTrial.Result> results = new ArrayList<>();
        results.add(result("the force is the slope of the potential", field, FieldTrial::slope));
        results.add(result("a range of grains is a range", field, FieldTrial::range));
        results.add(result("finite numbers", field, FieldTrial::finite));
        results.add(result("no allocation", field, FieldTrial::allocation));
        return results;
    }

    private static LawTrial.Result result(String name, Field field, Function<Field, Outcome> check) {
        try {
            return new LawTrial.Result(name, check.apply(field));
        } catch (RuntimeException | LinkageError thrown) {
            return new LawTrial.Result(
                    name, Outcome.of(false, "The field throws " + thrown + ".", "Not measured: the field throws."));
        }
    }

    private static GrainStore grains(double spread) {
        RandomStream random = new RandomStream(7);
        GrainStore grains = new GrainStore();
        for (int g = 0; g < GRAINS; g++) {
            grains.add(
                    random.uniform(-spread, spread),
                    random.uniform(-spread, spread),
                    random.uniform(-spread, spread),
                    random.uniform(0.001, 0.01),
                    1250,
                    0,
                    0);
            grains.velocity(g, random.normal(), random.normal(), random.normal());
        }
        return grains;
    }

    private static Outcome slope(Field field) {
        GrainStore grains = grains(0.5);
        double worst = 0;
        double energies = 0;
        for (double time : TIMES) {
            java.util.Arrays.fill(grains.forces(), 0);
            field.apply(grains, 0, GRAINS, time);
            for (int g = 0; g < GRAINS; g++) {
                double size = 1e-30;
                double apart = 0;
                for (int axis = 0; axis < 3; axis++) {
                    double force = grains.forces()[GrainRow.forceAt(g) + GrainRow.FORCE + axis];
                    double expected = -slope(field, grains, g, axis);
                    size = Math.max(size, Math.max(Math.abs(force), Math.abs(expected)));
                    apart = Math.max(apart, Math.abs(force - expected));
                }
                energies = Math.max(energies, Math.abs(field.potentialEnergy(grains, g, g + 1)));
                worst = apart / size <= worst ? worst : apart / size;
            }
        }
        if (energies == 0) {
            return new Outcome(List.of(), "No potential is declared: the field's work shows in the ledger's residual.");
        }
        return Outcome.of(
                worst <= SLOPE,
                String.format(
                        Locale.ROOT, "The force differs by %.2g from minus the slope of the potential energy.", worst),
                String.format(Locale.ROOT, "%d grains at %d times: %.1e of the force.", GRAINS, TIMES.length, worst));
    }

    private static double slope(Field field, GrainStore grains, int g, int axis) {
        int at = GrainRow.at(g) + GrainRow.X + axis;
        double here = grains.rows()[at];
        grains.rows()[at] = here + NUDGE;
        double above = field.potentialEnergy(grains, g, g + 1);
        grains.rows()[at] = here - NUDGE;
        double below = field.potentialEnergy(grains, g, g + 1);
        grains.rows()[at] = here;
        return (above - below) / (2 * NUDGE);
    }

    private static Outcome range(Field field) {
        GrainStore grains = grains(0.5);
        field.apply(grains, 0, GRAINS, TIMES[1]);
        double[] whole = grains.forces().clone();
        java.util.Arrays.fill(grains.forces(), 0);
        int third = GRAINS / 3;
        field.apply(grains, third, 2 * third, TIMES[1]);
        int strayed = 0;
        for (int k = 0; k < grains.forces().length; k++) {
            boolean inside = k >= GrainRow.forceAt(third) && k < GrainRow.forceAt(2 * third);
            strayed += !inside && grains.forces()[k] != 0 ? 1 : 0;
        }
        field.apply(grains, 0, third, TIMES[1]);
        field.apply(grains, 2 * third, GRAINS, TIMES[1]);
        List<String> findings = new ArrayList<>();
        if (strayed > 0) {
            findings.add("The field wrote " + strayed + " numbers to force rows outside the range it was given.");
        }
        boolean same = java.util.Arrays.equals(whole, grains.forces());
        if (!same) {
            findings.add("Three ranges give other forces than one: a grain's force must depend on that grain alone.");
        }
        return new Outcome(findings, same ? "One range and three: the same bits." : "One range and three differ.");
    }

    private static Outcome finite(Field field) {
        int wrong = 0;
        for (double spread : new double[] {0, 1e-12, 1, 1e4}) {
            for (double time : new double[] {0, 1e-9, 1e5}) {
                GrainStore grains = grains(spread);
                field.apply(grains, 0, GRAINS, time);
                for (double force : grains.forces()) {
                    wrong += Double.isFinite(force) ? 0 : 1;
                }
                wrong += Double.isFinite(field.potentialEnergy(grains, 0, GRAINS)) ? 0 : 1;
            }
        }
        return Outcome.of(
                wrong == 0,
                wrong + " numbers are not finite, with grains at one point, far away, at time 0 or late.",
                "Grains at one point and 10 km apart, early and late: "
                        + (wrong == 0 ? "all finite." : wrong + " are not."));
    }

    private static Outcome allocation(Field field) {
        GrainStore grains = grains(0.5);
        double least = Allocation.leastBytes(() -> field.apply(grains, 0, GRAINS, 0.1), CALLS, ROUNDS);
        return Outcome.of(
                least < 1,
                String.format(Locale.ROOT, "The field allocates %.0f bytes a call.", least),
                String.format(Locale.ROOT, "%.3g bytes a call.", least));
    }
}
