// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;

/** Her papers: what stands in the files as it is. */
final class HeronPapers {
    /** The round: forward to aft on the port side, back up the starboard side, then below. */
    static final List<String> WALK = List.of(
            "chain", "fp", "bowthr", "hyd", "dtc", "echo", "db1-c", "db1-p", "w1-p", "hop2-p", "db2-p", "w2-p", "db3-p",
            "w3-p", "db4-p", "fo1-p", "coff", "go1-p", "fw-p", "rudder", "ap", "fw-s", "go1-s", "fo1-s", "db4-s",
            "w3-s", "db3-s", "w2-s", "hop2-s", "db2-s", "w1-s", "db1-s", "duct", "fo-set", "fo-srv", "go-day",
            "lo-stor", "lo-sump", "urea", "bilge", "sludge", "grey", "black");

    static final String LIQUIDS =
            """
            # Demo data, invented; not a real ship
            liquid,name,class,density_t_m3,reference_temp_c,expansion
            sw,sea water,sea-water,1.025,15,none
            fw,fresh water,fresh-water,1,15,none
            vlsfo,low-sulphur fuel,fuel-oil,0.962,15,petroleum
            mgo,gas oil,gas-oil,0.852,15,petroleum
            lube,lube oil,lube-oil,0.898,15,petroleum-lubricant
            hyd,hydraulic oil,hydraulic-oil,0.875,15,petroleum-lubricant
            grey,grey water,grey-water,1,15,none
            black,black water,black-water,1.01,15,none
            oily,bilge water,oily-water,1,15,none
            sludge,oily sludge,oily-water,0.98,15,none
            urea,urea solution,urea,1.09,20,none
            dry,should be dry,none,1.025,15,none
            """;

    static final String WEIGHTS =
            """
            # Demo data, invented; not a real ship
            name,mass_t,lcg_m,tcg_m,vcg_m,mass_u_pct,vcg_u_m
            cargo in hold 1 (forward),1330,56.6,-0.03,5.45,1,0.15
            cargo in hold 2 (aft),1210,32.4,0,5.35,1,0.15
            cargo on the hatches,480,45.5,0,10.3,2,0.2
            stores and spares,35,12,0,8.4,10,0.3
            crew and effects,6,9,0,12.5,10,0.3
            constant,45,38,0,5.5,20,0.5
            """;

    private HeronPapers() {}

    static String vesselJson(boolean withCurve) {
        String curve = withCurve ? "{ \"name\": \"intact\", \"file\": \"gm-required-intact.csv\" }" : "";
        return """
                {
                  "format": 1,
                  "id": "heron",
                  "name": "Saltmarsh Heron",
                  "particulars": { "lbp_m": 84.0, "breadth_m": 15.4, "depth_m": 8.2, "summer_draught_m": 5.9 },
                  "lightship": { "mass_t": 1920.0, "lcg_m": 36.1, "tcg_m": 0.0, "vcg_m": 6.05 },
                  "sea_density_t_m3": 1.025,
                  "draught_marks": [ { "name": "aft", "x_m": 1.2 }, { "name": "forward", "x_m": 82.5 } ],
                  "policy": {
                    "gm_allowance_m": 0.10,
                    "list_limit_deg": 3.0, "trim_min_m": -0.3, "trim_max_m": 2.0,
                    "reading_stale_after_h": { "default": 24, "void": 24 }
                  },
                  "limit_curves": [ %s ],
                  "sources": [
                    "Demo ship, invented: no such vessel exists, and no figure here may be used for one",
                    "hull and tanks drawn for the demo; every table tabulated from those shapes",
                    "gm-required-intact.csv: worked out from her own kn.csv by the general criteria, 2008 IS Code part A 2.2.1 to 2.2.4"
                  ]
                }
                """
                .formatted(curve);
    }

    static String plain(double value) {
        BigDecimal rounded = new BigDecimal(value).setScale(4, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }
}
