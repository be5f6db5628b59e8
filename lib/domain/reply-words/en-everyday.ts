/**
 * Everyday English words without a meaning here: those that a slip of the finger would make of a word
 * that has one, and the commonest. They keep guesses at spelling off.
 */
export const enEveryday = `above accent accept accident accompany account accounted across act acting action acts actually
  addicted admit admitting afford afraid against ahead ain alike allow along alter angry anybody
  anyone anyway anywhere apiece apologize arms army arrest arrive ass asshole attack attacking
  awakened babes backing bag bailed bake baked bald bale ball ballroom balls band bands bang
  banking bar bare barking barrier bastard batch bath bats batting battles beach beak bean bear
  beast beasts beaten beating beauty became become beds beeping beer began beginning begun belt
  bet bets betting bidding bigger billing bind blame blind blinking bliss blond blur blush
  blushing board boat bollocks bomb bonds bones bong bono book booking border boring bout bowls
  box boyfriend bragging brawl breach bred breed breeding brew brick briefing brig broad brushed
  brushing bucks bugging build building bully bunch bunk buns bursting bury burying buys cabs
  calm camera camps cane canned cans cards cared career careful caring carry cashed cast casting
  causing cellar cells cent chained chanting chap charging charming charter chasing chatting
  cheat cheeks cheering cheese cheesy chess chick choice choir chooses chop chopped chow
  chuckling clamp clan clap clapping claw clearing clever client clinical clipped cloak clocks
  closer closes clown clue coach coaching collar collector college comb comfortable common
  compelled compete conception concerned conducted conducting conductor confessed confined
  consider consumed continue control converted convicted conviction cooked cooler cooling cop
  cope cops cord correctly cosy country court crap crappy craps creaking cream creative crew
  crime criminal crippled crock crooked cross crush crushing cry crying cursed cute dame damn
  dance dancing dangerous dare darling date dating deaf dealing death debt debts deceased decide
  decided decision deck decks deed deep deer deny department deported descent deserve desk
  destroy detailed detained detected dies dig digs dime dine dire directors discuss discussing
  dish diver diving dock docks doggy doll doom doomed dork dose dove dream dreams dress dressed
  drifting drilling drive drooling drowning drug drugs duct dude duel dues dumb dump dunk duty
  early earring ease edgy either emotion emotions employed enemy enjoy especially ether evidence
  evil excited expect experience faces failing fair faith fake famous fare fart farther fat fault
  favor favorite favour feather fellows fiend fight fighting figure figured file files filming
  final finer fired fires firm fist flaming flank flatter flattering flaw fled flee fleeing flesh
  flick flight fling flipping flirting flock flour folks fond fool fore forgive form forming
  forth freaking free fresh fries frigging fright frying fun further future gain gals game games
  gang gangs garbage gay gentlemen gift girlfriend glad goddamn gods goof goon gosh gotta
  government grab graceful grad gram grass grave greatest greet grew grid grieving grin grind
  grinding grow guard guilty gun guns hallowed hallway handing happen happened happening hardcore
  harp hash hat hate hating haunt heading healing hearing heating heir helped helping herd hero
  hide hind history holds holler homo honest honor hood hopes hoping hostess hotter huge human
  hungry hunk idiot imagine immediately important impressed injected innocent insisted inspect
  instead instinct insulted intention intentions intercept interest interesting interpret
  interrupt invented invention invested involved isn jail jazz jeep joke judge jump key keys kick
  kicking kidding kill killed killing kiss kite knack knife knowing known knows lace lacking
  ladder ladies lads lakes lamp land laps lass lately laugh laughing lawful lawyer lead lean
  leaning learn learned least lend lesser lesson lest lice licked lie lied lights likes liking
  limb lime limo listening lively loaf lock locked locking loft logs loner lords loud loudly
  loved lover loves loving lucky lump lung lust lying magic male males mare marriage marries
  marrow mass massage masses match mate meal medal medical meet memory mental mention mere mess
  messed messing messy met middle mild miles mill million mines mini missus mist moaning mock
  mode mole moon moor moose moth mourning movie movies murder mush music names nature nerd nerds
  nervous notion nuclear nuts occurred offence offer operation outta oven overhead owe pack pact
  paddle paddles pads pal pals pans pants papers paradise pardon partner party patient patrol
  paying peas peck peed peeking peep peeping pending pepper personal pest petty picked picking
  pictures pies pile pillow pillows pimp pins pint piss pissing pitching pits placing plains
  planned plans planting platter play player pleasure plenty poking pole police polo pony port
  pose position pots pound practice pray prayed prayers praying preaching presume pretty princes
  princess prison prisoner private prizes producing promise promised protect proud prove puck
  pudding pulling pulls punk pushing puss pussy quack quart queen queer quid quitting race rack
  raid rained rains rake rally rang rather ratio rays reached reaches reaching reading realize
  reason recently record referring refugees regiment relax relieve relieved rely remained
  repeated repeating reporting rescuing resort respect responsible retarded revolver rewards rich
  rid rider rides ringing rink ripe rises rising risk roar robber rocked rocking rocks role
  roller rope ruin ruining ruled ruling sack sacks sail sailed sailing sails sake sakes salmon
  sample samples sane sank saved saying scam scanning scared scene scout scraping screening sea
  search searched seas seat seating seats secret security sedative seeing seeking seemed sees
  seller sells sense sentiment seriously setting settled shallow share shared shaving ship
  shocking shoe shoes shopping shouting shouts showed shutting sight signed silly simpler simply
  singing sings sink sinking sins sire sites sits situation skid skiing skilled skip skipped sky
  slam slapped slayer sled slides slug smart smartest smile smiled smuggling snappy snatched
  sneaking snip snooping snowing sobs socks sole somehow song soothing sort soup space span
  speaking spear special speech speeding spell spelled spelling spells spending spices spinning
  spirit spitting spooked spooky spoons sporting sports sprung stab stabbing stable stack stakes
  stale stall stalling standing stare staring starring starting starved starving stashed stat
  state station steal stealing steals steam steamed steaming steering stepping steps sticker stir
  stirred strapped stretched strike striking stroll struck strung study stumble stumbled stunning
  stupid sucker sued suggestion suing suits sunk sunny supporting surf surprise surprised suspect
  swab swam swearing sweeping sweeps sweetest sweetheart sweetie swinging tabs tack tackle tale
  tales talked tall tame tapped tapping taught teasing tech teeth telling tells tent themselves
  thinking third thong thousand thrilling thus ticket tide tidy tie ties tight tile tissues
  together token toll tool torment tossed tough towel track tracking traitor transformed traveled
  tread treat treating trial trick tripped troubling trying tuck tune tuned tunes type unless
  unlocked upstairs vanish vest victim vine voice wailing waiter waiters wand wandering wanting
  war warn wars waste wasted wasting watch watching waves ways weakness weapon wear weekly whale
  whatsoever wherever whether widow wild willing win wine wins wished wishing witness wolf won
  words worried worry worrying worth wrap wretched wrote yard yell yourselves`
