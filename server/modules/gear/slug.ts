/** "Brand Modèle 100 W" → "brand-modele-100-w" */
export function createSlug(brand: string, model: string): string {
  return `${brand} ${model}`
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
}
