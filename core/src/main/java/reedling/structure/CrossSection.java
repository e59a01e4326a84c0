// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Cross-section of a line element in its own axes: axis 1 along the line, axes 2 and 3 across.
 *
 * <p>Source: shear factors from G. R. Cowper, The shear coefficient in Timoshenko's beam theory, 1966; torsion constant
 * of the rectangle is the usual engineering fit (from memory, within 0.4 %).
 */
public sealed interface CrossSection extends Section {

    /** Area A, m2. */
    double area();

    /** Second moment about axis 2, integral of z^2, m4. */
    double secondMoment2();

    /** Second moment about axis 3, integral of y^2, m4. */
    double secondMoment3();

    /** Torsion constant J_t, m4. */
    double torsionConstant();

    /** Timoshenko shear factor at a Poisson ratio, dimensionless. */
    double shearFactor(double poissonRatio);

    /** Largest fibre stress of the bending moments about axes 2 and 3, >= 0, Pa. */
    double bendingStress(double moment2, double moment3);

    /** Largest width of the section, m. */
    double thickness();

    /** Polar second moment I_p = I2 + I3, m4. */
    default double polarMoment() {
        return secondMoment2() + secondMoment3();
    }

    /**
     * Solid round section.
     *
     * @param diameter m, > 0
     */
    record SolidCircle(double diameter) implements CrossSection {

        @Override
        public double area() {
            return Math.PI * diameter * diameter / 4;
        }

        @Override
        public double secondMoment2() {
            return Math.PI * diameter * diameter * diameter * diameter / 64;
        }

        @Override
        public double secondMoment3() {
            return secondMoment2();
        }

        @Override
        public double torsionConstant() {
            return polarMoment();
        }

        @Override
        public double shearFactor(double poissonRatio) {
            return 6 * (1 + poissonRatio) / (7 + 6 * poissonRatio);
        }

        @Override
        public double bendingStress(double moment2, double moment3) {
            return Math.sqrt(moment2 * moment2 + moment3 * moment3) * diameter / (2 * secondMoment2());
        }

        @Override
        public double thickness() {
            return diameter;
        }

        @Override
        public double contactRadius() {
            return diameter / 2;
        }
    }

    /**
     * Round tube.
     *
     * @param outerDiameter m
     * @param innerDiameter m, 0 < inner < outer
     */
    record Tube(double outerDiameter, double innerDiameter) implements CrossSection {

        @Override
        public double area() {
            return Math.PI * (outerDiameter * outerDiameter - innerDiameter * innerDiameter) / 4;
        }

        @Override
        public double secondMoment2() {
            return area() * (outerDiameter * outerDiameter + innerDiameter * innerDiameter) / 16;
        }

        @Override
        public double secondMoment3() {
            return secondMoment2();
        }

        @Override
        public double torsionConstant() {
            return polarMoment();
        }

        @Override
        public double shearFactor(double poissonRatio) {
            double m2 = innerDiameter * innerDiameter / (outerDiameter * outerDiameter);
            double sum = (1 + m2) * (1 + m2);
            return 6 * (1 + poissonRatio) * sum / ((7 + 6 * poissonRatio) * sum + (20 + 12 * poissonRatio) * m2);
        }

        @Override
        public double bendingStress(double moment2, double moment3) {
            return Math.sqrt(moment2 * moment2 + moment3 * moment3) * outerDiameter / (2 * secondMoment2());
        }

        @Override
        public double thickness() {
            return outerDiameter;
        }

        @Override
        public double contactRadius() {
            return outerDiameter / 2;
        }
    }

    /**
     * Solid rectangle.
     *
     * @param width along axis 2, m
     * @param height along axis 3, m
     */
    record Rectangle(double width, double height) implements CrossSection {

        @Override
        public double area() {
            return width * height;
        }

        @Override
        public double secondMoment2() {
            return width * height * height * height / 12;
        }

        @Override
        public double secondMoment3() {
            return height * width * width * width / 12;
        }

        @Override
        public double torsionConstant() {
            double a = Math.max(width, height);
            double c = Math.min(width, height);
            double ratio = c / a;
            double fourth = ratio * ratio * ratio * ratio;
            return (1.0 / 3 - 0.21 * ratio * (1 - fourth / 12)) * a * c * c * c;
        }

        @Override
        public double shearFactor(double poissonRatio) {
            return 10 * (1 + poissonRatio) / (12 + 11 * poissonRatio);
        }

        @Override
        public double bendingStress(double moment2, double moment3) {
            return Math.abs(moment2) * height / (2 * secondMoment2())
                    + Math.abs(moment3) * width / (2 * secondMoment3());
        }

        @Override
        public double thickness() {
            return Math.max(width, height);
        }

        @Override
        public double contactRadius() {
            return Math.min(width, height) / 2;
        }
    }
}
