/*
 * Hydrocarbons.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval methane[] = {
    FIT(  200,  1000, -1.766850998E+05,  2.786181020E+03, -1.202577850E+01,  3.917619290E-02,
                      -3.619054430E-05,  2.026853043E-08, -4.976705490E-12),
    FIT( 1000,  6000,  3.730042760E+06, -1.383501485E+04,  2.049107091E+01, -1.961974759E-03,
                       4.727313040E-07, -3.728814690E-11,  1.623737207E-15),
};
static const struct gas_interval ethane[] = {
    FIT(  200,  1000, -1.862044161E+05,  3.406191860E+03, -1.951705092E+01,  7.565835590E-02,
                      -8.204173220E-05,  5.061135800E-08, -1.319281992E-11),
    FIT( 1000,  6000,  5.025782130E+06, -2.033022397E+04,  3.322552930E+01, -3.836703410E-03,
                       7.238405860E-07, -7.319182500E-11,  3.065468699E-15),
};
static const struct gas_interval ethylene[] = {
    FIT(  200,  1000, -1.163605836E+05,  2.554851510E+03, -1.609746428E+01,  6.625779320E-02,
                      -7.885081860E-05,  5.125224820E-08, -1.370340031E-11),
    FIT( 1000,  6000,  3.408763670E+06, -1.374847903E+04,  2.365898074E+01, -2.423804419E-03,
                       4.431395660E-07, -4.352683390E-11,  1.775410633E-15),
};
static const struct gas_interval acetylene[] = {
    FIT(  200,  1000,  1.598112089E+05, -2.216644118E+03,  1.265707813E+01, -7.979651080E-03,
                       8.054992750E-06, -2.433307673E-09, -7.529233180E-14),
    FIT( 1000,  6000,  1.713847410E+06, -5.929106660E+03,  1.236127943E+01,  1.314186993E-04,
                      -1.362764431E-07,  2.712655786E-11, -1.302066204E-15),
};
static const struct gas_interval propane[] = {
    FIT(  200,  1000, -2.433144337E+05,  4.656270810E+03, -2.939466091E+01,  1.188952745E-01,
                      -1.376308269E-04,  8.814823910E-08, -2.342987994E-11),
    FIT( 1000,  6000,  6.420731680E+06, -2.659791134E+04,  4.534356840E+01, -5.020663920E-03,
                       9.471216940E-07, -9.575405230E-11,  4.009672880E-15),
};
static const struct gas_interval propylene[] = {
    FIT(  200,  1000, -1.912462174E+05,  3.542074240E+03, -2.114878626E+01,  8.901484790E-02,
                      -1.001429154E-04,  6.267959390E-08, -1.637870781E-11),
    FIT( 1000,  6000,  5.017620340E+06, -2.086084035E+04,  3.644156340E+01, -3.881191170E-03,
                       7.278677190E-07, -7.321204500E-11,  3.052176369E-15),
};
static const struct gas_interval cyclopropane[] = {
    FIT(  200,  1000, -1.565787770E+05,  4.111129870E+03, -3.233447460E+01,  1.306337881E-01,
                      -1.645563833E-04,  1.095708326E-07, -2.956394783E-11),
    FIT( 1000,  6000,  4.785000670E+06, -2.042118175E+04,  3.631495780E+01, -3.561319440E-03,
                       6.476241240E-07, -6.328430100E-11,  2.568705857E-15),
};
static const struct gas_interval propadiene[] = {
    FIT(  200,  1000, -1.645155745E+04,  9.629457810E+02, -7.532326680E+00,  5.518219110E-02,
                      -6.733585120E-05,  4.532709050E-08, -1.251837614E-11),
    FIT( 1000,  6000,  3.479355100E+06, -1.430412453E+04,  2.702534756E+01, -2.557412369E-03,
                       4.706646750E-07, -4.651688070E-11,  1.908219044E-15),
};
static const struct gas_interval propyne[] = {
    FIT(  200,  1000, -3.563884400E+04,  8.328139100E+02, -4.073759440E+00,  4.113929610E-02,
                      -4.470444950E-05,  2.847458197E-08, -7.695298240E-12),
    FIT( 1000,  6000,  3.710441420E+06, -1.489145507E+04,  2.732397127E+01, -2.645264770E-03,
                       4.858300350E-07, -4.794128480E-11,  1.964338121E-15),
};
static const struct gas_interval n_butane[] = {
    FIT(  200,  1000, -3.175872540E+05,  6.176331820E+03, -3.891562120E+01,  1.584654284E-01,
                      -1.860050159E-04,  1.199676349E-07, -3.201670550E-11),
    FIT( 1000,  6000,  7.682322450E+06, -3.256051510E+04,  5.736732750E+01, -6.197916810E-03,
                       1.180186048E-06, -1.221893698E-10,  5.250635250E-15),
};
static const struct gas_interval isobutane[] = {
    FIT(  200,  1000, -3.834469330E+05,  7.000039640E+03, -4.440026900E+01,  1.746183447E-01,
                      -2.078195348E-04,  1.339792433E-07, -3.551681630E-11),
    FIT( 1000,  6000,  7.528018920E+06, -3.202517060E+04,  5.700161000E+01, -6.060013090E-03,
                       1.143975809E-06, -1.157061835E-10,  4.846042910E-15),
};
static const struct gas_interval gas_1_butene[] = {
    FIT(  200,  1000, -2.721492014E+05,  5.100079250E+03, -3.183786250E+01,  1.317754442E-01,
                      -1.527359339E-04,  9.714761110E-08, -2.560204470E-11),
    FIT( 1000,  6000,  6.257948610E+06, -2.660376305E+04,  4.764920050E+01, -4.383267110E-03,
                       7.128838440E-07, -5.991020840E-11,  2.051753504E-15),
};
static const struct gas_interval cis_2_butene[] = {
    FIT(  200,  1000, -2.773870877E+05,  5.382384040E+03, -3.375188100E+01,  1.322980623E-01,
                      -1.490975922E-04,  9.277722000E-08, -2.408282948E-11),
    FIT( 1000,  6000,  6.461018350E+06, -2.775376432E+04,  4.863532360E+01, -4.862386350E-03,
                       8.412626100E-07, -7.633890370E-11,  2.861702826E-15),
};
static const struct gas_interval trans_2_butene[] = {
    FIT(  200,  1000, -3.594644110E+05,  5.930972080E+03, -3.255825290E+01,  1.254957780E-01,
                      -1.374705365E-04,  8.407341350E-08, -2.163047345E-11),
    FIT( 1000,  6000,  6.444758090E+06, -2.750706151E+04,  4.870329380E+01, -4.952445460E-03,
                       8.700135910E-07, -8.017471710E-11,  3.052575093E-15),
};
static const struct gas_interval isobutene[] = {
    FIT(  200,  1000, -2.327205032E+05,  3.941994240E+03, -2.224581184E+01,  1.012790864E-01,
                      -1.073194065E-04,  6.454696910E-08, -1.646330345E-11),
    FIT( 1000,  6000,  6.484970990E+06, -2.732504764E+04,  4.836321080E+01, -4.768004050E-03,
                       8.233875840E-07, -7.449253000E-11,  2.782303056E-15),
};
static const struct gas_interval gas_1_3_butadiene[] = {
    FIT(  200,  1000, -9.181130530E+04,  3.312570530E+03, -2.985828611E+01,  1.479201147E-01,
                      -2.056618326E-04,  1.466496826E-07, -4.145285730E-11),
    FIT( 1000,  6000, -2.361903188E+07,  5.651323370E+04, -3.275738320E+01,  2.293070572E-02,
                      -2.297106441E-06,  4.292596210E-11,  4.236766040E-15),
};
static const struct gas_interval n_pentane[] = {
    FIT(  200,  1000, -2.768894625E+05,  5.834283470E+03, -3.617541480E+01,  1.533339707E-01,
                      -1.528395882E-04,  8.191092000E-08, -1.792327902E-11),
    FIT( 1000,  6000, -2.530779286E+06, -8.972593260E+03,  4.536223260E+01, -2.626989916E-03,
                       3.135136419E-06, -5.318728940E-10,  2.886896868E-14),
};
static const struct gas_interval isopentane[] = {
    FIT(  200,  1000, -4.231903390E+05,  6.497189100E+03, -3.681126970E+01,  1.532424729E-01,
                      -1.548790714E-04,  8.749897120E-08, -2.070547710E-11),
    FIT( 1000,  6000,  1.156888594E+07, -4.556246870E+04,  7.495443630E+01, -7.845415580E-03,
                       1.444393314E-06, -1.464370213E-10,  6.230285000E-15),
};
static const struct gas_interval neopentane[] = {
    FIT(  200,  1000, -8.973222270E+06,  1.289225617E+05, -7.199344830E+02,  2.056862183E+00,
                      -2.953159699E-03,  2.158893146E-06, -6.268318770E-10),
    FIT( 1000,  6000,  1.684705520E+07, -5.979430570E+04,  8.685451480E+01, -9.621917600E-03,
                       1.653363091E-06, -1.674727926E-10,  7.372119360E-15),
};
static const struct gas_interval gas_1_pentene[] = {
    FIT(  200,  1000, -5.340548130E+05,  9.298917380E+03, -5.667792450E+01,  2.123100266E-01,
                      -2.571298290E-04,  1.666834304E-07, -4.434080470E-11),
    FIT( 1000,  6000,  3.744014970E+06, -2.104485321E+04,  4.736126990E+01, -4.244201200E-04,
                      -3.898975050E-08,  1.367074243E-11, -9.313194230E-16),
};
static const struct gas_interval cyclopentane[] = {
    FIT(  200,  1000, -4.141119710E+05,  8.627592800E+03, -6.202959980E+01,  2.259910921E-01,
                      -2.682303330E-04,  1.706289935E-07, -4.464050920E-11),
    FIT( 1000,  6000,  7.501938730E+06, -3.505864850E+04,  6.322480750E+01, -6.940356580E-03,
                       1.337306593E-06, -1.377905033E-10,  5.867357640E-15),
};
static const struct gas_interval n_hexane[] = {
    FIT(  200,  1000, -5.815926700E+05,  1.079097724E+04, -6.633947030E+01,  2.523715155E-01,
                      -2.904344705E-04,  1.802201514E-07, -4.617223680E-11),
    FIT( 1000,  6000, -3.106625684E+06, -7.346087920E+03,  4.694131760E+01,  1.693963977E-03,
                       2.068996667E-06, -4.212141680E-10,  2.452345845E-14),
};
static const struct gas_interval gas_1_hexene[] = {
    FIT(  200,  1000, -6.668831650E+05,  1.176864939E+04, -7.270998330E+01,  2.709398396E-01,
                      -3.333246400E-04,  2.182347097E-07, -5.859468820E-11),
    FIT( 1000,  6000,  7.332906960E+05, -1.448848641E+04,  4.671215490E+01,  3.172978470E-03,
                      -5.242646520E-07,  4.280355820E-11, -1.472353254E-15),
};
static const struct gas_interval cyclohexane[] = {
    FIT(  200,  1000, -5.679987040E+05,  1.034238704E+04, -6.800041250E+01,  2.387797658E-01,
                      -2.511890049E-04,  1.425293184E-07, -3.407833190E-11),
    FIT( 1000,  6000,  5.225149470E+06, -3.364194580E+04,  7.174607470E+01, -6.698979120E-03,
                       1.318443254E-06, -1.390794789E-10,  6.060102240E-15),
};
static const struct gas_interval n_heptane[] = {
    FIT(  200,  1000, -6.127432890E+05,  1.184085437E+04, -7.487188600E+01,  2.918466052E-01,
                      -3.416795490E-04,  2.159285269E-07, -5.655852730E-11),
    FIT( 1000,  6000,  9.135632470E+06, -3.923319690E+04,  7.889780850E+01, -4.654251930E-03,
                       2.071774142E-06, -3.442539300E-10,  1.976834775E-14),
};
static const struct gas_interval gas_1_heptene[] = {
    FIT(  200,  1000, -7.449402840E+05,  1.332179893E+04, -8.281694380E+01,  3.108065994E-01,
                      -3.786779920E-04,  2.446841042E-07, -6.488763870E-11),
    FIT( 1000,  6000, -1.927608174E+06, -9.125024420E+03,  4.748177970E+01,  6.067660530E-03,
                      -8.684859080E-07,  5.813995260E-11, -1.473979569E-15),
};
static const struct gas_interval n_octane[] = {
    FIT(  200,  1000, -6.986647150E+05,  1.338501096E+04, -8.415165920E+01,  3.271936660E-01,
                      -3.777209590E-04,  2.339836988E-07, -6.010892650E-11),
    FIT( 1000,  6000,  6.365406950E+06, -3.105364657E+04,  6.969162340E+01,  1.048059637E-02,
                      -4.129621950E-06,  5.543226320E-10, -2.651436499E-14),
};
static const struct gas_interval gas_2_2_4_trimethylpentane[] = {
    FIT(  200,  1000, -1.688758565E+05,  3.126903227E+03, -2.123502828E+01,  1.489151508E-01,
                      -1.151180135E-04,  4.473216170E-08, -5.554882070E-12),
    FIT( 1000,  6000,  1.352765032E+07, -4.663370340E+04,  7.795313180E+01,  1.423729984E-02,
                      -5.073593910E-06,  7.248232970E-10, -3.819190110E-14),
};
static const struct gas_interval gas_1_octene[] = {
    FIT(  200,  1000, -9.281905220E+05,  1.640974476E+04, -1.015939534E+02,  3.748001410E-01,
                      -4.590829400E-04,  2.965335340E-07, -7.840445210E-11),
    FIT( 1000,  6000, -4.409336070E+06, -4.383678800E+03,  4.939154260E+01,  7.912339630E-03,
                      -7.888669510E-07,  9.970212350E-12,  1.913144872E-15),
};
static const struct gas_interval benzene[] = {
    FIT(  200,  1000, -1.677340902E+05,  4.404500040E+03, -3.717377910E+01,  1.640509559E-01,
                      -2.020812374E-04,  1.307915264E-07, -3.444284100E-11),
    FIT( 1000,  6000,  4.538575720E+06, -2.260502547E+04,  4.694007300E+01, -4.206676830E-03,
                       7.907994330E-07, -7.968302100E-11,  3.328212080E-15),
};
static const struct gas_interval toluene[] = {
    FIT(  200,  1000, -2.877962220E+05,  6.133941520E+03, -4.574706760E+01,  1.936895724E-01,
                      -2.304305304E-04,  1.459301178E-07, -3.790796100E-11),
    FIT( 1000,  6000,  6.184538350E+06, -2.990284056E+04,  5.982005970E+01, -5.696983960E-03,
                       1.080748416E-06, -1.098702235E-10,  4.624740220E-15),
};
static const struct gas_interval styrene[] = {
    FIT(  200,  1000, -2.686930520E+05,  6.167999470E+03, -4.836054940E+01,  2.182873229E-01,
                      -2.738561832E-04,  1.810084981E-07, -4.867750270E-11),
    FIT( 1000,  6000, -6.629183620E+06,  1.514594166E+04,  1.609822364E+00,  3.383318600E-02,
                      -1.093737395E-05,  1.338825116E-09, -6.032534920E-14),
};
static const struct gas_interval ethylbenzene[] = {
    FIT(  200,  1000, -4.694940000E+05,  9.307168360E+03, -6.521769470E+01,  2.612080237E-01,
                      -3.181753480E-04,  2.051355473E-07, -5.401817350E-11),
    FIT( 1000,  6000,  5.551564100E+06, -2.831380598E+04,  6.061240720E+01,  1.042112857E-03,
                      -1.327426719E-06,  2.166031743E-10, -1.142545514E-14),
};
static const struct gas_interval naphthalene[] = {
    FIT(  200,  1000, -2.602845316E+05,  6.237409570E+03, -5.226095040E+01,  2.397692776E-01,
                      -2.912244803E-04,  1.854944401E-07, -4.816619270E-11),
    FIT( 1000,  6000,  5.906172110E+06, -3.163229240E+04,  7.030342030E+01, -6.018865540E-03,
                       1.142052144E-06, -1.161605689E-10,  4.892844020E-15),
};

static const struct gas_species gases[] = {
    {.name = "methane", .formula = "CH4", .cas = "74-82-8", .aliases = "marsh gas|firedamp|C1|R-50",
     .element = {{"C", 1}, {"H", 4}}, HEAT(methane, "g 8/99: Gurvich,1991 pt1 p44 pt2 p36."),
     BOILS(111.66, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(190.56, CRC_102, 4599000, IUPAC_CRITICAL, 0.011, PERRY_8)},
    {.name = "ethane", .formula = "C2H6", .cas = "74-84-0", .aliases = "C2|R-170", .element = {{"C", 2}, {"H", 6}},
     HEAT(ethane, "g 7/00: Ethane. Pamidimukkala,1982."), BOILS(184.6, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(305.32, IUPAC_CRITICAL, 4872000, IUPAC_CRITICAL, 0.099, POLING_5)},
    {.name = "ethylene", .formula = "C2H4", .cas = "74-85-1", .aliases = "ethene|C2=|R-1150",
     .element = {{"C", 2}, {"H", 4}}, HEAT(ethylene, "g 1/00: TRC(4/88) w2600. Chao,1975. Knippers,1985."),
     BOILS(169.42, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(282.34, IUPAC_CRITICAL, 5041000, IUPAC_CRITICAL, 0.086, PERRY_8)},
    {.name = "acetylene", .formula = "C2H2", .cas = "74-86-2", .aliases = "ethyne", .element = {{"C", 2}, {"H", 2}},
     HEAT(acetylene, "g 1/91: Hf:TRC(10/93) w-3040. Gurvich,1991 pt1 p47 pt2 p39."), BOILS(188.5, CRC_102),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(308.32, PERRY_8, 6138000, IUPAC_CRITICAL, 0.189, POLING_5)},
    {.name = "propane", .formula = "C3H8", .cas = "74-98-6", .aliases = "C3|R-290", .element = {{"C", 3}, {"H", 8}},
     HEAT(propane, "g 2/00: Hf:TRC(10/85) w1350. Chao,1973."), BOILS(231.1, JOBACK_1984), DIPOLE(0.084, NSRDS_10),
     CRITICAL(369.83, IUPAC_CRITICAL, 4248000, IUPAC_CRITICAL, 0.152, POLING_5)},
    {.name = "propylene", .formula = "C3H6", .cas = "115-07-1", .aliases = "propene|C3H6|C3=|R-1270",
     .element = {{"C", 3}, {"H", 6}}, HEAT(propylene, "g 2/00: Hf:TRC(4/88) w2600. Chao,1975."),
     BOILS(225.46, POLING_5), DIPOLE(0.366, NSRDS_10),
     CRITICAL(364.9, IUPAC_CRITICAL, 4600000, IUPAC_CRITICAL, 0.142, POLING_5)},
    {.name = "cyclopropane", .formula = "C3H6", .cas = "75-19-4", .aliases = "trimethylene|c-C3H6",
     .element = {{"C", 3}, {"H", 6}}, HEAT(cyclopropane, "g 1/00: Dorofeeva,1986. Butcher,1973b."),
     BOILS(240.37, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(398.0, IUPAC_CRITICAL, 5540000, IUPAC_CRITICAL, 0.127, YAWS_2014)},
    {.name = "propadiene", .formula = "C3H4", .cas = "463-49-0", .aliases = "allene|1,2-propadiene",
     .element = {{"C", 3}, {"H", 4}},
     HEAT(propadiene, "g 2/00: TRC(4/84) w2750. Shimanouchi,1972 p115. Butcher,1973a."),
     BOILS(238.65, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(394.0, IUPAC_CRITICAL, 5250000, IUPAC_CRITICAL, 0.132, VDI_ATLAS)},
    {.name = "propyne", .formula = "C3H4", .cas = "74-99-7", .aliases = "methylacetylene|methyl acetylene",
     .element = {{"C", 3}, {"H", 4}},
     HEAT(propyne, "g 1/00: Hf:TRC(10/93) w3040. Trambarulo,1950. Shimanouchi,1972."),
     BOILS(249.94, YAWS_2009_ORGANIC), DIPOLE(0.784, NSRDS_10),
     CRITICAL(402.4, IUPAC_CRITICAL, 5630000, IUPAC_CRITICAL, 0.215, JOBACK_1984)},
    {.name = "n-butane", .formula = "C4H10", .cas = "106-97-8",
     .aliases = "butane|normal butane|C4H10|n-C4H10|nC4|R-600", .element = {{"C", 4}, {"H", 10}},
     HEAT(n_butane, "g12/00: Hf:TRC(10/85) w1350. Chen,1975."), BOILS(272.7, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(425.12, IUPAC_CRITICAL, 3796000, IUPAC_CRITICAL, 0.2, POLING_5)},
    {.name = "isobutane", .formula = "C4H10", .cas = "75-28-5",
     .aliases = "2-methylpropane|methylpropane|i-butane|i-C4H10|iC4|R-600a", .element = {{"C", 4}, {"H", 10}},
     HEAT(isobutane, "g 8/00: TRC(10/85) w1350. Chen,1975."), BOILS(261.43, YAWS_2009_ORGANIC),
     DIPOLE(0.132, NSRDS_10), CRITICAL(407.84, CRC_102, 3640000, IUPAC_CRITICAL, 0.183, JOBACK_1984)},
    {.name = "1-butene", .formula = "C4H8", .cas = "106-98-9",
     .aliases = "but-1-ene|butene-1|1-butylene|alpha-butylene", .element = {{"C", 4}, {"H", 8}},
     HEAT(gas_1_butene, "n 4/88: TRC(4/88) tuvw2600."), BOILS(266.9, CRC_102), DIPOLE(0.34, NSRDS_10),
     CRITICAL(419.5, IUPAC_CRITICAL, 4020000, IUPAC_CRITICAL, 0.19, PERRY_8)},
    {.name = "cis-2-butene", .formula = "C4H8", .cas = "590-18-1",
     .aliases = "cis-but-2-ene|(Z)-2-butene|(Z)-but-2-ene|cis-butene-2", .element = {{"C", 4}, {"H", 8}},
     HEAT(cis_2_butene, "n 4/88: Cis2-butene TRC(4/88) tuvw2600."), BOILS(276.87, CRC_102), DIPOLE(0.253, NSRDS_10),
     CRITICAL(435.58, PERRY_8, 4210000, IUPAC_CRITICAL, 0.203, YAWS_2014)},
    {.name = "trans-2-butene", .formula = "C4H8", .cas = "624-64-6",
     .aliases = "trans-but-2-ene|(E)-2-butene|(E)-but-2-ene|trans-butene-2", .element = {{"C", 4}, {"H", 8}},
     HEAT(trans_2_butene, "n 4/88: TRC(4/88) tuvw-2600."), BOILS(274.03, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(428.6, IUPAC_CRITICAL, 4100000, IUPAC_CRITICAL, 0.216, PERRY_8)},
    {.name = "isobutene", .formula = "C4H8", .cas = "115-11-7",
     .aliases = "isobutylene|2-methylpropene|methylpropene|i-butene", .element = {{"C", 4}, {"H", 8}},
     HEAT(isobutene, "n 4/88: TRC(4/88) tuvw2600."), BOILS(266.2, CRC_102), DIPOLE(0.503, NSRDS_10),
     CRITICAL(417.9, IUPAC_CRITICAL, 4000000, IUPAC_CRITICAL, 0.19, PSRK_4)},
    {.name = "1,3-butadiene", .formula = "C4H6", .cas = "106-99-0", .aliases = "butadiene|buta-1,3-diene|divinyl",
     .element = {{"C", 4}, {"H", 6}}, HEAT(gas_1_3_butadiene, "n10/92: 1,3-butadiene. TRC(10/92) tuvw2820."),
     BOILS(268.74, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(425.0, IUPAC_CRITICAL, 4326578, PSRK_4, 0.193, YAWS_2014)},
    {.name = "n-pentane", .formula = "C5H12", .cas = "109-66-0",
     .aliases = "pentane|normal pentane|C5H12|n-C5H12|nC5|R-601", .element = {{"C", 5}, {"H", 12}},
     HEAT(n_pentane, "n10/85: TRC(10/85) tuvw1350."), BOILS(309.21, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(469.7, IUPAC_CRITICAL, 3370000, IUPAC_CRITICAL, 0.251, PERRY_8)},
    {.name = "isopentane", .formula = "C5H12", .cas = "78-78-4",
     .aliases = "2-methylbutane|methylbutane|i-pentane|i-C5H12|iC5|R-601a", .element = {{"C", 5}, {"H", 12}},
     HEAT(isopentane, "n10/85: 2-Methylbutane. TRC(10/85) tuvw1350."), BOILS(300.98, CRC_102),
     DIPOLE(0.13, NSRDS_10), CRITICAL(460.4, IUPAC_CRITICAL, 3380000, IUPAC_CRITICAL, 0.2273, PASSUT_DANNER)},
    {.name = "neopentane", .formula = "C5H12", .cas = "463-82-1",
     .aliases = "2,2-dimethylpropane|dimethylpropane|neo-C5H12|neoC5", .element = {{"C", 5}, {"H", 12}},
     HEAT(neopentane, "n10/85: 2,2-Dimethylpropane (neopentane). TRC(10/85) tuvw1350."), BOILS(282.65, CRC_102),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(433.8, IUPAC_CRITICAL, 3196000, IUPAC_CRITICAL, 0.196, YAWS_2014)},
    {.name = "1-pentene", .formula = "C5H10", .cas = "109-67-1", .aliases = "pent-1-ene|amylene-1",
     .element = {{"C", 5}, {"H", 10}}, HEAT(gas_1_pentene, "n 4/87: TRC(4/87) tuvw2500."), BOILS(303.11, POLING_5),
     DIPOLE(0.4, NSRDS_10), CRITICAL(464.78, PERRY_8, 3560000, IUPAC_CRITICAL, 0.236, PERRY_8)},
    {.name = "cyclopentane", .formula = "C5H10", .cas = "287-92-3", .aliases = "pentamethylene|c-C5H10",
     .element = {{"C", 5}, {"H", 10}}, HEAT(cyclopentane, "g 2/01: Cyclopentane. Dorofeeva,1986."),
     BOILS(322.4, CRC_102), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(511.7, IUPAC_CRITICAL, 4510000, IUPAC_CRITICAL, 0.195, YAWS_2014)},
    {.name = "n-hexane", .formula = "C6H14", .cas = "110-54-3", .aliases = "hexane|normal hexane|n-C6H14|nC6",
     .element = {{"C", 6}, {"H", 14}}, HEAT(n_hexane, "g 6/01: TRC(4/85) tuvw1440."), BOILS(341.88, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(507.6, IUPAC_CRITICAL, 3025000, IUPAC_CRITICAL, 0.3, POLING_5)},
    {.name = "1-hexene", .formula = "C6H12", .cas = "592-41-6", .aliases = "hex-1-ene",
     .element = {{"C", 6}, {"H", 12}}, HEAT(gas_1_hexene, "n 4/87: TRC(4/87) tuvw2500."), BOILS(336.63, POLING_5),
     DIPOLE(0.4, NSRDS_10), CRITICAL(504.0, IUPAC_CRITICAL, 3200000, CRC_102, 0.2839, PSRK_4)},
    {.name = "cyclohexane", .formula = "C6H12", .cas = "110-82-7", .aliases = "hexamethylene|c-C6H12",
     .element = {{"C", 6}, {"H", 12}}, HEAT(cyclohexane, "g 6/90: Cyclohexane. Dorofeeva,1986."),
     BOILS(353.87, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(553.6, VDI_ATLAS, 4080000, PINA_MARTINEZ, 0.212, PERRY_8)},
    {.name = "n-heptane", .formula = "C7H16", .cas = "142-82-5", .aliases = "heptane|normal heptane|n-C7H16|nC7",
     .element = {{"C", 7}, {"H", 16}}, HEAT(n_heptane, "n10/85: TRC(10/85) tuv1460. TRC(10/84) ptuv1010."),
     BOILS(371.57, POLING_5), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(540.2, IUPAC_CRITICAL, 2740000, IUPAC_CRITICAL, 0.35, POLING_5)},
    {.name = "1-heptene", .formula = "C7H14", .cas = "592-76-7", .aliases = "hept-1-ene",
     .element = {{"C", 7}, {"H", 14}}, HEAT(gas_1_heptene, "n 4/87: TRC(4/87) tuvw2500."), BOILS(366.79, POLING_5),
     DIPOLE(0.3, NSRDS_10), CRITICAL(537.3, IUPAC_CRITICAL, 2920000, IUPAC_CRITICAL, 0.344, VDI_ATLAS)},
    {.name = "n-octane", .formula = "C8H18", .cas = "111-65-9", .aliases = "octane|normal octane|C8H18|n-C8H18|nC8",
     .element = {{"C", 8}, {"H", 18}}, HEAT(n_octane, "n 4/85: TRC(4/85) tuvw1490."), BOILS(398.82, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(568.7, IUPAC_CRITICAL, 2490000, IUPAC_CRITICAL, 0.396, PERRY_8)},
    {.name = "2,2,4-trimethylpentane", .formula = "C8H18", .cas = "540-84-1",
     .aliases = "isooctane|iso-octane|i-octane|i-C8H18", .element = {{"C", 8}, {"H", 18}},
     HEAT(gas_2_2_4_trimethylpentane, "n 4/85: 2,2,4-Trimethylpentane. TRC(4/85) tuvw1490."), BOILS(372.4, CRC_102),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(543.8, IUPAC_CRITICAL, 2570000, IUPAC_CRITICAL, 0.303, PSRK_4)},
    {.name = "1-octene", .formula = "C8H16", .cas = "111-66-0", .aliases = "oct-1-ene",
     .element = {{"C", 8}, {"H", 16}}, HEAT(gas_1_octene, "n 4/87: TRC(4/87) tuvw2500."),
     BOILS(394.44, YAWS_2009_ORGANIC), DIPOLE(0.3, NSRDS_10),
     CRITICAL(566.7, JOBACK_1984, 2680000, IUPAC_CRITICAL, 0.386, PSRK_4)},
    {.name = "benzene", .formula = "C6H6", .cas = "71-43-2", .aliases = "benzol", .element = {{"C", 6}, {"H", 6}},
     HEAT(benzene, "g 8/00: TRC(10/86)w3200. Pliva,1982,1983,1984. Shimanouchi,1972."), BOILS(353.24, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(562.05, IUPAC_CRITICAL, 4895000, IUPAC_CRITICAL, 0.21, POLING_5)},
    {.name = "toluene", .formula = "C7H8", .cas = "108-88-3", .aliases = "methylbenzene|toluol",
     .element = {{"C", 7}, {"H", 8}}, HEAT(toluene, "g 1/93: Hf:TRC(4/98) w3510. Hitchcock,1975. Rudolph,1967."),
     BOILS(383.78, YAWS_2009_ORGANIC), DIPOLE(0.375, NSRDS_10),
     CRITICAL(591.75, IUPAC_CRITICAL, 4108000, IUPAC_CRITICAL, 0.264, YAWS_2014)},
    {.name = "styrene", .formula = "C8H8", .cas = "100-42-5", .aliases = "vinylbenzene|ethenylbenzene|phenylethene",
     .element = {{"C", 8}, {"H", 8}}, HEAT(styrene, "n 4/89: Ethenylbenzene. TRC(4/89) tuvw4490."),
     BOILS(418.31, YAWS_2009_ORGANIC), DIPOLE(0.13, NSRDS_10),
     CRITICAL(636.0, PERRY_8, 3840000, VDI_ATLAS, 0.295, VDI_ATLAS)},
    {.name = "ethylbenzene", .formula = "C8H10", .cas = "100-41-4", .aliases = "phenylethane",
     .element = {{"C", 8}, {"H", 10}}, HEAT(ethylbenzene, "n10/86: Ethylbenzene. TRC(10/86) tuvw3200."),
     BOILS(409.35, YAWS_2009_ORGANIC), DIPOLE(0.59, NSRDS_10),
     CRITICAL(617.15, IUPAC_CRITICAL, 3609000, IUPAC_CRITICAL, 0.302, JOBACK_1984)},
    {.name = "naphthalene", .formula = "C10H8", .cas = "91-20-3", .aliases = "naphthalin",
     .element = {{"C", 10}, {"H", 8}}, HEAT(naphthalene, "g 3/01: Naphthalene. Chen,1979."),
     BOILS(491.14, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(748.4, IUPAC_CRITICAL, 4050000, IUPAC_CRITICAL, 0.302, PSRK_4)},
};
/* clang-format on */

const struct gas_family gas_family_hydrocarbons = {sizeof gases / sizeof gases[0], gases};
