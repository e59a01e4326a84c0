// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/** Solves for a velocity that a drag slows and a turning force turns, both taken at that same velocity. Stateless. */
final class LinearResponse {

    private LinearResponse() {}

    /**
     * Solves a r - b x r = r0 in place: r = (a^2 r0 + a b x r0 + b (b . r0)) / (a (a^2 + b^2)). With a = 1 and the kick
     * that follows, the change from r0 to 2 r - r0 is a pure turn, so that the speed stays (the rotation of Boris,
     * Relativistic plasma simulation - optimization of a hybrid code, 1970, from memory).
     *
     * @param r r0, three numbers from index at; replaced by r
     * @param a >= 1
     */
    static void solve(double[] r, int at, double a, double bx, double by, double bz) {
        double x = r[at], y = r[at + 1], z = r[at + 2];
        double along = bx * x + by * y + bz * z;
        double aa = a * a;
        double scale = 1 / (a * (aa + bx * bx + by * by + bz * bz));
        r[at] = scale * (aa * x + a * (by * z - bz * y) + bx * along);
        r[at + 1] = scale * (aa * y + a * (bz * x - bx * z) + by * along);
        r[at + 2] = scale * (aa * z + a * (bx * y - by * x) + bz * along);
    }
}
