# SPDX-License-Identifier: GPL-3.0-or-later
# Packages by CPack: a .deb, and an archive of the sources that builds without a network. app/package makes both.
set(CPACK_PACKAGE_NAME planewright)
set(CPACK_PACKAGE_CONTACT ${PLANEWRIGHT_MAINTAINER})
set(CPACK_PACKAGE_DESCRIPTION_SUMMARY ${PROJECT_DESCRIPTION})
set(CPACK_VERBATIM_VARIABLES ON)
set(CPACK_GENERATOR DEB)

set(CPACK_SOURCE_GENERATOR TGZ)
set(CPACK_SOURCE_PACKAGE_FILE_NAME planewright-${PROJECT_VERSION})
string(REGEX REPLACE "([][+.*()^$?|\\])" "\\\\\\1" top ${PROJECT_SOURCE_DIR})
set(CPACK_SOURCE_IGNORE_FILES "^${top}/\\.git(/|$)" "^${top}/\\.build/" "^${top}/\\.ccache/" "\\.swp$" "/__pycache__/")

# The program contains parts of these packages, and their licences ask that their notices come with it. They are
# taken from where they are installed: so they are those of what is built in.
set(PLANEWRIGHT_FONTS_PACKAGE fonts-liberation2)
if(NOT EXISTS /usr/share/doc/${PLANEWRIGHT_FONTS_PACKAGE}/copyright)
  set(PLANEWRIGHT_FONTS_PACKAGE fonts-liberation)
endif()
set(copyright ${PROJECT_BINARY_DIR}/debian/copyright)
configure_file(${CMAKE_CURRENT_LIST_DIR}/copyright.in ${copyright} @ONLY)
set(isDebian TRUE)
foreach(part ${PLANEWRIGHT_FONTS_PACKAGE} qt6-translations-l10n nlohmann-json3-dev libeigen3-dev libexpected-dev)
  set(notice /usr/share/doc/${part}/copyright)
  if(EXISTS ${notice})
    file(READ ${notice} words)
    file(APPEND ${copyright} "\n---- ${part} ----\n\n${words}")
  else()
    set(isDebian FALSE)
  endif()
endforeach()
planewright_compressed(${CMAKE_CURRENT_LIST_DIR}/changelog ${PROJECT_BINARY_DIR}/debian/changelog.Debian.gz)

if(isDebian)
  install(FILES ${copyright} ${PROJECT_BINARY_DIR}/debian/changelog.Debian.gz DESTINATION ${CMAKE_INSTALL_DOCDIR}
          COMPONENT debian EXCLUDE_FROM_ALL)
  install(FILES ${CMAKE_CURRENT_LIST_DIR}/lintian-overrides DESTINATION ${CMAKE_INSTALL_DATADIR}/lintian/overrides
          RENAME planewright COMPONENT debian EXCLUDE_FROM_ALL)
endif()
set(CPACK_INSTALL_CMAKE_PROJECTS ${PROJECT_BINARY_DIR} planewright program / ${PROJECT_BINARY_DIR} planewright debian /)

set(CPACK_INSTALL_DEFAULT_DIRECTORY_PERMISSIONS OWNER_READ OWNER_WRITE OWNER_EXECUTE GROUP_READ GROUP_EXECUTE
                                                WORLD_READ WORLD_EXECUTE)
set(CPACK_DEBIAN_FILE_NAME DEB-DEFAULT)
set(CPACK_DEBIAN_PACKAGE_RELEASE ${PLANEWRIGHT_REVISION})
set(CPACK_DEBIAN_PACKAGE_SECTION science)
set(CPACK_DEBIAN_PACKAGE_DESCRIPTION
"Planewright turns the stresses at one point of a member, in plane stress, to
the plane that matters: the grain of timber, the bond of a glue line, the
throat of a weld, the fibres of a ply. Stresses are typed with units, the cut
is dragged round the point by the stress element or the circle of stresses,
and the stresses along and across the line are read, held against strengths
over all combinations, and put into the calculation package as a labelled
figure or a calculation sheet.
.
It is an aid to a licensed engineer, who decides, under the code that governs
locally.")
set(CPACK_DEBIAN_PACKAGE_SHLIBDEPS ON)
# Desktops bring them; they are what makes a study open by its type.
set(CPACK_DEBIAN_PACKAGE_RECOMMENDS "desktop-file-utils, hicolor-icon-theme, shared-mime-info")
set(CPACK_DEBIAN_COMPRESSION_TYPE xz)
set(CPACK_DEBIAN_PACKAGE_CONTROL_STRICT_PERMISSION ON)
# The program is stripped; where its lines are goes into a package of its own.
set(CPACK_DEBIAN_DEBUGINFO_PACKAGE ON)
include(CPack)
