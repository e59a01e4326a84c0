// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.particle.GrainStore;
import reedling.particle.RandomStream;
import reedling.wall.Oscillating;
import reedling.wall.Stroke;
import reedling.wall.Timing;

class WaveProbeTest {

    private static final double FREQUENCY = 25;
    private static final double WIDTH = 0.12;
    private static final double RADIUS = 0.001;

    private static WavePlan plan(double amplitude) {
        WavePlan.Area area = new WavePlan.Area(-0.5 * WIDTH, 0, WIDTH, 0.02, 30, 5);
        Oscillating motion =
                Oscillating.harmonic(new Stroke(new Vector3d(0, 0, 1), amplitude, 0.3), FREQUENCY, Timing.always());
        return new WavePlan("waves", area, FREQUENCY, motion, 8, 3);
    }

    /**
     * Grains that slosh along x by s cos(2 pi f/2 t) sin(k (x - x0)), x their place at rest: to first order in k s their
     * depth is h (1 - k s cos(...) cos(k (x - x0))).
     */
    private static GrainStore sloshing(double time, double part, double k, double slosh) {
        GrainStore grains = new GrainStore();
        for (int column = 0; column < 1200; column++) {
            for (int row = 0; row < 20; row++) {
                double rest = WIDTH * (column + 0.5) / 1200;
                double shift = slosh * Math.cos(2 * Math.PI * part * FREQUENCY * time) * Math.sin(k * rest);
                grains.add(rest + shift - 0.5 * WIDTH, 0.001 * row + 0.0005, 0.01, RADIUS, 1000, 0, 0);
            }
        }
        return grains;
    }

    private static Map<String, Double> after(BulkProbe probe, int first, int last, Slosh slosh) {
        GrainStore grains = new GrainStore();
        for (int sample = first; sample < last; sample++) {
            double time = sample * probe.every() * (1 + 1e-15);
            grains = slosh.at(time);
            probe.sample(time, grains);
        }
        return probe.readings(grains).stream().collect(Collectors.toMap(Reading::key, Reading::value));
    }

    private interface Slosh {
        GrainStore at(double time);
    }

    @Test
    void standingWaveShowsItsLengthAndHeight() {
        double k = 6 * Math.PI / WIDTH;
        BulkProbe probe = plan(0.001).open();
        Map<String, Double> found = after(probe, 0, 128, time -> sloshing(time, 0.5, k, 2e-3));
        assertThat(found.get("dominant_wavelength_m")).isEqualTo(0.04, within(1e-4));
        double depth = 24_000 * 4 * Math.PI / 3 * 1e-9 / (WIDTH * 0.02);
        // mean over the area and over the time of h^2 (k s)^2 cos^2 cos^2; cells of a tenth of a wave blunt it by 1.6 %
        assertThat(found.get("rms_wave_at_half_frequency_m"))
                .isEqualTo(0.5 * depth * k * 2e-3, within(0.03 * depth * k * 2e-3));
        assertThat(found.get("rms_background_m")).isLessThan(0.02 * found.get("rms_wave_at_half_frequency_m"));
    }

    @Test
    void motionAtTheFrequencyOfTheDriveIsNoWave() {
        BulkProbe probe = plan(0.001).open();
        Map<String, Double> found = after(probe, 0, 128, time -> sloshing(time, 1, 6 * Math.PI / WIDTH, 2e-3));
        double depth = 24_000 * 4 * Math.PI / 3 * 1e-9 / (WIDTH * 0.02);
        assertThat(found.get("rms_wave_at_half_frequency_m")).isLessThan(0.01 * depth);
    }

    private static GrainStore scattered(RandomStream random) {
        GrainStore grains = new GrainStore();
        for (int g = 0; g < 2000; g++) {
            double x = random.uniform(-0.5 * WIDTH, 0.5 * WIDTH);
            grains.add(x, random.uniform(0, 0.02), 0.01, RADIUS, 1000, 0, 0);
        }
        return grains;
    }

    /** Grains that move at random show at both frequencies alike. */
    @Test
    void randomMotionIsBackground() {
        RandomStream random = new RandomStream(8);
        Map<String, Double> found = after(plan(0.001).open(), 0, 128, time -> scattered(random));
        // the strongest of some thirty rings stands out a little
        assertThat(found.get("wave_over_background")).isBetween(0.5, 2.5);
        assertThat(found.get("floor_acceleration_at_onset_g")).isNaN();
    }

    /** 1 mm at 25 Hz: (2 pi 25)^2 0.001 / 9.80665 = 2.516 g. */
    @Test
    void accelerationOfTheFloorIsThatOfItsVibration() {
        Map<String, Double> found = after(plan(0.001).open(), 0, 128, time -> sloshing(time, 0.5, 150, 0));
        assertThat(found.get("peak_floor_acceleration_g")).isEqualTo(2.51606, within(1e-4));
    }

    @Test
    void onsetNeedsTwoWindowsInARow() {
        BulkProbe probe = plan(0.001).open();
        double k = 6 * Math.PI / WIDTH;
        RandomStream random = new RandomStream(8);
        Slosh waves = time -> {
            int window = (int) (time * FREQUENCY / 8 + 1e-9);
            return window == 1 || window >= 3 ? sloshing(time, 0.5, k, 2e-3) : scattered(random);
        };
        assertThat(after(probe, 0, 384, waves).get("floor_acceleration_at_onset_g"))
                .isNaN();
        assertThat(after(probe, 384, 640, waves).get("floor_acceleration_at_onset_g"))
                .isEqualTo(2.51606, within(1e-4));
    }

    @Test
    void windowCutShortIsNotCounted() {
        assertThat(after(plan(0.001).open(), 5, 140, time -> sloshing(time, 0.5, 150, 2e-3))
                        .get("dominant_wavelength_m"))
                .isNaN();
    }

    @Test
    void resumedProbeGoesOn(@TempDir Path folder) throws IOException {
        Slosh waves = time -> sloshing(time, 0.5, 6 * Math.PI / WIDTH, 2e-3);
        BulkProbe whole = plan(0.001).open();
        after(whole, 0, 200, waves);
        BulkProbe resumed = plan(0.001).open();
        CheckpointWriter checkpoint = new CheckpointWriter(new CheckpointHeader("test", "", 0, 0, Map.of()));
        checkpoint.save(whole);
        try (CheckpointReader reader =
                CheckpointReader.open(CheckpointFolder.create(folder).write(checkpoint))) {
            reader.restore(resumed);
        }
        GrainStore last = waves.at(0);
        assertThat(resumed.closingTable(last)).isEqualTo(whole.closingTable(last));
        assertThat(after(resumed, 200, 256, waves)).isEqualTo(after(whole, 200, 256, waves));
        assertThat(List.of(resumed.name(), resumed.section())).containsExactly("waves", "probe waves");
    }
}
