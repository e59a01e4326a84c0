// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import javax.tools.ToolProvider;

/** Builds plugin jars for tests as a site author would: source, service file, manifest. */
final class PluginJar {

    private final Map<String, String> sources = new LinkedHashMap<>();
    private String provider = "";
    private String leftOut = "";

    /** A jar with one working greeting: class {@code site.<className>}, of the given name and API level. */
    static PluginJar greeting(String className, String name, String apiLevel) {
        return new PluginJar().provider("site." + className, """
                package site;
                public class %s implements reedling.plugin.Greeting {
                    public String name() { return "%s"; }
                    public int apiLevel() { return %s; }
                    public String summary() { return "Greets."; }
                    public String source() { return "common practice, no source"; }
                    public String greet() { return "greetings"; }
                }
                """.formatted(className, name, apiLevel));
    }

    PluginJar provider(String className, String source) {
        provider = className;
        return source(className, source);
    }

    PluginJar source(String className, String source) {
        sources.put(className, source);
        return this;
    }

    /** Compiles a class but leaves it out of the jar. */
    PluginJar leavingOut(String className) {
        leftOut = className.replace('.', '/') + ".class";
        return this;
    }

    /** Adds to the text of the provider's class body. */
    PluginJar with(String member) {
        sources.computeIfPresent(
                provider, (name, source) -> source.substring(0, source.lastIndexOf('}')) + member + "}\n");
        return this;
    }

    Path write(Path jar) throws IOException {
        Path work = Files.createTempDirectory("plugin-jar");
        Manifest manifest = new Manifest();
        manifest.getMainAttributes().put(Attributes.Name.MANIFEST_VERSION, "1.0");
        manifest.getMainAttributes().put(Attributes.Name.IMPLEMENTATION_VERSION, "3.1");
        try (OutputStream file = Files.newOutputStream(jar);
                JarOutputStream out = new JarOutputStream(file, manifest)) {
            compile(work);
            try (Stream<Path> classes = Files.walk(work)) {
                for (Path path : classes.filter(Files::isRegularFile).toList()) {
                    String name = work.relativize(path).toString().replace('\\', '/');
                    if (!name.equals(leftOut)) {
                        entry(out, name, Files.readAllBytes(path));
                    }
                }
            }
            if (!provider.isEmpty()) {
                entry(out, "META-INF/services/reedling.plugin.Greeting", provider.getBytes(StandardCharsets.UTF_8));
            }
        }
        return jar;
    }

    private void compile(Path work) throws IOException {
        if (sources.isEmpty()) {
            return;
        }
        Path sourceFolder = Files.createTempDirectory("plugin-source");
        List<String> arguments = new ArrayList<>(
                List.of("-proc:none", "-cp", System.getProperty("java.class.path"), "-d", work.toString()));
        for (Map.Entry<String, String> source : sources.entrySet()) {
            Path file = sourceFolder.resolve(source.getKey().replace('.', '/') + ".java");
            Files.createDirectories(file.getParent());
            arguments.add(Files.writeString(file, source.getValue()).toString());
        }
        int result = ToolProvider.getSystemJavaCompiler().run(null, null, null, arguments.toArray(new String[0]));
        assertThat(result).as("compiler result for %s", sources.keySet()).isZero();
    }

    private static void entry(JarOutputStream out, String name, byte[] content) throws IOException {
        out.putNextEntry(new ZipEntry(name));
        out.write(content);
        out.closeEntry();
    }
}
