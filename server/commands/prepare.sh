# Installs what is missing: Node packages from the lock file, programs from Debian.
# Sourced by start.sh and test.sh, from the root of the checkout.

say() { printf '%s\n' "$*" >&2; }

need_node() {
  if ! command -v node >/dev/null || ! command -v npm >/dev/null; then
    say 'Node.js 20.19 or newer and npm are needed: https://nodejs.org'
    exit 1
  fi
  node -e '
    const [major, minor] = process.versions.node.split(".").map(Number);
    process.exit(major > 20 || (major === 20 && minor >= 19) ? 0 : 1);
  ' || {
    say "Node.js 20.19 or newer is needed; this is $(node --version)."
    exit 1
  }
}

need_modules() {
  node server/commands/checkModules.mjs && return
  say 'Installing the Node packages of the lock file ...'
  # The tools that build the web app are development packages: wanted whatever NODE_ENV says.
  npm ci --include=dev --no-audit --no-fund --loglevel=error >&2
}

# need_debian PROGRAM-OR-PATTERN... -- PACKAGE: installs the package unless one of them exists.
need_debian() {
  while [ "$1" != '--' ]; do
    command -v "$1" >/dev/null 2>&1 && return
    # An unmatched pattern stays as it is and names no file.
    for candidate in $1; do [ -x "$candidate" ] && return; done
    shift
  done
  shift
  if ! command -v apt-get >/dev/null; then
    say "$1 is missing and there is no apt-get. Install it, then start again."
    exit 1
  fi
  as_root=''
  if [ "$(id -u)" -ne 0 ]; then
    if ! sudo -n true 2>/dev/null; then
      say "$1 is missing. Install it, then start again: sudo apt-get install $1"
      exit 1
    fi
    as_root='sudo'
  fi
  say "Installing $1 from Debian ..."
  $as_root apt-get -qq update >&2
  $as_root env DEBIAN_FRONTEND=noninteractive \
    apt-get -qq install -y --no-install-recommends "$1" >&2
}

need_postgresql() { need_debian initdb '/usr/lib/postgresql/*/bin/initdb' -- postgresql; }
need_chromium() { need_debian chromium -- chromium; }
need_qpdf() {
  need_debian qpdf -- qpdf
  need_debian pdftotext -- poppler-utils
}
