# Building, migrating and serving the app. Sourced after say.sh, packages.sh and postgres.sh.

export NEXT_TELEMETRY_DISABLED=1

# The map's worker is a file of its own, which the bundler does not find by itself.
copy_map_worker() {
  cp node_modules/maplibre-gl/dist/maplibre-gl-worker.mjs public/maplibre-gl-worker.mjs
}

knex_cli() {
  node --import tsx node_modules/knex/bin/cli.js --knexfile knexfile.ts "$@"
}

without_stack() { grep -v '^ *at ' <<<"$1" | tail -n 12; }

migrate() {
  local output
  output=$(knex_cli migrate:latest 2>&1) || fail "The database could not be brought up to date:
$(without_stack "$output")"
}

# Knex's seeds; the demo's own seed leaves a database alone that has it already.
seed_demo() {
  local output
  output=$(TWOBOW_DEMO=1 knex_cli seed:run 2>&1) || fail "The demo could not be put into the database:
$(without_stack "$output")"
}

# Builds into TWOBOW_DIST_DIR where the sources are not those of the last build there.
build_when_changed() {
  local dist=${TWOBOW_DIST_DIR:-.next} hash
  mkdir -p .local
  exec 7>.local/build.lock
  flock 7
  copy_map_worker
  hash=$(node scripts/lib/source-hash.mjs)
  if [ "$(cat "$dist/twobow-sources" 2>/dev/null)" != "$hash" ]; then
    say "Building (the sources changed since the last build)"
    rm -f "$dist/twobow-sources"
    NODE_ENV=production node node_modules/next/dist/bin/next build 7>&- </dev/null || fail "The build failed. Its reasons are above."
    printf '%s\n' "$hash" >"$dist/twobow-sources"
  fi
  exec 7>&-
}

# A random secret for sessions, kept for this checkout, where none is given.
ensure_secret() {
  if [ -z "${NEXTAUTH_SECRET:-}" ]; then
    mkdir -p .local
    if [ ! -s .local/nextauth-secret ]; then
      (umask 077 && random_password >.local/nextauth-secret)
    fi
    NEXTAUTH_SECRET=$(cat .local/nextauth-secret)
  fi
  export NEXTAUTH_SECRET
}

# require_free_port <command to show>: sets HOST and PORT, or says how to choose another port.
require_free_port() {
  export HOST=${HOST:-127.0.0.1} PORT=${PORT:-3000}
  case $PORT in *[!0-9]* | '') fail "PORT is “$PORT”. Give a number from 1 to 65535, for example: PORT=3001 $1" ;; esac
  [ "$PORT" -ge 1 ] && [ "$PORT" -le 65535 ] || fail "PORT is $PORT. Give a number from 1 to 65535, for example: PORT=3001 $1"
  node scripts/lib/port.mjs is-free "$HOST" "$PORT"
  case $? in
  0) ;;
  1) fail "PORT $PORT on $HOST is taken by another program. Choose another, for example: PORT=$((PORT < 65535 ? PORT + 1 : 3000)) $1" ;;
  *) fail "Cannot listen on HOST $HOST, PORT $PORT. Choose others, for example: HOST=127.0.0.1 PORT=3001 $1" ;;
  esac
}

# The address that a person on this machine opens.
local_address() {
  local name=$HOST
  case $HOST in 0.0.0.0 | ::) name=localhost ;; *:*) name="[$HOST]" ;; esac
  printf 'http://%s:%s\n' "$name" "$PORT"
}

# Waits until the app of process $1 answers at $2.
wait_until_healthy() {
  local pid=$1 address=$2 tries
  for tries in $(seq 1 300); do
    kill -0 "$pid" 2>/dev/null || return 1
    if node scripts/lib/is-healthy.mjs "$address"; then return 0; fi
    sleep 0.2
  done
  return 1
}
