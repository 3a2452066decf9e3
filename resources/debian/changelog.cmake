# SPDX-License-Identifier: GPL-3.0-or-later
# The changelog of the package is where the version's date and the maintainer's address are written; man page,
# AppStream and package take them from it:
#   PLANEWRIGHT_DATE         2026-12-31
#   PLANEWRIGHT_MAINTAINER   Name <address>
#   PLANEWRIGHT_REVISION     of the package, behind the version
set(changelog ${CMAKE_CURRENT_LIST_DIR}/changelog)
set_property(DIRECTORY APPEND PROPERTY CMAKE_CONFIGURE_DEPENDS ${changelog})
file(READ ${changelog} entries)
string(REGEX MATCH "^planewright \\(([0-9.]+)-([0-9]+)\\)" head "${entries}")
if(NOT CMAKE_MATCH_1 STREQUAL PROJECT_VERSION)
  message(FATAL_ERROR "${changelog} begins with version '${CMAKE_MATCH_1}', the project has ${PROJECT_VERSION}.")
endif()
set(PLANEWRIGHT_REVISION ${CMAKE_MATCH_2})
string(REGEX MATCH "\n -- ([^\n]+>)  [A-Z][a-z]+, ([0-9]+) ([A-Z][a-z]+) ([0-9]+)" trailer "${entries}")
set(PLANEWRIGHT_MAINTAINER ${CMAKE_MATCH_1})
set(PLANEWRIGHT_DATE ${CMAKE_MATCH_4}-${CMAKE_MATCH_3}-${CMAKE_MATCH_2})
set(month 0)
foreach(name Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec)
  math(EXPR month "${month} + 1")
  if(month LESS 10)
    set(month 0${month})
  endif()
  string(REPLACE -${name}- -${month}- PLANEWRIGHT_DATE ${PLANEWRIGHT_DATE})
endforeach()

# planewright_compressed(FROM TO): as Debian wants man pages and changelogs, without name and time in it.
find_program(GZIP gzip REQUIRED)
function(planewright_compressed from to)
  set_property(DIRECTORY APPEND PROPERTY CMAKE_CONFIGURE_DEPENDS ${from})
  execute_process(COMMAND ${GZIP} -9nc ${from} OUTPUT_FILE ${to} COMMAND_ERROR_IS_FATAL ANY)
endfunction()
