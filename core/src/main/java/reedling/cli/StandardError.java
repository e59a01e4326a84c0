// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.lang.foreign.FunctionDescriptor;
import java.lang.foreign.Linker;
import java.lang.foreign.ValueLayout;

/**
 * The launcher starts Java with standard error led through a filter that takes the incubator announcement away, and
 * keeps the real one as another descriptor. Putting it back makes it a terminal again and ends the filter.
 */
final class StandardError {

    private static final String KEPT_DESCRIPTOR = "reedling.standardError";
    private static final int STANDARD_ERROR = 2;

    private StandardError() {}

    /** Does nothing unless the launcher says which descriptor it kept. */
    @SuppressWarnings("restricted") // native access is what this class is for; the launcher allows it
    static void restore() {
        Integer kept = Integer.getInteger(KEPT_DESCRIPTOR);
        if (kept == null) {
            return;
        }
        Linker linker = Linker.nativeLinker();
        linker.defaultLookup().find("dup2").ifPresent(dup2 -> {
            var duplicate = linker.downcallHandle(
                    dup2, FunctionDescriptor.of(ValueLayout.JAVA_INT, ValueLayout.JAVA_INT, ValueLayout.JAVA_INT));
            try {
                // On failure standard error still arrives, through the filter.
                int ignored = (int) duplicate.invokeExact((int) kept, STANDARD_ERROR);
            } catch (Throwable failure) {
                throw new IllegalStateException("standard error could not be restored", failure);
            }
        });
    }
}
