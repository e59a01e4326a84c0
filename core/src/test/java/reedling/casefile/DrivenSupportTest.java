// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.assertj.core.data.Offset;
import org.joml.Quaterniond;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import reedling.structure.SupportMotion;
import reedling.wall.Oscillating;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Turning;

class DrivenSupportTest {

    private static final Vector3d POINT = new Vector3d(0.3, -0.2, 0.5);

    private final double[] pose = new double[SupportMotion.POSE_LENGTH];

    private Vector3d placed(Vector3d rest) {
        Quaterniond turn = new Quaterniond(pose[4], pose[5], pose[6], pose[3]);
        return turn.transform(new Vector3d(rest)).add(pose[0], pose[1], pose[2]);
    }

    private SupportMotion turning() {
        return new DrivenSupport(new Turning(POINT, new Vector3d(0, 0, 1), Math.PI, Timing.always()));
    }

    @Test
    void pointsOfTheAxisOfARotationStayWhereTheyAre() {
        turning().pose(0.37, pose);
        assertThat(placed(POINT).distance(POINT)).isLessThan(1e-15);
    }

    @Test
    void aQuarterTurnTakesTheEastOfTheAxisToItsNorth() {
        turning().pose(0.5, pose);
        Vector3d found = placed(new Vector3d(POINT).add(0.1, 0, 0.7));
        assertThat(found.distance(new Vector3d(POINT).add(0, 0.1, 0.7))).isLessThan(1e-15);
    }

    @Test
    void aVibrationOnlyShifts() {
        Stroke stroke = new Stroke(new Vector3d(0, 3, 0), 0.002, 0);
        new DrivenSupport(Oscillating.harmonic(stroke, 10, Timing.always())).pose(0.025, pose);
        assertThat(pose).containsExactly(new double[] {0, 0.002, 0, 1, 0, 0, 0}, Offset.offset(1e-17));
    }
}
