import type { Response, Test } from 'supertest';

/** The answer with its body as the bytes that came, whatever their type. */
export function bytesOf(request: Test): Promise<Response & { body: Buffer }> {
  return request.buffer(true).parse((message, done) => {
    const chunks: Buffer[] = [];
    message.on('data', (chunk: Buffer) => chunks.push(Buffer.from(chunk)));
    message.on('end', () => done(null, Buffer.concat(chunks)));
  }) as unknown as Promise<Response & { body: Buffer }>;
}
