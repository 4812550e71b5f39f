// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.working;

/** Receives the steps of a calculation as it takes them. */
public interface Working {
    /** Records nothing. */
    Working OFF = new Working() {
        @Override
        public boolean recording() {
            return false;
        }

        @Override
        public void step(Step step) {
            // Nobody asked.
        }
    };

    /** Whether steps are kept: a calculation asks before it makes one. */
    boolean recording();

    /** Takes a step. A later step of the same figure replaces an earlier one, as the last pass of an iteration does. */
    void step(Step step);
}
