import type { Caution as CautionOf } from '#calc/index.ts'
import { Caution } from '../../components/Caution.tsx'

/** Cautions beside what they are about. */
export const CautionList = ({ cautions = [] }: { cautions?: readonly CautionOf[] }) =>
  cautions.map(({ level, say }) => (
    <Caution key={say} level={level}>
      <p>{say}</p>
    </Caution>
  ))
