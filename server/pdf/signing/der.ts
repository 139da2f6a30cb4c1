import { BitString, Boolean as Asn1Boolean, Constructed, fromBER, GeneralizedTime, Integer, ObjectIdentifier, OctetString, Primitive, Sequence, Set as Asn1Set, UTCTime, Utf8String, type BaseBlock } from 'asn1js'

/** Few words for the ASN.1 that certificates and signatures are made of. Everything is written in DER. */

const buffer = (bytes: Uint8Array) => new Uint8Array(bytes).buffer

export type Block = BaseBlock
export const sequence = (...value: Block[]): Block => new Sequence({ value })
export const set = (...value: Block[]): Block => new Asn1Set({ value })
export const oid = (value: string): Block => new ObjectIdentifier({ value })
export const octets = (bytes: Uint8Array): Block => new OctetString({ valueHex: buffer(bytes) })
export const bits = (bytes: Uint8Array, unusedBits = 0): Block => new BitString({ valueHex: buffer(bytes), unusedBits })
export const integer = (value: number): Block => new Integer({ value })
/** An unsigned integer of any length. */
export const bigInteger = (bytes: Uint8Array): Block => Integer.fromBigInt(`0x${Buffer.from(bytes).toString('hex')}`)
export const truth = (): Block => new Asn1Boolean({ value: true })
export const text = (value: string): Block => new Utf8String({ value })
/** Constructed and tagged in the context: `[n] { … }`. */
export const tagged = (tagNumber: number, ...value: Block[]): Block => new Constructed({ idBlock: { tagClass: 3, tagNumber }, value })
/** Primitive and tagged in the context: `[n] bytes`. */
export const taggedBytes = (tagNumber: number, bytes: Uint8Array): Block => new Primitive({ idBlock: { tagClass: 3, tagNumber }, valueHex: buffer(bytes) })
/** RFC 5280: two-digit years up to 2049. */
export const time = (value: Date): Block => value.getUTCFullYear() < 2050 ? new UTCTime({ valueDate: value }) : new GeneralizedTime({ valueDate: value })

export const encode = (block: Block): Buffer => Buffer.from(block.toBER(false))

/** Reads one value that fills the bytes. @throws when it does not, or is not in DER. */
export function decode(bytes: Uint8Array): Block {
  const { offset, result } = fromBER(buffer(bytes))
  if (offset !== bytes.length || !encode(result).equals(bytes)) throw new Error('not DER')
  return result
}

/** The members of a constructed value; empty for any other. */
export const members = (block: Block | undefined): Block[] => block instanceof Constructed ? block.valueBlock.value as Block[] : []

/** The bytes of an octet string, or nothing. */
export const bytesOf = (block: Block | undefined): Buffer | null => block instanceof OctetString ? Buffer.from(block.getValue()) : null
