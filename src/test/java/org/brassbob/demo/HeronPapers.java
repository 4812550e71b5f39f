// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/** The demo coaster's own figures and what she carries. */
final class HeronPapers {
    static final String VESSEL =
            """
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
              "limit_curves": [ { "name": "intact", "file": "gm-required-intact.csv" } ],
              "sources": [
                "Demo data: the ship, her lines, tanks, light ship and cargo are invented; no real ship is described.",
                "Shapes of hull and tanks: written by org.brassbob.demo.HeronYard from invented lines; no booklet stands behind them.",
                "Calibration tables, hydrostatics and cross curves: made from those shapes by 'tabulate'.",
                "GM required, intact: worked out from those cross curves by the general criteria, 2008 IS Code (Res. MSC.267(85)) part A 2.2, no flooding angle taken into account."
              ]
            }
            """;

    static final String WEIGHTS =
            """
            name,mass_t,lcg_m,tcg_m,vcg_m,mass_u_pct,vcg_u_m
            Hold 1 bagged cargo,1120,59.2,0.02,4.75,0.5,0.1
            Hold 2 general cargo,1360,36.6,-0.01,5.05,0.5,0.1
            Deck cargo on hatch covers,595,47.5,0.05,11.35,2,0.15
            Lashings and dunnage,14,46,0,9.8,10,0.3
            Crew and effects,6,12,0,13.5,10,0.3
            Provisions and stores,18,10.5,-0.4,10.2,10,0.3
            Spare gear and constant,42,30,0.3,7.4,20,0.5
            """;

    private HeronPapers() {}
}
