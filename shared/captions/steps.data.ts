const set = (text: string) => new Set(text.trim().split(/\s+/));

/** Words of no topic. */
export const stopwords =
  set(`a an the and or but so if then than that this these those there here it its i you we they he she him her them me my your our
  us is are was were be been being am do does did done doing have has had having will would can could should may might must shall of to in on at by for
  with from up down out off over under into onto about as like just really very quite got get gets getting go goes going gonna went come comes came
  um uh okay ok alright right well yeah oh now here not no don't doesn't didn't isn't aren't it's i'm i've you've you're we're they're that's there's i'll
  we'll you'll let's what which who how when where why because some any all both each every other another more most much many little bit kind sort thing
  things stuff way make makes making made take takes taking put puts putting want wants need needs one two three four five six seven eight nine ten
  also too still again back only even actually basically maybe probably pretty good nice first next last same know see look think say said mean`);

/** What a maker does, as said → as a title has it. Forms in -ing and -ed are found from the first. */
export const verbs =
  set(`cut rip drill glue clamp sand plane rout route mill turn bore screw bolt nail assemble attach mount fit install mark measure chamfer sharpen
  shape carve chop trim finish oil wax paint stain varnish seal test square level flatten joint laminate hang fix build make add join dry scrape file bend weave
  tap ream press set align lay position bevel taper notch groove countersink crosscut rabbet rebate mortise dowel cover line fill pour mix epoxy wire hinge
  transfer trace flush round shim tape bore clean strip steam repair remove pull knock wedge brush wipe soak season peg pin lift load check adjust tune lock
  flip stick spread rough scribe resaw stack roll apply buff polish grind hone tie wrap stretch staple brace plumb dig fasten break hollow part`);

/** The base of a verb as said: "drilling", "drilled", "cuts"; null when it is none of ours. */
export function verbOf(w: string): string | null {
  if (verbs.has(w)) return w;
  const stems = [
    w.replace(/ing$/, ''),
    w.replace(/ing$/, 'e'),
    w.replace(/(.)\1ing$/, '$1'),
    w.replace(/ed$/, ''),
    w.replace(/d$/, ''),
    w.replace(/(.)\1ed$/, '$1'),
    w.replace(/s$/, ''),
    w.replace(/es$/, ''),
    w.replace(/ied$/, 'y'),
    w.replace(/ies$/, 'y'),
  ];
  if (w.length < 5 && !/s$/.test(w)) return null;
  return stems.find((stem) => stem !== w && verbs.has(stem)) ?? null;
}

/** How a new stretch of work is opened, with its weight. Matched at the start of a cue or sentence. */
export const openings: readonly { is: RegExp; weight: number }[] = [
  {
    is: /^(?:okay|ok|alright|right|all right)(?: so| now| then)? (?!and\b|but\b|that's|i know|i see)/,
    weight: 1.2,
  },
  {
    is: /^(?:so|now|and) (?:now|next|then|for|the next|let's|with|once|that|we|i|the|what|on|to|while|before|here|at|it)\b/,
    weight: 0.7,
  },
  { is: /^now\b/, weight: 0.9 },
  { is: /^next\b/, weight: 1.4 },
  {
    is: /^(?:so |and |okay |alright |right )*(?:first of all|first up|to start|let's start|i'll start|we start|start with|starting with|the first thing|the last thing|last thing|next job|next thing|next step|the next thing|the next step|almost done|nearly there|moving on|time for)\b/,
    weight: 1.5,
  },
  {
    is: /^(?:for the (?:\w+ )?\w+ (?:i|we|you|i'm|we're|up)\b|now (?:for|the|let's|we|i)|now to)\b/,
    weight: 1.2,
  },
  {
    is: /^(?:step|part|stage) (?:one|two|three|four|five|six|seven|eight|nine|ten|\d+|number)\b/,
    weight: 2,
  },
  {
    is: /^(?:first|first thing|first off|firstly|second|secondly|third|then|finally|lastly|last thing)\b/,
    weight: 0.7,
  },
  {
    is: /^(?:moving on|on to|onto|back (?:at|over|to|in|on)|over (?:at|to)|time (?:to|for)|let's|okay|meanwhile|after that|from there|almost there|moment of truth)\b/,
    weight: 1.1,
  },
  {
    is: /^(?:so |and |now |okay )?(?:while|once|with|after) (?:that|the|those|it|this|everything|all|we|i)\b/,
    weight: 0.9,
  },
  {
    is: /^(?:so |and |now |okay |alright )?(?:for|to) (?:the|my|finish|this|make|get|cut)\b/,
    weight: 0.5,
  },
  {
    is: /^(?:so |and |now |okay |alright )?(?:the next morning|next day|the next day|next morning|a day later|the following day|day two|that's (?:it|the) \w+ done)\b/,
    weight: 1.5,
  },
];

/** Reactions and asides begin no step. */
export const reactions =
  /^(?:(?:oh|yeah|wow|nice|look|see|there we go|there you go|hear|ha|haha|beautiful|perfect|whoa|man|boy|yes|nope|ah|ooh|so yeah|okay and|and that|but|which|because|or|don't ask)\b)/;

export const welcome =
  /\b(?:welcome|howdy|(?:hey|hi) y'all|hey (?:everybody|everyone|guys|folks|there)|hello|good (?:morning|evening|afternoon|to see you)|what's up|hi (?:everybody|everyone|guys|folks|there|again)|today we|today i|today's|this week|in this (?:video|one)|this time|let's get (?:into|started|going|stuck)|my name is|channel|subscrib\w+)\b/;
export const farewell =
  /\b(?:thanks for|thank you for|see you|catch you|next (?:time|one|week|video)|that's it for|so that is it|that's (?:it|that|the|all)|there (?:it|you|we|they) (?:is|have|are)|bye|subscribe|like and|let me know|in the comments|down below|signing off|take care|if you (?:liked|enjoyed|want)|cheers|i'm happy|all done|final thoughts|wrap(?:ping)? up|until next|stay safe)\b/;
export const sponsor =
  /\b(?:sponsor\w*|this video is brought|promo code|discount code|use (?:my |the )?code|percent off|free trial|link in the description|affiliate|patreon|merch)\b/;
export const trying =
  /\b(?:moment of truth|let's (?:see|test|try|fill|load|give)|see (?:if|how) it|test (?:it|run|cut|piece|drive)|try it|does it (?:work|fit)|here we go|in use|how it works|show you how|take it for|put it to|the (?:real|big|final) test|try (?:it|this|that)|set up a|demonstrat\w+|see what it)\b/;

/** How a sign-off begins. */
export const signOff =
  /^(?:so |and |okay |alright |right |well |anyway )*(?:that's (?:it|all|that|about|a wrap|the|everything)|that is (?:it|all)|there (?:it is|you go|you have it|we are|we go|they are)|and that's|thanks for|thank you for|if you (?:liked|enjoyed)|until next)\b/;
/** What ends a welcome. */
export const letsGo =
  /\b(?:let's (?:get (?:into|started|going|stuck|to)|go|jump|dive|do it|begin)|here's how|so here we are|grab a)\b/;
/** How the first piece of work begins. */
export const begins =
  /^(?:so |and |okay |alright |right |now |ok )*(?:first\b|the first thing|to start|let's start|i'm starting|we're starting|we start|i'll start|start (?:by|with|off))/;
