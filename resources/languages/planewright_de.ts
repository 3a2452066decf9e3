<?xml version="1.0" encoding="utf-8"?>
<!DOCTYPE TS>
<TS version="2.1" language="de" sourcelanguage="en">
<context>
    <name>Case</name>
    <message>
        <source>permanent</source>
        <translation>ständig</translation>
    </message>
    <message>
        <source>variable</source>
        <translation>veränderlich</translation>
    </message>
    <message>
        <source>accidental</source>
        <translation>außergewöhnlich</translation>
    </message>
    <message>
        <source>measured</source>
        <translation>gemessen</translation>
    </message>
    <message>
        <source>long term</source>
        <translation>lang</translation>
    </message>
    <message>
        <source>medium term</source>
        <translation>mittel</translation>
    </message>
    <message>
        <source>short term</source>
        <translation>kurz</translation>
    </message>
    <message>
        <source>instantaneous</source>
        <translation>sehr kurz</translation>
    </message>
</context>
<context>
    <name>ChangeWords</name>
    <message>
        <source>none</source>
        <translation>leer</translation>
    </message>
    <message>
        <source>%1 now %2, %3 now %4</source>
        <translation>%1 jetzt %2, %3 jetzt %4</translation>
    </message>
    <message>
        <source>%1 now %2, was %3</source>
        <translation>%1 jetzt %2, vorher %3</translation>
    </message>
</context>
<context>
    <name>Check</name>
    <message>
        <source>printed value</source>
        <translation>gedruckter Wert</translation>
    </message>
    <message>
        <source>rounded on its way in the source</source>
        <translation>in der Quelle zwischendurch gerundet</translation>
    </message>
    <message>
        <source>magnitude only</source>
        <translation>nur der Betrag</translation>
    </message>
    <message>
        <source>no printed value</source>
        <translation>kein gedruckter Wert</translation>
    </message>
    <message>
        <source>This row has not as many fields as its heading.</source>
        <translation>Diese Zeile hat nicht so viele Felder wie ihre Kopfzeile.</translation>
    </message>
    <message>
        <source>This status is not known.</source>
        <translation>Dieser Status ist nicht bekannt.</translation>
    </message>
    <message>
        <source>The numbers of this row do not read.</source>
        <translation>Die Zahlen dieser Zeile sind nicht lesbar.</translation>
    </message>
    <message>
        <source>This is not the heading of checks.</source>
        <translation>Das ist nicht die Kopfzeile der Vergleichswerte.</translation>
    </message>
    <message>
        <source>This quantity does not follow from these inputs.</source>
        <translation>Diese Größe folgt nicht aus diesen Eingaben.</translation>
    </message>
    <message>
        <source>This input is no number.</source>
        <translation>Diese Eingabe ist keine Zahl.</translation>
    </message>
    <message>
        <source>This view is not known.</source>
        <translation>Diese Ansicht ist nicht bekannt.</translation>
    </message>
    <message>
        <source>This rule of signs is not known.</source>
        <translation>Diese Vorzeichenregel ist nicht bekannt.</translation>
    </message>
    <message>
        <source>This place in the section is not known.</source>
        <translation>Diese Stelle im Querschnitt ist nicht bekannt.</translation>
    </message>
    <message>
        <source>Checks know no such shape.</source>
        <translation>Die Vergleichswerte kennen keine solche Form.</translation>
    </message>
    <message>
        <source>These inputs make no state of stress.</source>
        <translation>Aus diesen Eingaben ergibt sich kein Spannungszustand.</translation>
    </message>
    <message>
        <source>These inputs make no state of strain.</source>
        <translation>Aus diesen Eingaben ergibt sich kein Verzerrungszustand.</translation>
    </message>
    <message>
        <source>“%1” is no quantity of a strain.</source>
        <translation>„%1“ ist keine Größe einer Dehnung.</translation>
    </message>
    <message>
        <source>These inputs make no check of a strength.</source>
        <translation>Aus diesen Eingaben ergibt sich kein Festigkeitsnachweis.</translation>
    </message>
    <message>
        <source>“%1” is no quantity of a strength.</source>
        <translation>„%1“ ist keine Größe einer Festigkeit.</translation>
    </message>
    <message>
        <source>lines</source>
        <translation>Linien</translation>
    </message>
    <message>
        <source>normals</source>
        <translation>Normalen</translation>
    </message>
    <message>
        <source>from %1 over 90° to %2</source>
        <translation>von %1 über 90° bis %2</translation>
    </message>
    <message>
        <source>from %1 to %2</source>
        <translation>von %1 bis %2</translation>
    </message>
    <message>
        <source>%1 and %2</source>
        <translation>%1 und %2</translation>
    </message>
    <message>
        <source>Utilisation stands still at the nominal direction.</source>
        <translation>In Nennrichtung ändert sich die Ausnutzung nicht.</translation>
    </message>
    <message>
        <source>Utilisation grows by %1 per degree counter-clockwise at the nominal direction.</source>
        <translation>In Nennrichtung wächst die Ausnutzung um %1 je Grad gegen den Uhrzeigersinn.</translation>
    </message>
    <message>
        <source>Utilisation grows by %1 per degree clockwise at the nominal direction.</source>
        <translation>In Nennrichtung wächst die Ausnutzung um %1 je Grad im Uhrzeigersinn.</translation>
    </message>
    <message>
        <source>Least utilisation %1 at %2 (for choosing a fibre direction, not for re-describing a member).</source>
        <translation>Kleinste Ausnutzung %1 bei %2 (zur Wahl einer Faserrichtung, nicht um ein vorhandenes Bauteil umzudeuten).</translation>
    </message>
    <message>
        <source>Least utilisation %1 at %2 (for choosing the direction of a joint, not for re-describing one that is there).</source>
        <translation>Kleinste Ausnutzung %1 bei %2 (zur Wahl der Richtung einer Verbindung, nicht um eine vorhandene umzudeuten).</translation>
    </message>
    <message>
        <source>edge at %1</source>
        <translation>Rand bei %1</translation>
    </message>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>not checked</source>
        <translation>nicht nachgewiesen</translation>
    </message>
    <message>
        <source>within</source>
        <translation>eingehalten</translation>
    </message>
    <message>
        <source>not judged</source>
        <translation>nicht beurteilt</translation>
    </message>
    <message>
        <source>exceeds</source>
        <translation>überschritten</translation>
    </message>
    <message>
        <source>within: no stress is given</source>
        <translation>eingehalten: keine Spannung gegeben</translation>
    </message>
    <message>
        <source>within, %1 of 1</source>
        <translation>eingehalten, %1 von 1</translation>
    </message>
    <message>
        <source>exceeds, %1</source>
        <translation>überschritten, %1</translation>
    </message>
    <message>
        <source>outside the criterion</source>
        <translation>außerhalb des Kriteriums</translation>
    </message>
    <message>
        <source>Stress at this point within the stated strengths.</source>
        <translation>Die Spannung an diesem Punkt hält die angegebenen Festigkeiten ein.</translation>
    </message>
    <message>
        <source>No stress is given at this point: none of its strengths is used.</source>
        <translation>An diesem Punkt ist keine Spannung gegeben: Keine seiner Festigkeiten wird ausgenutzt.</translation>
    </message>
    <message>
        <source>Stress at this point exceeds the stated strengths.</source>
        <translation>Die Spannung an diesem Punkt überschreitet die angegebenen Festigkeiten.</translation>
    </message>
    <message>
        <source>A combination could not be judged: nothing is said of the point.</source>
        <translation>Eine Kombination war nicht zu beurteilen: Über den Punkt wird nichts ausgesagt.</translation>
    </message>
    <message>
        <source>No check yet: nothing is judged against strengths.</source>
        <translation>Noch kein Nachweis: Nichts wird mit Festigkeiten verglichen.</translation>
    </message>
    <message>
        <source>%1, %2</source>
        <translation>%1, %2</translation>
    </message>
    <message>
        <source>%1 (%2)</source>
        <translation>%1 (%2)</translation>
    </message>
    <message>
        <source>no finite number</source>
        <translation>keine endliche Zahl</translation>
    </message>
    <message>
        <source>Not judged: %1, in %2. %3</source>
        <translation>Nicht beurteilt: %1, in %2. %3</translation>
    </message>
    <message>
        <source>%1 %2</source>
        <translation>%1 %2</translation>
    </message>
    <message>
        <source>No stress acts.</source>
        <translation>Es wirkt keine Spannung.</translation>
    </message>
    <message>
        <source>No multiple of all loads is within the limit.</source>
        <translation>Kein Vielfaches aller Lasten hält die Grenze ein.</translation>
    </message>
    <message>
        <source>No multiple of all loads reaches the limit.</source>
        <translation>Kein Vielfaches aller Lasten erreicht die Grenze.</translation>
    </message>
    <message>
        <source>All loads must be multiplied by %1.</source>
        <translation>Alle Lasten müssen mit %1 multipliziert werden.</translation>
    </message>
    <message>
        <source>All loads could be multiplied by %1.</source>
        <translation>Alle Lasten könnten mit %1 multipliziert werden.</translation>
    </message>
    <message>
        <source>%1 The direction at %2 comes to its limit first.</source>
        <translation>%1 Die Richtung bei %2 erreicht ihre Grenze zuerst.</translation>
    </message>
    <message>
        <source>Worst at %1, inside %2 ±&#xa0;%3; nominal %4.</source>
        <translation>Am ungünstigsten bei %1, innerhalb von %2 ±&#xa0;%3; in Nennrichtung %4.</translation>
    </message>
    <message>
        <source>f_{u} over β_{w} %1 and γ_{M2} %2.</source>
        <translation>f_{u} geteilt durch β_{w} %1 und γ_{M2} %2.</translation>
    </message>
    <message>
        <source>Strengths with factor 1.</source>
        <translation>Festigkeiten mit Beiwert 1.</translation>
    </message>
    <message>
        <source>Strengths times %1, as given.</source>
        <translation>Festigkeiten mal %1, wie angegeben.</translation>
    </message>
    <message>
        <source>Strengths over the partial factor %1: times %2.</source>
        <translation>Festigkeiten geteilt durch den Teilsicherheitsbeiwert %1: mal %2.</translation>
    </message>
    <message>
        <source>Strengths times %1 (%2) over %3: times %4.</source>
        <translation>Festigkeiten mal %1 (%2) geteilt durch %3: mal %4.</translation>
    </message>
    <message>
        <source>No angle holds.</source>
        <translation>Kein Winkel ist zulässig.</translation>
    </message>
    <message>
        <source>Every angle is within the limit.</source>
        <translation>Jeder Winkel ist zulässig.</translation>
    </message>
    <message>
        <source>Within the limit for %1 %2.</source>
        <translation>Zulässig sind %1 %2.</translation>
    </message>
    <message>
        <source>Tolerance could be ±&#xa0;%1.</source>
        <translation>Die Toleranz könnte ±&#xa0;%1 betragen.</translation>
    </message>
    <message>
        <source>By %1.</source>
        <translation>Nachweis: %1.</translation>
    </message>
</context>
<context>
    <name>Circle</name>
    <message>
        <source>τ_{nt} (%1), + down</source>
        <translation>τ_{nt} (%1), + nach unten</translation>
    </message>
    <message>
        <source>τ_{nt} (%1), + up</source>
        <translation>τ_{nt} (%1), + nach oben</translation>
    </message>
    <message>
        <source>tension</source>
        <translation>Zug</translation>
    </message>
    <message>
        <source>compression</source>
        <translation>Druck</translation>
    </message>
    <message>
        <source>σ_{n} (%1)</source>
        <translation>σ_{n} (%1)</translation>
    </message>
    <message>
        <source>0 is %1 to the left</source>
        <translation>0 liegt %1 weiter links</translation>
    </message>
    <message>
        <source>0 is %1 to the right</source>
        <translation>0 liegt %1 weiter rechts</translation>
    </message>
    <message>
        <source>zero stress: every direction is principal</source>
        <translation>Spannung null: Jede Richtung ist Hauptrichtung</translation>
    </message>
    <message>
        <source>equal stress on every plane: every direction is principal</source>
        <translation>gleiche Spannung auf jeder Ebene: Jede Richtung ist Hauptrichtung</translation>
    </message>
    <message>
        <source>all %1 combinations</source>
        <translation>alle %1 Kombinationen</translation>
    </message>
    <message>
        <source>2θ turns the other way</source>
        <translation>2θ dreht andersherum</translation>
    </message>
    <message>
        <source>%1, %2</source>
        <translation>%1, %2</translation>
    </message>
    <message>
        <source>on %1</source>
        <translation>Richtung: %1</translation>
    </message>
    <message>
        <source>σ_{n} on the reading plane: from %1 in %2 to %3 in %4</source>
        <translation>σ_{n} auf der Ableseebene: von %1 in %2 bis %3 in %4</translation>
    </message>
    <message>
        <source>τ_{nt} on the reading plane: from %1 in %2 to %3 in %4</source>
        <translation>τ_{nt} auf der Ableseebene: von %1 in %2 bis %3 in %4</translation>
    </message>
</context>
<context>
    <name>ColumnMeanings</name>
    <message>
        <source>%1 of %2</source>
        <translation>%1 von %2</translation>
    </message>
</context>
<context>
    <name>Combination</name>
    <message>
        <source>EN 1990 (6.10)</source>
        <translation>EN 1990 (6.10)</translation>
    </message>
    <message>
        <source>EN 1990 (6.10a) and (6.10b)</source>
        <translation>EN 1990 (6.10a) und (6.10b)</translation>
    </message>
    <message>
        <source>A factor of %1 is negative.</source>
        <translation>Der Beiwert %1 ist negativ.</translation>
    </message>
    <message>
        <source>Give 0 or more.</source>
        <translation>0 oder mehr angeben.</translation>
    </message>
    <message>
        <source>These cases make more than %1 combinations.</source>
        <translation>Diese Lastfälle ergeben mehr als %1 Kombinationen.</translation>
    </message>
    <message>
        <source>Let cases that never meet exclude each other, or type the combinations that matter.</source>
        <translation>Lastfälle, die nie zusammentreffen, einander ausschließen lassen oder die wesentlichen Kombinationen eintippen.</translation>
    </message>
    <message>
        <source>Recommended factors are those of EN 1990:2002, Tables A1.1 and A1.2(B), from memory; they are nationally determined: check them against the code in force.</source>
        <translation>Die empfohlenen Beiwerte sind die der EN 1990:2002, Tabellen A1.1 und A1.2(B), aus dem Gedächtnis; sie werden national festgelegt: mit der geltenden Norm abgleichen.</translation>
    </message>
    <message>
        <source>Accidental and seismic combinations are not built.</source>
        <translation>Außergewöhnliche Kombinationen und Erdbebenkombinationen werden nicht gebildet.</translation>
    </message>
    <message>
        <source>Neither permanent nor variable, so in none of them: %1.</source>
        <translation>Weder ständig noch veränderlich, daher in keiner von ihnen: %1.</translation>
    </message>
    <message>
        <source>“%1” names no case.</source>
        <translation>„%1“ nennt keinen Lastfall.</translation>
    </message>
    <message>
        <source>Write terms such as 1.35 G, joined by +.</source>
        <translation>Glieder wie 1.35 G schreiben, mit + verbunden.</translation>
    </message>
    <message>
        <source>The case %1 stands twice.</source>
        <translation>Der Lastfall %1 steht zweimal da.</translation>
    </message>
    <message>
        <source>Give it one factor, the sum of the two.</source>
        <translation>Einen einzigen Beiwert angeben, die Summe der beiden.</translation>
    </message>
    <message>
        <source>The name “%1” is taken.</source>
        <translation>Der Name „%1“ ist vergeben.</translation>
    </message>
    <message>
        <source>Give this combination a name of its own.</source>
        <translation>Dieser Kombination einen eigenen Namen geben.</translation>
    </message>
    <message>
        <source>There is no combination in this text.</source>
        <translation>In diesem Text steht keine Kombination.</translation>
    </message>
    <message>
        <source>Copy one a line, such as 1.35 G + 1.5 S.</source>
        <translation>Eine je Zeile kopieren, etwa 1.35 G + 1.5 S.</translation>
    </message>
    <message>
        <source>design</source>
        <translation>Bemessung</translation>
    </message>
    <message>
        <source>characteristic</source>
        <translation>charakteristisch</translation>
    </message>
    <message>
        <source>allowable</source>
        <translation>zulässig</translation>
    </message>
</context>
<context>
    <name>Command</name>
    <message>
        <source>The table has a header and no row.</source>
        <translation>Die Tabelle hat eine Kopfzeile, aber keine Zeile darunter.</translation>
    </message>
    <message>
        <source>Give it a row for each point.</source>
        <translation>Für jeden Punkt eine Zeile angeben.</translation>
    </message>
    <message>
        <source>There is no option %1 here.</source>
        <translation>Die Option %1 gibt es hier nicht.</translation>
    </message>
    <message>
        <source>The options are: %1 --help.</source>
        <translation>Die Optionen sind: %1 --help.</translation>
    </message>
    <message>
        <source>The option %1 needs a value.</source>
        <translation>Die Option %1 braucht einen Wert.</translation>
    </message>
    <message>
        <source>Write it behind the option; a value cannot begin with “--”.</source>
        <translation>Den Wert hinter die Option schreiben; er darf nicht mit „--“ beginnen.</translation>
    </message>
    <message>
        <source>The option %1 is given twice.</source>
        <translation>Die Option %1 ist zweimal angegeben.</translation>
    </message>
    <message>
        <source>Give it once.</source>
        <translation>Die Option nur einmal angeben.</translation>
    </message>
    <message>
        <source>The option %1 takes no value.</source>
        <translation>Die Option %1 nimmt keinen Wert.</translation>
    </message>
    <message>
        <source>The word “%1” is one too many.</source>
        <translation>Das Wort „%1“ ist zu viel.</translation>
    </message>
    <message>
        <source>Put a value with blanks in quotes.</source>
        <translation>Einen Wert mit Leerzeichen in Anführungszeichen setzen.</translation>
    </message>
    <message>
        <source>Two studies are compared.</source>
        <translation>Es werden zwei Studien verglichen.</translation>
    </message>
    <message>
        <source>Write planewright compare EARLIER LATER.</source>
        <translation>planewright compare EARLIER LATER schreiben.</translation>
    </message>
    <message>
        <source>“%1” is the study itself.</source>
        <translation>„%1“ ist die Studie selbst.</translation>
    </message>
    <message>
        <source>Give the output another name.</source>
        <translation>Der Ausgabe einen anderen Namen geben.</translation>
    </message>
    <message>
        <source>The ending of “%1” names no kind of picture.</source>
        <translation>Die Endung von „%1“ nennt keine Bildart.</translation>
    </message>
    <message>
        <source>End the name with .svg, .pdf or .png.</source>
        <translation>Den Namen mit .svg, .pdf oder .png enden lassen.</translation>
    </message>
    <message>
        <source>“%1” names no kind of picture.</source>
        <translation>„%1“ nennt keine Bildart.</translation>
    </message>
    <message>
        <source>Take svg, pdf or png.</source>
        <translation>svg, pdf oder png nehmen.</translation>
    </message>
    <message>
        <source>One figure goes to a file, those of several points to a folder.</source>
        <translation>Eine einzelne Abbildung geht in eine Datei, die mehrerer Punkte in einen Ordner.</translation>
    </message>
    <message>
        <source>Leave out -o or --folder.</source>
        <translation>-o oder --folder weglassen.</translation>
    </message>
    <message>
        <source>No file is given for the figure.</source>
        <translation>Für die Abbildung ist keine Datei angegeben.</translation>
    </message>
    <message>
        <source>Write -o FILE.svg, -o FILE.pdf or -o FILE.png, or --folder FOLDER.</source>
        <translation>-o FILE.svg, -o FILE.pdf oder -o FILE.png schreiben, oder --folder FOLDER.</translation>
    </message>
    <message>
        <source>The option %1 belongs to --folder.</source>
        <translation>Die Option %1 gehört zu --folder.</translation>
    </message>
    <message>
        <source>Leave it out: the ending of the file says the kind, and the file is replaced.</source>
        <translation>Die Option weglassen: Die Dateiendung bestimmt die Art, und die Datei wird ersetzt.</translation>
    </message>
    <message>
        <source>One file holds the figure of one point.</source>
        <translation>Eine Datei enthält die Abbildung eines einzigen Punkts.</translation>
    </message>
    <message>
        <source>Write --folder FOLDER for several.</source>
        <translation>Für mehrere --folder FOLDER schreiben.</translation>
    </message>
    <message>
        <source>Only a PNG has a resolution; SVG and PDF are drawn with lines.</source>
        <translation>Nur PNG hat eine Auflösung; SVG und PDF werden mit Linien gezeichnet.</translation>
    </message>
    <message>
        <source>Leave out --dpi, or ask for a PNG.</source>
        <translation>--dpi weglassen oder PNG verlangen.</translation>
    </message>
    <message>
        <source>“%1” is not a whole number.</source>
        <translation>„%1“ ist keine ganze Zahl.</translation>
    </message>
    <message>
        <source>Write the resolution as a whole number, for instance 300.</source>
        <translation>Die Auflösung als ganze Zahl schreiben, zum Beispiel 300.</translation>
    </message>
    <message>
        <source>No study is given.</source>
        <translation>Es ist keine Studie angegeben.</translation>
    </message>
    <message>
        <source>Write planewright figure STUDY -o FILE.svg.</source>
        <translation>planewright figure STUDY -o FILE.svg schreiben.</translation>
    </message>
    <message>
        <source>“%1” has %2 of the %3 files already, “%4” among them.</source>
        <translation>„%1“ enthält %2 der %3 Dateien schon, darunter „%4“.</translation>
    </message>
    <message>
        <source>Take another folder, or --replace.</source>
        <translation>Einen anderen Ordner nehmen, oder --replace.</translation>
    </message>
    <message>
        <source>The folder “%1” cannot be made: %2.</source>
        <translation>Der Ordner „%1“ kann nicht angelegt werden: %2.</translation>
    </message>
    <message>
        <source>Take another folder.</source>
        <translation>Einen anderen Ordner nehmen.</translation>
    </message>
    <message>
        <source>Write planewright COMMAND --help for one command.</source>
        <translation>Zu einem einzelnen Befehl planewright COMMAND --help schreiben.</translation>
    </message>
    <message>
        <source>“%1” is neither a command nor a file.</source>
        <translation>„%1“ ist weder ein Befehl noch eine Datei.</translation>
    </message>
    <message>
        <source>The study has no “%1”.</source>
        <translation>Die Studie hat kein „%1“.</translation>
    </message>
    <message>
        <source>It has: %1.</source>
        <translation>Vorhanden: %1.</translation>
    </message>
    <message>
        <source>“%1” is none of the words of %2.</source>
        <translation>„%1“ ist keines der Wörter von %2.</translation>
    </message>
    <message>
        <source>Take one of these: %1.</source>
        <translation>Eines von diesen nehmen: %1.</translation>
    </message>
    <message>
        <source>The program&apos;s own font does not load, so no figure can be made.</source>
        <translation>Die Schrift des Programms lässt sich nicht laden, daher kann keine Abbildung erstellt werden.</translation>
    </message>
    <message>
        <source>Install Planewright again, or make the figure as SVG.</source>
        <translation>Planewright neu installieren oder die Abbildung als SVG erstellen.</translation>
    </message>
    <message>
        <source>The figure cannot be painted here: %1</source>
        <translation>Die Abbildung kann hier nicht gezeichnet werden: %1</translation>
    </message>
    <message>
        <source>“%1” is not a format of resolve.</source>
        <translation>„%1“ ist kein Format von resolve.</translation>
    </message>
    <message>
        <source>Take text, json or csv.</source>
        <translation>text, json oder csv nehmen.</translation>
    </message>
    <message>
        <source>Interrupted: nothing was written.</source>
        <translation>Abgebrochen: Nichts wurde geschrieben.</translation>
    </message>
    <message>
        <source>Judging</source>
        <translation>Beurteilen</translation>
    </message>
    <message>
        <source>No point of the table is left to be judged.</source>
        <translation>In der Tabelle bleibt kein Punkt zu beurteilen.</translation>
    </message>
    <message>
        <source>Give each point all cases that act in a combination.</source>
        <translation>Zu jedem Punkt alle Lastfälle angeben, die in einer Kombination wirken.</translation>
    </message>
    <message>
        <source>Reading</source>
        <translation>Lesen</translation>
    </message>
    <message>
        <source>Rows with a fault: %1 of %2; points that lack something: %3 of %4.</source>
        <translation>Fehlerhafte Zeilen: %1 von %2; unvollständige Punkte: %3 von %4.</translation>
    </message>
    <message>
        <source>Mend them, or go on without them by --leave-out. Nothing was written.</source>
        <translation>Diese berichtigen oder mit --leave-out ohne sie fortfahren. Nichts wurde geschrieben.</translation>
    </message>
    <message>
        <source>The table has no point and no region “%1”.</source>
        <translation>Die Tabelle hat keinen Punkt und keinen Bereich „%1“.</translation>
    </message>
    <message>
        <source>Write the name as it stands there, or its beginning with a star: “corner*”.</source>
        <translation>Den Namen schreiben, wie er dort steht, oder seinen Anfang mit einem Stern: „corner*“.</translation>
    </message>
    <message>
        <source>The list has more than 64 MB.</source>
        <translation>Die Liste hat mehr als 64 MB.</translation>
    </message>
    <message>
        <source>Leave out whole regions by --except.</source>
        <translation>Ganze Bereiche mit --except weglassen.</translation>
    </message>
    <message>
        <source>The table has no point for %1 of the names in the list, such as “%2”.</source>
        <translation>Zu %1 der Namen in der Liste hat die Tabelle keinen Punkt, etwa zu „%2“.</translation>
    </message>
    <message>
        <source>Write one name of a point a line, as it stands in the table.</source>
        <translation>Je Zeile einen Punktnamen schreiben, wie er in der Tabelle steht.</translation>
    </message>
    <message>
        <source>Writing</source>
        <translation>Schreiben</translation>
    </message>
    <message>
        <source>Left out: %1 of %2 rows, for a fault; %3 of %4 points, which lack something.</source>
        <translation>Weggelassen: %1 von %2 Zeilen als fehlerhaft; %3 von %4 Punkten als unvollständig.</translation>
    </message>
    <message>
        <source>Points left out on request: %1.</source>
        <translation>Auf Wunsch weggelassene Punkte: %1.</translation>
    </message>
    <message>
        <source>Write planewright screen POINTS.csv --study STUDY -o OUT.csv.</source>
        <translation>planewright screen POINTS.csv --study STUDY -o OUT.csv schreiben.</translation>
    </message>
    <message>
        <source>“%1” does not say which column is which.</source>
        <translation>„%1“ sagt nicht, welche Spalte welche ist.</translation>
    </message>
    <message>
        <source>Write NAME=HEADING, for instance --column &quot;sx [psi]=SXX&quot;.</source>
        <translation>NAME=HEADING schreiben, zum Beispiel --column &quot;sx [psi]=SXX&quot;.</translation>
    </message>
    <message>
        <source>“%1” is no count of points.</source>
        <translation>„%1“ ist keine Anzahl von Punkten.</translation>
    </message>
    <message>
        <source>Write a whole number from 1 on.</source>
        <translation>Eine ganze Zahl ab 1 schreiben.</translation>
    </message>
    <message>
        <source>Standard input is either the table or the study.</source>
        <translation>Die Standardeingabe ist entweder die Tabelle oder die Studie.</translation>
    </message>
    <message>
        <source>Give one of them as a file.</source>
        <translation>Eine von beiden als Datei angeben.</translation>
    </message>
    <message>
        <source>“%1” is read, and cannot be written.</source>
        <translation>„%1“ wird gelesen und kann nicht geschrieben werden.</translation>
    </message>
    <message>
        <source>No table of points is given.</source>
        <translation>Es ist keine Tabelle mit Punkten angegeben.</translation>
    </message>
    <message>
        <source>No study is given that has the checks.</source>
        <translation>Es ist keine Studie mit den Nachweisen angegeben.</translation>
    </message>
    <message>
        <source>No file is given for the results.</source>
        <translation>Für die Ergebnisse ist keine Datei angegeben.</translation>
    </message>
    <message>
        <source>The ending of “%1” names no kind of sheet.</source>
        <translation>Die Endung von „%1“ nennt keine Art von Rechenblatt.</translation>
    </message>
    <message>
        <source>End the name with .pdf, .html or .txt.</source>
        <translation>Den Namen mit .pdf, .html oder .txt enden lassen.</translation>
    </message>
    <message>
        <source>Write planewright sheet STUDY -o FILE.pdf.</source>
        <translation>planewright sheet STUDY -o FILE.pdf schreiben.</translation>
    </message>
    <message>
        <source>No file is given for the sheet.</source>
        <translation>Für das Rechenblatt ist keine Datei angegeben.</translation>
    </message>
    <message>
        <source>Write -o FILE.pdf or -o FILE.html.</source>
        <translation>-o FILE.pdf oder -o FILE.html schreiben.</translation>
    </message>
    <message>
        <source>Only a PDF has a paper.</source>
        <translation>Nur PDF hat ein Papierformat.</translation>
    </message>
    <message>
        <source>Leave out --paper, or end the name with .pdf.</source>
        <translation>--paper weglassen oder den Namen mit .pdf enden lassen.</translation>
    </message>
    <message>
        <source>A tolerance belongs to the --line before it, and to one only.</source>
        <translation>Eine Toleranz gehört zum --line davor, und nur zu einem.</translation>
    </message>
    <message>
        <source>Write --line ANGLE --tolerance ANGLE.</source>
        <translation>--line ANGLE --tolerance ANGLE schreiben.</translation>
    </message>
    <message>
        <source>Neither a study nor all three components are given.</source>
        <translation>Weder eine Studie noch alle drei Komponenten sind angegeben.</translation>
    </message>
    <message>
        <source>Name a study file, or give --sx, --sy and --txy.</source>
        <translation>Eine Studiendatei nennen oder --sx, --sy und --txy angeben.</translation>
    </message>
    <message>
        <source>A study brings its own stresses and convention.</source>
        <translation>Eine Studie bringt ihre eigenen Spannungen und Vereinbarungen mit.</translation>
    </message>
    <message>
        <source>Leave out the study, or %1.</source>
        <translation>Die Studie oder %1 weglassen.</translation>
    </message>
    <message>
        <source>Point %1, check %2: exceeds, %3 (%4).</source>
        <translation>Punkt %1, Nachweis %2: überschritten, %3 (%4).</translation>
    </message>
    <message>
        <source>Point %1, check %2: not judged in %3. %4 %5</source>
        <translation>Punkt %1, Nachweis %2: nicht beurteilt in %3. %4 %5</translation>
    </message>
    <message>
        <source>The window opens one study.</source>
        <translation>Das Fenster öffnet eine einzige Studie.</translation>
    </message>
    <message>
        <source>There is no display for the window.</source>
        <translation>Für das Fenster ist keine Anzeige vorhanden.</translation>
    </message>
    <message>
        <source>The commands resolve and figure need none; planewright --help explains them.</source>
        <translation>Die Befehle resolve und figure brauchen keine; planewright --help erklärt sie.</translation>
    </message>
    <message>
        <source>“%1” is no language of the program.</source>
        <translation>„%1“ ist keine Sprache des Programms.</translation>
    </message>
    <message>
        <source>The commands are resolve, figure, sheet, screen, compare, validate and manual; planewright --help explains them.</source>
        <translation>Die Befehle sind resolve, figure, sheet, screen, compare, validate und manual; planewright --help erklärt sie.</translation>
    </message>
    <message>
        <source>No folder is given for the handbook.</source>
        <translation>Es ist kein Ordner für das Handbuch angegeben.</translation>
    </message>
    <message>
        <source>Write planewright manual -o FOLDER.</source>
        <translation>planewright manual -o FOLDER schreiben.</translation>
    </message>
    <message>
        <source>The handbook is not there in “%1”.</source>
        <translation>Das Handbuch gibt es nicht in „%1“.</translation>
    </message>
    <message>
        <source>It is there in: %1.</source>
        <translation>Es gibt es in: %1.</translation>
    </message>
</context>
<context>
    <name>Comparison</name>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>%1, %2: %3</source>
        <translation>%1, %2: %3</translation>
    </message>
    <message>
        <source>there</source>
        <translation>vorhanden</translation>
    </message>
    <message>
        <source>%1 %2</source>
        <translation>%1 %2</translation>
    </message>
    <message>
        <source>verdict of the study</source>
        <translation>Ergebnis der Studie</translation>
    </message>
    <message>
        <source>%1: greatest %2</source>
        <translation>%1: größte %2</translation>
    </message>
    <message>
        <source>%1 (%2)</source>
        <translation>%1 (%2)</translation>
    </message>
    <message>
        <source>shear in the plane</source>
        <translation>Schubspannung in der Ebene</translation>
    </message>
    <message>
        <source>%1: check %2</source>
        <translation>%1: Nachweis %2</translation>
    </message>
    <message>
        <source>Nothing differs.</source>
        <translation>Keine Unterschiede.</translation>
    </message>
    <message>
        <source>nothing</source>
        <translation>nichts</translation>
    </message>
    <message>
        <source>%1: %2, was %3</source>
        <translation>%1: %2, vorher %3</translation>
    </message>
    <message>
        <source>none</source>
        <translation>keine</translation>
    </message>
    <message>
        <source>Inputs that differ</source>
        <translation>Abweichende Eingaben</translation>
    </message>
    <message>
        <source>Results that differ</source>
        <translation>Abweichende Ergebnisse</translation>
    </message>
</context>
<context>
    <name>Convention</name>
    <message>
        <source>tension positive</source>
        <translation>Zug positiv</translation>
    </message>
    <message>
        <source>compression positive</source>
        <translation>Druck positiv</translation>
    </message>
    <message>
        <source>τ_{nt} drawn + down</source>
        <translation>τ_{nt} + nach unten aufgetragen</translation>
    </message>
    <message>
        <source>τ_{nt} drawn + up</source>
        <translation>τ_{nt} + nach oben aufgetragen</translation>
    </message>
    <message>
        <source>3 significant digits</source>
        <translation>3 gültige Stellen</translation>
    </message>
    <message>
        <source>4 significant digits</source>
        <translation>4 gültige Stellen</translation>
    </message>
    <message>
        <source>5 significant digits</source>
        <translation>5 gültige Stellen</translation>
    </message>
    <message>
        <source>6 significant digits</source>
        <translation>6 gültige Stellen</translation>
    </message>
</context>
<context>
    <name>Criterion</name>
    <message>
        <source>maximum stress</source>
        <translation>Maximalspannung</translation>
    </message>
    <message>
        <source>Hankinson</source>
        <translation>Hankinson</translation>
    </message>
    <message>
        <source>sum of squares</source>
        <translation>Quadratsumme</translation>
    </message>
    <message>
        <source>Norris, one plane</source>
        <translation>Norris, eine Ebene</translation>
    </message>
    <message>
        <source>Norris, three planes</source>
        <translation>Norris, drei Ebenen</translation>
    </message>
    <message>
        <source>Azzi and Tsai</source>
        <translation>Azzi und Tsai</translation>
    </message>
    <message>
        <source>Azzi and Tsai, two signs</source>
        <translation>Azzi und Tsai, zwei Vorzeichen</translation>
    </message>
    <message>
        <source>Hoffman</source>
        <translation>Hoffman</translation>
    </message>
    <message>
        <source>Tsai and Wu</source>
        <translation>Tsai und Wu</translation>
    </message>
    <message>
        <source>linear sum</source>
        <translation>lineare Summe</translation>
    </message>
    <message>
        <source>EN 1995 compression at an angle</source>
        <translation>EN 1995 Druck unter einem Winkel</translation>
    </message>
    <message>
        <source>EN 1995 tapered edge</source>
        <translation>EN 1995 angeschnittener Rand</translation>
    </message>
    <message>
        <source>von Mises</source>
        <translation>von Mises</translation>
    </message>
    <message>
        <source>Tresca</source>
        <translation>Tresca</translation>
    </message>
    <message>
        <source>Rankine</source>
        <translation>Rankine</translation>
    </message>
    <message>
        <source>Mohr-Coulomb</source>
        <translation>Mohr-Coulomb</translation>
    </message>
    <message>
        <source>Coulomb on the plane</source>
        <translation>Coulomb auf der Ebene</translation>
    </message>
    <message>
        <source>throat of a fillet weld</source>
        <translation>Nahtfläche einer Kehlnaht</translation>
    </message>
    <message>
        <source>bond in tension and shear</source>
        <translation>Klebfuge auf Zug und Schub</translation>
    </message>
    <message>
        <source>Jenkin 1920 (author from memory)</source>
        <translation>Jenkin 1920 (Autor aus dem Gedächtnis)</translation>
    </message>
    <message>
        <source>uniaxial stress at an angle α to the line</source>
        <translation>einachsige Spannung unter einem Winkel α zur Linie</translation>
    </message>
    <message>
        <source>Hankinson 1921; exponent n: USDA Wood Handbook, equation 5-2</source>
        <translation>Hankinson 1921; Exponent n: USDA Wood Handbook, Gleichung 5-2</translation>
    </message>
    <message>
        <source>ANC-18, section 2:55; USDA Wood Handbook, page 9-15</source>
        <translation>ANC-18, Abschnitt 2:55; USDA Wood Handbook, Seite 9-15</translation>
    </message>
    <message>
        <source>Norris 1950, FPL report 1816 (equation from memory)</source>
        <translation>Norris 1950, FPL-Bericht 1816 (Gleichung aus dem Gedächtnis)</translation>
    </message>
    <message>
        <source>Azzi and Tsai 1965</source>
        <translation>Azzi und Tsai 1965</translation>
    </message>
    <message>
        <source>form of Azzi and Tsai 1965 given by Kaw</source>
        <translation>Form von Azzi und Tsai 1965 nach Kaw</translation>
    </message>
    <message>
        <source>Hoffman 1967</source>
        <translation>Hoffman 1967</translation>
    </message>
    <message>
        <source>Tsai and Wu 1971</source>
        <translation>Tsai und Wu 1971</translation>
    </message>
    <message>
        <source>published for uniaxial tension and bending at an angle; for other states an extension of this program</source>
        <translation>veröffentlicht für einachsigen Zug und Biegung unter einem Winkel; für andere Zustände eine Erweiterung dieses Programms</translation>
    </message>
    <message>
        <source>LVL Handbook Europe 2025, equations 4.15 and 4.16</source>
        <translation>LVL Handbook Europe 2025, Gleichungen 4.15 und 4.16</translation>
    </message>
    <message>
        <source>uniaxial compression at an angle α to the grain</source>
        <translation>einachsiger Druck unter einem Winkel α zur Faser</translation>
    </message>
    <message>
        <source>EN 1995-1-1, 6.2.2, equation (6.16)</source>
        <translation>EN 1995-1-1, 6.2.2, Gleichung (6.16)</translation>
    </message>
    <message>
        <source>uniaxial stress along a tapered edge at an angle α to the grain</source>
        <translation>einachsige Spannung längs eines angeschnittenen Rands unter einem Winkel α zur Faser</translation>
    </message>
    <message>
        <source>EN 1995-1-1, 6.4.2, equations (6.38) to (6.40), numbers from memory</source>
        <translation>EN 1995-1-1, 6.4.2, Gleichungen (6.38) bis (6.40), Nummern aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>common practice, no source</source>
        <translation>übliche Praxis, ohne Quelle</translation>
    </message>
    <message>
        <source>EN 1993-1-8, 4.5.3.2</source>
        <translation>EN 1993-1-8, 4.5.3.2</translation>
    </message>
    <message>
        <source>own form, common practice, no source</source>
        <translation>eigene Form, übliche Praxis, ohne Quelle</translation>
    </message>
</context>
<context>
    <name>Decimal sign</name>
    <message>
        <source>point: 0.5</source>
        <translation>Punkt: 0.5</translation>
    </message>
    <message>
        <source>comma: 0,5</source>
        <translation>Komma: 0,5</translation>
    </message>
</context>
<context>
    <name>Dimension</name>
    <message>
        <source>a plain number</source>
        <translation>eine reine Zahl</translation>
    </message>
    <message>
        <source>a force</source>
        <translation>eine Kraft</translation>
    </message>
    <message>
        <source>a length</source>
        <translation>eine Länge</translation>
    </message>
    <message>
        <source>an angle</source>
        <translation>ein Winkel</translation>
    </message>
    <message>
        <source>a stress</source>
        <translation>eine Spannung</translation>
    </message>
    <message>
        <source>a moment</source>
        <translation>ein Moment</translation>
    </message>
    <message>
        <source>an area</source>
        <translation>eine Fläche</translation>
    </message>
    <message>
        <source>a volume</source>
        <translation>ein Volumen</translation>
    </message>
    <message>
        <source>a force per length</source>
        <translation>eine Kraft je Länge</translation>
    </message>
    <message>
        <source>%1^%2</source>
        <translation>%1^%2</translation>
    </message>
    <message>
        <source>%1 * %2</source>
        <translation>%1 * %2</translation>
    </message>
    <message>
        <source>force</source>
        <translation>Kraft</translation>
    </message>
    <message>
        <source>length</source>
        <translation>Länge</translation>
    </message>
    <message>
        <source>angle</source>
        <translation>Winkel</translation>
    </message>
</context>
<context>
    <name>Direction</name>
    <message>
        <source>greatest shear +</source>
        <translation>größter Schub +</translation>
    </message>
    <message>
        <source>greatest shear −</source>
        <translation>größter Schub −</translation>
    </message>
    <message>
        <source>crossing the %1</source>
        <translation>Schnitt quer zu %1</translation>
    </message>
    <message>
        <source>following the %1</source>
        <translation>Schnitt entlang %1</translation>
    </message>
</context>
<context>
    <name>Echo</name>
    <message>
        <source>%1 from +x</source>
        <translation>%1 ab +x</translation>
    </message>
    <message>
        <source>%1 from +x, %2</source>
        <translation>%1 ab +x, %2</translation>
    </message>
</context>
<context>
    <name>Element</name>
    <message>
        <source>%1 and %2</source>
        <translation>%1 und %2</translation>
    </message>
    <message>
        <source>%1  ·  on %2</source>
        <translation>%1  ·  Richtung: %2</translation>
    </message>
    <message>
        <source>Element</source>
        <translation>Spannungselement</translation>
    </message>
    <message>
        <source>snap on</source>
        <translation>Einrasten an</translation>
    </message>
    <message>
        <source>snap off</source>
        <translation>Einrasten aus</translation>
    </message>
    <message>
        <source>%1 at %2</source>
        <translation>%1 bei %2</translation>
    </message>
    <message>
        <source>normal at %1  ·  cut at %2</source>
        <translation>Normale bei %1  ·  Schnitt bei %2</translation>
    </message>
    <message>
        <source>stresses in %1</source>
        <translation>Spannungen in %1</translation>
    </message>
    <message>
        <source>Type the stresses from the hand calc; 18.6 kN/(90 mm*240 mm) is fine</source>
        <translation>Spannungen aus der Handrechnung eintippen; auch als 18.6 kN/(90 mm*240 mm)</translation>
    </message>
</context>
<context>
    <name>Entry</name>
    <message>
        <source>This can be taken now.</source>
        <translation>Das kann jetzt übernommen werden.</translation>
    </message>
    <message>
        <source>Press Enter.</source>
        <translation>Eingabetaste drücken.</translation>
    </message>
</context>
<context>
    <name>Export</name>
    <message>
        <source>A resolution of %1 dpi is out of range.</source>
        <translation>Eine Auflösung von %1 dpi liegt außerhalb des Bereichs.</translation>
    </message>
    <message>
        <source>Take a whole number from %1 to %2.</source>
        <translation>Eine ganze Zahl von %1 bis %2 nehmen.</translation>
    </message>
    <message>
        <source>At %1 dpi the picture has too many pixels.</source>
        <translation>Bei %1 dpi hat das Bild zu viele Pixel.</translation>
    </message>
    <message>
        <source>Take a smaller resolution or a narrower figure.</source>
        <translation>Eine geringere Auflösung oder eine schmalere Abbildung nehmen.</translation>
    </message>
    <message>
        <source>The figure could not be painted.</source>
        <translation>Die Abbildung konnte nicht gezeichnet werden.</translation>
    </message>
    <message>
        <source>The printer did not start.</source>
        <translation>Der Drucker ist nicht gestartet.</translation>
    </message>
    <message>
        <source>Choose another printer.</source>
        <translation>Einen anderen Drucker wählen.</translation>
    </message>
</context>
<context>
    <name>Expression</name>
    <message>
        <source>Write for example 12 kN/(90 mm*240 mm).</source>
        <translation>Zum Beispiel 12 kN/(90 mm*240 mm) schreiben.</translation>
    </message>
    <message>
        <source>It has no unit of its own; to give it one write %1.</source>
        <translation>Eine eigene Einheit fehlt; um sie anzugeben, %1 schreiben.</translation>
    </message>
    <message>
        <source>A unit belongs to the number right before it; for a quotient write (1/2) %1.</source>
        <translation>Eine Einheit gehört zur Zahl direkt davor; für einen Quotienten (1/2) %1 schreiben.</translation>
    </message>
    <message>
        <source>Type for example 4.8 deg or 1 in 12.</source>
        <translation>Zum Beispiel 4.8 deg oder 1 in 12 eingeben.</translation>
    </message>
    <message>
        <source>Type for example %1.</source>
        <translation>Zum Beispiel %1 eingeben.</translation>
    </message>
    <message>
        <source>Nothing is typed; %1 is needed.</source>
        <translation>Es ist nichts eingegeben; benötigt wird %1.</translation>
    </message>
    <message>
        <source>No unit is typed.</source>
        <translation>Es ist keine Einheit eingegeben.</translation>
    </message>
    <message>
        <source>Type for example MPa, kN, mm or kN*m.</source>
        <translation>Zum Beispiel MPa, kN, mm oder kN*m eingeben.</translation>
    </message>
    <message>
        <source>There is no unit “%1”.</source>
        <translation>Die Einheit „%1“ gibt es nicht.</translation>
    </message>
    <message>
        <source>Write %1.</source>
        <translation>%1 schreiben.</translation>
    </message>
    <message>
        <source>Type for example MPa, psi, kN, mm or deg.</source>
        <translation>Zum Beispiel MPa, psi, kN, mm oder deg eingeben.</translation>
    </message>
    <message>
        <source>Did you mean %1?</source>
        <translation>War %1 gemeint?</translation>
    </message>
    <message>
        <source>“%1” does not belong to a unit.</source>
        <translation>„%1“ gehört nicht zu einer Einheit.</translation>
    </message>
    <message>
        <source>Write units as in MPa, kN*m or N/mm^2.</source>
        <translation>Einheiten wie in MPa, kN*m oder N/mm^2 schreiben.</translation>
    </message>
    <message>
        <source>“%1” does not raise a unit.</source>
        <translation>„%1“ kann keine Einheit potenzieren.</translation>
    </message>
    <message>
        <source>After a unit write one whole exponent up to 99, as in mm^2, or put the quantity into parentheses.</source>
        <translation>Hinter eine Einheit einen einzigen ganzen Exponenten bis 99 schreiben, wie in mm^2, oder die Größe in Klammern setzen.</translation>
    </message>
    <message>
        <source>The unit “%1” has no number before it.</source>
        <translation>Vor der Einheit „%1“ steht keine Zahl.</translation>
    </message>
    <message>
        <source>Write 1 %1.</source>
        <translation>1 %1 schreiben.</translation>
    </message>
    <message>
        <source>The unit “%1” follows another unit.</source>
        <translation>Die Einheit „%1“ folgt auf eine andere Einheit.</translation>
    </message>
    <message>
        <source>Write %1 or %2.</source>
        <translation>%1 oder %2 schreiben.</translation>
    </message>
    <message>
        <source>“%1” already has a unit (%2); “%3” cannot follow it.</source>
        <translation>„%1“ hat schon eine Einheit (%2); „%3“ kann nicht darauf folgen.</translation>
    </message>
    <message>
        <source>Take one of the units away, or write * 1 %1.</source>
        <translation>Eine der Einheiten wegnehmen oder * 1 %1 schreiben.</translation>
    </message>
    <message>
        <source>A number follows the unit in “%1”.</source>
        <translation>In „%1“ folgt eine Zahl auf die Einheit.</translation>
    </message>
    <message>
        <source>Write %1: a unit is raised with ^.</source>
        <translation>%1 schreiben: Eine Einheit wird mit ^ potenziert.</translation>
    </message>
    <message>
        <source>Put an operator between.</source>
        <translation>Einen Operator dazwischensetzen.</translation>
    </message>
    <message>
        <source>In “%1” the unit stands on the exponent.</source>
        <translation>In „%1“ steht die Einheit am Exponenten.</translation>
    </message>
    <message>
        <source>“%1” makes a slope here, and a slope stands alone.</source>
        <translation>„%1“ ergibt hier eine Neigung, und eine Neigung steht allein.</translation>
    </message>
    <message>
        <source>Write a slope as 1 in 12 or 1:12, an angle as 4.8 deg.</source>
        <translation>Eine Neigung als 1 in 12 oder 1:12 schreiben, einen Winkel als 4.8 deg.</translation>
    </message>
    <message>
        <source>“%1” is a slope.</source>
        <translation>„%1“ ist eine Neigung.</translation>
    </message>
    <message>
        <source>Write an angle, as in 30 deg: the normal of a plane takes no slope, only the field of a line does.</source>
        <translation>Einen Winkel schreiben, etwa 30 deg: Die Normale einer Ebene nimmt keine Neigung, nur das Feld einer Linie.</translation>
    </message>
    <message>
        <source>The run of the slope is zero.</source>
        <translation>Die zweite Zahl der Neigung ist null.</translation>
    </message>
    <message>
        <source>Write 90 deg for a line along y.</source>
        <translation>Für eine Linie längs y 90 deg schreiben.</translation>
    </message>
    <message>
        <source>The sign of a slope stands in front, not before “%1”.</source>
        <translation>Das Vorzeichen einer Neigung steht ganz vorn, nicht vor „%1“.</translation>
    </message>
    <message>
        <source>“%1” is negative; a tolerance is not.</source>
        <translation>„%1“ ist negativ; eine Toleranz ist es nie.</translation>
    </message>
    <message>
        <source>It counts to both sides: leave the sign out.</source>
        <translation>Die Toleranz gilt zu beiden Seiten: das Vorzeichen weglassen.</translation>
    </message>
    <message>
        <source>“%1” is the unit of %2; the unit of %3 is needed.</source>
        <translation>Einheit „%1“: Das ist %2; benötigt wird %3.</translation>
    </message>
    <message>
        <source>Type the unit as in %1.</source>
        <translation>Die Einheit wie in %1 eingeben.</translation>
    </message>
    <message>
        <source>This is %1 (%2); %3 is needed: divide by an area.</source>
        <translation>Das ist %1 (%2); benötigt wird %3: durch eine Fläche teilen.</translation>
    </message>
    <message>
        <source>This is %1 (%2); %3 is needed.</source>
        <translation>Das ist %1 (%2); benötigt wird %3.</translation>
    </message>
    <message>
        <source>“%1” gives no finite number.</source>
        <translation>„%1“ ergibt keine endliche Zahl.</translation>
    </message>
    <message>
        <source>Results go up to 1.7e308 in N, mm and deg.</source>
        <translation>Ergebnisse reichen bis 1.7e308 in N, mm und deg.</translation>
    </message>
    <message>
        <source>“%1” is out of the range of numbers.</source>
        <translation>„%1“ liegt außerhalb des Zahlenbereichs.</translation>
    </message>
    <message>
        <source>Numbers go from 1e-307 to 1.7e308; write 0 for less.</source>
        <translation>Zahlen reichen von 1e-307 bis 1.7e308; für weniger 0 schreiben.</translation>
    </message>
    <message>
        <source>“%1” raises units too far.</source>
        <translation>„%1“ potenziert Einheiten zu hoch.</translation>
    </message>
    <message>
        <source>No exponent of a unit may exceed 100.</source>
        <translation>Kein Exponent einer Einheit darf 100 überschreiten.</translation>
    </message>
    <message>
        <source>“%1” is zero and something is divided by it.</source>
        <translation>„%1“ ist null, und es wird dadurch geteilt.</translation>
    </message>
    <message>
        <source>Divide by something else.</source>
        <translation>Durch etwas anderes teilen.</translation>
    </message>
    <message>
        <source>“%1” is negative and has no root.</source>
        <translation>„%1“ ist negativ und hat keine Wurzel.</translation>
    </message>
    <message>
        <source>Put the sign in front of the root.</source>
        <translation>Das Vorzeichen vor die Wurzel setzen.</translation>
    </message>
    <message>
        <source>“%1” is %2; its root has no whole unit.</source>
        <translation>„%1“ ist %2; die Wurzel davon hat keine ganze Einheit.</translation>
    </message>
    <message>
        <source>Take roots of plain numbers or of squares, as in sqrt(9 mm^2).</source>
        <translation>Wurzeln aus reinen Zahlen oder aus Quadraten ziehen, wie in sqrt(9 mm^2).</translation>
    </message>
    <message>
        <source>“%1” is %2; raised to “%3” it has no whole unit.</source>
        <translation>„%1“ ist %2; mit dem Exponenten „%3“ entsteht keine ganze Einheit.</translation>
    </message>
    <message>
        <source>Raise quantities with a unit to whole numbers up to 100.</source>
        <translation>Größen mit Einheit nur mit ganzen Zahlen bis 100 potenzieren.</translation>
    </message>
    <message>
        <source>“%1” is %2; an exponent is a plain number.</source>
        <translation>„%1“ ist %2; ein Exponent ist eine reine Zahl.</translation>
    </message>
    <message>
        <source>Take its unit away, or divide by a quantity of its kind.</source>
        <translation>Die Einheit wegnehmen oder durch eine Größe derselben Art teilen.</translation>
    </message>
    <message>
        <source>“%1” is %2 and “%3” is %4; they do not go together.</source>
        <translation>„%1“ ist %2, „%3“ ist %4; das passt nicht zusammen.</translation>
    </message>
    <message>
        <source>Give each its unit, as in 2 MPa + 3 MPa or (2 + 3) MPa.</source>
        <translation>Jedem seine Einheit geben, wie in 2 MPa + 3 MPa oder (2 + 3) MPa.</translation>
    </message>
    <message>
        <source>Add and compare only what is of one kind.</source>
        <translation>Nur Gleichartiges addieren und vergleichen.</translation>
    </message>
    <message>
        <source>“%1” is %2; %3 wants an angle.</source>
        <translation>„%1“ ist %2; %3 verlangt einen Winkel.</translation>
    </message>
    <message>
        <source>Write %1(%2 deg) or %1(%2 rad).</source>
        <translation>%1(%2 deg) oder %1(%2 rad) schreiben.</translation>
    </message>
    <message>
        <source>Give the angle its unit, as in %1(30 deg).</source>
        <translation>Dem Winkel seine Einheit geben, wie in %1(30 deg).</translation>
    </message>
    <message>
        <source>%1 compares two values or more.</source>
        <translation>%1 vergleicht zwei oder mehr Werte.</translation>
    </message>
    <message>
        <source>%1 takes one value.</source>
        <translation>%1 nimmt einen einzigen Wert.</translation>
    </message>
    <message>
        <source>Write %1(a, b).</source>
        <translation>%1(a, b) schreiben.</translation>
    </message>
    <message>
        <source>Write %1(a).</source>
        <translation>%1(a) schreiben.</translation>
    </message>
    <message>
        <source>The byte %1 is not UTF-8.</source>
        <translation>Das Byte %1 ist kein UTF-8.</translation>
    </message>
    <message>
        <source>Type the text again, or save its file as UTF-8.</source>
        <translation>Den Text neu eingeben oder seine Datei als UTF-8 speichern.</translation>
    </message>
    <message>
        <source>The text is longer than 4096 characters.</source>
        <translation>Der Text ist länger als 4096 Zeichen.</translation>
    </message>
    <message>
        <source>Work out a part of it and type the result.</source>
        <translation>Einen Teil davon ausrechnen und das Ergebnis eingeben.</translation>
    </message>
    <message>
        <source>Here the expression goes deeper than 200 levels.</source>
        <translation>Hier geht der Ausdruck tiefer als 200 Ebenen.</translation>
    </message>
    <message>
        <source>Take parentheses or signs away.</source>
        <translation>Klammern oder Vorzeichen wegnehmen.</translation>
    </message>
    <message>
        <source>The “(” is not closed.</source>
        <translation>Die „(“ ist nicht geschlossen.</translation>
    </message>
    <message>
        <source>Add a “)”.</source>
        <translation>Eine „)“ ergänzen.</translation>
    </message>
    <message>
        <source>The “)” closes nothing.</source>
        <translation>Die „)“ schließt nichts.</translation>
    </message>
    <message>
        <source>Take it away, or add a “(” before it.</source>
        <translation>Die Klammer wegnehmen oder davor eine „(“ ergänzen.</translation>
    </message>
    <message>
        <source>Type a number, pi, a function or a “(” here.</source>
        <translation>Hier eine Zahl, pi, eine Funktion oder eine „(“ eingeben.</translation>
    </message>
    <message>
        <source>The expression ends where a number is needed.</source>
        <translation>Der Ausdruck endet, wo eine Zahl gebraucht wird.</translation>
    </message>
    <message>
        <source>“%1” stands where a number is needed.</source>
        <translation>„%1“ steht, wo eine Zahl gebraucht wird.</translation>
    </message>
    <message>
        <source>Between “%1” and “%2” an operator is missing.</source>
        <translation>Zwischen „%1“ und „%2“ fehlt ein Operator.</translation>
    </message>
    <message>
        <source>Put + - * / or ^ between them; digits are not grouped.</source>
        <translation>+ - * / oder ^ dazwischensetzen; Ziffern werden nicht gruppiert.</translation>
    </message>
    <message>
        <source>“%1” is no number.</source>
        <translation>„%1“ ist keine Zahl.</translation>
    </message>
    <message>
        <source>Write one decimal point, as in 1.5 or 1.5e-3.</source>
        <translation>Einen einzigen Dezimalpunkt schreiben, wie in 1.5 oder 1.5e-3.</translation>
    </message>
    <message>
        <source>“%1” has a decimal comma.</source>
        <translation>„%1“ hat ein Dezimalkomma.</translation>
    </message>
    <message>
        <source>Write %1, with a decimal point.</source>
        <translation>%1 schreiben, mit Dezimalpunkt.</translation>
    </message>
    <message>
        <source>“%1” has a comma between thousands.</source>
        <translation>„%1“ hat ein Komma als Tausendertrennung.</translation>
    </message>
    <message>
        <source>Write %1; digits are not grouped.</source>
        <translation>%1 schreiben; Ziffern werden nicht gruppiert.</translation>
    </message>
    <message>
        <source>The “,” parts nothing here.</source>
        <translation>Das „,“ trennt hier nichts.</translation>
    </message>
    <message>
        <source>Commas stand only between the values of min and max.</source>
        <translation>Kommas stehen nur zwischen den Werten von min und max.</translation>
    </message>
    <message>
        <source>“=” is not part of an expression.</source>
        <translation>„=“ gehört nicht in einen Ausdruck.</translation>
    </message>
    <message>
        <source>Leave the “=” out.</source>
        <translation>Das „=“ weglassen.</translation>
    </message>
    <message>
        <source>“%1” has brackets round a unit.</source>
        <translation>„%1“ hat Klammern um eine Einheit.</translation>
    </message>
    <message>
        <source>Write %1 without them.</source>
        <translation>%1 ohne sie schreiben.</translation>
    </message>
    <message>
        <source>“%1” is no finite number.</source>
        <translation>„%1“ ist keine endliche Zahl.</translation>
    </message>
    <message>
        <source>Type a number.</source>
        <translation>Eine Zahl eingeben.</translation>
    </message>
    <message>
        <source>Expressions have numbers, units, + - * / ^ ( ) and functions.</source>
        <translation>Ausdrücke bestehen aus Zahlen, Einheiten, + - * / ^ ( ) und Funktionen.</translation>
    </message>
    <message>
        <source>“%1” is not part of an expression.</source>
        <translation>„%1“ gehört nicht in einen Ausdruck.</translation>
    </message>
    <message>
        <source>“%1” (%2) is not part of an expression.</source>
        <translation>„%1“ (%2) gehört nicht in einen Ausdruck.</translation>
    </message>
    <message>
        <source>The character %1 is not part of an expression.</source>
        <translation>Das Zeichen %1 gehört nicht in einen Ausdruck.</translation>
    </message>
    <message>
        <source>There are sqrt, abs, min, max, sin, cos and tan.</source>
        <translation>Es gibt sqrt, abs, min, max, sin, cos und tan.</translation>
    </message>
    <message>
        <source>There is no function “%1”.</source>
        <translation>Die Funktion „%1“ gibt es nicht.</translation>
    </message>
    <message>
        <source>Did you mean %1? %2</source>
        <translation>War %1 gemeint? %2</translation>
    </message>
    <message>
        <source>The function “%1” has no parentheses.</source>
        <translation>Die Funktion „%1“ hat keine Klammern.</translation>
    </message>
    <message>
        <source>Write %1(...).</source>
        <translation>%1(...) schreiben.</translation>
    </message>
    <message>
        <source>“%1” is not known here.</source>
        <translation>„%1“ ist hier nicht bekannt.</translation>
    </message>
    <message>
        <source>Type a number, pi or a function such as sqrt(2).</source>
        <translation>Eine Zahl, pi oder eine Funktion wie sqrt(2) eingeben.</translation>
    </message>
    <message>
        <source>“%1” follows another superscript.</source>
        <translation>„%1“ folgt auf eine andere Hochzahl.</translation>
    </message>
    <message>
        <source>Write the exponent with ^, as in 2^23.</source>
        <translation>Den Exponenten mit ^ schreiben, wie in 2^23.</translation>
    </message>
</context>
<context>
    <name>Field</name>
    <message>
        <source>top</source>
        <translation>oben</translation>
    </message>
    <message>
        <source>mid</source>
        <translation>Mitte</translation>
    </message>
    <message>
        <source>bottom</source>
        <translation>unten</translation>
    </message>
    <message>
        <source>A quote in the header is not closed.</source>
        <translation>Ein Anführungszeichen in der Kopfzeile ist nicht geschlossen.</translation>
    </message>
    <message>
        <source>Close it in the same line.</source>
        <translation>Das Anführungszeichen in derselben Zeile schließen.</translation>
    </message>
    <message>
        <source>The table has no column “%1”.</source>
        <translation>Die Tabelle hat keine Spalte „%1“.</translation>
    </message>
    <message>
        <source>Write the heading as it stands in the table.</source>
        <translation>Die Überschrift schreiben, wie sie in der Tabelle steht.</translation>
    </message>
    <message>
        <source>No column can be “%1”.</source>
        <translation>Keine Spalte kann „%1“ sein.</translation>
    </message>
    <message>
        <source>Take point, layer, case, axes, line, region, x, y, sx, sy, txy, a stress with its case (“sx G”), or unread.</source>
        <translation>point, layer, case, axes, line, region, x, y, sx, sy, txy, eine Spannung mit ihrem Lastfall („sx G“) oder unread nehmen.</translation>
    </message>
    <message>
        <source>Two columns are %1.</source>
        <translation>Zwei Spalten enthalten: %1.</translation>
    </message>
    <message>
        <source>Say which one counts, by mapping its heading.</source>
        <translation>Durch Zuordnen der Überschrift sagen, welche zählt.</translation>
    </message>
    <message>
        <source>The table has both stresses of a case and a row for each case.</source>
        <translation>Die Tabelle hat sowohl Spannungen je Lastfall als auch eine Zeile je Lastfall.</translation>
    </message>
    <message>
        <source>Give either point,case,sx,sy,txy or a column triple for each case.</source>
        <translation>Entweder point,case,sx,sy,txy oder drei Spalten je Lastfall angeben.</translation>
    </message>
    <message>
        <source>Two columns are %1 of case %2.</source>
        <translation>Zwei Spalten enthalten: %1 von Lastfall %2.</translation>
    </message>
    <message>
        <source>Leave one of them out.</source>
        <translation>Eine davon weglassen.</translation>
    </message>
    <message>
        <source>%1 of case %2</source>
        <translation>%1 von Lastfall %2</translation>
    </message>
    <message>
        <source>No column is %1.</source>
        <translation>Keine Spalte enthält: %1.</translation>
    </message>
    <message>
        <source>Head it so, or map the heading that it has.</source>
        <translation>Eine Spalte so benennen oder ihre Überschrift zuordnen.</translation>
    </message>
    <message>
        <source>not read</source>
        <translation>nicht gelesen</translation>
    </message>
    <message>
        <source>the point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>the layer</source>
        <translation>Lage</translation>
    </message>
    <message>
        <source>the case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>the turn of the row&apos;s axes</source>
        <translation>Drehung der Achsen der Zeile</translation>
    </message>
    <message>
        <source>the angle of the line</source>
        <translation>Winkel der Linie</translation>
    </message>
    <message>
        <source>the region</source>
        <translation>Bereich</translation>
    </message>
    <message>
        <source>x of the point</source>
        <translation>x des Punkts</translation>
    </message>
    <message>
        <source>y of the point</source>
        <translation>y des Punkts</translation>
    </message>
    <message>
        <source>σ_{x}</source>
        <translation>σ_{x}</translation>
    </message>
    <message>
        <source>σ_{y}</source>
        <translation>σ_{y}</translation>
    </message>
    <message>
        <source>τ_{xy}</source>
        <translation>τ_{xy}</translation>
    </message>
    <message>
        <source>A number is missing.</source>
        <translation>Eine Zahl fehlt.</translation>
    </message>
    <message>
        <source>“%1” is no finite number.</source>
        <translation>„%1“ ist keine endliche Zahl.</translation>
    </message>
    <message>
        <source>The number is beyond 1e100 MPa, degrees or mm.</source>
        <translation>Die Zahl liegt über 1e100 MPa, Grad oder mm.</translation>
    </message>
    <message>
        <source>“%1” is no number.</source>
        <translation>„%1“ ist keine Zahl.</translation>
    </message>
    <message>
        <source>The row has fewer cells than the header.</source>
        <translation>Die Zeile hat weniger Zellen als die Kopfzeile.</translation>
    </message>
    <message>
        <source>Give it a cell for each column.</source>
        <translation>Für jede Spalte eine Zelle angeben.</translation>
    </message>
    <message>
        <source>A quote is not closed, or text stands behind it.</source>
        <translation>Ein Anführungszeichen ist nicht geschlossen, oder dahinter steht Text.</translation>
    </message>
    <message>
        <source>The row has more cells than the header.</source>
        <translation>Die Zeile hat mehr Zellen als die Kopfzeile.</translation>
    </message>
    <message>
        <source>Give it one for each column, and decimals with a point.</source>
        <translation>Je Spalte eine angeben, Dezimalzahlen mit Punkt.</translation>
    </message>
    <message>
        <source>“%1” is no layer.</source>
        <translation>„%1“ ist keine Lage.</translation>
    </message>
    <message>
        <source>Write top, mid or bottom.</source>
        <translation>top, mid oder bottom schreiben.</translation>
    </message>
    <message>
        <source>The study has no case “%1”.</source>
        <translation>Die Studie hat keinen Lastfall „%1“.</translation>
    </message>
    <message>
        <source>Write the id or the name of one that it has.</source>
        <translation>Die Kennung oder den Namen eines vorhandenen Lastfalls schreiben.</translation>
    </message>
    <message>
        <source>The point “%1” has this a second time.</source>
        <translation>Der Punkt „%1“ hat dies ein zweites Mal.</translation>
    </message>
    <message>
        <source>Give each point, layer and case one row, and points names of their own.</source>
        <translation>Je Punkt, Lage und Lastfall eine einzige Zeile angeben und Punkten eigene Namen.</translation>
    </message>
    <message>
        <source>Another row of the point “%1” has other axes, another line, region or place.</source>
        <translation>Eine andere Zeile des Punkts „%1“ hat andere Achsen, eine andere Linie, einen anderen Bereich oder Ort.</translation>
    </message>
    <message>
        <source>Give all rows of a point the same.</source>
        <translation>In allen Zeilen eines Punkts dasselbe angeben.</translation>
    </message>
    <message>
        <source>The point “%1” lacks case %2.</source>
        <translation>Dem Punkt „%1“ fehlt Lastfall %2.</translation>
    </message>
    <message>
        <source>Give it a row for each case; where nothing acts, zeros.</source>
        <translation>Für jeden Lastfall eine Zeile angeben; wo nichts wirkt, Nullen.</translation>
    </message>
    <message>
        <source>The table has nothing of case %1, which acts in a combination.</source>
        <translation>Zu Lastfall %1, der in einer Kombination wirkt, enthält die Tabelle nichts.</translation>
    </message>
    <message>
        <source>Give it for every point, or take the case out of the combinations.</source>
        <translation>Den Lastfall für jeden Punkt angeben oder aus den Kombinationen nehmen.</translation>
    </message>
    <message>
        <source>Write a plain number, decimals with a point.</source>
        <translation>Eine reine Zahl schreiben, Dezimalzahlen mit Punkt.</translation>
    </message>
    <message>
        <source>The row has more than a million bytes.</source>
        <translation>Die Zeile hat mehr als eine Million Bytes.</translation>
    </message>
    <message>
        <source>End rows with a line feed.</source>
        <translation>Zeilen mit einem Zeilenvorschub beenden.</translation>
    </message>
    <message>
        <source>This is no table in UTF-8.</source>
        <translation>Das ist keine Tabelle in UTF-8.</translation>
    </message>
    <message>
        <source>Export it as CSV in UTF-8.</source>
        <translation>Die Tabelle als CSV in UTF-8 exportieren.</translation>
    </message>
    <message>
        <source>The file holds no table.</source>
        <translation>Die Datei enthält keine Tabelle.</translation>
    </message>
    <message>
        <source>Give it a header and a row for each point.</source>
        <translation>Eine Kopfzeile und für jeden Punkt eine Zeile angeben.</translation>
    </message>
</context>
<context>
    <name>Figure</name>
    <message>
        <source>as the width allows</source>
        <translation>wie es die Breite erlaubt</translation>
    </message>
    <message>
        <source>elements and circle beside one another</source>
        <translation>Elemente und Kreis nebeneinander</translation>
    </message>
    <message>
        <source>elements and circle one below another</source>
        <translation>Elemente und Kreis untereinander</translation>
    </message>
    <message>
        <source>elements</source>
        <translation>Spannungselemente</translation>
    </message>
    <message>
        <source>circle</source>
        <translation>Mohrscher Kreis</translation>
    </message>
    <message>
        <source>table of planes</source>
        <translation>Tabelle der Ebenen</translation>
    </message>
    <message>
        <source>check and utilisation</source>
        <translation>Nachweis und Ausnutzung</translation>
    </message>
    <message>
        <source>Take each of these at most once, with commas between: %1.</source>
        <translation>Jedes von diesen höchstens einmal nehmen, durch Kommas getrennt: %1.</translation>
    </message>
    <message>
        <source>“%1” names no part of the order.</source>
        <translation>„%1“ nennt keinen Teil der Reihenfolge.</translation>
    </message>
    <message>
        <source>“%1” stands twice in the order.</source>
        <translation>„%1“ steht zweimal in der Reihenfolge.</translation>
    </message>
    <message>
        <source>%1 (%2)</source>
        <translation>%1 (%2)</translation>
    </message>
    <message>
        <source>tension</source>
        <translation>Zug</translation>
    </message>
    <message>
        <source>compression</source>
        <translation>Druck</translation>
    </message>
    <message>
        <source>σ_{n} (%1)</source>
        <translation>σ_{n} (%1)</translation>
    </message>
    <message>
        <source>τ_{nt} (%1), + down</source>
        <translation>τ_{nt} (%1), + nach unten</translation>
    </message>
    <message>
        <source>τ_{nt} (%1), + up</source>
        <translation>τ_{nt} (%1), + nach oben</translation>
    </message>
    <message>
        <source>0 is %1 left of the centre</source>
        <translation>0 liegt %1 links vom Mittelpunkt</translation>
    </message>
    <message>
        <source>0 is %1 right of the centre</source>
        <translation>0 liegt %1 rechts vom Mittelpunkt</translation>
    </message>
    <message>
        <source>Circle of the state</source>
        <translation>Mohrscher Kreis</translation>
    </message>
    <message>
        <source>Tension positive.</source>
        <translation>Zug positiv.</translation>
    </message>
    <message>
        <source>Compression positive.</source>
        <translation>Druck positiv.</translation>
    </message>
    <message>
        <source>τ_{nt} acts on the n face, positive towards t (n turned by +90°), and is drawn + down: turning the plane by θ turns its point by 2θ in the same sense.</source>
        <translation>τ_{nt} wirkt auf der n-Fläche, positiv in Richtung t (n um +90° gedreht), und ist + nach unten aufgetragen: Dreht die Ebene um θ, so dreht ihr Punkt um 2θ im gleichen Sinn.</translation>
    </message>
    <message>
        <source>τ_{nt} acts on the n face, positive towards t (n turned by +90°), and is drawn + up: turning the plane by θ turns its point by 2θ the other way.</source>
        <translation>τ_{nt} wirkt auf der n-Fläche, positiv in Richtung t (n um +90° gedreht), und ist + nach oben aufgetragen: Dreht die Ebene um θ, so dreht ihr Punkt um 2θ andersherum.</translation>
    </message>
    <message>
        <source>Line “%1”</source>
        <translation>Linie „%1“</translation>
    </message>
    <message>
        <source>Line “%1” (%2)</source>
        <translation>Linie „%1“ (%2)</translation>
    </message>
    <message>
        <source>%1: φ = %2, given as %3</source>
        <translation>%1: φ = %2, gegeben als %3</translation>
    </message>
    <message>
        <source>%1, without tolerance.</source>
        <translation>%1, ohne Toleranz.</translation>
    </message>
    <message>
        <source>%1, ± %2.</source>
        <translation>%1, ± %2.</translation>
    </message>
    <message>
        <source>With σ_{3} = %1 the greatest shear on any plane is %2.</source>
        <translation>Mit σ_{3} = %1 ist die größte Schubspannung aller Ebenen %2.</translation>
    </message>
    <message>
        <source>No stresses are given for %1: counted as 0.</source>
        <translation>Für %1 sind keine Spannungen gegeben: mit 0 angesetzt.</translation>
    </message>
    <message>
        <source>The circle is a point: every direction is principal.</source>
        <translation>Der Kreis ist ein Punkt: Jede Richtung ist Hauptrichtung.</translation>
    </message>
    <message>
        <source>Angles counter-clockwise from +x, seen from +z.</source>
        <translation>Winkel gegen den Uhrzeigersinn ab +x, von +z her gesehen.</translation>
    </message>
    <message>
        <source>The elements are drawn with x inclined by %1.</source>
        <translation>Die Elemente sind mit um %1 geneigter x-Achse gezeichnet.</translation>
    </message>
    <message>
        <source>Arrows in one scale, small ones at a least length.</source>
        <translation>Pfeile in einem Maßstab, kleine mit einer Mindestlänge.</translation>
    </message>
    <message>
        <source>Stresses at one point, not a design check: the code in force and a licensed engineer decide.</source>
        <translation>Spannungen an einem Punkt, kein Bemessungsnachweis: Es entscheiden die geltende Norm und zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>%1 %2</source>
        <translation>%1 %2</translation>
    </message>
    <message>
        <source>Reading plane</source>
        <translation>Ableseebene</translation>
    </message>
    <message>
        <source>Given axes</source>
        <translation>Gegebene Achsen</translation>
    </message>
    <message>
        <source>first touch %1</source>
        <translation>erste Berührung %1</translation>
    </message>
    <message>
        <source>Take a number from %1 to %2.</source>
        <translation>Eine Zahl von %1 bis %2 nehmen.</translation>
    </message>
    <message>
        <source>A width of %1 mm does not hold elements and circle beside one another.</source>
        <translation>Bei einer Breite von %1 mm passen Elemente und Kreis nicht nebeneinander.</translation>
    </message>
    <message>
        <source>Take %1 mm or more, or set them one below another.</source>
        <translation>%1 mm oder mehr nehmen oder sie untereinander setzen.</translation>
    </message>
    <message>
        <source>A width of %1 mm is out of range.</source>
        <translation>Eine Breite von %1 mm liegt außerhalb des Bereichs.</translation>
    </message>
    <message>
        <source>Text of %1 pt is out of range.</source>
        <translation>Eine Schriftgröße von %1 pt liegt außerhalb des Bereichs.</translation>
    </message>
    <message>
        <source>At %1 mm the labels find no room.</source>
        <translation>Bei %1 mm finden die Beschriftungen keinen Platz.</translation>
    </message>
    <message>
        <source>Take a wider figure, smaller text or fewer lines.</source>
        <translation>Eine breitere Abbildung, kleinere Schrift oder weniger Linien nehmen.</translation>
    </message>
    <message>
        <source>%1 — %2</source>
        <translation>%1 — %2</translation>
    </message>
    <message>
        <source>no. %1</source>
        <translation>Nr. %1</translation>
    </message>
    <message>
        <source>rev. %1</source>
        <translation>Stand %1</translation>
    </message>
    <message>
        <source>case %1</source>
        <translation>Lastfall %1</translation>
    </message>
    <message>
        <source>Without room for their names on the circle: %1 watched planes.</source>
        <translation>Ohne Platz für ihre Namen am Kreis: %1 vorgemerkte Ebenen.</translation>
    </message>
    <message>
        <source>Plane stress: σ_{x} %1, σ_{y} %2, τ_{xy} %3. Principal stresses %4 and %5. On the plane with its normal at %6: σ_{n} %7, τ_{nt} %8.</source>
        <translation>Ebener Spannungszustand: σ_{x} %1, σ_{y} %2, τ_{xy} %3. Hauptspannungen %4 und %5. Auf der Ebene mit der Normalen bei %6: σ_{n} %7, τ_{nt} %8.</translation>
    </message>
    <message>
        <source>angle of the line (°)</source>
        <translation>Winkel der Linie (°)</translation>
    </message>
    <message>
        <source>normal of the plane (°)</source>
        <translation>Normale der Ebene (°)</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>greatest of all</source>
        <translation>größte von allen</translation>
    </message>
    <message>
        <source>The figure is printed at its true size.</source>
        <translation>Die Abbildung wird in wahrer Größe gedruckt.</translation>
    </message>
    <message>
        <source>The paper does not hold the figure: it is printed at %1 % of its true size.</source>
        <translation>Die Abbildung passt nicht auf das Papier: Sie wird mit %1 % ihrer wahren Größe gedruckt.</translation>
    </message>
</context>
<context>
    <name>File</name>
    <message>
        <source>The study in this file is carried in form %1; this program reads form 1.</source>
        <translation>Die Studie in dieser Datei ist in Form %1 mitgegeben; dieses Programm liest Form 1.</translation>
    </message>
    <message>
        <source>Open it with a newer Planewright.</source>
        <translation>Die Datei mit einem neueren Planewright öffnen.</translation>
    </message>
    <message>
        <source>The study is too large to travel inside another file.</source>
        <translation>Die Studie ist zu groß, um in einer anderen Datei mitgegeben zu werden.</translation>
    </message>
    <message>
        <source>Leave the study out of it.</source>
        <translation>Die Studie weglassen.</translation>
    </message>
    <message>
        <source>This file carries no study.</source>
        <translation>Diese Datei enthält keine Studie.</translation>
    </message>
    <message>
        <source>Open the study itself, or a figure that was saved with the study inside.</source>
        <translation>Die Studie selbst öffnen oder eine Abbildung, die mit der Studie darin gespeichert wurde.</translation>
    </message>
    <message>
        <source>This file is cut off, and with it the study inside.</source>
        <translation>Diese Datei ist abgeschnitten, und mit ihr die Studie darin.</translation>
    </message>
    <message>
        <source>Take the whole file again from where it came.</source>
        <translation>Die vollständige Datei noch einmal von dort holen, wo sie herkam.</translation>
    </message>
    <message>
        <source>The study inside this file was changed after it was saved.</source>
        <translation>Die Studie in dieser Datei wurde nach dem Speichern geändert.</translation>
    </message>
    <message>
        <source>Open the file as Planewright saved it, or the study itself.</source>
        <translation>Die Datei öffnen, wie Planewright sie gespeichert hat, oder die Studie selbst.</translation>
    </message>
    <message>
        <source>This file carries more than one study.</source>
        <translation>Diese Datei enthält mehr als eine Studie.</translation>
    </message>
    <message>
        <source>Open one of the figures that it was put together from.</source>
        <translation>Eine der Abbildungen öffnen, aus denen sie zusammengesetzt wurde.</translation>
    </message>
    <message>
        <source>This file is too large: a study is looked for in files of up to 64 MB.</source>
        <translation>Diese Datei ist zu groß: Nach einer Studie wird in Dateien bis 64 MB gesucht.</translation>
    </message>
    <message>
        <source>Open the study itself.</source>
        <translation>Die Studie selbst öffnen.</translation>
    </message>
    <message>
        <source>The version of the file is missing.</source>
        <translation>Die Version der Datei fehlt.</translation>
    </message>
    <message>
        <source>Write &quot;version&quot;: 1.</source>
        <translation>&quot;version&quot;: 1 schreiben.</translation>
    </message>
    <message>
        <source>This file has version %1; this program reads version 1.</source>
        <translation>Diese Datei hat Version %1; dieses Programm liest Version 1.</translation>
    </message>
    <message>
        <source>Open it with a newer Planewright; the file is left as it is.</source>
        <translation>Die Datei mit einem neueren Planewright öffnen; sie bleibt, wie sie ist.</translation>
    </message>
    <message>
        <source>The version of a file is a whole number from 1.</source>
        <translation>Die Version einer Datei ist eine ganze Zahl ab 1.</translation>
    </message>
    <message>
        <source>This text has control characters.</source>
        <translation>Dieser Text enthält Steuerzeichen.</translation>
    </message>
    <message>
        <source>Take them out.</source>
        <translation>Diese Zeichen entfernen.</translation>
    </message>
    <message>
        <source>The file has more than a million values.</source>
        <translation>Die Datei hat mehr als eine Million Werte.</translation>
    </message>
    <message>
        <source>The brackets are nested more than 64 deep.</source>
        <translation>Die Klammern sind tiefer als 64 Ebenen verschachtelt.</translation>
    </message>
    <message>
        <source>This key stands twice in one object.</source>
        <translation>Dieser Schlüssel steht zweimal in einem Objekt.</translation>
    </message>
    <message>
        <source>Take one of them out.</source>
        <translation>Einen davon entfernen.</translation>
    </message>
    <message>
        <source>The number “%1” is too large.</source>
        <translation>Die Zahl „%1“ ist zu groß.</translation>
    </message>
    <message>
        <source>The file ends too early.</source>
        <translation>Die Datei endet zu früh.</translation>
    </message>
    <message>
        <source>It may be cut off: take it again from where it came.</source>
        <translation>Vielleicht ist sie abgeschnitten: noch einmal von dort holen, wo sie herkam.</translation>
    </message>
    <message>
        <source>The text “%1” breaks off at what JSON does not allow in a text.</source>
        <translation>Der Text „%1“ bricht bei etwas ab, das JSON in einem Text nicht erlaubt.</translation>
    </message>
    <message>
        <source>Close it with a quote; write \n for a new line and \\ for a backslash.</source>
        <translation>Den Text mit einem Anführungszeichen schließen; für eine neue Zeile \n und für einen umgekehrten Schrägstrich \\ schreiben.</translation>
    </message>
    <message>
        <source>A character that cannot be seen does not belong here.</source>
        <translation>Ein Zeichen, das nicht zu sehen ist, gehört nicht hierher.</translation>
    </message>
    <message>
        <source>“%1” does not belong here.</source>
        <translation>„%1“ gehört nicht hierher.</translation>
    </message>
    <message>
        <source>Look for a missing or surplus comma, quote or bracket just before it.</source>
        <translation>Kurz davor nach einem fehlenden oder überzähligen Komma, Anführungszeichen oder einer Klammer suchen.</translation>
    </message>
    <message>
        <source>The file is larger than 16 MB.</source>
        <translation>Die Datei ist größer als 16 MB.</translation>
    </message>
    <message>
        <source>The file is not UTF-8 from here on.</source>
        <translation>Ab hier ist die Datei kein UTF-8.</translation>
    </message>
    <message>
        <source>Save it as UTF-8.</source>
        <translation>Die Datei als UTF-8 speichern.</translation>
    </message>
    <message>
        <source>The file goes on after its end.</source>
        <translation>Die Datei geht hinter ihrem Ende weiter.</translation>
    </message>
    <message>
        <source>This is not a file of materials of Planewright.</source>
        <translation>Das ist keine Materialdatei von Planewright.</translation>
    </message>
    <message>
        <source>A file of materials begins with &quot;format&quot;: &quot;%1&quot;.</source>
        <translation>Eine Materialdatei beginnt mit &quot;format&quot;: &quot;%1&quot;.</translation>
    </message>
    <message>
        <source>A list in square brackets is needed here.</source>
        <translation>Hier wird eine Liste in eckigen Klammern gebraucht.</translation>
    </message>
    <message>
        <source>An object in braces is needed here.</source>
        <translation>Hier wird ein Objekt in geschweiften Klammern gebraucht.</translation>
    </message>
    <message>
        <source>A text in quotes is needed here.</source>
        <translation>Hier wird ein Text in Anführungszeichen gebraucht.</translation>
    </message>
    <message>
        <source>Put it in quotes, with its unit where it has one.</source>
        <translation>Den Wert in Anführungszeichen setzen, gegebenenfalls mit seiner Einheit.</translation>
    </message>
    <message>
        <source>“%1” is missing in this object.</source>
        <translation>„%1“ fehlt in diesem Objekt.</translation>
    </message>
    <message>
        <source>“%1” is no key of this object.</source>
        <translation>„%1“ ist kein Schlüssel dieses Objekts.</translation>
    </message>
    <message>
        <source>Its keys are: %1.</source>
        <translation>Seine Schlüssel sind: %1.</translation>
    </message>
    <message>
        <source>This is not a study of Planewright.</source>
        <translation>Das ist keine Studie von Planewright.</translation>
    </message>
    <message>
        <source>A study begins with &quot;format&quot;: &quot;%1&quot;.</source>
        <translation>Eine Studie beginnt mit &quot;format&quot;: &quot;%1&quot;.</translation>
    </message>
    <message>
        <source>This is not an unsaved study of Planewright.</source>
        <translation>Dies ist keine ungespeicherte Studie von Planewright.</translation>
    </message>
    <message>
        <source>A file of an unsaved study begins with &quot;format&quot;: &quot;%1&quot;.</source>
        <translation>Die Datei einer ungespeicherten Studie beginnt mit &quot;format&quot;: &quot;%1&quot;.</translation>
    </message>
    <message>
        <source>The bytes of the saved file are no base64.</source>
        <translation>Die Bytes der gespeicherten Datei sind kein Base64.</translation>
    </message>
    <message>
        <source>the disk is full</source>
        <translation>der Datenträger ist voll</translation>
    </message>
    <message>
        <source>permission is denied</source>
        <translation>die Berechtigung fehlt</translation>
    </message>
    <message>
        <source>the disk is read-only</source>
        <translation>der Datenträger ist schreibgeschützt</translation>
    </message>
    <message>
        <source>it is a folder</source>
        <translation>es ist ein Ordner</translation>
    </message>
    <message>
        <source>its reader has gone</source>
        <translation>die lesende Seite ist nicht mehr da</translation>
    </message>
    <message>
        <source>it is closed</source>
        <translation>der Kanal ist geschlossen</translation>
    </message>
    <message>
        <source>there is no such file or folder</source>
        <translation>es gibt keine solche Datei und keinen solchen Ordner</translation>
    </message>
    <message>
        <source>This cannot be read: %1.</source>
        <translation>Das kann nicht gelesen werden: %1.</translation>
    </message>
    <message>
        <source>This could not be written: %1.</source>
        <translation>Das konnte nicht geschrieben werden: %1.</translation>
    </message>
    <message>
        <source>Your library has another “%1” already.</source>
        <translation>Die Bibliothek enthält schon ein anderes „%1“.</translation>
    </message>
    <message>
        <source>Give this one another name, or remove that one first.</source>
        <translation>Diesem einen anderen Namen geben oder erst jenes entfernen.</translation>
    </message>
    <message>
        <source>The file of your materials does not read, so nothing is written to it.</source>
        <translation>Die Datei der eigenen Materialien ist nicht lesbar, daher wird nichts hineingeschrieben.</translation>
    </message>
    <message>
        <source>Mend it, or move it away to begin another.</source>
        <translation>Die Datei berichtigen oder verschieben, um eine neue zu beginnen.</translation>
    </message>
</context>
<context>
    <name>FileQuestions</name>
    <message>
        <source>Studies (*.planewright);;All files (*)</source>
        <translation>Studien (*.planewright);;Alle Dateien (*)</translation>
    </message>
    <message>
        <source>Studies (*.planewright);;Figures and sheets with their study inside (*.svg *.pdf *.png *.html);;All files (*)</source>
        <translation>Studien (*.planewright);;Abbildungen und Rechenblätter mit ihrer Studie darin (*.svg *.pdf *.png *.html);;Alle Dateien (*)</translation>
    </message>
    <message>
        <source>Unsaved changes</source>
        <translation>Ungespeicherte Änderungen</translation>
    </message>
    <message>
        <source>“%1” has changes that are in no file.</source>
        <translation>„%1“ hat Änderungen, die in keiner Datei stehen.</translation>
    </message>
    <message>
        <source>Save them before going on?</source>
        <translation>Vor dem Fortfahren speichern?</translation>
    </message>
    <message>
        <source>Open elsewhere</source>
        <translation>Anderswo geöffnet</translation>
    </message>
    <message>
        <source>“%1” is open in another window: process %2 on %3.</source>
        <translation>„%1“ ist in einem anderen Fenster geöffnet: Prozess %2 auf %3.</translation>
    </message>
    <message>
        <source>Read-only, it is not saved over here. Taken over, the other window is asked before it saves over it.</source>
        <translation>Schreibgeschützt geöffnet, wird die Datei hier nicht überschrieben. Nach dem Übernehmen fragt das andere Fenster, bevor es sie überschreibt.</translation>
    </message>
    <message>
        <source>Open &amp;read-only</source>
        <translation>&amp;Schreibgeschützt öffnen</translation>
    </message>
    <message>
        <source>&amp;Take over</source>
        <translation>Über&amp;nehmen</translation>
    </message>
    <message>
        <source>Save over it?</source>
        <translation>Überschreiben?</translation>
    </message>
    <message>
        <source>“%1” is open in another window.</source>
        <translation>„%1“ ist in einem anderen Fenster geöffnet.</translation>
    </message>
    <message>
        <source>“%1” was changed on the disk since it was opened or saved here.</source>
        <translation>„%1“ wurde auf dem Datenträger geändert, seit sie hier geöffnet oder gespeichert wurde.</translation>
    </message>
    <message>
        <source>What is saved over stays beside it, with a tilde (~) behind its name.</source>
        <translation>Die überschriebene Fassung bleibt daneben liegen, mit einer Tilde (~) hinter dem Namen.</translation>
    </message>
    <message>
        <source>Save &amp;as…</source>
        <translation>Speichern &amp;unter…</translation>
    </message>
    <message>
        <source>&amp;Take over and save</source>
        <translation>Über&amp;nehmen und speichern</translation>
    </message>
    <message>
        <source>Save &amp;over it</source>
        <translation>Ü&amp;berschreiben</translation>
    </message>
    <message>
        <source>Open a study</source>
        <translation>Studie öffnen</translation>
    </message>
    <message>
        <source>Tables (*.csv *.tsv *.txt);;All files (*)</source>
        <translation>Tabellen (*.csv *.tsv *.txt);;Alle Dateien (*)</translation>
    </message>
    <message>
        <source>Import points</source>
        <translation>Punkte importieren</translation>
    </message>
    <message>
        <source>Save the study as</source>
        <translation>Studie speichern unter</translation>
    </message>
    <message>
        <source>Export the points</source>
        <translation>Punkte exportieren</translation>
    </message>
</context>
<context>
    <name>Given</name>
    <message>
        <source>tension +</source>
        <translation>Zug +</translation>
    </message>
    <message>
        <source>compression +</source>
        <translation>Druck +</translation>
    </message>
    <message>
        <source>τ drawn + down</source>
        <translation>τ + nach unten</translation>
    </message>
    <message>
        <source>τ drawn + up</source>
        <translation>τ + nach oben</translation>
    </message>
    <message>
        <source>stress</source>
        <translation>Spannung</translation>
    </message>
    <message>
        <source>force</source>
        <translation>Kraft</translation>
    </message>
    <message>
        <source>length</source>
        <translation>Länge</translation>
    </message>
    <message>
        <source>moment</source>
        <translation>Moment</translation>
    </message>
    <message>
        <source>name</source>
        <translation>Name</translation>
    </message>
    <message>
        <source>angle φ</source>
        <translation>Winkel φ</translation>
    </message>
    <message>
        <source>± within</source>
        <translation>Toleranz ±</translation>
    </message>
    <message>
        <source>normal at</source>
        <translation>Normale bei</translation>
    </message>
    <message>
        <source>cut itself at</source>
        <translation>Schnitt selbst</translation>
    </message>
    <message>
        <source>A = %1, I_{z} = %2, I_{y} = %3</source>
        <translation>A = %1, I_{z} = %2, I_{y} = %3</translation>
    </message>
    <message>
        <source>positive τ_{xy} on the x face</source>
        <translation>positive τ_{xy} auf der x-Fläche</translation>
    </message>
    <message>
        <source>runs towards +y</source>
        <translation>zeigt nach +y</translation>
    </message>
    <message>
        <source>runs towards −y</source>
        <translation>zeigt nach −y</translation>
    </message>
    <message>
        <source>x axis at</source>
        <translation>x-Achse bei</translation>
    </message>
    <message>
        <source>free edge at</source>
        <translation>freier Rand bei</translation>
    </message>
</context>
<context>
    <name>Governing</name>
    <message>
        <source>%1, %2: greatest shear in the plane, %3</source>
        <translation>%1, %2: größte Schubspannung in der Ebene, %3</translation>
    </message>
    <message>
        <source>%1, %2: greatest σ1, %3</source>
        <translation>%1, %2: größte σ1, %3</translation>
    </message>
    <message>
        <source>%1, %2: greatest utilisation, %3</source>
        <translation>%1, %2: größte Ausnutzung, %3</translation>
    </message>
    <message>
        <source>governs</source>
        <translation>maßgebend</translation>
    </message>
    <message>
        <source>governs by σ1</source>
        <translation>maßgebend durch σ1</translation>
    </message>
    <message>
        <source>governs by shear</source>
        <translation>maßgebend durch Schub</translation>
    </message>
    <message>
        <source>The greatest utilisation of all combinations at this point</source>
        <translation>Größte Ausnutzung aller Kombinationen an diesem Punkt</translation>
    </message>
    <message>
        <source>The greatest σ1 and the greatest shear in the plane of all combinations at this point</source>
        <translation>Größte σ1 und größte Schubspannung in der Ebene aller Kombinationen an diesem Punkt</translation>
    </message>
    <message>
        <source>The greatest σ1 of all combinations at this point</source>
        <translation>Größte σ1 aller Kombinationen an diesem Punkt</translation>
    </message>
    <message>
        <source>The greatest shear in the plane of all combinations at this point</source>
        <translation>Größte Schubspannung in der Ebene aller Kombinationen an diesem Punkt</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>σn, %1</source>
        <translation>σn, %1</translation>
    </message>
    <message>
        <source>Worst of all checks over their bands</source>
        <translation>Ungünstigster aller Nachweise über ihre Toleranzbereiche</translation>
    </message>
    <message>
        <source>Normal stress on the reading plane</source>
        <translation>Normalspannung auf der Ableseebene</translation>
    </message>
    <message>
        <source>worst utilisation</source>
        <translation>größte Ausnutzung</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>Over all combinations and bands</source>
        <translation>Über alle Kombinationen und Toleranzbereiche</translation>
    </message>
</context>
<context>
    <name>Inverse</name>
    <message>
        <source>%1 reaches only %2 to %3.</source>
        <translation>%1 reicht nur von %2 bis %3.</translation>
    </message>
    <message>
        <source>the greatest τ_{nt}</source>
        <translation>größter τ_{nt}</translation>
    </message>
    <message>
        <source>the least τ_{nt}</source>
        <translation>kleinster τ_{nt}</translation>
    </message>
    <message>
        <source>touches the circle at %1</source>
        <translation>berührt den Kreis bei %1</translation>
    </message>
    <message>
        <source>%1, ± %2</source>
        <translation>%1, ± %2</translation>
    </message>
    <message>
        <source>also at %1</source>
        <translation>auch bei %1</translation>
    </message>
    <message>
        <source>every direction</source>
        <translation>jede Richtung</translation>
    </message>
</context>
<context>
    <name>Language</name>
    <message>
        <source>en</source>
        <translation>de</translation>
    </message>
</context>
<context>
    <name>Line</name>
    <message>
        <source>grain</source>
        <translation>Faser</translation>
    </message>
    <message>
        <source>fibre</source>
        <translation>Laminatfaser</translation>
    </message>
    <message>
        <source>weld</source>
        <translation>Schweißnaht</translation>
    </message>
    <message>
        <source>bond</source>
        <translation>Klebfuge</translation>
    </message>
    <message>
        <source>line</source>
        <translation>Linie</translation>
    </message>
</context>
<context>
    <name>Manual</name>
    <message>
        <source>Limit</source>
        <translation>Grenzbedingung</translation>
    </message>
    <message>
        <source>Materials</source>
        <translation>Materialien</translation>
    </message>
    <message>
        <source>Meant for</source>
        <translation>Gültig für</translation>
    </message>
    <message>
        <source>Source</source>
        <translation>Quelle</translation>
    </message>
    <message>
        <source>Planewright handbook</source>
        <translation>Handbuch zu Planewright</translation>
    </message>
    <message>
        <source>Plane stress at a point, resolved to the line that matters. An aid to a licensed engineer; the code that governs locally decides.</source>
        <translation>Ebener Spannungszustand in einem Punkt, zerlegt auf die Linie, auf die es ankommt. Eine Hilfe für zugelassene Ingenieurinnen und Ingenieure; es entscheidet die örtlich geltende Norm.</translation>
    </message>
</context>
<context>
    <name>Mark</name>
    <message>
        <source>along %1</source>
        <translation>längs %1</translation>
    </message>
    <message>
        <source>along</source>
        <translation>längs</translation>
    </message>
    <message>
        <source>across %1</source>
        <translation>quer %1</translation>
    </message>
    <message>
        <source>across</source>
        <translation>quer</translation>
    </message>
    <message>
        <source>%1 %2 | %3</source>
        <translation>%1 %2 | %3</translation>
    </message>
    <message>
        <source>%1 %2</source>
        <translation>%1 %2</translation>
    </message>
</context>
<context>
    <name>Material</name>
    <message>
        <source>Solid timber</source>
        <translation>Vollholz</translation>
    </message>
    <message>
        <source>Glulam</source>
        <translation>Brettschichtholz</translation>
    </message>
    <message>
        <source>Laminated veneer lumber</source>
        <translation>Furnierschichtholz</translation>
    </message>
    <message>
        <source>Laminae</source>
        <translation>Einzelschichten</translation>
    </message>
    <message>
        <source>Fillet welds</source>
        <translation>Kehlnähte</translation>
    </message>
    <message>
        <source>not given</source>
        <translation>nicht angegeben</translation>
    </message>
    <message>
        <source>not told</source>
        <translation>nicht genannt</translation>
    </message>
    <message>
        <source>“%1” of %2</source>
        <translation>„%1“ von %2</translation>
    </message>
    <message>
        <source>%1 more</source>
        <translation>%1 weitere</translation>
    </message>
    <message>
        <source>Checks by it: %1. When the material is removed, they go with it.</source>
        <translation>Nachweise damit: %1. Wird das Material entfernt, gehen sie mit.</translation>
    </message>
    <message>
        <source>%1; %2 strengths</source>
        <translation>%1; Festigkeiten: %2</translation>
    </message>
    <message>
        <source>How read</source>
        <translation>Art der Entnahme</translation>
    </message>
    <message>
        <source>Source</source>
        <translation>Quelle</translation>
    </message>
    <message>
        <source>Edition</source>
        <translation>Ausgabe</translation>
    </message>
    <message>
        <source>Strengths</source>
        <translation>Festigkeiten</translation>
    </message>
    <message>
        <source>Factors</source>
        <translation>Beiwerte</translation>
    </message>
</context>
<context>
    <name>MaterialFields</name>
    <message>
        <source>name</source>
        <translation>Name</translation>
    </message>
    <message>
        <source>source</source>
        <translation>Quelle</translation>
    </message>
    <message>
        <source>edition</source>
        <translation>Ausgabe</translation>
    </message>
    <message>
        <source>how read</source>
        <translation>wie gelesen</translation>
    </message>
    <message>
        <source>service class</source>
        <translation>Nutzungsklasse</translation>
    </message>
    <message>
        <source>partial factor</source>
        <translation>Teilsicherheitsbeiwert</translation>
    </message>
    <message>
        <source>explicit factor</source>
        <translation>eigener Beiwert</translation>
    </message>
    <message>
        <source>permanent loads</source>
        <translation>Dauer ständig</translation>
    </message>
    <message>
        <source>long loads</source>
        <translation>Dauer lang</translation>
    </message>
    <message>
        <source>medium loads</source>
        <translation>Dauer mittel</translation>
    </message>
    <message>
        <source>short loads</source>
        <translation>Dauer kurz</translation>
    </message>
    <message>
        <source>instantaneous loads</source>
        <translation>Dauer sehr kurz</translation>
    </message>
</context>
<context>
    <name>Mode</name>
    <message>
        <source>tension along the line</source>
        <translation>Zug längs der Linie</translation>
    </message>
    <message>
        <source>compression along the line</source>
        <translation>Druck längs der Linie</translation>
    </message>
    <message>
        <source>tension across the line</source>
        <translation>Zug quer zur Linie</translation>
    </message>
    <message>
        <source>compression across the line</source>
        <translation>Druck quer zur Linie</translation>
    </message>
    <message>
        <source>shear</source>
        <translation>Schub</translation>
    </message>
    <message>
        <source>interaction of several stresses</source>
        <translation>Interaktion mehrerer Spannungen</translation>
    </message>
    <message>
        <source>tension at an angle to the line</source>
        <translation>Zug schräg zur Linie</translation>
    </message>
    <message>
        <source>compression at an angle to the line</source>
        <translation>Druck schräg zur Linie</translation>
    </message>
    <message>
        <source>yield</source>
        <translation>Fließen</translation>
    </message>
    <message>
        <source>tension</source>
        <translation>Zug</translation>
    </message>
    <message>
        <source>compression</source>
        <translation>Druck</translation>
    </message>
    <message>
        <source>slip along the plane</source>
        <translation>Gleiten entlang der Ebene</translation>
    </message>
    <message>
        <source>tension across the plane</source>
        <translation>Zug quer zur Ebene</translation>
    </message>
    <message>
        <source>combined stress in the throat</source>
        <translation>Vergleichsspannung in der Nahtfläche</translation>
    </message>
    <message>
        <source>normal stress on the throat</source>
        <translation>Normalspannung auf der Nahtfläche</translation>
    </message>
</context>
<context>
    <name>Paste</name>
    <message>
        <source>sizes of sections</source>
        <translation>Abmessungen von Querschnitten</translation>
    </message>
    <message>
        <source>second lines</source>
        <translation>zweite Linien</translation>
    </message>
    <message>
        <source>watched planes</source>
        <translation>vorgemerkte Ebenen</translation>
    </message>
    <message>
        <source>checks</source>
        <translation>Nachweise</translation>
    </message>
    <message>
        <source>free edges</source>
        <translation>freie Ränder</translation>
    </message>
    <message>
        <source>inclined axes</source>
        <translation>geneigte Achsen</translation>
    </message>
    <message>
        <source>reading planes</source>
        <translation>Ableseebenen</translation>
    </message>
    <message>
        <source>The table has more than 100 000 rows.</source>
        <translation>Die Tabelle hat mehr als 100 000 Zeilen.</translation>
    </message>
    <message>
        <source>Take it in parts.</source>
        <translation>In Teilen übernehmen.</translation>
    </message>
    <message>
        <source>The table has more than 40 columns.</source>
        <translation>Die Tabelle hat mehr als 40 Spalten.</translation>
    </message>
    <message>
        <source>Copy only the columns that are wanted.</source>
        <translation>Nur die benötigten Spalten kopieren.</translation>
    </message>
    <message>
        <source>A cell begins with a quote that is not closed.</source>
        <translation>Eine Zelle beginnt mit einem Anführungszeichen, das nicht geschlossen wird.</translation>
    </message>
    <message>
        <source>Close it, or put the cell in quotes and double those inside it.</source>
        <translation>Es schließen oder die Zelle in Anführungszeichen setzen und die darin enthaltenen verdoppeln.</translation>
    </message>
    <message>
        <source>Behind the closing quote of a cell stands more text.</source>
        <translation>Hinter dem schließenden Anführungszeichen einer Zelle steht weiterer Text.</translation>
    </message>
    <message>
        <source>Put the whole cell in quotes and double those inside it.</source>
        <translation>Die ganze Zelle in Anführungszeichen setzen und die darin enthaltenen verdoppeln.</translation>
    </message>
    <message>
        <source>The table has more than 10 MB of text.</source>
        <translation>Die Tabelle hat mehr als 10 MB Text.</translation>
    </message>
    <message>
        <source>The text is not UTF-8.</source>
        <translation>Der Text ist nicht in UTF-8.</translation>
    </message>
    <message>
        <source>Save the table as CSV in UTF-8.</source>
        <translation>Die Tabelle als CSV in UTF-8 speichern.</translation>
    </message>
    <message>
        <source>Two columns are %1.</source>
        <translation>Zwei Spalten enthalten: %1.</translation>
    </message>
    <message>
        <source>Leave one of them out.</source>
        <translation>Eine davon weglassen.</translation>
    </message>
    <message>
        <source>Choose what it is, or head it with its name: point, note, case, sx, sy, txy, sz, N, V_y, V_z, T, M_y, M_z, section, y, z.</source>
        <translation>Wählen, was sie enthält, oder ihren Namen als Überschrift setzen: point, note, case, sx, sy, txy, sz, N, V_y, V_z, T, M_y, M_z, section, y, z.</translation>
    </message>
    <message>
        <source>It is not told what this column is.</source>
        <translation>Was diese Spalte enthält, ist nicht angegeben.</translation>
    </message>
    <message>
        <source>“%1” is not a heading that is known.</source>
        <translation>„%1“ ist keine bekannte Überschrift.</translation>
    </message>
    <message>
        <source>The table has no column with the load case.</source>
        <translation>Die Tabelle hat keine Spalte mit dem Lastfall.</translation>
    </message>
    <message>
        <source>Add a column headed “case”; of one case alone, with its id in each row.</source>
        <translation>Eine Spalte mit der Überschrift „case“ ergänzen; bei nur einem Lastfall mit seiner Kennung in jeder Zeile.</translation>
    </message>
    <message>
        <source>The table has no column with a stress or a section force.</source>
        <translation>Die Tabelle hat keine Spalte mit einer Spannung oder Schnittgröße.</translation>
    </message>
    <message>
        <source>Head the columns sx, sy, txy or N, V_y, M_z.</source>
        <translation>Als Überschriften sx, sy, txy oder N, V_y, M_z verwenden.</translation>
    </message>
    <message>
        <source>not used</source>
        <translation>nicht verwendet</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>note of the point</source>
        <translation>Anmerkung zum Punkt</translation>
    </message>
    <message>
        <source>name of the line</source>
        <translation>Name der Linie</translation>
    </message>
    <message>
        <source>load case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>“%1” can be %2 or %3.</source>
        <translation>„%1“ kann %2 oder %3 sein.</translation>
    </message>
    <message>
        <source>Write the one that is meant.</source>
        <translation>Den gemeinten Wert schreiben.</translation>
    </message>
    <message>
        <source>There is no row below the headings.</source>
        <translation>Unter den Überschriften steht keine Zeile.</translation>
    </message>
    <message>
        <source>Copy the rows of the table as well.</source>
        <translation>Auch die Zeilen der Tabelle kopieren.</translation>
    </message>
    <message>
        <source>The table has no headings: what its columns are was told by their count.</source>
        <translation>Die Tabelle hat keine Überschriften: Was ihre Spalten enthalten, folgt aus deren Anzahl.</translation>
    </message>
    <message>
        <source>Signs are read as in this study: %1.</source>
        <translation>Vorzeichen werden wie in dieser Studie gelesen: %1.</translation>
    </message>
    <message>
        <source>The sense of V_{y} is that of this study: %1.</source>
        <translation>Der Richtungssinn von V_{y} ist der dieser Studie: %1.</translation>
    </message>
    <message>
        <source>Envelope rows (greatest N with greatest M of different instants) cannot be told from the data: forces of one row must act at the same time.</source>
        <translation>Zeilen einer Einhüllenden (größtes N mit größtem M verschiedener Zeitpunkte) sind an den Daten nicht zu erkennen: Die Schnittgrößen einer Zeile müssen gleichzeitig wirken.</translation>
    </message>
    <message>
        <source>“%1” in the heading “%2” is read as %3.</source>
        <translation>„%1“ in der Überschrift „%2“ wird als %3 gelesen.</translation>
    </message>
    <message>
        <source>Rows whose case has section forces, pressure or measured strains in the study: %1, the first is %2 at %3. They stay, and add to what is pasted.</source>
        <translation>Zeilen, deren Lastfall in der Studie Schnittgrößen, Innendruck oder gemessene Dehnungen hat: %1, zuerst %2 bei %3. Diese bleiben und kommen zum Eingefügten hinzu.</translation>
    </message>
    <message>
        <source>There is no table in this text.</source>
        <translation>In diesem Text ist keine Tabelle.</translation>
    </message>
    <message>
        <source>Copy the cells of a table first.</source>
        <translation>Zuerst die Zellen einer Tabelle kopieren.</translation>
    </message>
    <message>
        <source>Name the point in each of its rows.</source>
        <translation>Den Punkt in jeder seiner Zeilen nennen.</translation>
    </message>
    <message>
        <source>Name the load case in each row, such as G or Q2.</source>
        <translation>Den Lastfall in jeder Zeile nennen, etwa G oder Q2.</translation>
    </message>
    <message>
        <source>Case %1 stands twice for point %2: in line %3 too.</source>
        <translation>Lastfall %1 steht für Punkt %2 doppelt: auch in Zeile %3.</translation>
    </message>
    <message>
        <source>Leave one of the rows out, or give it a case of its own.</source>
        <translation>Eine der Zeilen weglassen oder ihr einen eigenen Lastfall geben.</translation>
    </message>
    <message>
        <source>Nothing is given for case %1.</source>
        <translation>Für Lastfall %1 ist nichts angegeben.</translation>
    </message>
    <message>
        <source>Write 0 where nothing acts, or leave the row out.</source>
        <translation>0 schreiben, wo nichts wirkt, oder die Zeile weglassen.</translation>
    </message>
    <message>
        <source>Point %1 has another text in a row above: %2.</source>
        <translation>Punkt %1 hat in einer Zeile darüber einen anderen Text: %2.</translation>
    </message>
    <message>
        <source>Give each point one, in all of its rows or in the first.</source>
        <translation>Jedem Punkt nur einen geben, in allen seinen Zeilen oder in der ersten.</translation>
    </message>
    <message>
        <source>%1 of case %2 is not whole: %3 is not given.</source>
        <translation>%1 von Lastfall %2 ist unvollständig. Es fehlt: %3.</translation>
    </message>
    <message>
        <source>Fill the column headed “%1” too.</source>
        <translation>Auch die Spalte mit der Überschrift „%1“ füllen.</translation>
    </message>
    <message>
        <source>This study has no section “%1”.</source>
        <translation>Diese Studie hat keinen Querschnitt „%1“.</translation>
    </message>
    <message>
        <source>Make the section in the study first, by this name.</source>
        <translation>Zuerst den Querschnitt mit diesem Namen in der Studie anlegen.</translation>
    </message>
    <message>
        <source>Point %1 has no section, which section forces need.</source>
        <translation>Punkt %1 hat keinen Querschnitt; für Schnittgrößen ist einer nötig.</translation>
    </message>
    <message>
        <source>Give the point its section and fibre first, or in columns section, y, z.</source>
        <translation>Querschnitt und Stelle des Punkts zuerst angeben oder in den Spalten section, y, z.</translation>
    </message>
    <message>
        <source>Where point %1 lies in section “%2” is not given.</source>
        <translation>Wo Punkt %1 im Querschnitt „%2“ liegt, ist nicht angegeben.</translation>
    </message>
    <message>
        <source>Add columns y and z, measured from the centroid.</source>
        <translation>Spalten y und z ergänzen, gemessen vom Schwerpunkt.</translation>
    </message>
</context>
<context>
    <name>Place</name>
    <message>
        <source>load case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>material</source>
        <translation>Material</translation>
    </message>
    <message>
        <source>section</source>
        <translation>Querschnitt</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>fibre</source>
        <translation>Stelle im Querschnitt</translation>
    </message>
    <message>
        <source>stresses of a case</source>
        <translation>Spannungen eines Lastfalls</translation>
    </message>
    <message>
        <source>section forces</source>
        <translation>Schnittgrößen</translation>
    </message>
    <message>
        <source>pressure in a thin wall</source>
        <translation>Innendruck, dünne Wand</translation>
    </message>
    <message>
        <source>strain rosette</source>
        <translation>Dehnungsrosette</translation>
    </message>
    <message>
        <source>line</source>
        <translation>Linie</translation>
    </message>
    <message>
        <source>watched plane</source>
        <translation>vorgemerkte Ebene</translation>
    </message>
    <message>
        <source>check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>factor</source>
        <translation>Beiwert</translation>
    </message>
    <message>
        <source>size of the section</source>
        <translation>Abmessung des Querschnitts</translation>
    </message>
    <message>
        <source>project</source>
        <translation>Projekt</translation>
    </message>
    <message>
        <source>subject</source>
        <translation>Gegenstand</translation>
    </message>
    <message>
        <source>number</source>
        <translation>Nummer</translation>
    </message>
    <message>
        <source>revision</source>
        <translation>Stand</translation>
    </message>
    <message>
        <source>prepared</source>
        <translation>aufgestellt</translation>
    </message>
    <message>
        <source>state that was prepared</source>
        <translation>aufgestellter Bearbeitungsstand</translation>
    </message>
    <message>
        <source>checked</source>
        <translation>geprüft</translation>
    </message>
    <message>
        <source>state that was checked</source>
        <translation>geprüfter Bearbeitungsstand</translation>
    </message>
    <message>
        <source>date</source>
        <translation>Datum</translation>
    </message>
    <message>
        <source>purpose</source>
        <translation>Zweck</translation>
    </message>
    <message>
        <source>notes</source>
        <translation>Notizen</translation>
    </message>
    <message>
        <source>unit of stress</source>
        <translation>Einheit der Spannung</translation>
    </message>
    <message>
        <source>unit of force</source>
        <translation>Einheit der Kraft</translation>
    </message>
    <message>
        <source>unit of length</source>
        <translation>Einheit der Länge</translation>
    </message>
    <message>
        <source>unit of moment</source>
        <translation>Einheit des Moments</translation>
    </message>
    <message>
        <source>positive normal stress</source>
        <translation>positive Normalspannung</translation>
    </message>
    <message>
        <source>shear axis of the circle</source>
        <translation>Schubachse des Kreises</translation>
    </message>
    <message>
        <source>sense of V_{y}</source>
        <translation>Richtungssinn von V_{y}</translation>
    </message>
    <message>
        <source>name of the case</source>
        <translation>Name des Lastfalls</translation>
    </message>
    <message>
        <source>nature of the action</source>
        <translation>Art der Einwirkung</translation>
    </message>
    <message>
        <source>duration of the action</source>
        <translation>Dauer der Einwirkung</translation>
    </message>
    <message>
        <source>cases never together with this</source>
        <translation>Lastfälle, nie zusammen mit diesem</translation>
    </message>
    <message>
        <source>basis of the combination</source>
        <translation>Basis der Kombination</translation>
    </message>
    <message>
        <source>kind of material</source>
        <translation>Art des Materials</translation>
    </message>
    <message>
        <source>source of the strengths</source>
        <translation>Quelle der Festigkeiten</translation>
    </message>
    <message>
        <source>edition of the source</source>
        <translation>Ausgabe der Quelle</translation>
    </message>
    <message>
        <source>how the strengths were read</source>
        <translation>Art der Entnahme der Festigkeiten</translation>
    </message>
    <message>
        <source>basis of the strengths</source>
        <translation>Basis der Festigkeiten</translation>
    </message>
    <message>
        <source>strength along the line in tension</source>
        <translation>Zugfestigkeit längs der Linie</translation>
    </message>
    <message>
        <source>strength along the line in compression</source>
        <translation>Druckfestigkeit längs der Linie</translation>
    </message>
    <message>
        <source>strength along the line in bending</source>
        <translation>Biegefestigkeit längs der Linie</translation>
    </message>
    <message>
        <source>strength across the line in tension</source>
        <translation>Zugfestigkeit quer zur Linie</translation>
    </message>
    <message>
        <source>strength across the line in compression</source>
        <translation>Druckfestigkeit quer zur Linie</translation>
    </message>
    <message>
        <source>strength in shear</source>
        <translation>Schubfestigkeit</translation>
    </message>
    <message>
        <source>strength in tension</source>
        <translation>Zugfestigkeit</translation>
    </message>
    <message>
        <source>strength in compression</source>
        <translation>Druckfestigkeit</translation>
    </message>
    <message>
        <source>cohesion</source>
        <translation>Kohäsion</translation>
    </message>
    <message>
        <source>angle of friction</source>
        <translation>Reibungswinkel</translation>
    </message>
    <message>
        <source>greatest tension across the plane</source>
        <translation>größter Zug quer zur Ebene</translation>
    </message>
    <message>
        <source>seam</source>
        <translation>Nahtart</translation>
    </message>
    <message>
        <source>partial factor</source>
        <translation>Teilsicherheitsbeiwert</translation>
    </message>
    <message>
        <source>factor of the strengths</source>
        <translation>Beiwert der Festigkeiten</translation>
    </message>
    <message>
        <source>service class</source>
        <translation>Nutzungsklasse</translation>
    </message>
    <message>
        <source>factor of permanent loads</source>
        <translation>Beiwert für ständige Lasten</translation>
    </message>
    <message>
        <source>factor of long loads</source>
        <translation>Beiwert für lange Lasten</translation>
    </message>
    <message>
        <source>factor of medium loads</source>
        <translation>Beiwert für mittlere Lasten</translation>
    </message>
    <message>
        <source>factor of short loads</source>
        <translation>Beiwert für kurze Lasten</translation>
    </message>
    <message>
        <source>factor of instantaneous loads</source>
        <translation>Beiwert für sehr kurze Lasten</translation>
    </message>
    <message>
        <source>shape of the section</source>
        <translation>Form des Querschnitts</translation>
    </message>
    <message>
        <source>note</source>
        <translation>Anmerkung</translation>
    </message>
    <message>
        <source>inclination of the member</source>
        <translation>Neigung des Stabs</translation>
    </message>
    <message>
        <source>section of the fibre</source>
        <translation>Querschnitt der Stelle</translation>
    </message>
    <message>
        <source>face that is looked at</source>
        <translation>Blickrichtung</translation>
    </message>
    <message>
        <source>direction of a free edge</source>
        <translation>Richtung eines freien Rands</translation>
    </message>
    <message>
        <source>ends of the vessel</source>
        <translation>Enden des Behälters</translation>
    </message>
    <message>
        <source>material under the gauges</source>
        <translation>Material unter den Messgittern</translation>
    </message>
    <message>
        <source>kind of line</source>
        <translation>Art der Linie</translation>
    </message>
    <message>
        <source>angle of the line</source>
        <translation>Winkel der Linie</translation>
    </message>
    <message>
        <source>tolerance of the line&apos;s angle</source>
        <translation>Toleranz des Winkels der Linie</translation>
    </message>
    <message>
        <source>normal of the plane</source>
        <translation>Normale der Ebene</translation>
    </message>
    <message>
        <source>tolerance of the normal</source>
        <translation>Toleranz der Normalen</translation>
    </message>
    <message>
        <source>material of the check</source>
        <translation>Material des Nachweises</translation>
    </message>
    <message>
        <source>criterion</source>
        <translation>Kriterium</translation>
    </message>
    <message>
        <source>line of the check</source>
        <translation>Linie des Nachweises</translation>
    </message>
    <message>
        <source>plane of the check</source>
        <translation>Ebene des Nachweises</translation>
    </message>
    <message>
        <source>direction of the edge</source>
        <translation>Richtung des Rands</translation>
    </message>
    <message>
        <source>normal of the reading plane</source>
        <translation>Normale der Ableseebene</translation>
    </message>
    <message>
        <source>shown point</source>
        <translation>gezeigter Punkt</translation>
    </message>
    <message>
        <source>shown combination</source>
        <translation>gezeigte Kombination</translation>
    </message>
    <message>
        <source>digits of stresses</source>
        <translation>Stellenzahl der Spannungen</translation>
    </message>
</context>
<context>
    <name>Planes</name>
    <message>
        <source>In this state every direction is such a plane.</source>
        <translation>In diesem Zustand ist jede Richtung eine solche Ebene.</translation>
    </message>
    <message>
        <source>turn of the reading plane</source>
        <translation>Drehung der Ableseebene</translation>
    </message>
</context>
<context>
    <name>Problem</name>
    <message>
        <source>line %1, column %2</source>
        <translation>Zeile %1, Spalte %2</translation>
    </message>
    <message>
        <source>line %1</source>
        <translation>Zeile %1</translation>
    </message>
    <message>
        <source>column %1</source>
        <translation>Spalte %1</translation>
    </message>
</context>
<context>
    <name>Program</name>
    <message>
        <source>The program&apos;s own font does not load. The program is damaged: build or install it again.</source>
        <translation>Die eigene Schrift des Programms lässt sich nicht laden. Das Programm ist beschädigt: neu erstellen oder neu installieren.</translation>
    </message>
</context>
<context>
    <name>Readout</name>
    <message>
        <source>Stresses in %1, %2. Angles from +x, counter-clockwise, seen from +z.</source>
        <translation>Spannungen in %1, %2. Winkel ab +x, gegen den Uhrzeigersinn, gesehen von +z.</translation>
    </message>
    <message>
        <source>Stresses at single points, not a design check: the code in force and a licensed engineer decide.</source>
        <translation>Spannungen in einzelnen Punkten, kein Bemessungsnachweis: Es entscheiden die geltende Norm und zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>Point %1</source>
        <translation>Punkt %1</translation>
    </message>
    <message>
        <source>Governing among those judged: %1, point %2, check %3, %4</source>
        <translation>Maßgebend unter den beurteilten: %1, Punkt %2, Nachweis %3, %4</translation>
    </message>
    <message>
        <source>Governing: %1, point %2, check %3, %4</source>
        <translation>Maßgebend: %1, Punkt %2, Nachweis %3, %4</translation>
    </message>
    <message>
        <source>Check %1: %2</source>
        <translation>Nachweis %1: %2</translation>
    </message>
    <message>
        <source>Limit: %1 (%2)</source>
        <translation>Grenzbedingung: %1 (%2)</translation>
    </message>
    <message>
        <source>Caution: %1</source>
        <translation>Achtung: %1</translation>
    </message>
    <message>
        <source>Working of the check in %1, tension positive</source>
        <translation>Rechengang des Nachweises in %1, Zug positiv</translation>
    </message>
    <message>
        <source>%1 (%2)</source>
        <translation>%1 (%2)</translation>
    </message>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>Mode: %1</source>
        <translation>Versagensart: %1</translation>
    </message>
    <message>
        <source>Greatest %1: %2, point %3, %4</source>
        <translation>Größter Wert für %1: %2, Punkt %3, %4</translation>
    </message>
    <message>
        <source>shear in the plane</source>
        <translation>Schub in der Ebene</translation>
    </message>
    <message>
        <source>Line %1</source>
        <translation>Linie %1</translation>
    </message>
    <message>
        <source>Line %1 (%2)</source>
        <translation>Linie %1 (%2)</translation>
    </message>
    <message>
        <source>%1: %2, given as %3, without tolerance</source>
        <translation>%1: %2, eingegeben als %3, ohne Toleranz</translation>
    </message>
    <message>
        <source>%1: %2 ± %3, given as %4</source>
        <translation>%1: %2 ± %3, eingegeben als %4</translation>
    </message>
    <message>
        <source>Free edge at %1</source>
        <translation>Freier Rand bei %1</translation>
    </message>
    <message>
        <source>Over all combinations</source>
        <translation>Über alle Kombinationen</translation>
    </message>
    <message>
        <source>Case %1: %2</source>
        <translation>Lastfall %1: %2</translation>
    </message>
    <message>
        <source>Limit: %1</source>
        <translation>Einschränkung: %1</translation>
    </message>
    <message>
        <source>Case %1 in all</source>
        <translation>Lastfall %1 insgesamt</translation>
    </message>
    <message>
        <source>Sources are worked out with tension positive; here the study counts compression positive.</source>
        <translation>Die Quellen der Spannungen werden mit Zug positiv berechnet; in dieser Studie zählt Druck positiv.</translation>
    </message>
    <message>
        <source>Combination %1</source>
        <translation>Kombination %1</translation>
    </message>
    <message>
        <source>Case %1</source>
        <translation>Lastfall %1</translation>
    </message>
    <message>
        <source>Case %1 alone</source>
        <translation>Lastfall %1 allein</translation>
    </message>
    <message>
        <source>left on the free edge: σ_{n} = %1, τ_{nt} = %2</source>
        <translation>am freien Rand verbleiben: σ_{n} = %1, τ_{nt} = %2</translation>
    </message>
    <message>
        <source>Working (formulas: %1)</source>
        <translation>Rechengang (Formeln: %1)</translation>
    </message>
    <message>
        <source>Case %1 has stresses here, but no combination has it.</source>
        <translation>Lastfall %1 hat hier Spannungen, kommt aber in keiner Kombination vor.</translation>
    </message>
    <message>
        <source>No stresses are given for case %1: it counts as 0.</source>
        <translation>Für Lastfall %1 sind keine Spannungen angegeben: Er zählt als 0.</translation>
    </message>
    <message>
        <source>The name “%1” says other factors than the combination has: %2.</source>
        <translation>Der Name „%1“ nennt andere Beiwerte, als die Kombination hat: %2.</translation>
    </message>
    <message>
        <source>Least and greatest values count 0 for %1: none of its cases is listed here.</source>
        <translation>Kleinste und größte Werte enthalten 0 für %1: Keiner der zugehörigen Lastfälle ist hier aufgeführt.</translation>
    </message>
    <message>
        <source>%1 and %2 more</source>
        <translation>%1 und %2 weitere</translation>
    </message>
    <message>
        <source>typed</source>
        <translation>eingegeben</translation>
    </message>
    <message>
        <source>axial</source>
        <translation>axial</translation>
    </message>
    <message>
        <source>bending</source>
        <translation>Biegung</translation>
    </message>
    <message>
        <source>measured</source>
        <translation>gemessen</translation>
    </message>
    <message>
        <source>of σ_{x} (%1): %2</source>
        <translation>Anteile von σ_{x} (%1): %2</translation>
    </message>
</context>
<context>
    <name>Rosette</name>
    <message>
        <source>the same in all directions</source>
        <translation>in allen Richtungen gleich</translation>
    </message>
    <message>
        <source>with a line</source>
        <translation>mit Linie</translation>
    </message>
</context>
<context>
    <name>Route</name>
    <message>
        <source>reading plane</source>
        <translation>Ableseebene</translation>
    </message>
    <message>
        <source>trace σ_{1} + σ_{2}</source>
        <translation>Spur σ_{1} + σ_{2}</translation>
    </message>
    <message>
        <source>determinant σ_{1} σ_{2}</source>
        <translation>Determinante σ_{1} σ_{2}</translation>
    </message>
    <message>
        <source>σ on the plane at θ_{1}</source>
        <translation>σ auf der Ebene bei θ_{1}</translation>
    </message>
    <message>
        <source>τ on the plane at θ_{1}</source>
        <translation>τ auf der Ebene bei θ_{1}</translation>
    </message>
    <message>
        <source>greatest τ_{nt}</source>
        <translation>größtes τ_{nt}</translation>
    </message>
    <message>
        <source>σ_{n}, %1</source>
        <translation>σ_{n}, %1</translation>
    </message>
    <message>
        <source>τ_{nt}, %1</source>
        <translation>τ_{nt}, %1</translation>
    </message>
    <message>
        <source>along the %1</source>
        <translation>längs der Linie %1</translation>
    </message>
    <message>
        <source>across the %1</source>
        <translation>quer zur Linie %1</translation>
    </message>
    <message>
        <source>shear in the axes of the %1</source>
        <translation>Schub in den Achsen der Linie %1</translation>
    </message>
    <message>
        <source>%1: utilisation at the load multiplier</source>
        <translation>%1: Ausnutzung beim Lastmultiplikator</translation>
    </message>
    <message>
        <source>%1: worst in the band is reached by no direction of a scan</source>
        <translation>%1: ungünstigster Wert im Toleranzbereich, von keiner abgetasteten Richtung übertroffen</translation>
    </message>
</context>
<context>
    <name>Screen</name>
    <message>
        <source>From %1, line %2.</source>
        <translation>Aus %1, Zeile %2.</translation>
    </message>
    <message>
        <source>Open one that has all cases that act.</source>
        <translation>Einen öffnen, der alle wirkenden Lastfälle hat.</translation>
    </message>
    <message>
        <source>it judges a plane, and a field is judged along a line</source>
        <translation>er beurteilt eine Ebene, ein Punktfeld wird längs einer Linie beurteilt</translation>
    </message>
    <message>
        <source>its criterion knows no line</source>
        <translation>sein Kriterium kennt keine Linie</translation>
    </message>
    <message>
        <source>its criterion is for uniaxial stress only, which the points of a field rarely have</source>
        <translation>sein Kriterium gilt nur für einachsige Spannung, die in den Punkten eines Punktfelds selten ist</translation>
    </message>
    <message>
        <source>The point has no check “%1”.</source>
        <translation>Der Punkt hat keinen Nachweis „%1“.</translation>
    </message>
    <message>
        <source>Take one that it has.</source>
        <translation>Einen wählen, den er hat.</translation>
    </message>
    <message>
        <source>The point has no check to judge a field by.</source>
        <translation>Der Punkt hat keinen Nachweis, mit dem ein Punktfeld zu beurteilen ist.</translation>
    </message>
    <message>
        <source>Give it a check of a line: material, criterion and line.</source>
        <translation>Dem Punkt einen Nachweis an einer Linie geben: Material, Kriterium und Linie.</translation>
    </message>
    <message>
        <source>No check of the point can judge a field: %1.</source>
        <translation>Kein Nachweis des Punkts kann ein Punktfeld beurteilen: %1.</translation>
    </message>
    <message>
        <source>Take a criterion of combined stresses along a line, such as sum-of-squares.</source>
        <translation>Ein Kriterium für kombinierte Spannungen längs einer Linie nehmen, etwa sum-of-squares.</translation>
    </message>
    <message>
        <source>Judged by point %1, over %2 combinations.</source>
        <translation>Beurteilt nach Punkt %1, über %2 Kombinationen.</translation>
    </message>
    <message>
        <source>Check %1: %2, line %3 ± %4</source>
        <translation>Nachweis %1: %2, Linie %3 ± %4</translation>
    </message>
    <message>
        <source>Check %1 is not used: %2.</source>
        <translation>Nachweis %1 wird nicht verwendet: %2.</translation>
    </message>
    <message>
        <source>Rows: %1, of them faulty and left out: %2, of these not finite: %3.</source>
        <translation>Zeilen: %1, davon fehlerhaft und weggelassen: %2, davon nicht endlich: %3.</translation>
    </message>
    <message>
        <source>Points left out by “%1”: %2</source>
        <translation>Punkte, weggelassen durch „%1“: %2</translation>
    </message>
    <message>
        <source>Column not read: %1</source>
        <translation>Nicht gelesene Spalte: %1</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>layer</source>
        <translation>Lage</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>load multiplier</source>
        <translation>Lastmultiplikator</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>mode</source>
        <translation>Versagensart</translation>
    </message>
    <message>
        <source>worst angle</source>
        <translation>ungünst. Winkel</translation>
    </message>
    <message>
        <source>Worst points:</source>
        <translation>Ungünstigste Punkte:</translation>
    </message>
    <message>
        <source>Points by utilisation:</source>
        <translation>Punkte nach Ausnutzung:</translation>
    </message>
    <message>
        <source>above %1</source>
        <translation>über %1</translation>
    </message>
    <message>
        <source>up to %1</source>
        <translation>bis %1</translation>
    </message>
    <message>
        <source>Caution: %1</source>
        <translation>Achtung: %1</translation>
    </message>
    <message>
        <source>Points: %1, judged: %2, incomplete and not judged: %3, left out on request: %4.</source>
        <translation>Punkte: %1, beurteilt: %2, unvollständig und nicht beurteilt: %3, auf Wunsch weggelassen: %4.</translation>
    </message>
    <message>
        <source>Exceeding: %1 of %2 judged points.</source>
        <translation>Überschritten: %1 von %2 beurteilten Punkten.</translation>
    </message>
    <message>
        <source>Greatest utilisation: %1 at point %2; 99.9 % of the points do not exceed %3.</source>
        <translation>Größte Ausnutzung: %1 in Punkt %2; 99.9 % der Punkte überschreiten %3 nicht.</translation>
    </message>
    <message>
        <source>Where these are far apart the greatest stands for few points, as at a singular corner, and is no verdict by itself.</source>
        <translation>Liegen diese Werte weit auseinander, steht der größte nur für wenige Punkte, wie an einer singulären Ecke, und ist für sich kein Ergebnis.</translation>
    </message>
    <message>
        <source>There is no such file.</source>
        <translation>Diese Datei gibt es nicht.</translation>
    </message>
    <message>
        <source>Choose a table as CSV.</source>
        <translation>Eine Tabelle als CSV wählen.</translation>
    </message>
    <message>
        <source>This is no table in UTF-8.</source>
        <translation>Das ist keine Tabelle in UTF-8.</translation>
    </message>
    <message>
        <source>Export it as CSV in UTF-8.</source>
        <translation>Als CSV in UTF-8 exportieren.</translation>
    </message>
    <message>
        <source>Rows with a fault: %1 of %2; points that lack something: %3 of %4.</source>
        <translation>Fehlerhafte Zeilen: %1 von %2; unvollständige Punkte: %3 von %4.</translation>
    </message>
    <message>
        <source>Mend them, or go on without them by “Leave faulty rows out”.</source>
        <translation>Sie berichtigen oder mit „Fehlerhafte Zeilen weglassen“ ohne sie fortfahren.</translation>
    </message>
    <message>
        <source>The table has no point and no region “%1”.</source>
        <translation>Die Tabelle hat keinen Punkt und keinen Bereich „%1“.</translation>
    </message>
    <message>
        <source>Write the name as it stands there, or its beginning with a star: “corner*”.</source>
        <translation>Den Namen schreiben, wie er dort steht, oder seinen Anfang mit einem Stern: „corner*“.</translation>
    </message>
    <message>
        <source>No point of the table is left to be judged.</source>
        <translation>In der Tabelle bleibt kein Punkt, der zu beurteilen ist.</translation>
    </message>
    <message>
        <source>Give each point all cases that act in a combination.</source>
        <translation>Jedem Punkt alle Lastfälle geben, die in einer Kombination wirken.</translation>
    </message>
    <message>
        <source>The table does not fit into the memory of this machine.</source>
        <translation>Die Tabelle passt nicht in den Speicher dieses Rechners.</translation>
    </message>
    <message>
        <source>Screen it in parts, or close other programs.</source>
        <translation>In Teilen prüfen oder andere Programme schließen.</translation>
    </message>
</context>
<context>
    <name>Section</name>
    <message>
        <source>%1 %2</source>
        <translation>%1 %2</translation>
    </message>
</context>
<context>
    <name>Sheet</name>
    <message>
        <source>inputs and results</source>
        <translation>Eingaben und Ergebnisse</translation>
    </message>
    <message>
        <source>working of what governs</source>
        <translation>Rechengang der maßgebenden Kombination</translation>
    </message>
    <message>
        <source>working of all combinations</source>
        <translation>Rechengang aller Kombinationen</translation>
    </message>
    <message>
        <source>Not judged: %1, check %2</source>
        <translation>Nicht beurteilt: %1, Nachweis %2</translation>
    </message>
    <message>
        <source>Utilisation %1: %2, check %3</source>
        <translation>Ausnutzung %1: %2, Nachweis %3</translation>
    </message>
    <message>
        <source>Greatest %1: %2, %3</source>
        <translation>Größter Wert für %1: %2, %3</translation>
    </message>
    <message>
        <source>shear in the plane</source>
        <translation>Schub in der Ebene</translation>
    </message>
    <message>
        <source>Purpose, method and conventions</source>
        <translation>Zweck, Verfahren und Vereinbarungen</translation>
    </message>
    <message>
        <source>Purpose: not stated.</source>
        <translation>Zweck: nicht angegeben.</translation>
    </message>
    <message>
        <source>Purpose: %1</source>
        <translation>Zweck: %1</translation>
    </message>
    <message>
        <source>Assumptions and notes: %1</source>
        <translation>Annahmen und Notizen: %1</translation>
    </message>
    <message>
        <source>Method: the stresses of each load case at a point are summed over the combinations, transformed to the planes and lines that matter (plane stress, small displacements) and held against strengths in those directions, the direction of a line over the whole of its tolerance.</source>
        <translation>Verfahren: Die Spannungen jedes Lastfalls in einem Punkt werden über die Kombinationen summiert, auf die maßgebenden Ebenen und Linien transformiert (ebener Spannungszustand, kleine Verschiebungen) und den Festigkeiten in diesen Richtungen gegenübergestellt, die Richtung einer Linie über ihre ganze Toleranz.</translation>
    </message>
    <message>
        <source>Positive: %1. τ_{xy} acts on the +x face in the direction of +y. Angles from +x, counter-clockwise, seen from +z; a plane is named by its normal, the cut itself runs at 90° to it. Cuts cross or follow a line; stresses act along or across it.</source>
        <translation>Vorzeichen: %1. τ_{xy} wirkt auf der +x-Fläche in Richtung +y. Winkel ab +x, gegen den Uhrzeigersinn, gesehen von +z; eine Ebene wird durch ihre Normale bezeichnet, der Schnitt selbst verläuft unter 90° dazu. Schnitte verlaufen quer zu einer Linie oder entlang der Linie; Spannungen wirken längs oder quer dazu.</translation>
    </message>
    <message>
        <source>Rounding: results have four significant digits of the greatest stress of their state, numbers put in at least one digit more, and as many as the result needs where terms cancel. Utilisations are rounded upwards, load multipliers downwards. The program calculates with about 16 digits.</source>
        <translation>Rundung: Ergebnisse haben vier signifikante Stellen der größten Spannung ihres Zustands, eingesetzte Zahlen mindestens eine Stelle mehr und so viele, wie das Ergebnis braucht, wo sich Glieder aufheben. Ausnutzungen werden aufgerundet, Lastmultiplikatoren abgerundet. Das Programm rechnet mit etwa 16 Stellen.</translation>
    </message>
    <message>
        <source>Shown: %1; %2.</source>
        <translation>Dargestellt: %1; %2.</translation>
    </message>
    <message>
        <source>all points of the study</source>
        <translation>alle Punkte der Studie</translation>
    </message>
    <message>
        <source>chosen points of the study</source>
        <translation>ausgewählte Punkte der Studie</translation>
    </message>
    <message>
        <source>study %1 · Planewright %2</source>
        <translation>Studie %1 · Planewright %2</translation>
    </message>
    <message>
        <source>Sees single points in plane stress: not volume, size, moisture, notches. Local codes and a licensed engineer decide.</source>
        <translation>Nur Punkte, ebene Spannung: ohne Volumen, Größe, Feuchte, Kerben. Örtliche Normen und zugelassene Ingenieurinnen und Ingenieure entscheiden.</translation>
    </message>
    <message>
        <source>Prepared</source>
        <translation>Aufgestellt</translation>
    </message>
    <message>
        <source>Checked</source>
        <translation>Geprüft</translation>
    </message>
    <message>
        <source>Date</source>
        <translation>Datum</translation>
    </message>
    <message>
        <source>Second route agrees within %1.</source>
        <translation>Zweiter Rechenweg stimmt auf %1 überein.</translation>
    </message>
    <message>
        <source>The two routes disagree by %1: do not use this sheet.</source>
        <translation>Die beiden Rechenwege weichen um %1 voneinander ab: dieses Blatt nicht verwenden.</translation>
    </message>
    <message>
        <source>Point, combination</source>
        <translation>Punkt, Kombination</translation>
    </message>
    <message>
        <source>Quantity</source>
        <translation>Größe</translation>
    </message>
    <message>
        <source>First route</source>
        <translation>Erster Weg</translation>
    </message>
    <message>
        <source>Second route</source>
        <translation>Zweiter Weg</translation>
    </message>
    <message>
        <source>Difference</source>
        <translation>Abweichung</translation>
    </message>
    <message>
        <source>Second route within this program</source>
        <translation>Zweiter Rechenweg in diesem Programm</translation>
    </message>
    <message>
        <source>Every result is worked out again by another way: the stress tensor as a matrix, summed over the cases, turned by rotation matrices, its principal values by an eigenvalue solver; trace and determinant; the state times its load multiplier, which must stand at the limit; a scan of each band, which must find nothing worse. It reads the same study and is no substitute for a checking person.</source>
        <translation>Jedes Ergebnis wird auf einem anderen Weg noch einmal berechnet: der Spannungstensor als Matrix, über die Lastfälle summiert, mit Drehmatrizen gedreht, seine Hauptwerte mit einem Eigenwertlöser; Spur und Determinante; der Zustand mal seinem Lastmultiplikator, der genau an der Grenze liegen muss; eine Abtastung jedes Toleranzbereichs, die nichts Ungünstigeres finden darf. Gelesen wird dieselbe Studie; das ersetzt keine prüfende Person.</translation>
    </message>
    <message>
        <source>Where the two routes disagree</source>
        <translation>Wo die beiden Rechenwege abweichen</translation>
    </message>
    <message>
        <source>Both routes at %1</source>
        <translation>Beide Rechenwege bei %1</translation>
    </message>
    <message>
        <source>Differences are parts of the size of the terms. Compared: %1 results.</source>
        <translation>Abweichungen sind auf die Größe der Glieder bezogen. Verglichen: %1 Ergebnisse.</translation>
    </message>
    <message>
        <source>Changes since another revision</source>
        <translation>Änderungen gegenüber einem anderen Stand</translation>
    </message>
    <message>
        <source>another study</source>
        <translation>einer anderen Studie</translation>
    </message>
    <message>
        <source>Compared with %1, revision “%2”, study %3.</source>
        <translation>Verglichen mit %1, Stand „%2“, Studie %3.</translation>
    </message>
    <message>
        <source>Nothing differs.</source>
        <translation>Keine Unterschiede.</translation>
    </message>
    <message>
        <source>None.</source>
        <translation>Keine.</translation>
    </message>
    <message>
        <source>What</source>
        <translation>Was</translation>
    </message>
    <message>
        <source>Was</source>
        <translation>Vorher</translation>
    </message>
    <message>
        <source>Is now</source>
        <translation>Jetzt</translation>
    </message>
    <message>
        <source>Inputs that differ</source>
        <translation>Abweichende Eingaben</translation>
    </message>
    <message>
        <source>Results that differ</source>
        <translation>Abweichende Ergebnisse</translation>
    </message>
    <message>
        <source>Conclusion</source>
        <translation>Schlussfolgerung</translation>
    </message>
    <message>
        <source>Point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>Check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>Verdict</source>
        <translation>Ergebnis</translation>
    </message>
    <message>
        <source>Combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>Point %1 has no check: its stresses are reported, not judged.</source>
        <translation>Punkt %1 hat keinen Nachweis: Seine Spannungen werden angegeben, nicht beurteilt.</translation>
    </message>
    <message>
        <source>Cautions</source>
        <translation>Hinweise</translation>
    </message>
    <message>
        <source>What is not covered</source>
        <translation>Was nicht erfasst ist</translation>
    </message>
    <message>
        <source>The sheet sees stresses at single points in plane stress, found elsewhere and taken as given. It does not see the volume that is stressed, gradients, notches and corners, moisture, temperature, fatigue, creep, stability, stress through the thickness beyond σ_{z}, nor whether the load cases are complete. The code in force and a licensed engineer decide.</source>
        <translation>Das Blatt erfasst Spannungen in einzelnen Punkten im ebenen Spannungszustand, die anderswo ermittelt und als gegeben übernommen sind. Es erfasst nicht das beanspruchte Volumen, Spannungsgradienten, Kerben und Ecken, Feuchte, Temperatur, Ermüdung, Kriechen, Stabilität, Spannungen in Dickenrichtung außer σ_{z} und auch nicht, ob die Lastfälle vollständig sind. Es entscheiden die geltende Norm und zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>Signatures</source>
        <translation>Unterschriften</translation>
    </message>
    <message>
        <source>Calculation sheet</source>
        <translation>Rechenblatt</translation>
    </message>
    <message>
        <source>Project</source>
        <translation>Projekt</translation>
    </message>
    <message>
        <source>Number</source>
        <translation>Nummer</translation>
    </message>
    <message>
        <source>Revision</source>
        <translation>Stand</translation>
    </message>
    <message>
        <source>Subject</source>
        <translation>Gegenstand</translation>
    </message>
    <message>
        <source>Given, as typed</source>
        <translation>Vorgaben, wie eingegeben</translation>
    </message>
    <message>
        <source>Load case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>Name</source>
        <translation>Name</translation>
    </message>
    <message>
        <source>Nature</source>
        <translation>Art</translation>
    </message>
    <message>
        <source>Duration</source>
        <translation>Dauer</translation>
    </message>
    <message>
        <source>Never with</source>
        <translation>Nie mit</translation>
    </message>
    <message>
        <source>Load cases and combinations</source>
        <translation>Lastfälle und Kombinationen</translation>
    </message>
    <message>
        <source>No combinations are given: each case is judged with factor 1.</source>
        <translation>Es sind keine Kombinationen angegeben: Jeder Lastfall wird mit Beiwert 1 beurteilt.</translation>
    </message>
    <message>
        <source>Factors as typed</source>
        <translation>Beiwerte, wie eingegeben</translation>
    </message>
    <message>
        <source>Basis</source>
        <translation>Basis</translation>
    </message>
    <message>
        <source>As typed</source>
        <translation>Eingabe</translation>
    </message>
    <message>
        <source>Value</source>
        <translation>Wert</translation>
    </message>
    <message>
        <source>Section %1: %2</source>
        <translation>Querschnitt %1: %2</translation>
    </message>
    <message>
        <source>%1, %2</source>
        <translation>%1, %2</translation>
    </message>
    <message>
        <source>block %1: %2</source>
        <translation>Block %1: %2</translation>
    </message>
    <message>
        <source>Material %1: %2</source>
        <translation>Material %1: %2</translation>
    </message>
    <message>
        <source>Basis: %1.</source>
        <translation>Basis: %1.</translation>
    </message>
    <message>
        <source>Source: %1.</source>
        <translation>Quelle: %1.</translation>
    </message>
    <message>
        <source>Edition: %1.</source>
        <translation>Ausgabe: %1.</translation>
    </message>
    <message>
        <source>How it was read: %1.</source>
        <translation>Art der Entnahme: %1.</translation>
    </message>
    <message>
        <source>Point %1</source>
        <translation>Punkt %1</translation>
    </message>
    <message>
        <source>case %1: %2</source>
        <translation>Lastfall %1: %2</translation>
    </message>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>What is not listed is 0.</source>
        <translation>Was nicht aufgeführt ist, ist 0.</translation>
    </message>
    <message>
        <source>A4</source>
        <translation>A4</translation>
    </message>
    <message>
        <source>Letter</source>
        <translation>Letter</translation>
    </message>
    <message>
        <source>Page</source>
        <translation>Seite</translation>
    </message>
    <message>
        <source>%1 of %2</source>
        <translation>%1 von %2</translation>
    </message>
    <message>
        <source>Element and circle: %1</source>
        <translation>Spannungselement und Kreis: %1</translation>
    </message>
    <message>
        <source>Case %1: %2</source>
        <translation>Lastfall %1: %2</translation>
    </message>
    <message>
        <source>Limit: %1</source>
        <translation>Einschränkung: %1</translation>
    </message>
    <message>
        <source>Case %1 in all</source>
        <translation>Lastfall %1 insgesamt</translation>
    </message>
    <message>
        <source>Governing: %1</source>
        <translation>Maßgebend: %1</translation>
    </message>
    <message>
        <source>Combination %1</source>
        <translation>Kombination %1</translation>
    </message>
    <message>
        <source>Caution: %1</source>
        <translation>Achtung: %1</translation>
    </message>
    <message>
        <source>Check %1 in %2: %3</source>
        <translation>Nachweis %1 in %2: %3</translation>
    </message>
    <message>
        <source>Limit: %1 (%2)</source>
        <translation>Grenzbedingung: %1 (%2)</translation>
    </message>
    <message>
        <source>Meant for: %1</source>
        <translation>Gültig für: %1</translation>
    </message>
    <message>
        <source>Not judged: %1 %2</source>
        <translation>Nicht beurteilt: %1 %2</translation>
    </message>
    <message>
        <source>Mode: %1</source>
        <translation>Versagensart: %1</translation>
    </message>
    <message>
        <source>along</source>
        <translation>längs</translation>
    </message>
    <message>
        <source>across</source>
        <translation>quer</translation>
    </message>
    <message>
        <source>shear</source>
        <translation>Schub</translation>
    </message>
    <message>
        <source>All combinations (%1)</source>
        <translation>Alle Kombinationen (%1)</translation>
    </message>
    <message>
        <source>Along, across and shear are those of the %1.</source>
        <translation>Längs, quer und Schub gelten für die Linie %1.</translation>
    </message>
    <message>
        <source>Utilisation in all combinations, the worst of each band</source>
        <translation>Ausnutzung in allen Kombinationen, ungünstigster Wert je Toleranzbereich</translation>
    </message>
    <message>
        <source>Least and greatest over all combinations</source>
        <translation>Kleinste und größte Werte über alle Kombinationen</translation>
    </message>
    <message>
        <source>[Figure] %1</source>
        <translation>[Abbildung] %1</translation>
    </message>
    <message>
        <source>Sources of the formulas</source>
        <translation>Quellen der Formeln</translation>
    </message>
</context>
<context>
    <name>Signing</name>
    <message>
        <source>%1, for an unknown state</source>
        <translation>%1, für unbekannten Bearbeitungsstand</translation>
    </message>
    <message>
        <source>%1, changed since prepared</source>
        <translation>%1, seit der Aufstellung geändert</translation>
    </message>
    <message>
        <source>%1, changed since checked</source>
        <translation>%1, seit der Prüfung geändert</translation>
    </message>
</context>
<context>
    <name>Slip</name>
    <message>
        <source>σ_{n} on the reading plane</source>
        <translation>σ_{n} auf der Ableseebene</translation>
    </message>
    <message>
        <source>τ_{nt} on the reading plane</source>
        <translation>τ_{nt} auf der Ableseebene</translation>
    </message>
    <message>
        <source>stress along the line</source>
        <translation>Spannung längs der Linie</translation>
    </message>
    <message>
        <source>stress across the line</source>
        <translation>Spannung quer zur Linie</translation>
    </message>
    <message>
        <source>shear on the cut that crosses the line</source>
        <translation>Schub im Schnitt quer zur Linie</translation>
    </message>
    <message>
        <source>principal stress σ_{1}</source>
        <translation>Hauptspannung σ_{1}</translation>
    </message>
    <message>
        <source>principal stress σ_{2}</source>
        <translation>Hauptspannung σ_{2}</translation>
    </message>
    <message>
        <source>greatest shear in the plane</source>
        <translation>größter Schub in der Ebene</translation>
    </message>
    <message>
        <source>the angle of the line taken for that of the normal of the cut that follows it</source>
        <translation>Winkel der Linie statt des Winkels der Normalen des Schnitts entlang der Linie</translation>
    </message>
    <message>
        <source>the angle of the cut taken for that of its normal</source>
        <translation>Winkel des Schnitts statt des Winkels seiner Normalen</translation>
    </message>
    <message>
        <source>θ and 90° − θ exchanged</source>
        <translation>θ und 90° − θ vertauscht</translation>
    </message>
    <message>
        <source>the angle turned clockwise</source>
        <translation>Winkel im Uhrzeigersinn gedreht</translation>
    </message>
    <message>
        <source>θ where 2θ belongs: the doubling forgotten</source>
        <translation>θ statt 2θ: Verdopplung vergessen</translation>
    </message>
    <message>
        <source>2θ taken for θ: doubled twice</source>
        <translation>2θ statt θ: zweimal verdoppelt</translation>
    </message>
    <message>
        <source>degrees put into functions of radians</source>
        <translation>Grad in Funktionen für Bogenmaß eingesetzt</translation>
    </message>
    <message>
        <source>radians taken for degrees</source>
        <translation>Bogenmaß als Grad genommen</translation>
    </message>
    <message>
        <source>the term of τ_{xy} with half its value: sin θ cos θ where sin 2θ belongs</source>
        <translation>Glied mit τ_{xy} nur zur Hälfte: sin θ cos θ statt sin 2θ</translation>
    </message>
    <message>
        <source>the term of τ_{xy} forgotten</source>
        <translation>Glied mit τ_{xy} vergessen</translation>
    </message>
    <message>
        <source>the stress across the line taken for that along it</source>
        <translation>Spannung quer zur Linie statt der Spannung längs der Linie</translation>
    </message>
    <message>
        <source>the stress along the line taken for that across it</source>
        <translation>Spannung längs der Linie statt der Spannung quer zur Linie</translation>
    </message>
    <message>
        <source>a slope 1 in n read as n degrees</source>
        <translation>Neigung 1:n als n Grad gelesen</translation>
    </message>
    <message>
        <source>a slope taken as degrees</source>
        <translation>Neigung als Grad genommen</translation>
    </message>
    <message>
        <source>a slope in per cent read as degrees</source>
        <translation>Neigung in Prozent als Grad gelesen</translation>
    </message>
    <message>
        <source>the radius with the whole difference: √((σ_{x} − σ_{y})² + τ_{xy}²)</source>
        <translation>Radius mit der ganzen Differenz: √((σ_{x} − σ_{y})² + τ_{xy}²)</translation>
    </message>
    <message>
        <source>the radius with the mean: √(((σ_{x} + σ_{y})/2)² + τ_{xy}²)</source>
        <translation>Radius mit dem Mittelwert: √(((σ_{x} + σ_{y})/2)² + τ_{xy}²)</translation>
    </message>
    <message>
        <source>the mean without its half: σ_{x} + σ_{y}</source>
        <translation>Mittelwert nicht halbiert: σ_{x} + σ_{y}</translation>
    </message>
    <message>
        <source>σ = r ± mean in place of mean ± r</source>
        <translation>σ = r ± Mittelwert statt Mittelwert ± r</translation>
    </message>
    <message>
        <source>τ_{xy} forgotten</source>
        <translation>τ_{xy} vergessen</translation>
    </message>
    <message>
        <source>the root left out: ((σ_{x} − σ_{y})/2)² + τ_{xy}²</source>
        <translation>Wurzel weggelassen: ((σ_{x} − σ_{y})/2)² + τ_{xy}²</translation>
    </message>
    <message>
        <source>σ_{1} and σ_{2} exchanged</source>
        <translation>σ_{1} und σ_{2} vertauscht</translation>
    </message>
    <message>
        <source>the greatest shear of all planes, with the third principal stress</source>
        <translation>größter Schub aller Ebenen, mit der dritten Hauptspannung</translation>
    </message>
    <message>
        <source>the sign of τ_{xy}</source>
        <translation>Vorzeichen von τ_{xy}</translation>
    </message>
    <message>
        <source>σ_{x} and σ_{y} exchanged</source>
        <translation>σ_{x} und σ_{y} vertauscht</translation>
    </message>
    <message>
        <source>the sign of σ_{x}</source>
        <translation>Vorzeichen von σ_{x}</translation>
    </message>
    <message>
        <source>the sign of σ_{y}</source>
        <translation>Vorzeichen von σ_{y}</translation>
    </message>
    <message>
        <source>σ_{y} forgotten</source>
        <translation>σ_{y} vergessen</translation>
    </message>
    <message>
        <source>σ_{x} forgotten</source>
        <translation>σ_{x} vergessen</translation>
    </message>
    <message>
        <source>the sign of the shear: another convention, or the other face</source>
        <translation>Vorzeichen des Schubs: andere Vereinbarung oder die andere Fläche</translation>
    </message>
    <message>
        <source>the sign: compression and tension exchanged</source>
        <translation>Vorzeichen: Druck und Zug vertauscht</translation>
    </message>
    <message>
        <source>This point has no line.</source>
        <translation>Dieser Punkt hat keine Linie.</translation>
    </message>
    <message>
        <source>Give the line, or ask about a plane.</source>
        <translation>Die Linie angeben oder nach einer Ebene fragen.</translation>
    </message>
</context>
<context>
    <name>Source</name>
    <message>
        <source>Tabled values have no shape to look along.</source>
        <translation>Tabellenwerte haben keine Form, über die ein Spannungsverlauf zu bilden ist.</translation>
    </message>
    <message>
        <source>Choose a shape with sizes.</source>
        <translation>Eine Form mit Abmessungen wählen.</translation>
    </message>
    <message>
        <source>There is no material along this line through the section.</source>
        <translation>Auf dieser Geraden durch den Querschnitt liegt kein Material.</translation>
    </message>
    <message>
        <source>Take a fibre in the section.</source>
        <translation>Eine Stelle im Querschnitt wählen.</translation>
    </message>
    <message>
        <source>The %1 is not greater than 0.</source>
        <translation>Nicht größer als 0: %1.</translation>
    </message>
    <message>
        <source>Give a positive stress.</source>
        <translation>Eine positive Spannung angeben.</translation>
    </message>
    <message>
        <source>modulus of elasticity</source>
        <translation>Elastizitätsmodul</translation>
    </message>
    <message>
        <source>Poisson&apos;s ratio %1 is out of range.</source>
        <translation>Die Querdehnzahl %1 liegt außerhalb des möglichen Bereichs.</translation>
    </message>
    <message>
        <source>It lies between −1 and 0.5; for most metals near 0.3.</source>
        <translation>Sie liegt zwischen −1 und 0.5; für die meisten Metalle nahe 0.3.</translation>
    </message>
    <message>
        <source>modulus of elasticity along the line</source>
        <translation>Elastizitätsmodul längs der Linie</translation>
    </message>
    <message>
        <source>modulus of elasticity across the line</source>
        <translation>Elastizitätsmodul quer zur Linie</translation>
    </message>
    <message>
        <source>shear modulus</source>
        <translation>Schubmodul</translation>
    </message>
    <message>
        <source>With ν_{12} = %1 its square is not less than E along the line over E across it: no material is like that.</source>
        <translation>Mit ν_{12} = %1 ist dessen Quadrat nicht kleiner als E längs der Linie durch E quer dazu: Ein solches Material gibt es nicht.</translation>
    </message>
    <message>
        <source>ν_{12} is the contraction across the line when stressed along it; ν_{21} is the smaller one.</source>
        <translation>ν_{12} ist die Kontraktion quer zur Linie bei Spannung längs der Linie; ν_{21} ist die kleinere.</translation>
    </message>
    <message>
        <source>from the side (x-y plane, seen from +z)</source>
        <translation>von der Seite (x-y-Ebene, gesehen von +z)</translation>
    </message>
    <message>
        <source>from the top (x-z plane, seen from +y)</source>
        <translation>von oben (x-z-Ebene, gesehen von +y)</translation>
    </message>
    <message>
        <source>V_{y} positive upwards on the +x face</source>
        <translation>V_{y} positiv nach oben auf der +x-Fläche</translation>
    </message>
    <message>
        <source>V_{y} = dM_{z}/dx</source>
        <translation>V_{y} = dM_{z}/dx</translation>
    </message>
    <message>
        <source>extreme fibre, top</source>
        <translation>Randfaser oben</translation>
    </message>
    <message>
        <source>top corner, near face</source>
        <translation>obere Ecke, vorn</translation>
    </message>
    <message>
        <source>top corner, far face</source>
        <translation>obere Ecke, hinten</translation>
    </message>
    <message>
        <source>bottom corner, near face</source>
        <translation>untere Ecke, vorn</translation>
    </message>
    <message>
        <source>bottom corner, far face</source>
        <translation>untere Ecke, hinten</translation>
    </message>
    <message>
        <source>extreme fibre, bottom</source>
        <translation>Randfaser unten</translation>
    </message>
    <message>
        <source>top face, middle</source>
        <translation>Oberseite, Mitte</translation>
    </message>
    <message>
        <source>bottom face, middle</source>
        <translation>Unterseite, Mitte</translation>
    </message>
    <message>
        <source>upper junction, near face</source>
        <translation>oberer Anschluss, vorn</translation>
    </message>
    <message>
        <source>lower junction, near face</source>
        <translation>unterer Anschluss, vorn</translation>
    </message>
    <message>
        <source>axis, near face</source>
        <translation>Achse, vorn</translation>
    </message>
    <message>
        <source>axis, far face</source>
        <translation>Achse, hinten</translation>
    </message>
    <message>
        <source>axis, middle</source>
        <translation>Achse, Mitte</translation>
    </message>
    <message>
        <source>top flange beside the web</source>
        <translation>oberer Flansch neben dem Steg</translation>
    </message>
    <message>
        <source>bottom flange beside the web</source>
        <translation>unterer Flansch neben dem Steg</translation>
    </message>
    <message>
        <source>flange beside the web</source>
        <translation>Flansch neben dem Steg</translation>
    </message>
    <message>
        <source>Hooke&apos;s law in plane stress</source>
        <translation>Hookesches Gesetz im ebenen Spannungszustand</translation>
    </message>
    <message>
        <source>reading of gauge %1, from the strains found</source>
        <translation>Messwert von Messgitter %1, aus den ermittelten Dehnungen</translation>
    </message>
    <message>
        <source>equation of a gauge</source>
        <translation>Gleichung eines Messgitters</translation>
    </message>
    <message>
        <source>circle of strain</source>
        <translation>Mohrscher Dehnungskreis</translation>
    </message>
    <message>
        <source>greater principal strain</source>
        <translation>größere Hauptdehnung</translation>
    </message>
    <message>
        <source>lesser principal strain</source>
        <translation>kleinere Hauptdehnung</translation>
    </message>
    <message>
        <source>direction of ε_{1}</source>
        <translation>Richtung von ε_{1}</translation>
    </message>
    <message>
        <source>normal stress in x</source>
        <translation>Normalspannung in x</translation>
    </message>
    <message>
        <source>normal stress in y</source>
        <translation>Normalspannung in y</translation>
    </message>
    <message>
        <source>shear stress</source>
        <translation>Schubspannung</translation>
    </message>
    <message>
        <source>stress along the line</source>
        <translation>Spannung längs der Linie</translation>
    </message>
    <message>
        <source>stress across the line</source>
        <translation>Spannung quer zur Linie</translation>
    </message>
    <message>
        <source>shear in the axes of the line</source>
        <translation>Schub in den Achsen der Linie</translation>
    </message>
    <message>
        <source>strains in turned axes</source>
        <translation>Dehnungen in gedrehten Achsen</translation>
    </message>
    <message>
        <source>strain along the line</source>
        <translation>Dehnung längs der Linie</translation>
    </message>
    <message>
        <source>strain across the line</source>
        <translation>Dehnung quer zur Linie</translation>
    </message>
    <message>
        <source>shear strain in the axes of the line</source>
        <translation>Gleitung in den Achsen der Linie</translation>
    </message>
    <message>
        <source>The gauges are nearly parallel: an error of reading can grow %1 times.</source>
        <translation>Die Messgitter sind fast parallel: Ein Ablesefehler kann sich auf das %1-Fache vergrößern.</translation>
    </message>
    <message>
        <source>Gauges see the surface alone, and strains of temperature and moisture as well as those of stress.</source>
        <translation>Messgitter erfassen nur die Oberfläche und neben den Dehnungen aus Spannungen auch die aus Temperatur und Feuchte.</translation>
    </message>
    <message>
        <source>The principal axes of stress differ from those of strain in a material with a line.</source>
        <translation>In einem Material mit Linie weichen die Hauptachsen der Spannungen von denen der Dehnungen ab.</translation>
    </message>
    <message>
        <source>Strains are positive in extension; the directions of the gauges are counter-clockwise from +x.</source>
        <translation>Dehnungen sind bei Verlängerung positiv; die Richtungen der Messgitter zählen gegen den Uhrzeigersinn ab +x.</translation>
    </message>
    <message>
        <source>top flange</source>
        <translation>oberer Flansch</translation>
    </message>
    <message>
        <source>web</source>
        <translation>Steg</translation>
    </message>
    <message>
        <source>bottom flange</source>
        <translation>unterer Flansch</translation>
    </message>
    <message>
        <source>fillets at the top</source>
        <translation>Ausrundungen oben</translation>
    </message>
    <message>
        <source>fillets at the bottom</source>
        <translation>Ausrundungen unten</translation>
    </message>
    <message>
        <source>flange</source>
        <translation>Flansch</translation>
    </message>
    <message>
        <source>top wall</source>
        <translation>obere Wand</translation>
    </message>
    <message>
        <source>right wall</source>
        <translation>rechte Wand</translation>
    </message>
    <message>
        <source>left wall</source>
        <translation>linke Wand</translation>
    </message>
    <message>
        <source>bottom wall</source>
        <translation>untere Wand</translation>
    </message>
    <message>
        <source>block %1</source>
        <translation>Block %1</translation>
    </message>
    <message>
        <source>circle</source>
        <translation>Kreis</translation>
    </message>
    <message>
        <source>rectangle</source>
        <translation>Rechteck</translation>
    </message>
    <message>
        <source>thin wall, inner radius (Lord et al. 2026, chapter 13)</source>
        <translation>dünne Wand, Innenradius (Lord et al. 2026, Kapitel 13)</translation>
    </message>
    <message>
        <source>Give a positive length.</source>
        <translation>Eine positive Länge angeben.</translation>
    </message>
    <message>
        <source>inner radius</source>
        <translation>Innenradius</translation>
    </message>
    <message>
        <source>thickness of the wall</source>
        <translation>Wanddicke</translation>
    </message>
    <message>
        <source>r/t = %1 is below 10: the wall is not thin, and its inner face has %2 times this hoop stress (thick wall, Lamé).</source>
        <translation>r/t = %1 liegt unter 10: Die Wand ist nicht dünn, und innen wirkt das %2-Fache dieser Umfangsspannung (dicke Wand, Lamé).</translation>
    </message>
    <message>
        <source>Pressure from outside: buckling of the wall is not seen here.</source>
        <translation>Druck von außen: Beulen der Wand wird hier nicht erfasst.</translation>
    </message>
    <message>
        <source>The pressure on the face itself is left out (σ_{z} = 0), and so are ends, nozzles and supports.</source>
        <translation>Der Druck auf die Fläche selbst ist nicht angesetzt (σ_{z} = 0), ebenso Enden, Stutzen und Auflager nicht.</translation>
    </message>
    <message>
        <source>hoop stress</source>
        <translation>Umfangsspannung</translation>
    </message>
    <message>
        <source>axial stress, closed ends</source>
        <translation>Längsspannung, geschlossene Enden</translation>
    </message>
    <message>
        <source>p is positive where the pressure inside is the greater one; x runs along the axis of the vessel.</source>
        <translation>p ist positiv, wenn der Druck innen größer ist; x verläuft in der Achse des Behälters.</translation>
    </message>
    <message>
        <source>The ends are closed: their pressure is carried by the wall.</source>
        <translation>Die Enden sind geschlossen: Ihren Druck trägt die Wand.</translation>
    </message>
    <message>
        <source>The ends are open: pressure gives no axial stress.</source>
        <translation>Die Enden sind offen: Der Druck erzeugt keine Längsspannung.</translation>
    </message>
    <message>
        <source>common practice, no source</source>
        <translation>übliche Praxis, ohne Quelle</translation>
    </message>
    <message>
        <source>area</source>
        <translation>Fläche</translation>
    </message>
    <message>
        <source>second moment about the level axis z</source>
        <translation>Flächenträgheitsmoment um die waagerechte Achse z</translation>
    </message>
    <message>
        <source>second moment about the upright axis y</source>
        <translation>Flächenträgheitsmoment um die lotrechte Achse y</translation>
    </message>
    <message>
        <source>centroid above the bottom</source>
        <translation>Schwerpunkt über der Unterkante</translation>
    </message>
    <message>
        <source>centroid from the left end</source>
        <translation>Schwerpunkt vom linken Rand</translation>
    </message>
    <message>
        <source>product of inertia</source>
        <translation>Deviationsmoment</translation>
    </message>
    <message>
        <source>part %1, %2</source>
        <translation>Teil %1, %2</translation>
    </message>
    <message>
        <source>section modulus of the top fibre</source>
        <translation>Widerstandsmoment am oberen Rand</translation>
    </message>
    <message>
        <source>section modulus of the bottom fibre</source>
        <translation>Widerstandsmoment am unteren Rand</translation>
    </message>
    <message>
        <source>section modulus of the right fibre</source>
        <translation>Widerstandsmoment am rechten Rand</translation>
    </message>
    <message>
        <source>section modulus of the left fibre</source>
        <translation>Widerstandsmoment am linken Rand</translation>
    </message>
    <message>
        <source>Lord, Richardson, Davison, Dillard: Strength of Materials (2026), %1</source>
        <translation>Lord, Richardson, Davison, Dillard: Strength of Materials (2026), %1</translation>
    </message>
    <message>
        <source>stress of the normal force</source>
        <translation>Spannung aus Normalkraft</translation>
    </message>
    <message>
        <source>stress of bending</source>
        <translation>Spannung aus Biegung</translation>
    </message>
    <message>
        <source>shear of V</source>
        <translation>Schub aus V</translation>
    </message>
    <message>
        <source>first moment of the part above the cut</source>
        <translation>statisches Moment des Teils über dem Schnitt</translation>
    </message>
    <message>
        <source>first moment of the part to the right of the cut</source>
        <translation>statisches Moment des Teils rechts vom Schnitt</translation>
    </message>
    <message>
        <source>Bredt&apos;s formula, from memory</source>
        <translation>Bredtsche Formel, aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>thin open walls, e from the middle of the wall; from memory</source>
        <translation>dünne offene Wände, e ab Wandmitte; aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>Saint-Venant&apos;s series for c, a the longer side; from memory</source>
        <translation>Reihe von Saint-Venant für c, a die längere Seite; aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>shear of torsion</source>
        <translation>Schub aus Torsion</translation>
    </message>
    <message>
        <source>torsion constant</source>
        <translation>Torsionsträgheitsmoment</translation>
    </message>
    <message>
        <source>area inside the middle line of the walls</source>
        <translation>Fläche innerhalb der Mittellinie der Wände</translation>
    </message>
    <message>
        <source>thin open walls, approximate; from memory</source>
        <translation>dünne offene Wände, Näherung; aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>normal stress</source>
        <translation>Normalspannung</translation>
    </message>
    <message>
        <source>N is positive in tension.</source>
        <translation>N ist als Zug positiv.</translation>
    </message>
    <message>
        <source>M_{z} is positive when it sags: it pulls at y &lt; 0.</source>
        <translation>M_{z} ist positiv, wenn der Stab durchhängt: Zug bei y &lt; 0.</translation>
    </message>
    <message>
        <source>M_{y} is positive when it pulls at z &gt; 0.</source>
        <translation>M_{y} ist positiv, wenn es bei z &gt; 0 Zug erzeugt.</translation>
    </message>
    <message>
        <source>V_{y} is positive when it acts in +y on the +x face, so that dM_{z}/dx = −V_{y} and τ_{xy} = +V_{y} S/(I b).</source>
        <translation>V_{y} ist positiv, wenn es auf der +x-Fläche in +y wirkt, sodass dM_{z}/dx = −V_{y} und τ_{xy} = +V_{y} S/(I b).</translation>
    </message>
    <message>
        <source>V_{y} = dM_{z}/dx, so that τ_{xy} = −V_{y} S/(I b).</source>
        <translation>V_{y} = dM_{z}/dx, sodass τ_{xy} = −V_{y} S/(I b).</translation>
    </message>
    <message>
        <source>V_{z} is positive when it acts in +z on the +x face, which is dM_{y}/dx = V_{z}.</source>
        <translation>V_{z} ist positiv, wenn es auf der +x-Fläche in +z wirkt, das heißt dM_{y}/dx = V_{z}.</translation>
    </message>
    <message>
        <source>T is right-handed about +x: its shear is −T r/J on the face towards the viewer and + on the far face.</source>
        <translation>T dreht rechtshändig um +x: Der Schub ist −T r/J auf der Vorderseite und + auf der Rückseite.</translation>
    </message>
    <message>
        <source>Seen from the top, x to the right and −z as the second axis: τ is positive in −z on the +x face.</source>
        <translation>Von oben gesehen, x nach rechts und −z als zweite Achse: τ ist auf der +x-Fläche in −z positiv.</translation>
    </message>
    <message>
        <source>V S/(I b) is for members of constant section: in a tapered one N and M shear the fibre too.</source>
        <translation>V S/(I b) gilt für Stäbe mit konstantem Querschnitt: In einem Stab mit veränderlichem Querschnitt erzeugen auch N und M Schub an der Stelle.</translation>
    </message>
    <message>
        <source>y = %1, z = %2 mm is outside the material.</source>
        <translation>y = %1, z = %2 mm liegt außerhalb des Materials.</translation>
    </message>
    <message>
        <source>Stay in it: from the centroid y is %1 to %2, z %3 to %4 mm at most.</source>
        <translation>Darin bleiben: Vom Schwerpunkt aus liegt y zwischen %1 und %2, z zwischen %3 und %4 mm.</translation>
    </message>
    <message>
        <source>V is taken through the centre of shear; where it acts elsewhere, T has to say so.</source>
        <translation>V ist im Schubmittelpunkt angesetzt; greift es anderswo an, muss T das enthalten.</translation>
    </message>
    <message>
        <source>The %1 is needed here and not given.</source>
        <translation>Wird hier benötigt und ist nicht angegeben: %1.</translation>
    </message>
    <message>
        <source>Give it, or leave out the force that needs it.</source>
        <translation>Angeben oder die Schnittgröße weglassen, die es benötigt.</translation>
    </message>
    <message>
        <source>%1 is not used, since %2 is given.</source>
        <translation>%1 wird nicht verwendet, da %2 angegeben ist.</translation>
    </message>
    <message>
        <source>%1 does not say on which side of the axis the fibre lies.</source>
        <translation>%1 sagt nicht, auf welcher Seite der Achse die Stelle liegt.</translation>
    </message>
    <message>
        <source>Give the place of the fibre, y up and z to the viewer.</source>
        <translation>Die Lage der Stelle angeben, y nach oben und z zum Betrachter.</translation>
    </message>
    <message>
        <source>Shear of V across the plane that is seen is not judged with tabled values.</source>
        <translation>Schub aus V quer zur betrachteten Ebene wird mit Tabellenwerten nicht beurteilt.</translation>
    </message>
    <message>
        <source>This shape has no size %1.</source>
        <translation>Diese Form hat keine Abmessung %1.</translation>
    </message>
    <message>
        <source>Leave it out, or choose the shape that has it.</source>
        <translation>Weglassen oder die Form wählen, die sie hat.</translation>
    </message>
    <message>
        <source>The %1 is missing.</source>
        <translation>Es fehlt: %1.</translation>
    </message>
    <message>
        <source>Give it.</source>
        <translation>Den Wert angeben.</translation>
    </message>
    <message>
        <source>The %1 is no finite number.</source>
        <translation>Keine endliche Zahl: %1.</translation>
    </message>
    <message>
        <source>Give a finite one.</source>
        <translation>Eine endliche Zahl angeben.</translation>
    </message>
    <message>
        <source>The %1 must be greater than zero.</source>
        <translation>Muss größer als null sein: %1.</translation>
    </message>
    <message>
        <source>Give it without a sign.</source>
        <translation>Ohne Vorzeichen angeben.</translation>
    </message>
    <message>
        <source>The %1 must not be negative.</source>
        <translation>Darf nicht negativ sein: %1.</translation>
    </message>
    <message>
        <source>Give it without a sign, or 0 where there is none.</source>
        <translation>Ohne Vorzeichen angeben, oder 0, wo keine vorhanden ist.</translation>
    </message>
    <message>
        <source>half the diameter</source>
        <translation>der halbe Durchmesser</translation>
    </message>
    <message>
        <source>half the width</source>
        <translation>die halbe Breite</translation>
    </message>
    <message>
        <source>half the depth</source>
        <translation>die halbe Höhe</translation>
    </message>
    <message>
        <source>the depth</source>
        <translation>die Höhe</translation>
    </message>
    <message>
        <source>the width of the flange</source>
        <translation>die Breite des Flansches</translation>
    </message>
    <message>
        <source>This wall is as thick as %1 or thicker.</source>
        <translation>Diese Wand ist so dick wie %1 oder dicker.</translation>
    </message>
    <message>
        <source>Give a thinner wall, or choose the solid shape.</source>
        <translation>Eine dünnere Wand angeben oder den Vollquerschnitt wählen.</translation>
    </message>
    <message>
        <source>the depth that the other flange leaves</source>
        <translation>die Höhe, die der andere Flansch übrig lässt</translation>
    </message>
    <message>
        <source>The root fillets do not fit between web and flanges.</source>
        <translation>Die Ausrundungen passen nicht zwischen Steg und Flansche.</translation>
    </message>
    <message>
        <source>Give a smaller radius, or 0 for sharp corners.</source>
        <translation>Einen kleineren Radius angeben, oder 0 für scharfe Ecken.</translation>
    </message>
    <message>
        <source>Block %1 overlaps block %2.</source>
        <translation>Block %1 überschneidet Block %2.</translation>
    </message>
    <message>
        <source>Move one of them so that they only touch.</source>
        <translation>Einen davon verschieben, sodass sie sich nur berühren.</translation>
    </message>
    <message>
        <source>Block %1 does not hang together with block 1.</source>
        <translation>Block %1 hängt nicht mit Block 1 zusammen.</translation>
    </message>
    <message>
        <source>Move it until edges touch; a section of loose parts does not bend as one.</source>
        <translation>Verschieben, bis sich Kanten berühren; ein Querschnitt aus losen Teilen biegt sich nicht als Ganzes.</translation>
    </message>
    <message>
        <source>solid circle</source>
        <translation>Vollkreis</translation>
    </message>
    <message>
        <source>round tube</source>
        <translation>Rundrohr</translation>
    </message>
    <message>
        <source>rectangular hollow section</source>
        <translation>Rechteckhohlprofil</translation>
    </message>
    <message>
        <source>I or H section</source>
        <translation>I- oder H-Profil</translation>
    </message>
    <message>
        <source>T section, flange at the top</source>
        <translation>T-Profil, Flansch oben</translation>
    </message>
    <message>
        <source>channel, open towards +z</source>
        <translation>U-Profil, offen nach +z</translation>
    </message>
    <message>
        <source>built of rectangles</source>
        <translation>aus Rechtecken zusammengesetzt</translation>
    </message>
    <message>
        <source>tabled values</source>
        <translation>Tabellenwerte</translation>
    </message>
    <message>
        <source>width</source>
        <translation>Breite</translation>
    </message>
    <message>
        <source>depth</source>
        <translation>Höhe</translation>
    </message>
    <message>
        <source>thickness of the web</source>
        <translation>Dicke des Stegs</translation>
    </message>
    <message>
        <source>width of the top flange</source>
        <translation>Breite des oberen Flansches</translation>
    </message>
    <message>
        <source>thickness of the top flange</source>
        <translation>Dicke des oberen Flansches</translation>
    </message>
    <message>
        <source>width of the bottom flange</source>
        <translation>Breite des unteren Flansches</translation>
    </message>
    <message>
        <source>thickness of the bottom flange</source>
        <translation>Dicke des unteren Flansches</translation>
    </message>
    <message>
        <source>radius of the root fillets</source>
        <translation>Ausrundungsradius</translation>
    </message>
    <message>
        <source>width of the flange</source>
        <translation>Breite des Flansches</translation>
    </message>
    <message>
        <source>thickness of the flange</source>
        <translation>Dicke des Flansches</translation>
    </message>
    <message>
        <source>height of the block&apos;s middle</source>
        <translation>Höhenlage der Blockmitte</translation>
    </message>
    <message>
        <source>place of the block&apos;s middle to the right</source>
        <translation>Lage der Blockmitte nach rechts</translation>
    </message>
    <message>
        <source>turn of the block, from +z towards +y</source>
        <translation>Drehung des Blocks, von +z nach +y</translation>
    </message>
    <message>
        <source>second moment about z</source>
        <translation>Flächenträgheitsmoment um z</translation>
    </message>
    <message>
        <source>second moment about y</source>
        <translation>Flächenträgheitsmoment um y</translation>
    </message>
    <message>
        <source>section modulus about z of the fibre</source>
        <translation>Widerstandsmoment um z für die Stelle</translation>
    </message>
    <message>
        <source>section modulus about y of the fibre</source>
        <translation>Widerstandsmoment um y für die Stelle</translation>
    </message>
    <message>
        <source>first moment about z of the part beyond the fibre</source>
        <translation>statisches Moment um z des Teils jenseits der Stelle</translation>
    </message>
    <message>
        <source>width of the cut at the fibre&apos;s height</source>
        <translation>Breite des Schnitts in Höhe der Stelle</translation>
    </message>
    <message>
        <source>first moment about y of the part beyond the fibre</source>
        <translation>statisches Moment um y des Teils jenseits der Stelle</translation>
    </message>
    <message>
        <source>depth of the upright cut at the fibre</source>
        <translation>Höhe des lotrechten Schnitts an der Stelle</translation>
    </message>
    <message>
        <source>diameter</source>
        <translation>Durchmesser</translation>
    </message>
    <message>
        <source>outer diameter</source>
        <translation>Außendurchmesser</translation>
    </message>
    <message>
        <source>outer width</source>
        <translation>Außenbreite</translation>
    </message>
    <message>
        <source>outer depth</source>
        <translation>Außenhöhe</translation>
    </message>
    <message>
        <source>thickness of the upright walls</source>
        <translation>Dicke der lotrechten Wände</translation>
    </message>
    <message>
        <source>thickness of the level walls</source>
        <translation>Dicke der waagerechten Wände</translation>
    </message>
    <message>
        <source>V S/(I b) does not hold in a flange that overhangs the web: its shear runs across the plane that is seen.</source>
        <translation>V S/(I b) gilt nicht in einem Flansch, der über den Steg hinausragt: Sein Schub verläuft quer zur betrachteten Ebene.</translation>
    </message>
    <message>
        <source>V S/(I b) does not hold here: the wall runs across the plane that is seen from the top.</source>
        <translation>V S/(I b) gilt hier nicht: Die Wand verläuft quer zu der von oben betrachteten Ebene.</translation>
    </message>
    <message>
        <source>Take the fibre in the web, or look from the top.</source>
        <translation>Die Stelle in den Steg legen oder von oben blicken.</translation>
    </message>
    <message>
        <source>Take the fibre in a flange, or look from the side.</source>
        <translation>Die Stelle in einen Flansch legen oder von der Seite blicken.</translation>
    </message>
    <message>
        <source>The shear of V_{z} along this wall of a closed section is not given, except in the middle of its height.</source>
        <translation>Der Schub aus V_{z} längs dieser Wand eines geschlossenen Querschnitts wird nicht angegeben, außer in der Mitte ihrer Höhe.</translation>
    </message>
    <message>
        <source>The shear of V_{y} along this wall of a closed section is not given, except in the middle of its width.</source>
        <translation>Der Schub aus V_{y} längs dieser Wand eines geschlossenen Querschnitts wird nicht angegeben, außer in der Mitte ihrer Breite.</translation>
    </message>
    <message>
        <source>Take the fibre in the middle of the wall.</source>
        <translation>Die Stelle in die Mitte der Wand legen.</translation>
    </message>
    <message>
        <source>The cut meets several walls: V S/(I b) is the mean of their shears.</source>
        <translation>Der Schnitt trifft mehrere Wände: V S/(I b) ist der Mittelwert ihrer Schubspannungen.</translation>
    </message>
    <message>
        <source>The cut lies at a junction: the thinner side is taken, b = %1 mm; on the other side b = %2 mm.</source>
        <translation>Der Schnitt liegt an einem Anschluss: Angesetzt ist die dünnere Seite, b = %1 mm; auf der anderen Seite ist b = %2 mm.</translation>
    </message>
    <message>
        <source>An edge is inclined here: V S/(I b) is the mean over the cut; along the edge the shear is greater.</source>
        <translation>Ein Rand ist hier geneigt: V S/(I b) ist der Mittelwert über den Schnitt; am Rand ist der Schub größer.</translation>
    </message>
    <message>
        <source>The cut is wider than the section is deep: V S/(I b) is the mean over it; at its ends the shear is greater.</source>
        <translation>Der Schnitt ist breiter, als der Querschnitt hoch ist: V S/(I b) ist der Mittelwert darüber; an seinen Enden ist der Schub größer.</translation>
    </message>
    <message>
        <source>Shear of V across the plane that is seen is not judged here.</source>
        <translation>Schub aus V quer zur betrachteten Ebene wird hier nicht beurteilt.</translation>
    </message>
    <message>
        <source>V also gives τ_{xz} = %1 MPa at this fibre, across the plane that is seen.</source>
        <translation>V erzeugt an dieser Stelle auch τ_{xz} = %1 MPa, quer zur betrachteten Ebene.</translation>
    </message>
    <message>
        <source>V also gives τ_{xy} = %1 MPa at this fibre, across the plane that is seen.</source>
        <translation>V erzeugt an dieser Stelle auch τ_{xy} = %1 MPa, quer zur betrachteten Ebene.</translation>
    </message>
    <message>
        <source>The gauges at %1, %2 and %3 are too nearly parallel: an error of reading would grow more than %4 times.</source>
        <translation>Die Messgitter bei %1, %2 und %3 sind fast parallel: Ein Ablesefehler würde sich auf mehr als das %4-Fache vergrößern.</translation>
    </message>
    <message>
        <source>Give three directions that differ, such as 0, 45 and 90 deg.</source>
        <translation>Drei verschiedene Richtungen angeben, etwa 0, 45 und 90 deg.</translation>
    </message>
    <message>
        <source>The torsion of turned blocks is not given here.</source>
        <translation>Die Torsion gedrehter Blöcke wird hier nicht angegeben.</translation>
    </message>
    <message>
        <source>Leave T out, or type J as a tabled value.</source>
        <translation>T weglassen oder J als Tabellenwert eingeben.</translation>
    </message>
    <message>
        <source>These blocks enclose a cell: the sum of b t³/3 is not their torsion constant.</source>
        <translation>Diese Blöcke umschließen eine Zelle: Die Summe von b t³/3 ist nicht ihr Torsionsträgheitsmoment.</translation>
    </message>
    <message>
        <source>Choose the hollow section, or leave T out.</source>
        <translation>Das Hohlprofil wählen oder T weglassen.</translation>
    </message>
    <message>
        <source>T r/J holds for circular sections; for another one J and r must belong together.</source>
        <translation>T r/J gilt für Kreisquerschnitte; bei anderen müssen J und r zusammengehören.</translation>
    </message>
    <message>
        <source>The shear of torsion at this fibre does not lie in the plane that is seen.</source>
        <translation>Der Schub aus Torsion liegt an dieser Stelle nicht in der betrachteten Ebene.</translation>
    </message>
    <message>
        <source>Look from the top, or take a fibre on a face that looks to the side.</source>
        <translation>Von oben blicken oder eine Stelle auf einer seitlichen Fläche wählen.</translation>
    </message>
    <message>
        <source>Look from the side, or take a fibre on a face that looks up or down.</source>
        <translation>Von der Seite blicken oder eine Stelle auf der Ober- oder Unterseite wählen.</translation>
    </message>
    <message>
        <source>A wall is thicker than a tenth of the smaller side: Bredt&apos;s formula for thin walls is rough here (the limit is common practice, no source).</source>
        <translation>Eine Wand ist dicker als ein Zehntel der kleineren Seite: Die Bredtsche Formel für dünne Wände ist hier ungenau (Grenze: übliche Praxis, ohne Quelle).</translation>
    </message>
    <message>
        <source>At a corner the shear of torsion is taken as along the wall; at inner corners it is greater, by a factor that depends on the radius.</source>
        <translation>An einer Ecke ist der Schub aus Torsion wie längs der Wand angesetzt; an einspringenden Ecken ist er größer, je nach Radius.</translation>
    </message>
    <message>
        <source>J = Σ b t³/3 is approximate: for thin open walls, without fillets, free to warp.</source>
        <translation>J = Σ b t³/3 ist eine Näherung: für dünne offene Wände, ohne Ausrundungen, ohne Wölbbehinderung.</translation>
    </message>
    <message>
        <source>The torsion of a solid rectangle is given at the middle of its sides alone, and is 0 at its corners.</source>
        <translation>Die Torsion eines vollen Rechtecks wird nur in der Mitte seiner Seiten angegeben und ist an seinen Ecken 0.</translation>
    </message>
    <message>
        <source>Take the fibre at the middle of a face that is seen, or at a corner.</source>
        <translation>Die Stelle in die Mitte einer betrachteten Fläche oder an eine Ecke legen.</translation>
    </message>
    <message>
        <source>The torsion constant J is not given.</source>
        <translation>Das Torsionsträgheitsmoment J ist nicht angegeben.</translation>
    </message>
    <message>
        <source>Give J, or leave T out.</source>
        <translation>J angeben oder T weglassen.</translation>
    </message>
    <message>
        <source>section forces on %1</source>
        <translation>Schnittgrößen am Querschnitt %1</translation>
    </message>
    <message>
        <source>pressure in a thin wall</source>
        <translation>Innendruck, dünne Wand</translation>
    </message>
    <message>
        <source>strains measured by a rosette</source>
        <translation>mit einer Rosette gemessene Dehnungen</translation>
    </message>
</context>
<context>
    <name>Strength</name>
    <message>
        <source>With an exponent above 2 Hankinson&apos;s formula exceeds the strength along the line at small angles.</source>
        <translation>Mit einem Exponenten über 2 überschreitet die Formel von Hankinson bei kleinen Winkeln die Festigkeit längs der Linie.</translation>
    </message>
    <message>
        <source>The linear sum is published for uniaxial tension and bending at an angle; for other states it is an extension of this program.</source>
        <translation>Die lineare Summe ist für einachsigen Zug und Biegung unter einem Winkel veröffentlicht; für andere Zustände ist sie eine Erweiterung dieses Programms.</translation>
    </message>
    <message>
        <source>A k_{c,90} above 1 belongs to a bearing with its lengths and supports (EN 1995-1-1, 6.1.5), not to the stress at a point.</source>
        <translation>Ein k_{c,90} über 1 gehört zu einer Auflagerpressung mit ihren Längen und Auflagern (EN 1995-1-1, 6.1.5), nicht zur Spannung in einem Punkt.</translation>
    </message>
    <message>
        <source>The taper is over 10°: the formula is stated for less (Swedish Wood, Design of timber structures, vol. 1; not in the clause).</source>
        <translation>Der Anschnittwinkel ist größer als 10°: Die Formel ist nur für kleinere angegeben (Swedish Wood, Design of timber structures, Bd. 1; nicht im Abschnitt der Norm).</translation>
    </message>
    <message>
        <source>A point in plane stress sees one shear on the throat: the other one of EN 1993-1-8, 4.5.3.2 is taken as 0.</source>
        <translation>Ein Punkt im ebenen Spannungszustand erfasst nur eine Schubspannung der Nahtfläche: Die andere nach EN 1993-1-8, 4.5.3.2 ist mit 0 angesetzt.</translation>
    </message>
    <message>
        <source>No cut-off is given: it counts as 0, so the plane takes no tension.</source>
        <translation>Keine Zuggrenze ist angegeben: Sie zählt als 0, die Ebene nimmt also keinen Zug auf.</translation>
    </message>
    <message>
        <source>Stresses at single points only; local codes and a licensed engineer decide.</source>
        <translation>Nur Spannungen in einzelnen Punkten; es entscheiden örtliche Normen und Vorschriften sowie zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>Stress at this point only; local codes and a licensed engineer decide.</source>
        <translation>Nur die Spannung in diesem Punkt; es entscheiden örtliche Normen und Vorschriften sowie zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>Near free edges, notches, holes, ends of plies, curved apexes and in welds, stresses out of the plane are not seen (common practice, no source).</source>
        <translation>Nahe freien Rändern, Kerben, Löchern, Lagenenden, gekrümmten Firstbereichen und in Schweißnähten werden Spannungen aus der Ebene heraus nicht erfasst (übliche Praxis, ohne Quelle).</translation>
    </message>
    <message>
        <source>Criteria agree on the axes of the material and disagree in between; tests under combined stresses are scarce (FHWA-HRT-04-097, 1.4 and appendix D).</source>
        <translation>Auf den Achsen des Materials stimmen die Kriterien überein, dazwischen weichen sie voneinander ab; Versuche unter kombinierten Spannungen sind selten (FHWA-HRT-04-097, 1.4 und Anhang D).</translation>
    </message>
    <message>
        <source>Characteristic values are not design values; the national annex decides (common practice, no source).</source>
        <translation>Charakteristische Werte sind keine Bemessungswerte; maßgebend ist der Nationale Anhang (übliche Praxis, ohne Quelle).</translation>
    </message>
    <message>
        <source>Rolling shear, tension in the third direction, the volume under tension across the grain, and cracks are outside this check.</source>
        <translation>Rollschub, Zug in der dritten Richtung, das querzugbeanspruchte Volumen und Risse liegen außerhalb dieses Nachweises.</translation>
    </message>
    <message>
        <source>About 60 % of the load of a short test is carried for ten years (FPL-GTR-282, pages 5-38 to 5-40): use the factor of the duration.</source>
        <translation>Etwa 60 % der Last eines Kurzzeitversuchs werden zehn Jahre lang getragen (FPL-GTR-282, Seiten 5-38 bis 5-40): den Beiwert der Einwirkungsdauer verwenden.</translation>
    </message>
    <message>
        <source>Clear wood scatters: coefficient of variation 25 % in tension and 28 % in compression across the grain, 14 % in shear (FPL-GTR-282, table 5-6).</source>
        <translation>Fehlerfreies Holz streut: Variationskoeffizient 25 % bei Zug und 28 % bei Druck quer zur Faser, 14 % bei Schub (FPL-GTR-282, Tabelle 5-6).</translation>
    </message>
    <message>
        <source>Across the grain strengths can be 40 to 60 % lower at 45° to the rings in some species (FPL-GTR-282, page 5-31).</source>
        <translation>Quer zur Faser können die Festigkeiten bei manchen Holzarten unter 45° zu den Jahrringen 40 bis 60 % niedriger sein (FPL-GTR-282, Seite 5-31).</translation>
    </message>
    <message>
        <source>With these strengths the criterion sets no limit in some directions: %1 does not hold.</source>
        <translation>Mit diesen Festigkeiten setzt das Kriterium in manchen Richtungen keine Grenze: %1 ist nicht erfüllt.</translation>
    </message>
    <message>
        <source>Check the strengths, or take another criterion.</source>
        <translation>Die Festigkeiten prüfen oder ein anderes Kriterium wählen.</translation>
    </message>
    <message>
        <source>This criterion is for uniaxial stress only; the principal stresses here are %1 and %2 MPa, and %3 MPa out of the plane.</source>
        <translation>Dieses Kriterium gilt nur für einachsige Spannung; die Hauptspannungen sind hier %1 und %2 MPa, aus der Ebene heraus %3 MPa.</translation>
    </message>
    <message>
        <source>Take a criterion for combined stresses, such as sum-of-squares.</source>
        <translation>Ein Kriterium für kombinierte Spannungen wählen, etwa sum-of-squares.</translation>
    </message>
    <message>
        <source>This criterion is for uniaxial stress only; the principal stresses here are %1 and %2 MPa.</source>
        <translation>Dieses Kriterium gilt nur für einachsige Spannung; die Hauptspannungen sind hier %1 und %2 MPa.</translation>
    </message>
    <message>
        <source>Take a criterion for combined stresses, such as the sum of squares.</source>
        <translation>Ein Kriterium für kombinierte Spannungen wählen, etwa die Summe der Quadrate.</translation>
    </message>
    <message>
        <source>EN 1995-1-1, 6.2.2 is for compression; the stress here is %1 MPa in tension.</source>
        <translation>EN 1995-1-1, 6.2.2 gilt für Druck; die Spannung beträgt hier %1 MPa Zug.</translation>
    </message>
    <message>
        <source>Take another criterion for this combination.</source>
        <translation>Für diese Kombination ein anderes Kriterium wählen.</translation>
    </message>
    <message>
        <source>EN 1995-1-1, 6.4.2 needs the direction of the edge.</source>
        <translation>EN 1995-1-1, 6.4.2 benötigt die Richtung des Rands.</translation>
    </message>
    <message>
        <source>Give the check its edge.</source>
        <translation>Dem Nachweis seinen Rand angeben.</translation>
    </message>
    <message>
        <source>The stress here acts at %1°, not along the edge at %2°.</source>
        <translation>Die Spannung wirkt hier unter %1°, nicht längs des Rands unter %2°.</translation>
    </message>
    <message>
        <source>Give the stress that acts along the edge.</source>
        <translation>Die Spannung angeben, die längs des Rands wirkt.</translation>
    </message>
    <message>
        <source>The material has no %1, which this criterion needs.</source>
        <translation>Dem Material fehlt, was dieses Kriterium benötigt: %1.</translation>
    </message>
    <message>
        <source>Give it among the strengths of the material.</source>
        <translation>Bei den Festigkeiten des Materials angeben.</translation>
    </message>
    <message>
        <source>EN 1993-1-8, 4.5.3.2 is for fillet welds: at a butt weld the parent metal governs (4.7.1, from memory).</source>
        <translation>EN 1993-1-8, 4.5.3.2 gilt für Kehlnähte: Bei einer Stumpfnaht ist der Grundwerkstoff maßgebend (4.7.1, aus dem Gedächtnis).</translation>
    </message>
    <message>
        <source>Check the parent metal instead.</source>
        <translation>Stattdessen den Grundwerkstoff nachweisen.</translation>
    </message>
    <message>
        <source>timber</source>
        <translation>Holz</translation>
    </message>
    <message>
        <source>fibre-reinforced lamina</source>
        <translation>faserverstärkte Einzelschicht</translation>
    </message>
    <message>
        <source>other material with a line</source>
        <translation>anderes Material mit Linie</translation>
    </message>
    <message>
        <source>the same in all directions</source>
        <translation>in allen Richtungen gleich</translation>
    </message>
    <message>
        <source>plane with friction and cohesion</source>
        <translation>Ebene mit Reibung und Kohäsion</translation>
    </message>
    <message>
        <source>throat of a weld</source>
        <translation>Nahtfläche einer Schweißnaht</translation>
    </message>
    <message>
        <source>bonded plane</source>
        <translation>Klebfuge</translation>
    </message>
    <message>
        <source>characteristic</source>
        <translation>charakteristisch</translation>
    </message>
    <message>
        <source>design</source>
        <translation>Bemessungswert</translation>
    </message>
    <message>
        <source>allowable</source>
        <translation>zulässig</translation>
    </message>
    <message>
        <source>mean of tests</source>
        <translation>Mittelwert aus Versuchen</translation>
    </message>
    <message>
        <source>fillet weld</source>
        <translation>Kehlnaht</translation>
    </message>
    <message>
        <source>butt weld</source>
        <translation>Stumpfnaht</translation>
    </message>
    <message>
        <source>The material has a partial factor and no factors for the duration of loads: k_{mod} counts as 1.</source>
        <translation>Das Material hat einen Teilsicherheitsbeiwert, aber keine Beiwerte der Einwirkungsdauer: k_{mod} zählt als 1.</translation>
    </message>
    <message>
        <source>The slope of the grain counts to one side, and the sign of τ_{xy} decides whether it is pulled or pressed across: where its sense is not known, give 0° with the slope as tolerance.</source>
        <translation>Die Faserneigung zählt nach einer Seite, und das Vorzeichen von τ_{xy} entscheidet, ob quer Zug oder Druck entsteht: Ist ihr Richtungssinn nicht bekannt, 0° mit der Neigung als Toleranz angeben.</translation>
    </message>
    <message>
        <source>The material has no factor for loads of the duration “%1”.</source>
        <translation>Das Material hat keinen Beiwert für Lasten der Einwirkungsdauer „%1“.</translation>
    </message>
    <message>
        <source>Give it among the factors of the material.</source>
        <translation>Bei den Beiwerten des Materials angeben.</translation>
    </message>
    <message>
        <source>σ_{z} acts here, and this criterion does not see it: judge it apart.</source>
        <translation>Hier wirkt σ_{z}, und dieses Kriterium erfasst es nicht: gesondert beurteilen.</translation>
    </message>
    <message>
        <source>The stress along the edge is compared with f_{m}: what is no bending, or is typed as a stress, is taken as bending.</source>
        <translation>Die Spannung längs des Rands wird mit f_{m} verglichen: Was keine Biegung oder als Spannung eingegeben ist, gilt als Biegung.</translation>
    </message>
    <message>
        <source>Allowable strengths against factored design loads.</source>
        <translation>Zulässige Festigkeiten gegenüber Bemessungslasten mit Teilsicherheitsbeiwerten.</translation>
    </message>
    <message>
        <source>Allowable strengths against a characteristic combination: name it allowable if it is meant so.</source>
        <translation>Zulässige Festigkeiten gegenüber einer charakteristischen Kombination: Ist es so gemeint, sie als „zulässig“ bezeichnen.</translation>
    </message>
    <message>
        <source>Against means of tests: not a design check.</source>
        <translation>Gegenüber Mittelwerten aus Versuchen: kein Bemessungsnachweis.</translation>
    </message>
    <message>
        <source>Design strengths of the weld against loads that are not design loads.</source>
        <translation>Bemessungsfestigkeiten der Naht gegenüber Lasten, die keine Bemessungslasten sind.</translation>
    </message>
    <message>
        <source>Against characteristic strengths: not a design check.</source>
        <translation>Gegenüber charakteristischen Festigkeiten: kein Bemessungsnachweis.</translation>
    </message>
    <message>
        <source>Design strengths against loads that are not design loads.</source>
        <translation>Bemessungsfestigkeiten gegenüber Lasten, die keine Bemessungslasten sind.</translation>
    </message>
    <message>
        <source>For timber pulled at a small angle to the grain this criterion promises more than tests show: C24 at 1 in 10 keeps all of f_{t,0} by it, %1 to %2 by published tests and rules. See the other criteria beside it.</source>
        <translation>Für Holz unter Zug in kleinem Winkel zur Faser verspricht dieses Kriterium mehr, als Versuche zeigen: Nach ihm behält C24 bei 1:10 das volle f_{t,0}, nach veröffentlichten Versuchen und Regeln das %1- bis %2-Fache. Zum Vergleich die anderen Kriterien ansehen.</translation>
    </message>
    <message>
        <source>With characteristic strengths of timber this criterion can promise more than f_{c,0}: C24 pressed at 15° takes %1 MPa by Tsai and Wu against f_{c,0} = 21 MPa, because f_{t,90} is far below f_{c,90}. See the other criteria beside it.</source>
        <translation>Mit charakteristischen Festigkeiten von Holz kann dieses Kriterium mehr als f_{c,0} versprechen: C24 unter Druck bei 15° trägt nach Tsai und Wu %1 MPa gegenüber f_{c,0} = 21 MPa, weil f_{t,90} weit unter f_{c,90} liegt. Zum Vergleich die anderen Kriterien ansehen.</translation>
    </message>
    <message>
        <source>k_{vol} = 1 in tension across the grain: f_{t,90} is for %1 m³, and (%1/V)^%2 is %3 at %4 m³ (exponent from memory).</source>
        <translation>k_{vol} = 1 bei Zug quer zur Faser: f_{t,90} gilt für %1 m³, und (%1/V)^%2 ist %3 bei %4 m³ (Exponent aus dem Gedächtnis).</translation>
    </message>
    <message>
        <source>The factor of the strengths is %1, which is above %2: see that it is meant.</source>
        <translation>Der Beiwert der Festigkeiten ist %1, das ist mehr als %2: prüfen, ob es so gemeint ist.</translation>
    </message>
    <message>
        <source>The duration factor for “%1” is %2, which is above %3: see that it is meant.</source>
        <translation>Der Beiwert der Einwirkungsdauer „%1“ ist %2, das ist mehr als %3: prüfen, ob es so gemeint ist.</translation>
    </message>
</context>
<context>
    <name>Study</name>
    <message>
        <source>“%1” is not one of the words for this.</source>
        <translation>„%1“ gehört nicht zu den Wörtern, die hier gelten.</translation>
    </message>
    <message>
        <source>Use one of: %1.</source>
        <translation>Eines davon verwenden: %1.</translation>
    </message>
    <message>
        <source>The stress that follows is too large to be meant.</source>
        <translation>Die Spannung, die sich ergibt, ist zu groß, um so gemeint zu sein.</translation>
    </message>
    <message>
        <source>Check the units of sizes and forces.</source>
        <translation>Die Einheiten der Abmessungen und Kräfte prüfen.</translation>
    </message>
    <message>
        <source>“%1” has no unit, or blanks round it.</source>
        <translation>„%1“ hat keine Einheit oder ist von Leerzeichen umgeben.</translation>
    </message>
    <message>
        <source>Write “%1”.</source>
        <translation>„%1“ schreiben.</translation>
    </message>
    <message>
        <source>There is no such place in this study.</source>
        <translation>Diese Angabe gibt es in dieser Studie nicht.</translation>
    </message>
    <message>
        <source>“%1” cannot be added here.</source>
        <translation>„%1“ kann hier nicht hinzugefügt werden.</translation>
    </message>
    <message>
        <source>Use a name that is not taken yet.</source>
        <translation>Einen Namen verwenden, der noch frei ist.</translation>
    </message>
    <message>
        <source>The name “%1” is taken.</source>
        <translation>Der Name „%1“ ist vergeben.</translation>
    </message>
    <message>
        <source>Use another name.</source>
        <translation>Einen anderen Namen verwenden.</translation>
    </message>
    <message>
        <source>There are too many of this kind: %1.</source>
        <translation>Davon gibt es zu viele: %1.</translation>
    </message>
    <message>
        <source>The name “%1” stands twice.</source>
        <translation>Der Name „%1“ steht doppelt.</translation>
    </message>
    <message>
        <source>Give each its own name.</source>
        <translation>Jedem einen eigenen Namen geben.</translation>
    </message>
    <message>
        <source>There is no “%1” in this study.</source>
        <translation>In dieser Studie gibt es kein „%1“.</translation>
    </message>
    <message>
        <source>Use a name that the study has.</source>
        <translation>Einen Namen verwenden, den die Studie hat.</translation>
    </message>
    <message>
        <source>A study needs at least one %1.</source>
        <translation>Eine Studie braucht mindestens einen Eintrag dieser Art: %1.</translation>
    </message>
    <message>
        <source>Name it once.</source>
        <translation>Nur einmal nennen.</translation>
    </message>
    <message>
        <source>A case cannot exclude itself.</source>
        <translation>Ein Lastfall kann sich nicht selbst ausschließen.</translation>
    </message>
    <message>
        <source>“%1” is the id of a case already.</source>
        <translation>„%1“ ist schon die Kennung eines Lastfalls.</translation>
    </message>
    <message>
        <source>Give the combination its factor, such as “1.0 %1”.</source>
        <translation>Der Kombination ihren Beiwert geben, etwa „1.0 %1“.</translation>
    </message>
    <message>
        <source>Case %1 is measured: it takes factor 1 only.</source>
        <translation>Lastfall %1 ist gemessen: Er lässt nur den Beiwert 1 zu.</translation>
    </message>
    <message>
        <source>Give it factor 1; what was measured acts as it is.</source>
        <translation>Den Beiwert 1 geben; Gemessenes wirkt, wie es ist.</translation>
    </message>
    <message>
        <source>Cases %1 and %2 exclude each other, but “%3” has both.</source>
        <translation>Die Lastfälle %1 und %2 schließen einander aus, aber „%3“ enthält beide.</translation>
    </message>
    <message>
        <source>Take one of them out of the combination.</source>
        <translation>Einen davon aus der Kombination nehmen.</translation>
    </message>
    <message>
        <source>Point %1 lies in section “%2”, which is not in this study.</source>
        <translation>Punkt %1 liegt im Querschnitt „%2“, den es in dieser Studie nicht gibt.</translation>
    </message>
    <message>
        <source>Give the point a section that the study has.</source>
        <translation>Dem Punkt einen Querschnitt geben, den die Studie hat.</translation>
    </message>
    <message>
        <source>Section forces of case %1 need a fibre: a section and a place in it.</source>
        <translation>Schnittgrößen von Lastfall %1 brauchen eine Stelle: einen Querschnitt und einen Ort darin.</translation>
    </message>
    <message>
        <source>Give point %1 its section first.</source>
        <translation>Zuerst Punkt %1 seinen Querschnitt geben.</translation>
    </message>
    <message>
        <source>Case %1 has measured strains, but its nature is not “measured”.</source>
        <translation>Lastfall %1 hat gemessene Dehnungen, aber seine Art ist nicht „gemessen“.</translation>
    </message>
    <message>
        <source>Make its nature “measured”, or give the rosette a case of its own.</source>
        <translation>Seine Art auf „gemessen“ setzen oder der Rosette einen eigenen Lastfall geben.</translation>
    </message>
    <message>
        <source>A material with a line needs the line of point %1.</source>
        <translation>Ein Material mit Linie braucht die Linie von Punkt %1.</translation>
    </message>
    <message>
        <source>Give the point a line first.</source>
        <translation>Zuerst dem Punkt eine Linie geben.</translation>
    </message>
    <message>
        <source>“%1” is of the kind “%2”, which has no %3.</source>
        <translation>„%1“ ist von der Art „%2“; zu ihr gehört nicht: %3.</translation>
    </message>
    <message>
        <source>Take it out, or give the material another kind.</source>
        <translation>Weglassen oder dem Material eine andere Art geben.</translation>
    </message>
    <message>
        <source>An angle of friction is at least 0° and less than 90°.</source>
        <translation>Ein Reibungswinkel beträgt mindestens 0° und weniger als 90°.</translation>
    </message>
    <message>
        <source>Give it in degrees, such as 30 deg.</source>
        <translation>In Grad angeben, etwa 30 deg.</translation>
    </message>
    <message>
        <source>A plane with neither cohesion nor friction carries nothing.</source>
        <translation>Eine Ebene ohne Kohäsion und ohne Reibung trägt nichts.</translation>
    </message>
    <message>
        <source>Give one of them.</source>
        <translation>Eines von beiden angeben.</translation>
    </message>
    <message>
        <source>The %1 is not greater than 0.</source>
        <translation>Nicht größer als 0: %1.</translation>
    </message>
    <message>
        <source>Give a positive number, for compression too.</source>
        <translation>Eine positive Zahl angeben, auch für Druck.</translation>
    </message>
    <message>
        <source>The %1 is out of every range that can be meant.</source>
        <translation>Außerhalb jedes sinnvollen Bereichs: %1.</translation>
    </message>
    <message>
        <source>Check the exponent and the unit.</source>
        <translation>Den Exponenten und die Einheit prüfen.</translation>
    </message>
    <message>
        <source>There is no material “%1” in this study.</source>
        <translation>In dieser Studie gibt es kein Material „%1“.</translation>
    </message>
    <message>
        <source>Take one from the library, or add it to the materials.</source>
        <translation>Eines aus der Bibliothek nehmen oder es bei den Materialien hinzufügen.</translation>
    </message>
    <message>
        <source>The criterion “%1” does not judge a material of the kind “%2”.</source>
        <translation>Das Kriterium „%1“ beurteilt kein Material der Art „%2“.</translation>
    </message>
    <message>
        <source>Take a criterion of that kind, or another material.</source>
        <translation>Ein Kriterium dieser Art oder ein anderes Material wählen.</translation>
    </message>
    <message>
        <source>Check “%1” needs its %2.</source>
        <translation>Nachweis „%1“ ist unvollständig. Es fehlt: %2.</translation>
    </message>
    <message>
        <source>Point %1 has no “%2” for its check.</source>
        <translation>Punkt %1 hat kein „%2“ für seinen Nachweis.</translation>
    </message>
    <message>
        <source>Name one that the point has.</source>
        <translation>Eine nennen, die der Punkt hat.</translation>
    </message>
    <message>
        <source>The criterion “%1” takes no %2.</source>
        <translation>Beim Kriterium „%1“ entfällt: %2.</translation>
    </message>
    <message>
        <source>Leave it empty.</source>
        <translation>Leer lassen.</translation>
    </message>
    <message>
        <source>The parameter %1 is not greater than 0.</source>
        <translation>Der Parameter %1 ist nicht größer als 0.</translation>
    </message>
    <message>
        <source>Give a positive number.</source>
        <translation>Eine positive Zahl angeben.</translation>
    </message>
    <message>
        <source>This text is not valid UTF-8.</source>
        <translation>Dieser Text ist kein gültiges UTF-8.</translation>
    </message>
    <message>
        <source>This text has control characters.</source>
        <translation>Dieser Text enthält Steuerzeichen.</translation>
    </message>
    <message>
        <source>This text has more than 20000 bytes.</source>
        <translation>Dieser Text hat mehr als 20000 Bytes.</translation>
    </message>
    <message>
        <source>A tolerance cannot be negative.</source>
        <translation>Eine Toleranz kann nicht negativ sein.</translation>
    </message>
    <message>
        <source>Give the greatest deviation to either side.</source>
        <translation>Die größte Abweichung nach jeder Seite angeben.</translation>
    </message>
    <message>
        <source>This is too large to be meant.</source>
        <translation>Das ist zu groß, um so gemeint zu sein.</translation>
    </message>
    <message>
        <source>A name is needed here.</source>
        <translation>Hier ist ein Name nötig.</translation>
    </message>
    <message>
        <source>A name cannot begin or end with a blank.</source>
        <translation>Ein Name kann nicht mit einem Leerzeichen beginnen oder enden.</translation>
    </message>
    <message>
        <source>This name is not valid UTF-8.</source>
        <translation>Dieser Name ist kein gültiges UTF-8.</translation>
    </message>
    <message>
        <source>A name cannot have control characters.</source>
        <translation>Ein Name kann keine Steuerzeichen enthalten.</translation>
    </message>
    <message>
        <source>This name has more than 200 bytes.</source>
        <translation>Dieser Name hat mehr als 200 Bytes.</translation>
    </message>
    <message>
        <source>The id of a case cannot have a comma.</source>
        <translation>Die Kennung eines Lastfalls kann kein Komma enthalten.</translation>
    </message>
</context>
<context>
    <name>Sweep</name>
    <message>
        <source>A step lies between 0.1 and 90 deg.</source>
        <translation>Eine Schrittweite liegt zwischen 0.1 und 90 deg.</translation>
    </message>
</context>
<context>
    <name>Table</name>
    <message>
        <source>Plane</source>
        <translation>Ebene</translation>
    </message>
    <message>
        <source>normal at</source>
        <translation>Normale bei</translation>
    </message>
    <message>
        <source>cut at</source>
        <translation>Schnitt bei</translation>
    </message>
    <message>
        <source>Reading plane</source>
        <translation>Ableseebene</translation>
    </message>
    <message>
        <source>x face</source>
        <translation>x-Fläche</translation>
    </message>
    <message>
        <source>y face</source>
        <translation>y-Fläche</translation>
    </message>
    <message>
        <source>Principal σ_{1}</source>
        <translation>Hauptspannung σ_{1}</translation>
    </message>
    <message>
        <source>Principal σ_{2}</source>
        <translation>Hauptspannung σ_{2}</translation>
    </message>
    <message>
        <source>Greatest shear, τ_{nt} &gt; 0</source>
        <translation>Größter Schub, τ_{nt} &gt; 0</translation>
    </message>
    <message>
        <source>Greatest shear, τ_{nt} &lt; 0</source>
        <translation>Größter Schub, τ_{nt} &lt; 0</translation>
    </message>
    <message>
        <source>Crossing the %1 (stress along it)</source>
        <translation>Quer zu %1 (Spannung längs)</translation>
    </message>
    <message>
        <source>Following the %1 (stress across it)</source>
        <translation>Entlang %1 (Spannung quer)</translation>
    </message>
    <message>
        <source>every direction</source>
        <translation>jede Richtung</translation>
    </message>
    <message>
        <source>least σ_{n}</source>
        <translation>kleinstes σ_{n}</translation>
    </message>
    <message>
        <source>greatest σ_{n}</source>
        <translation>größtes σ_{n}</translation>
    </message>
    <message>
        <source>greatest |τ_{nt}|</source>
        <translation>größtes |τ_{nt}|</translation>
    </message>
    <message>
        <source>Not in the table: %1.</source>
        <translation>Nicht in der Tabelle: %1.</translation>
    </message>
</context>
<context>
    <name>Things</name>
    <message>
        <source>Points lie in the section “%1”: %2.</source>
        <translation>Im Querschnitt „%1“ liegen Punkte: %2.</translation>
    </message>
    <message>
        <source>Give them another section, or none, first.</source>
        <translation>Diesen Punkten zuerst einen anderen oder gar keinen Querschnitt geben.</translation>
    </message>
    <message>
        <source>Case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>Load cases</source>
        <translation>Lastfälle</translation>
    </message>
    <message>
        <source>load case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>Name</source>
        <translation>Name</translation>
    </message>
    <message>
        <source>Nature</source>
        <translation>Art</translation>
    </message>
    <message>
        <source>Duration</source>
        <translation>Dauer</translation>
    </message>
    <message>
        <source>Never together with</source>
        <translation>Nie zusammen mit</translation>
    </message>
    <message>
        <source>Factors</source>
        <translation>Beiwerte</translation>
    </message>
    <message>
        <source>Combinations</source>
        <translation>Kombinationen</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>Basis</source>
        <translation>Basis</translation>
    </message>
    <message>
        <source>Points</source>
        <translation>Punkte</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>Point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>Note</source>
        <translation>Anmerkung</translation>
    </message>
    <message>
        <source>Shape</source>
        <translation>Form</translation>
    </message>
    <message>
        <source>Sections</source>
        <translation>Querschnitte</translation>
    </message>
    <message>
        <source>section</source>
        <translation>Querschnitt</translation>
    </message>
    <message>
        <source>Section</source>
        <translation>Querschnitt</translation>
    </message>
    <message>
        <source>Sizes</source>
        <translation>Maße</translation>
    </message>
    <message>
        <source>Points in it</source>
        <translation>Punkte darin</translation>
    </message>
</context>
<context>
    <name>TitleDialog</name>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
</context>
<context>
    <name>Validate</name>
    <message>
        <source>All %1 values agree.</source>
        <translation>Alle %1 Werte stimmen überein.</translation>
    </message>
    <message>
        <source>%1 of %2 values disagree.</source>
        <translation>%1 von %2 Werten weichen ab.</translation>
    </message>
    <message>
        <source>%1 of them are evidence from outside the program; %2 are not.</source>
        <translation>%1 davon sind Belege von außerhalb des Programms; %2 sind es nicht.</translation>
    </message>
    <message>
        <source>read in the work itself</source>
        <translation>im Werk selbst gelesen</translation>
    </message>
    <message>
        <source>read in a companion of the work or second-hand</source>
        <translation>in einem Begleitwerk oder aus zweiter Hand gelesen</translation>
    </message>
    <message>
        <source>from memory</source>
        <translation>aus dem Gedächtnis</translation>
    </message>
    <message>
        <source>own arithmetic</source>
        <translation>eigene Rechnung</translation>
    </message>
    <message>
        <source>Check</source>
        <translation>Prüfung</translation>
    </message>
    <message>
        <source>Quantity</source>
        <translation>Größe</translation>
    </message>
    <message>
        <source>Inputs</source>
        <translation>Eingaben</translation>
    </message>
    <message>
        <source>Printed</source>
        <translation>Gedruckt</translation>
    </message>
    <message>
        <source>Computed</source>
        <translation>Berechnet</translation>
    </message>
    <message>
        <source>Difference</source>
        <translation>Abweichung</translation>
    </message>
    <message>
        <source>Tolerance</source>
        <translation>Toleranz</translation>
    </message>
    <message>
        <source>Verdict</source>
        <translation>Ergebnis</translation>
    </message>
    <message>
        <source>Where</source>
        <translation>Fundstelle</translation>
    </message>
    <message>
        <source>none</source>
        <translation>keiner</translation>
    </message>
    <message>
        <source>agrees</source>
        <translation>stimmt überein</translation>
    </message>
    <message>
        <source>DISAGREES</source>
        <translation>WEICHT AB</translation>
    </message>
    <message>
        <source>Planewright %1 on %2</source>
        <translation>Planewright %1 auf %2</translation>
    </message>
    <message>
        <source>By what the values rest on</source>
        <translation>Worauf die Werte beruhen</translation>
    </message>
    <message>
        <source>Basis</source>
        <translation>Grundlage</translation>
    </message>
    <message>
        <source>Outside evidence</source>
        <translation>Fremder Beleg</translation>
    </message>
    <message>
        <source>Values</source>
        <translation>Werte</translation>
    </message>
    <message>
        <source>Disagree</source>
        <translation>Abweichend</translation>
    </message>
    <message>
        <source>yes</source>
        <translation>ja</translation>
    </message>
    <message>
        <source>no</source>
        <translation>nein</translation>
    </message>
    <message>
        <source>A value without a printed one, or one that its source rounded on its way, is judged by own arithmetic; of some sources only the size without its sign.</source>
        <translation>Ein Wert ohne gedrucktes Ergebnis oder einer, den seine Quelle zwischendurch gerundet hat, wird nach eigener Rechnung beurteilt; bei manchen Quellen nur der Betrag ohne Vorzeichen.</translation>
    </message>
    <message>
        <source>What disagrees</source>
        <translation>Was abweicht</translation>
    </message>
    <message>
        <source>All values, by source</source>
        <translation>Alle Werte, nach Quelle</translation>
    </message>
    <message>
        <source>Basis: %1.</source>
        <translation>Grundlage: %1.</translation>
    </message>
    <message>
        <source>Known misprints of the sources</source>
        <translation>Bekannte Druckfehler der Quellen</translation>
    </message>
    <message>
        <source>Printed answers that do not follow from their own inputs; nothing is judged against them.</source>
        <translation>Gedruckte Ergebnisse, die nicht aus ihren eigenen Eingaben folgen; an ihnen wird nichts beurteilt.</translation>
    </message>
    <message>
        <source>Source</source>
        <translation>Quelle</translation>
    </message>
    <message>
        <source>Recomputed</source>
        <translation>Nachgerechnet</translation>
    </message>
    <message>
        <source>Reason</source>
        <translation>Grund</translation>
    </message>
    <message>
        <source>Planewright %1</source>
        <translation>Planewright %1</translation>
    </message>
    <message>
        <source>Published values, recomputed</source>
        <translation>Veröffentlichte Werte, nachgerechnet</translation>
    </message>
    <message>
        <source>Evidence for the transformations and criteria alone. Local codes and a licensed engineer decide.</source>
        <translation>Beleg nur für Transformationen und Kriterien. Es entscheiden örtliche Normen und Vorschriften sowie zugelassene Ingenieurinnen und Ingenieure.</translation>
    </message>
    <message>
        <source>Planewright %1 · %2</source>
        <translation>Planewright %1 · %2</translation>
    </message>
</context>
<context>
    <name>Vessel</name>
    <message>
        <source>closed ends</source>
        <translation>geschlossene Enden</translation>
    </message>
    <message>
        <source>open ends</source>
        <translation>offene Enden</translation>
    </message>
</context>
<context>
    <name>Working</name>
    <message>
        <source>%1, at the worst direction</source>
        <translation>%1, in der ungünstigsten Richtung</translation>
    </message>
    <message>
        <source>%1, at the direction that comes to its limit first</source>
        <translation>%1, in der Richtung, die zuerst die Grenze erreicht</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>multiplier on all loads that reaches the limit</source>
        <translation>Multiplikator aller Lasten, der die Grenze erreicht</translation>
    </message>
    <message>
        <source>the utilisation is proportional to the loads</source>
        <translation>die Ausnutzung ist den Lasten proportional</translation>
    </message>
    <message>
        <source>terms linear in the stresses</source>
        <translation>in den Spannungen lineare Glieder</translation>
    </message>
    <message>
        <source>terms quadratic in the stresses</source>
        <translation>in den Spannungen quadratische Glieder</translation>
    </message>
    <message>
        <source>product coefficient of the strengths times the factor</source>
        <translation>Produktkoeffizient zu den Festigkeiten mal Beiwert</translation>
    </message>
    <message>
        <source>terms quadratic in the stresses, with F_{12} = −√(F_{11} F_{22})/2</source>
        <translation>in den Spannungen quadratische Glieder, mit F_{12} = −√(F_{11} F_{22})/2</translation>
    </message>
    <message>
        <source>shear that the plane resists</source>
        <translation>aufnehmbarer Schub der Ebene</translation>
    </message>
    <message>
        <source>limit of the combined stress in the throat</source>
        <translation>Grenze der Vergleichsspannung in der Nahtfläche</translation>
    </message>
    <message>
        <source>limit of the normal stress on the throat</source>
        <translation>Grenze der Normalspannung auf der Nahtfläche</translation>
    </message>
    <message>
        <source>equivalent stress</source>
        <translation>Vergleichsspannung</translation>
    </message>
    <message>
        <source>radius of the circle at the line of failure</source>
        <translation>Radius des Kreises an der Bruchgeraden</translation>
    </message>
    <message>
        <source>common practice, no source</source>
        <translation>übliche Praxis, ohne Quelle</translation>
    </message>
    <message>
        <source>strength %1 times the factor</source>
        <translation>Festigkeit %1 mal Beiwert</translation>
    </message>
    <message>
        <source>strength along the line, axial tension mixed with bending</source>
        <translation>Festigkeit längs der Linie, axialer Zug mit Biegung gemischt</translation>
    </message>
    <message>
        <source>strength along the line, axial compression mixed with bending</source>
        <translation>Festigkeit längs der Linie, axialer Druck mit Biegung gemischt</translation>
    </message>
    <message>
        <source>share of bending along the line, all else counted as axial</source>
        <translation>Biegeanteil längs der Linie, alles andere als axial gezählt</translation>
    </message>
    <message>
        <source>strength at the angle α to the line</source>
        <translation>Festigkeit unter dem Winkel α zur Linie</translation>
    </message>
    <message>
        <source>factor of the tapered edge</source>
        <translation>Beiwert des angeschnittenen Rands</translation>
    </message>
    <message>
        <source>normal stress on the x face</source>
        <translation>Normalspannung auf der x-Fläche</translation>
    </message>
    <message>
        <source>normal stress on the y face</source>
        <translation>Normalspannung auf der y-Fläche</translation>
    </message>
    <message>
        <source>shear stress on the x face</source>
        <translation>Schubspannung auf der x-Fläche</translation>
    </message>
    <message>
        <source>the parts of a case add up</source>
        <translation>die Anteile eines Lastfalls addieren sich</translation>
    </message>
    <message>
        <source>factor of the strengths, duration of the loads: %1</source>
        <translation>Beiwert der Festigkeiten, Einwirkungsdauer: %1</translation>
    </message>
    <message>
        <source>factor of the strengths</source>
        <translation>Beiwert der Festigkeiten</translation>
    </message>
    <message>
        <source>share of bending in σ_{x}, of the parts that act as the whole does</source>
        <translation>Biegeanteil an σ_{x}, aus den Anteilen, die im Sinn der Summe wirken</translation>
    </message>
    <message>
        <source>%1, tension positive</source>
        <translation>%1, Zug positiv</translation>
    </message>
    <message>
        <source>stress along the %1</source>
        <translation>Spannung längs der Linie %1</translation>
    </message>
    <message>
        <source>stress across the %1</source>
        <translation>Spannung quer zur Linie %1</translation>
    </message>
    <message>
        <source>shear on the cut that crosses the %1</source>
        <translation>Schub im Schnitt quer zur Linie %1</translation>
    </message>
    <message>
        <source>normal stress on the plane %1</source>
        <translation>Normalspannung auf der Ebene %1</translation>
    </message>
    <message>
        <source>shear on the plane %1</source>
        <translation>Schub auf der Ebene %1</translation>
    </message>
    <message>
        <source>the one principal stress</source>
        <translation>einzige Hauptspannung</translation>
    </message>
    <message>
        <source>angle of that stress to the %1</source>
        <translation>Winkel dieser Spannung zur Linie %1</translation>
    </message>
    <message>
        <source>greatest principal stress</source>
        <translation>größte Hauptspannung</translation>
    </message>
    <message>
        <source>middle principal stress</source>
        <translation>mittlere Hauptspannung</translation>
    </message>
    <message>
        <source>least principal stress</source>
        <translation>kleinste Hauptspannung</translation>
    </message>
    <message>
        <source>normal stress on the reading plane</source>
        <translation>Normalspannung auf der Ableseebene</translation>
    </message>
    <message>
        <source>shear on the reading plane</source>
        <translation>Schub auf der Ableseebene</translation>
    </message>
    <message>
        <source>mean stress</source>
        <translation>mittlere Spannung</translation>
    </message>
    <message>
        <source>radius of the circle</source>
        <translation>Radius des Kreises</translation>
    </message>
    <message>
        <source>greater principal stress</source>
        <translation>größere Hauptspannung</translation>
    </message>
    <message>
        <source>lesser principal stress</source>
        <translation>kleinere Hauptspannung</translation>
    </message>
    <message>
        <source>normal of the plane of σ_{1}</source>
        <translation>Normale der Ebene von σ_{1}</translation>
    </message>
    <message>
        <source>normal of the plane of greatest τ_{nt}</source>
        <translation>Normale der Ebene des größten τ_{nt}</translation>
    </message>
    <message>
        <source>greatest shear of all planes</source>
        <translation>größter Schub aller Ebenen</translation>
    </message>
    <message>
        <source>shear stress</source>
        <translation>Schubspannung</translation>
    </message>
    <message>
        <source>stress across the plane</source>
        <translation>Spannung quer zur Ebene</translation>
    </message>
</context>
<context>
    <name>planewright::BuildDialog</name>
    <message>
        <source>ψ₀ of %1</source>
        <translation>ψ₀ von %1</translation>
    </message>
    <message>
        <source>Build combinations</source>
        <translation>Kombinationen bilden</translation>
    </message>
    <message>
        <source>rule</source>
        <translation>Regel</translation>
    </message>
    <message>
        <source>by</source>
        <translation>nach</translation>
    </message>
    <message>
        <source>γ of permanent, unfavourable</source>
        <translation>γ ständig, ungünstig</translation>
    </message>
    <message>
        <source>γ of permanent, favourable</source>
        <translation>γ ständig, günstig</translation>
    </message>
    <message>
        <source>γ of variable</source>
        <translation>γ veränderlich</translation>
    </message>
    <message>
        <source>ξ, of (6.10b) only</source>
        <translation>ξ, nur für (6.10b)</translation>
    </message>
    <message>
        <source>combinations that are built</source>
        <translation>gebildete Kombinationen</translation>
    </message>
    <message>
        <source>%1: </source>
        <translation>%1: </translation>
    </message>
    <message>
        <source>Add them</source>
        <translation>Hinzufügen</translation>
    </message>
    <message>
        <source>Nothing is built.</source>
        <translation>Es wird nichts gebildet.</translation>
    </message>
    <message>
        <source>%1 combinations</source>
        <translation>%1 Kombinationen</translation>
    </message>
    <message>
        <source>%1 combinations, %2 of them in the study already</source>
        <translation>%1 Kombinationen, davon %2 schon in der Studie</translation>
    </message>
    <message>
        <source>Add %1</source>
        <translation>%1 hinzufügen</translation>
    </message>
    <message>
        <source>built combinations</source>
        <translation>gebildete Kombinationen</translation>
    </message>
</context>
<context>
    <name>planewright::CaseStrip</name>
    <message>
        <source>case %1</source>
        <translation>Lastfall %1</translation>
    </message>
    <message>
        <source>Case</source>
        <translation>Lastfall</translation>
    </message>
    <message>
        <source>case</source>
        <translation>Lastfall</translation>
    </message>
</context>
<context>
    <name>planewright::CheckFields</name>
    <message>
        <source>2, usual</source>
        <translation>2, üblich</translation>
    </message>
    <message>
        <source>1, usual</source>
        <translation>1, üblich</translation>
    </message>
    <message>
        <source>−0.5 √(F₁₁ F₂₂), usual</source>
        <translation>−0.5 √(F₁₁ F₂₂), üblich</translation>
    </message>
    <message>
        <source>material</source>
        <translation>Material</translation>
    </message>
    <message>
        <source>criterion</source>
        <translation>Kriterium</translation>
    </message>
    <message>
        <source>on</source>
        <translation>Richtung</translation>
    </message>
    <message>
        <source>exponent of Hankinson&apos;s formula, 2 unless given</source>
        <translation>Exponent der Formel von Hankinson, ohne Angabe 2</translation>
    </message>
    <message>
        <source>product coefficient of Tsai and Wu; half the usual root unless given</source>
        <translation>Produktbeiwert von Tsai und Wu; ohne Angabe die übliche halbe Wurzel</translation>
    </message>
    <message>
        <source>factor of compression across the grain, 1 unless given</source>
        <translation>Beiwert für Druck quer zur Faser, ohne Angabe 1</translation>
    </message>
    <message>
        <source>direction of the tapered edge</source>
        <translation>Richtung des angeschnittenen Rands</translation>
    </message>
    <message>
        <source>material of the check</source>
        <translation>Material des Nachweises</translation>
    </message>
    <message>
        <source>criterion of the check</source>
        <translation>Kriterium des Nachweises</translation>
    </message>
    <message>
        <source>direction of the check</source>
        <translation>Richtung des Nachweises</translation>
    </message>
    <message>
        <source>every direction</source>
        <translation>jede Richtung</translation>
    </message>
</context>
<context>
    <name>planewright::CheckList</name>
    <message>
        <source>check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>Checks of the point</source>
        <translation>Nachweise des Punkts</translation>
    </message>
    <message>
        <source>no stress</source>
        <translation>keine Spannung</translation>
    </message>
</context>
<context>
    <name>planewright::CirclePlot</name>
    <message>
        <source>%1 degrees</source>
        <translation>%1 Grad</translation>
    </message>
    <message>
        <source>Reading plane on the circle</source>
        <translation>Ableseebene am Kreis</translation>
    </message>
    <message>
        <source>Turn the reading plane</source>
        <translation>Ableseebene drehen</translation>
    </message>
    <message>
        <source>Every direction is principal: the arrow keys turn the plane</source>
        <translation>Jede Richtung ist Hauptrichtung: Die Pfeiltasten drehen die Ebene</translation>
    </message>
    <message>
        <source>Draw the x face: changes σx and τxy of case %1</source>
        <translation>x-Fläche ziehen: ändert σx und τxy von Lastfall %1</translation>
    </message>
    <message>
        <source>The x face cannot be drawn here: %1 is not one case with factor 1,
so a drag would not say which case to change.</source>
        <translation>Die x-Fläche lässt sich hier nicht ziehen: %1 ist nicht ein einzelner Lastfall mit Beiwert 1,
daher bliebe offen, welcher Lastfall zu ändern ist.</translation>
    </message>
    <message>
        <source>Draw the x face</source>
        <translation>x-Fläche ziehen</translation>
    </message>
    <message>
        <source>normal stress %1, shear stress %2; principal stresses %3 and %4</source>
        <translation>Normalspannung %1, Schubspannung %2; Hauptspannungen %3 und %4</translation>
    </message>
</context>
<context>
    <name>planewright::CircleView</name>
    <message>
        <source>This circle</source>
        <translation>Dieser Kreis</translation>
    </message>
    <message>
        <source>All combinations</source>
        <translation>Alle Kombinationen</translation>
    </message>
    <message>
        <source>With the limit of checked planes</source>
        <translation>Mit der Grenze nachgewiesener Ebenen</translation>
    </message>
    <message>
        <source>Circle</source>
        <translation>Mohrscher Kreis</translation>
    </message>
    <message>
        <source>Left/Right turn by 1°, Shift 0.1°, Ctrl 15°</source>
        <translation>Links/Rechts dreht um 1°, Umschalt 0.1°, Strg 15°</translation>
    </message>
    <message>
        <source>fit: all combinations</source>
        <translation>Ausschnitt: alle Kombinationen</translation>
    </message>
    <message>
        <source>fit: with the limit</source>
        <translation>Ausschnitt: mit Grenze</translation>
    </message>
    <message>
        <source>fit: this circle</source>
        <translation>Ausschnitt: dieser Kreis</translation>
    </message>
</context>
<context>
    <name>planewright::ConventionGroup</name>
    <message>
        <source>Conventions</source>
        <translation>Vereinbarungen</translation>
    </message>
    <message>
        <source>Units of bare numbers and of results</source>
        <translation>Einheiten für Zahlen ohne Einheit und für Ergebnisse</translation>
    </message>
    <message>
        <source>moment</source>
        <translation>Spannung</translation>
    </message>
    <message>
        <source>sense of the shear force</source>
        <translation>Richtungssinn der Querkraft</translation>
    </message>
    <message>
        <source>sign convention</source>
        <translation>Vorzeichenregel</translation>
    </message>
    <message>
        <source>Tension now counts positive. Typed numbers keep their digits and now mean the opposite sense.</source>
        <translation>Zug zählt jetzt positiv. Eingegebene Zahlen behalten ihre Ziffern und gelten jetzt im entgegengesetzten Sinn.</translation>
    </message>
    <message>
        <source>Compression now counts positive. Typed numbers keep their digits and now mean the opposite sense.</source>
        <translation>Druck zählt jetzt positiv. Eingegebene Zahlen behalten ihre Ziffern und gelten jetzt im entgegengesetzten Sinn.</translation>
    </message>
    <message>
        <source>direction of the shear axis</source>
        <translation>Richtung der Schubachse</translation>
    </message>
    <message>
        <source>Vy positive upwards</source>
        <translation>Vy nach oben positiv</translation>
    </message>
    <message>
        <source>Vy = dMz/dx</source>
        <translation>Vy = dMz/dx</translation>
    </message>
    <message>
        <source>%1, %2</source>
        <translation>%1, %2</translation>
    </message>
    <message>
        <source>digits of stresses</source>
        <translation>Stellenzahl der Spannungen</translation>
    </message>
</context>
<context>
    <name>planewright::ElementView</name>
    <message>
        <source>Element</source>
        <translation>Spannungselement</translation>
    </message>
    <message>
        <source>Left/Right turn by 1°, Shift 0.1°, Ctrl 15°</source>
        <translation>Links/Rechts dreht um 1°, Umschalt 0.1°, Strg 15°</translation>
    </message>
    <message>
        <source>Turn the %1</source>
        <translation>%1 drehen</translation>
    </message>
    <message>
        <source>Turn the reading plane</source>
        <translation>Ableseebene drehen</translation>
    </message>
    <message>
        <source>%1, at %2 degrees, changes what is given</source>
        <translation>%1, bei %2 Grad, ändert gegebene Werte</translation>
    </message>
    <message>
        <source>reading plane, normal at %1 degrees</source>
        <translation>Ableseebene, Normale bei %1 Grad</translation>
    </message>
    <message>
        <source>turn the reading plane</source>
        <translation>Ableseebene drehen</translation>
    </message>
    <message>
        <source>turn the %1: changes what is given</source>
        <translation>%1 drehen: ändert gegebene Werte</translation>
    </message>
</context>
<context>
    <name>planewright::EntryField</name>
    <message>
        <source>from drag</source>
        <translation>durch Ziehen</translation>
    </message>
    <message>
        <source>“%1” for %2 was not taken.</source>
        <translation>„%1“ als %2 wurde nicht übernommen.</translation>
    </message>
    <message>
        <source>typing of %1</source>
        <translation>Eingabe: %1</translation>
    </message>
    <message>
        <source>still %1</source>
        <translation>noch %1</translation>
    </message>
    <message>
        <source>= %1</source>
        <translation>= %1</translation>
    </message>
    <message>
        <source>before the drag: %1</source>
        <translation>vor dem Ziehen: %1</translation>
    </message>
    <message>
        <source>Not taken: %1 %2</source>
        <translation>Nicht übernommen: %1 %2</translation>
    </message>
</context>
<context>
    <name>planewright::EvidenceDialog</name>
    <message>
        <source>Published values, recomputed</source>
        <translation>Veröffentlichte Werte, nachgerechnet</translation>
    </message>
    <message>
        <source>Save PDF…</source>
        <translation>PDF speichern…</translation>
    </message>
    <message>
        <source>PDF (*.pdf)</source>
        <translation>PDF (*.pdf)</translation>
    </message>
    <message>
        <source>Save HTML…</source>
        <translation>HTML speichern…</translation>
    </message>
    <message>
        <source>HTML (*.html)</source>
        <translation>HTML (*.html)</translation>
    </message>
    <message>
        <source>Save text…</source>
        <translation>Text speichern…</translation>
    </message>
    <message>
        <source>Text (*.txt)</source>
        <translation>Text (*.txt)</translation>
    </message>
    <message>
        <source>Print…</source>
        <translation>Drucken…</translation>
    </message>
    <message>
        <source>published-values</source>
        <translation>veroeffentlichte-werte</translation>
    </message>
    <message>
        <source>Save the report</source>
        <translation>Bericht speichern</translation>
    </message>
    <message>
        <source>Saved as %1.</source>
        <translation>Gespeichert als %1.</translation>
    </message>
    <message>
        <source>The report is printed.</source>
        <translation>Der Bericht ist gedruckt.</translation>
    </message>
</context>
<context>
    <name>planewright::FacesDialog</name>
    <message>
        <source>True slope of the grain from two faces</source>
        <translation>Wahre Faserneigung aus zwei Flächen</translation>
    </message>
    <message>
        <source>Slope on the wide face</source>
        <translation>Neigung auf der breiten Fläche</translation>
    </message>
    <message>
        <source>Slope on the narrow face</source>
        <translation>Neigung auf der schmalen Fläche</translation>
    </message>
    <message>
        <source>1 in 12</source>
        <translation>1 in 12</translation>
    </message>
    <message>
        <source>1 in 20</source>
        <translation>1 in 20</translation>
    </message>
    <message>
        <source>Take either way</source>
        <translation>Beidseitig übernehmen</translation>
    </message>
    <message>
        <source>tan φ = √(tan² a + tan² b): the sense is lost, so it counts either way.</source>
        <translation>tan φ = √(tan² a + tan² b): Der Richtungssinn geht verloren, daher gilt sie beidseitig.</translation>
    </message>
    <message>
        <source>none</source>
        <translation>keine</translation>
    </message>
    <message>
        <source>True slope %1 (%2), either way. The angle of the line stays %3; its tolerance, now %4, becomes %5.</source>
        <translation>Wahre Neigung %1 (%2), beidseitig. Der Winkel der Linie bleibt %3; ihre Toleranz, jetzt %4, wird %5.</translation>
    </message>
</context>
<context>
    <name>planewright::FieldMapView</name>
    <message>
        <source>Map of the field by utilisation</source>
        <translation>Karte des Punktfelds nach Ausnutzung</translation>
    </message>
    <message>
        <source>%1 %2   x →  y ↑</source>
        <translation>%1 %2   x →  y ↑</translation>
    </message>
</context>
<context>
    <name>planewright::FieldModel</name>
    <message>
        <source>left out</source>
        <translation>weggelassen</translation>
    </message>
    <message>
        <source>incomplete</source>
        <translation>unvollständig</translation>
    </message>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>layer</source>
        <translation>Lage</translation>
    </message>
    <message>
        <source>region</source>
        <translation>Bereich</translation>
    </message>
    <message>
        <source>utilisation</source>
        <translation>Ausnutzung</translation>
    </message>
    <message>
        <source>load multiplier</source>
        <translation>Lastmultiplikator</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>mode</source>
        <translation>Versagensart</translation>
    </message>
    <message>
        <source>worst angle</source>
        <translation>ungünst. Winkel</translation>
    </message>
    <message>
        <source>x (%1)</source>
        <translation>x (%1)</translation>
    </message>
    <message>
        <source>y (%1)</source>
        <translation>y (%1)</translation>
    </message>
</context>
<context>
    <name>planewright::FieldPage</name>
    <message>
        <source>e&amp;xceeding only</source>
        <translation>nur &amp;überschrittene</translation>
    </message>
    <message>
        <source>&amp;Open as a point</source>
        <translation>Als Punkt ö&amp;ffnen</translation>
    </message>
    <message>
        <source>name or region</source>
        <translation>Name oder Bereich</translation>
    </message>
    <message>
        <source>Filter by name or region</source>
        <translation>Nach Name oder Bereich filtern</translation>
    </message>
    <message>
        <source>utilisation from</source>
        <translation>Ausnutzung ab</translation>
    </message>
    <message>
        <source>Filter by the least utilisation</source>
        <translation>Nach Mindestausnutzung filtern</translation>
    </message>
    <message>
        <source>Filter by combination</source>
        <translation>Nach Kombination filtern</translation>
    </message>
    <message>
        <source>Points of the field</source>
        <translation>Punkte des Punktfelds</translation>
    </message>
    <message>
        <source>What was judged and read, and cautions</source>
        <translation>Was beurteilt und gelesen wurde, und Hinweise</translation>
    </message>
    <message>
        <source>Map, bars and notes</source>
        <translation>Karte, Balken und Notizen</translation>
    </message>
    <message>
        <source>&amp;Map</source>
        <translation>&amp;Karte</translation>
    </message>
    <message>
        <source>&amp;Bars</source>
        <translation>&amp;Balken</translation>
    </message>
    <message>
        <source>&amp;Notes</source>
        <translation>&amp;Notizen</translation>
    </message>
    <message>
        <source>Points by utilisation</source>
        <translation>Punkte nach Ausnutzung</translation>
    </message>
    <message>
        <source>Screen &amp;another…</source>
        <translation>&amp;Weitere Tabelle prüfen…</translation>
    </message>
    <message>
        <source>&amp;Save results…</source>
        <translation>Ergebnisse &amp;speichern…</translation>
    </message>
    <message>
        <source>%1, judged by %2.</source>
        <translation>%1, beurteilt nach %2.</translation>
    </message>
    <message>
        <source>all combinations</source>
        <translation>alle Kombinationen</translation>
    </message>
    <message>
        <source>“%1” is no utilisation. Write a number with a point, as 0.8.</source>
        <translation>„%1“ ist keine Ausnutzung. Eine Zahl mit Punkt schreiben, etwa 0.8.</translation>
    </message>
    <message>
        <source>rows: %1 of %2</source>
        <translation>Zeilen: %1 von %2</translation>
    </message>
    <message>
        <source>The study has changed since: these results are of the study as it was. Screen again.</source>
        <translation>Die Studie hat sich seitdem geändert: Diese Ergebnisse gehören zum früheren Bearbeitungsstand. Neu prüfen.</translation>
    </message>
    <message>
        <source>point %1 of a field</source>
        <translation>Punkt %1 aus einem Punktfeld</translation>
    </message>
    <message>
        <source>Results written to %1.</source>
        <translation>Ergebnisse in %1 geschrieben.</translation>
    </message>
</context>
<context>
    <name>planewright::FieldSetup</name>
    <message>
        <source>&amp;Choose…</source>
        <translation>&amp;Wählen…</translation>
    </message>
    <message>
        <source>Leave &amp;faulty rows out</source>
        <translation>&amp;Fehlerhafte Zeilen weglassen</translation>
    </message>
    <message>
        <source>&amp;Screen</source>
        <translation>&amp;Prüfen</translation>
    </message>
    <message>
        <source>Cancel</source>
        <translation>Abbrechen</translation>
    </message>
    <message>
        <source>names of points or regions, commas between: corner*, support</source>
        <translation>Namen von Punkten oder Bereichen, durch Kommas getrennt: corner*, support</translation>
    </message>
    <message>
        <source>Points and regions to leave out</source>
        <translation>Wegzulassende Punkte und Bereiche</translation>
    </message>
    <message>
        <source>Point whose checks judge</source>
        <translation>Punkt, dessen Nachweise gelten</translation>
    </message>
    <message>
        <source>Without it a faulty row ends the run; they are counted either way.</source>
        <translation>Sonst beendet eine fehlerhafte Zeile den Lauf; gezählt werden fehlerhafte Zeilen in jedem Fall.</translation>
    </message>
    <message>
        <source>Judged by the checks of</source>
        <translation>Beurteilt mit den Nachweisen von</translation>
    </message>
    <message>
        <source>Left out</source>
        <translation>Weggelassen</translation>
    </message>
    <message>
        <source>File of the table</source>
        <translation>Datei der Tabelle</translation>
    </message>
    <message>
        <source>a table as CSV: point,case,sx,sy,txy or three columns for each case</source>
        <translation>Tabelle als CSV: point,case,sx,sy,txy oder drei Spalten je Lastfall</translation>
    </message>
    <message>
        <source>start of the table</source>
        <translation>Anfang der Tabelle</translation>
    </message>
    <message>
        <source>What is wrong with the table</source>
        <translation>Fehler der Tabelle</translation>
    </message>
    <message>
        <source>Judging the points …</source>
        <translation>Punkte werden beurteilt …</translation>
    </message>
    <message>
        <source>Reading the table …</source>
        <translation>Tabelle wird gelesen …</translation>
    </message>
    <message>
        <source>Nothing is screened while something is wrong:</source>
        <translation>Nichts wird geprüft, solange etwas fehlerhaft ist:</translation>
    </message>
</context>
<context>
    <name>planewright::FigureArrangement</name>
    <message>
        <source>Earlier</source>
        <translation>Nach vorn</translation>
    </message>
    <message>
        <source>Later</source>
        <translation>Nach hinten</translation>
    </message>
    <message>
        <source>Elements and circle</source>
        <translation>Elemente und Kreis</translation>
    </message>
    <message>
        <source>Order of the parts</source>
        <translation>Reihenfolge der Teile</translation>
    </message>
    <message>
        <source>From the top down; of elements and circle in one row the first stands to the left.</source>
        <translation>Von oben nach unten; stehen Elemente und Kreis in einer Reihe, steht das erste links.</translation>
    </message>
</context>
<context>
    <name>planewright::FigureDialog</name>
    <message>
        <source>Arrange figure</source>
        <translation>Abbildung anordnen</translation>
    </message>
    <message>
        <source>Fit</source>
        <translation>Einpassen</translation>
    </message>
    <message>
        <source>100 %</source>
        <translation>100 %</translation>
    </message>
    <message>
        <source>File name</source>
        <translation>Dateiname</translation>
    </message>
    <message>
        <source>Save</source>
        <translation>Speichern</translation>
    </message>
    <message>
        <source>Save as…</source>
        <translation>Speichern unter…</translation>
    </message>
    <message>
        <source>Copy</source>
        <translation>Kopieren</translation>
    </message>
    <message>
        <source>Print…</source>
        <translation>Drucken…</translation>
    </message>
    <message>
        <source>All points…</source>
        <translation>Alle Punkte…</translation>
    </message>
    <message>
        <source>No room beside the drawings for the values of %1: they stand in the table.</source>
        <translation>Neben den Zeichnungen ist kein Platz für die Werte von %1: Sie stehen in der Tabelle.</translation>
    </message>
    <message>
        <source>No room beside the drawings for the values of %1; the table of planes has them.</source>
        <translation>Neben den Zeichnungen ist kein Platz für die Werte von %1; die Tabelle der Ebenen enthält sie.</translation>
    </message>
    <message>
        <source>Saved as %1, with the study inside.</source>
        <translation>Gespeichert als %1, mit der Studie darin.</translation>
    </message>
    <message>
        <source>Saved as %1, without the study.</source>
        <translation>Gespeichert als %1, ohne die Studie.</translation>
    </message>
    <message>
        <source>%1 exists. Replace it?</source>
        <translation>%1 ist schon vorhanden. Ersetzen?</translation>
    </message>
    <message>
        <source>Save figure</source>
        <translation>Abbildung speichern</translation>
    </message>
    <message>
        <source>%1 figure (*%2)</source>
        <translation>%1-Abbildung (*%2)</translation>
    </message>
    <message>
        <source>The figure is on the clipboard, as SVG, PDF and pixels.</source>
        <translation>Die Abbildung ist in der Zwischenablage, als SVG, PDF und Pixelbild.</translation>
    </message>
    <message>
        <source>Preview</source>
        <translation>Vorschau</translation>
    </message>
</context>
<context>
    <name>planewright::FigureOptions</name>
    <message>
        <source>Parts</source>
        <translation>Teile</translation>
    </message>
    <message>
        <source>Title</source>
        <translation>Titel</translation>
    </message>
    <message>
        <source>Element in the given axes</source>
        <translation>Element in den gegebenen Achsen</translation>
    </message>
    <message>
        <source>Element at the reading plane</source>
        <translation>Element an der Ableseebene</translation>
    </message>
    <message>
        <source>Circle</source>
        <translation>Mohrscher Kreis</translation>
    </message>
    <message>
        <source>Table of planes</source>
        <translation>Tabelle der Ebenen</translation>
    </message>
    <message>
        <source>Check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>Utilisation over the angle</source>
        <translation>Ausnutzung über dem Winkel</translation>
    </message>
    <message>
        <source>Conventions</source>
        <translation>Vereinbarungen</translation>
    </message>
    <message>
        <source>A figure without its sign conventions can be misread; they always stand.</source>
        <translation>Ohne ihre Vorzeichenregeln ist eine Abbildung leicht falsch zu lesen; sie stehen immer dabei.</translation>
    </message>
    <message>
        <source>Arrangement</source>
        <translation>Anordnung</translation>
    </message>
    <message>
        <source>Width</source>
        <translation>Breite</translation>
    </message>
    <message>
        <source>Text column, 90 mm</source>
        <translation>Textspalte, 90 mm</translation>
    </message>
    <message>
        <source>Full page, 160 mm</source>
        <translation>Ganze Seite, 160 mm</translation>
    </message>
    <message>
        <source>Own width</source>
        <translation>Eigene Breite</translation>
    </message>
    <message>
        <source>Own width in mm</source>
        <translation>Eigene Breite in mm</translation>
    </message>
    <message>
        <source>mm</source>
        <translation>mm</translation>
    </message>
    <message>
        <source>Text and colour</source>
        <translation>Text und Farbe</translation>
    </message>
    <message>
        <source>Size of the text</source>
        <translation>Schriftgröße</translation>
    </message>
    <message>
        <source>pt</source>
        <translation>pt</translation>
    </message>
    <message>
        <source>Mono: black and greys only</source>
        <translation>Einfarbig: nur Schwarz und Grau</translation>
    </message>
    <message>
        <source>Caption</source>
        <translation>Bildunterschrift</translation>
    </message>
    <message>
        <source>Format</source>
        <translation>Format</translation>
    </message>
    <message>
        <source>SVG, lines and text</source>
        <translation>SVG, Linien und Text</translation>
    </message>
    <message>
        <source>PDF, lines and text</source>
        <translation>PDF, Linien und Text</translation>
    </message>
    <message>
        <source>PNG, pixels</source>
        <translation>PNG, Pixel</translation>
    </message>
    <message>
        <source>dpi</source>
        <translation>dpi</translation>
    </message>
    <message>
        <source>Resolution of the PNG</source>
        <translation>Auflösung der PNG-Datei</translation>
    </message>
    <message>
        <source>Study</source>
        <translation>Studie</translation>
    </message>
    <message>
        <source>Carry the study inside the file</source>
        <translation>Studie in der Datei mitgeben</translation>
    </message>
    <message>
        <source>For sending outside</source>
        <translation>Für Versand nach außen</translation>
    </message>
    <message>
        <source>Leaves the study out until this window is closed.</source>
        <translation>Lässt die Studie weg, bis dieses Fenster geschlossen wird.</translation>
    </message>
    <message>
        <source>The whole study, with all points and notes, travels inside; opening the figure brings it back.</source>
        <translation>Die ganze Studie mit allen Punkten und Notizen ist enthalten; Öffnen der Abbildung stellt sie wieder her.</translation>
    </message>
    <message>
        <source>The file holds the figure alone; no study comes back from it.</source>
        <translation>Die Datei enthält nur die Abbildung; aus ihr lässt sich keine Studie wiederherstellen.</translation>
    </message>
</context>
<context>
    <name>planewright::FigurePage</name>
    <message>
        <source>Figure</source>
        <translation>Abbildung</translation>
    </message>
    <message>
        <source>0 mm</source>
        <translation>0 mm</translation>
    </message>
</context>
<context>
    <name>planewright::Filing</name>
    <message>
        <source>New study</source>
        <translation>Neue Studie</translation>
    </message>
    <message>
        <source>Study from %1</source>
        <translation>Studie aus %1</translation>
    </message>
    <message>
        <source>study.planewright</source>
        <translation>studie.planewright</translation>
    </message>
    <message>
        <source>%1 points.csv</source>
        <translation>%1 Punkte.csv</translation>
    </message>
    <message>
        <source>The points are in %1.</source>
        <translation>Die Punkte sind in %1.</translation>
    </message>
    <message>
        <source>Saved as %1.</source>
        <translation>Gespeichert als %1.</translation>
    </message>
</context>
<context>
    <name>planewright::FilterList</name>
    <message>
        <source>Type to filter</source>
        <translation>Zum Filtern tippen</translation>
    </message>
    <message>
        <source>Filter</source>
        <translation>Filter</translation>
    </message>
</context>
<context>
    <name>planewright::GivenPanel</name>
    <message>
        <source>Given</source>
        <translation>Gegeben</translation>
    </message>
    <message>
        <source>Enter takes an entry, Esc puts it back, F8 next entry not taken</source>
        <translation>Eingabetaste übernimmt, Esc stellt zurück, F8 nächste nicht übernommene Eingabe</translation>
    </message>
    <message>
        <source>Notes</source>
        <translation>Anmerkung</translation>
    </message>
    <message>
        <source>bare numbers in %1</source>
        <translation>ohne Einheit: %1</translation>
    </message>
    <message>
        <source>none</source>
        <translation>keine</translation>
    </message>
    <message>
        <source>%1 of case %2</source>
        <translation>%1 von Lastfall %2</translation>
    </message>
</context>
<context>
    <name>planewright::HelpWindow</name>
    <message>
        <source>Pages</source>
        <translation>Seiten</translation>
    </message>
    <message>
        <source>Page</source>
        <translation>Seite</translation>
    </message>
    <message>
        <source>Handbook</source>
        <translation>Handbuch</translation>
    </message>
    <message>
        <source>Search (Ctrl+F)</source>
        <translation>Suchen (Strg+F)</translation>
    </message>
    <message>
        <source>Search</source>
        <translation>Suchen</translation>
    </message>
    <message>
        <source>Back (Alt+Left)</source>
        <translation>Zurück (Alt+Links)</translation>
    </message>
    <message>
        <source>Forward (Alt+Right)</source>
        <translation>Vorwärts (Alt+Rechts)</translation>
    </message>
    <message>
        <source>%1 (%2)</source>
        <translation>%1 (%2)</translation>
    </message>
    <message>
        <source>These words stand on no page together.</source>
        <translation>Diese Wörter stehen auf keiner Seite zusammen.</translation>
    </message>
    <message>
        <source>Enter goes to the next place, Esc shows all pages.</source>
        <translation>Die Eingabetaste geht zur nächsten Stelle, Esc zeigt alle Seiten.</translation>
    </message>
</context>
<context>
    <name>planewright::HistogramView</name>
    <message>
        <source>above %1</source>
        <translation>über %1</translation>
    </message>
    <message>
        <source>up to %1</source>
        <translation>bis %1</translation>
    </message>
    <message>
        <source>Points by utilisation</source>
        <translation>Punkte nach Ausnutzung</translation>
    </message>
    <message>
        <source>Click on a bar to see its points alone, and once more for all.</source>
        <translation>Auf einen Balken klicken, um nur seine Punkte zu sehen, noch einmal für alle.</translation>
    </message>
    <message>
        <source>chosen: %1</source>
        <translation>gewählt: %1</translation>
    </message>
</context>
<context>
    <name>planewright::LineGroup</name>
    <message>
        <source>Line</source>
        <translation>Linie</translation>
    </message>
    <message>
        <source>Second line</source>
        <translation>Zweite Linie</translation>
    </message>
    <message>
        <source>Slope of unknown sense</source>
        <translation>Neigung unbekannten Sinns</translation>
    </message>
    <message>
        <source>A second direction of the material at this point, such as the bond beside the grain</source>
        <translation>Eine zweite Richtung des Materials an diesem Punkt, etwa die Klebfuge neben der Faser</translation>
    </message>
    <message>
        <source>true slope from two faces…</source>
        <translation>wahre Neigung aus zwei Flächen…</translation>
    </message>
    <message>
        <source>The slope of a grain whose sense is not known: the tolerance to either side of the angle above</source>
        <translation>Neigung einer Faser, deren Richtungssinn nicht bekannt ist: die Toleranz zu beiden Seiten des Winkels darüber</translation>
    </message>
    <message>
        <source>within 1 in %1 either way of %2</source>
        <translation>bis 1 in %1 beidseits von %2</translation>
    </message>
    <message>
        <source>within 1 in %1 either way</source>
        <translation>bis 1 in %1 beidseits</translation>
    </message>
    <message>
        <source>slope of unknown sense</source>
        <translation>Neigung unbekannten Sinns</translation>
    </message>
    <message>
        <source>another name…</source>
        <translation>anderer Name…</translation>
    </message>
    <message>
        <source>no line</source>
        <translation>keine Linie</translation>
    </message>
    <message>
        <source>kind of line</source>
        <translation>Art der Linie</translation>
    </message>
    <message>
        <source>± within</source>
        <translation>Toleranz ±</translation>
    </message>
    <message>
        <source>name of the line</source>
        <translation>Name der Linie</translation>
    </message>
    <message>
        <source>angle of the line from +x, or a slope</source>
        <translation>Winkel der Linie ab +x oder eine Neigung</translation>
    </message>
    <message>
        <source>tolerance of the line&apos;s angle</source>
        <translation>Toleranz des Winkels der Linie</translation>
    </message>
    <message>
        <source>new line</source>
        <translation>neue Linie</translation>
    </message>
    <message>
        <source>removal of the line</source>
        <translation>Entfernen der Linie</translation>
    </message>
    <message>
        <source>Without a line, only planes are read.</source>
        <translation>Ohne Linie werden nur Ebenen abgelesen.</translation>
    </message>
    <message>
        <source>The cut following it has its normal at %1.</source>
        <translation>Der Schnitt entlang der Linie hat seine Normale bei %1.</translation>
    </message>
</context>
<context>
    <name>planewright::MainWindow</name>
    <message>
        <source>Strength</source>
        <translation>Festigkeit</translation>
    </message>
    <message>
        <source>Unsaved changes cannot be kept for the next start. %1 Save often.</source>
        <translation>Ungespeicherte Änderungen können nicht für den nächsten Start aufgehoben werden. %1 Bitte oft speichern.</translation>
    </message>
    <message>
        <source>Undone: %1.</source>
        <translation>Rückgängig gemacht: %1.</translation>
    </message>
    <message>
        <source>%1.</source>
        <translation>%1.</translation>
    </message>
    <message>
        <source>Undo</source>
        <translation>Rückgängig</translation>
    </message>
    <message>
        <source>Open in another window: %1 is not saved over here.</source>
        <translation>In einem anderen Fenster geöffnet: %1 wird hier nicht überschrieben.</translation>
    </message>
    <message>
        <source>Take over</source>
        <translation>Übernehmen</translation>
    </message>
    <message>
        <source>Restored from %1. The study is in no file of its own yet.</source>
        <translation>Aus %1 wiederhergestellt. Die Studie liegt noch in keiner eigenen Datei.</translation>
    </message>
    <message>
        <source>Save as…</source>
        <translation>Speichern unter…</translation>
    </message>
    <message>
        <source>Worked example, invented. Start your own: Ctrl+N.</source>
        <translation>Ausgearbeitetes Beispiel, erfunden. Eigene Studie beginnen: Strg+N.</translation>
    </message>
    <message>
        <source>New study</source>
        <translation>Neue Studie</translation>
    </message>
    <message>
        <source>A new study: type the stresses of your point.</source>
        <translation>Eine neue Studie: Spannungen des Punkts eingeben.</translation>
    </message>
    <message>
        <source>Open the worked example</source>
        <translation>Ausgearbeitetes Beispiel öffnen</translation>
    </message>
    <message>
        <source>%1 (read-only)</source>
        <translation>%1 (schreibgeschützt)</translation>
    </message>
    <message>
        <source>%1[*] – Planewright</source>
        <translation>%1[*] – Planewright</translation>
    </message>
    <message>
        <source>%1: %2</source>
        <translation>%1: %2</translation>
    </message>
    <message>
        <source>All %1 problems</source>
        <translation>Alle %1 Fehler</translation>
    </message>
    <message>
        <source>Problems in %1</source>
        <translation>Fehler in %1</translation>
    </message>
    <message>
        <source>&amp;File</source>
        <translation>&amp;Datei</translation>
    </message>
    <message>
        <source>&amp;New</source>
        <translation>&amp;Neu</translation>
    </message>
    <message>
        <source>&amp;Open…</source>
        <translation>Ö&amp;ffnen…</translation>
    </message>
    <message>
        <source>Open &amp;recent</source>
        <translation>&amp;Zuletzt geöffnet</translation>
    </message>
    <message>
        <source>&amp;Unsaved studies…</source>
        <translation>Un&amp;gespeicherte Studien…</translation>
    </message>
    <message>
        <source>&amp;Save</source>
        <translation>&amp;Speichern</translation>
    </message>
    <message>
        <source>Save &amp;as…</source>
        <translation>Speichern &amp;unter…</translation>
    </message>
    <message>
        <source>&amp;Import points…</source>
        <translation>Punkte &amp;importieren…</translation>
    </message>
    <message>
        <source>Export poin&amp;ts…</source>
        <translation>Punkte &amp;exportieren…</translation>
    </message>
    <message>
        <source>S&amp;creen points…</source>
        <translation>Punkte &amp;reihenweise prüfen…</translation>
    </message>
    <message>
        <source>&amp;Export figure…</source>
        <translation>&amp;Abbildung exportieren…</translation>
    </message>
    <message>
        <source>Copy fi&amp;gure</source>
        <translation>Abbildung &amp;kopieren</translation>
    </message>
    <message>
        <source>&amp;Print figure…</source>
        <translation>Abbildung &amp;drucken…</translation>
    </message>
    <message>
        <source>Calculation s&amp;heet…</source>
        <translation>Rechenb&amp;latt…</translation>
    </message>
    <message>
        <source>&amp;Quit</source>
        <translation>&amp;Beenden</translation>
    </message>
    <message>
        <source>&amp;Edit</source>
        <translation>&amp;Bearbeiten</translation>
    </message>
    <message>
        <source>&amp;Undo</source>
        <translation>&amp;Rückgängig</translation>
    </message>
    <message>
        <source>&amp;Redo</source>
        <translation>&amp;Wiederholen</translation>
    </message>
    <message>
        <source>&amp;Copy</source>
        <translation>&amp;Kopieren</translation>
    </message>
    <message>
        <source>Copy stresses of &amp;this point</source>
        <translation>Spannungen &amp;dieses Punkts kopieren</translation>
    </message>
    <message>
        <source>The stresses of %1 are on the clipboard.</source>
        <translation>Die Spannungen von %1 sind in der Zwischenablage.</translation>
    </message>
    <message>
        <source>Copy stresses of &amp;all points</source>
        <translation>Spannungen &amp;aller Punkte kopieren</translation>
    </message>
    <message>
        <source>The stresses of all points are on the clipboard.</source>
        <translation>Die Spannungen aller Punkte sind in der Zwischenablage.</translation>
    </message>
    <message>
        <source>Copy table of planes as &amp;Markdown</source>
        <translation>Tabelle der Ebenen als &amp;Markdown kopieren</translation>
    </message>
    <message>
        <source>The table is on the clipboard, as Markdown.</source>
        <translation>Die Tabelle ist in der Zwischenablage, als Markdown.</translation>
    </message>
    <message>
        <source>Copy table of planes as &amp;LaTeX rows</source>
        <translation>Tabelle der Ebenen als &amp;LaTeX-Zeilen kopieren</translation>
    </message>
    <message>
        <source>The table is on the clipboard, as rows for LaTeX.</source>
        <translation>Die Tabelle ist in der Zwischenablage, als LaTeX-Zeilen.</translation>
    </message>
    <message>
        <source>Paste ta&amp;ble…</source>
        <translation>Tabelle &amp;einfügen…</translation>
    </message>
    <message>
        <source>&amp;Study</source>
        <translation>&amp;Studie</translation>
    </message>
    <message>
        <source>&amp;Title block…</source>
        <translation>&amp;Schriftfeld…</translation>
    </message>
    <message>
        <source>&amp;Stresses</source>
        <translation>S&amp;pannungen</translation>
    </message>
    <message>
        <source>&amp;Units and conventions</source>
        <translation>&amp;Einheiten und Vereinbarungen</translation>
    </message>
    <message>
        <source>&amp;Next entry not taken</source>
        <translation>&amp;Nächste nicht übernommene Eingabe</translation>
    </message>
    <message>
        <source>&amp;Previous entry not taken</source>
        <translation>&amp;Vorige nicht übernommene Eingabe</translation>
    </message>
    <message>
        <source>Co&amp;mpare somebody else&apos;s number…</source>
        <translation>Fre&amp;mden Wert vergleichen…</translation>
    </message>
    <message>
        <source>&amp;Working of the shown stresses…</source>
        <translation>Rechen&amp;gang der angezeigten Spannungen…</translation>
    </message>
    <message>
        <source>Previous point</source>
        <translation>Voriger Punkt</translation>
    </message>
    <message>
        <source>Next point</source>
        <translation>Nächster Punkt</translation>
    </message>
    <message>
        <source>Previous combination</source>
        <translation>Vorige Kombination</translation>
    </message>
    <message>
        <source>Next combination</source>
        <translation>Nächste Kombination</translation>
    </message>
    <message>
        <source>&amp;Governing combination here</source>
        <translation>Maßgebende Kombination &amp;hier</translation>
    </message>
    <message>
        <source>Governing point and combination</source>
        <translation>Maßgebender Punkt mit Kombination</translation>
    </message>
    <message>
        <source>P&amp;oints…</source>
        <translation>P&amp;unkte…</translation>
    </message>
    <message>
        <source>S&amp;ections…</source>
        <translation>&amp;Querschnitte…</translation>
    </message>
    <message>
        <source>&amp;Load cases…</source>
        <translation>&amp;Lastfälle…</translation>
    </message>
    <message>
        <source>&amp;Combinations…</source>
        <translation>&amp;Kombinationen…</translation>
    </message>
    <message>
        <source>&amp;Build combinations…</source>
        <translation>Kombinationen &amp;bilden…</translation>
    </message>
    <message>
        <source>Mate&amp;rials…</source>
        <translation>Mate&amp;rialien…</translation>
    </message>
    <message>
        <source>&amp;View</source>
        <translation>&amp;Ansicht</translation>
    </message>
    <message>
        <source>Show &amp;given arrows</source>
        <translation>&amp;Gegebene Pfeile anzeigen</translation>
    </message>
    <message>
        <source>&amp;Snap to named directions</source>
        <translation>An benannten &amp;Richtungen einrasten</translation>
    </message>
    <message>
        <source>&amp;Point</source>
        <translation>&amp;Punkt</translation>
    </message>
    <message>
        <source>Su&amp;mmary of all points</source>
        <translation>Übersicht &amp;aller Punkte</translation>
    </message>
    <message>
        <source>&amp;Fit the circle</source>
        <translation>&amp;Kreis einpassen</translation>
    </message>
    <message>
        <source>Next area</source>
        <translation>Nächster Bereich</translation>
    </message>
    <message>
        <source>Previous area</source>
        <translation>Voriger Bereich</translation>
    </message>
    <message>
        <source>&amp;Usual sizes of the panels</source>
        <translation>Ü&amp;bliche Größen der Bereiche</translation>
    </message>
    <message>
        <source>&amp;Appearance</source>
        <translation>&amp;Erscheinungsbild</translation>
    </message>
    <message>
        <source>Fu&amp;ll screen</source>
        <translation>&amp;Vollbild</translation>
    </message>
    <message>
        <source>As the &amp;system</source>
        <translation>Wie das &amp;System</translation>
    </message>
    <message>
        <source>&amp;Light</source>
        <translation>&amp;Hell</translation>
    </message>
    <message>
        <source>&amp;Dark</source>
        <translation>&amp;Dunkel</translation>
    </message>
    <message>
        <source>&amp;Help</source>
        <translation>&amp;Hilfe</translation>
    </message>
    <message>
        <source>Published &amp;values, recomputed…</source>
        <translation>Veröffentlichte &amp;Werte, nachgerechnet…</translation>
    </message>
    <message>
        <source>&amp;Worked example</source>
        <translation>Ausgearbeitetes &amp;Beispiel</translation>
    </message>
    <message>
        <source>&amp;About Planewright</source>
        <translation>Über &amp;Planewright</translation>
    </message>
    <message>
        <source>The figure is on the clipboard.</source>
        <translation>Die Abbildung ist in der Zwischenablage.</translation>
    </message>
    <message>
        <source>About Planewright</source>
        <translation>Über Planewright</translation>
    </message>
    <message>
        <source>&lt;h3&gt;Planewright %1&lt;/h3&gt;&lt;p&gt;Plane stress at a point, resolved to the line that matters.&lt;/p&gt;&lt;p&gt;An aid to a licensed engineer; the code that governs locally decides.&lt;/p&gt;&lt;p&gt;Free software under the GNU General Public License, version 3 or later; there is no warranty. Built with Qt. Set in Liberation Sans, under the SIL Open Font License 1.1.&lt;/p&gt;</source>
        <translation>&lt;h3&gt;Planewright %1&lt;/h3&gt;&lt;p&gt;Ebener Spannungszustand an einem Punkt, bezogen auf die Linie, auf die es ankommt.&lt;/p&gt;&lt;p&gt;Eine Hilfe für zugelassene Ingenieurinnen und Ingenieure; es entscheidet die örtlich geltende Norm.&lt;/p&gt;&lt;p&gt;Freie Software unter der GNU General Public License, Version 3 oder neuer; ohne jede Gewährleistung. Erstellt mit Qt. Gesetzt in Liberation Sans, unter der SIL Open Font License 1.1.&lt;/p&gt;</translation>
    </message>
    <message>
        <source>Paste a table</source>
        <translation>Tabelle einfügen</translation>
    </message>
    <message>
        <source>Import points from %1</source>
        <translation>Punkte aus %1 importieren</translation>
    </message>
    <message>
        <source>Pre&amp;ferences…</source>
        <translation>&amp;Einstellungen…</translation>
    </message>
    <message>
        <source>High &amp;contrast</source>
        <translation>Hoher &amp;Kontrast</translation>
    </message>
    <message>
        <source>The preferences are kept. The language changes with the next start.</source>
        <translation>Die Einstellungen sind übernommen. Die Sprache wechselt mit dem nächsten Start.</translation>
    </message>
    <message>
        <source>The preferences are kept.</source>
        <translation>Die Einstellungen sind übernommen.</translation>
    </message>
    <message>
        <source>Conventions in pictures</source>
        <translation>Vereinbarungen in Bildern</translation>
    </message>
    <message>
        <source>&amp;Help on this place</source>
        <translation>&amp;Hilfe zu dieser Stelle</translation>
    </message>
    <message>
        <source>Hand&amp;book</source>
        <translation>Hand&amp;buch</translation>
    </message>
    <message>
        <source>&amp;Keys</source>
        <translation>&amp;Tasten</translation>
    </message>
    <message>
        <source>&amp;Cautions</source>
        <translation>&amp;Warnhinweise</translation>
    </message>
</context>
<context>
    <name>planewright::MapLegend</name>
    <message>
        <source>not in the rows</source>
        <translation>ausgefiltert</translation>
    </message>
    <message>
        <source>not judged</source>
        <translation>nicht beurteilt</translation>
    </message>
    <message>
        <source>above %1</source>
        <translation>über %1</translation>
    </message>
    <message>
        <source>up to %1</source>
        <translation>bis %1</translation>
    </message>
    <message>
        <source>Classes of utilisation: %1</source>
        <translation>Klassen der Ausnutzung: %1</translation>
    </message>
</context>
<context>
    <name>planewright::MaterialFields</name>
    <message>
        <source>name of the material</source>
        <translation>Name des Materials</translation>
    </message>
    <message>
        <source>Strengths</source>
        <translation>Festigkeiten</translation>
    </message>
    <message>
        <source>Where they come from</source>
        <translation>Woher sie stammen</translation>
    </message>
    <message>
        <source>Factors</source>
        <translation>Beiwerte</translation>
    </message>
    <message>
        <source>Strengths are multiplied by the factor of the shortest load that acts, over the partial factor. An explicit factor takes the place of both.</source>
        <translation>Die Festigkeiten werden mit dem Beiwert der kürzesten wirkenden Last multipliziert und durch den Teilsicherheitsbeiwert geteilt. Ein eigener Beiwert tritt an die Stelle beider.</translation>
    </message>
    <message>
        <source>kind</source>
        <translation>Art</translation>
    </message>
    <message>
        <source>basis</source>
        <translation>Basis</translation>
    </message>
    <message>
        <source>seam</source>
        <translation>Nahtart</translation>
    </message>
    <message>
        <source>%1 of %2</source>
        <translation>%1 von %2</translation>
    </message>
    <message>
        <source>duration factors of %1</source>
        <translation>Beiwerte der Einwirkungsdauer von %1</translation>
    </message>
    <message>
        <source>The duration factors are not those of service class %1 in EN 1995-1-1: the class alone changes no number.</source>
        <translation>Die Beiwerte der Einwirkungsdauer sind nicht die der Nutzungsklasse %1 in EN 1995-1-1: Die Klasse allein ändert keine Zahl.</translation>
    </message>
    <message>
        <source>Take the factors of service class %1</source>
        <translation>Beiwerte der Nutzungsklasse %1 übernehmen</translation>
    </message>
    <message>
        <source>“%1” for %2</source>
        <translation>„%1“ als %2</translation>
    </message>
</context>
<context>
    <name>planewright::MaterialsDialog</name>
    <message>
        <source>Materials</source>
        <translation>Materialien</translation>
    </message>
    <message>
        <source>Undo</source>
        <translation>Rückgängig</translation>
    </message>
    <message>
        <source>Redo</source>
        <translation>Wiederholen</translation>
    </message>
    <message>
        <source>service class to be taken for</source>
        <translation>Nutzungsklasse, für die übernommen wird</translation>
    </message>
    <message>
        <source>Factors for service class</source>
        <translation>Beiwerte für Nutzungsklasse</translation>
    </message>
    <message>
        <source>&amp;Add</source>
        <translation>&amp;Hinzufügen</translation>
    </message>
    <message>
        <source>&amp;Take into the study</source>
        <translation>In die &amp;Studie übernehmen</translation>
    </message>
    <message>
        <source>&amp;Remove from the study</source>
        <translation>Aus der Studie &amp;entfernen</translation>
    </message>
    <message>
        <source>&amp;Keep in own library</source>
        <translation>In eigener &amp;Bibliothek ablegen</translation>
    </message>
    <message>
        <source>Remove from &amp;own library</source>
        <translation>Aus ei&amp;gener Bibliothek entfernen</translation>
    </message>
    <message>
        <source>&amp;Close</source>
        <translation>S&amp;chließen</translation>
    </message>
    <message>
        <source>In this study</source>
        <translation>In dieser Studie</translation>
    </message>
    <message>
        <source>none yet</source>
        <translation>noch keine</translation>
    </message>
    <message>
        <source>Own library</source>
        <translation>Eigene Bibliothek</translation>
    </message>
    <message>
        <source>none kept yet</source>
        <translation>noch keine abgelegt</translation>
    </message>
    <message>
        <source>not read, see above</source>
        <translation>nicht gelesen, siehe oben</translation>
    </message>
    <message>
        <source>Choose a material, or add one.</source>
        <translation>Ein Material wählen oder hinzufügen.</translation>
    </message>
    <message>
        <source>Your library does not read and is left as it is (%1): %2</source>
        <translation>Die eigene Bibliothek ist nicht lesbar und bleibt, wie sie ist (%1): %2</translation>
    </message>
    <message>
        <source>All %1 problems</source>
        <translation>Alle %1 Fehler</translation>
    </message>
    <message>
        <source>Problems in your library</source>
        <translation>Fehler in der eigenen Bibliothek</translation>
    </message>
    <message>
        <source>%1 of %2 was not taken.</source>
        <translation>%1 von %2 wurde nicht übernommen.</translation>
    </message>
    <message>
        <source>%1 and %2 more of %3 were not taken.</source>
        <translation>%1 und %2 weitere von %3 wurden nicht übernommen.</translation>
    </message>
    <message>
        <source>%1 from the library</source>
        <translation>%1 aus der Bibliothek</translation>
    </message>
    <message>
        <source>The study has another “%1” already; this one is “%2”.</source>
        <translation>Die Studie hat schon ein anderes „%1“; dieses heißt „%2“.</translation>
    </message>
    <message>
        <source>new material</source>
        <translation>neues Material</translation>
    </message>
    <message>
        <source>removal of %1</source>
        <translation>Entfernen von %1</translation>
    </message>
    <message>
        <source>%1 is removed.</source>
        <translation>%1 ist entfernt.</translation>
    </message>
    <message>
        <source>%1 is removed, and with it the check by it.</source>
        <translation>%1 ist entfernt, ebenso der Nachweis damit.</translation>
    </message>
    <message>
        <source>%1 is removed, and with it the %2 checks by it.</source>
        <translation>%1 ist entfernt, ebenso die %2 Nachweise damit.</translation>
    </message>
    <message>
        <source>%1 is in your library now, for every study.</source>
        <translation>%1 ist jetzt in der eigenen Bibliothek, für jede Studie.</translation>
    </message>
    <message>
        <source>%1 is no longer in your library.</source>
        <translation>%1 ist nicht mehr in der eigenen Bibliothek.</translation>
    </message>
    <message>
        <source>Put it back</source>
        <translation>Zurücklegen</translation>
    </message>
</context>
<context>
    <name>planewright::MaterialsList</name>
    <message>
        <source>Type to filter</source>
        <translation>Zum Filtern tippen</translation>
    </message>
    <message>
        <source>Filter</source>
        <translation>Filter</translation>
    </message>
    <message>
        <source>Materials</source>
        <translation>Materialien</translation>
    </message>
</context>
<context>
    <name>planewright::MeaningHeader</name>
    <message>
        <source>meaning of column %1</source>
        <translation>Bedeutung von Spalte %1</translation>
    </message>
</context>
<context>
    <name>planewright::NoteField</name>
    <message>
        <source>note on this point</source>
        <translation>Anmerkung zu diesem Punkt</translation>
    </message>
    <message>
        <source>note</source>
        <translation>Anmerkung</translation>
    </message>
</context>
<context>
    <name>planewright::PagesView</name>
    <message>
        <source>Pages</source>
        <translation>Seiten</translation>
    </message>
    <message>
        <source>Whole width</source>
        <translation>Ganze Breite</translation>
    </message>
    <message>
        <source>100 %</source>
        <translation>100 %</translation>
    </message>
</context>
<context>
    <name>planewright::PasteDialog</name>
    <message>
        <source>%1 more</source>
        <translation>%1 weitere</translation>
    </message>
    <message>
        <source>Nothing is taken while something is wrong.</source>
        <translation>Nichts wird übernommen, solange etwas fehlerhaft ist.</translation>
    </message>
    <message>
        <source>The table has no column of points: its rows go to %1, which is shown.</source>
        <translation>Die Tabelle hat keine Spalte mit Punkten: Die Zeilen gehen an %1, den angezeigten Punkt.</translation>
    </message>
    <message>
        <source>Points that are added: %1.</source>
        <translation>Punkte, die hinzukommen: %1.</translation>
    </message>
    <message>
        <source>Load cases that are added, as variable: %1.</source>
        <translation>Lastfälle, die als veränderlich hinzukommen: %1.</translation>
    </message>
    <message>
        <source>Load cases that are added, as measured: %1.</source>
        <translation>Lastfälle, die als gemessen hinzukommen: %1.</translation>
    </message>
    <message>
        <source>Texts of the study that are replaced: %1.</source>
        <translation>Texte der Studie, die ersetzt werden: %1.</translation>
    </message>
    <message>
        <source>The study has all of this already.</source>
        <translation>Die Studie enthält all dies schon.</translation>
    </message>
    <message>
        <source>choose…</source>
        <translation>wählen…</translation>
    </message>
    <message>
        <source>The first row has &amp;headings</source>
        <translation>Erste Zeile enthält Über&amp;schriften</translation>
    </message>
    <message>
        <source>&amp;Next wrong row</source>
        <translation>&amp;Nächste fehlerhafte Zeile</translation>
    </message>
    <message>
        <source>&amp;Take</source>
        <translation>Ü&amp;bernehmen</translation>
    </message>
    <message>
        <source>rows of the table</source>
        <translation>Zeilen der Tabelle</translation>
    </message>
    <message>
        <source>what is added</source>
        <translation>was hinzukommt</translation>
    </message>
    <message>
        <source>cautions</source>
        <translation>Hinweise</translation>
    </message>
    <message>
        <source>F8</source>
        <translation>F8</translation>
    </message>
    <message>
        <source>rows: %1</source>
        <translation>Zeilen: %1</translation>
    </message>
    <message>
        <source>rows: %1, wrong ones: %2</source>
        <translation>Zeilen: %1, davon fehlerhaft: %2</translation>
    </message>
    <message>
        <source>Line %1, column %2: </source>
        <translation>Zeile %1, Spalte %2: </translation>
    </message>
    <message>
        <source>Line %1: </source>
        <translation>Zeile %1: </translation>
    </message>
    <message>
        <source>pasted table</source>
        <translation>eingefügte Tabelle</translation>
    </message>
</context>
<context>
    <name>planewright::PasteModel</name>
    <message>
        <source>what is wrong</source>
        <translation>was fehlerhaft ist</translation>
    </message>
    <message>
        <source>column %1</source>
        <translation>Spalte %1</translation>
    </message>
</context>
<context>
    <name>planewright::Picker</name>
    <message>
        <source>Previous (%1+PageUp)</source>
        <translation>Zurück (%1+Bild auf)</translation>
    </message>
    <message>
        <source>Next (%1+PageDown)</source>
        <translation>Weiter (%1+Bild ab)</translation>
    </message>
    <message>
        <source>%1 of %2</source>
        <translation>%1 von %2</translation>
    </message>
</context>
<context>
    <name>planewright::PlanesModel</name>
    <message>
        <source>Watch a plane…</source>
        <translation>Ebene vormerken…</translation>
    </message>
    <message>
        <source>Type a name, or the angle of a normal or of a cut</source>
        <translation>Einen Namen eingeben oder den Winkel einer Normalen oder eines Schnitts</translation>
    </message>
    <message>
        <source>name of a watched plane</source>
        <translation>Name einer vorgemerkten Ebene</translation>
    </message>
    <message>
        <source>normal of a watched plane</source>
        <translation>Normale einer vorgemerkten Ebene</translation>
    </message>
    <message>
        <source>watched plane</source>
        <translation>vorgemerkte Ebene</translation>
    </message>
    <message>
        <source>turn of the reading plane</source>
        <translation>Drehung der Ableseebene</translation>
    </message>
    <message>
        <source>removal of a watched plane</source>
        <translation>Entfernen einer vorgemerkten Ebene</translation>
    </message>
    <message>
        <source>plane %1</source>
        <translation>Ebene %1</translation>
    </message>
</context>
<context>
    <name>planewright::PlanesPage</name>
    <message>
        <source>Planes</source>
        <translation>Ebenen</translation>
    </message>
    <message>
        <source>Bring the reading plane here</source>
        <translation>Ableseebene hierher bringen</translation>
    </message>
    <message>
        <source>Enter</source>
        <translation>Eingabe</translation>
    </message>
    <message>
        <source>Show the combination of this value</source>
        <translation>Kombination dieses Werts anzeigen</translation>
    </message>
    <message>
        <source>Watch the reading plane</source>
        <translation>Ableseebene vormerken</translation>
    </message>
    <message>
        <source>Ins</source>
        <translation>Einfg</translation>
    </message>
    <message>
        <source>Rename</source>
        <translation>Umbenennen</translation>
    </message>
    <message>
        <source>F2</source>
        <translation>F2</translation>
    </message>
    <message>
        <source>Remove</source>
        <translation>Entfernen</translation>
    </message>
    <message>
        <source>Del</source>
        <translation>Entf</translation>
    </message>
    <message>
        <source>Copy</source>
        <translation>Kopieren</translation>
    </message>
    <message>
        <source>Ctrl+C</source>
        <translation>Strg+C</translation>
    </message>
    <message>
        <source>Copy the table</source>
        <translation>Tabelle kopieren</translation>
    </message>
</context>
<context>
    <name>planewright::PlanesPanel</name>
    <message>
        <source>Copy table</source>
        <translation>Tabelle kopieren</translation>
    </message>
    <message>
        <source>Planes</source>
        <translation>Ebenen</translation>
    </message>
    <message>
        <source>Sweep</source>
        <translation>Winkelverlauf</translation>
    </message>
    <message>
        <source>Copies the table for a spreadsheet and for a document</source>
        <translation>Kopiert die Tabelle für eine Tabellenkalkulation und für ein Dokument</translation>
    </message>
    <message>
        <source>F2 edit, Enter go there, Ctrl+Enter other solution, Ins watch, Del remove</source>
        <translation>F2 bearbeiten, Eingabetaste dorthin, Strg+Eingabetaste andere Lösung, Einfg vormerken, Entf entfernen</translation>
    </message>
    <message>
        <source>Enter brings the reading plane here, Ctrl+C copies</source>
        <translation>Eingabetaste bringt die Ableseebene hierher, Strg+C kopiert</translation>
    </message>
</context>
<context>
    <name>planewright::PointsDialog</name>
    <message>
        <source>%1 of these %2 files exist in %3.</source>
        <translation>%1 dieser %2 Dateien sind in %3 schon vorhanden.</translation>
    </message>
    <message>
        <source>Replace them?</source>
        <translation>Ersetzen?</translation>
    </message>
    <message>
        <source>Replace them</source>
        <translation>Ersetzen</translation>
    </message>
    <message>
        <source>Write only the others</source>
        <translation>Nur die übrigen schreiben</translation>
    </message>
    <message>
        <source>Figures of all points</source>
        <translation>Abbildungen aller Punkte</translation>
    </message>
    <message>
        <source>Write the figures</source>
        <translation>Abbildungen schreiben</translation>
    </message>
    <message>
        <source>Points</source>
        <translation>Punkte</translation>
    </message>
    <message>
        <source>All</source>
        <translation>Alle</translation>
    </message>
    <message>
        <source>None</source>
        <translation>Keine</translation>
    </message>
    <message>
        <source>The one that governs each point</source>
        <translation>Die für jeden Punkt maßgebende</translation>
    </message>
    <message>
        <source>The shown one: %1</source>
        <translation>Die angezeigte: %1</translation>
    </message>
    <message>
        <source>Choose…</source>
        <translation>Wählen…</translation>
    </message>
    <message>
        <source>Combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>Folder</source>
        <translation>Ordner</translation>
    </message>
    <message>
        <source>What could not be written</source>
        <translation>Was nicht geschrieben werden konnte</translation>
    </message>
    <message>
        <source>Folder of the figures</source>
        <translation>Ordner der Abbildungen</translation>
    </message>
    <message>
        <source>Close</source>
        <translation>Schließen</translation>
    </message>
    <message>
        <source>No point is chosen.</source>
        <translation>Es ist kein Punkt gewählt.</translation>
    </message>
    <message>
        <source>Figures: %1, with the study inside each, named like %2.</source>
        <translation>Abbildungen: %1, jede mit der Studie darin, benannt wie %2.</translation>
    </message>
    <message>
        <source>Figures: %1, without the study, named like %2.</source>
        <translation>Abbildungen: %1, ohne die Studie, benannt wie %2.</translation>
    </message>
    <message>
        <source>The folder %1 cannot be made. Choose another one.</source>
        <translation>Der Ordner %1 kann nicht angelegt werden. Einen anderen wählen.</translation>
    </message>
    <message>
        <source>Stop</source>
        <translation>Abbrechen</translation>
    </message>
    <message>
        <source>%1 of %2 …</source>
        <translation>%1 von %2 …</translation>
    </message>
    <message>
        <source>Stopped. Figures written: %1 of %2, to %3.</source>
        <translation>Abgebrochen. Geschriebene Abbildungen: %1 von %2, in %3.</translation>
    </message>
    <message>
        <source>Figures written: %1 of %2, to %3.</source>
        <translation>Geschriebene Abbildungen: %1 von %2, in %3.</translation>
    </message>
    <message>
        <source>Left as they were: %1.</source>
        <translation>Unverändert gelassen: %1.</translation>
    </message>
    <message>
        <source>Not written: %1.</source>
        <translation>Nicht geschrieben: %1.</translation>
    </message>
    <message>
        <source>Stopping …</source>
        <translation>Wird abgebrochen …</translation>
    </message>
</context>
<context>
    <name>planewright::PreferencesDialog</name>
    <message>
        <source>Preferences</source>
        <translation>Einstellungen</translation>
    </message>
    <message>
        <source>Choose…</source>
        <translation>Wählen…</translation>
    </message>
    <message>
        <source>Choose: %1</source>
        <translation>Wählen: %1</translation>
    </message>
    <message>
        <source>Window</source>
        <translation>Fenster</translation>
    </message>
    <message>
        <source>as the system</source>
        <translation>wie das System</translation>
    </message>
    <message>
        <source>language (from the next start)</source>
        <translation>Sprache (ab dem nächsten Start)</translation>
    </message>
    <message>
        <source>appearance</source>
        <translation>Erscheinungsbild</translation>
    </message>
    <message>
        <source>light</source>
        <translation>hell</translation>
    </message>
    <message>
        <source>dark</source>
        <translation>dunkel</translation>
    </message>
    <message>
        <source>high contrast</source>
        <translation>hoher Kontrast</translation>
    </message>
    <message>
        <source>%1 %</source>
        <translation>%1 %</translation>
    </message>
    <message>
        <source>size of text</source>
        <translation>Schriftgröße</translation>
    </message>
    <message>
        <source>New studies</source>
        <translation>Neue Studien</translation>
    </message>
    <message>
        <source>stress in</source>
        <translation>Spannung in</translation>
    </message>
    <message>
        <source>force in</source>
        <translation>Kraft in</translation>
    </message>
    <message>
        <source>length in</source>
        <translation>Länge in</translation>
    </message>
    <message>
        <source>moment in</source>
        <translation>Moment in</translation>
    </message>
    <message>
        <source>positive normal stress</source>
        <translation>positive Normalspannung</translation>
    </message>
    <message>
        <source>shear on the circle</source>
        <translation>Schub am Kreis</translation>
    </message>
    <message>
        <source>shear force</source>
        <translation>Querkraft</translation>
    </message>
    <message>
        <source>project</source>
        <translation>Projekt</translation>
    </message>
    <message>
        <source>prepared by</source>
        <translation>aufgestellt von</translation>
    </message>
    <message>
        <source>purpose</source>
        <translation>Zweck</translation>
    </message>
    <message>
        <source>folder of studies</source>
        <translation>Ordner der Studien</translation>
    </message>
    <message>
        <source>that of the newest study</source>
        <translation>der der neuesten Studie</translation>
    </message>
    <message>
        <source>Figures and sheets</source>
        <translation>Abbildungen und Rechenblätter</translation>
    </message>
    <message>
        <source>paper of sheets</source>
        <translation>Papier der Rechenblätter</translation>
    </message>
    <message>
        <source>folder of figures and sheets</source>
        <translation>Ordner für Abbildungen und Rechenblätter</translation>
    </message>
    <message>
        <source>that of the study</source>
        <translation>der der Studie</translation>
    </message>
    <message>
        <source>stresses with</source>
        <translation>Spannungen mit</translation>
    </message>
    <message>
        <source>decimal sign</source>
        <translation>Dezimalzeichen</translation>
    </message>
</context>
<context>
    <name>planewright::ReadingGroup</name>
    <message>
        <source>Reading plane</source>
        <translation>Ableseebene</translation>
    </message>
    <message>
        <source>Go to</source>
        <translation>Gehe zu</translation>
    </message>
    <message>
        <source>go to a named direction</source>
        <translation>zu einer benannten Richtung gehen</translation>
    </message>
    <message>
        <source>cut itself at</source>
        <translation>Schnitt selbst</translation>
    </message>
    <message>
        <source>angle of the reading plane&apos;s normal</source>
        <translation>Winkel der Normalen der Ableseebene</translation>
    </message>
    <message>
        <source>direction in which the reading plane runs</source>
        <translation>Richtung, in der die Ableseebene verläuft</translation>
    </message>
    <message>
        <source>turn of the reading plane</source>
        <translation>Drehung der Ableseebene</translation>
    </message>
    <message>
        <source>normal %1, cut %2</source>
        <translation>Normale %1, Schnitt %2</translation>
    </message>
</context>
<context>
    <name>planewright::ScreenDialog</name>
    <message>
        <source>Screen points</source>
        <translation>Punkte reihenweise prüfen</translation>
    </message>
    <message>
        <source>Table of points</source>
        <translation>Tabelle mit Punkten</translation>
    </message>
    <message>
        <source>Tables (*.csv *.tsv *.txt);;All files (*)</source>
        <translation>Tabellen (*.csv *.tsv *.txt);;Alle Dateien (*)</translation>
    </message>
    <message>
        <source>%1-results.csv</source>
        <translation>%1-ergebnisse.csv</translation>
    </message>
    <message>
        <source>Save the results</source>
        <translation>Ergebnisse speichern</translation>
    </message>
    <message>
        <source>Tables (*.csv);;All files (*)</source>
        <translation>Tabellen (*.csv);;Alle Dateien (*)</translation>
    </message>
</context>
<context>
    <name>planewright::SectionGroup</name>
    <message>
        <source>Section</source>
        <translation>Querschnitt</translation>
    </message>
    <message>
        <source>Ready places</source>
        <translation>Vorgegebene Stellen</translation>
    </message>
    <message>
        <source>Worst fibre</source>
        <translation>Ungünstigste Stelle</translation>
    </message>
    <message>
        <source>Add a block</source>
        <translation>Block hinzufügen</translation>
    </message>
    <message>
        <source>Remove the last</source>
        <translation>Letzten entfernen</translation>
    </message>
    <message>
        <source>section of the point</source>
        <translation>Querschnitt des Punkts</translation>
    </message>
    <message>
        <source>shape of the section</source>
        <translation>Form des Querschnitts</translation>
    </message>
    <message>
        <source>side from which the fibre is seen</source>
        <translation>Seite, von der die Stelle gesehen wird</translation>
    </message>
    <message>
        <source>new block</source>
        <translation>neuer Block</translation>
    </message>
    <message>
        <source>removal of a block</source>
        <translation>Entfernen eines Blocks</translation>
    </message>
    <message>
        <source>height of the fibre over the centroid</source>
        <translation>Höhe der Stelle über dem Schwerpunkt</translation>
    </message>
    <message>
        <source>place of the fibre beside the centroid, towards the near face</source>
        <translation>Abstand der Stelle neben dem Schwerpunkt, zur vorderen Fläche hin</translation>
    </message>
    <message>
        <source>new section</source>
        <translation>neuer Querschnitt</translation>
    </message>
    <message>
        <source>no section</source>
        <translation>kein Querschnitt</translation>
    </message>
    <message>
        <source>removal of the section of the point</source>
        <translation>Entfernen des Querschnitts des Punkts</translation>
    </message>
    <message>
        <source>place of the fibre</source>
        <translation>Lage der Stelle</translation>
    </message>
    <message>
        <source>The point has no section.</source>
        <translation>Der Punkt hat keinen Querschnitt.</translation>
    </message>
    <message>
        <source> (where theory gives the shear)</source>
        <translation> (wo die Theorie den Schub liefert)</translation>
    </message>
    <message>
        <source>greatest tension σ₁: y = %1, z = %2, %3</source>
        <translation>größter Zug σ₁: y = %1, z = %2, %3</translation>
    </message>
    <message>
        <source>greatest shear in the plane: y = %1, z = %2, %3</source>
        <translation>größter Schub in der Ebene: y = %1, z = %2, %3</translation>
    </message>
    <message>
        <source>Drawn for %1, which is shown.</source>
        <translation>Gezeichnet für %1 (angezeigt).</translation>
    </message>
    <message>
        <source>seen from the side</source>
        <translation>von der Seite gesehen</translation>
    </message>
    <message>
        <source>seen from the top</source>
        <translation>von oben gesehen</translation>
    </message>
    <message>
        <source>%1, y = %2</source>
        <translation>%1, y = %2</translation>
    </message>
</context>
<context>
    <name>planewright::SectionView</name>
    <message>
        <source>drawing of the section</source>
        <translation>Zeichnung des Querschnitts</translation>
    </message>
    <message>
        <source>Pull the mark to the fibre that is looked at. Arrow keys move it, PageUp and PageDown go to the next ready place.</source>
        <translation>Die Marke zur betrachteten Stelle ziehen. Pfeiltasten verschieben sie, Bild auf und Bild ab gehen zur nächsten vorgegebenen Stelle.</translation>
    </message>
    <message>
        <source>place of the fibre</source>
        <translation>Lage der Stelle</translation>
    </message>
    <message>
        <source>fibre at y = %1, z = %2</source>
        <translation>Stelle bei y = %1, z = %2</translation>
    </message>
</context>
<context>
    <name>planewright::SheetDialog</name>
    <message>
        <source>Calculation sheet</source>
        <translation>Rechenblatt</translation>
    </message>
    <message>
        <source>The pages are being set…</source>
        <translation>Die Seiten werden gesetzt…</translation>
    </message>
    <message>
        <source>Title block…</source>
        <translation>Schriftfeld…</translation>
    </message>
    <message>
        <source>Compare with…</source>
        <translation>Vergleichen mit…</translation>
    </message>
    <message>
        <source>Save PDF…</source>
        <translation>PDF speichern…</translation>
    </message>
    <message>
        <source>Save HTML…</source>
        <translation>HTML speichern…</translation>
    </message>
    <message>
        <source>Print…</source>
        <translation>Drucken…</translation>
    </message>
    <message>
        <source>sheet</source>
        <translation>rechenblatt</translation>
    </message>
    <message>
        <source>%1-sheet</source>
        <translation>%1-rechenblatt</translation>
    </message>
    <message>
        <source>Save the sheet</source>
        <translation>Rechenblatt speichern</translation>
    </message>
    <message>
        <source>Saved as %1.</source>
        <translation>Gespeichert als %1.</translation>
    </message>
    <message>
        <source>PDF (*.pdf)</source>
        <translation>PDF (*.pdf)</translation>
    </message>
    <message>
        <source>HTML (*.html)</source>
        <translation>HTML (*.html)</translation>
    </message>
    <message>
        <source>%1: %2 input(s) and %3 result(s) differ; the sheet has them under “Changes since another revision”.</source>
        <translation>%1: abweichende Eingaben %2, abweichende Ergebnisse %3; im Rechenblatt stehen sie unter „Änderungen gegenüber einem anderen Stand“.</translation>
    </message>
    <message>
        <source>Compare with an earlier revision</source>
        <translation>Mit einem früheren Stand vergleichen</translation>
    </message>
    <message>
        <source>Studies, figures and sheets (*.planewright *.svg *.pdf *.png *.html)</source>
        <translation>Studien, Abbildungen und Rechenblätter (*.planewright *.svg *.pdf *.png *.html)</translation>
    </message>
    <message>
        <source>The sheet is printed.</source>
        <translation>Das Rechenblatt ist gedruckt.</translation>
    </message>
</context>
<context>
    <name>planewright::SheetOptions</name>
    <message>
        <source>Points</source>
        <translation>Punkte</translation>
    </message>
    <message>
        <source>Points of the sheet</source>
        <translation>Punkte des Rechenblatts</translation>
    </message>
    <message>
        <source>Depth</source>
        <translation>Umfang</translation>
    </message>
    <message>
        <source>Element and circle of each point</source>
        <translation>Element und Kreis jedes Punkts</translation>
    </message>
    <message>
        <source>Paper</source>
        <translation>Papier</translation>
    </message>
    <message>
        <source>Study</source>
        <translation>Studie</translation>
    </message>
    <message>
        <source>Carry the study inside the file</source>
        <translation>Studie in der Datei mitgeben</translation>
    </message>
    <message>
        <source>The whole study, with all points and notes, travels inside; opening the sheet brings it back.</source>
        <translation>Die ganze Studie mit allen Punkten und Notizen ist enthalten; Öffnen des Rechenblatts stellt sie wieder her.</translation>
    </message>
    <message>
        <source>The file holds the sheet alone; no study comes back from it.</source>
        <translation>Die Datei enthält nur das Rechenblatt; aus ihr lässt sich keine Studie wiederherstellen.</translation>
    </message>
</context>
<context>
    <name>planewright::SheetPreview</name>
    <message>
        <source>Calculation sheet</source>
        <translation>Rechenblatt</translation>
    </message>
    <message numerus="yes">
        <source>%n page(s)</source>
        <translation>
            <numerusform>%n Seite</numerusform>
            <numerusform>%n Seiten</numerusform>
        </translation>
    </message>
</context>
<context>
    <name>planewright::SideBySideDialog</name>
    <message>
        <source>All criteria side by side</source>
        <translation>Alle Kriterien nebeneinander</translation>
    </message>
    <message>
        <source>criterion</source>
        <translation>Kriterium</translation>
    </message>
    <message>
        <source>nominal</source>
        <translation>Nennrichtung</translation>
    </message>
    <message>
        <source>worst</source>
        <translation>ungünstigste</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>remark</source>
        <translation>Bemerkung</translation>
    </message>
    <message>
        <source>Utilisation by every criterion</source>
        <translation>Ausnutzung nach jedem Kriterium</translation>
    </message>
    <message>
        <source>This point has no check “%1”.</source>
        <translation>Dieser Punkt hat keinen Nachweis „%1“.</translation>
    </message>
    <message>
        <source>%1, the worst of all combinations. Which criterion suits the material is for the engineer to decide.</source>
        <translation>%1, die ungünstigste aller Kombinationen. Welches Kriterium zum Material passt, ist eine ingenieurmäßige Entscheidung.</translation>
    </message>
</context>
<context>
    <name>planewright::SigningLine</name>
    <message>
        <source>Give it for the study as it is</source>
        <translation>Für den jetzigen Bearbeitungsstand setzen</translation>
    </message>
    <message>
        <source>Given for the study as it is, %1.</source>
        <translation>Für den jetzigen Bearbeitungsstand gesetzt, %1.</translation>
    </message>
    <message>
        <source>The study changed since it was prepared.</source>
        <translation>Die Studie wurde nach dem Aufstellen geändert.</translation>
    </message>
    <message>
        <source>The study changed since it was checked.</source>
        <translation>Die Studie wurde nach dem Prüfen geändert.</translation>
    </message>
    <message>
        <source>Nothing says for which state of the study the name was given.</source>
        <translation>Für welchen Bearbeitungsstand der Name gesetzt wurde, ist nirgends vermerkt.</translation>
    </message>
    <message>
        <source>Name given again</source>
        <translation>Name erneut gesetzt</translation>
    </message>
</context>
<context>
    <name>planewright::SlipDialog</name>
    <message>
        <source>Compare somebody else&apos;s number</source>
        <translation>Fremden Wert vergleichen</translation>
    </message>
    <message>
        <source>what the number is</source>
        <translation>was der Wert ist</translation>
    </message>
    <message>
        <source>the other number</source>
        <translation>der fremde Wert</translation>
    </message>
    <message>
        <source>comparison</source>
        <translation>Vergleich</translation>
    </message>
    <message>
        <source>Their</source>
        <translation>Fremder Wert</translation>
    </message>
    <message>
        <source>is</source>
        <translation>beträgt</translation>
    </message>
    <message>
        <source>Type the number; a bare one is in %1. A number agrees when it is this one to the last digit typed.</source>
        <translation>Die Zahl eingeben; ohne Einheit gilt sie in %1. Ein Wert stimmt überein, wenn er bis zur letzten eingegebenen Stelle gleich ist.</translation>
    </message>
    <message>
        <source>Agrees with this study: %1.</source>
        <translation>Stimmt mit dieser Studie überein: %1.</translation>
    </message>
    <message>
        <source>In this study it is %1. No slip that this program knows makes the other number.</source>
        <translation>In dieser Studie ist es %1. Kein Versehen, das dieses Programm kennt, ergibt den fremden Wert.</translation>
    </message>
    <message>
        <source>In this study it is %1. The other number comes out with:</source>
        <translation>In dieser Studie ist es %1. Der fremde Wert entsteht durch:</translation>
    </message>
</context>
<context>
    <name>planewright::SourceFields</name>
    <message>
        <source>remove</source>
        <translation>entfernen</translation>
    </message>
    <message>
        <source>remove %1</source>
        <translation>%1 entfernen</translation>
    </message>
    <message>
        <source>normal force, tension positive</source>
        <translation>Normalkraft, Zug positiv</translation>
    </message>
    <message>
        <source>shear force in y</source>
        <translation>Querkraft in y</translation>
    </message>
    <message>
        <source>shear force in z</source>
        <translation>Querkraft in z</translation>
    </message>
    <message>
        <source>torsional moment, right-handed about +x</source>
        <translation>Torsionsmoment, rechtshändig um +x</translation>
    </message>
    <message>
        <source>bending moment about y, positive when it pulls at z &gt; 0</source>
        <translation>Biegemoment um y, positiv bei Zug auf der Seite z &gt; 0</translation>
    </message>
    <message>
        <source>bending moment about z, sagging positive</source>
        <translation>Biegemoment um z, positiv bei Zug unten</translation>
    </message>
    <message>
        <source>pressure inside over that outside</source>
        <translation>Überdruck innen gegenüber außen</translation>
    </message>
    <message>
        <source>inner radius</source>
        <translation>Innenradius</translation>
    </message>
    <message>
        <source>thickness of the wall</source>
        <translation>Wanddicke</translation>
    </message>
    <message>
        <source>ends of the vessel</source>
        <translation>Enden des Behälters</translation>
    </message>
    <message>
        <source>strain of gauge a</source>
        <translation>Dehnung an Messgitter a</translation>
    </message>
    <message>
        <source>direction of gauge a from +x</source>
        <translation>Richtung von Messgitter a ab +x</translation>
    </message>
    <message>
        <source>strain of gauge b</source>
        <translation>Dehnung an Messgitter b</translation>
    </message>
    <message>
        <source>direction of gauge b from +x</source>
        <translation>Richtung von Messgitter b ab +x</translation>
    </message>
    <message>
        <source>strain of gauge c</source>
        <translation>Dehnung an Messgitter c</translation>
    </message>
    <message>
        <source>direction of gauge c from +x</source>
        <translation>Richtung von Messgitter c ab +x</translation>
    </message>
    <message>
        <source>material under the gauges</source>
        <translation>Material unter den Messgittern</translation>
    </message>
    <message>
        <source>modulus of elasticity</source>
        <translation>Elastizitätsmodul</translation>
    </message>
    <message>
        <source>Poisson&apos;s ratio</source>
        <translation>Querdehnzahl</translation>
    </message>
    <message>
        <source>modulus of elasticity along the line</source>
        <translation>Elastizitätsmodul längs der Linie</translation>
    </message>
    <message>
        <source>modulus of elasticity across the line</source>
        <translation>Elastizitätsmodul quer zur Linie</translation>
    </message>
    <message>
        <source>Poisson&apos;s ratio: contraction across the line when stressed along it</source>
        <translation>Querdehnzahl: Verkürzung quer zur Linie bei Spannung längs der Linie</translation>
    </message>
    <message>
        <source>shear modulus</source>
        <translation>Schubmodul</translation>
    </message>
    <message>
        <source>removal of %1</source>
        <translation>Entfernen: %1</translation>
    </message>
    <message>
        <source>Case %1 is still a measured one; its nature is in the list of load cases.</source>
        <translation>Lastfall %1 gilt weiterhin als gemessen; seine Art steht in der Liste der Lastfälle.</translation>
    </message>
    <message>
        <source>What is measured takes factor 1 only, and a combination has another one for case %1: give the rosette a case of its own.</source>
        <translation>Gemessenes nimmt nur Beiwert 1, eine Kombination hat für Lastfall %1 aber einen anderen: der Rosette einen eigenen Lastfall geben.</translation>
    </message>
    <message>
        <source>new: %1</source>
        <translation>neu: %1</translation>
    </message>
    <message>
        <source>Case %1 is a measured one now, at all points: it takes factor 1 only.</source>
        <translation>Lastfall %1 gilt jetzt an allen Punkten als gemessen: Er nimmt nur Beiwert 1.</translation>
    </message>
    <message>
        <source>The forces need a section: “%1” was added, to begin with a rectangle %2. Give it its own shape and sizes.</source>
        <translation>Die Schnittgrößen brauchen einen Querschnitt: „%1“ wurde hinzugefügt, zunächst als Rechteck %2. Seine Form und Maße noch anpassen.</translation>
    </message>
</context>
<context>
    <name>planewright::StateBar</name>
    <message>
        <source>Point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>Ctrl</source>
        <translation>Strg</translation>
    </message>
    <message>
        <source>Combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>Alt</source>
        <translation>Alt</translation>
    </message>
    <message>
        <source>governs here</source>
        <translation>hier maßgebend</translation>
    </message>
    <message>
        <source>Figure…</source>
        <translation>Abbildung…</translation>
    </message>
    <message>
        <source>What is shown</source>
        <translation>Was angezeigt wird</translation>
    </message>
    <message>
        <source>Ctrl+PageUp/PageDown point, Alt+PageUp/PageDown combination</source>
        <translation>Strg+Bild auf/Bild ab Punkt, Alt+Bild auf/Bild ab Kombination</translation>
    </message>
</context>
<context>
    <name>planewright::StatusLine</name>
    <message>
        <source>Status</source>
        <translation>Status</translation>
    </message>
    <message>
        <source>F1 help</source>
        <translation>F1 Hilfe</translation>
    </message>
    <message>
        <source>%1 · F1 help</source>
        <translation>%1 · F1 Hilfe</translation>
    </message>
    <message>
        <source>1 entry not taken: %1</source>
        <translation>1 Eingabe nicht übernommen: %1</translation>
    </message>
    <message>
        <source>%1 entries not taken, first %2</source>
        <translation>%1 Eingaben nicht übernommen, zuerst %2</translation>
    </message>
</context>
<context>
    <name>planewright::StrengthPanel</name>
    <message>
        <source>Add a check</source>
        <translation>Neuer Nachweis</translation>
    </message>
    <message>
        <source>Remove</source>
        <translation>Entfernen</translation>
    </message>
    <message>
        <source>All criteria side by side</source>
        <translation>Alle Kriterien</translation>
    </message>
    <message>
        <source>More</source>
        <translation>Mehr</translation>
    </message>
    <message>
        <source>Strength</source>
        <translation>Festigkeit</translation>
    </message>
    <message>
        <source>Up/Down choose a check, Del removes it; on the plot Left/Right turn the line</source>
        <translation>Auf/Ab wählen einen Nachweis, Entf entfernt ihn; im Diagramm drehen Links/Rechts die Linie</translation>
    </message>
    <message>
        <source>Materials…</source>
        <translation>Materialien…</translation>
    </message>
    <message>
        <source>Watch a plane first: %1 is checked on a plane.</source>
        <translation>Zuerst eine Ebene vormerken: %1 wird auf einer Ebene nachgewiesen.</translation>
    </message>
    <message>
        <source>Give the point a line first: %1 is checked along a line.</source>
        <translation>Dem Punkt zuerst eine Linie geben: %1 wird längs einer Linie nachgewiesen.</translation>
    </message>
    <message>
        <source>new check</source>
        <translation>neuer Nachweis</translation>
    </message>
    <message>
        <source>removal of a check</source>
        <translation>Entfernen eines Nachweises</translation>
    </message>
    <message>
        <source>Mode: %1.</source>
        <translation>Versagensart: %1.</translation>
    </message>
    <message>
        <source>Not judged: %1</source>
        <translation>Nicht beurteilt: %1</translation>
    </message>
    <message>
        <source>Governs among those judged: %1</source>
        <translation>Maßgebend unter den beurteilten: %1</translation>
    </message>
    <message>
        <source>Governs: %1</source>
        <translation>Maßgebend: %1</translation>
    </message>
    <message>
        <source>%1 (shown)</source>
        <translation>%1 (angezeigt)</translation>
    </message>
    <message>
        <source>Scale: logarithmic</source>
        <translation>Skala: logarithmisch</translation>
    </message>
    <message>
        <source>Scale: 0 to 2</source>
        <translation>Skala: 0 bis 2</translation>
    </message>
    <message>
        <source>What a check at a point does not see</source>
        <translation>Was ein Nachweis an einem Punkt nicht erfasst</translation>
    </message>
</context>
<context>
    <name>planewright::StressGroup</name>
    <message>
        <source>Stress</source>
        <translation>Spannung</translation>
    </message>
    <message>
        <source>Add a source</source>
        <translation>Quelle hinzufügen</translation>
    </message>
    <message>
        <source>Third direction</source>
        <translation>Dritte Richtung</translation>
    </message>
    <message>
        <source>Inclined axes</source>
        <translation>Geneigte Achsen</translation>
    </message>
    <message>
        <source>Free edge</source>
        <translation>Freier Rand</translation>
    </message>
    <message>
        <source>normal stress on the x face</source>
        <translation>Normalspannung auf der x-Fläche</translation>
    </message>
    <message>
        <source>normal stress on the y face</source>
        <translation>Normalspannung auf der y-Fläche</translation>
    </message>
    <message>
        <source>shear stress on the x face</source>
        <translation>Schubspannung auf der x-Fläche</translation>
    </message>
    <message>
        <source>normal stress in the third direction</source>
        <translation>Normalspannung in der dritten Richtung</translation>
    </message>
    <message>
        <source>Section forces, pressure in a thin wall or measured strains: they add to the typed stresses</source>
        <translation>Schnittgrößen, Druck in dünner Wand oder gemessene Dehnungen: Sie kommen zu den eingegebenen Spannungen hinzu</translation>
    </message>
    <message>
        <source>inclination of the member; it turns only the drawing</source>
        <translation>Neigung des Bauteils; sie dreht nur die Zeichnung</translation>
    </message>
    <message>
        <source>direction of an edge that carries nothing</source>
        <translation>Richtung eines Rands, der nichts trägt</translation>
    </message>
    <message>
        <source>A normal stress out of the plane; it counts only in the absolute greatest shear</source>
        <translation>Eine Normalspannung aus der Ebene heraus; sie zählt nur für die absolut größte Schubspannung</translation>
    </message>
    <message>
        <source>Draw the element in the axes of an inclined member; no stress changes</source>
        <translation>Das Element in den Achsen eines geneigten Bauteils zeichnen; keine Spannung ändert sich</translation>
    </message>
    <message>
        <source>An edge that carries nothing: what the stresses leave there finds wrong signs and wrong fibres</source>
        <translation>Ein Rand, der nichts trägt: Was die Spannungen dort übrig lassen, deckt falsche Vorzeichen und falsche Stellen auf</translation>
    </message>
    <message>
        <source>%1 in all: %2</source>
        <translation>%1 insgesamt: %2</translation>
    </message>
    <message>
        <source>The free edge carries nothing, as it should.</source>
        <translation>Der freie Rand trägt nichts, wie es sein soll.</translation>
    </message>
    <message>
        <source>On the free edge are left σn = %1 and τnt = %2 %3: look for a wrong sign or fibre.</source>
        <translation>Am freien Rand bleiben σn = %1 und τnt = %2 %3: nach falschem Vorzeichen oder falscher Stelle suchen.</translation>
    </message>
    <message>
        <source>in %1: %2</source>
        <translation>in %1: %2</translation>
    </message>
    <message>
        <source>%1   %2   %3 %4</source>
        <translation>%1   %2   %3 %4</translation>
    </message>
</context>
<context>
    <name>planewright::Strip</name>
    <message>
        <source>Put this line away</source>
        <translation>Diese Zeile ausblenden</translation>
    </message>
</context>
<context>
    <name>planewright::SummaryModel</name>
    <message>
        <source>no stress</source>
        <translation>keine Spannung</translation>
    </message>
    <message>
        <source>line %1</source>
        <translation>Linie %1</translation>
    </message>
    <message>
        <source>normal %1</source>
        <translation>Normale %1</translation>
    </message>
    <message>
        <source>point</source>
        <translation>Punkt</translation>
    </message>
    <message>
        <source>check</source>
        <translation>Nachweis</translation>
    </message>
    <message>
        <source>worst utilisation</source>
        <translation>größte Ausnutzung</translation>
    </message>
    <message>
        <source>combination</source>
        <translation>Kombination</translation>
    </message>
    <message>
        <source>mode</source>
        <translation>Versagensart</translation>
    </message>
    <message>
        <source>worst at</source>
        <translation>ungünstigst bei</translation>
    </message>
</context>
<context>
    <name>planewright::SummaryPage</name>
    <message>
        <source>exceeds or not judged only</source>
        <translation>nur überschritten oder nicht beurteilt</translation>
    </message>
    <message>
        <source>filter: P1, 1.5 S, shear</source>
        <translation>Filter: P1, 1.5 S, Schub</translation>
    </message>
    <message>
        <source>Filter of the summary</source>
        <translation>Filter der Übersicht</translation>
    </message>
    <message>
        <source>Summary of all points</source>
        <translation>Übersicht aller Punkte</translation>
    </message>
    <message>
        <source>Summary</source>
        <translation>Übersicht</translation>
    </message>
    <message>
        <source>Enter opens the point with its governing combination, Ctrl+1 goes back</source>
        <translation>Eingabetaste öffnet den Punkt mit seiner maßgebenden Kombination, Strg+1 führt zurück</translation>
    </message>
    <message>
        <source>All points, all checks: %1</source>
        <translation>Alle Punkte, alle Nachweise: %1</translation>
    </message>
</context>
<context>
    <name>planewright::SweepPage</name>
    <message>
        <source>step</source>
        <translation>Schritt</translation>
    </message>
    <message>
        <source>step of the sweep</source>
        <translation>Schritt des Winkelverlaufs</translation>
    </message>
    <message>
        <source>Sweep</source>
        <translation>Winkelverlauf</translation>
    </message>
</context>
<context>
    <name>planewright::TableModel</name>
    <message>
        <source>%1 in %2
Enter shows this combination</source>
        <translation>%1 in %2
Eingabetaste zeigt diese Kombination</translation>
    </message>
    <message>
        <source>%1 in %2</source>
        <translation>%1 in %2</translation>
    </message>
    <message>
        <source>Over all combinations that are judged; single cases are not part of it.</source>
        <translation>Über alle beurteilten Kombinationen; einzelne Lastfälle gehören nicht dazu.</translation>
    </message>
</context>
<context>
    <name>planewright::ThingsDialog</name>
    <message>
        <source>&amp;Add</source>
        <translation>&amp;Hinzufügen</translation>
    </message>
    <message>
        <source>&amp;Duplicate</source>
        <translation>&amp;Duplizieren</translation>
    </message>
    <message>
        <source>&amp;Paste</source>
        <translation>&amp;Einfügen</translation>
    </message>
    <message>
        <source>Adds what is on the clipboard, one a line: 1.35 G + 1.5 S</source>
        <translation>Fügt den Inhalt der Zwischenablage hinzu, je Zeile eine: 1.35 G + 1.5 S</translation>
    </message>
    <message>
        <source>&amp;Remove</source>
        <translation>En&amp;tfernen</translation>
    </message>
    <message>
        <source>&amp;Up</source>
        <translation>Nach &amp;oben</translation>
    </message>
    <message>
        <source>Do&amp;wn</source>
        <translation>Nach &amp;unten</translation>
    </message>
    <message>
        <source>Line %1: </source>
        <translation>Zeile %1: </translation>
    </message>
    <message>
        <source>So do %1 more.</source>
        <translation>Ebenso %1 weitere.</translation>
    </message>
    <message>
        <source>new %1</source>
        <translation>neu: %1</translation>
    </message>
    <message>
        <source>copy of a %1</source>
        <translation>Kopie: %1</translation>
    </message>
    <message>
        <source>pasted list</source>
        <translation>eingefügte Liste</translation>
    </message>
    <message>
        <source>removal of a %1</source>
        <translation>Entfernen: %1</translation>
    </message>
    <message>
        <source>order of the list of each %1</source>
        <translation>Reihenfolge: %1</translation>
    </message>
</context>
<context>
    <name>planewright::ThingsModel</name>
    <message>
        <source>%1 %2: %3</source>
        <translation>%1 %2: %3</translation>
    </message>
    <message>
        <source>name</source>
        <translation>Name</translation>
    </message>
</context>
<context>
    <name>planewright::TitleDialog</name>
    <message>
        <source>Title block</source>
        <translation>Schriftfeld</translation>
    </message>
    <message>
        <source>name of the shown point</source>
        <translation>Name des angezeigten Punkts</translation>
    </message>
</context>
<context>
    <name>planewright::UnsavedDialog</name>
    <message>
        <source>New study</source>
        <translation>Neue Studie</translation>
    </message>
    <message>
        <source>Nothing that is typed or found differs from what was saved.</source>
        <translation>Eingaben und Ergebnisse sind wie zuletzt gespeichert.</translation>
    </message>
    <message>
        <source>&amp;Open</source>
        <translation>Ö&amp;ffnen</translation>
    </message>
    <message>
        <source>&amp;Discard</source>
        <translation>&amp;Verwerfen</translation>
    </message>
    <message>
        <source>Unsaved studies</source>
        <translation>Ungespeicherte Studien</translation>
    </message>
    <message>
        <source>study</source>
        <translation>Studie</translation>
    </message>
    <message>
        <source>last change</source>
        <translation>letzte Änderung</translation>
    </message>
    <message>
        <source>file</source>
        <translation>Datei</translation>
    </message>
    <message>
        <source>What changed since it was saved</source>
        <translation>Was sich seit dem Speichern geändert hat</translation>
    </message>
    <message>
        <source>Not saved when their window ended</source>
        <translation>Nicht gespeichert, als ihr Fenster endete</translation>
    </message>
    <message>
        <source>Discarded; kept for %1 days</source>
        <translation>Verworfen; %1 Tage aufgehoben</translation>
    </message>
    <message>
        <source>No study was left unsaved.</source>
        <translation>Es ist keine ungespeicherte Studie zurückgeblieben.</translation>
    </message>
    <message>
        <source>These studies had changes that were in no file when their window ended. What is opened here stays unsaved until you save it.</source>
        <translation>Diese Studien hatten Änderungen, die in keiner Datei standen, als ihr Fenster endete. Was hier geöffnet wird, bleibt ungespeichert, bis es gespeichert wird.</translation>
    </message>
    <message>
        <source>not readable</source>
        <translation>nicht lesbar</translation>
    </message>
</context>
<context>
    <name>planewright::UtilisationPlot</name>
    <message>
        <source>Utilisation over the angle of the line</source>
        <translation>Ausnutzung über dem Winkel der Linie</translation>
    </message>
    <message>
        <source>%1 at %2</source>
        <translation>%1 bei %2</translation>
    </message>
    <message>
        <source>turn of the line</source>
        <translation>Drehung der Linie</translation>
    </message>
    <message>
        <source>turn of the plane</source>
        <translation>Drehung der Ebene</translation>
    </message>
    <message>
        <source>%1 at %2, all combinations</source>
        <translation>%1 bei %2, alle Kombinationen</translation>
    </message>
    <message>
        <source>%1 degrees</source>
        <translation>%1 Grad</translation>
    </message>
</context>
<context>
    <name>planewright::VerdictBlock</name>
    <message>
        <source>Verdict</source>
        <translation>Ergebnis</translation>
    </message>
</context>
<context>
    <name>planewright::VerdictChip</name>
    <message numerus="yes">
        <source>%1, %n entry not taken</source>
        <translation>
            <numerusform>%1, %n Eingabe nicht übernommen</numerusform>
            <numerusform>%1, %n Eingaben nicht übernommen</numerusform>
        </translation>
    </message>
    <message>
        <source>this point: %1</source>
        <translation>dieser Punkt: %1</translation>
    </message>
    <message>
        <source>Verdict: %1</source>
        <translation>Ergebnis: %1</translation>
    </message>
    <message>
        <source>Worst of all combinations: %1.</source>
        <translation>Ungünstigste aller Kombinationen: %1.</translation>
    </message>
</context>
<context>
    <name>planewright::WorkingDialog</name>
    <message>
        <source>Working of the shown stresses</source>
        <translation>Rechengang der angezeigten Spannungen</translation>
    </message>
    <message>
        <source>working</source>
        <translation>Rechengang</translation>
    </message>
</context>
</TS>
