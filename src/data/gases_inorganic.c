/*
 * Oxides, hydrides and other small inorganic gases.
 *
 * Heat capacities: nine-constant fits of B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002); the
 * constants are those of cp/R as printed, a1 to a7.
 */
#include "gases.h"

/* clang-format off */
static const struct gas_interval carbon_monoxide[] = {
    FIT(  200,  1000,  1.489045326E+04, -2.922285939E+02,  5.724527170E+00, -8.176235030E-03,
                       1.456903469E-05, -1.087746302E-08,  3.027941827E-12),
    FIT( 1000,  6000,  4.619197250E+05, -1.944704863E+03,  5.916714180E+00, -5.664282830E-04,
                       1.398814540E-07, -1.787680361E-11,  9.620935570E-16),
    FIT( 6000, 20000,  8.868662960E+08, -7.500377840E+05,  2.495474979E+02, -3.956351100E-02,
                       3.297772080E-06, -1.318409933E-10,  1.998937948E-15),
};
static const struct gas_interval carbon_dioxide[] = {
    FIT(  200,  1000,  4.943650540E+04, -6.264116010E+02,  5.301725240E+00,  2.503813816E-03,
                      -2.127308728E-07, -7.689988780E-10,  2.849677801E-13),
    FIT( 1000,  6000,  1.176962419E+05, -1.788791477E+03,  8.291523190E+00, -9.223156780E-05,
                       4.863676880E-09, -1.891053312E-12,  6.330036590E-16),
    FIT( 6000, 20000, -1.544423287E+09,  1.016847056E+06, -2.561405230E+02,  3.369401080E-02,
                      -2.181184337E-06,  6.991420840E-11, -8.842351500E-16),
};
static const struct gas_interval water[] = {
    FIT(  200,  1000, -3.947960830E+04,  5.755731020E+02,  9.317826530E-01,  7.222712860E-03,
                      -7.342557370E-06,  4.955043490E-09, -1.336933246E-12),
    FIT( 1000,  6000,  1.034972096E+06, -2.412698562E+03,  4.646110780E+00,  2.291998307E-03,
                      -6.836830480E-07,  9.426468930E-11, -4.822380530E-15),
};
static const struct gas_interval heavy_water[] = {
    FIT(  200,  1000,  6.958278470E+03, -1.280889437E+01,  3.595878870E+00,  1.502093683E-03,
                       3.594675050E-07,  5.340417200E-10, -5.181941270E-13),
    FIT( 1000,  6000,  1.544193253E+06, -5.474238900E+03,  1.017542424E+01, -9.619415540E-04,
                       2.036545675E-07, -2.050566442E-11,  8.510770690E-16),
};
static const struct gas_interval nitric_oxide[] = {
    FIT(  200,  1000, -1.143916503E+04,  1.536467592E+02,  3.431468730E+00, -2.668592368E-03,
                       8.481399120E-06, -7.685111050E-09,  2.386797655E-12),
    FIT( 1000,  6000,  2.239018716E+05, -1.289651623E+03,  5.433936030E+00, -3.656034900E-04,
                       9.880966450E-08, -1.416076856E-11,  9.380184620E-16),
    FIT( 6000, 20000, -9.575303540E+08,  5.912434480E+05, -1.384566826E+02,  1.694339403E-02,
                      -1.007351096E-06,  2.912584076E-11, -3.295109350E-16),
};
static const struct gas_interval nitrogen_dioxide[] = {
    FIT(  200,  1000, -5.642038780E+04,  9.633085720E+02, -2.434510974E+00,  1.927760886E-02,
                      -1.874559328E-05,  9.145497730E-09, -1.777647635E-12),
    FIT( 1000,  6000,  7.213001570E+05, -3.832615200E+03,  1.113963285E+01, -2.238062246E-03,
                       6.547723430E-07, -7.611335900E-11,  3.328361050E-15),
};
static const struct gas_interval nitrous_oxide[] = {
    FIT(  200,  1000,  4.288225970E+04, -6.440118440E+02,  6.034351430E+00,  2.265394436E-04,
                       3.472782850E-06, -3.627748640E-09,  1.137969552E-12),
    FIT( 1000,  6000,  3.438448040E+05, -2.404557558E+03,  9.125636220E+00, -5.401667930E-04,
                       1.315124031E-07, -1.414215100E-11,  6.381066870E-16),
};
static const struct gas_interval dinitrogen_trioxide[] = {
    FIT(  200,  1000, -9.204444170E+04,  9.295520150E+02,  3.203664810E+00,  1.356473078E-02,
                      -6.262966070E-06, -1.402915559E-09,  1.431620930E-12),
    FIT( 1000,  6000,  7.783881860E+05, -4.483024660E+03,  1.666668024E+01, -2.062143878E-03,
                       5.309541710E-07, -6.190451220E-11,  2.692956658E-15),
};
static const struct gas_interval dinitrogen_tetroxide[] = {
    FIT(  200,  1000, -3.804751440E+04,  5.612828890E+02, -2.083648324E-01,  3.887087820E-02,
                      -4.422412260E-05,  2.498812310E-08, -5.679102380E-12),
    FIT( 1000,  6000, -4.582843760E+05, -1.604749805E+03,  1.674102133E+01, -5.091385080E-04,
                       1.143634670E-07, -1.316288176E-11,  5.976316620E-16),
};
static const struct gas_interval dinitrogen_pentoxide[] = {
    FIT(  200,  1000,  4.007828170E+04, -8.769675120E+02,  1.055932981E+01,  1.394613859E-02,
                      -8.884346920E-06,  8.500431150E-10,  7.791550910E-13),
    FIT( 1000,  6000, -5.325578960E+04, -3.109277389E+03,  2.036088958E+01, -9.959901140E-04,
                       2.401398635E-07, -3.057161911E-11,  1.495915511E-15),
};
static const struct gas_interval nitrogen_trifluoride[] = {
    FIT(  200,  1000,  8.757149280E+04, -9.031832890E+02,  4.027417270E+00,  2.314439555E-02,
                      -3.415106470E-05,  2.409483651E-08, -6.633464190E-12),
    FIT( 1000,  6000, -3.496268760E+05, -4.973728670E+02,  1.036866128E+01,  8.900687650E-05,
                       5.882654360E-08, -3.157737664E-12,  1.714329953E-16),
};
static const struct gas_interval nitric_acid[] = {
    FIT(  200,  1000,  9.202869010E+03,  1.093774496E+02, -4.521042450E-01,  2.984914503E-02,
                      -3.190635500E-05,  1.720931528E-08, -3.782649830E-12),
    FIT( 1000,  6000, -9.497809640E+04, -2.733024468E+03,  1.449426995E+01, -7.821868050E-04,
                       1.702693665E-07, -1.930543961E-11,  8.870455120E-16),
};
static const struct gas_interval nitrosyl_chloride[] = {
    FIT(  200,  1000,  2.308835209E+04, -5.495983840E+02,  7.730463360E+00, -5.073910900E-03,
                       1.062996184E-05, -8.793249700E-09,  2.648180166E-12),
    FIT( 1000,  6000, -6.133413330E+05, -3.919298830E+02,  9.138917220E+00, -2.605664613E-03,
                       1.295687247E-06, -2.215378352E-10,  1.280394898E-14),
};
static const struct gas_interval sulfur_dioxide[] = {
    FIT(  200,  1000, -5.310842140E+04,  9.090311670E+02, -2.356891244E+00,  2.204449885E-02,
                      -2.510781471E-05,  1.446300484E-08, -3.369070940E-12),
    FIT( 1000,  6000, -1.127640116E+05, -8.252261380E+02,  7.616178630E+00, -1.999327610E-04,
                       5.655631430E-08, -5.454316610E-12,  2.918294102E-16),
};
static const struct gas_interval sulfur_trioxide[] = {
    FIT(  200,  1000, -3.952855290E+04,  6.208572570E+02, -1.437731716E+00,  2.764126467E-02,
                      -3.144958662E-05,  1.792798000E-08, -4.126386660E-12),
    FIT( 1000,  6000, -2.166923781E+05, -1.301022399E+03,  1.096287985E+01, -3.837100020E-04,
                       8.466889040E-08, -9.705399290E-12,  4.498397540E-16),
};
static const struct gas_interval hydrogen_sulfide[] = {
    FIT(  200,  1000,  9.543808810E+03, -6.875175080E+01,  4.054921960E+00, -3.014557336E-04,
                       3.768497750E-06, -2.239358925E-09,  3.086859108E-13),
    FIT( 1000,  6000,  1.430040220E+06, -5.284028650E+03,  1.016182124E+01, -9.703849960E-04,
                       2.154003405E-07, -2.169695700E-11,  9.318163070E-16),
};
static const struct gas_interval carbonyl_sulfide[] = {
    FIT(  200,  1000,  8.547876430E+04, -1.319464821E+03,  9.735257240E+00, -6.870830960E-03,
                       1.082331416E-05, -7.705597340E-09,  2.078570344E-12),
    FIT( 1000,  6000,  1.959098567E+05, -1.756167688E+03,  8.710430340E+00, -4.139424960E-04,
                       1.015243648E-07, -1.159609663E-11,  5.691053860E-16),
};
static const struct gas_interval ammonia[] = {
    FIT(  200,  1000, -7.681226150E+04,  1.270951578E+03, -3.893229130E+00,  2.145988418E-02,
                      -2.183766703E-05,  1.317385706E-08, -3.332322060E-12),
    FIT( 1000,  6000,  2.452389535E+06, -8.040894240E+03,  1.271346201E+01, -3.980186580E-04,
                       3.552502750E-08,  2.530923570E-12, -3.322700530E-16),
};
static const struct gas_interval hydrogen_chloride[] = {
    FIT(  200,  1000,  2.062588287E+04, -3.093368855E+02,  5.275418850E+00, -4.828874220E-03,
                       6.195794600E-06, -3.040023782E-09,  4.916790030E-13),
    FIT( 1000,  6000,  9.157749510E+05, -2.770550211E+03,  5.973539790E+00, -3.629810060E-04,
                       4.735529190E-08,  2.810262054E-12, -6.656104220E-16),
};
static const struct gas_interval hydrogen_fluoride[] = {
    FIT(  200,  1000, -3.192098970E+03,  5.986807720E+01,  3.055113902E+00,  1.684673783E-03,
                      -3.287394830E-06,  3.095923617E-09, -9.764691610E-13),
    FIT( 1000,  6000,  7.257089040E+05, -1.484797741E+03,  3.855527470E+00,  7.138989850E-04,
                      -2.106757333E-07,  3.050092453E-11, -1.639495583E-15),
    FIT( 6000, 20000,  1.764588423E+08, -8.789998060E+04,  1.886524859E+01, -6.850866180E-04,
                      -1.403468022E-08,  1.503711045E-12, -2.717518148E-17),
};
static const struct gas_interval hydrogen_bromide[] = {
    FIT(  200,  1000,  2.527222498E+04, -4.065110270E+02,  6.043116610E+00, -7.717882870E-03,
                       1.149123213E-05, -7.293633280E-09,  1.747406491E-12),
    FIT( 1000,  6000,  1.170033949E+06, -3.786521010E+03,  7.503148050E+00, -1.284963943E-03,
                       3.206257190E-07, -3.444925160E-11,  1.126758417E-15),
};
static const struct gas_interval hydrogen_iodide[] = {
    FIT(  200,  1000,  1.872881730E+04, -3.431788840E+02,  5.956712430E+00, -8.543439600E-03,
                       1.454780274E-05, -1.049104164E-08,  2.839734003E-12),
    FIT( 1000,  6000,  4.724921450E+05, -1.923465741E+03,  5.758048970E+00, -4.066266380E-04,
                       9.474332050E-08, -1.033534431E-11,  4.611614790E-16),
};
static const struct gas_interval hydrogen_cyanide[] = {
    FIT(  200,  1000,  9.098286930E+04, -1.238657512E+03,  8.721307870E+00, -6.528242940E-03,
                       8.872700830E-06, -4.808886670E-09,  9.317898500E-13),
    FIT( 1000,  6000,  1.236889278E+06, -4.446732410E+03,  9.738874850E+00, -5.855182640E-04,
                       1.072791440E-07, -1.013313244E-11,  3.348247980E-16),
};
static const struct gas_interval cyanogen[] = {
    FIT(  200,  1000,  1.082404484E+05, -1.928137871E+03,  1.553891898E+01, -1.821159329E-02,
                       2.778840840E-05, -1.899434373E-08,  4.949677720E-12),
    FIT( 1000,  6000,  7.934423720E+05, -3.997376270E+03,  1.314497430E+01, -8.747782000E-04,
                       2.059156733E-07, -2.200469389E-11,  9.974485770E-16),
};
static const struct gas_interval chlorine_dioxide[] = {
    FIT(  200,  1000, -1.127277696E+04,  3.903032030E+02, -3.843018530E-01,  2.108677947E-02,
                      -2.793137755E-05,  1.841289286E-08, -4.839779150E-12),
    FIT( 1000,  6000, -1.633793802E+05, -3.161480670E+02,  7.009787260E+00,  2.837971144E-04,
                      -1.179925338E-07,  2.920383252E-11, -2.024030202E-15),
};
static const struct gas_interval chlorine_trifluoride[] = {
    FIT(  200,  1000,  1.285175171E+05, -2.140445721E+03,  1.493096474E+01, -6.042471040E-03,
                       3.718968610E-06, -8.053201100E-10, -7.985600530E-14),
    FIT( 1000,  6000, -2.294956235E+05, -1.220741000E+02,  1.009124644E+01, -3.649724750E-05,
                       8.058910750E-09, -9.230849950E-13,  4.272569490E-17),
};
static const struct gas_interval hydrogen_peroxide[] = {
    FIT(  200,  1000, -9.279533580E+04,  1.564748385E+03, -5.976460140E+00,  3.270744520E-02,
                      -3.932193260E-05,  2.509255235E-08, -6.465045290E-12),
    FIT( 1000,  6000,  1.489428027E+06, -5.170821780E+03,  1.128204970E+01, -8.042397790E-05,
                      -1.818383769E-08,  6.947265590E-12, -4.827831900E-16),
};
static const struct gas_interval hydrazine[] = {
    FIT(  200,  1000, -1.660756354E+05,  3.035416736E+03, -1.736889823E+01,  7.159834020E-02,
                      -8.866799300E-05,  5.798970280E-08, -1.530037218E-11),
    FIT( 1000,  6000,  3.293486700E+06, -1.199850628E+04,  2.104406814E+01, -1.399381724E-03,
                       1.933173351E-07, -1.318016127E-11,  3.166400170E-16),
};
static const struct gas_interval carbon_disulfide[] = {
    FIT(  200,  1000,  1.613560482E+04, -4.649481470E+02,  6.297938790E+00,  1.888896706E-03,
                       3.031927747E-07, -1.737645373E-09,  7.793989390E-13),
    FIT( 1000,  6000, -1.390419724E+06,  3.354975500E+03,  3.019247723E+00,  2.876437543E-03,
                      -9.076812720E-07,  1.374091042E-10, -6.999575570E-15),
};
static const struct gas_interval sulfur_tetrafluoride[] = {
    FIT(  200,  1000,  1.636183265E+05, -2.531316261E+03,  1.559106568E+01,  3.326704310E-03,
                      -1.054935525E-05,  9.391363050E-09, -2.914816694E-12),
    FIT( 1000,  6000, -3.777125160E+05, -2.937595659E+02,  1.321902007E+01, -8.747669450E-05,
                       1.929905265E-08, -2.209423506E-12,  1.022335559E-16),
};
static const struct gas_interval sulfur_hexafluoride[] = {
    FIT(  200,  1000,  3.309526740E+05, -4.737685050E+03,  2.247738068E+01,  1.046954309E-02,
                      -2.560641961E-05,  2.153716967E-08, -6.516098960E-12),
    FIT( 1000,  6000, -7.306726500E+05, -6.367056550E+02,  1.947442853E+01, -1.894325671E-04,
                       4.178722830E-08, -4.783744950E-12,  2.213516129E-16),
};
static const struct gas_interval sulfuryl_fluoride[] = {
    FIT(  200,  1000,  5.533153530E+04, -8.074639680E+02,  5.287172160E+00,  2.294547775E-02,
                      -2.891025299E-05,  1.785631907E-08, -4.418919500E-12),
    FIT( 1000,  6000, -3.403904450E+05, -1.309288764E+03,  1.396601541E+01, -3.840088150E-04,
                       8.456688780E-08, -9.678246870E-12,  4.480014280E-16),
};
static const struct gas_interval sulfuryl_chloride[] = {
    FIT(  200,  1000,  6.821592390E+03, -5.849569200E+02,  8.596756910E+00,  1.197228675E-02,
                      -1.333760700E-05,  7.126129000E-09, -1.496150016E-12),
    FIT( 1000,  6000, -2.376639109E+05, -9.647740410E+02,  1.371469904E+01, -2.850327057E-04,
                       6.293509620E-08, -7.217844260E-12,  3.346840220E-16),
};

static const struct gas_species gases[] = {
    {.name = "carbon monoxide", .formula = "CO", .cas = "630-08-0", .aliases = "carbonic oxide",
     .element = {{"C", 1}, {"O", 1}}, HEAT(carbon_monoxide, "tpis79: Gurvich,1979 pt1 p25 pt2 p29."),
     BOILS(81.7, YAWS_2009_ORGANIC), DIPOLE(0.11, NSRDS_10),
     CRITICAL(132.92, PERRY_8, 3498000, VDI_ATLAS, 0.049, PSRK_4)},
    {.name = "carbon dioxide", .formula = "CO2", .cas = "124-38-9",
     .aliases = "carbonic acid gas|carbonic anhydride|R-744", .element = {{"C", 1}, {"O", 2}},
     HEAT(carbon_dioxide, "g 9/99: Gurvich,1991 pt1 p27 pt2 p24."), BOILS(194.67, YAWS_2009_ORGANIC),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(304.19, YAWS_2014, 7382000, YAWS_2014, 0.2252, PSRK_4)},
    {.name = "water", .formula = "H2O", .cas = "7732-18-5",
     .aliases = "steam|water vapour|water vapor|moisture|R-718", .element = {{"H", 2}, {"O", 1}},
     HEAT(water, "g 8/89: Hf:Cox,1989. Woolley,1987. TRC(10/88) tuv25."), BOILS(373.15, POLING_5),
     DIPOLE(1.8546, NSRDS_10), CRITICAL(647.13, PERRY_8, 2.2055e+07, YAWS_2014, 0.344, POLING_5)},
    {.name = "heavy water", .formula = "D2O", .cas = "7789-20-0", .aliases = "deuterium oxide|heavy steam",
     .element = {{"D", 2}, {"O", 1}}, HEAT(heavy_water, "g 6/99: Gurvich,1989 pt1 p142 pt2 p51."),
     BOILS(374.55, YAWS_2009_INORGANIC), DIPOLE(1.87, NSRDS_10),
     CRITICAL(643.89, PINA_MARTINEZ, 2.1671e+07, PINA_MARTINEZ, 0.3677, YAWS_2014)},
    {.name = "nitric oxide", .formula = "NO", .cas = "10102-43-9", .aliases = "nitrogen monoxide|nitrogen(II) oxide",
     .element = {{"N", 1}, {"O", 1}}, HEAT(nitric_oxide, "tpis89: Gurvich,1978,1989 pt1 p326 pt2 p203."),
     BOILS(121.38, POLING_5), DIPOLE(0.159, NSRDS_10),
     CRITICAL(180.15, PERRY_8, 6480000, POLING_5, 0.5829, YAWS_2014)},
    {.name = "nitrogen dioxide", .formula = "NO2", .cas = "10102-44-0",
     .aliases = "nitrogen peroxide|nitrogen(IV) oxide", .element = {{"N", 1}, {"O", 2}},
     HEAT(nitrogen_dioxide, "g 4/99: Gurvich,1989 pt1 p332 pt2 p207."), BOILS(294.15, YAWS_2009_INORGANIC),
     DIPOLE(0.316, NSRDS_10), CRITICAL(431.15, VDI_ATLAS, 1.0133e+07, POLING_5, 0.8511, YAWS_2014)},
    {.name = "nitrous oxide", .formula = "N2O", .cas = "10024-97-2",
     .aliases = "laughing gas|dinitrogen monoxide|dinitrogen oxide|R-744A", .element = {{"N", 2}, {"O", 1}},
     HEAT(nitrous_oxide, "g 4/99: Gurvich,1989 pt1 p337 pt2 p210."), BOILS(184.67, POLING_5),
     DIPOLE(0.161, NSRDS_10), CRITICAL(309.57, PERRY_8, 7245000, VDI_ATLAS, 0.143, PERRY_8)},
    {.name = "dinitrogen trioxide", .formula = "N2O3", .cas = "10544-73-7", .aliases = "",
     .element = {{"N", 2}, {"O", 3}}, HEAT(dinitrogen_trioxide, "g 4/99: Gurvich,1989 pt1 p338 pt2 p211."),
     BOILS(275.15, YAWS_2009_INORGANIC), DIPOLE(2.12, NSRDS_10),
     CRITICAL(425.0, YAWS_2014, 6990000, YAWS_2014, 0.4312, YAWS_2014)},
    {.name = "dinitrogen tetroxide", .formula = "N2O4", .cas = "10544-72-6", .aliases = "nitrogen tetroxide|NTO",
     .element = {{"N", 2}, {"O", 4}}, HEAT(dinitrogen_tetroxide, "tpis89: Gurvich,1989 pt1 p342 pt2 p212."),
     BOILS(294.31, YAWS_2009_INORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(431.1, VDI_ATLAS, 1.01325e+07, PSRK_4, 0.8533, YAWS_2014)},
    {.name = "dinitrogen pentoxide", .formula = "N2O5", .cas = "10102-03-1", .aliases = "nitrogen pentoxide",
     .element = {{"N", 2}, {"O", 5}}, HEAT(dinitrogen_pentoxide, "g 4/99: Gurvich,1989 pt1 p343 pt2 p213."),
     BOILS(306.15, YAWS_2009_INORGANIC), DIPOLE(NAN, NONE),
     CRITICAL(515.51, YAWS_2014, 6433000, YAWS_2014, 0.266, YAWS_2014)},
    {.name = "nitrogen trifluoride", .formula = "NF3", .cas = "7783-54-2", .aliases = "",
     .element = {{"N", 1}, {"F", 3}},
     HEAT(nitrogen_trifluoride, "g 4/99: Gurvich,1989 pt1 p375. McBride,1992 METHOD NRRAO2."),
     BOILS(144.09, YAWS_2009_INORGANIC), DIPOLE(0.235, NSRDS_10),
     CRITICAL(234.0, PINA_MARTINEZ, 4461000, PINA_MARTINEZ, 0.12, YAWS_2014)},
    {.name = "nitric acid", .formula = "HNO3", .cas = "7697-37-2", .aliases = "",
     .element = {{"H", 1}, {"N", 1}, {"O", 3}}, HEAT(nitric_acid, "g 5/99: Gurvich,1989 pt1 p367 pt2 p231."),
     BOILS(356.15, YAWS_2009_INORGANIC), DIPOLE(2.17, NSRDS_10),
     CRITICAL(520.0, PSRK_4, 6890100, PSRK_4, 0.7144, PSRK_4)},
    {.name = "nitrosyl chloride", .formula = "NOCl", .cas = "2696-92-6", .aliases = "NOCl",
     .element = {{"N", 1}, {"O", 1}, {"Cl", 1}},
     HEAT(nitrosyl_chloride, "g 4/99: Gurvich,1989 pt1 p389. McBride,1992 METHOD PANDK."),
     BOILS(267.77, YAWS_2009_INORGANIC), DIPOLE(1.9, NSRDS_10),
     CRITICAL(440.65, PINA_MARTINEZ, 9120000, PINA_MARTINEZ, 0.318, PSRK_4)},
    {.name = "sulfur dioxide", .formula = "SO2", .cas = "7446-09-5",
     .aliases = "sulphur dioxide|sulfurous anhydride|R-764", .element = {{"S", 1}, {"O", 2}},
     HEAT(sulfur_dioxide, "tpis89: Gurvich,1989 pt1 p288 pt2 p175."), BOILS(263.13, POLING_5),
     DIPOLE(1.633, NSRDS_10), CRITICAL(430.75, PERRY_8, 7884000, POLING_5, 0.2453, YAWS_2014)},
    {.name = "sulfur trioxide", .formula = "SO3", .cas = "7446-11-9",
     .aliases = "sulphur trioxide|sulfuric anhydride", .element = {{"S", 1}, {"O", 3}},
     HEAT(sulfur_trioxide, "tpis89: Gurvich,1989 pt1 p292 pt2 p177."), BOILS(317.9, POLING_5),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(490.85, PERRY_8, 8210000, POLING_5, 0.424, VDI_ATLAS)},
    {.name = "hydrogen sulfide", .formula = "H2S", .cas = "7783-06-4",
     .aliases = "hydrogen sulphide|sulfuretted hydrogen", .element = {{"H", 2}, {"S", 1}},
     HEAT(hydrogen_sulfide, "g 4/01: Gurvich,1989 pt1 p298 pt2 p181."), BOILS(212.8, YAWS_2009_INORGANIC),
     DIPOLE(0.978, NSRDS_10), CRITICAL(373.53, PERRY_8, 8963000, PINA_MARTINEZ, 0.096, PERRY_8)},
    {.name = "carbonyl sulfide", .formula = "COS", .cas = "463-58-1",
     .aliases = "carbonyl sulphide|carbon oxysulfide|carbon oxysulphide|OCS",
     .element = {{"C", 1}, {"O", 1}, {"S", 1}}, HEAT(carbonyl_sulfide, "g 5/01: Gurvich,1991 pt1 p211 pt2 p200."),
     BOILS(223.0, YAWS_2009_ORGANIC), DIPOLE(0.715, NSRDS_10),
     CRITICAL(378.8, PINA_MARTINEZ, 6349000, PINA_MARTINEZ, 0.097, YAWS_2014)},
    {.name = "ammonia", .formula = "NH3", .cas = "7664-41-7", .aliases = "anhydrous ammonia|azane|R-717",
     .element = {{"N", 1}, {"H", 3}}, HEAT(ammonia, "tpis89: Gurvich,1989 pt1 p354 pt2 p219. Haar,1968."),
     BOILS(239.8, JOBACK_1984), DIPOLE(1.472, NSRDS_10),
     CRITICAL(405.6, PSRK_4, 1.128e+07, PINA_MARTINEZ, 0.2526, YAWS_2014)},
    {.name = "hydrogen chloride", .formula = "HCl", .cas = "7647-01-0",
     .aliases = "hydrochloric acid gas|hydrogen chloride gas", .element = {{"H", 1}, {"Cl", 1}},
     HEAT(hydrogen_chloride, "tpis89: Gurvich,1989 pt1 p186 pt2 p93."), BOILS(188.15, YAWS_2009_INORGANIC),
     DIPOLE(1.109, NSRDS_10), CRITICAL(324.65, PERRY_8, 8310000, VDI_ATLAS, 0.131, VDI_ATLAS)},
    {.name = "hydrogen fluoride", .formula = "HF", .cas = "7664-39-3",
     .aliases = "hydrogen fluoride (monomer)|anhydrous hydrofluoric acid|AHF", .element = {{"H", 1}, {"F", 1}},
     HEAT(hydrogen_fluoride, "monomer only, association is not in it. tpis89: Gurvich,1989 pt1 p162 pt2 p77."),
     BOILS(292.67, YAWS_2009_INORGANIC), DIPOLE(1.826, NSRDS_10),
     CRITICAL(461.15, PERRY_8, 6480000, VDI_ATLAS, 0.381, VDI_ATLAS)},
    {.name = "hydrogen bromide", .formula = "HBr", .cas = "10035-10-6", .aliases = "hydrobromic acid gas",
     .element = {{"H", 1}, {"Br", 1}}, HEAT(hydrogen_bromide, "tpis89: Gurvich,1989 pt1 p205 pt2 p106."),
     BOILS(206.45, YAWS_2009_INORGANIC), DIPOLE(0.827, NSRDS_10),
     CRITICAL(363.15, PERRY_8, 8552000, VDI_ATLAS, 0.0693, YAWS_2014)},
    {.name = "hydrogen iodide", .formula = "HI", .cas = "10034-85-2", .aliases = "hydriodic acid gas",
     .element = {{"H", 1}, {"I", 1}}, HEAT(hydrogen_iodide, "j 9/61: Chase,1998 p1265."),
     BOILS(237.55, YAWS_2009_INORGANIC), DIPOLE(0.448, NSRDS_10),
     CRITICAL(423.85, VDI_ATLAS, 8310000, VDI_ATLAS, 0.0381, YAWS_2014)},
    {.name = "hydrogen cyanide", .formula = "HCN", .cas = "74-90-8",
     .aliases = "hydrocyanic acid|prussic acid|formonitrile", .element = {{"H", 1}, {"C", 1}, {"N", 1}},
     HEAT(hydrogen_cyanide, "g 6/01: Hf: East,1993. Gurvich,1991 pt1 p226."), BOILS(298.9, JOBACK_1984),
     DIPOLE(2.985, NSRDS_10), CRITICAL(456.65, PERRY_8, 5390000, VDI_ATLAS, 0.41, VDI_ATLAS)},
    {.name = "cyanogen", .formula = "C2N2", .cas = "460-19-5", .aliases = "dicyanogen|ethanedinitrile|(CN)2",
     .element = {{"C", 2}, {"N", 2}}, HEAT(cyanogen, "tpis79: Gurvich,1979 pt1 p195 pt2 p220."),
     BOILS(252.0, YAWS_2009_ORGANIC), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(400.0, IUPAC_CRITICAL, 5978175, PSRK_4, 0.279, VDI_ATLAS)},
    {.name = "chlorine dioxide", .formula = "ClO2", .cas = "10049-04-4", .aliases = "",
     .element = {{"Cl", 1}, {"O", 2}}, HEAT(chlorine_dioxide, "g 7/93: Gurvich,1989 pt1 p182 pt2 p91."),
     BOILS(284.1, FROM_MEMORY), DIPOLE(1.784, NSRDS_10), CRITICAL(465.0, PSRK_4, 8611612, PSRK_4, 0.277, PSRK_4)},
    {.name = "chlorine trifluoride", .formula = "ClF3", .cas = "7790-91-2", .aliases = "chlorine(III) fluoride",
     .element = {{"Cl", 1}, {"F", 3}}, HEAT(chlorine_trifluoride, "tpis89: Gurvich,1989 pt1 p193 pt2 p98."),
     BOILS(NAN, NONE), DIPOLE(NAN, NONE), CRITICAL(NAN, NONE, NAN, NONE, NAN, NONE)},
    {.name = "hydrogen peroxide", .formula = "H2O2", .cas = "7722-84-1", .aliases = "",
     .element = {{"H", 2}, {"O", 2}},
     HEAT(hydrogen_peroxide, "g 6/99: Hf:Gurvich,1989 pt1 p127. Gurvich,1978 pt1 p121."),
     BOILS(423.35, YAWS_2009_INORGANIC), DIPOLE(1.573, NSRDS_10),
     CRITICAL(730.15, PINA_MARTINEZ, 2.17e+07, PINA_MARTINEZ, 0.3582, YAWS_2014)},
    {.name = "hydrazine", .formula = "N2H4", .cas = "302-01-2", .aliases = "diazane",
     .element = {{"N", 2}, {"H", 4}}, HEAT(hydrazine, "g 4/99: Gurvich,1989 pt1 p360 pt2 p225."),
     BOILS(386.65, YAWS_2009_INORGANIC), DIPOLE(1.75, NSRDS_10),
     CRITICAL(653.15, PERRY_8, 1.47e+07, PINA_MARTINEZ, 0.315, PERRY_8)},
    {.name = "carbon disulfide", .formula = "CS2", .cas = "75-15-0",
     .aliases = "carbon disulphide|carbon bisulfide|carbon bisulphide", .element = {{"C", 1}, {"S", 2}},
     HEAT(carbon_disulfide, "g 6/95: Gurvich,1991 pt1 p209 pt2 p199."), BOILS(319.37, YAWS_2009_ORGANIC),
     DIPOLE(0.0, BY_SYMMETRY), CRITICAL(552.0, PERRY_8, 7900000, VDI_ATLAS, 0.115, PSRK_4)},
    {.name = "sulfur tetrafluoride", .formula = "SF4", .cas = "7783-60-0", .aliases = "sulphur tetrafluoride",
     .element = {{"S", 1}, {"F", 4}}, HEAT(sulfur_tetrafluoride, "tpis89: Gurvich,1989 pt1 p307 pt2 p188."),
     BOILS(232.7, YAWS_2009_INORGANIC), DIPOLE(0.632, NSRDS_10),
     CRITICAL(364.0, YAWS_2014, 5222000, YAWS_2014, 0.307, YAWS_2014)},
    {.name = "sulfur hexafluoride", .formula = "SF6", .cas = "2551-62-4", .aliases = "sulphur hexafluoride",
     .element = {{"S", 1}, {"F", 6}}, HEAT(sulfur_hexafluoride, "tpis89: Gurvich,1989 pt1 p311 pt2 p191."),
     BOILS(209.3, NIST_WEBBOOK), DIPOLE(0.0, BY_SYMMETRY),
     CRITICAL(318.7, PSRK_4, 3760000, PINA_MARTINEZ, 0.2151, YAWS_2014)},
    {.name = "sulfuryl fluoride", .formula = "SO2F2", .cas = "2699-79-8",
     .aliases = "sulphuryl fluoride|sulfonyl difluoride", .element = {{"S", 1}, {"O", 2}, {"F", 2}},
     HEAT(sulfuryl_fluoride, "tpis89: Gurvich,1989 pt1 p313 pt2 p193."), BOILS(217.75, YAWS_2009_INORGANIC),
     DIPOLE(1.12, NSRDS_10), CRITICAL(336.28, YAWS_2014, 4639000, YAWS_2014, NAN, NONE)},
    {.name = "sulfuryl chloride", .formula = "SO2Cl2", .cas = "7791-25-5",
     .aliases = "sulphuryl chloride|sulfonyl dichloride", .element = {{"S", 1}, {"O", 2}, {"Cl", 2}},
     HEAT(sulfuryl_chloride, "j 6/71: Chase,1998 p847."), BOILS(342.55, YAWS_2009_INORGANIC), DIPOLE(1.81, NSRDS_10),
     CRITICAL(545.0, PINA_MARTINEZ, 4610000, VDI_ATLAS, 0.176, VDI_ATLAS)},
};
/* clang-format on */

const struct gas_family gas_family_inorganic = {sizeof gases / sizeof gases[0], gases};
