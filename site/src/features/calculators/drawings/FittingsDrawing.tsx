import type { PlainRow } from '#calc/index.ts'
import { fittings } from '#calc/pipe/fittings.ts'
import { format, join } from '#calc/units/format.ts'
import { Framed } from '../../../components/Framed.tsx'
import { rowsOf, textWidth, type DrawingProps } from './Drawing.tsx'

const rowHeight = 50
const pipe = 12

const words: Readonly<Record<string, string>> = fittings.outputs.rows.columns.kind.words
const kindWords = (kind: string): string => words[kind] ?? kind

const nameOf = (row: PlainRow): string => {
  const count = Number(row['count'])
  const kind = kindWords(String(row['kind']))
  return count === 1 ? kind : `${count} × ${kind}`
}

/** Down the pipe, each fitting with the head that it takes as a bar, all to one scale. */
export function FittingsDrawing({ found }: DrawingProps) {
  const rows = rowsOf(found, 'rows').map((row) => ({
    name: nameOf(row),
    loss: Number(row['headLoss']),
    said: join(format(Number(row['headLoss']), 'head')),
  }))
  const most = Math.max(...rows.map(({ loss }) => loss))
  if (rows.length === 0 || most === 0) return null
  const foot = rows.length * rowHeight + 16

  return (
    <Framed
      name={`Head lost by each fitting along the pipe: ${rows.map(({ name, said }) => `${name} ${said}`).join(', ')}`}
      draw={(width) => {
        const start = 34
        const longest = width - start - Math.max(...rows.map(({ said }) => textWidth(said))) - 20
        return {
          height: foot,
          lines: (
            <g fill="none">
              <path d={`M${pipe} 0V${foot}`} stroke="var(--ink)" strokeWidth="14" />
              <path d={`M${pipe} 0V${foot}`} stroke="var(--water-fill)" strokeWidth="9" />
              {rows.map(({ name, loss, said }, i) => {
                const y = i * rowHeight + 40
                const length = Math.max((longest * loss) / most, 1)
                return (
                  <g key={i}>
                    <path d={`M${pipe - 10} ${y}h20`} stroke="var(--ink)" strokeWidth="5" />
                    <text x={start} y={y - 16} fontSize="15" fill="var(--ink)">
                      {name}
                    </text>
                    <path
                      d={`M${start} ${y - 8}h${length}v16h${-length}z`}
                      fill="var(--rust-fill)"
                      stroke="var(--rust)"
                      strokeWidth="1.5"
                    />
                    <text x={start + length + 8} y={y + 5} fontSize="15" fontWeight="600" fill="var(--rust)">
                      {said}
                    </text>
                  </g>
                )
              })}
            </g>
          ),
        }
      }}
    />
  )
}
