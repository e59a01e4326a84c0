// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.plugins.contact;

import org.jspecify.annotations.NullMarked;
