// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.List;
import reedling.unit.Dimension;

/** The one greeting of the test class path. */
public final class ClassPathGreeting implements Greeting {

    @Override
    public String name() {
        return "plain-hello";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Says hello.";
    }

    @Override
    public String source() {
        return "common practice, no source";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(new Parameter("loudness", Dimension.PRESSURE, 0, 20, 0.02, "Sound pressure of the greeting."));
    }

    @Override
    public String greet() {
        return "hello from " + Library.class.getName();
    }

    /** Stands for a class that a plugin jar may bring in another version. */
    public static final class Library {}
}
