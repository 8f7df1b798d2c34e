/* Every unit of the table in the words of GNU units, whose definitions are not ours. Where a word of GNU units means
 * another flavour, the row writes the definition out (calorie_IT, btu_th, therms). */
/* clang-format off */
static const struct gnu_row {
    const char *ours, *gnu, *base; /* base: the SI unit in GNU's words */
} gnu_rows[] = {
    {"-", "1", "1"}, {"%", "percent", "1"}, {"ppm", "1e-6", "1"},
    {"Pa", "Pa", "Pa"}, {"bar", "bar", "Pa"}, {"atm", "atm", "Pa"}, {"at", "technicalatmosphere", "Pa"},
    {"psi", "psi", "Pa"}, {"ksi", "1000 psi", "Pa"}, {"psf", "lbf/ft^2", "Pa"}, {"torr", "torr", "Pa"}, {"mHg", "m Hg", "Pa"}, {"cmHg", "cm Hg", "Pa"},
    {"mmHg", "mmHg", "Pa"}, {"inHg", "inHg", "Pa"}, {"mH2O", "m water", "Pa"}, {"cmH2O", "cm water", "Pa"},
    {"mmH2O", "mmH2O", "Pa"}, {"inH2O", "inH2O", "Pa"}, {"ftH2O", "ft water", "Pa"},
    {"K", "K", "K"}, {"R", "degR", "K"}, {"°C", "degC", "K"}, {"°F", "degF", "K"},
    {"m", "m", "m"}, {"in", "inch", "m"}, {"ft", "ft", "m"}, {"yd", "yard", "m"}, {"mile", "mile", "m"},
    {"sqft", "ft^2", "m^2"}, {"sqin", "in^2", "m^2"}, {"L", "liter", "m^3"}, {"cc", "cc", "m^3"}, {"cbm", "m^3", "m^3"},
    {"cuft", "ft^3", "m^3"}, {"cu in", "in^3", "m^3"}, {"gal", "gallon", "m^3"}, {"Imp gal", "brgallon", "m^3"}, {"bbl", "bbl", "m^3"},
    {"g", "gram", "kg"}, {"t", "tonne", "kg"}, {"lb", "pound", "kg"}, {"oz", "ounce", "kg"}, {"grain", "grain", "kg"}, {"slug", "slug", "kg"},
    {"short ton", "shortton", "kg"}, {"long ton", "longton", "kg"},
    {"mol", "mol", "mol"}, {"kgmol", "kg mol/g", "mol"}, {"lbmol", "lb mol/g", "mol"},
    {"s", "s", "s"}, {"min", "min", "s"}, {"h", "hour", "s"}, {"d", "day", "s"},
    {"N", "N", "N"}, {"kgf", "kgf", "N"}, {"lbf", "lbf", "N"}, {"dyn", "dyne", "N"},
    {"J", "J", "J"}, {"Nm", "N m", "J"}, {"Wh", "W hour", "J"}, {"cal", "calorie_th", "J"}, {"cal(IT)", "calorie_IT", "J"},
    {"Btu", "btu_IT", "J"}, {"Btu(th)", "btu_th", "J"}, {"MMBtu", "1e6 btu_IT", "J"}, {"therm", "1e5 btu_IT", "J"},
    {"therm(EC)", "105.506e6 J", "J"}, {"therm(US)", "UStherm", "J"}, {"Dth", "1e6 btu_IT", "J"},
    {"ft-lbf", "ft lbf", "J"}, {"in-lbf", "inch lbf", "J"}, {"hp-h", "horsepower hour", "J"}, {"erg", "erg", "J"},
    {"W", "W", "W"}, {"hp", "horsepower", "W"}, {"PS", "metrichorsepower", "W"}, {"hp(electric)", "electrichorsepower", "W"},
    {"hp(boiler)", "boilerhorsepower", "W"}, {"TR", "tonref", "W"}, {"Btuh", "btu_IT/hour", "W"}, {"MBH", "1000 btu_IT/hour", "W"},
    {"cfm", "ft^3/min", "m^3/s"}, {"cfh", "ft^3/hour", "m^3/s"}, {"cfs", "ft^3/s", "m^3/s"}, {"Am3", "m^3", "m^3"},
    {"gpm", "gallon/min", "m^3/s"}, {"lpm", "liter/min", "m^3/s"}, {"pph", "lb/hour", "kg/s"},
#define AT0  "* (atm/(R 273.15 K))"
#define AT15 "* (atm/(R 288.15 K))"
#define AT60 "* (14.696 psi/(R 519.67 degR))"
    {"Nm3", "m^3 " AT0, "mol"}, {"NL", "liter " AT0, "mol"}, {"Ncm3", "cm^3 " AT0, "mol"}, {"kNm3", "1000 m^3 " AT0, "mol"},
    {"Sm3", "m^3 " AT15, "mol"}, {"kSm3", "1000 m^3 " AT15, "mol"}, {"MMSm3", "1e6 m^3 " AT15, "mol"},
    {"scf", "ft^3 " AT60, "mol"}, {"Mscf", "1e3 ft^3 " AT60, "mol"}, {"MMscf", "1e6 ft^3 " AT60, "mol"}, {"Bscf", "1e9 ft^3 " AT60, "mol"},
    {"scfs", "ft^3/s " AT60, "mol/s"}, {"scfm", "ft^3/min " AT60, "mol/s"}, {"Mscfm", "1e3 ft^3/min " AT60, "mol/s"},
    {"scfh", "ft^3/hour " AT60, "mol/s"}, {"Mscfh", "1e3 ft^3/hour " AT60, "mol/s"}, {"MMscfh", "1e6 ft^3/hour " AT60, "mol/s"},
    {"scfd", "ft^3/day " AT60, "mol/s"}, {"Mscfd", "1e3 ft^3/day " AT60, "mol/s"}, {"MMscfd", "1e6 ft^3/day " AT60, "mol/s"},
    {"Bscfd", "1e9 ft^3/day " AT60, "mol/s"},
    /* prefixes */
    {"uPa", "uPa", "Pa"}, {"mPa", "mPa", "Pa"}, {"hPa", "hPa", "Pa"}, {"kPa", "kPa", "Pa"}, {"MPa", "MPa", "Pa"}, {"GPa", "GPa", "Pa"},
    {"mbar", "mbar", "Pa"}, {"kbar", "1000 bar", "Pa"}, {"mtorr", "0.001 torr", "Pa"}, {"mK", "mK", "K"},
    {"um", "um", "m"}, {"mm", "mm", "m"}, {"cm", "cm", "m"}, {"dm", "dm", "m"}, {"km", "km", "m"},
    {"uL", "uL", "m^3"}, {"mL", "mL", "m^3"}, {"cL", "cL", "m^3"}, {"dL", "dL", "m^3"}, {"hL", "hL", "m^3"}, {"ML", "1e6 L", "m^3"},
    {"ug", "ug", "kg"}, {"mg", "mg", "kg"}, {"kg", "kg", "kg"}, {"Mg", "1e6 g", "kg"}, {"kt", "1000 tonne", "kg"}, {"klb", "1000 lb", "kg"},
    {"umol", "1e-6 mol", "mol"}, {"mmol", "1e-3 mol", "mol"}, {"kmol", "1e3 mol", "mol"}, {"klbmol", "1e3 lb mol/g", "mol"},
    {"us", "us", "s"}, {"ms", "ms", "s"}, {"kN", "kN", "N"}, {"MN", "MN", "N"}, {"klbf", "1000 lbf", "N"},
    {"mJ", "mJ", "J"}, {"kJ", "kJ", "J"}, {"MJ", "MJ", "J"}, {"GJ", "GJ", "J"}, {"TJ", "TJ", "J"}, {"kNm", "kN m", "J"},
    {"kWh", "kW hour", "J"}, {"MWh", "MW hour", "J"}, {"GWh", "GW hour", "J"},
    {"kcal", "1e3 calorie_th", "J"}, {"Mcal", "1e6 calorie_th", "J"}, {"Gcal", "1e9 calorie_th", "J"}, {"kcal(IT)", "1e3 calorie_IT", "J"},
    {"kBtu", "1e3 btu_IT", "J"}, {"kBtu(th)", "1e3 btu_th", "J"},
    {"mW", "mW", "W"}, {"kW", "kW", "W"}, {"MW", "MW", "W"}, {"GW", "GW", "W"}, {"TW", "TW", "W"}, {"kBtuh", "1e3 btu_IT/hour", "W"},
    {"kcfm", "1e3 ft^3/min", "m^3/s"},
    /* compounds */
    {"kJ/kg-K", "kJ/(kg K)", "J/(kg K)"}, {"J/mol/K", "J/(mol K)", "J/(mol K)"}, {"Btu/lb-°F", "btu_IT/(lb degF)", "J/(kg K)"},
    {"Btu(th)/lb-°F", "btu_th/(lb degF)", "J/(kg K)"}, {"kcal/kg-°C", "kcal_th/(kg degC)", "J/(kg K)"}, {"cal/mol-K", "cal_th/(mol K)", "J/(mol K)"},
    {"Btu/lbmol-R", "btu_IT/((lb mol/g) degR)", "J/(mol K)"}, {"ft-lbf/lb-°R", "ft lbf/(lb degR)", "J/(kg K)"}, {"ft3/lb", "ft^3/lb", "m^3/kg"},
    {"ft3/lbmol", "ft^3/(lb mol/g)", "m^3/mol"}, {"L/mol", "L/mol", "m^3/mol"}, {"kg/kmol", "kg/(1000 mol)", "kg/mol"}, {"g/mol", "g/mol", "kg/mol"},
    {"lb/ft3", "lb/ft^3", "kg/m^3"}, {"g/L", "g/L", "kg/m^3"}, {"kmol/m3", "1000 mol/m^3", "mol/m^3"}, {"Btu/lb", "btu_IT/lb", "J/kg"},
    {"Btu/lbmol", "btu_IT/(lb mol/g)", "J/mol"}, {"kcal/kg", "kcal_th/kg", "J/kg"}, {"Btu/°R", "btu_IT/degR", "J/K"}, {"kW/°C", "kW/degC", "W/K"},
    {"lb/min", "lb/min", "kg/s"}, {"t/d", "tonne/day", "kg/s"}, {"kmol/h", "1000 mol/hour", "mol/s"}, {"lbmol/h", "lb mol/g/hour", "mol/s"},
    {"bbl/d", "bbl/day", "m^3/s"}, {"kcal/h", "kcal_th/hour", "W"}, {"ft-lbf/min", "ft lbf/min", "W"}, {"m/s", "m/s", "m/s"}, {"ft/min", "ft/min", "m/s"},
    {"kgf·m", "kgf m", "J"}, {"L·atm", "L atm", "J"}, {"cm3·bar", "cm^3 bar", "J"}, {"psi·ft3", "psi ft^3", "J"}, {"dyn/cm2", "dyne/cm^2", "Pa"},
    {"kg/cm2", "kgf/cm^2", "Pa"}, {"lb/in2", "lbf/in^2", "Pa"}, {"lb/sq ft", "lbf/ft^2", "Pa"}, {"N/mm2", "N/mm^2", "Pa"},
    {"W/m2-K", "W/(m^2 K)", "W/(m^2 K)"}, {"Btu/h-ft2-°F", "btu_IT/(hour ft^2 degF)", "W/(m^2 K)"}, {"Pa·s", "Pa s", "Pa s"}, {"10^6 Btu/h", "1e6 btu_IT/hour", "W"},
    {"MJ/Nm3", "MJ/(m^3 " AT0 ")", "J/mol"}, {"Btu/scf", "btu_IT/(ft^3 " AT60 ")", "J/mol"}, {"kg/Nm3", "kg/(m^3 " AT0 ")", "kg/mol"},
};
/* clang-format on */
