// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * The schedule of the demo coaster's tanks, in the order of the sounding walk: from the bow aft along the starboard side, back along
 * the port side, then down into the engine room. The pipe's place and the height of its upper end are given; its foot follows from the
 * bottom of the tank.
 */
final class HeronSchedule {
    static final String LIQUIDS =
            """
            liquid,name,class,density_t_m3,reference_temp_c,expansion
            sw,Sea water ballast,sea-water,1.025,,none
            fw,Fresh water,fresh-water,1,,none
            hfo,Heavy fuel oil,fuel-oil,0.982,15,petroleum
            lsfo,Low-sulphur fuel oil,fuel-oil,0.935,15,petroleum
            mgo,Marine gas oil,gas-oil,0.845,15,petroleum
            lo,Lubricating oil,lube-oil,0.895,15,petroleum-lubricant
            hyd,Hydraulic oil,hydraulic-oil,0.875,15,petroleum-lubricant
            grey,Grey water,grey-water,1,,none
            black,Black water,black-water,1.01,,none
            oily,Oily bilge water,oily-water,0.99,,none
            sludge,Oil residue (sludge),oily-water,0.95,,none
            urea,Urea solution 40 %,urea,1.112,,none
            dry,Nothing: should read dry,none,1.025,,none
            """;

    /** As tanks.csv, but with the height of the pipe's upper end in place of its foot and length, and no capacity. */
    static final String TANKS =
            """
            tank,name,liquid,may_hold,gauge,pipe_x_m,pipe_y_m,pipe_top_z_m,fill_limit_pct,residue_m3,use,pair,encloses,steel_pct,rate_m3_h,space
            fp,F PEAK,sw,,sounding,79.5,0,8.2,100,0.8,fixed,,,2.5,150,tank
            v-chain,CHAIN LKR,dry,,sounding,76.4,0.4,8.2,100,0.1,fixed,,,0,10,void
            v-thruster,BOW THR RM,dry,,sounding,75.9,0.3,8.2,100,0.3,fixed,,,2,10,void
            dt1-c,DEEP TK 1 C,sw,,sounding,72.3,1.6,8.2,100,1.5,fixed,,hyd,2,150,tank
            hyd,HYD OIL,hyd,,ullage,73.5,0.5,8.2,90,0.05,fixed,,,1,2,tank
            v-echo,ECHO SDR VOID,dry,,sounding,72.2,-0.4,8.2,100,0.1,fixed,,,1,5,void
            db1-c,DB 1 C,sw,,sounding,60.4,0.6,8.2,100,3,fixed,,,3,150,tank
            db2-s,DB 2 S,sw,,sounding,48.4,5.9,8.2,100,1.5,fixed,db2-p,,3,150,tank
            wt1-s,WT 1 S,sw,,sounding,48.4,6.8,8.2,100,0.8,fixed,wt1-p,,2,150,tank
            db3-s,DB 3 S,sw,,sounding,36.4,5.9,8.2,100,1.5,fixed,db3-p,,3,150,tank
            ht2-s,HT 2 S,sw,,sounding,24.4,6.7,8.2,100,0.8,fixed,ht2-p,,2.5,150,tank
            wt2-s,WT 2 S,sw,,remote,24.4,7.1,8.2,100,1,fixed,wt2-p,,2,150,tank
            db4-s,DB 4 S,sw,,sounding,22,3.4,8.2,100,1.8,fixed,db4-p,,3,150,tank
            lsfo-s,LSFO 1 S,lsfo,mgo,sounding,21.9,5.2,8.2,90,0.6,consumable,lsfo-p,,2,20,tank
            hfo-s,HFO 1 S,hfo,lsfo,ullage,21.9,1.4,8.2,90,0.8,consumable,hfo-p,,2,20,tank
            fw-s,FW S,fw,,sounding,0.6,3.3,8.2,100,0.3,consumable,fw-p,,1.5,15,tank
            ap,A PEAK,sw,fw,sounding,6.3,0,8.2,100,0.8,fixed,,,3,150,tank
            fw-p,FW P,fw,,sounding,0.6,-3.3,8.2,100,0.3,consumable,fw-s,,1.5,15,tank
            hfo-p,HFO 1 P,hfo,lsfo,ullage,21.9,-1.4,8.2,90,0.8,consumable,hfo-s,,2,20,tank
            lsfo-p,LSFO 1 P,lsfo,mgo,sounding,21.9,-5.2,8.2,90,0.6,consumable,lsfo-s,,2,20,tank
            v-coff,COFFERDAM FR 35,dry,,sounding,21.3,-2.2,8.2,100,0.6,fixed,,,2,10,void
            v-duct,PIPE DUCT,dry,,sounding,21.3,-0.5,8.2,100,0.6,fixed,,,1,10,void
            db4-p,DB 4 P,sw,,sounding,22,-3.4,8.2,100,1.8,fixed,db4-s,,3,150,tank
            wt2-p,WT 2 P,sw,,remote,24.4,-7.1,8.2,100,1,fixed,wt2-s,,2,150,tank
            ht2-p,HT 2 P,sw,,sounding,24.4,-6.7,8.2,100,0.8,fixed,ht2-s,,2.5,150,tank
            db3-p,DB 3 P,sw,,sounding,36.4,-5.9,8.2,100,1.5,fixed,db3-s,,3,150,tank
            wt1-p,WT 1 P,sw,,sounding,48.4,-6.8,8.2,100,0.8,fixed,wt1-s,,2,150,tank
            db2-p,DB 2 P,sw,,sounding,48.4,-5.9,8.2,100,1.5,fixed,db2-s,,3,150,tank
            hfo-sett,HFO SETT,hfo,,ullage,18.9,3.6,8.2,90,0.4,consumable,,,1.5,20,tank
            hfo-serv,HFO SERV,hfo,,ullage,18.9,1.6,8.2,95,0.4,consumable,,,1.5,20,tank
            lsfo-serv,LSFO SERV,lsfo,,ullage,18.9,-1.6,8.2,95,0.4,consumable,,,1.5,20,tank
            mgo-day,MGO DAY,mgo,,sounding,18.9,-3.6,8.2,95,0.3,consumable,,,1.5,15,tank
            lo-stor,LO STOR,lo,,sounding,15.9,-4.8,7.4,95,0.2,consumable,,,1.5,3,tank
            urea,UREA,urea,,remote,,,,95,0.2,consumable,,,1,3,tank
            grey,GREY WATER,grey,,sounding,15.3,4.8,6.4,90,0.2,consumable,,,1.5,5,tank
            black,SEWAGE HOLD,black,,remote,,,,90,0.2,consumable,,,1.5,5,tank
            mgo-s,MGO 1 S,mgo,,sounding,12.5,1.6,2.4,95,0.5,consumable,mgo-p,,3,15,tank
            v-sump,LO SUMP COFF,dry,,sounding,12.3,1.2,2.4,100,0.3,fixed,,lo-sump,2,5,void
            lo-sump,LO SUMP,lo,,sounding,12.9,0.5,2.4,80,0.3,fixed,,,2,3,tank
            mgo-p,MGO 1 P,mgo,,sounding,12.5,-1.6,2.4,95,0.5,consumable,mgo-s,,3,15,tank
            sludge,SLUDGE,sludge,,sounding,9.4,0.3,2.4,90,0.2,consumable,,,2,2,tank
            bilge,BILGE HOLD,oily,,sounding,8.2,-0.3,2.4,90,0.2,consumable,,,2,5,tank
            """;

    private HeronSchedule() {}
}
