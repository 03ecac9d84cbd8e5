# What `npm start` and `npm run dev` have in common. Sourced by both; $1 of serve is 'start' or 'dev'.

. scripts/lib/say.sh
. scripts/lib/packages.sh
. scripts/lib/postgres.sh
. scripts/lib/app.sh

SERVER_PID=
stop_all() {
  trap '' INT TERM HUP
  if [ -n "$SERVER_PID" ]; then
    kill "$SERVER_PID" 2>/dev/null
    wait "$SERVER_PID" 2>/dev/null
  fi
  if [ -n "${CLUSTER_HOME:-}" ]; then cluster_down; fi
}

serve() {
  local mode=$1 command=$2 address
  trap stop_all EXIT
  trap 'exit 130' INT
  trap 'exit 143' TERM HUP

  require_node
  require_free_port "$command"
  require_node_modules
  ensure_database
  say "Bringing the database up to date"
  migrate
  settle_settings
  if [ "$TWOBOW_DEMO" = 1 ]; then seed_demo; fi
  if [ "$mode" = start ]; then build_when_changed; else copy_map_worker; fi

  address=$(local_address)
  say "Starting the server"
  node node_modules/next/dist/bin/next "$mode" -H "$HOST" -p "$PORT" </dev/null &
  SERVER_PID=$!
  wait_until_healthy "$SERVER_PID" "$address" || fail "The server did not come up. Its reasons are above."
  tell_address "$address"
  wait "$SERVER_PID"
}

# DATABASE_URL names a database of yours, which is then used as it is; else the project's own cluster.
ensure_database() {
  if [ -n "${DATABASE_URL:-}" ]; then
    say "Using the database of DATABASE_URL"
    return
  fi
  require_postgres
  CLUSTER_HOME=$(own_cluster_home)
  say "Starting the project's own database"
  cluster_up
  DATABASE_URL=$(cluster_url)
  export DATABASE_URL
}

settle_settings() {
  ensure_secret
  NEXTAUTH_URL=${NEXTAUTH_URL:-$(local_address)}
  TWOBOW_DEMO=${TWOBOW_DEMO:-1}
  if [ -z "${TWOBOW_SMTP_URL:-}" ]; then TWOBOW_MAIL_FAKE=${TWOBOW_MAIL_FAKE:-1}; fi
  export NEXTAUTH_URL TWOBOW_DEMO TWOBOW_MAIL_FAKE
}

tell_address() {
  printf '\n  Twobow is at %s\n' "$1"
  if [ "$TWOBOW_DEMO" = 1 ]; then
    printf '\n  Demo accounts, password two-bows-one-wind:\n'
    printf '    owner@example.org    skipper@example.org    crew@example.org\n'
    printf '  TWOBOW_DEMO=0 starts without them.\n'
  fi
  if [ "${TWOBOW_MAIL_FAKE:-}" = 1 ]; then
    printf '\n  No mail leaves this machine (TWOBOW_SMTP_URL is not set); read it at %s/dev/mail\n' "$1"
  fi
  printf '\n  Ctrl-C stops the server.\n\n'
}
