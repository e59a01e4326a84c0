// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.io.IOException;
import java.net.URL;
import java.net.URLClassLoader;
import java.util.Enumeration;

/**
 * Loads one plugin jar. Classes of the jar come before those of the program, so that two plugins may bring different
 * versions of one library; only {@code reedling.*} (and {@code java.*}) comes from the program first, so that a
 * provider implements the very interface the engine knows.
 */
final class PluginJarLoader extends URLClassLoader {

    static {
        registerAsParallelCapable();
    }

    PluginJarLoader(URL jar, ClassLoader program) {
        super(new URL[] {jar}, program);
    }

    @Override
    protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
        if (name.startsWith("java.") || name.startsWith("reedling.")) {
            return super.loadClass(name, resolve);
        }
        synchronized (getClassLoadingLock(name)) {
            Class<?> loaded = findLoadedClass(name);
            if (loaded != null) {
                return loaded;
            }
            try {
                return findClass(name);
            } catch (ClassNotFoundException absentFromJar) {
                return super.loadClass(name, resolve);
            }
        }
    }

    /** Service files of the program are hidden, or each jar would seem to provide the built-in plugins again. */
    @Override
    public Enumeration<URL> getResources(String name) throws IOException {
        return name.startsWith("META-INF/services/") ? findResources(name) : super.getResources(name);
    }
}
