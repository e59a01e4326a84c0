// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

/** One thing that the contract asks of a contact law. */
interface Check {

    /** A few words, the same for every law. */
    String name();

    /** Tries the law. What it throws is a finding too. */
    Outcome run(Subject subject);
}
