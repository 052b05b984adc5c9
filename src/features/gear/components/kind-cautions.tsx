import { getKind, type KindKey } from '#shared/kinds/index'
import { CautionBox } from '../../../components/ui/caution-box'

/** What is always worth knowing of a kind. */
export function KindCautions({ kind }: { readonly kind: KindKey }) {
  return (
    <div className="mt-10 space-y-3">
      {getKind(kind).electric && (
        <CautionBox title="Mains and salt water.">
          Use residual-current (ground-fault) protection and a drip loop, and let local codes and a licensed electrician
          decide.
        </CautionBox>
      )}
      {(kind === 'heater' || kind === 'temperature-controller') && (
        <CautionBox title="Heaters fail.">
          One that sticks on keeps heating. A second, independent cut-off protects what lives in the tank.
        </CautionBox>
      )}
      {(kind === 'tank' || kind === 'stand') && (
        <CautionBox title="A filled tank is heavy.">
          For anything large or upstairs a structural engineer and local building rules decide.
        </CautionBox>
      )}
      {kind === 'light' && (
        <CautionBox title="Light figures are estimates.">
          They come from a model with stated assumptions. Measure before trusting corals to them.
        </CautionBox>
      )}
      <CautionBox title="Demo data.">This brand and product are invented.</CautionBox>
    </div>
  )
}
