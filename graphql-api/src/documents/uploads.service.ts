import { randomUUID } from 'node:crypto';
import { Injectable, Logger } from '@nestjs/common';
import { AuditService } from '../audit/audit.service.js';
import { CandidatesService } from '../candidates/candidates.service.js';
import { checkKey, documentKey, slotKey } from '../storage/storage-keys.js';
import { StorageService } from '../storage/storage.service.js';
import { findOrThrow } from '../tenancy/find-or-throw.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { StartUploadInput } from './dto/start-upload.input.js';
import { UploadRefused, UploadSlot } from './dto/upload.result.js';
import { Document, DocumentState } from './entities/document.entity.js';
import { isContentOf, sha256Of } from './file-content.js';
import { acceptFile, LARGEST_FILE_BYTES, nothingArrived, wrongContent, wrongSize } from './file-rules.js';

type Inspection = { sha256: string } | { refusal: string };

/** An upload goes from the browser straight to a slot of the store; here it is announced, then checked and kept. */
@Injectable()
export class UploadsService {
  private readonly log = new Logger('Uploads');

  constructor(
    private readonly db: TenantDatabase,
    private readonly candidates: CandidatesService,
    private readonly storage: StorageService,
    private readonly audit: AuditService,
  ) {}

  async start(input: StartUploadInput): Promise<UploadSlot | UploadRefused> {
    const document = await this.announce(input);
    if (document instanceof UploadRefused) return document;
    const { url, fields } = await this.storage.uploadForm(
      slotKey(document.id),
      document.contentType,
      LARGEST_FILE_BYTES,
    );
    return new UploadSlot(document, url, fields);
  }

  /** Asking again for a document that is ready changes nothing. */
  async finish(documentId: string): Promise<Document | UploadRefused> {
    const document = await this.db.transaction((em) => findOrThrow(em, Document, 'document', documentId));
    if (document.state === DocumentState.READY) return document;
    const inspection = await this.takeOver(document);
    if ('refusal' in inspection) return this.refuse(document, inspection.refusal);
    const kept = await this.markReady(document, inspection.sha256);
    await this.tidy(slotKey(documentId));
    return kept;
  }

  private announce(input: StartUploadInput): Promise<Document | UploadRefused> {
    return this.db.transaction(async (em) => {
      const { candidate } = await this.candidates.lockChangeable(em, input.candidateId);
      const accepted = acceptFile(input);
      if ('refusal' in accepted) return new UploadRefused(accepted.refusal);
      const expected = em.create(Document, {
        ...accepted,
        candidateId: candidate.id,
        quoteId: null,
        state: DocumentState.EXPECTED,
        sizeBytes: input.sizeBytes,
        sha256: null,
        uploadedBy: currentMembershipId(),
      });
      return em.save(expected);
    });
  }

  /** Copies first and looks at the copy: the slot could still be written to while it is read. */
  private async takeOver(document: Document): Promise<Inspection> {
    const copy = checkKey(document.id, randomUUID());
    const inspection = await this.inspect(document, copy);
    if ('sha256' in inspection) await this.storage.copy(copy, documentKey(document.id, inspection.sha256));
    await this.tidy(copy);
    return inspection;
  }

  private async inspect(
    { id, fileName, contentType, sizeBytes }: Document,
    copy: string,
  ): Promise<Inspection> {
    const arrived = await this.storage.sizeOf(slotKey(id));
    if (arrived === null) return { refusal: nothingArrived(fileName) };
    if (arrived !== sizeBytes || arrived > LARGEST_FILE_BYTES) return { refusal: wrongSize(fileName) };
    const isCopied = await this.storage.copy(slotKey(id), copy);
    if (!isCopied) return { refusal: nothingArrived(fileName) };
    const copied = await this.storage.sizeOf(copy);
    if (copied !== sizeBytes) return { refusal: wrongSize(fileName) };
    const bytes = await this.storage.read(copy);
    if (!(await isContentOf(bytes, contentType))) return { refusal: wrongContent(fileName) };
    return { sha256: sha256Of(bytes) };
  }

  private markReady({ id }: Document, sha256: string): Promise<Document> {
    return this.db.transaction(async (em) => {
      const { candidateId } = await findOrThrow(em, Document, 'document', id);
      const { candidate } = await this.candidates.lockChangeable(em, candidateId);
      const document = await findOrThrow(em, Document, 'document', id);
      if (document.state === DocumentState.READY) return document;
      document.state = DocumentState.READY;
      document.sha256 = sha256;
      await em.save(document);
      const data = { fileName: document.fileName, sha256, detail: `${candidate.code} ${candidate.name}` };
      await this.audit.record(em, 'document.uploaded', { roundId: candidate.roundId, objectId: id, data });
      return document;
    });
  }

  /** What was decided stands, even if the store no longer answers. */
  private async tidy(key: string): Promise<void> {
    await this.storage.delete(key).catch(() => this.log.warn(`${key} could not be removed`));
  }

  /**
   * The row goes first, because nobody reaches an object without one. Without a row to remove, the same upload was
   * finished meanwhile by another request, and its answer stands.
   */
  private async refuse({ id }: Document, refusal: string): Promise<Document | UploadRefused> {
    const finished = await this.db.transaction(async (em) => {
      const { affected } = await em.delete(Document, { id, state: DocumentState.EXPECTED });
      return affected ? null : findOrThrow(em, Document, 'document', id);
    });
    if (finished) return finished;
    await this.tidy(slotKey(id));
    return new UploadRefused(refusal);
  }
}
