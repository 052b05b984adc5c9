/** Words that carry nothing to be used: grammar, pleasantries, and what every question here is about. */
export const stopWords: ReadonlySet<string> = new Set(
  (
    "most plug plugs wattage watts section ready strong behind back something lxwxh lxwxd wxdxh lxdxh w a an the this that these those it its it's is are was were be been being am i i'm im i've ive i'd i'll me my mine we we're our us you your " +
    'he she they them their there here of to in on at by for from with without and or but so if then than as into onto inside up down out ' +
    'off over do does did doing done have has had having got get gets getting will would could should can may might must shall what which who ' +
    'whom whose where when why how hi hello hey please pls thanks thank thx cheers guys folks anyone anybody someone somebody all any some ' +
    'just also only really very quite pretty even still already again maybe perhaps probably about around roughly approx approximately need ' +
    'needs needed want wants wanted looking look find finding found recommend recommendation recommendations suggest suggestion suggestions ' +
    'suggested buy buying use using used fit fits fitting work works working go goes going put suit suits suitable help advice question new ' +
    "know think tell say says like love good best better great right thing things something anything one ones not no yes don't dont doesn't " +
    "won't can't cannot isn't what's whats that's there's here's let's ok okay u r ur kind type sort size sized dimensions dimension measures " +
    'measure measuring measured inner internal actual making make makes made each per between min max minimum maximum temp temps temperature ' +
    'temperatures degrees degree reef marine saltwater salt-water aquarium aquariums tank tanks piece unit gear equipment come comes coming ' +
    'run runs running set setting setup system my build building start starting started currently now today soon hobby beginner newbie first ' +
    'near nearly almost within more less much many lot lots bit little other another else both such own same too enough option options ' +
    'available around sits sit sitting stand-alone stands holds hold holding carry carries carrying bear bears keep keeps keeping kept after before because since while ' +
    'during whenever until though although however well oh um er lol btw fyi imo ty tia place location area spot space room possible ideally ' +
    "ideal perfect proper correct year years time times day days week weeks month months gets got's lets wondering wonder curious try trying tried give given gives " +
    "show me am pm give people person friend every always usually normally typically x vs versus eg ie etc ones there'll cost decide choose pick choosing " +
    'long wide deep tall high height width length depth thick thickness litre liter volume water cold hot winter summer night able ask asking'
  ).split(' '),
)

/** Said of a size that was read, they add nothing. */
export const vagueSizes: ReadonlySet<string> = new Set(
  'small little tiny narrow tight big large nano mini slim shallow short compact'.split(' '),
)
