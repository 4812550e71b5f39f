// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * What opening the records came to.
 *
 * @param store null where they could not be opened; then nothing was changed
 * @param message one line for the officer: why not, or what was rescued; empty where all is well
 */
public record Opened(@Nullable Store store, String message) {
    /** The store, where it could be opened. */
    public Optional<Store> opened() {
        return Optional.ofNullable(store);
    }
}
