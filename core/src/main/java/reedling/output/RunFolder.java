// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/**
 * The folder of one run, held by one process at a time. {@code run.log} marks a folder as holding a run.
 * Threads: {@link #log} from any thread, the rest from one.
 */
public final class RunFolder implements AutoCloseable {

    private static final String LOG = "run.log";

    private final Path path;
    private final FolderLock lock;
    private final FileChannel log;

    private RunFolder(Path path, FolderLock lock) throws IOException {
        this.path = path;
        this.lock = lock;
        WholeFile.removeLeftovers(path);
        log = FileChannel.open(path.resolve(LOG), StandardOpenOption.CREATE, StandardOpenOption.APPEND);
    }

    /**
     * Makes and holds the folder of a new run.
     *
     * @throws ReedlingException with exit code OUTPUT if it cannot be made, holds an earlier run or is in use
     */
    public static RunFolder create(Path path) {
        if (Files.exists(path) && !Files.isDirectory(path)) {
            throw refusal(path, "a file", "a folder or a free name", "Choose another name.");
        }
        try {
            Files.createDirectories(path);
            return hold(path, true);
        } catch (IOException cause) {
            throw unusable(path, cause);
        }
    }

    /**
     * Holds the folder of an earlier run in order to go on with it.
     *
     * @throws ReedlingException with exit code OUTPUT if there is no run in it or it is in use
     */
    public static RunFolder resume(Path path) {
        if (!Files.exists(path.resolve(LOG))) {
            throw refusal(path, "without a run", "the folder of an earlier run", "Check the name.");
        }
        try {
            return hold(path, false);
        } catch (IOException cause) {
            throw unusable(path, cause);
        }
    }

    private static RunFolder hold(Path path, boolean refuseEarlierRun) throws IOException {
        FolderLock lock = FolderLock.hold(path);
        try {
            if (refuseEarlierRun && Files.exists(path.resolve(LOG))) {
                throw refusal(
                        path, "the folder of an earlier run", "a new one", "Choose another name, or resume that run.");
            }
            return new RunFolder(path, lock);
        } catch (IOException | RuntimeException failure) {
            lock.close();
            throw failure;
        }
    }

    public Path path() {
        return path;
    }

    /** A file of the folder. */
    public Path resolve(String name) {
        return path.resolve(name);
    }

    /** Adds one line with the time of day (UTC) to {@code run.log}. */
    public void log(String line) {
        byte[] bytes = (now() + " " + line + "\n").getBytes(StandardCharsets.UTF_8);
        try {
            synchronized (log) {
                WholeFile.writeFully(log, ByteBuffer.wrap(bytes));
            }
        } catch (IOException cause) {
            throw new ReedlingException(
                    ExitCode.INPUT_OUTPUT,
                    new Finding(
                            resolve(LOG).toString(), "", "not written: " + cause, "", "Check free space, then resume."),
                    cause);
        }
    }

    /** Forces the log to the disk and releases the folder. */
    @Override
    public void close() throws IOException {
        try (lock;
                log) {
            log.force(true);
        }
    }

    static String now() {
        return Instant.now().truncatedTo(ChronoUnit.MILLIS).toString();
    }

    private static ReedlingException refusal(Path path, String got, String expected, String remedy) {
        return new ReedlingException(ExitCode.OUTPUT, new Finding(path.toString(), "", got, expected, remedy));
    }

    private static ReedlingException unusable(Path path, IOException cause) {
        Finding finding = new Finding(
                path.toString(),
                "",
                "impossible to use: " + cause,
                "a folder that can be written",
                "Check its permissions and free space.");
        return new ReedlingException(ExitCode.OUTPUT, finding, cause);
    }
}
