// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.structure.SupportMotion;
import reedling.wall.Motion;
import reedling.wall.Pose;

/**
 * A support that moves as a wall does. The wall's pose turns about a pivot, the support's about the origin: translation =
 * pivot + shift - R pivot. Threads: immutable.
 */
record DrivenSupport(Motion motion) implements SupportMotion {

    @Override
    public void pose(double time, double[] pose) {
        Pose found = new Pose();
        motion.pose(time, found);
        // R p = p + 2 q x (q x p + w p), q the vector part of the quaternion
        double x = found.pivotX;
        double y = found.pivotY;
        double z = found.pivotZ;
        double cx = found.qy * z - found.qz * y + found.qw * x;
        double cy = found.qz * x - found.qx * z + found.qw * y;
        double cz = found.qx * y - found.qy * x + found.qw * z;
        pose[0] = found.shiftX - 2 * (found.qy * cz - found.qz * cy);
        pose[1] = found.shiftY - 2 * (found.qz * cx - found.qx * cz);
        pose[2] = found.shiftZ - 2 * (found.qx * cy - found.qy * cx);
        pose[3] = found.qw;
        pose[4] = found.qx;
        pose[5] = found.qy;
        pose[6] = found.qz;
    }
}
