// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import java.util.List;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.ElementReference;
import reedling.structure.ElementSet;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.ResultColumn;
import reedling.unit.Dimension;

/**
 * Shear-flexible beam of two nodes with one integration point, exact in rotations of any size.
 *
 * <p>Formula: U = L/2 (EA e^2 + GA2 y2^2 + GA3 y3^2 + GJ k1^2 + EI2 k2^2 + EI3 k3^2), forces = -dU/dx exactly. In the
 * frame half-way between the two nodes' frames, with chord g and relative rotation vector theta:
 * e = |g|/L - 1 (chord stretch), y2 = g2/L, y3 = g3/L, k = theta/L. Shear stiffness is the residual bending
 * flexibility value 1/GA2 = 1/(k_s G A) + L^2/(12 EI3), likewise 1/GA3 with EI2: the element is then linearly
 * identical to the exact Timoshenko beam with end loads. The axial force must act along the chord: along the section
 * normal this shear stiffness would make a taut wire unstable beyond N = 12 EI/L^2.
 *
 * <p>Damping: every strain s is replaced by s + beta (s - s_old)/h in the force.
 *
 * <p>Shapes: constants {@link BeamKernel#CONSTANTS} and history 12 doubles per element (strains e, y2, y3, k1, k2, k3
 * and the dashpot forces conjugate to them); slots 12 per element.
 *
 * <p>Valid for small strains and relative rotations below pi per element (keep below 1 rad); not for warping or
 * thin-walled open sections. Straight as meshed: kinks between elements are stress free.
 *
 * <p>Stable step: 2/w (sqrt(1 + x^2) - x), x = beta w/2, with w the largest of the axial, bending and shear, rotary and
 * torsional element frequencies; about 0.82 L/c for slender round wires.
 *
 * <p>Source: J. C. Simo, A finite strain beam formulation, 1985; M. A. Crisfield and G. Jelenic, Objectivity of strain
 * measures in the geometrically exact beam theory, 1999; R. H. MacNeal, A simple quadrilateral shell element, 1978
 * (all from memory). Deviation: chord stretch.
 *
 * <p>Threads: immutable.
 *
 * @param section sizes in m
 * @param material density and moduli
 * @param dampingTime beta, s, >= 0
 * @param inertiaFactor nodal rotary inertia over rho I_p L/2
 */
record BeamLaw(CrossSection section, Material material, double dampingTime, double inertiaFactor)
        implements ElementLaw {

    private static final List<String> HISTORY = List.of(
            "stretch",
            "shear_2",
            "shear_3",
            "twist",
            "curvature_2",
            "curvature_3",
            "dashpot_stretch",
            "dashpot_shear_2",
            "dashpot_shear_3",
            "dashpot_twist",
            "dashpot_curvature_2",
            "dashpot_curvature_3");

    private static final List<ResultColumn> RESULTS = List.of(
            new ResultColumn("axial_force", Dimension.FORCE),
            new ResultColumn("bending_moment", Dimension.MOMENT),
            new ResultColumn("torque", Dimension.MOMENT),
            new ResultColumn("fibre_stress_max", Dimension.PRESSURE),
            new ResultColumn("fibre_stress_min", Dimension.PRESSURE),
            new ResultColumn("stressed_end", Dimension.NUMBER));

    @Override
    public int nodesPerElement() {
        return 2;
    }

    @Override
    public int constantCount() {
        return BeamKernel.CONSTANTS;
    }

    @Override
    public List<String> historyColumns() {
        return HISTORY;
    }

    @Override
    public List<ResultColumn> resultColumns() {
        return RESULTS;
    }

    @Override
    public void reference(ElementReference reference, double[] constants, int at) {
        Position a = reference.nodes().get(0);
        Position b = reference.nodes().get(1);
        double length = a.distance(b) / (1 + reference.prestretch());
        double e = material.youngsModulus();
        double g = material.shearModulus();
        double bending2 = e * section.secondMoment2();
        double bending3 = e * section.secondMoment3();
        double shear = section.shearFactor(material.poissonRatio()) * g * section.area();
        constants[at + BeamKernel.LENGTH] = length;
        constants[at + BeamKernel.INVERSE_LENGTH] = 1 / length;
        constants[at + BeamKernel.STIFFNESS] = e * section.area();
        constants[at + BeamKernel.STIFFNESS + 1] = 1 / (1 / shear + length * length / (12 * bending3));
        constants[at + BeamKernel.STIFFNESS + 2] = 1 / (1 / shear + length * length / (12 * bending2));
        constants[at + BeamKernel.STIFFNESS + 3] = g * section.torsionConstant();
        constants[at + BeamKernel.STIFFNESS + 4] = bending2;
        constants[at + BeamKernel.STIFFNESS + 5] = bending3;
        ElementFrame.write(a, b, reference.up(), constants, at + BeamKernel.FRAME);
        constants[at + BeamKernel.NODE_MASS] = 0.5 * material.density() * section.area() * length;
        constants[at + BeamKernel.NODE_INERTIA] =
                0.5 * inertiaFactor * material.density() * section.polarMoment() * length;
    }

    @Override
    public double nodeMass(double[] constants, int offset) {
        return constants[offset + BeamKernel.NODE_MASS];
    }

    @Override
    public double nodeInertia(double[] constants, int offset) {
        return constants[offset + BeamKernel.NODE_INERTIA];
    }

    @Override
    public double forces(ElementSet set, NodeStore nodes, int first, int last, double step) {
        double rate = step > 0 ? dampingTime / step : 0;
        return BeamKernel.forces(set, nodes.position, nodes.orientation, first, last, rate);
    }

    @Override
    public double strainEnergy(ElementSet set, int first, int last) {
        double sum = 0;
        for (int e = first; e < last; e++) {
            int c = e * BeamKernel.CONSTANTS;
            int s = e * BeamKernel.HISTORY;
            double density = 0;
            for (int i = 0; i < 6; i++) {
                density += set.constants[c + BeamKernel.STIFFNESS + i] * set.history[s + i] * set.history[s + i];
            }
            sum += 0.5 * set.constants[c + BeamKernel.LENGTH] * density;
        }
        return sum;
    }

    @Override
    public double squaredFrequency(ElementSet set, int first, int last) {
        double largest = 0;
        for (int e = first; e < last; e++) {
            largest = Math.max(largest, BeamKernel.squaredFrequency(set, e));
        }
        return largest;
    }

    @Override
    public void results(ElementSet set, int first, int last, double[] rows) {
        for (int e = first; e < last; e++) {
            writeResult(set, e, rows, (e - first) * RESULTS.size());
        }
    }

    /** The moment is linear along the element: M3 = mid +- Q2 L/2, M2 = mid -+ Q3 L/2 at end 1 and 2. */
    private void writeResult(ElementSet set, int e, double[] rows, int at) {
        int c = e * BeamKernel.CONSTANTS + BeamKernel.STIFFNESS;
        int s = e * BeamKernel.HISTORY;
        double half = 0.5 * set.constants[e * BeamKernel.CONSTANTS + BeamKernel.LENGTH];
        double axial = set.constants[c] * set.history[s];
        double shear2 = set.constants[c + 1] * set.history[s + 1] * half;
        double shear3 = set.constants[c + 2] * set.history[s + 2] * half;
        double mid2 = set.constants[c + 4] * set.history[s + 4];
        double mid3 = set.constants[c + 5] * set.history[s + 5];
        double stress1 = section.bendingStress(mid2 - shear3, mid3 + shear2);
        double stress2 = section.bendingStress(mid2 + shear3, mid3 - shear2);
        int end = stress2 > stress1 ? 1 : 0;
        double m2 = end == 0 ? mid2 - shear3 : mid2 + shear3;
        double m3 = end == 0 ? mid3 + shear2 : mid3 - shear2;
        double bending = Math.max(stress1, stress2);
        rows[at] = axial;
        rows[at + 1] = Math.sqrt(m2 * m2 + m3 * m3);
        rows[at + 2] = set.constants[c + 3] * set.history[s + 3];
        rows[at + 3] = axial / section.area() + bending;
        rows[at + 4] = axial / section.area() - bending;
        rows[at + 5] = end;
    }
}
