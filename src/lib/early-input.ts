type Field = HTMLInputElement | HTMLTextAreaElement | HTMLSelectElement

const isTicked = (field: Field): field is HTMLInputElement =>
  field instanceof HTMLInputElement && (field.type === 'checkbox' || field.type === 'radio')

function isChanged(field: Field): boolean {
  if (field instanceof HTMLSelectElement)
    return [...field.options].some(({ selected, defaultSelected }) => defaultSelected && !selected)
  if (isTicked(field)) return field.checked !== field.defaultChecked
  return field.type !== 'hidden' && field.value !== field.defaultValue
}

/** Sets a property as the browser does when somebody types: past React, which then takes the event for news. */
function setQuietly(field: Field, name: 'value' | 'checked', value: string | boolean): void {
  const prototype = Object.getPrototypeOf(field) as Field
  Object.getOwnPropertyDescriptor(prototype, name)?.set?.call(field, value)
}

function replay(field: Field, value: string, isOn: boolean): void {
  const bubbles = { bubbles: true }
  if (field instanceof HTMLSelectElement) {
    field.value = value
    field.dispatchEvent(new Event('change', bubbles))
  } else if (isTicked(field)) {
    field.checked = !isOn
    setQuietly(field, 'checked', isOn)
    // Not a MouseEvent, which would turn it over once more.
    field.dispatchEvent(new Event('click', bubbles))
  } else {
    field.value = field.defaultValue
    setQuietly(field, 'value', value)
    field.dispatchEvent(new Event('input', bubbles))
  }
}

/**
 * Notices what somebody typed or chose before a page could listen; what it answers tells the page, once it can. React
 * sets a field back to what the page believes as soon as it renders it again, so the two are apart.
 */
export function noticeEarlyInput(root: ParentNode): () => void {
  const changed = [...root.querySelectorAll<Field>('input, textarea, select')].filter(isChanged)
  const held = changed.map((field) => ({ field, value: field.value, isOn: isTicked(field) && field.checked }))
  return () => {
    for (const { field, value, isOn } of held) replay(field, value, isOn)
  }
}
