<?xml version="1.0" encoding="utf-8"?>
<!DOCTYPE TS>
<TS version="2.1" language="en" sourcelanguage="en">
<context>
    <name>planewright::SheetPreview</name>
    <message numerus="yes">
        <source>%n page(s)</source>
        <translation>
            <numerusform>%n page</numerusform>
            <numerusform>%n pages</numerusform>
        </translation>
    </message>
</context>
<context>
    <name>planewright::VerdictChip</name>
    <message numerus="yes">
        <source>%1, %n entry not taken</source>
        <translation>
            <numerusform>%1, %n entry not taken</numerusform>
            <numerusform>%1, %n entries not taken</numerusform>
        </translation>
    </message>
</context>
</TS>
