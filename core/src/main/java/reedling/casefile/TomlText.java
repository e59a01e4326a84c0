// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** Writes a case back as TOML 1.0: assignments from the command line included, comments lost. */
final class TomlText {

    private TomlText() {}

    static String quoted(String text) {
        StringBuilder out = new StringBuilder("\"");
        for (char sign : text.toCharArray()) {
            switch (sign) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\n' -> out.append("\\n");
                case '\t' -> out.append("\\t");
                default -> out.append(sign < ' ' || sign == 127 ? String.format("\\u%04x", (int) sign) : sign);
            }
        }
        return out.append('"').toString();
    }

    static String key(String key) {
        return key.matches("[A-Za-z0-9_-]+") ? key : quoted(key);
    }

    /** The whole tree: plain values first, then a header for each table. */
    static String write(Node.Table root) {
        StringBuilder out = new StringBuilder();
        table(root, "", out);
        return out.toString();
    }

    private static void table(Node.Table table, String path, StringBuilder out) {
        table.entries().forEach((name, node) -> {
            if (!headed(node)) {
                out.append(key(name)).append(" = ").append(node.toml()).append('\n');
            }
        });
        table.entries().forEach((name, node) -> {
            String inner = path.isEmpty() ? key(name) : path + "." + key(name);
            if (node instanceof Node.Table nested) {
                out.append("\n[").append(inner).append("]\n");
                table(nested, inner, out);
            } else if (headed(node)) {
                for (Node item : ((Node.Sequence) node).items()) {
                    out.append("\n[[").append(inner).append("]]\n");
                    table((Node.Table) item, inner, out);
                }
            }
        });
    }

    private static boolean headed(Node node) {
        return node instanceof Node.Table
                || (node instanceof Node.Sequence list
                        && !list.items().isEmpty()
                        && list.items().stream().allMatch(Node.Table.class::isInstance));
    }
}
