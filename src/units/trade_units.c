/* THE table of units. A unit is added here and nowhere else; tests/units/test_unit.c compares every row. */
#include "units.h"

/* clang-format off */
#define SP811   "NIST SP 811 (2008), App. B"
#define SI      "BIPM SI Brochure, 9th ed. (2019)"
#define BY_DEF  "by definition from the rows above"
#define TRADE   "common practice"

#define LB      0.45359237              /* kg, exact: SP 811 */
#define GN      9.80665                 /* m/s2, exact: 3rd CGPM (1901) */
#define FOOT    0.3048                  /* m, exact: SP 811 */
#define INCH    0.0254                  /* m, exact: SP 811 */
#define FOOT3   0.028316846592          /* m3, exact */
#define GALLON  0.003785411784          /* m3, 231 in3, exact */
#define BTU     1055.05585262           /* J, International Table, exact */
#define BTU_TH  (4.184 * 1000.0 * LB / 1.8)
#define MERCURY (13595.1 * GN)          /* Pa/m, conventional column */
#define WATER   (1000.0 * GN)           /* Pa/m, conventional column */
#define DAY     86400.0

#define P(kg, m, s, K, mol) {kg, m, s, K, mol}
#define NUMBER   P(0, 0, 0, 0, 0)
#define PRESSURE P(1, -1, -2, 0, 0)
#define ENERGY   P(1, 2, -2, 0, 0)
#define POWER    P(1, 2, -3, 0, 0)
#define FORCE    P(1, 1, -2, 0, 0)
#define MASS     P(1, 0, 0, 0, 0)
#define LENGTH   P(0, 1, 0, 0, 0)
#define AREA     P(0, 2, 0, 0, 0)
#define VOLUME   P(0, 3, 0, 0, 0)
#define VOL_FLOW P(0, 3, -1, 0, 0)
#define MASSFLOW P(1, 0, -1, 0, 0)
#define TIME     P(0, 0, 1, 0, 0)
#define KELVIN   P(0, 0, 0, 1, 0)
#define AMOUNT   P(0, 0, 0, 0, 1)

/* engine symbol | names: symbols;words | prefixes | factor | powers | source */
#define U(symbol, names, prefixes, factor, power, source) {symbol, names, prefixes, factor, power, 0.0, UNIT_PLAIN, source},
#define LEVEL(symbol, names, factor, offset, source)      {symbol, names, "", factor, KELVIN, offset, UNIT_PLAIN, source},
#define REF(symbol, names, factor, power, kind, source)   {symbol, names, "", factor, power, 0.0, kind, source},
#define UNSURE(names, choices)                            {"", names, "", 1.0, NUMBER, 0.0, UNIT_AMBIGUOUS, choices},

const struct unit_prefix gas_unit_prefixes[] = {
    {"u", "micro", 1e-6}, {"m", "milli", 1e-3}, {"c", "centi", 1e-2}, {"d", "deci", 1e-1}, {"h", "hecto", 1e2},
    {"k", "kilo", 1e3},   {"M", "mega", 1e6},   {"G", "giga", 1e9},   {"T", "tera", 1e12},
};

const struct trade_unit gas_trade_units[] = {
    /* numbers */
    U("one",     "-;dimensionless,fraction",        "",      1.0,                    NUMBER,   "plain number")
    U("pct",     "%,pct;percent,per cent",          "",      0.01,                   NUMBER,   SP811)
    U("ppm",     "ppm,ppmv",                        "",      1e-6,                   NUMBER,   SP811)

    /* pressure */
    U("Pa",      "Pa;pascal",                       "umhkMG", 1.0,                   PRESSURE, SI)
    U("bar",     "bar;bar",                         "mk",    1e5,                    PRESSURE, SP811)
    U("atm",     "atm;atmosphere,standard atmosphere", "",   101325.0,               PRESSURE, SP811)
    U("att",     "at;technical atmosphere",         "",      1e4 * GN,               PRESSURE, SP811)
    U("psi",     "psi,lbf/in2;pound per square inch", "",    LB * GN / (INCH * INCH), PRESSURE, SP811)
    U("ksi",     "ksi",                             "",      1e3 * LB * GN / (INCH * INCH), PRESSURE, SP811)
    U("psf",     "psf",                             "",      LB * GN / (FOOT * FOOT), PRESSURE, SP811)
    U("torr",    "torr,Torr;torr",                  "m",     101325.0 / 760.0,       PRESSURE, SP811)
    U("mHg",     "mHg,m Hg;metre of mercury",       "",      MERCURY,                PRESSURE, SP811)
    U("cmHg",    "cmHg,cm Hg",                      "",      MERCURY * 1e-2,         PRESSURE, SP811)
    U("mmHg",    "mmHg,mm Hg,mm of Hg;millimetre of mercury,millimeter of mercury,mm of mercury,mm mercury", "",
                                                             MERCURY * 1e-3,         PRESSURE, SP811)
    U("inHg",    "inHg,in Hg,in of Hg;inches Hg,inch Hg,inch of mercury,inches of mercury,in of mercury,in mercury", "",
                                                             MERCURY * INCH,         PRESSURE, SP811)
    U("mAq",     "mAq,m Aq,mWC,m WC;metre of water,meter of water", "", WATER,       PRESSURE, SP811)
    U("cmAq",    "cmAq,cm Aq,cmWC,cm WC,cm W C",    "",      WATER * 1e-2,           PRESSURE, SP811)
    U("mmAq",    "mmAq,mm Aq,mmWC,mm WC,mm W C,mmWS,mm WS;mm of water,mm water,millimetre of water,mm of Aq", "",
                                                             WATER * 1e-3,           PRESSURE, SP811)
    U("inAq",    "inAq,in Aq,inWC,in WC,in W C;inches Aq,inch of water,inches of water,in of water,in water,in of Aq", "",
                                                             WATER * INCH,           PRESSURE, SP811)
    U("ftAq",    "ftAq,ft Aq,ftWC;feet of water,ft of water,foot of water,ft water", "",
                                                             WATER * FOOT,           PRESSURE, SP811)

    /* temperature; a level has an offset, the engine sees the difference */
    U("K",       "K,degK,deg K;kelvin,degree kelvin,degrees kelvin", "m",   1.0,                    KELVIN,   SI)
    U("degR",    "degR,R,deg R;rankine,degree rankine,degrees rankine", "",  1.0 / 1.8,              KELVIN,   SP811)
    LEVEL("K",   "degC,C,deg C,degrees C;celsius,degree celsius,degrees celsius,centigrade,deg celsius", 1.0, 273.15, SI)
    LEVEL("degR", "degF,F,deg F,degrees F;fahrenheit,degree fahrenheit,degrees fahrenheit,deg fahrenheit", 1.0 / 1.8, 459.67, SP811)

    /* length, area, volume */
    U("m",       "m;metre,meter",                   "umcdk", 1.0,                    LENGTH,   SI)
    U("inch",    "in,inch;inch,inches",             "",      INCH,                   LENGTH,   SP811)
    U("ft",      "ft;foot,feet",                    "",      FOOT,                   LENGTH,   SP811)
    U("yd",      "yd;yard",                         "",      3.0 * FOOT,             LENGTH,   SP811)
    U("mile",    "mi;mile",                         "",      5280.0 * FOOT,          LENGTH,   SP811)
    U("sqft",    "sqft,sf",                         "",      FOOT * FOOT,            AREA,     SP811)
    U("sqin",    "sqin",                            "",      INCH * INCH,            AREA,     SP811)
    U("L",       "L,l;litre,liter,ltr,lit",         "umcdhM", 1e-3,                  VOLUME,   SP811)
    U("cc",      "cc,ccm",                          "",      1e-6,                   VOLUME,   SP811)
    U("cbm",     "cbm",                             "",      1.0,                    VOLUME,   TRADE)
    U("cuft",    "cuft,cf,CF,cft",                  "",      FOOT3,                  VOLUME,   SP811)
    U("cuin",    "cuin,cu in",                      "",      INCH * INCH * INCH,     VOLUME,   SP811)
    U("gal_us",  "gal,USgal,US gal,gal(US),gal US,U S gal;gallon,US gallon,gallon(US)", "", GALLON, VOLUME, SP811)
    U("gal_imp", "gal(UK),gal(Imp),gal UK,UK gal,Imp gal,gal Imp,Impgal;imperial gallon,imperial gal,UK gallon,Imp gallon,gallon(UK),gallon(imperial)", "",
                                                             0.00454609,             VOLUME,   SP811)
    U("bbl",     "bbl;barrel",                      "",      42.0 * GALLON,          VOLUME,   SP811)

    /* mass, amount */
    U("g",       "g;gram,gramme,gm",                "umkM",  1e-3,                   MASS,     SI)
    U("tonne",   "t;tonne,metric ton,metric tonne", "k",     1000.0,                 MASS,     SP811)
    U("lb",      "lb,lbm,lb_m;pound,lb,lbm,pound mass", "k", LB,                     MASS,     SP811)
    U("oz",      "oz;ounce",                        "",      LB / 16.0,              MASS,     SP811)
    U("grain",   ";grain",                          "",      LB / 7000.0,            MASS,     SP811)
    U("slug",    ";slug",                           "",      LB * GN / FOOT,         MASS,     SP811)
    U("ton_us",  ";short ton,US ton,ton(short),ton(US),short tons", "", 2000.0 * LB, MASS,     SP811)
    U("ton_uk",  ";long ton,UK ton,imperial ton,ton(long),ton(UK)", "", 2240.0 * LB, MASS,     SP811)
    U("mol",     "mol;mole,mol,gmol,g mol,gram mole", "umk", 1.0,                    AMOUNT,   SI)
    U("kgmol",   "kgmol,kg mol;kilogram mole,kgmole,kg mole", "", 1000.0,            AMOUNT,   TRADE)
    U("lbmol",   "lbmol,lb mol,lbm mol;pound mole,lbmole,lb mole,lbmol", "k", LB * 1000.0, AMOUNT, TRADE)

    /* time */
    U("s",       "s,sec;second,sec",                "um",    1.0,                    TIME,     SI)
    U("min",     "min;minute,min",                  "",      60.0,                   TIME,     SP811)
    U("hour",    "h,hr;hour,hr",                    "",      3600.0,                 TIME,     SP811)
    U("day",     "d;day",                           "",      DAY,                    TIME,     SP811)

    /* force */
    U("N",       "N;newton",                        "kM",    1.0,                    FORCE,    SI)
    U("kgf",     "kgf,kp,kg_f;kilogram force",      "",      GN,                     FORCE,    SP811)
    U("lbf",     "lbf,lb_f;pound force,lbf",        "k",     LB * GN,                FORCE,    SP811)
    U("dyn",     "dyn;dyne",                        "",      1e-5,                   FORCE,    SP811)

    /* energy */
    U("J",       "J;joule",                         "mkMGT", 1.0,                    ENERGY,   SI)
    U("Nm",      "Nm",                              "k",     1.0,                    ENERGY,   SI)
    U("Wh",      "Wh,Whr;watt hour",                "kMG",   3600.0,                 ENERGY,   SP811)
    U("cal",     "cal,cal_th,cal(th);calorie",      "kMG",   4.184,                  ENERGY,   SP811)
    U("cal_it",  "cal_IT,cal(IT),calIT,calorie(IT)", "kMG",  4.1868,                 ENERGY,   SP811)
    U("Btu",     "Btu,Btu_IT,Btu(IT),BtuIT;british thermal unit,Btu", "k", BTU,      ENERGY,   SP811)
    U("Btu_th",  "Btu_th,Btu(th),Btuth",            "k",     BTU_TH,                 ENERGY,   SP811)
    U("MMBtu",   "MMBtu,MM Btu,MMBtu(IT);MMBtu,million Btu", "", 1e6 * BTU,          ENERGY,   TRADE)
    U("therm",   "thm;therm",                       "",      1e5 * BTU,              ENERGY,   BY_DEF)
    U("therm_ec", ";therm(EC)",                     "",      1.05506e8,              ENERGY,   SP811)
    U("therm_us", ";therm(US)",                     "",      1.054804e8,             ENERGY,   SP811)
    U("Dth",     "Dth;dekatherm",                   "",      1e6 * BTU,              ENERGY,   BY_DEF)
    U("ftlbf",   "ftlbf,ft lbf,ft lb,ft lb_f,ftlb;foot pound,foot pound force", "", LB * GN * FOOT, ENERGY, SP811)
    U("inlbf",   "inlbf,in lbf,in lb;inch pound",   "",      LB * GN * INCH,         ENERGY,   SP811)
    U("hph",     "hph,hp h,hp hr,hphr;horsepower hour,hp hour", "", 550.0 * LB * GN * FOOT * 3600.0, ENERGY, BY_DEF)
    U("erg",     ";erg",                            "",      1e-7,                   ENERGY,   SP811)

    /* power */
    U("W",       "W;watt",                          "mkMGT", 1.0,                    POWER,    SI)
    U("hp",      "hp,bhp,Bhp,hp(I),hp(UK),hp(mech);horsepower,mechanical hp,hp(mechanical)", "", 550.0 * LB * GN * FOOT, POWER, SP811)
    U("hp_m",    "PS,hp(M);metric hp,hp metric,hp(metric),metric horsepower", "", 75.0 * GN, POWER, SP811)
    U("hp_e",    ";electric hp,hp(electric),hp(E)", "",      746.0,                  POWER,    SP811)
    U("hp_b",    ";boiler hp,hp(boiler),hp(S),boiler horsepower", "", 9809.5,        POWER,    SP811)
    U("TR",      "TR;ton of refrigeration,tons of refrigeration,ton refrigeration,tons refrigeration,refrigeration ton,ton(refrigeration)", "",
                                                             12000.0 * BTU / 3600.0, POWER,    SP811)
    U("Btuh",    "Btuh,BTUH",                       "k",     BTU / 3600.0,           POWER,    SP811)
    U("MBH",     "MBH",                             "",      1000.0 * BTU / 3600.0,  POWER,    TRADE)

    /* flows under one word */
    U("cfm",     "cfm,acfm,icfm",                   "k",     FOOT3 / 60.0,           VOL_FLOW, SP811)
    U("cfh",     "cfh,acfh",                        "",      FOOT3 / 3600.0,         VOL_FLOW, SP811)
    U("cfs",     "cfs,acfs",                        "",      FOOT3,                  VOL_FLOW, SP811)
    U("cbm",     "Am3,am3",                         "",      1.0,                    VOLUME,   TRADE)
    U("gpm",     "gpm,USgpm",                       "",      GALLON / 60.0,          VOL_FLOW, SP811)
    U("lpm",     "lpm",                             "",      1e-3 / 60.0,            VOL_FLOW, TRADE)
    U("pph",     "pph",                             "",      LB / 3600.0,            MASSFLOW, TRADE)

    /* volumes at reference conditions: amounts of substance */
    REF("cbm",   "Nm3,N m3,mn3,m_n3,normal m3,norm m3;normal cubic metre,normal cubic meter", 1.0,      VOLUME,   UNIT_NORMAL, "DIN 1343")
    REF("L",     "NL,Nl,ln,l_n,L_n,Ndm3;normal litre,normal liter", 1e-3,   VOLUME,   UNIT_NORMAL, "DIN 1343")
    REF("cc",    "NmL,Nml,Ncm3,Ncc",                1e-6,                   VOLUME,   UNIT_NORMAL, "DIN 1343")
    REF("cbm",   "Sm3,standard m3,std m3;standard cubic metre,standard cubic meter", 1.0,      VOLUME,   UNIT_STANDARD, "ISO 13443")
    REF("thou_cbm",   "kSm3",                            1e3,                    VOLUME,   UNIT_STANDARD, "ISO 13443")
    REF("mill_cbm",  "MSm3,MMSm3",                      1e6,                    VOLUME,   UNIT_STANDARD, "ISO 13443")
    REF("thou_cbm",  "kNm3",                            1e3,                    VOLUME,   UNIT_NORMAL, "DIN 1343")
    REF("scf",   "scf,Scf,SCF;standard cubic foot,standard cubic feet,std cubic feet,standard cu ft,std cu ft,std cuft,std cf", FOOT3, VOLUME, UNIT_SCF, "API MPMS / GPA 2172")
    REF("Mscf",  "Mscf,kscf,MSCF;thousand scf",     1e3 * FOOT3,            VOLUME,   UNIT_SCF, TRADE)
    REF("MMscf", "MMscf,MM scf,MMSCF;million scf",  1e6 * FOOT3,            VOLUME,   UNIT_SCF, TRADE)
    REF("Bscf",  "Bscf,BSCF;billion scf",           1e9 * FOOT3,            VOLUME,   UNIT_SCF, TRADE)
    REF("scfs",  "scfs",                            FOOT3,                  VOL_FLOW, UNIT_SCF, TRADE)
    REF("scfm",  "scfm",                            FOOT3 / 60.0,           VOL_FLOW, UNIT_SCF, TRADE)
    REF("Mscfm", "Mscfm,kscfm",                     1e3 * FOOT3 / 60.0,     VOL_FLOW, UNIT_SCF, TRADE)
    REF("scfh",  "scfh",                            FOOT3 / 3600.0,         VOL_FLOW, UNIT_SCF, TRADE)
    REF("Mscfh", "Mscfh,kscfh",                     1e3 * FOOT3 / 3600.0,   VOL_FLOW, UNIT_SCF, TRADE)
    REF("MMscfh", "MMscfh",                         1e6 * FOOT3 / 3600.0,   VOL_FLOW, UNIT_SCF, TRADE)
    REF("scfd",  "scfd",                            FOOT3 / DAY,            VOL_FLOW, UNIT_SCF, TRADE)
    REF("Mscfd", "Mscfd,kscfd",                     1e3 * FOOT3 / DAY,      VOL_FLOW, UNIT_SCF, TRADE)
    REF("MMscfd", "MMscfd,MM scfd",                 1e6 * FOOT3 / DAY,      VOL_FLOW, UNIT_SCF, TRADE)
    REF("Bscfd", "Bscfd",                           1e9 * FOOT3 / DAY,      VOL_FLOW, UNIT_SCF, TRADE)

    /* names that stand for several things */
    UNSURE(";standard,std,normal,norm,STP,NTP,reference",
           "write Nm3 (0 °C), Sm3 (15 °C), scf (60 °F), or spell it out: m3@20°C,101.325kPa")
    UNSURE("SL,Sl,SmL,sdm3;slpm,slm,slph,sccm,standard litre,standard liter,std L,scc,sccs",
           "makers differ: write NL (0 °C, 101.325 kPa), or spell it out: L/min@20°C,101.325kPa")
    UNSURE(";Mcf,MMcf,Mcfd,MMcfd,bcf,bcfd", "write Mscf or MMscfd (60 °F, 14.696 psia), or 1000 ft3 as measured")
    UNSURE(";ton", "write t (tonne), short ton, long ton, or TR (ton of refrigeration)")
    UNSURE("MBtu,mBtu,MBTU", "write kBtu (1000 Btu) or MMBtu (1000000 Btu)")
    UNSURE("Cal,Calorie,Calories", "write cal or kcal")
    UNSURE("gr", "write g (gram) or grain")
    UNSURE("deg,degree,degrees", "write °C or °F")
    UNSURE(";inWG,in WG,in W G,mmWG,mm WG,mm W G,cmWG,iwg",
           "a water gauge: write inH2O(g) or mmH2O(g) above the barometer, inH2O or mmH2O absolute")
};
/* clang-format on */

const size_t gas_trade_unit_count = sizeof gas_trade_units / sizeof *gas_trade_units;
const size_t gas_unit_prefix_count = sizeof gas_unit_prefixes / sizeof *gas_unit_prefixes;
