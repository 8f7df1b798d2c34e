#!/bin/sh
# price.sh OXT TOOLS [TURNS]: what formulas cost in real Calc. A sheet of each kind of formula is loaded, computed and
# written as csv; its processor time less that of a sheet of plain figures, over the number of rows, is the price of a
# row: reading the formula, computing it, writing its result. Turns go round the kinds, and medians are taken, so that
# a slow minute of the machine meets all kinds alike. Prints, asserts nothing. ROWS=... sets the number of rows.
set -eu
oxt=$1 tools=$2 turns=${3:-5} rows=${ROWS:-100000}
kinds="none native analysis version cp unit solve native-array cp-array solve-array"
work=$(mktemp -d "${TMPDIR:-/tmp}/gasleaf.XXXXXX")
trap 'rm -rf "$work"' EXIT
trap 'exit 1' HUP INT TERM
mkdir -p "$work/out" "$work/times" "$work/profile/user"
cp "$oxt" "$work/gasleaf.oxt"
cp "$tools/cpu_time" "$work/cpu_time"
cat >"$work/profile/user/registrymodifications.xcu" <<'XCU'
<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry">
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="ODFRecalcMode" oor:op="fuse"><value>0</value></prop></item>
</oor:items>
XCU
for kind in $kinds; do
    "$tools/price_sheet" "$kind" "$rows" >"$work/$kind.fods"
done
as=
if [ "$(id -u)" = 0 ]; then # the office refuses root
    chown -R 65534:65534 "$work"
    as="setpriv --reuid=65534 --regid=65534 --clear-groups"
fi
office() { # COMMAND...
    # shellcheck disable=SC2086 # $as is words
    (cd "$work" && $as env HOME="$work" TMPDIR="$work" SAL_USE_VCLPLUGIN=svp timeout 300 "$@" \
        "-env:UserInstallation=file://$work/profile" 2>>"$work/log" </dev/null)
}
convert() { # KIND: processor seconds
    office "$work/cpu_time" soffice --headless --norestore --convert-to csv --outdir "$work/out" "$work/$1.fods"
}
median() { # FILE
    sort -n "$1" | awk '{ value[NR] = $1 } END { print value[int((NR + 1) / 2)] }'
}

office unopkg add --suppress-license "$work/gasleaf.oxt" >>"$work/log"
convert cp >/dev/null # the first start writes the profile
if head -n 1 "$work/out/cp.csv" | grep -q 'Err:\|#NAME'; then
    echo "the office does not know the functions" >&2
    exit 1
fi
turn=0
while [ "$turn" -lt "$turns" ]; do
    for kind in $kinds; do
        convert "$kind" >>"$work/times/$kind"
    done
    turn=$((turn + 1))
done
printf '%-14s %9s %9s %11s   (%s rows, medians of %s)\n' kind 'us a row' 'to native' 'to analysis' "$rows" "$turns"
for kind in $kinds; do
    echo "$kind $(median "$work/times/$kind")"
done | awk -v rows="$rows" '
    $1 == "none" { none = $2; next }
    { price = 1e6 * ($2 - none) / rows }
    $1 == "native" || $1 == "native-array" { native = price }
    $1 == "analysis" { analysis = price }
    { printf "%-14s %9.2f %9.2f %11s\n", $1, price, price / native, analysis ? sprintf("%.2f", price / analysis) : "" }'
