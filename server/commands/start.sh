#!/bin/sh
# npm start: from a fresh checkout to a running server.
set -eu
cd "$(dirname "$0")/../.."
. server/commands/prepare.sh

need_node
need_modules
# A database of one's own makes ours unnecessary.
[ -n "${DATABASE_URL:-}" ] || need_postgresql

# One process, so that a signal reaches it as it was sent.
exec node --import tsx server/commands/start.ts "$@"
