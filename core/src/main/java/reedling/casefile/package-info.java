// SPDX-License-Identifier: Apache-2.0
/**
 * TOML case files: from text to checked, immutable specifications in SI units, with every finding at once.
 *
 * <p>A file passes through {@link reedling.casefile.CaseFile}: syntax ({@code TomlTree}), assignments from the command
 * line ({@code Assignments}), keys against their declarations ({@code CaseKeys}, {@code ValueReader}), records
 * ({@code *Keys} classes), then the checks that need more than one part ({@code *Checks}).
 */
@NullMarked
package reedling.casefile;

import org.jspecify.annotations.NullMarked;
