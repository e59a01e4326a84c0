// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** Kernels called one after the other, from one place, so that each is compiled for itself; the first speaks for all. */
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
        return kernels[0].duration(speed, radius, mass);
    }

    @Override
    public double dampingRatio() {
        return kernels[0].dampingRatio();
    }

    @Override
    public boolean dashpotMayPull() {
        return kernels[0].dashpotMayPull();
    }
}
