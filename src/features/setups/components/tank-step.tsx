import type { Gear, GearItem } from '#shared/schemas/gear'
import { describeSpecs } from '../../../lib/describe-specs'
import { usePrinter } from '../../../lib/use-printer'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import { sizePart } from '../model/form-sections'
import type { FormTexts } from './field-grid'
import { FormPartFields } from './form-part'
import { FormStep } from './form-step'
import { PieceSearch } from './piece-search'

export interface TankStepProps {
  readonly slug: string | undefined
  readonly tank: Gear | undefined
  readonly findTank: string
  readonly found: readonly GearItem[] | undefined
  readonly form: FormTexts
}

/** Which tank it is, or its sizes; sizes of one's own go before the catalogue's. */
export function TankStep({ slug, tank, findTank, found, form }: TankStepProps) {
  const printer = usePrinter()
  return (
    <FormStep number={1} id="tank" title="The tank">
      {slug === undefined ? (
        <PieceSearch
          name="findTank"
          label="Look your tank up"
          hint="Its brand and model. If it is not there, its volume alone is enough to begin with."
          text={findTank}
          kind="tank"
          found={found}
          addLabel="This is mine"
        />
      ) : (
        <div className="border border-rule bg-sheet p-4">
          <input type="hidden" name="tank.gear" value={slug} />
          <p className="font-heading text-lg font-bold">{tank ? `${tank.brand} · ${tank.model}` : slug}</p>
          {tank && <p className="text-sm text-ink-soft">{describeSpecs('tank', tank.specs, printer)}</p>}
          <p className="mt-1 text-sm">
            Its recorded measures are used. What you measure yourself goes before them: type it below.
          </p>
          <Button type="submit" size="sm" className="mt-3" formAction={paths.setupNew} name="drop" value="tank">
            It is another tank
          </Button>
        </div>
      )}
      <FormPartFields part={sizePart} form={form} />
    </FormStep>
  )
}
