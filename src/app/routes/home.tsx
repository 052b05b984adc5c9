import { QuestionBox } from '../../features/finder/components/question-box'
import { HeroDrawing } from '../../features/home/components/hero-drawing'
import { HowItWorks } from '../../features/home/components/how-it-works'
import { Openings } from '../../features/home/components/openings'
import { CautionBox } from '../../components/ui/caution-box'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

function HomePage() {
  return (
    <>
      <div className="grid items-end gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <div>
          <h1 className="max-w-[22ch] text-[clamp(2rem,5vw,3.25rem)] leading-[1.06]">
            The piece you wanted is gone. What still fits?
          </h1>
          <p className="mt-4 max-w-prose text-lg">
            Describe a reef tank in a sentence or a drawing. Stillfits measures every piece in its catalogue against it,
            and shows the numbers behind each answer.
          </p>
          <div className="mt-8">
            <QuestionBox example="heater for a 20 gallon with a 4 x 5 x 12 inch rear chamber, room gets down to 60 F" />
          </div>
        </div>
        <HeroDrawing />
      </div>
      <Openings />
      <HowItWorks />
      <div className="mt-14 max-w-4xl space-y-3">
        <CautionBox title="Mains and salt water.">
          Use residual-current (ground-fault) protection and drip loops. Local codes and a licensed electrician decide.
        </CautionBox>
        <CautionBox title="Estimates are estimates.">
          Heat and light figures come from stated models. Measure before trusting livestock to them; its welfare comes
          first.
        </CautionBox>
        <CautionBox title="Demo data.">
          Every brand and product in this catalogue is invented, so that the measuring can be tried without naming
          anyone.
        </CautionBox>
      </div>
    </>
  )
}

export const page: Page = {
  Component: HomePage,
  head: () => ({
    title: 'Stillfits',
    description:
      'What fits a reef tank, and what can take the place of a piece that is gone: measured, with the numbers behind every answer.',
    canonical: paths.home,
  }),
}
