# Gasleaf. `make help` prints the targets.
VERSION  := 0.1.0
BUILD    ?= build
CC       ?= cc
CFLAGS   ?= -O2 -g
WARN     := -std=c11 -Wall -Wextra -Wconversion -Wshadow -pedantic -Werror
CPPFLAGS += -D_GNU_SOURCE -Iinclude -Isrc -DGASLEAF_VERSION='"$(VERSION)"'
COMPILE   = $(CC) $(WARN) $(CPPFLAGS) $(CFLAGS) -fPIC -fvisibility=hidden -MMD -MP

LIB_LAYERS   := core data units
SHEET_LAYERS := sheet audit
sources = $(foreach layer,$(1),$(wildcard src/$(layer)/*.c))
objects = $(patsubst %.c,$(BUILD)/%.o,$(1))

LIB      := $(BUILD)/libgasleaf.a
SHEETLIB := $(BUILD)/libgasleaf-sheet.a
TEST_SRC := $(wildcard tests/support/*.c) $(foreach layer,core data units sheet audit check,$(wildcard tests/$(layer)/test_*.c))
SUITES   := $(patsubst test_%.c,suite_%,$(filter test_%,$(notdir $(TEST_SRC))))

.PHONY: all check clean help
all: $(LIB) $(SHEETLIB)

help: ## print the targets
	@grep -hE '^[a-z-]+:.*##' $(MAKEFILE_LIST) | sed 's/:.*##/\t/'

$(BUILD)/%.o: %.c
	@mkdir -p $(@D)
	$(COMPILE) -c $< -o $@

$(LIB): $(call objects,$(call sources,$(LIB_LAYERS)))
	rm -f $@ && ar rcs $@ $^

$(SHEETLIB): $(call objects,$(call sources,$(SHEET_LAYERS)))
	rm -f $@ && ar rcs $@ $^

$(BUILD)/tests/suites.c: $(TEST_SRC) Makefile
	@mkdir -p $(@D)
	@{ echo '#include "check.h"'; for s in $(SUITES); do echo "extern const struct test_suite $$s;"; done; \
	   echo 'extern const struct test_suite *const all_suites[];'; \
	   echo 'const struct test_suite *const all_suites[] = {'; for s in $(SUITES); do echo "    &$$s,"; done; \
	   echo '    0};'; } > $@

$(BUILD)/tests/suites.o: $(BUILD)/tests/suites.c
	$(COMPILE) -Itests/support -c $< -o $@

$(BUILD)/tests/%.o: CPPFLAGS += -Itests/support -Itests
TEST_OBJ := $(call objects,$(TEST_SRC)) $(BUILD)/tests/suites.o

$(BUILD)/tests/run: $(TEST_OBJ) $(SHEETLIB) $(LIB)
	$(CC) $(TEST_OBJ) $(SHEETLIB) $(LIB) -o $@ -lcunit -lgsl -lgslcblas -ludunits2 -lm -pthread

check: $(BUILD)/tests/run ## build and run the CUnit suites that need no office
	$(BUILD)/tests/run $(SUITE)

clean: ## remove what was built
	rm -rf $(BUILD)

-include $(shell find $(BUILD) -name '*.d' 2>/dev/null)
