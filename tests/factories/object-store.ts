import { createServer, type IncomingMessage, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { AwsV4Signer } from 'aws4fetch'

const whole = async (request: IncomingMessage): Promise<Buffer> => {
  const parts: Buffer[] = []
  for await (const part of request) parts.push(part as Buffer)
  return Buffer.concat(parts)
}

/**
 * As much of the S3 protocol as storing needs, in memory: one bucket, objects put,
 * got, asked for and deleted, every request signed (AWS Signature Version 4) or refused.
 */
export class ObjectStore {
  readonly objects = new Map<string, Buffer>()
  /** Answers this status to everything, as a store in trouble does. */
  trouble: number | null = null
  private constructor(private readonly server: Server, private readonly keys: { id: string, secret: string, region: string }) {}

  static async start(keys = { id: 'KEY/ID', secret: 'secret+with/signs', region: 'eu-west-1' }): Promise<ObjectStore> {
    const server = createServer()
    const store = new ObjectStore(server, keys)
    server.on('request', (request, response) => {
      void store.answer(request).then(({ status, body }) => response.writeHead(status).end(body))
    })
    await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve))
    return store
  }

  /** For TORQUILL_FILES_URL. */
  url(bucket = 'notes', secret = this.keys.secret): string {
    const { port } = this.server.address() as AddressInfo
    return `s3://${encodeURIComponent(this.keys.id)}:${encodeURIComponent(secret)}@127.0.0.1:${port}/${bucket}?region=${this.keys.region}&insecure=1`
  }

  stop = () => new Promise<void>(resolve => this.server.close(() => resolve()))

  private async signed(request: IncomingMessage, body: Buffer): Promise<boolean> {
    const given = String(request.headers.authorization)
    const names = /SignedHeaders=([^,]+)/.exec(given)?.[1]?.split(';') ?? []
    const headers = Object.fromEntries(names.filter(name => name !== 'host').map(name => [name, String(request.headers[name])]))
    const signer = new AwsV4Signer({
      method: request.method, url: `http://${request.headers.host}${request.url}`, headers, body: body.length ? new Uint8Array(body) : undefined,
      accessKeyId: this.keys.id, secretAccessKey: this.keys.secret, service: 's3', region: this.keys.region, datetime: String(request.headers['x-amz-date']),
    })
    return given === await signer.authHeader()
  }

  private async answer(request: IncomingMessage): Promise<{ status: number, body?: Buffer | string }> {
    const body = await whole(request)
    if (this.trouble) return { status: this.trouble, body: '<Error/>' }
    if (!await this.signed(request, body)) return { status: 403, body: '<Error><Code>SignatureDoesNotMatch</Code></Error>' }
    const path = decodeURIComponent(request.url ?? '')
    if (!path.startsWith('/notes/')) return { status: 404, body: '<Error><Code>NoSuchBucket</Code></Error>' }
    if (request.method === 'PUT') this.objects.set(path, body)
    const found = this.objects.get(path)
    if (!found) return { status: 404, body: '<Error><Code>NoSuchKey</Code></Error>' }
    return { status: 200, body: request.method === 'GET' ? found : undefined }
  }
}
