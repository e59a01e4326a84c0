// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Objects;
import java.util.concurrent.Callable;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/** Makes a folder in which a contact law of one's own can be built, tested and tried. */
@Command(
        name = "new-law",
        description = "Makes a Maven project with one contact law and its test, ready to build.",
        mixinStandardHelpOptions = true)
final class NewLawCommand implements Callable<Integer> {

    private static final Pattern KEBAB_CASE = Pattern.compile("[a-z][a-z0-9]*(-[a-z0-9]+)*");
    private static final String SOURCES = "src/main/java/site/laws/";

    @Parameters(paramLabel = "FOLDER", description = "Folder to make; new or empty.")
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private Path folder;

    @Option(
            names = "--name",
            paramLabel = "NAME",
            description = "Name of the law, a kebab-case word (default: the name of the folder).")
    private @Nullable String given;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    @Override
    public Integer call() {
        String name = given == null
                ? String.valueOf(folder.toAbsolutePath().normalize().getFileName())
                : given;
        if (!KEBAB_CASE.matcher(name).matches()) {
            throw new ReedlingException(
                    ExitCode.USAGE,
                    new Finding(
                            "command line",
                            given == null ? "name of the folder" : "--name",
                            '"' + name + '"',
                            "a kebab-case word such as soft-shell",
                            "Give one with --name."));
        }
        try {
            refuseUsed();
            write(name);
        } catch (IOException failure) {
            throw RunSession.unusable(folder, failure);
        }
        PrintWriter out = spec.commandLine().getOut();
        out.println("Made " + folder + " with the law \"" + name + "\"; its README.md has the commands. Begin with:");
        out.println("cd " + folder + " && mvn -q package");
        out.flush();
        return ExitCode.OK.number();
    }

    private void refuseUsed() throws IOException {
        if (!Files.exists(folder)) {
            return;
        }
        try (Stream<Path> inside = Files.list(folder)) {
            if (inside.findAny().isPresent()) {
                throw new ReedlingException(
                        ExitCode.OUTPUT,
                        new Finding(
                                folder.toString(),
                                "",
                                "a folder that is not empty",
                                "a new or empty folder",
                                "Choose another."));
            }
        }
    }

    private void write(String name) throws IOException {
        String version = ProgramRepository.write(folder.resolve("program"));
        Filling filling = new Filling(name, className(name), version);
        copy("pom.xml", "pom.xml", filling);
        copy("README.md", "README.md", filling);
        copy("Law.java", SOURCES + filling.type() + "Law.java", filling);
        copy("Block.java", SOURCES + filling.type() + "Block.java", filling);
        copy("Provider.java", SOURCES + filling.type() + "Provider.java", filling);
        copy("Test.java", "src/test/java/site/laws/" + filling.type() + "LawTest.java", filling);
        text(
                "src/main/resources/META-INF/services/reedling.contact.ContactLawProvider",
                "site.laws." + filling.type() + "Provider\n");
    }

    /** Words that stand for the places held open in the templates. */
    private record Filling(String name, String type, String version) {
        String fill(String template) {
            String home = System.getProperty("reedling.home");
            return template.replace("@name@", name)
                    .replace("@Class@", type)
                    .replace("@version@", version)
                    .replace("@reedling@", home == null ? "reedling" : home + "/reedling");
        }
    }

    private void copy(String template, String to, Filling filling) throws IOException {
        try (InputStream in =
                Objects.requireNonNull(NewLawCommand.class.getResourceAsStream("new-law/" + template), template)) {
            text(to, filling.fill(new String(in.readAllBytes(), StandardCharsets.UTF_8)));
        }
    }

    private void text(String to, String text) throws IOException {
        Path file = folder.resolve(to);
        Files.createDirectories(Objects.requireNonNull(file.getParent()));
        WholeFile.writeText(file, text);
    }

    private static String className(String kebab) {
        StringBuilder name = new StringBuilder();
        for (String word : kebab.split("-")) {
            name.append(word.substring(0, 1).toUpperCase(Locale.ROOT)).append(word.substring(1));
        }
        return name.toString();
    }
}
