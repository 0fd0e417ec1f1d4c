# shellcheck shell=bash
# Secrets are made once per data folder and live in files that only their owner reads; never on an argument list.

random_hex() { od -An -N "$1" -tx1 /dev/urandom | tr -d ' \n'; }

# write_private FILE: standard input into FILE (0600), complete or not at all.
write_private() {
  local draft
  draft=$(mktemp "$1.XXXXXX")
  cat >"$draft"
  mv -f "$draft" "$1"
}

load_secrets() {
  local file=$DATA_DIR/secrets.env
  if [ ! -e "$file" ]; then
    write_private "$file" <<SECRETS
POSTGRES_ADMIN_PASSWORD=$(random_hex 24)
POSTGRES_PASSWORD=$(random_hex 24)
REDIS_PASSWORD=$(random_hex 24)
ACCESS_TOKEN_SECRET=$(random_hex 48)
SECRETS
  fi
  # shellcheck disable=SC1090
  . "$file"
}

# One folder under /var/lib for both servers: the one that a link already leads to, or a new one.
folder_behind_links() {
  local link
  for link in "$DATA_DIR/postgresql" "$DATA_DIR/redis"; do
    [ ! -L "$link" ] || { dirname "$(readlink "$link")"; return; }
  done
  printf '%s' "/var/lib/leeside-$(random_hex 6)"
}

# server_folder NAME: prints the folder of one server's data, making it on first use. Where the server's user cannot
# reach the data folder (a checkout under /root, a home that is closed), the data lies under /var/lib behind a link.
server_folder() {
  local folder=$DATA_DIR/$1
  if [ ! -e "$folder" ] && [ ! -L "$folder" ]; then
    if as_server_user test -x "$DATA_DIR"; then
      mkdir -m 700 "$folder"
    else
      local home
      home=$(folder_behind_links)
      mkdir -p "$home/$1"
      chmod 711 "$home"
      chmod 700 "$home/$1"
      ln -s "$home/$1" "$folder"
    fi
    if is_root; then chown postgres:postgres "$folder/."; fi
  fi
  [ -d "$folder" ] || fail "$folder points at $(readlink "$folder"), which is gone. Bring it back, or move the link away to begin with no data."
  readlink -f "$folder"
}
