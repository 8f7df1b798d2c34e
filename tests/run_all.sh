#!/bin/sh
# Every test, those in headless Calc too. The last line is `N passed, N failed` over all parts, and nothing is counted
# that was not run. The Makefile sets BUILD, ADDIN and OXT and has built what is tested.
set -u
results=$BUILD/results
rm -rf "$results"
mkdir -p "$results/sheets"
passed=0 failed=0

count() { # NAME STATUS LOG: the log of a part ends in `N passed, N failed`; anything else is a failure
    line=$(tail -n 1 "$3")
    good=$(echo "$line" | sed -n 's/^\([0-9]*\) passed, [0-9]* failed$/\1/p')
    bad=$(echo "$line" | sed -n 's/^[0-9]* passed, \([0-9]*\) failed$/\1/p')
    if [ -z "$good" ] || [ "$((good + bad))" = 0 ]; then
        echo "FAILED: $1 ended early"
        good=0 bad=1
    elif [ "$2" != 0 ] && [ "$bad" = 0 ]; then
        echo "FAILED: $1 ended with status $2"
        bad=1
    fi
    passed=$((passed + good)) failed=$((failed + bad))
    echo "   $good of $((good + bad)) hold"
}

part() { # NAME COMMAND...
    name=$1 log=$results/part.log
    shift
    echo "-- $name"
    "$@" >"$log" 2>&1 </dev/null
    status=$?
    if [ "$status" != 0 ]; then
        sed '$d' "$log" | grep -v '^ *$'
    fi
    count "$name" "$status" "$log"
}

part "layers include downwards, C alone" tests/check_arrows.sh
part "unit suites" "$BUILD/tests/run"
part "glue of the add-in" env GASLEAF_ADDIN="$ADDIN" "$BUILD/tests/glue-run"

echo "-- headless Calc computes tests/sheets and tests/check"
for table in tests/check/*.csv; do
    topic=published-$(basename "$table" .csv)
    "$BUILD/tests/tools/check_rows" "$table" >"$results/$topic.tsv" || failed=$((failed + 1))
    if ! "$BUILD/tests/tools/make_sheet" "$results/$topic.tsv" "$results/sheets/$topic.fods" >"$results/$topic.rows"; then
        failed=$((failed + 1))
    fi
done
for table in tests/sheets/*.tsv; do
    topic=$(basename "$table" .tsv)
    if ! "$BUILD/tests/tools/make_sheet" "$table" "$results/sheets/$topic.fods" >"$results/$topic.rows"; then
        failed=$((failed + 1))
    fi
done
for sheet in tests/sheets/*.fods; do
    [ -e "$sheet" ] && cp "$sheet" "$results/sheets/"
done
csv='csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,false,false,false,false,-1'
tests/tools/office.sh "$OXT" "$results/csv" "$csv" -- "$results"/sheets/*.fods
for sheet in "$results"/sheets/*.fods; do
    topic=$(basename "$sheet" .fods)
    part "sheet $topic" "$BUILD/tests/tools/count_sheet" "$results/csv/$topic-check.csv" \
        $(cat "$results/$topic.rows" 2>/dev/null)
done

part "sample workbooks, kept as ods and xlsx too" tests/check_examples.sh

echo "$passed passed, $failed failed"
[ "$failed" = 0 ] && [ "$passed" -gt 0 ]
