/*
 * Air and the elements.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval air[] = {
    FIT(  200,  1000,  1.009950160E+04, -1.968275610E+02,  5.009155110E+00, -5.761013730E-03,
                       1.066859930E-05, -7.940297970E-09,  2.185231910E-12),
    FIT( 1000,  6000,  2.415214430E+05, -1.257874600E+03,  5.144558670E+00, -2.138541790E-04,
                       7.065227840E-08, -1.071483490E-11,  6.577800150E-16),
};
static const struct gas_interval nitrogen[] = {
    FIT(  200,  1000,  2.210371497E+04, -3.818461820E+02,  6.082738360E+00, -8.530914410E-03,
                       1.384646189E-05, -9.625793620E-09,  2.519705809E-12),
    FIT( 1000,  6000,  5.877124060E+05, -2.239249073E+03,  6.066949220E+00, -6.139685500E-04,
                       1.491806679E-07, -1.923105485E-11,  1.061954386E-15),
    FIT( 6000, 20000,  8.310139160E+08, -6.420733540E+05,  2.020264635E+02, -3.065092046E-02,
                       2.486903333E-06, -9.705954110E-11,  1.437538881E-15),
};
static const struct gas_interval oxygen[] = {
    FIT(  200,  1000, -3.425563420E+04,  4.847000970E+02,  1.119010961E+00,  4.293889240E-03,
                      -6.836300520E-07, -2.023372700E-09,  1.039040018E-12),
    FIT( 1000,  6000, -1.037939022E+06,  2.344830282E+03,  1.819732036E+00,  1.267847582E-03,
                      -2.188067988E-07,  2.053719572E-11, -8.193467050E-16),
    FIT( 6000, 20000,  4.975294300E+08, -2.866106874E+05,  6.690352250E+01, -6.169959020E-03,
                       3.016396027E-07, -7.421416600E-12,  7.278175770E-17),
};
static const struct gas_interval argon[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  2.010538475E+01, -5.992661070E-02,  2.500069401E+00, -3.992141160E-08,
                       1.205272140E-11, -1.819015576E-15,  1.078576636E-19),
    FIT( 6000, 20000, -9.951265080E+08,  6.458887260E+05, -1.675894697E+02,  2.319933363E-02,
                      -1.721080911E-06,  6.531938460E-11, -9.740147729E-16),
};
static const struct gas_interval helium[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 6000, 20000,  3.396845420E+06, -2.194037652E+03,  3.080231878E+00, -8.068957550E-05,
                       6.252784910E-09, -2.574990067E-13,  4.429960218E-18),
};
static const struct gas_interval neon[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 6000, 20000, -1.238252746E+07,  6.958579580E+03,  1.016709287E+00,  1.424664555E-04,
                      -4.803933930E-09, -1.170213183E-13,  8.415153652E-18),
};
static const struct gas_interval krypton[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  2.643639057E+02, -7.910050820E-01,  2.500920585E+00, -5.328164110E-07,
                       1.620730161E-10, -2.467898017E-14,  1.478585040E-18),
    FIT( 6000, 20000, -1.375531087E+09,  9.064030530E+05, -2.403481435E+02,  3.378312030E-02,
                      -2.563103877E-06,  9.969787790E-11, -1.521249677E-15),
};
static const struct gas_interval xenon[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  4.025226680E+03, -1.209507521E+01,  2.514153347E+00, -8.248102080E-06,
                       2.530232618E-09, -3.892333230E-13,  2.360439138E-17),
    FIT( 6000, 20000,  2.540397456E+08, -1.105373774E+05,  1.382644099E+01,  1.500614606E-03,
                      -3.935359030E-07,  2.765790584E-11, -5.943990574E-16),
};
static const struct gas_interval radon[] = {
    FIT(  200,  1000,  3.389432090E-06, -1.311675533E-07,  2.500000001E+00, -2.978593139E-12,
                       4.337050730E-15, -3.182040220E-18,  9.247787030E-22),
    FIT( 1000,  6000,  2.730190029E+04, -8.284672620E+01,  2.598178483E+00, -5.813729850E-05,
                       1.819136527E-08, -2.866656182E-12,  1.789322176E-16),
    FIT( 6000, 20000,  9.180866680E+08, -6.245854600E+05,  1.724946531E+02, -2.325758595E-02,
                       1.636222413E-06, -5.369173150E-11,  6.507189926E-16),
};
static const struct gas_interval hydrogen[] = {
    FIT(  200,  1000,  4.078323210E+04, -8.009186040E+02,  8.214702010E+00, -1.269714457E-02,
                       1.753605076E-05, -1.202860270E-08,  3.368093490E-12),
    FIT( 1000,  6000,  5.608128010E+05, -8.371504740E+02,  2.975364532E+00,  1.252249124E-03,
                      -3.740716190E-07,  5.936625200E-11, -3.606994100E-15),
    FIT( 6000, 20000,  4.966884120E+08, -3.147547149E+05,  7.984121880E+01, -8.414789210E-03,
                       4.753248350E-07, -1.371873492E-11,  1.605461756E-16),
};
static const struct gas_interval deuterium[] = {
    FIT(  200,  1000,  2.125790482E+04, -2.996945907E+02,  5.130314980E+00, -4.172970890E-03,
                       5.014345720E-06, -2.126389969E-09,  2.386536969E-13),
    FIT( 1000,  6000,  8.215168560E+05, -2.365623159E+03,  5.342974510E+00,  6.928145990E-05,
                      -8.523671020E-08,  2.456447415E-11, -1.960597698E-15),
    FIT( 6000, 20000,  4.899848740E+08, -3.112892916E+05,  7.945961340E+01, -8.425828740E-03,
                       4.789458020E-07, -1.390917969E-11,  1.637606941E-16),
};
static const struct gas_interval hydrogen_deuteride[] = {
    FIT(298.15,  1000,  2.519120338E+04, -2.761004999E+02,  4.644441290E+00, -2.082376844E-03,
                       1.418070803E-06,  2.839893835E-10, -3.202331030E-13),
    FIT( 1000,  6000,  8.455830000E+05, -1.956578537E+03,  4.404373870E+00,  5.751681090E-04,
                      -2.131983152E-07,  4.036126680E-11, -2.727170705E-15),
    FIT( 6000, 20000,  4.829960940E+08, -3.077144916E+05,  7.864816510E+01, -8.332990910E-03,
                       4.732254110E-07, -1.372721571E-11,  1.614120677E-16),
};
static const struct gas_interval chlorine[] = {
    FIT(  200,  1000,  3.462815170E+04, -5.547126520E+02,  6.207589370E+00, -2.989632078E-03,
                       3.173027290E-06, -1.793629562E-09,  4.260043590E-13),
    FIT( 1000,  6000,  6.092569420E+06, -1.949627662E+04,  2.854535795E+01, -1.449968764E-02,
                       4.463890770E-06, -6.358525860E-10,  3.327360290E-14),
};
static const struct gas_interval fluorine[] = {
    FIT(  200,  1000,  1.018176308E+04,  2.274241183E+01,  1.971353040E+00,  8.151604010E-03,
                      -1.148960090E-05,  7.958652530E-09, -2.167079526E-12),
    FIT( 1000,  6000, -2.941167790E+06,  9.456597700E+03, -7.738616150E+00,  7.644712990E-03,
                      -2.241007605E-06,  2.915845236E-10, -1.425033974E-14),
};
static const struct gas_interval bromine[] = {
    FIT(  200,  1000,  7.497047540E+03, -2.350884557E+02,  5.491934320E+00, -2.227573303E-03,
                       2.932401703E-06, -1.954889514E-09,  5.312307890E-13),
    FIT( 1000,  6000, -4.311698570E+06,  1.111268634E+04, -5.555775610E+00,  3.630516590E-03,
                      -2.754164226E-07, -6.217506760E-11,  7.375341620E-15),
};
static const struct gas_interval iodine[] = {
    FIT(  200,  1000, -5.087968770E+03, -1.249585210E+01,  4.504219090E+00,  1.370962533E-04,
                      -1.390523014E-07,  1.174813853E-10, -2.337541043E-14),
    FIT( 1000,  6000, -5.632594160E+06,  1.793961560E+04, -1.723055169E+01,  1.244214080E-02,
                      -3.332768580E-06,  4.125477940E-10, -1.960461713E-14),
};
static const struct gas_interval ozone[] = {
    FIT(  200,  1000, -1.282314507E+04,  5.898216640E+02, -2.547496763E+00,  2.690121526E-02,
                      -3.528258340E-05,  2.312290922E-08, -6.044893270E-12),
    FIT( 1000,  6000, -3.869662480E+07,  1.023344994E+05, -8.961551600E+01,  3.706144970E-02,
                      -4.137638740E-06, -2.725018591E-10,  5.248188110E-14),
};
static const struct gas_interval disulfur[] = {
    FIT(  200,  1000,  3.528091780E+04, -4.222156580E+02,  4.677433490E+00,  1.724046361E-03,
                      -3.862208210E-06,  3.336156340E-09, -9.930661540E-13),
    FIT( 1000,  6000, -1.588128788E+04,  6.315480880E+02,  2.449628069E+00,  1.986240565E-03,
                      -6.507927240E-07,  1.002813651E-10, -5.596990050E-15),
};
static const struct gas_interval octasulfur[] = {
    FIT(  200,  1000,  3.145625719E+05, -6.116510160E+03,  4.875327540E+01, -6.241794650E-02,
                       7.421831750E-05, -3.726449310E-08,  5.799429880E-12),
    FIT( 1000,  6000, -8.727921130E+06,  1.221627968E+04,  2.209959617E+01, -3.494064830E-03,
                       1.397604162E-06, -2.169815281E-10,  1.212304364E-14),
};
static const struct gas_interval mercury[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  5.146573510E+04, -1.681269855E+02,  2.718343098E+00, -1.445026192E-04,
                       5.158977660E-08, -9.472485010E-12,  7.034797406E-16),
    FIT( 6000, 20000,  5.358443930E+08, -4.433853810E+05,  1.463223992E+02, -2.318441669E-02,
                       1.916335174E-06, -7.419662000E-11,  1.067224054E-15),
};

static const struct gas_species gases[] = {
    {.name = "air", .formula = "", .cas = "132259-10-0", .aliases = "dry air|R-729",
     .element = {{"N", 1.56168}, {"O", 0.41958}, {"Ar", 0.00934}, {"C", 0.000314}}, .molar_mass = 28.9644e-3,
     HEAT(air, "g 9/95: Mole%:N2 78.084,O2 20.9476,Ar .9365,CO2 .0319.Gordon,1982.Reac"),
     BOILS(78.903, LEMMON_2000_BUBBLE), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(132.5306, LEMMON_2000, 3786000, LEMMON_2000, 0.0335, FROM_MEMORY)},
    {.name = "nitrogen", .formula = "N2", .cas = "7727-37-9", .aliases = "dinitrogen|R-728|GN2",
     .element = {{"N", 2}}, HEAT(nitrogen, "tpis78: Ref-Elm. Gurvich,1978 pt1 p280 pt2 p207."),
     BOILS(77.35, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(126.2, PERRY_8, 3398000, POLING_5, 0.0377, YAWS_2014)},
    {.name = "oxygen", .formula = "O2", .cas = "7782-44-7", .aliases = "dioxygen|R-732|GOX", .element = {{"O", 2}},
     HEAT(oxygen, "tpis89: Ref-Elm. Gurvich,1989 pt1 p94 pt2 p9."), BOILS(90.19, YAWS_2009_INORGANIC),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(154.58, PERRY_8, 5043000, POLING_5, 0.022, POLING_5)},
    {.name = "argon", .formula = "Ar", .cas = "7440-37-1", .aliases = "R-740", .element = {{"Ar", 1}},
     HEAT(argon, "g 3/98: Ref-Elm. Moore,1971. Gordon,1999."), BOILS(87.27, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(150.86, POLING_5, 4898000, POLING_5, -0.002, POLING_5)},
    {.name = "helium", .formula = "He", .cas = "7440-59-7", .aliases = "R-704|GHe", .element = {{"He", 1}},
     HEAT(helium, "g 5/97: Ref-Elm. Moore,1971. Moore,1970a. Gordon,1999."), BOILS(4.222, CRC_MEMORY),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(5.2, YAWS_2014, 228000, YAWS_2014, -0.39, POLING_5)},
    {.name = "neon", .formula = "Ne", .cas = "7440-01-9", .aliases = "R-720", .element = {{"Ne", 1}},
     HEAT(neon, "g 5/97: Ref-Elm. Moore,1971. Moore,1970a. Gordon,1999."), BOILS(27.07, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(44.4, POLING_5, 2653000, PINA_MARTINEZ, -0.0395, YAWS_2014)},
    {.name = "krypton", .formula = "Kr", .cas = "7439-90-9", .aliases = "R-784", .element = {{"Kr", 1}},
     HEAT(krypton, "g 8/97: Ref-Elm. Sugar,1991."), BOILS(119.93, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(209.35, PINA_MARTINEZ, 5502000, PINA_MARTINEZ, -0.002, PSRK_4)},
    {.name = "xenon", .formula = "Xe", .cas = "7440-63-3", .aliases = "", .element = {{"Xe", 1}},
     HEAT(xenon, "g 1/99: Ref-Elm. Moore,1971. Moore,1970a. Gordon,1999."), BOILS(165.05, FROM_MEMORY),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(289.74, PINA_MARTINEZ, 5840000, PINA_MARTINEZ, 0.002, PSRK_4)},
    {.name = "radon", .formula = "Rn", .cas = "10043-92-2", .aliases = "", .element = {{"Rn", 1}},
     HEAT(radon, "g 5/97: Ref-Elm. Moore,1971. Gordon,1999."), BOILS(211.5, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(377.5, PINA_MARTINEZ, 6280000, PINA_MARTINEZ, NAN, NONE)},
    {.name = "hydrogen", .formula = "H2", .cas = "1333-74-0", .aliases = "dihydrogen|R-702|GH2",
     .element = {{"H", 2}}, HEAT(hydrogen, "tpis78: Ref-Elm. Gurvich,1978 pt1 p103 pt2 p31."),
     BOILS(20.38, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(33.19, PERRY_8, 1297000, POLING_5, -0.216, POLING_5)},
    {.name = "deuterium", .formula = "D2", .cas = "7782-39-0", .aliases = "dideuterium|heavy hydrogen",
     .element = {{"D", 2}}, HEAT(deuterium, "tpis89: Ref-Species. Gurvich,1989 pt1 p134 pt2 p45."),
     BOILS(23.65, YAWS_2009_INORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(38.35, YAWS_2014, 1659997, PSRK_4, -0.1449, YAWS_2014)},
    {.name = "hydrogen deuteride", .formula = "HD", .cas = "13983-20-5", .aliases = "deuterium hydride",
     .element = {{"H", 1}, {"D", 1}}, HEAT(hydrogen_deuteride, "tpis89: Gurvich,1989 pt1 p144 pt2 p53."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "chlorine", .formula = "Cl2", .cas = "7782-50-5", .aliases = "dichlorine", .element = {{"Cl", 2}},
     HEAT(chlorine, "tpis89: Ref-Elm. Gurvich,1989 pt1 p177 pt2 p88."), BOILS(239.12, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(417.0, POLING_5, 7711000, YAWS_2014, 0.073, PERRY_8)},
    {.name = "fluorine", .formula = "F2", .cas = "7782-41-4", .aliases = "difluorine", .element = {{"F", 2}},
     HEAT(fluorine, "tpis89: Ref-Elm. Gurvich,1989. pt1 p157 pt2 p73."), BOILS(84.95, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(144.12, PERRY_8, 5215000, POLING_5, 0.053, PERRY_8)},
    {.name = "bromine", .formula = "Br2", .cas = "7726-95-6", .aliases = "dibromine", .element = {{"Br", 2}},
     HEAT(bromine, "tpis89: Gurvich,1989 pt1 p200 pt2 p104."), BOILS(331.9, YAWS_2009_INORGANIC),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(584.15, PERRY_8, 1.03326e+07, JOBACK_1984, 0.1189, YAWS_2014)},
    {.name = "iodine", .formula = "I2", .cas = "7553-56-2", .aliases = "diiodine", .element = {{"I", 2}},
     HEAT(iodine, "tpis89: Gurvich,1989 pt1 p220 pt2 p117."), BOILS(457.56, YAWS_2009_INORGANIC),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(819.15, VDI_ATLAS, 1.1654e+07, VDI_ATLAS, 0.1115, YAWS_2014)},
    {.name = "ozone", .formula = "O3", .cas = "10028-15-6", .aliases = "trioxygen", .element = {{"O", 3}},
     HEAT(ozone, "g 8/01: Gurvich,1989 pt1 p101 pt2 p15."), BOILS(161.85, YAWS_2009_INORGANIC),
     DIPOLE(0.534, NSRDS_10), CRITICAL(261.0, PINA_MARTINEZ, 5570000, PINA_MARTINEZ, 0.1559, PSRK_4)},
    {.name = "disulfur", .formula = "S2", .cas = "23550-45-0", .aliases = "disulphur|sulfur dimer",
     .element = {{"S", 2}}, HEAT(disulfur, "tpis89: Gurvich,1989 pt1 p270 pt2 p165."), BOILS(NAN, NONE),
     DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "octasulfur", .formula = "S8", .cas = "10544-50-0",
     .aliases = "octasulphur|cyclo-octasulfur|sulfur ring", .element = {{"S", 8}},
     HEAT(octasulfur, "tpis89: Gurvich,1989 pt1 p284 pt2 p172."), BOILS(NAN, NONE), DIPOLE(NAN, NONE),
     CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "mercury", .formula = "Hg", .cas = "7439-97-6",
     .aliases = "mercury vapour|mercury vapor|mercury (monatomic gas)", .element = {{"Hg", 1}},
     HEAT(mercury, "g 1/98: Hf:Cox,1989. Moore,1971. Gordon,1999."), BOILS(629.88, FROM_MEMORY),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(1735.0, YAWS_2014, 1.608e+08, YAWS_2014, -0.1644, YAWS_2014)},
};
/* clang-format on */

const struct gas_family gas_family_elements = {sizeof gases / sizeof gases[0], gases};
