// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

/** A small invented ship in memory: a box barge of 40 × 8 m with a shaped tank, a pair of tables, a void, and a tank in a tank. */
final class SmallShip {
    static final String ROUND =
            """
            # invented
            #: trim_m=0.1
            #: list_deg=0.5
            tank,at,kind,value,temp_c,density_t_m3,water_m,note
            wb-p,2026-05-01T06:00:00Z,sounding,1.2,,,,
            wb-s,2026-05-01T06:05:00Z,sounding,1.25,,,,
            fo,2026-05-01T06:10:00Z,ullage,1.1,40,,0.05,
            lo,2026-05-01T06:15:00Z,percent,50,,,,
            coff,2026-05-01T06:20:00Z,sounding,0,,,,
            """;

    private SmallShip() {}

    static MemoryFolder folder() {
        return MemoryFolder.empty()
                .with("vessel.json", VESSEL)
                .with("hydrostatics.csv", HYDROSTATICS)
                .with("gm.csv", "displacement_t,gm_required_m\n100,0.3\n900,0.4\n")
                .with("kn.csv", "displacement_t,kn_10deg_m,kn_20deg_m,flooding_deg\n200,0.9,1.6,40\n600,0.6,1.2,\n")
                .with("weights.csv", "name,mass_t,lcg_m,tcg_m,vcg_m,mass_u_pct\ndeck cargo,60,20,0,3.5,2\n")
                .with("liquids.csv", LIQUIDS)
                .with("tanks.csv", TANKS)
                .with("tanks/wb-p.sounding.csv", soundings())
                .with("tanks/wb-p.volume.csv", volumes(-2))
                .with("tanks/wb-s.sounding.csv", soundings())
                .with("tanks/wb-s.volume.csv", volumes(2))
                .with("tanks/fo.shape.csv", box(4, 10, -3, 3, 0.2, 2.4))
                .with("tanks/lo.shape.csv", box(6, 8, -1, 1, 0.5, 1.5))
                .with("hull.shape.csv", box(0, 40, 0, 4, 0, 3))
                .with("tanks/coff.shape.csv", box(10, 10.6, -3, 3, 0.2, 2.4));
    }

    private static final String VESSEL =
            """
            {
              "format": 1,
              "id": "barge",
              "name": "Mudlark",
              "particulars": { "lbp_m": 40, "breadth_m": 8, "depth_m": 3, "summer_draught_m": 2.2 },
              "lightship": { "mass_t": 150, "lcg_m": 19.5, "tcg_m": 0, "vcg_m": 1.8 },
              "sea_density_t_m3": 1.025,
              "draught_marks": [ { "name": "aft", "x_m": 1 }, { "name": "forward", "x_m": 39 } ],
              "policy": { "gm_allowance_m": 0.1, "list_limit_deg": 3, "trim_min_m": -0.5, "trim_max_m": 1,
                          "reading_stale_after_h": { "default": 24, "void": 12, "fuel-oil": 6 }, "mass_in": "vacuum" },
              "limit_curves": [ { "name": "intact", "file": "gm.csv" } ],
              "sources": [ "invented" ]
            }
            """;

    private static final String LIQUIDS =
            """
            liquid,name,class,density_t_m3,reference_temp_c,expansion
            sw,sea water,sea-water,1.025,,
            hfo,fuel oil,fuel-oil,0.96,15,petroleum
            lube,lube oil,lube-oil,0.9,15,petroleum-lubricant
            dry,nothing,none,1.025,,none
            """;

    private static final String TANKS =
            """
            tank,name,liquid,may_hold,walk,gauge,pipe_x_m,pipe_y_m,pipe_foot_z_m,pipe_length_m,capacity_m3,fill_limit_pct,residue_m3,use,pair,encloses,steel_pct,rate_m3_h,space
            wb-p,WB P,sw,,1,sounding,20,-2,0,3,40,100,0.5,fixed,wb-s,,,50,tank
            wb-s,WB S,sw,,2,sounding,20,2,0,3,40,100,0.5,fixed,wb-p,,,50,
            fo,FUEL,hfo,,3,ullage,4.5,0.2,0.2,2.8,75.2,95,0.2,consumable,,lo,0,20,tank
            lo,LUBE,lube,,4,remote,,,,,4,90,0,consumable,,,0,,tank
            coff,COFFERDAM,dry,,5,sounding,10.3,0,0.2,3,7.92,,0.1,fixed,,,,,void
            """;

    private static final String HYDROSTATICS = hydrostatics();

    /** A box of 40 × 8 m: closed form. */
    private static String hydrostatics() {
        StringBuilder csv =
                new StringBuilder("draught_m,displacement_t,lcb_m,lcf_m,kmt_m,mct_tm_per_cm,tpc_t_per_cm,kb_m\n");
        for (int i = 1; i <= 10; i++) {
            double t = 0.3 * i;
            double volume = 320 * t;
            double km = t / 2 + 8 * 8 / (12 * t);
            double mct = 1.025 * (8 * Math.pow(40, 3) / 12) / 4000;
            csv.append(String.format(
                    java.util.Locale.ROOT, "%.2f,%.3f,20,20,%.4f,%.4f,3.28,%.3f%n", t, volume * 1.025, km, mct, t / 2));
        }
        return csv.toString();
    }

    /** 10 × 2 × 2 m upright at every trim and heel of the grid: enough to be read. */
    private static String soundings() {
        StringBuilder csv = new StringBuilder("sounding_m,volume_m3,trim_m,heel_deg\n");
        for (int trim = 0; trim <= 1; trim++) {
            for (int heel = -2; heel <= 2; heel += 2) {
                for (int s = 0; s <= 4; s++) {
                    csv.append(s * 0.5)
                            .append(',')
                            .append(s * 10)
                            .append(',')
                            .append(trim)
                            .append(',')
                            .append(heel)
                            .append('\n');
                }
            }
        }
        return csv.toString();
    }

    private static String volumes(double tcg) {
        StringBuilder csv = new StringBuilder("volume_m3,lcg_m,tcg_m,vcg_m,fs_m4\n");
        for (int i = 0; i <= 8; i++) {
            csv.append(i * 5)
                    .append(",25,")
                    .append(tcg)
                    .append(',')
                    .append(i * 0.125)
                    .append(",6.667\n");
        }
        return csv.toString();
    }

    static String box(double aft, double forward, double port, double starboard, double bottom, double top) {
        StringBuilder csv = new StringBuilder("x_m,loop,y_m,z_m\n");
        for (double x : new double[] {aft, forward}) {
            csv.append(x).append(",1,").append(port).append(',').append(bottom).append('\n');
            csv.append(x)
                    .append(",1,")
                    .append(starboard)
                    .append(',')
                    .append(bottom)
                    .append('\n');
            csv.append(x)
                    .append(",1,")
                    .append(starboard)
                    .append(',')
                    .append(top)
                    .append('\n');
            csv.append(x).append(",1,").append(port).append(',').append(top).append('\n');
        }
        return csv.toString();
    }
}
