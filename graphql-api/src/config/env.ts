import { readFileSync } from 'node:fs';

/** Everything the processes take from outside, read once. A missing value stops the start with its name. */
export interface Env {
  databaseUrl: string;
  port: number;
  publicUrl: string;
  webDist: string;
  production: boolean;
  jwtPrivateKey: string;
  s3: { endpoint: string; region: string; bucket: string; accessKeyId: string; secretAccessKey: string };
  smtp: { host: string; port: number; from: string };
}

export const ENV = Symbol('ENV');

export function readEnv(source: NodeJS.ProcessEnv = process.env): Env {
  return {
    databaseUrl: required(source, 'DATABASE_URL'),
    port: Number(source.PORT ?? 4000),
    publicUrl: required(source, 'PUBLIC_URL'),
    webDist: source.WEB_DIST ?? '',
    production: source.NODE_ENV === 'production',
    jwtPrivateKey: readFileSync(required(source, 'JWT_PRIVATE_KEY_FILE'), 'utf8'),
    s3: {
      endpoint: required(source, 'S3_ENDPOINT'),
      region: source.S3_REGION ?? 'eu-central-1',
      bucket: source.S3_BUCKET ?? 'metewand',
      accessKeyId: required(source, 'S3_ACCESS_KEY_ID'),
      secretAccessKey: required(source, 'S3_SECRET_ACCESS_KEY'),
    },
    smtp: {
      host: required(source, 'SMTP_HOST'),
      port: Number(required(source, 'SMTP_PORT')),
      from: source.MAIL_FROM ?? 'Metewand <metewand@example.org>',
    },
  };
}

export function required(source: NodeJS.ProcessEnv, name: string): string {
  const value = source[name];
  if (!value) throw new Error(`The environment variable ${name} is not set.`);
  return value;
}
