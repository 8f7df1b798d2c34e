/*
 * Halocarbons.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval carbon_tetrafluoride[] = {
    FIT(  200,  1000,  9.817458500E+03,  1.163343483E+02, -1.288338636E+00,  3.959566910E-02,
                      -4.996244210E-05,  3.125339346E-08, -7.841700320E-12),
    FIT( 1000,  6000, -4.164456780E+05, -1.414797167E+03,  1.405124837E+01, -4.199093860E-04,
                       9.278921610E-08, -1.064575830E-11,  4.937099680E-16),
};
static const struct gas_interval trifluoromethane[] = {
    FIT(  200,  1000, -1.095132260E+05,  2.042273879E+03, -1.166213079E+01,  5.785807770E-02,
                      -6.857135060E-05,  4.212118380E-08, -1.053196888E-11),
    FIT( 1000,  6000,  5.685232020E+05, -4.728361700E+03,  1.586728516E+01, -7.382348650E-04,
                       1.970841706E-07, -2.062115571E-11,  8.970599640E-16),
};
static const struct gas_interval difluoromethane[] = {
    FIT(  200,  1000, -1.819917500E+05,  3.174427890E+03, -1.714256906E+01,  6.411353830E-02,
                      -7.313592120E-05,  4.426384160E-08, -1.103877216E-11),
    FIT( 1000,  6000,  1.546609496E+06, -7.876883330E+03,  1.768770469E+01, -1.581298721E-03,
                       3.068917255E-07, -3.183405460E-11,  1.363827177E-15),
};
static const struct gas_interval fluoromethane[] = {
    FIT(  200,  1000, -2.029821878E+05,  3.447331130E+03, -1.768994275E+01,  5.945275800E-02,
                      -6.469528250E-05,  3.859418040E-08, -9.626541530E-12),
    FIT( 1000,  6000,  2.561903188E+06, -1.086052758E+04,  1.929446920E+01, -2.070973131E-03,
                       3.929124530E-07, -3.994503420E-11,  1.681447081E-15),
};
static const struct gas_interval chlorotrifluoromethane[] = {
    FIT(  200,  1000,  1.499409978E+04, -1.365768572E+02,  1.452912370E+00,  3.404765070E-02,
                      -4.473777640E-05,  2.888115112E-08, -7.434171330E-12),
    FIT( 1000,  6000, -4.066042120E+05, -1.022626507E+03,  1.376252628E+01, -3.052722979E-04,
                       6.755966040E-08, -7.759315250E-12,  3.601192290E-16),
};
static const struct gas_interval dichlorodifluoromethane[] = {
    FIT(  200,  1000,  3.841258750E+04, -6.139499820E+02,  5.269667190E+00,  2.574105783E-02,
                      -3.587376480E-05,  2.411600130E-08, -6.402236900E-12),
    FIT( 1000,  6000, -3.827448550E+05, -6.933774800E+02,  1.351791274E+01, -2.075114435E-04,
                       4.594021610E-08, -5.276874600E-12,  2.449037044E-16),
};
static const struct gas_interval trichlorofluoromethane[] = {
    FIT(  200,  1000,  7.400174000E+04, -1.252282466E+03,  1.001327229E+01,  1.475107601E-02,
                      -2.315635251E-05,  1.664207025E-08, -4.622929960E-12),
    FIT( 1000,  6000, -3.450464780E+05, -4.177821450E+02,  1.331196736E+01, -1.248759531E-04,
                       2.761391353E-08, -3.168207640E-12,  1.468834601E-16),
};
static const struct gas_interval carbon_tetrachloride[] = {
    FIT(  200,  1000,  1.093385626E+05, -1.861731846E+03,  1.449632467E+01,  3.949485160E-03,
                      -1.010805379E-05,  8.645514170E-09, -2.642368852E-12),
    FIT( 1000,  6000, -3.043078255E+05, -2.168170491E+02,  1.316132386E+01, -6.431124890E-05,
                       1.416482497E-08, -1.619343320E-12,  7.483974350E-17),
};
static const struct gas_interval chlorodifluoromethane[] = {
    FIT(  200,  1000, -7.240579410E+04,  1.365510973E+03, -7.153222080E+00,  4.854987970E-02,
                      -5.948781670E-05,  3.750966190E-08, -9.589524420E-12),
    FIT( 1000,  6000,  5.629493730E+05, -4.298673050E+03,  1.558191398E+01, -8.789278480E-04,
                       1.720248689E-07, -1.797910869E-11,  7.753391700E-16),
};
static const struct gas_interval dichlorofluoromethane[] = {
    FIT(  200,  1000, -1.734959015E+04,  4.924913200E+02, -1.854635884E+00,  3.782786280E-02,
                      -4.863343040E-05,  3.197197630E-08, -8.459057990E-12),
    FIT( 1000,  6000,  5.640113020E+05, -3.887083300E+03,  1.527760246E+01, -7.576487420E-04,
                       1.452498792E-07, -1.490796515E-11,  6.328998500E-16),
};
static const struct gas_interval chloroform[] = {
    FIT(  200,  1000,  3.395333290E+04, -3.047428785E+02,  2.923672263E+00,  2.830547858E-02,
                      -3.712424690E-05,  2.551365915E-08, -6.987659550E-12),
    FIT( 1000,  6000,  6.136052740E+05, -3.715087170E+03,  1.510777247E+01,  2.362584336E-04,
                       1.297140438E-07, -1.267494791E-11,  5.259022310E-16),
};
static const struct gas_interval dichloromethane[] = {
    FIT(  200,  1000, -2.509841179E+04,  8.687667380E+02, -5.094669210E+00,  4.150049990E-02,
                      -5.199772150E-05,  3.445944260E-08, -9.270292520E-12),
    FIT( 1000,  6000,  1.529279337E+06, -6.976954760E+03,  1.694154931E+01, -1.265053995E-03,
                       2.344766734E-07, -2.333227421E-11,  9.632834730E-16),
};
static const struct gas_interval chloromethane[] = {
    FIT(  200,  1000, -9.841971100E+04,  1.983700841E+03, -1.084512305E+01,  4.777980050E-02,
                      -5.515516260E-05,  3.506176140E-08, -9.236103960E-12),
    FIT( 1000,  6000,  2.522463305E+06, -1.030115447E+04,  1.882725852E+01, -1.872291294E-03,
                       3.473372860E-07, -3.458887220E-11,  1.428941079E-15),
};
static const struct gas_interval bromomethane[] = {
    FIT(  200,  1000, -7.115585770E+04,  1.524705928E+03, -8.230445210E+00,  4.239973210E-02,
                      -4.946979890E-05,  3.194433340E-08, -8.531237080E-12),
    FIT( 1000,  6000,  2.524874348E+06, -1.011876098E+04,  1.865902163E+01, -1.797673690E-03,
                       3.298520110E-07, -3.250912030E-11,  1.330179925E-15),
};
static const struct gas_interval bromotrifluoromethane[] = {
    FIT(  200,  1000, -5.439489010E+03,  1.243615190E+02,  9.231941950E-01,  3.481044380E-02,
                      -4.549645490E-05,  2.932836552E-08, -7.548000360E-12),
    FIT( 1000,  6000, -3.834088510E+05, -9.719093300E+02,  1.372477396E+01, -2.901710612E-04,
                       6.421892200E-08, -7.375688770E-12,  3.423154250E-16),
};
static const struct gas_interval bromochlorodifluoromethane[] = {
    FIT(  200,  1000,  2.696699365E+04, -4.678832270E+02,  5.244809420E+00,  2.530121349E-02,
                      -3.508443520E-05,  2.354353958E-08, -6.246161130E-12),
    FIT( 1000,  6000, -3.592828840E+05, -6.539283590E+02,  1.348831524E+01, -1.956099469E-04,
                       4.329775970E-08, -4.972644370E-12,  2.307575050E-16),
};
static const struct gas_interval tetrafluoroethylene[] = {
    FIT(  200,  1000, -9.991530070E+03, -1.291088427E+02,  4.504229050E+00,  2.592029640E-02,
                      -2.630308720E-05,  1.316489777E-08, -2.625017169E-12),
    FIT( 1000,  6000, -1.629915758E+05, -2.603903955E+03,  1.788488423E+01, -7.397038010E-04,
                       1.614460340E-07, -1.835820392E-11,  8.457641070E-16),
};
static const struct gas_interval hexafluoroethane[] = {
    FIT(  200,  1000, -3.795371700E+04,  7.998276400E+02, -4.671561810E+00,  7.501450990E-02,
                      -9.812116100E-05,  6.319807590E-08, -1.622597311E-11),
    FIT( 1000,  6000, -1.011551484E+06, -9.422140710E+02,  2.202553906E+01, -1.314518750E-04,
                       1.866045300E-08, -3.467118610E-12,  2.488311205E-16),
};
static const struct gas_interval trifluoroethylene[] = {
    FIT(  200,  1000, -1.410969036E+04,  3.687624920E+02, -1.144797568E+00,  3.956306020E-02,
                      -4.602001360E-05,  2.785149385E-08, -6.903760080E-12),
    FIT( 1000,  6000,  6.917413780E+05, -5.260301640E+03,  1.915276614E+01, -1.072493938E-03,
                       2.099276744E-07, -2.195126633E-11,  9.472702400E-16),
};
static const struct gas_interval vinyl_fluoride[] = {
    FIT(  200,  1000, -4.579134960E+04,  1.411541724E+03, -1.021500877E+01,  5.775816570E-02,
                      -7.080677490E-05,  4.640850760E-08, -1.240455865E-11),
    FIT( 1000,  6000,  2.478832340E+06, -1.075932307E+04,  2.194796688E+01, -1.869114110E-03,
                       3.395280670E-07, -3.315382930E-11,  1.345081799E-15),
};
static const struct gas_interval vinyl_chloride[] = {
    FIT(  200,  1000, -1.688896130E+04,  8.545105550E+02, -6.514968110E+00,  4.944682090E-02,
                      -6.117756910E-05,  4.067294030E-08, -1.101392662E-11),
    FIT( 1000,  6000,  2.456178566E+06, -1.047452720E+04,  2.178736544E+01, -1.816893523E-03,
                       3.296374030E-07, -3.214400710E-11,  1.302256512E-15),
};
static const struct gas_interval trichloroethylene[] = {
    FIT(  200,  1000,  3.959233060E+04, -5.178756040E+02,  5.155030160E+00,  2.816922101E-02,
                      -3.624741150E-05,  2.392073843E-08, -6.362400700E-12),
    FIT( 1000,  6000,  6.049298240E+05, -4.237003190E+03,  1.846274582E+01, -8.137243260E-04,
                       1.551223511E-07, -1.584645594E-11,  6.701006540E-16),
};
static const struct gas_interval tetrachloroethylene[] = {
    FIT(  200,  1000,  3.746257500E+04, -8.481774390E+02,  1.009156041E+01,  1.845463807E-02,
                      -2.390899731E-05,  1.514828471E-08, -3.841119950E-12),
    FIT( 1000,  6000, -3.001289625E+05, -1.132413909E+03,  1.683073063E+01, -3.288820170E-04,
                       7.220975400E-08, -8.245417760E-12,  3.810154710E-16),
};
static const struct gas_interval chlorotrifluoroethylene[] = {
    FIT(  200,  1000, -8.122270310E+03, -1.574007092E+02,  5.041810290E+00,  2.621692321E-02,
                      -2.843001445E-05,  1.537643979E-08, -3.360730670E-12),
    FIT( 1000,  6000, -2.162724659E+05, -2.195103372E+03,  1.759605428E+01, -6.282617290E-04,
                       1.374166610E-07, -1.565004037E-11,  7.218309900E-16),
};
static const struct gas_interval phosgene[] = {
    FIT(  200,  1000,  9.319321450E+04, -1.577971273E+03,  1.208353907E+01, -4.809015610E-03,
                       7.688477320E-06, -5.858841200E-09,  1.687786559E-12),
    FIT( 1000,  6000, -2.545881891E+04, -1.305958516E+03,  1.092922584E+01, -3.601210160E-04,
                       7.787017650E-08, -8.792452030E-12,  4.028696610E-16),
};
static const struct gas_interval carbonyl_fluoride[] = {
    FIT(  200,  1000,  5.263393150E+04, -4.618603390E+02,  2.774114516E+00,  1.831931082E-02,
                      -2.130172554E-05,  1.266924542E-08, -3.101675983E-12),
    FIT( 1000,  6000, -4.073806850E+04, -1.974009812E+03,  1.140363654E+01, -5.437111470E-04,
                       1.175232744E-07, -1.326564192E-11,  6.076772130E-16),
};

static const struct gas_species gases[] = {
    {.name = "carbon tetrafluoride", .formula = "CF4", .cas = "75-73-0",
     .aliases = "tetrafluoromethane|carbon tetrafluoride|R-14|PFC-14", .element = {{"C", 1}, {"F", 4}},
     HEAT(carbon_tetrafluoride, "g 7/99: Hf:TRC(12/94) w6520. Gurvich,1991 pt1 p79 pt2 p58."),
     BOILS(145.09, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(227.5, IUPAC_CRITICAL, 3740000, VDI_ATLAS, 0.179, YAWS_2014)},
    {.name = "trifluoromethane", .formula = "CHF3", .cas = "75-46-7", .aliases = "fluoroform|R-23|HFC-23",
     .element = {{"C", 1}, {"H", 1}, {"F", 3}},
     HEAT(trifluoromethane, "g 8/99: Hf:TRC(12/89) w6880. Gurvich,1991 pt1 p97 pt2 p72."), BOILS(191.0, JOBACK_1984),
     DIPOLE(1.651, NSRDS_10), CRITICAL(299.01, PINA_MARTINEZ, 4816000, PINA_MARTINEZ, 0.264, YAWS_2014)},
    {.name = "difluoromethane", .formula = "CH2F2", .cas = "75-10-5", .aliases = "methylene fluoride|R-32|HFC-32",
     .element = {{"C", 1}, {"H", 2}, {"F", 2}},
     HEAT(difluoromethane, "g 8/99: Hf:TRC(12/89) w6880. Gurvich,1991 pt1 p96 pt2 p71."),
     BOILS(221.5, YAWS_2009_ORGANIC), DIPOLE(1.978, NSRDS_10),
     CRITICAL(351.26, VDI_ATLAS, 5784000, PINA_MARTINEZ, 0.271, PSRK_4)},
    {.name = "fluoromethane", .formula = "CH3F", .cas = "593-53-3", .aliases = "methyl fluoride|R-41|HFC-41",
     .element = {{"C", 1}, {"H", 3}, {"F", 1}},
     HEAT(fluoromethane, "g 8/99: Hf:TRC(12/89) w6880. Gurvich,1991 pt1 p93 pt2 p69."), BOILS(194.84, CRC_102),
     DIPOLE(1.858, NSRDS_10), CRITICAL(317.42, CRC_102, 5875400, JOBACK_1984, 0.198, PERRY_8)},
    {.name = "chlorotrifluoromethane", .formula = "CClF3", .cas = "75-72-9", .aliases = "CF3Cl|R-13|CFC-13",
     .element = {{"C", 1}, {"Cl", 1}, {"F", 3}},
     HEAT(chlorotrifluoromethane, "g 7/99: Hf:TRC(6/89) w7350. Gurvich,1991 pt1 p137 pt2 p109."),
     BOILS(191.74, YAWS_2009_ORGANIC), DIPOLE(0.5, NSRDS_10),
     CRITICAL(302.0, PINA_MARTINEZ, 3870000, VDI_ATLAS, 0.172, VDI_ATLAS)},
    {.name = "dichlorodifluoromethane", .formula = "CCl2F2", .cas = "75-71-8", .aliases = "CF2Cl2|R-12|CFC-12",
     .element = {{"C", 1}, {"Cl", 2}, {"F", 2}},
     HEAT(dichlorodifluoromethane, "g 7/99: Hf:TRC(6/89) w7350.Gurvich,1991 pt1 p139 pt2 p111."),
     BOILS(243.4, CRC_102), DIPOLE(0.51, NSRDS_10),
     CRITICAL(384.95, PINA_MARTINEZ, 4125000, PINA_MARTINEZ, 0.18, YAWS_2014)},
    {.name = "trichlorofluoromethane", .formula = "CCl3F", .cas = "75-69-4",
     .aliases = "CFCl3|fluorotrichloromethane|R-11|CFC-11", .element = {{"C", 1}, {"Cl", 3}, {"F", 1}},
     HEAT(trichlorofluoromethane, "g 7/99: Hf:TRC(6/89) w7350. Gurvich,1991 pt1 p140 pt2 p112."),
     BOILS(296.9, CRC_102), DIPOLE(0.46, NSRDS_10),
     CRITICAL(471.15, PSRK_4, 4408000, PINA_MARTINEZ, 0.189, YAWS_2014)},
    {.name = "carbon tetrachloride", .formula = "CCl4", .cas = "56-23-5", .aliases = "tetrachloromethane|R-10",
     .element = {{"C", 1}, {"Cl", 4}}, HEAT(carbon_tetrachloride, "tpis91: Gurvich,1991 pt1 p111 pt2 p84."),
     BOILS(349.9, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(556.35, PERRY_8, 4560000, VDI_ATLAS, 0.193, VDI_ATLAS)},
    {.name = "chlorodifluoromethane", .formula = "CHClF2", .cas = "75-45-6",
     .aliases = "CHF2Cl|difluorochloromethane|R-22|HCFC-22", .element = {{"C", 1}, {"H", 1}, {"Cl", 1}, {"F", 2}},
     HEAT(chlorodifluoromethane, "g 7/99: Hf:TRC(6/89) w7350. Gurvich,1991 pt1 p148 pt2 p123."),
     BOILS(232.32, YAWS_2009_ORGANIC), DIPOLE(1.42, NSRDS_10),
     CRITICAL(369.3, CRC_95, 4975057, PSRK_4, 0.219, YAWS_2014)},
    {.name = "dichlorofluoromethane", .formula = "CHCl2F", .cas = "75-43-4",
     .aliases = "CHFCl2|fluorodichloromethane|R-21|HCFC-21", .element = {{"C", 1}, {"H", 1}, {"Cl", 2}, {"F", 1}},
     HEAT(dichlorofluoromethane, "g 7/99: Hf:TRC(6/89) w7350. Gurvich,1991 pt1 p149 pt2 p124."),
     BOILS(282.1, CRC_102), DIPOLE(1.29, NSRDS_10), CRITICAL(451.6, CRC_102, 5184000, VDI_ATLAS, 0.205, VDI_ATLAS)},
    {.name = "chloroform", .formula = "CHCl3", .cas = "67-66-3", .aliases = "trichloromethane|R-20",
     .element = {{"C", 1}, {"H", 1}, {"Cl", 3}}, HEAT(chloroform, "g 7/99: Gurvich,1991 pt1 p127 pt2 p98."),
     BOILS(334.33, YAWS_2009_ORGANIC), DIPOLE(1.04, NSRDS_10),
     CRITICAL(536.4, PERRY_8, 5472000, PINA_MARTINEZ, 0.222, YAWS_2014)},
    {.name = "dichloromethane", .formula = "CH2Cl2", .cas = "75-09-2", .aliases = "methylene chloride|R-30",
     .element = {{"C", 1}, {"H", 2}, {"Cl", 2}}, HEAT(dichloromethane, "tpis91: Gurvich,1991 pt1 p125 pt2 p97."),
     BOILS(312.9, YAWS_2009_ORGANIC), DIPOLE(1.6, NSRDS_10),
     CRITICAL(510.0, PINA_MARTINEZ, 6350000, IUPAC_CRITICAL, 0.199, YAWS_2014)},
    {.name = "chloromethane", .formula = "CH3Cl", .cas = "74-87-3", .aliases = "methyl chloride|R-40",
     .element = {{"C", 1}, {"H", 3}, {"Cl", 1}}, HEAT(chloromethane, "tpis91: Gurvich,1991 pt1 p122 pt2 p95."),
     BOILS(249.1, CRC_102), DIPOLE(1.896, NSRDS_10),
     CRITICAL(416.25, IUPAC_CRITICAL, 6680000, IUPAC_CRITICAL, 0.153, YAWS_2014)},
    {.name = "bromomethane", .formula = "CH3Br", .cas = "74-83-9", .aliases = "methyl bromide|R-40B1",
     .element = {{"C", 1}, {"H", 3}, {"Br", 1}}, HEAT(bromomethane, "g 8/99: Kudchadker,1975."),
     BOILS(276.71, YAWS_2009_ORGANIC), DIPOLE(1.822, NSRDS_10),
     CRITICAL(467.0, PERRY_8, 8000000, PERRY_8, 0.192, PERRY_8)},
    {.name = "bromotrifluoromethane", .formula = "CBrF3", .cas = "75-63-8", .aliases = "CF3Br|R-13B1|halon 1301",
     .element = {{"C", 1}, {"Br", 1}, {"F", 3}},
     HEAT(bromotrifluoromethane, "tpis91: Gurvich,1991 pt1 p165 pt2 p144."), BOILS(215.3, JOBACK_1984),
     DIPOLE(0.65, NSRDS_10), CRITICAL(340.15, PINA_MARTINEZ, 3970000, PINA_MARTINEZ, 0.17, YAWS_2014)},
    {.name = "bromochlorodifluoromethane", .formula = "CBrClF2", .cas = "353-59-3",
     .aliases = "CF2ClBr|R-12B1|halon 1211", .element = {{"C", 1}, {"Br", 1}, {"Cl", 1}, {"F", 2}},
     HEAT(bromochlorodifluoromethane, "tpis91: Gurvich,1991 pt1 p173 pt2 p156."), BOILS(269.3, CRC_102),
     DIPOLE(NAN, NONE), CRITICAL(426.9, IUPAC_CRITICAL, 4254000, PINA_MARTINEZ, 0.187, YAWS_2014)},
    {.name = "tetrafluoroethylene", .formula = "C2F4", .cas = "116-14-3", .aliases = "tetrafluoroethene|TFE|R-1114",
     .element = {{"C", 2}, {"F", 4}}, HEAT(tetrafluoroethylene, "tpis91: Gurvich,1991 pt1 p84 pt2 p62."),
     BOILS(197.51, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(307.0, IUPAC_CRITICAL, 3940000, IUPAC_CRITICAL, 0.227, YAWS_2014)},
    {.name = "hexafluoroethane", .formula = "C2F6", .cas = "76-16-4", .aliases = "perfluoroethane|R-116|PFC-116",
     .element = {{"C", 2}, {"F", 6}}, HEAT(hexafluoroethane, "g12/99: Gurvich,1991 pt1 p86 pt2 p64."),
     BOILS(194.95, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(292.9, CRC_102, 3030000, CRC_102, 0.249, YAWS_2014)},
    {.name = "trifluoroethylene", .formula = "C2HF3", .cas = "359-11-5", .aliases = "trifluoroethene|R-1123",
     .element = {{"C", 2}, {"H", 1}, {"F", 3}}, HEAT(trifluoroethylene, "tpis91: Gurvich,1991 pt1 p105 pt2 p79."),
     BOILS(221.01, YAWS_2009_ORGANIC), DIPOLE(1.32, NSRDS_10),
     CRITICAL(347.22, YAWS_2014, 4516000, YAWS_2014, 0.238, YAWS_2014)},
    {.name = "vinyl fluoride", .formula = "C2H3F", .cas = "75-02-5", .aliases = "fluoroethylene|fluoroethene|R-1141",
     .element = {{"C", 2}, {"H", 3}, {"F", 1}}, HEAT(vinyl_fluoride, "tpis91: Gurvich,1991 pt1 p100 pt2 p74."),
     BOILS(200.95, YAWS_2009_ORGANIC), DIPOLE(1.468, NSRDS_10),
     CRITICAL(327.8, PINA_MARTINEZ, 5240000, PINA_MARTINEZ, 0.143, YAWS_2014)},
    {.name = "vinyl chloride", .formula = "C2H3Cl", .cas = "75-01-4",
     .aliases = "chloroethylene|chloroethene|VCM|R-1140", .element = {{"C", 2}, {"H", 3}, {"Cl", 1}},
     HEAT(vinyl_chloride, "g 5/02: Hf:Manion,2002. Gurvich,1991 pt1 p129 pt2 p100."), BOILS(259.267, NIST_WEBBOOK),
     DIPOLE(1.45, NSRDS_10), CRITICAL(432.0, PERRY_8, 5670000, VDI_ATLAS, 0.106, PERRY_8)},
    {.name = "trichloroethylene", .formula = "C2HCl3", .cas = "79-01-6", .aliases = "trichloroethene|R-1120",
     .element = {{"C", 2}, {"H", 1}, {"Cl", 3}},
     HEAT(trichloroethylene, "g 5/02: Hf:Manion,2002. Gurvich,1991 pt1 p134 pt2 p105."),
     BOILS(360.1, YAWS_2009_ORGANIC), DIPOLE(0.8, NSRDS_10),
     CRITICAL(571.0, PINA_MARTINEZ, 4910000, VDI_ATLAS, 0.213, PSRK_4)},
    {.name = "tetrachloroethylene", .formula = "C2Cl4", .cas = "127-18-4",
     .aliases = "tetrachloroethene|perchloroethylene|R-1110", .element = {{"C", 2}, {"Cl", 4}},
     HEAT(tetrachloroethylene, "g 5/02: Hf:Manion,2002. Gurvich,1991 pt1 p115 pt2 p88."),
     BOILS(394.4, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(620.0, PINA_MARTINEZ, 4490000, VDI_ATLAS, 0.214, VDI_ATLAS)},
    {.name = "chlorotrifluoroethylene", .formula = "C2ClF3", .cas = "79-38-9",
     .aliases = "chlorotrifluoroethene|CTFE|R-1113", .element = {{"C", 2}, {"Cl", 1}, {"F", 3}},
     HEAT(chlorotrifluoroethylene, "tpis91: Gurvich,1991 pt1 p142 pt2 p114."), BOILS(244.8, YAWS_2009_ORGANIC),
     DIPOLE(0.4, NSRDS_10), CRITICAL(379.15, VDI_ATLAS, 4053000, VDI_ATLAS, 0.244, YAWS_2014)},
    {.name = "phosgene", .formula = "COCl2", .cas = "75-44-5", .aliases = "carbonyl chloride|carbonyl dichloride",
     .element = {{"C", 1}, {"O", 1}, {"Cl", 2}}, HEAT(phosgene, "tpis91: Gurvich,1991 pt1 p119 pt2 p92."),
     BOILS(280.71, YAWS_2009_ORGANIC), DIPOLE(1.17, NSRDS_10),
     CRITICAL(455.0, PINA_MARTINEZ, 5674000, VDI_ATLAS, 0.201, VDI_ATLAS)},
    {.name = "carbonyl fluoride", .formula = "COF2", .cas = "353-50-4",
     .aliases = "carbonyl difluoride|fluorophosgene", .element = {{"C", 1}, {"O", 1}, {"F", 2}},
     HEAT(carbonyl_fluoride, "tpis91: Gurvich,1991 pt1 p89 pt2 p66."), BOILS(190.05, YAWS_2009_INORGANIC),
     DIPOLE(0.95, NSRDS_10), CRITICAL(297.0, PINA_MARTINEZ, 5760000, PINA_MARTINEZ, 0.283, YAWS_2014)},
    {.name = "1,1-difluoroethylene", .formula = "C2H2F2", .cas = "75-38-7",
     .aliases = "1,1-difluoroethene|vinylidene fluoride|R-1132a", .element = {{"C", 2}, {"H", 2}, {"F", 2}}, NO_HEAT,
     BOILS(187.5, FROM_MEMORY), DIPOLE(1.389, NSRDS_10),
     CRITICAL(302.9, CRC_95, 4460000, PINA_MARTINEZ, 0.1506, PSRK_4)},
    {.name = "1,1,1,2-tetrafluoroethane", .formula = "C2H2F4", .cas = "811-97-2", .aliases = "R-134a|HFC-134a",
     .element = {{"C", 2}, {"H", 2}, {"F", 4}}, NO_HEAT, BOILS(247.08, FROM_MEMORY), DIPOLE(2.06, NSRDS_10),
     CRITICAL(374.18, IUPAC_CRITICAL, 4056000, PINA_MARTINEZ, 0.3259, PSRK_4)},
    {.name = "pentafluoroethane", .formula = "C2HF5", .cas = "354-33-6",
     .aliases = "1,1,1,2,2-pentafluoroethane|R-125|HFC-125", .element = {{"C", 2}, {"H", 1}, {"F", 5}}, NO_HEAT,
     BOILS(225.06, FROM_MEMORY), DIPOLE(1.56, NSRDS_10),
     CRITICAL(339.2, CRC_95, 3620000, PINA_MARTINEZ, 0.3003, PSRK_4)},
    {.name = "1,1-difluoroethane", .formula = "C2H4F2", .cas = "75-37-6", .aliases = "R-152a|HFC-152a",
     .element = {{"C", 2}, {"H", 4}, {"F", 2}}, NO_HEAT, BOILS(249.13, FROM_MEMORY), DIPOLE(2.27, NSRDS_10),
     CRITICAL(386.43, IUPAC_CRITICAL, 4520000, IUPAC_CRITICAL, 0.2586, PSRK_4)},
    {.name = "1,1,1-trifluoroethane", .formula = "C2H3F3", .cas = "420-46-2", .aliases = "R-143a|HFC-143a",
     .element = {{"C", 2}, {"H", 3}, {"F", 3}}, NO_HEAT, BOILS(225.91, FROM_MEMORY), DIPOLE(2.347, NSRDS_10),
     CRITICAL(345.88, PINA_MARTINEZ, 3764000, PINA_MARTINEZ, 0.2619, PSRK_4)},
};
/* clang-format on */

const struct gas_family gas_family_halocarbons = {sizeof gases / sizeof gases[0], gases};
