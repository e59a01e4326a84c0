// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import reedling.contact.ContactLawProvider;
import reedling.math.Lanes;

/**
 * The law in a Java machine of its own where kernels run at the other width, since the width is chosen once at start: its
 * fingerprint and its cost.
 *
 * @param fingerprint as {@link Fingerprint#of}
 * @param nanoseconds as {@link Cost#nanoseconds}
 */
record OtherWidth(long fingerprint, double nanoseconds) {

    private static final long PATIENCE = 120; // s
    private static final String ANSWER = "other width: ";

    /** Asks for the law; empty where its provider cannot be made in another machine. */
    static Optional<OtherWidth> of(Subject subject) {
        if (!canBeMade(subject.provider().getClass())) {
            return Optional.empty();
        }
        try {
            Process process = new ProcessBuilder(command(subject))
                    .redirectErrorStream(true)
                    .start();
            process.getOutputStream().close();
            String said = new String(process.getInputStream().readAllBytes(), java.nio.charset.StandardCharsets.UTF_8);
            if (!process.waitFor(PATIENCE, TimeUnit.SECONDS)) {
                process.destroyForcibly();
            }
            return Optional.of(answer(said));
        } catch (IOException failure) {
            throw new UncheckedIOException("no second Java machine could be started", failure);
        } catch (InterruptedException failure) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted while a second Java machine ran", failure);
        }
    }

    private static boolean canBeMade(Class<?> type) {
        try {
            return java.lang.reflect.Modifier.isPublic(type.getConstructor().getModifiers());
        } catch (NoSuchMethodException none) {
            return false;
        }
    }

    private static OtherWidth answer(String said) {
        String line = said.lines()
                .filter(one -> one.startsWith(ANSWER))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("a second Java machine said: " + said.strip()));
        String[] words = line.substring(ANSWER.length()).split(" ");
        return new OtherWidth(Long.parseLong(words[0]), Double.parseDouble(words[1]));
    }

    private static List<String> command(Subject subject) {
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "--add-modules",
                "jdk.incubator.vector",
                "-XX:-DoEscapeAnalysis",
                "-XX:+UseSerialGC",
                "-Dreedling.lanes=" + (Lanes.VECTORISED ? 1 : Lanes.TILE),
                "-cp",
                System.getProperty("java.class.path"),
                OtherWidth.class.getName(),
                subject.provider().getClass().getName(),
                folderOf(subject.provider())));
        subject.values().forEach((name, value) -> command.add(name + "=" + value));
        return command;
    }

    /** Folder of the plugin's jar; empty if it is on the class path. */
    private static String folderOf(ContactLawProvider provider) {
        if (provider.getClass().getClassLoader() == OtherWidth.class.getClassLoader()) {
            return "";
        }
        CodeSource source = provider.getClass().getProtectionDomain().getCodeSource();
        Path jar = Path.of(java.net.URI.create(source.getLocation().toString()));
        Path folder = jar.getParent();
        return folder == null || !Files.isRegularFile(jar) ? "" : folder.toString();
    }

    /** What the second machine does. */
    public static void main(String[] arguments) throws ReflectiveOperationException {
        List<ContactLawProvider> laws =
                LoadedLaws.in(arguments[1].isEmpty() ? Optional.empty() : Optional.of(Path.of(arguments[1])));
        ContactLawProvider provider = laws.stream()
                .filter(one -> one.getClass().getName().equals(arguments[0]))
                .findFirst()
                .orElse(null);
        if (provider == null) {
            provider = (ContactLawProvider)
                    Class.forName(arguments[0]).getConstructor().newInstance();
        }
        Map<String, Double> values = new java.util.HashMap<>();
        for (int k = 2; k < arguments.length; k++) {
            String[] pair = arguments[k].split("=", 2);
            values.put(pair[0], Double.valueOf(pair[1]));
        }
        Subject subject = Subject.of(provider, values, laws);
        System.out.println(ANSWER + Fingerprint.of(subject) + " " + Cost.nanoseconds(subject.laws(), subject.stage()));
    }
}
