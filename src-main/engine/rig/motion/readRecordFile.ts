import { faultText } from '../faultText'
import type { Loose } from '../form/loose'
import type { DimensionName } from '../formula/dimension'
import { scaleByUnit } from '../formula/scaleByUnit'
import type { Place } from '../place'
import { readQuantity, readQuantityFormula } from '../readQuantity'
import type { Reading } from '../reading'
import { checkRecordPath } from './checkRecordPath'
import { quote } from '../showValue'
import { parseRecord } from './parseRecord'
import type { Columns } from './readPairs'

type ColumnForm = string | number | { name?: string; number?: number; unit?: string }

interface FileForm {
  file?: string
  columns?: Loose<{ time: ColumnForm; value: ColumnForm }>
}

/**
 * Reads two columns of a record beside the rig.
 * @param reading gets `record-path`, `record-refused` and the faults of units
 * @param place of the pulse that names the record
 * @param form its file and columns
 * @param dimension of the values
 * @returns times and values in SI, or null where anything is faulty
 */
export function readRecordFile(
  reading: Reading,
  place: Place,
  form: FileForm,
  dimension: DimensionName,
): Columns | null {
  if (form.file === undefined) return null
  const filePlace: Place = [...place, 'file']
  const refuse = (why: string): null => {
    reading.faults.add(filePlace, faultText.recordRefused(why))
    return null
  }
  const why = checkRecordPath(form.file)
  if (why !== null) {
    reading.faults.add(filePlace, faultText.recordPath(form.file, why))
    return null
  }
  if (reading.readRecord === null) return refuse('there is no folder beside the rig to read records from')
  const text = reading.readRecord(form.file)
  if (typeof text !== 'string')
    return refuse(`the record ${quote(form.file)} cannot be read: ${text.refused}`)
  const record = parseRecord(text)
  if ('refused' in record) return refuse(`in ${quote(form.file)}: ${record.refused}`)
  const columns = [
    readColumn(reading, place, 'time', form.columns?.time ?? 1, record, 'time'),
    readColumn(reading, place, 'value', form.columns?.value ?? 2, record, dimension),
  ]
  if (columns[0] === null || columns[1] === null) return null
  const [first, second] = columns as number[][]
  const late = first.findIndex((time, i) => i > 0 && time <= first[i - 1])
  if (late === -1) return { first, second }
  return refuse(
    `in ${quote(form.file)}: times must rise from row to row; row ${late + record.firstRow} does not come after the one before it`,
  )
}

function readColumn(
  reading: Reading,
  place: Place,
  key: 'time' | 'value',
  form: ColumnForm,
  record: { headings: string[]; columns: number[][] },
  dimension: DimensionName,
): number[] | null {
  const at: Place = [...place, 'columns', key]
  const { name, number, unit } =
    typeof form === 'object' ? form : typeof form === 'number' ? { number: form } : { name: form }
  const refuse = (why: string): null => {
    reading.faults.add(at, faultText.recordRefused(why))
    return null
  }
  if ((name === undefined) === (number === undefined))
    return refuse('name the column by either its name or its number')
  const count = record.columns.length
  if (number !== undefined && number > count)
    return refuse(`there is no column ${number}; the record has ${count}`)
  const named = record.headings.flatMap((heading, i) =>
    name !== undefined && isHeading(heading, name) ? [i] : [],
  )
  if (number === undefined && named.length !== 1) {
    const found = named.length === 0 ? 'no column' : `${named.length} columns`
    return refuse(
      `the record has ${found} ${quote(name ?? '')}; its headings are ${record.headings.map(quote).join(', ')}`,
    )
  }
  const index = number === undefined ? named[0] : number - 1
  const factor = readUnit(reading, [...at, 'unit'], unit, record.headings[index] ?? '', dimension, refuse)
  return factor === null ? null : record.columns[index].map((value) => scaleByUnit(value, factor))
}

/** Takes the unit that is given, else the one in the brackets of the heading. */
function readUnit(
  reading: Reading,
  place: Place,
  unit: string | undefined,
  heading: string,
  dimension: DimensionName,
  refuse: (why: string) => null,
): number | null {
  if (unit !== undefined) return readQuantity(reading, place, unit, dimension)
  const bracket = /[[(]([^[\]()]+)[\])]\s*$/.exec(heading)
  if (bracket === null) {
    return refuse(
      `the heading ${quote(heading)} has no unit in brackets, such as "F [kN]"; give the column as an object with a unit`,
    )
  }
  const formula = readQuantityFormula(reading, place.slice(0, -1), bracket[1], dimension, 'none')
  return formula === null ? null : formula.fixed
}

function isHeading(heading: string, name: string): boolean {
  const bare = heading.replace(/\s*[[(][^[\]()]*[\])]\s*$/, '')
  return heading === name.trim() || bare === name.trim()
}
