// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import org.joml.Vector3dc;

/** Test of two directions. */
final class RightAngle {

    static final String REMEDY = "The scalar product of the two must be zero.";

    /** Largest cosine taken for a right angle: directions are written with about ten digits. */
    private static final double COSINE = 1e-9;

    private RightAngle() {}

    static boolean between(Vector3dc a, Vector3dc b) {
        return Math.abs(a.dot(b)) <= COSINE * a.length() * b.length();
    }
}
