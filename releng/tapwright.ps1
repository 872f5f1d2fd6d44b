# SPDX-License-Identifier: EPL-2.0
# Starts the product that was built for Windows.
#   tapwright              opens the window on sample-workspace
#   tapwright FOLDER       opens the window on the portfolio in FOLDER
#   tapwright VERB ...     runs the headless command; --help lists the verbs
$ErrorActionPreference = 'Stop'
$root = Split-Path -Parent $PSScriptRoot
$product = Join-Path $root 'product\target\products\tapwright.product\win32\win32\x86_64'

function Fail($message) {
	[Console]::Error.WriteLine("tapwright: $message")
	exit 2
}

function Find-Java {
	$candidates = @()
	if ($env:JAVA_HOME) { $candidates += (Join-Path $env:JAVA_HOME 'bin\java.exe') }
	$candidates += @(Get-Command java -CommandType Application -All -ErrorAction SilentlyContinue | ForEach-Object { $_.Source })
	foreach ($java in $candidates) {
		$release = Join-Path (Split-Path -Parent (Split-Path -Parent $java)) 'release'
		if ((Test-Path $java) -and (Test-Path $release) -and ((Get-Content $release -Raw) -match 'JAVA_VERSION="(\d+)') -and ([int]$Matches[1] -ge 21)) {
			return $java
		}
	}
	Fail 'no Java of release 21 or newer in JAVA_HOME or on the PATH. Install one or set JAVA_HOME.'
}

function Get-Jar($name) { (Get-ChildItem (Join-Path $product "plugins\${name}_*.jar") | Select-Object -First 1).FullName }

if (-not (Test-Path $product)) { Fail "there is no product in $product. Build it with: mvn verify" }
$java = Find-Java

$folder = $null
if ($args.Count -eq 0) { $folder = Join-Path $root 'sample-workspace' }
elseif ($args.Count -eq 1 -and (Test-Path $args[0] -PathType Container)) { $folder = (Resolve-Path $args[0]).Path }

if ($folder) {
	# one Eclipse workspace for each portfolio, outside of it: the portfolio's folder holds nothing but its own files
	$bytes = [Security.Cryptography.SHA256]::Create().ComputeHash([Text.Encoding]::UTF8.GetBytes($folder))
	$hash = [BitConverter]::ToString($bytes, 0, 4).Replace('-', '').ToLowerInvariant()
	$data = Join-Path $env:LOCALAPPDATA ('tapwright\' + (Split-Path -Leaf $folder) + "-$hash")
	& $java '-Xmx2g' '--enable-native-access=ALL-UNNAMED' '-Djava.awt.headless=true' '-jar' (Get-Jar 'org.eclipse.equinox.launcher') '-data' $data '-portfolio' $folder
} else {
	$jars = @('tapwright.cli', 'tapwright.core', 'tapwright.model', 'tapwright.dsp', 'org.eclipse.emf.common', 'org.eclipse.emf.ecore',
		'org.eclipse.emf.ecore.change', 'org.eclipse.emf.ecore.xmi', 'com.google.gson', 'org.apache.commons.math3', 'org.apache.commons.commons-codec',
		'org.eclipse.jgit', 'com.googlecode.javaewah.JavaEWAH', 'slf4j.api', 'slf4j.nop') | ForEach-Object { Get-Jar $_ }
	& $java '-Dstdout.encoding=UTF-8' '-Dstderr.encoding=UTF-8' '-Xlog:disable' '-Xlog:all=error:stderr' '-cp' ($jars -join ';') 'tapwright.cli.Main' @args
}
exit $LASTEXITCODE
