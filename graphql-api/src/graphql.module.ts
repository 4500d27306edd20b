import { ApolloDriver, type ApolloDriverConfig } from '@nestjs/apollo';
import { GraphQLModule as NestGraphQLModule } from '@nestjs/graphql';
import { ApolloArmor } from '@escape.tech/graphql-armor';
import type { ApolloServerPlugin } from '@apollo/server';
import type { GraphqlContext } from './auth/graphql-context.js';
import { formatError } from './common/format-error.js';
import { ENV, type Env } from './config/env.js';

/** Refused before anything is executed. The cost limit is in the guard's own points: 2 an object, 1 a field, ×1.5 a level. */
const armor = new ApolloArmor({
  maxDepth: { n: 10, flattenFragments: true },
  maxAliases: { n: 30 },
  maxDirectives: { n: 50 },
  maxTokens: { n: 5_000 },
  costLimit: { maxCost: 15_000 },
  blockFieldSuggestion: { enabled: true },
});

/** One endpoint, code-first, no websocket. */
export const GraphqlModule = NestGraphQLModule.forRootAsync<ApolloDriverConfig>({
  driver: ApolloDriver,
  inject: [ENV],
  useFactory: (env: Env) => {
    const { plugins, validationRules } = armor.protect();
    return {
      path: '/graphql',
      autoSchemaFile: true,
      sortSchema: true,
      graphiql: false,
      introspection: !env.production,
      includeStacktraceInErrorResponses: false,
      allowBatchedHttpRequests: false,
      csrfPrevention: true,
      persistedQueries: false,
      context: ({ req, res }: GraphqlContext): GraphqlContext => ({ req, res }),
      formatError,
      validationRules,
      plugins: plugins as ApolloServerPlugin[],
    };
  },
});
