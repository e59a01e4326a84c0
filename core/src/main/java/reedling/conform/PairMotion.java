// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

/** A motion of two bodies that is laid down from outside. */
interface PairMotion {

    /** Numbers in a pose. */
    int LENGTH = 12;

    /** Where the angles turned begin in a pose. */
    int ANGLES = 6;

    /**
     * The pose at a time.
     *
     * @param time s, may be a little before 0
     * @param pose filled with the centres of both bodies (m), then the angles both have turned (rad, integral of the spin
     *     in world axes)
     */
    void at(double time, double[] pose);

    /** The same motion with the two bodies exchanged. */
    default PairMotion exchanged() {
        double[] own = new double[LENGTH];
        return (time, pose) -> {
            at(time, own);
            for (int k = 0; k < LENGTH; k += 6) {
                System.arraycopy(own, k, pose, k + 3, 3);
                System.arraycopy(own, k + 3, pose, k, 3);
            }
        };
    }
}
