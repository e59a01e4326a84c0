// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/**
 * The checkpoints of one run, {@code checkpoint_000001.rck} and so on. Only the last two good ones are kept; an older
 * one is deleted after the newer one is safely on the disk. Threads: the writer thread only.
 */
public final class CheckpointFolder {

    private static final int KEPT = 2;
    private static final Pattern NAME = Pattern.compile("checkpoint_(\\d{6,9})\\.rck");

    private final Path folder;
    private final Deque<Path> good = new ArrayDeque<>();
    private int lastNumber;

    private CheckpointFolder(Path folder, List<Path> good) throws IOException {
        this.folder = folder;
        this.good.addAll(good);
        lastNumber = numbered(folder).stream()
                .mapToInt(CheckpointFolder::number)
                .max()
                .orElse(0);
    }

    /** For a new run. */
    public static CheckpointFolder create(Path folder) throws IOException {
        return new CheckpointFolder(folder, List.of());
    }

    /**
     * For a run resumed from {@code resumedFrom}, which counts as the last good one: damaged files of higher number are
     * left where they are, but never counted among those kept.
     */
    public static CheckpointFolder resume(Path folder, Path resumedFrom) throws IOException {
        List<Path> kept = numbered(folder).stream()
                .filter(file -> number(file) <= number(resumedFrom))
                .toList()
                .reversed();
        return new CheckpointFolder(folder, kept);
    }

    /** Writes the next checkpoint as a whole file and returns its path. */
    public Path write(CheckpointWriter checkpoint) throws IOException {
        Path file = folder.resolve("checkpoint_%06d.rck".formatted(lastNumber + 1));
        WholeFile.write(file, checkpoint::writeTo);
        WholeFile.syncFolder(folder);
        lastNumber++;
        good.addLast(file);
        while (good.size() > KEPT) {
            Files.deleteIfExists(good.removeFirst());
        }
        return file;
    }

    /**
     * The newest usable checkpoint of a folder and what was wrong with those passed over.
     *
     * @param reader open; the caller closes it
     * @param passedOver one finding for each newer file that could not be used; tell the user
     */
    public record Latest(CheckpointReader reader, List<Finding> passedOver) {}

    /**
     * Opens the newest usable checkpoint; a file being written is never seen, since it bears another name.
     *
     * @throws ReedlingException with every finding if no checkpoint can be used
     */
    public static Latest latest(Path folder) throws IOException {
        List<Finding> passedOver = new ArrayList<>();
        for (Path file : numbered(folder)) {
            try {
                return new Latest(CheckpointReader.open(file), List.copyOf(passedOver));
            } catch (ReedlingException unusable) {
                passedOver.addAll(unusable.findings());
            }
        }
        if (passedOver.isEmpty()) {
            throw CheckpointFault.NONE_FOUND.in(folder, "", "without a checkpoint");
        }
        throw new ReedlingException(ExitCode.CHECKPOINT, passedOver);
    }

    private static List<Path> numbered(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(
                            file -> NAME.matcher(file.getFileName().toString()).matches())
                    .sorted(Comparator.comparingInt(CheckpointFolder::number).reversed())
                    .toList();
        }
    }

    private static int number(Path file) {
        Matcher matcher = NAME.matcher(String.valueOf(file.getFileName()));
        return matcher.matches() ? Integer.parseInt(matcher.group(1)) : 0;
    }
}
