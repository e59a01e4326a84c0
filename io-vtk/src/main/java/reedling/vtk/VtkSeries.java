// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.LineMesh;
import reedling.output.SnapshotWriter;

/**
 * The snapshots of one run: {@code snapshots.pvd} in the run folder, and a folder {@code snapshots} with
 * {@code grains_000000.vtp} and one {@code NAME_000000.vtu} for each structure and time. The index is replaced after
 * the files it names are whole, so it is valid at every moment. Threads: one at a time.
 */
final class VtkSeries implements SnapshotWriter {

    private static final String FILES = "snapshots";
    private static final Pattern NUMBERED = Pattern.compile(".+_(\\d{6,9})\\.vt[pu]");
    private static final int BUFFER_BYTES = 1 << 20;

    private final Path folder;
    private final PvdIndex index;
    private final ByteBuffer buffer = ByteBuffer.allocateDirect(BUFFER_BYTES);
    private int nextNumber;

    private VtkSeries(Path folder, PvdIndex index) {
        this.folder = folder;
        this.index = index;
        nextNumber = index.entries().stream()
                .mapToInt(entry -> number(entry.file()) + 1)
                .max()
                .orElse(0);
    }

    static VtkSeries open(Path folder, double resumeTime) throws IOException {
        Path path = folder.resolve(FILES + ".pvd");
        Files.createDirectories(folder.resolve(FILES));
        if (Double.isNaN(resumeTime)) {
            refuseEarlier(path);
            return new VtkSeries(folder, new PvdIndex(path));
        }
        PvdIndex index = Files.exists(path) ? PvdIndex.read(path) : new PvdIndex(path);
        if (index.drop(time -> time > resumeTime)) {
            index.save();
        }
        VtkSeries series = new VtkSeries(folder, index);
        series.removeUnlisted();
        return series;
    }

    private static void refuseEarlier(Path path) {
        if (Files.exists(path)) {
            throw new ReedlingException(
                    ExitCode.OUTPUT,
                    new Finding(
                            path.toString(),
                            "",
                            "an index of an earlier run",
                            "a free name",
                            "Choose another folder, or resume that run."));
        }
    }

    /** A frame of the same time as the last one replaces it; that happens when a run was stopped between the two. */
    @Override
    public void write(SnapshotFrame frame) throws IOException {
        boolean again = index.entries().stream().anyMatch(entry -> entry.time() == frame.time());
        int number = again ? nextNumber - 1 : nextNumber;
        List<PvdIndex.Entry> written = writeParts(frame, number);
        WholeFile.syncFolder(folder.resolve(FILES));
        index.drop(time -> time == frame.time());
        written.forEach(index::add);
        index.save();
        nextNumber = number + 1;
    }

    private List<PvdIndex.Entry> writeParts(SnapshotFrame frame, int number) throws IOException {
        List<PvdIndex.Entry> written = new ArrayList<>();
        String suffix = "_%06d".formatted(number);
        written.add(writePart(frame, 0, "grains", suffix + ".vtp", VtkLayout.grains(frame)));
        Set<String> names = new HashSet<>(Set.of("grains"));
        for (LineMesh mesh : frame.structures()) {
            int part = written.size();
            String stem = fileStem(mesh.name(), part, names);
            written.add(writePart(frame, part, stem, suffix + ".vtu", VtkLayout.lines(frame, mesh)));
        }
        return written;
    }

    private PvdIndex.Entry writePart(SnapshotFrame frame, int part, String stem, String ending, VtkDocument document)
            throws IOException {
        String file = FILES + "/" + stem + ending;
        WholeFile.write(folder.resolve(file), channel -> document.writeTo(channel, buffer));
        return new PvdIndex.Entry(frame.time(), part, stem, file);
    }

    /** A name that is safe as a file on every system and differs from those taken. */
    private static String fileStem(String name, int part, Set<String> taken) {
        String stem = name.replaceAll("[^A-Za-z0-9-]", "-");
        return taken.add(stem) ? stem : stem + "-part" + part;
    }

    /** Deletes files of dropped frames and those of a frame that was cut short before the index named it. */
    private void removeUnlisted() throws IOException {
        Set<Path> listed = index.entries().stream()
                .map(entry -> folder.resolve(entry.file()))
                .collect(Collectors.toSet());
        WholeFile.removeLeftovers(folder.resolve(FILES));
        try (Stream<Path> files = Files.list(folder.resolve(FILES))) {
            for (Path file : files.toList()) {
                if (NUMBERED.matcher(String.valueOf(file.getFileName())).matches() && !listed.contains(file)) {
                    Files.delete(file);
                }
            }
        }
    }

    private static int number(String file) {
        Matcher matcher = NUMBERED.matcher(file);
        return matcher.matches() ? Integer.parseInt(matcher.group(1)) : -1;
    }
}
