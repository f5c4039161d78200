# shellcheck shell=bash
# Installs what is missing, once for a user. Sourced by Trunkfile; CACHE is set there.

readonly RUST_OLDEST=1.85
readonly TRUNK_VERSION=0.21.14
readonly WASM=wasm32-unknown-unknown
export CARGO_HOME="${CARGO_HOME:-$HOME/.cargo}"
export PATH="$CACHE/cargo/bin:$CARGO_HOME/bin:$PATH"

say() { printf '== %s\n' "$*"; }

# fail STEP NEXT: which step failed, and what to do now.
fail() {
  printf '== failed: %s\n== next: %s\n' "$1" "$2" >&2
  exit 1
}

# long_step STEP TIME NEXT COMMAND...: runs a step that may take long, its output kept in a log.
long_step() {
  local step="$1" time="$2" next="$3" log
  shift 3
  log="$CACHE/log/${step//[^a-zA-Z0-9.]/-}.log"
  mkdir -p "$CACHE/log"
  say "$step ($time; log: $log)"
  if ! "$@" >"$log" 2>&1 </dev/null; then
    tail -n 20 "$log" >&2
    fail "$step" "$next"
  fi
}

# Two runs must not install the same thing at once; the lock ends with the command given.
alone() (
  exec 9>"$CACHE/install.lock"
  flock -n 9 || { say "another run is installing; waiting for it"; flock 9; }
  "$@"
)

at_least() { [ "$(printf '%s\n%s\n' "$1" "$2" | sort -V | head -n 1)" = "$1" ]; }
has() { command -v "$1" >/dev/null 2>&1; }

as_root() {
  if [ "$(id -u)" = 0 ]; then "$@"; elif has sudo; then sudo "$@"; else
    echo "neither root nor sudo" >&2
    return 1
  fi
}

apt_version() { apt-cache policy "$1" 2>/dev/null | sed -n 's/^  Candidate: \([^(]\)/\1/p'; }

# The lists are fetched once a run, and only when something is to be installed.
apt_update() {
  [ -z "${APT_UPDATED:-}" ] || return 0
  has apt-get || fail "installing packages" "this is not a Debian or Ubuntu: install the tools by hand"
  long_step "reading the lists of packages" "seconds" "check the network and the apt sources" \
    as_root apt-get update
  APT_UPDATED=1
}

apt_install() {
  apt_update
  long_step "installing $*" "about a minute" "run: sudo apt-get install $*" \
    as_root env DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends "$@"
}

# Debian's compiler for web browsers replaces other Rust packages, so ask before it removes one.
debian_rust_would_remove() { dpkg -s rustup 2>/dev/null | grep -q '^Status: install ok installed'; }

cargo_is_new() { has "$1" && at_least "$RUST_OLDEST" "$("$1" --version 2>/dev/null | cut -d' ' -f2)"; }

# A cargo of 1.85 or newer: the one on PATH, else Debian's newest.
find_cargo() {
  [ -z "${CARGO_FOUND:-}" ] || return 0
  if ! cargo_is_new cargo; then
    if ! cargo_is_new /usr/bin/cargo; then
      apt_update
      if [ -z "$(apt_version cargo-web)" ] || debian_rust_would_remove; then
        fail "finding cargo $RUST_OLDEST or newer" \
          "install rustup and run: rustup default stable (or: rustup update)"
      fi
      apt_install rustc-web cargo-web
    fi
    export PATH="/usr/bin:$PATH"
  fi
  has cc || apt_install gcc libc6-dev
  CARGO_FOUND=1
}

wasm_std_present() { [ -d "$("$1" --print sysroot 2>/dev/null)/lib/rustlib/$WASM/lib" ]; }

rustc_is_rustup() { has rustup && [[ "$(rustc --print sysroot)" == *toolchains* ]]; }

# Asks rustup for the target; a refusal is remembered for this compiler, so it is asked once.
rustup_gives_wasm() {
  rustc_is_rustup || return 1
  local refused
  refused="$CACHE/no-wasm-from-rustup-$(rustc --version | tr -c 'a-zA-Z0-9.\n' '-')"
  [ ! -e "$refused" ] || [ -z "$(wasm_linker)" ] || return 1
  say "asking rustup for $WASM (under a minute)"
  if timeout 300 rustup target add "$WASM" >"$CACHE/rustup.log" 2>&1 </dev/null; then return 0; fi
  say "rustup cannot fetch it here; Debian's compiler is used instead"
  touch "$refused"
  return 1
}

wasm_linker() { compgen -G '/usr/bin/wasm-ld*' | sort -V | tail -n 1; }

# Chooses the compiler of the WebAssembly build: PAGE_ENV holds what differs from the usual one.
setup_wasm() {
  PAGE_ENV=()
  if wasm_std_present rustc || rustup_gives_wasm; then return 0; fi
  local web=/usr/lib/rustlib/src/rust/library
  if ! { cargo_is_new /usr/bin/cargo && { wasm_std_present /usr/bin/rustc || [ -d $web ]; }; }; then
    apt_update
    if debian_rust_would_remove; then
      fail "finding $WASM" "run: rustup target add $WASM"
    elif [ -n "$(apt_version rustc-web)" ]; then
      apt_install rustc-web cargo-web rust-web-src
    elif at_least "$RUST_OLDEST" "$(apt_version rustc | sed 's/^[0-9]*://')"; then
      apt_install rustc cargo libstd-rust-dev-wasm32
    else
      fail "finding $WASM" "install rustup and run: rustup target add $WASM"
    fi
  fi
  if [ -z "$(wasm_linker)" ]; then
    local lld
    lld="$(apt-cache search --names-only '^lld-[0-9]+$' | cut -d' ' -f1 | sort -V | tail -n 1)"
    apt_install "${lld:-lld}"
  fi
  PAGE_ENV=(RUSTC=/usr/bin/rustc CARGO=/usr/bin/cargo PATH="/usr/bin:$PATH"
    CARGO_TARGET_WASM32_UNKNOWN_UNKNOWN_LINKER="$(wasm_linker)"
    CARGO_TARGET_WASM32_UNKNOWN_UNKNOWN_RUSTFLAGS=-Clinker-flavor=wasm-ld)
  # Without a compiled standard library for the target, cargo compiles it from Debian's source.
  wasm_std_present /usr/bin/rustc ||
    PAGE_ENV+=(RUSTC_BOOTSTRAP=1 CARGO_UNSTABLE_BUILD_STD="std,panic_abort")
}

# Runs a command of the WebAssembly build with its compiler; wasm-opt and esbuild are on its PATH.
page_env() { env ${PAGE_ENV[@]+"${PAGE_ENV[@]}"} "$@"; }

# cargo_tool NAME PACKAGE VERSION TIME [OPTION...]: a pinned program from crates.io. One of another
# version in cargo's own bin folder belongs to someone else: then ours goes into the cache.
cargo_tool() {
  local name="$1" package="$2" version="$3" time="$4" root=()
  shift 4
  [ "$("$name" --version 2>/dev/null)" != "$name $version" ] || return 0
  ! has "$name" || root=(--root "$CACHE/cargo")
  if has cargo-binstall; then
    say "fetching $package $version (under a minute)"
    cargo binstall --no-confirm "${root[@]}" "$package@$version" </dev/null && return 0
  fi
  long_step "installing $package $version" "$time, once" \
    "look into the log; by hand: cargo install $package --version $version $*" \
    cargo install "$package" --version "=$version" "${root[@]}" "$@"
}

locked_version() { grep -A1 "^name = \"$1\"\$" Cargo.lock | sed -n 's/^version = "\(.*\)"/\1/p'; }

# The page's tools are kept in the cache under the hash of their lock file, and linked.
setup_npm() {
  if ! has node || ! has npm; then
    fail "finding node and npm" "run: sudo apt-get install nodejs npm"
  fi
  at_least 18.18 "$(node --version | tr -d v)" ||
    fail "node $(node --version) is too old" "install Node 18.18 or newer"
  local store
  store="$CACHE/npm-$(cat www/package.json www/package-lock.json | sha256sum | cut -c1-16)"
  [ -d "$store" ] || alone install_npm "$store"
  link_folder "$store/node_modules" www/node_modules
  # The tests stand beside www, so they find the same tools through a link of their own.
  link_folder ../www/node_modules tests/node_modules
}

install_npm() {
  [ ! -d "$1" ] || return 0
  local fresh
  fresh="$(mktemp -d "$CACHE/npm-new.XXXXXX")"
  cp www/package.json www/package-lock.json "$fresh"
  long_step "installing the page's tools" "about half a minute, once" \
    "check the network; by hand: cd www && npm ci" \
    npm ci --prefix "$fresh" --no-audit --no-fund
  mv "$fresh" "$1"
}

link_folder() {
  [ "$(readlink "$2" || true)" = "$1" ] || { rm -rf "$2" && ln -s "$1" "$2"; }
}

setup_page() {
  find_cargo
  setup_npm
  alone cargo_tool trunk trunk "$TRUNK_VERSION" "6 to 10 minutes" \
    --locked --no-default-features --features rustls
  alone cargo_tool wasm-bindgen wasm-bindgen-cli "$(locked_version wasm-bindgen)" "3 to 5 minutes"
  setup_wasm
}

setup_lint() {
  has shellcheck || apt_install shellcheck
  if ! cargo fmt --version >/dev/null 2>&1 || ! cargo clippy --version >/dev/null 2>&1; then
    if rustc_is_rustup; then
      long_step "adding rustfmt and clippy" "under a minute" "run: rustup component add rustfmt clippy" \
        rustup component add rustfmt clippy
    elif [[ "$(dpkg -S "$(readlink -f "$(command -v rustc)")" 2>/dev/null)" == rustc-web:* ]]; then
      apt_install rustfmt-web rust-web-clippy
    else
      apt_install rustfmt rust-clippy
    fi
  fi
}

# A browser for the tests. Ubuntu's package is a stub for a snap, which cannot be used here.
setup_chromium() {
  local name
  for name in "${CHROMIUM:-}" chromium google-chrome-stable google-chrome chromium-browser; do
    if [ -n "$name" ] && has "$name" && ! is_snap "$(command -v "$name")"; then
      CHROMIUM="$(command -v "$name")"
      export CHROMIUM
      return 0
    fi
  done
  apt_update
  [[ "$(apt_version chromium)" == [0-9]* && "$(apt_version chromium)" != *snap* ]] ||
    fail "finding Chromium" "install a browser that is not a snap and set CHROMIUM=/path/to/it"
  apt_install chromium
  CHROMIUM="$(command -v chromium)"
  export CHROMIUM
}

is_snap() {
  [[ "$(readlink -f "$1")" == */snap* ]] || { head -c 2000 "$1" | grep -aq 'snap install'; }
}
