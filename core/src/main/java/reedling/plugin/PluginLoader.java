// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.ServiceConfigurationError;
import java.util.ServiceLoader;
import java.util.jar.JarFile;
import java.util.stream.Stream;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/**
 * Finds plugins: those of the class path first, then those of each jar in a folder, in the order of file names.
 *
 * <p>Everything wrong is collected and thrown at once: a file that is no jar, a jar without plugins, a provider that
 * cannot be made, another API level, a name of the wrong form, a name given twice.
 *
 * <p>Threads: one loader is used by one thread; the catalogue it returns is immutable.
 */
public final class PluginLoader {

    private final List<PluginService<?>> services;
    private final List<Finding> findings = new ArrayList<>();
    private final Map<String, LoadedPlugin> loaded = new LinkedHashMap<>();

    private PluginLoader(List<PluginService<?>> services) {
        this.services = List.copyOf(services);
    }

    /**
     * Loads every plugin of the given services.
     *
     * @param services the service interfaces known to the caller
     * @param folder folder of plugin jars, if the user named one
     * @throws ReedlingException with {@link ExitCode#PLUGIN} and every finding
     */
    public static PluginCatalogue load(List<PluginService<?>> services, Optional<Path> folder) {
        PluginLoader loader = new PluginLoader(services);
        loader.loadClassPath();
        folder.ifPresent(loader::loadFolder);
        if (!loader.findings.isEmpty()) {
            throw new ReedlingException(ExitCode.PLUGIN, loader.findings);
        }
        return new PluginCatalogue(List.copyOf(loader.loaded.values()));
    }

    private void loadClassPath() {
        ClassLoader program = PluginLoader.class.getClassLoader();
        services.forEach(service -> loadService(service, program, "class path"));
    }

    private void loadFolder(Path folder) {
        try (Stream<Path> files = Files.list(folder)) {
            files.filter(file -> file.getFileName().toString().endsWith(".jar"))
                    .sorted()
                    .forEach(this::loadJar);
        } catch (IOException unreadable) {
            findings.add(new Finding(
                    folder.toString(),
                    "plugin folder",
                    "unreadable (" + unreadable + ")",
                    "a folder of jars",
                    "Name an existing folder."));
        }
    }

    private void loadJar(Path jar) {
        try (JarFile opened = new JarFile(jar.toFile())) {
            boolean provides = services.stream()
                    .anyMatch(service -> opened.getEntry(
                                    "META-INF/services/" + service.type().getName())
                            != null);
            if (!provides) {
                findings.add(new Finding(
                        jar.toString(),
                        "",
                        "a jar without plugins",
                        "a file in META-INF/services named after a service",
                        "Add that file; libraries a plugin needs belong inside its own jar."));
                return;
            }
        } catch (IOException unreadable) {
            findings.add(new Finding(
                    jar.toString(),
                    "",
                    "not a readable jar (" + unreadable.getMessage() + ")",
                    "a jar",
                    "Take it away."));
            return;
        }
        ClassLoader jarLoader = openJar(jar);
        services.forEach(service -> loadService(service, jarLoader, jar.toString()));
    }

    /** The loader stays open as long as the program runs: plugins load classes whenever they first need them. */
    private static ClassLoader openJar(Path jar) {
        try {
            return new PluginJarLoader(jar.toUri().toURL(), PluginLoader.class.getClassLoader());
        } catch (IOException malformed) {
            throw new IllegalStateException("no URL for " + jar, malformed);
        }
    }

    private void loadService(PluginService<?> service, ClassLoader classLoader, String where) {
        Iterator<? extends ServiceLoader.Provider<? extends Provider>> found =
                ServiceLoader.load(service.type(), classLoader).stream().iterator();
        while (true) {
            String suspect = where;
            try {
                // After a failure the next call goes on with the next entry.
                if (!found.hasNext()) {
                    return;
                }
                ServiceLoader.Provider<? extends Provider> entry = found.next();
                suspect = jarOf(entry.type(), where);
                add(service, entry.get(), suspect);
            } catch (ServiceConfigurationError | LinkageError | RuntimeException failure) {
                findings.add(brokenProvider(suspect, failure));
            }
        }
    }

    private static Finding brokenProvider(String jar, Throwable failure) {
        Throwable cause = failure.getCause() == null ? failure : failure.getCause();
        String reason = cause == failure ? String.valueOf(failure.getMessage()) : failure.getMessage() + ": " + cause;
        boolean incomplete = failure instanceof NoClassDefFoundError
                || cause instanceof ClassNotFoundException
                || cause instanceof NoClassDefFoundError;
        String remedy = incomplete
                ? "A class is missing: put the library that has it inside the plugin's jar, or correct the service file."
                : "Repair the plugin, or take the jar away.";
        return new Finding(jar, "plugin", "unusable (" + reason + ")", "", remedy);
    }

    private void add(PluginService<?> service, Provider provider, String jar) {
        if (!new ProviderCheck(jar, findings::add).accepts(provider)) {
            return;
        }
        LoadedPlugin plugin = new LoadedPlugin(service, provider, provider.name(), jar);
        LoadedPlugin earlier = loaded.putIfAbsent(service.kind() + " " + plugin.name(), plugin);
        if (earlier != null) {
            findings.add(new Finding(
                    jar,
                    service.kind() + " plugin " + plugin.name(),
                    "already provided by " + earlier.jar(),
                    "one provider for each name",
                    "Take one of the two jars away."));
        }
    }

    private static String jarOf(Class<?> type, String otherwise) {
        var source = type.getProtectionDomain().getCodeSource();
        if (source == null || source.getLocation() == null) {
            return otherwise;
        }
        return "file".equals(source.getLocation().getProtocol())
                ? Path.of(URI.create(source.getLocation().toString())).toString()
                : source.getLocation().toString();
    }
}
