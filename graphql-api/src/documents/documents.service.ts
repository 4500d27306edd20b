import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { NotFoundError } from '../common/domain-error.js';
import { documentKey } from '../storage/storage-keys.js';
import { StorageService } from '../storage/storage.service.js';
import { findOrThrow } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { DownloadLink } from './dto/upload.result.js';
import { Document, DocumentState } from './entities/document.entity.js';

interface Owned {
  id: string;
  candidateId: string;
}

@Injectable()
export class DocumentsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly storage: StorageService,
    private readonly audit: AuditService,
  ) {}

  /** Hangs an uploaded document of the candidate on one of its quotes; the caller holds the candidate's lock. */
  async attach(em: EntityManager, documentId: string, quote: Owned): Promise<void> {
    const document = await readyDocument(em, documentId);
    if (document.candidateId !== quote.candidateId) throw new NotFoundError('document', documentId);
    document.quoteId = quote.id;
    await em.save(document);
  }

  /** A link that is good for a minute; every opening is written down. */
  async open(id: string): Promise<DownloadLink> {
    const { fileName, contentType, sha256 } = await this.db.transaction(async (em) => {
      const document = await readyDocument(em, id);
      const { roundId, code, name } = await em.findOneByOrFail(Candidate, { id: document.candidateId });
      const data = { fileName: document.fileName, detail: `${code} ${name}` };
      await this.audit.record(em, 'document.opened', { roundId, objectId: id, data });
      return document;
    });
    return { url: await this.storage.downloadLink({ key: documentKey(id, sha256), fileName, contentType }) };
  }
}

type ReadyDocument = Document & { sha256: string };

/** A document that is still expected cannot be opened or attached: it is not there yet. */
async function readyDocument(em: EntityManager, id: string): Promise<ReadyDocument> {
  const document = await findOrThrow(em, Document, 'document', id);
  if (!isReady(document)) throw new NotFoundError('document', id);
  return document;
}

function isReady(document: Document): document is ReadyDocument {
  return document.state === DocumentState.READY && document.sha256 !== null;
}
