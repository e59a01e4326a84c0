package site.laws;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * The law for a block of contacts, as arrays: no calls, no objects, a loop that the compiler can work with. The vectors of
 * jdk.incubator.vector, eight rows at a time, are the next step; DEVELOPERS.md of Reedling says how.
 */
record @Class@Block(double modulus, double dampingRatio) implements ContactKernel {

    private static final double SMALLEST = 1e-40; // m, keeps quotients finite in rows that do not touch

    @Override
    public void apply(ContactBlock block) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r++) {
            double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
            double mass = c[at(Column.EFFECTIVE_MASS) + r];
            double overlap = Math.max(c[at(Column.OVERLAP) + r], SMALLEST);
            double area = Math.sqrt(radius * overlap);
            double stiffness = 2 * modulus * area;
            double force = 2.0 / 3 * stiffness * overlap;
            c[at(Column.CONTACT_RADIUS) + r] = area;
            c[at(Column.ELASTIC_FORCE) + r] = force;
            c[at(Column.STIFFNESS) + r] = stiffness;
            c[at(Column.DAMPING) + r] = 2 * dampingRatio * Math.sqrt(stiffness * mass);
            if (c[at(Column.TOUCH) + r] > 0) {
                double closing = c[at(Column.CLOSING) + r];
                double speed = Math.sqrt(closing * closing + 0.8 * force * overlap / mass);
                block.reportDuration(impact(modulus, speed, radius, mass));
            }
            if (block.energyDue()) {
                c[at(Column.STORED_ENERGY) + r] = c[at(Column.TOUCH) + r] * 0.4 * force * overlap;
            }
        }
    }

    /** How long an impact lasts, s. */
    static double impact(double modulus, double speed, double radius, double mass) {
        return 2.868266 * Math.pow(mass * mass / (radius * modulus * modulus * speed), 0.2);
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        return impact(modulus, speed, radius, mass);
    }
}
