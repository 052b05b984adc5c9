/** Cords and plugs by the country that a version is sold in. */
export const northAmerica = { volts: [120], plugType: 'A/B', plugs: 1 }
export const continental = { volts: [230], plugType: 'F', plugs: 1 }
export const british = { volts: [230], plugType: 'G', plugs: 1 }
export const australian = { volts: [230], plugType: 'I', plugs: 1 }
/** A power brick that takes 100 to 240 V. */
export const wideRange = { volts: [100, 120, 230], plugType: 'A/B', plugs: 1 }
