# Gasleaf. `make help` prints the targets.

# --- settings -------------------------------------------------------------------------------------------------------
VERSION ?= 0.1.0
BUILD   ?= build
CC      ?= cc
CFLAGS  ?= -O2 -g
# The office, its development kit, and the unit library that travels inside the extension.
OFFICE    ?= /usr/lib/libreoffice
SDK       ?= $(OFFICE)/sdk
UDUNITS   ?= $(firstword $(wildcard /usr/lib/*/libudunits2.so.0 /usr/lib64/libudunits2.so.0 /usr/lib/libudunits2.so.0))
UDUNITS_LICENCE ?= /usr/share/doc/libudunits2-0/copyright
# Debian packages that `make deps` installs when they are missing.
BUILD_PACKAGES := gcc libc6-dev make zip libudunits2-dev libreoffice-calc libreoffice-dev libreoffice-dev-common
TEST_PACKAGES  := libcunit1-dev libgsl-dev units unzip locales
DEMO_PACKAGES  := poppler-utils fonts-dejavu-core
LINT_PACKAGES  := clang-format clang-tidy cppcheck valgrind

JOBS ?= $(shell nproc)

WARN     := -std=c11 -Wall -Wextra -Wconversion -Wshadow -pedantic -Werror
CPPFLAGS += -D_GNU_SOURCE -Iinclude -Isrc -DGASLEAF_VERSION='"$(VERSION)"'
COMPILE   = $(CC) $(WARN) $(CPPFLAGS) $(CFLAGS) -fPIC -fvisibility=hidden -MMD -MP

# --- what is built from what ----------------------------------------------------------------------------------------
LIB_LAYERS   := core data units
SHEET_LAYERS := sheet audit
sources = $(foreach layer,$(1),$(wildcard src/$(layer)/*.c))
objects = $(patsubst %.c,$(BUILD)/%.o,$(1))

LIB       := $(BUILD)/libgasleaf.a
SHEETLIB  := $(BUILD)/libgasleaf-sheet.a
ADDIN     := $(BUILD)/oxt/gasleaf.so
OXT       := $(BUILD)/gasleaf.oxt
GENERATOR := $(BUILD)/generate

UNIT_LAYERS := core data units sheet audit check fuzz
TEST_SRC    := $(wildcard tests/support/*.c) $(filter-out tests/fuzz/test_%,$(wildcard tests/fuzz/*.c)) $(foreach layer,$(UNIT_LAYERS),$(wildcard tests/$(layer)/test_*.c))
GLUE_SRC    := $(wildcard tests/support/*.c) $(wildcard tests/glue/*.c) $(filter-out %/main.c,$(call sources,generate))
suites = $(patsubst test_%.c,suite_%,$(filter test_%,$(notdir $(1))))

.PHONY: audit-report bench prices all check test demo deps generate install lint valgrind fuzz sanitize races clean help glue tools sdk checks
all: $(OXT) ## build the extension, build/gasleaf.oxt

help: ## print the targets
	@awk -F ':.*## ' '/^[a-z-]+:.*## / { printf "make %-12s %s\n", $$1, $$2 }' $(MAKEFILE_LIST)

# --- compiling ------------------------------------------------------------------------------------------------------
$(BUILD)/%.o: %.c
	@mkdir -p $(@D)
	$(COMPILE) -c $< -o $@

$(LIB): $(call objects,$(call sources,$(LIB_LAYERS)))
	rm -f $@ && ar rcs $@ $^

$(SHEETLIB): $(call objects,$(call sources,$(SHEET_LAYERS)))
	rm -f $@ && ar rcs $@ $^

$(GENERATOR): $(call objects,$(call sources,generate)) $(SHEETLIB) $(LIB)
	$(CC) $^ -o $@ -ludunits2 -lm -pthread

generate: $(GENERATOR) ## rewrite idl/, the wizard's texts and docs/functions.md from the catalogue
	$(GENERATOR) .

# --- the extension --------------------------------------------------------------------------------------------------
ADDIN_OBJ := $(call objects,$(call sources,addin))
$(ADDIN_OBJ) $(BUILD)/tests/glue/%.o: CPPFLAGS += -isystem $(SDK)/include
$(ADDIN_OBJ): | sdk

sdk:
	@test -e $(SDK)/lib/libuno_cppu.so -a -e "$(UDUNITS)" || { \
	  echo "The office's development kit or UDUNITS-2 is missing: 'make deps' installs them" \
	       "(or set SDK=... and UDUNITS=...)."; exit 1; }

$(ADDIN): $(ADDIN_OBJ) $(SHEETLIB) $(LIB)
	@mkdir -p $(@D)
	$(CC) -shared $^ -o $@ -Wl,-z,defs -Wl,--exclude-libs,ALL -Wl,--enable-new-dtags -Wl,-rpath,'$$ORIGIN' \
	  -Wl,-soname,gasleaf.so -L$(SDK)/lib -luno_cppu -luno_sal -ludunits2 -lm -pthread

$(BUILD)/oxt/gasleaf.rdb: $(wildcard idl/gasleaf/*.idl) | sdk
	@mkdir -p $(@D)
	$(SDK)/bin/unoidl-write $(OFFICE)/program/types.rdb $(OFFICE)/program/types/offapi.rdb idl $@

$(OXT): $(ADDIN) $(BUILD)/oxt/gasleaf.rdb $(wildcard src/package/*) LICENSE Makefile
	mkdir -p $(BUILD)/oxt/META-INF
	cp src/package/CalcAddIns.xcu src/package/gasleaf.components src/package/about.txt LICENSE $(BUILD)/oxt/
	cp src/package/manifest.xml $(BUILD)/oxt/META-INF/manifest.xml
	sed 's/@VERSION@/$(VERSION)/' src/package/description.xml.in > $(BUILD)/oxt/description.xml
	cp -L $(UDUNITS) $(BUILD)/oxt/libudunits2.so.0
	cp $(UDUNITS_LICENCE) $(BUILD)/oxt/LICENSE-UDUNITS
	rm -f $@ && cd $(BUILD)/oxt && zip -qrX ../$(@F) .

install: $(OXT) ## install the extension for the current user
	unopkg add --suppress-license --force $(OXT)

deps: ## install the Debian packages that are missing
	@tests/tools/deps.sh $(BUILD_PACKAGES) $(TEST_PACKAGES) $(DEMO_PACKAGES)

# --- tests ----------------------------------------------------------------------------------------------------------
write_suites = { echo '\#include "check.h"'; for s in $(1); do echo "extern const struct test_suite $$s;"; done; \
	  echo 'extern const struct test_suite *const all_suites[];'; \
	  echo 'const struct test_suite *const all_suites[] = {'; for s in $(1); do echo "    &$$s,"; done; echo '    0};'; }

$(BUILD)/tests/suites.c: $(TEST_SRC) Makefile
	@mkdir -p $(@D)
	@$(call write_suites,$(call suites,$(TEST_SRC))) > $@

$(BUILD)/tests/glue_suites.c: $(GLUE_SRC) Makefile
	@mkdir -p $(@D)
	@$(call write_suites,$(call suites,$(GLUE_SRC))) > $@

$(BUILD)/tests/%.o: CPPFLAGS += -Itests/support -Itests
$(BUILD)/tests/fuzz/%.o: CPPFLAGS += -DTEST_LOCALES='"$(BUILD)/locale"'
# Locales that trip careless code: a decimal comma; a dotless i, in an encoding of single bytes.
LOCALES := $(BUILD)/locale/de_DE.UTF-8 $(BUILD)/locale/tr_TR
$(LOCALES): $(BUILD)/locale/%:
	@mkdir -p $(@D)
	localedef -i $(firstword $(subst ., ,$*)) -f $(if $(findstring UTF,$*),UTF-8,ISO-8859-9) $@
$(BUILD)/tests/%suites.o: $(BUILD)/tests/%suites.c
	$(COMPILE) -c $< -o $@

$(BUILD)/tests/run: $(call objects,$(TEST_SRC)) $(BUILD)/tests/suites.o $(SHEETLIB) $(LIB) | $(LOCALES)
	$(CC) $^ -o $@ -lcunit -lgsl -lgslcblas -ludunits2 -lm -pthread

$(BUILD)/tests/glue-run: $(call objects,$(GLUE_SRC)) $(BUILD)/tests/glue_suites.o $(SHEETLIB) $(LIB)
	$(CC) $^ -o $@ -L$(SDK)/lib -luno_cppu -luno_sal -lcunit -ludunits2 -lm -ldl -pthread \
	  -Wl,-rpath,$(OFFICE)/program

SUPPORT := $(BUILD)/tests/support
$(BUILD)/tests/tools/%: $(BUILD)/tests/tools/%.o $(SUPPORT)/csv.o $(SUPPORT)/published.o
	$(CC) $^ -o $@ -lm

$(BUILD)/tests/tools/check_page: $(BUILD)/tests/tools/check_page.o \
    $(addprefix $(SUPPORT)/,csv.o published.o published_page.o formula.o) $(SHEETLIB) $(LIB)
	$(CC) $^ -o $@ -ludunits2 -lm -pthread

check: $(BUILD)/tests/run ## build and run the suites that need no office (SUITE=prefix runs a part)
	$(BUILD)/tests/run $(SUITE)

audit-report: $(BUILD)/tests/run ## write docs/audit-confusion.md: how well the audit finds slips
	GASLEAF_CONFUSION=docs/audit-confusion.md $(BUILD)/tests/run slips

glue: $(BUILD)/tests/glue-run $(ADDIN) ## build and run the suites of the add-in's glue
	GASLEAF_ADDIN=$(ADDIN) $(BUILD)/tests/glue-run $(SUITE)

BENCHES := $(patsubst %.c,$(BUILD)/%,$(wildcard tests/bench/bench_*.c))
$(BENCHES): %: %.o $(SHEETLIB) $(LIB)
	$(CC) $^ -o $@ -ludunits2 -lm -pthread

PRICE_TOOLS := $(BUILD)/tests/bench/office/price_sheet $(BUILD)/tests/bench/office/cpu_time
$(PRICE_TOOLS): %: %.o
	$(CC) $^ -o $@

prices: $(OXT) $(PRICE_TOOLS) ## the price of formulas in real Calc, beside its own
	tests/bench/office/price.sh $(OXT) $(BUILD)/tests/bench/office

bench: $(BENCHES) ## time per row of large tables
	@for b in $(BENCHES); do $$b || exit 1; done

CHECK_TABLES := $(wildcard tests/check/*.csv)
CHECK_SHEETS := $(CHECK_TABLES:tests/check/%.csv=$(BUILD)/checks/%.fods)
$(BUILD)/checks/%.fods: tests/check/%.csv $(BUILD)/tests/tools/check_rows $(BUILD)/tests/tools/make_sheet
	@mkdir -p $(@D)
	@$(BUILD)/tests/tools/check_rows $< > $(@:.fods=.tsv)
	@$(BUILD)/tests/tools/make_sheet $(@:.fods=.tsv) $@ > $(@:.fods=.rows)

checks: $(BUILD)/tests/tools/check_page $(CHECK_SHEETS) ## write docs/checks.md and, to open in Calc, build/checks/*.fods
	$(BUILD)/tests/tools/check_page

tools: $(foreach tool,make_sheet count_sheet show_table check_rows,$(BUILD)/tests/tools/$(tool))

test: deps ## install what is missing, build, and run every test, those in headless Calc too
	@echo "Building"
	@$(MAKE) --no-print-directory -s all tools $(BUILD)/tests/run $(BUILD)/tests/glue-run
	@BUILD=$(BUILD) ADDIN=$(ADDIN) OXT=$(OXT) tests/run_all.sh

demo: deps ## compute the sample sheets in headless Calc; prints them, pictures in build/demo
	@echo "Building"
	@$(MAKE) --no-print-directory -s all tools
	@BUILD=$(BUILD) OXT=$(OXT) tests/tools/demo.sh

# --- quality --------------------------------------------------------------------------------------------------------
C_FILES = $(shell git ls-files '*.c' '*.h')

lint: ## layout, clang-tidy, cppcheck: silent when all is well
	@tests/tools/deps.sh $(LINT_PACKAGES)
	@clang-format --dry-run -Werror $(C_FILES)
	@printf '%s\n' $(filter %.c,$(C_FILES)) | xargs -P $(JOBS) -I{} clang-tidy --quiet {} -- \
	  -std=c11 $(CPPFLAGS) -DTEST_LOCALES='""' -Itests/support -Itests -isystem $(SDK)/include 2>/dev/null
	@cppcheck --quiet --error-exitcode=1 --std=c11 --inline-suppr --enable=warning,performance,portability \
	  -Iinclude -Isrc -Itests/support -DGASLEAF_VERSION='""' -DUNX -DLINUX $(filter %.c,$(C_FILES))

# UDUNITS keeps its units in search trees, which memcheck calls possibly lost: those are not counted.
MEMCHECK := valgrind -q --error-exitcode=1 --leak-check=full --show-leak-kinds=definite,indirect \
  --errors-for-leak-kinds=definite,indirect --suppressions=tests/glue/valgrind.supp

valgrind: $(BUILD)/tests/run $(BUILD)/tests/glue-run $(ADDIN) ## the suites and the glue under memcheck
	@tests/tools/deps.sh $(LINT_PACKAGES)
	GASLEAF_ADDIN=$(ADDIN) $(MEMCHECK) $(BUILD)/tests/glue-run $(SUITE)
	$(MEMCHECK) $(BUILD)/tests/run $(SUITE)

# MOST_CALLS: how many calls the fuzzing makes. What follows it builds in directories of its own, without the warnings
# that the instrumented code alone gives.
MOST_CALLS ?= 200000
fuzz: $(BUILD)/tests/run ## call the functions MOST_CALLS times with arguments made from seeds
	GASLEAF_FUZZ=$(MOST_CALLS) $(BUILD)/tests/run fuzz

sanitize: ## the suites under the address and undefined-behaviour sanitizers
	$(MAKE) BUILD=$(BUILD)/sanitize CC="$(CC) -fsanitize=address,undefined -fno-sanitize-recover=all" WARN="-std=c11 -w" check

races: ## the fuzzing in several threads under the thread sanitizer
	$(MAKE) BUILD=$(BUILD)/races CC="$(CC) -fsanitize=thread" WARN="-std=c11 -w" SUITE=fuzz check

clean: ## remove what was built
	rm -rf $(BUILD)

-include $(shell find $(BUILD) -name '*.d' 2>/dev/null)
