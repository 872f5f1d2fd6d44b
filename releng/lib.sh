# SPDX-License-Identifier: EPL-2.0
# Shell functions that the commands in this folder share; to be sourced. Everything they say goes to standard error, so
# that a command's results can be piped.

root=$(cd -- "$(dirname -- "${BASH_SOURCE[0]}")/.." && pwd)
cache=${XDG_CACHE_HOME:-$HOME/.cache}/tapwright
maven_version=3.9.11

say() { printf '%s\n' "$*" >&2; }

die() {
	say "tapwright: $*"
	exit 2
}

# --- system packages ---------------------------------------------------------------------------------------------------

# present PACKAGE: whether what the Debian package brings is there, however it came
present() {
	case $1 in
	libgtk-3-0) { ldconfig -p || /sbin/ldconfig -p; } 2>/dev/null | grep -q 'libgtk-3\.so\.0' ;;
	xvfb) command -v Xvfb >/dev/null ;;
	maven) command -v mvn >/dev/null ;;
	fonts-dejavu-core) [ -n "$(find /usr/share/fonts -name '*.ttf' -print -quit 2>/dev/null)" ] ;;
	adwaita-icon-theme) [ -d /usr/share/icons/Adwaita ] ;;
	librsvg2-common) compgen -G '/usr/lib/*/gdk-pixbuf-2.0/*/loaders/libpixbufloader*svg.so' >/dev/null ;;
	*) dpkg-query -W -f='${db:Status-Status}' "$1" 2>/dev/null | grep -qx installed ;;
	esac
}

# need_packages PACKAGE...: installs what is missing when root on Debian, else names it and ends
need_packages() {
	local package missing=()
	for package in "$@"; do present "$package" || missing+=("$package"); done
	[ ${#missing[@]} -eq 0 ] && return
	if [ "$(id -u)" != 0 ] || ! command -v apt-get >/dev/null; then
		die "these packages are missing (Debian's names): ${missing[*]}. As root on Debian: apt-get install ${missing[*]}"
	fi
	mkdir -p "$root/target"
	say "Installing ${missing[*]} ..."
	if ! { apt-get update && DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends "${missing[@]}"; } \
		>"$root/target/packages.log" 2>&1 </dev/null; then
		tail -n 15 "$root/target/packages.log" >&2
		die "could not install ${missing[*]}; the whole output is in target/packages.log"
	fi
}

need_window_packages() { need_packages libgtk-3-0 fonts-dejavu-core adwaita-icon-theme librsvg2-common; }

# --- JDK and Maven -----------------------------------------------------------------------------------------------------

# jdk_release HOME: prints the feature release of the JDK there; nothing when there is none
jdk_release() {
	[ -x "$1/bin/javac" ] && [ -r "$1/release" ] && sed -n 's/^JAVA_VERSION="\([0-9]*\).*/\1/p' "$1/release"
}

find_jdk() {
	local home release on_path
	on_path=$(command -v javac || true)
	for home in "${JAVA_HOME:-}" "${on_path:+$(dirname "$(dirname "$(readlink -f "$on_path")")")}" /usr/lib/jvm/*; do
		release=$(jdk_release "$home" || true)
		if [ -n "$release" ] && [ "$release" -ge 21 ]; then
			export JAVA_HOME=$home
			return
		fi
	done
	return 1
}

# need_jdk: sets JAVA_HOME to a JDK of release 21 or newer
need_jdk() {
	find_jdk && return
	if [ "$(id -u)" = 0 ] && command -v apt-get >/dev/null; then
		local package
		apt-get update >/dev/null 2>&1 </dev/null || true
		for package in openjdk-25-jdk-headless openjdk-21-jdk-headless; do
			if [ -n "$(apt-cache search --names-only "^$package\$" 2>/dev/null)" ]; then
				need_packages "$package"
				find_jdk && return
			fi
		done
	fi
	die "no JDK of release 21 or newer in JAVA_HOME, on the PATH or under /usr/lib/jvm. Install one (Debian 13: openjdk-21-jdk-headless) or set JAVA_HOME."
}

# need_maven: sets the array mvn to a command of Maven 3.9 or newer; fetches one through the machine's older Maven
need_maven() {
	local home=$cache/apache-maven-$maven_version version fetch
	need_jdk
	if [ ! -r "$home/bin/mvn" ]; then
		need_packages maven
		version=$(mvn --version 2>/dev/null | sed -n 's/.*Apache Maven \([0-9]*\.[0-9]*\).*/\1/p')
		if [ "$(printf '%s\n3.9\n' "$version" | sort -V | head -n 1)" = 3.9 ]; then
			mvn=(mvn)
			return
		fi
		say "Fetching Maven $maven_version (this machine has $version) ..."
		mkdir -p "$cache"
		fetch=$(mktemp -d "$cache/maven.XXXXXX")
		if ! (cd "$fetch" && mvn -B -q org.apache.maven.plugins:maven-dependency-plugin:3.8.1:copy \
			-Dartifact=org.apache.maven:apache-maven:$maven_version:zip:bin -DoutputDirectory=. </dev/null \
			&& "$JAVA_HOME/bin/jar" xf apache-maven-$maven_version-bin.zip) >"$cache/maven.log" 2>&1; then
			tail -n 15 "$cache/maven.log" >&2
			rm -rf "$fetch"
			die "could not fetch Maven $maven_version; put one on the PATH and try again"
		fi
		# another run may have been faster: then its copy stays
		mv -T "$fetch/apache-maven-$maven_version" "$home" 2>/dev/null || true
		rm -rf "$fetch"
	fi
	# the zip is unpacked without its executable bits
	mvn=(bash "$home/bin/mvn")
}

# --- building ----------------------------------------------------------------------------------------------------------

# lock_build: from here to the end of the command no other command builds in this checkout
lock_build() {
	mkdir -p "$root/target"
	exec 8>"$root/target/build.lock"
	flock -n 8 && return
	say "Waiting for another build of this checkout ..."
	flock 8
}

# fingerprint: of everything that the product is made from; changes with every edit, addition and removal
fingerprint() {
	(cd "$root" && find pom.xml .mvn bundles features product releng/tapwright.target releng/config \
		\( -name target -o -name bin -o -name src_test -o -name '*.tests' -o -name tapwright.testing -o -name '.polyglot.*' \) -prune \
		-o -type f -printf '%p %s %T@\n' | LC_ALL=C sort | sha256sum | cut -c1-16)
}

# publish FINGERPRINT: keeps the Linux product just built under target/run, where no later build touches it while it
# runs; earlier ones go as soon as nothing runs in them
publish() {
	local built=$root/product/target/products/tapwright.product/linux/gtk/x86_64 run=$root/target/run old
	mkdir -p "$run"
	rm -rf "$run/new" "${run:?}/$1"
	cp -al "$built" "$run/new" 2>/dev/null || { rm -rf "$run/new" && cp -a "$built" "$run/new"; }
	mv -T "$run/new" "$run/$1"
	for old in "$run"/*; do
		[ "$old" = "$run/$1" ] || flock -n -x "$old" rm -rf "$old" || true
	done
}

# progress TITLE LOG PID: on a terminal shows what the build is at, until it ends
progress() {
	printf '%s ' "$1" >&2
	while kill -0 "$3" 2>/dev/null; do
		[ -t 2 ] && printf '\r\033[K%s %s' "$1" "$(grep -o ' Building .*\[[0-9]*/[0-9]*\]' "$2" 2>/dev/null | tail -n 1)" >&2
		sleep 1
	done
	[ -t 2 ] && printf '\r\033[K%s ' "$1" >&2
	return 0
}

# build_product: builds the product when it is older than its sources; sets the variable product to its folder
build_product() {
	local print log=$root/target/build.log start=$SECONDS pid title='Building Tapwright ...'
	print=$(fingerprint)
	product=$root/target/run/$print
	[ -d "$product" ] && return
	lock_build
	print=$(fingerprint)
	product=$root/target/run/$print
	[ -d "$product" ] && return
	need_maven
	[ -d "$root/target/run" ] || title='Building Tapwright (first time: a few minutes) ...'
	(cd "$root" && exec "${mvn[@]}" -B -ntp clean verify -Dmaven.test.skip=true -pl product -am) >"$log" 2>&1 </dev/null 8>&- &
	pid=$!
	progress "$title" "$log" $pid
	if ! wait $pid; then
		say "failed."
		{ grep '^\[ERROR\]' "$log" || tail -n 40 "$log"; } | head -n 40 >&2
		die "the build failed; the whole output is in target/build.log"
	fi
	publish "$print"
	say "done in $((SECONDS - start)) s."
	exec 8>&-
}
