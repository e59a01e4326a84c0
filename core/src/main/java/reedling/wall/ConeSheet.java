// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Conical sheet of no thickness (funnel, hopper), open at both ends, about the z axis of its frame and centred on the
 * origin; touched from both sides and at its rims.
 *
 * <p>The gap is the distance to the nearest point of the sheet and never negative, so a grain is pushed back to the side
 * its centre is on. A grain touches at one point only: not for openings that a single grain closes. The stiffness is that
 * of a flat wall, since the curvature changes along the cone: too soft inside by part of grain radius over cone radius.
 * <p>Errors: length not positive, a radius negative, both zero. Threads: immutable.
 *
 * @param lowRadius radius at -z, m
 * @param highRadius radius at +z, m
 * @param length extent along z, m
 */
public record ConeSheet(double lowRadius, double highRadius, double length) implements Surface {

    public ConeSheet {
        new RangeCheck("wall.cone")
                .notNegative("low radius", lowRadius, "m")
                .notNegative("high radius", highRadius, "m")
                .positive("larger radius", Math.max(lowRadius, highRadius), "m")
                .positive("length", length, "m")
                .finish();
    }

    @Override
    public int facets() {
        return 1;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        double distance = Math.sqrt(x * x + y * y);
        double radialX = distance == 0 ? 1 : x / distance;
        double radialY = distance == 0 ? 0 : y / distance;
        // nearest point of the generating line, from the low to the high rim, in the half plane of the point
        double across = highRadius - lowRadius;
        double fromLow = z + 0.5 * length;
        double along = (distance - lowRadius) * across + fromLow * length;
        double part = Math.clamp(along / (across * across + length * length), 0, 1);
        double toRadial = lowRadius + part * across - distance;
        double toAxial = part * length - fromLow;
        double squared = toRadial * toRadial + toAxial * toAxial;
        if (squared == 0) {
            double slant = 1 / Math.sqrt(across * across + length * length);
            normal[0] = radialX * length * slant;
            normal[1] = radialY * length * slant;
            normal[2] = -across * slant;
            return 0;
        }
        return Nearest.normalise(radialX * toRadial, radialY * toRadial, toAxial, 2, 1, normal);
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return grainRadius;
    }
}
