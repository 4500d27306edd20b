import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { codegen } from '@graphql-codegen/core';
import { preset } from '@graphql-codegen/near-operation-file-preset';
import * as typescript from '@graphql-codegen/typescript';
import * as operations from '@graphql-codegen/typescript-operations';
import { gqlPluckFromCodeStringSync } from '@graphql-tools/graphql-tag-pluck';
import { buildSchema, isAbstractType, parse } from 'graphql';
import { root } from './root.mjs';

const sources = 'web/src';
const baseTypes = `${sources}/generated/graphql.ts`;
const possibleTypesFile = `${sources}/generated/possible-types.ts`;
const extension = '.generated.ts';
const config = {
  useTypeImports: true,
  enumsAsTypes: true,
  enumType: 'string-literal',
  nonOptionalTypename: true,
  defaultScalarType: 'unknown',
  scalars: { ID: 'string', Decimal: 'string', CalendarDate: 'string', DateTime: 'string' },
};
const pluginMap = { typescript, 'typescript-operations': operations };

/**
 * Writes the types of the schema, of every operation beside the file that asks it, and the possible types of unions
 * for the cache. Touches only files whose content changes, removes those whose operation is gone.
 * @returns {Promise<{ operations: number, written: string[] }>}
 */
export async function generateWebTypes() {
  const schemaText = readFileSync(join(root, 'schema/schema.graphql'), 'utf8');
  const schema = { schema: parse(schemaText), schemaAst: buildSchema(schemaText) };
  const documents = pluckOperations();
  const outputs = new Map([
    [baseTypes, await generateBaseTypes(schema)],
    [possibleTypesFile, possibleTypes(schema.schemaAst)],
    ...(await generateOperationTypes(schema, documents)),
  ]);
  for (const stale of generatedFiles().filter((file) => !outputs.has(file))) rmSync(join(root, stale));
  const written = [...outputs]
    .filter(([file, content]) => writeIfChanged(file, content))
    .map(([file]) => file);
  return { operations: documents.length, written };
}

function pluckOperations() {
  return sourceFiles()
    .filter((file) => /\.tsx?$/.test(file) && !file.endsWith(extension) && !/\.test\.tsx?$/.test(file))
    .flatMap((location) =>
      gqlPluckFromCodeStringSync(location, readFileSync(join(root, location), 'utf8'), {
        skipIndent: true,
        globalGqlIdentifierName: ['gql'],
      }).map(({ body }) => ({ location, rawSDL: body, document: parse(body) })),
    );
}

function generateBaseTypes(schema) {
  return codegen({
    ...schema,
    filename: baseTypes,
    documents: [],
    plugins: [{ typescript: {} }],
    pluginMap,
    config,
  });
}

async function generateOperationTypes(schema, documents) {
  const sections = await preset.buildGeneratesSection({
    ...schema,
    baseOutputDir: `${sources}/`,
    documents,
    config,
    presetConfig: {
      extension,
      baseTypesPath: 'generated/graphql.ts',
      cwd: root,
      importTypesNamespace: 'Schema',
    },
    plugins: [{ 'typescript-operations': { importSchemaTypesFrom: baseTypes } }],
    pluginMap,
    pluginContext: {},
    profiler: { run: (work) => work(), collect: () => [] },
  });
  return Promise.all(sections.map(async (section) => [section.filename, await codegen(section)]));
}

/** Which object types stand behind each union and interface: the cache needs it to match fragments. */
function possibleTypes(schema) {
  const entries = Object.values(schema.getTypeMap())
    .filter((type) => isAbstractType(type) && !type.name.startsWith('__'))
    .map((type) => [type.name, schema.getPossibleTypes(type).map(({ name }) => name)]);
  const record = JSON.stringify(Object.fromEntries(entries), null, 2);
  return `export const possibleTypes: Record<string, string[]> = ${record};\n`;
}

function generatedFiles() {
  return sourceFiles().filter((file) => file.endsWith(extension));
}

function sourceFiles() {
  return readdirSync(join(root, sources), { recursive: true })
    .map((file) => `${sources}/${file}`)
    .sort();
}

function writeIfChanged(file, content) {
  const path = join(root, file);
  if (existsSync(path) && readFileSync(path, 'utf8') === content) return false;
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, content);
  return true;
}
