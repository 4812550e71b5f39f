// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Optional;

/** Held while the records are open; the system lets go of it when the process ends, however it ends. */
final class FolderLock implements AutoCloseable {
    private final FileChannel channel;

    private FolderLock(FileChannel channel) {
        this.channel = channel;
    }

    /**
     * Empty where somebody else holds it.
     *
     * @throws IOException if the lock file can't be made or written
     */
    static Optional<FolderLock> take(Path file) throws IOException {
        FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        boolean held = false;
        try {
            FileLock lock = channel.tryLock();
            held = lock != null;
        } catch (OverlappingFileLockException e) {
            // Held by this very process.
            held = false;
        } finally {
            if (!held) {
                channel.close();
            }
        }
        return held ? Optional.of(new FolderLock(channel)) : Optional.empty();
    }

    @Override
    public void close() {
        try {
            channel.close();
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }
}
