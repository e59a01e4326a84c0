// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/**
 * Passes everything on to a kernel and puts the law's name on what it throws.
 *
 * @param name of the law
 * @param kernel of the law
 */
record NamedKernel(String name, ContactKernel kernel) implements ContactKernel {

    @Override
    public void apply(ContactBlock block) {
        try {
            kernel.apply(block);
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        try {
            return kernel.duration(speed, radius, mass);
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public double dampingRatio() {
        try {
            return kernel.dampingRatio();
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public double reach(double largestRadius) {
        try {
            return kernel.reach(largestRadius);
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public boolean pulls() {
        try {
            return kernel.pulls();
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }

    @Override
    public boolean dashpotMayPull() {
        try {
            return kernel.dashpotMayPull();
        } catch (RuntimeException | LinkageError thrown) {
            throw new LawFault(name, thrown);
        }
    }
}
