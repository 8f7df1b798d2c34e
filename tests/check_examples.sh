#!/bin/sh
# The sample workbooks in headless Calc: no cell shows an error of the office, and a workbook saved as .ods or .xlsx and
# opened again shows the same figures. The Makefile sets BUILD and OXT. Ends in `N passed, N failed`.
set -u
out=$BUILD/results/examples
csv='csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,true,true,false,false,-1'
passed=0 failed=0

holds() { # WORDS COMMAND...
    words=$1
    shift
    if "$@"; then
        passed=$((passed + 1))
    else
        failed=$((failed + 1))
        echo "FAILED: $words"
    fi
}

no_office_error() { # FILE
    ! grep -nE '(^|[,"])(Err:[0-9]+|#(NAME|VALUE|REF|DIV/0|NUM|N/A)[!?]?)' "$1"
}

rm -rf "$out"
tests/tools/office.sh "$OXT" "$out/first" "$csv" ods xlsx -- examples/*.fods || failed=1
for sheet in "$out"/first/*.csv; do
    holds "$(basename "$sheet" .csv) shows an error of the office" no_office_error "$sheet"
done
for kind in ods xlsx; do
    tests/tools/office.sh "$OXT" "$out/$kind" "$csv" -- "$out"/first/*."$kind" || failed=$((failed + 1))
    for sheet in "$out"/first/*.csv; do
        name=$(basename "$sheet")
        holds "${name%.csv} changes when it is kept as $kind" cmp -s "$sheet" "$out/$kind/$name"
    done
done
echo "$passed passed, $failed failed"
[ "$failed" = 0 ] && [ "$passed" -gt 0 ]
