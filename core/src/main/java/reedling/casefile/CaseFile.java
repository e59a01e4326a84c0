// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/**
 * Reads case files. Threads: stateless.
 *
 * <p>Findings name {@code FILE:LINE:COLUMN}, or {@code --set KEY} for assignments of the command line.
 */
public final class CaseFile {

    private CaseFile() {}

    /**
     * Reads, checks and resolves a case.
     *
     * @param file TOML 1.0, UTF-8
     * @param assignments {@code KEY=VALUE}, key as findings write it (dotted, list items counted from 1), value TOML
     * @param lookup the plugins that the case may name
     * @throws ReedlingException with all findings in file order: {@link ExitCode#CASE}; if the file cannot be read,
     *     {@link ExitCode#NO_INPUT}
     */
    public static CaseReading read(Path file, List<String> assignments, ProviderLookup lookup) {
        Path folder = Objects.requireNonNullElse(file.toAbsolutePath().getParent(), file.toAbsolutePath());
        return read(text(file), file.toString(), folder, assignments, lookup);
    }

    /**
     * The same for a text already in memory; files it names are taken from the current folder.
     *
     * @param source name for findings
     */
    public static CaseReading read(String text, String source, List<String> assignments, ProviderLookup lookup) {
        return read(text, source, Path.of("").toAbsolutePath(), assignments, lookup);
    }

    private static CaseReading read(
            String text, String source, Path folder, List<String> assignments, ProviderLookup lookup) {
        Findings findings = new Findings();
        Node.Table root = TomlTree.read(text, source, findings);
        Assignments.apply(root, assignments, findings);
        new FileAnchors(folder, lookup).apply(root);
        return new CaseReader(root, lookup, findings).read();
    }

    /** JSON Schema (draft 2020-12) of case files, for editors; plugin parameters are left open. */
    public static String schema() {
        return new CaseSchema().write();
    }

    /** Every key with dimension, range, default and meaning, as Markdown. */
    public static String keyReference() {
        return new KeyReference().write();
    }

    private static String text(Path file) {
        try {
            return Files.readString(file, StandardCharsets.UTF_8);
        } catch (NoSuchFileException e) {
            throw unreadable(file, "missing", "Check the path; it is taken from the current folder.", e);
        } catch (CharacterCodingException e) {
            throw unreadable(file, "not UTF-8 text", "Save it as UTF-8.", e);
        } catch (IOException e) {
            throw unreadable(file, "unreadable: " + e, "Check its permissions, and that it is a file.", e);
        }
    }

    private static ReedlingException unreadable(Path file, String got, String remedy, IOException cause) {
        return new ReedlingException(
                ExitCode.NO_INPUT, new Finding(file.toString(), "", got, "a readable case file", remedy), cause);
    }
}
