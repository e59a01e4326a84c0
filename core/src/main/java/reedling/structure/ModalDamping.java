// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Mass-proportional damping of supported bodies relative to their supports.
 *
 * <p>Formula: F = -alpha m (v - v_s), alpha = 2 zeta omega_1; v_s is the support velocity, interpolated linearly along
 * the body between its two held ends. A rigid translation of the supports is therefore not braked.
 *
 * <p>Where: alpha in 1/s per node (0 for unsupported bodies); velocities of the ends in m/s, before and after the
 * node stage, 12 numbers per body: old end A, old end B, new end A, new end B.
 */
final class ModalDamping {

    static final int ENDS = 12;

    /** 1/s per node. */
    final double[] alpha;

    /** Distance from end A over the distance between the ends, per node. */
    final double[] fraction;

    /** {@link #ENDS} numbers per body, m/s. */
    final double[] endVelocity;

    private final int[] ends;
    private final double[] next = new double[3];

    /** @param ends two held nodes per body, -1 where the body is not damped */
    ModalDamping(double[] alpha, double[] fraction, int[] ends) {
        this.alpha = alpha;
        this.fraction = fraction;
        this.ends = ends;
        this.endVelocity = new double[ends.length / 2 * ENDS];
    }

    /** Takes the velocities of the held ends over the last and the coming step; serial, before the node stage. */
    void refresh(NodeStore nodes, SupportPoses poses, double newStep) {
        for (int end = 0; end < ends.length; end++) {
            int node = ends[end];
            if (node >= 0) {
                poses.position(nodes, node, nodes.support[node], next);
                int at = end / 2 * ENDS + end % 2 * 3;
                for (int i = 0; i < 3; i++) {
                    endVelocity[at + i] = nodes.velocity[3 * node + i];
                    endVelocity[at + 6 + i] = (next[i] - nodes.position[3 * node + i]) / newStep;
                }
            }
        }
    }
}
