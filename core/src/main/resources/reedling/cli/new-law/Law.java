package site.laws;

import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.ContactRow;
import reedling.contact.PerContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * Normal force between elastic spheres with a dashpot of a given damping ratio. Replace it by your own.
 *
 * <pre>
 * a = sqrt(R* d)                     radius of contact, m
 * F = 4/3 E* a d                     N
 * k = 2 E* a                         N/m, the slope of F
 * c = 2 zeta sqrt(k m*)              N s/m
 * t = 2.868266 (m*^2 / (R* E*^2 v))^(1/5),  v^2 = v_n^2 + 4/5 F d / m*     s, how long an impact lasts
 * </pre>
 *
 * <p>Where: d overlap (m); R*, m* effective radius (m) and mass (kg); E* contact modulus (Pa); v_n closing speed (m/s).
 * Source: Hertz, On the contact of elastic solids, 1882; Johnson, Contact Mechanics, 1985.
 */
final class @Class@Law implements ContactLaw {

    private final double dampingRatio;

    @Class@Law(double dampingRatio) {
        this.dampingRatio = dampingRatio;
    }

    /** Called once for each material pair: compute here what does not change. */
    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        // The convenient way: one contact after the other.
        return new OneContact(pair.contactModulus(), dampingRatio).asKernel(Stage.NORMAL, historyColumn, 0);
        // The way to full speed, the same law for whole blocks of contacts; put it in place of the line above:
        // return new @Class@Block(pair.contactModulus(), dampingRatio);
    }

    private record OneContact(double modulus, double dampingRatio) implements PerContactLaw {

        @Override
        public void contact(ContactRow row) {
            double overlap = row.overlap();
            double area = Math.sqrt(row.effectiveRadius() * overlap);
            double stiffness = 2 * modulus * area;
            double force = 2.0 / 3 * stiffness * overlap;
            row.contactRadius(area);
            row.elasticForce(force);
            row.stiffness(stiffness);
            row.damping(2 * dampingRatio * Math.sqrt(stiffness * row.effectiveMass()));
            double mass = row.effectiveMass();
            double speed = Math.sqrt(row.closing() * row.closing() + 0.8 * force * overlap / mass);
            row.duration(duration(speed, row.effectiveRadius(), mass));
            if (row.energyDue()) {
                row.addStoredEnergy(0.4 * force * overlap);
            }
        }

        @Override
        public double duration(double speed, double radius, double mass) {
            return @Class@Block.impact(modulus, speed, radius, mass);
        }

        @Override
        public double dampingRatio() {
            return dampingRatio;
        }
    }
}
