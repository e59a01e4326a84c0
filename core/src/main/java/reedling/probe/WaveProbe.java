// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.particle.GrainStore;
import reedling.wall.Pose;

/**
 * Waves of half the drive's frequency on a shaken layer.
 *
 * <p>Formula: the map is the solid depth, volume of the grains over a cell per area of the cell (m). Sixteen times in a
 * period of the drive it is multiplied with exp(-2 pi i f t/2) and summed over a window of whole periods; twice the mean is
 * its complex amplitude, {@link WaveSpectrum} its waves: those of the strongest wavelength are reported. The background is
 * the same at 5/8 of the drive's frequency and this wavelength; neither the drive nor patterns of two or four periods have
 * a part there, while a grain that moves at random shows in both alike. The
 * peak acceleration of the floor is (2 pi f)^2 times the amplitude of its vertical motion at f in the same window.
 * <p>Onset is the peak acceleration of the first of two windows in a row whose waves exceed the background by a ratio; only
 * above 1 g, below which the layer never leaves the floor.
 * <p>Source: Fourier analysis at the frequencies named; waves at half the frequency: F. Melo, P. Umbanhowar and H. L.
 * Swinney, Transition to parametric wave patterns in a vertically oscillated granular layer, 1994. Threads: one.
 */
final class WaveProbe implements BulkProbe {

    private static final double STANDARD_GRAVITY = 9.80665;

    /** Frequencies over that of the drive, by number of the sums. */
    private static final double[] PARTS = {0.5, 0.625};

    private static final int SCALARS = 9;

    private final WavePlan plan;
    private final double[] depth;
    /** Cosine and sine sums of each cell, for each frequency. */
    private final double[][] cosine;

    private final double[][] sine;
    private double floorCosine;
    private double floorSine;
    private long count;
    private double acceleration = Double.NaN;
    private double amplitude = Double.NaN;
    private double background = Double.NaN;
    private double wavelength = Double.NaN;
    private double candidate = Double.NaN;
    private double onset = Double.NaN;
    private final double[] lastCosine;
    private final double[] lastSine;
    private final Pose pose = new Pose();

    WaveProbe(WavePlan plan) {
        this.plan = plan;
        int cells = plan.area().columns() * plan.area().rows();
        depth = new double[cells];
        cosine = new double[PARTS.length][cells];
        sine = new double[PARTS.length][cells];
        lastCosine = new double[cells];
        lastSine = new double[cells];
    }

    @Override
    public String name() {
        return plan.name();
    }

    @Override
    public double every() {
        return 1 / (plan.frequency() * WavePlan.SAMPLES);
    }

    @Override
    public void sample(double time, GrainStore grains) {
        int window = plan.periods() * WavePlan.SAMPLES;
        // a due time is k times the interval to a rounding, and the step that reaches it ends at or a little after it
        long number = (long) Math.floor(time / every() + 1e-6);
        if (number % window == 0) {
            clear();
        }
        map(grains);
        double periods = plan.frequency() * time;
        for (int part = 0; part < PARTS.length; part++) {
            double angle = 2 * Math.PI * PARTS[part] * periods;
            add(StrictMath.cos(angle), depth, cosine[part]);
            add(StrictMath.sin(angle), depth, sine[part]);
        }
        plan.motion().pose(time, pose);
        floorCosine += pose.shiftZ * StrictMath.cos(2 * Math.PI * periods);
        floorSine += pose.shiftZ * StrictMath.sin(2 * Math.PI * periods);
        count++;
        if (number % window == window - 1 && count == window) {
            close();
        }
    }

    private static void add(double factor, double[] map, double[] sum) {
        for (int cell = 0; cell < map.length; cell++) {
            sum[cell] += factor * map[cell];
        }
    }

    private void map(GrainStore grains) {
        Arrays.fill(depth, 0);
        for (int g = 0; g < grains.count(); g++) {
            int cell = plan.area().cell(grains.position(g, 0), grains.position(g, 1));
            if (cell >= 0) {
                double radius = grains.radius(g);
                depth[cell] +=
                        4 * Math.PI / 3 * radius * radius * radius / plan.area().cellArea();
            }
        }
    }

    private void clear() {
        for (int part = 0; part < PARTS.length; part++) {
            Arrays.fill(cosine[part], 0);
            Arrays.fill(sine[part], 0);
        }
        floorCosine = 0;
        floorSine = 0;
        count = 0;
    }

    private void close() {
        double turn = 2 * Math.PI * plan.frequency();
        acceleration = turn * turn * 2 / count * Math.hypot(floorCosine, floorSine) / STANDARD_GRAVITY;
        System.arraycopy(cosine[0], 0, lastCosine, 0, lastCosine.length);
        System.arraycopy(sine[0], 0, lastSine, 0, lastSine.length);
        scale(lastCosine);
        scale(lastSine);
        scale(cosine[1]);
        scale(sine[1]);
        WaveSpectrum waves = lastSpectrum();
        int strongest = waves.strongest();
        amplitude = waves.amplitude(strongest);
        wavelength = waves.wavelength(strongest);
        background = new WaveSpectrum(plan.area(), cosine[1], sine[1]).amplitude(strongest);
        boolean high = acceleration > 1 && amplitude > plan.onsetRatio() * background;
        if (high && Double.isNaN(onset)) {
            onset = candidate;
        }
        candidate = high ? Double.isNaN(candidate) ? acceleration : candidate : Double.NaN;
    }

    private void scale(double[] sum) {
        for (int cell = 0; cell < sum.length; cell++) {
            sum[cell] *= 2.0 / count;
        }
    }

    private WaveSpectrum lastSpectrum() {
        return new WaveSpectrum(plan.area(), lastCosine, lastSine);
    }

    @Override
    public List<Reading> readings(GrainStore grains) {
        return List.of(
                new Reading("peak floor acceleration", "g", acceleration),
                new Reading("rms wave at half frequency", "m", amplitude),
                new Reading("rms background", "m", background),
                new Reading("wave over background", "", amplitude / background),
                new Reading("dominant wavelength", "m", wavelength),
                new Reading("floor acceleration at onset", "g", onset));
    }

    @Override
    public List<String> closingTable(GrainStore grains) {
        WaveSpectrum spectrum = lastSpectrum();
        List<String> rows = new ArrayList<>();
        rows.add("wave number [rad/m],wavelength [m],mean square at half frequency in the last window [m2]");
        for (int ring = 1; ring < spectrum.rings(); ring++) {
            rows.add(spectrum.waveNumber(ring) + "," + 2 * Math.PI / spectrum.waveNumber(ring) + ","
                    + spectrum.meanSquare(ring));
        }
        return rows;
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        for (int part = 0; part < PARTS.length; part++) {
            out.writeDoubles(cosine[part], 0, depth.length);
            out.writeDoubles(sine[part], 0, depth.length);
        }
        out.writeDoubles(lastCosine, 0, depth.length);
        out.writeDoubles(lastSine, 0, depth.length);
        double[] scalars = {
            floorCosine, floorSine, count, acceleration, amplitude, background, wavelength, candidate, onset
        };
        out.writeDoubles(scalars, 0, SCALARS);
    }

    @Override
    public void restore(SectionReader in) {
        for (int part = 0; part < PARTS.length; part++) {
            in.readDoubles(cosine[part], 0, depth.length);
            in.readDoubles(sine[part], 0, depth.length);
        }
        in.readDoubles(lastCosine, 0, depth.length);
        in.readDoubles(lastSine, 0, depth.length);
        double[] scalars = new double[SCALARS];
        in.readDoubles(scalars, 0, SCALARS);
        floorCosine = scalars[0];
        floorSine = scalars[1];
        count = (long) scalars[2];
        acceleration = scalars[3];
        amplitude = scalars[4];
        background = scalars[5];
        wavelength = scalars[6];
        candidate = scalars[7];
        onset = scalars[8];
    }
}
