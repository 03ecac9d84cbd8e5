# What the machine must have: Debian's packages and node_modules. Sourced after say.sh.

require_node() {
  command -v node >/dev/null || fail "Node.js is not installed. Twobow needs version 20.9 or later."
  node -e 'const [a, b] = process.versions.node.split(".").map(Number); process.exit(a > 20 || (a === 20 && b >= 9) ? 0 : 1)' ||
    fail "This is Node.js $(node --version). Twobow needs version 20.9 or later."
}

# install_debian_packages <what for> <package>…: installs them, or says exactly what to run.
install_debian_packages() {
  local what_for=$1 as_root=()
  shift
  local by_hand="apt-get update && apt-get install -y --no-install-recommends $*"
  command -v apt-get >/dev/null || fail "$what_for is missing, and this machine has no apt-get. Install it ($*) and start again."
  if [ "$(id -u)" != 0 ]; then
    if command -v sudo >/dev/null && { sudo -n true 2>/dev/null || [ -t 0 ]; }; then
      as_root=(sudo env DEBIAN_FRONTEND=noninteractive)
    else
      fail "$what_for is missing, and only root may install it. Run this as root, then start again:
    $by_hand"
    fi
  fi
  say "$what_for is missing: installing $* from Debian's packages"
  apt_quietly "${as_root[@]}" apt-get update || fail "apt-get update failed. Is this machine online?"
  apt_quietly "${as_root[@]}" apt-get install -y --no-install-recommends -o DPkg::Lock::Timeout=120 "$@" ||
    fail "Installing $* failed. Run this as root to see why:
    $by_hand"
}

# Runs a command, and shows what it said only where it failed.
apt_quietly() {
  local output
  if ! output=$(DEBIAN_FRONTEND=noninteractive "$@" </dev/null 2>&1); then
    printf '%s\n' "$output" | tail -n 20 >&2
    return 1
  fi
}

# Installs what package-lock.json names, where node_modules is missing or differs from it.
require_node_modules() {
  mkdir -p .local
  (
    flock 8
    if node scripts/lib/modules-differ.mjs; then
      say "Installing the npm packages of package-lock.json (npm ci)"
      npm ci --include=dev --no-audit --no-fund </dev/null || fail "npm ci failed. Is this machine online?"
    fi
  ) 8>.local/npm.lock || exit 1
}

require_chromium() {
  [ -x /usr/bin/chromium ] || install_debian_packages "Chromium" chromium
}
