import { mkdirSync } from 'node:fs';
import S3rver from 's3rver';

// Stands in for S3 during development and tests, on loopback only: it checks neither signatures nor the conditions of
// a presigned POST, so nothing here proves that those are right.
// STORAGE_FOLDER holds the objects; ALLOWED_ORIGIN is the address of the web, whose pages upload straight to here;
// STORAGE_PORT chooses the port, without it a free one is taken and printed.

const { STORAGE_FOLDER, STORAGE_PORT, ALLOWED_ORIGIN } = process.env;
if (!STORAGE_FOLDER || !ALLOWED_ORIGIN) throw new Error('STORAGE_FOLDER and ALLOWED_ORIGIN must be set.');

const methods = ['GET', 'HEAD', 'POST', 'PUT']
  .map((method) => `<AllowedMethod>${method}</AllowedMethod>`)
  .join('');
const crossOrigin = `<CORSConfiguration><CORSRule>
  <AllowedOrigin>${ALLOWED_ORIGIN}</AllowedOrigin>${methods}
  <AllowedHeader>*</AllowedHeader><ExposeHeader>ETag</ExposeHeader>
</CORSRule></CORSConfiguration>`;

mkdirSync(STORAGE_FOLDER, { recursive: true });
const storage = new S3rver({
  address: '127.0.0.1',
  port: Number(STORAGE_PORT ?? 0),
  directory: STORAGE_FOLDER,
  silent: true,
  vhostBuckets: false,
  configureBuckets: [{ name: 'metewand', configs: [crossOrigin] }],
});
const { port } = await storage.run();
console.log(`ready on http://127.0.0.1:${port}`);

process.once('SIGTERM', () => process.exit(0));
