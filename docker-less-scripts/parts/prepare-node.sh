# shellcheck shell=bash
# Node.js itself, the JavaScript packages and the build: each only when something changed.

require_node() {
  local want='Node.js 20.19 or newer is needed (https://nodejs.org; Debian 12 itself brings 18, which is too old)'
  command -v node >/dev/null || fail "$want, and there is no node on the PATH."
  node -e 'const [a, b] = process.versions.node.split(".").map(Number); process.exit(a > 20 || (a === 20 && b >= 19) ? 0 : 1)' ||
    fail "$want; this one is $(node --version)."
  command -v npm >/dev/null || fail 'npm, which comes with Node.js, is not on the PATH.'
}

stamps=$ROOT/node_modules/.leeside

# Copies with different data folders may share one checkout: one of them installs and builds at a time (descriptor 8).
hold_checkout() {
  exec 8<"$ROOT/package.json"
  flock -w 900 8 || fail 'Another start has been installing or building in this checkout for fifteen minutes.'
}

release_checkout() { exec 8<&-; }

lock_hash() { sha256sum <"$ROOT/package-lock.json" | cut -d' ' -f1; }

install_node_packages() {
  local log=$DATA_DIR/log/npm.log
  [ "$(cat "$stamps/installed" 2>/dev/null || true)" != "$(lock_hash)" ] || return 0
  if ! node "$ROOT/docker-less-scripts/parts/installed-packages-match.mjs" "$ROOT"; then
    say 'Installing the JavaScript packages (npm ci)'
    (cd "$ROOT" && exec env -u NODE_ENV npm ci --ignore-scripts --include=dev --no-audit --no-fund) \
      </dev/null >"$log" 2>&1 9>&- || { show_last_lines "$log"; fail 'npm could not install the packages.'; }
  fi
  mkdir -p "$stamps"
  lock_hash >"$stamps/installed"
}

# One hash over everything that the build reads.
source_hash() {
  (cd "$ROOT" && find package-lock.json package.json tsconfig*.json packages apps \
    \( -name node_modules -o -name dist -o -name dist-types -o -name coverage \) -prune -o \
    -type f ! -name '*.test.ts' ! -name '*.test.tsx' ! -name '*.md' -print0 |
    LC_ALL=C sort -z | xargs -0 sha256sum | sha256sum | cut -d' ' -f1)
}

built_files_stand() {
  local file
  for file in apps/api/dist/start-server.js apps/api/dist/seed-lab.js apps/worker/dist/start-worker.js \
    packages/database/dist/migrate.js apps/web/dist/index.html; do
    [ -s "$ROOT/$file" ] || return 1
  done
}

# build_when_changed: sets BUILD_HASH, the hash of the sources that the built files come from.
build_when_changed() {
  local log=$DATA_DIR/log/build.log
  BUILD_HASH=$(source_hash)
  if [ "$(cat "$stamps/built" 2>/dev/null || true)" = "$BUILD_HASH" ] && built_files_stand; then return 0; fi
  say 'Building'
  rm -f "$stamps/built"
  # A lost output is not noticed by an incremental build: then everything is built again.
  built_files_stand || find "$ROOT/packages" "$ROOT/apps" -path '*/dist/.tsbuildinfo' -not -path '*/node_modules/*' -delete
  (cd "$ROOT" && exec npm run build) </dev/null >"$log" 2>&1 9>&- ||
    { show_last_lines "$log"; fail 'The build failed.'; }
  mkdir -p "$stamps"
  printf '%s\n' "$BUILD_HASH" >"$stamps/built"
}

prepare_node() {
  require_node
  hold_checkout
  install_node_packages
  build_when_changed
  release_checkout
}
