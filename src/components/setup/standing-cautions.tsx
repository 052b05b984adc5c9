import { CautionBox } from '../ui/caution-box'

/** What is said under every page that judges a setup. */
export function StandingCautions() {
  return (
    <div className="mt-12 space-y-3">
      <CautionBox title="Mains and salt water.">
        Use a residual-current (ground-fault) protected outlet and drip loops, overload no strip, and let a licensed
        electrician decide where local codes ask for one.
      </CautionBox>
      <CautionBox title="Weight, heat and light.">
        A filled tank is heavy: a structural engineer and local building rules decide for anything large or upstairs.
        Heaters fail: a second, independent cut-off protects what lives here. Heat and light figures are estimates from
        stated models; measure before trusting livestock to them. Livestock welfare comes first.
      </CautionBox>
    </div>
  )
}
