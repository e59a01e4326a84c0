// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.Arrays;

/** Start of a run in the moving frame of the supports, so that no jolt rings through the wires. */
final class SupportStart {

    private SupportStart() {}

    /** Sets velocity and spin of every node of a body to those of the motion its first driven node follows. */
    static void apply(Mesh mesh, SupportPoses poses, double time, double step) {
        NodeStore nodes = mesh.nodes();
        int[] motion = new int[nodes.count];
        for (Body body : mesh.bodies()) {
            int last = body.firstNode() + body.nodeCount();
            int driver = -1;
            for (int n = body.firstNode(); n < last && driver < 0; n++) {
                driver = nodes.support[n];
            }
            Arrays.fill(motion, body.firstNode(), last, driver);
        }
        double[] start = new double[3 * nodes.count];
        poses.moveTo(time);
        for (int n = 0; n < nodes.count; n++) {
            place(nodes, poses, n, motion[n], start);
        }
        poses.moveTo(time + step);
        double[] end = new double[3 * nodes.count];
        double[] rotation = new double[3];
        for (int n = 0; n < nodes.count; n++) {
            if (motion[n] >= 0) {
                place(nodes, poses, n, motion[n], end);
                poses.rotation(nodes, n, motion[n], rotation);
                for (int i = 0; i < 3; i++) {
                    nodes.velocity[3 * n + i] = (end[3 * n + i] - start[3 * n + i]) / step;
                    nodes.spin[3 * n + i] = rotation[i] / step;
                }
            }
        }
    }

    private static void place(NodeStore nodes, SupportPoses poses, int node, int motion, double[] all) {
        double[] one = new double[3];
        poses.position(nodes, node, motion, one);
        System.arraycopy(one, 0, all, 3 * node, 3);
    }
}
