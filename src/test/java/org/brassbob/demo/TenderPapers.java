// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/** The demo tender's own figures, what she carries, and the schedule of her tanks. */
final class TenderPapers {
    static final String VESSEL =
            """
            {
              "format": 1,
              "id": "dabchick",
              "name": "Fenland Dabchick",
              "particulars": { "lbp_m": 38.0, "breadth_m": 9.2, "depth_m": 3.6, "summer_draught_m": 2.8 },
              "lightship": { "mass_t": 318.0, "lcg_m": 15.1, "tcg_m": 0.0, "vcg_m": 3.05 },
              "sea_density_t_m3": 1.025,
              "draught_marks": [ { "name": "aft", "x_m": 0.5 }, { "name": "forward", "x_m": 36.5 } ],
              "policy": {
                "gm_allowance_m": 0.15,
                "list_limit_deg": 3.0, "trim_min_m": -0.3, "trim_max_m": 1.2,
                "reading_stale_after_h": { "default": 24, "void": 72 }
              },
              "limit_curves": [ { "name": "harbour", "file": "kg-limit-harbour.csv" } ],
              "sources": [
                "Demo data: the ship, her tanks, tables and light ship are invented; no real ship is described.",
                "Tables of tanks and hydrostatics: written by org.brassbob.demo.TenderYard, each from a formula; no booklet stands behind them.",
                "KG limit, harbour: KM less 1.20 m, invented."
              ]
            }
            """;

    static final String LIQUIDS =
            """
            liquid,name,class,density_t_m3,reference_temp_c,expansion
            sw,Sea water ballast,sea-water,1.025,,none
            fw,Fresh water,fresh-water,1,,none
            cargo,Gas oil cargo,cargo,0.842,15,petroleum
            mgo,Marine gas oil,gas-oil,0.848,15,petroleum
            dry,Nothing: should read dry,none,1.025,,none
            """;

    static final String WEIGHTS =
            """
            name,mass_t,lcg_m,tcg_m,vcg_m,mass_u_pct,vcg_u_m
            Crew and stores,4,5,0,5.1,10,0.3
            Hoses and gear on deck,6,24,0.4,4.4,10,0.3
            Constant,5,16,0,3,20,0.5
            """;

    /** Id, name, liquid, gauge, pipe x, y and upper end, then as tanks.csv from the fill limit on; in the order of the walk. */
    static final String TANKS =
            """
            fp,F PEAK,sw,sounding,32.3,0,3.6,100,0.1,fixed,,30,tank
            c1-s,CARGO 1 S,cargo,ullage,20.6,1.8,3.9,97,0.3,fixed,c1-p,80,tank
            c2-s,CARGO 2 S,cargo,ullage,12.2,1.8,3.9,97,0.3,fixed,c2-p,80,tank
            fo-s,FUEL S,mgo,sounding,6.4,2.6,3.6,90,0.1,consumable,fo-p,6,tank
            fw,FRESH WATER,fw,sounding,4.5,-1.4,3.6,95,0.05,consumable,,6,tank
            fo-p,FUEL P,mgo,sounding,6.4,-2.6,3.6,90,0.1,consumable,fo-s,6,tank
            db-c,DB C,sw,sounding,12.4,0.5,3.6,100,0.5,fixed,,30,tank
            c2-p,CARGO 2 P,cargo,ullage,12.2,-1.8,3.9,97,0.3,fixed,c2-s,80,tank
            cof,COFFERDAM,dry,sounding,19.8,0.4,3.6,100,0.05,fixed,,5,void
            c1-p,CARGO 1 P,cargo,ullage,20.6,-1.8,3.9,97,0.3,fixed,c1-s,80,tank
            """;

    private TenderPapers() {}
}
