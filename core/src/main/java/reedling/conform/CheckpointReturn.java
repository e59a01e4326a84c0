// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import reedling.material.MaterialPair;

/** A checkpoint in mid-contact, read into laws bound anew, goes on with the same bits: nothing is remembered elsewhere. */
final class CheckpointReturn implements Check {

    private static final int COUPLES = 40;
    private static final int STEPS = 400;
    private static final int SAVED_AT = 170;

    @Override
    public String name() {
        return "checkpoint and back";
    }

    @Override
    public Outcome run(Subject subject) {
        try {
            Path folder = Files.createTempDirectory("reedling-conform");
            try {
                return run(subject, folder);
            } finally {
                delete(folder);
            }
        } catch (IOException failure) {
            throw new UncheckedIOException(
                    "a checkpoint could not be written to the folder for temporary files", failure);
        }
    }

    private static Outcome run(Subject subject, Path folder) throws IOException {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        double step = cycles.duration() / STEPS;
        List<double[]> straight = new ArrayList<>();
        List<double[]> resumed = new ArrayList<>();
        try (PairBench bench = new PairBench(subject.laws(), pair, cycles.couples(), Reference.RADIUS)) {
            Drive drive = new Drive(bench, cycles.motions(), step);
            drive.run(0, SAVED_AT, (k, at) -> {});
            bench.save(folder);
            drive.run(SAVED_AT + 1, STEPS, (k, at) -> straight.add(loads(at)));
        }
        try (PairBench bench = new PairBench(subject.laws(), pair, cycles.couples(), Reference.RADIUS)) {
            bench.restore(folder);
            new Drive(bench, cycles.motions(), step).run(SAVED_AT + 1, STEPS, (k, at) -> resumed.add(loads(at)));
        }
        int differing = 0;
        for (int p = 0; p < COUPLES; p++) {
            differing += RowIndependence.sameBits(new Recording(straight, 0), p, new Recording(resumed, 0), p) ? 0 : 1;
        }
        return Outcome.of(
                differing == 0,
                differing + " of " + COUPLES + " contacts have other forces after a checkpoint was read back:"
                        + " the law remembers something that is not in its history columns.",
                COUPLES + " contacts saved and read back in mid-motion: "
                        + (differing == 0 ? "the same bits." : differing + " differ."));
    }

    private static double[] loads(Drive drive) {
        double[] all = new double[COUPLES * PairMotion.LENGTH];
        for (int k = 0; k < all.length; k++) {
            all[k] = drive.load(k / PairMotion.LENGTH, k % PairMotion.LENGTH);
        }
        return all;
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(path);
            }
        }
    }
}
