#!/bin/sh
# The layers' arrows run one way: a file includes its own layer and lower ones. C is the only language.
set -u
passed=0 failed=0
layers="core data units sheet audit addin"
core_headers="status gas heat state path stages vessel mixing realgas"
data_headers="$core_headers species"
units_headers="$data_headers unit heading"

check() { # WORDS OFFENDERS: empty when all is well
    if [ -n "$2" ]; then
        echo "FAILED: $1"
        echo "$2" | sed 's/^/    /'
        failed=$((failed + 1))
    else
        passed=$((passed + 1))
    fi
}

others() { # PREFIX ALLOWED: of lines "file:...#include <prefix x...", those whose x is not allowed
    pattern=$(echo "$2" | tr ' ' '|')
    grep -vE "#include [<\"]$1($pattern)[/.]"
}

allowed=
for layer in $layers; do
    allowed="${allowed:+$allowed }$layer"
    [ -d "src/$layer" ] || continue
    upward=$(grep -nE '#include "[a-z]+/' -r "src/$layer" | others '' "$allowed")
    check "src/$layer includes only: $allowed" "$upward"
    case $layer in
    core) public=$core_headers ;;
    data) public=$data_headers ;;
    addin) public=none ;;
    *) public=$units_headers ;;
    esac
    upward=$(grep -nE '#include <gasleaf/' -r "src/$layer" | others 'gasleaf/' "$public")
    check "src/$layer includes only the public headers: $public" "$upward"
done
check "src/generate includes the catalogue alone" \
    "$(grep -nE '#include "[a-z]+/' -r src/generate | others '' 'sheet generate')"
check "only src/addin knows the office" \
    "$(grep -nE '#include <(uno|typelib|rtl|sal|osl|cppu|com)/' -r src include | grep -v '^src/addin/uno_headers.h:')"
check "public headers stand on public headers" \
    "$(grep -nE '#include "' -r include)"
check "letters and figures are read whatever the locale (src/sheet/ascii.h, gas_number_parse)" \
    "$(grep -nE '\b(is(alpha|alnum|digit|space|upper|lower|punct|print)|to(lower|upper)|strn?casecmp|atof|sscanf) ?\(' -r src |
        grep -v '^src/generate/')"
check "figures in texts do not depend on the locale (gas_shown, gas_number_format)" \
    "$(grep -nE '%[0-9.]*[gf]' -r src/sheet src/audit | grep -v 'cp_build.c.*"/%[.]0f"')"
check "C is the only language of the sources" \
    "$(find src include tests -name '*.cc' -o -name '*.cpp' -o -name '*.cxx' -o -name '*.hxx' -o -name '*.hpp' -o -name '*.C')"

echo "$passed passed, $failed failed"
[ "$failed" = 0 ]
