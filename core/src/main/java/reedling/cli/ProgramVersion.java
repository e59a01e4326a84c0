// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.Objects;
import picocli.CommandLine.IVersionProvider;

/** Version of the program and of the Java machine it runs on. */
final class ProgramVersion implements IVersionProvider {

    /** Version in the jar's manifest; "development" when run from a folder of classes. */
    static String number() {
        return Objects.requireNonNullElse(Main.class.getPackage().getImplementationVersion(), "development");
    }

    @Override
    public String[] getVersion() {
        return new String[] {"reedling " + number(), "java " + Runtime.version()};
    }
}
