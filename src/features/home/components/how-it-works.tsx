import { Link } from 'react-router-dom'
import { paths } from '../../../config/paths'
import { StepDrawing } from './step-drawing'

const steps = [
  {
    step: 'describe',
    title: 'Describe',
    text: 'Type a sentence or press the drawing. What you say is solid, what is assumed is dashed, and every assumption can be changed.',
  },
  {
    step: 'measure',
    title: 'Measure',
    text: 'Every candidate is judged by the same checks: the measured value, the limit, what is to spare, and where the rule comes from.',
  },
  {
    step: 'answer',
    title: 'Answer',
    text: 'Fits, fits with changes, does not fit, or not enough data. A number that nobody measured is named, never guessed.',
  },
] as const

export function HowItWorks() {
  return (
    <section className="mt-16 border-t-[1.5px] border-ink pt-6">
      <h2>How it works</h2>
      <ol className="mt-5 grid gap-x-8 gap-y-10 md:grid-cols-3">
        {steps.map(({ step, title, text }, at) => (
          <li key={step}>
            <StepDrawing step={step} />
            <h3 className="mt-3 font-heading text-lg font-bold">
              <span className="mr-2 font-mono text-base font-normal text-ink-soft">{at + 1}</span>
              {title}
            </h3>
            <p className="mt-1 max-w-prose">{text}</p>
          </li>
        ))}
      </ol>
      <p className="mt-6">
        All of it, check by check:{' '}
        <Link to={paths.method} className="link">
          the method
        </Link>
        .
      </p>
    </section>
  )
}
