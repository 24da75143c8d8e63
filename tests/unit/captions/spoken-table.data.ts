/**
 * Measures as the trade says them (common practice, no source), one a line: what is said | values | unit.
 * `-` for no measure. A leading [mm], [in] or [mixed] sets the units of the talk; inches otherwise.
 */
export const spokenLines = `
half inch plywood | 0.5 | in
a half inch dowel | 0.5 | in
half an inch deep | 0.5 | in
a quarter inch | 0.25 | in
a quarter of an inch | 0.25 | in
three quarters of an inch | 0.75 | in
three quarter inch ply | 0.75 | in
an eighth of an inch | 0.125 | in
an eighth inch bit | 0.125 | in
five eighths wide | 0.625 | in
seven eighths thick | 0.875 | in
a sixteenth proud | 0.0625 | in
three sixteenths | 0.1875 | in
five sixteenths deep | 0.3125 | in
seven sixteenths | 0.4375 | in
nine sixteenths | 0.5625 | in
eleven sixteenths | 0.6875 | in
thirteen sixteenths | 0.8125 | in
fifteen sixteenths | 0.9375 | in
a thirty second | 0.03125 | in
a thirty second of an inch | 0.03125 | in
three thirty seconds | 0.09375 | in
five thirty seconds | 0.15625 | in
seven thirty seconds | 0.21875 | in
nine thirty seconds | 0.28125 | in
thirteen thirty seconds | 0.40625 | in
twenty three thirty seconds | 0.71875 | in
thirty one thirty seconds | 0.96875 | in
a sixty fourth | 0.015625 | in
three sixty fourths | 0.046875 | in
fifteen sixty fourths | 0.234375 | in
seventeen sixty fourths | 0.265625 | in
sixty three sixty fourths | 0.984375 | in
an inch | 1 | in
an inch and a half | 1.5 | in
inch and a half | 1.5 | in
an inch and a quarter | 1.25 | in
an inch and three eighths | 1.375 | in
an inch and a sixteenth | 1.0625 | in
one inch | 1 | in
one and a half inches | 1.5 | in
one and three quarter inches | 1.75 | in
two inches | 2 | in
two inches and a quarter | 2.25 | in
two and a half inches | 2.5 | in
two and a quarter inches wide | 2.25 | in
two and seven sixteenths | 2.4375 | in
three and nine sixteenths | 3.5625 | in
three and a half square | 3.5 | in
four and a quarter | 4.25 | in
five and five eighths | 5.625 | in
twelve inches | 12 | in
fourteen inches long | 14 | in
twenty eight and five eighths | 28.625 | in
thirty four and a half inches | 34.5 | in
fifty seven and an eighth | 57.125 | in
sixty three and thirty one thirty seconds | 63.96875 | in
the board is nine wide | 9 | in
it is twelve deep | 12 | in
thirty six long | 36 | in
seven high | 7 | in
set the fence at twelve | 12 | in
set the fence to six | 6 | in
rip it down to four | 4 | in
the shelf is ten deep | 10 | in
holes three apart | 3 | in
on sixteen inch centers | 16 | in
sixteen inches on center | 16 | in
point six one five | 0.615 | in
point two four two | 0.242 | in
point seven four two | 0.742 | in
zero point two five | 0.25 | in
point oh six two | 0.062 | in
point two five oh oh | 0.25 | in
two point two five inches | 2.25 | in
eight point zero zero four | 8.004 | in
one point oh one two | 1.012 | in
sixty thou | 0.06 | in
ten thou | 0.01 | in
five thou | 0.005 | in
half a thou | 0.0005 | in
a thou | 0.001 | in
two thousandths | 0.002 | in
fifteen thousandths | 0.015 | in
seven forty two thou | 0.742 | in
six fifteen thousandths | 0.615 | in
two and a half thou | 0.0025 | in
with the calipers it reads two forty two | 0.242 | in
the calipers say seven forty two | 0.742 | in
eight foot | 8 | ft
eight foot long | 8 | ft
eight feet | 8 | ft
six and a half feet | 6.5 | ft
a foot and a half | 1.5 | ft
four foot three | 51 | in
four foot three inches | 51 | in
five foot three and a half | 63.5 | in
five feet three and a half inches | 63.5 | in
two foot four by four foot eight | 28,56 | in
six foot six | 78 | in
three foot nine and a quarter inches | 45.25 | in
fifteen by ninety | 15,90 | in
twelve inches by twenty inches | 12,20 | in
twelve by twenty inches | 12,20 | in
an inch and a half by three quarters by twelve inches | 1.5,0.75,12 | in
inch and three quarters by three and three quarters | 1.75,3.75 | in
seven by seven | 7,7 | in
twenty four by fifty two | 24,52 | in
three quarters by two and a half by thirty | 0.75,2.5,30 | in
a four by eight sheet | 4,8 | ft
four by eight sheet of ply | 4,8 | ft
a five by five sheet | 5,5 | ft
[mm] eighteen mil birch ply | 18 | mm
[mm] eighteen mil | 18 | mm
[mm] twelve millimetres | 12 | mm
[mm] a millimetre | 1 | mm
[mm] half a mil | 0.5 | mm
[mm] half a millimetre | 0.5 | mm
[mm] point two of a mil | 0.2 | mm
[mm] seventeen point six mil | 17.6 | mm
[mm] one point eight millimetres | 1.8 | mm
[mm] six hundred wide | 600 | mm
[mm] five hundred and seventy six long | 576 | mm
[mm] five seventy six long | 576 | mm
[mm] two hundred and ninety eight wide | 298 | mm
[mm] one thousand seven hundred and fifty from the floor | 1750 | mm
[mm] a thousand and one across | 1001 | mm
[mm] a hundred mil | 100 | mm
[mm] hundred mil | 100 | mm
[mm] twelve hundred long | 1200 | mm
[mm] twenty four forty long | 2440 | mm
[mm] three fifty by seven hundred by eighteen mil | 350,700,18 | mm
[mm] three fifty by seven hundred by eighteen | 350,700,18 | mm
[mm] six hundred by four hundred by eighteen mil | 600,400,18 | mm
[mm] six hundred by eight hundred by two hundred | 600,800,200 | mm
[mm] eight hundred by two hundred | 800,200 | mm
[mm] forty by forty by twenty mil | 40,40,20 | mm
[mm] ten by three magnets | 10,3 | mm
[mm] three eight nine overall | 389 | mm
[mm] two metres | 2000 | mm
[mm] two point four metres | 2400 | mm
[mm] half a metre | 500 | mm
[mm] a metre and a half | 1500 | mm
[mm] one metre twenty | 1200 | mm
[mm] thirty centimetres | 300 | mm
[mm] two and a half centimetres | 25 | mm
[mm] set the fence to one eighty | 180 | mm
[mm] the gap is two | 2 | mm
[mm] it is really seventeen point six | 17.6 | mm
[mm] thirty five apart | 35 | mm
[mm] twenty two diameter | 22 | mm
[mm] holes sixty deep | 60 | mm
forty five degrees | 45 | deg
half a degree | 0.5 | deg
a forty five degree chamfer | 45 | deg
at a forty five | 45 | deg
tilt the blade to thirty | 30 | deg
twenty two and a half degrees | 22.5 | deg
fifteen degrees off vertical | 15 | deg
seven degrees | 7 | deg
ninety degrees | 90 | deg
eighty two degrees | 82 | deg
thirty seconds | 30 | s
wait sixty seconds | 60 | s
five minutes | 5 | min
five minute epoxy | 5 | min
let it sit for half an hour | 0.5 | h
leave it an hour | 1 | h
an hour and a half | 1.5 | h
two and a half hours | 2.5 | h
three quarters of an hour | 0.75 | h
ninety minutes | 90 | min
twenty four hours | 24 | h
leave it for two days | 2 | day
ten to fifteen minutes | 10,15 | min
fifteen or twenty minutes | 15,20 | min
between ten and fifteen minutes | 10,15 | min
an hour or two | 1,2 | h
two to three hours | 2,3 | h
three or four inches | 3,4 | in
two to three thou | 0.002,0.003 | in
[mm] two to three mil | 2,3 | mm
mix it one to one | 1,1 | ratio
three to one mix | 3,1 | ratio
a one in six dovetail | 1,6 | ratio
a slope of one in eighty | 1,80 | ratio
two parts resin to one part hardener | 2,1 | ratio
two coats | 2 | count
three coats of oil | 3 | count
one coat of wax | 1 | count
two passes | 2 | count
three passes | 3 | count
four legs | 4 | count
seven sticks | 7 | count
sixteen lags | 16 | count
thirty two holes | 32 | count
eight clamps | 8 | count
six clamps | 6 | count
four long rails | 4 | count
two doors | 2 | count
two layers | 2 | count
cut four of them | 4 | count
make two of those | 2 | count
four in total | 4 | count
a dozen screws | 12 | count
twenty biscuits | 20 | count
five shelves | 5 | count
three boxes | 3 | count
two half inch dowels | 2;0.5 | count;in
six three inch screws | 6;3 | count;in
four number eight by inch and a quarter screws | 4;8,1.25 | count;screw
two 18 gauge brads | 2;18 | count;gauge
two quarter twenty by two inch bolts | 2;0.25,20,2 | count;bolt
four legs at twenty eight and five eighths | 4;28.625 | count;in
eight boards at thirty six inches | 8;36 | count;in
eight foot two by fours | 8;2,4 | ft;nominal
two by four | 2,4 | nominal
a two by four | 2,4 | nominal
two by fours | 2,4 | nominal
one by six boards | 1,6 | nominal
a scrap of two by six | 2,6 | nominal
some one by threes | 1,3 | nominal
a four by four post | 4,4 | nominal
two by tens | 2,10 | nominal
four quarter rough stock | 1 | nominal
eight quarter maple | 2 | nominal
five quarter oak | 1.25 | nominal
six quarter ash | 1.5 | nominal
number eight by inch and a quarter | 8,1.25 | screw
number eight by inch and a quarter screws | 8,1.25 | screw
number six by half inch | 6,0.5 | screw
number ten by three inch screws | 10,3 | screw
number tens | 10 | screw
number eights | 8 | screw
number eight screws | 8 | screw
eight by inch and a half screws | 8,1.5 | screw
quarter inch by inch and a half lags | 0.25,1.5 | screw
five sixteenths by four inch lags | 0.3125,4 | screw
[mm] four by thirty screws | 4,30 | screw
[mm] screws four by thirty | 4,30 | screw
[mm] eight by fifty screws | 8,50 | screw
[mm] three and a half by thirty five screws | 3.5,35 | screw
[mm] six by eighty screw | 6,80 | screw
quarter twenty bolt | 0.25,20 | bolt
quarter twenty by two inch | 0.25,20,2 | bolt
three eighths sixteen by four inch | 0.375,16,4 | bolt
three eighths by three inch bolts | 0.375,3 | bolt
half thirteen bolt | 0.5,13 | bolt
ten twenty four machine screw | 10,24 | bolt
eight thirty two by three quarter inch machine screw | 8,32,0.75 | bolt
five sixteenths eighteen bolt | 0.3125,18 | bolt
[mm] m6 by forty | 6,40 | bolt
[mm] m5 | 5 | bolt
[mm] an m eight bolt | 8 | bolt
[mm] m8 by a hundred | 8,100 | bolt
18 gauge | 18 | gauge
sixteen gauge nails | 16 | gauge
twenty three gauge pins | 23 | gauge
one twenty grit | 120 | grit
two twenty grit | 220 | grit
eighty grit | 80 | grit
sand it to three twenty | 320 | grit
sand with one eighty | 180 | grit
four hundred grit | 400 | grit
sand with one twenty then one eighty then two twenty | 120;180;220 | grit;grit;grit
thirty five pounds of clamp | 35 | lb
a hundred and seventy five pounds | 175 | lb
[mm] twenty two kilos | 22 | kg
five hundred rpm | 500 | rpm
eighteen thousand rpm | 18000 | rpm
ten teeth per inch | 10 | tpi
eight percent moisture | 8 | percent
twenty degrees celsius | 20 | C
five eighths sorry eleven sixteenths | 0.6875 | in
two inches no wait two and a half | 2.5 | in
cut it at twelve inches i mean thirteen inches | 13 | in
ten minutes make that fifteen minutes | 15 | min
[mm] forty mil sorry fifty mil | 50 | mm
eleven years | - | -
fifteen bucks | - | -
four thousand subscribers | - | -
number one tip | - | -
one more time | - | -
ninety dollars | - | -
video two hundred and twelve | - | -
in twenty nineteen | - | -
three years ago | - | -
a five year old | - | -
sixty eight euros | - | -
the two of them | - | -
a couple of clamps | - | -
give me a second | - | -
in a minute | - | -
my number five plane | - | -
two car garage | - | -
twenty six years | - | -
part two | - | -
a quarter turn | - | -
half of it | - | -
project number two | - | -
it cost twenty quid | - | -
ten thousand views | - | -
step three | - | -
an 18 volt drill | - | -
two hundred square feet | - | -
the second coat | - | -
3/4" | 0.75 | in
1-1/2" | 1.5 | in
1 1/2 inches | 1.5 | in
2 7/16" | 2.4375 | in
5' 3-1/2" | 63.5 | in
0.742" | 0.742 | in
1½" | 1.5 | in
⅝ in deep | 0.625 | in
3.375 inches | 3.375 | in
2x4 | 2,4 | nominal
2x4s | 2,4 | nominal
[mm] 18mm ply | 18 | mm
[mm] 600 x 400 x 18mm | 600,400,18 | mm
[mm] 600mm by 400mm | 600,400 | mm
[mm] 1,750mm | 1750 | mm
[mm] 2.4m long | 2400 | mm
45° | 45 | deg
45 degrees | 45 | deg
220 grit | 220 | grit
#8 x 1-1/4" screws | 8,1.25 | screw
1/4-20 x 2" bolts | 0.25,20,2 | bolt
$15 | - | -
10-15 minutes | 10,15 | min
[mm] M6x40 bolt | 6,40 | bolt
12" by 20" | 12,20 | in
8 ft long | 8 | ft
23/32 ply | 0.71875 | in
`;
