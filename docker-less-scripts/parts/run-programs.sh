# shellcheck shell=bash
# The API and the workers as daemons: a pid file and a log each, secrets through the environment alone.

# program_runs NAME SCRIPT: the pid in the file is a node that runs this script for this data folder.
program_runs() {
  local pid
  pid=$(cat "$DATA_DIR/run/$1.pid" 2>/dev/null || true)
  case $pid in '' | *[!0-9]*) return 1 ;; esac
  { tr "\0" "\n" <"/proc/$pid/cmdline"; } 2>/dev/null | grep -qxF "$2" &&
    { tr "\0" "\n" <"/proc/$pid/environ"; } 2>/dev/null | grep -qxF "DATA_DIR=$DATA_DIR"
}

# What the programs get to know. The database's superuser is not among it.
export_environment() {
  load_secrets
  . "$DATA_DIR/services.env"
  export DATA_DIR DATABASE_URL REDIS_URL ACCESS_TOKEN_SECRET
  export OBJECT_STORE_DIR=${OBJECT_STORE_DIR:-$DATA_DIR/objects}
  export PORT BASE_URL
  export LEESIDE_MODE NODE_ENV=production WEB_DIST=$ROOT/apps/web/dist
  mkdir -p "$OBJECT_STORE_DIR"
  chmod 700 "$OBJECT_STORE_DIR"
}

# A log over 10 MB makes room at the next start; the one before it is kept.
turn_log() {
  [ ! -e "$1" ] || [ "$(stat -c %s "$1")" -lt 10000000 ] || mv -f "$1" "$1.before"
}

# launch_program NAME SCRIPT: starts it unless it runs, and notes which build it runs.
launch_program() {
  local log=$DATA_DIR/log/$1.log
  program_runs "$1" "$2" && return 0
  turn_log "$log"
  printf -- '-- started %s\n' "$(date --iso-8601=seconds)" >>"$log"
  (cd "$ROOT" && exec env -u LEESIDE_LOCK_HELD setsid node "$2") </dev/null >>"$log" 2>&1 8<&- 9>&- &
  echo $! >"$DATA_DIR/run/$1.pid"
  printf '%s\n' "${BUILD_HASH:-}" >"$DATA_DIR/run/$1.build"
}

# stop_program NAME SCRIPT: asks, waits, insists. Leaves every process alone that is not ours.
stop_program() {
  local pid file=$DATA_DIR/run/$1.pid
  if program_runs "$1" "$2"; then
    pid=$(cat "$file")
    kill -TERM "$pid" 2>/dev/null || true
    wait_until 35 is_gone "$pid" || kill -KILL "$pid" 2>/dev/null || true
    wait_until 5 is_gone "$pid" || fail "The $1 (process $pid) cannot be stopped."
  fi
  rm -f "$file" "$DATA_DIR/run/$1.build" "$DATA_DIR/run/$1.port"
}

api_script() { printf '%s' "$ROOT/apps/api/dist/start-server.js"; }
worker_script() { printf '%s' "$ROOT/apps/worker/dist/start-worker.js"; }

# The names of all workers that were ever started here, running or not: worker-1, worker-2 ...
worker_names() {
  local file
  for file in "$DATA_DIR"/run/worker-*.pid; do
    [ ! -e "$file" ] || basename "$file" .pid
  done
}

stop_workers() {
  local name
  for name in $(worker_names); do stop_program "$name" "$(worker_script)"; done
}

stop_programs() {
  stop_program api "$(api_script)"
  stop_workers
}

# Programs of an older build make room for the new one; a crashed one is started again.
launch_workers() {
  local name
  for name in $( (echo worker-1; worker_names) | sort -uV); do
    if [ "$(cat "$DATA_DIR/run/$name.build" 2>/dev/null || true)" != "$BUILD_HASH" ]; then
      stop_program "$name" "$(worker_script)"
    fi
    launch_program "$name" "$(worker_script)"
  done
}

# launch_api: the API at $PORT, restarted when it is of an older build or at another port.
launch_api() {
  if [ "$(cat "$DATA_DIR/run/api.build" 2>/dev/null || true)" != "$BUILD_HASH" ] || [ "$(running_port)" != "$PORT" ]; then
    stop_program api "$(api_script)"
  fi
  launch_program api "$(api_script)"
  echo "$PORT" >"$DATA_DIR/run/api.port"
}

# The port at which our API runs, or nothing.
running_port() {
  ! program_runs api "$(api_script)" || cat "$DATA_DIR/run/api.port" 2>/dev/null || true
}

page_answers() {
  node "$ROOT/docker-less-scripts/parts/page-answers.mjs" "http://127.0.0.1:$PORT"
}

# Waits for the page; gives up at once when a program has ended.
wait_for_page() {
  local round
  for round in $(seq 1 120); do
    page_answers && break
    ! is_gone "$(cat "$DATA_DIR/run/api.pid")" || { show_last_lines "$DATA_DIR/log/api.log"; fail 'The API has ended.' "$1"; }
    [ "$round" -lt 120 ] || { show_last_lines "$DATA_DIR/log/api.log"; fail 'The page does not answer.' "$1"; }
    sleep 0.5
  done
  wait_until 2 program_runs worker-1 "$(worker_script)" || { show_last_lines "$DATA_DIR/log/worker-1.log"; fail 'The worker has ended.' "$1"; }
}
