// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

/** What the parts of a size distribution are parts of. */
public enum Basis {
    /** Mass, as scales give it. */
    MASS(0),
    /** Number of grains, as counting gives it. */
    NUMBER(3);

    private final int massPower;

    Basis(int massPower) {
        this.massPower = massPower;
    }

    /** Power of the diameter that turns a density by this basis into one by mass; less 3, into one by number. */
    int massPower() {
        return massPower;
    }
}
