// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import reedling.error.ReedlingException;

class SurfaceTest {

    private static final EnumSet<BoxInside.Face> OPEN_TOP = EnumSet.of(BoxInside.Face.HIGH_Z);
    private final double[] normal = new double[3];
    private final double[] second = new double[3];

    private static final List<Surface> SURFACES = List.of(
            new HalfSpace(),
            new Rectangle(0.3, 0.2),
            new BoxInside(0.3, 0.2, 0.4, EnumSet.noneOf(BoxInside.Face.class)),
            new BoxInside(0.3, 0.2, 0.4, OPEN_TOP),
            new BoxInside(0.3, 0.2, 0.4, EnumSet.of(BoxInside.Face.LOW_X, BoxInside.Face.HIGH_Z)),
            new BoxOutside(0.3, 0.2, 0.4),
            new CylinderInside(0.15, 0.4),
            new CylinderInside(0.15, 0.4, true, false),
            new CylinderInside(0.15, 0.4, true, true),
            new CylinderOutside(0.15, 0.4),
            new ConeSheet(0.02, 0.15, 0.2),
            new ConeSheet(0.1, 0, 0.4),
            new ConeSheet(0.15, 0.15, 0.4));

    /** Centres, faces, rims and the ends of the range: chance alone never meets them. */
    private static final double[] SPECIAL = {-0.4, -0.2, -0.15, -0.1, 0, 0.1, 0.15, 0.2, 0.4};

    private static final int POINTS = 2_000;

    @Test
    void normalIsUnitAndLeadsToThePointOfZeroGap() {
        everywhere((surface, p, random) -> {
            for (int facet = 0; facet < surface.facets(); facet++) {
                normalLeadsToZeroGap(surface, facet, p[0], p[1], p[2]);
            }
        });
    }

    @Test
    void nearestGapChangesNoFasterThanThePointMoves() {
        // holds across rims and edges too: a jump there would be a jump in force
        everywhere((surface, p, random) -> {
            double move = random.nextDouble(-0.01, 0.01);
            double before = nearest(surface, p[0], p[1], p[2]);
            double after = nearest(surface, p[0] + move, p[1] - move, p[2] + move);
            assertThat(Math.abs(after - before)).isLessThanOrEqualTo(Math.sqrt(3) * Math.abs(move) + 1e-14);
        });
    }

    @Test
    void grainInACornerOfABoxTouchesThreeFacets() {
        Surface box = new BoxInside(0.3, 0.2, 0.4, OPEN_TOP);
        int touching = 0;
        for (int facet = 0; facet < box.facets(); facet++) {
            touching += box.gap(facet, 0.15 - 0.009, 0.1 - 0.009, -0.2 + 0.009, normal) < 0.01 ? 1 : 0;
        }
        assertThat(box.facets()).isEqualTo(5);
        assertThat(touching).isEqualTo(3);
    }

    @Test
    void edgeOfAnOpenBoxSeenFromOutsideIsOneContact() {
        Surface box = new BoxInside(0.3, 0.2, 0.4, OPEN_TOP);
        double[][] outside = {{0.155, 0.105, 0}, {0.155, 0.105, -0.205}, {0.155, 0.099, 0}, {0.149, 0.105, 0}};
        for (double[] p : outside) {
            int touching = 0;
            for (int facet = 0; facet < box.facets(); facet++) {
                touching += box.gap(facet, p[0], p[1], p[2], normal) < 0.01 ? 1 : 0;
            }
            assertThat(touching).as("contacts at %s", p).isEqualTo(1);
        }
    }

    @Test
    void grainSpilledOverTheRimIsPushedOutwards() {
        Surface box = new BoxInside(0.3, 0.2, 0.4, OPEN_TOP);
        assertThat(box.gap(1, 0.16, 0, 0, normal)).isEqualTo(0.01, within(1e-15));
        assertThat(normal).containsExactly(new double[] {-1, 0, 0}, within(0.0));
        assertThat(box.gap(1, 0.16, 0, 0.21, normal)).isEqualTo(Math.sqrt(2) * 0.01, within(1e-15));
    }

    @Test
    void closedBoxPushesADeepGrainBackInside() {
        Surface box = new BoxInside(0.3, 0.2, 0.4, EnumSet.noneOf(BoxInside.Face.class));
        assertThat(box.gap(1, 0.16, 0, 0, normal)).isEqualTo(-0.01, within(1e-15));
        assertThat(normal).containsExactly(new double[] {1, 0, 0}, within(0.0));
    }

    @Test
    void solidBoxKnowsFaceEdgeCornerAndInside() {
        Surface box = new BoxOutside(2, 2, 2);
        assertThat(box.gap(0, 0.3, 0.2, 1.5, normal)).isEqualTo(0.5);
        assertThat(box.gap(0, 1.3, 1.4, 0, normal)).isEqualTo(0.5, within(1e-15));
        assertThat(box.gap(0, 1.1, 1.1, 1.1, normal)).isEqualTo(0.1 * Math.sqrt(3), within(1e-15));
        assertThat(box.gap(0, 0, -0.9, 0.5, normal)).isEqualTo(-0.1, within(1e-15));
        assertThat(normal).containsExactly(new double[] {0, 1, 0}, within(0.0));
    }

    @Test
    void exactlyOneFacetOfASolidCylinderAnswers() {
        Surface roller = new CylinderOutside(1, 2);
        double[][] points = {
            {2, 0, 0}, {0, 0, 2}, {0, 0, -2}, {2, 0, 2}, {0, 0, 0}, {0.99, 0, 0.5}, {0.2, 0, 0.9}, {1, 0, 1}
        };
        int[] expected = {0, 2, 1, 0, 0, 0, 2, 0};
        for (int k = 0; k < points.length; k++) {
            for (int facet = 0; facet < 3; facet++) {
                double gap = roller.gap(facet, points[k][0], points[k][1], points[k][2], normal);
                boolean answers = gap < Double.POSITIVE_INFINITY;
                assertThat(answers).as("point %d facet %d", k, facet).isEqualTo(facet == expected[k]);
            }
        }
    }

    @Test
    void edgeOfACupSeenFromOutsideIsOneContact() {
        Surface cup = new CylinderInside(0.15, 0.4, true, false);
        double[][] outside = {{0.155, 0, -0.205}, {0.149, 0, -0.205}, {0.155, 0, -0.199}, {0.155, 0, 0.205}};
        for (double[] p : outside) {
            int touching = 0;
            for (int facet = 0; facet < cup.facets(); facet++) {
                touching += cup.gap(facet, p[0], p[1], p[2], normal) < 0.01 ? 1 : 0;
            }
            assertThat(touching).as("contacts at %s", p).isEqualTo(1);
        }
        assertThat(cup.gap(0, 0.145, 0, -0.195, normal)).isEqualTo(0.005, within(1e-15));
        assertThat(cup.gap(1, 0.145, 0, -0.195, normal)).isEqualTo(0.005, within(1e-15));
    }

    /** Rims (3, 0) and (0, 4) half-way up and down: the side of a triangle of 3, 4 and 5. */
    @Test
    void coneKnowsItsSideAndItsRims() {
        Surface cone = new ConeSheet(3, 0, 4);
        assertThat(cone.gap(0, 0, 0, -2, normal)).isEqualTo(2.4, within(1e-15));
        assertThat(normal).containsExactly(new double[] {0.8, 0, 0.6}, within(1e-15));
        assertThat(cone.gap(0, 0, 3, 2, normal)).isEqualTo(2.4, within(1e-15));
        assertThat(normal).containsExactly(new double[] {0, -0.8, -0.6}, within(1e-15));
        assertThat(cone.gap(0, 0, 0, 4, normal)).isEqualTo(2, within(1e-15));
        assertThat(cone.gap(0, 6, 0, -6, normal)).isEqualTo(5, within(1e-15));
        assertThat(normal).containsExactly(new double[] {-0.6, 0, 0.8}, within(1e-15));
    }

    @Test
    void coneOfEqualRadiiIsAPipe() {
        Surface cone = new ConeSheet(0.15, 0.15, 0.4);
        Surface pipe = new CylinderInside(0.15, 0.4);
        everywhere((surface, p, random) -> assertThat(cone.gap(0, p[0], p[1], p[2], normal))
                .isEqualTo(Math.abs(pipe.gap(0, p[0], p[1], p[2], second)), within(1e-14)));
    }

    @Test
    void effectiveRadiusIsTheGrainOnPlanesAndTheHertzLineOnCylinders() {
        assertThat(new HalfSpace().effectiveRadius(0, 0.003)).isEqualTo(0.003);
        assertThat(new CylinderInside(0.1, 1, true, true).effectiveRadius(1, 0.003))
                .isEqualTo(0.003);
        assertThat(new CylinderInside(0.1, 1).effectiveRadius(0, 0.003)).isEqualTo(HertzLine.inBore(0.003, 0.1));
        assertThat(new CylinderOutside(0.1, 1).effectiveRadius(0, 0.003)).isEqualTo(HertzLine.outside(0.003, 0.1));
    }

    @Test
    void wrongMeasuresAreAllReported() {
        assertThatThrownBy(() -> new BoxOutside(-1, 0, Double.NaN))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.findings()).hasSize(3));
        EnumSet<BoxInside.Face> all = EnumSet.allOf(BoxInside.Face.class);
        assertThatThrownBy(() -> new BoxInside(1, 1, 1, all)).hasMessageContaining("open");
    }

    /** One property at many points around every surface; a failure names the seed, which alone gives the same point again. */
    private void everywhere(Property property) {
        for (int k = 0; k < SURFACES.size(); k++) {
            for (long seed = 1; seed <= POINTS; seed++) {
                SplittableRandom random = new SplittableRandom(seed);
                double[] p = {coordinate(random), coordinate(random), coordinate(random)};
                try {
                    property.check(SURFACES.get(k), p, random);
                } catch (AssertionError e) {
                    throw new AssertionError(
                            "surface %d %s, seed %d, point %s: %s"
                                    .formatted(k, SURFACES.get(k), seed, Arrays.toString(p), e.getMessage()),
                            e);
                }
            }
        }
    }

    private static double coordinate(SplittableRandom random) {
        return random.nextInt(4) == 0 ? SPECIAL[random.nextInt(SPECIAL.length)] : random.nextDouble(-0.4, 0.4);
    }

    private void normalLeadsToZeroGap(Surface surface, int facet, double x, double y, double z) {
        double gap = surface.gap(facet, x, y, z, normal);
        assertThat(Math.hypot(Math.hypot(normal[0], normal[1]), normal[2])).isEqualTo(1, within(1e-14));
        if (gap == Double.POSITIVE_INFINITY) {
            return;
        }
        // at half the way the gap is halved and the normal is the same; at the end it vanishes
        double half = step(surface, facet, x, y, z, 0.5 * gap);
        assertThat(half).isEqualTo(0.5 * gap, within(1e-13));
        if (Math.abs(gap) > 1e-3) {
            assertThat(second).containsExactly(normal, within(1e-9));
        }
        // rounding may put the end just past an edge that another facet stands for
        double end = step(surface, facet, x, y, z, gap);
        boolean handedOver = end == Double.POSITIVE_INFINITY;
        double endX = x + gap * normal[0];
        double endY = y + gap * normal[1];
        double endZ = z + gap * normal[2];
        assertThat(handedOver ? nearest(surface, endX, endY, endZ) : end).isEqualTo(0, within(1e-13));
    }

    private double step(Surface surface, int facet, double x, double y, double z, double way) {
        return surface.gap(facet, x + way * normal[0], y + way * normal[1], z + way * normal[2], second);
    }

    private double nearest(Surface surface, double x, double y, double z) {
        double least = Double.POSITIVE_INFINITY;
        for (int facet = 0; facet < surface.facets(); facet++) {
            double gap = surface.gap(facet, x, y, z, second);
            least = Math.min(least, gap);
        }
        return least;
    }

    private interface Property {
        void check(Surface surface, double[] point, SplittableRandom random);
    }
}
