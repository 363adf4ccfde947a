import { readMenu, type GroupText, type MenuText } from '../read-menu';

const groups: readonly GroupText[] = [
  { group: 'Side', min: 0, max: 1, lines: ['Side salad | SIDE SALAD | mustard', 'Chips | CHIPS', 'Slaw | SLAW | eggs, mustard'] },
  { group: 'Cooking', min: 1, max: 1, lines: ['Rare', 'Medium', 'Well done'] },
  { group: 'With it', min: 0, max: 1, lines: ['Cream | CREAM | milk', 'Vanilla ice | VANILLA ICE | milk, eggs'] },
  { group: 'Roast extras', min: 0, max: 1, lines: ['Extra gravy | EXTRA GRAVY | celery'] },
];

const sections: readonly MenuText[] = [
  { section: 'From the grill', course: 'Mains', seconds: 600, lines: [
    'Rib-eye, 300 g | RIBEYE 300 | | Cooking', 'Sirloin, 250 g | SIRLOIN 250 | | Cooking', 'Fillet, 200 g | FILLET 200 | | Cooking', 'Flat iron steak | FLAT IRON | | Cooking',
    'Lamb cutlets | LAMB CUTLETS', 'Pork chop, apple | PORK CHOP', 'Half chicken, lemon | HALF CHICKEN', 'Spatchcock poussin | POUSSIN', 'Merguez | MERGUEZ | sulphites',
    'Halloumi skewers | HALLOUMI SKEW | milk', 'Grilled hispi cabbage | HISPI | nuts', 'Duck breast, cherry | DUCK BREAST', 'Ox cheek, grilled | OX CHEEK | celery',
    'Venison loin | VENISON', 'Aubergine, miso | AUBERGINE | soybeans', 'Prawns on the shell | PRAWNS GRILL | crustaceans', 'Squid, chilli | SQUID GRILL | molluscs', 'Côte de bœuf for two | COTE BOEUF',
  ] },
  { section: 'Burgers', course: 'Mains', seconds: 540, lines: [
    'House burger | HOUSE BURGER | gluten, eggs, sesame | Side, Cooking', 'Cheese burger | CHEESE BURGER | gluten, milk, sesame | Side', 'Blue burger | BLUE BURGER | gluten, milk | Side',
    'Lamb burger | LAMB BURGER | gluten, milk | Side', 'Chicken burger | CHIX BURGER | gluten, eggs | Side', 'Fish burger | FISH BURGER | gluten, fish, eggs | Side',
    'Bean burger | BEAN BURGER | gluten, celery | Side', 'Mushroom burger | MUSH BURGER | gluten, milk | Side', 'Small burger | SMALL BURGER | gluten, sesame | Side',
  ] },
  { section: 'Sunday roast', course: 'Mains', seconds: 480, lines: [
    'Roast beef | ROAST BEEF | gluten, milk | Roast extras', 'Roast pork | ROAST PORK | gluten | Roast extras', 'Roast chicken | ROAST CHIX | gluten | Roast extras', 'Roast lamb | ROAST LAMB | gluten | Roast extras',
    'Nut roast | NUT ROAST | nuts, gluten, celery | Roast extras', 'Roast for the table | ROAST TABLE | gluten, milk | Roast extras', 'Child’s roast | CHILD ROAST | gluten, milk | Roast extras',
  ] },
  { section: 'Salads', course: 'Starters', seconds: 240, lines: [
    'Beetroot salad | BEETROOT SALAD | nuts, milk', 'Tomato and basil salad | TOMATO SALAD', 'Green salad | GREEN SALAD | mustard', 'Endive, pear, walnut | ENDIVE WALNUT | nuts', 'Farm salad | FARM SALAD | eggs, mustard',
    'Warm goat’s cheese salad | GOAT SALAD | milk, gluten', 'Lentil salad | LENTIL SALAD | celery, mustard', 'Fennel and orange | FENNEL ORANGE', 'Chicken salad | CHIX SALAD | eggs', 'Niçoise | NICOISE | fish, eggs', 'Bread and herb salad | BREAD SALAD | gluten',
  ] },
  { section: 'Cold starters', course: 'Starters', seconds: 240, lines: [
    'Crab toast | CRAB TOAST | crustaceans, gluten, eggs', 'Smoked trout | SMOKED TROUT | fish', 'Beef tartare | TARTARE | eggs, mustard', 'Country pâté | PATE | milk, gluten', 'Cured salmon | CURED SALMON | fish, mustard', 'Burrata, peach | BURRATA | milk',
    'Potted shrimps | POTTED SHRIMP | crustaceans, milk', 'Chicken liver parfait | PARFAIT | milk, eggs', 'Ham, celeriac | HAM CELERIAC | celery, eggs, mustard', 'Olives and almonds | OLIVES | nuts', 'Bread and butter | BREAD BUTTER | gluten, milk', 'Cold leek, egg | LEEK EGG | eggs, mustard',
  ] },
  { section: 'Pasta', course: 'Mains', seconds: 420, lines: [
    'Tagliatelle, ragù | TAG RAGU | gluten, eggs, celery', 'Spaghetti, clams | SPAG CLAMS | gluten, molluscs', 'Linguine, crab | LING CRAB | gluten, crustaceans', 'Rigatoni, tomato | RIG TOMATO | gluten', 'Gnocchi, sage | GNOCCHI SAGE | gluten, milk', 'Ravioli, ricotta | RAV RICOTTA | gluten, milk, eggs', 'Lasagne | LASAGNE | gluten, milk, eggs',
    'Orecchiette, greens | ORECC GREENS | gluten', 'Pappardelle, boar | PAPP BOAR | gluten, eggs', 'Cannelloni | CANNELLONI | gluten, milk', 'Macaroni cheese | MAC CHEESE | gluten, milk', 'Penne, aubergine | PENNE AUB | gluten', 'Mushroom risotto | MUSH RISOTTO | milk, celery',
  ] },
  { section: 'Fish', course: 'Mains', seconds: 480, lines: [
    'Hake, brown butter | HAKE BRN BUTTER | fish, milk', 'Cod, mussels | COD MUSSELS | fish, molluscs', 'Sea bass, fennel | SEA BASS | fish', 'Plaice on the bone | PLAICE | fish, milk', 'Skate, capers | SKATE | fish', 'Turbot for two | TURBOT | fish, milk', 'Fish stew | FISH STEW | fish, crustaceans, molluscs, celery', 'Mussels and chips | MUSSELS | molluscs, celery, milk', 'Scallops, peas | SCALLOPS | molluscs', 'Salmon, lentils | SALMON LENT | fish, celery',
  ] },
  { section: 'Sides', course: 'Mains', seconds: 180, lines: [
    'Chips, skin on | CHIPS SKIN', 'Mash | MASH | milk', 'New potatoes | NEW POTS | milk', 'Gratin | GRATIN | milk', 'Green beans | GREEN BEANS', 'Buttered greens | GREENS | milk', 'Carrots, cumin | CARROTS', 'Peas and lettuce | PEAS | milk', 'Creamed spinach | SPINACH | milk', 'Onion rings | ONION RINGS | gluten', 'Mushrooms, garlic | MUSHROOMS', 'Cauliflower cheese | CAULI CHEESE | milk, gluten', 'Rice | RICE', 'Broccoli, almond | BROCC ALMOND | nuts', 'Red cabbage | RED CABBAGE | sulphites',
  ] },
  { section: 'Desserts', course: 'Desserts', seconds: 240, lines: [
    'Lemon tart | LEMON TART | gluten, eggs, milk | With it', 'Chocolate mousse | CHOC MOUSSE | eggs, milk | With it', 'Crème brûlée | CREME BRULEE | eggs, milk', 'Apple crumble | CRUMBLE | gluten, milk | With it', 'Sticky date pudding | DATE PUDDING | gluten, eggs, milk | With it', 'Cheesecake, cherries | CHEESECAKE | gluten, milk', 'Meringue, berries | MERINGUE | eggs, milk', 'Rice pudding | RICE PUDDING | milk | With it', 'Almond cake | ALMOND CAKE | nuts, eggs | With it', 'Poached pear | POACHED PEAR | sulphites | With it',
    'Bread pudding | BREAD PUDDING | gluten, eggs, milk | With it', 'Ices, three scoops | ICES 3 | milk, eggs', 'Sorbets | SORBETS', 'Cheese plate | CHEESE PLATE | milk, gluten', 'Affogato | AFFOGATO | milk', 'Truffles | TRUFFLES | milk, soybeans',
  ] },
  { section: 'Cocktails', course: 'Drinks', seconds: 120, lines: [
    'Yard spritz | YARD SPRITZ | sulphites', 'Lantern sour | LANTERN SOUR | eggs', 'Rhubarb fizz | RHUBARB FIZZ', 'Elderflower collins | ELDER COLLINS', 'Smoked old style | SMOKED OLD', 'Harbour negus | HARBOUR NEGUS | sulphites', 'Pear mule | PEAR MULE', 'Quince martini | QUINCE MARTINI', 'Sloe gin cup | SLOE CUP', 'Bramble royal | BRAMBLE ROYAL | sulphites', 'Ginger dram | GINGER DRAM',
    'Orchard punch | ORCHARD PUNCH', 'Espresso martini | ESP MARTINI', 'Cherry highball | CHERRY HIBALL', 'Basil smash | BASIL SMASH', 'Grapefruit paloma | PALOMA', 'Mint julep | MINT JULEP', 'Vermouth, soda | VERMOUTH SODA | sulphites', 'Garden cup, no alcohol | GARDEN CUP', 'Lime cordial, no alcohol | LIME CORDIAL', 'Tomato snapper | SNAPPER | celery', 'Coffee old style | COFFEE OLD',
  ] },
  { section: 'Wine and beer', course: 'Drinks', seconds: 60, lines: [
    'Picpoul, glass | PICPOUL GL | sulphites', 'Picpoul, bottle | PICPOUL 75 | sulphites', 'Muscadet, glass | MUSCADET GL | sulphites', 'Muscadet, bottle | MUSCADET 75 | sulphites', 'Chenin, glass | CHENIN GL | sulphites', 'Chenin, bottle | CHENIN 75 | sulphites', 'Riesling, glass | RIESLING GL | sulphites', 'Riesling, bottle | RIESLING 75 | sulphites', 'Grüner Veltliner, bottle | GRUNER 75 | sulphites', 'Chablis, bottle | CHABLIS 75 | sulphites', 'Rosé, glass | ROSE GL | sulphites', 'Rosé, bottle | ROSE 75 | sulphites', 'Gamay, glass | GAMAY GL | sulphites', 'Gamay, bottle | GAMAY 75 | sulphites', 'Tempranillo, glass | TEMPRAN GL | sulphites', 'Tempranillo, bottle | TEMPRAN 75 | sulphites',
    'Syrah, glass | SYRAH GL | sulphites', 'Syrah, bottle | SYRAH 75 | sulphites', 'Pinot noir, bottle | PINOT N 75 | sulphites', 'Claret, bottle | CLARET 75 | sulphites', 'Sparkling, glass | SPARKLING GL | sulphites', 'Sparkling, bottle | SPARKLING 75 | sulphites', 'Sweet wine, glass | SWEET GL | sulphites', 'Fino, glass | FINO GL | sulphites', 'Pale ale, half | PALE HALF | gluten', 'Pale ale, pint | PALE PINT | gluten', 'Lager, half | LAGER HALF | gluten', 'Lager, pint | LAGER PINT | gluten', 'Stout, pint | STOUT PINT | gluten', 'Cider, bottle | CIDER | sulphites', 'Beer without alcohol | BEER 0.0 | gluten',
  ] },
  { section: 'Hot drinks', course: 'Drinks', seconds: 90, lines: ['Espresso | ESPRESSO', 'Double espresso | DBL ESPRESSO', 'Flat white | FLAT WHITE | milk', 'Cappuccino | CAPPUCCINO | milk', 'Black tea | BLACK TEA', 'Mint tea | MINT TEA', 'Hot chocolate | HOT CHOC | milk', 'Café au lait | CAFE AU LAIT | milk'] },
  { section: 'Late menu', course: 'Mains', seconds: 300, lines: ['Cheese toastie | CHEESE TOASTIE | gluten, milk', 'Soup of the day | SOUP | celery', 'Steak sandwich | STEAK SANDWICH | gluten, mustard', 'Charcuterie board | CHARCUTERIE | gluten, mustard', 'Bowl of chips | BOWL CHIPS', 'Late omelette | OMELETTE | eggs, milk'] },
  { section: 'Oysters', course: 'Starters', seconds: 240, lines: ['Rock oysters, three | OYSTERS 3 | molluscs', 'Rock oysters, six | OYSTERS 6 | molluscs', 'Rock oysters, twelve | OYSTERS 12 | molluscs', 'Oysters, shallot vinegar | OYSTERS VIN | molluscs, sulphites'] },
];

export const lanternYardMenu = readMenu('ly', sections, groups);
