// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** UTF-8, strictly. */
final class Text {
    private Text() {}

    /** The text of a file; empty, with a fault, where the bytes are not UTF-8. A byte-order mark is dropped. */
    static Optional<String> decode(String file, byte[] bytes, Problems problems) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        try {
            String text = decoder.decode(in).toString();
            return Optional.of(text.startsWith("\uFEFF") ? text.substring(1) : text);
        } catch (CharacterCodingException e) {
            problems.add(file, lineOf(bytes, in.position()), "bytes that are not UTF-8; expected UTF-8 text");
            return Optional.empty();
        }
    }

    private static int lineOf(byte[] bytes, int position) {
        int line = 1;
        for (int i = 0; i < position && i < bytes.length; i++) {
            if (bytes[i] == '\n') {
                line++;
            }
        }
        return line;
    }
}
