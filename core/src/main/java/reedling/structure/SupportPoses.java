// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.List;

/** Where the supports stand at the end of the coming step. Written by one thread between stages, read by all. */
final class SupportPoses {

    private static final int LENGTH = SupportMotion.POSE_LENGTH;

    private final List<SupportMotion> motions;
    private final double[] poses;
    private final double[] one = new double[LENGTH];

    SupportPoses(List<SupportMotion> motions) {
        this.motions = List.copyOf(motions);
        this.poses = new double[motions.size() * LENGTH];
    }

    void moveTo(double time) {
        for (int m = 0; m < motions.size(); m++) {
            motions.get(m).pose(time, one);
            System.arraycopy(one, 0, poses, m * LENGTH, LENGTH);
        }
    }

    /** Position of a node that follows a motion (-1: rests), m. */
    void position(NodeStore nodes, int node, int motion, double[] out) {
        if (motion < 0) {
            System.arraycopy(nodes.position, 3 * node, out, 0, 3);
        } else {
            SpatialRotation.place(poses, motion * LENGTH, nodes.reference, 3 * node, out);
        }
    }

    /** Rotation vector (rad) from a node's orientation to that of a motion (-1: rests). */
    void rotation(NodeStore nodes, int node, int motion, double[] out) {
        if (motion < 0) {
            out[0] = 0;
            out[1] = 0;
            out[2] = 0;
        } else {
            SpatialRotation.between(nodes.orientation, 4 * node, poses, motion * LENGTH + 3, out);
        }
    }

    /** Sets a held node's orientation to the pose's. */
    void orient(NodeStore nodes, int node) {
        int motion = nodes.support[node];
        if (motion >= 0) {
            System.arraycopy(poses, motion * LENGTH + 3, nodes.orientation, 4 * node, 4);
        }
    }
}
