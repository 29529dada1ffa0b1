~VERSION INFORMATION
 VERS                   .         2.0              : CWLS LOG ASCII STANDARD - VERSION 2.0
 WRAP                   .         NO               : ONE LINE PER DEPTH STEP
~WELL INFORMATION
 STRT                   .M        1200.0000        : START DEPTH
 STOP                   .M        1203.5000        : STOP DEPTH
 STEP                   .M        0.5000           : STEP, 0 WHEN UNEVEN
 NULL                   .         -999.25          : NULL VALUE
 COMP                   .                          : COMPANY
 WELL                   .         Tiny 1           : WELL
 FLD                    .                          : FIELD
 LOC                    .                          : LOCATION
 PROV                   .                          : PROVINCE
 CNTY                   .                          : COUNTY
 STAT                   .                          : STATE
 CTRY                   .                          : COUNTRY
 SRVC                   .                          : SERVICE COMPANY
 DATE                   .                          : LOG DATE
 UWI                    .                          : UNIQUE WELL ID
~CURVE INFORMATION
 DEPT                   .M                         : measured depth
 TVD                    .M                         : true vertical depth
 TVDSS                  .M                         : true vertical depth below sea level
 VP                     .m/s                       : compressional velocity
 VS                     .m/s                       : shear velocity
 DENSITY                .g/cm3                     : bulk density
 SHALE_VOLUME           .v/v                       : shale volume
 POROSITY               .v/v                       : porosity
 YOUNGS_DYNAMIC         .GPa                       : dynamic Young's modulus
 POISSON_DYNAMIC        .                          : dynamic Poisson's ratio
 YOUNGS_STATIC          .GPa                       : static Young's modulus
 POISSON_STATIC         .                          : static Poisson's ratio
 SHEAR_STATIC           .GPa                       : static shear modulus
 BULK_STATIC            .GPa                       : static bulk modulus
 LAME_LAMBDA_STATIC     .GPa                       : static Lame lambda
 BIOT                   .                          : Biot's coefficient
 UCS                    .MPa                       : unconfined compressive strength
 FRICTION_ANGLE         .deg                       : angle of internal friction
 TENSILE_STRENGTH       .MPa                       : tensile strength
 SV                     .MPa                       : vertical stress
 PP                     .MPa                       : pore pressure
 SHMIN                  .MPa                       : least horizontal stress
 SHMAX                  .MPa                       : greatest horizontal stress
 SV_GRADIENT            .kPa/m                     : vertical stress gradient
 PP_GRADIENT            .kPa/m                     : pore pressure gradient
 SHMIN_GRADIENT         .kPa/m                     : least horizontal stress gradient
 SHMAX_GRADIENT         .kPa/m                     : greatest horizontal stress gradient
 PP_EMW                 .g/cm3                     : pore pressure as equivalent mud density
 SHMIN_EMW              .g/cm3                     : least horizontal stress as equivalent mud density
 SV_EMW                 .g/cm3                     : vertical stress as equivalent mud density
 A_PHI                  .                          : stress shape number
 SV_UNLOGGED_SHARE      .v/v                       : share of the vertical stress from depths without a density log
~PARAMETER INFORMATION
 PDAT                   .         MEAN SEA LEVEL   : permanent datum
 DATUM                  .         ROTARY TABLE     : surface at which DEPT and TVD are zero
 DEPTH_KIND             .         MEASURED DEPTH   : what DEPT counts, along the hole below the datum
 DATUM_ELEVATION        .M        112.5000         : elevation of the datum above mean sea level
 GROUND_ELEVATION       .M        105.0000         : elevation of the ground above mean sea level
 WATER_TABLE_DEPTH      .M        12.0000          : ground to water table
~OTHER
 Estimates for planning, not a substitute for measured tests, local codes and regulations, or the judgement of a licensed engineer.
 Do not set mud weight, casing or treatment pressure from this output alone.
 Stresses and pressures are total, compression positive.
 DEPT is measured depth: along the hole below the datum.
 TVD is true vertical depth: vertically below the datum.
 TVDSS is true vertical depth below mean sea level, positive downwards.
~ASCII LOG DATA
1200.0000 1197.3413 1084.8413 3000.0 1625.0 2.3500 -999.25 -999.25 16.0397 0.29238 7.4404 0.29238 2.8786 5.9729 4.0538 0.85000 -999.25 -999.25 -999.25 25.6704 11.8972 18.3061 20.0333 21.5746 9.9990 15.3853 16.8369 1.013 1.559 2.186 0.23453 1.0000
1200.5000 1197.8314 1085.3314 3033.7 1613.5 2.3773 -999.25 -999.25 16.1257 0.30276 7.4839 0.30276 2.8723 6.3239 4.4091 0.85000 -999.25 -999.25 -999.25 25.6817 11.9021 18.6973 20.4207 21.5753 9.9990 15.7077 17.1555 1.013 1.592 2.186 0.24675 0.9996
1201.0000 1198.3214 1085.8214 3036.4 1589.6 2.3273 -999.25 -999.25 15.4217 0.31123 7.1289 0.31123 2.7184 6.2940 4.4818 0.85000 -999.25 -999.25 -999.25 25.6930 11.9071 18.9294 20.5604 21.5759 9.9991 15.8961 17.2657 1.013 1.611 2.186 0.24115 0.9991
1201.5000 1198.8114 1086.3114 3005.6 -999.25 2.3416 -999.25 -999.25 -999.25 -999.25 -999.25 -999.25 -999.25 -999.25 -999.25 0.85000 -999.25 -999.25 -999.25 25.7043 11.9120 -999.25 -999.25 21.5764 9.9991 -999.25 -999.25 1.013 -999.25 2.186 -999.25 0.9987
1202.0000 1199.3015 1086.8015 2969.7 1583.7 2.3797 -999.25 -999.25 15.5329 0.30131 7.1848 0.30131 2.7606 6.0268 4.1864 0.85000 -999.25 -999.25 -999.25 25.7156 11.9170 18.5936 20.2500 21.5771 9.9991 15.6013 16.9911 1.013 1.581 2.186 0.23257 0.9982
1202.5000 1199.7915 1087.2915 2961.6 1607.1 2.3568 -999.25 -999.25 15.7206 0.29133 7.2793 0.29133 2.8185 5.8140 3.9350 0.85000 -999.25 -999.25 -999.25 25.7270 11.9219 18.2664 19.9575 21.5778 9.9992 15.3204 16.7388 1.013 1.552 2.187 0.22667 0.9982
1203.0000 1200.2815 1087.7815 2988.8 1624.0 2.3339 -999.25 -999.25 15.8876 0.29054 7.3635 0.29054 2.8529 5.8591 3.9572 0.85000 -999.25 -999.25 -999.25 25.7383 11.9269 18.2655 19.9772 21.5784 9.9992 15.3133 16.7484 1.013 1.552 2.187 0.22906 0.9978
1203.5000 1200.7716 1088.2716 3026.3 1618.8 2.3797 -999.25 -999.25 16.2094 0.29957 7.5263 0.29957 2.8957 6.2586 4.3281 0.85000 -999.25 -999.25 -999.25 25.7496 11.9318 18.6350 20.3724 21.5790 9.9993 15.6168 17.0728 1.013 1.583 2.187 0.24421 0.9974
