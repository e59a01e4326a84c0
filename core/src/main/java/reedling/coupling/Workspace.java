// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.contact.ContactBlock;

/** What one worker needs while it works through tasks: a block of contact rows and a row under construction. */
final class Workspace {

    private final ContactBlock block = new ContactBlock();
    private final SurfaceRow row = new SurfaceRow();

    ContactBlock block() {
        return block;
    }

    SurfaceRow row() {
        return row;
    }
}
