// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.List;

/**
 * Force law of one kind of element. Immutable; its kernels are called by several threads on ranges that do not overlap.
 *
 * <p>All numbers of an element live in the flat arrays of its {@link ElementSet}: constants (reference geometry and
 * stiffness), history (what the next step needs of this one) and slots (6 numbers per element node: force then moment
 * ON the node, world frame). Kernels read nodes and write their own elements' history and slots, nothing else, and do
 * not allocate.
 */
public interface ElementLaw {

    /** Nodes of one element. */
    int nodesPerElement();

    /** Doubles per element in {@link ElementSet#constants}. */
    int constantCount();

    /** Names of the doubles per element in {@link ElementSet#history}, saved in checkpoints. */
    List<String> historyColumns();

    /** Numbers written by {@link #results}. */
    List<ResultColumn> resultColumns();

    /** Cross-section. */
    Section section();

    /** Damping time beta of the strain-rate damping, s. */
    double dampingTime();

    /** Writes the constants of one element. Serial, once. */
    void reference(ElementReference reference, double[] constants, int offset);

    /** Mass the element gives each of its nodes, kg. */
    double nodeMass(double[] constants, int offset);

    /** Scalar rotary inertia the element gives each of its nodes, kg m2. */
    double nodeInertia(double[] constants, int offset);

    /**
     * Forces and moments of elements {@code first <= e < last} into their slots; stores strains in the history.
     *
     * @param step time since the last call, s; 0 where there is none, which leaves strain-rate damping out
     * @return energy taken by strain-rate damping over that time, J: sum of 1/2 (old + new dashpot) . strain change
     */
    double forces(ElementSet set, NodeStore nodes, int first, int last, double step);

    /** Strain energy of a range at the positions of the last {@link #forces} call, J. */
    double strainEnergy(ElementSet set, int first, int last);

    /**
     * Largest squared natural frequency of a single free element of the range, 1/s2, at the strains of the last
     * {@link #forces} call: an upper bound of the mesh's, because masses are lumped element by element.
     *
     * <p>Source: B. Irons and G. Treharne, A bound theorem in eigenvalues and its practical applications, 1971.
     */
    double squaredFrequency(ElementSet set, int first, int last);

    /**
     * Stress resultants for output at the strains of the last {@link #forces} call.
     *
     * @param rows one row of {@link #resultColumns} numbers per element, starting at 0 with element {@code first}
     */
    void results(ElementSet set, int first, int last, double[] rows);
}
