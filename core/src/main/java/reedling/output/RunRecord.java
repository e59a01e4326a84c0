// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import reedling.file.WholeFile;

/**
 * What is to be known of a run, kept as {@code run.json}: versions, plugins, seeds, machine, timings, ledger.
 * Threads: one at a time; the job made by {@link #saving} may run on another.
 */
public final class RunRecord {

    private final Map<String, Object> values = new LinkedHashMap<>();

    /**
     * Sets or replaces a value; the first setting decides its place.
     *
     * @param value text, number, truth value, or a map or list of such
     */
    public RunRecord set(String key, Object value) {
        values.put(key, value);
        return this;
    }

    /** Its JSON text. */
    public String text() {
        return JsonText.of(values);
    }

    /** Takes the text as it is now; the job returned replaces the file in one step. */
    public WriteQueue.Job saving(Path file) {
        String now = text();
        return () -> WholeFile.writeText(file, now);
    }
}
