import { createHash, sign, type KeyObject } from 'node:crypto'
import { bytesOf, decode, encode, integer, members, octets, oid, sequence, set, tagged, type Block } from '#server/pdf/signing/der'

/** Object identifiers of RFC 5652, RFC 5035 and RFC 5758. */
const OID = {
  data: '1.2.840.113549.1.7.1',
  signedData: '1.2.840.113549.1.7.2',
  contentType: '1.2.840.113549.1.9.3',
  messageDigest: '1.2.840.113549.1.9.4',
  signingCertificateV2: '1.2.840.113549.1.9.16.2.47',
  sha256: '2.16.840.1.101.3.4.2.1',
  ecdsaWithSha256: '1.2.840.10045.4.3.2',
} as const

const attribute = (type: string, value: Block) => sequence(oid(type), set(value))
const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest()

/** What a signature is made of: everything else follows from it, byte for byte. */
export interface SignatureParts {
  /** SHA-256 of the signed bytes. */
  digest: Buffer
  /** DER. */
  certificate: Buffer
  root: Buffer
}

/** Issuer and serial number as they stand in a certificate (version, serial, algorithm, issuer, …). */
function issuerAndSerial(certificate: Buffer): { issuer: Block, serial: Block } {
  const [, serial, , issuer] = members(members(decode(certificate))[0])
  if (!serial || !issuer) throw new Error('not a certificate of version 3')
  return { issuer, serial }
}

/**
 * The signed attributes of PAdES B-B: content type, message digest and signing
 * certificate, in the order DER wants of a set. No signing time: the claimed
 * time stands in the signature dictionary.
 */
function signedAttributes({ digest, certificate }: SignatureParts): Block[] {
  const { issuer, serial } = issuerAndSerial(certificate)
  // The hash algorithm is SHA-256, the default, and DER leaves a default out.
  const certificateId = sequence(octets(sha256(certificate)), sequence(sequence(tagged(4, issuer)), serial))
  return [
    attribute(OID.contentType, oid(OID.data)),
    attribute(OID.messageDigest, octets(digest)),
    attribute(OID.signingCertificateV2, sequence(sequence(certificateId))),
  ].sort((a, b) => Buffer.compare(encode(a), encode(b)))
}

/** The bytes that the signature value is made over: the attributes as a set. */
export const bytesToSign = (parts: SignatureParts): Buffer => encode(set(...signedAttributes(parts)))

/** The CMS object with the signer's certificate and the root and nothing else. */
export function encodeCms(parts: SignatureParts, signature: Buffer): Buffer {
  const { issuer, serial } = issuerAndSerial(parts.certificate)
  const certificates = [parts.certificate, parts.root].sort(Buffer.compare).map(decode)
  const signerInfo = sequence(
    integer(1), sequence(issuer, serial), sequence(oid(OID.sha256)),
    tagged(0, ...signedAttributes(parts)),
    sequence(oid(OID.ecdsaWithSha256)), octets(signature),
  )
  const signedData = sequence(integer(1), set(sequence(oid(OID.sha256))), sequence(oid(OID.data)), tagged(0, ...certificates), set(signerInfo))
  return encode(sequence(oid(OID.signedData), tagged(0, signedData)))
}

/** Signs a digest with a key on P-256. */
export const signDigest = (parts: SignatureParts, key: KeyObject): Buffer =>
  encodeCms(parts, sign('sha256', bytesToSign(parts), { key, dsaEncoding: 'der' }))

/**
 * The two things of a CMS object that cannot be foreseen: whose certificate it
 * carries beside the root, and the signature value. Nothing is believed here:
 * the verifier makes the whole object again from them and compares bytes.
 */
export function readCms(cms: Buffer, root: Buffer): { certificate: Buffer, signature: Buffer } {
  const [, content] = members(decode(cms))
  const [, , , certificates, signerInfos] = members(members(content)[0])
  const others = members(certificates).map(encode).filter(bytes => !bytes.equals(root))
  const signature = bytesOf(members(members(signerInfos)[0])[5])
  if (others.length !== 1 || !others[0] || !signature) throw new Error('not a signature of this authority')
  return { certificate: others[0], signature }
}
