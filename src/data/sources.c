#include "sources.h"

#include <string.h>

#include <gasleaf/species.h>

/* clang-format off */
static const struct gas_source sources[] = {
    {NASA_GLENN,          "B. J. McBride, M. J. Zehe, S. Gordon, NASA Glenn Coefficients for Calculating Thermodynamic Properties of "
                          "Individual Species, NASA/TP-2002-211556, 2002; constants of cp/R, used with R = 8.314510 J/(mol K)"},
    {ATOMIC_WEIGHTS,      "T. Prohaska et al., Standard atomic weights of the elements 2021 (IUPAC Technical Report), Pure Appl. "
                          "Chem. 94 (2022) 573; abridged and conventional values"},
    {ATOMIC_MASSES,       "M. Wang, W. J. Huang, F. G. Kondev, G. Audi, S. Naimi, The AME 2020 atomic mass evaluation, Chinese Phys. C "
                          "45 (2021) 030003: deuterium, radon-222"},
    {US_ATMOSPHERE,       "U.S. Standard Atmosphere, 1976, NOAA, NASA, USAF, NOAA-S/T 76-1562, Washington 1976"},
    {SI_BROCHURE,         "BIPM, The International System of Units (SI), 9th ed., 2019: R = k NA, exact"},
    {ASHRAE_34,           "ANSI/ASHRAE Standard 34, Designation and Safety Classification of Refrigerants"},
    {IUPAC_CRITICAL,      "Vapor-Liquid Critical Properties of Elements and Compounds, a series of reviews for IUPAC, J. Chem. Eng. "
                          "Data, from 40 (1995) on"},
    {PINA_MARTINEZ,       "A. Pina-Martinez, R. Privat, J.-N. Jaubert, D.-Y. Peng, Fluid Phase Equilib. 485 (2019) 264, supplementary tables"},
    {PERRY_8,             "D. W. Green, R. H. Perry (eds.), Perry's Chemical Engineers' Handbook, 8th ed., McGraw-Hill 2008, section 2"},
    {YAWS_2014,           "C. L. Yaws, Thermophysical Properties of Chemicals and Hydrocarbons, 2nd ed., Gulf Professional 2014"},
    {YAWS_2009_ORGANIC,   "C. L. Yaws, Thermophysical Properties of Chemicals and Hydrocarbons, William Andrew 2009, organic compounds"},
    {YAWS_2009_INORGANIC, "C. L. Yaws, Thermophysical Properties of Chemicals and Hydrocarbons, William Andrew 2009, inorganic compounds"},
    {VDI_ATLAS,           "VDI Heat Atlas, 2nd ed., Springer 2010, section D3"},
    {PSRK_4,              "S. Horstmann, A. Jabloniec, J. Krafczyk, K. Fischer, J. Gmehling, Fluid Phase Equilib. 227 (2005) 157, appendix"},
    {CRC_102,             "J. R. Rumble (ed.), CRC Handbook of Chemistry and Physics, 102nd ed., CRC Press 2021"},
    {CRC_95,              "W. M. Haynes (ed.), CRC Handbook of Chemistry and Physics, 95th ed., CRC Press 2014"},
    {POLING_5,            "B. E. Poling, J. M. Prausnitz, J. P. O'Connell, The Properties of Gases and Liquids, 5th ed., McGraw-Hill 2001, "
                          "appendix A"},
    {LEMMON_2000,         "E. W. Lemmon, R. T Jacobsen, S. G. Penoncello, D. G. Friend, J. Phys. Chem. Ref. Data 29 (2000) 331"},
    {LEMMON_2000_BUBBLE,  "after E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331; the figure itself is from memory"},
    {JOBACK_1984,         "K. G. Joback, A Unified Approach to Physical Property Estimation, S.M. thesis, MIT 1984, compilation of data"},
    {PASSUT_DANNER,       "C. A. Passut, R. P. Danner, Ind. Eng. Chem. Process Des. Dev. 12 (1973) 365"},
    {NIST_WEBBOOK,        "P. J. Linstrom, W. G. Mallard (eds.), NIST Chemistry WebBook, NIST Standard Reference Database 69"},
    {NSRDS_10,            "after R. D. Nelson, D. R. Lide, A. A. Maryott, NSRDS-NBS 10, 1967, and the CRC Handbook, section 9; the figures "
                          "themselves are from memory"},
    {BY_SYMMETRY,         "dipole moment that vanishes by the symmetry of the molecule or is negligible"},
    {CRC_MEMORY,          "after the CRC Handbook of Chemistry and Physics; the figure itself is from memory"},
    {FROM_MEMORY,         "common handbook value, written down from memory; no publication was compared"},
};
/* clang-format on */

enum { SOURCES = sizeof sources / sizeof sources[0] };

size_t gas_source_count(void)
{
    return SOURCES;
}

const struct gas_source *gas_source_at(size_t index)
{
    return index < SOURCES ? &sources[index] : NULL;
}

const struct gas_source *gas_source_find(const char *key)
{
    for (size_t i = 0; i < SOURCES; i++)
        if (strcmp(sources[i].key, key) == 0)
            return &sources[i];
    return NULL;
}
