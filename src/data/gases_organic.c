/*
 * Organic gases with oxygen or nitrogen.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval methanol[] = {
    FIT(  200,  1000, -2.416642886E+05,  4.032147190E+03, -2.046415436E+01,  6.903698070E-02,
                      -7.598932690E-05,  4.598208360E-08, -1.158706744E-11),
    FIT( 1000,  6000,  3.411570760E+06, -1.345500201E+04,  2.261407623E+01, -2.141029179E-03,
                       3.730050540E-07, -3.498846390E-11,  1.366073444E-15),
};
static const struct gas_interval ethanol[] = {
    FIT(  200,  1000, -2.342791392E+05,  4.479180550E+03, -2.744817302E+01,  1.088679162E-01,
                      -1.305309334E-04,  8.437346400E-08, -2.234559017E-11),
    FIT( 1000,  6000,  4.694817650E+06, -1.929798213E+04,  3.447584040E+01, -3.236165980E-03,
                       5.784947720E-07, -5.564600270E-11,  2.226226400E-15),
};
static const struct gas_interval gas_1_propanol[] = {
    FIT(  200,  1000, -2.616973337E+05,  5.192376660E+03, -3.296481160E+01,  1.354568128E-01,
                      -1.593156164E-04,  1.019498160E-07, -2.688552974E-11),
    FIT( 1000,  6000,  6.308672120E+06, -2.642210376E+04,  4.715112590E+01, -4.642511930E-03,
                       8.593465360E-07, -8.682091820E-11,  3.642224010E-15),
};
static const struct gas_interval gas_2_propanol[] = {
    FIT(  200,  1000, -3.386510240E+05,  6.106048000E+03, -3.791418040E+01,  1.530494531E-01,
                      -1.864354461E-04,  1.213257738E-07, -3.220433490E-11),
    FIT( 1000,  6000,  6.001074750E+06, -2.505876830E+04,  4.622096120E+01, -4.272466310E-03,
                       7.693678770E-07, -7.450584840E-11,  2.998959935E-15),
};
static const struct gas_interval formaldehyde[] = {
    FIT(  200,  1000, -1.173916343E+05,  1.873628846E+03, -6.890288570E+00,  2.641561665E-02,
                      -2.186389299E-05,  1.005693006E-08, -2.023476949E-12),
    FIT( 1000,  6000,  1.700825405E+06, -7.620853840E+03,  1.472447547E+01, -1.649111754E-03,
                       3.292144720E-07, -3.495049770E-11,  1.526135000E-15),
};
static const struct gas_interval acetaldehyde[] = {
    FIT(  200,  1000, -1.373904369E+05,  2.559937679E+03, -1.340470172E+01,  5.922128620E-02,
                      -6.240006050E-05,  3.703324410E-08, -9.342697410E-12),
    FIT( 1000,  6000,  3.321176590E+06, -1.449719957E+04,  2.708421279E+01, -2.879320054E-03,
                       5.556309920E-07, -5.732674880E-11,  2.443965239E-15),
};
static const struct gas_interval acetone[] = {
    FIT(  200,  1000, -2.277802525E+05,  4.215280010E+03, -2.415785316E+01,  9.907483320E-02,
                      -1.084940903E-04,  6.583355960E-08, -1.676046146E-11),
    FIT( 1000,  6000,  5.001601920E+06, -2.170155542E+04,  3.964493990E+01, -4.179945050E-03,
                       7.962429530E-07, -8.122558050E-11,  3.428780960E-15),
};
static const struct gas_interval formic_acid[] = {
    FIT(  200,  1000, -2.906279097E+04,  7.658378880E+02, -3.328414130E+00,  2.817542991E-02,
                      -2.370050804E-05,  1.166063663E-08, -2.791373170E-12),
    FIT( 1000,  6000,  4.872336450E+05, -7.632238080E+03,  2.132788153E+01, -4.402546540E-03,
                       1.102001695E-06, -1.364343517E-10,  6.648429750E-15),
};
static const struct gas_interval acetic_acid[] = {
    FIT(  200,  1000, -3.219191980E+04,  1.196329795E+03, -8.705824020E+00,  5.696257590E-02,
                      -5.757887160E-05,  3.352115220E-08, -8.614438230E-12),
    FIT( 1000,  6000,  2.103514223E+06, -1.467822192E+04,  3.382802830E+01, -5.694858680E-03,
                       1.343221353E-06, -1.606041158E-10,  7.652794250E-15),
};
static const struct gas_interval dimethyl_ether[] = {
    FIT(  200,  1000, -2.693103242E+05,  4.300709710E+03, -2.152788028E+01,  8.131833390E-02,
                      -8.295671320E-05,  4.801911510E-08, -1.188699808E-11),
    FIT( 1000,  6000,  4.933577190E+06, -2.083094065E+04,  3.629050610E+01, -4.108351640E-03,
                       7.903220310E-07, -8.131435630E-11,  3.458166110E-15),
};
static const struct gas_interval ethylene_oxide[] = {
    FIT(  200,  1000, -1.728233345E+05,  3.816678800E+03, -2.629851977E+01,  1.014103162E-01,
                      -1.240578373E-04,  8.034040350E-08, -2.120942544E-11),
    FIT( 1000,  6000,  3.151809957E+06, -1.423646316E+04,  2.708080476E+01, -2.606238456E-03,
                       4.853891930E-07, -4.852144760E-11,  2.011778721E-15),
};
static const struct gas_interval propylene_oxide[] = {
    FIT(  200,  1000, -2.292808804E+05,  4.495750540E+03, -2.941117945E+01,  1.213113827E-01,
                      -1.440060464E-04,  9.202051750E-08, -2.416278343E-11),
    FIT( 1000,  6000,  4.789729990E+06, -2.106895971E+04,  3.954647730E+01, -3.910929980E-03,
                       7.325531510E-07, -7.357085970E-11,  3.060618500E-15),
};
static const struct gas_interval acetonitrile[] = {
    FIT(  200,  1000, -9.965988380E+04,  1.739278534E+03, -7.898420820E+00,  4.294894320E-02,
                      -4.499973880E-05,  2.717105086E-08, -7.026117590E-12),
    FIT( 1000,  6000,  2.923231393E+06, -1.233792258E+04,  2.324477222E+01, -2.411565845E-03,
                       4.622157170E-07, -4.740601240E-11,  2.010639467E-15),
};
static const struct gas_interval phenol[] = {
    FIT(  200,  1000, -1.209418144E+05,  3.378292270E+03, -2.991846148E+01,  1.567802942E-01,
                      -1.970937198E-04,  1.291815064E-07, -3.424351260E-11),
    FIT( 1000,  6000,  4.462081570E+06, -2.165521026E+04,  4.815015050E+01, -3.568282430E-03,
                       6.327175730E-07, -6.039905720E-11,  2.399168678E-15),
};

static const struct gas_species gases[] = {
    {.name = "methanol", .formula = "CH4O", .cas = "67-56-1", .aliases = "methyl alcohol|wood alcohol|CH3OH|MeOH",
     .element = {{"C", 1}, {"H", 4}, {"O", 1}}, HEAT(methanol, "g 7/00: Hf:TRC(6/87) w5030. Chen,1977."),
     BOILS(337.85, YAWS_2009_ORGANIC), DIPOLE(1.7, NSRDS_10),
     CRITICAL(512.64, PERRY_8, 8095868, PSRK_4, 0.563, VDI_ATLAS)},
    {.name = "ethanol", .formula = "C2H6O", .cas = "64-17-5", .aliases = "ethyl alcohol|alcohol|C2H5OH|EtOH",
     .element = {{"C", 2}, {"H", 6}, {"O", 1}}, HEAT(ethanol, "g 8/88: Hf:TRC(6/87) w5030. Chao,1986."),
     BOILS(351.44, YAWS_2009_ORGANIC), DIPOLE(1.69, NSRDS_10),
     CRITICAL(513.92, PERRY_8, 6148000, VDI_ATLAS, 0.644, VDI_ATLAS)},
    {.name = "1-propanol", .formula = "C3H8O", .cas = "71-23-8",
     .aliases = "propan-1-ol|n-propanol|n-propyl alcohol|propyl alcohol", .element = {{"C", 3}, {"H", 8}, {"O", 1}},
     HEAT(gas_1_propanol, "g 2/00: Hf:TRC(6/87) w5030. Chao,1986."), BOILS(370.3, JOBACK_1984),
     DIPOLE(1.68, NSRDS_10), CRITICAL(536.78, PERRY_8, 5169000, IUPAC_CRITICAL, 0.622, YAWS_2014)},
    {.name = "2-propanol", .formula = "C3H8O", .cas = "67-63-0",
     .aliases = "propan-2-ol|isopropanol|isopropyl alcohol|IPA", .element = {{"C", 3}, {"H", 8}, {"O", 1}},
     HEAT(gas_2_propanol, "g 2/00: Hf:TRC(6/87) w5030. Chao,1986."), BOILS(355.41, YAWS_2009_ORGANIC),
     DIPOLE(1.66, NSRDS_10), CRITICAL(508.3, IUPAC_CRITICAL, 4764000, IUPAC_CRITICAL, 0.665, PSRK_4)},
    {.name = "formaldehyde", .formula = "CH2O", .cas = "50-00-0", .aliases = "methanal|HCHO|H2CO",
     .element = {{"C", 1}, {"H", 2}, {"O", 1}},
     HEAT(formaldehyde, "g 5/01: Hf:TRC(6/78) w-5300. Gurvich,1991 pt1 p62 pt2 p47."), BOILS(254.0, JOBACK_1984),
     DIPOLE(2.332, NSRDS_10), CRITICAL(408.0, PERRY_8, 6586125, PSRK_4, 0.281, VDI_ATLAS)},
    {.name = "acetaldehyde", .formula = "C2H4O", .cas = "75-07-0", .aliases = "ethanal|CH3CHO",
     .element = {{"C", 2}, {"H", 4}, {"O", 1}}, HEAT(acetaldehyde, "g 8/88: Hf:TRC (6/78) w5300. Chao,1986."),
     BOILS(294.0, CRC_102), DIPOLE(2.69, NSRDS_10),
     CRITICAL(466.0, IUPAC_CRITICAL, 5570000, PERRY_8, 0.292, PERRY_8)},
    {.name = "acetone", .formula = "C3H6O", .cas = "67-64-1",
     .aliases = "propanone|2-propanone|dimethyl ketone|CH3COCH3", .element = {{"C", 3}, {"H", 6}, {"O", 1}},
     HEAT(acetone, "g 6/97: Chao,1986. Chao,1976."), BOILS(329.23, CRC_102), DIPOLE(2.88, NSRDS_10),
     CRITICAL(508.1, IUPAC_CRITICAL, 4700000, IUPAC_CRITICAL, 0.306, VDI_ATLAS)},
    {.name = "formic acid", .formula = "CH2O2", .cas = "64-18-6",
     .aliases = "methanoic acid|HCOOH|formic acid (monomer)", .element = {{"C", 1}, {"H", 2}, {"O", 2}},
     HEAT(formic_acid, "monomer only, association is not in it. g 6/01: Formic acid. Chao,1978."),
     BOILS(373.71, YAWS_2009_ORGANIC), DIPOLE(1.41, NSRDS_10),
     CRITICAL(588.0, IUPAC_CRITICAL, 5810000, PERRY_8, 0.317, PERRY_8)},
    {.name = "acetic acid", .formula = "C2H4O2", .cas = "64-19-7",
     .aliases = "ethanoic acid|CH3COOH|acetic acid (monomer)", .element = {{"C", 2}, {"H", 4}, {"O", 2}},
     HEAT(acetic_acid, "monomer only, association is not in it. g 6/00: Acetic Acid. Chao,1978."),
     BOILS(391.1, CRC_102), DIPOLE(1.7, NSRDS_10), CRITICAL(591.95, PERRY_8, 5786000, VDI_ATLAS, 0.463, PERRY_8)},
    {.name = "dimethyl ether", .formula = "C2H6O", .cas = "115-10-6", .aliases = "methoxymethane|DME|CH3OCH3|R-E170",
     .element = {{"C", 2}, {"H", 6}, {"O", 1}},
     HEAT(dimethyl_ether, "g 7/00: Dimethyl ether. Hf:TRC(6/91) w6040. Chao,1986."), BOILS(248.4, CRC_102),
     DIPOLE(1.3, NSRDS_10), CRITICAL(400.1, CRC_102, 5341000, VDI_ATLAS, 0.2, YAWS_2014)},
    {.name = "ethylene oxide", .formula = "C2H4O", .cas = "75-21-8", .aliases = "oxirane|ethene oxide|EO",
     .element = {{"C", 2}, {"H", 4}, {"O", 1}},
     HEAT(ethylene_oxide, "g 8/88: Ethylene Oxide. Shimanouchi,1972. Chase,1998 9/65."), BOILS(283.6, CRC_102),
     DIPOLE(1.89, NSRDS_10), CRITICAL(469.0, IUPAC_CRITICAL, 7194075, PSRK_4, 0.197, VDI_ATLAS)},
    {.name = "propylene oxide", .formula = "C3H6O", .cas = "75-56-9",
     .aliases = "methyloxirane|1,2-epoxypropane|propene oxide", .element = {{"C", 3}, {"H", 6}, {"O", 1}},
     HEAT(propylene_oxide, "g 6/01: TRC(6/84) w6150. Swalen,1957. Oetting,1964. Villarreal,1975."),
     BOILS(308.0, CRC_102), DIPOLE(2.01, NSRDS_10), CRITICAL(482.25, PINA_MARTINEZ, 4924395, PSRK_4, 0.269, PSRK_4)},
    {.name = "acetonitrile", .formula = "C2H3N", .cas = "75-05-8", .aliases = "methyl cyanide|ethanenitrile|CH3CN",
     .element = {{"C", 2}, {"H", 3}, {"N", 1}},
     HEAT(acetonitrile, "g 9/00: Acetonitrile. TRC(6/93) w9270. Koga,1984. Pavone,1990."),
     BOILS(354.75, YAWS_2009_ORGANIC), DIPOLE(3.925, NSRDS_10),
     CRITICAL(545.5, IUPAC_CRITICAL, 4833203, PSRK_4, 0.334, VDI_ATLAS)},
    {.name = "phenol", .formula = "C6H6O", .cas = "108-95-2", .aliases = "carbolic acid|hydroxybenzene|C6H5OH",
     .element = {{"C", 6}, {"H", 6}, {"O", 1}}, HEAT(phenol, "g 8/00: Burcat,1985."), BOILS(455.0, CRC_102),
     DIPOLE(1.45, NSRDS_10), CRITICAL(694.25, PERRY_8, 6128650, JOBACK_1984, 0.438, PERRY_8)},
};
/* clang-format on */

const struct gas_family gas_family_organic = {sizeof gases / sizeof gases[0], gases};
