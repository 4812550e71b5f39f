// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

/**
 * The corrected GM against its limit.
 *
 * @param curve name of the limit curve; empty where the ship has none
 * @param gmRequired least GM allowed (m); NaN without a curve
 * @param margin corrected GM less that (m); NaN without a curve
 * @param band how far above the limit caution reaches (m)
 * @param state how it is judged
 */
public record Margin(String curve, double gmRequired, double margin, double band, State state) {
    /** The verdict. */
    public enum State {
        /** At or above the band, and nothing known speaks against it. */
        CLEAR("clear"),
        /** Above the limit but within the band, or resting on figures that are old or missing. */
        CAUTION("caution"),
        /** Below the limit, or not to be judged by the curve. */
        BELOW("below");

        private final String code;

        State(String code) {
            this.code = code;
        }

        /** The word used in output. */
        public String code() {
            return code;
        }
    }
}
