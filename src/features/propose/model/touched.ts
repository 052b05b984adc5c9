import { getAttribute } from '#shared/kinds/index'
import type { UnitSystem } from '#shared/units/systems'
import { isSameTyped, saysMore } from './compare-typed'
import { spellSpec } from './rebase'
import type { FormBase, TypedForm } from './typed-form'

/** What was typed and nothing else, each bare number with its unit: it can be laid over a later record, in any units. */
export function pickTouched(base: FormBase, typed: TypedForm, system: UnitSystem): TypedForm {
  const specs = Object.entries(typed.specs).flatMap(([key, spec]) => {
    const was = base.typed.specs[key]
    const isTouched = was === undefined || !isSameTyped(spec, was) || saysMore(spec)
    return isTouched ? [[key, spellSpec(getAttribute(base.kind, key), spec, system)] as const] : []
  })
  const identity = Object.fromEntries(
    Object.entries(typed.identity).filter(
      ([key, text]) => text !== base.typed.identity[key as keyof TypedForm['identity']],
    ),
  )
  return { ...typed, identity: identity as unknown as TypedForm['identity'], specs: Object.fromEntries(specs) }
}

/** The form with what was typed earlier laid over the record as it is now. */
export function layOver(base: FormBase, touched: TypedForm): TypedForm {
  return {
    ...base.typed,
    ...touched,
    identity: { ...base.typed.identity, ...touched.identity },
    specs: { ...base.typed.specs, ...touched.specs },
  }
}
