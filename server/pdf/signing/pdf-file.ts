import { NotOurs, PdfReader, type PdfValue } from '#server/pdf/signing/pdf-values'

export interface PdfObject { id: number, value: PdfValue, stream: { start: number, end: number } | null }
export type Dictionary = Map<string, PdfValue>

/** A file whose every byte has a known purpose. */
export interface PdfFile { objects: Map<number, PdfObject>, trailer: Dictionary }

const HEADER = '%PDF-1.7\n%\xFF\xFF\xFF\xFF\n'
const OBJECT = /([1-9]\d*) 0 obj\n/y
const XREF_HEAD = /xref\n0 (\d+)\n0000000000 65535 f \n/y
const XREF_ROW = /(\d{10}) 00000 n \n/y

/**
 * Takes a file apart: header, objects side by side without a gap, one table
 * of them, one trailer, one end. Updates, hidden bytes and repeated objects
 * have no place in that and are refused.
 * @throws NotOurs
 */
export function readPdfFile(bytes: Buffer): PdfFile {
  const reader = new PdfReader(bytes.toString('latin1'))
  reader.expect(HEADER)
  const objects = new Map<number, PdfObject>()
  const offsets = new Map<number, number>()
  for (let start = reader.at, head = reader.match(OBJECT); head; start = reader.at, head = reader.match(OBJECT)) {
    const id = Number(head[1])
    if (objects.has(id)) throw new NotOurs(`object ${id} stands twice`)
    offsets.set(id, start)
    objects.set(id, readObject(reader, id))
  }
  const table = reader.at
  readTable(reader, offsets)
  const trailer = readTrailer(reader, table)
  if (reader.at !== bytes.length) throw new NotOurs('bytes follow the end of the file')
  return { objects, trailer }
}

function readObject(reader: PdfReader, id: number): PdfObject {
  const value = reader.value()
  reader.expect('\n')
  let stream: PdfObject['stream'] = null
  if (reader.has('stream\n')) {
    reader.expect('stream\n')
    const length = value.kind === 'dictionary' ? value.entries.get('Length') : undefined
    if (length?.kind !== 'number' || !Number.isInteger(length.value) || length.value < 0) throw new NotOurs(`the length of object ${id} is not given`)
    stream = { start: reader.at, end: reader.at + length.value }
    reader.at = stream.end
    reader.expect('\nendstream\n')
  }
  reader.expect('endobj\n')
  return { id, value, stream }
}

function readTable(reader: PdfReader, offsets: Map<number, number>): void {
  const head = reader.match(XREF_HEAD)
  if (!head || Number(head[1]) !== offsets.size + 1) throw new NotOurs('the table of objects is not complete')
  for (let id = 1; id <= offsets.size; id++) {
    const row = reader.match(XREF_ROW)
    if (!row || Number(row[1]) !== offsets.get(id)) throw new NotOurs(`the table of objects is wrong at object ${id}`)
  }
}

function readTrailer(reader: PdfReader, table: number): Dictionary {
  reader.expect('trailer\n')
  const trailer = reader.value()
  if (trailer.kind !== 'dictionary' || [...trailer.entries.keys()].join(' ') !== 'Size Root Info ID') throw new NotOurs('the trailer is not the one that was written')
  reader.expect(`\nstartxref\n${table}\n%%EOF\n`)
  return trailer.entries
}

export const dictionary = (value: PdfValue | undefined): Dictionary => {
  if (value?.kind !== 'dictionary') throw new NotOurs('a dictionary is missing')
  return value.entries
}

/** Follows a reference; any other value is given back. */
export function resolve(file: PdfFile, value: PdfValue | undefined): PdfValue | undefined {
  return value?.kind === 'ref' ? file.objects.get(value.id)?.value : value
}

/** Every dictionary of the file, however deep, once. */
export function* dictionaries(file: PdfFile): Generator<Dictionary> {
  const waiting: PdfValue[] = [...file.objects.values()].map(object => object.value)
  for (let value = waiting.pop(); value; value = waiting.pop()) {
    if (value.kind === 'array') waiting.push(...value.items)
    if (value.kind === 'dictionary') {
      yield value.entries
      waiting.push(...value.entries.values())
    }
  }
}

/** Objects that nothing leads to from the trailer: prepared content that could be shown later. */
export function unreached(file: PdfFile): number[] {
  const reached = new Set<number>()
  const waiting: PdfValue[] = [...file.trailer.values()]
  for (let value = waiting.pop(); value; value = waiting.pop()) {
    if (value.kind === 'array') waiting.push(...value.items)
    if (value.kind === 'dictionary') waiting.push(...value.entries.values())
    if (value.kind === 'ref' && !reached.has(value.id)) {
      reached.add(value.id)
      const target = file.objects.get(value.id)
      if (!target) throw new NotOurs(`object ${value.id} is missing`)
      waiting.push(target.value)
    }
  }
  return [...file.objects.keys()].filter(id => !reached.has(id))
}
