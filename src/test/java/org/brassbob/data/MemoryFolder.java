// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** A vessel folder in memory, whose files can be changed one at a time. */
public final class MemoryFolder implements FolderSource {
    private final Map<String, byte[]> files;

    private MemoryFolder(Map<String, byte[]> files) {
        this.files = files;
    }

    /** A copy of a folder on disk, without its rounds. */
    public static MemoryFolder of(Path folder) throws IOException {
        DiskFolder disk = new DiskFolder(folder);
        Map<String, byte[]> files = new TreeMap<>();
        for (String path : disk.paths()) {
            if (!path.startsWith("rounds/")) {
                files.put(path, disk.bytes(path).orElseThrow());
            }
        }
        return new MemoryFolder(files);
    }

    public static MemoryFolder empty() {
        return new MemoryFolder(new TreeMap<>());
    }

    /** The same folder with one file changed or added. */
    public MemoryFolder with(String path, String text) {
        return with(path, text.getBytes(StandardCharsets.UTF_8));
    }

    public MemoryFolder with(String path, byte[] bytes) {
        Map<String, byte[]> changed = new TreeMap<>(files);
        changed.put(path, bytes);
        return new MemoryFolder(changed);
    }

    public MemoryFolder without(String path) {
        Map<String, byte[]> changed = new TreeMap<>(files);
        changed.remove(path);
        return new MemoryFolder(changed);
    }

    public String text(String path) {
        return new String(bytes(path).orElseThrow(), StandardCharsets.UTF_8);
    }

    @Override
    public List<String> paths() {
        return new ArrayList<>(files.keySet());
    }

    @Override
    public Optional<byte[]> bytes(String path) {
        return Optional.ofNullable(files.get(path)).map(byte[]::clone);
    }
}
