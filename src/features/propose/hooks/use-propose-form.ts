import { useDeferredValue, useMemo, useState } from 'react'
import { zodResolver } from '@hookform/resolvers/zod'
import { useForm, useWatch, type Resolver } from 'react-hook-form'
import { createPrinter } from '#shared/units/print'
import type { Gear } from '#shared/schemas/gear'
import { usePreferences } from '../../../lib/app-context'
import { askDoubts } from '../model/doubts'
import { flattenErrors } from '../model/form-errors'
import { readTyped, type ReadForm } from '../model/read-typed'
import { rebaseTyped, respellTyped } from '../model/rebase'
import { createTypedSchema } from '../model/typed-schema'
import { createBase, type FormBase, type TypedForm } from '../model/typed-form'

export type ProposeForm = ReturnType<typeof useProposeForm>

export interface ProposeFormOptions {
  readonly base: FormBase
  /** What stands in it at first: the record, or a proposal that is taken up again. */
  readonly typed: TypedForm
}

/** The form as it is typed, as it is read, and what looks unlikely in it. */
export function useProposeForm(initial: ProposeFormOptions) {
  const { system } = usePreferences()
  const printer = createPrinter(system)
  const [base, setBase] = useState(initial.base)
  const [shownIn, setShownIn] = useState(system)
  const resolver: Resolver<TypedForm, unknown, ReadForm> = (...call) =>
    zodResolver(createTypedSchema(base, system))(...call)
  const form = useForm<TypedForm, unknown, ReadForm>({
    defaultValues: initial.typed as never,
    resolver,
    // The summary above the form takes focus.
    shouldFocusError: false,
  })
  const typed = useWatch({ control: form.control }) as TypedForm

  const fill = (next: TypedForm) => form.reset(next, { keepErrors: false, keepSubmitCount: true })
  if (shownIn !== system) {
    const next = respellTyped(base, form.getValues(), shownIn, printer)
    setShownIn(system)
    setBase(next.base)
    queueMicrotask(() => fill(next.typed))
  }

  const rested = useDeferredValue(typed)
  const read = useMemo(() => readTyped(base, rested, system), [base, rested, system])
  const doubts = useMemo(() => askDoubts(base, read, createPrinter(system)), [base, read, system])
  const errors = flattenErrors(form.formState.errors)

  return {
    form,
    base,
    typed,
    read,
    doubts,
    errors,
    printer,
    system,
    fill,
    readNow: () => readTyped(base, form.getValues(), system),
    doubtsNow: (now: ReadForm) => askDoubts(base, now, printer),
    /** Puts the typing on the record as it is now; nothing typed is lost. */
    rebase: (gear: Gear) => {
      const next = rebaseTyped(base, form.getValues(), gear, printer)
      setBase(next.base)
      fill(next.typed)
    },
    startOver: () => {
      const next = createBase(base.kind, base.gear, printer)
      setBase(next)
      fill(next.typed)
    },
  }
}
