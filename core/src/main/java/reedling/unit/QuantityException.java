// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import reedling.error.Finding;

/** A text that is no quantity of the wanted dimension; whoever knows file and line turns it into a finding. */
public final class QuantityException extends RuntimeException {

    private final String got;
    private final String expected;
    private final String remedy;

    QuantityException(String got, String expected, String remedy) {
        super("is " + got + ", expected " + expected + ". " + remedy);
        this.got = got;
        this.expected = expected;
        this.remedy = remedy;
    }

    /** The same fault with its place: file and line, and the key concerned. */
    public Finding at(String where, String what) {
        return new Finding(where, what, got, expected, remedy);
    }
}
