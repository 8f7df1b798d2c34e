#!/bin/sh
# deps.sh PACKAGE...: install the Debian packages that are missing; silent when there are none.
missing=
for package in "$@"; do
    case $(dpkg-query -W -f '${db:Status-Status}' "$package" 2>/dev/null) in
    installed) ;;
    *) missing="$missing $package" ;;
    esac
done
[ -n "$missing" ] || exit 0
if ! command -v apt-get >/dev/null; then
    echo "Please install:$missing" >&2
    exit 1
fi
sudo=
[ "$(id -u)" = 0 ] || sudo=sudo
echo "Installing:$missing"
export DEBIAN_FRONTEND=noninteractive
quiet="-qq -o Dpkg::Use-Pty=0"
# shellcheck disable=SC2086 # the lists are words
$sudo apt-get $quiet update </dev/null &&
    $sudo env DEBIAN_FRONTEND=noninteractive apt-get $quiet install -y --no-install-recommends $missing </dev/null
