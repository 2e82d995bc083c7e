/*
 * Words that stand in most lists of passwords, in alphabetical order.
 * Source: the password and first-name frequency lists of the zxcvbn package 4.4.2 (MIT licence,
 * copyright 2012-2016 Dan Wheeler and others), kept where the word is also in Debian's
 * wamerican 2020.12.07 (SCOWL), with its figures and keyboard patterns; some 60 phrases were
 * added from memory. Coarse words and trade names were left out.
 */
const words = `
000000 0000007 000001 000007 000111 007007 0192837465 100000 1000000 100500 102030 10203040 102938 10293847 1029384756 111000 111111 11111111 11112222 111222 111222333 111333 111555 111777 112211
112233 11223344 1122334455 112358 11235813 1123581321 115599 120676 121314 12131415 122333 123000 123098 123123 12312312 1231234 123321 123321123 123321qwe 1234123 1234321 12344321 123450
1234509876 123451 123454321 123455 1234554321 123456 1234560 1234561 123456123 1234566 123456654321 1234567 12345678 123456789 1234567890 1234567891 12345678910 1234567899 123456789qwe
123456789qwerty 12345679 1234568 123456asd 123456qwe 123456qwerty 123456zxc 123457 123459 12345asd 12345qaz 12345qwe 12345qwer 12345qwert 12345qwerty 123465 12348765 1234asdf 1234qaz 1234qwe
1234qwer 1234zxcv 123567 1235789 123654 12365478 123654789 1236987 12369874 123698745 123789 123789456 1237895 123890 123987 123asd 123qaz 123qwe 123qwe123 123qwe456 123qweas 123qweasd
123qweasdzxc 123qwer 123qwert 123qwerty 123zxc 124578 128500 12qw12 12qw12qw 12qw34er 12qwas 12qwaszx 12qwerty 131313 132435 13243546 132456 132465 134679 134679852 135246 135790 135791 1357911
135792468 1357924680 135798642 1366613 141627 142536 142857 145236 147258 14725836 147258369 147369 147741 147852 147852369 147896 1478963 14789632 147896325 147963 14881488 150781 153624 15426378
159263 159357 159632 159753 1598753 159951 162534 172839 18121812 18436572 192837 19283746 192837465 19411945 196969 1q2w3e 1q2w3e4r 1q2w3e4r5 1q2w3e4r5t 1q2w3e4r5t6y 1qaz2ws 1qaz2wsx 1qaz2wsx3edc
1qaz2wsx3edc4rfv 1qazse4 1qazxc 1qazxsw 1qazxsw2 1qazxsw23edc 1qazzaq1 1qwert 1qwerty 200000 2128506 222333 222777 223322 223344 224466 225588 235689 246810 25800852 25802580 258369 258456 258852
258963 2wsx3edc 2wsxcde3 2wsxzaq1 314159 31415926 315475 321123 321456 321654 321654987 321678 332211 333444 333555 333666 333777 334455 336699 357159 357951 362436 369258 369258147 369852 369963
415263 420000 420247 420420 44332211 445566 456123 456321 456654 456852 456987 4815162342 515000 5201314 5551212 555666 555777 556677 635241 654123 654321 655321 66613666 666666 666777 666999
6751520 696969 73501505 74108520 741852 741852963 741963 753159 753951 7753191 777333 777666 7777777 777888 7779311 777999 778899 784512 787898 789123 789456 78945612 789456123 7894561230 7895123
7896321 789654 789654123 789987 794613 852456 8675309 875421 888999 906090 911911 9379992 951357 951753 9562876 963258 963852 963852741 987123 987321 987456 987456321 996633 998877 999666 aardvark
aaron abacus abc123 abc1234 abc12345 abc123456 abcdefghijklmnopqrstuvwxyz abnormal abraham abrupt absinthe acacia access accord acetate acorns acrobat action adagio adam adapters admin
administrator adrenalin adrian adroit advent agape agate agnes aileron airborne airbrush airmail airman airplane alan albacore albert alberto alchemy alejandro alex alfalfa alfonso alfred alfredo
alice alicia aliens alkaline allan allay allegro alligator allison allover allure alma aloha alpha alphabet alphas alpine alton alvin amalgam amanda amaranth amateur amateurs amatory amazon amber
ambrosia amethyst amigo amigos amoeba amour ampere anaconda anarchy anathema andre andrea andres andrew andy anemone angel angela angelo angels angler animal animate anime anita anklet anna anne
annette annie anteater antelope anthony anthrax antihero antivirus antler antonio anvils apathy apogee apple apples applesauce apprentice apricot april arachnid arbiter arcane archangel archery
argyle arlene armada armando arrow arrows artefact arthur arturo asd123 asd1234 asd12345 asd123asd asd222 asd456 asdasd asdasd123 asddsa asdf12 asdf123 asdf1234 asdfasdf asdffdsa asdfg1 asdfg123
asdfg12345 asdfgh asdfgh01 asdfgh1 asdfghj asdfghjk asdfghjkl asdfjkl asdfqwer asdfzxcv asdqwe asdqwe123 asdzxc ashley aspen aspirant aspire assassin assassins assembler aster asthma astral atomic
auburn audrey avalanche avatar avenger aviator avocado awesome azalea azimuth baboon babushka backbone backhoe backlash backspace baddest badger badgers badlands baffle bagels bagpipe bagpipes
bakers balalaika balder balloon balloons balls balsam bamboo banana bananas bandana bandit banker banner banshee bantam banyan baobab barbara barbarian barbell barefoot baritone barks barley
barman barney barracuda barrage barry baseball bashful basket basses bassoon bazooka beaches beagle beagles beaker beaks beanbag bear beast beater beatrice beauty bebop becks becky bedbug bedlam
bedrock beech beefy beehive beeline beer beetle begonia behemoth beholder belinda benjamin bernard bernice berserk bertha bessie beth betty beverly biceps bicycle biggie bighorn bigmouth bigwig
biker bikers bikini bill billet billie billows billy bingo bionic birdbath birdcage birdhouse birdie birdies biscuit blackberry blackbird blackjack blackout blacks blacktop blade blades blake
blanked blarney blaster blasters blastoff blaze blazed blazer blazers bleach bleacher blender blessed blessing blinker blister blitz blizzard blonde blondes blonds bloods bloopers blubber blue
bluebell bluebird bluefish bluejay bluejays bluenose blues blunted blunts boarder boater boating bobbie bobbin bobbins bobble bobby bobcat bobcats bobolink bogey bogeys bogie bogies boiler bolero
bologna bomber bombers bonanza bonehead bones bongo bongos bonito bonkers bonnie bonsai boodle boogie bookcase bookie bookmark bookworm booster bootie booties bootleg boots booty boozer boulder
bounce bouncer bounder bounty bovine bowler bowling boxcar boxer boxers boxing bozo brad bradley bramble brandon brandy braves bravos breads breaker breakers breeze breezy brenda brent brett brian
bricks briefs brittany broker bronco broncos brownie browns bruce bruin bruins bruiser bryan bubble bubbles bucket buckeye buckeyes buckshot buckskin buckwheat buddy budgie buffalo buffalos buffer
buffet bugaboo bugger buggy builder bull bulldog bulldogs bullet bullfrog bulls bumble bumblebee bummer bumper bunches bungalow bunghole bungle bunnies bunny burger burly burner burnout burrito
bushed bushel buster busters bustle butane butch butter buttercup butterfly buttons buzzard buzzer buzzers buzzkill buzzword byron cabbage cabbages cabbie caboose cactus cadaver caddy cadence
calamity calculator calico calliope calvin calypso camber camel camels camper canard canaries canary cancer candies candle canes canine cannabis cannibal canon capitals capstan captain caramel
caravan carbine cardigan cardinal carefree carl carla carlos carlton carmen carnage carnival carol carole caroline carolyn carpet carrie carrot carrots cartoon cartoons casey cashew casino
cassandra castaway caster catcher catfish catherine cathy catnip cats catty catwalk caustic cavalier caveman cayenne cecil cecilia cement censor centaur centurion cerise certificate cerulean cesar
chad chainsaw chaise chalky chamois champ champion champs changeme changethis chaos charger chargers charisma charlene charles charlotte charmed chaser cheater checker checkers cheddar cheeks
cheeky cheers cheese cheetah chemist cherries cherub cheryl chessman chewy chichi chicken chickens chicks chiefs chigger chilis chiller chilli chilly chimaera chimera chino chipmunk chipper
chippers chisel chomper chopper choppers choppy chowder chris christian christina christine christopher christy chrome chronic chubby chuckles chucks chunky chutney cigars cinder cinders cindy
cinnamon cipher cirrus citadel citron citrus civics claire clambake clara clarence claret clarets clarinet clarion classic classics claude claudia clayton cleric clifford clifton climax climber
clinton clipper clippers clips clouds cloudy clove clover clowns clutch clyde cobalt cobblers cobras cobweb coconut codfish cody coffee coffees coke cola colleen collie colors colossus comet
comets commando compute computer concord concrete condom condor congas connect connie constance consumer contortionist contour cooker cookie cookies cooler coolness coopers cootie copper copter
cora corey cornbread cornet corolla corona coronas coronet correcthorsebatterystaple corsair corset cory cosmic cosmos cougar cougars courtney cowboy cowboys cowgirl coyote coyotes crabby crafty
craig cramps craving crawfish crayfish crayon creamy creative creeper creepers creosote crescent crevice cribbage cricket crimson crispy critter critters crocus crowbar cruise cruiser crumbs
crumpet crunch crunchy crusader crusty crybaby crystal cubs cucumber cuddles culinary cumming cumquat cumulus cupcake curious curlew curtis custard custom cutter cyclone cyclones cynthia cypress
daemon daffodil daffy dagger daisy dale damon dana dancer dandelion danger daniel danielle dank danny dapper darken darkness darlene darrell darren darryl daryl dave david dawn dawns daydream
dazed dazzle deacons deadlock deadwood dean deanna debbie deborah debugger decimal deejay default defaultpassword defender defiant delete delight delores delta deltas deluge deluxe demigod demo
denise dennis derek derrick dervish desert designer desire desktop desperado desperados destiny deuce deviant dewdrop dharma diabolic dialog diamond diamonds diana diane dianne diaper diddle
diehard diesel dieter digger diggers digital dimples dimwit ding dingo dinosaur dipper dipstick dirtball disco discover discus diskette diva diver divers divine doctor dodger dodgers dodges
dogfight dogfish doggie doggies doggone doggy doghouse dogma dogs dogwood dollar dolores dolphin dolphins doming dominion domino dominos donald dongle donkey donna donnie donotforget dontforget
donuts doodad doodle doodles doomsday dora doris dorothy dotcom doubled douche doug douglas dovetail downhill dragnet dragon dragonfly dragons dragoon dreads dreamer dreamers dreams dressage
dribble drifter drinker driver droopy druid druids drummer drummers drywall duane ducat duchess duck duckling ducks duffer dummies dumpy dungeon duster dustin dwayne dwight dynamite dynamo eagle
eagles earl earwig eclipse eddie eddies edgar edgewise edith edna eduardo edward edwin egghead eggplant egoist eider eileen elaine eleanor electric electrician electron electronic element elephant
elizabeth ella ellen elmer elsie embalm embalmer emerald emily emma empire empires encore energize energizer enforcer engage engineer engineering enigma enrique enter enterprise entropy envision
epsilon equinox eraser erasure erection eric erica erik erika erin ermine ernest ernesto ersatz espresso esquire esther eternal eternity ethel eugene euphoria eureka evan evelyn everett evermore
examination excite executor exigent exodus exotic exploiter explorer express extreme eyeball fabric facial facile fairway falcon falcons fallen fallout fanatic fanboy fang fannies fantasy fart
fasted faster fathead fatty faye fearless feather feathers fedora feeder feldspar felicia feline felix fellatio fencer fender fernando ferret ferrets fester fiddle fiddler fidelity fidget fiesta
fighter figment filbert filter finder finger fire fireball firefighter firefly fireman fireplug firestorm firewall firework fish fisherman fishers fishes fishhook fishing fishnet fishy fitness
fitter fizzle flamer flames flamingo flange flapjack flapper flash flasher flexible flimflam flipper flippy floppy florence florid florin flotsam flounder flower floyd fluff fluffy flyer flyers
flywheel foghorn foobar football foothill footman footsie foreplay foreskin forest forever forgetmenot forklift formula forsaken fossil fosters foxglove foxhound foxtrot foxy fractal fractals
framer franc frances francis francisco frank freaks freaky freckles fred freddie frederick fredrick freebie freedom freehand freeway fresher fright frigid frisky fritter frog frogman frogs
frontier frostbit frosty fruity fulcrum fullback fungus funky fusion fuzzball fuzzy gabriel gadfly gadget gagged gagging gail galactic galaxy galena galore gambit gambler gamer gamma gammas
gangster garden gardenia gargoyle garter gary gateway gateways gaucho gauntlet gazelle gecko geckos geezer gemstone gene generic genesis geneva genial genius george georgia gerald geraldine gerard
gerbil gertrude geyser ghetto ghost ghostly giantess giants gibbon giblet gigabyte giggle giggles gilbert gimlet gimpy gina ginger ginseng giraffe girdle girls gismo gizmo gizmos gladiator
gladiolus gladys glamour glen glenda glenn glider glitter gloria glowworm gnarly goalie goat goats gobbler goblin goddess godfather godlike golden goldfish golf golfer golfers golfing gong gonzo
goober goobers goodby goodie goofy goose gooses gopher gophers gorilla gosling gotcha grabber grace grandad granny grapple grassy gratis grease greats greener greenery greens greg gregory gremlin
gremlins gridlock griffins grimace grime grin grinder grinders gringo grizzly groove groovy grouch grouper grouse grumble grumpy grunge grunt grunts gryphon guadalupe guardian guesswhoiam guitar
guitars gumbo gumdrop gunner gunners gunny gunslinger gunsmith guppy gusher gwendolyn gymnast gymnastic hack hacked hacker hackers hacking hairball hairy halberd halcyon halibut hallow halogen
hamlet hammer hammers hamper hamster handbag handbags handball handcuff handily handyman hangman happybirthday happynewyear hardball hardline hardwood harold harpoon harriet harry harvest hater
haters hattie hawker hawking hawthorn hazel hazelnut hazmat headers headless headroom hearts heater heather heaven hector hedgehog hedonism hedonist heehaw heeled heidi helen helium hellion hello
hellos helmet helper hemlock henry herbert heretic herman hermit herons hexagon hibiscus hiccup hickory hidden highball highland hiking hilda hillside hilltop hippie hippo hippos hirsute hoagie
hobbit hockey holiday holly homeboy homely homemade homepage homer homers homies honeybee honeydew honeys hooch hoodoo hookah hookup hooligan hoopla hoops hooter hooters hopeful hoppers horace
horizon hornet hornets hornier horse horseman horses horsey hotness hotshot hounds housewife hover howler hubert hugh humbug hunter hunting huntress husker huskers huskies husky hussar hymen
iamtheadministrator iceberg icicle idiom iguana ihatepasswords illusion ilovemycat ilovemydog ilovemyfamily ilovemymum iloveyou imbue immortal impala implants incognito incubus indigo inferno
infinity infix inflames inhere insane insider insomnia install installer intel intercourse interne internet intranet intrepid intruder invader irene iridium irma isaac isabel islander ivan jabber
jack jackal jackie jackpot jacob jacqueline jagged jaguar jaguars jaime james jamie jane janet janice jared jasmine jason jasper javelin javier jazzy jean jeanette jeanne jeff jeffery jeffrey
jello jelly jellybean jennie jennifer jenny jeremiah jeremy jerkin jerome jerry jesse jessica jessie jester jesus jets jewels jigger jiggle jigsaw jill jimmie jimmy jingle jingles jiujitsu joan
joann joanne jobber jockey joel joey john johnathan johnnie johnny joker jokers jonathan jorge jose joseph josephine joshua joyce joyful joyride joystick juan juanita jubilee judith judy
juggernaut juggle juggler juice juicer juicy jujitsu jujube julia julian julie julio julius jumble jumbo jumbos jumper jumpsoverthelazydog jungle junior juniper junkie junkyard juntas juster
justice justin kaboom kahuna kamikaze kangaroo karaoke karat karate karen karl katherine kathleen kathryn kathy katie katrina katydid kayak kayaking kayaks keeper keith kelly kelvin kenned kenneth
kenny kent kernel kerry kestrel kevin keyboard keystone kicker killjoy kimberly kingfisher kingpin kingpins kipper kirk kismet kisses kitten kittens kitties kitty kiwi knickers knights knocker
knockers knotty knuckles koala koalas kookie kristen kristi kristin kristina krypton kumquat kurt kyle labia lacrosse lactate laddie ladles ladybird ladybug lager lagers lambda lament lamer lamers
lampoon lance lancer lancers lances lantern laptop larkspur larry laser lasers lassie latching latex laura lauren laurie lawrence leafs leah leapfrog leather leftie lefty legacy legalize legend
legion legman lemming lemmings lemonade lena leon leona leonard leopard leroy leslie lester letmein letmeinplease lever lexicon liberty licorice lighter lightning lights lillian lillie linda
lindsay lindsey lineage lineman lion lioness liquid lisa lithium lizard llama lloyd loader lobster lockout loco locust logger login logistic logjam logoff logout lois lollipop lollypop lonesome
longhair longhorn longhorns lonnie lookout lookup looser lorenzo loretta lori lorraine loser losers lotus louis louise love loveable lovely lover lovers lowdown lucidity lucille lucky lucy luis
luke lumber lumpy lunchbox lupine lurker luscious lust lusty luther lydia lyle lynn mabel macabre macaroni machine macros madcap madhouse madman madness maestro magenta maggot magic magician
magics magnet magneto magnum magpie magpies maiden mailman majestic malcolm malice mallard mallards mamas mambo mammoth manatee mandarin mandolin mandrake mango mangoes mangos mania maniac manics
mankind mantis mantle mantra manuals manuel mapper maraca marathon marauder marbles marc marcia marco marcus margaret margarita margie marguerite maria mariachi marian marie marigold marihuana
marijuana marilyn marimba marina marine mariner mariners marines mario marion marjorie mark marker marlene marlins marmot maroon marquise marsha martha martian martinet martini marvin mary masher
masons massive master mastermind masterpassword matador matchbox mathew matrix matt matthew mattie mature maureen maurice maverick mavericks maxim maxima maximal maxine mayday mayfly mayhem
maytheforcebewithyou meadow meatball meatloaf mechanic medias medic meditate megabyte megan melange melanie melinda melissa mellow melon melons melvin memento menace menthol mentor mercury
meridian mermaid mermaids merrychristmas mesquite messiah metallic metros miasma michael micheal michele michelle micron microphone midnight midway mighty miguel mike miked mikes mildred milker
milkmaid milkman millers milton mimosa minim minion minnie minnow minstrel minty mirage miriam mischief misfit misfits mishmash mister mistress misty mitten mittens modem modems moguls molly
monarch money moneybag moneymaker mongoose monica monies monitor monkey monkeys monolith monopoly monsoon monster moonbeam moonlight moonshine moonshot moose mortgage mother motocross motorbike
motorman mountain mouse mouser mouses mousey mudslide muffin mulberry mulch mullet mumbles munch munchkin muscle muscles mushroom musics muskrat mustang mustangs mustard mutant mutter mutton
myopia mypassword myrtle mystic nacho nachos nancy naomi napalm nasty natalie nathan nathaniel naturals naught nautilus navigator nebula necromancer neil nellie nemesis neon neophyte nestle neuron
neutrino neutron nevermore newbie newness newpassword nexus nibbles nicholas nick nickel nickle nicole nighthawk nightshade nimbus nina ninja ninjas nipper nirvana nocturne noddy noggin nomad
nomads nonstop noodle noodles nopassword nora norma norman notebook notsecure nougat noway nudist nugget nuggets nutmeg nylon nylons oasis oatmeal obelisk oblivion obsidian ocarina oceans ocelot
octagon octane octopus oddball odyssey oleander olga omar omega omegas onceuponatime onetime onion onions online opensesame openthedoor operator opiate optima optimist opus oracle orange oranges
orchard orchid orgy orient origami oriole orioles orlando oscar osprey otis otter otters outback outlaw outlaws outsider ovation overkill overlord oxford oxymoron oyster pablo packer packers
paddle paddy padres paisley pallet palmetto pamela panacea panache pancake panda pandas pandemonium pander pang panorama panther panthers papaya paperboy paprika parabola paradigm paradise paradox
paragon parallax paramedic parkour parrot partizan passer passion passions passphrase passport password passwords passwort pastas pastel patches patchy patricia patrick patriot patriots patsy
patter paul paula pauline pavement pavilion payday peaces peach peaches peanut peanuts pearl pearls pebble pebbles peddler pedigree pedro peekaboo peeper peepers peewee peggy pelican pencil
penguin penguins penny pepper perils persona pervasive pervert peter petite petunia peyote phantasm phantasy phantom phantoms pharmacy pheasant philip phillip phish phishing phoenix photon photos
phyllis pianos piccolo picker pickle pickles pickup piercing pigeon piggies piggy piglet piglets pigpen pillow pinball pineapple ping pinhead pink pinky pinnacle pioneer pipeline pipers piranha
pirate pirates pistol piston pistons pitchers pixie pixies pizza pizzas placebo placid planet plankton planner plasma plastic plastics platinum platypus player playful playmate pleasechangeme
plover plucky plumber plumper poison pokers pokey polecat police politic polka polo pompon poncho pontoon pony pooch poodle pooh poop popcorn poppies poppy porpoise possum postal postman posture
potato pounded powder praline prancer preacher precious predator prelude premium presto preston pretzel primal primer primrose prince princes princess printer priscilla prissy private privet
probes prodigy prong prophet prosper proton protozoa proverbs prowler proxy psalms psycho puck pudding puddles puffer puffin puffy puller pulsar pumper pumpkin pumpkins punker punter puppies puppy
purple pusher puss pussies putter pyramid pyramids python q1w2e3 q1w2e3r q1w2e3r4 q1w2e3r4t5 q1w2e3r4t5y6 qaywsx qaz123 qaz12345 qaz123wsx qaz741 qazedc qazplm qazqaz qazwsx qazwsx1 qazwsx12
qazwsx123 qazwsxed qazwsxedc qazwsxedc1 qazwsxedc123 qazwsxedcrfv qazwsxedcrfvtgb qazxcv qazxsw qazxsw12 qazxsw123 qazxswedc qazxswedcvfr qazzaq quagmire quake quantum quark quartz quasar queens
quest quicksilver quixotic qwaszx qwaszx12 qwe123 qwe123qwe qwe321 qwe789 qweasd qweasd123 qweasdzx qweasdzxc qweasdzxc123 qwedsa qwedsazxc qweewq qweqwe qweqwe123 qwer12 qwer123 qwer1234 qwerfdsa
qwert1 qwert12 qwert123 qwert12345 qwert40 qwertasdfg qwerty qwerty1 qwerty11 qwerty12 qwerty123 qwerty1234 qwerty12345 qwerty123456 qwerty13 qwerty2 qwerty7 qwerty77 qwerty777 qwerty78 qwerty99
qwertyasdfgh qwertyu qwertyui qwertyuio qwertyuiop qwertyuiopasdfghjklzxcvbnm qwertz qwertzui qwezxc rabbit rabbits racer racers rachel racing radiance radish rafael raffles raider raiders rainbow
rainbows raindrop rainier rainmaker raisin ralph rambler ramon ramona rampage ramrod rancid randall random randy rang ranger rangers rapier rapture rascal rasdzv3 raster ratchet rattler rattlers
rattrap raul raunchy ravage raven ravens rawhide raymond razor razors razz reader realtor realty reaper rebecca rebel rebels rebirth reborn reckless recoil recycle redder redeemed redeemer redhead
redheads redneck redone reds redwood reefer reflex regal reggae regina reginald reliant reload reloaded rene renee renegade reptile requiem rescue resolute restart retype revolver rhapsody rhino
rhinos rhonda rhubarb ricardo richard riches rick rickey ricky ricochet riffraff rifleman ripoff ripper ripple rita riven roadkill roadrunner roadster roadway roamer robert roberta roberto robin
robot robotics rocker rocket rockets rocks rodent rodeo rodeos roderick rodney roger rogue rogues roland roller ronald ronnie roofer roofing rookie rooster roosters rooter rootroot rosa rose
rosebud rosebuds rosemary rosewood rotary rotten rouges router rover rovers rowdy royals rubber rubble ruben rubies ruby rudolph rudy ruffian ruffles rumble rumple runaway runner russell rustler
ruth ryan saber sable sabre sabres sabrina sachem safari saffron sailboat sailfish sailing sailor saints salamander salami sally salmon salvador samba samuel samurai sandal sandman sandra sanity
sapphire sara sarah sassy satchel sausage sausages savant savior sawdust scabby scammer scamp scamper scampi scanner scarab scarlet scimitar scooter scooters scoots scorch scorpion scorpions
scotch scott scout scrabble scream scribble scribe scruff scruffy scuba scubas scythe sean searcher seashell seashore seaside seaways secret secretpassword secure security seductive seeker seesaw
select sellout senators senna sentinel sentry sequoia seraph seraphim serendipity serenity serge sergio serpent server servo sesame seth setter sevens shadow shady shag shaggy shaker shaman shammy
shampoo shamrock shandy shane shannon shanty shark sharks sharon sharps shaun shaved shaven shawn sheepdog sheila shellac shelly sherbert sherri sherry sheryl shifty shimmer shimmy shiner shipmate
shirley shocker shockers shogun shooter shopper shotgun showboat shredder shrike shun shyster sidekick sideshow sidney sierra siesta sigma silencer silicone silvan silver simple sinful sinister
sinned sinner sirocco sissy sizzle skate skateboard skater skeet skiing skillet skinhead skinny skins skipper skulls skunk skunks skydive skydiver skylark skyline slacker slacking slammer slayer
sleeper sleepers sleepy sleuth slicer slider sliders slim slinky slipknot slipper slippery sliver slobber slowpoke sludge slugger slurp slurred smacker smashing smelly smiles smiley smiths smithy
smoke smoker smokes smooch smooches smooth smoothie smoothy smother smudge smuggles smurf snafu snake snakes snapper snappy snapshot snarf sneaker sneakers sneaky snicker snickers sniper snooker
snoop snooper snoops snorkel snowball snowboard snowdrop snowflake snowman snowshoe snowy snuffles snuggle snuggles soapy sobriety soccer softball software solace solder soldier solitude solstice
sonata songbird sonia sonic sonnet sooty soprano sopranos sorcerer soulmate southpaw spaceman spacey spam spammer spaniel spanner spanners sparkle sparkles spartan spawn spawns speaker spectrum
speeder speedster speedy sphinx spice spider spiffy spike spikes spinner spiral spirit spitfire splash splatter spleen splicer splinter splodge splurge sponge spook spooks spooky spoons sporty
spotter spotty spring sprint sprinter sprite sprocket sprout spud spuds spunk spunky spurs squall squash squeak squealer squid squids squirrel squirt squirts squish squishy stacey stacy stairway
stalker stallion stampede standby stanley star starfish stargazer starlet starlight starter stater static stealth steels stella stellar stephanie stephen stereo steve steven sticks sticky stigmata
stiletto sting stinger stingers stingray stinker stitch stocking stocks stoned stones stoney storm stormy stranger strap strawberry streaming strife strike striker stripe stroller stuart stubby
student studly stumpy stupid stylus stymie sublime submit subway success suede sugar sugars sully sultan summer summertime summit summoner sunbeam sunder sundial sundown sunfish sunflower sunlight
sunrise sunset sunshine suntan super superb superman supermen supernova supers supersecret supersonic superstar superuser surf surfer surfers surfing surveyor survivor susan sushi suzanne swallow
swallows swampy sweeper sweeps sweeties sweetness sweets swimmer swimming swinger swingers swinging sword swordfish swords sycamore sylvan sylvia synapse synergy syphon sysadmin tacit taco tadpole
taffy tailgate talisman tallyho talon talons tamara tammy tangerine tango tangos tanker tanya taproot tara target tarpon tartan tasty tattoo taxicab teabag teacher teacup teamster teamwork teapot
teardrop teaser teatime technician techno teepee telecast telecaster temp tempest temporary temppass temptress tennis tenpin tentacle tequila teresa terminator termite terrance terrapin terrence
terri terrier terriers terror terry test tester testing testtest thelma theodore thequickbrownfox theresa thinker thisismypassword thistle thomas thumbs thunder thunders thwack tickle tickling
ticklish tiffany tiger tigers tights tigress timber timberland timothy tina ting tinker tipper tiptop titan titanic titanium titans titmouse toaster toasty tobeornottobe todd toenail toffee toggle
tomahawk tomato tomboy tomcat tommy toni tony tonya toolbox tooling tooting topaz topsecret tornado tornados torrent torrents tortoise totem toucan towing tracer tracey tracker tractor tracy
trader trailers trainee trainer training trance tranquil transcend transits translator trapdoor trapper travail travel traveler travis treacle treasure treble treetop treetops trek trevor triangle
trickle tricky tricolor trident trigger trill trinity trinket triplet triplets tripod triumph trivia troika troll trombone trooper troopers tropic trotters trouble trousers trouts troy truck
trucker truckers trucking trucks truffle truffles trumpet trunks trustnoone tsunami tugboat tulip tulips tundra tuning turbot turkey turnip turtle turtles tuxedo tweet tweeter twiddle twiggy
twilight twink twinkle twinkles twinkletwinklelittlestar twisted twister twisters tyler typhoon tyrant tyrone udders ultimate ultra ultras umbrella umpire underdog undertaker undertow unicorn
unreal uptown urchin username utopia vacation vagabond valerie vampire vandal vanes vanessa vanguard vanilla vantage vector velma velvet vendetta venom vera verbatim verity vernon veronica vertigo
verysecure vesper vibrate vicki vickie victor victoria victory vincent vintage viola violet violin viper vipers virago virgil virginia visa vision vitamin vivian vivid vixen vixens volition volley
voodoo vortex voyager voyeur vulture wabbit waffle walleye walnut walrus walter wanda wanderer wannabe wapiti warez warhorse warlock warlord warrior warriors warthog wasdwasd watcher watchmen
watermelon wayfarer wayne weasel webcam webmaster weeded weenie welcome welder wendell wendy werewolf wesley wetter whaler whales whatever wheels whiplash whippet whirling whiskers whiskey whisky
whisper whistler whoami wicked widget wiggles wiggly wigwam wilbur wildcat wildcats wildfire willard william willie willow wilma windmill windows windsurf wingnut winner winsome winter wisdom
wishbone wisteria wizard wizardry wizards wobble wolverine wolves wombat wombats woodland woodwind woodwork woody woofer wormwood wraith wrangler wrench wrestle wrinkles wsxedc wsxqaz wsxzaq xenon
yanks yellow yolanda youllnevergetin yourpassword yummy yvonne zachary zapper zaq123 zaq12345 zaq12wsx zaq1xsw2 zaq1xsw2cde3 zaqwsx zaqwsxcde zaqxsw zaqxswcde zealot zealots zebras zenith zephyr
zeppelin zigzag zinger zippy zircon zodiac zombie zxc123 zxcasd zxcasdqwe zxcasdqwe123 zxccxz zxcv123 zxcv1234 zxcvasdf zxcvb1 zxcvb123 zxcvb12345 zxcvbn zxcvbn1 zxcvbnm zxcvbnm1 zxcvbnm123
zxcvvcxz zygote
`;

/** What people choose first, in lower case and without signs. */
export const commonPasswords: ReadonlySet<string> = new Set(words.trim().split(/\s+/));
