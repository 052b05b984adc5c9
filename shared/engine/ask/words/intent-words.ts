/** What asks for whatever is not there, even where pieces are named that are. */
export const missingPhrases: readonly string[] = (
  "what am i missing, what else am i missing, am i missing, anything missing, is anything missing, what is missing, whats missing, what's missing, " +
  'did i forget, have i forgotten, am i forgetting, forgetting anything, have i got everything, do i have everything, is this everything, ' +
  'is that everything, missing from my, missing from this, missing anything, missing something, forgot anything, what have i missed, did i miss, ' +
  'complete my setup, anything i forgot, fill the gaps, everything i need, did i leave out, what else do i still need, what do i still need'
).split(', ')

/** The same where no kind is named: "what do I need for 20 gallons". */
export const needPhrases: readonly string[] = (
  'what else do i need, anything else i need, do i still need, what do i need, what else should i buy, what else, what should i add, ' +
  'what gear do i need, what equipment do i need, what would i need, what will i need, what do you need'
).split(', ')

/** What says that a piece is gone, or that another is to take its place. */
export const gonePhrases: readonly string[] = (
  'died, dead, broke, broken, discontinued, out of stock, sold out, unavailable, not available, no longer available, no longer made, no longer sold, no longer in stock, failed, ' +
  "stopped working, quit working, quit, quit on me, gave up, gave out, not working, doesn't work anymore, cracked, leaks, leaking, leaked, burned out, burnt out, burned up, packed up, packed in, blew up, exploded, " +
  "shattered, stuck on, went out, kicked the bucket, gone, is gone, backordered, back ordered, on backorder, bit the dust, isn't made anymore, isn't available, can't get, cannot get, " +
  "can't find, cannot find, cant find, crapped out, kaput, conked out, rusted, fried, smashed, tripping the breaker, on back order, isn't sold anymore, no longer sell, no longer make, snapped, has died, just died, melted"
).split(', ')

export const replacePhrases: readonly string[] = (
  'replace, replaces, replaced, replacing, replacement, replacment, repalcement, replacemnt, instead of, substitute, substitutes, alternative, alternatives, alternative to, swap, swap out, swapping, equivalent, equivalent to, similar to, ' +
  'take the place of, takes the place of, in place of, stand in, stand in for, stand - in, sub for, new version of, successor, upgrade from, alternitive, alternate, in lieu of, switch out, change out'
).split(', ')

/** "Will it fit?" */
export const checkPhrases: readonly string[] =
  'will, does, is, can i use, would, can, could, could i use, is this, is it, is a, will a, will my, does my, is my, do, are, ok to use, okay to use'.split(
    ', ',
  )

export const fitPhrases: readonly string[] =
  'fit, fits, stand up, stand upright, work, works, ok, okay, suitable, big enough, strong enough, enough, too big, too small, too strong, too much, compatible, right size, do the job, work with, go in, go into, safe, powerful enough, overkill, long enough, too long, too weak, powerful, cover, hold'.split(
    ', ',
  )

/** A question about which piece, not about one. */
export const whichPhrases: readonly string[] =
  "which, what, any, recommend, suggest, looking for, find, whats, what's, best".split(', ')
