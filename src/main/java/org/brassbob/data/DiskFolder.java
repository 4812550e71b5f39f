// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
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
        if (Files.size(file) > LARGEST_FILE) {
            throw new IOException("larger than " + LARGEST_FILE / (1024 * 1024) + " MB");
        }
        return Optional.of(Files.readAllBytes(file));
    }
}
