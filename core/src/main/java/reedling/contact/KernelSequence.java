// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** Kernels called one after the other, from one place, so that each is compiled for itself; the strictest speaks for all. */
final class KernelSequence implements ContactKernel {

    private final ContactKernel[] kernels;

    KernelSequence(ContactKernel first, ContactKernel... others) {
        kernels = new ContactKernel[others.length + 1];
        kernels[0] = first;
        System.arraycopy(others, 0, kernels, 1, others.length);
    }

    @Override
    public void apply(ContactBlock block) {
        for (ContactKernel kernel : kernels) {
            kernel.apply(block);
        }
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        double shortest = Double.POSITIVE_INFINITY;
        for (ContactKernel kernel : kernels) {
            shortest = Math.min(shortest, kernel.duration(speed, radius, mass));
        }
        return shortest;
    }

    @Override
    public double dampingRatio() {
        double largest = 0;
        for (ContactKernel kernel : kernels) {
            largest = Math.max(largest, kernel.dampingRatio());
        }
        return largest;
    }

    @Override
    public double reach(double largestRadius) {
        double largest = 0;
        for (ContactKernel kernel : kernels) {
            largest = Math.max(largest, kernel.reach(largestRadius));
        }
        return largest;
    }

    @Override
    public boolean pulls() {
        for (ContactKernel kernel : kernels) {
            if (kernel.pulls()) {
                return true;
            }
        }
        return false;
    }

    @Override
    public boolean dashpotMayPull() {
        return kernels[0].dashpotMayPull();
    }
}
