// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/** What a probe of a case is to do. Threads: immutable. */
public interface ProbePlan {

    /** A fresh probe for one run. */
    BulkProbe open();
}
