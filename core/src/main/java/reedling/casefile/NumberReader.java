// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import reedling.unit.Dimension;
import reedling.unit.Quantity;
import reedling.unit.QuantityException;

/** Reads numbers and quantities, checking dimension and range. */
final class NumberReader {

    private final Findings findings;

    NumberReader(Findings findings) {
        this.findings = findings;
    }

    Optional<Double> quantity(Node node, ValueType.Quantity type, String path) {
        return si(node, type, path).filter(value -> {
            boolean inside = type.range().holds(value) && Double.isFinite(value);
            if (!inside) {
                String range = Double.isFinite(value) ? type.range().text(type.dimension()) : "a finite number";
                findings.error(
                        node.place(), path, node.shown(), range, type.range().advice());
            }
            return inside;
        });
    }

    private Optional<Double> si(Node node, ValueType.Quantity type, String path) {
        Object value = node instanceof Node.Scalar scalar ? scalar.value() : node;
        if (value instanceof Number number) {
            return Optional.of(number.doubleValue());
        }
        if (value instanceof String text) {
            try {
                return Optional.of(Quantity.read(text, type.dimension()));
            } catch (QuantityException fault) {
                findings.error(node.place(), path, fault);
                return Optional.empty();
            }
        }
        String remedy = type.dimension() == Dimension.NUMBER
                ? "Write a number."
                : "Write a number in " + type.dimension().siUnit() + ", or text with a unit.";
        findings.error(node.place(), path, node.shown(), TypeText.of(type), remedy);
        return Optional.empty();
    }

    Optional<Long> whole(Node node, ValueType.Whole type, String path) {
        if (!(node instanceof Node.Scalar scalar) || !(scalar.value() instanceof Long value)) {
            findings.error(
                    node.place(), path, node.shown(), TypeText.of(type), "Write it without point, unit and quotes.");
            return Optional.empty();
        }
        if (value < type.minimum() || value > type.maximum()) {
            findings.error(node.place(), path, node.shown(), TypeText.of(type), "Check the value.");
            return Optional.empty();
        }
        return Optional.of(value);
    }

    Optional<SearchMargin> margin(Node node, ValueType.Margin type, String path) {
        boolean text = node instanceof Node.Scalar scalar && scalar.value() instanceof String;
        ValueType.Quantity part = text
                ? new ValueType.Quantity(Dimension.LENGTH, type.length())
                : new ValueType.Quantity(Dimension.NUMBER, type.fraction());
        return quantity(node, part, path).map(value -> new SearchMargin(value, !text));
    }
}
