# A PostgreSQL cluster of the project's own, on loopback only. Sourced after say.sh and packages.sh.
#
# All of a cluster lies in one folder, CLUSTER_HOME: data/, port, password, log, users/ and lock. The server
# refuses to run as root; then it runs as Debian's user postgres, and CLUSTER_HOME lies where that user can
# reach it, which a checkout in somebody's private folder is not.

CLUSTER_SUPERUSER=twobow_admin
CLUSTER_USER=twobow
CLUSTER_DATABASE=twobow

# The folder of the cluster that belongs to this checkout.
own_cluster_home() {
  if [ "$(id -u)" = 0 ]; then
    printf '/var/lib/postgresql/twobow-%s\n' "$(pwd -P | sha256sum | cut -c1-12)"
  else
    printf '%s/.local/postgres\n' "$(pwd -P)"
  fi
}

find_postgres_bin() {
  local newest
  newest=$(ls -d /usr/lib/postgresql/*/bin 2>/dev/null | sort -t/ -k5 -n | tail -n 1)
  [ -n "$newest" ] && [ -x "$newest/initdb" ] && printf '%s\n' "$newest"
}

# Installs PostgreSQL where it is absent, without the ready-made cluster that Debian's package would start.
require_postgres() {
  if [ -z "$(find_postgres_bin)" ]; then
    local settings=/etc/postgresql-common/createcluster.d
    if [ "$(id -u)" = 0 ] && mkdir -p "$settings"; then
      printf 'create_main_cluster = false\n' >"$settings/twobow-install.conf"
    fi
    install_debian_packages "PostgreSQL" postgresql
    if [ "$(id -u)" = 0 ]; then rm -f "$settings/twobow-install.conf"; fi
    [ -n "$(find_postgres_bin)" ] || fail "PostgreSQL was installed, but its programs are not in /usr/lib/postgresql."
  fi
}

# Runs a command as the user that the server runs as, from a folder that this user can enter.
as_server_user() {
  if [ "$(id -u)" = 0 ]; then
    (cd / && exec runuser -u postgres -- "$@")
  else
    (cd / && exec "$@")
  fi
}

# The programs that made the data, so that an upgrade of Debian is noticed.
cluster_bin() {
  local version
  version=$(cat "$CLUSTER_HOME/data/PG_VERSION" 2>/dev/null)
  if [ -z "$version" ]; then
    find_postgres_bin
  elif [ -x "/usr/lib/postgresql/$version/bin/postgres" ]; then
    printf '/usr/lib/postgresql/%s/bin\n' "$version"
  else
    fail "The database in $CLUSTER_HOME was made by PostgreSQL $version, which is no longer installed.
  Install postgresql-$version, or move that folder away to begin with an empty database."
  fi
}

cluster_url() { # [database]
  printf 'postgres://%s:%s@127.0.0.1:%s/%s\n' "$CLUSTER_USER" "$(cat "$CLUSTER_HOME/password")" \
    "$(cat "$CLUSTER_HOME/port")" "${1:-$CLUSTER_DATABASE}"
}

cluster_sql() { # <sql>, as the superuser
  PGPASSWORD=$(cat "$CLUSTER_HOME/admin-password") "$(cluster_bin)/psql" -X -q -v ON_ERROR_STOP=1 -h 127.0.0.1 \
    -p "$(cat "$CLUSTER_HOME/port")" -U "$CLUSTER_SUPERUSER" -d postgres -At -c "$1"
}

cluster_answers() {
  [ -f "$CLUSTER_HOME/port" ] && [ -n "$(cluster_server_pid)" ] &&
    "$(cluster_bin)/pg_isready" -q -h 127.0.0.1 -p "$(cat "$CLUSTER_HOME/port")"
}

# The pid of a living server on this data folder; nothing where it is gone, a zombie, or another program.
cluster_server_pid() {
  local pid
  pid=$(head -n 1 "$CLUSTER_HOME/data/postmaster.pid" 2>/dev/null) || return 0
  [ -n "$pid" ] && [ -r "/proc/$pid/stat" ] || return 0
  grep -q '^State:[[:space:]]*Z' "/proc/$pid/status" 2>/dev/null && return 0
  tr '\0' ' ' <"/proc/$pid/cmdline" 2>/dev/null | grep -qF -- "-D $CLUSTER_HOME/data" && printf '%s\n' "$pid"
  return 0
}

random_password() { node -e 'process.stdout.write(require("node:crypto").randomBytes(24).toString("hex"))'; }

free_port() { node scripts/lib/port.mjs free; }

# Makes the cluster where there is none, starts it where it is down, and notes that this process uses it.
# CLUSTER_OPTIONS holds more options of the server.
cluster_up() {
  mkdir -p "$CLUSTER_HOME" || fail "The folder $CLUSTER_HOME for the database cannot be made."
  chmod 700 "$CLUSTER_HOME"
  if [ "$(id -u)" = 0 ]; then chown postgres: "$CLUSTER_HOME"; fi
  cluster_bin >/dev/null || exit 1
  exec 9>"$CLUSTER_HOME/lock"
  flock 9
  [ -f "$CLUSTER_HOME/ready" ] || make_cluster
  if ! cluster_answers; then start_cluster; fi
  cluster_sql "SELECT 1 FROM pg_roles WHERE rolname = '$CLUSTER_USER'" | grep -q 1 || make_role_and_database
  mkdir -p "$CLUSTER_HOME/users"
  : >"$CLUSTER_HOME/users/$$"
  exec 9>&-
}

make_cluster() {
  say "Making a database cluster of the project's own in $CLUSTER_HOME"
  rm -rf "$CLUSTER_HOME/data"
  (
    umask 077
    random_password >"$CLUSTER_HOME/password"
    random_password >"$CLUSTER_HOME/admin-password"
  )
  # The server's user may read neither our file nor a pipe of ours by name, but a pipe of its own.
  # shellcheck disable=SC2016
  as_server_user bash -c 'exec "$0" --pwfile=<(cat) "$@"' "$(find_postgres_bin)/initdb" -D "$CLUSTER_HOME/data" \
    -U "$CLUSTER_SUPERUSER" --auth=scram-sha-256 --encoding=UTF8 --locale=C.UTF-8 --no-instructions \
    <"$CLUSTER_HOME/admin-password" >/dev/null ||
    fail "The cluster could not be made in $CLUSTER_HOME."
  free_port >"$CLUSTER_HOME/port"
  : >"$CLUSTER_HOME/ready"
}

start_cluster() {
  local log="$CLUSTER_HOME/log" port
  [ -n "$(cluster_server_pid)" ] || rm -f "$CLUSTER_HOME/data/postmaster.pid"
  node scripts/lib/port.mjs is-free 127.0.0.1 "$(cat "$CLUSTER_HOME/port")" || free_port >"$CLUSTER_HOME/port"
  port=$(cat "$CLUSTER_HOME/port")
  as_server_user touch "$log" 2>/dev/null || true
  as_server_user "$(cluster_bin)/pg_ctl" start -s -w -t 60 -D "$CLUSTER_HOME/data" -l "$log" \
    -o "-p $port -c listen_addresses=127.0.0.1 -c unix_socket_directories='' ${CLUSTER_OPTIONS:-}" 9>&- >/dev/null ||
    fail "The database did not start. Its last words, from $log:
$(tail -n 10 "$log" 2>/dev/null)"
}

make_role_and_database() {
  cluster_sql "CREATE ROLE $CLUSTER_USER LOGIN PASSWORD '$(cat "$CLUSTER_HOME/password")'"
  cluster_sql "CREATE DATABASE $CLUSTER_DATABASE OWNER $CLUSTER_USER"
}

# Takes this process off the cluster's users, and stops the cluster where it was the last.
cluster_down() {
  [ -d "$CLUSTER_HOME/users" ] || return 0
  exec 9>"$CLUSTER_HOME/lock"
  flock 9
  rm -f "$CLUSTER_HOME/users/$$"
  local user
  for user in "$CLUSTER_HOME"/users/*; do
    [ -e "$user" ] || continue
    if [ -d "/proc/${user##*/}" ]; then exec 9>&-; return 0; fi
    rm -f "$user"
  done
  if [ -n "$(cluster_server_pid)" ]; then
    as_server_user "$(cluster_bin)/pg_ctl" stop -s -m fast -w -t 30 -D "$CLUSTER_HOME/data" 9>&- >/dev/null || true
  fi
  exec 9>&-
}
