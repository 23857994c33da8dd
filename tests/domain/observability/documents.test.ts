// @vitest-environment jsdom
import { describe, expect, it } from 'vitest'
import { answerCsv } from '@/lib/domain/observability/answerCsv'
import { answerTable } from '@/lib/domain/observability/answerTable'
import { describeCapabilities } from '@/lib/domain/observability/describeCapabilities'
import { errorTable } from '@/lib/domain/observability/errorTable'
import type { Observability } from '@/lib/domain/observability/findObservability'
import { readAsked } from '@/lib/domain/observability/readAsked'

const votableNamespace = 'http://www.ivoa.net/xml/VOTable/v1.3'

function read(text: string): Document {
  const document = new DOMParser().parseFromString(text, 'text/xml')
  expect(document.querySelector('parsererror')).toBeNull()
  return document
}

const found: Observability = {
  asked: readAsked(new URLSearchParams('POS=52,-27.8&TIME=61430/61432')),
  engine: '9.9.9',
  fromMjd: 61430,
  toMjd: 61432,
  isCutShort: false,
  rows: [
    { startMjd: 61430.07147519676, stopMjd: 61430.25, facility: 'Aldous <&"> 1' },
    { startMjd: 61431.25, stopMjd: 61431.5, facility: 'Fennel' },
  ],
  isOverflow: false,
}

const all = (document: Document, name: string) => [...document.getElementsByTagNameNS(votableNamespace, name)]
const statuses = (document: Document) =>
  all(document, 'INFO')
    .filter((info) => info.getAttribute('name') === 'QUERY_STATUS')
    .map((info) => info.getAttribute('value'))

describe('an answer as a VOTable', () => {
  const document = read(answerTable(found, 'https://x.example'))

  it('is of version 1.4, its results first and then the service', () => {
    const root = document.documentElement
    expect([root.namespaceURI, root.localName, root.getAttribute('version')]).toEqual([
      votableNamespace,
      'VOTABLE',
      '1.4',
    ])
    expect(all(document, 'RESOURCE').map((resource) => resource.getAttribute('type'))).toEqual([
      'results',
      'meta',
    ])
    expect(statuses(document)).toEqual(['OK'])
  })

  it('has the columns of the draft, with unit, UCD and utype, in the order of the cells', () => {
    const fields = all(document, 'FIELD').map((field) =>
      ['name', 'unit', 'ucd', 'utype'].map((key) => field.getAttribute(key)),
    )
    expect(fields.slice(0, 4)).toEqual([
      ['t_validity', 'd', 'time.validity', 'Char.TimeAxis.Coverage.Time'],
      ['t_start', 'd', 'time.start', 'Char.TimeAxis.Coverage.Bounds.Limits.StartTime'],
      ['t_stop', 'd', 'time.end', 'Char.TimeAxis.Coverage.Bounds.Limits.StopTime'],
      ['t_observability', 's', 'time.duration', 'Char.TimeAxis.Coverage.Support.Extent'],
    ])
    const rows = all(document, 'TR').map((row) => [...row.children].map((cell) => cell.textContent))
    expect(rows).toEqual([
      [
        '61432.00000000',
        '61430.07147520',
        '61430.25000000',
        '15424.543',
        'Aldous <&"> 1',
        'Noctuary sky 9.9.9',
      ],
      ['61432.00000000', '61431.25000000', '61431.50000000', '21600.000', 'Fennel', 'Noctuary sky 9.9.9'],
    ])
    for (const row of rows) expect(row).toHaveLength(fields.length)
  })

  it('says what its times are measured in', () => {
    const [system] = all(document, 'TIMESYS')
    expect([system?.getAttribute('timescale'), system?.getAttribute('timeorigin')]).toEqual([
      'UTC',
      'MJD-origin',
    ])
    const timed = all(document, 'FIELD').filter(
      (field) => field.getAttribute('ref') === system?.getAttribute('ID'),
    )
    expect(timed.map((field) => field.getAttribute('name'))).toEqual(['t_validity', 't_start', 't_stop'])
  })

  it('tells an overflow after its rows, and a limit of its own', () => {
    const cut = read(answerTable({ ...found, isOverflow: true, isCutShort: true }, 'https://x.example'))
    expect(statuses(cut)).toEqual(['OK', 'OVERFLOW'])
    const last = all(cut, 'RESOURCE')[0]?.lastElementChild
    expect([last?.localName, last?.getAttribute('value')]).toEqual(['INFO', 'OVERFLOW'])
    const limit = all(cut, 'INFO').find((info) => info.getAttribute('name') === 'T_MAX_HARD_LIMIT')
    expect(limit?.getAttribute('value')).toBe('61432.00000000')
  })

  it('is CSV of the same cells when asked for', () => {
    expect(answerCsv(found).split('\r\n').slice(0, 3)).toEqual([
      't_validity,t_start,t_stop,t_observability,facility,validity_predictor',
      '61432.00000000,61430.07147520,61430.25000000,15424.543,"Aldous <&""> 1",Noctuary sky 9.9.9',
      '61432.00000000,61431.25000000,61431.50000000,21600.000,Fennel,Noctuary sky 9.9.9',
    ])
  })
})

it('a failure is a VOTable of the sentence', () => {
  const document = read(errorTable('POS <is> wanted & missing.'))
  expect(statuses(document)).toEqual(['ERROR'])
  expect(all(document, 'INFO')[0]?.textContent).toBe('POS <is> wanted & missing.')
})

it('the capabilities lead to the three resources', () => {
  const document = read(describeCapabilities('https://x.example'))
  expect(document.documentElement.namespaceURI).toBe('http://www.ivoa.net/xml/VOSICapabilities/v1.0')
  const led = [...document.querySelectorAll('capability')].map((capability) => [
    capability.getAttribute('standardID'),
    capability.querySelector('accessURL')?.textContent,
  ])
  expect(led).toEqual([
    ['ivo://ivoa.net/std/VOSI#capabilities', 'https://x.example/api/vo/observability/capabilities'],
    ['ivo://ivoa.net/std/VOSI#availability', 'https://x.example/api/vo/observability/availability'],
    ['ivo://ivoa.net/std/ObjObsSAP#query-0.3', 'https://x.example/api/vo/observability/query'],
  ])
})
