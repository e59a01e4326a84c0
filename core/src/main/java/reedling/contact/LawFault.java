// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** Something that a contact law threw while a run called it, with the law's name. */
public final class LawFault extends RuntimeException {

    private final String law;

    LawFault(String law, Throwable cause) {
        super("contact law " + law + " threw " + cause, cause);
        this.law = law;
    }

    /** Name of the law. */
    public String law() {
        return law;
    }

    /** What a law threw in words, with the place in its code. */
    public static String words(Throwable thrown) {
        StackTraceElement[] trace = thrown.getStackTrace();
        return "throwing " + thrown + (trace.length == 0 ? "" : " at " + trace[0]);
    }
}
