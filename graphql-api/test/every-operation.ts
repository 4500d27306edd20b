import {
  getNamedType,
  isEnumType,
  isInputObjectType,
  isLeafType,
  isListType,
  isNonNullType,
  isObjectType,
  isUnionType,
  type GraphQLField,
  type GraphQLInputType,
  type GraphQLObjectType,
  type GraphQLOutputType,
  type GraphQLSchema,
} from 'graphql';

export interface Operation {
  name: string;
  kind: 'query' | 'mutation';
  field: GraphQLField<unknown, unknown>;
}

/** Every root field of the schema. */
export function operationsOf(schema: GraphQLSchema): Operation[] {
  const roots = [
    ['query', schema.getQueryType()],
    ['mutation', schema.getMutationType()],
  ] as const;
  return roots.flatMap(([kind, type]) =>
    Object.values(type?.getFields() ?? {}).map((field) => ({ name: field.name, kind, field })),
  );
}

/** The operation with all its arguments as variables, asking for every plain field of what it answers. */
export function documentFor({ kind, field }: Operation): string {
  const declared = field.args.map((arg) => `$${arg.name}: ${String(arg.type)}`).join(', ');
  const passed = field.args.map((arg) => `${arg.name}: $${arg.name}`).join(', ');
  const call = `${field.name}${passed ? `(${passed})` : ''}`;
  return `${kind}${declared ? ` (${declared})` : ''} { ${call} ${selectionFor(field.type)} }`;
}

function selectionFor(output: GraphQLOutputType): string {
  const type = getNamedType(output);
  if (isObjectType(type)) return `{ __typename ${plainFields(type)} }`;
  if (!isUnionType(type)) return '';
  const members = type.getTypes().map((member) => `... on ${member.name} { ${aliased(member)} }`);
  return `{ __typename ${members.join(' ')} }`;
}

function plainFields(type: GraphQLObjectType): string {
  return Object.values(type.getFields())
    .filter((field) => isLeafType(getNamedType(field.type)) && field.args.length === 0)
    .map((field) => field.name)
    .join(' ');
}

/** Fields of the same name may differ in type between the members of a union, so each gets its own alias. */
function aliased(type: GraphQLObjectType): string {
  return plainFields(type)
    .split(' ')
    .filter(Boolean)
    .map((name) => `${type.name}_${name}: ${name}`)
    .join(' ');
}

/** Dotted paths of all arguments of type ID, such as "input.fields.siteId". */
export function idPositions({ field }: Operation): string[] {
  return field.args.flatMap((arg) => idPaths(arg.name, arg.type));
}

function idPaths(path: string, input: GraphQLInputType): string[] {
  const type = getNamedType(input);
  if (isInputObjectType(type)) {
    return Object.values(type.getFields()).flatMap((field) => idPaths(`${path}.${field.name}`, field.type));
  }
  return type.name === 'ID' ? [path] : [];
}

/** A sound value for every argument; `idFor` says which id belongs at a path. */
export function variablesFor(operation: Operation, idFor: (path: string) => string): Record<string, unknown> {
  const text = `text of ${operation.name}`;
  return Object.fromEntries(
    operation.field.args.map((arg) => [arg.name, sample(arg.name, arg.type, idFor, text)]),
  );
}

const SAMPLES: Record<string, unknown> = {
  Int: 1,
  Float: 1,
  Boolean: false,
  Decimal: '1',
  CalendarDate: '2027-03-01',
  DateTime: '2027-03-01T00:00:00Z',
};

// Where any text or day would be refused before the id is looked at.
const SOUND: Record<string, unknown> = {
  validUntil: '2027-06-01',
  currency: 'EUR',
  contentType: 'application/pdf',
  fileName: 'quote.pdf',
  after: '999999',
  search: '',
};

function sample(
  path: string,
  input: GraphQLInputType,
  idFor: (path: string) => string,
  text: string,
): unknown {
  if (isNonNullType(input)) return sample(path, input.ofType, idFor, text);
  if (isListType(input)) return [sample(path, input.ofType, idFor, text)];
  if (isInputObjectType(input)) {
    const fields = Object.values(input.getFields());
    return Object.fromEntries(
      fields.map((field) => [field.name, sample(`${path}.${field.name}`, field.type, idFor, text)]),
    );
  }
  if (isEnumType(input)) return input.getValues()[0].name;
  if (input.name === 'ID') return idFor(path);
  const value = SOUND[path.split('.').at(-1) ?? ''] ?? (input.name === 'String' ? text : SAMPLES[input.name]);
  if (value === undefined) throw new Error(`No sample for ${path} of type ${input.name}.`);
  return value;
}

export function withValueAt(
  variables: Record<string, unknown>,
  path: string,
  value: unknown,
): Record<string, unknown> {
  const copy = structuredClone(variables);
  const keys = path.split('.');
  const last = keys.pop() ?? '';
  const holder = keys.reduce((object, key) => object[key] as Record<string, unknown>, copy);
  holder[last] = value;
  return copy;
}
