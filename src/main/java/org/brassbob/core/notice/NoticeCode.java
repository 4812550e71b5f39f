// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.notice;

/** Every notice that an assessment can raise, with its weight and its English sentence. */
public enum NoticeCode {
    READING_STALE(
            Severity.CAUTION,
            "the reading is {0} h old, the ship's limit is {1} h: the last value stays and the state is at best caution"),
    READING_MISSING(
            Severity.CAUTION,
            "no reading: taken at {0} m3, the level between residue and fill limit that gives the lowest corrected GM"),
    VOID_NOT_READ(Severity.CAUTION, "this void was not sounded: taken as dry, and the state is at best caution"),
    VOID_NOT_DRY(Severity.STOP, "this void should be dry and holds {0} m3: find out why before anything is pumped"),
    PIPE_DRY(
            Severity.NOTE,
            "the pipe reads dry, yet up to {0} m3 could lie out of its reach: taken at {1} m3, the less favourable end"),
    PIPE_BRIM_FULL(
            Severity.NOTE,
            "the pipe reads brim-full, yet the tank could hold from {0} m3 up: taken at {1} m3, the less favourable end"),
    LONGER_THAN_PIPE(Severity.CAUTION, "the reading of {0} m is longer than the pipe, whose reference height is {1} m"),
    OUTSIDE_TABLE_EDGE(
            Severity.CAUTION,
            "trim {0} m, list {1}° and reading {2} m lie outside the sounding table: its nearest edge was taken"),
    OUTSIDE_TABLE_SHAPE(
            Severity.NOTE,
            "trim {0} m, list {1}° and reading {2} m lie outside the sounding table: the tank's shape served"),
    ABOVE_CAPACITY(Severity.CAUTION, "the reading states {0} m3, the tank holds {1} m3: taken as full"),
    ABOVE_FILL_LIMIT(Severity.CAUTION, "{0} m3 is above the fill limit of {1} m3"),
    NO_TEMPERATURE(
            Severity.NOTE,
            "no temperature taken: the density at 15 °C was used, which states the mass a little high when warm"),
    DENSITY_OUT_OF_RANGE(
            Severity.CAUTION,
            "{0} t/m3 at 15 °C lies outside the groups of the petroleum volume-correction rule: not corrected for temperature"),
    FREE_WATER(Severity.CAUTION, "{0} m3 of water lies under the oil: counted at {1} t/m3 and as a second surface"),
    OUTSIDE_HYDROSTATICS_EDGE(
            Severity.STOP,
            "displacement {0} t lies outside the hydrostatic table: its nearest row was taken, and the figures can't be relied on"),
    OUTSIDE_HYDROSTATICS_HULL(
            Severity.NOTE, "displacement {0} t lies outside the hydrostatic table: worked out from the hull's shape"),
    TRIM_OUTSIDE_HYDROSTATICS(
            Severity.CAUTION, "trim {0} m lies outside the hydrostatic table: its nearest trim was taken"),
    NOT_SETTLED(
            Severity.CAUTION,
            "trim and list did not settle to 1 mm: observe them; the last pass, trim {0} m and list {1}°, was taken"),
    NO_LIMIT_CURVE(Severity.STOP, "the ship's data has no limit curve: the margin can't be judged"),
    OUTSIDE_LIMIT_CURVE(
            Severity.STOP, "displacement {0} t lies outside the limit curve ({1} to {2} t): judged as below the limit"),
    BELOW_LIMIT(
            Severity.STOP,
            "corrected GM {0} m is below the required {1} m: the approved booklet and the master's judgement stand above this aid"),
    NEGATIVE_GM(Severity.STOP, "corrected GM is {0} m: the ship lolls; find the cause before correcting a list"),
    LOLL_UNKNOWN(
            Severity.CAUTION, "the hydrostatic table gives no KB: the angle of loll and the list can't be worked out"),
    LIST_BEYOND_LIMIT(Severity.CAUTION, "list {0}° is beyond the ship's limit of {1}°"),
    TRIM_BEYOND_LIMIT(Severity.CAUTION, "trim {0} m is outside the ship's limits of {1} to {2} m"),
    DRAUGHT_BEYOND_SUMMER(Severity.CAUTION, "mean draught {0} m is deeper than the summer draught of {1} m");

    private final Severity severity;
    private final String sentence;

    NoticeCode(Severity severity, String sentence) {
        this.severity = severity;
        this.sentence = sentence;
    }

    /** Whether the margin's state is at best caution while this stands: what it rests on is old, missing or in doubt. */
    public boolean holdsAtCaution() {
        return switch (this) {
            case READING_STALE, VOID_NOT_READ, VOID_NOT_DRY, OUTSIDE_HYDROSTATICS_EDGE, NOT_SETTLED, NO_LIMIT_CURVE ->
                true;
            default -> false;
        };
    }

    public Severity severity() {
        return severity;
    }

    /** The English sentence, with {0}, {1} … where the values go. */
    public String sentence() {
        return sentence;
    }
}
