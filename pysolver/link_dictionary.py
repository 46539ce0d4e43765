"""Which strings do most records share? The preset dictionary of links of version r1.

A link's deflate stream points into this text, so it is part of the format: never change it. Another text is another
version (r2), and r1 links go on being read with this one. Strings that come often stand near the end.
"""

DICTIONARY_R1 = (
    "metric us m mm ft in lb/ft plf psf kip·ft kip lb kN·m kN/m² kN·m² kip·in² kg/m kg design exact laser paced level"
    " weighed ticket counted volume steel_table timber_grade concrete stated imposed roof snow water construction hol"
    "d_down line_load area_load not_stated design_effect all_but_self added asce7-16-asd asce7-16-lrfd unfactored own"
    " different not_seen something not_looked in_permanent permanent_favourable accompanying leading spring fixed fre"
    'e pinned right_end near_edge face true centres +01:00 +02:00 image/jpeg{"position":{"at":"centre","distance":{"m'
    'eans":"tape","text":"2.","unit":"m","value":2.0},"from":"left_end","side":"right","support":null,"to":"middle"},'
    '"zone":{"length":{"means":"design","text":"0.6","unit":"m","value":0.6},"position":{"at":"face","distance":{"mea'
    'ns":"tape","text":"2.","unit":"m","value":2.0},"from":"support","side":"left","support":1,"to":"near_edge"}}}{"n'
    'umbers":{"":0.0},"record":{"changed":"2026-","condition":{"distress":{"ends":"none","midspan":"none","underside"'
    ':"none"},"distress_note":"","told":null,"void":{"answer":"none","note":"","which":[]}},"created":"2026-","decisi'
    'on":null,"ends":{"left":"","right":""},"format":"asfound-record","found_at":"2026-","found_by":{"name":"","phone'
    '":"","role":""},"hinges":[],"id":"","limits":[{"basis":"factored","covers":"all","covers_loads":[],"document":""'
    ',"entries":[{"criterion":"sag","id":"e5","sag_under":"total","support":null,"value":{"means":"design","text":"L/'
    '360","unit":"","value":""},"width":null,"zone":null},{"criterion":"reaction","id":"e4","sag_under":null,"support'
    '":null,"value":{"means":"design","text":"90","unit":"kN","value":90000.0},"width":null,"zone":null},{"criterion"'
    ':"shear","id":"e3","sag_under":null,"support":null,"value":{"means":"design","text":"80","unit":"kN","value":800'
    '00.0},"width":null,"zone":null},{"criterion":"hogging","id":"e2","sag_under":null,"support":null,"value":{"means'
    '":"design","text":"60","unit":"kN·m","value":60000.0},"width":null,"zone":null},{"criterion":"sagging","id":"e1"'
    ',"sag_under":null,"support":null,"value":{"means":"design","text":"60","unit":"kN·m","value":60000.0},"width":nu'
    'll,"zone":null}],"id":"s1","issued_by":"","kind":"resistance","moment_at":"centre","own":null,"restraint":"full"'
    ',"restraint_spacing":null,"revision":"","set":"en1990-6.10-str","span":null,"span_rule":"effective"}],"loads":[{'
    '"category":"stored","form":"point","id":"l1","length":null,"magnitude":{"means":"by_eye","text":"13.5","unit":"k'
    'N","value":13500.0},"magnitude_end":null,"name":"pallet of blocks","note":"","photos":[],"position":{"at":"face"'
    ',"distance":{"means":"tape","text":"2.1","unit":"m","value":2.1},"from":"support","side":"right","support":0,"to'
    '":"middle"},"removable":true,"source":"","whole_beam":false},{"category":"permanent","form":"line","id":"l2","le'
    'ngth":null,"magnitude":{"means":"design","text":"4.8","unit":"kN/m","value":4800.0},"magnitude_end":null,"name":'
    '"floor","note":"","photos":[],"position":null,"removable":false,"source":"","whole_beam":true}],"notes":"","over'
    'hangs":{"left":null,"right":null},"permanent":{"answer":"entered"},"photos":[{"bytes":0,"hash":"","load":null,"n'
    'ame":"","note":"","taken":"","type":"image/jpeg"}],"place":{"drawing":"","member":"","revision":"","site":"","st'
    'age":""},"restraint":{"answer":"full","spacing":null},"section":{"depth":{"means":"tape","text":"300","unit":"mm'
    '","value":0.3},"identity":"same","note":"","stiffness":null,"zones":[]},"self_weight":{"answer":"entered","mass"'
    ':{"means":"steel_table","text":"46","unit":"kg/m","value":451.1059}},"settings":{"display":"metric","phone":""},'
    '"spans":[{"drawn":{"means":"design","text":"5.60","unit":"m","value":5.6},"length":{"means":"tape","text":"5.62"'
    ',"unit":"m","value":5.62},"measure":"clear"},{"drawn":null,"length":{"means":"tape","text":"5.62","unit":"m","va'
    'lue":5.62},"measure":"clear"}],"supports":[{"bearing":{"means":"tape","text":"100","unit":"mm","value":0.1},"bea'
    'ring_drawn":{"means":"design","text":"100","unit":"mm","value":0.1},"kind":"bearing","name":"A","note":"","rotat'
    'ional":null,"settlement":null,"stiffness":null},{"bearing":{"means":"tape","text":"100","unit":"mm","value":0.1}'
    ',"bearing_drawn":{"means":"design","text":"100","unit":"mm","value":0.1},"kind":"bearing","name":"B","note":"","'
    'rotational":null,"settlement":null,"stiffness":null},{"bearing":{"means":"tape","text":"100","unit":"mm","value"'
    ':0.1},"bearing_drawn":null,"kind":"bearing","name":"C","note":"","rotational":null,"settlement":null,"stiffness"'
    ':null}],"valid_until":null,"version":1},"versions":{"asfound":"0.1.0","numpy":"2.","python":"3.14.","record":1}}'
).encode()
