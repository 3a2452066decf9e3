# SPDX-License-Identifier: GPL-3.0-or-later
# The rules for the text of C++ sources, named on the command line by their path from the root.
# Prints each breach as "FILE: rule".

function breach(rule) { printf "%s: %s\n", FILENAME, rule; found = 1 }

function order(part, folders,   list, count, i) {
  count = split(folders, list, " ")
  for (i = 1; i <= count; i++) layer[part, list[i]] = i
}

BEGIN {
  # Each folder includes only folders before it in its row, and its own.
  order("core", "words quantity working stress source strength study table figure record screen shipped evidence report")
  order("ui", "look desk entry chart paint files manual given element circle planes strength figure sheet screen shell")
  split("given element circle planes strength figure sheet screen", views, " ")
  for (i in views) isView[views[i]] = 1
  edge = "(^|[^A-Za-z0-9_])"
  coreWords = "(strto[dfl]+|sto[dfil]+|[sfnv]*printf|to_string|atof|atoi|locale|setlocale|getenv|clock|" \
              "steady_clock|system_clock|time_t)"
  coreHeaders = "^<(Q[A-Za-z/]*|[io]*stream|sstream|iomanip|fstream|filesystem|c?locale|ctime|chrono|cstdio|" \
                "stdio\\.h|regex)>$"
}

FNR == 1 {
  finish(previous)
  previous = FILENAME
  split(FILENAME, path, "/")
  part = path[1]; own = path[2]
  pragma = 0
  if ($0 != "// SPDX-License-Identifier: GPL-3.0-or-later") breach("has no SPDX line")
  if ((part == "core" || part == "ui") && !((part, own) in layer)) breach("stands in a folder without a layer")
}

function finish(file) { if (file ~ /\.h$/ && !pragma) printf "%s: has no #pragma once\n", file }
END { finish(previous); summary() }

/^#pragma once$/ { pragma = 1 }
/(^|[^A-Za-z])(TODO|FIXME|XXX)([^A-Za-z]|$)/ { breach("leaves something to do") }

/^ *# *include/ { included($3 != "" && $2 == "include" ? $3 : $2); next }

function included(name,   to, folder) {
  if (name ~ /^<Qt(Core|Gui|Widgets|Charts|Test|PrintSupport|Concurrent)>$/) breach("includes a whole Qt module")
  if (name ~ /^<nlohmann\//) {
    json[FILENAME] = 1
    if (FILENAME !~ /^core\/record\/[^\/]*\.cpp$/) breach("nlohmann/json.hpp belongs to one source of core/record")
  }
  if (name ~ /^<Eigen\//) {
    eigen[FILENAME] = 1
    if (FILENAME ~ /\.h$/) breach("a header includes Eigen")
  }
  if (part == "core" && name ~ coreHeaders) breach("core includes " name)
  split(name, to, "/")
  to[1] = substr(to[1], 2)
  if (part == "core" && to[1] ~ /^(ui|app|tests)$/ || part == "ui" && to[1] ~ /^(app|tests)$/)
    breach("includes what stands above it: " name)
  if (to[1] == part && (part == "core" || part == "ui")) layered(to[2])
}

function layered(folder) {
  if (!((part, folder) in layer)) breach("includes " part "/" folder ", which has no layer")
  else if (layer[part, folder] > layer[part, own]) breach("includes " part "/" folder ", a later layer")
  if (part == "ui" && folder != own && (own in isView) && (folder in isView))
    breach("includes " part "/" folder ": a view knows no other view")
}

# The code without its string literals and comments.
{ code = $0; gsub(/"([^"\\]|\\.)*"/, "\"\"", code); sub(/\/\/.*/, "", code) }
part == "core" && code ~ (edge coreWords "([^A-Za-z0-9_]|$)") { breach("core uses " code) }
part == "ui" && code ~ /blockSignals|QSignalBlocker|[uU]seOpenGL/ { breach("blocks signals or uses OpenGL") }

function names(files,   file, list) { for (file in files) list = list " " file; return substr(list, 2) }
function size(files,   file, count) { for (file in files) count++; return count + 0 }
function summary() {
  if (size(json) > 1) printf "%s: nlohmann/json.hpp is included in more than one file\n", names(json)
  if (size(eigen) > 3) printf "%s: Eigen is included in more than three files\n", names(eigen)
}
