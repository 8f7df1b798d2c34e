#!/bin/sh
# Compute examples/*.fods in headless Calc with the fresh extension and print what they show; pages and pictures of them
# go to build/demo. The Makefile sets BUILD and OXT.
set -eu
demo=$BUILD/demo
rm -rf "$demo"
mkdir -p "$demo"
set -- examples/*.fods
if [ ! -e "$1" ]; then
    echo "There are no sample sheets in examples/" >&2
    exit 1
fi
echo "Computing $# sample sheets in headless Calc"
csv='csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,true,true,false,false,-1'
tests/tools/office.sh "$OXT" "$demo" "$csv" pdf -- "$@"
for example in "$@"; do
    name=$(basename "$example" .fods)
    for sheet in "$demo/$name"-*.csv; do
        printf '\n== %s\n' "$(basename "$sheet" .csv)"
        "$BUILD/tests/tools/show_table" "$sheet"
    done
    pdftoppm -png -r 80 "$demo/$name.pdf" "$demo/$name"
done
printf '\nPages: %s/*.pdf, pictures: %s/*.png\n' "$demo" "$demo"
