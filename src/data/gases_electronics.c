/*
 * Hydrides and halides of the semiconductor trade, and other volatile halides. Heat capacities: nine-constant fits of
 * B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the constants are those of cp/R as printed, a1 to
 * a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval silane[] = {
    FIT(  200,  1000,  7.872993290E+04, -5.526087050E+02,  2.498944303E+00,  1.442118274E-02,
                      -8.467107310E-06,  2.726164641E-09, -5.436754370E-13),
    FIT( 1000,  6000,  1.290378740E+06, -7.813399780E+03,  1.828851664E+01, -1.975620946E-03,
                       4.156502150E-07, -4.596745610E-11,  2.072777131E-15),
};
static const struct gas_interval dichlorosilane[] = {
    FIT(  200,  1000,  1.894281754E+05, -2.650960252E+03,  1.549874174E+01, -6.533130750E-03,
                       9.306098260E-06, -5.639698670E-09,  1.213664264E-12),
    FIT( 1000,  6000,  5.400204580E+05, -4.062337290E+03,  1.573118788E+01, -1.015038389E-03,
                       2.127060243E-07, -2.345079226E-11,  1.054871984E-15),
};
static const struct gas_interval trichlorosilane[] = {
    FIT(  200,  1000,  1.659565586E+05, -2.552498122E+03,  1.750117375E+01, -7.885728660E-03,
                       8.092567490E-06, -3.980420600E-09,  7.059173320E-13),
    FIT( 1000,  6000,  1.728644072E+05, -2.116727327E+03,  1.441802307E+01, -5.255249620E-04,
                       1.098826178E-07, -1.209327059E-11,  5.432187050E-16),
};
static const struct gas_interval silicon_tetrachloride[] = {
    FIT(  200,  1000,  1.171646285E+05, -2.185821461E+03,  1.908250496E+01, -9.636335720E-03,
                       8.836847690E-06, -4.360042400E-09,  8.940232430E-13),
    FIT( 1000,  6000, -2.100330761E+05, -8.476107710E+01,  1.306364027E+01, -2.554020420E-05,
                       5.653818470E-09, -6.488752670E-13,  3.008025543E-17),
};
static const struct gas_interval silicon_tetrafluoride[] = {
    FIT(  200,  1000,  1.069670784E+04, -9.569638640E+01,  2.513988593E+00,  3.309781030E-02,
                      -4.573044080E-05,  3.091834452E-08, -8.269304050E-12),
    FIT( 1000,  6000, -3.845892320E+05, -6.569979910E+02,  1.348925720E+01, -5.100471360E-05,
                       5.346329580E-08, -4.959598110E-12,  2.299314375E-16),
};
static const struct gas_interval phosphine[] = {
    FIT(  200,  1000, -6.384325340E+03,  4.057567410E+02, -1.565680086E-01,  1.338380613E-02,
                      -8.275391430E-06,  3.024360831E-09, -6.421764630E-13),
    FIT( 1000,  6000,  1.334801106E+06, -6.725463520E+03,  1.445857073E+01, -1.639736883E-03,
                       3.409218570E-07, -3.736272080E-11,  1.672947506E-15),
};
static const struct gas_interval phosphorus_trichloride[] = {
    FIT(  200,  1000,  7.717745470E+04, -1.617650860E+03,  1.536080470E+01, -1.011077050E-02,
                       1.103408340E-05, -6.476121020E-09,  1.579151140E-12),
    FIT( 1000,  6000, -1.333076930E+05, -4.145883210E+01,  1.003186060E+01, -1.301946160E-05,
                       2.922916890E-09, -3.391869240E-13,  1.586425530E-17),
};
static const struct gas_interval phosphorus_trifluoride[] = {
    FIT(  200,  1000,  8.480984480E+04, -1.102340691E+03,  7.160715110E+00,  1.438278338E-02,
                      -2.318137222E-05,  1.702244315E-08, -4.810991950E-12),
    FIT( 1000,  6000, -2.957040675E+05, -2.997689931E+02,  1.022297023E+01, -8.890263450E-05,
                       1.958901359E-08, -2.240491075E-12,  1.035952523E-16),
};
static const struct gas_interval phosphorus_pentafluoride[] = {
    FIT(  200,  1000,  1.855778473E+05, -2.436979828E+03,  1.201012406E+01,  2.339343049E-02,
                      -3.813944410E-05,  2.796136412E-08, -7.870704880E-12),
    FIT( 1000,  6000, -5.668727840E+05, -6.677917910E+02,  1.649789569E+01, -1.990099440E-04,
                       4.395007100E-08, -5.036849540E-12,  2.332945909E-16),
};
static const struct gas_interval phosphoryl_chloride[] = {
    FIT(  200,  1000,  4.793788160E+04, -1.270388280E+03,  1.367716460E+01,  1.082672100E-03,
                      -1.736104060E-06,  8.460890640E-10, -1.174661330E-13),
    FIT( 1000,  6000, -2.185937970E+05, -5.080269680E+02,  1.337784650E+01, -1.510731050E-04,
                       3.340986780E-08, -3.835329760E-12,  1.779329880E-16),
};
static const struct gas_interval boron_trichloride[] = {
    FIT(  200,  1000,  2.392970339E+04, -4.140378860E+02,  5.488035260E+00,  1.648395682E-02,
                      -2.456196216E-05,  1.743876340E-08, -4.845222140E-12),
    FIT( 1000,  6000, -2.417408819E+05, -2.921539509E+02,  1.021668480E+01, -8.623637100E-05,
                       1.897792088E-08, -2.168726841E-12,  1.002154013E-16),
};
static const struct gas_interval boron_trifluoride[] = {
    FIT(  200,  1000,  3.465584000E+03,  2.133198651E+01,  1.641245191E+00,  1.993755064E-02,
                      -2.150119930E-05,  1.145669081E-08, -2.442285789E-12),
    FIT( 1000,  6000, -1.819767014E+05, -1.405347931E+03,  1.103412258E+01, -4.104591050E-04,
                       9.031277570E-08, -1.033057360E-11,  4.780551830E-16),
};
static const struct gas_interval diborane[] = {
    FIT(  200,  1000, -1.052844558E+04,  1.041795556E+03, -8.960518860E+00,  5.492480880E-02,
                      -5.305197050E-05,  3.011904756E-08, -7.688768300E-12),
    FIT( 1000,  6000,  2.835765414E+06, -1.567600163E+04,  3.226122330E+01, -3.738609730E-03,
                       7.718806460E-07, -8.414454540E-11,  3.752223380E-15),
};
static const struct gas_interval germane[] = {
    FIT(298.15,  1000, -2.568398191E+05, -4.132811450E+01,  7.755116280E+00,  2.129640783E-03,
                       7.255053610E-07, -5.096314010E-10,  1.431608261E-13),
    FIT( 1000,  6000, -3.809805880E+06,  1.093167093E+04, -5.149675410E+00,  9.485931370E-03,
                      -1.649459859E-06,  1.419674126E-10, -5.004639750E-15),
};
static const struct gas_interval germanium_tetrachloride[] = {
    FIT(  200,  1000,  6.502870410E+04, -1.652482760E+03,  1.881327000E+01, -1.152426810E-02,
                       1.310809980E-05, -7.961956110E-09,  1.997505040E-12),
    FIT( 1000,  6000, -1.376261210E+05, -3.603769500E+01,  1.302816670E+01, -1.164956960E-05,
                       2.636193380E-09, -3.072926720E-13,  1.439808750E-17),
};
static const struct gas_interval titanium_tetrachloride[] = {
    FIT(  200,  1000,  8.187196800E+04, -1.758323850E+03,  1.892512121E+01, -1.133495876E-02,
                       1.251952037E-05, -7.422681330E-09,  1.825440187E-12),
    FIT( 1000,  6000, -1.432562278E+05, -4.316774850E+01,  1.303337752E+01, -1.371365738E-05,
                       3.093403483E-09, -3.604245160E-13,  1.691384523E-17),
};
static const struct gas_interval uranium_hexafluoride[] = {
    FIT(  200,  1000,  1.915674060E+05, -3.426391610E+03,  2.800395890E+01, -1.326392086E-02,
                       1.107123764E-05, -4.821754110E-09,  8.325132450E-13),
    FIT( 1000,  6000, -3.409027920E+05, -1.458950046E+02,  1.910902533E+01, -4.358451130E-05,
                       9.617604660E-09, -1.100915551E-12,  5.092645080E-17),
    FIT( 6000, 20000, -2.639780713E+05, -8.680089820E+01,  1.901877513E+01, -2.107561344E-06,
                       1.295346553E-10, -4.136090060E-15,  5.365237680E-20),
};

static const struct gas_species gases[] = {
    {.name = "silane", .formula = "SiH4", .cas = "7803-62-5", .aliases = "monosilane|silicon tetrahydride",
     .element = {{"Si", 1}, {"H", 4}}, HEAT(silane, "tpis91: Silane. Gurvich,1991 pt1 p263 pt 2 p237."),
     BOILS(161.0, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(269.7, PINA_MARTINEZ, 4840000, PINA_MARTINEZ, 0.0938, YAWS_2014)},
    {.name = "dichlorosilane", .formula = "SiH2Cl2", .cas = "4109-96-0", .aliases = "DCS",
     .element = {{"Si", 1}, {"H", 2}, {"Cl", 2}}, HEAT(dichlorosilane, "j12/76: Chase,1998 p823."),
     BOILS(281.5, FROM_MEMORY), DIPOLE(1.17, NSRDS_10),
     CRITICAL(451.5, PINA_MARTINEZ, 4599000, PINA_MARTINEZ, 0.0985, YAWS_2014)},
    {.name = "trichlorosilane", .formula = "SiHCl3", .cas = "10025-78-2", .aliases = "silicochloroform|TCS",
     .element = {{"Si", 1}, {"H", 1}, {"Cl", 3}}, HEAT(trichlorosilane, "j12/76: Chase,1998 880."),
     BOILS(305.0, FROM_MEMORY), DIPOLE(0.86, NSRDS_10),
     CRITICAL(479.0, PINA_MARTINEZ, 4170000, PINA_MARTINEZ, 0.1935, PSRK_4)},
    {.name = "silicon tetrachloride", .formula = "SiCl4", .cas = "10026-04-7", .aliases = "tetrachlorosilane|STC",
     .element = {{"Si", 1}, {"Cl", 4}}, HEAT(silicon_tetrachloride, "tpis91: Gurvich,1991 pt1 p276 pt2 p246."),
     BOILS(330.8, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(507.0, PINA_MARTINEZ, 3590000, PINA_MARTINEZ, 0.2318, YAWS_2014)},
    {.name = "silicon tetrafluoride", .formula = "SiF4", .cas = "7783-61-1", .aliases = "tetrafluorosilane",
     .element = {{"Si", 1}, {"F", 4}},
     HEAT(silicon_tetrafluoride, "g 6/01: Johnson,1986. McDowell,1982. Chase,1998 p1190 (6/76)."),
     BOILS(187.0, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY), CRITICAL(259.0, PSRK_4, 3714600, PSRK_4, 0.3293, PSRK_4)},
    {.name = "phosphine", .formula = "PH3", .cas = "7803-51-2", .aliases = "phosphane|hydrogen phosphide",
     .element = {{"P", 1}, {"H", 3}}, HEAT(phosphine, "j 6/62: Chase,1998 p1348."),
     BOILS(185.41, YAWS_2009_INORGANIC), DIPOLE(0.574, NSRDS_10),
     CRITICAL(324.75, PINA_MARTINEZ, 6540000, PINA_MARTINEZ, 0.0452, YAWS_2014)},
    {.name = "phosphorus trichloride", .formula = "PCl3", .cas = "7719-12-2", .aliases = "",
     .element = {{"P", 1}, {"Cl", 3}}, HEAT(phosphorus_trichloride, "tpis89: Gurvich,1989 pt1 p433 pt2 p285."),
     BOILS(349.1, JOBACK_1984), DIPOLE(0.56, NSRDS_10),
     CRITICAL(563.15, VDI_ATLAS, 5670000, VDI_ATLAS, 0.22, VDI_ATLAS)},
    {.name = "phosphorus trifluoride", .formula = "PF3", .cas = "7783-55-3", .aliases = "",
     .element = {{"P", 1}, {"F", 3}}, HEAT(phosphorus_trifluoride, "tpis89: Gurvich,1989 pt1 p427 pt2 p279."),
     BOILS(171.65, YAWS_2009_INORGANIC), DIPOLE(1.03, NSRDS_10),
     CRITICAL(271.2, YAWS_2014, 4330000, YAWS_2014, NAN, NONE)},
    {.name = "phosphorus pentafluoride", .formula = "PF5", .cas = "7647-19-0", .aliases = "",
     .element = {{"P", 1}, {"F", 5}}, HEAT(phosphorus_pentafluoride, "tpis89: Gurvich,1989 pt1 p429 pt2 p280."),
     BOILS(188.6, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(295.7, PINA_MARTINEZ, 3715000, PINA_MARTINEZ, NAN, NONE)},
    {.name = "phosphoryl chloride", .formula = "POCl3", .cas = "10025-87-3", .aliases = "phosphorus oxychloride",
     .element = {{"P", 1}, {"O", 1}, {"Cl", 3}},
     HEAT(phosphoryl_chloride, "tpis89: Gurvich,1989 pt1 p436 pt2 p287."), BOILS(378.7, FROM_MEMORY),
     DIPOLE(2.54, NSRDS_10), CRITICAL(602.15, YAWS_2014, 3440000, YAWS_2014, 0.0832, YAWS_2014)},
    {.name = "boron trichloride", .formula = "BCl3", .cas = "10294-34-5", .aliases = "trichloroborane",
     .element = {{"B", 1}, {"Cl", 3}}, HEAT(boron_trichloride, "tpis96: Gurvich,1996a pt1 p76 pt2 p53."),
     BOILS(285.8, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(451.95, PINA_MARTINEZ, 3871000, PINA_MARTINEZ, 0.1505, YAWS_2014)},
    {.name = "boron trifluoride", .formula = "BF3", .cas = "7637-07-2", .aliases = "trifluoroborane",
     .element = {{"B", 1}, {"F", 3}}, HEAT(boron_trifluoride, "tpis96: Gurvich,1996a pt1 p62 pt2 p39."),
     BOILS(173.3, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(260.9, PINA_MARTINEZ, 4990000, PINA_MARTINEZ, 0.4337, YAWS_2014)},
    {.name = "diborane", .formula = "B2H6", .cas = "19287-45-7", .aliases = "boroethane",
     .element = {{"B", 2}, {"H", 6}}, HEAT(diborane, "g 5/00: Hf:Gurvich,1996a pt1 p37. Yu,1998. Duncan,1985."),
     BOILS(180.7, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(289.8, PINA_MARTINEZ, 4053000, PINA_MARTINEZ, 0.125, YAWS_2014)},
    {.name = "germane", .formula = "GeH4", .cas = "7782-65-2", .aliases = "germanium tetrahydride|monogermane",
     .element = {{"Ge", 1}, {"H", 4}}, HEAT(germane, "bar89: Barin,1989 pt1 p628."), BOILS(185.1, FROM_MEMORY),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(308.0, PINA_MARTINEZ, 5550000, PINA_MARTINEZ, 0.1506, YAWS_2014)},
    {.name = "germanium tetrachloride", .formula = "GeCl4", .cas = "10038-98-9", .aliases = "tetrachlorogermane",
     .element = {{"Ge", 1}, {"Cl", 4}}, HEAT(germanium_tetrachloride, "tpis91: Gurvich,1991 pt1 p332 pt2 p286."),
     BOILS(357.2, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(550.0, PINA_MARTINEZ, 3850000, PINA_MARTINEZ, 0.123, YAWS_2014)},
    {.name = "titanium tetrachloride", .formula = "TiCl4", .cas = "7550-45-0", .aliases = "titanium(IV) chloride",
     .element = {{"Ti", 1}, {"Cl", 4}}, HEAT(titanium_tetrachloride, "j12/67: Chase,1998 p906."),
     BOILS(409.6, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(638.0, PINA_MARTINEZ, 4661000, PINA_MARTINEZ, 0.2837, YAWS_2014)},
    {.name = "uranium hexafluoride", .formula = "UF6", .cas = "7783-81-5", .aliases = "",
     .element = {{"U", 1}, {"F", 6}}, HEAT(uranium_hexafluoride, "tpis82: Gurvich,1982 pt1 p223 pt2 p257."),
     BOILS(329.7, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(505.8, YAWS_2014, 4660000, YAWS_2014, 0.318, YAWS_2014)},
    {.name = "tungsten hexafluoride", .formula = "WF6", .cas = "7783-82-6", .aliases = "tungsten(VI) fluoride",
     .element = {{"W", 1}, {"F", 6}}, NO_HEAT, BOILS(290.25, FROM_MEMORY), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(444.0, YAWS_2014, 4340000, YAWS_2014, 0.163, YAWS_2014)},
    {.name = "arsine", .formula = "AsH3", .cas = "7784-42-1", .aliases = "arsane|arsenic trihydride",
     .element = {{"As", 1}, {"H", 3}}, NO_HEAT, BOILS(210.67, FROM_MEMORY), DIPOLE(0.217, NSRDS_10),
     CRITICAL(373.0, PINA_MARTINEZ, 6550000, PINA_MARTINEZ, 0.0105, YAWS_2014)},
};
/* clang-format on */

const struct gas_family gas_family_electronics = {sizeof gases / sizeof gases[0], gases};
