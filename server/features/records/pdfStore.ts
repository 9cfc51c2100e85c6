/** The PDF of a record: made once, at its first need after the seal, and kept with its hash for ever. */
import type { DataSource } from 'typeorm';
import { recordDocument } from '../../../shared/api/recordDocument';
import type { Panel } from '../../../shared/panel/panelSchema';
import { RecordEntity, RecordPdfEntity } from './entity';
import { recordPdf } from './pdf/recordPdf';
import { sha256Of } from './seal';

interface PdfParts {
  database: DataSource;
  baseUrl: string;
  /** The panel of a pack, by the pack's digest. */
  panelOf: (pack: string) => Promise<Panel>;
}

export class RecordPdfs {
  constructor(private readonly parts: PdfParts) {}

  /** Null when there is no such record. */
  async of(record: string): Promise<Buffer | null> {
    const kept = await this.kept(record);
    if (kept) return kept;
    const made = await this.make(record);
    if (!made) return null;
    // Two servers may make it at once: the first one kept is the PDF, and both answer with it.
    await this.parts.database.manager
      .createQueryBuilder()
      .insert()
      .into(RecordPdfEntity)
      .values({ record, content: made, sha256: sha256Of(made), madeAt: new Date() })
      .orIgnore()
      .execute();
    return this.kept(record);
  }

  private async kept(record: string): Promise<Buffer | null> {
    const row = await this.parts.database.manager.findOne(RecordPdfEntity, {
      where: { record },
      select: { record: true, content: true },
    });
    return row?.content ?? null;
  }

  private async make(id: string): Promise<Buffer | null> {
    const record = await this.parts.database.manager.findOne(RecordEntity, {
      where: { id },
      select: {
        id: true,
        content: true,
        number: true,
        digest: true,
        previousSeal: true,
        seal: true,
        sealedAt: true,
      },
    });
    if (!record) return null;
    const document = recordDocument.parse(JSON.parse(record.content));
    const { number, digest, previousSeal, seal, sealedAt } = record;
    return recordPdf({
      document,
      number,
      digest,
      previousSeal,
      seal,
      sealedAt,
      panel: await this.parts.panelOf(document.pack),
      verifyUrl: `${this.parts.baseUrl}/verify?digest=${digest}`,
    });
  }
}
