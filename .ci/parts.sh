# shellcheck shell=bash
# The parts of ./Trunkfile test, and the count of what passed. Sourced by Trunkfile.

readonly PARTS=(lint rust engine page)
PASSED=0
FAILED=0

# run_parts [PART...]: every part runs even when an earlier one failed.
run_parts() {
  local part
  [ $# -gt 0 ] || set -- "${PARTS[@]}"
  for part in "$@"; do
    case "$part" in
      lint | rust | engine | page | reference) ;;
      *) fail "there is no part '$part'" "choose from: ${PARTS[*]} reference" ;;
    esac
  done
  find_cargo
  for part in "$@"; do
    say "part $part"
    "part_$part"
  done
  printf '\n%s passed, %s failed\n' "$PASSED" "$FAILED"
  [ "$FAILED" = 0 ]
}

# check TITLE COMMAND...: one check that passes or fails as a whole.
check() {
  local title="$1"
  shift
  if "$@"; then
    say "passed: $title"
    PASSED=$((PASSED + 1))
  else
    say "FAILED: $title"
    FAILED=$((FAILED + 1))
  fi
}

# counted TITLE PATTERN_PASSED PATTERN_FAILED COMMAND...: adds up what a test runner printed.
# A runner that fails without naming a failed test, or that ran none, counts as one failure.
counted() {
  local title="$1" passed="$2" failed="$3" log status=0 good bad
  shift 3
  log="$(mktemp)"
  "$@" 2>&1 | tee "$log" || status=$?
  good="$(sum_of "$passed" "$log")"
  bad="$(sum_of "$failed" "$log")"
  rm -f "$log"
  if [ "$bad" = 0 ] && { [ "$status" != 0 ] || [ "$good" = 0 ]; }; then
    say "FAILED: $title ended with status $status after $good tests"
    bad=1
  fi
  PASSED=$((PASSED + good))
  FAILED=$((FAILED + bad))
}

# Sums the number that stands in the marked group of a sed pattern.
sum_of() { sed -nE "s/$1/\\1/p" "$2" | awk '{ n += $1 } END { print n + 0 }'; }

part_lint() {
  local files
  setup_page
  setup_lint
  mapfile -t files < <(git ls-files '*.sh' 2>/dev/null || find www .ci -name '*.sh' -not -path '*/node_modules/*')
  check "rustfmt" cargo fmt --check
  check "clippy" cargo clippy --quiet --locked --all-targets --all-features -- -D warnings
  lint_wasm
  check "shellcheck" shellcheck --external-sources Trunkfile .ci/run "${files[@]}"
  ensure_built || return 0
  check "ESLint" node www/node_modules/eslint/bin/eslint.js --config www/eslint.config.js www tests
  check "types of the page and its tests" node www/node_modules/typescript/bin/tsc --project www
  check "types of the service worker" node www/node_modules/typescript/bin/tsc --project www/offline
}

# Clippy for the browser's border needs a standard library for the target: the usual compiler's.
# Where that is missing, the build itself checks the border with the same lints of rustc.
lint_wasm() {
  if [ ${#PAGE_ENV[@]} = 0 ]; then
    check "clippy for WebAssembly" cargo clippy --quiet --locked --target "$WASM" -- -D warnings
  else
    say "clippy for WebAssembly is left out: this compiler has no library for that target"
  fi
}

part_rust() {
  counted "the native tests" '^test result: .* ([0-9]+) passed;.*' '^test result: .* ([0-9]+) failed;.*' \
    cargo test --locked
}

part_engine() {
  ensure_built || return 0
  node_tests engine
}

part_page() {
  ensure_built || return 0
  setup_chromium
  node_tests page
}

node_tests() {
  counted "the tests of the $1" '^[ℹ#] pass ([0-9]+)$' '^[ℹ#] fail ([0-9]+)$' \
    node --test --test-reporter=spec --test-timeout=300000 tests/"$1"/*.test.js
}

# A page that cannot be built is one failure of each part that needs it.
ensure_built() {
  if [ -z "${BUILT:-}" ]; then
    setup_npm
    if (build_if_needed); then BUILT=yes; else BUILT=no; fi
  fi
  [ "$BUILT" = yes ] && return 0
  check "the page is built" false
  return 1
}

# Where the packages of the reference checks are kept, under the hash of their list.
reference_venv() { echo "$CACHE/reference-$(sha256sum tests/reference/requirements.txt | cut -c1-16)"; }

# The Python of the reference checks, if it has been set up.
reference_python() { [ ! -e "$(reference_venv)/ready" ] || echo "$(reference_venv)/bin/python"; }

# Python recomputes the committed answers from outside tables; its packages are pinned.
part_reference() {
  local venv list=tests/reference/requirements.txt
  venv="$(reference_venv)"
  if [ ! -e "$venv/ready" ]; then
    python3 -c 'import venv, ensurepip' 2>/dev/null ||
      fail "making a place for Python's packages" "run: sudo apt-get install python3-venv"
    python3 -m venv --clear "$venv"
    long_step "installing the packages of the reference checks" "a minute, once" \
      "check the network; by hand: pip install -r $list" "$venv/bin/pip" install -r "$list"
    touch "$venv/ready"
  fi
  check "the species tables are the published figures" "$venv/bin/python" tests/reference/library.py
  check "the reactions of the proof are those of the tables" "$venv/bin/python" tests/reference/janaf_proof.py
  check "the element table is the standard's" "$venv/bin/python" tests/reference/elements.py
  check "tolerances by a hundred thousand draws" "$venv/bin/python" tests/reference/monte_carlo.py
  check "the states of rest again in ninety digits" "$venv/bin/python" tests/reference/rest.py --check
  check "what small changes do to rest, in ninety digits" "$venv/bin/python" tests/reference/nudges.py --check
  check "the solutions again in fifty digits" "$venv/bin/python" tests/reference/solution.py --check
}
