# Sourced first by every script here: where things are, how to speak, one start at a time, whose process a pid is.
set -euo pipefail
umask 022

ROOT=$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd -P)
DATA_DIR=${DATA_DIR:-$ROOT/.data}
case $DATA_DIR in /*) ;; *) DATA_DIR=$PWD/$DATA_DIR ;; esac
export PATH="$PATH:/usr/sbin:/sbin"

say() { printf '%s\n' "$*"; }

fail() {
  printf '%s\n' "$@" >&2
  exit 1
}

# show_last_lines LOG: what a failed server said last.
show_last_lines() {
  printf 'Its log is %s; the last lines:\n' "$1" >&2
  tail -n 20 "$1" 2>/dev/null | sed 's/^/  | /' >&2 || true
}

make_data_folder() {
  mkdir -p "$DATA_DIR/log" "$DATA_DIR/run" || fail "The folder $DATA_DIR cannot be made. Choose another: DATA_DIR=/some/folder $0"
  DATA_DIR=$(cd "$DATA_DIR" && pwd -P)
  [ -w "$DATA_DIR" ] || fail "The folder $DATA_DIR belongs to somebody else. Choose another: DATA_DIR=/some/folder $0"
}

# One start or stop at a time in a data folder. Descriptor 9 holds the lock: daemons must not inherit it (9>&-).
# A script called by the one that holds the lock goes on without asking.
hold_lock() {
  [ "${LEESIDE_LOCK_HELD:-}" != "$DATA_DIR" ] || return 0
  exec 9>"$DATA_DIR/run/lock"
  flock -w 300 9 || fail "Another start or stop has been at work in $DATA_DIR for five minutes. Wait for it or end it, then try again."
  export LEESIDE_LOCK_HELD=$DATA_DIR
}

is_root() { [ "$(id -u)" = 0 ]; }

# The servers refuse to run as root: then they run as the user that Debian's postgresql package brings.
as_server_user() {
  if is_root; then
    (cd / && exec setpriv --reuid=postgres --regid=postgres --init-groups -- "$@")
  else
    "$@"
  fi
}

# pid_in FILE: the number on its first line, or nothing.
pid_in() {
  local pid=''
  [ ! -r "$1" ] || read -r pid <"$1" || true
  case $pid in '' | *[!0-9]*) return 0 ;; esac
  printf '%s' "$pid"
}

# works_in PID FOLDER: the process lives and has that folder as its own (so a number used again by a stranger is not taken for ours).
works_in() {
  [ -n "$1" ] && [ "$(readlink "/proc/$1/cwd" 2>/dev/null || true)" = "$(readlink -f "$2")" ]
}

# wait_until SECONDS COMMAND...: asks five times a second.
wait_until() {
  local tries=$(($1 * 5))
  shift
  until "$@" >/dev/null 2>&1; do
    tries=$((tries - 1))
    [ "$tries" -gt 0 ] || return 1
    sleep 0.2
  done
}

port_is_taken() { (exec 3<>"/dev/tcp/127.0.0.1/$1") 2>/dev/null; }

# free_port_from NUMBER: the first port at or above it that nobody answers on.
free_port_from() {
  local port=$1
  while port_is_taken "$port"; do port=$((port + 1)); done
  printf '%s' "$port"
}
