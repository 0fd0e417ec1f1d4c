# shellcheck shell=bash
# A private PostgreSQL: own folder, own port on 127.0.0.1, passwords always, no socket.

# postgresql_folder [MAJOR]: where that version's programs are (the newest when none is named); nothing when not installed.
postgresql_folder() {
  local initdb
  initdb=$(ls -d /usr/lib/postgresql/${1:-*}/bin/initdb 2>/dev/null | sort -V | tail -n 1)
  [ -z "$initdb" ] || dirname "$initdb"
}

make_cluster() {
  local folder=$1 programs=$2 draft log=$DATA_DIR/log/initdb.log
  say 'Making the database folder'
  draft=$folder/draft
  rm -rf "$draft"
  # The password goes in by a file that only the server's user reads.
  printf '%s\n' "$POSTGRES_ADMIN_PASSWORD" | as_server_user bash -c 'umask 077; cat >"$1"' bash "$folder/first-password"
  as_server_user "$programs/initdb" --pgdata="$draft" --username=leeside_admin --pwfile="$folder/first-password" \
    --auth=scram-sha-256 --encoding=UTF8 --locale=C.UTF-8 --data-checksums </dev/null >"$log" 2>&1 9>&- ||
    { show_last_lines "$log"; fail 'PostgreSQL could not make its folder.'; }
  rm -f "$folder/first-password"
  mv "$draft" "$folder/cluster"
}

write_postgresql_settings() {
  local flush=on
  [ -z "${LEESIDE_THROWAWAY:-}" ] || flush=off
  as_server_user bash -c 'cat >"$1"' bash "$1/leeside.conf" <<SETTINGS
listen_addresses = '127.0.0.1'
port = $2
unix_socket_directories = ''
max_connections = 200
fsync = $flush
log_line_prefix = '%m [%p] '
log_lock_waits = on
SETTINGS
  grep -q '^include .leeside.conf.' "$1/postgresql.conf" ||
    as_server_user bash -c 'echo "include '\''leeside.conf'\''" >>"$1"' bash "$1/postgresql.conf"
}

postgresql_runs() { works_in "$(pid_in "$1/postmaster.pid")" "$1"; }

postgresql_port() { sed -n 4p "$1/postmaster.pid"; }

postgresql_answers() { "$1/pg_isready" --quiet --host=127.0.0.1 --port="$2"; }

# A number in postmaster.pid that now belongs to a stranger would keep PostgreSQL from starting.
clear_stale_postmaster() {
  local pid
  pid=$(pid_in "$1/postmaster.pid")
  [ -z "$pid" ] || [ ! -e "/proc/$pid" ] || works_in "$pid" "$1" || rm -f "$1/postmaster.pid"
}

# The pid and the port of a cluster that was just launched; false while it is not ready.
postgresql_is_up() {
  postgresql_runs "$1" && grep -q '^ready' "$1/postmaster.pid" && postgresql_answers "$2" "$(postgresql_port "$1")"
}

launch_postgresql() {
  local cluster=$1 programs=$2 port=$3 log=$4
  write_postgresql_settings "$cluster" "$port"
  clear_stale_postmaster "$cluster"
  as_server_user "$programs/pg_ctl" start --pgdata="$cluster" --log="$log" --wait --timeout=60 \
    </dev/null >/dev/null 2>&1 9>&-
}

# start_postgresql FIRST_PORT: sets POSTGRES_PORT.
start_postgresql() {
  local folder cluster programs log port tries
  folder=$(server_folder postgresql)
  cluster=$folder/cluster
  log=$folder/server.log
  [ -e "$cluster/PG_VERSION" ] || make_cluster "$folder" "$(postgresql_folder)"
  programs=$(postgresql_folder "$(cat "$cluster/PG_VERSION")")
  [ -n "$programs" ] || fail "The data in $cluster belong to PostgreSQL $(cat "$cluster/PG_VERSION"), which is not installed (any more)."
  port=$1
  for tries in 1 2 3 4; do
    postgresql_runs "$cluster" && break
    port=$(free_port_from "$port")
    launch_postgresql "$cluster" "$programs" "$port" "$log" || sleep "$tries"
  done
  wait_until 60 postgresql_is_up "$cluster" "$programs" || { show_last_lines "$log"; fail 'PostgreSQL does not start.'; }
  POSTGRES_PORT=$(postgresql_port "$cluster")
  make_role_and_database "$programs/psql"
}

# The application's own role (no superuser) and its database.
make_role_and_database() {
  local ask=("$1" --host=127.0.0.1 "--port=$POSTGRES_PORT" --username=leeside_admin --dbname=postgres --no-psqlrc --quiet
    --tuples-only --no-align --set=ON_ERROR_STOP=1)
  export PGPASSWORD=$POSTGRES_ADMIN_PASSWORD
  if [ -z "$("${ask[@]}" --command="select 1 from pg_database where datname = 'leeside'")" ]; then
    "${ask[@]}" <<SQL
select 'create role leeside login' where not exists (select 1 from pg_roles where rolname = 'leeside') \gexec
alter role leeside password '$POSTGRES_PASSWORD';
create database leeside owner leeside;
SQL
  fi
  unset PGPASSWORD
}

stop_postgresql() {
  local cluster programs
  cluster=$(readlink -f "$DATA_DIR/postgresql" || true)/cluster
  postgresql_runs "$cluster" || return 0
  programs=$(postgresql_folder "$(cat "$cluster/PG_VERSION")")
  as_server_user "$programs/pg_ctl" stop --pgdata="$cluster" --mode=fast --wait --timeout=60 </dev/null >/dev/null 2>&1 9>&- ||
    fail "PostgreSQL does not stop; its log is $(dirname "$cluster")/server.log"
}
