# Words to the person at the terminal. Sourced.

say() { printf '%s %s\n' "▸" "$*"; }

# The last words before giving up: what is wrong and what to do.
fail() {
  printf '\n%s %s\n' "✗" "$*" >&2
  exit 1
}
