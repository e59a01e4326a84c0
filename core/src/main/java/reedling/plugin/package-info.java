// SPDX-License-Identifier: Apache-2.0
/** What plugins say of themselves, and the loader that finds them. */
@NullMarked
package reedling.plugin;

import org.jspecify.annotations.NullMarked;
