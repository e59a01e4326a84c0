// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/** Force against motion, there and back: an impact, a slide, a roll and a twist of two equal pellets. */
final class Loops {

    private static final double MICROMETRES = 1e6;
    private static final double MILLIRADIANS = 1e3;
    private static final int STEPS = 1200;
    private static final double WAVES = 1.5;

    private Loops() {}

    /** Normal force against overlap in a head-on impact. */
    static Chart impact(Map<Stage, ContactLaw> laws) {
        List<Series> series = new ArrayList<>();
        series.add(impact(laws, 1));
        series.add(impact(laws, 0.7));
        Couple couple = Reference.equal();
        return new Chart(
                "Force and overlap in an impact",
                String.format(
                        java.util.Locale.ROOT,
                        "Head-on impact of two equal pellets at %.2f m/s.",
                        Reference.speed(couple, Reference.lossy(), Reference.DEPTH * couple.effectiveRadius())),
                "overlap, µm",
                "normal force, N",
                false,
                series);
    }

    private static Series impact(Map<Stage, ContactLaw> laws, double restitution) {
        MaterialPair pair = Reference.pair(restitution, 0, 0);
        Couple couple = Reference.equal();
        double overlap = Reference.DEPTH * couple.effectiveRadius();
        List<double[]> points = new ArrayList<>();
        Flight.Shot shot = new Flight.Shot(couple, Reference.speed(couple, pair, overlap), 0);
        double step = Reference.duration(couple, pair, overlap) / 300;
        try (Flight flight = new Flight(laws, pair, List.of(shot), step)) {
            flight.run(6000, now -> {
                double force = -now.bench().force(0, 0);
                if (now.overlap(0) >= 0 || force != 0) {
                    points.add(new double[] {MICROMETRES * now.overlap(0), force});
                }
            });
        }
        return series("pair with restitution " + restitution, points);
    }

    /** Friction, rolling moment and twisting moment against their motion at a constant overlap, where there are any. */
    static List<Chart> turning(Map<Stage, ContactLaw> laws) {
        List<Chart> charts = new ArrayList<>();
        double reach = 3 * Reference.DEPTH * Reference.equal().effectiveRadius();
        loop(laws, reach, Loops::slide, 1)
                .ifPresent(line -> charts.add(chart(
                        "Friction and slide", "slide, µm", "friction on the first, N", scaled(line, MICROMETRES))));
        double angle = reach / Reference.RADIUS;
        loop(laws, 4 * angle, Loops::roll, 8)
                .ifPresent(line -> charts.add(chart(
                        "Rolling moment and angle",
                        "angle of each body, mrad",
                        "moment on the first, N m",
                        scaled(line, MILLIRADIANS))));
        loop(laws, 4 * angle, Loops::twist, 6)
                .ifPresent(line -> charts.add(chart(
                        "Twisting moment and angle",
                        "angle of each body, mrad",
                        "moment on the first, N m",
                        scaled(line, MILLIRADIANS))));
        return charts;
    }

    private static Chart chart(String title, String x, String y, Series series) {
        return new Chart(
                title,
                "Two equal pellets, held at a constant overlap of 1 % of R*, moved to and fro.",
                x,
                y,
                false,
                List.of(series));
    }

    /** A pose for a displacement of the first body against the second. */
    private interface Shape {
        void pose(double distance, double moved, double[] pose);
    }

    private static void slide(double distance, double moved, double[] pose) {
        pose[3] = Math.sqrt(distance * distance - moved * moved);
        pose[1] = moved;
    }

    /** Both turn about z against each other; equal spheres then roll without sliding. */
    private static void roll(double distance, double moved, double[] pose) {
        pose[3] = distance;
        pose[PairMotion.ANGLES + 2] = moved;
        pose[PairMotion.ANGLES + 5] = -moved;
    }

    private static void twist(double distance, double moved, double[] pose) {
        pose[3] = distance;
        pose[PairMotion.ANGLES] = moved;
        pose[PairMotion.ANGLES + 3] = -moved;
    }

    private static Optional<Series> loop(Map<Stage, ContactLaw> laws, double amplitude, Shape shape, int load) {
        MaterialPair pair = Reference.lossy();
        Couple couple = Reference.equal();
        double overlap = Reference.DEPTH * couple.effectiveRadius();
        double distance = couple.firstRadius() + couple.secondRadius() - overlap;
        double duration = 20 * Reference.duration(couple, pair, overlap);
        PairMotion motion = (time, pose) -> {
            java.util.Arrays.fill(pose, 0);
            shape.pose(distance, amplitude * Math.sin(2 * Math.PI * WAVES * time / duration), pose);
        };
        List<double[]> points = new ArrayList<>();
        try (PairBench bench = new PairBench(laws, pair, List.of(couple), PairBench.ONE_CELL)) {
            new Drive(bench, List.of(motion), duration / STEPS)
                    .run(
                            0,
                            STEPS,
                            (step, drive) -> points.add(new double[] {
                                amplitude * Math.sin(2 * Math.PI * WAVES * step / STEPS), drive.load(0, load)
                            }));
        }
        Series line = series("restitution 0.7, friction 0.4, rolling friction 0.1", points);
        double firm = pair.contactModulus() * overlap * overlap; // N, far below any friction worth drawing
        double least = load == 1 ? 1e-3 * firm : 1e-3 * firm * overlap;
        return line.largest() > least ? Optional.of(line) : Optional.empty();
    }

    private static Series scaled(Series line, double factor) {
        double[] x = line.x().clone();
        for (int k = 0; k < x.length; k++) {
            x[k] *= factor;
        }
        return new Series(line.name(), x, line.y(), line.points());
    }

    static Series series(String name, List<double[]> points) {
        double[] x = points.stream().mapToDouble(point -> point[0]).toArray();
        double[] y = points.stream().mapToDouble(point -> point[1]).toArray();
        return new Series(name, x, y, false);
    }
}
