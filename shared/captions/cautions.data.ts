/**
 * What makes a caution: patterns over the plain words, each with its weight. Two points within one thought
 * make a caution; a duty ("unplug it") has two by itself, a danger word or a warning word one.
 */
export const cautionSigns: readonly { is: RegExp; weight: number }[] = [
  { is: /^let (?:it|the \w+|that) (?:run|wind|spin|slow) down\b/, weight: 1.4 },
  {
    is: /^(?:before|until) (?:you|i|we) (?:lift|reach|touch|move|clear|change|take|start|switch|turn) (?:it |the |\w+ )?/,
    weight: 0.8,
  },
  {
    is: /^(?:watch|mind|protect) (?:your |the )?(?:eyes|lungs|hearing|sleeves|hair|ears)\b/,
    weight: 2,
  },
  { is: /^(?:glasses|specs|goggles) on\b/, weight: 1.4 },
  {
    is: /^(?:roll|push) (?:up )?(?:your|those|the) sleeves\b|^(?:take|get) (?:your |any |the )?(?:rings?|watch|jewell?ery|gloves) off\b|^take off (?:your |any )?(?:rings?|watch|jewell?ery|gloves)\b/,
    weight: 2,
  },
  { is: /^chuck key\b|^chalk key\b/, weight: 0.8 },
  { is: /^check (?:\w+ ){0,5}(?:detector|cables|pipes|wires|wiring|nails)\b/, weight: 2 },
  { is: /^(?:open|crack) (?:the|a|some|your) (?:windows?|doors?|garage)\b/, weight: 1.2 },
  { is: /^(?:windows?|doors?) (?:open|mind)\b/, weight: 0.9 },
  { is: /^(?:by|with|in) (?:your |one )?hands?\b/, weight: 0.5 },
  {
    is: /^(?:wear|put on|wearing|throw on|grab|get|use|put) (?:\w+ ){0,3}(?:glasses|specs|goggles|visor|respirator|ear (?:plugs|muffs|defenders|protection)|eye protection|face shield|hearing protection|dust mask|mask|earplugs|ppe|apron|shield)\b/,
    weight: 2,
  },
  {
    is: /^(?:glasses|goggles|eye protection|ear (?:defenders|muffs|protection)|mask|respirator|face shield) (?:on|down)\b/,
    weight: 2,
  },
  {
    is: /^(?:keep|keeping|get|have) (?:\w+ ){0,2}(?:fingers|hands|thumbs|fingertips|knuckles|sleeves|hair|face)\b/,
    weight: 2,
  },
  {
    is: /^(?:watch|mind) (?:\w+ )?(?:fingers|hands|thumbs|knuckles|kickback|toes|feet|back)\b/,
    weight: 2,
  },
  {
    is: /^(?:keep|leave|with|use|using|put|fit|have) (?:\w+ ){0,3}(?:riving knife|living knife|splitter|blade guard|guard|crown guard)\b/,
    weight: 2,
  },
  {
    is: /^(?:use|using|grab|with|want|need|get) (?:\w+ ){0,2}(?:push (?:stick|block|pad)s?|feather ?boards?|father boards?|hold ?downs?)\b/,
    weight: 2,
  },
  { is: /^(?:unplug|unplugged|isolate|disconnect)\b/, weight: 2 },
  {
    is: /^(?:pull|take|turn|switch) (?:\w+ ){0,2}(?:plug|battery|power|switch) ?(?:out|off)?\b/,
    weight: 2,
  },
  {
    is: /^(?:battery|power|plug|machine|saw|router|lathe) (?:is )?(?:out|off|unplugged)\b/,
    weight: 1.4,
  },
  {
    is: /^(?:let|wait for|wait till|wait until|until) (?:it|the blade|the bit|the saw|the cutter|the chuck|everything|that|it's|the lathe) (?:to |has |is |comes to |come to |)?(?:a )?(?:full |complete |dead |completely |fully )?(?:stop|stops|stopped|spin down|stop spinning|stopped spinning)\b/,
    weight: 1.4,
  },
  {
    is: /^(?:before|until) (?:i|you|we|your|my) (?:\w+ ){0,2}(?:reach|touch|go near|put|move|change|adjust|clear)\b/,
    weight: 0.8,
  },
  {
    is: /^(?:do not|don't|never|not to|always|please don't|you don't want to|you never want to)\b/,
    weight: 0.8,
  },
  {
    is: /^(?:make sure|be sure|be careful|careful|be very careful|please|seriously|remember to|check that|double check)\b/,
    weight: 0.8,
  },
  { is: /^(?:careful|be careful|take care)\b/, weight: 0.8 },
  { is: /^(?:reach|reaching) (?:over|past|across|behind|around|in)\b/, weight: 1 },
  { is: /^(?:kickback|kick back|kick it back|kicks back)\b/, weight: 1.4 },
  {
    is: /^(?:pinch|pinches|bind|binds|grab|grabs|snatch|snatches|climb|bite|bites|catch|catches|jam|shatter|shatters|explode|explodes)\b(?! (?:a|the|some|your|my|one|another|me) (?:pencil|piece|coffee|bit|scrap|offcut))/,
    weight: 0.8,
  },
  {
    is: /^(?:fingers?|hands?|thumbs?|knuckles|sleeves?|gloves?|jewell?ery|hair|eyes?|lungs?|skin|ears?)\b/,
    weight: 0.5,
  },
  { is: /^(?:razor|sharp as|scalpel)\b/, weight: 1.2 },
  {
    is: /^(?:catch fire|on fire|combust|spontaneous|spontaneously|(?:up in|into|burst into) flames|fire hazard|oily rags?|flammable|explosive|heater)\b/,
    weight: 1.4,
  },
  {
    is: /^(?:fumes|vapou?rs?|toxic|poison|poisonous|carcinogen|silica|nasty|lungs|breathe|breathing|cough|open (?:the|a|some) (?:window|garage|door|windows|doors)|ventilat\w+|well ventilated|fresh air|outside)\b/,
    weight: 0.9,
  },
  {
    is: /^(?:out of your hands?|across the (?:shop|room|garage|workshop)|into next week|at your (?:face|head|chest|belly)|through the (?:wall|window)|like a (?:propeller|missile|bullet|frisbee|rocket|razor))\b/,
    weight: 1.2,
  },
  {
    is: /^(?:trapped|pinned|wedged|comes loose|lets go|come loose|fly|flies|flying|thrown|throw it|throws|launch|launches|whip|whips|spin like|spins)\b/,
    weight: 0.8,
  },
  {
    is: /^(?:against the rotation|against the cutter|climb cut|climb cutting|against the direction|right to left|left to right)\b/,
    weight: 1.2,
  },
  { is: /^feed (?:it |them |the \w+ )?(?:against|right|left|from|into)\b/, weight: 1 },
  {
    is: /^(?:clamp|clamped|hold|holding|held|taped|screwed|secure|locked|lock|tape) (?:it |them |the \w+ |that |all the \w+ |the work ?piece |your \w+ |are |both )?(?:down|firmly|securely|properly|tight|well|both|wheels|casters|castors)\b/,
    weight: 0.8,
  },
  {
    is: /^(?:don't|never|not|do not|instead of) (?:try to |ever )?(?:hold|holding) (?:it|them|this|that|the \w+|anything) (?:with|in|by) (?:your|a|one) (?:hands?|fingers)\b/,
    weight: 1.6,
  },
  { is: /^lock (?:\w+ ){0,3}(?:wheels|casters|castors|brakes)\b/, weight: 1.6 },
  {
    is: /^(?:blade|bit|cutter|saw|router|lathe|chuck|grinder|jointer|planer|nailer|chisel|iron|gouge|thicknesser|spinning|blades)\b/,
    weight: 0.5,
  },
  {
    is: /^(?:through the (?:planer|thicknesser|jointer)|over the jointer|shorter than|smaller than|nothing shorter|too short)\b/,
    weight: 0.9,
  },
  {
    is: /^(?:lift|lifting|carry) (?:\w+ ){0,3}(?:on your own|alone|by yourself|single handed|with two people)\b/,
    weight: 2,
  },
  {
    is: /^(?:on your own|second pair of hands|two person|two people|get a helper|get some help|get help)\b/,
    weight: 0.9,
  },
  {
    is: /^(?:lose|losing|lost|cut off|missing) (?:a|your|my|half a) (?:finger|thumb|hand|fingertip|eye)\b/,
    weight: 1.6,
  },
  {
    is: /^(?:hurt|injur\w*|hospital|emergency room|a and e|stitches|blood|bleed|burn yourself|burns|dangerous|danger|hazard|hazardous|safety|safe|safely|safer|electrocuted|live wire|live cable|cables|pipes|wiring|asbestos|lead paint|treated)\b/,
    weight: 0.9,
  },
  {
    is: /^(?:no|without|take off|tie back|tie) (?:\w+ ){0,2}(?:gloves|loose (?:sleeves|clothing|clothes)|jewell?ery|rings?|long hair|hair|sleeves)\b/,
    weight: 2,
  },
  {
    is: /^stand (?:\w+ )?(?:to (?:one|the|either) side|aside|clear|out of the|off to)\b/,
    weight: 2,
  },
  { is: /^(?:is|it's|are) (?:not |no )?(?:a )?(?:joke|toy|messing)\b/, weight: 0.7 },
  { is: /^does not care\b/, weight: 0.6 },
  { is: /^(?:hang|spread|lay) (?:the|those|your|any) (?:\w+ )?(?:rags|cloths)\b/, weight: 1 },
  { is: /^lay (?:them|it|the rags?|those) (?:out )?flat\b/, weight: 1 },
  {
    is: /^(?:oily )?(?:rags?|cloths?) (?:\w+ ){0,4}(?:flat|outside|outdoors|water|fire|flames|bin|metal)\b/,
    weight: 1,
  },
  {
    is: /^(?:check|look|scan|use a detector) (?:\w+ ){0,2}for (?:\w+ ){0,2}(?:nails|cables|pipes|wires|wiring|studs|metal|staples|screws)\b/,
    weight: 2,
  },
];

/** Talk that looks like a caution and is none. */
export const cautionNot =
  /\b(?:don't (?:forget to (?:like|subscribe|hit)|be a hero|answer|worry|sweat|cheap out|ask|judge|at me|get me wrong|tell|know|think|have|care|like|want it|need|mind|even)|never (?:used|use it|had|mind|buy|been|again)|always (?:ask|wanted|dusty|liked|loved|said))\b/;
