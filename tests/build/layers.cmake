# Compiles `#include "gainsay/TO/..."` with the very command that compiles layer FROM, and wants it
# to compile or to be refused for want of that header (EXPECTED).

set(header_of_core gainsay/core/version.h)
set(header_of_estimation gainsay/estimation/coordinates.h)
set(header_of_stats gainsay/stats/tails.h)
set(header_of_cli gainsay/cli/letters.h)
set(header ${header_of_${TO}})

# The command of any source of the layer, up to its output and input.
file(READ ${BUILD}/compile_commands.json commands)
string(JSON count LENGTH "${commands}")
math(EXPR last "${count} - 1")
foreach(i RANGE ${last})
  string(JSON source GET "${commands}" ${i} file)
  if(source MATCHES "/${FROM}/[a-z0-9_]+\\.cpp$" AND NOT source MATCHES "/tests/")
    string(JSON command GET "${commands}" ${i} command)
    string(JSON directory GET "${commands}" ${i} directory)
    break()
  endif()
endforeach()
if(NOT command)
  message(FATAL_ERROR "no source of ${FROM} in ${BUILD}/compile_commands.json")
endif()
string(REGEX REPLACE " -o .*" "" command "${command}")
separate_arguments(command UNIX_COMMAND "${command}")

set(probe ${SCRATCH}/${FROM}_including_${TO}.cpp)
file(WRITE ${probe} "#include \"${header}\"\n")
execute_process(COMMAND ${command} -fsyntax-only ${probe} WORKING_DIRECTORY ${directory}
  RESULT_VARIABLE status ERROR_VARIABLE messages)

if(EXPECTED STREQUAL "compiles" AND NOT status EQUAL 0)
  message(FATAL_ERROR "${FROM} should see ${header}:\n${messages}")
elseif(EXPECTED STREQUAL "refused" AND NOT messages MATCHES "${header}: No such file or directory")
  message(FATAL_ERROR "${FROM} sees ${header}, of a layer above it:\n${messages}")
endif()
