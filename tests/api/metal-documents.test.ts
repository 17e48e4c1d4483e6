import { createHash, randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { LotDetail } from '#shared/contracts/lot.ts';
import { buildLot } from '#tests/factories/build-lot.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let lotId: string;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  lotId = (await buildLot(server.services)).id;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const pdf = Buffer.from('%PDF-1.7\n1 0 obj <<>> endobj\ntrailer <<>>\n%%EOF');

const upload = (content: Buffer, { name = 'certificate.pdf', type = 'application/pdf' } = {}) =>
  owner.client.post(`/api/lots/${lotId}/documents`).query({ name }).set('Content-Type', type).send(content);

describe('a document of a lot', () => {
  it('is kept, and comes back as a download that no browser runs', async () => {
    const name = 'Zertifikat № 1 "valley".pdf';
    const lot = (await upload(pdf, { name }).expect(201)).body as LotDetail;
    const document = lot.documents.at(-1);
    expect(document).toMatchObject({
      name,
      mediaType: 'application/pdf',
      bytes: pdf.length,
      sha256: createHash('sha256').update(pdf).digest('hex'),
      person: owner.user.name,
    });
    const path = `/api/lots/${lotId}/documents/${document?.id}`;
    const back = await owner.client.get(path).buffer().expect(200);
    expect(back.body).toEqual(pdf);
    expect(back.headers).toMatchObject({
      'content-type': 'application/pdf',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
      'content-disposition': `attachment; filename*=UTF-8''${encodeURIComponent(name)}`,
    });
    const elsewhere = await buildLot(server.services);
    expect((await owner.client.get(`/api/lots/${elsewhere.id}/documents/${document?.id}`)).status).toBe(404);
    expect((await owner.client.get(`/api/lots/${lotId}/documents/${randomUUID()}`)).status).toBe(404);
  });

  it.each([
    ['a page that calls itself a PDF', Buffer.from('<html><script>1</script></html>'), 'application/pdf'],
    ['a program that calls itself a photograph', Buffer.from('MZ\x90\0'), 'image/jpeg'],
    [
      'a drawing that could run',
      Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" onload="1"/>'),
      'image/svg+xml',
    ],
  ])('is refused when it is %s', async (_what, content, type) => {
    const response = await upload(content, { type });
    expect([response.status, sentenceOf(response)]).toEqual([
      400,
      expect.stringContaining('not a PDF, JPEG, PNG or WebP'),
    ]);
  });

  it('is refused when it is empty, or has no name', async () => {
    expect(problemIdOf(await upload(Buffer.alloc(0)))).toBe('invalid-request');
    expect(problemIdOf(await upload(pdf, { name: ' ' }))).toBe('invalid-request');
  });

  it('may be 10 MB and not a byte more, whether its length is told or not', async () => {
    const limit = 10 * 1024 * 1024;
    const of = (bytes: number): Buffer => Buffer.concat([pdf, Buffer.alloc(bytes - pdf.length)]);
    await upload(of(limit)).expect(201);
    const told = await upload(of(limit + 1));
    expect([told.status, problemIdOf(told)]).toEqual([413, 'too-large']);
    const cookie = owner.client.jar
      .getCookies({ domain: '127.0.0.1', path: '/', secure: false, script: false })
      .toValueString();
    const untold = await fetch(`${server.origin}/api/lots/${lotId}/documents?name=x.pdf`, {
      method: 'POST',
      headers: { 'Ladlemark-Place': 'desk', 'Content-Type': 'application/pdf', cookie },
      body: new Blob([new Uint8Array(of(limit + 1))]).stream(),
      duplex: 'half',
    } as RequestInit);
    expect(untold.status).toBe(413);
  });
});
