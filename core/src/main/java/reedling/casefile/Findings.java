// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import reedling.error.Finding;
import reedling.unit.QuantityException;
import reedling.unit.Spelling;

/** Collects what is wrong and what is doubtful while a case is read. Confined to the reading thread. */
final class Findings {

    private record Located(Place place, Finding finding) {}

    private final List<Located> errors = new ArrayList<>();
    private final List<Located> cautions = new ArrayList<>();
    private boolean incomplete;

    /** From here on missing keys and names are not reported: the syntax reader dropped parts of the file. */
    void markIncomplete() {
        incomplete = true;
    }

    boolean incomplete() {
        return incomplete;
    }

    void error(Place place, String what, String got, String expected, String remedy) {
        add(errors, place, new Finding(place.where(), what, got, expected, remedy));
    }

    void error(Place place, String what, QuantityException fault) {
        add(errors, place, fault.at(place.where(), what));
    }

    /** A key nobody declared. */
    void unknown(Place place, String what, String name, List<String> known) {
        String remedy = Spelling.nearest(name, known)
                .map(near -> "Did you mean " + near + "?")
                .orElse("Remove it or correct it.");
        error(place, what, "an unknown key", "one of " + String.join(", ", known), remedy);
    }

    /** A key that must be there; silent if the syntax reader dropped parts of the file. */
    void missing(Place place, String what, String expected, String meaning) {
        if (!incomplete) {
            error(place, what, "missing", expected, meaning);
        }
    }

    /** Something that may be meant, but rarely is. */
    void caution(Place place, String what, String got, String expected, String remedy) {
        add(cautions, place, new Finding(place.where(), what, got, expected, remedy));
    }

    private static void add(List<Located> list, Place place, Finding finding) {
        list.add(new Located(place, finding));
    }

    boolean none() {
        return errors.isEmpty();
    }

    /** Errors in file order. */
    List<Finding> errors() {
        return inFileOrder(errors);
    }

    /** Cautions in file order. */
    List<Finding> cautions() {
        return inFileOrder(cautions);
    }

    private static List<Finding> inFileOrder(List<Located> list) {
        return list.stream()
                .sorted(Comparator.comparing(Located::place))
                .map(Located::finding)
                .toList();
    }
}
