import { Inject, Injectable } from '@nestjs/common';
import {
  CopyObjectCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  NoSuchKey,
  NotFound,
  S3Client,
} from '@aws-sdk/client-s3';
import { createPresignedPost } from '@aws-sdk/s3-presigned-post';
import { getSignedUrl } from '@aws-sdk/s3-request-presigner';
import { DomainError } from '../common/domain-error.js';
import { ENV, type Env } from '../config/env.js';
import { attachmentNamed } from './attachment-name.js';

const TIMEOUT_MS = 10_000;
const UPLOAD_SECONDS = 600;
const DOWNLOAD_SECONDS = 60;

/** A form that the browser posts straight to the store. It fits one key, one content type and a bounded size. */
export interface UploadForm {
  url: string;
  fields: Record<string, string>;
}

export interface Download {
  key: string;
  fileName: string;
  contentType: string;
}

export class StorageUnavailableError extends DomainError {
  readonly code = 'STORAGE_UNAVAILABLE';
  constructor() {
    super('The store of documents does not answer. Nothing was saved. Try again in a minute.');
  }
}

/** The bucket. It asks nobody's leave: whoever calls has checked the right to the key before, outside any transaction. */
@Injectable()
export class StorageService {
  private readonly client: S3Client;
  private readonly bucket: string;

  constructor(@Inject(ENV) { s3 }: Env) {
    this.bucket = s3.bucket;
    this.client = new S3Client({
      endpoint: s3.endpoint,
      region: s3.region,
      credentials: { accessKeyId: s3.accessKeyId, secretAccessKey: s3.secretAccessKey },
      forcePathStyle: true,
      // by default the client frames streams in checksummed chunks, which not every store takes out again
      requestChecksumCalculation: 'WHEN_REQUIRED',
      responseChecksumValidation: 'WHEN_REQUIRED',
      requestHandler: { connectionTimeout: 3_000, requestTimeout: TIMEOUT_MS, throwOnRequestTimeout: true },
    });
  }

  uploadForm(key: string, contentType: string, largestBytes: number): Promise<UploadForm> {
    return createPresignedPost(this.client, {
      Bucket: this.bucket,
      Key: key,
      Fields: { 'Content-Type': contentType },
      Conditions: [['content-length-range', 1, largestBytes]],
      Expires: UPLOAD_SECONDS,
    });
  }

  /** Size in bytes, or null when nothing is there. */
  sizeOf(key: string): Promise<number | null> {
    return orUnavailable(async () => {
      try {
        const { ContentLength } = await this.client.send(new HeadObjectCommand(this.at(key)), patience());
        return ContentLength ?? 0;
      } catch (error) {
        if (error instanceof NotFound) return null;
        throw error;
      }
    });
  }

  /** The whole object; the caller knows its size. */
  read(key: string): Promise<Uint8Array> {
    return orUnavailable(async () => {
      const { Body } = await this.client.send(new GetObjectCommand(this.at(key)), patience());
      return Body ? Body.transformToByteArray() : new Uint8Array();
    });
  }

  /** Whether there was anything to copy. */
  copy(from: string, to: string): Promise<boolean> {
    const command = new CopyObjectCommand({ ...this.at(to), CopySource: `${this.bucket}/${from}` });
    return orUnavailable(async () => {
      try {
        await this.client.send(command, patience());
        return true;
      } catch (error) {
        if (error instanceof NoSuchKey) return false;
        throw error;
      }
    });
  }

  /** Deleting what is not there is no error. */
  async delete(key: string): Promise<void> {
    await orUnavailable(() => this.client.send(new DeleteObjectCommand(this.at(key)), patience()));
  }

  /** An address good for one minute that saves the object as a file and never shows it in the page. */
  downloadLink({ key, fileName, contentType }: Download): Promise<string> {
    const command = new GetObjectCommand({
      ...this.at(key),
      ResponseContentDisposition: attachmentNamed(fileName),
      ResponseContentType: contentType,
    });
    return getSignedUrl(this.client, command, { expiresIn: DOWNLOAD_SECONDS });
  }

  private at(key: string) {
    return { Bucket: this.bucket, Key: key };
  }
}

function patience() {
  return { abortSignal: AbortSignal.timeout(TIMEOUT_MS) };
}

async function orUnavailable<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    throw Object.assign(new StorageUnavailableError(), { cause: error });
  }
}
