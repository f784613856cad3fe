#!/usr/bin/env bash
# Makes stand-ins for the public .NET base images where no container registry can be reached: a minimal Debian system
# (debootstrap) with this machine's .NET folder. Needs root, a running Docker engine and debootstrap.
# Prints the build arguments; usage: docker build --network=host $(deploy/make-base-images.sh) -t partition-service .
set -euo pipefail
suite=${DEBIAN_SUITE:-bookworm}
dotnet_folder=${DOTNET_FOLDER:-$(dirname "$(readlink -f "$(command -v dotnet)")")}
root=$(mktemp -d)
trap 'rm -rf "$root"' EXIT

{
  debootstrap --variant=minbase --include=libicu72,libssl3,zlib1g,ca-certificates "$suite" "$root"
  mkdir -p "$root/usr/share/dotnet"
  for part in dotnet host shared; do
    cp -a "$dotnet_folder/$part" "$root/usr/share/dotnet/"
  done
  ln -sf /usr/share/dotnet/dotnet "$root/usr/bin/dotnet"
  rm -rf "$root"/var/cache/apt/archives/*.deb "$root"/var/lib/apt/lists/*
  tar -C "$root" -c . | docker import - partition-base-runtime:local

  # The build stage restores packages through this machine's network, so it needs the SDK, its package sources and its certificates.
  cp -a "$dotnet_folder/sdk" "$dotnet_folder/packs" "$root/usr/share/dotnet/" 2>/dev/null || cp -a "$dotnet_folder/sdk" "$root/usr/share/dotnet/"
  if [ -f /etc/ssl/certs/ca-certificates.crt ]; then
    cp -L /etc/ssl/certs/ca-certificates.crt "$root/etc/ssl/certs/ca-certificates.crt"
  fi
  if [ -f "$HOME/.nuget/NuGet/NuGet.Config" ]; then
    mkdir -p "$root/root/.nuget/NuGet"
    cp "$HOME/.nuget/NuGet/NuGet.Config" "$root/root/.nuget/NuGet/"
  fi
  tar -C "$root" -c . | docker import - partition-base-sdk:local
} >&2

echo "--build-arg SDK_IMAGE=partition-base-sdk:local --build-arg RUNTIME_IMAGE=partition-base-runtime:local"
