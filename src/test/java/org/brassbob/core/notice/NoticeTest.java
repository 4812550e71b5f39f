// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.notice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class NoticeTest {
    @ParameterizedTest
    @CsvSource({"36.5, 36.5", "36, 36", "0.12345, 0.123", "0.1235000001, 0.124", "1000, 1000", "-0.25, -0.25", "1e-9, 0"
    })
    void numbersAreShownToThreeDecimalsWithoutIdleZeros(double value, String shown) {
        Notice notice = Notice.of(NoticeCode.NEGATIVE_GM, "ship", value);
        assertTrue(notice.text().startsWith("corrected GM is " + shown + " m:"), notice::text);
    }

    @Test
    void valuesGoWhereTheyBelong() {
        assertEquals(
                "the reading is 30.5 h old, the ship's limit is 24 h: the last value stays and the state is at best caution",
                Notice.of(NoticeCode.READING_STALE, "wb1", 30.5, 24.0).text());
        assertTrue(Notice.of(NoticeCode.TRIM_BEYOND_LIMIT, "ship", 2.5, Double.NEGATIVE_INFINITY, 2.0)
                .text()
                .contains("-Infinity to 2 m"));
    }

    @ParameterizedTest
    @EnumSource(NoticeCode.class)
    void everySentenceIsOneLineAndCountsItsValuesFromZero(NoticeCode code) {
        assertFalse(code.sentence().contains("\n"));
        Object[] values = {"<0>", "<1>", "<2>"};
        String text = Notice.of(code, "x", values).text();
        assertFalse(text.contains("{"), text);
        for (int i = 1; i < values.length; i++) {
            if (text.contains("<" + i + ">")) {
                assertTrue(text.contains("<" + (i - 1) + ">"), text);
            }
        }
    }

    @Test
    void whatIsOldMissingOrInDoubtHoldsTheStateAtCaution() {
        Set<NoticeCode> holding = new HashSet<>();
        Arrays.stream(NoticeCode.values()).filter(NoticeCode::holdsAtCaution).forEach(holding::add);
        assertEquals(
                Set.of(
                        NoticeCode.READING_STALE,
                        NoticeCode.VOID_NOT_READ,
                        NoticeCode.VOID_NOT_DRY,
                        NoticeCode.OUTSIDE_HYDROSTATICS_EDGE,
                        NoticeCode.NOT_SETTLED,
                        NoticeCode.NO_LIMIT_CURVE),
                holding);
        assertTrue(holding.stream().noneMatch(c -> c.severity() == Severity.NOTE));
    }

    @Test
    void severitiesWeighInThisOrder() {
        assertEquals(
                List.of("note", "caution", "stop"),
                Arrays.stream(Severity.values()).map(Severity::code).toList());
    }
}
