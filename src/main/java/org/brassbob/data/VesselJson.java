// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.brassbob.core.vessel.DraughtMark;
import org.brassbob.core.vessel.LiquidClass;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Particulars;
import org.brassbob.core.vessel.Policy;

/** vessel.json: the ship's own figures, and which limit curves she has. */
final class VesselJson {
    static final String FILE = "vessel.json";

    /** The version of the folder's format that is read. */
    private static final int FORMAT = 1;

    /** The content of vessel.json. */
    record Content(
            String id,
            String name,
            Particulars particulars,
            MassPoint lightship,
            double seaDensity,
            List<DraughtMark> draughtMarks,
            Policy policy,
            List<CurveFile> curves,
            List<String> sources) {}

    /** A limit curve's name, its file, and the line that names it. */
    record CurveFile(String name, String file, int line) {}

    private VesselJson() {}

    static Optional<Content> read(byte[] bytes, Problems problems) {
        return Json.read(FILE, bytes, problems).map(root -> content(new JsonReader(FILE, "", root, problems)));
    }

    private static Content content(JsonReader root) {
        double format = root.number("format", 0, 1e6);
        if (!Double.isNaN(format) && format != FORMAT) {
            root.problem(root.line("format"), "format is " + format + "; expected " + FORMAT);
        }
        String id = root.text("id");
        if (!id.isEmpty() && !id.matches("[A-Za-z0-9-]{1,40}")) {
            root.problem(root.line("id"), "id is " + Numbers.shown(id) + "; expected letters, digits and -");
        }
        Content content = new Content(
                id,
                root.text("name"),
                particulars(root.object("particulars")),
                lightship(root.object("lightship")),
                root.number("sea_density_t_m3", 0.9, 1.1),
                marks(root),
                policy(root.object("policy")),
                curves(root),
                sources(root));
        root.rejectUnknown();
        return content;
    }

    private static Particulars particulars(JsonReader json) {
        Particulars particulars = new Particulars(
                json.number("lbp_m", 1, 600),
                json.number("breadth_m", 0.5, 120),
                json.number("depth_m", 0.3, 80),
                json.number("summer_draught_m", 0.1, 60));
        if (particulars.summerDraught() > particulars.depth()) {
            json.problem(json.line("summer_draught_m"), "summer_draught_m is more than depth_m; expected less");
        }
        json.rejectUnknown();
        return particulars;
    }

    private static MassPoint lightship(JsonReader json) {
        MassPoint point = new MassPoint(
                json.number("mass_t", 0.1, 1e6),
                json.number("lcg_m", -100, 700),
                json.number("tcg_m", -60, 60),
                json.number("vcg_m", 0, 100));
        json.rejectUnknown();
        return point;
    }

    private static List<DraughtMark> marks(JsonReader root) {
        List<DraughtMark> marks = new ArrayList<>();
        Set<Double> places = new HashSet<>();
        for (JsonReader mark : root.objects("draught_marks")) {
            DraughtMark made = new DraughtMark(mark.text("name"), mark.number("x_m", -100, 700));
            if (!places.add(made.x())) {
                mark.problem(mark.line(), "two draught marks at x_m " + made.x() + "; expected them apart");
            }
            marks.add(made);
            mark.rejectUnknown();
        }
        return marks;
    }

    private static Policy policy(JsonReader json) {
        Policy policy = new Policy(
                json.number("gm_allowance_m", 0, 10),
                json.optional("list_limit_deg", 0, 45),
                json.optional("trim_min_m", -50, 50),
                json.optional("trim_max_m", -50, 50),
                staleAfter(json.optionalObject("reading_stale_after_h")),
                massIn(json));
        Double least = policy.trimMin();
        Double most = policy.trimMax();
        if (least != null && most != null && least > most) {
            json.problem(json.line("trim_min_m"), "trim_min_m is more than trim_max_m; expected less");
        }
        json.rejectUnknown();
        return policy;
    }

    private static Map<String, Double> staleAfter(JsonReader json) {
        Map<String, Double> hours = new LinkedHashMap<>();
        List<String> kinds = new ArrayList<>(List.of("default", "void"));
        Arrays.stream(LiquidClass.values()).map(LiquidClass::code).forEach(kinds::add);
        for (String kind : kinds) {
            Double value = json.optional(kind, 0, 100_000);
            if (value != null) {
                hours.put(kind, value);
            }
        }
        json.rejectUnknown();
        return hours;
    }

    private static Policy.MassIn massIn(JsonReader json) {
        if (!json.has("mass_in")) {
            return Policy.MassIn.VACUUM;
        }
        String word = json.text("mass_in");
        for (Policy.MassIn choice : Policy.MassIn.values()) {
            if (choice.code().equals(word)) {
                return choice;
            }
        }
        json.problem(json.line("mass_in"), "mass_in is " + Numbers.shown(word) + "; expected vacuum or air");
        return Policy.MassIn.VACUUM;
    }

    private static List<CurveFile> curves(JsonReader root) {
        List<CurveFile> curves = new ArrayList<>();
        Set<String> names = new HashSet<>();
        for (JsonReader curve : root.objects("limit_curves")) {
            CurveFile made = new CurveFile(curve.text("name"), curve.text("file"), curve.line());
            if (!names.add(made.name())) {
                curve.problem(
                        curve.line(), "limit curve " + Numbers.shown(made.name()) + " named twice; expected once");
            }
            if (!made.file().isEmpty() && !made.file().matches("[A-Za-z0-9][A-Za-z0-9._-]*\\.csv")) {
                curve.problem(
                        curve.line("file"),
                        "file is " + Numbers.shown(made.file()) + "; expected the name of a .csv file in this folder");
            }
            curves.add(made);
            curve.rejectUnknown();
        }
        return curves;
    }

    private static List<String> sources(JsonReader root) {
        List<String> sources = new ArrayList<>();
        for (Json item : root.items("sources")) {
            if (item instanceof Json.Words words) {
                sources.add(words.value());
            } else {
                root.problem(item.line(), "a source is not a text; expected texts");
            }
        }
        return sources;
    }
}
