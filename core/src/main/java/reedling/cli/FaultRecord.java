// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes the stack trace of a fault of the program into a file, so that a report of it can be complete. */
final class FaultRecord {

    private final Path folder;

    /** Records go into this folder or, where it cannot be written, into the system's temporary folder. */
    FaultRecord(Path folder) {
        this.folder = folder;
    }

    /** Writes the record and returns the message for the user, which names the file. */
    String write(Throwable failure, Iterable<String> arguments) {
        String text = "reedling " + ProgramVersion.number() + ", java " + Runtime.version() + ", "
                + System.getProperty("os.name") + " " + System.getProperty("os.arch") + "\n"
                + "arguments: " + String.join(" ", arguments) + "\n\n" + stackTrace(failure);
        String message = "Internal fault of Reedling, not of your input: " + failure + ".";
        try {
            return message + " The details are in " + writeWhereAllowed(text) + "; please report it with that file.";
        } catch (IOException unwritable) {
            return message + " No file could be written (" + unwritable + "), so here are the details:\n" + text;
        }
    }

    private Path writeWhereAllowed(String text) throws IOException {
        Path absolute = folder.toAbsolutePath();
        Path file = Files.isWritable(absolute)
                ? Files.createTempFile(absolute, "reedling-fault-", ".txt")
                : Files.createTempFile("reedling-fault-", ".txt");
        return Files.writeString(file, text);
    }

    private static String stackTrace(Throwable failure) {
        StringWriter text = new StringWriter();
        failure.printStackTrace(new PrintWriter(text, true));
        return text.toString();
    }
}
