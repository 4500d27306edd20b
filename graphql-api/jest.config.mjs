// Everything is compiled to CommonJS, ESM-only packages included, so that jest needs no experimental flag.
const swc = (syntax) => [
  '@swc/jest',
  {
    jsc: {
      parser: syntax === 'typescript' ? { syntax, decorators: true } : { syntax },
      transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
      target: 'es2022',
      keepClassNames: true,
    },
    module: { type: 'commonjs' },
    sourceMaps: 'inline',
  },
];

export default {
  testEnvironment: 'node',
  roots: ['<rootDir>/src', '<rootDir>/test', '<rootDir>/kernels'],
  testMatch: ['**/*.spec.ts', '**/*.e2e-spec.ts'],
  testTimeout: 60_000,
  moduleNameMapper: {
    '^@metewand/(.*)$': '<rootDir>/kernels/$1/src/index.ts',
    '^(\\.{1,2}/.*)\\.js$': '$1',
  },
  modulePathIgnorePatterns: ['<rootDir>/dist', '<rootDir>/kernels/.*/dist'],
  transform: { '^.+\\.ts$': swc('typescript'), '^.+\\.m?js$': swc('ecmascript') },
  transformIgnorePatterns: [
    'node_modules/(?!(@nestjs|file-type|strtok3|token-types|uint8array-extras|@tokenizer|@borewit|bcryptjs)/)',
  ],
};
