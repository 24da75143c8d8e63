/** Words the measures grammar leans on. Lists of trade words, not of phrases from any clip. */
const set = (text: string) => new Set(text.trim().split(/\s+/));

/** Singular nouns of things that are made, fixed or done a number of times. */
export const countables = set(`
  leg rail side end door drawer shelf stile panel board block cleat slat strip spacer runner bearer batten joist stud post foot
  brace bracket gusset rib divider support stretcher apron top bottom back front face plate piece part blank wedge key spline pad
  hole slot groove dado rabbet rebate mortise mortice tenon dowel peg plug pin biscuit domino finger pocket notch kerf pilot
  screw bolt nail brad lag nut washer hinge magnet caster castor wheel handle knob pull clip staple insert bushing bearing
  tack rivet hook eye bracket slide latch catch clamp cramp caul layer coat pass ply lamination stick length sheet picket plank
  spindle leg rung seat arm template jig box tray card shim stud cup disc disk ring segment stave ball button anchor fixing
  cut wrap turn stack roller chock tile brick bag tab tail tenon shoulder corner cheek jaw handle hanger standoff wood
  timber stretcher crossmember crosspiece frame knee hub spoke axle tee bar rod tube tube crosscut lap strap band bead turnbuckle
  spring threaded sleeper upright partition compartment section holder rack hoop cap collar ferrule sleeve gib coupler
  drop dab squirt stroke swipe`);

/** Nouns after a number that make it no measurement of the build. */
export const neverCounted = set(`
  year years month months week weeks weekend weekends decade decades time times way ways people person folk folks guy guys kid kids
  video videos comment comments subscriber subscribers view views viewer viewers like likes follower followers member members
  patron patrons question questions reason reasons thing things dollar dollars buck bucks euro euros quid pence cent cents percent
  car cars option options tip tips trick tricks style styles type types kind kinds size sizes story stories episode episodes
  gallon gallons litre litres liter liters cup cups mile miles place places hand hands finger fingers thumb eye eyes choice choices word words
  project projects channel channels idea ideas mistake mistakes beer beers coffee coffees dog dogs cat cats daughter son
  grand hundred thousand million step steps half halves cans can point points figure figures number numbers machine machines
  attempt attempts try tries person summer summers winter winters spot spots edge edges face faces corner corners shop shops tool tools jobs job
  other others more less days day hours hour minutes minute seconds second look looks`);

/** Verbs that make or fix things: a number of anything after one of them is a count. */
export const makingVerbs = set(`
  cut cutting make making made need needs needed drill drilling drilled use using used add adding added bore boring glue gluing rip
  ripping mill milling take takes took run ran running put putting drive driving drove install installing fit fitting want
  build building lay laying set setting apply applying shoot pop tack place placed buy bought grab plus with`);

/** Words that come between a number and the thing counted. */
export const adjectives = set(`
  long short small little big large thin thick wide narrow tall new old same identical equal matching extra spare more other outer inner outside
  inside upper lower top bottom front back middle side end cross left right plain square round flat wood wooden ply plywood oak pine maple
  walnut ash beech birch steel brass metal rubber plastic pocket pilot through blind stopped loose drywall deck lag carriage machine
  hex wood countersunk pan head flanged tee t threaded shallow deep thin light heavy good full quick even hinge cup scrap
  dowel bar spring parallel sash quick-grip french locking swivel fixed rare earth neodymium good extra final thin light`);

/** Words that say which way a size runs; a bare number before one is a length. */
export const dimensionWords = set(`
  wide width deep depth long length high height tall thick thickness across diameter dia radius proud square apart longer shorter wider
  narrower thicker thinner deeper taller lower higher oversize undersize oversized undersized overall oversail overhang centres centers
  center centre inside outside spacing`);

/** Nouns whose size is told by a bare number after "is", "at", "to", "of". */
export const sizedNouns = set(`
  diagonal diagonals fence stop width length height depth radius diameter thickness gap spacing size offset clearance overhang reveal setback distance blade
  mark marks board panel shelf rail stile leg side top bottom back front base opening dado groove slot rabbet rebate tenon mortise mortice
  tongue hole shoulder cut stock blank pin reading calipers caliper micrometer gauge ply plywood sheet plate block strip centre center centers
  centres line rip saw bit cutter drill drawer door carcass carcase box piece part kerf pencil cleat runner spacer sheet post tape`);

/** Evidence of a price close to a number. */
export const money = set(
  `dollar dollars buck bucks euro euros quid cent cents pence pennies grand $ € £ sterling`,
);
export const costs = set(
  `cost costs costing paid pay price priced spend spent cheap worth charged bill money sale bargain each`,
);
export const watched =
  set(`subscriber subscribers view views viewer viewers follower followers comments comment members patrons likes
  episode episodes video videos people folks channel`);

/** Evidence that a stretch of time belongs to the work. */
export const waiting = set(`
  let leave leaving left sit sits dry dries drying dried cure cures curing cured wait waiting set sets setting clamp clamps clamped glue glued coat
  coats between after soak rest overnight least open pot minimum every apart hold press steam boil wipe tack flash harden hardens before until
  epoxy poly shellac oil varnish finish recoat minute bake heat spray pressure stay work`);
export const pastTalk = set(
  `ago old took spent since ever living lived worked married retired been career`,
);

/** Near these a bare three figure number is thousandths of an inch. */
export const precise = set(
  `caliper calipers micrometer mic thou thousandths thousandth feeler dial reamer ream indicator tenths zero`,
);

export const sheetNouns = set(
  `sheet sheets ply plywood mdf panel panels melamine osb hardboard sheathing drywall foot feet`,
);
export const lumberNouns =
  set(`lumber timber stock stud studs post posts joist joists board boards scrap offcut framing cls construction pine fir spruce
  material rafter rafters beam beams frame stick sticks length lengths block blocks`);
export const screwNouns = set(
  `screw screws lag lags spax deckscrew woodscrew woodscrews chipboard plug plugs coach fixing fixings`,
);
export const boltNouns = set(
  `bolt bolts nut nuts insert inserts stud rod tap thread threads threaded machine knob hex allen cap carriage socket t-bolt washer washers`,
);
export const angleWords =
  set(`angle angles bevel bevels bevelled beveled miter miters mitre mitres mitred mitered tilt tilted degree degrees chamfer chamfers
  blade protractor corner corners countersink countersunk splay splayed`);
export const abrasiveWords = set(
  `rub denib polish burnish grit grits sand sanding sanded sandpaper paper scuff abrasive sander sanders disc discs mesh`,
);
export const ratioWords =
  set(`blend mix mixed mixing ratio part parts thin thinned thinning cut dilute diluted resin hardener epoxy water alcohol spirit spirits thinner
  slope pitch taper dovetail dovetails dovetailed`);
/** Words right after a number that make it something else than a length. */
export const otherUnits =
  set(`volt volts amp amps watt watts horsepower hp o'clock am pm mph tooth teeth flute flutes speed stroke
  litre litres liter liters gallon gallons ounce ounces gram grams bar psi cfm db decibels lumens star stars year-old yearold`);
export const namedNumbers =
  set(`number video part step project chapter episode season volume route version revision page lesson rule tip figure mark take model
  instagram youtube level phase plan row tier top`);
export const clampWords = set(
  `clamp clamps clamping cramp pressure squeeze press force pull spring tension weight down`,
);
export const fastenerNouns = set(
  `screw screws brad brads nail nails lag lags pin pins staple staples bolt bolts dowel pockethole`,
);
export const temperatureWords = set(
  `temperature warm cold hot oven room heat heated outside freezing shop weather boil winter summer hotter colder`,
);
export const percentWords = set(
  `moisture humidity water mix mixed thinned solution diluted strength overlap speed relative dry slack solids alcohol stretch smaller bigger larger`,
);
