# shellcheck shell=bash
# Sourced by try.sh and tests/run.sh: sees to what they need beyond the .NET SDK.
# `need postgres fonts` installs what is missing with the system's package manager where this account may do that;
# otherwise it says exactly what to install and ends the script.

die() {
  printf '%s\n' "$@" >&2
  exit 1
}

has_postgres() {
  local folder version
  for folder in "${UNITVENT_PG_BIN:-}" /usr/lib/postgresql/*/bin /usr/libexec/postgresql* /usr/pgsql-*/bin ${PATH//:/ }; do
    if [[ -x $folder/initdb && -x $folder/postgres ]]; then
      version=$("$folder/postgres" --version)
      [[ $version =~ \)\ ([0-9]+) ]] && ((BASH_REMATCH[1] >= 15)) && return
    fi
  done
  return 1
}

has_fonts() { [[ -n $(find /usr/share/fonts /usr/local/share/fonts -name DejaVuSans.ttf -print -quit 2>/dev/null) ]]; }
has_chromium() { command -v chromium >/dev/null; }
has_poppler() { command -v pdftoppm >/dev/null && command -v pdftotext >/dev/null; }

# The system's packages for one need; the last line is for systems without a known package manager.
packages_for() {
  case $1:$2 in
    apt-get:postgres) echo postgresql ;;
    dnf:postgres) echo postgresql-server postgresql-contrib util-linux ;;
    apk:postgres) echo postgresql postgresql-contrib setpriv ;;
    apt-get:fonts) echo fonts-dejavu-core ;;
    dnf:fonts) echo dejavu-sans-fonts ;;
    apk:fonts) echo font-dejavu ;;
    *:chromium) echo chromium ;;
    *:poppler) echo poppler-utils ;;
    *:postgres) echo 'the PostgreSQL server, version 15 or newer' ;;
    *:fonts) echo 'the DejaVu Sans font' ;;
  esac
}

package_manager() {
  local manager
  for manager in apt-get dnf apk; do
    command -v "$manager" >/dev/null && echo "$manager" && return
  done
}

may_install() { [[ $(id -u) == 0 ]] || sudo -n true 2>/dev/null; }

as_root() {
  if [[ $(id -u) == 0 ]]; then "$@"; else sudo -n "$@"; fi
}

apt_install() {
  local install=(env DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends "$@")
  as_root "${install[@]}" || { as_root apt-get update && as_root "${install[@]}"; }
}

# Debian's server package makes and starts a cluster named main; none is wanted, and one that is there stays as it is.
apt_install_postgres() {
  local settings=/etc/postgresql-common/createcluster.conf
  apt_install postgresql-common || return
  as_root cp -p "$settings" "$settings.before" || return
  echo 'create_main_cluster = false' | as_root tee -a "$settings" >/dev/null || return
  apt_install "$@"
  local outcome=$?
  as_root mv "$settings.before" "$settings"
  return "$outcome"
}

install_with() {
  local manager=$1 need packages=()
  shift
  for need in "$@"; do
    read -ra packages <<<"$(packages_for "$manager" "$need")"
    case $manager:$need in
      apt-get:postgres) apt_install_postgres "${packages[@]}" ;;
      apt-get:*) apt_install "${packages[@]}" ;;
      dnf:*) as_root dnf install -y "${packages[@]}" ;;
      apk:*) as_root apk add "${packages[@]}" ;;
    esac || return
  done
}

# What a person types to get the same.
install_command() {
  local manager=$1 need
  shift
  printf 'Please install:\n'
  for need in "$@"; do
    case $manager in
      apt-get | dnf) echo "  sudo $manager install $(packages_for "$manager" "$need")" ;;
      apk) echo "  sudo apk add $(packages_for apk "$need")" ;;
      *) echo "  $(packages_for none "$need")" ;;
    esac
  done
}

need() {
  local manager one missing=() absent=()
  for one in "$@"; do
    "has_$one" || missing+=("$one")
  done
  ((${#missing[@]})) || return 0

  manager=$(package_manager) || manager=''
  if [[ -z $manager ]] || ! may_install; then
    die "This account may not install packages." "$(install_command "$manager" "${missing[@]}")"
  fi
  echo "Installing: ${missing[*]}" >&2
  install_with "$manager" "${missing[@]}" >&2 || die "Installing failed." "$(install_command "$manager" "${missing[@]}")"
  for one in "${missing[@]}"; do
    "has_$one" || absent+=("$one")
  done
  ((${#absent[@]} == 0)) || die "This system's packages do not bring ${absent[*]} as needed." "$(install_command none "${absent[@]}")"
}

# The SDK that global.json asks for; to be called in the checkout.
need_dotnet() {
  command -v dotnet >/dev/null && dotnet --version >/dev/null 2>&1 && return
  die "The .NET SDK $(sed -n 's/.*"sdk":.*"version": *"\([^"]*\)".*/\1/p' global.json) or newer of that line is missing." \
    "Please install it, from this system's packages or from its makers."
}

# The SDK keeps its caches in the home folder; without one they go into the checkout's ignored folder.
need_home() {
  if [[ -z ${HOME:-} || ! -d $HOME || ! -w $HOME ]]; then
    HOME=$PWD/artifacts/home
    mkdir -p "$HOME"
    export HOME DOTNET_CLI_HOME="$HOME" NUGET_PACKAGES="${NUGET_PACKAGES:-$HOME/.nuget/packages}"
  fi
  export DOTNET_NOLOGO=1 DOTNET_CLI_TELEMETRY_OPTOUT=1 DOTNET_GENERATE_ASPNET_CERTIFICATE=false MSBUILDDISABLENODEREUSE=1
}
