// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/**
 * Writes the running program, every jar of it, as a Maven repository of files, so that a plugin can be built against it
 * from an empty folder. Versions are digests of the content: what Maven keeps of an older program never stands in for a
 * newer one.
 */
final class ProgramRepository {

    private static final String GROUP = "org.reedling.program";
    private static final int DIGITS = 12;

    private final Path folder;
    private final StringBuilder dependencies = new StringBuilder();

    private ProgramRepository(Path folder) {
        this.folder = folder;
    }

    /**
     * Writes the repository.
     *
     * @return version of the artifact {@code org.reedling.program:everything}
     */
    static String write(Path folder) throws IOException {
        ProgramRepository repository = new ProgramRepository(folder);
        int number = 0;
        for (String entry : System.getProperty("java.class.path").split(File.pathSeparator)) {
            Path path = Path.of(entry);
            if (Files.isDirectory(path)) {
                repository.add("classes-" + number++, zipped(path));
            } else if (entry.endsWith(".jar") && Files.isRegularFile(path)) {
                String name = String.valueOf(path.getFileName());
                repository.add(name.substring(0, name.length() - ".jar".length()), Files.readAllBytes(path));
            }
        }
        return repository.everything();
    }

    private void add(String artifact, byte[] jar) throws IOException {
        String version = digest("SHA-256", jar).substring(0, DIGITS);
        write(artifact, version, "jar", jar);
        write(artifact, version, "pom", pom(artifact, version, "jar", ""));
        dependencies
                .append("<dependency>")
                .append(coordinates(artifact, version))
                .append("</dependency>\n");
    }

    private static String coordinates(String artifact, String version) {
        return "<groupId>" + GROUP + "</groupId><artifactId>" + artifact + "</artifactId><version>" + version
                + "</version>";
    }

    private String everything() throws IOException {
        byte[] all = dependencies.toString().getBytes(StandardCharsets.UTF_8);
        String version = digest("SHA-256", all).substring(0, DIGITS);
        write(
                "everything",
                version,
                "pom",
                pom("everything", version, "pom", "<dependencies>\n" + dependencies + "</dependencies>\n"));
        return version;
    }

    private static byte[] pom(String artifact, String version, String packaging, String inside) {
        String pom = "<project xmlns=\"http://maven.apache.org/POM/4.0.0\">\n<modelVersion>4.0.0</modelVersion>\n"
                + coordinates(artifact, version) + "<packaging>" + packaging + "</packaging>\n" + inside
                + "</project>\n";
        return pom.getBytes(StandardCharsets.UTF_8);
    }

    private void write(String artifact, String version, String kind, byte[] content) throws IOException {
        Path place = folder.resolve(GROUP.replace('.', '/')).resolve(artifact).resolve(version);
        Files.createDirectories(place);
        Path file = place.resolve(artifact + "-" + version + "." + kind);
        Files.write(file, content);
        Files.writeString(place.resolve(file.getFileName() + ".sha1"), digest("SHA-1", content));
    }

    private static String digest(String algorithm, byte[] content) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance(algorithm).digest(content));
        } catch (NoSuchAlgorithmException missing) {
            throw new IllegalStateException("every Java machine has " + algorithm, missing);
        }
    }

    /** A folder of classes as a jar, always the same bytes for the same files. */
    private static byte[] zipped(Path classes) throws IOException {
        List<Path> files = new ArrayList<>();
        try (Stream<Path> all = Files.walk(classes)) {
            all.filter(Files::isRegularFile).sorted().forEach(files::add);
        }
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream out = new ZipOutputStream(bytes)) {
            for (Path file : files) {
                ZipEntry entry =
                        new ZipEntry(classes.relativize(file).toString().replace('\\', '/'));
                entry.setTime(0);
                out.putNextEntry(entry);
                out.write(Files.readAllBytes(file));
                out.closeEntry();
            }
        }
        return bytes.toByteArray();
    }
}
