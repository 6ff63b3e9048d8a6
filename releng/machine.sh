# Sourced by the scripts of this folder: finds what they need on this machine, installs it where they may (root on
# Debian), else names exactly what to install. All messages go to standard error.

# Without a locale Java takes no letters beyond ASCII in file names.
case ${LC_ALL:-${LC_CTYPE:-${LANG:-}}} in '' | C | POSIX) export LC_ALL=C.UTF-8 ;; esac

say() { echo "coilbook: $*" >&2; }

fail() {
  say "$*"
  exit 5
}

can_install() { [ "$(id -u)" = 0 ] && command -v apt-get >/dev/null; }

apt_updated=
# install PACKAGE...: installs the packages, or says what to do and ends.
install() {
  can_install || fail "missing on this machine. As root on Debian: apt-get install --no-install-recommends $*"
  say "installing $*"
  export DEBIAN_FRONTEND=noninteractive
  if [ -z "$apt_updated" ]; then
    apt-get -q update >&2 </dev/null || say "apt-get update failed, going on with what is known"
    apt_updated=yes
  fi
  apt-get -q install -y --no-install-recommends "$@" >&2 </dev/null || fail "could not install $*"
}

# java_of DIRECTORY: the main version of the Java there, from its release file.
java_of() { sed -n 's/^JAVA_VERSION="\([0-9]*\).*/\1/p' "$1/release" 2>/dev/null; }

# need_jdk: leaves JAVA_HOME on a JDK of 17 or newer.
need_jdk() {
  local candidate
  for candidate in "${JAVA_HOME:-}" "$(dirname "$(dirname "$(readlink -f "$(command -v javac || echo /none/none/none)")")")" /usr/lib/jvm/*; do
    if [ -x "$candidate/bin/javac" ] && [ "$(java_of "$candidate")" -ge 17 ] 2>/dev/null; then
      export JAVA_HOME=$candidate
      return
    fi
  done
  [ -n "${1:-}" ] && fail "no JDK of 17 or newer was found; set JAVA_HOME"
  install openjdk-17-jdk-headless
  unset JAVA_HOME
  need_jdk again
}

# need_maven: Maven of 3.8.7 or newer.
need_maven() {
  command -v mvn >/dev/null || install maven
  local version
  version=$(mvn -v 2>/dev/null | sed -n 's/.*Apache Maven \([0-9.]*\).*/\1/p' | head -n 1)
  [ "$(printf '%s\n' 3.8.7 "$version" | sort -V | head -n 1)" = 3.8.7 ] || fail "needs Maven 3.8.7 or newer, and found ${version:-none}"
}

has_library() { ldconfig -p 2>/dev/null | grep -q "$1" || /sbin/ldconfig -p 2>/dev/null | grep -q "$1"; }

# need COMMAND=PACKAGE...: installs in one go the packages whose command is missing; lib*=PACKAGE looks for a library.
need() {
  local pair missing=()
  for pair in "$@"; do
    case $pair in
      lib*) has_library "${pair%%=*}" || missing+=("${pair#*=}") ;;
      *) command -v "${pair%%=*}" >/dev/null || missing+=("${pair#*=}") ;;
    esac
  done
  [ ${#missing[@]} -eq 0 ] || install "${missing[@]}"
}

need_virtual_display() { need libgtk-3.so.0=libgtk-3-0 Xvfb=xvfb openbox=openbox dbus-run-session=dbus-x11 xdotool=xdotool import=imagemagick; }

need_judges() { need ngspice=ngspice soffice=libreoffice-calc pdftoppm=poppler-utils; }

# virtual_display [WIDTHxHEIGHT]: starts a screen of its own with a window manager; ended with the script.
virtual_display() {
  local folder
  folder=$(mktemp -d)
  mkfifo "$folder/number"
  Xvfb -displayfd 3 -screen 0 "${1:-1600x1000}x24" -nolisten tcp 3>"$folder/number" >"$folder/log" 2>&1 &
  display_pid=$!
  read -r -t 30 display_number <"$folder/number" || fail "the virtual display did not start: $(cat "$folder/log")"
  export DISPLAY=:$display_number GDK_BACKEND=x11 LIBOVERLAY_SCROLLBAR=0 NO_AT_BRIDGE=1
  unset WAYLAND_DISPLAY
  openbox >/dev/null 2>&1 &
  manager_pid=$!
  trap 'kill $manager_pid $display_pid 2>/dev/null; rm -rf "'"$folder"'"' EXIT
  trap 'exit 130' INT TERM HUP
}

# with_lock FILE MESSAGE: one builder at a time in this checkout; held until the script ends or unlock is called.
with_lock() {
  mkdir -p "$(dirname "$1")" || fail "cannot write in $(dirname "$1")"
  command -v flock >/dev/null || return 0
  exec 9>"$1" || fail "cannot write $1"
  flock -n 9 || {
    say "$2"
    flock 9
  }
}

unlock() { exec 9>&-; }

# build LOG ARGUMENTS...: runs Maven, the whole output into LOG, one line a module to standard error.
build() {
  local log=$1
  shift
  # An account that the system does not know by name has no home for Java.
  getent passwd "$(id -u)" >/dev/null || set -- -Dmaven.repo.local="${HOME:-/tmp}/.m2/repository" "$@"
  mvn -B -f "$root/pom.xml" "$@" 9>&- </dev/null 2>&1 | tee "$log" | awk '
    /^\[INFO\] Building .*\[[0-9]+\/[0-9]+\]/ { line = $0; sub(/^\[INFO\] Building /, "", line); sub(/ [0-9][^ ]*SNAPSHOT */, " ", line); print "coilbook:   " line; fflush() }
    /^\[INFO\] Downloaded from / && ++fetched % 100 == 0 { print "coilbook:   " fetched " files fetched"; fflush() }
    /Resolving MavenDependencyRoots|Resolving target definition/ && !told { told = 1; print "coilbook:   resolving libraries (the first build fetches some 300 MB)"; fflush() }' >&2
  return "${PIPESTATUS[0]}"
}

# install_product: takes what was just built as the product to start. A running process keeps the files it started from.
install_product() {
  local built stamp old
  built=$root/releng/coilbook.product/target/products/coilbook.product/linux/gtk/$(uname -m)/coilbook
  [ -x "$built/coilbook" ] || fail "the build left no product at $built"
  stamp=$(date +%Y%m%d-%H%M%S)-$$
  cp -R "$built" "$product_home/$stamp" || fail "cannot write $product_home/$stamp"
  touch -r "$1" "$product_home/$stamp/built"
  # One start in place leaves what every later start would have to work out again; those find it read-only.
  "${JAVA_HOME:+$JAVA_HOME/bin/}java" -Djava.awt.headless=true -Dequinox.resolver.revision.batch.size=10 \
    -Djava.util.logging.config.file="$product_home/$stamp/logging.properties" \
    -jar "$product_home/$stamp"/plugins/org.eclipse.equinox.launcher_*.jar \
    -application coilbook.console.application -data @none --version >/dev/null 2>&1 9>&- </dev/null ||
    say "the new product did not start properly"
  ln -sfn "$stamp" "$product_home/next" && mv -T "$product_home/next" "$product_home/current" || fail "cannot write $product_home/current"
  for old in $(ls -1d "$product_home"/[0-9]* | sort | head -n -2); do rm -rf "$old"; done
}

# stale: true if there is no product, or a source is newer than it.
stale() {
  [ -e "$product_home/current/built" ] || return 0
  [ -n "$(find "$root/pom.xml" "$root/features" "$root/bundles" "$root/releng/coilbook.platform" "$root/releng/coilbook.product" \
    \( -name target -o -name '*.tests' -o -name bin \) -prune -o \( -type f -o -path '*/src/*' \) -newer "$product_home/current/built" -print 2>/dev/null | head -n 1)" ]
}

# only NAME,NAME...: the Maven arguments that leave out the product and every test module but those of the named bundles.
only() {
  local module name left_out=
  for module in "$root"/bundles/*.tests "$root"/releng/*.tests; do
    name=${module##*/coilbook.}
    [ -d "$module/src" ] && case ,$1, in *,"${name%.tests}",*) false ;; esac && left_out=$left_out,!${module#"$root"/}
  done
  echo "-pl !releng/coilbook.product$left_out"
}

product_home=$root/releng/target/product
