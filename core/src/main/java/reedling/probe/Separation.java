// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/**
 * What came out of a screen, kg, of grain that should pass (undersize) and grain that should go over (product).
 *
 * <p>Source: mass balance; the words are those of screening practice, no source.
 *
 * @param undersizePassed undersize through the deck
 * @param productPassed product through the deck
 * @param undersizeOver undersize over the deck
 * @param productOver product over the deck
 */
public record Separation(double undersizePassed, double productPassed, double undersizeOver, double productOver) {

    /** Part of the undersize that passed: the screening efficiency. */
    public double undersizeRecovery() {
        return undersizePassed / (undersizePassed + undersizeOver);
    }

    /** Part of the product that passed. */
    public double productLoss() {
        return productPassed / (productPassed + productOver);
    }

    /** Undersize left in what went over, as part of that. */
    public double undersizeInOver() {
        return undersizeOver / (undersizeOver + productOver);
    }

    /** Product in what passed, as part of that: misplaced product. */
    public double productInPassed() {
        return productPassed / (undersizePassed + productPassed);
    }
}
