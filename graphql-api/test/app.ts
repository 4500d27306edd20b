import 'reflect-metadata';
import { Test } from '@nestjs/testing';
import type { NestExpressApplication } from '@nestjs/platform-express';
import request from 'supertest';
import { setUpApp } from '../src/app-setup.js';
import { AppModule } from '../src/app.module.js';
import { demoPassword } from '../../scripts/seed/demo.mjs';

export interface Answer {
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- what a test asked for
  data?: any;
  errors?: {
    message: string;
    path?: string[];
    extensions: { code: string; requestId: string; [name: string]: unknown };
  }[];
}

/** The API over real HTTP on a free port, against the test database, as the API role. */
export class TestApp {
  private constructor(readonly app: NestExpressApplication) {}

  static async start(): Promise<TestApp> {
    const testing = await Test.createTestingModule({ imports: [AppModule] }).compile();
    const app = testing.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false });
    setUpApp(app);
    await app.listen(0, '127.0.0.1');
    return new TestApp(app);
  }

  stop() {
    return this.app.close();
  }

  /** A POST to /graphql; give a body and headers of your own through the returned request. */
  post() {
    return request(this.app.getHttpServer()).post('/graphql');
  }

  async ask(query: string, variables: Record<string, unknown> = {}, accessToken?: string): Promise<Answer> {
    const sent = accessToken ? this.post().set('authorization', `Bearer ${accessToken}`) : this.post();
    const response = await sent.send({ query, variables });
    return response.body as Answer;
  }

  async signIn(email: string, password = demoPassword) {
    const response = await this.post().send({
      query: `mutation ($input: SignInInput!) {
        signIn(input: $input) { __typename ... on SignedIn { accessToken } ... on SignInRefused { message } }
      }`,
      variables: { input: { email, password } },
    });
    const cookies = (response.headers['set-cookie'] ?? []) as unknown as string[];
    return {
      result: (response.body as Answer).data?.signIn,
      cookie: cookies.map((line) => line.split(';')[0]).join('; '),
    };
  }

  /** Signs in with the demo password and asks as that person from then on. */
  async as(email: string): Promise<Member> {
    const { result } = await this.signIn(email);
    if (!result?.accessToken) throw new Error(`${email} could not sign in.`);
    return new Member(this, result.accessToken as string);
  }
}

export class Member {
  constructor(
    private readonly app: TestApp,
    readonly accessToken: string,
  ) {}

  ask(query: string, variables?: Record<string, unknown>): Promise<Answer> {
    return this.app.ask(query, variables, this.accessToken);
  }

  /** The data of an answer that must hold no errors. */
  async get(query: string, variables?: Record<string, unknown>) {
    const { data, errors } = await this.ask(query, variables);
    if (errors) throw new Error(JSON.stringify(errors));
    return data;
  }
}
