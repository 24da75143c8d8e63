/**
 * Tools and materials by the words that name them. `name: word|word` a line; US and UK names together. A
 * contributor adds a line; the longest name at a place wins.
 */
export const toolLines = `
table saw: table saw|tablesaw|cabinet saw|saw bench
track saw: track saw|plunge saw
miter saw: miter saw|mitre saw|chop saw|meter saw|sliding saw
band saw: bandsaw|band saw
jigsaw: jigsaw|jig saw
circular saw: circular saw|circ saw|skill saw
scroll saw: scroll saw|fret saw
coping saw: coping saw
hand saw: hand saw|handsaw|tenon saw|dovetail saw|pull saw|panel saw|back saw|crosscut saw|rip saw
hacksaw: hacksaw
router: router|plunge router|trim router
router table: router table
drill press: drill press|pillar drill|bench drill
drill: drill driver|cordless drill|hand drill|impact driver|power drill
hammer drill: hammer drill
lathe: lathe
jointer: jointer
planer: planer|thicknesser|thickness planer
bench grinder: grinder|bench grinder|angle grinder
belt sander: belt sander
sander: orbital sander|random orbit sander|palm sander|sander|disc sander|spindle sander
brad nailer: brad nailer|nail gun|nailer|pin nailer|pinner
biscuit jointer: biscuit jointer|biscuit cutter
pocket hole jig: pocket hole jig|pocket jig
dado stack: dado stack|dado set|dado blade|dado head
block plane: block plane
hand plane: hand plane|smoothing plane|jack plane|jointer plane|shoulder plane|router plane|bench plane|number four plane|number five plane
spokeshave: spokeshave|spoke shave
chisel: chisel|chisels|bench chisel
gouge: gouge|bowl gouge|roughing gouge|spindle gouge
parting tool: parting tool
card scraper: card scraper|cabinet scraper|scraper
mallet: mallet|dead blow
hammer: hammer
screwdriver: screwdriver
wrench: wrench|spanner|socket wrench|allen key|hex key
pliers: pliers
clamp: clamp|clamps|cramp|cramps|bar clamp|sash cramp|pipe clamp|f clamp|spring clamp|strap clamp|band clamp
vise: vise|vice
square: square|combination square|try square|speed square|framing square|carpenter's square
bevel gauge: bevel gauge|sliding bevel|bevel square
marking gauge: marking gauge|mortise gauge|cutting gauge|wheel gauge
marking knife: marking knife|utility knife|craft knife
tape measure: tape measure
steel rule: steel rule|steel ruler|ruler
straightedge: straightedge|straight edge
calipers: calipers|caliper|vernier
micrometer: micrometer
feeler gauge: feeler gauge|feeler gauges|feeler
level: spirit level|level
compass: compass|dividers|trammel points
protractor: protractor|angle gauge
pencil: pencil
marker: marker
awl: awl|centre punch|center punch|transfer punch|punch
tap: tap and die|taps
reamer: reamer
file: file|files|rasp
forstner bit: forstner bit|forstner
brad point bit: brad point bit|brad point|lip and spur
twist bit: twist bit|twist drill
spade bit: spade bit|flat bit
hole saw: hole saw|holesaw
countersink: countersink bit|countersink|counter sink
straight bit: straight bit|straight cutter
spiral bit: spiral bit|upcut bit|downcut bit|spiral cutter
flush trim bit: flush trim bit|pattern bit|flush trim|template bit|bearing cutter
chamfer bit: chamfer bit|chamfer cutter
roundover bit: roundover bit|round over bit|roundover|ovolo
rabbet bit: rabbet bit|rebate cutter|rabbeting bit
push stick: push stick
push block: push block|push pad
feather board: feather board|featherboard|feather boards|featherboards
riving knife: riving knife
stop block: stop block
hold down: hold down|holdfast|hold fast
caul: caul|cauls
safety glasses: safety glasses|safety goggles|goggles|eye protection|face shield
ear protection: ear defenders|ear protection|ear muffs|hearing protection|earplugs
dust mask: dust mask|respirator
dust collector: dust collector|shop vac|dust extractor|extractor
steam box: steam box
heat gun: heat gun
paint roller: foam roller|roller
paint brush: brush|foam brush
bending iron: bending iron
ratchet strap: ratchet strap|strap
soldering iron: soldering iron
staple gun: staple gun|stapler
`;

export const materialLines = `
plywood: plywood|ply|birch ply|baltic birch|birch plywood|marine ply
mdf: mdf
particle board: particle board|chipboard|osb|melamine
hardboard: hardboard
cedar: cedar|western red cedar
pine: pine|redwood|douglas fir|spruce
oak: oak|white oak|red oak
maple: maple|hard maple
walnut: walnut
cherry: cherry
ash: ash
beech: beech
birch: birch
poplar: poplar|tulipwood
mahogany: mahogany|sapele
teak: teak|iroko
phenolic sheet: phenolic|phenolic sheet
acrylic: acrylic|polycarbonate|plexiglass
aluminium: aluminum|aluminium
steel: steel|angle iron|steel bar
brass: brass
drill rod: drill rod|silver steel
uhmw: uhmw|uhmw tape
lumber: construction lumber|two by fours|framing lumber
wood glue: wood glue|yellow glue|white glue|pva|glue|hide glue
epoxy: epoxy|five minute epoxy
polyurethane glue: polyurethane glue
contact cement: contact cement|contact adhesive
super glue: super glue|ca glue|superglue
double sided tape: double sided tape|double stick tape|carpet tape
tape: masking tape|painters tape|tape|blue tape
screws: screws|wood screws|deck screws|screw|chipboard screws
pocket screws: pocket screws|pocket hole screws
lag screws: lag screws|lags|lag bolts|coach screws
machine screws: machine screws|machine screw
bolts: bolts|bolt|carriage bolts|hex bolts|coach bolts|carriage bolt
washers: washer|washers|fender washer|penny washer
nuts: nuts|wing nut|wing nuts|t nut|t nuts|lock nuts|lock nut|hex nut
threaded insert: threaded insert|threaded inserts
threaded rod: threaded rod|studding|all thread
knob: knob|knobs|star knob
nails: nails|finish nails|panel pins|finishing nails
brads: brads|brad nails|pin nails
staples: staples
dowels: dowels|dowel
biscuits: biscuits
splines: splines|spline
hinges: hinges|hinge|piano hinge|butt hinge|butt hinges|strap hinges
drawer slides: drawer slides|drawer runners|slides
magnets: magnets|magnet
casters: casters|castors|caster|locking casters
t track: t track|t-track
shims: shims
wall plugs: wall plugs|wall plug|rawl plugs
french cleat: french cleat
landscape fabric: landscape fabric|weed barrier
leather: leather
cord: cord|danish cord|paper cord|rope
sandpaper: sandpaper|sanding discs|abrasive paper
paste wax: paste wax|wax|furniture wax|beeswax
shellac: shellac
polyurethane: polyurethane|poly|wipe on poly
varnish: varnish|spar varnish
lacquer: lacquer
linseed oil: linseed oil|boiled linseed oil|raw linseed oil
danish oil: danish oil|teak oil|tung oil|hard wax oil|hardwax oil|mineral oil
paint: paint|milk paint|primer|undercoat
stain: stain|dye
alcohol: denatured alcohol|methylated spirits|meths|alcohol
mineral spirits: mineral spirits|white spirit|thinner|turpentine
`;
