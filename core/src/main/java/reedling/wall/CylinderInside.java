// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Cylinder seen from inside (drum, tube), about the z axis of its frame and centred on the origin; its ends are open
 * unless closed by flat discs. Facet 0 is the curved side, then come the closed ends, low before high.
 *
 * <p>With both ends closed each facet reaches beyond its edges, so a grain is always pushed inwards. Otherwise side
 * and disc are sheets of no thickness, touched from both sides and at free rims; the edge between side and disc
 * belongs to the side. The effective radius is that of the bore, on the outer side of the sheet too.
 * <p>Errors: radius or length not positive. Threads: immutable.
 *
 * @param radius m
 * @param length extent along z, m
 * @param lowClosed whether a disc closes the end at -z
 * @param highClosed whether a disc closes the end at +z
 */
public record CylinderInside(double radius, double length, boolean lowClosed, boolean highClosed) implements Surface {

    public CylinderInside {
        new RangeCheck("wall.cylinder")
                .positive("radius", radius, "m")
                .positive("length", length, "m")
                .finish();
    }

    /** A tube with two open ends. */
    public CylinderInside(double radius, double length) {
        this(radius, length, false, false);
    }

    @Override
    public int facets() {
        return 1 + (lowClosed ? 1 : 0) + (highClosed ? 1 : 0);
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        double distance = Math.sqrt(x * x + y * y);
        if (facet == 0) {
            return sideGap(x, y, z, distance, normal);
        }
        double sign = facet == 1 && lowClosed ? -1 : 1;
        double inward = 0.5 * length - sign * z;
        if (lowClosed && highClosed) {
            Nearest.along(2, sign, normal);
            return inward;
        }
        Nearest.along(2, inward < 0 ? -sign : sign, normal);
        return distance > radius ? Double.POSITIVE_INFINITY : Math.abs(inward);
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return facet == 0 ? HertzLine.inBore(grainRadius, radius) : grainRadius;
    }

    private double sideGap(double x, double y, double z, double distance, double[] normal) {
        double radialX = distance == 0 ? 1 : x / distance;
        double radialY = distance == 0 ? 0 : y / distance;
        double inward = radius - distance;
        boolean sheet = !(lowClosed && highClosed);
        double past = sheet ? Nearest.beyond(z, 0.5 * length) : 0;
        boolean pastClosedEnd = past > 0 ? highClosed : past < 0 && lowClosed;
        if (!sheet || inward == 0 && past == 0 || pastClosedEnd && inward >= 0) {
            normal[0] = radialX;
            normal[1] = radialY;
            normal[2] = 0;
            return sheet && past != 0 ? Double.POSITIVE_INFINITY : inward;
        }
        return Nearest.normalise(radialX * inward, radialY * inward, -past, 0, 1, normal);
    }
}
