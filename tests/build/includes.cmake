# Refuses quoted includes that are not written from the root: "gainsay/LAYER/name.h".
file(GLOB_RECURSE sources RELATIVE ${ROOT} ${ROOT}/core/* ${ROOT}/estimation/* ${ROOT}/stats/*
     ${ROOT}/cli/* ${ROOT}/tests/*)
list(FILTER sources INCLUDE REGEX "\\.(h|cpp)$")

set(offences "")
foreach(source IN LISTS sources)
  file(STRINGS ${ROOT}/${source} includes REGEX "^[ \t]*#[ \t]*include[ \t]*\"")
  foreach(include IN LISTS includes)
    if(NOT include MATCHES "\"gainsay/[^.]+\\.h\"")
      list(APPEND offences "${source}: ${include}")
    endif()
  endforeach()
endforeach()
if(offences)
  list(JOIN offences "\n" offences)
  message(FATAL_ERROR "includes are written from the root, \"gainsay/LAYER/name.h\":\n${offences}")
endif()
