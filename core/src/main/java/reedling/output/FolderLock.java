// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/**
 * Exclusive use of a folder through a lock on {@code run.lock}, which the system releases even if the process is
 * killed. The lock file stays, since deleting it could take it from under the next process.
 */
final class FolderLock implements AutoCloseable {

    static final String NAME = "run.lock";

    /**
     * Folders held by this process. On Linux closing any channel of a file drops every lock that the process has on
     * it, so a folder known to be held must be refused before its lock file is opened.
     */
    private static final Set<Path> HELD = ConcurrentHashMap.newKeySet();

    private final Path folder;
    private final FileChannel channel;

    private FolderLock(Path folder, FileChannel channel) {
        this.folder = folder;
        this.channel = channel;
    }

    /**
     * Locks an existing folder.
     *
     * @throws ReedlingException if it is in use
     */
    static FolderLock hold(Path path) throws IOException {
        Path folder = path.toRealPath();
        if (!HELD.add(folder)) {
            throw inUse(path, "this process");
        }
        try {
            return new FolderLock(folder, lockedChannel(path));
        } catch (IOException | RuntimeException failure) {
            HELD.remove(folder);
            throw failure;
        }
    }

    private static FileChannel lockedChannel(Path path) throws IOException {
        Path file = path.resolve(NAME);
        FileChannel channel =
                FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
        try {
            if (channel.tryLock() == null) {
                throw inUse(path, Files.readString(file).strip());
            }
            channel.truncate(0);
            String owner = "process " + ProcessHandle.current().pid() + " since " + RunFolder.now() + "\n";
            WholeFile.writeFully(channel, ByteBuffer.wrap(owner.getBytes(StandardCharsets.UTF_8)));
            return channel;
        } catch (IOException | RuntimeException failure) {
            channel.close();
            throw failure;
        }
    }

    private static ReedlingException inUse(Path path, String owner) {
        return new ReedlingException(
                ExitCode.OUTPUT,
                new Finding(
                        path.toString(),
                        "",
                        "in use by " + owner,
                        "a folder no run is writing to",
                        "Wait for that run, or choose another name."));
    }

    @Override
    public void close() throws IOException {
        try (channel) {
            HELD.remove(folder);
        }
    }
}
