// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** Digest by which a checkpoint knows its case: SHA-256 of the resolved text. */
final class CaseDigest {

    private CaseDigest() {}

    static String of(String resolvedText) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(resolvedText.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(digest);
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java machine has SHA-256", impossible);
        }
    }
}
