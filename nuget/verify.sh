#!/usr/bin/env bash
# Checks the packages as a stranger meets them: content, equal entries from two clones, a consumer restored from the
# local feed alone, the example of the package readme, the tool installed from the feed, NativeAOT and trimming.
set -euo pipefail
root=$(cd "$(dirname "$0")/.." && pwd)
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
fail() { echo "verify: $*" >&2; exit 1; }
entries() { unzip -Z1 "$1" | sort; }
version=$(sed -n 's:.*<VersionPrefix>\(.*\)</VersionPrefix>.*:\1:p' "$root/nuget/build/RadicalSites.Common.props")
command -v unzip >/dev/null || { apt-get update -qq && apt-get install -y -qq unzip >/dev/null; }

echo "-- pack two clones"
for clone in a b; do
    git clone -q "$root" "$work/$clone-$clone"
    (cd "$work/$clone-$clone" && nuget/pack.sh "$work/feed-$clone" >"$work/pack-$clone.log" 2>&1) || { cat "$work/pack-$clone.log"; fail "packing failed"; }
done
feed=$work/feed-a
ls -l "$feed" | awk '{ if ($9) print "   " $5 " bytes " $9 }'

echo "-- same entries, same bytes"
for package in "$feed"/*.nupkg; do
    name=$(basename "$package")
    mkdir -p "$work/x/a" "$work/x/b"
    (cd "$work/x/a" && rm -rf ./* && unzip -q "$package")
    (cd "$work/x/b" && rm -rf ./* && unzip -q "$work/feed-b/$name")
    # The packing program names one relation file at random; everything else has to be equal.
    rm -rf "$work"/x/*/package "$work"/x/*/_rels
    diff -r "$work/x/a" "$work/x/b" >/dev/null || fail "$name differs between two clones: $(diff -rq "$work/x/a" "$work/x/b" | head -3)"
    ! grep -raqF -e "$work" -e "$root" "$work/x/a" || fail "$name holds a path of the build machine"
    for file in README.md icon.png CHANGELOG.md; do [ -f "$work/x/a/$file" ] || fail "$name lacks $file"; done
    grep -q '<license type="expression">MIT</license>' "$work"/x/a/*.nuspec || fail "$name lacks the licence expression"
    grep -q '<repository .*commit=' "$work"/x/a/*.nuspec || fail "$name does not name its commit"
    [ "$(stat -c %s "$package")" -lt 12000000 ] || fail "$name is larger than 12 MB"
done
entries "$feed/RadicalSites.$version.nupkg" | grep -qx 'lib/net10.0/RadicalSites.xml' || fail "the XML documentation is missing"
[ -f "$feed/RadicalSites.$version.snupkg" ] || fail "the symbol package is missing"

echo "-- a consumer restored from the local feed alone"
cp "${NUGET_PACKAGES:-$HOME/.nuget/packages}"/mathnet.numerics/5.0.0/mathnet.numerics.5.0.0.nupkg "$feed/"
mkdir "$work/consumer"
cp "$root/nuget/consumer/Consumer.csproj" "$work/consumer/"
sed -n '/^```csharp/,/^```/p' "$root/nuget/README.md" | sed '1d;$d' >"$work/consumer/Program.cs"
sed -n '/^prints/,$p' "$root/nuget/README.md" | sed -n '/^```/,/^```/p' | sed '1d;$d' >"$work/expected.txt"
cat >"$work/consumer/nuget.config" <<X
<configuration>
  <packageSources><clear /><add key="local" value="$feed" /></packageSources>
  <config><add key="globalPackagesFolder" value="$work/packages" /></config>
</configuration>
X
(cd "$work/consumer" && dotnet run -c Release -p:RadicalSitesVersion="$version" >"$work/got.txt") || fail "the consumer does not build or run"
diff "$work/expected.txt" "$work/got.txt" || fail "the example of the package readme prints something else"

echo "-- the tool from the feed"
(cd "$work/consumer" && dotnet tool install RadicalSites.Cli --version "$version" --tool-path "$work/tool" >/dev/null) || fail "the tool does not install"
"$work/tool/radicalsites" predict CCC --reagent Cl2 --format csv >"$work/tool.txt"
grep -q '^1,,CCC,ok,CCC,Cl2,298.15,,1,0;2,6,primary' "$work/tool.txt" || fail "the tool prints something else: $(cat "$work/tool.txt")"
"$work/tool/radicalsites" --version

if [ "${RADICALSITES_SKIP_AOT:-0}" = 1 ]; then
    echo "-- NativeAOT and trimming: skipped on request"
else
    echo "-- NativeAOT and trimmed, without warnings, same output"
    # These need the compiler packages of the SDK from the usual source beside the local feed.
    cat >"$work/consumer/nuget.config" <<X
<configuration>
  <packageSources><add key="local" value="$feed" /></packageSources>
  <fallbackPackageFolders><add key="usual" value="${NUGET_PACKAGES:-$HOME/.nuget/packages}" /></fallbackPackageFolders>
  <config><add key="globalPackagesFolder" value="$work/packages" /></config>
</configuration>
X
    for mode in PublishAot PublishTrimmed; do
        (cd "$work/consumer" && rm -rf obj bin && dotnet publish -c Release -r linux-x64 --self-contained -p:$mode=true -p:RadicalSitesVersion="$version" -o "$work/$mode" >"$work/$mode.log" 2>&1) \
            || { tail -20 "$work/$mode.log"; fail "$mode does not publish"; }
        ! grep -E 'warning (IL|AOT)' "$work/$mode.log" || fail "$mode warns"
        "$work/$mode/Consumer" | diff "$work/expected.txt" - || fail "$mode prints something else"
    done
fi
echo "verify: all well"
