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

redis_runs() { works_in "$(pid_in "$1/redis.pid")" "$1"; }

redis_port() { sed -n 's/^port //p' "$1/redis.conf"; }

# Answers PONG only when its file has been read back in, and only to our password.
redis_answers() { [ "$(REDISCLI_AUTH=$REDIS_PASSWORD redis-cli -h 127.0.0.1 -p "$1" ping 2>/dev/null)" = PONG ]; }

redis_is_up() { redis_runs "$1" && redis_answers "$(redis_port "$1")"; }

launch_redis() {
  write_redis_settings "$1" "$2"
  as_server_user redis-server "$1/redis.conf" </dev/null >/dev/null 2>&1 9>&- && wait_until 5 redis_runs "$1"
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
  redis_runs "$folder" || return 0
  pid=$(pid_in "$folder/redis.pid")
  as_server_user kill -TERM "$pid"
  wait_until 30 is_gone "$pid" || fail "Redis does not stop; its log is $folder/server.log"
}
