// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
import java.util.List;
import java.util.Optional;

/** Where the files of a vessel folder come from. */
public interface FolderSource {
    /** The largest file that is read (bytes): far above any table of a ship. */
    int LARGEST_FILE = 32 * 1024 * 1024;

    /**
     * The paths of all files, relative, with forward slashes.
     *
     * @throws IOException if the folder can't be listed
     */
    List<String> paths() throws IOException;

    /**
     * The content of a file; empty where there is no such file.
     *
     * @throws IOException if it can't be read, or is larger than {@link #LARGEST_FILE}
     */
    Optional<byte[]> bytes(String path) throws IOException;
}
