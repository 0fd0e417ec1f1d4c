# shellcheck shell=bash
# install_debian_packages NAME...: apt, with sudo when needed; packaged services are neither started nor given a cluster.

as_root() { if is_root; then "$@"; else sudo "$@"; fi; }

may_become_root() {
  is_root && return 0
  command -v sudo >/dev/null || return 1
  sudo -n true 2>/dev/null || { [ -t 0 ] && sudo -v; }
}

install_debian_packages() {
  local one_command="apt-get update && apt-get install -y --no-install-recommends $*"
  command -v apt-get >/dev/null ||
    fail "Missing: $*. This is not a Debian machine: install these programs its own way, then start again."
  may_become_root ||
    fail "Missing: $*. Without root or sudo this script cannot install them. Ask somebody who can to run, once:" \
      "  sudo sh -c '$one_command'"
  say "Installing with apt: $*"
  local log=$DATA_DIR/log/apt.log
  as_root bash -s -- "$@" >"$log" 2>&1 <<'AS_ROOT' || { show_last_lines "$log"; fail "apt could not install: $*"; }
set -euo pipefail
export DEBIAN_FRONTEND=noninteractive
policy=/usr/sbin/policy-rc.d
cluster_folder=/etc/postgresql-common/createcluster.d
cluster_rule=$cluster_folder/leeside.conf
made_policy=''
put_back() { [ -z "$made_policy" ] || rm -f "$policy"; rm -f "$cluster_rule"; }
trap put_back EXIT
if [ ! -e "$policy" ]; then
  made_policy=yes
  printf '#!/bin/sh\nexit 101\n' >"$policy"
  chmod 755 "$policy"
fi
if ! command -v pg_ctlcluster >/dev/null; then
  mkdir -p "$cluster_folder"
  echo 'create_main_cluster = false' >"$cluster_rule"
fi
had_redis=$(command -v redis-server || true)
# A list that cannot be fetched (somebody's own source) matters only if the packages cannot be installed.
apt-get -o DPkg::Lock::Timeout=300 update </dev/null || true
apt-get -o DPkg::Lock::Timeout=300 -o Dpkg::Options::=--force-confold install -y --no-install-recommends "$@" </dev/null
# The packaged Redis is not needed at the next boot: ours is private.
if [ -z "$had_redis" ] && [ -d /run/systemd/system ]; then systemctl disable --quiet redis-server || true; fi
AS_ROOT
}

install_services_when_missing() {
  local missing=()
  [ -n "$(postgresql_folder)" ] || missing+=(postgresql)
  command -v redis-server >/dev/null || missing+=(redis-server)
  [ ${#missing[@]} = 0 ] || install_debian_packages "${missing[@]}"
}
