#!/bin/sh
# npm test: every check and every test, on a fresh machine as well.
set -eu
cd "$(dirname "$0")/../.."
. server/commands/prepare.sh

need_node
need_modules
need_postgresql
need_chromium
need_qpdf

exec node --import tsx server/commands/testAll.ts "$@"
