// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotWriter;

/**
 * Writes a made-up run into a new folder for the checks with VTK's own reader, and says how long frames take:
 * arguments FOLDER, frames, grains, wires, elements of each wire.
 */
final class SyntheticRun {

    private SyntheticRun() {}

    public static void main(String[] arguments) throws IOException {
        Path folder = Files.createDirectories(Path.of(arguments[0]));
        int[] sizes = new int[4];
        for (int i = 0; i < sizes.length; i++) {
            sizes[i] = Integer.parseInt(arguments[i + 1]);
        }
        SnapshotWriter writer = new VtkProvider().open(folder, Double.NaN);
        double[] milliseconds = new double[sizes[0]];
        for (int frame = 0; frame < sizes[0]; frame++) {
            SnapshotFrame content = SyntheticDeck.frame(0.01 * frame, 1000L * frame, sizes[1], sizes[2], sizes[3]);
            long start = System.nanoTime();
            writer.write(content);
            milliseconds[frame] = 1e-6 * (System.nanoTime() - start);
        }
        java.util.Arrays.sort(milliseconds);
        System.out.printf(
                "frames %d, milliseconds each: median %.2f, largest %.2f%n",
                sizes[0], milliseconds[sizes[0] / 2], milliseconds[sizes[0] - 1]);
    }
}
