#!/bin/sh
# office.sh OXT OUT FORMAT... -- FILE...
#
# Convert FILEs with headless Calc to every FORMAT (as --convert-to takes them) into the folder OUT. Calc runs with the
# extension OXT in a private profile that is removed afterwards, and recomputes every formula on loading. The office
# refuses root: then it runs as a user without rights, on copies.
set -eu
limit=${OFFICE_LIMIT:-300} # seconds for one step
oxt=$1 out=$2
shift 2
formats=
while [ "$1" != -- ]; do
    formats="$formats
$1"
    shift
done
shift

work=$(mktemp -d "${TMPDIR:-/tmp}/gasleaf.XXXXXX")
trap 'rm -rf "$work"' EXIT
trap 'exit 1' HUP INT TERM
mkdir -p "$work/in" "$work/out" "$work/profile/user"
cp "$oxt" "$work/gasleaf.oxt"
cp "$@" "$work/in/"
cat >"$work/profile/user/registrymodifications.xcu" <<'XCU'
<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry">
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="ODFRecalcMode" oor:op="fuse"><value>0</value></prop></item>
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop></item>
<item oor:path="/org.openoffice.Setup/L10N"><prop oor:name="ooSetupSystemLocale" oor:op="fuse"><value>en-US</value></prop></item>
</oor:items>
XCU
as=
if [ "$(id -u)" = 0 ]; then
    chown -R 65534:65534 "$work"
    as="setpriv --reuid=65534 --regid=65534 --clear-groups"
fi

run() { # STEP COMMAND...: as the user, limited in time, speaking only when it fails
    step=$1
    shift
    # shellcheck disable=SC2086 # $as is words
    if ! (cd "$work" && $as env HOME="$work" TMPDIR="$work" SAL_USE_VCLPLUGIN=svp timeout -k 10 "$limit" "$@") \
        >"$work/log" 2>&1 </dev/null; then
        echo "office.sh: $step failed:" >&2
        cat "$work/log" >&2
        exit 1
    fi
}

profile=-env:UserInstallation=file://$work/profile
run "installing the extension" unopkg add --suppress-license "$profile" "$work/gasleaf.oxt"
echo "$formats" | while IFS= read -r format; do
    [ -z "$format" ] ||
        run "computing ($format)" soffice --headless --norestore "$profile" --convert-to "$format" --outdir "$work/out" \
            "$work/in/"*
done
mkdir -p "$out"
cp -R "$work/out/." "$out/"
