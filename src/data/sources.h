/* sources.h - the keys by which rows cite a publication; sources.c has the citations. (layer: data, internal) */
#ifndef DATA_SOURCES_H
#define DATA_SOURCES_H

#define NONE                ""
#define NASA_GLENN          "NASA/TP-2002-211556"
#define ATOMIC_WEIGHTS      "IUPAC atomic weights 2021"
#define ATOMIC_MASSES       "AME2020"
#define US_ATMOSPHERE       "US Standard Atmosphere 1976"
#define SI_BROCHURE         "BIPM SI Brochure 9th ed. (2019)"
#define ASHRAE_34           "ANSI/ASHRAE Standard 34"
#define IUPAC_CRITICAL      "IUPAC critical-properties series (J. Chem. Eng. Data)"
#define PINA_MARTINEZ       "Pina-Martinez et al. (FPE 485 (2019) 264)"
#define PERRY_8             "Perry 8th ed. (2008) sec. 2"
#define YAWS_2014           "Yaws 2014 (2nd ed.)"
#define YAWS_2009_ORGANIC   "Yaws 2009 (organics)"
#define YAWS_2009_INORGANIC "Yaws 2009 (inorganics)"
#define VDI_ATLAS           "VDI Heat Atlas 2nd ed. (2010) D3"
#define PSRK_4              "PSRK IV appendix (FPE 227 (2005) 157)"
#define CRC_102             "CRC Handbook 102nd ed. (2021)"
#define CRC_95              "CRC Handbook 95th ed. (2014)"
#define POLING_5            "Poling et al. 5th ed. (2001) App. A"
#define LEMMON_2000         "Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331"
#define LEMMON_2000_BUBBLE  "Lemmon et al. (2000), bubble point at 101.325 kPa, from memory"
#define JOBACK_1984         "Joback 1984 compilation"
#define PASSUT_DANNER       "Passut & Danner (IECPDD 12 (1973) 365)"
#define NIST_WEBBOOK        "NIST Chemistry WebBook SRD 69"
#define NSRDS_10            "NSRDS-NBS 10 (1967) / CRC Handbook sec. 9, from memory"
#define BY_SYMMETRY         "zero by symmetry or negligible"
#define CRC_MEMORY          "CRC Handbook, from memory"
#define FROM_MEMORY         "from memory"

#endif
