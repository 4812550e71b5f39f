// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.brassbob.core.vessel.Tank;

/** Checks what tanks say of each other: pairs must be mutual, and what a tank encloses must exist, have a shape, and not enclose it. */
final class TankRelations {
    private final CsvTable csv;
    private final Map<String, Tank> byId = new HashMap<>();
    private final Set<String> named;

    TankRelations(CsvTable csv, List<Tank> tanks) {
        this.csv = csv;
        this.named = new HashSet<>(TanksCsv.ids(csv));
        tanks.forEach(t -> byId.put(t.id(), t));
    }

    void check() {
        Map<String, String> enclosedBy = new HashMap<>();
        for (Tank tank : byId.values()) {
            checkPair(tank);
            for (String inner : tank.encloses()) {
                checkEnclosed(tank, inner);
                String other = enclosedBy.put(inner, tank.id());
                if (other != null) {
                    problem(tank, "encloses names " + inner + ", which another tank encloses too; expected one");
                }
            }
        }
    }

    private void checkPair(Tank tank) {
        String pair = tank.pair();
        if (pair == null) {
            return;
        }
        Tank other = byId.get(pair);
        if (!named.contains(pair) || pair.equals(tank.id())) {
            problem(tank, "pair is " + Numbers.shown(pair) + "; expected the id of another tank");
        } else if (other != null && !tank.id().equals(other.pair())) {
            problem(
                    tank,
                    "pair is " + pair + ", whose own pair is " + Numbers.shown(String.valueOf(other.pair()))
                            + "; expected " + tank.id());
        }
    }

    private void checkEnclosed(Tank tank, String inner) {
        Tank other = byId.get(inner);
        if (!named.contains(inner) || inner.equals(tank.id())) {
            problem(tank, "encloses names " + Numbers.shown(inner) + "; expected the id of another tank");
        } else if (other != null && !other.encloses().isEmpty()) {
            problem(tank, "encloses names " + inner + ", which encloses a tank itself; expected one level");
        } else if (other != null && tank.shape() != null && other.shape() == null) {
            problem(
                    tank,
                    "encloses names " + inner + ", which has no shape to take out; expected tanks/" + inner
                            + ".shape.csv");
        }
    }

    private void problem(Tank tank, String message) {
        csv.problems().add(TanksCsv.FILE, tank.origin().line(0), message);
    }
}
