import { Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ENV, type Env } from '../config/env.js';
import { databaseOptions } from './data-source.js';

@Global()
@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [ENV],
      useFactory: (env: Env) => ({ ...databaseOptions(env.databaseUrl), autoLoadEntities: true }),
    }),
  ],
})
export class DatabaseModule {}
