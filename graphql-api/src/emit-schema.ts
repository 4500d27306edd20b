import 'reflect-metadata';
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { NestFactory } from '@nestjs/core';
import { GraphQLSchemaBuilderModule, GraphQLSchemaFactory } from '@nestjs/graphql';
import { lexicographicSortSchema, printSchema, type GraphQLSchema } from 'graphql';
import { AppModule } from './app.module.js';
import { OPERATION_ROLES } from './auth/operation-roles.js';

/** Writes schema.graphql and roles.json into the folder named on the command line, without a database. */
const folder = process.argv[2];
if (!folder) throw new Error('Say into which folder.');

const builder = await NestFactory.create(GraphQLSchemaBuilderModule, { logger: ['error'] });
await builder.init();
const providers = providersOf(AppModule);
const schema = await builder
  .get(GraphQLSchemaFactory)
  .create(providers.filter(isResolver), providers.filter(isScalar) as never[]);
checkRolesCover(schema);

writeFileSync(join(folder, 'schema.graphql'), `${printSchema(lexicographicSortSchema(schema))}\n`);
writeFileSync(join(folder, 'roles.json'), `${JSON.stringify(OPERATION_ROLES, null, 2)}\n`);
await builder.close();

type Class = new (...args: never[]) => unknown;

/** Every class that the module and the modules it imports provide. */
function providersOf(module: Class, seen = new Set<unknown>()): Class[] {
  if (seen.has(module)) return [];
  seen.add(module);
  const own = (Reflect.getMetadata('providers', module) ?? []) as unknown[];
  const imported = (Reflect.getMetadata('imports', module) ?? []) as unknown[];
  return [...own.filter(isClass), ...imported.filter(isClass).flatMap((each) => providersOf(each, seen))];
}

function isClass(value: unknown): value is Class {
  return typeof value === 'function';
}

function isResolver(provider: Class) {
  return Reflect.hasMetadata('graphql:resolver_type', provider);
}

function isScalar(provider: Class) {
  return Reflect.hasMetadata('graphql:scalar_name', provider);
}

/** An operation without a row in the table of roles, or a row without an operation, stops the emission. */
function checkRolesCover(emitted: GraphQLSchema) {
  const operations = [emitted.getQueryType(), emitted.getMutationType()].flatMap((type) =>
    Object.keys(type?.getFields() ?? {}),
  );
  const missing = operations.filter((name) => !(name in OPERATION_ROLES));
  const unknown = Object.keys(OPERATION_ROLES).filter((name) => !operations.includes(name));
  if (missing.length || unknown.length) {
    throw new Error(
      `The table of roles lacks [${missing.join(', ')}] and names unknown [${unknown.join(', ')}].`,
    );
  }
}
