// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.feed;

import org.jspecify.annotations.NullMarked;
