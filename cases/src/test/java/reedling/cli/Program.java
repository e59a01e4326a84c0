// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Commands run inside the test, with what they print. */
final class Program {

    static final String FIRST_LOOK = Path.of("first-look", "case.toml").toString();

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();
    private final Path folder;

    /** @param folder for records of faults of the program */
    Program(Path folder) {
        this.folder = folder;
    }

    int run(String... arguments) {
        out.getBuffer().setLength(0);
        err.getBuffer().setLength(0);
        return Main.commandLine(new FaultRecord(folder))
                .setOut(new PrintWriter(out, true))
                .setErr(new PrintWriter(err, true))
                .execute(arguments);
    }

    String out() {
        return out.toString();
    }

    String err() {
        return err.toString();
    }

    /** A text or number of run.json. */
    static String recorded(Path run, String key) throws IOException {
        Matcher matcher = Pattern.compile("\"" + key + "\"\\s*:\\s*\"?([^\",\\s]+)")
                .matcher(Files.readString(run.resolve("run.json")));
        if (!matcher.find()) {
            throw new IllegalStateException("no " + key + " in run.json");
        }
        return matcher.group(1);
    }
}
