// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import reedling.structure.Position;

/** Reference frame of a line element as a quaternion: axis 1 along the line, axis 2 = up x axis 1. Stateless. */
final class ElementFrame {

    private ElementFrame() {}

    /** Writes w, x, y, z of the rotation that carries the world axes onto the element axes. */
    static void write(Position a, Position b, Position up, double[] out, int at) {
        double[] e1 = unit(b.x() - a.x(), b.y() - a.y(), b.z() - a.z());
        double[] across = cross(new double[] {up.x(), up.y(), up.z()}, e1);
        if (dot(across, across) < 1e-12 * (up.x() * up.x() + up.y() * up.y() + up.z() * up.z())) {
            across = cross(Math.abs(e1[2]) < 0.9 ? new double[] {0, 0, 1} : new double[] {1, 0, 0}, e1);
        }
        double[] e2 = unit(across[0], across[1], across[2]);
        double[] e3 = cross(e1, e2);
        quaternion(e1, e2, e3, out, at);
    }

    /** From a rotation matrix given by its columns; divides by the largest component, so never by a small number. */
    private static void quaternion(double[] e1, double[] e2, double[] e3, double[] out, int at) {
        double[] q = {
            1 + e1[0] + e2[1] + e3[2], 1 + e1[0] - e2[1] - e3[2], 1 - e1[0] + e2[1] - e3[2], 1 - e1[0] - e2[1] + e3[2]
        };
        double wx = e2[2] - e3[1];
        double wy = e3[0] - e1[2];
        double wz = e1[1] - e2[0];
        double xy = e2[0] + e1[1];
        double xz = e3[0] + e1[2];
        double yz = e3[1] + e2[2];
        double[][] rows = {{q[0], wx, wy, wz}, {wx, q[1], xy, xz}, {wy, xy, q[2], yz}, {wz, xz, yz, q[3]}};
        int largest = 0;
        for (int i = 1; i < 4; i++) {
            largest = q[i] > q[largest] ? i : largest;
        }
        double scale = 1 / Math.sqrt(4 * q[largest]);
        double length = 0;
        for (int i = 0; i < 4; i++) {
            out[at + i] = rows[largest][i] * scale;
            length += out[at + i] * out[at + i];
        }
        for (int i = 0; i < 4; i++) {
            out[at + i] /= Math.sqrt(length);
        }
    }

    private static double[] unit(double x, double y, double z) {
        double length = Math.sqrt(x * x + y * y + z * z);
        return new double[] {x / length, y / length, z / length};
    }

    private static double[] cross(double[] a, double[] b) {
        return new double[] {a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }
}
