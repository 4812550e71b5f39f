// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** A vessel folder on disk. */
public final class DiskFolder implements FolderSource {
    /** Files of a vessel folder lie in it or in {@code tanks/}. */
    private static final int DEPTH = 2;

    private final Path folder;

    public DiskFolder(Path folder) {
        this.folder = folder;
    }

    @Override
    public List<String> paths() throws IOException {
        try (Stream<Path> files = Files.walk(folder, DEPTH)) {
            return files.filter(Files::isRegularFile)
                    .map(f -> folder.relativize(f).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        }
    }

    @Override
    public Optional<byte[]> bytes(String path) throws IOException {
        Path file = folder.resolve(path);
        if (!Files.isRegularFile(file)) {
            return Optional.empty();
        }
        return Optional.of(content(file));
    }

    /**
     * The content of a file, or of anything else that can be read to an end.
     *
     * @throws IOException if it can't be read, or is larger than {@link #LARGEST_FILE}; a device without end is only read so far
     */
    static byte[] content(Path file) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(LARGEST_FILE + 1);
            if (bytes.length > LARGEST_FILE) {
                throw new IOException("larger than " + LARGEST_FILE / (1024 * 1024) + " MB");
            }
            return bytes;
        }
    }
}
