/**
 * Ten thousand stems that people choose again and again, in small letters, without signs and without
 * the digits around them. The commonest of the list in @zxcvbn-ts/language-common 4.1.3, which was
 * counted from passwords that became public (MIT, © Dan Wheeler and Dropbox, Inc., © zxcvbn-ts), with
 * some of our trade added.
 */
export const commonPasswords: ReadonlySet<string> = new Set(
  `
a123456a a1a2a a1a2a3a a1a2a3a4a a1b2c a1b2c3d a1b2c3d4e a1s2d a1s2d3f a1s2d3f4g a2a3a4a a2b3c a2b3c4d
a2b3c4d5e a2s3d a2s3d4f a2s3d4f5g a4tech aaaaa aaaaaa aaaaaaaa aaaaaaaaaa aaabbb aaasss aabbcc aaliyah
aardvark aaron aassdd abacab abacus abbey abbott abcabc abcdabcd abcdef abcdefg abcdefgh abcdefghi abcdefghij
abcxyz abdullah aberdeen abgrtyu abigail abnormal abracadabra abraham abrakadabra abraxas abrupt absolut
absolute absolutely abstr abstract abudfv acacia academy acapulco accept access accessdenied acclaim accord
account aceman acetate achilles achtung acidburn acmilan action active acura adams addict addicted addison
address adelaide adelina adeline adgjmptw adidas admin adminadmin administrator admiral adonis adrenalin adria
adrian adriana adrianna adriano adrienne adrock adult adults advance advanced advent adventur adventure
aerosmit aerosmith aezakmi africa afrika again agassi agatha agent aggie aggies aguila ahmed aikido aikman
aileen aimee airborne airbus aircraft airforce airman airplane airport airwolf aisan akasha akatsuki akira
alabama aladdin aladin alain alanis alanna alaska alatam albany albatros albert alberta alberto albina albino
albion alcatel alcatraz alchemy alcohol alejandr alejandra alejandro aleksander aleksandr aleksandra aleksei
aleksey alena alenka alert alesha alessand alessandro alessio alexa alexalex alexande alexander alexandr
alexandra alexandre alexandru alexei alexey alexi alexia alexis alexus alexxx alfalfa alfarome alfonso alfred
alfredo algebra algernon alibaba alice alicia alien aliens aligator alina alinka alisa alisha alisher alison
alissa alive alkaline all4one allah allan allblack allday allegra allegro allen alley alleycat allgood
alliance allie allied alligator allison allman allmine allnight allright allsop allstar allstate allyson
almighty almond aloha alone alonso alonzo alpha alphabet alphaman alpina alpine alright altair altec alterego
althea althor altima altoids alucard alvaro alvin always alyson alyssa amadeus amalia amand amanda amarillo
amateur amateurs amatory amature amazing amazon amber ambers ambrose ambrosia amelia amelie americ america
american amerika ameteur amethyst ametuer amidala amiga amigo amigos amnesia amonra amorcit amore amoremio
amores amour amstel amsterda amsterdam anaconda anakin anakonda analog analsex ananas anarchy anastasi
anastasia anastasiya anchor anders andersen anderson andre andrea andreas andreev andrei andrej andres andrew
andrews andrey android andromed andromeda andyandy andyod anechka anfield anfisa angel angela angele angeles
angelic angelica angelika angelina angeline angelit angelito angell angelo angelok angels angelus angie angus
anhyeuem animal animals animated anime anita ankara annaanna annabell annette annie annika annmarie anonymous
another answer antares antelope anthem anthon anthony anthrax antigone antoine anton antoni antonia antonina
antonio antonov antony antwerp anubis anything anytime aolsucks apache apollo apple applepie apples apricot
april aprilia apteka aptiva aquafina aquarium aquarius aquila aqwzsx arabella aragon aragorn aramis arcadia
arcane arcangel archange archangel archer archery archie architec archon arctic argent argentin argentina
argyle ariana ariane arianna ariel arielle aries arizona arjay arkansas arlene armada armageddon armagedon
arman armand armando armani armored armstron armstrong arnaud arnold around arrakis arrow arrows arsena
arsenal artem artemis artemka arthur artist artur arturo asdas asdasd asddsa asdfasdf asdffdsa asdfg asdfgh
asdfghj asdfghjk asdfghjkl asdfjkl asdfqwer asdfzxcv asdqwe asdzxc asgard ashle ashlee ashleigh ashley ashton
ashtray asian asians aside asimov aslan asmodeus aspen aspire aspirin aspirine assasin assass assassin
assassins assault asscock asses assface assfuck asshol asshole assholes asslover assman assmunch asswipe
assword astalavista asterix asthma astonvil astra astral astrid astro astros asylum athena athens athletic
athlon athome atlanta atlantic atlantis atlas atomic atreides attack atticus attila attitude attorney attract
aubrey auburn auckland audia audio auditt audrey auggie august augusta augustin augusto augustus aurelie
aurora aussie austin australi australia austria autumn avalanch avalanche avalon avangard avanti avatar
avenger avengers avenue avery aviation aviator avrora awesome awful awnyce axeman ayanami ayrton azamat azazel
azert azerty azertyui azertyuiop azrael azsxdc azsxdcfv aztnm azzer babel babemagn babemagnet baberuth babes
babies baboon babushka babybaby babybear babyblue babyboy babycake babydoll babyface babygir babygirl babylon
babylove bacardi bacchus bachelor backbone backdoor backup bacon badabing badass badboy badboys baddest baddog
badger badgers badgirl badguy badkarma badman badnaamhere bagels baggies baggins baggio bagira bagpuss bahamas
bahamut bailey bajingan baker balance balboa balder baldur baldwin ballard baller ballet ballin balloon
balloons balls ballsack balrog baltimor bambam bambi bambino bamboo banaan banan banana bananas banane bandi
bandit bangbang banger bangkok banker banks banner banshee banzai baracuda baraka barbados barbara barber
barbie barcelon barcelona barclay barefeet barefoot barfly baritone barker barkley barks barley barlow barnaby
barnes barney barnie baron baronn barracud barracuda barrage barrel barrett barron barry barselona barsik
bartman bartok barton basebal baseball basement basher basic basil basket basketba basketbal basketball
bassbass basset bassett bassin bassman bassoon bastard bastards bastet bastian batgirl bathing batista batma
batman battery battle bauhaus baura bavaria baxter bayern baylee baylor baywatch bazooka bball bbbbbb bbking
bcfields bdfyjd bdfyjdf beach beachbum beaches beacon beagle beaker beaks beamer beanbag beaner beanie beans
bearbear bearcat bearcats beardog bears beast beastie beater beating beatle beatles beatrice beatriz beaumont
beautifu beautiful beauty beaver beavers beavis because becca becker beckham becky becool bedford bedlam
bedrock bedroom beebop beech beefcake beeker beeline beemer beepbeep beerbeer beerman beerme beethove beetle
beezer before begemot behappy beijing belair belfast belgium believe belinda belinea belize belkin bella
bellaco bellagio belle belly belmont beloved bender bendover benedict benessere benfica bengal bengals benito
benjami benjamin benji bennett bennie benny benoit benson bentley benton beowulf beretta bergen berger
bergkamp berkeley berlin bermuda bernard bernardo bernhard bernice bernie berry berserk bertha bertie bertram
bertrand bessie bestbuy bethany betsy better bettina bettis betty bettyboo bettyboop beverley beverly beyonce
beyond bgates bhbcrf bhbirf bhbyrf bhjxrf bianca biatch bicycle bigal bigass bigbad bigballs bigbang bigbear
bigben bigbird bigblack bigblock bigblue bigbob bigboobs bigbooty bigboss bigboy bigbucks bigbutt bigbutts
bigcat bigcock bigdad bigdaddy bigdawg bigdick bigdicks bigdog bigfish bigfoot bigger biggie biggirl biggles
biggun bigguns bigguy bighead bigjim bigjoe bigjohn bigmac bigmama bigman bigmike bigmoney bignasty bignuts
bigone bigones bigpenis bigpimp bigpoppa bigpun bigpussy bigred bigsexy bigshow bigtime bigtit bigtits
bigtruck biguns bigworm biker bikers bikini bilbo billabon billabong billbill billie billows bills billy
billybob billyboy bimbo bimmer binder bingo binky binladen biohazard biology bionic bionicle birddog birdie
birdman birgit birthday biscuit biscuits bisexual bishop bismarck bismark bismilla bismillah bitch bitchass
bitches bitchs bitchy biteme bitter bizkit bizzare blabla black blackass blackbel blackbelt blackberry
blackbir blackbird blackboy blackcat blackcoc blackcock blackdog blackhaw blackhawk blackice blackie blackjac
blackjack blacklab blackman blackops blackout blacks blacky blade blades blahblah blaine blair blake blanca
blanche blanco blank blanked blast blaster blaze blazer blazers bleach bledsoe blender blessed blessing blind
blink blinky bliss blitz blizzard blobby block blocked bloke blond blonde blondes blondie blondinka blonds
blondy blood bloods bloody bloopers blossom blower blowfish blowjob blowme blubber blueball bluebell blueberr
blueberry bluebird blueblue blueboy bluedog blueeyes bluefish bluejay bluejays blueman bluemoon bluenose blues
bluesky bluesman bluestar blunt blunted blunts board boarder boater boating boats bobafett bobber bobbi bobbie
bobbob bobby bobbys bobcat bobcats bobdole bobdylan bobert bobmarle bobmarley boeing bogart bogdan bogey
bogota bogus bohica boiler boingo bolero bolitas boliva bolivi bollocks bollox bologna bolton bombay bomber
bombers bonanza bondage bonehead boner boners bones bonethug bonghit bongo bonita bonjour bonjovi bonkers
bonner bonnie bonovox bonsai bonzai bonzo boobear boobed boobie boobies booboo boobs boogaloo booger boogers
boogie boohoo bookcase booker bookie books bookworm boomboom boomer booper booster booter bootie bootleg boots
bootsie bootsy booty bootys booyah boozer bopper borabora bordeaux border borders borges boricua boris borman
boroda boromir borussia bosco bosshog bossman boston bottle bottom boulder bounce bouncer bounty bourbon bowie
bowler bowling bowman bowser bowtie bowwow boxcar boxer boxers boxing boxster boxter boytoy br0d3r bracken
bradford bradley bradshaw brady brain brains bramble branch brand branden brandi brando brandon brandy brasil
bravehea braveheart braves bravo braxton brazil bread break breaker breanna breast breasts breath breathe
breeze breezy bremen brenda brendan brenna brennan brent brest brett brewer brewster brian briana brianna
brians brick bricks bridge bridget briefs brigada briggs bright brighton brigitte brisbane bristol british
britney britt britta brittany brittney broad broadway brock brodie broken broker bronco broncos bronson bronze
brook brooke brooklyn brooks brother brothers brown browndog brownie browning browns bruce brucelee bruins
bruiser brunette bruno brutal brutus bryan bryant bryson bubba bubbas bubble bubblegum bubbles buceta buchanan
buckaroo bucker bucket buckeye buckeyes buckley bucks buckshot buckwhea bucky budapest buddah buddha buddie
buddies buddy buddyboy buddydog buddys budgie budlight budlite budman budweise budweiser buffa buffalo buffer
buffet buffett buffy buford bugatti bugger bugman bugsbunn buick builder building bukkake bukowski bulldawg
bulldog bulldogs buller bullet bulletin bullfrog bullit bullock bulls bullseye bullshit bullwink bumble bummer
bumper bundy bunghole bungle bunker bunnie bunnies bunny buratino burger burgess burner burning burnout burns
burrito burton bushel bushido bushman business businessbabe buste busted buster bustle busty butch butcher
butchie butchy butkus butler buttbutt butter buttercu buttercup butterfl butterfly butters buttfuck butthead
butthole buttman button buttons butts buzzard buzzer bynthytn byron byteme c2h5oh c3por2d cabbage cabernet
cabinetmaker cable caboose cabron cactus caddy cadillac cadman caesar caitlin caitlyn cajun calamity calculus
caldwell caleb calendar calgary calibra calico caliente californ california caligula calimero callahan
callaway callie calling callisto callofduty callum calvin calypso camaro camaross camber cambiami cambridg
cambridge camden camel camelot camels cameltoe camera camero cameron camil camila camilla camille camilo
camino campbell camper camping campus canada canadian canary cancel cancer cancun candace candice candie
candies candle candles candy candyass candyman candys canine cannabis cannibal cannon cannonda canon canton
cantona cantor canuck canucks canyon capcom capecod capetown capital capitals capoeira capone caprice capricor
capricorn capslock captain caracas carajo caralho caramba caramel caravan carbon cardiff cardinal cardinals
cards carebear carefree carina carla carlin carling carlisle carlito carlitos carlo carlos carlotta carlton
carman carme carmel carmen carmex carmine carnage carney carnival carol carola carole carolin carolina
caroline carolyn carpedie carpediem carpente carpenter carpentry carpet carrera carrie carroll carrot carrots
carson carsten carter carthage cartier cartman cartoon cartoons carver casablanca casanova cascade caserta
casey caseydog cashew cashflow cashmone cashmoney casino casio caspe casper cassandr cassandra cassi cassidy
cassie cassius caster castillo castle castor castro casual catalina catalog catch catcher catdaddy catdog
caterina catfight catfish catfood catherin catherine catholic cathy catman catnip cattle catwoman caught
caution cavalier cavalry caveman cayenne cayman cazzo cazzone cbr600rr cbr900rr ccbill cccccc cdtnbr cdtnkfyf
ceasar ceaser cecil cecile cecilia ceckbr cedar cedars cedric celeb celebrity celeron celeste celica celina
celine celtic celtics cement center central century cerber cerberus cerebus cesar cesare cessna cevthrb cezer
cfitymrf cfvceyu cgfhnfr chachi chadwick chains chainsaw chair chairman challeng chamber chambers champ
champion champs chance chandler chandra chanel chang change changed changeme changemenow changes chango
channel chantal chaos chapman chappy charge charger chargers charisma charity charle charlene charles charley
charli charlie charlott charlotte charlton charly charmed charming charon charter chase chaser chastity
chateau chatham chauncey chavez cheater check checker checkers checkit checkmat cheddar cheeba cheech cheeks
cheeky cheerleaers cheers chees cheese cheesy cheetah chelle chelse chelsea chelsey chemical chemist chemistry
cheng cherie cherokee cherries cherry cheryl cheshire chess chessie cheste chester chestnut chevelle chevrole
chevrolet chevy chevys chewbacc chewey chewie chewy cheyanne cheyenne chiara chicago chicco chichi chick
chicken chickens chickenwing chicks chico chief chiefs chiks child children chili chill chilli chillin chilly
chimera china chinchin chinese chingon chino chinook chipmunk chipper chippy chips chiquita chisel chitown
chivas chloe chocha chocolat chocolate choice choke chong chooch choochoo chopin chopper choppers chouchou
chowchow chowder chris chrisb chrisbln chriss chrissy christ christa christel christi christia christian
christie christin christina christine christma christmas christo christop christophe christopher christy
chrome chronic chrono chronos chrysler chuai chuan chuang chubby chuck chuckie chuckles chucky chunky church
churchil ciaociao ciccio cicero cigar cigars cimbom cinder cindy cinema cinnamon circle circus cirrus cisco
citadel citation citibank citizen citroen citron citrus civic civicsi civilwar cjkysirj cjkywt cjytxrf claire
clancy clapton clara clarence clarinet clarissa clark clarke class classic classics claude claudi claudia
claudine claudio claymore claypool clayton clean cleaner cleaning clemens clement clemente clemson cleopatr
cleopatra clerks cletus clevelan cleveland clever click cliff clifford cliffy clifton climax climber climbing
clint clinton clipper clippers clips clitoris clock close closer closeup cloud clouds cloudy clover clovis
clown clowns clueless cluster clutch clyde cneltyn cnfkrth cnfybckfd cntgfy coach coaster cobain cobalt cobra
cobras cocacol cocacola cocaine cochise cocker cocks cocksuck cocksucker cocktail cocoa coconut codered coffee
coffees cohiba coldbeer coldplay coleman colin collect colleen college collie collin collins colnago colombia
colombo colonel colonial color colorado colors colossus colton coltrane columbia columbo columbus comanche
combat comcast comedy comein comeon comet comets comfort comicbookdb comics coming command commande commander
commando comment commerce common compact company compaq compass complete complex compton compute computer
computers conan concept concord concorde concrete condom condor confirm confused connect conner connie connor
conover conquer conquest conrad constant consuelo consult consumer contact contains content contest contests
continue contortionist contour contra contract control converse conway coochie cooker cooki cookie cookies
cooking coolcat coolcool cooldude cooler coolgirl coolguy coolhand coolio coolman coolness cooper coors cooter
copenhag copper coral corazo corazon corbin cordelia cordoba corey corgan corina corinna corinne corky
corleone corndog cornelia cornell corner cornhole cornwall corolla corona corporal corps corpse corrado
correct correcthorsebatterystaple corsair corsica cortez cortina corvet corvett corvette corwin cosmic cosmo
cosmos costanza costaric costello cosworth cottage cotton cougar cougars counter country county couple couples
courage courier court courtney cousin coventry cowboy cowboys cowboyup cowgirl coyote crack cracker crackers
cradle craft crafty craig cramps crane crank crappy crash crave craven craving crawford crayon crazy crazybab
crazyman cream creampie creamy create creation creative creator creature credit creed creeper creepers creepy
crescent crevice cricket criminal crimson crispy crissy cristal cristian cristin cristina critter crjhgbjy
crockett crocodil cromwell cronic crosby cross crowbar crowley crown cruise cruiser crumbs crunch crusader
crusher crusty crysis crystal csyekz csyjxtr cthtuf cthulhu cthutq ctrhtn cubbies cubswin cucumber cuddles
cueball cuervo culinary cullen cummer cumming cummins cumshot cumslut cunts cupcake cupoi curious curley
curtis custard custer custom customer cutie cutiepie cutlass cutter cvbhyjdf cvthnm cxfcnkbdfz cxfcnmt cyber
cybersex cyborg cyclone cyclones cyclops cygnus cygnusx cynthia cypher cypress cyprus cyrano cyrus dabears
dabomb dabulls daddy daddyo daddys daedalus daemon daewoo daffy dagger dagmar dagobert daisey daisy daisydog
dakota dalejr dallas dalshe dalton damage daman damian damien damion dammit damned damnit damon dance dancer
dancing dandy danger dangerou dangerous danie daniel daniela daniele daniell daniella danielle daniels daniil
danil danila danilka danilo danish danman danni danny dannyboy dante dantes danzig daphne daredevi daredevil
darian darina darius darkange darkangel darkelf darklord darkman darknes darkness darkone darkside darkstar
darlene darling darnell darrel darrell darren darryl darth darthvad darthvader darwin dasani dasha dasher
dashka database dating datsun daughter davedave david davidb davidc davide davidoff davids davidson davies
davinci davis dawgs dawns dawson daydream daylight daytek dayton daytona dazzle dbnfkbq dbnfkbr dbnfkz dbrecz
dbrnjh dbrnjhbz ddddd deacon deadhead deadly deadman deadpool deadspin dealer deanna death deathnote deathrow
deaths debbie debora deborah debra december decimal decker deedee deejay deepak deepblue deeper deepthro
deepthroat deerhunt deeznuts deeznutz default defcon defender defense defiant deftones degree deicide dejavu
delaney delaware delboy delete delfin delgado delight delilah delldell delmar delphi delphin delphine delpiero
delsol delta deltas deluxe demodemo demon demons dempsey denali denied deniro denis denise deniska denmark
denni dennis density dental dentist denton denver depeche deputy derek derick derparol derrick descent desert
design designer desire desiree deskjet desktop desmond desperado destin destiny destroy destroyer details
detect detectiv detroit deuce deutsch deutschland device devil devildog deville devilman devilmaycry devils
devin devine devious devon dewalt dewayne dewey dexter dfcbkbcf dfcbkbq dfhdfhf dfkthbz dfkthf dfktynby
dfktynbyf dfvgbh dfytxrf dharma dhjnvytyjub diablo dialog diamant diamante diamon diamond diamonds diana diane
dianna dianne diaper diapers dickdick dickens dicker dickey dickhead dickie dicks dickweed dicky didier diego
diehard diesel dietcoke dieter digger diggler digimon digital dilbert dildo dildos dilligaf dillon dillweed
dimadima dimas dimension dimitri dimple dimples dinamo dinara dindom dinero dingbat dingdong dinger dingle
dingo dinner dinosaur diplomat dipper dipset dipshit dipstick direct director dirtbike dirty dirtydog disabled
disaster disco discover discovery discus disney distance disturbed ditto diver divers divine diving divorce
dixie dizzy django djdjxrf djkjlz dkflbckfd dkflbr dkflbvbh dkflbvbhjdbx dmband dmitriy dnsadm dobber doberman
doctor dodge dodger dodgeram dodgers dodges dogbert dogbone dogboy dogcat dogface dogfart dogfood dogger
dogggg doggie doggies doggy doggydog doggys doggystyle doghouse dogma dogman dogmeat dogpound dogshit dogwood
doitnow dokken doktor dolemite dollar dollars dolly dolores dolphi dolphin dolphins domain domainlock domenico
domestic dominate domingo domini dominic dominick dominik dominika dominion dominiqu dominique domino donald
donjuan donkey donna donner donnie donny donovan dontknow donut donuts doobie doodle doodles doofus doogie
dookie dooley doomed doomsday doorknob doors dorado doreen dorian doris dorothy dortmund dotcom dottie double
doubled douche dougal doughboy doughnut dougie douglas downer downhill download downtown draco dracula drag0n
drago dragon dragonba dragonball dragonballz dragonfl dragonfly dragons dragonz dragoon dragrace dragster
drake drakon draven dream dreamcas dreamcast dreamer dreaming dreams dresden drevil drifter drifting driller
drinker drive driven driver drizzt drjynfrnt droopy dropdead dropkick drowssap drpepper druid drummer drums
drunk drywall dshade dthjybrf dtkjcbgtl dtxyjcnm duane dublin ducati duchess duckduck duckhunt duckie duckman
ducks ducky dudedude dudeman dudes dudley duffer duffman duffy dukeduke dumbass dummy dunbar duncan dundee
dungeon dunhill dunlop dupont duracell durango durham duster dustin dusty dutch dutchess dutchman dwayne
dwight dyjuy dylan dynamic dynamite dynamo dynasty eagle eagles earnhard earth earthlin earthlink easter
eastern easton eastside eastwood easypay eating eatme eatmenow eatpussy eatshit ebony eclipse ecuador edc4rfv
edcrfv eddie edgar edinburg edison editor edmond edmonton edmund edthom eduard eduardo edward edwards edwin
eeyore egghead eggman eggplant egorka eight eightbal eighteen eileen einstein ejaculation ekaterina ekmzyf
elaine elbereth elcamino eldiablo eldorado eleanor electra electric electro electron elefant elektra element
elements elena eleonora elephant elevator eleven elgato elijah elisa elisabet elisabeth elite elizabet
elizabeth elizaveta ellen ellie elliot elliott ellis elmer elmira elodie eloise elpaso elvira elvis elvisp
elway elwood emanuel embalmer emerald emerson emili emilia emilie emilio emily emine eminem emmanuel emmett
emmitt emperor empire encore ender energy enforcer engage engine engineer england english enigma enjoy enough
enrico enrique enter enterme enternow enterpri enterprise enters entrance entropy entry envelope envision
epsilon epson equinox eragon eraser erasure erection erica ericeric ericka ericsson erika ernest ernesto ernie
erotic erotica error errors escalade escape escher escobar escorpio escort eskimo espana espresso esprit
esquire estate esteban estelle esther estrell estrella eternal eternity ethan ethernet euclid eugene eunice
euphoria eureka europa europe evanescence evangeli evangelion evans evelina evelyn everest everett evergree
evergreen everlast everques everquest everton everyday evgeniy evildead evilone evolutio evolution excalibu
excalibur excellen excess exchange excite exeter exigen exigent exodus exotic experience experienced expert
explore explorer export express extensa extra extreme eyeball ezekiel f00tball f15eagle fabia fabian fabie
fabienn fabienne fabio fabiol fabiola fabric fabrizio fabulous facebook facefuck facial factor factory faggot
fairlane faisal faith faithful fakepass falcon falcons fallen falling fallon fallout falstaff famil familia
family famous fanatic fandango fannie fanny fantasia fantasies fantasti fantasy fantom fantomas faraon farida
farley farmboy farmer farrell farscape farside fartman fashion fast4u fastball fastcar faster fatass fatboy
fatcat fathead father fatima fatman fatty faust favorite fduecn feanor fearless feather feathers february
federal federica federico fedorov feeder feedme feelgood feeling feetfeet felicia felicity feline felipe felix
fellatio fellow female females fender feniks fenris fenway fergie fergus ferguson fernand fernanda fernande
fernando ferrar ferrari ferret ferris fester festival festus fetish fettish fever fghtkm fgtkmcby fhctybq
fhntvrf fhvfutljy fialka ficken fiction fiddle fidelio fidelity field fields fiesta fifteen figaro fight
fighter fighting figure filippo films filter filthy final finalfantasy finally finance finder finger fingers
finish finland finnegan fiona fireball firebird fireblad fireblade firedog firefigh firefire firefly firefox
firehawk fireman firenze firestar firestorm firewall first fischer fishbone fishcake fisher fisherma fisherman
fishes fishface fishfish fishhead fishin fishing fishman fishon fishtank fishy fister fisting fitness fitter
fivestar fkbyjxrf fkbyrf fktrcfylh fktrcfylhf fktrctq fktyeirf fktyrf flame flamengo flames flamingo flanders
flange flanker flare flash flasher flashman flashy flathead flatron flavor fleming flesh fletch fletcher
flexible flicks flight flint flipflop flipmode flipper flippy floppy florence flores florian florida flounder
flowe flower flowers floyd flubber fluff fluffy flvbybcnhfnjh flyboy flyer flyers flyfish flyguy flying fmale
focus fokker follow foobar foolish footbal football footjob footlove footman forall forbes force forces fordf
fordtruc foreman foreplay foreskin forest forester foreve forever forfun forge forget forgetit forgot
forgotten forlife format forme formula forrest forsaken forsberg fortress fortuna fortune forum forward foryou
fossil foster fosters fountain fourteen fowler foxcg foxfire foxtrot foxylady fozzie fraggle fragile franc
france frances francesc francesca francesco franci francine francis francisc francisco franck franco francois
frank frankie franklin franks franky fraser frasier frazier freak freaked freaks freaky freckles freddie
freddy frederic frederick frederik fredfred fredrick freebird freedo freedom freee freefall freefree freeland
freeman freepass freeporn freesex freestyle freeuser freeway freewill freeze freiheit fremont french frenchie
frenchy fresh fresno friday fridge friend friendly friends friendster fright fringe frisbee frisco frisky
fritz frodo frogfrog frogger froggie froggy frogman frogs front frontier frosch frost frosty frozen fruit
fruitbat fruity fubar fuckall fucked fuckedup fuckem fucker fuckers fuckface fuckfuck fuckhead fuckher fuckin
fucking fuckinside fuckit fuckm fuckme fuckmehard fuckof fuckoff fucks fuckshit fuckthat fuckthis fucku
fuckyeah fuckyo fuckyou fucmy fudge fugazi fujifilm fujitsu fuking fukkc fulcrum fulham fullback fuller
fullmoon fulton fun4me function funeral fungus funky funny funstuff funtik funtime funtimes furball furious
furman fusion fussball futbol futurama future futyn fuzzball fuzzy fyfcnfcbz fyfnjkbq fylhtq fynjirf fynjybyf
fytxrf fyutkbyf fyutkjxtr fyyeirf fzappa gabber gabby gabrie gabriel gabriela gabriele gabriell gabrielle
gadget gaelic gaell gagarin gagged gagging gaijin galant galary galaxy galeries galileo galina gallaries
gallery galore galway gambit gamble gambler gameboy gamecock gamecube gameover gamer games gamma gandalf
gandolf gandon ganesh gangbang gangbanged gangsta gangster ganja ganjaman gannibal garage garbage garcia
garden gardner gareth garfield gargoyle garion garland garlic garner garnet garnett garret garrett garrison
garter gasman gaston gates gateway gatit gatito gator gatorade gators gatsby gaucho gavin gawker gayboy
gaylord gaymen gazelle gbcmrf gbgbcmrf gbhfvblf gbpltw gbyudby gdtrfb gecko geezer gegcbr geheim geibcnbr
gemini gender general generals generic genesis geneva genghis genius genocide gentle geoffrey geology georg
george georges georgia georgie georgina gerald geraldin gerard gerber gerbil gerhard german germany geronimo
gerrard gerry gertrude gesperrt getin getit getlost getmein getmoney getoff getout getsome getting gfgfvfvf
gfhjdjp gfhjkm gfhjkmgfhjkm gforce gfynthf ghbdtn ghbdtnbr ghbdtndctv ghbdtnrfrltkf ghblehjr ghbrjk ghbywtccf
ghetto ghhh47hj ghjcnbnenrf ghjcnj ghjcnjgfhjkm ghjcnjnfr ghjcnjq ghjdthrf ghjnjnbg ghjuhfvvf ghost ghostrider
ghosts gianluca gianni giant giants gibson gideon gidget gigabyte giggle giggles gilbert gilles gillian
gilligan gilmore ginge ginger ginola ginscoot giorgi giorgio giovanna giovanni giraffe girfriend girlie
girlies girls girsl gisela gitara giulia giuseppe giveitup giveme gizmo gizmodo gizmos gizzmo gjhjkm gjkbyf
glacier gladiato gladiator gladys glamour glasgow glass glasses glassman glenda glendale glenn glennwei
glenwood glider glitter global globus glock gloria glory glover gloves gmoney gn56gn go2hell goalie goarmy
goatboy goats goaway gobears gobigred goblin goblue gobucks gocats gocubs godawgs godbless goddess godfathe
godfather godiva godlike godsmack godspeed godzilla goethe gofast gofish goforit gogators gohan gohome goirish
goldberg golden goldeney goldeneye goldfing goldfish goldie goldrush goldstar goldwing golfball golfclub
golfer golfgolf golfgti golfing golfman golfnut golfpro goliath gollum gomets gomez gonavy gonzales gonzalez
gonzo goober goochi goodboy goodbye goodday gooddog goodfell goodgirl goodguy goodie goodison goodlife
goodluck goodman goodness goodsex goodtime goodwill goodwin goody goodyear goofball goofy google gooner
goonies goose gooseman gopack gopher gophers gordo gordon gorgeous gorilla gorillaz gotcha goten gotenks
gotham gothic gotigers gotmilk gotohell gotribe gotyoass govols grace gracie graduate graham gramma grammy
gramps granada grand grandam grande grandma grandpa grandpri granite granny grant grapeape grapes graphic
graphics grass grateful gratis graves gravis gravity grayson graywolf grease great greatest greatone greatsex
greece greedisgood greedy green greenbay greenday greene greenman greens greentea gregor gregory gremlin
grendel greta gretchen gretta gretzky greyhoun greywolf griffey griffin griffith grils grimace grime grinch
grinder gringo grisha grizzly gromit groove groovy groucho ground groupd groups grout grove grover growler
grumpy grunt gryphon gspot gstring gthcbr gtnhjdbx guang guard guardian gucci guess guesswho guest guevara
guido guillaum guillerm guilty guiness guinness guitar guitars gulliver gulnara gumbo gumby gundam gunnar
gunner gunners gunther gustav gustavo gutter guyver gymnast gymnastic gypsy habibi hacked hacker hackers
hackerz hacking haggis hailey hairball hairy halcyon haley halflife halifax hallie hallo hallowee halloween
hambone hamburg hamburger hamilton hamish hamlet hammer hammers hammond hamper hampton hamster hancock handbag
handball handle handsome handyman hanna hannah hannes hannibal hannover hansen hansol hansolo hanson hanuman
happines happiness happy happyday happydog happyman harald harbor harcore hardball hardcock hardcore harddick
harder hardon hardone hardrock hardware hardwood hardwork hardy harle harlem harley harman harmon harmony
harold harper harpoon harpua harrier harriet harris harrison harry harrypotter harrys hartford hartley harvard
harvest harvey hassan hastings hatred hatter hatteras hattie hattrick havana havefun having hawaii hawaiian
hawker hawkeye hawkeyes hawkins hawks hawkwind hawthorn hayabusa hayden hayley hazard hazel hazmat
hd764nw5d7e1vb headache headless headshot health heart hearts heater heathe heather heaven heavenly heavy
heckfy hector hedgehog hedges heeled heels heidi heineken heinlein heinrich hejsan helen helena helene helios
helium hellas hellboy hellfire hellno hello hellohel hellohello hellokitty helloo hellos hellow helloworld
hellsing hellyeah helmet helmut helper helphelp helpless helpme helsinki hemlock hendrix henley hennessy
henning henrik henry hentai henti herbert herbie hercule hercules herewego heritage herman hermann hermes
hermione hernande heroes herring hershey hesoyam hester hetfield hewitt hewlett heynow heyyou hfjdk hfljcnm
hfytnrb hickory hidden higgins highbury higher highheel highland highlander highlife highway hiking hilary
hillary hillbill hills hillside hilltop hilton hiphop hippie hippo hirsch history hitachi hithere hitler
hitman hiziad hjccbz hjvfirf hobart hobbes hobbit hocke hockey hoffman hogan hogtied hogwarts hokies holahola
holdem holden holein holes holger holiday holidays holla holland hollie hollow holly hollywoo hollywood holmes
holycow holyshit hombre homeboy homebrew homeless homely homemade homepage homer homerj homers homerun
homework honda hondacbr hondas honduras honest honesty honey honeybee honeybun honeydew honeys hongkong
honolulu honor hoochie hookem hooker hookers hookup hooligan hooper hoops hoosier hoosiers hooter hooters
hootie hoover hooyah hopeful hopeless hopkins hopper horace horatio hores horizon hornbeam hornbeamhornbeam
horndog hornet hornets horney horny hornyguy hornyman horror horse horseman horsemen horses horton hoser
hospital hot4u hotass hotbabes hotbox hotboy hotchick hotdog hotdogs hotel hotgirl hotgirls hotlegs hotlips
hotmama hotman hotone hotpussy hotrats hotred hotrod hotsex hotshit hotshot hotspur hotstuff hotter hottest
hottie hotties hottub hotty houdini hound hounddog house houses housewife housewifes houston hover howard
howdy howell howie hsu75kpot htubcnhfwbz huang hubert hudson hugetits hughes hugoboss hulkster humble humbug
hummel hummer humphrey hungry hunte hunter hunters hunting hurley hurrican hurricane husband husker huskers
huskies husky hussain hustle hustler hxboqg hybrid hydro hydrogen hyperion hyundai iamcool iamgod ib6ub ibanez
ibilltes ibrahim icarus iceberg icecold icecream icecube icehouse iceland iceman icetea idefix idiot idiots
idontkno idontknow idunno iforget iforgot ignatius iguana ihateyou iiyama ijrjkfl ijrjkflrf ilikeit ilikepie
ilikesex illini illinois illmatic illusion ilove ilovegod iloveit iloveme ilovemycat ilovemydog ilovemyself
iloveporn ilovepussy ilovesex iloveu iloveyo iloveyou iloveyousomuch image imagine imation imhorny immortal
impact impala impalass imperial implants impreza impulse imtheman imzadi inches incubus indain index india
indian indiana indians indigo indira indon indycar infamous infantry infected inferno infinite infiniti
infinity information ingram ingrid inlove innocent insane insanity insecure insert insertions inside insider
insight insomnia inspiron install instant instinct integra integral intel inter interacial intercourse
interest intern internal interne internet intrepid intruder inuyasha invest invictus iomega ip76k iphone
ipswich irakli ireland irene irina irinka irish irisha irishka irishman iriska ironhors ironmaiden ironman
irving isaac isabel isabell isabella isabelle isaiah iscool ishmael island islander ismail israel issues
istanbul istheman italia italian italiano italy itisme itsme ivanhoe ivanov ivanova iverson iwantu j3qq4h7h2v
j4ye3uz jabber jabroni jachin jackal jackass jackdog jacket jackie jackjack jacko jackoff jackpot jackson
jacob jacobs jacques jacqui jaeger jagger jaguar jaguars jaime jakarta jakejake jakester jamaica james jamesb
jamesbon jamesbond jameson jamess jamie jammer jammin janelle janet janeway janice janina janine janna january
japan japanees japanese jared jarhead jarrett jarrod jarvis jasmin jasmine jason jasons jasper javelin javie
javier jaybird jaycee jayden jayhawk jayhawks jayman jayson jazmin jazmine jazzman jazzy jbond jeadmi jeanette
jeanne jeannie jediknig jeeper jeepers jeepster jefferso jefferson jeffery jeffjeff jeffrey jeffro jehovah
jelena jello jelly jellybea jellybean jenifer jenkins jenna jennaj jennie jennife jennifer jennings jenny
jensen jeremiah jeremy jericho jerkoff jerky jermaine jerome jerry jersey jesper jesse jessi jessic jessica
jessie jester jesus jeter jethro jetski jetta jewel jewell jewels jewish jezebel jiang jigga jiggaman jigsaw
jillian jimbeam jimbo jimbob jimmie jimmy jimmys jingle jingles jiong jktxrf jktymrf joanna joanne joaquin
jocelyn jockey joeblow joebob joecool joejoe joelle joemama johan johann johanna johannes johnboy johncena
johndeer johndeere johndoe johngalt johnjohn johnnie johnny johnson johnston joinery joker jokers jolene jolly
jomama jonas jonatha jonathan jonathon jonboy jones jonesy jonny jorda jordan jordon jordyn jorge josep joseph
josephin josephine joshu joshua josiah josie joung journey joyce joyful joystick jrcfyf jsbach juanita juanito
jubilee judith juggalo jughead juice juicy jules julia julian juliana julie julieann julien juliet juliette
julio julius jumanji jumbo jumper juneau junebug jungle junio junior juniper junkie junkmail jupiter jurassic
just4fun just4me justdoit justi justice justin justinbieber justine justme justus juventus kaboom kahlua
kahuna kaiser kaitlyn kajak kakarot kakashi kakashka kaktus kalina kamasutra kamikadze kamikaze kamila kamilla
kangaroo kansas kappa karachi karamba karaoke karate kareem karen karin karina karine karma karolina kashmir
kasper katana katarina katelyn katerina katherin katherine kathleen kathryn kathy katie katrin katrina katten
katya katzen kavkaz kawasaki kayak kayla kaylee kayleigh kazanova kazantip kbctyjr kcchiefs kcj9wx5n keegan
keenan keeper keepout keesha keisha keith keksa keller kelley kelli kellie kelly kelsey kelvin kendall kendra
kennedy kenneth kennwort kenny kenobi kenshin kentucky kenwood kenworth kenzie kermit kernel kerouac kerrie
kerry kerstin kestrel kevin keyboard keystone keywest kfcnjxrf kfgjxrf kfhbcf kickass kicker kickflip kicksass
kidney kidrock kieran kikimora killa killah killbill kille killer killers killian killjoy killkill killme
killzone kilroy kimball kimber kimberly kimchi kimmie kimmy kinder kindred kingdom kingfish kingking kingkong
kingpin kings kingston kingtut kinky kipper kirby kirill kirkland kirsten kirsty kismet kisses kissing
kisskiss kissme kissmyas kissmyass kitchen kiteboy kitkat kitten kittens kittie kitties kitty kittycat
kittykat kittys kjifhf kjiflm kjkszpj kjrjvjnbd klaatu klaste klaster klaudia klaus kleenex kleopatra klingon
klizma klondike klopik klopklop klvbkf knickerless knickers knicks knight knights knock knockers knopka
knuckles koala kodak kodiak kojak kokomo kolbasa koleso kolibri kolobok kolokol kombat komodo komputer konrad
konstantin kontakt kontol konyor kookie koolaid kordell korean koroleva korova koshka kosmos kostik kostya
kotaku kotenok kraken kramer krasota krasotka krishna krissy krista kristen kristi kristian kristie kristin
kristina kristine kristy krokodil krolik kronos kruger krusty krypto krypton krystal ksenia kseniya ksusha
kthjxrf ktyjxrf kuang kubrick kumar kungfu kurtis kuwait l3tm31n l58jkdjp labia labonte labrador labtec lacey
lacoste lacrimosa lacrosse ladder laddie ladies ladybird ladyboy ladybug laetitia lagnaf laguna lagwagon
lahore laker lakers lakeside lakewood lakota lakshmi lalakers lambchop lambda lambert lamborghini lamer lamont
lampard lancaste lancaster lance lancelot lancer lancia lander landmark landon landrove langley lansing
lantern lapochka laptop laracroft large larisa larissa larkin larry larsen larson larsson lasalle laser
laserjet lasers lassie lasttime lasvega lasvegas latex latin latina latinas latino laughing laura laure laurel
lauren laurence laurent laurie lavalamp lavender lawman lawrence lawson lawyer lazarus lback lbtest lbvjxrf
leader leafs league leahcim leanne learjet leather leavemealone leaves lebanon lebowski lebron ledzep leeann
leeds leedsutd leeloo leeroy left4dead lefty legacy legend legenda legends legion legman legolas legos lehjxrf
leigh leinad lekker leland lemans lemmein lemmings lemon lemonade lemons lenin leningrad lennon lennox lenny
lenochka leonard leonardo leonid leonidas leonie leopard leopold leroy lesbain lesbean lesbens lesbian
lesbians lesbos lesley leslie lespaul lestat lester leticia letme1n letmei letmein letmeinn letmeinnow
letmesee letsdoit letsfuck letsgo letsplay letter letters lever lewis lexingky lexmark lexus lfitymrf lfybbk
lfybkf lhfrjy liang libby libero libertad liberty libido libra library licker licking lickit lickme lifehack
lifeisgood lifetime light lighter lighthou lighthouse lighting lightnin lightning lights lilbit lilian liliana
lilith liliya lillian lillie lilly lilman lilwayne limewire limited lincoln linda linden lindros lindsay
lindsey lineage lingerie linkin links linus linux lionel lioness lionhear lionheart lionking lions lipstick
lipton liquid lisalisa lisenok listen lister lithium litle little littlema livelife liverpoo liverpool
livewire living lizard lizzard lizzie lizzy ljxtymrf llama llamas lloyd loaded loader lobster location
lockdown locked locker lockerroom lockout locks locoloco locust locutus logan logger logical login loginlogin
logitech loglatin lokiloki lokomotiv lolipop lolita lollipop lollol lollypop lolol lololol loloxx lombard
londo london lonely lonesome lonestar lonewolf longbow longdong longer longhair longhorn longhorns longjohn
longshot lonnie looker lookin looking lookout lookup loomis looney looper loose looser lopata lopez lorelei
loren lorena lorenz lorenzo loretta lorien lorraine losangel losangeles loser losers lothar lottie lotus
loudog louie louis louisa louise loulou lourdes lovebug lovehate loveis loveit lovejoy lovel loveless lovelife
lovelove lovely lovem loveme lover loverboy loverman lovers loves lovesex loveya loveyou loving lowell
lowrider loyola ltkmaby ltybcrf ltymub lucas lucent lucia lucian luciana luciano lucien lucifer lucille luckie
lucky luckydog luckyme luckyone luckys ludacris ludmila ludwig lugano luigi lukas lumber lumina lunatic
lunchbox luscious luther luv2epus lvbnhbq lydia lynette m0nk3y m0nkey m2do5bs macaco macaroni macbeth macdaddy
macgyver machine machines machoman maciek macintos macintosh mackenzi mackie macleod macman macross madagaskar
madala madcat madcow madden maddie maddison maddog maddux maddy madeline madina madison madman madmax madness
madonna madrid maestro mafia magadan maganda magazine magdalena magelan magellan magenta maggi maggie maggot
magic magical magician magick magicman magics magnet magneto magnolia magnum magnus magoo magpie magpies
mahalkita mahalo mahler maiden mailcreated mailman mailru maine mainland maison majestic major makaka makaveli
makayla makeitso maker maksim maksimka malachi malaga malaka malakas malaysia malcolm malibu malice malika
malina malinka malish mallard mallorca mallory mallrats malone mamacita mamamia mamapapa mamas mamita mammoth
mamo4ka mamochka mamont manage manager manatee manchest manchester mancity mandarin manders mandingo mandolin
mandrake mandy manfred manga mango mangos manhatta maniac manifest manila mankind mannheim manning mannn manny
manolo manowar manson mantis mantle mantra manual manuals manue manuel manuela manunited manutd maple maradona
marajade marat marathon marauder marble marbles marcel marcela marcella marcello marcelo march marcia marcin
marcius marco marcos marcus margaret margarit margarita margie margo margot maria mariah mariam marian mariana
marianna marianne marie mariel marijuan marijuana marika mariko marilyn marin marina marine mariner mariners
marines marinka marino mario marion maripos mariposa marisa marishka marissa marita marius mariya marjorie
marker market marketin marketing markie markiz markiza markmark markus marlboro marlene marley marlin marlins
marlon marlow marmite marnie marquis marriage married marriott marseill marseille marsel marsh marsha marshal
marshall marta martha marti martian martin martina martine martinez martini marty marusya marvel marvin maryam
maryann maryanne marybeth maryjane maryland marymary masamune maserati masha mashka mason massage massey
massimo massive maste master masterbaiting masterbate masterbating masterkey mastermi mastermind masterp
masters masturbation matador matchbox mathew mathias mathieu matias matilda matisse matri matrix matros matteo
matthe matthew matthews matthias mattie mattingl mattmatt matty mature maureen maurice maurici mauricio
maurizio mauro maurolarastefy maveric maverick maxdog maxell maxim maxima maxime maximilian maximka maximo
maximum maximus maxine maxmax maxpayne maxpower maxwell maxxxx maybe mayday mayfair mayfield mayhem maynard
mazafaka mazda mazdarx mccarthy mcdonald mckenna mckenzie mclaren mdogg meadow meagan meandyou meatball
meathead meatloaf mechanic mechanism mechanisms media medic medical medicine medina medion medusa medved
megadeth megaman megan megane megapass megatron meggie meghan meier meister melani melanie melina melinda
melisa meliss melissa mellon mellow melody melons melrose melvin member memorex memories memory memphis menace
mendoza mensch mental menthol mentor mentos meonly meowmeow meowmix mephisto mercede mercedes mercer merchant
mercury meredith meridian merlin merlot merlyn mermaid merrill mersedes message messenger messiah messier
metal metall metallic metallica meteor method methos metoo metro metroid mexican mexico miami miamo miamor
michae michael michaela michaels michal micheal michel michele michell michelle michigan mickey micky micro
microlab micron microphone microsof microsoft middle midget midland midnight midnite midori midway mierda
mighty migue miguel mihail mikado mikael mikayla mikemike mikey mikkel milamber milan milana milano mildred
milena miles milfnew milhouse military milkman milkyway mille millenium miller millie million millions
millwall milton mimosa mindy minecraft minemine minerva mingus minime minimoni minimum ministry minnesot
minnesota minnie minute miracle mirage miranda miriam mirror mischa mischief misery misfit misfits misha
mishka misiaczek misiek misses missie missing mission mississi mississippi missouri missy mistake mister
mistral mistress misty mitch mitchel mitchell mittens mizuno mizzou mjolnir mobile mobydick mocha model models
modelsne modena modern modles mogwai mohamed mohammad mohammed mohawk mojave mojojojo mollie molly mollydog
moloko molotok molson momdad moment mommy momoney momsanaladventure momsuck monaco monalisa monarch monday
mondeo money moneyman moneys mongo mongol mongoose monic monica monies monika monique monitor monke monkey
monkeybo monkeyboy monkeyma monkeyman monkeys monolith monopoly monroe monsoon monste monster monsters montag
montana monte montecar montecarlo monterey montero montgom montoya montreal montrose monty moochie moocow
mookie moomoo moonbeam moondog mooner mooney moonligh moonlight moonman moonshin moonshine moonstar moore
moose mooses mopar morales morbid mordor morena moreno morga morgan morgana morgoth moritz morley morning
moron morozova morpheus morris morrison morrow morrowind mortal morten mortgage morticia mortimer mortis
morton mosaic moscow moses moskva motdepasse mother motherfu motherfucker motherlode mothers mothra motion
motley motocros motocross motor motorcyc motorola motors motown mountain mouse mouser mouses mousey mouth
movers movie movies mowgli mozart mpegs mrbill mudar mudvayne mueller mufasa muffdive muffin muffins muffy
muhammad mulder muller mullet mulligan multiplelo mummy munch munchkin munich munson munster muppet murder
murdock muriel murph murphy murray murzik musashi muschi muscle muscles mushroom music musica musical musician
musicman muskrat muslim mustafa mustan mustang mustangs mustard mutant mutley mutter muttley my3sons mybaby
myboys mydick myfriend mygirl mygirls mykids mylife mylove myname mynameis mypass mypasswo mypassword
mypasswordis myporn mypussy myrtle mysecret myself myspace mystery mystic mystical mystuff mytime myworld
myxworld nachos nacked nadejda nadezhda nadia nadine naked namaste nancy nanook naomi napalm napass naples
napoleon napoli napster narnia narut naruto nascar nassau nastena nastenka nastia nasty nastya nataha natal
natali natalia natalie nataly natalya natascha natasha natchez natedog natedogg nathalie nathan nathanie
nathaniel nation national native natural nature naught naughty nautica nautilus navajo navigato navigator
navyseal nazgul nbuhtyjr nbvjatq ncc1701a ncc1701d ncc1701e nebraska nebula necklace needforspeed needle
needles negative negro nellie nelson nemesis nemrac neptune nermal nestle nestor netscape nettie network
neutron nevada never nevermin nevermind nevermor nevermore nevets neville newark newbie newcastl newcastle
newday newhouse newjob newlife newman newness newone neworder newpass newpassword newport newproject newstart
newton newuser newyear newyork nextel nexus nfhfrfy nfnmzyf nfyirf nfytxrf nguyen nhfrnjh niagara niang
niceass niceguy nicetits nichola nicholas nichole nickel nickels nickie nicknick nickolas nicky nicol nicola
nicolas nicole nielsen nigel nigeria nigga niggas niggaz nigger niggers night nightmar nightmare nightowl
nights nightwin nightwish nikita nikitos nikki niklas nikola nikolai nikolas nikolay nikon nimbus nimitz
nimrod nineball nineinch niners nineteen ninja ninjas nintendo nipper nipple nipples nirvan nirvana nissan
nitram nitro nittany nixon nobody nocturne noelle nofear nogard nokia nokian nolan noles nolimit nomad nomore
noname nonenone nonmembe nonstop noodle noodles nookie nopass nopassword norbert noreen norfolk norma normal
norman normandy norris north northern norton norway norwich norwood nosferatu nostromo not4you notebook
nothing notnow notredam notused nounours novell november novifarm novikova noway nthvbyfnjh ntktajy ntktdbpjh
nuclear nudes nudist nudity nugent nugget nuggets number numbers nurlan nurse nurses nursing nutella nutmeg
nutter nuttertools nwo4life nygiants nyjets nylons nymets nympho nyyankee o9i8u7y oakland oakley oaktree oasis
oatmeal obelix oberon obiwan objects oblivion obsidian ocean oceans ocelot october octopus odessa odyssey
oedipus office officer offroad offshore offspring ohbaby ohmygod ohshit ohyeah oilers okinawa oklahoma okmijn
oksana older oldfart oldman olemiss olenka olesya olive oliver olives olivia olivier ollie olympia olympic
olympus omega omegared omerta omicron onelove oneoneone onepiece onetime onetwo onion onions online onlyme
onlyone ontario opendoor openit openme opennow openopen opensesame openup opera operator ophelia opiate
optical optima optimist optimus option options optiplex oracle oralsex orang orange oranges orbital orchard
orchid oregon orgasm orgasms orient origin original orioles orion orlando orleans orpheus ortega orwell osama
oscar oscars osgood osiris osprey oswald othello ottawa otter outback outkast outlaw outlaws outside outsider
ovation overkill overlord ownage oxford oxygen oyster ozzie p0o9i p0o9i8u p455w0rd p4ssw0rd p4ssword pa55w0rd
pa55word pablo pacers pacific pacino packard packer packers pacman paddle paddy padres pagan paige paint
paintbal paintball painter painting paisley pajero pakista pakistan palace paladin palermo pallmall palmer
palmtree paloma pamel pamela panache panama panasoni panasonic pancake pancakes pancho panda pandas pandora
panhead panic panorama panter pantera panther panthers panties pants pantyhos pantyhose panzer paola paolo
papabear papamama paper paperino papers papillon papit papito pappy paradigm paradis paradise paradox paragon
paramedi paramore paranoia paranoid paris parker parkour parlament parol parola paroll parrot parsifal parsons
partizan partner partners party pasadena pascal pasha passat passcode passes passfan passion passmast passme
passord passpass passphrase passport passthie passw0rd passwd passwor password passwords passwort pasta pastor
pasword patata patate patch patches pathetic pathfind pathfinder patience patric patrice patrici patricia
patrick patrik patriot patriots patrizia patrol patron patterso patti patton patty paula paulie paulin paulina
pauline paulpaul pavel pavement pavilion pavlik pavlov pavlova paxton payday payton pdiddy pdtplf peabody
peace peaceful peaceout peach peaches peachy peacock peanu peanut peanuts pearl pearljam pearls pearson peavey
pebble pebbles pecker peddler pedersen pedro peekaboo peeper peepers peewee pegasus peggy pelican penal pencil
pendejo penelope penetrating penetration penfold penguin penguins penis pennstat penny pennywis pentagon
penthous pentium people pepito peppe pepper peppers pepsi peregrin perfect perkele perkins perrin perry
persian persik person persona personal pertinant pervert peter peterbil peternorth peterpan peters peterson
petite petra petrov petrova petrovich petrus petunia peugeot peyton pfkegf pfloyd pfqxbr phaedrus phantom
pharao pharmacy pheonix phialpha philip philipp philippe philips phillies phillip phillips philly phish phishy
phoebe phoeni phoenix phone phones photo photog photon photos phpbb phrases phreak phrowz phyllis physics
piano pianoman pianos piazza picard picasso piccolo picher pickle pickles picks pickup picnic pictere pictuers
picture pictures picturs pierce piercing pierre pietro pigeon piggies piggy piglet pigpen pikachu pilgrim
pillow pilot pilots pilsner pimpdadd pimpdaddy pimpin pimping pimpster pinball pinch pineappl pineapple
pinetree pingpong pinguin pingvin pinhead pinkfloy pinkfloyd pinkie pinky pinnacle pintail pinto pioneer
pioner pipeline piper pippen pippin pippo piramida pirate pirates pisces pissed pisser pissing pissoff pistol
piston pistons pitbull pitch pitcher pitchers pitures pixie pixies pizda pizdec pizza pizzahut pizzaman pizzas
pjkjnj place placebo places placid plane planes planet planeta planner plants plasma plaster plastic plastics
platinum plato platon platypus playa playball playboy player players playing playmate playstat playstation
playtime please pleasure plokij ploppy plumber plumbing plummer pluto plymouth pobeda pocket poetry poets
point pointer poison poisson pokemo pokemon poker pokey poland polar polaris polaroid police policy polina
polish politics pollux polly polniypizdec polopolo polska pomidor pommes pompey poncho pontiac ponyboy poobear
poochie poodle poohbear pookey pookie pooky poontang pooper poophead poopie poopoo pooppoop poopy pooter
popcorn popeye popova popper poppie poppy poptart porkchop porn4me pornking porno pornographic pornos pornporn
pornstar porsche porshe portal porter portia portland portugal poseidon positive possum postal poster postman
potato potatoes pothead potter pounded pounding powder powell power powerful powerman powers prague praise
prancer praxis prayer prayers preacher precious predator pregnant prelude premier premiere premium presario
present presiden president presley pressure prestige presto preston pretty pretzel prick pride priest prima
primal prime primus princ prince princes princesa princess princessa princeto pringles printer printing
priscill prissy privacy privat private privet priyanka probes prodigy produce producer product professional
professor profile profit program progress project promise pronto property prophecy prophet prospect prosper
prosto protect protocol proton protoss prototype proview prowler proxy prozac prudence pssw0rd psycho public
puddin pudding puddles puffer puffin puffy pufunga pugsley pulled pulsar pumkin pumper pumpkin pumpkins punani
punch punisher punjab punkass punker punkin punkrock punter pupkin puppet puppies puppy puppydog puppys pupsik
purdue purpl purple pushing pushkin pushok pussey pussie pussies pusssy pussy pussy4me pussycat pussyeat
pussylover pussyman pussys pusyy putter puzzle pyramid pyramids python q1q2q q1q2q3q q1q2q3q4q q1w2e q1w2e3r
q1w2e3r4t q1w2e3r4t5y q2q3q q2q3q4q q2w3e q2w3e4r q2w3e4r5t q2w3e4r5t6y qa2ws qa2ws3ed qawsed qawsedrf
qawsedrftg qaywsx qaz123wsx qaz2ws qaz2wsx qaz2wsx3edc qaz2wsx3edc4rfv qazplm qazqaz qazse qazws qazwsx
qazwsxed qazwsxedc qazwsxedcrfv qazwsxedcrfvtgb qazxc qazxcv qazxsw qazxsw23edc qazxswedc qazzaq qiang qiong
qpalzm qqqqq qqqqqqqqqq qqqwww qqwwee quaint quake quaker quality quant4307s quantum quarter quartz quasar
quattro quebec queen queenie queens quentin quest question quick quincy quinn qw12qw qw23er qw34er qwaszx
qwe123qwe qweas qweasd qweasdzx qweasdzxc qwedsa qwedsazxc qweewq qweqwe qwerasdf qwerasdfzxcv qwert qwerty
qwertyu qwertyui qwertyuio qwertyuiop qwertz qwertzuiop r2d2c3p r2d2c3po r4e3w2q rabbi rabbit rabbits rabota
racecar racer racers racerx rachael rachel rachelle racing racoon radar radeon radical radio radiohea
radiohead radius raduga rafael ragman ragnar ragnarok raiden raider raiders railroad rainbow rainbows raindrop
rainer raining rainman rainyday raistlin raketa raleigh ralph ralphie ramada rambler rambo ramirez ramjet
rammstei rammstein ramon ramona ramones rampage ramrod ramses ramsey ramstein ramzes ranch rancid randall
randolph random randy ranetki range ranger rangers ransom raphael rapier rapper raptor raptors rapture
rapunzel raquel rascal rasdzv rashid rasmus rasputin rasta rastaman raster rastus ratboy rated ratman rattle
rattler raven ravens rawhide rayman raymond razor rb26dett rbcekz rbhbkk rctybz rdfhnbhf reader readers
reading ready reagan reality really realmadrid realtor reaper reason reaver rebbyt rebecca rebekah rebel
rebels rebelz reboot reborn recall reckless recon record records recovery redalert redbaron redbird redbone
redbull redcar reddevil reddog reddwarf redeye redfish redfox redhat redhead redheads redhot redleg redlight
redline redman redneck redone redrose redrum redskin redskins redsox redstar redstorm redwall redwine redwing
redwings redwolf redwood reebok reefer reeses reeves referee reflex regent reggae reggie regina reginald
regional register rehbwf reilly reindeer release reliant reload reloaded remember remingto remington remote
renat renata renate renato renault renee renegade rental repair repoman report reptile republic requiem
rereirf rerfhtre rescue research reserve resident respect restart restless retard retire retired retsam return
reuben reveal revenge review reviews revival revoluti revolution revolver rewind reynolds reznor rfgbnjirf
rfgecnf rfhbyf rfhfgep rfhfvtkmrf rfhfylfi rfhlbyfk rfhnjirf rfnthbyf rfntymrf rfrfirf rfrnec rfv3edc
rfvfcenhf rhbcnbyf rhfcfdbwf rhfcjnf rhfcjnrf rhiannon rhino rhinos rhjkbr rhjrjlbk rhodes rhonda rhtdtlrj
rhubarb rhythm ribbit ricard ricardo riccardo richar richard richards richie richmond richter rickie rickster
ricky riddick riddle riddler rider riders ridge riffraff rigger right rightnow riley rimmer ringer ringo
ripken ripley ripped ripper ripple riptide rising ritter river rivera riverrat rivers riversid riverside
rjcvjc rjhjdf rjhjkm rjhjktdf rjirfrgbde rjitxrf rjntyjr rjnzhf rjs1la7qe rjycnfynby rktjgfnhf roach roadkill
roadking roadrunn roadrunner roadster roadway robbie robbins rober robert roberta roberto roberts robin
robinhood robins robinson robocop robot robotech robotics robots robson robyn rocco rochard rochelle rocker
rocket rockets rockey rockford rockhard rockie rockies rockin rockman rocknrol rocknroll rockon rockrock rocks
rockstar rockwell rocky rodent rodeo rodger rodina rodman rodney rodrigo rodrigue rodriguez roger rogers rogue
roland rolex roller rollin rolling rollins rolltide roman romance romania romano romanov romanova romans
romantic romario romaroma romashka romeo romero rommel romulus ronald ronaldinho ronaldo ronnie ronny roofer
rookie rooney rooster roosters rootbeer rootedit rooter rootroot rosanna rosario rosco roscoe rosebud rosemary
roserose roses rosewood rosie rosita rostov roswell rotary rotten rough route router rover rovers rowdy rowena
rowing roxanne royal royals royalty royboy rrpass rsalinas rt6ytere rtyuehe rubber rubble ruben rubicon
rudeboy rudolf rudolph ruffles rufus rugby rugger rugrat rugrats rules rulez rulezzz rumble runaway runescape
runner running rupert rushmore rushrush ruslan russel russell russia russian rustam rusty rustydog rutgers
ruthie s3t4p sabaka sabbath sabina sabine sable sabre sabres sabrin sabrina sachin sacred saddam saddle sadie
safari safety safeway saffron sahara saibaba saigon sailboat sailing sailor saint saints sairam saiyan sakura
salamander salami salasana saleen salem sales salesman salinas sally salman salmon salome salomon salope salsa
salsero saltydog salvador salvator salvatore samadams samanta samanth samantha samara samba sambo samdog
samiam samir samira sammi sammie sammy sammydog sammys samoht sampson samson samsun samsung samtron samue
samuel samurai sanane sanchez sancho sandberg sander sanders sandie sandiego sandman sandr sandra sandrine
sandro sandwich sandy sanford sanfran sanity sanjay sanjose santa santacru santafe santana santiag santiago
santino santos sapper sapphic sapphire sarah sarajevo sarasara saratoga saratov sarge sarina sarita sascha
sasha sashka saskia sassy sasuke satan satana satanas satchmo satellit satellite sativa satori saturday saturn
saunders sauron sausage sausages savage savanna savannah savior sawdust sawyer saxman saxophon sayang scamper
scandinavian scania scanner scarab scarface scarlet scarlett scenery schalke schatz schatzi scheisse schmidt
schmuck schnuffi school schubert schultz schumi science scirocco scissors scoobie scooby scoobydo scoobydoo
scoote scooter score scorpi scorpio scorpion scorpions scotch scotland scott scottie scotts scotty scout
scouts scrabble scrapper scrappy scratch scream screamer screen screw screwy screwyou script scroll scrooge
scrotum scruffy scuba scully scumbag seabass seabee seadog seadoo seagull seahawks seahorse sealteam seaman
seamus searay search seaside season seattle seaweed seawolf sebastia sebastian sebastie sebora sebring second
secre secret secrets secretsecret section secure security sedona seductive seeker seeking segblue segreto
seinfeld sekret select selena selene selina selmer seminole semper semperfi senate senator senators seneca
senior senna sensei sentinel sentra sentry sephirot sephiroth septembe september seraphim serega serena
serenity sergbest serge sergeant sergei sergey sergi sergio series serious serpent sersolution server service
services sesame sestra seven sevenof sevens seventeen seventy severin sevilla seville seviyi sex4me sexgod
sexman sexpot sexsex sexsexse sextoy sexual sexxx sexxxx sexxxy sexxy sexyass sexybabe sexybitch sexyboy
sexygirl sexylady sexymama sexyman sexyme sexyone sexyred sexysexy seymour sf49ers sfgiants shade shades shado
shadow shadows shady shaft shaggy shaker shakes shakira shakur shalom shaman shamil shampoo shamrock shamus
shandy shane shaney shang shanghai shania shanna shanno shannon shanti shaolin shark sharks sharky sharma
sharon sharp sharpe sharpie shasta shaun shauna shaved shawn shawna shawnee shayla shayne shazam shearer sheba
sheeba sheena sheep sheepdog sheets sheila shelby sheldon shell shelley shells shelly shelter shelton shemale
sheng shepherd sheridan sheriff sherlock sherman sherri sherry sherwood sheryl shevchenko shibby shibumi
shield shift shifty shiloh shimano shimmer shine shiner shinigami shinji shinobi shirley shitface shitfuck
shithead shitshit shitter shitty shiva shiznit shock shocker shodan shoes shogun shojou shonuf shoot shooter
shopper shopping short shorty shotgun shotokan shovel shower showing showme showtime shredder shrimp shrink
shuai shuan shuang shurik shuttle shutup sickboy sickness sidekick sidewind sidney siemens sienna sierra sigma
sigmachi sigmar signal sigrid silence silent silicon silly silve silver silverad silverado silvi silvia simba
simcity simmons simon simona simone simons simple simply simpson simpsons sinatra sinbad sincity sinclair
sinful singapor singapore singer singh single sinister sinned sinner siobhan sirius sissy sister sisters sites
sithlord sixers sixpack sixteen sixty sixtynin sizzle sk8ordie skate skateboard skater skating skeeter
skeleton skibum skidoo skiing skilled skillet skills skillz skinhead skinner skinny skins skipper skippy skirt
skittles skolko skorpion skull skulls skunk skydive skydiver skyhawk skylar skylark skyler skyline skynet
skywalke skywalker slacker slainte slamdunk slammer slapnuts slapper slappy slapshot slash slasher slater
slava slave slavik slayer slayers sledge sleep sleeper sleeping sleepy slicer slick slide slider slimjim
slimshad slimshady slinky slipkno slipknot slipper slippery slippy sliver slonik sloppy slowhand slugger
sluggo sluts sluttey slutty smack smackdow smackdown small smalls smart smartass smarty smash smashing
smeghead smegma smeller smelly smile smiles smiley smirnoff smirnov smirnova smith smithers smiths smithy
smitty smoke smokedog smoker smokes smokey smokie smokin smoking smooch smooth smoothie smother smudge smurf
snafu snake snakeman snakes snapon snapper snapple snappy snapshot snatch sneakers sneaky snicker snickers
sniffer sniffing sniper snooker snookie snoop snoopdog snoopdogg snoopy snowball snowbird snowboar snowboard
snowdog snowflak snowflake snowman snowy snuffy snuggle snuggles snyder sobaka sober socce soccer social socks
socrates sodapop sofia sofiya softail softball softtail software sojdlg123aljg sokolov sokolova solace solar
solaris soldat soldier soleda soledad soleil solitude solnce solnishko solomon solution somebody someday
someone somerset somethin something sometime sommer sonata songbird songoku sonia sonic sonics sonja sonne
sonny sonoma sonora sonya sonyericsson sonyfuck sonysony sonyvaio sooner sooners sophi sophia sophie soprano
sopranos sorrow sosiska soso123aljg soulfly soulmate sound sounds source south southern southpar southpark
southpaw southside soviet sowhat space spaceman spade spades spain spalding spamspam spaniel spanish spank
spanker spanking spankme spanks spanky spanner sparhawk spark sparkey sparkle sparkles sparks sparky sparrow
sparta spartak spartan spartans sparty spawn speaker speakers spears special specialk spectre spectrum speed
speedo speedway speedy spence spencer sperm sperma sphinx spice spide spider spiderma spiderman spiders spidey
spiffy spike spiker spikes spikey spinner spiral spirit spitfire splash splatter spleen splendid spliff
splinter spock spoiled sponge spongebo spongebob spooge spook spooky spoon spooner spoons sport sporting
sports sporty spotty spread spring springer springs sprint sprinter sprite sprocket sprout spunk spunky spurs
sputnik spyder sqdwfe squall square squash squeak squeeze squerting squid squire squirrel squirt squirts
srinivas stacey stacie stacy staff stafford staind stalin stalker stallion stamford standard standby stands
stanford stang stanislav stanley stanton staples starbuck starbucks starcraf starcraft stardust starfire
starfish starfox stargate starligh starlight starlite starman starr stars starship starstar start starter
startrek starwar starwars stasik state states static station status stayout stealth steam steaua steel steele
steeler steelers stefan stefani stefania stefanie stefano steffen steffi steiner stella stellar stepan steph
stephan stephane stephani stephanie stephen stephens stereo sterlin sterling stern sterva stetson steve steven
stevens steveo stevie stewart stick stickman sticks sticky stiffy stigmata stiletto stimpy sting stinger
stingray stinker stinks stinky stirling stitch stock stocking stocks stockton stokes stolen stone stonecol
stonecold stoned stoner stones stonewal stoney stooge stooges stopit stoppedby storage store stories storm
storms stormy storys straight strange stranger strap strat stratfor strato stratus strawber strawberry streak
stream streaming street streets strelok strength stress stretch strider strife strike striker string strip
stripe striper stripes stripper stroke stroker strong stryker stuart stubby student studio studly studman
stuff stumpy stunner stupid style styles stylus subaru sublime submarin submit suburban subway subzero succes
success suckcock suckdick sucked sucker suckers sucking suckit suckme suckmydick sucks suede sugar sugars
suicide sukebe sullivan sultan summe summer summers summertime summit sunbeam sunbird sundance sunday sunderla
sundevil sundown sunfire sunflowe sunflower sunkist sunlight sunny sunnyday sunrise sunset sunshin sunshine
suntzu super superb superbow superfly superior superma superman supernatural supernov supernova supers
supersonic supersta superstar supply support supra supreme surfer surfing surfsup surgeon surgery surprise
survey surveyor survival survivor susan susana susanna susanne sushi susie susieq suslik sutton suzanne suzuki
sverige sveta svetik svetlana svoboda swallow swallows swampy swanson swatch sweden swedish sweeney sweeps
sweet sweetass sweetheart sweetie sweetnes sweetness sweetpea sweets sweety swift swifty swimmer swimming
swing swinger swingers swinging swiss switch swoosh sword swordfis swordfish swords sydney sylveste sylvia
sylvie syncmaster synergy syracuse system systems syzygy tabasco tabatha tabitha table tacobell tacoma tadpole
taekwondo taffy tahiti tahoe taichi tailgate taipan taiwan takamine talbot talgat talisman talks talon tamara
tamerlan tammie tammy tampabay tanaka tanechka tangerin tango tanker tanner tantra tanya tarakan tardis target
tarheel tarheels tarpon tarzan tasha tasty tatarin tater tatiana tatjana tattoo tatyana taurus taxman taylo
taylor tazman tazmania tbird tbone tdutybq tdutybz teacher teamwork teapot teaser technics techniques techno
tecumseh teddy teddybea teddybear teejay teenage teens teensex tekken telecom telefon telephon telephone
teller tempest templar temple temppass temptress tenchi tender tenerife tennesse tennis tequier tequiero
tequila terefon teresa terminal terminat terminator termite terra terran terrance terrapin terrell terrence
terri terrible terrier terriers terror terry tessa tessie tester testibil testing testpass testpassword
testtest tetris tetsuo teufel texaco texans texas texass tgb6yhn thailand thalia thanatos thanks thankyou
thanos thatsme theater theatre thebear thebeast thebest theboss theboys thecat theclash thecrow thecure thedog
thedon thedoors thedude theduke theedge theend theforce thegame thegreat their thekid theking thelma theman
theodore theone therapy there theresa therock thesaint these theshit thesims thething thetruth thewall thewho
thick thierry thighs thing things think thinking thirteen thirty thisisit thisismypassword thistle thoma
thomas thompson thomson thong thongs thought thrasher thrawn three threesom thriller throat thrust thuglife
thumb thumbnils thumbs thumper thunder thunderb thursday tiamat tiberian tiberius tiburon tical ticket tickle
tickler tickling ticklish ticktock tictac tiffan tiffany tiger tigercat tigers tigge tigger tight tights tigre
timber timelord timeout times timmy timosha timothy timoxa timur tinker tinkerbe tinkerbell tinman tintin
tipper tippy tiptop tires titan titanic titanium titans titfuck titleist titman titten titties titts titty
tittys tkbpfdtnf tkfkdg toast toaster toasty tobacco tobias tobydog today toejam toffee together toilet
tokiohotel tokyo toledo tolkien tomahawk tomas tomate tomato tomboy tomcat tommie tommy tommyboy tomorrow
tomservo tomtom tongue tonight tonka tonto tonya tonyhawk tonytony toocool toohot toolbox toolman tools
tooltime toomuch toonarmy toonces tooth tootie tootsie topaz topcat topdog topgun tophat topher topolino
topper topsecre topsecret topspin toriamos torino tornado toronto torpedo torque torrent torres tortoise
tortuga torture toshiba tosser total totoro tottenha tottenham touch touching toulouse tower towers toyota
trace tracer tracey track tracker tracks tractor tracy trader traffic trailer trailers train trainer training
trains traktor tralala tramp trample trance tranny trans transam transexual transfer transit translator
trapper trash trauma travel traveler travis treasure treble trebor treefrog trees treetop treetree trekker
trent trenton trevor trfnthbyf trial triangle tribal tribble tribe tricia trick tricks tricky trident trigger
trigun trinidad trinitro trinitron trinity triple tripleh triplets triplex tripod tripper trish trisha trista
tristan triton triumph trivia trixie trojan trojans troll trombone trooper tropical trotter trouble troubles
trousers trout truck trucker trucking trucks trueblue truelove truffles truman trumpet trunks trust trustme
trustno trustnoone truth tryagain tsunami tucker tucson tuesday tugboat tujhrf tulane tulip tulips tunafish
tundra tuning tunnel tupac turbo turbos turkey turner turnip turtle turtles tuscl tuxedo tweety twelve twenty
twiggy twilight twinkie twinkle twins twist twisted twister twostep tycoon tyler tylers typhoon tyrant tyrone
tyson tzzqi ub6ib udacha ufhvjybz ufkbyf ugd5hip2j uhbujhbq ukraine ulrich ulrike ultima ultimate ultra
ultraman ulysses umbrella umpire unbelievable uncencored uncle undead under underdog underground undertak
undertaker undertow underwear unicorn union unique united universa universal universe universi university
unknown unlock unreal uptown upyours uranus urlaub ursitesux ursula usarmy username usmarine usnavy usuckballz
utahjazz utjhubq utopia uzumymw vacation vader vadim vagabond vagina valdez valencia valentin valentina
valentine valentino valera valeri valeria valerie valeriya valery valhalla valiant valkyrie valley valleywa
vampir vampire vampires vancouve vancouver vandal vaness vanessa vangogh vanguard vanhalen vanilla vanity
vantage vargas varvara vaseline vasilisa vasiliy vaughan vaughn vauxhall vbhevbh vbienrf vbifyz vbkfirf vector
vectra vedder vegas vegeta vegitta vegitto vehpbr velocity velvet vendetta venera venice venom ventura venture
venus vepsrf verbatim verena veritas verizon vermont vernon verona veronic veronica veronika versace vertigo
verygood veteran vette vfcnth vfczyz vfhbirf vfhbyf vfhbyjxrf vfhecz vfhnsirf vfhufhbnf vfhujif vfibyf
vfitymrf vfkbyf vfksirf vflfufcrfh vfnbkmlf vfndtq vfntvfnbrf vfpfafrf vfrcbv vfrcbvrf vfvekz vfvfgfgf vfvjxrf
vfylfhby vgirl viagra vibrate vicious vicki vickie vicky victor victori victoria victory video videoes videos
vides vienna vietnam viewsoni viewsonic viking vikings viktor viktoria viktoriya villa village vince vincent
vincenzo vineyard vinnie vintage violator violet violetta violin viper vipergts vipers virago virgil virgin
virgini virginia virginie virgo virtual virus vishnu vision visited visitor visual vitalik vitamin vivaldi
vivian vivid vivitron vixen vjcrdf vjkjrj vjqgfhjkm vkontakte vladik vladimir vladislav vodafone vodka voland
volcano volcom volkodav volkov volkova volkswag volkswagen volley volleyba volleyball voltron volume volvo
voodoo vorlon vorona vortex voyager voyeur vqsablpzla vsegda vsjasnel vtldtlm vulcan vulva wachtwoord waffenss
waffle waffles wagner wahoo waiting wakeup waldo walker walking wallace wallet walleye wally walmart walnut
walrus walter walton wanda wanderer wanker wanking wannabe wanrltw wanted wapapapa wapbbs warcraft wareagle
warez warhamme warhammer warlock warlord warner warning warren warrior warriors warsaw warthog warwick wasabi
washburn washer washingt washington wasser wassup wasted watch watcher watching water waterboy waterfal
waterloo waterman watermelon waterpolo waters waterski watford watson wayer wayne wazzup wdtnjr wdtnjxtr
wealth weapon weare wearing weasel weather weaver webber webcam webhompas webmaste webmaster website websol
websolutions webster wedding wednesda wednesday weekend weenie weezer weiner weird welcom welcome welcomeback
welder welkom weller wellhung wellingt wendell wendy wendys werder werdna werewolf werner werter wesley
western westham weston westside westwood wetpussy wetter wg8e3wjf whale whales whateve whatever whatsup
whatthe whatup whatwhat wheeler wheels whiplash whiskers whiskey whisky whisper whistler white whiteboy
whiteout whites whitesox whitey whitney whocares whoknows whore whores whynot wibble wiccan wicked wicket
widget wifes wifey wiggle wiggles wilbur wildbill wildcard wildcat wildcats wilder wildfire wildlife wildman
wildone wildwood wilhelm willard willem willi willia william williams willie willis willow willy wilma wilmer
wilson winchest windmill window windows windsor windsurf windy winfield wingchun winger wingman wingnut wings
wingzero winner winners winnie winona winston winter winters wireless wisdom wiseguy wishbone wishes witch
wives wizard wizards wizzard wolfen wolfgang wolfie wolfman wolfpac wolfpack wolverin wolverine wolves wolvie
womam woman womans wombat womble women wonder wonderboy wonderfu wonderful wooden woodie woodland woodman
woodrow woods woodside woodstoc woodstock woodwork woodworker woodworking woodworkshop woody woofer woofwoof
woohoo wookie wordpass wordup worker working workout workshop world worldcup worlds wormix worship worthy
wp2003wp wpass wr2i7h wraith wrangler wrench wrestle wrestler wrestlin wrestling wright wrigley wrinkle
wrinkles writer written wsx3edc wsxedc wsxzaq wutang wxcvbn wyatt wyoming wyvern x2zkg8w x72jhhu3z x7pxr
xanadu xander xantia xavier xerxes xfiles xiang xiong xrated xtreme xxxpass xxxxxx xxxzzz xyzzy yahweh yamaha
yamahar yamato yankee yankees yanks yaroslav yasmin ybrbnf ybrbnjc ybrjkfq yeahbaby yeahyeah yello yellow
yeshua yessir yesterda yfcntyf yfcntymrf yfnfif yfnfirf yfnfitymrf yfnfkb yfnfkmz yinyang yitbos yjdsqgfhjkm
yngwie yogibear yolanda yomama yorkie yorktown yosemite yoshi youandme youknow young yourmama yourmom
yourpassword yousuck youtube yoyoma ytngfhjkz yugioh yuliya yummy yvette yvonne yzerman z1x2c z1x2c3v
z1x2c3v4b z2x3c z2x3c4v z2x3c4v5b zachary zalupa zander zanzibar zapata zaphod zappa zapper zaq12wsx zaq1xsw
zaqwsx zaqwsxcde zaqxsw zaqxswcde zaraza zardoz zarina zasada zaxscd zealots zebra zebras zelda zenith zephyr
zeppelin zerocool zerozero zhang zheng zhjckfd zhong zhuai zhuan zhuang zidane ziggy zigzag zildjian zimbabwe
zimmer zinger zipper zippo zippy zodiac zoloto zolushka zombie zoomer zoomzoom zooropa zorro zurich zvezda
zxasqw zxcasd zxcasdqwe zxccxz zxcvasdf zxcvb zxcvbn zxcvbnm zxcvvcxz zyjxrf zz8807zpl zztop zzxxcc zzzxxx
zzzzz zzzzzzzzzz
`
    .trim()
    .split(/\s+/),
);
