# shellcheck shell=bash
# Sourced first by every script here: where things are, how to speak, one start at a time, whose process a pid is.
set -euo pipefail
umask 022

ROOT=$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd -P)
DATA_DIR=${DATA_DIR:-$ROOT/.data}
case $DATA_DIR in /*) ;; *) DATA_DIR=$PWD/$DATA_DIR ;; esac
export PATH="$PATH:/usr/sbin:/sbin"

say() { printf '%s\n' "$@"; }

fail() {
  printf '%s\n' "$@" >&2
  exit 1
}

# show_last_lines LOG: what a failed program said last.
show_last_lines() {
  printf 'Its log is %s; the last lines:\n' "$1" >&2
  tail -n 20 "$1" 2>/dev/null | sed 's/^/  | /' >&2 || true
}

# Others may pass through the data folder (the servers' user must), but not look around in it.
make_data_folder() {
  local elsewhere="Choose another folder: DATA_DIR=/some/folder $0"
  [ -e "$DATA_DIR" ] || { mkdir -p "$DATA_DIR" && chmod 711 "$DATA_DIR"; } ||
    fail "The folder $DATA_DIR cannot be made. $elsewhere"
  DATA_DIR=$(cd "$DATA_DIR" && pwd -P)
  mkdir -p "$DATA_DIR/run" "$DATA_DIR/log" || fail "Nothing can be written in $DATA_DIR. $elsewhere"
  [ -O "$DATA_DIR/run" ] ||
    fail "$DATA_DIR is in use by $(stat -c %U "$DATA_DIR/run"): run this as that user. Or: $elsewhere"
  chmod 700 "$DATA_DIR/run" "$DATA_DIR/log"
  export DATA_DIR
}

# One start or stop at a time in a data folder. Descriptor 9 holds the lock: daemons must not inherit it (9>&-).
# A script called by the one that holds the lock goes on without asking.
hold_lock() {
  [ "${LEESIDE_LOCK_HELD:-}" != "$DATA_DIR" ] || return 0
  exec 9>"$DATA_DIR/run/lock"
  flock -w 600 9 || fail "Another start, stop or test has been at work in $DATA_DIR for ten minutes. Wait for it, then try again."
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
  pid=$(as_server_user head -n 1 "$1" 2>/dev/null || true)
  case $pid in '' | *[!0-9]*) return 0 ;; esac
  printf '%s' "$pid"
}

# works_in PID FOLDER: the server lives and has that folder as its own (so a number used again by a stranger is not taken
# for ours). Asked as the server's user, since even root may lack the right to look at another user's process.
works_in() {
  [ -n "$1" ] && [ "$(as_server_user readlink "/proc/$1/cwd" 2>/dev/null || true)" = "$(readlink -f "$2")" ]
}

# A dead process that its parent has not collected counts as gone.
is_gone() {
  local stat
  stat=$(cat "/proc/$1/stat" 2>/dev/null) || return 0
  case ${stat##*) } in Z* | X*) return 0 ;; esac
  return 1
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
