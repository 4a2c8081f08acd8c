import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getReportPhoto } from '@/app/api/reports/[id]/photos/[fileId]/route';
import { DELETE as removePhoto } from '@/app/api/sheets/[id]/photos/[photoId]/route';
import { POST as addPhoto, GET as listPhotos } from '@/app/api/sheets/[id]/photos/route';
import { createFileServer } from '@/db/server/file-server';
import type { ReportModel } from '@/lib/reporting/report-model';
import { mostPhotos } from '@/lib/schemas/sheet-photo';
import { keepFile } from '@/lib/services/keep-file';
import { getFile } from '@/lib/storage/storage';
import { renderReportPdf } from '@/templates/report/render';
import { pdfText } from '@/tests/helpers/pdf-text';
import { answer, ashdowns, indicator, issue, measuredJob, sign } from './measured-job';
import { Workshop } from './workshop';

let server: Server;
let folder: string;
let workshop: Workshop;

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'witnessmark-photos-'));
  server = createFileServer(folder, 'test-key').listen(0, '127.0.0.1');
  await once(server, 'listening');
  Object.assign(process.env, {
    S3_ENDPOINT: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    S3_BUCKET: 'tests',
    S3_ACCESS_KEY_ID: 'test-key',
    S3_SECRET_ACCESS_KEY: 'secret',
  });
  workshop = await Workshop.open([indicator]);
});
afterAll(async () => {
  await workshop?.close();
  server.closeAllConnections();
  server.close();
  await rm(folder, { recursive: true });
});

const picture = (red: number) =>
  sharp({ create: { width: 320, height: 200, channels: 3, background: { r: red, g: 60, b: 40 } } })
    .png()
    .toBuffer();

const upload = async (kind: 'photo' | 'nameplate' = 'photo', red = 200) => {
  const { organisationId } = workshop.viewer('inspector');
  const bytes = await picture(red);
  return workshop.as('inspector', (trx) => keepFile(trx, { organisationId, kind, name: 'shim.png', bytes }));
};

const photosOf = async (sheetId: string) => (await workshop.call(listPhotos, { params: { id: sheetId } })).body.items;
const add = (sheetId: string, body: object, as: 'inspector' | 'customer' | 'stranger' = 'inspector') =>
  workshop.call(addPhoto, { as, params: { id: sheetId }, body });

describe('photos at a sheet', () => {
  it('are added with a caption, taken away again, and stay stored', async () => {
    const { sheets } = await measuredJob(workshop, ashdowns, { 'SP-1a:S1': 0.4 });
    const { sheetId } = sheets.get('SP-1a:S1')!;
    const fileId = await upload();
    const { status, body } = await add(sheetId, { fileId, caption: ' Indicator on the nose ' });
    expect(status).toBe(201);
    expect(await photosOf(sheetId)).toMatchObject([
      { id: body.id, fileId, caption: 'Indicator on the nose', item: null, widthPx: 320, heightPx: 200 },
    ]);
    const away = () =>
      workshop.call(removePhoto, { method: 'DELETE', params: { id: sheetId, photoId: body.id }, as: 'inspector' });
    expect((await away()).status).toBe(204);
    expect((await away()).status).toBe(404);
    expect(await photosOf(sheetId)).toEqual([]);
    const kept = await workshop.as('inspector', (trx) => trx('files').where({ id: fileId }).first('key'));
    expect((await getFile(kept.key))?.bytes.length).toBeGreaterThan(100);
  });

  it('are refused in words: no such file, too many, a stranger, a customer, a closed job', async () => {
    const { jobId, sheets } = await measuredJob(workshop, ashdowns, { 'SP-1a:S1': 0.4 });
    const { sheetId } = sheets.get('SP-1a:S1')!;
    const missing = await add(sheetId, { fileId: sheetId });
    expect([missing.status, missing.body.errors]).toEqual([
      422,
      [{ pointer: '/fileId', detail: 'There is no such photo. Choose it again.' }],
    ]);
    const fileId = await upload();
    expect((await add(sheetId, { fileId }, 'stranger')).status).toBe(404);
    expect((await add(sheetId, { fileId }, 'customer')).status).toBe(403);
    for (let count = 0; count < mostPhotos; count++) expect((await add(sheetId, { fileId })).status).toBe(201);
    expect((await add(sheetId, { fileId })).status).toBe(422);
    expect((await issue(workshop, jobId, true)).status).toBe(201);
    expect((await add(sheetId, { fileId })).status).toBe(409);
  });

  it('print in the report, and its customer sees them; nobody else', async () => {
    const { jobId, sheets } = await measuredJob(workshop, ashdowns, { 'SP-1a:S1': 0.4, 'SP-2a:S1': 0.4 });
    const { sheetId } = sheets.get('SP-2a:S1')!;
    const [first, second] = [await upload('photo', 200), await upload('photo', 90)];
    await add(sheetId, { fileId: first, caption: 'Mandrel at the nose' });
    await add(sheetId, { fileId: second });
    const { body: issued } = await issue(workshop, jobId, true);
    const row = await workshop.as('inspector', (trx) => trx('reports').where({ id: issued.id }).first('model'));
    const model = row.model as ReportModel;
    const block = model.blocks.find(({ photos }) => photos)!;
    expect(block.photos).toMatchObject([
      { fileId: first, words: 'Mandrel at the nose', widthPx: 320, heightPx: 200 },
      { fileId: second, words: '' },
    ]);
    const stored = async (fileId: string) => {
      const { key } = await workshop.as('inspector', (trx) => trx('files').where({ id: fileId }).first('key'));
      return (await getFile(key))!.bytes;
    };
    const photos = { [first]: await stored(first), [second]: await stored(second) };
    const pdf = await renderReportPdf(model, photos);
    expect((await pdfText(pdf)).text).toContain('Mandrel at the nose');
    expect(pdf.toString('latin1').match(/\/Subtype \/Image/g)).toHaveLength(2);
    expect((await renderReportPdf(model, photos)).equals(pdf)).toBe(true);
    await expect(renderReportPdf(model, {})).rejects.toThrow(/was not handed over/);

    const seen = (as: 'customer' | 'stranger', fileId = first) =>
      getReportPhotoStatus(as, { id: issued.id as string, fileId });
    expect(await seen('customer')).toBe(200);
    expect(await seen('customer', await upload())).toBe(404);
    expect(await seen('stranger')).toBe(404);
    await sign(workshop, issued.id, answer('accept'));
    expect(await seen('customer', second)).toBe(200);
  });
});

const getReportPhotoStatus = async (as: 'customer' | 'stranger', params: Record<string, string>) =>
  (await workshop.call(getReportPhoto, { as, params })).status;
