/*
 * Atoms and radicals, for hot gases.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval oxygen_atom[] = {
    FIT(  200,  1000, -7.953611300E+03,  1.607177787E+02,  1.966226438E+00,  1.013670310E-03,
                      -1.110415423E-06,  6.517507500E-10, -1.584779251E-13),
    FIT( 1000,  6000,  2.619020262E+05, -7.298722030E+02,  3.317177270E+00, -4.281334360E-04,
                       1.036104594E-07, -9.438304330E-12,  2.725038297E-16),
    FIT( 6000, 20000,  1.779004264E+08, -1.082328257E+05,  2.810778365E+01, -2.975232262E-03,
                       1.854997534E-07, -5.796231540E-12,  7.191720164E-17),
};
static const struct gas_interval hydrogen_atom[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  6.078774250E+01, -1.819354417E-01,  2.500211817E+00, -1.226512864E-07,
                       3.732876330E-11, -5.687744560E-15,  3.410210197E-19),
    FIT( 6000, 20000,  2.173757694E+08, -1.312035403E+05,  3.399174200E+01, -3.813999680E-03,
                       2.432854837E-07, -7.694275540E-12,  9.644105630E-17),
};
static const struct gas_interval nitrogen_atom[] = {
    FIT(  200,  1000,  0.000000000E+00,  0.000000000E+00,  2.500000000E+00,  0.000000000E+00,
                       0.000000000E+00,  0.000000000E+00,  0.000000000E+00),
    FIT( 1000,  6000,  8.876501380E+04, -1.071231500E+02,  2.362188287E+00,  2.916720081E-04,
                      -1.729515100E-07,  4.012657880E-11, -2.677227571E-15),
    FIT( 6000, 20000,  5.475181050E+08, -3.107574980E+05,  6.916782740E+01, -6.847988130E-03,
                       3.827572400E-07, -1.098367709E-11,  1.277986024E-16),
};
static const struct gas_interval hydroxyl[] = {
    FIT(  200,  1000, -1.998858990E+03,  9.300136160E+01,  3.050854229E+00,  1.529529288E-03,
                      -3.157890998E-06,  3.315446180E-09, -1.138762683E-12),
    FIT( 1000,  6000,  1.017393379E+06, -2.509957276E+03,  5.116547860E+00,  1.305299930E-04,
                      -8.284322260E-08,  2.006475941E-11, -1.556993656E-15),
    FIT( 6000, 20000,  2.847234193E+08, -1.859532612E+05,  5.008240900E+01, -5.142374980E-03,
                       2.875536589E-07, -8.228817960E-12,  9.567229020E-17),
};
static const struct gas_interval carbon_atom[] = {
    FIT(  200,  1000,  6.495031470E+02, -9.649010860E-01,  2.504675479E+00, -1.281448025E-05,
                       1.980133654E-08, -1.606144025E-11,  5.314483411E-15),
    FIT( 1000,  6000, -1.289136472E+05,  1.719528572E+02,  2.646044387E+00, -3.353068950E-04,
                       1.742092740E-07, -2.902817829E-11,  1.642182385E-15),
    FIT( 6000, 20000,  4.432528010E+08, -2.886018412E+05,  7.737108320E+01, -9.715281890E-03,
                       6.649595330E-07, -2.230078776E-11,  2.899388702E-16),
};
static const struct gas_interval chlorine_atom[] = {
    FIT(  200,  1000,  2.276215854E+04, -2.168413293E+02,  2.745185115E+00,  2.451101694E-03,
                      -5.458011990E-06,  4.417986880E-09, -1.288134004E-12),
    FIT( 1000,  6000, -1.697932930E+05,  6.081726460E+02,  2.128664090E+00,  1.307367034E-04,
                      -2.644883596E-08,  2.842504775E-12, -1.252911731E-16),
    FIT( 6000, 20000, -7.139687070E+07,  4.499936330E+04, -9.264315350E+00,  1.657437964E-03,
                      -1.326219399E-07,  5.533998870E-12, -8.390301878E-17),
};
static const struct gas_interval fluorine_atom[] = {
    FIT(  200,  1000,  1.137409088E+03, -1.453392797E+02,  4.077403610E+00, -4.303360140E-03,
                       5.728897740E-06, -3.819312900E-09,  1.018322509E-12),
    FIT( 1000,  6000,  1.473506226E+04,  8.149927360E+01,  2.444371819E+00,  2.120210026E-05,
                      -4.546918620E-09,  5.109528730E-13, -2.333894647E-17),
    FIT( 6000, 20000, -2.926724756E+07,  1.775674924E+04, -1.814463258E+00,  5.351200280E-04,
                      -3.513620800E-08,  1.101519690E-12, -1.061293837E-17),
};
static const struct gas_interval sulfur_atom[] = {
    FIT(  200,  1000, -3.174841820E+02, -1.924704923E+02,  4.686825930E+00, -5.841365600E-03,
                       7.538533520E-06, -4.863586040E-09,  1.256976992E-12),
    FIT( 1000,  6000, -4.854244790E+05,  1.438830408E+03,  1.258504116E+00,  3.797990430E-04,
                       1.630685864E-09, -9.547095850E-12,  8.041466646E-16),
    FIT( 6000, 20000, -1.302005414E+08,  6.909362020E+04, -1.176228025E+01,  1.601540850E-03,
                      -1.050533340E-07,  4.341829020E-12, -7.675621927E-17),
};
static const struct gas_interval hydroperoxyl[] = {
    FIT(  200,  1000, -7.598882540E+04,  1.329383918E+03, -4.677388240E+00,  2.508308202E-02,
                      -3.006551588E-05,  1.895600056E-08, -4.828567390E-12),
    FIT( 1000,  6000, -1.810669724E+06,  4.963192030E+03, -1.039498992E+00,  4.560148530E-03,
                      -1.061859447E-06,  1.144567878E-10, -4.763064160E-15),
};
static const struct gas_interval methyl[] = {
    FIT(  200,  1000, -2.876188806E+04,  5.093268660E+02,  2.002143949E-01,  1.363605829E-02,
                      -1.433989346E-05,  1.013556725E-08, -3.027331936E-12),
    FIT( 1000,  6000,  2.760802663E+06, -9.336531170E+03,  1.487729606E+01, -1.439429774E-03,
                       2.444477951E-07, -2.224555778E-11,  8.395065760E-16),
};

static const struct gas_species gases[] = {
    {.name = "oxygen atom", .formula = "O", .cas = "17778-80-2", .aliases = "atomic oxygen|monatomic oxygen",
     .element = {{"O", 1}}, HEAT(oxygen_atom, "g 5/97: D0(O2):Brix,1954. Moore,1976. Gordon,1999."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "hydrogen atom", .formula = "H", .cas = "12385-13-6", .aliases = "atomic hydrogen|monatomic hydrogen",
     .element = {{"H", 1}}, HEAT(hydrogen_atom, "g 6/97: D0(H2):Herzberg,1970. Moore,1972. Gordon,1999."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "nitrogen atom", .formula = "N", .cas = "17778-88-0", .aliases = "atomic nitrogen|monatomic nitrogen",
     .element = {{"N", 1}}, HEAT(nitrogen_atom, "g 5/97: Hf:Cox,1989. Moore,1975. Gordon,1999."), BOILS(NAN, NONE),
     DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "hydroxyl", .formula = "OH", .cas = "3352-57-6", .aliases = "hydroxyl radical",
     .element = {{"O", 1}, {"H", 1}},
     HEAT(hydroxyl, "g 4/02: D0(H-OH): Ruscic,2002. Gurvich,1978 pt1 p110 pt2 p37."), BOILS(NAN, NONE),
     DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "carbon atom", .formula = "C", .cas = "7440-44-0", .aliases = "atomic carbon", .element = {{"C", 1}},
     HEAT(carbon_atom, "g 7/97: Hf:Douglas,1955. Moore,1970b. Gordon,1999."), BOILS(NAN, NONE), DIPOLE(NAN, NONE),
     CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "chlorine atom", .formula = "Cl", .cas = "22537-15-1", .aliases = "atomic chlorine",
     .element = {{"Cl", 1}}, HEAT(chlorine_atom, "g 7/97: Hf:Cox,1989. Moore,1971. Moore,1970a. Gordon,1999."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "fluorine atom", .formula = "F", .cas = "14762-94-8", .aliases = "atomic fluorine",
     .element = {{"F", 1}}, HEAT(fluorine_atom, "g 5/97: Hf:Cox,1989. Moore,1971. Moore,1970a. Gordon,1999."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "sulfur atom", .formula = "S", .cas = "7704-34-9", .aliases = "atomic sulfur|sulphur atom",
     .element = {{"S", 1}}, HEAT(sulfur_atom, "g 5/97: Hf: Cox,1989 p22. Martin,W.C.,1990. Gordon,1999."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "hydroperoxyl", .formula = "HO2", .cas = "3170-83-0", .aliases = "hydroperoxyl radical",
     .element = {{"H", 1}, {"O", 2}}, HEAT(hydroperoxyl, "g 4/02: Hf:Hills,1984 & NASA data. Jacox,1998 p153."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "methyl", .formula = "CH3", .cas = "2229-07-4", .aliases = "methyl radical",
     .element = {{"C", 1}, {"H", 3}}, HEAT(methyl, "g 4/02: D0(H3C-H): Ruscic,1999. Jacox,1998."), BOILS(NAN, NONE),
     DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
};
/* clang-format on */

const struct gas_family gas_family_radicals = {sizeof gases / sizeof gases[0], gases};
