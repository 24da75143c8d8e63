/**
 * Shop words that captions often get wrong. A line: `heard > meant | evidence | against`.
 * - heard: words as captions write them; variants parted by commas
 * - evidence: words of which one must stand within 12 words; `*` when the words make no sense otherwise;
 *   `+word` right after, `-word` right before, `@` a lone article before (a noun is wanted)
 * - against: words that speak for the word as heard
 * Groups in capitals are named in `groups`. Extend here; `mishearings.test.ts` has each line fire and not fire.
 */
export const groups: Record<string, string> = {
  WOOD: 'wood board boards plywood ply timber lumber oak pine maple walnut ash beech birch cherry cedar poplar grain panel shelf leg legs rail rails frame carcass cabinet stock piece end door plank planks top',
  CUT: 'cut cutting saw saws blade router bit table fence rip crosscut drill drilled groove slot chisel mill edge edges depth deep width wide bottom top across',
  JOINT:
    'joint joints joinery mortise mortises tenon tenons dovetail dovetails glue fit shoulder cheek',
  GLUE: 'glue glued clamp clamps clamped clamping pressure joint dry squeeze',
  FINISH:
    'finish coat coats wipe brush oil wax sand grit dries dry apply film thinner spray can alcohol',
  DRILL: 'drill drilling hole holes bit bits screw screws press pilot',
  HAND: 'hand plane iron shavings shaving sharpen edge smoothing block jack bench pass',
  LATHE: 'lathe turn turning spin spindle gouge tool rest bowl chuck tailstock headstock',
  METAL: 'steel rod drill file ream tap metal brass edge bolt hole',
};
export const mishearingLines = `
gig, gigs > jig, jigs | jig hold holds holding clamp clamps router drill hole holes pocket saw cut cuts board square piece table bench template shop build building wood fence | band show music stage tonight economy concert guitar
plain, plains > plane, planes | HAND down saw flat shave wood chisels shelf go up ramp heavy jointer joint end | old just yellow white simple english sight sawn brown bagel +old
rabbit, rabbits > rabbet, rabbets | CUT WOOD back panel mm deep wide along joint | hole animal ears hutch bunny hat carrot pet white easter
data > dado | CUT WOOD shelf shallow housing stack across | file files computer sheet spreadsheet phone plan analysis points
day doe, day dough, dato, day do, daydo, dotto > dado | CUT WOOD sit shelf wide deep stack | 
datas, day does > dados | CUT WOOD shelf |
tendon, tendons > tenon, tenons | JOINT CUT mortise | muscle doctor achilles injury knee pulled wrist
tenant, tenants > tenon, tenons | mortise joint shoulder cheek saw glue fit stretcher rung leg | rent landlord house lease flat
more tease, more tees, morris, more tis, mortis, more this > mortise | tenon tendon tenons tendons JOINT chisel |
mortar's, mortars > mortises | tenon tenons joint chisel |
in grain, and grain, engrain > end grain | look glue wood plane glass soak smooth sand cut board seal absorb glassy shooting pass planer | ingrained
living knife, driving knife, giving knife, arriving knife, raving knife > riving knife | * |
father board, father boards, further board > feather board, feather boards, feather boards | * |
fetter board, weather board, leather board > feather board | saw table fence router pressure push | roof siding cladding house
counter sync, counter sing, counter sink, countersync, counter sank, counter think, counter zinc > countersink | DRILL heads head bit | kitchen sink
chamber, camper, champ fur, champer, jam for, shamfer, champfer > chamfer | edge edges bottom bit router plane corner corners degree forty block along underside lead | van bed gun heart echo camping torture
chambers, campers > chamfers | edge edges bottom bit router plane corner corners |
chambered, campered > chamfered | edge edges bottom bit router plane corner corners |
towel, towels, dowl > dowel, dowels, dowel | drill hole holes glue inch diameter drops pin pins peg rod joint | paper bath dry wipe hands kitchen wet
shell lack, shell act, shell ac, shellack, shell ack, sheila, shall act > shellac | FINISH |
polly, paulie > poly | coat coats finish brush wipe dry satin | parrot
in a corner clamp > corner clamp | GLUE |
call, calls, called, callus > caul, cauls, caul, caul | clamp clamps clamping pressure spreads joint curved panel waxed flat @ | phone it them me him that this name video so
curve, curf, curb > kerf | saw blade wedge rip pinch close width table | radius template curved draw arc bend bent band street road dinner
meter saw, might or saw, mighter saw, mitre soar, motor saw > miter saw | * |
mighters, miders, my tours > miters | * |
meter, mighty, mider > miter | +gauge +joint +joints +slot +box +cut +square +fence +sled | tall long parking metres
plunge rotor, rotor > plunge router, router | plunge trim bit table cut groove slot template base edge collet straight | brake car helicopter wheel
rooter, rotter > router | bit table cut groove slot template edge collet straight plunge | boat ship
rowdy, rabid > rabbet | router groove panel edge deep wide |
fly wood, ply would, plywould, fly would, apply wood, ply woods, flywood > plywood | * |
empty f, mdf's, m d f, mtf, mds, empty have, mbf > mdf | * |
baltic church, baltic perch, baltic burch, ball tick birch > baltic birch | * |
church > birch | plywood ply sheet veneer baltic mil wood | sunday pew priest pray
birds eye, birch ice > bird's eye | maple figure figured |
hint > hinge | piano door doors screw screws leaf pin butt barrel lid mortise swing knuckle | give take tips clue clues
hindge, henge, hinch > hinge | door doors screw lid leaf pin box |
brisket, brisk it, briskets > biscuit, biscuit, biscuits | joint joints corner corners number slot slots glue jointer cutter edge panel alignment | smoke smoked meat bbq eat beef coffee oven dinner
chalk, chock, chuk > chuck | drill bit driver speed jaws press lathe tighten key clutch shank spin | line board white blackboard wheel wheels mark dust calk
french clean, french clear, french clique, french creek, french kleet, friend cleat, french cleet, french please > french cleat | * |
kleet, cleet > cleat | french wall hang hook screw strip bevel | wipe up up dust cloth nice surface
bezel, bevil > bevel | angle square tilt degree degrees saw blade chisel edge gauge grind sharpen sliding | watch screen phone herbs pasta level
bird, birds, brrr > burr, burrs, burr | edge edges scraper metal file steel deburr hook feel stone iron back drill drilled knife off take | house feeder nest sing box table sky
call it, collett, caulet > collet | router bit chuck rod shank tighten spindle wrench pointed nut quarter | phone name day done good
travel, trample > trammel | circle circles arm pivot pin radius router arc swings swing beam | trip plane car holiday abroad distance
fennel lick, phonetic, fanatic, phonolic, finolic, fennelic, final lick > phenolic | sheet plate base router insert thick drill tape quarter top | alphabet music
a pox e, a poxy, epoxies, pox e, a pock see, e poxy > epoxy | * |
rhema, rema, reemer > reamer | hole holes drill pin undersize press tapered size ream through bore | bend bending steam box sleep night
gym, chim, shem > shim | slide loosen thick thin paper card cards tape under level gap wedge screws behind fence | workout work membership exercise leg kick bruise
for center, four center, foreigner, forester, firster, foster, four stinger, forced near > forstner | bit bits hole drill diameter inch counterbore |
court are, cross cut sled > crosscut sled | * |
cross cat, across cut > crosscut | saw sled blade fence |
joiner plane, joint or > jointer plane, jointer | flatten face edge square board planer |
plainer, plane her, planar > planer | board thickness pass passes jointer surface through stock feed |
styles > stiles | rail rails door doors frame panel cope groove tenon | hair music fashion old modern similar free your
rails and styles > rails and stiles | * |
card kiss, carcase, car case, carcus, car kiss > carcass | cabinet side sides panel back shelf ply top bottom glue door doors box |
drawer slights, draw slides, drawer sliced > drawer slides | * |
draw, draws > drawer, drawers | slides slide runner runners bottom fronts front box boxes pull dovetail dovetails cabinet chest | pencil line lines sketch circle arc out picture
sprue, spruced > spruce | board timber framing lumber |
seizing, sap ely, sepele > sapele | board wood veneer mahogany |
lumbar > lumber | board boards wood yard rack pile stack saw rip construction rough | support back pain spine chair
sea clamp, see clamp, seek lamp > c clamp | * |
bar clamped, parallel clamped > bar clamps | panel |
vise's > vise | bench jaw jaws clamp held hold block file | words old man advice
mallard > mallet | chisel tap hit knock drive pound | duck pond
chistle, chizel, jizzle > chisel | sharp mallet mortise pare chop edge |
spoke shave, smoke shave, spook shave, spokes shave > spokeshave | * |
draw knife > drawknife | shave bark horse curve wood |
dove tail, dove tales, dub tail, dove tale > dovetail, dovetails, dovetail, dovetail | JOINT WOOD saw drawer pins tails angle marker jig key |
half blind does tails > half blind dovetails | * |
sliding devil, sliding table bevel > sliding bevel | angle |
kickpack, kick bag, kick pack > kickback | saw blade table router |
zero clear ants, zero clarence > zero clearance | insert throat plate saw table |
push stic, bush stick, push sick > push stick | * |
bush block, push black > push block | saw table jointer hand hands planer fingers |
gauze, gage, gouge > gauge | marking depth feeler angle mortise cutting line wheel scribe | turning lathe bowl everybody hey you what's bandage roughing spindle sharpen carve
gorge, gauge, googe > gouge | LATHE carve carving roughing spindle bowl | river wire brads feeler marking depth screws eighteen
head stock, heads stock > headstock | LATHE |
tail stock, tales stock > tailstock | LATHE |
face plate, facebook plate > faceplate | LATHE |
skewed, skew chisel, screw chisel > skew, skew, skew chisel | LATHE | crooked sideways angle
tool wrest, tool arrest, tool rests > tool rest | LATHE |
parting toll, party tool, parting two > parting tool | * |
live centre, life center, life centre > live center | LATHE |
band so, bandstand saw, van saw, banned saw, bond saw > bandsaw | * |
table so, table soar, cable saw, table song > table saw | * |
jig so, gig saw, jigger saw > jigsaw | * |
scroll so > scroll saw | * |
track so, truck saw, tracks all > track saw | * |
hack so, hex saw > hacksaw | * |
chop so > chop saw | * |
splints, splint > splines, spline | miter mitre corner corners key slot slots | doctor arm broken
loose tendon, loose tenant > loose tenon | * |
tri square, dry square > try square | mark line check corner ninety blade stock pencil scribe |
calibers, calibres, caliphers, caliber > calipers | measure measured thou thickness inch read reads reading jaws zero digital point diameter | gun bullet rifle
my crowmeter, micro meter, mike rometer > micrometer | * |
thou's, vow > thou | two three four five six ten | wedding
straight head, straightage, straight age > straightedge | flat lay check gap along ruler |
lie nails, brats, breads, bradz > brads | gauge nailer nail nails glue shoot pin tack | kids children sausage eat toast
laggs, legs bolts, lag bolds, lack bolts, lack screws, leg bolts > lags, lag bolts, lag bolts, lag bolts, lag screws, lag bolts | * |
carriage bolds, cabbage bolts, carriage boats > carriage bolts | * |
tea nut, tee nut, t net, teen nut, tea nuts > t nut, t nut, t nut, t nut, t nuts | bolt bolts thread threaded hammer hole drill knob | drink
tea track, tee track, t trek > t track | * |
threaded in search, threaded assert, threaded inset, threaded in certs > threaded insert | * |
pastor, pastors, costers > caster, casters, casters | wheel wheels locking swivel plate roll rolling cart bolt bolts | church sand king
lineseed oil, linseed all, lindsey oil, lynn seed oil, linc seed oil > linseed oil | * |
tongue oil, tung all, tongue all > tung oil | * |
danish all, dennis oil > danish oil | * |
laquer, lack her, lacquered, locker > lacquer | coat coats spray finish brush sand thinner dry film | gym school drink bottle bar key
varnished > varnish | coat coats finish brush spar sand dry satin | disappear gone
paced wax, paste whacks, paste works, waist wax > paste wax | * |
would glue, wood blue > wood glue | * |
spring joint, sprung joined > sprung joint | GLUE |
copying saw, coughing saw, coping soar > coping saw | * |
sand paper, sand pepper, san paper > sandpaper | * |
grid, grits > grit | sandpaper sand sanding sanded hundred eighty twenty forty paper sander scuff -80 -120 -150 -180 -220 -240 -320 -400 -twenty -eighty -forty -fifty | lines power graph idea job
scribe lion, scribed lime > scribe line | * |
joyce, joist's > joist | floor deck hanger beam framing hangers ceiling | your good personal best
studs finder, stud fighter > stud finder | wall |
plum > plumb | level wall line post vertical check straight square | fruit jam tree tart wine
level it's, spirit devil > spirit level | wall |
lap joined, lab joint, lamp joint > lap joint | * |
bridal joint > bridle joint | * |
butt joined, but joint, bought joint > butt joint | * |
box joined, fox joint > box joint | * |
finger joined > finger joint | * |
tongue and grove, tongue in groove, tonguing groove > tongue and groove | * |
grove, groves > groove, grooves | panel router cut deep wide tongue plough bottom drawer slot bit dado runs glue bead fold along | trees orange music band
baton, batons, batting > batten, battens, batten | wall screw board doors strip roof ledge brace hang | relay police orchestra baseball cricket
heiress > arris | edge edges plane soften sand sharp break corner | france
strop's, stroppy, stropes > strop | leather sharpen edge blade compound honing | mood
horning, owning > honing | guide stone chisel edge sharpen angle bevel | horn house
stop blog, stopped block, shop block > stop block | fence saw cut length miter clamp same |
bench docks, bench docs > bench dogs | * |
hold fast, hold vast > holdfast | bench hole mallet hammer |
rift saw, rift sewn, quarter sewn, quarter sun, quarter song > rift sawn, rift sawn, quarter sawn, quarter sawn, quarter sawn | oak grain board boards wood |
out feed, out feet > outfeed | table saw roller support planer | clothes wearing
in feed > infeed | table planer roller jointer support | baseball
`;
