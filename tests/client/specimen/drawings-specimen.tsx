import { useState } from 'react'
import type { Printer } from '#shared/units/print'
import { ChamberDetail } from '../../../src/components/drawings/chamber-detail'
import { Gauge } from '../../../src/components/drawings/gauge'
import { SharedScale } from '../../../src/components/drawings/shared-scale'
import { TankPlan } from '../../../src/components/drawings/tank-plan'
import { TankSection } from '../../../src/components/drawings/tank-section'
import { MeasureField } from '../../../src/components/ui/measure-field'
import { Popover } from '../../../src/components/ui/popover'
import { JudgedSpecimen } from './judged-specimen'
import { leaningTank, manyChambers, marks, nameOf, scales, standingTank } from './invented'

export function DrawingsSpecimen({ printer }: { readonly printer: Printer }) {
  const [selected, setSelected] = useState<string | null>(null)
  const [edit, setEdit] = useState<{ path: string; target: Element } | null>(null)
  const onEdit = (path: string, target: Element) => setEdit({ path, target })
  const editHref = (path: string) => `#${path}`
  return (
    <div className="mt-8 grid gap-8">
      {[standingTank, leaningTank, manyChambers].map((drawing, at) => (
        <div key={at} data-tank={at} className="grid gap-4 md:grid-cols-2">
          <TankPlan drawing={drawing} printer={printer} onEdit={onEdit} editHref={editHref} />
          <TankSection drawing={drawing} printer={printer} onEdit={onEdit} editHref={editHref} />
        </div>
      ))}
      <div className="grid gap-4 md:grid-cols-2">
        {[standingTank, leaningTank].map(
          (drawing, at) =>
            drawing.chambers[0] && (
              <ChamberDetail
                key={at}
                chamber={drawing.chambers[0]}
                at={0}
                given={drawing.given}
                printer={printer}
                {...(drawing.rod && { rod: drawing.rod })}
              />
            ),
        )}
      </div>
      <JudgedSpecimen printer={printer} />
      <div className="grid gap-6">
        {scales.map((scale) => (
          <SharedScale
            key={scale.key}
            scale={scale}
            marks={marks}
            printer={printer}
            nameOf={nameOf}
            selected={selected}
            onPick={setSelected}
          />
        ))}
      </div>
      <div className="grid max-w-3xl gap-6 md:grid-cols-2">
        <Gauge label="Length" unit="mm" printer={printer} value={269} limit={305} margin={0.118} outcome="pass" />
        <Gauge label="Length" unit="mm" printer={printer} value={318} limit={305} margin={-0.04} outcome="fail" />
        <Gauge label="Power" unit="W" printer={printer} value={90} limit={[75, 150]} margin={0.2} outcome="pass" />
        <Gauge label="Power" unit="W" printer={printer} value={62} limit={75} margin={-0.17} outcome="change" />
        <Gauge label="Power" unit="W" printer={printer} value={null} limit={75} margin={null} outcome="nodata" />
      </div>
      <div className="grid max-w-2xl grid-cols-1 gap-6 sm:grid-cols-3">
        <Gauge
          size="small"
          label="Length"
          unit="mm"
          printer={printer}
          value={269}
          limit={305}
          margin={0.118}
          outcome="pass"
        />
        <Gauge
          size="small"
          label="Length"
          unit="mm"
          printer={printer}
          value={304}
          limit={305}
          margin={0.003}
          outcome="pass"
        />
        <Gauge
          size="small"
          label="Power"
          unit="W"
          printer={printer}
          value={400}
          limit={[75, 150]}
          margin={-2}
          outcome="fail"
        />
      </div>
      <Popover anchor={edit?.target ?? null} onClose={() => setEdit(null)} label="Type a measure">
        <MeasureField id="edit" name={edit?.path ?? 'edit'} label={edit?.path ?? ''} defaultValue="" />
      </Popover>
    </div>
  )
}
