// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;

/** What is left of the speed after impacts of two equal pellets. */
final class Impacts {

    private static final double SLOWEST = 0.01; // m/s
    private static final double FASTEST = 10; // m/s
    private static final int SPEEDS = 13;
    private static final int STEPS = 300;
    private static final int MOST_STEPS = 12_000;
    private static final double FRICTION = 0.3;

    /** Stiff, so that the normal hardly turns while the bodies touch, as the theory takes it. */
    private static final Material ALLOY = new Material("alloy", 2700, 7e10, 0.3);

    private static final double OBLIQUE_SPEED = 0.2; // m/s
    private static final int OBLIQUE_STEPS = 2000;

    private Impacts() {}

    /** Normal restitution against speed, with what the pair asks for. */
    static Chart restitution(Map<Stage, ContactLaw> laws) {
        MaterialPair pair = Reference.lossy();
        Couple couple = Reference.equal();
        List<Flight.Shot> shots = new ArrayList<>();
        double[] speeds = new double[SPEEDS];
        for (int k = 0; k < SPEEDS; k++) {
            speeds[k] = SLOWEST * Math.pow(FASTEST / SLOWEST, k / (SPEEDS - 1.0));
            shots.add(new Flight.Shot(couple, speeds[k], 0));
        }
        double[] restitution = new double[SPEEDS];
        double[] after = new double[SPEEDS];
        // the fastest impact is the shortest; its depth follows from its energy as (v / v1)^(4/5)
        double depth = Reference.DEPTH * couple.effectiveRadius();
        double deepest = depth * Math.pow(FASTEST / Reference.speed(couple, pair, depth), 0.8);
        try (Flight flight = new Flight(laws, pair, shots, Reference.duration(couple, pair, deepest) / STEPS)) {
            flight.run(MOST_STEPS, now -> {});
            for (int k = 0; k < SPEEDS; k++) {
                after[k] = -flight.closing(k);
                restitution[k] = after[k] / speeds[k];
            }
        }
        double[] asked = new double[SPEEDS];
        java.util.Arrays.fill(asked, pair.restitution());
        return new Chart(
                "Restitution and speed",
                "Head-on impacts of two equal pellets whose pair asks for a restitution of " + pair.restitution() + ".",
                "closing speed, m/s",
                "restitution (no unit)",
                true,
                List.of(
                        new Series("asked of the pair", speeds, asked, false),
                        new Series("this law", speeds, restitution, true)));
    }

    /** Contact point's speed after an oblique impact against before, beside the published curve. */
    static Chart oblique(Map<Stage, ContactLaw> laws) {
        Series published = published();
        MaterialPair pair = Reference.pair(ALLOY, 1, FRICTION, 0);
        double poisson = pair.first().poissonRatio();
        double kappa = 2 * (1 - poisson) / (2 - poisson);
        Couple couple = Reference.equal();
        double unit = FRICTION * OBLIQUE_SPEED / kappa;
        List<Flight.Shot> shots = new ArrayList<>();
        for (double psi : published.x()) {
            shots.add(new Flight.Shot(couple, OBLIQUE_SPEED, psi * unit));
        }
        double depth = Reference.DEPTH * couple.effectiveRadius();
        double deepest = depth * Math.pow(OBLIQUE_SPEED / Reference.speed(couple, pair, depth), 0.8);
        double[] after = new double[published.x().length];
        double step = Reference.duration(couple, pair, deepest) / OBLIQUE_STEPS;
        try (Flight flight = new Flight(laws, pair, shots, step)) {
            flight.run(10 * OBLIQUE_STEPS, now -> {});
            for (int p = 0; p < after.length; p++) {
                after[p] = flight.sliding(p) / unit;
            }
        }
        return new Chart(
                "Oblique impact",
                "Equal elastic spheres, Poisson ratio 0.3, no spin before. ψ is the speed of the contact point along the"
                        + " surface, times κ / (µ v) with κ = 2 (1 - ν) / (2 - ν) and v the closing speed. Published: Maw,"
                        + " Barber and Fawcett, The oblique impact of elastic spheres, 1976, with partial slip; values"
                        + " computed with the one-dimensional foundation of Popov and Hess.",
                "ψ before (no unit)",
                "ψ after (no unit)",
                false,
                List.of(published, new Series("this law", published.x(), after, true)));
    }

    private static Series published() {
        List<double[]> points = new ArrayList<>();
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(Impacts.class.getResourceAsStream("oblique-impact.csv")),
                StandardCharsets.UTF_8))) {
            lines.lines().filter(line -> Character.isDigit(line.charAt(0))).forEach(line -> {
                String[] numbers = line.split(",");
                points.add(new double[] {Double.parseDouble(numbers[0]), Double.parseDouble(numbers[1])});
            });
        } catch (IOException failure) {
            throw new UncheckedIOException("the published curve could not be read from the program's jar", failure);
        }
        return Loops.series("published, with partial slip", points);
    }
}
