# No file of C++ is longer than 500 lines.
file(GLOB_RECURSE sources RELATIVE ${ROOT} ${ROOT}/core/* ${ROOT}/estimation/* ${ROOT}/stats/*
     ${ROOT}/cli/* ${ROOT}/tests/*)
list(FILTER sources INCLUDE REGEX "\\.(h|cpp)$")

set(offences "")
foreach(source IN LISTS sources)
  file(READ ${ROOT}/${source} text)
  string(REGEX MATCHALL "\n" ends "${text}")
  list(LENGTH ends count)
  if(count GREATER 500)
    list(APPEND offences "${source}: ${count} lines")
  endif()
endforeach()
if(offences)
  list(JOIN offences "\n" offences)
  message(FATAL_ERROR "files of more than 500 lines:\n${offences}")
endif()
