// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/** Lift of a spinning sphere (Magnus effect), across its path and its spin. */
enum LiftLaw {
    /** No lift. */
    NONE,
    /** F = pi R^3 density (w x v), both relative to the gas; derived for Re far below 1. */
    RUBINOW_KELLER,
    /** |F| = 1/2 density pi R^2 C_L v^2 where spin stands across the path, its sine where it does not. */
    CONSTANT;

    static List<String> words() {
        return Arrays.stream(values())
                .map(law -> law.name().toLowerCase(Locale.ROOT).replace('_', '-'))
                .toList();
    }

    static LiftLaw of(String word) {
        return valueOf(word.toUpperCase(Locale.ROOT).replace('-', '_'));
    }
}
