# SPDX-License-Identifier: MPL-2.0
# Finds the office and its SDK. Where they are elsewhere, set OFFICE_HOME (the folder that holds
# `program`) and OFFICE_SDK (the folder that holds `include` and `bin`).

find_program(SOFFICE NAMES soffice libreoffice)
if(SOFFICE)
  file(REAL_PATH ${SOFFICE} soffice_real)
  cmake_path(GET soffice_real PARENT_PATH soffice_program)
  cmake_path(GET soffice_program PARENT_PATH soffice_home)
endif()
find_path(OFFICE_HOME program/types.rdb
          HINTS ${soffice_home} PATHS /usr/lib/libreoffice /usr/lib64/libreoffice /opt/libreoffice
          DOC "Folder of the office, with `program`" REQUIRED)
find_path(OFFICE_SDK include/cppuhelper/implbase2.hxx
          HINTS ${OFFICE_HOME}/sdk DOC "Folder of the office's SDK" REQUIRED)
# The program folder may keep the compiled types in a place of its own.
find_file(OFFICE_TYPES types.rdb HINTS ${OFFICE_HOME}/program ${OFFICE_HOME}/program/types REQUIRED)
find_file(OFFICE_API offapi.rdb HINTS ${OFFICE_HOME}/program/types ${OFFICE_HOME}/program REQUIRED)
find_program(UNOIDL_WRITE unoidl-write HINTS ${OFFICE_SDK}/bin REQUIRED)
find_program(CPPUMAKER cppumaker HINTS ${OFFICE_SDK}/bin REQUIRED)
find_program(UNOPKG unopkg HINTS ${OFFICE_HOME}/program)
foreach(name cppuhelpergcc3 cppu sal)
  find_library(OFFICE_${name} uno_${name} HINTS ${OFFICE_SDK}/lib ${OFFICE_HOME}/program REQUIRED)
  list(APPEND OFFICE_LIBRARIES ${OFFICE_${name}})
endforeach()
# The SDK's tools need the office's own libraries.
set(OFFICE_TOOL ${CMAKE_COMMAND} -E env LD_LIBRARY_PATH=${OFFICE_HOME}/program)
