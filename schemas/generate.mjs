// Writes what the core derives from gain-module.schema.json; with --check it only compares, and exits 1 on drift.
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { compactSchema } from './generate/compact.mjs';
import { typesOf } from './generate/types.mjs';
import { validatorOf } from './generate/validator.mjs';

const schema = JSON.parse(readFileSync(new URL('gain-module.schema.json', import.meta.url), 'utf8'));
const folder = new URL('../extension/core/design/generated/', import.meta.url);
const outputs = {
  'gain-module.ts': await typesOf(schema),
  'schema.ts': await compactSchema(schema),
  ...(await validatorOf(schema)),
};

const check = process.argv.includes('--check');
const drifted = [];
mkdirSync(folder, { recursive: true });
for (const [name, text] of Object.entries(outputs)) {
  const file = fileURLToPath(new URL(name, folder));
  if (check ? read(file) !== text : true) {
    if (check) drifted.push(name);
    else writeFileSync(file, text);
  }
}
if (drifted.length > 0) {
  console.error(`Not what the schema says: ${drifted.join(', ')}. Run: npm run generate`);
  process.exitCode = 1;
}

function read(file) {
  try {
    return readFileSync(file, 'utf8').replace(/\r\n/g, '\n');
  } catch {
    return undefined;
  }
}
