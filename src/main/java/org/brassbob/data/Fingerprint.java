// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;

/**
 * What a ship's data were, in 64 hexadecimal digits: SHA-256 over the files of the folder in the order of their paths, each as its
 * path in UTF-8, a zero byte, its own SHA-256 in lower-case hexadecimal, and a line feed. Rounds have no part in it.
 */
final class Fingerprint {
    private final Map<String, String> byFile = new TreeMap<>();

    void add(String path, byte[] bytes) {
        byFile.put(path, HexFormat.of().formatHex(sha256().digest(bytes)));
    }

    /** The SHA-256 of each file. */
    Map<String, String> byFile() {
        return Map.copyOf(byFile);
    }

    String whole() {
        MessageDigest digest = sha256();
        byFile.forEach((path, hash) -> {
            digest.update(path.getBytes(StandardCharsets.UTF_8));
            digest.update((byte) 0);
            digest.update(hash.getBytes(StandardCharsets.US_ASCII));
            digest.update((byte) '\n');
        });
        return HexFormat.of().formatHex(digest.digest());
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
