import { createHash, randomBytes, sign, type KeyObject } from 'node:crypto'
import { bigInteger, bits, decode, encode, integer, members, octets, oid, sequence, set, tagged, taggedBytes, text, time, truth, type Block } from '#server/pdf/signing/der'

const OID = {
  commonName: '2.5.4.3', organisation: '2.5.4.10', ecdsaWithSha256: '1.2.840.10045.4.3.2',
  subjectKey: '2.5.29.14', keyUsage: '2.5.29.15', basicConstraints: '2.5.29.19', authorityKey: '2.5.29.35', extendedKeyUsage: '2.5.29.37',
  // Both: without emailProtection common PDF readers' certificate stores do not trust a document signer.
  emailProtection: '1.3.6.1.5.5.7.3.4', documentSigning: '1.3.6.1.5.5.7.3.36',
} as const

export interface CertificateOrder {
  subject: string
  publicKey: KeyObject
  /** Who signs it: for a root the subject itself. */
  issuer: { name: string, publicKey: KeyObject, privateKey: KeyObject }
  authority: boolean
  from: Date
  until: Date
}

const name = (common: string) => sequence(
  set(sequence(oid(OID.organisation), text('Torquill'))),
  set(sequence(oid(OID.commonName), text(common))),
)
const extension = (id: string, critical: boolean, value: Block) => sequence(oid(id), ...(critical ? [truth()] : []), octets(encode(value)))

const keyInfo = (key: KeyObject) => decode(key.export({ type: 'spki', format: 'der' }))
/** RFC 5280 §4.2.1.2, method 1: the hash of the key's bits. */
function keyId(key: KeyObject): Buffer {
  const encoded = encode(members(keyInfo(key))[1] ?? octets(Buffer.alloc(0)))
  // A bit string of a P-256 point: tag, length and the count of unused bits come first.
  return createHash('sha1').update(encoded.subarray(3)).digest()
}

function extensions({ authority, publicKey, issuer }: CertificateOrder): Block[] {
  // Bits of key usage: 0 digitalSignature, 1 nonRepudiation, 5 keyCertSign, 6 cRLSign.
  const usage = authority ? bits(Uint8Array.of(0b0000_0110), 1) : bits(Uint8Array.of(0b1100_0000), 6)
  return [
    extension(OID.basicConstraints, true, authority ? sequence(truth(), integer(0)) : sequence()),
    extension(OID.keyUsage, true, usage),
    extension(OID.subjectKey, false, octets(keyId(publicKey))),
    extension(OID.authorityKey, false, sequence(taggedBytes(0, keyId(issuer.publicKey)))),
    ...(authority ? [] : [extension(OID.extendedKeyUsage, false, sequence(oid(OID.emailProtection), oid(OID.documentSigning)))]),
  ]
}

/** Makes an X.509 certificate, version 3, on P-256 with SHA-256. DER. */
export function makeCertificate(order: CertificateOrder): Buffer {
  const algorithm = sequence(oid(OID.ecdsaWithSha256))
  const serial = randomBytes(16)
  serial[0] = (serial[0] ?? 0) & 0x7F | 0x40
  const body = sequence(
    tagged(0, integer(2)), bigInteger(serial), algorithm, name(order.issuer.name),
    sequence(time(order.from), time(order.until)), name(order.subject), keyInfo(order.publicKey),
    tagged(3, sequence(...extensions(order))),
  )
  const signature = sign('sha256', encode(body), { key: order.issuer.privateKey, dsaEncoding: 'der' })
  return encode(sequence(body, algorithm, bits(signature)))
}
