# shellcheck shell=bash
# A private Redis: own folder, own port on 127.0.0.1, a password, every write in the append-only file, nothing evicted.

write_redis_settings() {
  as_server_user bash -c 'umask 077; cat >"$1"' bash "$1/redis.conf" <<SETTINGS
bind 127.0.0.1
port $2
requirepass $REDIS_PASSWORD
dir "$1"
pidfile "$1/redis.pid"
logfile "$1/server.log"
daemonize yes
appendonly yes
appendfsync everysec
maxmemory-policy noeviction
save ""
SETTINGS
}

# redis_pid FOLDER: the Redis that works in this folder, found among the processes, so that a lost or foreign pid file
# never leads to a second one on the same files.
redis_pid() {
  as_server_user bash -s -- "$(readlink -f "$1")" <<'FIND'
for process in /proc/[0-9]*; do
  { read -r name <"$process/comm"; } 2>/dev/null || continue
  if [ "$name" = redis-server ] && [ "$(readlink "$process/cwd" 2>/dev/null)" = "$1" ]; then
    printf '%s' "${process#/proc/}"
    exit
  fi
done
FIND
}

redis_runs() { [ -n "$(redis_pid "$1")" ]; }

redis_port() { as_server_user sed -n 's/^port //p' "$1/redis.conf"; }

# Answers PONG only when its file has been read back in, and only to our password.
redis_answers() { [ "$(REDISCLI_AUTH=$REDIS_PASSWORD redis-cli -h 127.0.0.1 -p "$1" ping 2>/dev/null)" = PONG ]; }

redis_is_up() { redis_runs "$1" && redis_answers "$(redis_port "$1")"; }

launch_redis() {
  write_redis_settings "$1" "$2"
  rm -f "$1/redis.pid"
  as_server_user redis-server "$1/redis.conf" </dev/null >/dev/null 2>&1 9>&- || return 1
  # A port that was lost to somebody else in between shows as a Redis that ends again.
  sleep 0.3
  redis_runs "$1"
}

# start_redis FIRST_PORT: sets REDIS_PORT.
start_redis() {
  local folder port tries
  folder=$(server_folder redis)
  port=$1
  for tries in 1 2 3 4; do
    redis_runs "$folder" && break
    port=$(free_port_from "$port")
    launch_redis "$folder" "$port" || sleep "$tries"
  done
  wait_until 60 redis_is_up "$folder" || { show_last_lines "$folder/server.log"; fail 'Redis does not start.'; }
  REDIS_PORT=$(redis_port "$folder")
}

stop_redis() {
  local folder pid
  folder=$(readlink -f "$DATA_DIR/redis" || true)
  [ -d "$folder" ] || return 0
  pid=$(redis_pid "$folder")
  [ -n "$pid" ] || return 0
  as_server_user bash -c 'kill -TERM "$1"' bash "$pid"
  wait_until 30 is_gone "$pid" || fail "Redis does not stop; its log is $folder/server.log"
}
