// SPDX-License-Identifier: Apache-2.0
package reedling.error;

/**
 * One thing that is wrong, in the house form {@code <where> <what>: is <got>, expected <expected>. <remedy>}.
 *
 * @param where file and line, or step, time and entity; never empty
 * @param what the key, quantity or file concerned
 * @param got the value found, with its unit
 * @param expected the accepted values or range, with unit
 * @param remedy what the reader should do, a full sentence
 */
public record Finding(String where, String what, String got, String expected, String remedy) {

    @Override
    public String toString() {
        String subject = what.isEmpty() ? where : where + " " + what;
        String range = expected.isEmpty() ? "" : ", expected " + expected;
        return subject + ": is " + got + range + "." + (remedy.isEmpty() ? "" : " " + remedy);
    }
}
