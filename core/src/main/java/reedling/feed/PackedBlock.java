// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.Locale;
import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.RangeCheck;
import reedling.error.ReedlingException;
import reedling.particle.RandomStream;

/**
 * A box filled with grains at once, up to a count or a solid fraction.
 *
 * <p>Grains are drawn by the mix, set at random places at reduced size, largest first, then grown to full size while
 * overlapping ones are pushed apart. Every grain lies inside the box; two grains overlap by less than 0.1 % of the
 * smaller radius.
 * <p>Valid for: solid fractions of equal grains up to 0.57 in cubes ten grains wide, 0.59 in cubes twenty wide and
 * 0.60 in cubes thirty wide (measured; the faces of the box keep the packing loose), about 0.01 more for a mix of 4
 * to 7 mm.
 * <p>Cost: 31,000 grains at 0.60 take some ten seconds, half of that fraction less than one (measured, one core).
 * <p>Errors: a box without volume, a fraction that is not between 0 and 0.64, a grain wider than the box; on filling, a
 * packing that does not settle, with the fraction reached.
 * <p>Threads: immutable.
 *
 * @param name as in the case file; also names the random streams
 * @param mix what is filled in
 * @param box where
 * @param amount how much
 * @param velocity of every grain, m/s
 */
public record PackedBlock(String name, LotMix mix, BoxRegion box, Amount amount, Vector3dc velocity) {

    /** Random close packing of equal spheres, from memory; more is not to be had without order. */
    private static final double CLOSEST = 0.64;

    /** Solid fraction of the loose start. */
    private static final double LOOSE_START = 0.28;

    /** Factor on the size when even the loose start finds no room, as in a narrow box. */
    private static final double SHRINK = 0.9;

    private static final int MOST_SHRINKS = 10;

    /**
     * How much to fill in: a number of grains or a solid fraction.
     *
     * @param count grains, or 0 if the fraction decides
     * @param solidFraction volume of the grains over volume of the box, or 0 if the count decides
     */
    public record Amount(int count, double solidFraction) {

        public Amount {
            new RangeCheck("block")
                    .require(
                            count > 0 != solidFraction > 0,
                            "amount",
                            count + " grains, " + solidFraction,
                            "either a count > 0 or a solid fraction > 0",
                            "")
                    .require(!(solidFraction > CLOSEST), "solid fraction", solidFraction, "", "at most " + CLOSEST)
                    .finish();
        }

        public static Amount grains(int count) {
            return new Amount(count, 0);
        }

        public static Amount fraction(double solidFraction) {
            return new Amount(0, solidFraction);
        }
    }

    public PackedBlock {
        velocity = new Vector3d(velocity);
        double widest = 2 * mix.largestRadius();
        new RangeCheck("block." + name)
                .require(!name.isEmpty(), "name", "empty", "a name", "")
                .positive("volume of the box", box.volume(), "m3")
                .require(
                        box.narrowest() >= widest,
                        "narrowest side of the box",
                        box.narrowest(),
                        "m",
                        "at least the widest grain, " + widest + " m")
                .finite("velocity", velocity.length(), "m/s")
                .finish();
    }

    /**
     * Fills the box.
     *
     * @param random stream of the case; the block splits off its own by its name, so the same case gives the same block
     * @throws ReedlingException if the packing does not settle
     */
    public GrainSeeds fill(RandomStream random) {
        RandomStream own = random.split(name);
        DrawnGrains drawn = DrawnGrains.draw(this, own.split("sizes"));
        Spheres spheres = new Spheres(box, drawn.radius());
        double fraction = spheres.solidFraction();
        if (spheres.size() == 0) {
            throw notSettled(amount.solidFraction(), "less than half of one grain");
        }
        if (fraction > CLOSEST) {
            throw notSettled(fraction, "more than random close packing");
        }
        double start = placeLoosely(spheres, fraction, own.split("places"));
        OverlapRemoval removal = new OverlapRemoval(spheres);
        double scale = removal.grow(start);
        double overlap = removal.worstOverlap();
        if (scale < 1 || overlap >= OverlapRemoval.TOLERANCE) {
            String state = "settled up to %.4f, largest overlap at full size %.2f %% of a radius";
            double settled = fraction * scale * scale * scale;
            throw notSettled(fraction, String.format(Locale.ROOT, state, settled, 100 * overlap));
        }
        return seeds(spheres, drawn);
    }

    private double placeLoosely(Spheres spheres, double fraction, RandomStream places) {
        double scale = StrictMath.cbrt(Math.min(1, LOOSE_START / fraction));
        for (int shrink = 0; shrink <= MOST_SHRINKS; shrink++) {
            if (SequentialPlacement.place(spheres, scale, places) == spheres.size()) {
                return scale;
            }
            scale *= SHRINK;
        }
        String state = String.format(Locale.ROOT, "not even placed at %.4f", fraction * scale * scale * scale);
        throw notSettled(fraction, state);
    }

    private GrainSeeds seeds(Spheres spheres, DrawnGrains drawn) {
        GrainSeeds seeds = new GrainSeeds();
        for (int k = 0; k < spheres.size(); k++) {
            int row = seeds.add(spheres.x[k], spheres.y[k], spheres.z[k], spheres.radius[k]);
            int lot = drawn.lot()[k];
            seeds.setKind(row, lot, mix.lot(lot).material());
            seeds.setVelocity(row, velocity.x(), velocity.y(), velocity.z());
        }
        return seeds;
    }

    private ReedlingException notSettled(double asked, String state) {
        String got = String.format(Locale.ROOT, "%.4g, %s", asked, state);
        String remedy = "Ask for less, take a larger box, or fill loosely and let the grains settle.";
        Finding finding = new Finding("block." + name, "solid fraction", got, "a fraction that settles", remedy);
        return new ReedlingException(ExitCode.CASE, finding);
    }
}
